import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import * as z from 'zod';
import { rows } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import { enqueueAll } from '@/lib/jobs/enqueue';
import { isEssential, letterSchema, type Letter } from '@/lib/mail/letter';
import { email } from '@/lib/schemas/person';

/** How often a letter is tried before it is given up: for a little more than a day. */
export const letterTries = 14;

/** A letter to be put into the outbox. */
export interface NewLetter {
  readonly to: string;
  /** Whose letter it is, when they have an account. */
  readonly personId?: string;
  readonly letter: Letter;
  /** Names the cause, so that it writes one letter however often it is met. */
  readonly once?: string;
  /** Not before this moment; at once by default. */
  readonly sendAfter?: Date;
}

/**
 * Puts a letter into the outbox, and the job that sends it on the queue, as part of the transaction
 * that causes it. Answers the letter's id; null when the same cause has written it before, or its
 * reader wants no letters of this kind. Throws for a letter that does not fit its schema, or an
 * address that is none.
 *
 * @example
 * await queueLetter(transaction, { to: email, personId, letter: { kind: 'reset-password', linkId } });
 */
export async function queueLetter(
  transaction: Transaction,
  letter: NewLetter,
): Promise<string | null> {
  const [letterId] = await queueLetters(transaction, [letter]);
  return letterId ?? null;
}

/** As `queueLetter`, for many at once and in two statements; answers the ids of those written. */
export async function queueLetters(
  transaction: Transaction,
  letters: readonly NewLetter[],
): Promise<string[]> {
  if (letters.length === 0) return [];
  const queued = await rows<{ id: string; sendAfter: Date }>(
    `insert into letters (id, message_id, kind, to_address, person_id, data, once_key, send_after)
     select n.id, n."messageId", n.kind, n."to", n."personId", n.data, n.once,
       coalesce(n."sendAfter", now())
     from jsonb_to_recordset($1::jsonb) as n (id uuid, "messageId" text, kind text, "to" text,
       "personId" uuid, data jsonb, once text, "sendAfter" timestamptz, essential boolean)
     where n.essential or n."personId" is null or exists (
       select 1 from people p where p.id = n."personId" and p.wants_class_mail)
     on conflict (once_key) do nothing returning id, send_after as "sendAfter"`,
    [JSON.stringify(letters.map(recordOf))],
    transaction,
  );
  await queueSending(transaction, queued);
  return queued.map(({ id }) => id);
}

/** Puts the jobs that send these letters on the queue; one a letter at a time. */
export async function queueSending(
  transaction: Transaction,
  letters: readonly { readonly id: string; readonly sendAfter: Date }[],
): Promise<void> {
  const jobs = letters.map(({ id, sendAfter }) => ({
    payload: { letterId: id },
    key: `send-letter:${id}`,
    runAt: sendAfter,
    tries: letterTries,
  }));
  await enqueueAll(transaction, 'send-letter', jobs);
}

function recordOf({ to, letter, ...rest }: NewLetter) {
  const id = randomUUID();
  const { kind, ...data } = letterSchema.parse(letter);
  const essential = isEssential(kind);
  return { ...rest, id, messageId: messageIdOf(id), kind, to: oneAddress(to), data, essential };
}

/** The same for every try of a letter, so that a second copy can be known for what it is. */
export function messageIdOf(letterId: string): string {
  return `<${letterId}@${new URL(siteEnvironment().address).hostname}>`;
}

function oneAddress(to: string): string {
  const read = z.safeParse(email, to);
  if (!read.success)
    throw new RangeError('queueLetter: expected one address such as you@example.org');
  return read.data;
}
