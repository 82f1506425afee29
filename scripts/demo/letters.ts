import { queueAssignmentLetters } from '@/lib/data/assignment-letters';
import { row, rows, transact } from '@/lib/db/query';

/**
 * Files the letters of the weeks that are over as sent when they were written, so that nothing of
 * them goes out now. One address was refused, as happens.
 */
export async function fileLetters(now: Date): Promise<void> {
  await transact(async (transaction) => {
    const set = await rows<{ id: string }>('select id from assignments order by opens_at', []);
    for (const { id } of set) await queueAssignmentLetters(transaction, id);
    await rows(
      `update letters set state = 'sent', tries = 1, created_at = send_after, tried_at = send_after,
         sent_at = send_after + interval '2 seconds'
       where state = 'waiting' and send_after <= $1 returning id`,
      [now],
      transaction,
    );
    await row(
      `update letters set state = 'failed', sent_at = null,
         last_error = 'The mail server refused the address: 550 5.1.1 nobody of that name.'
       where id = (select id from letters order by created_at desc, id desc offset 2 limit 1)
       returning id`,
      [],
      transaction,
    );
    await rows(
      `delete from graphile_worker._private_jobs j
       using graphile_worker._private_tasks t
       where t.id = j.task_id and t.identifier = 'send-letter' and j.run_at <= $1 returning j.id`,
      [now],
      transaction,
    );
  });
}
