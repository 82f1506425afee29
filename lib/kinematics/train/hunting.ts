import { greatestCommonDivisor } from '@/lib/numeric/fraction';
import { requireCount } from '@/lib/numeric/require';

/** How often the same two teeth of a pair meet. */
export interface HuntingTeeth {
  /** Turns of each wheel until the same two teeth meet again. */
  readonly firstTurns: number;
  readonly secondTurns: number;
  /** Whether every tooth of one meets every tooth of the other, so that they wear alike. */
  readonly hunting: boolean;
}

/**
 * How many turns pass before the same two teeth meet again.
 *
 * @throws RangeError for counts that are not whole.
 * Source: least common multiple over the own count; cases TN-HT-01 and 02.
 * @example huntingTeeth(24, 60) // → { firstTurns: 5, secondTurns: 2, hunting: false }
 */
export function huntingTeeth(firstTeeth: number, secondTeeth: number): HuntingTeeth {
  const first = requireCount('huntingTeeth', 'firstTeeth', firstTeeth);
  const second = requireCount('huntingTeeth', 'secondTeeth', secondTeeth);
  const shared = Number(greatestCommonDivisor(BigInt(first), BigInt(second)));
  return { firstTurns: second / shared, secondTurns: first / shared, hunting: shared === 1 };
}
