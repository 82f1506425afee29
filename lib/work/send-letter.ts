import 'server-only';
import type { JobHelpers } from 'graphile-worker';
import { now } from '@/lib/clock';
import { claimLetter, markLetterSent, markLetterTried } from '@/lib/data/entry/letter-delivery';
import { failureOf } from '@/lib/mail/failure';
import type { Postbox } from '@/lib/mail/send';
import { writeLetter } from '@/lib/mail/write-letter';

const proof = { by: 'job', job: 'send-letter' } as const;

/** A try that did not succeed; the queue comes back to it later. */
class LetterNotSent extends Error {
  override name = 'LetterNotSent';
}

/**
 * Sends one letter: takes it, hands it over, marks it. Ended between the last two, it is handed over
 * once more under the same Message-ID, never lost. What cannot succeed is given up at once, what may
 * pass is tried again with growing pauses.
 */
export async function sendLetter(
  { letterId }: { readonly letterId: string },
  { job }: Pick<JobHelpers, 'job'>,
  postbox: Postbox,
): Promise<void> {
  const claimed = await claimLetter(proof, letterId, now());
  if (claimed === null) return;
  const { messageId, to, letter, context, oneClickAddress } = claimed;
  try {
    const written = writeLetter(letter, context);
    await postbox.send({ ...written, to, messageId, date: context.writtenAt, oneClickAddress });
  } catch (error) {
    const { reason, final } = failureOf(error);
    const givenUp = final || job.attempts >= job.max_attempts;
    await markLetterTried(proof, letterId, { reason, givenUp }, now());
    if (final) return;
    throw new LetterNotSent(reason);
  }
  await markLetterSent(proof, letterId, now());
}
