import 'server-only';

/**
 * How an attempt stands in a class: by the latest override of that class, else as it was marked.
 * `attempt` is the alias of the attempts; `$1` is the class. An override holds in its own class only,
 * and moves no peg: pegs follow from rounds as they were closed.
 */
export function latestOverride(attempt: string): string {
  return `left join lateral (
    select v.verdict from overrides v
    where v.attempt_id = ${attempt}.id and v.class_id = $1
    order by v.created_at desc limit 1) o on true`;
}

/** The time given to the learner of `c` (counted_attempts) for the assignment `s`, as `x`. */
export const ownExtension =
  'left join extensions x on x.assignment_id = s.id and x.learner_id = c.learner_id';

/**
 * Whether the attempt `a` stands as late. What was stored as late is late as long as it lies after
 * the due moment that the learner has now: more time, given later, helps, and a due moment that is
 * moved back makes nothing late. Needs `ownExtension`.
 */
export const standsLate = '(c.late and a.created_at > greatest(s.due_at, x.due_at))';

/** The place of a verdict among the others: right before partly before wrong. */
export const verdictRank = (verdict: string) =>
  `array_position(array['right', 'partly', 'wrong'], ${verdict})`;
