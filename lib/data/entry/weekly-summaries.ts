import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import type { LetterOf } from '@/lib/mail/letter';
import { itemsSql, type Item } from '../assignment-items';
import { exerciseTitle, workTitles } from '../lesson-titles';
import { queueLetters } from '../letters';
import type { JobProof } from './proof';
import { concernedLearners, isConcerned, isUnfinished } from './set-work';

/**
 * Tells instructors how each of their classes went in the week before, once a week and class: from
 * seven on Monday by the class's clock, or on Tuesday if nobody worked on Monday. A class without
 * work and answers has nothing to tell. Answers how many letters were written.
 */
export async function summariseWeeks(_proof: JobProof, now: Date): Promise<number> {
  const classes = await rows<ClassRow>(classesSql, [now]);
  let written = 0;
  for (const one of classes) {
    written += await transact((transaction) => summarise(one, transaction));
  }
  return written;
}

async function summarise(
  { classId, className, timeZone, from, to, starts, ends, instructors }: ClassRow,
  transaction: Transaction,
): Promise<number> {
  const week = await row<WeekRow>(weekSql, [classId, starts, ends], transaction);
  if (week === null) return 0;
  const { answers, quiet, slips, due } = week;
  if (answers.length + quiet.length + due.length === 0) return 0;
  const late = answers.filter((one) => one.late > 0);
  const letter: LetterOf<'weekly-summary'> = {
    kind: 'weekly-summary',
    classId,
    className,
    timeZone,
    from,
    to,
    answered: answers.map(({ name, answers: count }) => ({ name, answers: count })),
    quiet: [...quiet],
    late: late.map((one) => ({ name: one.name, answers: one.late })),
    slips: slips.map(({ exerciseId, advice, times }) => ({
      exercise: exerciseTitle(exerciseId),
      advice,
      times,
    })),
    due: due.map(({ items, dueAt }) => ({
      work: workTitles(items).join(', ').slice(0, 200),
      dueAt: new Date(dueAt).toISOString(),
    })),
  };
  const ids = await queueLetters(
    transaction,
    instructors.map(({ personId, email }) => ({
      to: email,
      personId,
      once: `weekly-summary:${classId}:${personId}:${to}`,
      letter,
    })),
  );
  return ids.length;
}

interface ClassRow {
  readonly classId: string;
  readonly className: string;
  readonly timeZone: string;
  /** The first and the last day of the week that is over. */
  readonly from: string;
  readonly to: string;
  readonly starts: Date;
  readonly ends: Date;
  readonly instructors: readonly { readonly personId: string; readonly email: string }[];
}

/** Classes whose Monday has come, with those instructors who have not been told yet. */
const classesSql = `
  with due as (
    select g.id, g.name, g.time_zone,
      date_trunc('week', $1::timestamptz at time zone g.time_zone)::date as monday
    from class_groups g
    where g.archived_at is null
      and extract(isodow from $1::timestamptz at time zone g.time_zone) in (1, 2)
      and $1::timestamptz at time zone g.time_zone
        >= date_trunc('week', $1::timestamptz at time zone g.time_zone) + interval '7 hours')
  select d.id as "classId", d.name as "className", d.time_zone as "timeZone",
    (d.monday - 7)::text as "from", (d.monday - 1)::text as "to",
    (d.monday - 7)::timestamp at time zone d.time_zone as starts,
    d.monday::timestamp at time zone d.time_zone as ends,
    json_agg(json_build_object('personId', p.id, 'email', p.email) order by p.id) as instructors
  from due d
  join memberships m on m.class_id = d.id and m.role = 'instructor' and m.left_at is null
    and m.joined_at < d.monday::timestamp at time zone d.time_zone
  join people p on p.id = m.person_id and p.disabled_at is null and p.erased_at is null
    and p.wants_class_mail
  where not exists (
    select 1 from letters w
    where w.once_key = concat('weekly-summary:', d.id, ':', p.id, ':', d.monday - 1))
  group by d.id, d.name, d.time_zone, d.monday
  order by d.id`;

interface WeekRow {
  readonly answers: readonly {
    readonly name: string;
    readonly answers: number;
    readonly late: number;
  }[];
  readonly quiet: readonly string[];
  readonly slips: readonly {
    readonly exerciseId: string;
    readonly advice: string;
    readonly times: number;
  }[];
  readonly due: readonly {
    readonly items: readonly Item[];
    readonly dueAt: string;
  }[];
}

/** Of class $1 between $2 and $3: what counted, learners with work left who sent nothing, slips. */
const weekSql = `
  with counted as (
    select c.learner_id, t.id, t.exercise_id, t.marking, bool_or(c.late) as late
    from assignments a
    join assignment_items i on i.assignment_id = a.id
    join counted_attempts c on c.item_id = i.id
    join attempts t on t.id = c.attempt_id and t.created_at >= $2 and t.created_at < $3
    where a.class_id = $1 and a.withdrawn_at is null
    group by c.learner_id, t.id),
  answers as (
    select l.id, p.name, count(*)::int as answers, (count(*) filter (where c.late))::int as late
    from memberships m
    join people p on p.id = m.person_id and p.erased_at is null
    join learners l on l.person_id = p.id
    join counted c on c.learner_id = l.id
    where m.class_id = $1 and m.role = 'learner' and m.left_at is null
    group by l.id, p.name),
  quiet as (
    select distinct l.id, p.name from ${concernedLearners}
    join assignment_items i on i.assignment_id = a.id
    where g.id = $1 and ${isConcerned} and a.opens_at < $3::timestamptz - interval '1 day'
      and (a.late_work = 'marked' or greatest(a.due_at, e.due_at) > $2)
      and not exists (select 1 from counted c where c.learner_id = l.id) and ${isUnfinished}),
  slips as (
    select c.exercise_id as "exerciseId", part ->> 'slip' as slip,
      max(part ->> 'message') as advice, count(*)::int as times
    from counted c cross join lateral jsonb_array_elements(c.marking -> 'parts') part
    where part ? 'slip' and part ? 'message' group by 1, 2
    order by times desc, 1, 2 limit 5),
  due as (
    select a.due_at as "dueAt", ${itemsSql('a.id')} as items
    from assignments a
    where a.class_id = $1 and a.withdrawn_at is null
      and a.due_at >= $3 and a.due_at < $3::timestamptz + interval '14 days'
    order by a.due_at, a.id limit 5)
  select
    (select coalesce(json_agg(json_build_object('name', name, 'answers', answers, 'late', late)
      order by name, id), '[]') from answers) as answers,
    (select coalesce(json_agg(name order by name, id), '[]') from quiet) as quiet,
    (select coalesce(json_agg(json_build_object('exerciseId', "exerciseId", 'advice', advice,
      'times', times) order by times desc, "exerciseId", slip), '[]') from slips) as slips,
    (select coalesce(json_agg(json_build_object('items', items, 'dueAt', "dueAt")
      order by "dueAt"), '[]') from due where items is not null) as due`;
