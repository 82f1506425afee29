import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { queueLetter } from './letters';
import {
  complaintAbout,
  hashPassword,
  isPassword,
  knownOf,
  type PasswordComplaint,
} from './entry/password';
import { countTry, forgetTries } from './entry/throttle';

/** What changing one's password comes to. */
export type PasswordChange =
  | { readonly outcome: 'changed' }
  | { readonly outcome: 'wrong password' }
  | { readonly outcome: 'throttled' }
  | { readonly outcome: 'refused'; readonly complaint: PasswordComplaint };

/**
 * Changes the viewer's password; the one they have is the proof. Every other sign-in of theirs
 * ends. Wrong tries count with those of signing in.
 */
export async function changePassword(
  viewer: Viewer,
  { current, next }: { readonly current: string; readonly next: string },
  now: Date = presentTime(),
): Promise<PasswordChange> {
  const person = await row<{ name: string; email: string; passwordHash: string | null }>(
    'select name, email, password_hash as "passwordHash" from people where id = $1',
    [viewer.personId],
  );
  if (person === null) return { outcome: 'wrong password' };
  const tries = await countTry('sign-in by account', person.email);
  if (!tries.allowed) return { outcome: 'throttled' };
  if (!(await isPassword(person.passwordHash, current))) return { outcome: 'wrong password' };
  await forgetTries('sign-in by account', person.email);
  const complaint = complaintAbout(next, knownOf(person));
  if (complaint !== null) return { outcome: 'refused', complaint };
  await keepPassword(viewer, person.email, await hashPassword(next), now);
  return { outcome: 'changed' };
}

async function keepPassword(
  viewer: Viewer,
  email: string,
  passwordHash: string,
  now: Date,
): Promise<void> {
  await transact(async (transaction) => {
    await rows(
      `update people set password_hash = $2, password_set_at = $3, updated_at = $3
       where id = $1 returning id`,
      [viewer.personId, passwordHash, now],
      transaction,
    );
    await rows(
      `update sessions set ended_at = $3
       where person_id = $1 and id <> $2 and ended_at is null returning id`,
      [viewer.personId, viewer.sessionId, now],
      transaction,
    );
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'password set',
        objectKind: 'person',
        objectId: viewer.personId,
      },
      transaction,
    );
    await queueLetter(transaction, {
      to: email,
      personId: viewer.personId,
      letter: { kind: 'password-changed' },
    });
  });
}
