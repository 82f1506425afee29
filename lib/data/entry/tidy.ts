import 'server-only';
import { rows, transact } from '@/lib/db/query';
import type { JobProof } from './proof';

/** How long what is over is kept: retries have long ceased by then. */
const keptDays = 30;

/** How long the log of letters reaches back. */
const lettersKeptDays = 180;

/**
 * Removes what is over and done with: remembered answers to requests, sessions, one-time links
 * and invitations past their time, letters of long ago, and counts of tries. Attempts and the audit
 * log are never touched.
 */
export async function tidy(_proof: JobProof, now: Date): Promise<void> {
  const before = new Date(now.getTime() - keptDays * 86_400_000);
  await transact(async (transaction) => {
    for (const [table, condition] of [
      ['request_keys', 'created_at < $1'],
      ['sessions', 'coalesce(ended_at, expires_at) < $1'],
      ['one_time_links', 'coalesce(used_at, expires_at) < $1'],
      [
        'invitations',
        `accepted_at is null and coalesce(withdrawn_at, expires_at) < $1 and not exists (
          select 1 from one_time_links o where o.invitation_id = invitations.id)`,
      ],
    ] as const) {
      await rows(
        `delete from ${table} where ${condition} returning 1 as gone`,
        [before],
        transaction,
      );
    }
    await rows(
      "delete from letters where state <> 'waiting' and created_at < $1 returning 1 as gone",
      [new Date(now.getTime() - lettersKeptDays * 86_400_000)],
      transaction,
    );
    await rows(
      'delete from throttle where expire < $1 returning 1 as gone',
      [now.getTime()],
      transaction,
    );
  });
}
