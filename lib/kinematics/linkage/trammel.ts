import { requireMeasure } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import { acosClamped } from '@/lib/numeric/tolerance';
import { wrapAngle } from '@/lib/geometry/angle';
import { dot, norm, type Point } from '@/lib/geometry/point';

/**
 * A trammel: a bar with two pins and a pen, each pin in a groove of its own.
 *
 * The level groove lies along x, the upright one along y (or at `grooveAngle`), crossing at the
 * origin. Both pins are given by the pen's distance from them along the bar, in any one unit:
 * positive behind the pen as the bar points, negative beyond it.
 */
export interface Trammel {
  /** Pen to the pin in the upright groove: with square grooves the half axis along x. */
  readonly uprightPin: number;
  /** Pen to the pin in the level groove: with square grooves the half axis along y. */
  readonly levelPin: number;
  /** How far the pen stands to the left of the bar; 0 on it. */
  readonly beside?: number;
  /** From the level groove to the upright one, between 0 and π; a right angle if left out. */
  readonly grooveAngle?: number;
}

/** Where everything stands when the bar points in the direction `angle`, from the pins to the pen. */
export interface TrammelPose {
  readonly pen: Point;
  readonly uprightPin: Point;
  readonly levelPin: Point;
}

/** The oval that a trammel draws. */
export interface TrammelOval {
  readonly semiMajor: number;
  readonly semiMinor: number;
  /** Direction of the long axis from +x, from 0 to π (left out); 0 for a circle. */
  readonly majorAxis: number;
  /** Which way the pen goes round as the bar turns; `line` when the oval has shut to a line. */
  readonly round: 'with-the-bar' | 'against-the-bar' | 'line';
}

/**
 * Pen and pins of a trammel with its bar at `angle`.
 *
 * Frame: grooves cross at the origin; radians counter-clockwise from +x to the bar's direction.
 * Throws `RangeError` for a length that is not finite or grooves that do not cross.
 * Source: exact geometry; on the bar with square grooves, pen = (uprightPin·cos, levelPin·sin).
 * @example trammelPose({ uprightPin: 150, levelPin: 90 }, radians(30)).pen // → { x: 129.903811, y: 45 }
 */
export function trammelPose(trammel: Trammel, angle: number): TrammelPose {
  const [xx, xy, yx, yy] = penMatrix('trammelPose', trammel);
  requireMeasure('trammelPose', 'angle', angle);
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)];
  const apart = trammel.uprightPin - trammel.levelPin;
  const level = apart * (cosine - sine * cotangent(trammel));
  return {
    pen: { x: xx * cosine + xy * sine, y: yx * cosine + yy * sine },
    levelPin: { x: level, y: 0 },
    uprightPin: { x: level - apart * cosine, y: 0 - apart * sine },
  };
}

/**
 * Velocity of the pen while the bar turns at `speed` radians a second (units of length a second).
 *
 * @example trammelPenVelocity({ uprightPin: 150, levelPin: 90 }, Math.PI / 2, 2) // → { x: -300, y: 0 }
 */
export function trammelPenVelocity(trammel: Trammel, angle: number, speed: number): Point {
  const [xx, xy, yx, yy] = penMatrix('trammelPenVelocity', trammel);
  requireMeasure('trammelPenVelocity', 'angle', angle);
  requireMeasure('trammelPenVelocity', 'speed', speed);
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)];
  return { x: speed * (xy * cosine - xx * sine), y: speed * (yy * cosine - yx * sine) };
}

/**
 * Half axes, direction and sense of the oval that the pen draws: on the bar, beside it, between or
 * beyond the pins, in square grooves or skew ones.
 *
 * The pen's way is `α·e^(it) + β·e^(−it)` in the complex plane; the half axes are |α| + |β| and
 * ||α| − |β||. Throws as `trammelPose`. Source: Cardan's circles; de la Hire.
 * @example trammelOval({ uprightPin: 300, levelPin: 180 }) // → { semiMajor: 300, semiMinor: 180, majorAxis: 0, round: 'with-the-bar' }
 * @example trammelOval({ uprightPin: 50, levelPin: -50 }).round // → 'against-the-bar'
 */
