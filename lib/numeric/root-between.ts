import { findRoot } from '@/lib/numeric/root';

/**
 * The root of a continuous function between two places, where the caller knows that it changes sign.
 *
 * @throws RangeError naming `caller` if it does not, for then the arguments overflow or underflow.
 * @example rootBetween('f', (x) => x * x - 2, 1, 2) // → 1.41421356237
 */
export function rootBetween(
  caller: string,
  f: (x: number) => number,
  low: number,
  high: number,
): number {
  const found = findRoot(f, low, high);
  if (found.outcome === 'found') return found.x;
  throw new RangeError(`${caller}: ${found.outcome} from ${low} to ${high}; expected a root there`);
}
