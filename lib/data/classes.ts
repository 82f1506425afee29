import 'server-only';
import { UniqueConstraintError } from 'sequelize';
import { isTimeZone, now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Role, Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from './audit';
import { isId, staffOfClass, staffValues } from './class-right';
import { sessionLimits } from './entry/sessions';

/** A class in a list. */
export interface ClassListed {
  readonly classId: string;
  readonly name: string;
  /** What the viewer is in it; null for an administrator who is not in it. */
  readonly role: Role | null;
  readonly instructors: readonly string[];
  readonly learners: number;
}

/** Somebody who is in a class. */
export interface Member {
  readonly personId: string;
  readonly learnerId: string;
  readonly name: string;
  readonly email: string | null;
  readonly role: Role;
  readonly joinedAt: string;
}

/** A class with who is in it, for its instructors and the administrator. */
export interface ClassFound {
  readonly classId: string;
  readonly name: string;
  readonly timeZone: string;
  readonly startsOn: string | null;
  readonly endsOn: string | null;
  readonly members: readonly Member[];
}

/** A class to be made. */
export interface NewClass {
  readonly name: string;
  readonly timeZone?: string;
  readonly startsOn?: string | null;
  readonly endsOn?: string | null;
}

/** The classes that the viewer is in, and for an administrator all of them. */
export function listClasses(viewer: Viewer): Promise<ClassListed[]> {
  return rows<ClassListed>(
    `select g.id as "classId", g.name, mine.role,
       coalesce((
         select json_agg(p.name order by p.name) from memberships m
         join people p on p.id = m.person_id
         where m.class_id = g.id and m.role = 'instructor' and m.left_at is null), '[]')
         as instructors,
       (select count(*)::int from memberships m
         where m.class_id = g.id and m.role = 'learner' and m.left_at is null) as learners
     from class_groups g
     left join memberships mine
       on mine.class_id = g.id and mine.person_id = $1 and mine.left_at is null
     where g.archived_at is null and ($2::boolean or mine.id is not null)
     order by g.name, g.id`,
    [viewer.personId, viewer.isAdministrator],
  );
}

/** A class with who is in it; null for anybody but its instructors and the administrator. */
export async function findClass(viewer: Viewer, classId: string): Promise<ClassFound | null> {
  if (!isId(classId)) return null;
  return row<ClassFound>(
    `select g.id as "classId", g.name, g.time_zone as "timeZone",
       g.starts_on::text as "startsOn", g.ends_on::text as "endsOn",
       coalesce((
         select json_agg(json_build_object('personId', p.id, 'learnerId', l.id, 'name', p.name,
             'email', p.email, 'role', m.role, 'joinedAt', m.joined_at)
           order by m.role, p.name, p.id)
         from memberships m join people p on p.id = m.person_id
         join learners l on l.person_id = p.id
         where m.class_id = g.id and m.left_at is null), '[]') as members
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
    const made = await models().ClassGroup.create(
      { name: name.trim(), timeZone, startsOn, endsOn },
      { transaction },
    );
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'class created',
        objectKind: 'class',
        objectId: made.id,
        classId: made.id,
      },
      transaction,
    );
    return made.id;
  });
}

/** What adding somebody to a class comes to. */
export type MemberAdded = 'added' | 'already there' | 'no such person' | 'not allowed';

/** Adds the person with this address to a class. */
export async function addMember(
  viewer: Viewer,
  classId: string,
  { email, role }: { readonly email: string; readonly role: Role },
  now: Date = presentTime(),
): Promise<MemberAdded> {
  if (!can(viewer, 'change who is in a class', classId) || !isId(classId)) return 'not allowed';
  try {
    return await transact(async (transaction) => {
      const added = await row<{ personId: string }>(
        `insert into memberships (class_id, person_id, role, joined_at)
         select g.id, p.id, $3, $4 from class_groups g, people p
         where g.id = $1 and g.archived_at is null and p.email = $2 and p.disabled_at is null
         returning person_id as "personId"`,
        [classId, email.trim().toLowerCase(), role, now],
        transaction,
      );
      if (added === null) return 'no such person';
      if (role === 'instructor') {
        // Who teaches signs in for hours, not for weeks: longer sign-ins are cut down.
        await rows(
          `update sessions set idle_minutes = least(idle_minutes, $2),
             expires_at = greatest(least(expires_at, created_at + make_interval(hours => $3)),
               created_at + interval '1 second')
           where person_id = $1 and ended_at is null returning id`,
          [added.personId, sessionLimits.staff.idleMinutes, sessionLimits.staff.hours],
          transaction,
        );
      }
      await recordAudit(
        {
          actorId: viewer.personId,
          action: 'member added',
          objectKind: 'person',
          objectId: added.personId,
          classId,
          detail: { role },
        },
        transaction,
      );
      return 'added';
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) return 'already there';
    throw error;
  }
}

/** Takes somebody out of a class; what they did stays theirs. False when that cannot be done. */
export async function removeMember(
  viewer: Viewer,
  classId: string,
  personId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!can(viewer, 'change who is in a class', classId) || !isId(classId) || !isId(personId)) {
    return false;
  }
  return transact(async (transaction) => {
    const left = await row(
      `update memberships set left_at = greatest($3, joined_at)
       where class_id = $1 and person_id = $2 and left_at is null returning id`,
      [classId, personId, now],
      transaction,
    );
    if (left === null) return false;
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'member removed',
        objectKind: 'person',
        objectId: personId,
        classId,
      },
      transaction,
    );
    return true;
  });
}
