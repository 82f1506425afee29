import { beltLoop } from '@/lib/kinematics/belt/two-wheels';
import type { Lay } from '@/lib/kinematics/belt/two-wheels';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';
import { rootBetween } from '@/lib/numeric/root-between';

/** One step of a pair of cones, by diameter. */
export interface ConeStep {
  readonly driver: number;
  readonly driven: number;
}

/** A step that takes a loop at a ratio, or the amount by which none does. */
export type StepForLoop =
  | ({ readonly outcome: 'step' } & ConeStep)
  /** The loop is so long that the wheels would meet: it hangs `slack` then. */
  | { readonly outcome: 'loop-too-long'; readonly slack: number }
  /** The loop does not even go to the other shaft and back: it lacks `lacking`. */
  | { readonly outcome: 'loop-too-short'; readonly lacking: number };

/** Cones on which one loop fits every step. */
export type SteppedCones =
  | { readonly outcome: 'cones'; readonly steps: readonly ConeStep[]; readonly length: number }
  /** The wheels of the first step overlap. */
  | { readonly outcome: 'wheels-meet'; readonly overlap: number }
  /** Step `step` (from 0) finds no wheels for the loop of the first. */
  | { readonly outcome: 'no-step'; readonly step: number; readonly slack: number };

/**
 * Stepped cones for one loop: the first step's driver and every step's ratio are given.
 *
 * Diameters; a ratio is driver speed over driven speed, driven diameter over driver's.
 *
 * @throws RangeError for nonsense or no ratio at all.
 * Source: Khurmi and Gupta: crossed, the sum stays; open, the length stays. Cases BL-SC-01 to 03.
 * @example steppedCones({ centreDistance: 720, firstDriver: 80, ratios: [8 / 3, 2], lay: 'crossed' }).outcome // → 'cones'
 */
export function steppedCones(cones: {
  readonly centreDistance: number;
  readonly firstDriver: number;
  readonly ratios: readonly number[];
  readonly lay: Lay;
}): SteppedCones {
  const { centreDistance, lay } = cones;
  const driver = requireSize('steppedCones', 'firstDriver', cones.firstDriver);
  const [firstRatio, ...others] = cones.ratios;
  const driven = driver * requireSize('steppedCones', 'first ratio', firstRatio ?? Number.NaN);
  const loop = beltLoop({ first: driven, second: driver, centreDistance, lay });
  if (loop.outcome === 'wheels-meet') return loop;
  const steps: ConeStep[] = [{ driver, driven }];
  for (const ratio of others) {
    const step = stepForLoop({ centreDistance, length: loop.length, ratio, lay });
    if (step.outcome === 'loop-too-long') {
      return { outcome: 'no-step', step: steps.length, slack: step.slack };
    }
    if (step.outcome === 'step') steps.push({ driver: step.driver, driven: step.driven });
  }
  return { outcome: 'cones', steps, length: loop.length };
}

/**
 * The two wheels of a given ratio on which a loop just fits.
 *
 * @throws RangeError for nonsense.
 * Source: the loop's length rises with the size of the step.
 * @example stepForLoop({ centreDistance: 300, length: 1061.28, ratio: 1, lay: 'open' }).outcome // → 'step'
 */
export function stepForLoop(wanted: {
  readonly centreDistance: number;
  readonly length: number;
  readonly ratio: number;
  readonly lay: Lay;
}): StepForLoop {
  const distance = requireSize('stepForLoop', 'centreDistance', wanted.centreDistance);
  const length = requireSize('stepForLoop', 'length', wanted.length);
  const ratio = requireSize('stepForLoop', 'ratio', wanted.ratio);
  if (length <= 2 * distance) return { outcome: 'loop-too-short', lacking: 2 * distance - length };
  const over = (driver: number): number => {
    const loop = beltLoop({
      first: ratio * driver,
      second: driver,
      centreDistance: distance,
      lay: wanted.lay,
    });
    return loop.outcome === 'loop' ? loop.length - length : Number.MAX_VALUE;
  };
  const largest = ((2 * distance) / (1 + ratio)) * (1 - Number.EPSILON * 4);
  const atLargest = over(largest);
  if (atLargest < 0) return { outcome: 'loop-too-long', slack: -atLargest };
  const driver = rootBetween('stepForLoop', over, largest * Number.EPSILON, largest);
  return { outcome: 'step', driver, driven: ratio * driver };
}

/**
 * What a loop lacks (negative) or has to spare on a step, in length; 0 when it fits. Null when the
 * wheels of the step meet.
 *
 * @throws RangeError for nonsense.
 * @example slackOnStep({ driver: 120, driven: 120 }, { centreDistance: 400, lay: 'open', length: 1186 }) // → 9.0088816
 */
export function slackOnStep(
  step: ConeStep,
  belt: { readonly centreDistance: number; readonly lay: Lay; readonly length: number },
): number | null {
  const length = requireSize('slackOnStep', 'length', belt.length);
  const loop = beltLoop({
    first: step.driver,
    second: step.driven,
    centreDistance: belt.centreDistance,
    lay: belt.lay,
  });
  return loop.outcome === 'loop' ? length - loop.length : null;
}

/**
 * Paces that feel evenly spaced: each the same number of times the one before.
 *
 * @throws RangeError for nonsense or fewer than two paces.
 * Source: q = (fast/slow)^(1/(n − 1)) (lesson 1.3).
 * @example evenPaces(10, 40, 3) // → [10, 20, 40]
 */
export function evenPaces(slowest: number, fastest: number, count: number): readonly number[] {
  const slow = requireSize('evenPaces', 'slowest', slowest);
  const fast = requireSize('evenPaces', 'fastest', fastest);
  requireCount('evenPaces', 'count', count, 2);
  return Array.from({ length: count }, (_, index) =>
    index === count - 1 ? fast : slow * (fast / slow) ** (index / (count - 1)),
  );
}

/**
 * Fastest over slowest speed of equal cones set head to foot: the square of their ends' ratio.
 *
 * @throws RangeError for nonsense.
 * @example speedRange(180, 60) // → 9
 */
export function speedRange(largest: number, smallest: number): number {
  const end =
    requireSize('speedRange', 'largest', largest) / requireSize('speedRange', 'smallest', smallest);
  return end * end;
}
