import type pg from 'pg';
import { exercises } from '@/content/exercises/registry';
import type { Acknowledged } from './writer';

/** What the record says of what was acknowledged. */
export interface Kept {
  readonly acknowledged: number;
  readonly lost: number;
  /** Attempts of the run that nobody was told of: none, since every writer asked until told. */
  readonly unknown: number;
  readonly doubled: number;
  /** Closed rounds whose facts about skills are not what their attempts say. */
  readonly wrongProgress: number;
  /** Counted attempts whose numbers have a gap, or that count twice for the same work. */
  readonly wrongCounts: number;
}

/** Holds the record against what was acknowledged since `begun`. */
export async function inspect(
  pool: pg.Pool,
  acknowledged: readonly Acknowledged[],
  begun: Date,
): Promise<Kept> {
  const attempts = await pool.query<{ id: string }>(
    'select id from attempts where created_at >= $1',
    [begun],
  );
  const kept = new Set(attempts.rows.map(({ id }) => id));
  const told = new Set(acknowledged.map(({ attemptId }) => attemptId));
  return {
    acknowledged: acknowledged.length,
    lost: [...told].filter((id) => !kept.has(id)).length,
    unknown: [...kept].filter((id) => !told.has(id)).length,
    doubled: acknowledged.length - told.size + (await countOf(pool, doubledSql, begun)),
    wrongProgress: await countOf(pool, wrongProgressSql, begun, JSON.stringify(skillsOfExercises)),
    wrongCounts: await countOf(pool, wrongCountsSql),
  };
}

const skillsOfExercises = Object.fromEntries(
  [...exercises.values()].map(({ id, skills }) => [id, skills]),
);

async function countOf(pool: pg.Pool, text: string, ...values: unknown[]): Promise<number> {
  const { rows } = await pool.query<{ n: number }>(text, values);
  return rows[0]?.n ?? 0;
}

/** A response of one key that was kept twice, or an attempt without its key. */
const doubledSql = `
  select count(*)::int as n from attempts a
  left join (select attempt_id, count(*) as keys from request_keys group by 1) k
    on k.attempt_id = a.id
  where a.created_at >= $1 and k.keys is distinct from 1`;

/**
 * For every round that an attempt of the run closed: one fact a skill, right when the attempt's own
 * marking says so, with as many attempts as the round has; and none for a round left open.
 */
const wrongProgressSql = `
  with closing as (
    select a.*, (select count(*) from attempts b where b.round_id = a.round_id) as tries
    from attempts a where a.created_at >= $1 and a.closes_round
  ), expected as (
    select c.round_id, c.learner_id, s.skill, c.unaided, c.tries,
      exists (select 1 from jsonb_array_elements(c.marking -> 'skills') m
        where m ->> 'skill' = s.skill and (m ->> 'right')::boolean) as was_right
    from closing c, jsonb_array_elements_text($2::jsonb -> c.exercise_id) s (skill)
  ), found as (
    select f.* from skill_facts f join rounds r on r.id = f.round_id
    where exists (select 1 from attempts a where a.round_id = r.id and a.created_at >= $1)
  )
  select count(*)::int as n from expected e
  full join found f on f.round_id = e.round_id and f.skill = e.skill
  where e.round_id is null or f.round_id is null or f.was_right <> e.was_right
    or f.unaided <> e.unaided or f.attempts <> e.tries or f.learner_id <> e.learner_id`;

const wrongCountsSql = `
  select count(*)::int as n from (
    select item_id, learner_id from counted_attempts group by item_id, learner_id
    having max(n) <> count(*) or count(distinct attempt_id) <> count(*)) wrong`;
