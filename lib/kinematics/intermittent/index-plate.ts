import { requireCount } from '@/lib/numeric/require';

/** How the handle moves for each division, or why no ring of holes serves. */
export type IndexMove =
  | {
      readonly outcome: 'moves';
      /** Whole turns of the handle, and holes beyond them on the ring. */
      readonly turns: number;
      readonly holes: number;
      readonly ring: number;
    }
  /** No ring serves: one is needed whose holes are a multiple of this. */
  | { readonly outcome: 'no-ring'; readonly multipleOf: number };

/**
 * The turns and holes that bring up the next of `divisions`, the handle turning `ratio` times for
 * one round of the work; the first of `rings` that serves is taken.
 *
 * A ratio of 1 is a plate on the work itself. If the turns are whole, any ring serves.
 *
 * @throws RangeError for counts that are none.
 * @see R/n = t + j/h with h a multiple of n/gcd(R, n): exact arithmetic.
 * @example indexMove(40, 24, [20, 30, 36]) // → { outcome: 'moves', turns: 1, holes: 20, ring: 30 }
 * @example indexMove(40, 23, [20, 30, 36]) // → { outcome: 'no-ring', multipleOf: 23 }
 */
export function indexMove(ratio: number, divisions: number, rings: readonly number[]): IndexMove {
  requireCount('indexMove', 'ratio', ratio);
  requireCount('indexMove', 'divisions', divisions);
  for (const ring of rings) requireCount('indexMove', 'ring', ring);
  const common = greatestCommonFactor(ratio, divisions);
  const multipleOf = divisions / common;
  const ring = rings.find((holes) => holes % multipleOf === 0);
  if (ring === undefined) return { outcome: 'no-ring', multipleOf };
  const turns = Math.floor(ratio / divisions);
  const rest = ratio / common - turns * multipleOf;
  return { outcome: 'moves', turns, holes: rest * (ring / multipleOf), ring };
}

/** One division by counting the nearest whole hole, and the error that it carries on. */
export interface NearestHole {
  /** Holes from the start, whole turns counted as a ring each. */
  readonly hole: number;
  /** How far the hole lies beyond the true place (behind it if < 0), in holes. */
  readonly error: number;
}

/**
 * The hole nearest to the place of a division on a ring that need not serve, and how far it misses.
 *
 * @throws RangeError for counts that are none, a division below 0.
 * @see i·R·h/n holes from the start: exact arithmetic.
 * @example nearestHole(40, 23, 30, 1) // → { hole: 52, error: -0.173913 }
 */
export function nearestHole(
  ratio: number,
  divisions: number,
  ring: number,
  division: number,
): NearestHole {
  requireCount('nearestHole', 'ratio', ratio);
  requireCount('nearestHole', 'divisions', divisions);
  requireCount('nearestHole', 'ring', ring);
  requireCount('nearestHole', 'division', division, 0);
  const dividend = requireCount('nearestHole', 'holes in all', division * ratio * ring, 0);
  const under = Math.floor(dividend / divisions);
  const over = dividend - under * divisions;
  const hole = 2 * over < divisions ? under : under + 1;
  return { hole, error: hole - under - over / divisions };
}

function greatestCommonFactor(a: number, b: number): number {
  let [x, y] = [a, b];
  while (y !== 0) [x, y] = [y, x % y];
  return x;
}
