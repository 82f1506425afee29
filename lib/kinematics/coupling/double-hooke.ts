import { findExtremes } from '@/lib/numeric/extremes';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite } from '@/lib/numeric/require';
import { type HookeState, hookeJoint, requireBend } from './hooke';

/**
 * Two universal joints in one plane on a middle shaft. `phase` is the angle between its two forks:
 * 0 when both lie in one plane.
 */
export interface DoubleHooke {
  readonly firstBend: number;
  readonly secondBend: number;
  readonly phase: number;
}

/**
 * Two joints, one after the other, the first shaft turned to `angle` from its pins in the plane.
 *
 * Radians. With forks in one plane the second joint starts a quarter turn on, so that equal bends
 * undo each other.
 *
 * @throws RangeError for a bend below 0 or of a quarter turn and more, angles that are no numbers.
 * @see the law of one joint, taken twice: exact geometry.
 * @example doubleHooke({ firstBend: 0.4, secondBend: 0.4, phase: 0 }, 1).angle // → 1
 */
export function doubleHooke(joints: DoubleHooke, angle: number): HookeState {
  const { firstBend, secondBend, phase } = joints;
  requireBend('doubleHooke', firstBend);
  requireBend('doubleHooke', secondBend);
  requireFinite('doubleHooke', 'phase', phase);
  const first = hookeJoint(firstBend, angle);
  const start = hookeJoint(secondBend, phase, 'square');
  const second = hookeJoint(secondBend, first.angle + phase, 'square');
  const lead = first.lead + second.lead - start.lead;
  return finiteResult('doubleHooke', {
    angle: angle + lead,
    lead,
    speedRatio: first.speedRatio * second.speedRatio,
    acceleration:
      second.acceleration * first.speedRatio ** 2 + second.speedRatio * first.acceleration,
  });
}

/** Between which speeds the last shaft swings, over the first one's. */
export interface DoubleHookeExtremes {
  readonly fastest: number;
  readonly slowest: number;
  readonly fluctuation: number;
}

/**
 * The fastest and the slowest of two joints over a turn.
 *
 * @throws RangeError as `doubleHooke`.
 * @see by search over half a turn, after which the joint repeats itself; exact to rounding.
 * @example doubleHookeExtremes({ firstBend: Math.PI / 9, secondBend: Math.PI / 9, phase: Math.PI / 2 }).fastest // → 1.132474
 */
export function doubleHookeExtremes(joints: DoubleHooke): DoubleHookeExtremes {
  const ratio = (angle: number) => doubleHooke(joints, angle).speedRatio;
  const { least, most } = findExtremes(ratio, 0, Math.PI, 360);
  return finiteResult('doubleHookeExtremes', {
    fastest: most.value,
    slowest: least.value,
    fluctuation: most.value - least.value,
  });
}
