import 'server-only';
import { randomInt } from 'node:crypto';
import { exercises } from '@/content/exercises/registry';
import { now as presentTime } from '@/lib/clock';
import { rows, transact } from '@/lib/db/query';
import type { ExerciseDefinition } from '@/lib/marking/definition';
import { drawVariant } from '@/lib/marking/draw';
import { hintsTotal } from '@/lib/marking/view';
import type { Viewer } from '@/lib/policy/viewer';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { RoundView } from '@/lib/schemas/round';
import {
  findLatestRecord,
  findRoundRecord,
  listLatestRecords,
  viewRound,
  type RoundRecord,
} from './round-record';
import { factsOf, insertFactsSql } from './skill-facts';

/** Which round is wanted. */
export interface RoundWanted {
  readonly exerciseId: string;
  /** By default the person's own. */
  readonly units?: UnitSystem;
}

/**
 * The viewer's round at an exercise as it stands, for a page to show: the open one, else the last;
 * null when there is none yet. Writes nothing.
 */
export async function findRound(viewer: Viewer, wanted: RoundWanted): Promise<RoundView | null> {
  const definition = exercises.get(wanted.exerciseId);
  if (definition === undefined) return null;
  const record = await findStanding(viewer, definition, wanted.units ?? viewer.units);
  return record === null ? null : viewRound(definition, record);
}

/**
 * The viewer's rounds at several exercises, each as `findRound` would give it, in one query; an
 * exercise without a round is not among them. Writes nothing.
 */
export async function listRounds(
  viewer: Viewer,
  exerciseIds: readonly string[],
  units: UnitSystem = viewer.units,
): Promise<RoundView[]> {
  const definitions = exerciseIds.flatMap((id) => exercises.get(id) ?? []);
  const records = await listLatestRecords(
    viewer.learnerId,
    definitions.map(({ id, version, kind }) => ({
      exerciseId: id,
      version,
      units: kind === 'prediction' ? null : units,
    })),
  );
  return records.flatMap((record) => {
    const definition = exercises.get(record.exerciseId);
    return definition === undefined ? [] : [viewRound(definition, record)];
  });
}

/**
 * Opens the viewer's round at an exercise, or answers the one that is open: asking again, or twice
 * at once, gives the same round. A prediction is made once; after that its round stays as it is.
 * Null when there is no such exercise.
 */
export async function openRound(
  viewer: Viewer,
  wanted: RoundWanted,
  now: Date = presentTime(),
  seed: number = randomInt(2 ** 31),
): Promise<RoundView | null> {
  const definition = exercises.get(wanted.exerciseId);
  if (definition === undefined) return null;
  const units = wanted.units ?? viewer.units;
  const standing = await findStanding(viewer, definition, units);
  if (standing !== null && (!standing.closed || definition.kind === 'prediction')) {
    return viewRound(definition, standing);
  }
  if (standing === null) await closeOlder(viewer, definition, now);
  await insertRound(viewer, definition, units, now, seed);
  const opened = await findStanding(viewer, definition, units);
  return opened === null ? null : viewRound(definition, opened);
}

/**
 * Records that a hint, counted from 1, was taken, in the open rounds of both units, and answers the
 * round with it. Hints come in order, one at a time. A closed round, or one with this hint taken, is
 * answered as it is; null when the viewer has no such round at this exercise.
 */
export async function takeHint(
  viewer: Viewer,
  exerciseId: string,
  roundId: string,
  hint: number,
): Promise<RoundView | null> {
  const definition = exercises.get(exerciseId);
  if (definition === undefined) return null;
  await rows(
    `with asked as (
       select least($4::int, $5::int, hints_taken + 1) as wanted from rounds
       where id = $1 and learner_id = $2 and exercise_id = $3 and closed_at is null
       for update)
     update rounds set hints_taken = greatest(rounds.hints_taken, asked.wanted)
     from asked
     where learner_id = $2 and exercise_id = $3 and closed_at is null
     returning id`,
    [roundId, viewer.learnerId, exerciseId, hintsTotal, hint],
  );
  const record = await findRoundRecord(viewer.learnerId, roundId);
  return record?.exerciseId === exerciseId ? viewRound(definition, record) : null;
}

/**
 * Shows the worked solution of the viewer's round, which closes it and gives up its unaided mark;
 * a round that is closed already is answered as it is. Null when there is no such round.
 */
export async function showSolution(
  viewer: Viewer,
  exerciseId: string,
  roundId: string,
  now: Date = presentTime(),
): Promise<RoundView | null> {
  const definition = exercises.get(exerciseId);
  if (definition === undefined) return null;
  return transact(async (transaction) => {
    const closed = await rows(
      `update rounds set solution_seen_at = $4, closed_at = $4
       where id = $1 and learner_id = $2 and exercise_id = $3 and closed_at is null returning id`,
      [roundId, viewer.learnerId, exerciseId, now],
      transaction,
    );
    const record = await findRoundRecord(viewer.learnerId, roundId, transaction);
    if (record?.exerciseId !== exerciseId) return null;
    if (closed.length > 0) {
      const facts = factsOf(definition, record.attempts.at(-1)?.marking, false, now);
      await rows(
        insertFactsSql,
        [roundId, viewer.learnerId, now, JSON.stringify(facts)],
        transaction,
      );
    }
    return viewRound(definition, record);
  });
}

/** The open round, else the last one, among those of the present version of the exercise. */
function findStanding(
  viewer: Viewer,
  { id, version, kind }: ExerciseDefinition,
  units: UnitSystem,
): Promise<RoundRecord | null> {
  return findLatestRecord(viewer.learnerId, id, version, kind === 'prediction' ? null : units);
}

/**
 * Draws a variant and keeps it with the words in which it was put, unless a round is open already.
 * Hints count across both units: a round opened beside another begins with the hints taken there.
 */
async function insertRound(
  { learnerId }: Viewer,
  definition: ExerciseDefinition,
  units: UnitSystem,
  now: Date,
  seed: number,
): Promise<void> {
  const variant = drawVariant(definition, seed, units);
  const shown = {
    title: definition.title,
    prompt: definition.prompt(variant),
    givens: definition.givens(variant),
  };
  await rows(
    `insert into rounds (learner_id, exercise_id, definition_version, units, seed, variant,
       shown, opened_at, hints_taken)
     select $1, $2, $3, $4, $5, $6::jsonb, $7::jsonb, $8, coalesce((
       select max(o.hints_taken) from rounds o
       where o.learner_id = $1 and o.exercise_id = $2 and o.closed_at is null), 0)
     on conflict (learner_id, exercise_id, units) where closed_at is null do nothing
     returning id`,
    [
      learnerId,
      definition.id,
      definition.version,
      units,
      seed,
      JSON.stringify(variant),
      JSON.stringify(shown),
      now,
    ],
  );
}

/** Rounds of an older version of their exercise can no longer be marked, and are closed. */
async function closeOlder(
  { learnerId }: Viewer,
  { id, version }: ExerciseDefinition,
  now: Date,
): Promise<void> {
  await rows(
    `update rounds set closed_at = greatest($4, opened_at)
     where learner_id = $1 and exercise_id = $2 and definition_version <> $3 and closed_at is null
     returning id`,
    [learnerId, id, version, now],
  );
}
