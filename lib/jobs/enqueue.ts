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

/** A job to be put on the queue. */
export interface NewJob<Name extends JobName> extends JobOptions {
  readonly payload: JobPayloads[Name];
}

/**
 * Puts a job on the queue as part of the transaction that causes it: rolled back with it, seen by
 * the workers when it is committed.
 *
 * @example await enqueue(transaction, 'send-letter', { letterId });
 */
export function enqueue<Name extends JobName>(
  transaction: Transaction,
  name: Name,
  payload: JobPayloads[Name],
  options: JobOptions = {},
): Promise<void> {
  return enqueueAll(transaction, name, [{ ...options, payload }]);
}

/** As `enqueue`, for many jobs of one name in one statement. */
export async function enqueueAll<Name extends JobName>(
  transaction: Transaction,
  name: Name,
  jobs: readonly NewJob<Name>[],
): Promise<void> {
  if (jobs.length === 0) return;
  await rows(
    `select count(job.id) from jsonb_to_recordset($2::jsonb)
       as n (payload json, key text, "runAt" timestamptz, tries int)
     cross join lateral graphile_worker.add_job($1, n.payload, job_key => n.key,
       run_at => n."runAt", max_attempts => n.tries) job`,
    [name, JSON.stringify(jobs)],
    transaction,
  );
}
