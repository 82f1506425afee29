import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { acosClamped, asinClamped } from '@/lib/numeric/tolerance';
import { direction, distance, type Point } from '@/lib/geometry/point';
import type { CrankMotion } from '@/lib/kinematics/linkage/four-bar-motion';

/**
 * A crank pin that runs in the slot of a lever. The crank turns about the origin; the lever's
 * pivot stands at (0, −centreDistance). Any one unit.
 */
export interface SlottedLever {
  readonly crank: number;
  readonly centreDistance: number;
}

export interface ShaperStrokes {
  /** Swing of the lever to either side of the line of centres, radians. */
  readonly halfSwing: number;
  /** Time of the slow stroke over the quick one. */
  readonly timeRatio: number;
}

export type ShaperOutcome =
  | ({ readonly outcome: 'swings' } & ShaperStrokes)
  /** The crank is as long as the centres are apart: the lever may go on or turn back. */
  | { readonly outcome: 'change-point' }
  | { readonly outcome: 'turns-right-round'; readonly by: number };

/**
 * Swing and time ratio of a crank shaper, whose lever swings.
 *
 * Outcomes: `swings`; `change-point`; `turns-right-round` by crank − centreDistance: see
 * `whitworthStrokes`. Throws `RangeError` for lengths that are not positive. Source: sin ψ = r/d;
 * R. S. Khurmi and J. K. Gupta, Theory of Machines.
 * @example shaperStrokes({ crank: 120, centreDistance: 240 }) // → { outcome: 'swings', halfSwing: 0.523599, timeRatio: 2 }
 */
export function shaperStrokes(lever: SlottedLever): ShaperOutcome {
  const { crank, centreDistance } = requireLever('shaperStrokes', lever);
  if (crank === centreDistance) return { outcome: 'change-point' };
  if (crank > centreDistance) return { outcome: 'turns-right-round', by: crank - centreDistance };
  const halfSwing = asinClamped(crank / centreDistance);
  const quarter = Math.PI / 2;
  return {
    outcome: 'swings',
    halfSwing,
    timeRatio: (quarter + halfSwing) / (quarter - halfSwing),
  };
}

/**
 * Way across, from end to end, of a lever's end `length` from its pivot, for a half swing.
 * @example shaperStroke(450, radians(30)) // → 450
 */
export function shaperStroke(length: number, halfSwing: number): number {
  requireMeasure('shaperStroke', 'halfSwing', halfSwing);
  return 2 * requireSize('shaperStroke', 'length', length) * Math.sin(halfSwing);
}

/**
 * Crank of a shaper for a wanted time ratio: the inverse of `shaperStrokes`. Throws `RangeError`
 * for a ratio under 1.
 * @example shaperCrank(240, 2) // → 120
 */
export function shaperCrank(centreDistance: number, timeRatio: number): number {
  requireSize('shaperCrank', 'centreDistance', centreDistance);
  const over = requireSizeOrNought('shaperCrank', 'timeRatio − 1', timeRatio - 1);
  return centreDistance * Math.sin(((Math.PI / 2) * over) / (timeRatio + 1));
}

export type WhitworthOutcome =
  | {
      readonly outcome: 'turns';
      /** Crank's turn during the lever's quick half turn, radians. */
      readonly quickAngle: number;
      readonly timeRatio: number;
    }
  | { readonly outcome: 'change-point' }
  | { readonly outcome: 'only-swings'; readonly by: number };

/**
 * Whitworth's quick return, whose lever turns right round: crank's turn in the quick half.
 *
 * Outcomes: `turns`; `change-point`; `only-swings` by centreDistance − crank. Throws as
 * `shaperStrokes`. Source: cos = d/r; R. S. Khurmi and J. K. Gupta, Theory of Machines.
 * @example whitworthStrokes({ crank: 75, centreDistance: 50 }) // → { outcome: 'turns', quickAngle: 1.682137, timeRatio: 2.735239 }
 */
export function whitworthStrokes(lever: SlottedLever): WhitworthOutcome {
  const { crank, centreDistance } = requireLever('whitworthStrokes', lever);
  if (crank === centreDistance) return { outcome: 'change-point' };
  if (crank < centreDistance) return { outcome: 'only-swings', by: centreDistance - crank };
  const quickAngle = 2 * acosClamped(centreDistance / crank);
  return { outcome: 'turns', quickAngle, timeRatio: (2 * Math.PI - quickAngle) / quickAngle };
}

/** The lever on the move. */
export interface LeverMotion {
  /** Direction from the pivot to the crank pin, radians from −π to π. */
  readonly angle: number;
  /** Distance of the crank pin from the pivot: where it stands in the slot. */
  readonly reach: number;
  readonly speed: number;
  readonly acceleration: number;
}

export type LeverOutcome =
  | ({ readonly outcome: 'moves' } & LeverMotion)
  /** The pin stands on the pivot: only with equal lengths. */
  | { readonly outcome: 'change-point' };

/**
 * Angle, speed and acceleration of the slotted lever at a crank angle from +x.
 *
 * Outcomes: `moves`, `change-point`. Throws as `shaperStrokes`. Source: exact geometry.
 * @example leverMotion({ crank: 120, centreDistance: 240 }, { angle: Math.PI / 2, speed: 3 }) // → { outcome: 'moves', angle: 1.570796, reach: 360, speed: 1, acceleration: 0 }
 */
export function leverMotion(
  lever: SlottedLever,
  { angle, speed, acceleration = 0 }: CrankMotion,
): LeverOutcome {
  const { crank, centreDistance } = requireLever('leverMotion', lever);
  requireMeasure('leverMotion', 'angle', angle);
  requireMeasure('leverMotion', 'speed', speed);
  requireMeasure('leverMotion', 'acceleration', acceleration);
  const at: Point = {
    x: crank * Math.cos(angle),
    y: crank * Math.sin(angle) + centreDistance,
  };
  const reach = distance(at, { x: 0, y: 0 });
  if (reach <= 1e-9 * crank) return { outcome: 'change-point' };
  const squared = reach * reach;
  const share = (crank * (crank + centreDistance * Math.sin(angle))) / squared;
  const lean = (crank * centreDistance * Math.cos(angle)) / squared;
  const bend = lean * (1 - 2 * share);
  return {
    outcome: 'moves',
    angle: direction(at),
    reach,
    speed: share * speed,
    acceleration: share * acceleration + bend * speed * speed,
  };
}

/**
 * Least and greatest distance of the pin from the lever's pivot: the slot's ends, pin and air left out.
 * @example slotRange({ crank: 120, centreDistance: 240 }) // → { least: 120, most: 360 }
 */
export function slotRange(lever: SlottedLever): { readonly least: number; readonly most: number } {
  const { crank, centreDistance } = requireLever('slotRange', lever);
  return { least: Math.abs(centreDistance - crank), most: centreDistance + crank };
}

function requireLever(caller: string, { crank, centreDistance }: SlottedLever): SlottedLever {
  return {
    crank: requireSize(caller, 'crank', crank),
    centreDistance: requireSize(caller, 'centreDistance', centreDistance),
  };
}
