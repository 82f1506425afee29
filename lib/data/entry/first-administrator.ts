import 'server-only';
import { transact } from '@/lib/db/query';
import { models } from '@/models';
import { recordAudit } from '../audit';
import { linkAddress } from './link-token';
import { createLink } from './one-time-links';
import type { ConsoleProof } from './proof';

/** An administrator to be: a name and an address. */
export interface NewAdministrator {
  readonly name: string;
  readonly email: string;
}

/**
 * Makes an administrator from the machine itself, or makes one of the person who has the address
 * already; answers the link that sets their password.
 */
export async function createAdministrator(
  _proof: ConsoleProof,
  { name, email }: NewAdministrator,
  now: Date,
): Promise<string> {
  const { Person, Learner } = models();
  return transact(async (transaction) => {
    const address = email.trim().toLowerCase();
    const known = await Person.findOne({
      attributes: ['id'],
      where: { email: address },
      transaction,
    });
    const person =
      known ??
      (await Person.create(
        { name: name.trim(), email: address, createdAt: now, updatedAt: now },
        { transaction },
      ));
    if (known === null) await Learner.create({ personId: person.id }, { transaction });
    await Person.update({ isAdministrator: true }, { where: { id: person.id }, transaction });
    await recordAudit(
      {
        actorId: null,
        action: 'administrator made',
        objectKind: 'person',
        objectId: person.id,
      },
      transaction,
    );
    const target = { purpose: 'set-password', personId: person.id } as const;
    return linkAddress('set-password', await createLink(target, null, now, transaction));
  });
}
