import { requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount, requireWithin } from '@/lib/numeric/require';

/** A worm and its wheel. */
export interface WormSpec {
  /** Threads of the worm. */
  readonly starts: number;
  readonly wheelTeeth: number;
  /** Module along the worm's axis. */
  readonly module: number;
  /** Pitch diameter of the worm. */
  readonly wormDiameter: number;
}

/** Sizes of a worm drive. */
export interface WormDrive {
  /** Turns of the worm for one of the wheel. */
  readonly ratio: number;
  /** What the wheel's rim moves in one turn of the worm. */
  readonly lead: number;
  /** Radians. */
  readonly leadAngle: number;
  readonly centreDistance: number;
}

/** Whether a load on the wheel can turn the worm. */
export type WormHolding =
  /** It cannot: the lead's slope stays `spare` (a share of the friction) below the friction. */
  | { readonly outcome: 'holds'; readonly spare: number }
  /** It can: the slope is greater by `excess`, a pure number like the friction. */
  | { readonly outcome: 'creeps'; readonly excess: number };

/**
 * Turns of the worm for one of its wheel: teeth over starts.
 *
 * @throws RangeError for nonsense.
 * Source: case TN-WM-01.
 * @example wormRatio(2, 50) // → 25
 */
export function wormRatio(starts: number, wheelTeeth: number): number {
  return (
    requireCount('wormRatio', 'wheelTeeth', wheelTeeth) /
    requireCount('wormRatio', 'starts', starts)
  );
}

/**
 * Ratio, lead, lead angle and centres of a worm drive with square shafts.
 *
 * @throws RangeError for nonsense.
 * Source: lead sπm, tan λ = sm/d, distance (d + mz)/2 (any book of gears).
 * @example wormDrive({ starts: 1, wheelTeeth: 40, module: 4, wormDiameter: 40 }).centreDistance // → 100
 */
export function wormDrive(spec: WormSpec): WormDrive {
  const ratio = wormRatio(spec.starts, spec.wheelTeeth);
  const size = requireSize('wormDrive', 'module', spec.module);
  const diameter = requireSize('wormDrive', 'wormDiameter', spec.wormDiameter);
  return {
    ratio,
    lead: spec.starts * Math.PI * size,
    leadAngle: Math.atan2(spec.starts * size, diameter),
    centreDistance: (diameter + size * spec.wheelTeeth) / 2,
  };
}

/**
 * Whether a worm holds its load by friction.
 *
 * `friction` is the coefficient; `faceAngle` the slant of the thread's side in the axial section
 * (radians; 0 for a square thread), which raises the friction to μ/cos. A fifth to spare is common
 * practice, for a shaken worm creeps.
 *
 * @throws RangeError for nonsense.
 * Source: ramp and friction: the load slides when tan λ is more than μ/cos α.
 * @example wormHolding(Math.atan(0.1), 0.2).outcome // → 'holds'
 */
export function wormHolding(leadAngle: number, friction: number, faceAngle = 0): WormHolding {
  const slope = Math.tan(
    requireWithin('wormHolding', 'leadAngle', leadAngle, 0, Math.PI / 2 - 1e-9),
  );
  const grip = effectiveFriction('wormHolding', friction, faceAngle);
  return slope < grip
    ? { outcome: 'holds', spare: 1 - slope / grip }
    : { outcome: 'creeps', excess: slope - grip };
}

/**
 * The share of the work put into the worm that comes out at its wheel, friction in the thread only.
 *
 * 0 when the worm cannot be driven at all (the friction's angle and the lead's reach a right angle).
 *
 * @throws RangeError for nonsense.
 * Source: tan λ/tan(λ + ρ) with tan ρ = μ/cos α (any book of machine elements).
 * @example wormEfficiency(Math.PI / 4, 0) // → 1
 */
export function wormEfficiency(leadAngle: number, friction: number, faceAngle = 0): number {
  const slope = Math.tan(
    requireWithin('wormEfficiency', 'leadAngle', leadAngle, 0, Math.PI / 2 - 1e-9),
  );
  const grip = effectiveFriction('wormEfficiency', friction, faceAngle);
  if (slope === 0) return grip === 0 ? 1 : 0;
  return Math.max(0, (slope * (1 - slope * grip)) / (slope + grip));
}

function effectiveFriction(caller: string, friction: number, faceAngle: number): number {
  requireSizeOrNought(caller, 'friction', friction);
  return friction / Math.cos(requireWithin(caller, 'faceAngle', faceAngle, 0, Math.PI / 3));
}
