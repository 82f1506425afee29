import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { row } from '@/lib/db/query';
import { models } from '@/models';
import { linkLifetimes, linkToken, type LinkPurpose } from './link-token';
import type { LinkProof } from './proof';
import { hashSecret } from './secret';

/** Where a link leads: to somebody's account, or to an invitation. */
export type LinkTarget =
  | {
      readonly purpose: 'set-password' | 'reset-password';
      readonly personId: string;
    }
  | { readonly purpose: 'change-address'; readonly personId: string; readonly newEmail: string }
  | { readonly purpose: 'invitation' | 'confirm-address'; readonly invitationId: string };

/**
 * Makes a link and ends the unused ones that lead to the same; answers its id, from which the token
 * follows. Whoever calls has made sure of the right to do so.
 */
export async function createLink(
  target: LinkTarget,
  madeBy: string | null,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const { OneTimeLink } = models();
  const same =
    'invitationId' in target
      ? { invitationId: target.invitationId }
      : { personId: target.personId, purpose: replaced(target.purpose) };
  await OneTimeLink.update({ usedAt: now }, { where: { ...same, usedAt: null }, transaction });
  const id = randomUUID();
  await OneTimeLink.create(
    {
      id,
      ...target,
      secretHash: hashSecret(linkToken(id)),
      madeBy,
      createdAt: now,
      expiresAt: new Date(now.getTime() + linkLifetimes[target.purpose]),
    },
    { transaction },
  );
  return id;
}

/** Uses a link up; false when somebody has meanwhile, or when it has expired. */
export async function spendLink(id: string, now: Date, transaction: Transaction): Promise<boolean> {
  const used = await row(
    `update one_time_links set used_at = $2
     where id = $1 and used_at is null and expires_at > $2 returning id`,
    [id, now],
    transaction,
  );
  return used !== null;
}

/** The condition on `o` (one_time_links) by which a link that can still be used is found. */
export const usableLink = 'o.secret_hash = $1 and o.used_at is null and o.expires_at > $2';

/** The values for `usableLink`. */
export function linkValues(proof: LinkProof, now: Date): [string, Date] {
  return [hashSecret(proof.secret), now];
}

/** A first password and a forgotten one are set in the same way: each link ends the other kind. */
function replaced(purpose: LinkPurpose): LinkPurpose[] {
  return purpose === 'change-address' ? [purpose] : ['set-password', 'reset-password'];
}
