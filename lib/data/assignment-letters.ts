import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows } from '@/lib/db/query';
import { itemsSql, type Item } from './assignment-items';
import { workTitles } from './lesson-titles';
import { queueLetters } from './letters';

/**
 * Tells every learner concerned that work was set, as part of the transaction that sets it; when it
 * opens, if that is later. Told once: after an edit only those whom it newly concerns are. Whoever
 * calls has made sure of the right to set it. Answers how many letters were written.
 */
export async function queueAssignmentLetters(
  transaction: Transaction,
  assignmentId: string,
): Promise<number> {
  const set = await row<AssignmentRow>(assignmentSql, [assignmentId], transaction);
  if (set === null) return 0;
  const learners = await rows<LearnerRow>(learnersSql, [assignmentId], transaction);
  const { items, opensAt, ...about } = set;
  const written = await queueLetters(
    transaction,
    learners.map(({ personId, learnerId, email, dueAt }) => ({
      to: email,
      personId,
      once: `assignment-set:${assignmentId}:${learnerId}`,
      sendAfter: opensAt,
      letter: {
        kind: 'assignment-set',
        assignmentId,
        ...about,
        opensAt: opensAt.toISOString(),
        dueAt: dueAt.toISOString(),
        work: workTitles(items),
      },
    })),
  );
  return written.length;
}

interface AssignmentRow {
  readonly className: string;
  readonly timeZone: string;
  readonly setBy: string;
  readonly note: string;
  readonly opensAt: Date;
  readonly items: readonly Item[];
}

const assignmentSql = `
  select g.name as "className", g.time_zone as "timeZone", p.name as "setBy", a.note,
    a.opens_at as "opensAt",
    ${itemsSql('a.id')} as items
  from assignments a
  join class_groups g on g.id = a.class_id and g.archived_at is null
  join people p on p.id = a.set_by
  where a.id = $1 and a.withdrawn_at is null`;

interface LearnerRow {
  readonly personId: string;
  readonly learnerId: string;
  readonly email: string;
  readonly dueAt: Date;
}

const learnersSql = `
  select p.id as "personId", l.id as "learnerId", p.email, greatest(a.due_at, e.due_at) as "dueAt"
  from assignments a
  join memberships m on m.class_id = a.class_id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id and p.disabled_at is null and p.erased_at is null
  join learners l on l.person_id = p.id
  left join extensions e on e.assignment_id = a.id and e.learner_id = l.id
  where a.id = $1 and p.wants_class_mail and (not a.for_chosen_learners or exists (
    select 1 from assignment_learners x where x.assignment_id = a.id and x.learner_id = l.id))`;
