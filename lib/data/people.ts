import 'server-only';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from './audit';
import { isId } from './class-right';
import { linkAddress } from './entry/link-token';
import { createLink } from './entry/one-time-links';
import { queueLetter } from './letters';
import { hasGivenPassword } from './password-given';

/** A person to be made. */
export interface NewPerson {
  readonly name: string;
  readonly email: string;
  readonly isAdministrator?: boolean;
}

/**
 * What making a person comes to. A letter brings them the link; it is shown once, too, for where
 * letters do not arrive, and is kept only as a hash.
 */
export type PersonCreated =
  | { readonly outcome: 'created'; readonly personId: string; readonly link: string }
  | { readonly outcome: 'address taken' }
  /** For an administrator to be, the viewer's own password is asked for again. */
  | { readonly outcome: 'password wanted' }
  | { readonly outcome: 'not allowed' };

/** Makes a person, with the link by which they set their first password. */
export async function createPerson(
  viewer: Viewer,
  { name, email, isAdministrator = false }: NewPerson,
  now: Date = presentTime(),
): Promise<PersonCreated> {
  if (!can(viewer, 'look after people')) return { outcome: 'not allowed' };
  if (isAdministrator && !(await hasGivenPassword(viewer, now))) {
    return { outcome: 'password wanted' };
  }
  const { Person, Learner } = models();
  const address = email.trim().toLowerCase();
  try {
    return await transact(async (transaction) => {
      const person = await Person.create(
        {
          name: name.trim(),
          email: address,
          isAdministrator,
          timeZone: viewer.timeZone,
          units: viewer.units,
        },
        { transaction },
      );
      await Learner.create({ personId: person.id }, { transaction });
      await audit(viewer, 'person created', person.id, transaction);
      if (isAdministrator) await audit(viewer, 'administrator made', person.id, transaction);
      const link = await createPasswordLinkFor(
        viewer,
        { personId: person.id, to: address },
        now,
        transaction,
      );
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
    const person = await row<{ email: string }>(
      'select email from people where id = $1 and disabled_at is null and erased_at is null',
      [personId],
      transaction,
    );
    if (person === null) return null;
    await audit(viewer, 'link made', personId, transaction);
    return createPasswordLinkFor(viewer, { personId, to: person.email }, now, transaction);
  });
}

/**
 * Shuts a person out at once, sessions and links included. False when that cannot be done, or when
 * the viewer has given their password too long ago.
 */
export async function disablePerson(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  // Nobody shuts themselves out: there is always an administrator left.
  if (personId === viewer.personId) return false;
  return changePerson(viewer, personId, now, async (transaction) => {
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

/**
 * Makes somebody an administrator. False when that cannot be done, or when the viewer has given their
 * password too long ago.
 */
export async function makeAdministrator(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  return changePerson(viewer, personId, now, async (transaction) => {
    const made = await row(
      `update people set is_administrator = true, updated_at = $2
       where id = $1 and not is_administrator and disabled_at is null and erased_at is null
       returning id`,
      [personId, now],
      transaction,
    );
    if (made === null) return false;
    await audit(viewer, 'administrator made', personId, transaction);
    return true;
  });
}

/** Makes an administrator one no longer; the last one stays. False when that cannot be done. */
export async function unmakeAdministrator(
  viewer: Viewer,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  return changePerson(viewer, personId, now, async (transaction, administrators) => {
    if (administrators.length < 2 || !administrators.includes(personId)) return false;
    await rows(
      'update people set is_administrator = false, updated_at = $2 where id = $1 returning id',
      [personId, now],
      transaction,
    );
    await audit(viewer, 'administrator unmade', personId, transaction);
    return true;
  });
}

/**
 * Runs a change of somebody's account, for an administrator who has given their password lately. All
 * administrators are held meanwhile: two of them cannot shut each other out at once.
 */
async function changePerson(
  viewer: Viewer,
  personId: string,
  now: Date,
  work: (transaction: Transaction, administrators: readonly string[]) => Promise<boolean>,
): Promise<boolean> {
  if (!can(viewer, 'make somebody an administrator') || !isId(personId)) return false;
  return transact(async (transaction) => {
    const held = await rows<{ id: string }>(
      `select id from people
       where is_administrator and disabled_at is null and erased_at is null order by id for update`,
      [],
      transaction,
    );
    const administrators = held.map(({ id }) => id);
    if (!administrators.includes(viewer.personId)) return false;
    if (!(await hasGivenPassword(viewer, now, transaction))) return false;
    return work(transaction, administrators);
  });
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

/** Makes the link and the letter that brings it. */
async function createPasswordLinkFor(
  viewer: Viewer,
  { personId, to }: { readonly personId: string; readonly to: string },
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const target = { purpose: 'set-password', personId } as const;
  const linkId = await createLink(target, viewer.personId, now, transaction);
  await queueLetter(transaction, { to, personId, letter: { kind: 'set-password', linkId } });
  return linkAddress('set-password', linkId);
}
