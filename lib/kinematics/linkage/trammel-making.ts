import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';
import type { Trammel } from '@/lib/kinematics/linkage/trammel';

/**
 * Distance of the two pins of a trammel from one another along the bar.
 * @example pinsApart({ uprightPin: 300, levelPin: 180 }) // → 120
 * @example pinsApart({ uprightPin: 300, levelPin: -180 }) // → 480
 */
export function pinsApart(trammel: Trammel): number {
  const upright = requireFinite('pinsApart', 'uprightPin', trammel.uprightPin);
  return Math.abs(upright - requireFinite('pinsApart', 'levelPin', trammel.levelPin));
}

/**
 * How far each pin travels in its groove, from end to end: twice the pins' distance in square
 * grooves, more in skew ones. Source: exact geometry.
 * @example grooveTravel({ uprightPin: 300, levelPin: 180 }) // → 240
 */
export function grooveTravel(trammel: Trammel): number {
  return (2 * pinsApart(trammel)) / Math.sin(trammel.grooveAngle ?? Math.PI / 2);
}

/**
 * Least length of a groove with closed ends, for a slider of length `slider` with its pin in the middle.
 * @example grooveLength({ uprightPin: 300, levelPin: 180 }, 40) // → 280
 */
export function grooveLength(trammel: Trammel, slider: number): number {
  return grooveTravel(trammel) + requireNonNegative('grooveLength', 'slider', slider);
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
  const spare = requirePositive('grooveFits', 'groove', groove) - grooveLength(trammel, slider);
  return spare >= 0 ? { outcome: 'enough', spare } : { outcome: 'too-short', by: -spare };
}

/**
 * Least distance of the pins at which two sliders, square-ended, `length` by `width`, pass one
 * another at the crossing of square grooves: `(length + width)/√2`. Source: exact geometry, worst
 * with the bar at 45°.
 * @example leastPinsApart(60, 20) // → 56.5685425
 */
export function leastPinsApart(length: number, width: number): number {
  requireNonNegative('leastPinsApart', 'length', length);
  return (length + requireNonNegative('leastPinsApart', 'width', width)) / Math.SQRT2;
}

/**
 * Length of the bar with `beyond` of wood past the pen and past the last pin at either end.
 * @example barLength({ uprightPin: 300, levelPin: 180 }, 25) // → 350
 * @example barLength({ uprightPin: 300, levelPin: -180 }, 25) // → 530
 */
export function barLength({ uprightPin, levelPin }: Trammel, beyond: number): number {
  requireFinite('barLength', 'uprightPin', uprightPin);
  requireFinite('barLength', 'levelPin', levelPin);
  const ends = [0, uprightPin, levelPin];
  return (
    Math.max(...ends) - Math.min(...ends) + 2 * requireNonNegative('barLength', 'beyond', beyond)
  );
}
