import { rungWithin } from '@/lib/kinematics/train/continued-fraction';
import type { NoWholeWheel } from '@/lib/kinematics/train/ratio';
import { fraction, greatestCommonDivisor, multiply } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Two pairs whose first and last arbor stand in one line. */
export interface RevertedTeeth {
  readonly firstPinion: number;
  readonly firstWheel: number;
  readonly secondPinion: number;
  readonly secondWheel: number;
  /** Teeth of either pair together; equal, as the modules are. */
  readonly toothSum: number;
}

/** The wheel that closes a reverted train of two modules. */
export type ClosingWheel =
  | {
      readonly outcome: 'closes';
      readonly teeth: number;
      readonly centreDistance: number;
      /** Turns of the first arbor for one of the last. */
      readonly reduction: Fraction;
    }
  /** No whole wheel closes; the nearest counts miss the centres by these lengths. */
  | NoWholeWheel
  /** The third wheel alone is too large, by `overlap`. */
  | { readonly outcome: 'no-room'; readonly overlap: number };

/** A stage ratio is read as the nearest fraction this near: 2.6667 written long is 8/3. */
const ratioTolerance = 1e-9;
/** As for an idler: far below any saw, far above rounding. */
const wholeTolerance = 1e-6;

/**
 * The smallest wheels of two reduction stages of one module between the same two arbors.
 *
 * `firstStage` and `secondStage` are driven over driver; every wheel has at least `fewest` teeth.
 *
 * @throws RangeError for nonsense.
 * Source: Shigley, reverted train of 30:1; z₁(1 + i₁) = z₃(1 + i₂); cases TN-RV-01 and 02.
 * @example revertedTeeth(6, 5, 16).toothSum // → 126
 */
export function revertedTeeth(
  firstStage: number,
  secondStage: number,
  fewest: number,
): RevertedTeeth {
  const first = rungWithin(requireSize('revertedTeeth', 'firstStage', firstStage), ratioTolerance);
  const second = rungWithin(
    requireSize('revertedTeeth', 'secondStage', secondStage),
    ratioTolerance,
  );
  const least = BigInt(requireCount('revertedTeeth', 'fewest', fewest));
  const [firstSum, secondSum] = [sum(first), sum(second)];
  const shared = greatestCommonDivisor(firstSum, secondSum);
  const [a, b] = [secondSum / shared, firstSum / shared];
  const smallest = [
    first.denominator * a,
    first.numerator * a,
    second.denominator * b,
    second.numerator * b,
  ];
  const lowest = smallest.reduce((low, teeth) => (teeth < low ? teeth : low));
  const times = (least + lowest - 1n) / lowest;
  const [firstPinion = 0, firstWheel = 0, secondPinion = 0, secondWheel = 0] = smallest.map(
    (teeth) => Number(teeth * times),
  );
  return { firstPinion, firstWheel, secondPinion, secondWheel, toothSum: firstPinion + firstWheel };
}

/**
 * The last wheel of a reverted train whose two pairs have modules of their own.
 *
 * @throws RangeError for nonsense.
 * Source: m₁(z₁ + z₂) = m₂(z₃ + z₄); case TN-RC-01.
 * @example closingWheel({ firstModule: 2, firstPinion: 20, firstWheel: 70, secondModule: 3, secondPinion: 16 }).outcome // → 'closes'
 */
export function closingWheel(train: {
  readonly firstModule: number;
  readonly firstPinion: number;
  readonly firstWheel: number;
  readonly secondModule: number;
  readonly secondPinion: number;
}): ClosingWheel {
  const caller = 'closingWheel';
  const firstModule = requireSize(caller, 'firstModule', train.firstModule);
  const secondModule = requireSize(caller, 'secondModule', train.secondModule);
  const first = requireCount(caller, 'firstPinion', train.firstPinion);
  const second = requireCount(caller, 'firstWheel', train.firstWheel);
  const third = requireCount(caller, 'secondPinion', train.secondPinion);
  const centreDistance = (firstModule * (first + second)) / 2;
  const exact = (2 * centreDistance) / secondModule - third;
  if (exact <= 0) return { outcome: 'no-room', overlap: (-exact * secondModule) / 2 };
  const teeth = Math.round(exact);
  if (teeth > 0 && Math.abs(exact - teeth) <= wholeTolerance) {
    const reduction = multiply(fraction(second, first), fraction(teeth, third));
    return { outcome: 'closes', teeth, centreDistance, reduction };
  }
  const below = Math.floor(exact);
  return {
    outcome: 'no-whole-wheel',
    exact,
    below,
    gap: ((exact - below) * secondModule) / 2,
    above: below + 1,
    excess: ((below + 1 - exact) * secondModule) / 2,
  };
}

function sum(stage: Fraction): bigint {
  return stage.numerator + stage.denominator;
}
