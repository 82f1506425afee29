import { finiteResult } from '@/lib/numeric/finite-result';
import { itemAt } from '@/lib/numeric/item-at';
import type { DriverAndDriven } from '@/lib/kinematics/train/ratio';

/**
 * Drivers and driven wheels set in pairs so that the widest pair is as narrow as can be; null if
 * even that one has more teeth together than `mostTeeth`.
 *
 * The largest driver goes with the smallest driven wheel, and so on: crossing two such pairs never
 * makes the wider of them narrower. Both lists have one length.
 *
 * @example pairedWithin([10, 30], [20, 60], 70) // → [[30, 20], [10, 60]]
 */
export function pairedWithin(
  drivers: readonly number[],
  driven: readonly number[],
  mostTeeth: number,
): readonly DriverAndDriven[] | null {
  const falling = drivers.toSorted((a, b) => b - a);
  const rising = driven.toSorted((a, b) => a - b);
  const pairs = falling.map((driver, index): DriverAndDriven => [driver, itemAt(rising, index)]);
  finiteResult('pairedWithin', pairs);
  return pairs.every(([driver, other]) => driver + other <= mostTeeth) ? pairs : null;
}
