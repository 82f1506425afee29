import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';
import { type Motion, type MotionLaw, motionLaw, motionLaws } from './motion-law';
import { peakFactors } from './peak-factors';

/** A rise of `lift` while the cam turns through `angle`, by a law of motion. */
export interface Rise {
  readonly law: MotionLaw;
  readonly lift: number;
  readonly angle: number;
}

/**
 * The follower's lift and its derivatives by time, `turned` into the rise, the cam turning at
 * `speed`; at a speed of 1 the derivatives are by the cam's angle.
 *
 * Radians, and radians a second; lift 0 or more, in any unit; `turned` from 0 to the rise's angle.
 *
 * @throws RangeError for a lift below 0, an angle of 0 or less, a place outside the rise.
 * @see s = h·f(θ/β), v = h·f′·ω/β, and so on: closed form of the law.
 * @example riseMotion({ law: 'parabolic', lift: 25, angle: 3 }, 1).position // → 5.55556
 */
export function riseMotion(rise: Rise, turned: number, speed = 1): Motion {
  requireRise('riseMotion', rise);
  requireTurned('riseMotion', rise, turned);
  requireFinite('riseMotion', 'speed', speed);
  const f = motionLaw(rise.law, Math.min(1, turned / rise.angle));
  const pace = speed / rise.angle;
  return finiteResult('riseMotion', {
    position: rise.lift * f.position,
    velocity: rise.lift * f.velocity * pace,
    acceleration: rise.lift * f.acceleration * pace ** 2,
    jerk: rise.lift * f.jerk * pace ** 3,
  });
}

/**
 * The greatest lift per radian on the rise, C_v·h/β: how far a flat face's contact wanders.
 *
 * @throws RangeError for an impossible rise.
 * @see peak factors: Rothbart, Cams.
 * @example greatestSlope({ law: 'cycloidal', lift: 20, angle: 2 }) // → 20
 */
export function greatestSlope(rise: Rise): number {
  requireRise('greatestSlope', rise);
  return finiteResult('greatestSlope', peakFactors(rise.law).velocity * (rise.lift / rise.angle));
}

/** The speed from which a follower held down by a pull leaves the cam, if there is one. */
export type FloatSpeed =
  | { readonly outcome: 'floats-above'; readonly speed: number }
  /** The law strikes a blow at any speed, so the follower is thrown at any speed. */
  | { readonly outcome: 'thrown-at-any-speed' }
  | { readonly outcome: 'never-floats' };

/**
 * The cam's speed above which the follower leaves the cam on the rise: there the cam draws away
 * faster than its pull can follow.
 *
 * `pull` is the acceleration that the pull alone gives the follower: g for its own weight,
 * g·(1 + k) with a spring that presses k times the weight. Any one unit of length, seconds.
 *
 * @throws RangeError for an impossible rise or a pull of 0 or less.
 * @see C_a·h·(ω/β)² = g(1 + k), C_a the greatest slowing down; own statics.
 * @example floatSpeed({ law: 'cycloidal', lift: 40, angle: Math.PI / 2 }, 9810) // → { outcome: 'floats-above', speed: 9.81374 }
 */
export function floatSpeed(rise: Rise, pull: number): FloatSpeed {
  requireRise('floatSpeed', rise);
  requirePositive('floatSpeed', 'pull', pull);
  const slowing = peakFactors(rise.law).accelerationMin;
  if (rise.lift === 0) return { outcome: 'never-floats' };
  if (slowing === 'infinite') return { outcome: 'thrown-at-any-speed' };
  const speed = rise.angle * Math.sqrt(pull / rise.lift / -slowing);
  return finiteResult('floatSpeed', { outcome: 'floats-above', speed });
}

/** A place reckoned in another way may lie past the end of a rise by its last digits. */
const endSlack = 1 + 1e-12;

/** Refuses a place outside a rise. */
export function requireTurned(caller: string, rise: Rise, turned: number): void {
  requireWithin(caller, 'turned', turned, 0, rise.angle * endSlack);
}

/** Refuses a rise that is none: the guard of every function that takes one. */
export function requireRise(caller: string, { law, lift, angle }: Rise): void {
  if (!motionLaws.includes(law)) throw new RangeError(`${caller}: law is ${law}; no such law`);
  requireNonNegative(caller, 'lift', lift);
  requirePositive(caller, 'angle', angle);
}
