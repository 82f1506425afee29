import 'server-only';
import type { Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { queueAssignmentLetters } from './assignment-letters';
import { itemsOf, type Chosen } from './assignment-items';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { classMoment, openingMoment } from './class-time';

/** Work to be set to a class. Days and times are those of the clock of the class. */
export interface NewAssignment extends Chosen {
  /** To whom of the class, by their learner's key; to everybody when left out or null. */
  readonly learners?: readonly string[] | null;
  /** From when on; at once when left out or empty. */
  readonly opensOn?: string;
  readonly opensTime?: string;
  readonly dueOn: string;
  /** The end of the day unless said otherwise. */
  readonly dueTime?: string;
  /** How many attempts count for each exercise; any number when left out or null. */
  readonly attemptsAllowed?: number | null;
  /** Which attempt stands for the exercise. */
  readonly counting?: 'best' | 'latest';
  /** Whether what comes late counts and is marked late, or does not count. */
  readonly lateWork?: 'marked' | 'closed';
  readonly note?: string;
  /** Whether everybody concerned is written to; they are unless said otherwise. */
  readonly tell?: boolean;
}

/** What setting work comes to. */
export type AssignmentCreated =
  | { readonly outcome: 'set'; readonly assignmentId: string; readonly dueAt: string }
  | { readonly outcome: AssignmentFault | 'no such class' };

/** What is wrong with the rules of an assignment. */
export type AssignmentFault =
  'nothing chosen' | 'nobody chosen' | 'due in the past' | 'due before it opens';

/**
 * Sets lessons and exercises to a class or to some of its learners, by one of its instructors or the
 * administrator. What is not there, or is named twice, is left out. Throws `RangeError` for a
 * malformed day or time.
 */
export async function createAssignment(
  viewer: Viewer,
  classId: string,
  wanted: NewAssignment,
  now: Date = presentTime(),
): Promise<AssignmentCreated> {
  if (!isId(classId)) return { outcome: 'no such class' };
  const items = itemsOf(wanted);
  if (items.length === 0) return { outcome: 'nothing chosen' };
  return transact(async (transaction) => {
    const found = await row<{ timeZone: string }>(
      `select g.time_zone as "timeZone" from class_groups g where ${staffOfOpenClass} for share`,
      staffValues(viewer, classId),
      transaction,
    );
    if (found === null) return { outcome: 'no such class' } as const;
    const opensAt = opening(found.timeZone, wanted, now);
    const dueAt = classMoment(found.timeZone, { on: wanted.dueOn, time: wanted.dueTime ?? '' });
    if (dueAt <= now) return { outcome: 'due in the past' } as const;
    if (dueAt <= opensAt) return { outcome: 'due before it opens' } as const;
    const chosen = await learnersInClass(classId, wanted.learners ?? null, transaction);
    if (chosen?.length === 0) return { outcome: 'nobody chosen' } as const;
    const made = await models().Assignment.create(
      {
        ...rulesOf(wanted),
        classId,
        forChosenLearners: chosen !== null,
        opensAt,
        dueAt,
        setBy: viewer.personId,
        createdAt: now,
      },
      { transaction },
    );
    await writeItems(made.id, items, transaction);
    await writeLearners(made.id, chosen ?? [], transaction);
    await recordAudit(aboutWork(viewer, classId, made.id, 'work set'), transaction);
    if (wanted.tell !== false) await queueAssignmentLetters(transaction, made.id);
    return { outcome: 'set', assignmentId: made.id, dueAt: dueAt.toISOString() } as const;
  });
}

/** Takes back what was set; what was done for it is kept. False when that cannot be done. */
export async function withdrawAssignment(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!isId(classId) || !isId(assignmentId)) return false;
  return transact(async (transaction) => {
    const withdrawn = await row(
      `update assignments a set withdrawn_at = $5, updated_at = $5, version = a.version + 1
       from class_groups g
       where a.id = $4 and a.class_id = g.id and a.withdrawn_at is null and ${staffOfOpenClass}
       returning a.id`,
      [...staffValues(viewer, classId), assignmentId, now],
      transaction,
    );
    if (withdrawn === null) return false;
    await recordAudit(aboutWork(viewer, classId, assignmentId, 'work withdrawn'), transaction);
    return true;
  });
}

/** The moment from which on it is open; one that is there already stays when it reads the same. */
export function opening(timeZone: string, wanted: NewAssignment, now: Date, kept?: Date): Date {
  if (!wanted.opensOn) return kept !== undefined && kept < now ? kept : now;
  return openingMoment(timeZone, { on: wanted.opensOn, time: wanted.opensTime ?? '' }, kept);
}

/** The rules that are kept as they are said. */
export function rulesOf({ note, attemptsAllowed, counting, lateWork }: NewAssignment) {
  return {
    note: note?.trim() ?? '',
    attemptsAllowed: attemptsAllowed ?? null,
    counting: counting ?? 'best',
    lateWork: lateWork ?? 'marked',
  } as const;
}

/** Those of the chosen who learn in the class now; null when it is for everybody. */
export async function learnersInClass(
  classId: string,
  wanted: readonly string[] | null,
  transaction: Transaction,
): Promise<string[] | null> {
  if (wanted === null) return null;
  const found = await rows<{ learnerId: string }>(
    `select l.id as "learnerId" from memberships m join learners l on l.person_id = m.person_id
     where m.class_id = $1 and m.role = 'learner' and m.left_at is null and l.id = any($2::uuid[])`,
    [classId, wanted.filter(isId)],
    transaction,
  );
  return found.map(({ learnerId }) => learnerId);
}

/** Writes the exercises of an assignment that are not in it yet, and the order of all of them. */
export async function writeItems(
  assignmentId: string,
  items: ReturnType<typeof itemsOf>,
  transaction: Transaction,
): Promise<void> {
  await rows(
    `insert into assignment_items (assignment_id, position, lesson_id, exercise_id)
     select $1, i.position, i.lesson_id, i.exercise_id
     from jsonb_to_recordset($2::jsonb) i (position int, lesson_id text, exercise_id text)
     on conflict (assignment_id, exercise_id)
       do update set position = excluded.position, lesson_id = excluded.lesson_id
     returning id`,
    [
      assignmentId,
      JSON.stringify(
        items.map(({ lessonId, exerciseId }, position) => ({
          position,
          lesson_id: lessonId,
          exercise_id: exerciseId,
        })),
      ),
    ],
    transaction,
  );
}

/** Writes for whom an assignment is, when it is not for everybody. */
export async function writeLearners(
  assignmentId: string,
  learners: readonly string[],
  transaction: Transaction,
): Promise<void> {
  await rows(
    `insert into assignment_learners (assignment_id, learner_id)
     select $1, unnest($2::uuid[]) on conflict do nothing returning learner_id`,
    [assignmentId, [...learners]],
    transaction,
  );
}

/** A line of the audit log about work that is set. */
export function aboutWork(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  action: 'work set' | 'work changed' | 'work withdrawn',
) {
  return {
    actorId: viewer.personId,
    action,
    objectKind: 'assignment',
    objectId: assignmentId,
    classId,
  } as const;
}