export function trammelOval(trammel: Trammel): TrammelOval {
  const [xx, xy, yx, yy] = penMatrix('trammelOval', trammel);
  const alpha = Math.hypot(xx + yy, yx - xy) / 2;
  const beta = Math.hypot(xx - yy, yx + xy) / 2;
  const circle = Math.min(alpha, beta) <= 1e-14 * Math.max(alpha, beta);
  const turned = Math.atan2(yx - xy, xx + yy) + Math.atan2(yx + xy, xx - yy);
  const half = circle ? 0 : turned / 2 - Math.PI * Math.floor(turned / 2 / Math.PI);
  const shut = Math.abs(alpha - beta) <= 1e-14 * (alpha + beta);
  return {
    semiMajor: alpha + beta,
    semiMinor: shut ? 0 : Math.abs(alpha - beta),
    majorAxis: half >= Math.PI ? 0 : half,
    round: shut ? 'line' : alpha > beta ? 'with-the-bar' : 'against-the-bar',
  };
}

/**
 * The pins for an oval of a given whole length and width: the inverse of `trammelOval`.
 *
 * `lies` says which groove the long axis follows; `pen` whether it stands beyond both pins or
 * between them, where the pins come farther apart. Throws `RangeError` unless 0 ≤ width ≤ length.
 * @example trammelForOval(600, 360) // → { uprightPin: 300, levelPin: 180 }
 * @example trammelForOval(600, 360, { lies: 'upright', pen: 'between' }) // → { uprightPin: -180, levelPin: 300 }
 */
export function trammelForOval(
  length: number,
  width: number,
  {
    lies = 'level',
    pen = 'beyond',
  }: { readonly lies?: 'level' | 'upright'; readonly pen?: 'beyond' | 'between' } = {},
): Trammel {
  const far = requireMeasure('trammelForOval', 'length', length) / 2;
  const near =
    (requireWithin('trammelForOval', 'width', width, 0, length) / 2) * (pen === 'beyond' ? 1 : -1);
  return lies === 'level'
    ? { uprightPin: far, levelPin: near }
    : { uprightPin: near, levelPin: far };
}

/**
 * The bar's angle, from −π to π, that brings the pen to `pen`: the inverse of `trammelPose`.
 *
 * For a point off the oval it is the angle of the point that lies in the same proportion on it, so
 * that a dragged pen follows the hand. Where the oval has shut to a line, of the two angles for a
 * point that from 0 to π before the pen runs back is taken.
 * @example barAngleForPen({ uprightPin: 150, levelPin: 90 }, { x: 0, y: 90 }) // → 1.5707963
 */
export function barAngleForPen(trammel: Trammel, pen: Point): number {
  const [xx, xy, yx, yy] = penMatrix('barAngleForPen', trammel);
  requireMeasure('barAngleForPen', 'pen.x', pen.x);
  requireMeasure('barAngleForPen', 'pen.y', pen.y);
  const oval = trammelOval(trammel);
  if (oval.round !== 'line') {
    const spin = xx * yy - xy * yx < 0 ? -1 : 1;
    return Math.atan2(spin * (xx * pen.y - yx * pen.x), spin * (yy * pen.x - xy * pen.y));
  }
  if (oval.semiMajor === 0) return 0;
  const along = { x: Math.cos(oval.majorAxis), y: Math.sin(oval.majorAxis) };
  const [c, s] = [dot(along, { x: xx, y: yx }), dot(along, { x: xy, y: yy })];
  return wrapAngle(Math.atan2(s, c) + acosClamped(dot(along, pen) / norm({ x: c, y: s })));
}

/** Pen = (xx·cos + xy·sin, yx·cos + yy·sin). */
function penMatrix(caller: string, trammel: Trammel): readonly [number, number, number, number] {
  const upright = requireMeasure(caller, 'uprightPin', trammel.uprightPin);
  const level = requireMeasure(caller, 'levelPin', trammel.levelPin);
  const beside = requireMeasure(caller, 'beside', trammel.beside ?? 0);
  const angle = requireWithin(
    caller,
    'grooveAngle',
    trammel.grooveAngle ?? Math.PI / 2,
    0,
    Math.PI,
  );
  if (Math.sin(angle) < 1e-9)
    throw new RangeError(`${caller}: grooveAngle is ${angle}; expected grooves that cross`);
  return [upright, 0 - (upright - level) * cotangent(trammel) - beside, beside, level];
}

/** Of the angle between the grooves; exactly nought for square ones. */
function cotangent({ grooveAngle }: Trammel): number {
  return grooveAngle === undefined ? 0 : Math.cos(grooveAngle) / Math.sin(grooveAngle);
}
