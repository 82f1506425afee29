import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { createLink } from './entry/one-time-links';
import { countTry } from './entry/throttle';
import { queueLetter } from './letters';
import { hasGivenPassword } from './password-given';

/** What asking for another address comes to. */
export type NewAddressAsked = 'asked' | 'the same' | 'password wanted' | 'throttled';

/** The address with which the viewer signs in. */
export async function findOwnAddress(viewer: Viewer): Promise<string | null> {
  const person = await row<{ email: string | null }>('select email from people where id = $1', [
    viewer.personId,
  ]);
  return person?.email ?? null;
}

/**
 * Writes to a new address of the viewer's; it takes the old one's place when the link in that letter
 * is followed. Whether somebody has the address already is said to nobody but its owner.
 */
export async function askForNewAddress(
  viewer: Viewer,
  newEmail: string,
  now: Date = presentTime(),
): Promise<NewAddressAsked> {
  const email = newEmail.trim().toLowerCase();
  if (email === (await findOwnAddress(viewer))) return 'the same';
  if (!(await hasGivenPassword(viewer, now))) return 'password wanted';
  const tries = await countTry('new address by person', viewer.personId);
  if (!tries.allowed) return 'throttled';
  const { personId } = viewer;
  await transact(async (transaction) => {
    const target = { purpose: 'change-address', personId, newEmail: email } as const;
    const linkId = await createLink(target, personId, now, transaction);
    const taken = await row('select 1 as taken from people where email = $1', [email], transaction);
    const letter =
      taken === null
        ? ({ kind: 'change-address', linkId } as const)
        : ({ kind: 'account-exists' } as const);
    await queueLetter(transaction, { to: email, letter });
    await recordAudit(
      {
        actorId: personId,
        action: 'address change asked for',
        objectKind: 'person',
        objectId: personId,
      },
      transaction,
    );
  });
  return 'asked';
}
