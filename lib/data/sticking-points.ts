import 'server-only';
import { sectionToShow } from '@/content/exercises/show-again';
import { listLessons } from '@/content/lessons/front-matter';
import { row } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { isId, staffOfClass, staffValues } from './class-right';
import { exerciseTitle, lessonName } from './lesson-titles';
import { latestOverride } from './verdicts';

/** A wrong answer, as it was typed. */
export interface WrongAnswer {
  readonly learnerId: string;
  readonly name: string;
  readonly attemptId: string;
  readonly typed: string;
}

/** A slip that the class makes. */
export interface StickingPoint {
  readonly exerciseId: string;
  readonly title: string;
  readonly slip: string;
  /** What was asked, and what those who made the slip were told. */
  readonly label: string;
  readonly advice: string;
  readonly learners: number;
  readonly times: number;
  readonly answers: readonly WrongAnswer[];
  readonly showAgain: {
    readonly label: string;
    readonly lesson: string;
    readonly path: string;
  } | null;
}

/** How an exercise did, by each learner's first attempt that counts. */
export interface ItemFigures {
  readonly exerciseId: string;
  readonly title: string;
  readonly n: number;
  /** With fewer first attempts than thirty the figures say little, and are not shown. */
  readonly tooFew: boolean;
  readonly shareRight: number;
  /** The Wilson interval of the share, at 95 in a hundred. */
  readonly from: number;
  readonly to: number;
  /** How being right goes with being right elsewhere; null where there is nothing to compare. */
  readonly itemRest: number | null;
}

/** Where a class is stuck. */
export interface ClassSticking {
  readonly points: readonly StickingPoint[];
  readonly items: readonly ItemFigures[];
}

/** Fewer first attempts than these say too little. */
export const enoughAttempts = 30;

/**
 * Where a class is stuck, for its staff; null for anybody else. The slips of those enrolled now in
 * answers that count, those of the most learners first, and how each exercise did. One query.
 */
export async function findStickingPoints(
  viewer: Viewer,
  classId: string,
): Promise<ClassSticking | null> {
  if (!isId(classId)) return null;
  const found = await row<StickingRow>(stickingSql, staffValues(viewer, classId));
  if (found === null) return null;
  return {
    points: found.points.map(({ part, ...point }) => ({
      ...point,
      title: exerciseTitle(point.exerciseId),
      showAgain: showAgain(point.exerciseId, part),
    })),
    items: found.items.map((item) => ({
      ...item,
      title: exerciseTitle(item.exerciseId),
      tooFew: item.n < enoughAttempts,
    })),
  };
}

function showAgain(exerciseId: string, part: string): StickingPoint['showAgain'] {
  const section = sectionToShow(exerciseId, part);
  const lesson = listLessons().find(({ id }) => id === section?.lessonId);
  if (section === null || lesson === undefined) return null;
  const label = lesson.sections.find(({ id }) => id === section.sectionId)?.label;
  const { title, path } = lessonName(lesson.id);
  return { label: label ?? 'Rule', lesson: title, path: `${path}#${section.sectionId}` };
}

interface StickingRow {
  readonly points: readonly (Omit<StickingPoint, 'title' | 'showAgain'> & { part: string })[];
  readonly items: readonly Omit<ItemFigures, 'title' | 'tooFew'>[];
}

/** Every answer that counts for work of the class, once, of those who learn in it now. */
const answersSql = `
  select distinct a.id, a.learner_id, a.exercise_id, a.response, a.marking, a.created_at,
    coalesce(o.verdict, a.verdict) as verdict, p.name
  from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id
  join assignments s on s.class_id = g.id and s.withdrawn_at is null
  join assignment_items i on i.assignment_id = s.id
  join counted_attempts c on c.item_id = i.id and c.learner_id = l.id
  join attempts a on a.id = c.attempt_id
  ${latestOverride('a')}
  where ${staffOfClass}`;

const pointsSql = `
  select w.exercise_id as "exerciseId", part ->> 'slip' as slip, part ->> 'key' as part,
    (array_agg(part ->> 'label' order by w.created_at desc))[1] as label,
    (array_agg(coalesce(part ->> 'message', '') order by w.created_at desc))[1] as advice,
    count(distinct w.learner_id)::int as learners, count(*)::int as times,
    json_agg(json_build_object('learnerId', w.learner_id, 'name', w.name, 'attemptId', w.id,
      'typed', case jsonb_typeof(w.response -> 'answers' -> split_part(part ->> 'key', '.', 1))
        when 'string' then w.response -> 'answers' ->> split_part(part ->> 'key', '.', 1)
        else part ->> 'echo' end) order by w.created_at desc) as answers
  from answers w cross join lateral jsonb_array_elements(w.marking -> 'parts') part
  where part ? 'slip' and w.verdict <> 'right'
  group by w.exercise_id, part ->> 'slip', part ->> 'key'
  order by count(distinct w.learner_id) desc, count(*) desc, 1, 2, 3`;

/** 1.959963984540054 is the standard normal quantile at 0.975. */
const itemsSql = `
  select exercise_id as "exerciseId", n, share as "shareRight", "itemRest",
    (share + z * z / (2 * n) - z * sqrt(share * (1 - share) / n + z * z / (4.0 * n * n)))
      / (1 + z * z / n) as "from",
    (share + z * z / (2 * n) + z * sqrt(share * (1 - share) / n + z * z / (4.0 * n * n)))
      / (1 + z * z / n) as "to"
  from (
    select exercise_id, count(*)::int as n, avg(x) as share, corr(x, rest) as "itemRest",
      1.959963984540054::float8 as z
    from (
      select exercise_id, x,
        (sum(x) over learner - x) / nullif(count(*) over learner - 1, 0) as rest
      from (
        select distinct on (learner_id, exercise_id) learner_id, exercise_id,
          (verdict = 'right')::int::float8 as x
        from answers order by learner_id, exercise_id, created_at) first
      window learner as (partition by learner_id)) with_rest
    group by exercise_id) counted
  order by share, exercise_id`;

const stickingSql = `
  with answers as materialized (${answersSql})
  select coalesce((select json_agg(p) from (${pointsSql}) p), '[]') as points,
    coalesce((select json_agg(f) from (${itemsSql}) f), '[]') as items
  from class_groups g where ${staffOfClass}`;
