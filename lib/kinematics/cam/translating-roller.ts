import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';

/**
 * A cam's base circle and a roller that slides along y above it: a knife edge is a roller of
 * radius 0. An offset above 0 puts its line to the side (+x) where the rim goes up with the rise.
 */
export interface TranslatingRoller {
  readonly baseRadius: number;
  readonly rollerRadius: number;
  readonly offset: number;
}

/** The roller misses the base circle, by `gap`: its line runs too far beside the axle. */
export interface OutOfReach {
  readonly outcome: 'out-of-reach';
  readonly gap: number;
}

/** The height of the roller's centre over the axle at the lowest place, or that it has none. */
export type RestHeight =
  { readonly outcome: 'rests'; readonly height: number; readonly primeRadius: number } | OutOfReach;

/**
 * The height of the roller's centre at the lowest place, √((R_b + ρ)² − e²).
 *
 * @throws RangeError for a base radius of 0 or less, a roller below 0, an offset that is no number.
 * @example restHeight({ baseRadius: 40, rollerRadius: 10, offset: 30 }) // → { outcome: 'rests', height: 40, primeRadius: 50 }
 */
export function restHeight(follower: TranslatingRoller): RestHeight {
  const { baseRadius, rollerRadius, offset } = follower;
  requirePositive('restHeight', 'baseRadius', baseRadius);
  requireNonNegative('restHeight', 'rollerRadius', rollerRadius);
  requireFinite('restHeight', 'offset', offset);
  const primeRadius = finiteResult('restHeight', baseRadius + rollerRadius);
  const gap = Math.abs(offset) - primeRadius;
  if (gap >= 0) return finiteResult('restHeight', { outcome: 'out-of-reach', gap });
  const height = Math.sqrt(primeRadius - offset) * Math.sqrt(primeRadius + offset);
  return { outcome: 'rests', height, primeRadius };
}
