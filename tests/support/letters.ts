import { rows } from '@/lib/db/query';
import { takeUpJoining } from '@/lib/data/entry/joining';
import { sendReset } from '@/lib/data/entry/forgotten';
import { linkToken } from '@/lib/data/entry/link-token';

interface QueuedLetter {
  readonly kind: string;
  readonly to: string;
  readonly data: { readonly linkId?: string; readonly className?: string };
}

/** The letters to an address that are in the outbox, the oldest first. */
export function lettersTo(email: string): Promise<QueuedLetter[]> {
  return rows<QueuedLetter>(
    `select kind, to_address as "to", data from letters where to_address = $1
     order by created_at, id`,
    [email],
  );
}

/** The token of the link in the latest letter to an address. */
export async function latestToken(email: string): Promise<string> {
  const linkId = (await lettersTo(email)).at(-1)?.data.linkId;
  if (linkId === undefined) throw new Error(`latestToken: no letter to ${email} has a link`);
  return linkToken(linkId);
}

const handlers = { 'send-reset': sendReset, 'take-up-joining': takeUpJoining } as const;

/** Does what waits on the queue of one kind, as the worker would. */
export async function workOff(job: keyof typeof handlers, now = new Date()): Promise<number> {
  const waiting = await rows<{
    id: string;
    payload: { word: string; name: string; email: string };
  }>(
    `select j.id, j.payload from graphile_worker._private_jobs j
     join graphile_worker._private_tasks t on t.id = j.task_id
     where t.identifier = $1 order by j.id`,
    [job],
  );
  for (const { id, payload } of waiting) {
    await handlers[job]({ by: 'job', job }, payload, now);
    await rows('delete from graphile_worker._private_jobs where id = $1 returning id', [id]);
  }
  return waiting.length;
}
