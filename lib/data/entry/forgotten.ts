import 'server-only';
import { row, transact } from '@/lib/db/query';
import { enqueue } from '@/lib/jobs/enqueue';
import { recordAudit } from '../audit';
import { queueLetter } from '../letters';
import { createLink } from './one-time-links';
import type { FormProof, JobProof } from './proof';
import { countTry, type Allowance } from './throttle';

/**
 * Takes the wish for a new password. The answer is the same, and the work until it is given too,
 * whether the address is known or not: all looking up is left to the job.
 */
export async function askForReset(proof: FormProof, email: string): Promise<Allowance> {
  if (proof.from !== null) {
    const byAddress = await countTry('reset by address', proof.from);
    if (!byAddress.allowed) return byAddress;
  }
  const address = email.trim().toLowerCase();
  const byAccount = await countTry('reset by account', address);
  if (!byAccount.allowed) return byAccount;
  await transact((transaction) => enqueue(transaction, 'send-reset', { email: address }));
  return { allowed: true };
}

/** Writes to whoever has this address, if anybody has, with a link that sets a new password. */
export async function sendReset(
  _proof: JobProof,
  { email }: { readonly email: string },
  now: Date,
): Promise<void> {
  await transact(async (transaction) => {
    const person = await row<{ id: string }>(
      'select id from people where email = $1 and disabled_at is null and erased_at is null',
      [email],
      transaction,
    );
    if (person === null) return;
    const target = { purpose: 'reset-password', personId: person.id } as const;
    const linkId = await createLink(target, null, now, transaction);
    const letter = { kind: 'reset-password', linkId } as const;
    await queueLetter(transaction, { to: email, personId: person.id, letter });
    await recordAudit(
      { actorId: null, action: 'reset asked for', objectKind: 'person', objectId: person.id },
      transaction,
    );
  });
}
