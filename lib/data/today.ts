import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import type { PegView } from '@/lib/schemas/round';
import { exerciseTitle, lessonName, lessonOfExercise, type LessonName } from './lesson-titles';
import { listPegs } from './progress';
import { lessons } from '@/content/exercises/registry';

/** An exercise that is set, and how the viewer stands with it. */
export interface SetExercise {
  readonly exerciseId: string;
  readonly title: string;
  readonly lesson: LessonName | null;
  readonly mark: 'none' | 'right' | 'partly' | 'wrong';
  /** How many more attempts count; null for any number. */
  readonly attemptsLeft: number | null;
}

/** Work that is set to the viewer. */
export interface SetWork {
  readonly assignmentId: string;
  readonly classId: string;
  readonly className: string;
  readonly note: string;
  readonly dueAt: string;
  readonly timeZone: string;
  readonly overdue: boolean;
  /** Whether the viewer has been given more time than the class. */
  readonly extended: boolean;
  readonly lateWork: 'marked' | 'closed';
  readonly exercises: readonly SetExercise[];
  readonly done: number;
}

/** Where the viewer was last. */
export interface LastPlace {
  readonly exerciseId: string;
  readonly title: string;
  readonly lesson: LessonName;
  readonly at: string;
  /** Whether the round there is still open. */
  readonly open: boolean;
}

/** A lesson with the viewer's pegs. */
export interface LessonPegs extends LessonName {
  readonly pegs: readonly PegView[];
}

/** What a learner comes to. */
export interface Today {
  /** What is set, the next due first; work that is done leaves the list a week after it was due. */
  readonly set: readonly SetWork[];
  readonly last: LastPlace | null;
  readonly lessons: readonly LessonPegs[];
}

/** What is set, where the viewer was, and the pegs of every lesson. Three queries. */
export async function findToday(viewer: Viewer, now: Date = presentTime()): Promise<Today> {
  const [set, last, pegs] = await Promise.all([
    rows<SetRow>(setSql, [viewer.personId, viewer.learnerId, now]),
    row<LastRow>(lastSql, [viewer.learnerId]),
    listPegs(viewer, now),
  ]);
  const pegOf = new Map(pegs.map((peg) => [peg.skill, peg]));
  return {
    set: set.map((one) => workOf(one, now)),
    last: last === null ? null : placeOf(last),
    lessons: lessons.map(({ id, skills }) => ({
      ...lessonName(id),
      pegs: skills.flatMap((skill) => pegOf.get(skill) ?? []),
    })),
  };
}

function workOf({ items, dueAt, ...rest }: SetRow, now: Date): SetWork {
  const exercises = items.map(({ exerciseId, lessonId, mark, attemptsLeft }) => {
    const lesson = lessonId ?? lessonOfExercise(exerciseId);
    return {
      exerciseId,
      title: exerciseTitle(exerciseId),
      lesson: lesson === null ? null : lessonName(lesson),
      mark,
      attemptsLeft,
    };
  });
  const done = exercises.filter(({ mark }) => mark === 'right').length;
  return {
    ...rest,
    dueAt: dueAt.toISOString(),
    overdue: dueAt <= now && done < exercises.length,
    exercises,
    done,
  };
}

function placeOf({ exerciseId, at, open }: LastRow): LastPlace | null {
  const lessonId = lessonOfExercise(exerciseId);
  if (lessonId === null) return null;
  return {
    exerciseId,
    title: exerciseTitle(exerciseId),
    lesson: lessonName(lessonId),
    at: at.toISOString(),
    open,
  };
}

interface SetRow {
  readonly assignmentId: string;
  readonly classId: string;
  readonly className: string;
  readonly note: string;
  readonly dueAt: Date;
  readonly timeZone: string;
  readonly extended: boolean;
  readonly lateWork: SetWork['lateWork'];
  readonly items: readonly {
    readonly exerciseId: string;
    readonly lessonId: string | null;
    readonly mark: SetExercise['mark'];
    readonly attemptsLeft: number | null;
  }[];
}

const setSql = `
  select * from (
    select a.id as "assignmentId", g.id as "classId", g.name as "className", a.note,
      greatest(a.due_at, e.due_at) as "dueAt", g.time_zone as "timeZone",
      e.due_at > a.due_at is true as extended, a.late_work as "lateWork",
      (select json_agg(json_build_object('exerciseId', i.exercise_id, 'lessonId', i.lesson_id,
          'attemptsLeft', greatest(0, a.attempts_allowed - (
            select count(*) from counted_attempts c
            where c.item_id = i.id and c.learner_id = $2)),
          'mark', coalesce((
            select coalesce(v.verdict, t.verdict) as stands
            from counted_attempts c join attempts t on t.id = c.attempt_id
            left join lateral (
              select o.verdict from overrides o where o.attempt_id = t.id and o.class_id = g.id
              order by o.created_at desc limit 1) v on true
            where c.item_id = i.id and c.learner_id = $2
            order by case when a.counting = 'latest' then -c.n end,
              array_position(array['right', 'partly', 'wrong'], coalesce(v.verdict, t.verdict))
            limit 1), 'none'))
        order by i.position) from assignment_items i where i.assignment_id = a.id) as items
    from memberships m
    join class_groups g on g.id = m.class_id and g.archived_at is null
    join assignments a on a.class_id = g.id and a.withdrawn_at is null and a.opens_at <= $3
    left join extensions e on e.assignment_id = a.id and e.learner_id = $2
    where m.person_id = $1 and m.role = 'learner' and m.left_at is null
      and (not a.for_chosen_learners or exists (
        select 1 from assignment_learners x
        where x.assignment_id = a.id and x.learner_id = $2))) work
  where "dueAt" > $3::timestamptz - interval '7 days' or exists (
    select 1 from json_array_elements(items) item where item ->> 'mark' <> 'right')
  order by "dueAt", "assignmentId"`;

interface LastRow {
  readonly exerciseId: string;
  readonly at: Date;
  readonly open: boolean;
}

const lastSql = `
  select r.exercise_id as "exerciseId", r.closed_at is null as open,
    greatest(r.opened_at, (select max(a.created_at) from attempts a where a.round_id = r.id)) as at
  from rounds r where r.learner_id = $1
  order by r.opened_at desc limit 1`;
