import 'server-only';
import { lessons } from '@/content/exercises/registry';
import { now as presentTime } from '@/lib/clock';
import { row } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { pegFromCounts } from '@/lib/retention/peg';
import type { ClassProgress, Mark } from '@/lib/schemas/class-progress';
import { isId, staffOfClass, staffValues } from './class-right';
import { exerciseTitle, lessonName, lessonOfExercise } from './lesson-titles';
import { skillName, skillsOfLesson } from './pegs';
import { latestOverride, ownExtension, standsLate, verdictRank } from './verdicts';

/**
 * The progress of a class, for its instructors and the administrator; null for anybody else. One
 * column a lesson of which something is set, one row a learner enrolled now. Two queries, whatever
 * the size of the class.
 */
export async function findClassProgress(
  viewer: Viewer,
  classId: string,
  now: Date = presentTime(),
): Promise<ClassProgress | null> {
  if (!isId(classId)) return null;
  const values = staffValues(viewer, classId);
  const found = await row<ClassRow>(classSql, values);
  if (found === null) return null;
  const columns = columnsOf(found.items);
  const skillIds = columns.flatMap(({ lessonId }) => skillsOfLesson(lessonId));
  const standing = await row<StandingRow>(standingSql, [...values, skillIds]);
  const pegState = new Map(standing?.pegs.map((one) => [one[0] + one[1], stateOf(one, now)]));
  const isSetTo = whoIsSet(found);
  const markOf = new Map(standing?.marks.map((one) => [one[0] + one[1], one]));
  return {
    classId,
    name: found.name,
    timeZone: found.timeZone,
    lessons: columns,
    learners: found.learners.map(({ learnerId, name }) => ({
      learnerId,
      name,
      lessons: columns.map(({ lessonId, exercises }) => ({
        lessonId,
        pegs: skillsOfLesson(lessonId).map((skill) => ({
          skill,
          name: skillName(skill),
          state: pegState.get(learnerId + skill) ?? 'open',
        })),
        exercises: exercises.map(({ exerciseId }) =>
          markOf.has(learnerId + exerciseId) || isSetTo(learnerId, exerciseId)
            ? cellOf(exerciseId, markOf.get(learnerId + exerciseId))
            : { ...cellOf(exerciseId, undefined), mark: 'not set' },
        ),
      })),
    })),
  };
}

/** Whether something that asks for an exercise is set to a learner, be it to the whole class. */
function whoIsSet({ items, chosen }: ClassRow) {
  const forEverybody = new Set(
    items.flatMap(({ chosenOnly, exerciseId }) => (chosenOnly ? [] : exerciseId)),
  );
  const learnersOf = new Map<string, Set<string>>();
  for (const [assignmentId, learnerId] of chosen) {
    learnersOf.set(assignmentId, (learnersOf.get(assignmentId) ?? new Set()).add(learnerId));
  }
  return (learnerId: string, exerciseId: string) =>
    forEverybody.has(exerciseId) ||
    items.some(
      (item) =>
        item.exerciseId === exerciseId &&
        learnersOf.get(item.assignmentId)?.has(learnerId) === true,
    );
}

function columnsOf(items: readonly ItemRow[]): ClassProgress['lessons'] {
  const byLesson = new Map<string, ItemRow[]>();
  for (const item of items) {
    const lessonId = item.lessonId ?? lessonOfExercise(item.exerciseId) ?? 'other';
    byLesson.set(lessonId, [...(byLesson.get(lessonId) ?? []), item]);
  }
  const order = lessons.map(({ id }) => id);
  return [...byLesson]
    .sort(([one], [other]) => order.indexOf(one) - order.indexOf(other))
    .map(([lessonId, set]) => ({
      lessonId,
      title: lessonName(lessonId).title,
      dueAt: latest(set.map(({ dueAt }) => new Date(dueAt).toISOString())),
      exercises: [...new Set(set.map(({ exerciseId }) => exerciseId))].map((exerciseId) => ({
        exerciseId,
        title: exerciseTitle(exerciseId),
      })),
    }));
}

function latest(moments: readonly string[]): string | null {
  return [...moments].sort().at(-1) ?? null;
}

function stateOf([, , looked, good, dates]: PegRow, now: Date) {
  return pegFromCounts({ looked, good, dates, due: null, now: now.toISOString() }).state;
}

function cellOf(
  exerciseId: string,
  found: MarkRow | undefined,
): ClassProgress['learners'][number]['lessons'][number]['exercises'][number] {
  if (found === undefined) {
    return {
      exerciseId,
      mark: 'none',
      attempts: 0,
      attemptId: null,
      late: false,
      overridden: false,
    };
  }
  const [, , mark, attemptId, late, attempts, overridden] = found;
  return { exerciseId, mark, attempts, attemptId, late, overridden };
}

