import 'server-only';
import { exercises, lessons } from '@/content/exercises/registry';
import { momentIn, now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from './audit';
import { isId, staffOfClass, staffValues } from './class-right';
import { exerciseTitle, lessonName } from './lesson-titles';

/** Work to be set to a class. */
export interface NewAssignment {
  /** Lessons, each of which is set as all of its exercises. */
  readonly lessons: readonly string[];
  /** Single exercises beside them. */
  readonly exercises: readonly string[];
  /** The date by which it is due, in the class's time zone. */
  readonly dueOn: string;
  /** The time on that date; the last minute of it unless said otherwise. */
  readonly dueTime?: string;
  readonly note?: string;
}

/** What setting work comes to. */
export type AssignmentCreated =
  | { readonly outcome: 'set'; readonly assignmentId: string }
  | { readonly outcome: 'nothing chosen' }
  | { readonly outcome: 'due in the past' }
  | { readonly outcome: 'no such class' };

/** Work that is set to a class. */
export interface AssignmentListed {
  readonly assignmentId: string;
  readonly dueAt: string;
  readonly note: string;
  readonly setBy: string;
  readonly lessons: readonly { readonly lessonId: string; readonly title: string }[];
  /** Exercises set by themselves, not as part of a lesson. */
  readonly exercises: readonly { readonly exerciseId: string; readonly title: string }[];
  /** How many learners have a right counted attempt at every exercise of it, of how many. */
  readonly done: number;
  readonly learners: number;
}

/**
 * Sets lessons and exercises to a class, by one of its instructors or the administrator. What is
 * not there, or is named twice, is left out. Throws `RangeError` for a malformed date.
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
      `select g.time_zone as "timeZone" from class_groups g
       where ${staffOfClass} and g.archived_at is null`,
      staffValues(viewer, classId),
      transaction,
    );
    if (found === null) return { outcome: 'no such class' } as const;
    const dueAt = dueMoment(found.timeZone, wanted);
    if (dueAt <= now) return { outcome: 'due in the past' } as const;
    const { Assignment, AssignmentItem } = models();
    const made = await Assignment.create(
      {
        classId,
        note: wanted.note?.trim() ?? '',
        opensAt: now,
        dueAt,
        setBy: viewer.personId,
        createdAt: now,
      },
      { transaction },
    );
    await AssignmentItem.bulkCreate(
      items.map((item, position) => ({ ...item, position, assignmentId: made.id })),
      { transaction },
    );
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'work set',
        objectKind: 'assignment',
        objectId: made.id,
        classId,
      },
      transaction,
    );
    return { outcome: 'set', assignmentId: made.id } as const;
  });
}

/** What is set to a class, the next due first; nothing for anybody but its staff. */
export async function listAssignments(
  viewer: Viewer,
  classId: string,
): Promise<AssignmentListed[]> {
  if (!isId(classId)) return [];
  const found = await rows<AssignmentRow>(listSql, staffValues(viewer, classId));
  return found.map(({ items, dueAt, ...rest }) => ({
    ...rest,
    dueAt: dueAt.toISOString(),
    lessons: [...new Set(items.flatMap(({ lessonId }) => lessonId ?? []))].map((lessonId) => ({
      lessonId,
      title: lessonName(lessonId).title,
    })),
    exercises: items.flatMap(({ lessonId, exerciseId }) =>
      lessonId === null ? [{ exerciseId, title: exerciseTitle(exerciseId) }] : [],
    ),
  }));
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
       where a.id = $4 and a.class_id = g.id and a.withdrawn_at is null and ${staffOfClass}
       returning a.id`,
      [...staffValues(viewer, classId), assignmentId, now],
      transaction,
    );
    if (withdrawn === null) return false;
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'work withdrawn',
        objectKind: 'assignment',
        objectId: assignmentId,
        classId,
      },
      transaction,
    );
    return true;
  });
}

interface Item {
  readonly lessonId: string | null;
  readonly exerciseId: string;
}

function itemsOf(wanted: NewAssignment): Item[] {
  const byLesson = wanted.lessons.flatMap((lessonId) =>
    (lessons.find(({ id }) => id === lessonId)?.exercises ?? []).map((exerciseId) => ({
      lessonId,
      exerciseId,
    })),
  );
  const alone = wanted.exercises.map((exerciseId) => ({ lessonId: null, exerciseId }));
  const once = new Map<string, Item>();
  for (const item of [...byLesson, ...alone]) {
    const definition = exercises.get(item.exerciseId);
    const settable = definition !== undefined && definition.kind !== 'prediction';
    if (settable && !once.has(item.exerciseId)) once.set(item.exerciseId, item);
  }
  return [...once.values()];
}

/** The end of the day, when no time is given, is the first moment that is no longer in it. */
function dueMoment(timeZone: string, { dueOn, dueTime }: NewAssignment): Date {
  return dueTime === undefined
    ? new Date(momentIn(timeZone, dueOn, '23:59').getTime() + 60_000)
    : momentIn(timeZone, dueOn, dueTime);
}

interface AssignmentRow extends Omit<AssignmentListed, 'dueAt' | 'lessons' | 'exercises'> {
  readonly dueAt: Date;
  readonly items: readonly Item[];
}

const listSql = `
  select a.id as "assignmentId", a.due_at as "dueAt", a.note, setter.name as "setBy",
    (select json_agg(json_build_object('lessonId', i.lesson_id, 'exerciseId', i.exercise_id)
      order by i.position) from assignment_items i where i.assignment_id = a.id) as items,
    (select count(*)::int from memberships m
      where m.class_id = g.id and m.role = 'learner' and m.left_at is null) as learners,
    (select count(*)::int from memberships m join learners l on l.person_id = m.person_id
      where m.class_id = g.id and m.role = 'learner' and m.left_at is null
        and not exists (
          select 1 from assignment_items i where i.assignment_id = a.id and not exists (
            select 1 from counted_attempts c join attempts t on t.id = c.attempt_id
            where c.item_id = i.id and c.learner_id = l.id and t.verdict = 'right'))) as done
  from class_groups g
  join assignments a on a.class_id = g.id and a.withdrawn_at is null
  join people setter on setter.id = a.set_by
  where ${staffOfClass}
  order by a.due_at, a.id`;
