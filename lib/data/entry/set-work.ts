import 'server-only';

/**
 * Parts of the statements by which jobs find whom set work concerns. They name `a` (assignments),
 * `g` (class_groups), `m` (memberships), `p` (people), `l` (learners), `e` (extensions).
 */

/** Every learner whom an assignment concerns, who is still there, with the time that holds for them. */
export const concernedLearners = `
  assignments a
  join class_groups g on g.id = a.class_id and g.archived_at is null
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id and p.disabled_at is null and p.erased_at is null
  join learners l on l.person_id = p.id
  left join extensions e on e.assignment_id = a.id and e.learner_id = l.id`;

/** That the assignment is for the whole class, or for this learner among others. */
export const isForLearner = `
  (not a.for_chosen_learners or exists (
    select 1 from assignment_learners x where x.assignment_id = a.id and x.learner_id = l.id))`;

/** That the assignment stands, and is for this learner. */
export const isConcerned = `a.withdrawn_at is null and ${isForLearner}`;

/**
 * That item `i` is still to be done: nothing right counts for it, an instructor's override looked at
 * first, and another attempt is allowed.
 */
export const isUnfinished = `
  (a.attempts_allowed is null or a.attempts_allowed > (
    select count(*) from counted_attempts c where c.item_id = i.id and c.learner_id = l.id))
  and not exists (
    select 1 from counted_attempts c join attempts t on t.id = c.attempt_id
    where c.item_id = i.id and c.learner_id = l.id and 'right' = coalesce((
      select o.verdict from overrides o
      where o.attempt_id = t.id and o.class_id = a.class_id
      order by o.created_at desc limit 1), t.verdict))`;
