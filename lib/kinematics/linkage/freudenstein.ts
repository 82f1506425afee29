import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { solveLinear } from '@/lib/numeric/linear';
import type { FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';

/** Directions of crank and rocker that belong together, radians. */
export interface AnglePair {
  readonly crank: number;
  readonly rocker: number;
}

export type SynthesisOutcome =
  /** A negative crank or rocker stands for one whose direction is the other way (half a turn on). */
  | {
      readonly outcome: 'bars';
      readonly bars: FourBarLengths;
      readonly crankReversed: boolean;
      readonly rockerReversed: boolean;
    }
  /** The three pairs do not settle the bars: the equations depend on one another. */
  | { readonly outcome: 'undetermined' }
  /** They ask for bars of no end, or a coupler whose square is negative by `by` (of the frame's square). */
  | { readonly outcome: 'impossible'; readonly by: number };

/** Pivot of the scaled equations under which they count as one another's copies. */
const DEPENDENT = 1e-10;

/**
 * The four-bar on a given frame that passes through three pairs of crank and rocker directions.
 *
 * Frame as `fourBarPosition`. Branch and order are not looked at: try the result. Outcomes: `bars`,
 * `undetermined`, `impossible`. Throws `RangeError` for a frame that is not positive.
 * Source: F. Freudenstein, 1955: K1·cos θ4 − K2·cos θ2 + K3 = cos(θ2 − θ4).
 * @example fourBarThroughPairs(100, [{ crank: radians(30), rocker: radians(55.2677772232) }, { crank: radians(60), rocker: radians(64.9434811058) }, { crank: radians(95), rocker: radians(82.9567636727) }]).bars // → { crank: 40.00000, coupler: 120.00000, rocker: 80.00000, frame: 100 }
 */
export function fourBarThroughPairs(
  frame: number,
  pairs: readonly [AnglePair, AnglePair, AnglePair],
): SynthesisOutcome {
  requireSize('fourBarThroughPairs', 'frame', frame);
  const matrix = new Float64Array(9);
  const right = new Float64Array(4);
  pairs.forEach(({ crank, rocker }, k) => {
    requireMeasure('fourBarThroughPairs', 'crank', crank);
    requireMeasure('fourBarThroughPairs', 'rocker', rocker);
    matrix.set([Math.cos(rocker), -Math.cos(crank), 1], 3 * k);
    right[k] = Math.cos(crank - rocker);
  });
  solveLinear(matrix, right, 3);
  const [k1 = 0, k2 = 0, k3 = 0, pivot = 0] = right;
  if (pivot < DEPENDENT) return { outcome: 'undetermined' };
  if (Math.abs(k1) < DEPENDENT || Math.abs(k2) < DEPENDENT) return { outcome: 'impossible', by: 0 };
  const [a, c] = [1 / k1, 1 / k2];
  const squared = a * a + c * c + 1 - 2 * a * c * k3;
  if (squared <= 0) return { outcome: 'impossible', by: -squared };
  return {
    outcome: 'bars',
    bars: {
      crank: Math.abs(a) * frame,
      coupler: Math.sqrt(squared) * frame,
      rocker: Math.abs(c) * frame,
      frame,
    },
    crankReversed: a < 0,
    rockerReversed: c < 0,
  };
}
