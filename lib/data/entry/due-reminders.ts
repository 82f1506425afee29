import 'server-only';
import { rows, transact } from '@/lib/db/query';
import { exerciseTitle } from '../lesson-titles';
import { queueLetters } from '../letters';
import type { JobProof } from './proof';
import { concernedLearners, isConcerned, isUnfinished } from './set-work';

/**
 * Reminds learners of what is due tomorrow, by their class's calendar, and not done: from nine in the
 * morning there, once for each assignment and due date, however often it runs. Answers how many
 * letters were written.
 */
export async function remindOfDueWork(_proof: JobProof, now: Date): Promise<number> {
  return transact(async (transaction) => {
    const found = await rows<ReminderRow>(dueSql, [now], transaction);
    const written = await queueLetters(
      transaction,
      found.map(({ personId, learnerId, email, dueAt, left, ...about }) => ({
        to: email,
        personId,
        once: `due-tomorrow:${about.assignmentId}:${learnerId}:${dueAt.toISOString()}`,
        letter: {
          kind: 'due-tomorrow',
          ...about,
          dueAt: dueAt.toISOString(),
          left: left.map(exerciseTitle),
        },
      })),
    );
    return written.length;
  });
}

interface ReminderRow {
  readonly assignmentId: string;
  readonly className: string;
  readonly timeZone: string;
  readonly personId: string;
  readonly learnerId: string;
  readonly email: string;
  readonly dueAt: Date;
  readonly left: readonly string[];
}

/** Midnight is the end of a day: what is due then is due on the day before. */
const dueSql = `
  select * from (
    select a.id as "assignmentId", g.name as "className", g.time_zone as "timeZone",
      p.id as "personId", l.id as "learnerId", p.email, greatest(a.due_at, e.due_at) as "dueAt",
      (select json_agg(i.exercise_id order by i.position) from assignment_items i
        where i.assignment_id = a.id and ${isUnfinished}) as left
    from ${concernedLearners}
    where ${isConcerned} and p.wants_class_mail
      and a.opens_at <= $1::timestamptz
      and a.id in (
        select id from assignments where due_at between $1 and $1::timestamptz + interval '3 days'
        union select assignment_id from extensions
        where due_at between $1 and $1::timestamptz + interval '3 days')
      and greatest(a.due_at, e.due_at) > $1
      and ((greatest(a.due_at, e.due_at) - interval '1 millisecond') at time zone g.time_zone)::date
        = ($1::timestamptz at time zone g.time_zone)::date + 1
      and ($1::timestamptz at time zone g.time_zone)::time >= '09:00') due
  where due.left is not null
  order by "assignmentId", "learnerId"`;
