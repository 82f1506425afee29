import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows } from '@/lib/db/query';
import type { ExerciseDefinition, Variant } from '@/lib/marking/definition';
import type { Marking } from '@/lib/marking/marking';
import { roundView } from '@/lib/marking/view';
import type { AttemptView, RoundView } from '@/lib/schemas/round';

/** A marking as it is kept with its attempt. */
export type KeptMarking = Omit<Marking, 'outcome'>;

/** How many attempts of a round travel with it; what went before is in the record. */
export const attemptsShown = 10;

/** A round as the record has it, with its latest attempts, the last one last. */
export interface RoundRecord {
  readonly roundId: string;
  readonly exerciseId: string;
  readonly variant: Variant;
  readonly hintsTaken: number;
  readonly solutionSeen: boolean;
  readonly closed: boolean;
  readonly attempts: readonly {
    readonly attemptId: string;
    readonly createdAt: string;
    readonly marking: KeptMarking;
  }[];
}

/** The columns of a `RoundRecord`, from `r` (rounds). */
export const roundColumns = `
  r.id as "roundId", r.exercise_id as "exerciseId", r.variant, r.hints_taken as "hintsTaken",
  r.solution_seen_at is not null as "solutionSeen", r.closed_at is not null as closed,
  coalesce((
    select json_agg(json_build_object(
      'attemptId', a.id, 'createdAt', a.created_at, 'marking', a.marking) order by a.created_at)
    from (
      select id, created_at, marking from attempts
      where round_id = r.id order by created_at desc limit ${attemptsShown}) a), '[]') as attempts`;

/** The learner's own round by its id, or null. */
export function findRoundRecord(
  learnerId: string,
  roundId: string,
  transaction?: Transaction,
): Promise<RoundRecord | null> {
  return row<RoundRecord>(
    `select ${roundColumns} from rounds r where r.id = $1 and r.learner_id = $2`,
    [roundId, learnerId],
    transaction,
  );
}

/**
 * The learner's latest round at this version of an exercise, an open one first; in any units when
 * none are given.
 */
export function findLatestRecord(
  learnerId: string,
  exerciseId: string,
  version: number,
  units: string | null,
  transaction?: Transaction,
): Promise<RoundRecord | null> {
  return row<RoundRecord>(
    `select ${roundColumns} from rounds r
     where r.learner_id = $1 and r.exercise_id = $2 and r.definition_version = $3
       and ($4::text is null or r.units = $4)
     order by r.closed_at is null desc, r.opened_at desc limit 1`,
    [learnerId, exerciseId, version, units],
    transaction,
  );
}

/** Which rounds are wanted: of one version of an exercise, in some units or (null) in any. */
export interface RecordWanted {
  readonly exerciseId: string;
  readonly version: number;
  readonly units: string | null;
}

/** The learner's latest round at each of these exercises, an open one first. */
export function listLatestRecords(
  learnerId: string,
  wanted: readonly RecordWanted[],
): Promise<RoundRecord[]> {
  return rows<RoundRecord>(
    `select distinct on (r.exercise_id) ${roundColumns}
     from unnest($2::text[], $3::int[], $4::text[]) wanted (exercise_id, version, units)
     join rounds r on r.learner_id = $1 and r.exercise_id = wanted.exercise_id
       and r.definition_version = wanted.version
       and (wanted.units is null or r.units = wanted.units)
     order by r.exercise_id, r.closed_at is null desc, r.opened_at desc`,
    [
      learnerId,
      wanted.map(({ exerciseId }) => exerciseId),
      wanted.map(({ version }) => version),
      wanted.map(({ units }) => units),
    ],
  );
}

/** The round as its learner sees it: nothing of the answer, and no slip not yet made. */
export function viewRound(definition: ExerciseDefinition, record: RoundRecord): RoundView {
  return roundView(definition, record.variant, {
    roundId: record.roundId,
    hintsTaken: record.hintsTaken,
    solutionSeen: record.solutionSeen,
    closed: record.closed,
    attempts: record.attempts.map(({ attemptId, createdAt, marking }) =>
      viewAttempt(attemptId, createdAt, marking),
    ),
  });
}

/** An attempt as its learner sees it. */
export function viewAttempt(
  attemptId: string,
  createdAt: string,
  { verdict, parts, message, nextStep, closesRound }: KeptMarking,
): AttemptView {
  return {
    attemptId,
    createdAt: new Date(createdAt).toISOString(),
    verdict,
    parts: [...parts],
    message,
    nextStep,
    closesRound,
  };
}
