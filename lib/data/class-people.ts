import 'server-only';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Role, Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isId, staffOfClass, staffOfOpenClass, staffValues } from './class-right';

/** Somebody who is in a class, or was. */
export interface Member {
  readonly personId: string;
  readonly learnerId: string;
  readonly name: string;
  readonly email: string | null;
  readonly role: Role;
  readonly joinedAt: string;
  /** When they left; null while they are in it. */
  readonly leftAt: string | null;
}

/**
 * Who is in a class and who has left it, instructors first; null for anybody but its instructors and
 * the administrator. Somebody who left and came back is in it.
 */
export async function findClassPeople(viewer: Viewer, classId: string): Promise<Member[] | null> {
  if (!isId(classId)) return null;
  const found = await row<{ members: readonly Member[] }>(
    `select coalesce((
       select json_agg(json_build_object('personId', p.id, 'learnerId', l.id, 'name', p.name,
           'email', p.email, 'role', m.role, 'joinedAt', m.joined_at, 'leftAt', m.left_at)
         order by m.left_at desc nulls first, m.role, p.name, p.id)
       from (
         select distinct on (person_id) * from memberships
         where class_id = g.id order by person_id, left_at desc nulls first) m
       join people p on p.id = m.person_id
       join learners l on l.person_id = p.id), '[]') as members
     from class_groups g where ${staffOfClass}`,
    staffValues(viewer, classId),
  );
  return found === null ? null : found.members.map(asMember);
}

function asMember({ joinedAt, leftAt, ...rest }: Member): Member {
  const moment = (said: string) => new Date(said).toISOString();
  return { ...rest, joinedAt: moment(joinedAt), leftAt: leftAt === null ? null : moment(leftAt) };
}

/** What adding somebody to a class comes to. */
export type MemberAdded = 'added' | 'already there' | 'no such person' | 'not allowed';

/**
 * Puts the person with this address into a class, by the administrator; instructors invite, so that
 * nobody learns by trying whose address has an account.
 */
export async function addMember(
  viewer: Viewer,
  classId: string,
  { email, role }: { readonly email: string; readonly role: Role },
  now: Date = presentTime(),
): Promise<MemberAdded> {
  if (!can(viewer, 'change who is in a class', classId)) return 'not allowed';
  try {
    return await transact(async (transaction) => {
      if (!(await lockClass(viewer, classId, transaction))) return 'not allowed';
      const added = await row<{ personId: string }>(
        `insert into memberships (class_id, person_id, role, joined_at)
         select $1, p.id, $2, $3 from people p where p.email = $4 and p.disabled_at is null
         returning person_id as "personId"`,
        [classId, role, now, email.trim().toLowerCase()],
        transaction,
      );
      if (added === null) return 'no such person';
      await noteMember(viewer, classId, added.personId, 'member added', transaction, { role });
      return 'added';
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) return 'already there';
    throw error;
  }
}

/** What taking somebody out of a class comes to. */
export type MemberRemoved = 'removed' | 'last instructor' | 'not allowed';

/**
 * Takes somebody out of a class, by one of its instructors or the administrator; what they did stays
 * theirs. The last instructor goes only when that is said expressly: nobody would teach it then.
 */
export async function removeMember(
  viewer: Viewer,
  classId: string,
  personId: string,
  { evenTheLast = false, now = presentTime() }: { evenTheLast?: boolean; now?: Date } = {},
): Promise<MemberRemoved> {
  if (!isId(personId)) return 'not allowed';
  return transact(async (transaction) => {
    if (!(await lockClass(viewer, classId, transaction))) return 'not allowed';
    const instructors = await rows<{ personId: string }>(
      `select person_id as "personId" from memberships
       where class_id = $1 and role = 'instructor' and left_at is null`,
      [classId],
      transaction,
    );
    const last = instructors.length === 1 && instructors[0]?.personId === personId;
    if (last && !evenTheLast) return 'last instructor';
    const left = await row(
      `update memberships set left_at = greatest($3, joined_at)
       where class_id = $1 and person_id = $2 and left_at is null returning id`,
      [classId, personId, now],
      transaction,
    );
    if (left === null) return 'not allowed';
    await noteMember(viewer, classId, personId, 'member removed', transaction);
    return 'removed';
  });
}

/**
 * The right to change who is in an open class, and the class held until the end of the transaction:
 * two instructors cannot take each other out at once.
 */
async function lockClass(
  viewer: Viewer,
  classId: string,
  transaction: Transaction,
): Promise<boolean> {
  if (!isId(classId)) return false;
  const held = await row(
    `select g.id from class_groups g where ${staffOfOpenClass} for no key update`,
    staffValues(viewer, classId),
    transaction,
  );
  return held !== null;
}

async function noteMember(
  viewer: Viewer,
  classId: string,
  personId: string,
  action: 'member added' | 'member removed',
  transaction: Transaction,
  detail?: { readonly role: Role },
): Promise<void> {
  await recordAudit(
    {
      actorId: viewer.personId,
      action,
      objectKind: 'person',
      objectId: personId,
      classId,
      detail,
    },
    transaction,
  );
}
