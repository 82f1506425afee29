import type { Point } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';

/** An Oldham coupling at one moment. */
export interface OldhamState {
  /** The middle of the disc; the driving shaft is the origin, the driven one lies on +x. */
  readonly centre: Point;
  /** How far the disc has slid along the driving and along the driven tongue. */
  readonly drivingSlide: number;
  readonly drivenSlide: number;
  /** The driven shaft's angle: always the driving one's. */
  readonly drivenAngle: number;
}

/**
 * An Oldham coupling whose shafts miss each other by `offset`, the driving tongue turned to `angle`.
 *
 * Radians; one unit of length. The disc's middle sees both shafts at a right angle, so it runs on
 * the circle whose diameter joins them.
 *
 * @throws RangeError for an offset below 0 or an angle that is no finite number.
 * @see Thales' theorem.
 * @example oldhamCoupling(12, Math.PI / 4).centre // → { x: 6, y: 6 }
 */
export function oldhamCoupling(offset: number, angle: number): OldhamState {
  requireNonNegative('oldhamCoupling', 'offset', offset);
  requireFinite('oldhamCoupling', 'angle', angle);
  const [drivingSlide, drivenSlide] = [offset * Math.cos(angle), offset * Math.sin(angle)];
  const centre = { x: drivingSlide * Math.cos(angle), y: drivingSlide * Math.sin(angle) };
  return { centre, drivingSlide, drivenSlide, drivenAngle: angle };
}

/** What an Oldham coupling does while its shafts turn. */
export interface OldhamMotion {
  readonly drivenSpeed: number;
  readonly pathRadius: number;
  /** How fast the disc's middle goes round its circle: twice the shafts' speed. */
  readonly pathSpeed: number;
  /** The way of a tongue in its groove, from end to end. */
  readonly slideTravel: number;
  readonly greatestSlidingSpeed: number;
}

/**
 * The motion of an Oldham coupling at `speed`.
 *
 * Radians a second; one unit of length.
 *
 * @throws RangeError for an offset below 0 or a speed that is no finite number.
 * @see slide e·cos θ: exact geometry.
 * @example oldhamMotion(18, 10) // → { drivenSpeed: 10, pathRadius: 9, pathSpeed: 20, slideTravel: 36, greatestSlidingSpeed: 180 }
 */
export function oldhamMotion(offset: number, speed: number): OldhamMotion {
  requireNonNegative('oldhamMotion', 'offset', offset);
  requireFinite('oldhamMotion', 'speed', speed);
  return finiteResult('oldhamMotion', {
    drivenSpeed: speed,
    pathRadius: offset / 2,
    pathSpeed: 2 * speed,
    slideTravel: 2 * offset,
    greatestSlidingSpeed: offset * Math.abs(speed),
  });
}

/** The room that an Oldham disc needs, or by how much its tongues leave their grooves. */
export type OldhamFit =
  | {
      readonly outcome: 'engages';
      /** The length of tongue in its groove at the worst moment. */
      readonly overlap: number;
      /** The hole in which the disc just runs free. */
      readonly hole: number;
      /** The wood between the two grooves; below 0 they cut into each other. */
      readonly web: number;
    }
  | { readonly outcome: 'parts'; readonly by: number };

/** The disc of a coupling: its size, its thickness and the depth of the groove in either face. */
export interface OldhamDisc {
  readonly diameter: number;
  readonly thickness: number;
  readonly grooveDepth: number;
}

/**
 * Whether the tongues of hubs as wide as the disc stay in their grooves, and what room it sweeps.
 *
 * @throws RangeError for a diameter or a thickness of 0 or less, a depth or an offset below 0.
 * @see overlap D − e, hole D + e: exact geometry of the disc's circle.
 * @example oldhamFit({ diameter: 120, thickness: 24, grooveDepth: 8 }, 12) // → { outcome: 'engages', overlap: 108, hole: 132, web: 8 }
 */
export function oldhamFit(disc: OldhamDisc, offset: number): OldhamFit {
  requirePositive('oldhamFit', 'diameter', disc.diameter);
  requirePositive('oldhamFit', 'thickness', disc.thickness);
  requireNonNegative('oldhamFit', 'grooveDepth', disc.grooveDepth);
  requireNonNegative('oldhamFit', 'offset', offset);
  const overlap = disc.diameter - offset;
  if (overlap <= 0) return { outcome: 'parts', by: -overlap };
  const web = disc.thickness - 2 * disc.grooveDepth;
  const hole = disc.diameter + offset;
  return finiteResult('oldhamFit', { outcome: 'engages', overlap, hole, web });
}
