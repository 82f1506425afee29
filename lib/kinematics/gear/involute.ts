import type { Point } from '@/lib/geometry/point';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';

/** Below this the difference tan a − a loses digits, and its series is exact to rounding. */
const seriesBelow = 0.1;
/** The steps settle quadratically; six to eight are usual. */
const maximumSteps = 60;

/** A pencil on a cord that is unwound from a disc. */
export interface UnwoundCord {
  /** Length of cord that has left the disc: the radius of curvature of the involute there. */
  readonly cord: number;
  /** Distance of the pencil from the centre of the disc. */
  readonly radius: number;
  /** Where the pencil stands; it began at (baseRadius, 0). */
  readonly point: Point;
}

/**
 * The involute function inv a = tan a − a, good to the last digits down to nought.
 *
 * `angle` in radians, from 0 to less than a quarter turn; the answer is in radians.
 *
 * @throws RangeError for an angle outside that.
 * Source: any book of gears; Machinery's Handbook tabulates it.
 * @example involute(Math.PI / 9) // → 0.0149043838673
 */
export function involute(angle: number): number {
  requireWithin('involute', 'angle', angle, 0, Math.PI / 2 - Number.EPSILON);
  if (angle >= seriesBelow) return Math.tan(angle) - angle;
  const square = angle * angle;
  const tail =
    1 / 3 +
    square * (2 / 15 + square * (17 / 315 + square * (62 / 2835 + square * (1382 / 155925))));
  return angle * square * tail;
}

/**
 * The angle whose involute function is `value`.
 *
 * `value` in radians, zero or more; the answer lies from 0 to a quarter turn. Newton's steps on
 * t − atan t, which is convex, so that they cannot run away.
 *
 * @throws RangeError for a negative value.
 * @example involuteInverse(0.0343) // → 0.45526404
 */
export function involuteInverse(value: number): number {
  requireSizeOrNought('involuteInverse', 'value', value);
  if (value === 0) return 0;
  let tangent = Math.min(Math.cbrt(3 * value), value + Math.PI / 2);
  for (let step = 0; step < maximumSteps; step += 1) {
    const slope = 1 / (1 + 1 / (tangent * tangent));
    const next = tangent - (unwinding(tangent) - value) / slope;
    const settled = Math.abs(next - tangent) <= 4 * Number.EPSILON * next;
    tangent = next;
    if (settled) break;
  }
  return Math.atan(tangent);
}

/**
 * Where a pencil stands after a cord has been unwound by an angle from a disc.
 *
 * The disc lies about the origin, the pencil starts at (baseRadius, 0), the cord leaves
 * counter-clockwise; `unwound` in radians, either sign (the mirrored curve when negative).
 *
 * @throws RangeError for a disc without size or an angle that is no number.
 * @example unwindCord(30, 1).cord // → 30
 */
export function unwindCord(baseRadius: number, unwound: number): UnwoundCord {
  requireSize('unwindCord', 'baseRadius', baseRadius);
  requireMeasure('unwindCord', 'unwound', unwound);
  const cosine = Math.cos(unwound);
  const sine = Math.sin(unwound);
  return {
    cord: baseRadius * Math.abs(unwound),
    radius: baseRadius * Math.hypot(1, unwound),
    point: {
      x: baseRadius * (cosine + unwound * sine),
      y: baseRadius * (sine - unwound * cosine),
    },
  };
}

/**
 * The pressure angle of an involute at a radius: acos(base radius / radius).
 *
 * In radians; at or inside the base circle, where there is no involute, it is 0, the limit.
 *
 * @throws RangeError for a radius that is not positive.
 * @example pressureAngleAt(50, 100) // → 1.04719755
 */
export function pressureAngleAt(baseRadius: number, radius: number): number {
  requireSize('pressureAngleAt', 'baseRadius', baseRadius);
  requireSize('pressureAngleAt', 'radius', radius);
  if (radius <= baseRadius) return 0;
  return Math.atan2(Math.sqrt((radius - baseRadius) * (radius + baseRadius)), baseRadius);
}

/** t − atan t, without the loss of digits near nought. */
function unwinding(tangent: number): number {
  if (tangent >= seriesBelow) return tangent - Math.atan(tangent);
  const square = tangent * tangent;
  const tail =
    1 / 3 -
    square * (1 / 5 - square * (1 / 7 - square * (1 / 9 - square * (1 / 11 - square / 13))));
  return tangent * square * tail;
}
