import 'server-only';
import { UniqueConstraintError } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import { recordAudit } from '../audit';
import { queueLetter } from '../letters';
import { linkValues, usableLink, spendLink } from './one-time-links';
import type { LinkProof } from './proof';

/** What confirming a new address comes to. */
export type AddressConfirmed =
  | { readonly outcome: 'changed'; readonly email: string }
  | { readonly outcome: 'address taken' }
  | { readonly outcome: 'no longer good' };

/** The new address that a link would put into force. Looking changes nothing. */
export async function findNewAddress(proof: LinkProof, now: Date): Promise<string | null> {
  return (await row<ChangeRow>(changeSql, linkValues(proof, now)))?.newEmail ?? null;
}

/**
 * Puts a new address into force: the link that was sent to it is the proof. The old address is told,
 * and every unused link that was sent there ends.
 */
export async function confirmNewAddress(proof: LinkProof, now: Date): Promise<AddressConfirmed> {
  const found = await row<ChangeRow>(changeSql, linkValues(proof, now));
  if (found === null) return { outcome: 'no longer good' };
  const { id, personId, email, newEmail } = found;
  try {
    return await transact(async (transaction) => {
      if (!(await spendLink(id, now, transaction))) return { outcome: 'no longer good' };
      await rows(
        `update people set email = $2, email_confirmed_at = $3, updated_at = $3
         where id = $1 returning id`,
        [personId, newEmail, now],
        transaction,
      );
      await rows(
        `update one_time_links set used_at = $2 where person_id = $1 and used_at is null
         returning id`,
        [personId, now],
        transaction,
      );
      await queueLetter(transaction, { to: email, personId, letter: { kind: 'address-changed' } });
      await recordAudit(
        { actorId: personId, action: 'address changed', objectKind: 'person', objectId: personId },
        transaction,
      );
      return { outcome: 'changed', email: newEmail };
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) return { outcome: 'address taken' };
    throw error;
  }
}

interface ChangeRow {
  readonly id: string;
  readonly personId: string;
  readonly email: string;
  readonly newEmail: string;
}

const changeSql = `
  select o.id, o.person_id as "personId", p.email, o.new_email as "newEmail"
  from one_time_links o
  join people p on p.id = o.person_id and p.disabled_at is null and p.erased_at is null
  where ${usableLink} and o.purpose = 'change-address'`;
