import { involute, involuteInverse, pressureAngleAt } from '@/lib/kinematics/gear/involute';
import { completeGear, gearProportions } from '@/lib/kinematics/gear/proportions';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';
import { requireSize } from '@/lib/numeric/moderate';

/** The thickness of a tooth at a radius, or why there is none. */
export type ToothThickness =
  | { readonly outcome: 'tooth'; readonly thickness: number }
  /** The radius lies `inside` the base circle, where there is no involute. */
  | { readonly outcome: 'inside-base-circle'; readonly inside: number }
  /** The flanks have met already, `beyond` nearer to the centre. */
  | { readonly outcome: 'beyond-the-point'; readonly beyond: number };

/** What a calliper and a depth gauge find across one tooth on the pitch circle. */
export interface ChordalTooth {
  /** Straight across the tooth. */
  readonly thickness: number;
  /** From that chord to the tip. */
  readonly addendum: number;
}

/**
 * Thickness of a tooth along the arc at `radius`, of involutes continued as far as they go.
 *
 * Lengths in the unit of the module.
 * - `tooth`: s = 2r(s₀/d + inv α − inv α_r).
 * - `inside-base-circle`, `beyond-the-point`: no involute there, by how much.
 *
 * @throws RangeError for nonsense.
 * Source: ISO 21771; case GR-TT-01.
 * @example toothThickness({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }, 39) // → { outcome: 'tooth', thickness: 2.14665130055 }
 */
export function toothThickness(spec: GearSpec, radius: number): ToothThickness {
  const baseRadius = gearProportions(spec).baseDiameter / 2;
  requireSize('toothThickness', 'radius', radius);
  if (radius < baseRadius) return { outcome: 'inside-base-circle', inside: baseRadius - radius };
  const pointed = pointedRadius(spec);
  if (radius > pointed) return { outcome: 'beyond-the-point', beyond: radius - pointed };
  const half = halfAngleAtBase(spec) - involute(pressureAngleAt(baseRadius, radius));
  return { outcome: 'tooth', thickness: Math.max(0, 2 * radius * half) };
}

/**
 * Thickness of a tooth along the base circle, where its involutes begin.
 *
 * @throws RangeError for nonsense, and if the shift leaves no tooth.
 * @example baseThickness({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }) // → 5.43659599784
 */
export function baseThickness(spec: GearSpec): number {
  return gearProportions(spec).baseDiameter * halfAngleAtBase(spec);
}

/**
 * The radius at which the flanks of a tooth meet in a point.
 *
 * @throws RangeError for nonsense, and if the shift leaves no tooth.
 * @example pointedRadius({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }) // → 40.7601046136
 */
export function pointedRadius(spec: GearSpec): number {
  const baseRadius = gearProportions(spec).baseDiameter / 2;
  return baseRadius / Math.cos(involuteInverse(halfAngleAtBase(spec)));
}

/**
 * Thickness straight across a tooth on the pitch circle, and the height of the tip above that chord.
 *
 * @throws RangeError for nonsense.
 * Source: SDP/SI, Elements of Metric Gear Technology, Table 10-1 (re-read); case GR-CH-02.
 * @example chordalTooth({ module: 10, teeth: 12, pressureAngle: Math.PI / 9, shift: 0.3 }).thickness // → 17.8255684347
 */
export function chordalTooth(spec: GearSpec): ChordalTooth {
  const gear = completeGear('chordalTooth', spec);
  const { thickness, pitchDiameter } = gearProportions(spec);
  const half = thickness / pitchDiameter;
  return {
    thickness: pitchDiameter * Math.sin(half),
    addendum: gear.module * (gear.addendum + gear.shift) + pitchDiameter * Math.sin(half / 2) ** 2,
  };
}

/** Half the angle of a tooth at the base circle. */
function halfAngleAtBase(spec: GearSpec): number {
  const { thickness, pitchDiameter } = gearProportions(spec);
  const half = thickness / pitchDiameter + involute(spec.pressureAngle);
  return requireSize('toothThickness', 'tooth thickness at the base circle', half);
}
