import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';

/**
 * The angle that the cam turns in `duration`: the same share of the turn as of its time.
 *
 * Seconds, radians.
 *
 * @throws RangeError for a duration below 0 or a turn that takes no time.
 * @example angleForTime(2.5, 12) // → 1.309
 */
export function angleForTime(duration: number, turnTime: number): number {
  requireNonNegative('angleForTime', 'duration', duration);
  requirePositive('angleForTime', 'turnTime', turnTime);
  return finiteResult('angleForTime', 2 * Math.PI * (duration / turnTime));
}

/**
 * The time that the cam takes to turn through `angle`: the inverse of `angleForTime`.
 *
 * @throws RangeError for an angle below 0 or a turn that takes no time.
 * @example timeForAngle(Math.PI, 12) // → 6
 */
export function timeForAngle(angle: number, turnTime: number): number {
  requireNonNegative('timeForAngle', 'angle', angle);
  requirePositive('timeForAngle', 'turnTime', turnTime);
  return finiteResult('timeForAngle', (angle / (2 * Math.PI)) * turnTime);
}

/**
 * How far a second, equal cam is set back on the axle, against the turning, so that its follower
 * moves `delay` later than the first; below 0 it is set ahead.
 *
 * `followerAngle` is how far the second follower stands on, round the axle in the sense of
 * turning: the cam reaches it later by itself.
 *
 * @throws RangeError for a turn that takes no time, or values that are no finite numbers.
 * @see plain proportion; own geometry.
 * @example setBackAngle(2, 12, Math.PI / 6) // → 0.523599
 */
export function setBackAngle(delay: number, turnTime: number, followerAngle: number): number {
  requireFinite('setBackAngle', 'delay', delay);
  requirePositive('setBackAngle', 'turnTime', turnTime);
  requireFinite('setBackAngle', 'followerAngle', followerAngle);
  return finiteResult('setBackAngle', 2 * Math.PI * (delay / turnTime) - followerAngle);
}

/** The arc, about the axle, on which a follower stands still. */
export interface DwellArc {
  readonly radius: number;
  readonly length: number;
}

/**
 * The arc of a dwell at `lift` above the base circle, and its length along the rim.
 *
 * @throws RangeError for a base radius of 0 or less, a lift or an angle below 0.
 * @example dwellArc(35, 20, 2).length // → 110
 */
export function dwellArc(baseRadius: number, lift: number, angle: number): DwellArc {
  requirePositive('dwellArc', 'baseRadius', baseRadius);
  requireNonNegative('dwellArc', 'lift', lift);
  requireNonNegative('dwellArc', 'angle', angle);
  const radius = baseRadius + lift;
  return finiteResult('dwellArc', { radius, length: radius * angle });
}
