import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import { models } from '@/models';
import { recordAudit } from '../audit';
import { queueLetter } from '../letters';
import { linkValues, usableLink, spendLink } from './one-time-links';
import { complaintAbout, hashPassword, knownOf, type PasswordComplaint } from './password';
import type { LinkProof } from './proof';

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
  const found = await row<LinkRow>(holderSql, linkValues(proof, now));
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
  const holder = await row<LinkRow>(holderSql, linkValues(proof, now));
  if (holder === null) return { outcome: 'no longer good' };
  const complaint = complaintAbout(password, knownOf(holder));
  if (complaint !== null) return { outcome: 'refused', complaint };
  const passwordHash = await hashPassword(password);
  return transact(async (transaction) => {
    if (!(await spendLink(holder.id, now, transaction)))
      return { outcome: 'no longer good' } as const;
    await keepPassword(holder, passwordHash, now, transaction);
    return { outcome: 'set', email: holder.email } as const;
  });
}

async function keepPassword(
  { personId, email, passwordHash: earlier }: LinkRow,
  passwordHash: string,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  await models().Person.update(
    { passwordHash, passwordSetAt: now, emailConfirmedAt: now },
    { where: { id: personId }, transaction },
  );
  await rows(
    'update sessions set ended_at = $2 where person_id = $1 and ended_at is null returning id',
    [personId, now],
    transaction,
  );
  await recordAudit(
    { actorId: personId, action: 'password set', objectKind: 'person', objectId: personId },
    transaction,
  );
  if (earlier === null) return;
  await queueLetter(transaction, { to: email, personId, letter: { kind: 'password-changed' } });
}

interface LinkRow {
  readonly id: string;
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string | null;
}

const holderSql = `
  select o.id, o.person_id as "personId", p.name, p.email, p.password_hash as "passwordHash"
  from one_time_links o
  join people p on p.id = o.person_id and p.disabled_at is null and p.erased_at is null
  where ${usableLink} and o.purpose in ('set-password', 'reset-password')`;
