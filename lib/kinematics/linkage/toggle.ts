import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { crankSliderLinkage } from '@/lib/kinematics/linkage/crank-slider';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

export type ToggleOutcome =
  | { readonly outcome: 'presses'; readonly ratio: number }
  /** Both links on the line of thrust: the press has no limit, in wood the pins give way first. */
  | { readonly outcome: 'on-the-line' };

/**
 * Press over push of a toggle whose knee is pushed square to the line of thrust, its links at
 * `first` and `second` radians to that line: `1/(tan α + tan β)`, without friction.
 *
 * Negative angles stand for a knee past the line. Outcomes: `presses`, `on-the-line`. Throws
 * `RangeError` for a quarter turn or more. Source: virtual work; equal links 1/(2·tan α),
 * Machinery's Handbook, toggle joint.
 * @example togglePress(radians(5), radians(5)) // → { outcome: 'presses', ratio: 5.715026 }
 */
export function togglePress(first: number, second: number): ToggleOutcome {
  const give = Math.tan(requireLean('first', first)) + Math.tan(requireLean('second', second));
  return give === 0 ? { outcome: 'on-the-line' } : { outcome: 'presses', ratio: 1 / give };
}

function requireLean(name: string, angle: number): number {
  const lean = requireMeasure('togglePress', name, angle);
  if (Math.abs(lean) < Math.PI / 2) return lean;
  throw new RangeError(`togglePress: ${name} is ${angle}; expected less than a quarter turn`);
}

/** Two links between a fixed pin and a block, their knee off the line of thrust. */
export interface Toggle {
  readonly first: number;
  readonly second: number;
  /** The knee's distance from the line; negative past it. */
  readonly knee: number;
}

export type KneeOutcome =
  ToggleOutcome | { readonly outcome: 'links-too-short'; readonly by: number };

/**
 * Press over push of a toggle by its links and its knee's distance from the line.
 *
 * With pins of radius `pin` and friction `friction` the knee acts as if it stood 2·μ·r farther out
 * (friction circle, from memory). Outcomes: as `togglePress`; `links-too-short` by how far the knee
 * is beyond the shorter link. Throws `RangeError` for links that are not positive.
 * @example kneePress({ first: 100, second: 100, knee: 10 }) // → { outcome: 'presses', ratio: 4.974937 }
 * @example kneePress({ first: 100, second: 100, knee: 5 }, { pin: 4, friction: 0.2 }) // → { outcome: 'presses', ratio: 7.559240 }
 */
export function kneePress(
  { first, second, knee }: Toggle,
  { pin = 0, friction = 0 }: { readonly pin?: number; readonly friction?: number } = {},
): KneeOutcome {
  requireSize('kneePress', 'first', first);
  requireSize('kneePress', 'second', second);
  requireMeasure('kneePress', 'knee', knee);
  const out =
    2 *
    requireSizeOrNought('kneePress', 'friction', friction) *
    requireSizeOrNought('kneePress', 'pin', pin);
  const acting = knee + out;
  const by = Math.abs(acting) - Math.min(first, second);
  if (by >= 0) return { outcome: 'links-too-short', by };
  return togglePress(Math.asin(acting / first), Math.asin(acting / second));
}

/** What a toggle does under load when the hand lets go. */
export type ToggleRest = 'holds-against-the-stop' | 'balances' | 'opens' | 'folds-on';

/**
 * What a loaded toggle does when the hand lets go: past the line it leans on its stop, if it has one.
 * Source: sign of the knee's push under thrust.
 * @example toggleAtRest({ first: 100, second: 100, knee: -3 }, { stop: true }) // → 'holds-against-the-stop'
 */
export function toggleAtRest({ knee }: Toggle, { stop }: { readonly stop: boolean }): ToggleRest {
  requireMeasure('toggleAtRest', 'knee', knee);
  if (knee === 0) return 'balances';
  if (knee > 0) return 'opens';
  return stop ? 'holds-against-the-stop' : 'folds-on';
}

/** A toggle as data: points as `crankSliderLinkage`, the knee at `A`, the block at `C`; driven by the first link. */
export function toggleLinkage({ first, second }: Omit<Toggle, 'knee'>): Linkage {
  return crankSliderLinkage({ crank: first, rod: second });
}
