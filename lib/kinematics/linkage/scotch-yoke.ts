import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import { acosClamped } from '@/lib/numeric/tolerance';
import type { CrankMotion } from '@/lib/kinematics/linkage/four-bar-motion';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A Scotch yoke: a crank pin in the straight slot of a plate that slides along x. Any one unit.
 */
export interface ScotchYoke {
  readonly crank: number;
  /** Lean of the slot from square to the slide, radians counter-clockwise, under a quarter turn. */
  readonly slant?: number;
}

export interface YokeMotion {
  /** The plate's place along x: that of the slot where it crosses the slide's line. */
  readonly position: number;
  readonly velocity: number;
  readonly acceleration: number;
}

/**
 * Position, velocity and acceleration of the yoke at a crank angle from the slide's direction.
 *
 * Square slot: crank·cos θ, a pure wave. Slanted by γ: crank·cos(θ − γ)/cos γ. Throws `RangeError`
 * for a crank that is not positive or a slant of a quarter turn. Source: projection of the crank
 * pin along the slot.
 * @example yokeMotion({ crank: 35 }, { angle: radians(50), speed: 4 }) // → { position: 22.497566, velocity: -107.246222, acceleration: -359.961061 }
 */
export function yokeMotion(
  yoke: ScotchYoke,
  { angle, speed, acceleration = 0 }: CrankMotion,
): YokeMotion {
  const { crank, slant } = requireYoke('yokeMotion', yoke);
  requireMeasure('yokeMotion', 'angle', angle);
  requireMeasure('yokeMotion', 'speed', speed);
  requireMeasure('yokeMotion', 'acceleration', acceleration);
  const reach = crank / Math.cos(slant);
  const [cosine, sine] = [Math.cos(angle - slant), Math.sin(angle - slant)];
  return {
    position: reach * cosine,
    velocity: 0 - reach * speed * sine,
    acceleration: 0 - reach * (acceleration * sine + speed * speed * cosine),
  };
}

/**
 * Travel of the yoke from end to end: twice the crank, over the cosine of the slant.
 * @example yokeStroke({ crank: 35 }) // → 70
 */
export function yokeStroke(yoke: ScotchYoke): number {
  const { crank, slant } = requireYoke('yokeStroke', yoke);
  return (2 * crank) / Math.cos(slant);
}

/**
 * Least length of the slot for a pin of diameter `pin` with `air` at both ends.
 * @example slotLength({ crank: 35 }, 8, 1) // → 80
 */
export function slotLength(yoke: ScotchYoke, pin: number, air: number): number {
  requireSizeOrNought('slotLength', 'pin', pin);
  return yokeStroke(yoke) + pin + 2 * requireSizeOrNought('slotLength', 'air', air);
}

/**
 * Share of a turn that the yoke spends within the top `share` of its travel: acos(1 − 2·share)/π.
 * @example shareOfTurnNearEnd(0.25) // → 0.333333333
 */
export function shareOfTurnNearEnd(share: number): number {
  return acosClamped(1 - 2 * requireWithin('shareOfTurnNearEnd', 'share', share, 0, 1)) / Math.PI;
}

/**
 * A Scotch yoke as data for the general solver: points `O2`, `A` (crank pin), `Y` (the plate on
 * its slide), `X` on the slide's line and `S` in the slot's direction from O2; driven by the crank.
 */
export function yokeLinkage(yoke: ScotchYoke): Linkage {
  const { crank, slant } = requireYoke('yokeLinkage', yoke);
  return {
    points: {
      O2: { x: 0, y: 0 },
      A: { x: crank, y: 0 },
      Y: { x: crank, y: 0 },
      X: { x: crank, y: 0 },
      S: { x: -crank * Math.sin(slant), y: crank * Math.cos(slant) },
    },
    fixed: ['O2', 'X', 'S'],
    bars: [{ ends: ['O2', 'A'], length: crank }],
    slides: [
      { point: 'Y', along: ['O2', 'X'] },
      { point: 'A', along: ['O2', 'S'], through: 'Y' },
    ],
    drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
  };
}

function requireYoke(caller: string, { crank, slant = 0 }: ScotchYoke): Required<ScotchYoke> {
  requireSize(caller, 'crank', crank);
  requireMeasure(caller, 'slant', slant);
  if (Math.abs(slant) >= Math.PI / 2 - 1e-9) {
    throw new RangeError(`${caller}: slant is ${slant}; expected less than a quarter turn`);
  }
  return { crank, slant };
}
