import 'server-only';
import { isTimeZone } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Role, Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit, type AuditedAction } from './audit';
import { isId, staffOfClass, staffOfOpenClass, staffValues } from './class-right';

/** A class in a list. */
export interface ClassListed {
  readonly classId: string;
  readonly name: string;
  /** What the viewer is in it; null for an administrator who is not in it. */
  readonly role: Role | null;
  readonly instructors: readonly string[];
  readonly learners: number;
  /** Put away: it can be read, and nothing in it changes. */
  readonly archived: boolean;
}

/** A class as its instructors and the administrator see it. */
export interface ClassFound {
  readonly classId: string;
  readonly name: string;
  readonly timeZone: string;
  readonly startsOn: string | null;
  readonly endsOn: string | null;
  readonly archived: boolean;
  readonly instructors: readonly string[];
  readonly learners: number;
  /** The word by which anybody may join while joining is open; null before the first is made. */
  readonly joiningWord: string | null;
  readonly joiningOpen: boolean;
}

/** What is said of a class. */
export interface ClassFacts {
  readonly name: string;
  readonly timeZone: string;
  readonly startsOn: string | null;
  readonly endsOn: string | null;
}

/** A class to be made; what is left out is taken from its maker, or stays open. */
export type NewClass = Pick<ClassFacts, 'name'> & Partial<ClassFacts>;

/**
 * The classes that the viewer is in, and for an administrator all of them; those put away come last,
 * and only to their staff.
 */
export function listClasses(viewer: Viewer): Promise<ClassListed[]> {
  return rows<ClassListed>(
    `select g.id as "classId", g.name, mine.role, ${instructorsOf} as instructors,
       ${learnersOf} as learners, g.archived_at is not null as archived
     from class_groups g
     left join memberships mine
       on mine.class_id = g.id and mine.person_id = $1 and mine.left_at is null
     where ($2::boolean or mine.id is not null)
       and (g.archived_at is null or $2::boolean or mine.role = 'instructor')
     order by g.archived_at is not null, g.name, g.id`,
    [viewer.personId, viewer.isAdministrator],
  );
}

/** A class; null for anybody but its instructors and the administrator. */
export async function findClass(viewer: Viewer, classId: string): Promise<ClassFound | null> {
  if (!isId(classId)) return null;
  return row<ClassFound>(
    `select g.id as "classId", g.name, g.time_zone as "timeZone",
       g.starts_on::text as "startsOn", g.ends_on::text as "endsOn",
       g.archived_at is not null as archived, ${instructorsOf} as instructors,
       ${learnersOf} as learners, g.joining_word as "joiningWord",
       g.joining_open as "joiningOpen"
     from class_groups g where ${staffOfClass}`,
    staffValues(viewer, classId),
  );
}

/** Makes a class; null when the viewer may not. Throws `RangeError` for an unknown time zone. */
export async function createClass(
  viewer: Viewer,
  { name, timeZone = viewer.timeZone, startsOn = null, endsOn = null }: NewClass,
): Promise<string | null> {
  if (!can(viewer, 'make a class')) return null;
  if (!isTimeZone(timeZone)) throw new RangeError(`createClass: ${timeZone} is not a time zone`);
  return transact(async (transaction) => {
    const { id } = await models().ClassGroup.create(
      { name: name.trim(), timeZone, startsOn, endsOn },
      { transaction },
    );
    await recordAudit(aboutClass(viewer, id, 'class created'), transaction);
    return id;
  });
}

/**
 * Says anew what a class is called, where its clock hangs and when it meets. Due moments stay what
 * they are when the time zone changes. False when that cannot be done. Throws `RangeError` for an
 * unknown time zone.
 */
export async function updateClass(
  viewer: Viewer,
  classId: string,
  { name, timeZone, startsOn, endsOn }: ClassFacts,
): Promise<boolean> {
  if (!isTimeZone(timeZone)) throw new RangeError(`updateClass: ${timeZone} is not a time zone`);
  return changeClass(
    viewer,
    classId,
    'class changed',
    `name = $4, time_zone = $5, starts_on = $6, ends_on = $7`,
    [name.trim(), timeZone, startsOn, endsOn],
  );
}

/** Puts a class away: it can be read, and nothing in it changes. False when that cannot be done. */
export async function archiveClass(viewer: Viewer, classId: string): Promise<boolean> {
  return changeClass(
    viewer,
    classId,
    'class archived',
    'archived_at = now(), joining_open = false',
    [],
  );
}

/** Takes a class that was put away back into use. False when that cannot be done. */
export async function reopenClass(viewer: Viewer, classId: string): Promise<boolean> {
  const putAway = `${staffOfClass} and g.archived_at is not null`;
  return changeClass(viewer, classId, 'class reopened', 'archived_at = null', [], putAway);
}

/** Changes one class under the right in `where`, and notes it; `$4` and on are the values. */
async function changeClass(
  viewer: Viewer,
  classId: string,
  action: AuditedAction,
  changes: string,
  values: readonly unknown[],
  where = staffOfOpenClass,
): Promise<boolean> {
  if (!isId(classId)) return false;
  return transact(async (transaction) => {
    const changed = await row(
      `update class_groups g set ${changes}, version = g.version + 1, updated_at = now()
       where ${where} returning g.id`,
      [...staffValues(viewer, classId), ...values],
      transaction,
    );
    if (changed === null) return false;
    await recordAudit(aboutClass(viewer, classId, action), transaction);
    return true;
  });
}

function aboutClass(viewer: Viewer, classId: string, action: AuditedAction) {
  return {
    actorId: viewer.personId,
    action,
    objectKind: 'class',
    objectId: classId,
    classId,
  } as const;
}

const instructorsOf = `
  coalesce((
    select json_agg(p.name order by p.name) from memberships m
    join people p on p.id = m.person_id
    where m.class_id = g.id and m.role = 'instructor' and m.left_at is null), '[]')`;

const learnersOf = `
  (select count(*)::int from memberships m
    where m.class_id = g.id and m.role = 'learner' and m.left_at is null)`;