interface ItemRow {
  readonly exerciseId: string;
  readonly lessonId: string | null;
  readonly dueAt: string;
  readonly assignmentId: string;
  /** Whether it is for some of the class only. */
  readonly chosenOnly: boolean;
}

interface ClassRow {
  readonly name: string;
  readonly timeZone: string;
  readonly items: readonly ItemRow[];
  /** Assignment and learner, for what is not for everybody. */
  readonly chosen: readonly (readonly [string, string])[];
  readonly learners: readonly { readonly learnerId: string; readonly name: string }[];
}

const classSql = `
  select g.name, g.time_zone as "timeZone",
    coalesce((
      select json_agg(json_build_object(
        'exerciseId', i.exercise_id, 'lessonId', i.lesson_id, 'dueAt', a.due_at,
        'assignmentId', a.id, 'chosenOnly', a.for_chosen_learners)
        order by a.due_at, i.position)
      from assignments a join assignment_items i on i.assignment_id = a.id
      where a.class_id = g.id and a.withdrawn_at is null), '[]') as items,
    coalesce((
      select json_agg(json_build_array(a.id, x.learner_id))
      from assignments a join assignment_learners x on x.assignment_id = a.id
      where a.class_id = g.id and a.withdrawn_at is null and a.for_chosen_learners), '[]') as chosen,
    coalesce((
      select json_agg(json_build_object('learnerId', l.id, 'name', p.name) order by p.name, l.id)
      from memberships m join people p on p.id = m.person_id join learners l on l.person_id = p.id
      where m.class_id = g.id and m.role = 'learner' and m.left_at is null), '[]') as learners
  from class_groups g where ${staffOfClass}`;

/** The learners enrolled now, under the same right: repeated in every query, never taken on trust. */
const enrolled = `
  select l.id, p.time_zone from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id
  where ${staffOfClass}`;

/** Learner, skill; closed rounds looked at, right unaided among them, on so many dates. */
type PegRow = readonly [string, string, number, number, number];

/** Learner, exercise; the verdict and id of the attempt that stands, late, how many, overridden. */
type MarkRow = readonly [string, string, Mark, string, boolean, number, boolean];

/** Both as JSON, which costs the server a tenth of as many rows. */
interface StandingRow {
  readonly pegs: readonly PegRow[];
  readonly marks: readonly MarkRow[];
}

/** The last four closed rounds of each learner and skill, counted as the peg rule asks. */
const pegSql = `
  select json_build_array(e.id, wanted.skill, count(*), count(*) filter (where f.good),
    count(distinct (f.closed_at at time zone e.time_zone)::date) filter (where f.good)) as peg
  from (${enrolled}) e
  cross join unnest($4::text[]) as wanted (skill)
  cross join lateral (
    select s.closed_at, s.was_right and s.unaided as good from skill_facts s
    where s.learner_id = e.id and s.skill = wanted.skill
    order by s.closed_at desc limit 4) f
  group by e.id, wanted.skill`;

/**
 * How each learner stands with each exercise: for every assignment the best or the latest of the
 * attempts that count, as its rule says, and of these the best. The best is right before partly
 * before wrong, then in time before late, then the latest.
 */
const markSql = `
  select distinct on (t.learner_id, t.exercise_id)
    json_build_array(t.learner_id, t.exercise_id, t.verdict, t.attempt_id, t.late,
      max(t.attempts) over (partition by t.learner_id, t.exercise_id), t.overridden) as mark
  from (
    select distinct on (c.learner_id, c.item_id) c.learner_id, i.exercise_id, c.attempt_id, c.n,
      coalesce(o.verdict, a.verdict) as verdict, o.verdict is not null as overridden,
      ${standsLate} as late,
      count(*) over (partition by c.learner_id, c.item_id) as attempts
    from (${enrolled}) e
    join counted_attempts c on c.learner_id = e.id
    join assignment_items i on i.id = c.item_id
    join assignments s on s.id = i.assignment_id and s.class_id = $1 and s.withdrawn_at is null
    join attempts a on a.id = c.attempt_id
    ${ownExtension}
    ${latestOverride('a')}
    order by c.learner_id, c.item_id, case when s.counting = 'latest' then -c.n end,
      ${verdictRank('coalesce(o.verdict, a.verdict)')},
      ${standsLate}, c.n desc) t
  order by t.learner_id, t.exercise_id, ${verdictRank('t.verdict')}, t.late, t.n desc`;

const standingSql = `
  select coalesce((select json_agg(peg) from (${pegSql}) p), '[]') as pegs,
    coalesce((select json_agg(mark) from (${markSql}) m), '[]') as marks`;
