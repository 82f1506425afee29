import { analyseTrain } from '@/lib/kinematics/train/graph';
import type { Shares, Train, TrainAnalysis, TrainMesh } from '@/lib/kinematics/train/graph';
import { finiteResult } from '@/lib/numeric/finite-result';
import { isZero, toNumber } from '@/lib/numeric/fraction';
import { itemAt } from '@/lib/numeric/item-at';
import { requireMeasure } from '@/lib/numeric/moderate';

/** What becomes of a train when its drives are turned. */
export type TrainTurns =
  | { readonly outcome: 'turns'; readonly turns: ReadonlyMap<string, number> }
  /** The drives leave some bodies free: nothing turns those. */
  | {
      readonly outcome: 'partly-free';
      readonly turns: ReadonlyMap<string, number>;
      readonly free: readonly string[];
      /** How many further drives would settle them. */
      readonly freedom: number;
    }
  /** The train cannot turn like that; `excess` is the turns by which its demands contradict. */
  | { readonly outcome: 'locked'; readonly excess: number };

/** Drives that were rounded to doubles may miss an exact demand by this share of their size. */
const driveTolerance = 1e-12;

/**
 * The turns (or speeds) of every body of a train.
 *
 * `drives` gives the turns of each driven body, in any one unit of turning; the answers are in the
 * same unit, absolute, with the same sense positive.
 *
 * - `turns`: every body's turns.
 * - `partly-free`: those that are settled, and the names of those that nothing turns.
 * - `locked`: the meshes contradict each other or the drives, as three wheels in a ring do.
 *
 * @throws RangeError for nonsense, and for a driven body without a value in `drives`.
 * @example turnsOfTrain({ meshes: [{ first: 'a', firstTeeth: 20, second: 'b', secondTeeth: 40 }], driven: ['a'] }, { a: 4 }).outcome // → 'turns'
 */
export function turnsOfTrain(train: Train, drives: Readonly<Record<string, number>>): TrainTurns {
  const values = train.driven.map((body) =>
    requireMeasure('turnsOfTrain', `drive of ${body}`, drives[body] ?? Number.NaN),
  );
  return turnsOfAnalysis(analyseTrain(train), values);
}

/**
 * The turns of bodies in mesh when some are held and some are driven: `turnsOfTrain` in one breath.
 *
 * @throws RangeError as `turnsOfTrain` does.
 * @example turnsOfMeshes([{ first: 'a', firstTeeth: 20, second: 'b', secondTeeth: 40 }], { a: 4 }).outcome // → 'turns'
 */
export function turnsOfMeshes(
  meshes: readonly TrainMesh[],
  drives: Readonly<Record<string, number>>,
  held: readonly string[] = [],
): TrainTurns {
  return turnsOfTrain({ meshes, driven: Object.keys(drives), held }, drives);
}

/**
 * The same from an analysis already made, for a picture that asks many times a second.
 *
 * `values` are the turns of the driven bodies in the order of the train's `driven`.
 *
 * @throws RangeError for a value that is no number.
 * @example turnsOfAnalysis({ bodies: [], shares: new Map(), free: [], freedom: 0, demands: [] }, []).outcome // → 'turns'
 */
export function turnsOfAnalysis(analysis: TrainAnalysis, values: readonly number[]): TrainTurns {
  values.forEach((value) => requireMeasure('turnsOfAnalysis', 'value', value));
  const excess = Math.max(0, ...analysis.demands.map((demand) => excessOf(demand, values)));
  if (excess > 0) return { outcome: 'locked', excess };
  const turns = new Map<string, number>();
  analysis.shares.forEach((shares, body) => turns.set(body, weighted(shares, values)));
  if (analysis.free.length === 0) return { outcome: 'turns', turns };
  return { outcome: 'partly-free', turns, free: analysis.free, freedom: analysis.freedom };
}

function weighted(shares: Shares, values: readonly number[]): number {
  const sum = shares.reduce(
    (turns, share, drive) =>
      isZero(share) ? turns : turns + toNumber(share) * itemAt(values, drive),
    0,
  );
  return finiteResult('turnsOfTrain', sum);
}

function excessOf(demand: Shares, values: readonly number[]): number {
  const size = demand.reduce(
    (sum, share, drive) => sum + Math.abs(toNumber(share) * itemAt(values, drive)),
    0,
  );
  const excess = Math.abs(weighted(demand, values));
  return excess > driveTolerance * size ? excess : 0;
}
