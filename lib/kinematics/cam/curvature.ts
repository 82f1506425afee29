import { findExtremes } from '@/lib/numeric/extremes';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative } from '@/lib/numeric/require';
import { rolledCurve } from './rolled-curve';
import { type Rise, requireRise, requireTurned, riseMotion } from './rise';
import { type OutOfReach, type TranslatingRoller, restHeight } from './translating-roller';

/** A radius of curvature, above 0 where the curve bulges outward. */
export type CurvatureRadius = number | 'infinite';

/** The curvature of the roller's path (the pitch curve) at one place. */
export type PitchCurvature =
  | {
      readonly outcome: 'curves';
      readonly curvature: number;
      readonly radius: CurvatureRadius;
    }
  | OutOfReach;

/** Whether a roller can follow its own path round the sharpest bend, and by how much not. */
export type SharpestBend =
  | {
      readonly outcome: 'clean';
      /** Of the roller's path; infinite if the rise bulges nowhere. */
      readonly pitchRadius: CurvatureRadius;
      /** Of the rim: one roller radius less. */
      readonly rimRadius: CurvatureRadius;
      readonly at: number;
    }
  | {
      readonly outcome: 'undercut';
      readonly pitchRadius: number;
      readonly rimRadius: number;
      readonly at: number;
      /** How much smaller the roller's radius must be for the rim to come to a mere point. */
      readonly by: number;
    }
  | OutOfReach;

/**
 * The curvature of the path of the roller's centre on the cam, `turned` into the rise.
 *
 * @throws RangeError for an impossible rise, follower or place in the rise.
 * @see ρ = (y² + s′²)^{3/2}/(y² + 2s′² − y·s″) in line, y = R_p + s; with offset by `rolledCurve`.
 */
export function pitchCurvature(
  rise: Rise,
  follower: TranslatingRoller,
  turned: number,
): PitchCurvature {
  requireRise('pitchCurvature', rise);
  requireTurned('pitchCurvature', rise, turned);
  const rest = restHeight(follower);
  if (rest.outcome === 'out-of-reach') return rest;
  const curvature = curvatureOnRise(rise, follower.offset, rest.height, turned);
  const radius = radiusOf(curvature);
  return finiteResult('pitchCurvature', { outcome: 'curves', curvature, radius });
}

/**
 * The sharpest outward bend on the rise, of the roller's path and of the rim: the roller
 * undercuts the rim where the bend of its path is no larger than itself.
 *
 * @throws RangeError for an impossible rise or follower.
 * @see ρ_rim = ρ_pitch − ρ_roller; least convex radius by search on each half of the rise.
 */
export function sharpestBend(rise: Rise, follower: TranslatingRoller): SharpestBend {
  requireRise('sharpestBend', rise);
  const rest = restHeight(follower);
  if (rest.outcome === 'out-of-reach') return rest;
  const bend = (turned: number) => curvatureOnRise(rise, follower.offset, rest.height, turned);
  // the parabolic law jumps at mid-rise: each half is searched by itself
  const halves = [
    findExtremes(bend, 0, rise.angle / 2).most,
    findExtremes(bend, rise.angle / 2, rise.angle).most,
  ];
  const { at, value } = halves.reduce((a, b) => (b.value > a.value ? b : a));
  return finiteResult('sharpestBend', judged(value, follower.rollerRadius, at));
}

/**
 * The least base radius of a flat-faced follower's cam that nowhere on the rise bends tighter
 * than `leastRadius`; 0 if any base will do.
 *
 * @throws RangeError for an impossible rise or a radius below 0.
 * @see ρ = R_b + s + s″, the radius of curvature under a flat face.
 */
export function leastFlatBaseRadius(rise: Rise, leastRadius: number): number {
  requireRise('leastFlatBaseRadius', rise);
  requireNonNegative('leastFlatBaseRadius', 'leastRadius', leastRadius);
  const lacking = (turned: number) => {
    const { position, acceleration } = riseMotion(rise, turned);
    return -position - acceleration;
  };
  const worst = Math.max(
    findExtremes(lacking, 0, rise.angle / 2).most.value,
    findExtremes(lacking, rise.angle / 2, rise.angle).most.value,
  );
  return finiteResult('leastFlatBaseRadius', Math.max(0, leastRadius + worst));
}

function curvatureOnRise(rise: Rise, offset: number, height: number, turned: number): number {
  const { position, velocity, acceleration } = riseMotion(rise, turned);
  const place = { x: offset, y: position + height };
  const curve = rolledCurve(place, { x: 0, y: velocity }, { x: 0, y: acceleration });
  if (curve === null) throw new RangeError('pitchCurvature: the roller stands on the axle');
  return curve.curvature;
}

function judged(curvature: number, rollerRadius: number, at: number): SharpestBend {
  if (curvature <= 0) {
    return { outcome: 'clean', pitchRadius: 'infinite', rimRadius: 'infinite', at };
  }
  const pitchRadius = 1 / curvature;
  const rimRadius = pitchRadius - rollerRadius;
  return rollerRadius > 0 && rimRadius <= 0
    ? { outcome: 'undercut', pitchRadius, rimRadius, at, by: -rimRadius }
    : { outcome: 'clean', pitchRadius, rimRadius, at };
}

function radiusOf(curvature: number): CurvatureRadius {
  return curvature === 0 ? 'infinite' : 1 / curvature;
}
