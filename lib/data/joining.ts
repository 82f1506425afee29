import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import {
  claimInvitation,
  findInvitationRow,
  joinByInvitation,
  joinClass,
} from './entry/accept-invitation';
import { plainWord } from './entry/joining';
import type { LinkProof } from './entry/proof';
import { countTry } from './entry/throttle';

/** What joining by word comes to, for somebody who is signed in. */
export type Joined =
  | { readonly outcome: 'joined' | 'already there'; readonly className: string }
  | { readonly outcome: 'no such word' }
  | { readonly outcome: 'throttled'; readonly retryAfter: number };

/** What accepting an invitation comes to, for somebody who is signed in. */
export type Accepted =
  | { readonly outcome: 'joined' }
  | { readonly outcome: 'another account'; readonly invited: string }
  | { readonly outcome: 'no longer good' };

/** Puts the viewer into the class that is open to this word. */
export async function joinByWord(
  viewer: Viewer,
  word: string,
  now: Date = presentTime(),
): Promise<Joined> {
  const tries = await countTry('joining word by person', viewer.personId);
  if (!tries.allowed) return { outcome: 'throttled', retryAfter: tries.retryAfter };
  return transact(async (transaction) => {
    const found = await row<{ classId: string; className: string }>(
      `select id as "classId", name as "className" from class_groups
       where joining_word = $1 and joining_open and archived_at is null for share`,
      [plainWord(word)],
      transaction,
    );
    if (found === null) return { outcome: 'no such word' };
    const { classId, className } = found;
    const joining = {
      classId,
      personId: viewer.personId,
      role: 'learner',
      by: 'joining word',
    } as const;
    return { outcome: await joinClass(joining, now, transaction), className };
  });
}

/** Accepts an invitation with the account that the viewer has, if it was sent to its address. */
export async function acceptInvitation(
  viewer: Viewer,
  proof: LinkProof,
  now: Date = presentTime(),
): Promise<Accepted> {
  const found = await findInvitationRow(proof, now);
  if (found === null) return { outcome: 'no longer good' };
  if (found.personId !== viewer.personId) {
    return { outcome: 'another account', invited: found.email };
  }
  return transact(async (transaction) => {
    if (!(await claimInvitation(found, now, transaction))) return { outcome: 'no longer good' };
    await joinByInvitation(found, viewer.personId, now, transaction);
    return { outcome: 'joined' };
  });
}
