import { trainProduct } from '@/lib/kinematics/train/ratio';
import type { DriverAndDriven } from '@/lib/kinematics/train/ratio';
import { fraction, multiply, toNumber } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** The beat of a clock and the pendulum that keeps it. */
export interface ClockBeats {
  /** Beats in one turn of the centre wheel, exactly: two for each tooth of the escape wheel. */
  readonly beatsPerTurn: Fraction;
  readonly beatsPerHour: number;
  /** Seconds. */
  readonly beat: number;
  /** Length of the simple pendulum, millimetres. */
  readonly pendulum: number;
}

/** Standard fall, millimetres a second squared: 9.80665 m/s² (ISO 80000-3). */
export const standardFall = 9806.65;

/**
 * The beat of a clock from its wheels: `pairs` from the centre wheel, which turns once an hour, to
 * the escape wheel, each wheel with the pinion that it drives.
 *
 * @throws RangeError for nonsense.
 * Source: two beats a tooth; pendulum g(t/π)² for a beat t; cases TN-CK-01 and 02.
 * @example clockBeats([[64, 8], [60, 8]], 30).beatsPerHour // → 3600
 */
export function clockBeats(pairs: readonly DriverAndDriven[], escapeTeeth: number): ClockBeats {
  const teeth = requireCount('clockBeats', 'escapeTeeth', escapeTeeth);
  const train = pairs.length === 0 ? fraction(1) : trainProduct(pairs);
  const beatsPerTurn = multiply(train, fraction(2 * teeth));
  const beatsPerHour = toNumber(beatsPerTurn);
  const beat = 3600 / beatsPerHour;
  return { beatsPerTurn, beatsPerHour, beat, pendulum: pendulumForBeat(beat) };
}

/**
 * Length of the simple pendulum that beats once in `beat` seconds, in millimetres.
 *
 * @throws RangeError for a beat that is not positive.
 * Source: Huygens: one way takes π√(l/g), for small swings.
 * @example pendulumForBeat(1) // → 993.621385566
 */
export function pendulumForBeat(beat: number): number {
  return standardFall * (requireSize('pendulumForBeat', 'beat', beat) / Math.PI) ** 2;
}

/**
 * Beat, in seconds, of a simple pendulum of a length in millimetres.
 *
 * @throws RangeError for a length that is not positive.
 * @example beatOfPendulum(993.621385566) // → 1
 */
export function beatOfPendulum(length: number): number {
  return Math.PI * Math.sqrt(requireSize('beatOfPendulum', 'length', length) / standardFall);
}
