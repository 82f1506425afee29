import 'server-only';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import type { Role } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from '../audit';
import { linkValues, usableLink, spendLink } from './one-time-links';
import { complaintAbout, hashPassword, knownOf, type PasswordComplaint } from './password';
import type { LinkProof } from './proof';
import { insertSession } from './sessions';

/** An invitation that can still be accepted, for whoever holds its link. */
export interface InvitationFound {
  readonly email: string;
  readonly name: string | null;
  readonly className: string | null;
  readonly role: Role | null;
  /** Who invited; null when somebody came with the joining word. */
  readonly inviterName: string | null;
  /** Whether the address has an account with a password, which then accepts signed in. */
  readonly hasAccount: boolean;
}

/** What accepting as somebody new comes to. */
export type AcceptedAsNew =
  | { readonly outcome: 'joined'; readonly personId: string; readonly secret: string }
  | { readonly outcome: 'refused'; readonly complaint: PasswordComplaint }
  | { readonly outcome: 'has an account' }
  | { readonly outcome: 'no longer good' };

/** A new person's name and password, and the device that they sit at. */
export interface NewAccount {
  readonly name: string;
  readonly password: string;
  readonly device: string;
}

/** The invitation that this link leads to, if it can still be accepted. Looking changes nothing. */
export async function findInvitation(proof: LinkProof, now: Date): Promise<InvitationFound | null> {
  const found = await findInvitationRow(proof, now);
  if (found === null) return null;
  const { email, name, className, role, inviterName, hasAccount } = found;
  return { email, name, className, role, inviterName, hasAccount };
}

/**
 * Accepts an invitation as somebody new: makes the account with its password, the address being
 * confirmed by the letter, puts the person into the class, and signs them in.
 */
export async function acceptAsNew(
  proof: LinkProof,
  { name, password, device }: NewAccount,
  now: Date,
): Promise<AcceptedAsNew> {
  const found = await findInvitationRow(proof, now);
  if (found === null) return { outcome: 'no longer good' };
  if (found.hasAccount) return { outcome: 'has an account' };
  const complaint = complaintAbout(password, knownOf({ name, email: found.email }));
  if (complaint !== null) return { outcome: 'refused', complaint };
  const passwordHash = await hashPassword(password);
  try {
    return await transact(async (transaction) => {
      if (!(await claimInvitation(found, now, transaction))) return { outcome: 'no longer good' };
      const personId = await keepPerson(found, { name, passwordHash }, now, transaction);
      await joinByInvitation(found, personId, now, transaction);
      const secret = await insertSession(personId, device, now, transaction);
      return { outcome: 'joined', personId, secret };
    });
  } catch (error) {
    // Another invitation to the same address was accepted at the same moment.
    if (error instanceof UniqueConstraintError) return { outcome: 'has an account' };
    throw error;
  }
}

/** Uses the invitation's link up and holds the invitation; false when either has gone meanwhile. */
export async function claimInvitation(
  { linkId, invitationId }: InvitationRow,
  now: Date,
  transaction: Transaction,
): Promise<boolean> {
  const open = await row(
    `select 1 as open from invitations
     where id = $1 and accepted_at is null and withdrawn_at is null for update`,
    [invitationId],
    transaction,
  );
  return open !== null && spendLink(linkId, now, transaction);
}

/** Marks a claimed invitation as accepted and puts the person into its class. */
export async function joinByInvitation(
  { invitationId, classId, role, byWord }: InvitationRow,
  personId: string,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  await models().Invitation.update(
    { acceptedAt: now, acceptedBy: personId },
    { where: { id: invitationId }, transaction },
  );
  if (classId === null || role === null) return;
  const by = byWord ? 'joining word' : 'invitation';
  await joinClass({ classId, personId, role, by }, now, transaction);
}

/** Puts somebody into a class, if they are not in it; whoever calls has made sure of the right. */
export async function joinClass(
  { classId, personId, role, by }: { classId: string; personId: string; role: Role; by: string },
  now: Date,
  transaction: Transaction,
): Promise<'joined' | 'already there'> {
  const joined = await row(
    `insert into memberships (class_id, person_id, role, joined_at) values ($1, $2, $3, $4)
     on conflict (class_id, person_id) where left_at is null do nothing returning id`,
    [classId, personId, role, now],
    transaction,
  );
  if (joined === null) return 'already there';
  await recordAudit(
    {
      actorId: personId,
      action: 'member added',
      objectKind: 'person',
      objectId: personId,
      classId,
      detail: { role, by },
    },
    transaction,
  );
  return 'joined';
}

/** An invitation with what its acceptance needs. */
export interface InvitationRow extends InvitationFound {
  readonly linkId: string;
  readonly invitationId: string;
  readonly classId: string | null;
  readonly byWord: boolean;
  /** The account that has the address already. */
  readonly personId: string | null;
}

/** The invitation behind a link, with the account that has its address. */
export function findInvitationRow(proof: LinkProof, now: Date): Promise<InvitationRow | null> {
  return row<InvitationRow>(invitationSql, linkValues(proof, now));
}

const invitationSql = `
  select o.id as "linkId", i.id as "invitationId", i.class_id as "classId", i.email,
    coalesce(i.name, p.name) as name, i.role, g.name as "className", inviter.name as "inviterName",
    i.joining_word is not null as "byWord", p.id as "personId",
    coalesce(p.password_hash is not null, false) as "hasAccount"
  from one_time_links o
  join invitations i on i.id = o.invitation_id and i.accepted_at is null
    and i.withdrawn_at is null and i.expires_at > $2
  left join class_groups g on g.id = i.class_id
  left join people inviter on inviter.id = i.invited_by
  left join people p on p.email = i.email
  where ${usableLink} and (i.class_id is null or g.archived_at is null)
    and (i.joining_word is null or (g.joining_open and g.joining_word = i.joining_word))
    and (p.id is null or (p.disabled_at is null and p.erased_at is null))`;

async function keepPerson(
  { email, personId, classId }: InvitationRow,
  { name, passwordHash }: { readonly name: string; readonly passwordHash: string },
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const { Person, Learner } = models();
  const password = { name: name.trim(), passwordHash, passwordSetAt: now, emailConfirmedAt: now };
  if (personId !== null) {
    await Person.update(password, { where: { id: personId }, transaction });
    await rows(
      'update one_time_links set used_at = $2 where person_id = $1 and used_at is null returning id',
      [personId, now],
      transaction,
    );
  }
  const person =
    personId === null
      ? await Person.create(
          { ...password, email, timeZone: await zoneOf(classId, transaction) },
          { transaction },
        )
      : { id: personId };
  if (personId === null) await Learner.create({ personId: person.id }, { transaction });
  await recordAudit(
    {
      actorId: person.id,
      action: personId === null ? 'person created' : 'password set',
      objectKind: 'person',
      objectId: person.id,
    },
    transaction,
  );
  return person.id;
}

/** Somebody new lives where their class does, until they say otherwise. */
async function zoneOf(
  classId: string | null,
  transaction: Transaction,
): Promise<string | undefined> {
  if (classId === null) return undefined;
  const found = await row<{ timeZone: string }>(
    'select time_zone as "timeZone" from class_groups where id = $1',
    [classId],
    transaction,
  );
  return found?.timeZone;
}
