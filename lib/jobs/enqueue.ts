import 'server-only';
import type { Transaction } from 'sequelize';
import { rows } from '@/lib/db/query';
import type { JobName, JobPayloads } from './jobs';

/** When a job is to run, and how it is known. */
export interface JobOptions {
  /** A second job with the same key takes the first one's place while that waits. */
  readonly key?: string;
  /** Not before this moment; at once by default. */
  readonly runAt?: Date;
  /** How often it is tried in all; the pauses between the tries grow. */
  readonly tries?: number;
}

/**
 * Puts a job on the queue as part of the transaction that causes it: rolled back with it, seen by
 * the workers when it is committed.
 *
 * @example await enqueue(transaction, 'send-letter', { letterId });
 */
export async function enqueue<Name extends JobName>(
  transaction: Transaction,
  name: Name,
  payload: JobPayloads[Name],
  { key, runAt, tries }: JobOptions = {},
): Promise<void> {
  await rows(
    `select 1 as queued from graphile_worker.add_job($1, $2::json, job_key => $3, run_at => $4,
       max_attempts => $5)`,
    [name, JSON.stringify(payload), key ?? null, runAt ?? null, tries ?? null],
    transaction,
  );
}
