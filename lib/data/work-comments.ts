import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import type { Item } from './assignment-items';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { tellOfComment } from './feedback';
import { workTitles } from './lesson-titles';

/** Whose work something is said about. */
export interface LearnersWork {
  readonly learnerId: string;
  readonly assignmentId: string;
}

/**
 * Says something about what a learner of the class did for work that is set to them, by its staff; as
 * with an attempt, the learner is written to once, until they have read. False when that cannot be
 * done.
 */
export async function addWorkComment(
  viewer: Viewer,
  classId: string,
  { learnerId, assignmentId }: LearnersWork,
  body: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (![classId, learnerId, assignmentId].every(isId)) return false;
  return transact(async (transaction) => {
    const found = await row<AboutRow>(
      aboutSql,
      [...staffValues(viewer, classId), learnerId, assignmentId],
      transaction,
    );
    if (found === null) return false;
    const made = await row<{ id: string }>(
      `insert into comments (assignment_id, class_id, author_id, learner_id, body, created_at)
       values ($1, $2, $3, $4, $5, $6) returning id`,
      [assignmentId, classId, viewer.personId, learnerId, body, now],
      transaction,
    );
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'comment written',
        objectKind: 'assignment',
        objectId: assignmentId,
        classId,
        detail: { learner: learnerId },
      },
      transaction,
    );
    if (found.unread === 0 && made !== null) {
      const subject = workTitles(found.items).join(', ');
      await tellOfComment(viewer, { ...found, subject }, { id: made.id, body }, transaction);
    }
    return true;
  });
}

interface AboutRow {
  readonly personId: string;
  readonly email: string | null;
  readonly className: string;
  readonly items: readonly Item[];
  readonly unread: number;
}

/** Work that is set to somebody who learns in the class; taken back work too, once they answered it. */
const aboutSql = `
  select p.id as "personId", p.email, g.name as "className",
    (select json_agg(json_build_object('lessonId', i.lesson_id, 'exerciseId', i.exercise_id)
      order by i.position) from assignment_items i where i.assignment_id = s.id) as items,
    (select count(*)::int from comments c where c.learner_id = l.id and c.read_at is null) as unread
  from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id and l.id = $4
  join assignments s on s.class_id = g.id and s.id = $5
  where ${staffOfOpenClass} and (
    (s.withdrawn_at is null and (not s.for_chosen_learners or exists (
      select 1 from assignment_learners x where x.assignment_id = s.id and x.learner_id = l.id)))
    or exists (
      select 1 from counted_attempts c join assignment_items i on i.id = c.item_id
      where i.assignment_id = s.id and c.learner_id = l.id))
  for no key update of l`;
