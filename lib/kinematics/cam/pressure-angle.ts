import { findExtremes } from '@/lib/numeric/extremes';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requireWithin } from '@/lib/numeric/require';
import { peakFactors } from './peak-factors';
import { type Rise, requireRise, requireTurned, riseMotion } from './rise';
import { type OutOfReach, type TranslatingRoller, restHeight } from './translating-roller';

/** How far the cam's push leans from the follower's line. */
export type PressureAngle = { readonly outcome: 'leans'; readonly angle: number } | OutOfReach;

/** The greatest pressure angle of a rise, and how far into the rise it comes. */
export type GreatestPressureAngle =
  { readonly outcome: 'leans'; readonly angle: number; readonly at: number } | OutOfReach;

/**
 * The pressure angle of a sliding roller, `turned` into the rise; above 0 when the cam pushes the
 * follower the way its rim goes.
 *
 * Radians; one unit of length. `out-of-reach` if the offset leaves the prime circle.
 *
 * @throws RangeError for an impossible rise, follower or place in the rise.
 * @see tan φ = (s′ − e)/(s + √((R_b + ρ)² − e²)): Norton, Design of Machinery, cam design.
 * @example pressureAngle({ law: 'simple-harmonic', lift: 20, angle: Math.PI / 2 }, { baseRadius: 40, rollerRadius: 0, offset: 0 }, Math.PI / 4) // → { outcome: 'leans', angle: 0.380506 }
 */
export function pressureAngle(
  rise: Rise,
  follower: TranslatingRoller,
  turned: number,
): PressureAngle {
  requireRise('pressureAngle', rise);
  requireTurned('pressureAngle', rise, turned);
  const rest = restHeight(follower);
  if (rest.outcome === 'out-of-reach') return rest;
  const { position, velocity } = riseMotion(rise, turned);
  const angle = Math.atan2(velocity - follower.offset, position + rest.height);
  return finiteResult('pressureAngle', { outcome: 'leans', angle });
}

/**
 * The greatest pressure angle on the rise and where it comes: a little before the steepest place,
 * because there the follower stands lower.
 *
 * @throws RangeError for an impossible rise or follower.
 * @see the same formula; found by search, the angle to 1e-12, its place to 1e-7 of the rise.
 */
export function greatestPressureAngle(
  rise: Rise,
  follower: TranslatingRoller,
): GreatestPressureAngle {
  requireRise('greatestPressureAngle', rise);
  const rest = restHeight(follower);
  if (rest.outcome === 'out-of-reach') return rest;
  const lean = (turned: number) => {
    const { position, velocity } = riseMotion(rise, turned);
    return Math.atan2(velocity - follower.offset, position + rest.height);
  };
  const { at, value } = findExtremes(lean, 0, rise.angle).most;
  return finiteResult('greatestPressureAngle', { outcome: 'leans', angle: value, at });
}

/**
 * The least base radius that keeps the pressure angle at or under `allowed` all through the rise;
 * 0 if any base will do.
 *
 * Solved for the height at rest: √(R_p² − e²) ≥ (s′ − e)/tan φ − s everywhere, so no trial is needed.
 *
 * @throws RangeError for an impossible rise or roller, or an allowed angle outside 0 to π/2.
 * @see the formula of `pressureAngle`, solved for the base.
 */
export function leastBaseRadius(
  rise: Rise,
  follower: Omit<TranslatingRoller, 'baseRadius'>,
  allowed: number,
): number {
  requireRise('leastBaseRadius', rise);
  const { rollerRadius, offset } = follower;
  requireNonNegative('leastBaseRadius', 'rollerRadius', rollerRadius);
  requireFinite('leastBaseRadius', 'offset', offset);
  requireAllowed('leastBaseRadius', allowed);
  const needed = (turned: number) => {
    const { position, velocity } = riseMotion(rise, turned);
    return (velocity - offset) / Math.tan(allowed) - position;
  };
  const height = Math.max(0, findExtremes(needed, 0, rise.angle).most.value);
  return finiteResult('leastBaseRadius', Math.max(0, Math.hypot(height, offset) - rollerRadius));
}

/**
 * The base radius that gives the pressure angle `allowed` at mid-rise of a follower in line with
 * the axle: the drawing-board rule, a little small, since the greatest angle comes earlier.
 *
 * @throws RangeError for an impossible rise or roller, or an allowed angle outside 0 to π/2.
 * @see R_b = (C_v·h/β)/tan φ − h/2 − ρ, for laws that are steepest at mid-rise.
 * @example midRiseBaseRadius({ law: 'simple-harmonic', lift: 30, angle: 7 * Math.PI / 18 }, 10, Math.PI / 6) // → 41.8077
 */
export function midRiseBaseRadius(rise: Rise, rollerRadius: number, allowed: number): number {
  requireRise('midRiseBaseRadius', rise);
  requireNonNegative('midRiseBaseRadius', 'rollerRadius', rollerRadius);
  requireAllowed('midRiseBaseRadius', allowed);
  const slope = (peakFactors(rise.law).velocity * rise.lift) / rise.angle;
  return finiteResult(
    'midRiseBaseRadius',
    Math.max(0, slope / Math.tan(allowed) - rise.lift / 2 - rollerRadius),
  );
}

function requireAllowed(caller: string, allowed: number): void {
  requireWithin(caller, 'allowed', allowed, Number.MIN_VALUE, Math.PI / 2);
}
