import 'server-only';
import type { Transaction } from 'sequelize';
import { row } from '@/lib/db/query';
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
  const found = await row<BeforeRow>(
    beforeSql,
    [learnerId, roundId, key, JSON.stringify(skillsByExercise)],
    transaction,
  );
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

const beforeSql = `
  select ${roundColumns},
    (select json_build_object('bodyHash', k.body_hash, 'reply', k.answer)
      from request_keys k where k.learner_id = l.id and k.key = $3) as earlier,
    coalesce((
      select json_agg(last) from (${lastRoundsOf(
        'l.id',
        "jsonb_array_elements_text(coalesce($4::jsonb -> r.exercise_id, '[]'))",
      )}) last), '[]') as rounds
  from learners l left join rounds r on r.id = $2 and r.learner_id = l.id
  where l.id = $1`;

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
 * statement, so that all of it is there or none. False when the round was closed meanwhile. Throws
 * a unique violation when the key, or a number of a counted attempt, was taken meanwhile.
 */
export async function insertAttempt(
  record: AttemptRecord,
  transaction?: Transaction,
): Promise<boolean> {
  const kept = await row<{ id: string }>(
    insertAttemptSql,
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
  return kept !== null;
}

const insertAttemptSql = `
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
  ), counted as (
    insert into counted_attempts (item_id, learner_id, n, attempt_id, late)
    select open_item.id, kept.learner_id, open_item.taken + 1, kept.id, $12 > open_item.due_at
    from kept, lateral (
      select i.id, coalesce(e.due_at, a.due_at) as due_at, a.late_work, a.attempts_allowed, (
        select coalesce(max(c.n), 0) from counted_attempts c
        where c.item_id = i.id and c.learner_id = kept.learner_id) as taken
      from assignment_items i
      join assignments a on a.id = i.assignment_id
      join class_groups g on g.id = a.class_id
      join memberships m on m.class_id = a.class_id and m.role = 'learner' and m.left_at is null
      join learners l on l.person_id = m.person_id and l.id = kept.learner_id
      left join extensions e on e.assignment_id = a.id and e.learner_id = kept.learner_id
      where i.exercise_id = kept.exercise_id and a.opens_at <= $12 and a.withdrawn_at is null
        and g.archived_at is null and (not a.for_chosen_learners or exists (
          select 1 from assignment_learners x
          where x.assignment_id = a.id and x.learner_id = kept.learner_id))
    ) open_item
    where $17::boolean
      and (open_item.late_work = 'marked' or $12 <= open_item.due_at)
      and (open_item.attempts_allowed is null or open_item.taken < open_item.attempts_allowed)
    returning n
  ), remembered as (
    insert into request_keys (learner_id, key, body_hash, attempt_id, answer, created_at)
    select learner_id, $13, $14, id, $15::jsonb, $12 from kept
    returning key
  )
  select id from kept`;
