import { finiteResult } from '@/lib/numeric/finite-result';
import { type Point, polar } from '@/lib/geometry/point';
import {
  requireCount,
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/** A spiral that gains `lift` evenly over `angle` from `startRadius`: half a heart, or a snail. */
export interface Spiral {
  readonly startRadius: number;
  readonly lift: number;
  readonly angle: number;
}

/** The radius of a spiral under a knife edge in line with the axle, and how far the push leans. */
export interface SpiralPlace {
  readonly radius: number;
  readonly pressureAngle: number;
}

/**
 * A spiral, `turned` from its low end: r = r₀ + h·θ/β and tan φ = (h/β)/r.
 *
 * Radians; one unit of length. The low end is the steepest.
 *
 * @throws RangeError for a start radius or an angle of 0 or less, a lift below 0, a place beyond the ends.
 * @see the spiral of Archimedes.
 * @example spiralAt({ startRadius: 25, lift: 40, angle: Math.PI }, Math.PI / 2).radius // → 45
 */
export function spiralAt(spiral: Spiral, turned: number): SpiralPlace {
  requireSpiral('spiralAt', spiral);
  requireWithin('spiralAt', 'turned', turned, 0, spiral.angle);
  const radius = spiral.startRadius + spiral.lift * (turned / spiral.angle);
  const pressureAngle = Math.atan2(spiral.lift / spiral.angle, radius);
  return finiteResult('spiralAt', { radius, pressureAngle });
}

/**
 * How far from its low end a spiral reaches `radius`: the inverse of `spiralAt`.
 *
 * `beyond-the-ends` with the length that is missing.
 *
 * @throws RangeError as `spiralAt`, for a lift of 0, or a radius that is no finite number.
 * @example spiralAngle({ startRadius: 25, lift: 40, angle: 2 }, 45) // → { outcome: 'reaches', turned: 1 }
 */
export function spiralAngle(
  spiral: Spiral,
  radius: number,
):
  | { readonly outcome: 'reaches'; readonly turned: number }
  | { readonly outcome: 'beyond-the-ends'; readonly by: number } {
  requireSpiral('spiralAngle', spiral);
  requirePositive('spiralAngle', 'lift', spiral.lift);
  requireFinite('spiralAngle', 'radius', radius);
  const gained = radius - spiral.startRadius;
  const by = Math.max(-gained, gained - spiral.lift);
  return finiteResult(
    'spiralAngle',
    by > 0
      ? { outcome: 'beyond-the-ends', by }
      : { outcome: 'reaches', turned: (gained / spiral.lift) * spiral.angle },
  );
}

/**
 * A heart cam: an even rise over half a turn and the same way back.
 *
 * `turned` from the low place, any angle; the pressure angle is below 0 on the way down.
 *
 * @throws RangeError for a start radius of 0 or less, a lift below 0, an angle that is no number.
 * @example heartCam({ startRadius: 25, lift: 40 }, Math.PI / 2) // → { radius: 45, pressureAngle: 0.275735 }
 */
export function heartCam(heart: Omit<Spiral, 'angle'>, turned: number): SpiralPlace {
  requireFinite('heartCam', 'turned', turned);
  const spiral = { ...heart, angle: Math.PI };
  requireSpiral('heartCam', spiral);
  const into = turned - 2 * Math.PI * Math.floor(turned / (2 * Math.PI));
  const rising = into <= Math.PI;
  const place = spiralAt(
    spiral,
    Math.min(Math.PI, Math.max(0, rising ? into : 2 * Math.PI - into)),
  );
  return rising ? place : { ...place, pressureAngle: -place.pressureAngle };
}

/** A snail: `lobes` equal spirals a turn, each with a rest at the low radius behind its step. */
export interface Snail {
  readonly startRadius: number;
  readonly lift: number;
  readonly lobes: number;
  /** The angle of the rest after each drop. */
  readonly rest: number;
}

/** The outline of a snail, or the angle that its slope, its rest or its leaning step lacks. */
export type SnailOutline =
  | { readonly outcome: 'outlined'; readonly points: readonly Point[]; readonly slopeAngle: number }
  | { readonly outcome: 'no-room'; readonly by: number };

/**
 * The closed outline of a snail that lifts while it turns counter-clockwise, its first step at +y
 * and its places in order clockwise; `lean` puts the foot of the step forward under its nose (< 0:
 * undercut) or back behind it (> 0).
 *
 * Radians; `steps` places a spiral. `no-room` if the rests leave no slope, or a step leans out over its rest or in through its slope.
 *
 * @throws RangeError for a start radius or a lift of 0 or less, lobes or steps that are no counts.
 * @see the spiral of Archimedes under a cam turning counter-clockwise, as `camProfile` draws it.
 */
export function snailOutline(snail: Snail, lean = 0, steps = 90): SnailOutline {
  const { startRadius, lift, lobes, rest } = snail;
  requirePositive('snailOutline', 'startRadius', startRadius);
  requirePositive('snailOutline', 'lift', lift);
  requireCount('snailOutline', 'lobes', lobes);
  requireWithin('snailOutline', 'lobes', lobes, 1, 360);
  requireNonNegative('snailOutline', 'rest', rest);
  requireWithin('snailOutline', 'lean', lean, -Math.PI / 3, Math.PI / 3);
  requireCount('snailOutline', 'steps', steps, 2);
  requireWithin('snailOutline', 'steps', steps, 2, 10_000);
  const slopeAngle = (2 * Math.PI) / lobes - rest;
  const by = Math.max(-slopeAngle, lean - rest, -lean - slopeAngle);
  if (slopeAngle <= 0 || by > 0) {
    return finiteResult('snailOutline', { outcome: 'no-room', by });
  }
  const lobe = (k: number): Point[] => {
    const nose = Math.PI / 2 - (k * 2 * Math.PI) / lobes;
    const foot = polar(startRadius, nose - lean);
    const slope = Array.from({ length: steps + 1 }, (_, i) =>
      polar(startRadius + (lift * i) / steps, nose - rest - (slopeAngle * i) / steps),
    );
    return [foot, ...restArc(startRadius, nose - lean, nose - rest), ...slope];
  };
  const points = Array.from({ length: lobes }, (_, k) => lobe(k)).flat();
  return finiteResult('snailOutline', { outcome: 'outlined', points, slopeAngle });
}

function restArc(radius: number, from: number, to: number): Point[] {
  const pieces = Math.max(1, Math.ceil(Math.abs(to - from) / (Math.PI / 90)));
  return Array.from({ length: pieces - 1 }, (_, i) =>
    polar(radius, from + ((to - from) * (i + 1)) / pieces),
  );
}

function requireSpiral(caller: string, { startRadius, lift, angle }: Spiral): void {
  requirePositive(caller, 'startRadius', startRadius);
  requireNonNegative(caller, 'lift', lift);
  requirePositive(caller, 'angle', angle);
}
