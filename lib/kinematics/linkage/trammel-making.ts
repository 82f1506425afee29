import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import type { Point } from '@/lib/geometry/point';
import type { Trammel } from '@/lib/kinematics/linkage/trammel';

/**
 * Distance of the two pins of a trammel from one another along the bar.
 * @example pinsApart({ uprightPin: 300, levelPin: 180 }) // → 120
 * @example pinsApart({ uprightPin: 300, levelPin: -180 }) // → 480
 */
export function pinsApart(trammel: Trammel): number {
  const upright = requireMeasure('pinsApart', 'uprightPin', trammel.uprightPin);
  return Math.abs(upright - requireMeasure('pinsApart', 'levelPin', trammel.levelPin));
}

/**
 * A trammel told by its bar from the upright groove's pin A to the level groove's pin B.
 *
 * The pen lies `beyond` B on the bar, or `fromMiddle` on from the bar's middle, and `beside` to the
 * left; `lean` is the angle by which the bar slopes down from A to B, radians. Gives the trammel
 * and the bar's angle for `trammelPose`. Throws `RangeError` unless one of the two places is given.
 * @example barTrammel({ spacing: 60, beyond: 90, lean: 0.5 }) // → { trammel: { uprightPin: 150, levelPin: 90 }, angle: -0.5 }
 */
export function barTrammel({
  spacing,
  beyond,
  fromMiddle,
  lean = 0,
  ...rest
}: {
  readonly spacing: number;
  readonly beyond?: number;
  readonly fromMiddle?: number;
  readonly lean?: number;
} & Pick<Trammel, 'beside' | 'grooveAngle'>): {
  readonly trammel: Trammel;
  readonly angle: number;
} {
  requireSize('barTrammel', 'spacing', spacing);
  const fromB = beyond ?? (fromMiddle ?? Number.NaN) - spacing / 2;
  const levelPin = requireMeasure('barTrammel', 'beyond or fromMiddle', fromB);
  return {
    trammel: { ...rest, uprightPin: levelPin + spacing, levelPin },
    angle: 0 - requireMeasure('barTrammel', 'lean', lean),
  };
}

/**
 * Half axes along x and along y of the oval drawn on the bar, in square grooves.
 * @example halfAxes({ uprightPin: 65, levelPin: -35 }) // → { x: 65, y: 35 }
 */
export function halfAxes({ uprightPin, levelPin }: Trammel): Point {
  return {
    x: Math.abs(requireMeasure('halfAxes', 'uprightPin', uprightPin)),
    y: Math.abs(requireMeasure('halfAxes', 'levelPin', levelPin)),
  };
}

/**
 * Diameter of the circle through both pins and the crossing, which rolls inside one twice its size:
 * the pins' distance over the sine of the angle between the grooves. Source: Cardan.
 * @example cardanDiameter({ uprightPin: 50, levelPin: -50, grooveAngle: radians(60) }) // → 115.470054
 */
export function cardanDiameter(trammel: Trammel): number {
  return grooveTravel(trammel) / 2;
}

/**
 * How far each pin travels in its groove, from end to end: twice the pins' distance in square
 * grooves, more in skew ones. Source: exact geometry.
 * @example grooveTravel({ uprightPin: 300, levelPin: 180 }) // → 240
 */
export function grooveTravel(trammel: Trammel): number {
  const { grooveAngle = Math.PI / 2 } = trammel;
  requireWithin('grooveTravel', 'grooveAngle', grooveAngle, 1e-9, Math.PI - 1e-9);
  return (2 * pinsApart(trammel)) / Math.sin(grooveAngle);
}

/**
 * Least length of a groove with closed ends, for a slider of length `slider` with its pin in the middle.
 * @example grooveLength({ uprightPin: 300, levelPin: 180 }, 40) // → 280
 */
export function grooveLength(trammel: Trammel, slider: number): number {
  return grooveTravel(trammel) + requireSizeOrNought('grooveLength', 'slider', slider);
}

/** Whether a groove is long enough. */
export type GrooveOutcome =
  | { readonly outcome: 'enough'; readonly spare: number }
  | { readonly outcome: 'too-short'; readonly by: number };

/**
 * Whether a slider runs the whole turn in a groove of length `groove`, centred on the crossing.
 * @example grooveFits({ uprightPin: 300, levelPin: 180 }, 40, 250) // → { outcome: 'too-short', by: 30 }
 */
export function grooveFits(trammel: Trammel, slider: number, groove: number): GrooveOutcome {
  const spare = requireSize('grooveFits', 'groove', groove) - grooveLength(trammel, slider);
  return spare >= 0 ? { outcome: 'enough', spare } : { outcome: 'too-short', by: -spare };
}

/**
 * Least distance of the pins at which two sliders, square-ended, `length` by `width`, pass one
 * another at the crossing of square grooves: `(length + width)/√2`. Source: exact geometry, worst
 * with the bar at 45°.
 * @example leastPinsApart(60, 20) // → 56.5685425
 */
export function leastPinsApart(length: number, width: number): number {
  requireSizeOrNought('leastPinsApart', 'length', length);
  return (length + requireSizeOrNought('leastPinsApart', 'width', width)) / Math.SQRT2;
}

/**
 * Length of the bar with `beyond` of wood past the pen and past the last pin at either end.
 * @example barLength({ uprightPin: 300, levelPin: 180 }, 25) // → 350
 * @example barLength({ uprightPin: 300, levelPin: -180 }, 25) // → 530
 */
export function barLength({ uprightPin, levelPin }: Trammel, beyond: number): number {
  requireMeasure('barLength', 'uprightPin', uprightPin);
  requireMeasure('barLength', 'levelPin', levelPin);
  const ends = [0, uprightPin, levelPin];
  return (
    Math.max(...ends) - Math.min(...ends) + 2 * requireSizeOrNought('barLength', 'beyond', beyond)
  );
}
