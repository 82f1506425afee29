import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import { models } from '@/models';
import { recordAudit } from '../audit';
import { complaintAbout, hashPassword, type PasswordComplaint } from './password';
import type { LinkProof } from './proof';
import { hashSecret, newSecret } from './secret';

/** How long a link to set a password lives. */
export const setPasswordDays = 7;

/** Whose password a link sets. */
export interface LinkHolder {
  readonly name: string;
  readonly email: string;
  /** Whether the person has a password already, which the link then replaces. */
  readonly hasPassword: boolean;
}

/** What setting a password comes to. */
export type PasswordSet =
  | { readonly outcome: 'set'; readonly email: string }
  | { readonly outcome: 'refused'; readonly complaint: PasswordComplaint }
  | { readonly outcome: 'no longer good' };

/** Whose link this is, if it can still be used. */
export async function findLinkHolder(proof: LinkProof, now: Date): Promise<LinkHolder | null> {
  const found = await row<LinkRow>(linkSql, [hashSecret(proof.secret), now]);
  return (
    found && { name: found.name, email: found.email, hasPassword: found.passwordHash !== null }
  );
}

/**
 * Sets the password of the link's person, uses the link up, and ends every sign-in of that person.
 * It does not sign anybody in.
 */
export async function setPassword(
  proof: LinkProof,
  password: string,
  now: Date,
): Promise<PasswordSet> {
  const holder = await row<LinkRow>(linkSql, [hashSecret(proof.secret), now]);
  if (holder === null) return { outcome: 'no longer good' };
  const complaint = complaintAbout(password, [
    ...holder.name.split(/\s+/),
    holder.email,
    holder.email.split('@')[0] ?? '',
  ]);
  if (complaint !== null) return { outcome: 'refused', complaint };
  const passwordHash = await hashPassword(password);
  return transact(async (transaction) => {
    const used = await row(
      `update one_time_links set used_at = $2
       where id = $1 and used_at is null and expires_at > $2 returning id`,
      [holder.id, now],
      transaction,
    );
    if (used === null) return { outcome: 'no longer good' } as const;
    await models().Person.update(
      { passwordHash, passwordSetAt: now, emailConfirmedAt: now },
      { where: { id: holder.personId }, transaction },
    );
    await rows(
      `update sessions set ended_at = $2 where person_id = $1 and ended_at is null returning id`,
      [holder.personId, now],
      transaction,
    );
    await recordAudit(
      {
        actorId: holder.personId,
        action: 'password set',
        objectKind: 'person',
        objectId: holder.personId,
      },
      transaction,
    );
    return { outcome: 'set', email: holder.email } as const;
  });
}

/**
 * Makes the secret of a link that sets this person's password, and ends earlier ones. Whoever calls
 * has made sure of the right to do so.
 */
export async function makeSetPasswordSecret(
  personId: string,
  madeBy: string | null,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const secret = newSecret();
  const { OneTimeLink } = models();
  await OneTimeLink.update(
    { usedAt: now },
    { where: { personId, purpose: 'set-password', usedAt: null }, transaction },
  );
  await OneTimeLink.create(
    {
      personId,
      purpose: 'set-password',
      secretHash: hashSecret(secret),
      madeBy,
      createdAt: now,
      expiresAt: new Date(now.getTime() + setPasswordDays * 86_400_000),
    },
    { transaction },
  );
  return secret;
}

interface LinkRow {
  readonly id: string;
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string | null;
}

const linkSql = `
  select o.id, o.person_id as "personId", p.name, p.email, p.password_hash as "passwordHash"
  from one_time_links o
  join people p on p.id = o.person_id and p.disabled_at is null and p.erased_at is null
  where o.secret_hash = $1 and o.purpose = 'set-password'
    and o.used_at is null and o.expires_at > $2`;
