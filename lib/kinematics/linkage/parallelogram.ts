import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import type { Point } from '@/lib/geometry/point';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A board on two equal, parallel arms: fixed pins at the origin and at (ground, 0), the board as
 * long between its pins. Any one unit, arm angles in radians from +x.
 */
export interface Parallelogram {
  readonly arm: number;
  readonly ground: number;
}

/**
 * A point of the board, `along` it from the first arm's upper pin and `above` the pin line. The
 * board never turns, so every point follows a circle of the arm's size.
 *
 * Throws `RangeError` for lengths that are not positive. Source: circular translation.
 * @example boardPoint({ arm: 50, ground: 140 }, radians(65), { along: 60, above: 30 }) // → { position: { x: 81.130913, y: 75.315389 }, centre: { x: 60, y: 30 }, radius: 50, turn: 0 }
 */
export function boardPoint(
  parallelogram: Parallelogram,
  armAngle: number,
  { along, above }: { readonly along: number; readonly above: number },
): {
  readonly position: Point;
  readonly centre: Point;
  readonly radius: number;
  /** Of the board: always 0. */
  readonly turn: number;
} {
  const { arm } = requireArms('boardPoint', parallelogram);
  requireMeasure('boardPoint', 'armAngle', armAngle);
  requireMeasure('boardPoint', 'along', along);
  requireMeasure('boardPoint', 'above', above);
  return {
    position: { x: arm * Math.cos(armAngle) + along, y: arm * Math.sin(armAngle) + above },
    centre: { x: along, y: above },
    radius: arm,
    turn: 0,
  };
}

/**
 * Distance of the board's pin line from the fixed one, and of the two arms' middle lines from one another.
 * @example parallelGaps({ arm: 100, ground: 60 }, radians(30)) // → { pinLines: 50, arms: 30 }
 */
export function parallelGaps(
  parallelogram: Parallelogram,
  armAngle: number,
): { readonly pinLines: number; readonly arms: number } {
  const { arm, ground } = requireArms('parallelGaps', parallelogram);
  const sine = Math.abs(Math.sin(requireMeasure('parallelGaps', 'armAngle', armAngle)));
  return { pinLines: arm * sine, arms: ground * sine };
}

/**
 * Arm angle at which a parallel rule stands `gap` open, and how far its upper blade has slid along
 * from arms square to it; `too-wide` by how much the gap is more than the arms. Source: right triangle.
 * @example ruleOpening(100, 60) // → { outcome: 'opens', angle: 0.643501, slide: 80 }
 */
export function ruleOpening(
  arm: number,
  gap: number,
):
  | { readonly outcome: 'opens'; readonly angle: number; readonly slide: number }
  | { readonly outcome: 'too-wide'; readonly by: number } {
  requireSize('ruleOpening', 'arm', arm);
  requireSizeOrNought('ruleOpening', 'gap', gap);
  if (gap > arm) return { outcome: 'too-wide', by: gap - arm };
  return {
    outcome: 'opens',
    angle: Math.asin(gap / arm),
    slide: Math.sqrt((arm - gap) * (arm + gap)),
  };
}

/**
 * Least angle to the frame line at which two arms `width` wide clear one another: sin θ = width/ground.
 *
 * `always-touch` by how much they are wider than the pins are apart.
 * @example armsTouchAt({ arm: 120, ground: 60 }, 30) // → { outcome: 'touch', angle: 0.523599 }
 */
export function armsTouchAt(
  parallelogram: Parallelogram,
  width: number,
):
  | { readonly outcome: 'touch'; readonly angle: number }
  | { readonly outcome: 'always-touch'; readonly by: number } {
  const { ground } = requireArms('armsTouchAt', parallelogram);
  requireSizeOrNought('armsTouchAt', 'width', width);
  if (width > ground) return { outcome: 'always-touch', by: width - ground };
  return { outcome: 'touch', angle: Math.asin(width / ground) };
}

/**
 * Tilt of the board, radians, when the second arm is too long by `arm`, or the board by `board`:
 * first order, e/(d·sin θ) and e/(d·tan θ). Throws `RangeError` at the flat, where it has no limit.
 * @example boardTilt({ arm: 150, ground: 100 }, Math.PI / 2, { arm: 1 }) // → 0.01
 */
export function boardTilt(
  parallelogram: Parallelogram,
  armAngle: number,
  { arm = 0, board = 0 }: { readonly arm?: number; readonly board?: number },
): number {
  const { ground } = requireArms('boardTilt', parallelogram);
  requireMeasure('boardTilt', 'arm error', arm);
  requireMeasure('boardTilt', 'board error', board);
  const sine = Math.sin(armAngle);
  if (!(Math.abs(sine) > 1e-9)) {
    throw new RangeError(`boardTilt: armAngle is ${armAngle}; expected arms off the frame line`);
  }
  return (arm - board * Math.cos(armAngle)) / (ground * sine);
}

/**
 * How far the board moves out and down while the arms swing between two angles.
 * @example boardSwing(200, radians(90), radians(30)) // → { out: 173.205081, down: 100 }
 */
export function boardSwing(
  arm: number,
  from: number,
  to: number,
): { readonly out: number; readonly down: number } {
  requireSize('boardSwing', 'arm', arm);
  requireMeasure('boardSwing', 'from', from);
  requireMeasure('boardSwing', 'to', to);
  const [middle, half] = [(from + to) / 2, (from - to) / 2];
  const chord = 2 * arm * Math.sin(half);
  return { out: chord * Math.sin(middle), down: chord * Math.cos(middle) };
}

/** The parallelogram as data, points as `fourBarLinkage`; at the flat it may carry on crossed. */
export function parallelogramLinkage(parallelogram: Parallelogram): Linkage {
  const { arm, ground } = requireArms('parallelogramLinkage', parallelogram);
  return fourBarLinkage({ crank: arm, coupler: ground, rocker: arm, frame: ground });
}

function requireArms(caller: string, { arm, ground }: Parallelogram): Parallelogram {
  return {
    arm: requireSize(caller, 'arm', arm),
    ground: requireSize(caller, 'ground', ground),
  };
}
