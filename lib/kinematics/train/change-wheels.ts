import { decimalFraction, divide, multiply } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireSize } from '@/lib/numeric/moderate';

/**
 * Turns of a lead screw for one turn of the spindle, to cut a metric pitch on an inch screw.
 *
 * `leadThreads` are the lead screw's threads an inch, `pitch` the wanted one in millimetres, both as
 * they are written; an inch is 25.4 mm exactly, and so the answer is exact.
 *
 * @throws RangeError for nonsense.
 * Source: case TN-CG-01.
 * @example changeWheelRatio(8, 1.5) // → { numerator: 60n, denominator: 127n }
 */
export function changeWheelRatio(leadThreads: number, pitch: number): Fraction {
  const threads = requireSize('changeWheelRatio', 'leadThreads', leadThreads);
  const wanted = requireSize('changeWheelRatio', 'pitch', pitch);
  return divide(multiply(decimalFraction(wanted), decimalFraction(threads)), decimalFraction(25.4));
}
