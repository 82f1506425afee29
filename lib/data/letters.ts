import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import * as z from 'zod';
import { row } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import { enqueue } from '@/lib/jobs/enqueue';
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
  { to, personId, letter, once, sendAfter }: NewLetter,
): Promise<string | null> {
  const id = randomUUID();
  const { kind, ...data } = letterSchema.parse(letter);
  const queued = await row(
    `insert into letters (id, message_id, kind, to_address, person_id, data, once_key, send_after)
     select $1, $2, $3, $4, $5::uuid, $6::jsonb, $7, coalesce($8::timestamptz, now())
     where $9::boolean or $5::uuid is null or exists (
       select 1 from people p where p.id = $5::uuid and p.wants_class_mail)
     on conflict (once_key) do nothing returning id`,
    [
      id,
      messageIdOf(id),
      kind,
      oneAddress(to),
      personId ?? null,
      JSON.stringify(data),
      once ?? null,
      sendAfter ?? null,
      isEssential(kind),
    ],
    transaction,
  );
  if (queued === null) return null;
  await queueSending(transaction, id, sendAfter);
  return id;
}

/** Puts the job that sends a letter of the outbox on the queue; one a letter at a time. */
export async function queueSending(
  transaction: Transaction,
  letterId: string,
  runAt?: Date,
): Promise<void> {
  const key = `send-letter:${letterId}`;
  await enqueue(transaction, 'send-letter', { letterId }, { key, runAt, tries: letterTries });
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
