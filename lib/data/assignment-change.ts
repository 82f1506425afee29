import 'server-only';
import { ForeignKeyConstraintError, type Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { itemsOf, type Item } from './assignment-items';
import { queueAssignmentLetters } from './assignment-letters';
import { findAssignment, type AssignmentFound } from './assignment-list';
import {
  aboutWork,
  learnersInClass,
  opening,
  rulesOf,
  writeItems,
  writeLearners,
  type AssignmentFault,
  type NewAssignment,
} from './assignments';
import { recordAudit } from './audit';
import { staffOfOpenClass, staffValues } from './class-right';
import { classMomentOr } from './class-time';
import { exerciseTitle } from './lesson-titles';

/** What changing work that is set comes to. */
export type AssignmentChanged =
  | { readonly outcome: 'changed'; readonly dueAt: string }
  /** Somebody else has changed it since it was looked at: how it stands now. */
  | { readonly outcome: 'changed meanwhile'; readonly current: AssignmentFound }
  /** Exercises that were left out have answers; withdrawing the whole keeps them. */
  | { readonly outcome: 'has answers'; readonly titles: readonly string[] }
  | { readonly outcome: AssignmentFault | 'no such work' };

/**
 * Changes work that is set, seen at `version`, by one of the class's instructors or the
 * administrator. What has counted goes on counting, whatever the new limit: the rules hold for the
 * attempts that come. Throws `RangeError` for a malformed day or time.
 */
export async function updateAssignment(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  version: number,
  wanted: NewAssignment,
  now: Date = presentTime(),
): Promise<AssignmentChanged> {
  const current = await findAssignment(viewer, classId, assignmentId);
  if (current === null || current.withdrawn) return { outcome: 'no such work' };
  const items = itemsOf(wanted);
  if (items.length === 0) return { outcome: 'nothing chosen' };
  try {
    const result = await transact((transaction) =>
      change(viewer, classId, { assignmentId, version, items }, wanted, now, transaction),
    );
    if (result.outcome !== 'changed meanwhile') return result;
    return { ...result, current: (await findAssignment(viewer, classId, assignmentId)) ?? current };
  } catch (error) {
    // An answer came for an exercise while it was being left out.
    if (error instanceof ForeignKeyConstraintError) return { outcome: 'has answers', titles: [] };
    throw error;
  }
}

interface Wanted {
  readonly assignmentId: string;
  readonly version: number;
  readonly items: readonly Item[];
}

type Tried =
  | Exclude<AssignmentChanged, { outcome: 'changed meanwhile' }>
  | { readonly outcome: 'changed meanwhile' };

async function change(
  viewer: Viewer,
  classId: string,
  { assignmentId, version, items }: Wanted,
  wanted: NewAssignment,
  now: Date,
  transaction: Transaction,
): Promise<Tried> {
  const held = await row<HeldRow>(
    heldSql,
    [...staffValues(viewer, classId), assignmentId],
    transaction,
  );
  if (held === null) return { outcome: 'no such work' };
  if (held.version !== version) return { outcome: 'changed meanwhile' };
  const moments = momentsOf(held, wanted, now);
  if ('outcome' in moments) return moments;
  const chosen = await learnersInClass(classId, wanted.learners ?? null, transaction);
  if (chosen?.length === 0) return { outcome: 'nobody chosen' };
  const answered = await leaveOut(assignmentId, items, transaction);
  if (answered.length > 0) return { outcome: 'has answers', titles: answered.map(exerciseTitle) };
  await models().Assignment.update(
    {
      ...rulesOf(wanted),
      ...moments,
      forChosenLearners: chosen !== null,
      version: version + 1,
      updatedAt: now,
    },
    { where: { id: assignmentId }, transaction },
  );
  await writeItems(assignmentId, [...items], transaction);
  await rows(
    'delete from assignment_learners where assignment_id = $1 returning learner_id',
    [assignmentId],
    transaction,
  );
  await writeLearners(assignmentId, chosen ?? [], transaction);
  await recordAudit(aboutWork(viewer, classId, assignmentId, 'work changed'), transaction);
  if (wanted.tell !== false) await queueAssignmentLetters(transaction, assignmentId);
  return { outcome: 'changed', dueAt: moments.dueAt.toISOString() };
}

/** A due moment that has passed may stay; it cannot be moved to another that has. */
function momentsOf(
  held: HeldRow,
  wanted: NewAssignment,
  now: Date,
): { opensAt: Date; dueAt: Date } | { outcome: AssignmentFault } {
  const said = { on: wanted.dueOn, time: wanted.dueTime ?? '' };
  const dueAt = classMomentOr(held.dueAt, held.timeZone, said);
  const opensAt = opening(held.timeZone, wanted, now, held.opensAt);
  if (dueAt <= opensAt) return { outcome: 'due before it opens' };
  const moved = dueAt.getTime() !== held.dueAt.getTime();
  return moved && dueAt <= now ? { outcome: 'due in the past' } : { opensAt, dueAt };
}

/** Takes out what is not wanted any more; answers the exercises that have answers and so stay. */
async function leaveOut(
  assignmentId: string,
  items: readonly Item[],
  transaction: Transaction,
): Promise<string[]> {
  const kept = items.map(({ exerciseId }) => exerciseId);
  const answered = await rows<{ exerciseId: string }>(
    `select i.exercise_id as "exerciseId" from assignment_items i
     where i.assignment_id = $1 and i.exercise_id <> all($2::text[]) and exists (
       select 1 from counted_attempts c where c.item_id = i.id)
     order by i.position`,
    [assignmentId, kept],
    transaction,
  );
  if (answered.length === 0) {
    await rows(
      `delete from assignment_items where assignment_id = $1 and exercise_id <> all($2::text[])
       returning id`,
      [assignmentId, kept],
      transaction,
    );
  }
  return answered.map(({ exerciseId }) => exerciseId);
}

interface HeldRow {
  readonly version: number;
  readonly timeZone: string;
  readonly opensAt: Date;
  readonly dueAt: Date;
}

/** The work, held until the end of the transaction: of two who save at once one comes second. */
const heldSql = `
  select a.version, g.time_zone as "timeZone", a.opens_at as "opensAt", a.due_at as "dueAt"
  from class_groups g
  join assignments a on a.class_id = g.id and a.id = $4 and a.withdrawn_at is null
  where ${staffOfOpenClass} for update of a`;
