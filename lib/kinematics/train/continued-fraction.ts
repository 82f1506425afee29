import {
  fraction,
  isZero,
  subtract,
  divide,
  toNumber,
  decimalFraction,
} from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** The whole parts of a ratio, and the fraction at each rung. */
export interface ContinuedFraction {
  readonly quotients: readonly bigint[];
  /** No fraction with a smaller denominator comes nearer than a rung. */
  readonly rungs: readonly Fraction[];
}

/**
 * The first whole parts of a value and their rungs: whole part, turn over the rest, again.
 *
 * Ends early where the value is met exactly. Values below nought begin with the whole number below.
 *
 * @throws RangeError if `terms` is not a whole number of at least 1.
 * Source: Huygens 1703 for planetary trains; cases TN-CF-01 to 03.
 * @example continuedFraction({ numerator: 127n, denominator: 5n }, 3).quotients // → [25n, 2n, 2n]
 */
export function continuedFraction(value: Fraction, terms: number): ContinuedFraction {
  requireCount('continuedFraction', 'terms', terms);
  const quotients: bigint[] = [];
  const rungs: Fraction[] = [];
  let rest = value;
  let [p, lastP, q, lastQ] = [1n, 0n, 0n, 1n];
  while (quotients.length < terms) {
    const whole = floor(rest);
    quotients.push(whole);
    [p, lastP, q, lastQ] = [whole * p + lastP, p, whole * q + lastQ, q];
    rungs.push({ numerator: p, denominator: q });
    const over = subtract(rest, fraction(whole));
    if (isZero(over)) break;
    rest = divide(fraction(1), over);
  }
  return { quotients, rungs };
}

/**
 * The first rung of a number that lies within a share `tolerance` of it.
 *
 * The number is taken as it is written in decimals; `tolerance` is relative and may be as small as
 * one likes: the last rung is the number itself.
 *
 * @throws RangeError for a number or a tolerance that is not positive.
 * @example rungWithin(2.66666666667, 1e-9) // → { numerator: 8n, denominator: 3n }
 */
export function rungWithin(value: number, tolerance: number): Fraction {
  requireSize('rungWithin', 'value', value);
  requireSize('rungWithin', 'tolerance', tolerance);
  const exact = decimalFraction(value);
  const { rungs } = continuedFraction(exact, 10_000);
  return rungs.find((rung) => Math.abs(toNumber(rung) / value - 1) <= tolerance) ?? exact;
}

/**
 * What an error of ratio does in a given time: the share it is off, times the time.
 *
 * In the unit of `time`; positive when the reached ratio runs ahead.
 *
 * @throws RangeError for ratios that are not positive.
 * Source: drift = time·(reached/wanted − 1) (lesson 2.3).
 * @example driftOf(59 / 57, 1.03505, 1440) // → 0.0524765
 */
export function driftOf(reached: number, wanted: number, time: number): number {
  requireSize('driftOf', 'reached', reached);
  requireSize('driftOf', 'wanted', wanted);
  requireMeasure('driftOf', 'time', time);
  return time * ((reached - wanted) / wanted);
}

function floor(value: Fraction): bigint {
  const whole = value.numerator / value.denominator;
  return value.numerator < 0n && whole * value.denominator !== value.numerator ? whole - 1n : whole;
}
