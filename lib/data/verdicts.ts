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

/** The place of a verdict among the others: right before partly before wrong. */
export const verdictRank = (verdict: string) =>
  `array_position(array['right', 'partly', 'wrong'], ${verdict})`;
