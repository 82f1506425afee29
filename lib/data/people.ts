import 'server-only';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import { isTimeZone, now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from './audit';
import { isId } from './class-right';
import { linkAddress } from './entry/link-token';
import { createLink } from './entry/one-time-links';

/** A person as the administrator sees them. */
export interface PersonListed {
  readonly personId: string;
  readonly name: string;
  readonly email: string | null;
  readonly isAdministrator: boolean;
  readonly disabled: boolean;
  /** Whether they have set a password, and so can sign in. */
  readonly hasPassword: boolean;
  readonly lastSeenAt: string | null;
  readonly classes: readonly {
    readonly classId: string;
    readonly name: string;
    readonly role: 'learner' | 'instructor';
  }[];
}

/** A person to be made. */
export interface NewPerson {
  readonly name: string;
  readonly email: string;
  readonly isAdministrator?: boolean;
}

/** What making a person comes to; the link is shown once and kept only as a hash. */
export type PersonCreated =
  | { readonly outcome: 'created'; readonly personId: string; readonly link: string }
  | { readonly outcome: 'address taken' }
  | { readonly outcome: 'not allowed' };

/** Everybody, by name, for the administrator; nobody for anybody else. Three parts, one query. */
export function listPeople(viewer: Viewer): Promise<PersonListed[]> {
  return people(viewer, null);
}

/** One person, for the administrator; null for anybody else and for somebody who is not there. */
export async function findPerson(viewer: Viewer, personId: string): Promise<PersonListed | null> {
  if (!isId(personId)) return null;
  const [person] = await people(viewer, personId);
  return person ?? null;
}

async function people(viewer: Viewer, personId: string | null): Promise<PersonListed[]> {
  const found = await rows<Omit<PersonListed, 'lastSeenAt'> & { lastSeenAt: Date | null }>(
    `select p.id as "personId", p.name, p.email, p.is_administrator as "isAdministrator",
       p.disabled_at is not null as disabled, p.password_hash is not null as "hasPassword",
       (select max(s.last_seen_at) from sessions s where s.person_id = p.id) as "lastSeenAt",
       coalesce((
         select json_agg(json_build_object('classId', g.id, 'name', g.name, 'role', m.role)
           order by g.name)
         from memberships m join class_groups g on g.id = m.class_id and g.archived_at is null
         where m.person_id = p.id and m.left_at is null), '[]') as classes
     from people p
     where $1::boolean and p.erased_at is null and ($2::uuid is null or p.id = $2::uuid)
     order by p.name, p.id`,
    [can(viewer, 'look after people'), personId],
  );
  return found.map((one) => ({ ...one, lastSeenAt: one.lastSeenAt?.toISOString() ?? null }));
}

/** Makes a person, with the link by which they set their first password. */
export async function createPerson(
  viewer: Viewer,
  { name, email, isAdministrator = false }: NewPerson,
  now: Date = presentTime(),
): Promise<PersonCreated> {
  if (!can(viewer, 'look after people')) return { outcome: 'not allowed' };
  const { Person, Learner } = models();
  try {
    return await transact(async (transaction) => {
      const person = await Person.create(
        {
          name: name.trim(),
          email: email.trim().toLowerCase(),
          isAdministrator,
          timeZone: viewer.timeZone,
          units: viewer.units,
        },
        { transaction },
      );
      await Learner.create({ personId: person.id }, { transaction });
      await audit(viewer, 'person created', person.id, transaction);
      if (isAdministrator) await audit(viewer, 'administrator made', person.id, transaction);
      const link = await createPasswordLinkFor(viewer, person.id, now, transaction);
      return { outcome: 'created', personId: person.id, link } as const;
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) return { outcome: 'address taken' };
    throw error;
  }
}

/**
 * A new link for a first or forgotten password, which ends the earlier ones; null when the viewer
 * may not, or the person is not there or disabled.
 */
export async function createPasswordLink(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<string | null> {
  if (!can(viewer, 'look after people') || !isId(personId)) return null;
  return transact(async (transaction) => {
    const person = await row(
      'select id from people where id = $1 and disabled_at is null and erased_at is null',
      [personId],
      transaction,
    );
    if (person === null) return null;
    await audit(viewer, 'link made', personId, transaction);
    return createPasswordLinkFor(viewer, personId, now, transaction);
  });
}

/** Shuts a person out at once, sessions and links included. False when that cannot be done. */
export async function disablePerson(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  // Nobody shuts themselves out: there is always an administrator left.
  if (!can(viewer, 'look after people') || !isId(personId) || personId === viewer.personId) {
    return false;
  }
  return transact(async (transaction) => {
    const disabled = await row(
      `update people set disabled_at = $2, updated_at = $2
       where id = $1 and disabled_at is null and erased_at is null returning id`,
      [personId, now],
      transaction,
    );
    if (disabled === null) return false;
    await endEverything(personId, now, transaction);
    await audit(viewer, 'person disabled', personId, transaction);
    return true;
  });
}

/** Lets a disabled person in again. False when that cannot be done. */
export async function enablePerson(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!can(viewer, 'look after people') || !isId(personId)) return false;
  return transact(async (transaction) => {
    const enabled = await row(
      `update people set disabled_at = null, updated_at = $2
       where id = $1 and disabled_at is not null and erased_at is null returning id`,
      [personId, now],
      transaction,
    );
    if (enabled === null) return false;
    await audit(viewer, 'person enabled', personId, transaction);
    return true;
  });
}

/** How somebody likes things shown. */
export interface Preferences {
  readonly name?: string;
  readonly units?: 'metric' | 'inch';
  readonly timeZone?: string;
}

/** Changes the viewer's own name, units or time zone. Throws `RangeError` for an unknown zone. */
export async function updatePreferences(viewer: Viewer, wanted: Preferences): Promise<void> {
  if (wanted.timeZone !== undefined && !isTimeZone(wanted.timeZone)) {
    throw new RangeError(`updatePreferences: ${wanted.timeZone} is not a time zone`);
  }
  const { name, units, timeZone } = wanted;
  await models().Person.update({ name, units, timeZone }, { where: { id: viewer.personId } });
}

async function endEverything(personId: string, now: Date, transaction: Transaction) {
  await rows(
    'update sessions set ended_at = $2 where person_id = $1 and ended_at is null returning id',
    [personId, now],
    transaction,
  );
  await rows(
    'update one_time_links set used_at = $2 where person_id = $1 and used_at is null returning id',
    [personId, now],
    transaction,
  );
}

function audit(
  viewer: Viewer,
  action: Parameters<typeof recordAudit>[0]['action'],
  personId: string,
  transaction: Transaction,
): Promise<void> {
  return recordAudit(
    { actorId: viewer.personId, action, objectKind: 'person', objectId: personId },
    transaction,
  );
}

async function createPasswordLinkFor(
  viewer: Viewer,
  personId: string,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const target = { purpose: 'set-password', personId } as const;
  return linkAddress('set-password', await createLink(target, viewer.personId, now, transaction));
}
