import 'server-only';
import type { Transaction } from 'sequelize';
import { preparedRow, type Prepared } from '@/lib/db/prepared';
import type { AttemptReply } from '@/lib/schemas/round';
import {
  lastRoundsOf,
  skillRounds,
  skillsByExercise,
  type LastRoundRow,
  type SkillRound,
} from './pegs';
import { roundColumns, type KeptMarking, type RoundRecord } from './round-record';

/** What must be known before a response can be marked. */
export interface BeforeAttempt {
  /** What was answered before under the same key, if anything was. */
  readonly earlier: { readonly bodyHash: string; readonly reply: AttemptReply } | null;
  /** The learner's round, if it is theirs. */
  readonly record: RoundRecord | null;
  /** The last closed rounds of each skill of the lesson to which the round belongs. */
  readonly rounds: readonly SkillRound[];
}

/** Looks all of it up at once: sending an answer is what the server does most. */
export async function findBeforeAttempt(
  learnerId: string,
  roundId: string,
  key: string,
  transaction?: Transaction,
): Promise<BeforeAttempt> {
  const found = await preparedRow<BeforeRow>(before, [learnerId, roundId, key], transaction);
  if (found === null) return { earlier: null, record: null, rounds: [] };
  const { earlier, rounds, roundId: own, ...record } = found;
  return {
    earlier,
    record: own === null ? null : { ...record, roundId: own },
    rounds: skillRounds(rounds),
  };
}

interface BeforeRow extends Omit<RoundRecord, 'roundId'> {
  readonly roundId: string | null;
  readonly earlier: BeforeAttempt['earlier'];
  readonly rounds: readonly LastRoundRow[];
}

/** The skills of every exercise, as a constant of the plan: nothing of them is sent or read again. */
const skillsConstant = `'${JSON.stringify(skillsByExercise).replaceAll("'", "''")}'::jsonb`;

const before: Prepared = {
  name: 'before-attempt',
  text: `
  select ${roundColumns},
    (select json_build_object('bodyHash', k.body_hash, 'reply', k.answer)
      from request_keys k where k.learner_id = l.id and k.key = $3) as earlier,
    coalesce((
      select json_agg(last) from (${lastRoundsOf(
        'l.id',
        `jsonb_array_elements_text(coalesce(${skillsConstant} -> r.exercise_id, '[]'))`,
      )}) last), '[]') as rounds
  from learners l left join rounds r on r.id = $2 and r.learner_id = l.id
  where l.id = $1`,
};

/** Everything that one attempt writes. */
export interface AttemptRecord {
  readonly attemptId: string;
  readonly roundId: string;
  readonly learnerId: string;
  readonly exerciseId: string;
  readonly response: object;
  readonly marking: KeptMarking;
  readonly unaided: boolean;
  readonly closesRound: boolean;
  readonly counts: boolean;
  readonly answeredAt: string | null;
  readonly createdAt: Date;
  readonly key: string;
  readonly bodyHash: string;
  readonly answer: object;
  readonly facts: readonly SkillRound[];
}

/**
 * Keeps an attempt with its marking, closes the round, notes what it showed of each skill, counts
 * it for every assignment open to the learner, and remembers the answer for the request's key: one
 * statement, so that all of it is there or none. Answers what it counts for and what not; null when
 * the round was closed meanwhile. Throws a unique violation when the key, or a number of a counted
 * attempt, was taken meanwhile.
 */
export async function insertAttempt(
  record: AttemptRecord,
  transaction?: Transaction,
): Promise<AttemptReply['counting'] | null> {
  const kept = await preparedRow<{ counting: AttemptReply['counting'] }>(
    insertion,
    [
      record.attemptId,
      record.roundId,
      record.learnerId,
      record.exerciseId,
      JSON.stringify(record.response),
      JSON.stringify(record.marking),
      record.marking.verdict,
      record.marking.score,
      record.unaided,
      record.closesRound,
      record.answeredAt,
      record.createdAt,
      record.key,
      record.bodyHash,
      JSON.stringify(record.answer),
      JSON.stringify(record.facts),
      record.counts,
    ],
    transaction,
  );
  return kept?.counting ?? null;
}

const insertion: Prepared = {
  name: 'insert-attempt',
  text: `
  with open_round as (
    select id, learner_id, exercise_id from rounds
    where id = $2 and learner_id = $3 and exercise_id = $4 and closed_at is null
    for update
  ), kept as (
    insert into attempts (id, round_id, learner_id, exercise_id, response, marking, verdict, credit,
      unaided, closes_round, answered_at, created_at)
    select $1, id, learner_id, exercise_id, $5::jsonb, $6::jsonb, $7, $8, $9, $10, $11, $12
    from open_round
    returning id, round_id, learner_id, exercise_id
  ), closed as (
    update rounds set closed_at = greatest($12::timestamptz, opened_at)
    from kept where rounds.id = kept.round_id and $10::boolean
    returning rounds.id
  ), facts as (
    insert into skill_facts (round_id, learner_id, closed_at, skill, was_right, unaided, attempts)
    select kept.round_id, kept.learner_id, $12, f.skill, f."right", f.unaided,
      (select count(*) + 1 from attempts before where before.round_id = $2)
    from kept, jsonb_to_recordset($16::jsonb) as f (skill text, "right" boolean, unaided boolean)
    returning skill
  ), asked as (
    select i.id as item_id, g.name as class_name, a.attempts_allowed,
      greatest(a.due_at, e.due_at) as due_at, taken.n as taken,
      case
        when a.late_work = 'closed' and $12 > greatest(a.due_at, e.due_at) then 'closed'
        when taken.n >= a.attempts_allowed then 'none left'
        else 'counted'
      end as outcome
    from kept
    join assignment_items i on i.exercise_id = kept.exercise_id
    join assignments a on a.id = i.assignment_id and a.opens_at <= $12 and a.withdrawn_at is null
    join class_groups g on g.id = a.class_id and g.archived_at is null
    join memberships m on m.class_id = a.class_id and m.role = 'learner' and m.left_at is null
    join learners l on l.person_id = m.person_id and l.id = kept.learner_id
    left join extensions e on e.assignment_id = a.id and e.learner_id = kept.learner_id
    cross join lateral (
      select coalesce(max(c.n), 0) as n from counted_attempts c
      where c.item_id = i.id and c.learner_id = kept.learner_id) taken
    where $17::boolean and (not a.for_chosen_learners or exists (
      select 1 from assignment_learners x
      where x.assignment_id = a.id and x.learner_id = kept.learner_id))
  ), counted as (
    insert into counted_attempts (item_id, learner_id, n, attempt_id, late)
    select asked.item_id, kept.learner_id, asked.taken + 1, kept.id, $12 > asked.due_at
    from asked, kept where asked.outcome = 'counted'
    returning n
  ), told as (
    select coalesce(jsonb_agg(jsonb_build_object(
      'className', class_name, 'outcome', outcome, 'allowed', attempts_allowed,
      'n', case outcome when 'counted' then taken + 1 else taken end, 'late', $12 > due_at)
      order by due_at, item_id), '[]') as counting
    from asked
  ), remembered as (
    insert into request_keys (learner_id, key, body_hash, attempt_id, answer, created_at)
    select learner_id, $13, $14, id, $15::jsonb || jsonb_build_object('counting', told.counting), $12
    from kept, told
    returning key
  )
  select kept.id, told.counting from kept, told`,
};
