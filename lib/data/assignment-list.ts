import 'server-only';
import { row, rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { chosenOf, itemsSql, type Chosen, type Item } from './assignment-items';
import { isId, staffOfClass, staffValues } from './class-right';
import { workTitles } from './lesson-titles';

/** The rules of work that is set. */
export interface AssignmentRules {
  readonly opensAt: string;
  readonly dueAt: string;
  readonly attemptsAllowed: number | null;
  readonly counting: 'best' | 'latest';
  readonly lateWork: 'marked' | 'closed';
  readonly note: string;
}

/** Work that is set to a class. */
export interface AssignmentListed extends AssignmentRules {
  readonly assignmentId: string;
  readonly setBy: string;
  readonly withdrawn: boolean;
  /** The titles of its lessons and of the exercises set by themselves. */
  readonly titles: readonly string[];
  readonly exercises: number;
  /** Whether it is for some of the class only. */
  readonly forChosen: boolean;
  readonly extensions: number;
  /** How many learners have a right counted attempt at every exercise of it, of how many. */
  readonly done: number;
  readonly learners: number;
}

/** More time for one learner. */
export interface Extension {
  readonly learnerId: string;
  readonly name: string;
  readonly dueAt: string;
  readonly givenBy: string;
}

/** Work that is set, with everything that can be said of it. */
export interface AssignmentFound extends AssignmentRules {
  readonly assignmentId: string;
  /** Counts the changes: who saves says which one they saw. */
  readonly version: number;
  readonly withdrawn: boolean;
  readonly setBy: string;
  readonly titles: readonly string[];
  readonly chosen: Chosen;
  /** For whom it is, when it is not for everybody. */
  readonly learners: readonly string[] | null;
  /** Attempts that count for it. */
  readonly answers: number;
  readonly extensions: readonly Extension[];
  /** Who learns in the class now. */
  readonly inClass: readonly { readonly learnerId: string; readonly name: string }[];
}

/**
 * What is set to a class, the next due first and what was taken back last; nothing for anybody but
 * its staff.
 */
export async function listAssignments(
  viewer: Viewer,
  classId: string,
): Promise<AssignmentListed[]> {
  if (!isId(classId)) return [];
  const found = await rows<ListRow>(listSql, staffValues(viewer, classId));
  return found.map(({ items, opensAt, dueAt, ...rest }) => ({
    ...rest,
    opensAt: opensAt.toISOString(),
    dueAt: dueAt.toISOString(),
    titles: workTitles(items),
    exercises: items.length,
  }));
}

/** Work that is set to a class, for its staff; null for anybody else, or when it is not there. */
export async function findAssignment(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
): Promise<AssignmentFound | null> {
  if (!isId(classId) || !isId(assignmentId)) return null;
  const found = await row<FoundRow>(findSql, [...staffValues(viewer, classId), assignmentId]);
  if (found === null) return null;
  const { items, opensAt, dueAt, extensions, ...rest } = found;
  return {
    ...rest,
    opensAt: opensAt.toISOString(),
    dueAt: dueAt.toISOString(),
    titles: workTitles(items),
    chosen: chosenOf(items),
    extensions: extensions.map((one) => ({ ...one, dueAt: new Date(one.dueAt).toISOString() })),
  };
}

type Dated<Row extends AssignmentRules> = Omit<Row, 'opensAt' | 'dueAt' | 'titles'> & {
  readonly opensAt: Date;
  readonly dueAt: Date;
  readonly items: readonly Item[];
};
type ListRow = Omit<Dated<AssignmentListed>, 'exercises'>;
type FoundRow = Omit<Dated<AssignmentFound>, 'chosen'>;

const rules = `
  a.id as "assignmentId", a.opens_at as "opensAt", a.due_at as "dueAt", a.note, a.counting,
  a.attempts_allowed as "attemptsAllowed", a.late_work as "lateWork", setter.name as "setBy",
  a.withdrawn_at is not null as withdrawn,
  ${itemsSql('a.id')} as items`;

/** The learners of the class now for whom an assignment is. */
const concerned = `
  from memberships m join learners l on l.person_id = m.person_id
  where m.class_id = g.id and m.role = 'learner' and m.left_at is null
    and (not a.for_chosen_learners or exists (
      select 1 from assignment_learners x
      where x.assignment_id = a.id and x.learner_id = l.id))`;

const listSql = `
  select ${rules}, a.for_chosen_learners as "forChosen",
    (select count(*)::int from extensions e where e.assignment_id = a.id) as extensions,
    (select count(*)::int ${concerned}) as learners,
    (select count(*)::int ${concerned}
        and not exists (
          select 1 from assignment_items i where i.assignment_id = a.id and not exists (
            select 1 from counted_attempts c join attempts t on t.id = c.attempt_id
            where c.item_id = i.id and c.learner_id = l.id and coalesce((
              select v.verdict from overrides v
              where v.attempt_id = t.id and v.class_id = g.id
              order by v.created_at desc limit 1), t.verdict) = 'right'))) as done
  from class_groups g
  join assignments a on a.class_id = g.id
  join people setter on setter.id = a.set_by
  where ${staffOfClass}
  order by a.withdrawn_at is not null, a.due_at, a.id`;

const findSql = `
  select ${rules}, a.version,
    case when a.for_chosen_learners then coalesce((
      select json_agg(x.learner_id order by x.learner_id) from assignment_learners x
      where x.assignment_id = a.id), '[]') end as learners,
    (select count(*)::int from counted_attempts c join assignment_items i on i.id = c.item_id
      where i.assignment_id = a.id) as answers,
    coalesce((
      select json_agg(json_build_object('learnerId', e.learner_id, 'name', p.name,
        'dueAt', e.due_at, 'givenBy', giver.name) order by p.name, p.id)
      from extensions e join learners l on l.id = e.learner_id join people p on p.id = l.person_id
      join people giver on giver.id = e.given_by
      where e.assignment_id = a.id), '[]') as extensions,
    coalesce((
      select json_agg(json_build_object('learnerId', l.id, 'name', p.name) order by p.name, p.id)
      from memberships m join people p on p.id = m.person_id join learners l on l.person_id = p.id
      where m.class_id = g.id and m.role = 'learner' and m.left_at is null), '[]') as "inClass"
  from class_groups g
  join assignments a on a.class_id = g.id and a.id = $4
  join people setter on setter.id = a.set_by
  where ${staffOfClass}`;
