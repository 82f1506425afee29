import { finiteResult } from '@/lib/numeric/finite-result';
import { requireMeasure } from '@/lib/numeric/moderate';
import {
  add,
  cross,
  dot,
  perpendicular,
  polar,
  scale,
  subtract,
  type Point,
} from '@/lib/geometry/point';
import {
  fourBarPosition,
  type CouplerPlace,
  type FourBarLengths,
  type FourBarPose,
  type FourBarSide,
} from '@/lib/kinematics/linkage/four-bar';

/** How the crank stands and turns: radians, radians a second, radians a second squared. */
export interface CrankMotion {
  readonly angle: number;
  readonly speed: number;
  readonly acceleration?: number;
}

/** A four-bar on the move: angular speeds and accelerations of coupler and rocker. */
export interface FourBarMotion extends FourBarPose {
  readonly couplerSpeed: number;
  readonly rockerSpeed: number;
  readonly couplerAcceleration: number;
  readonly rockerAcceleration: number;
}

export type FourBarMotionOutcome =
  | ({ readonly outcome: 'moves' } & FourBarMotion)
  /** Coupler and rocker in line: the crank cannot go on, or the rocker may go either way. */
  | { readonly outcome: 'toggle' }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/** Sine of the angle between coupler and rocker under which their speeds have no limit. */
const TOGGLE_SINE = 1e-9;

/**
 * Angular speed and acceleration of coupler and rocker on one assembly.
 *
 * Frame as `fourBarPosition`, counter-clockwise positive. Outcomes: `moves`; `toggle`, where the
 * speeds grow without limit; `does-not-close`. Throws `RangeError` for numbers that are not finite
 * and lengths that are not positive. Source: R. L. Norton, Design of Machinery, examples 6-7, 7-1.
 * @example fourBarMotion({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, 'open', { angle: radians(40), speed: 25, acceleration: 15 }) // → { outcome: 'moves', couplerSpeed: -4.120914, rockerSpeed: 6.997985, couplerAcceleration: 296.089193, rockerAcceleration: 470.133530 }
 */
export function fourBarMotion(
  bars: FourBarLengths,
  side: FourBarSide,
  { angle, speed, acceleration = 0 }: CrankMotion,
): FourBarMotionOutcome {
  requireMeasure('fourBarMotion', 'speed', speed);
  requireMeasure('fourBarMotion', 'acceleration', acceleration);
  const found = fourBarPosition(bars, angle);
  if (found.outcome === 'does-not-close') return found;
  const pose = found[side];
  const along = subtract(pose.B, pose.A);
  const arm = subtract(pose.B, { x: bars.frame, y: 0 });
  const det = cross(along, arm);
  if (Math.abs(det) <= TOGGLE_SINE * bars.coupler * bars.rocker) return { outcome: 'toggle' };
  const crank = pose.A;
  const vA = scale(perpendicular(crank), speed);
  const [couplerSpeed, rockerSpeed] = turnRates(along, arm, vA, det);
  const pull = add(scale(perpendicular(crank), acceleration), scale(crank, -speed * speed));
  const spun = add(
    subtract(pull, scale(along, couplerSpeed * couplerSpeed)),
    scale(arm, rockerSpeed * rockerSpeed),
  );
  const [couplerAcceleration, rockerAcceleration] = turnRates(along, arm, spun, det);
  return {
    outcome: 'moves',
    ...pose,
    couplerSpeed,
    rockerSpeed,
    couplerAcceleration,
    rockerAcceleration,
  };
}

/** Position of a coupler point. Frame as `fourBarPosition`; the angle is laid off from A–B, CCW. */
export function couplerPointOf({ A, couplerAngle }: FourBarPose, place: CouplerPlace): Point {
  requireMeasure('couplerPointOf', 'place.distance', place.distance);
  requireMeasure('couplerPointOf', 'place.angle', place.angle);
  return finiteResult('couplerPointOf', polar(place.distance, couplerAngle + place.angle, A));
}

/**
 * Both positions of a coupler point at a crank angle, or by how much the linkage does not close.
 *
 * @example couplerPoint({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, { distance: 60, angle: radians(30) }, radians(40)).open // → { x: 68.9695526, y: 71.8740614 }
 */
export function couplerPoint(
  bars: FourBarLengths,
  place: CouplerPlace,
  crankAngle: number,
):
  | { readonly outcome: 'closes'; readonly open: Point; readonly crossed: Point }
  | { readonly outcome: 'does-not-close'; readonly by: number } {
  const found = fourBarPosition(bars, crankAngle);
  if (found.outcome === 'does-not-close') return found;
  return {
    outcome: 'closes',
    open: couplerPointOf(found.open, place),
    crossed: couplerPointOf(found.crossed, place),
  };
}

/** A coupler point on the move. */
export interface PointMotion {
  readonly position: Point;
  readonly velocity: Point;
  readonly acceleration: Point;
  /** Length of the velocity. */
  readonly speed: number;
}

export type PointMotionOutcome =
  | ({ readonly outcome: 'moves' } & PointMotion)
  | Exclude<FourBarMotionOutcome, { readonly outcome: 'moves' }>;

/**
 * Position, velocity and acceleration of a coupler point on one assembly.
 *
 * Outcomes and throws as `fourBarMotion`. Source: v = vA + ω × AP.
 * @example couplerPointMotion({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, 'open', { distance: 60, angle: radians(30) }, { angle: radians(40), speed: 25 }).speed // → 758.017795
 */
export function couplerPointMotion(
  bars: FourBarLengths,
  side: FourBarSide,
  place: CouplerPlace,
  crank: CrankMotion,
): PointMotionOutcome {
  const found = fourBarMotion(bars, side, crank);
  if (found.outcome !== 'moves') return found;
  const position = couplerPointOf(found, place);
  const arm = subtract(position, found.A);
  const { speed, acceleration = 0 } = crank;
  const velocity = add(
    scale(perpendicular(found.A), speed),
    scale(perpendicular(arm), found.couplerSpeed),
  );
  const turning = add(
    scale(perpendicular(found.A), acceleration),
    scale(perpendicular(arm), found.couplerAcceleration),
  );
  const inward = add(scale(found.A, -speed * speed), scale(arm, -(found.couplerSpeed ** 2)));
  return {
    outcome: 'moves',
    position,
    velocity,
    acceleration: add(turning, inward),
    speed: Math.hypot(velocity.x, velocity.y),
  };
}

/**
 * Speed of a point whose tracing carries a dot at every `dotTurn` radians of crank, two of which
 * are `gap` apart, while the crank turns at `crankSpeed` radians a second. Source: gap over time.
 * @example speedFromDots(10, radians(10), 3) // → 171.887339
 */
export function speedFromDots(gap: number, dotTurn: number, crankSpeed: number): number {
  requireMeasure('speedFromDots', 'gap', gap);
  requireMeasure('speedFromDots', 'crankSpeed', crankSpeed);
  return requireMeasure('speedFromDots', 'gap·speed/turn', (gap * crankSpeed) / dotTurn);
}

/** Solve w + p·along⊥ = q·arm⊥ for p and q. */
function turnRates(along: Point, arm: Point, w: Point, det: number): readonly [number, number] {
  return [-dot(w, arm) / det, -dot(w, along) / det];
}
