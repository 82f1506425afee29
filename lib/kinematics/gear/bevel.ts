import { requireSize } from '@/lib/numeric/moderate';
import { requireCount, requireWithin } from '@/lib/numeric/require';

/** Two bevel wheels on shafts that cross. */
export interface BevelSpec {
  readonly firstTeeth: number;
  readonly secondTeeth: number;
  /** Between the shafts, radians, more than 0 and less than half a turn. */
  readonly shaftAngle: number;
}

/** The pitch cones, rolling on each other with their points together. */
export interface BevelCones {
  /** Half angles of the cones at their points, radians; together the shaft angle. */
  readonly first: number;
  readonly second: number;
  /**
   * `outside`: both cones are convex. `crown`: one is flat, a face wheel. `inside`: one is hollow,
   * with its half angle over a quarter turn.
   */
  readonly form: 'outside' | 'crown' | 'inside';
}

/** Sizes of one bevel wheel at its large end. */
export interface BevelWheel {
  readonly pitchDiameter: number;
  /** From the point of the cone to the large end, along the cone. */
  readonly coneLength: number;
  /** Across the tips: the pitch diameter and an addendum square to the cone on either side. */
  readonly outsideDiameter: number;
  /** Teeth of the spur wheel that has the same profile (Tredgold). */
  readonly spurTeeth: number;
}

/** A cone within this of a quarter turn is flat. */
const flatTolerance = 1e-12;

/**
 * The pitch cones of a pair of bevel wheels.
 *
 * @throws RangeError for nonsense.
 * Source: tan γ₁ = sin Σ/(z₂/z₁ + cos Σ); cases GR-BV-01 and 02.
 * @example bevelCones({ firstTeeth: 20, secondTeeth: 40, shaftAngle: Math.PI / 2 }).first // → 0.4636476090008061
 */
export function bevelCones(spec: BevelSpec): BevelCones {
  const first = requireCount('bevelCones', 'firstTeeth', spec.firstTeeth);
  const second = requireCount('bevelCones', 'secondTeeth', spec.secondTeeth);
  const angle = requireWithin('bevelCones', 'shaftAngle', spec.shaftAngle, 1e-9, Math.PI - 1e-9);
  const [sine, cosine] = [Math.sin(angle), Math.cos(angle)];
  const cones = {
    first: Math.atan2(first * sine, second + first * cosine),
    second: Math.atan2(second * sine, first + second * cosine),
  };
  const over = Math.max(cones.first, cones.second) - Math.PI / 2;
  const form = Math.abs(over) <= flatTolerance ? 'crown' : over > 0 ? 'inside' : 'outside';
  return { ...cones, form };
}

/**
 * Sizes of one bevel wheel of module m at its large end.
 *
 * `cone` is its half angle from `bevelCones`, more than 0 and less than a quarter turn.
 *
 * @throws RangeError for nonsense, a flat or a hollow cone.
 * Source: cone length d/(2 sin γ), at square shafts (m/2)√(z₁² + z₂²); Tredgold's z/cos γ.
 * @example bevelWheel({ module: 4, teeth: 20 }, Math.atan(0.5)).coneLength // → 89.4427191
 */
export function bevelWheel(
  wheel: { readonly module: number; readonly teeth: number },
  cone: number,
): BevelWheel {
  const size = requireSize('bevelWheel', 'module', wheel.module);
  const teeth = requireCount('bevelWheel', 'teeth', wheel.teeth);
  requireWithin('bevelWheel', 'cone', cone, 1e-9, Math.PI / 2 - flatTolerance);
  const pitchDiameter = size * teeth;
  return {
    pitchDiameter,
    coneLength: pitchDiameter / (2 * Math.sin(cone)),
    outsideDiameter: pitchDiameter + 2 * size * Math.cos(cone),
    spurTeeth: teeth / Math.cos(cone),
  };
}
