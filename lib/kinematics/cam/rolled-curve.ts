import type { Point } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';

/** What a point of a follower draws on the turning cam, seen where cam and follower stand. */
export interface RolledCurve {
  /** The unit normal of the drawn curve, out of the cam. */
  readonly normal: Point;
  /** Its curvature, above 0 where the curve bulges outward. */
  readonly curvature: number;
}

/** A tangent shorter than this part of the point's distance is rounding: the point stands still. */
const standstill = 1e-12;

/**
 * The normal and the curvature of the curve that a moving point draws on a cam turning
 * counter-clockwise, from the point's place and its first two derivatives by the cam's angle; null
 * where the point stands still on the cam, so that the curve has no direction.
 *
 * On the cam the point moves by F′ − J·F and J turns a vector by a quarter turn; a cam turning
 * counter-clockwise is drawn on clockwise, hence the sign of the curvature.
 *
 * @see own derivation, by differentiating R(−θ)·F twice.
 */
export function rolledCurve(place: Point, first: Point, second: Point): RolledCurve | null {
  const tx = first.x + place.y;
  const ty = first.y - place.x;
  const length = Math.hypot(tx, ty);
  if (length <= standstill * Math.hypot(place.x, place.y)) return null;
  const sx = second.x + 2 * first.y - place.x;
  const sy = second.y - 2 * first.x - place.y;
  return finiteResult('rolledCurve', {
    normal: { x: -ty / length, y: tx / length },
    curvature: ((ty / length) * (sx / length) - (tx / length) * (sy / length)) / length,
  });
}
