import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { LENGTH_TOLERANCE, sqrtClamped } from '@/lib/numeric/tolerance';
import type { CrankMotion } from '@/lib/kinematics/linkage/four-bar-motion';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A crank that moves a slider by a rod, any one unit. The crank turns about the origin; the
 * slider's pin runs on the line y = offset.
 */
export interface CrankSlider {
  readonly crank: number;
  readonly rod: number;
  /** Signed; 0, or left out, for a slider in line with the crank's axle. */
  readonly offset?: number;
}

/** The slider to the right or to the left of the crank pin. */
export type SliderSide = 'right' | 'left';

export interface CrankSliderPose {
  /** Where the slider's pin stands along its line. */
  readonly slider: number;
  /** Direction from the slider's pin to the crank pin, radians from −π to π. */
  readonly rodAngle: number;
}

export type CrankSliderOutcome =
  | { readonly outcome: 'closes'; readonly right: CrankSliderPose; readonly left: CrankSliderPose }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Both assemblies of a crank and slider at a crank angle (radians from the slider's line).
 *
 * Outcomes: `closes`, with two like poses where the rod stands square to the line;
 * `does-not-close` with the length by which the rod is too short. Throws `RangeError` for crank or
 * rod that are not positive. Source: R. L. Norton, Design of Machinery, example 4-2.
 * @example crankSliderPosition({ crank: 40, rod: 120, offset: -20 }, radians(60)).right // → { slider: 126.838005, rodAngle: 2.668837 }
 * @example crankSliderPosition({ crank: 100, rod: 40 }, radians(90)) // → { outcome: 'does-not-close', by: 60 }
 */
export function crankSliderPosition(
  mechanism: CrankSlider,
  crankAngle: number,
): CrankSliderOutcome {
  const { crank, rod, offset } = requireSlider('crankSliderPosition', mechanism);
  requireMeasure('crankSliderPosition', 'crankAngle', crankAngle);
  const rise = crank * Math.sin(crankAngle) - offset;
  const by = Math.abs(rise) - rod;
  if (by > LENGTH_TOLERANCE * (rod + crank)) return { outcome: 'does-not-close', by };
  const reach = sqrtClamped((rod - rise) * (rod + rise));
  const pin = crank * Math.cos(crankAngle);
  return {
    outcome: 'closes',
    right: { slider: pin + reach, rodAngle: Math.atan2(rise, 0 - reach) },
    left: { slider: pin - reach, rodAngle: Math.atan2(rise, reach) },
  };
}

export type CrankSliderMotionOutcome =
  | ({
      readonly outcome: 'moves';
      /** Of the slider, along its line. */
      readonly velocity: number;
      readonly acceleration: number;
      /** Of the rod, counter-clockwise positive. */
      readonly rodSpeed: number;
      readonly rodAcceleration: number;
    } & CrankSliderPose)
  /** The rod stands square to the line: the speeds have no limit. */
  | { readonly outcome: 'toggle' }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Velocity and acceleration of slider and rod.
 *
 * Frame as `crankSliderPosition`; crank angle, speed and acceleration in radians and seconds.
 * Outcomes: `moves`, `toggle`, `does-not-close`. Throws as `crankSliderPosition`.
 * Source: the loop equation differentiated twice.
 * @example crankSliderMotion({ crank: 50, rod: 200 }, 'right', { angle: radians(120), speed: 20 }) // → { outcome: 'moves', velocity: -755.142213, acceleration: 12497.768641, rodSpeed: 2.560738, rodAcceleration: 87.252347 }
 */
export function crankSliderMotion(
  mechanism: CrankSlider,
  side: SliderSide,
  { angle, speed, acceleration = 0 }: CrankMotion,
): CrankSliderMotionOutcome {
  requireMeasure('crankSliderMotion', 'speed', speed);
  requireMeasure('crankSliderMotion', 'acceleration', acceleration);
  const found = crankSliderPosition(mechanism, angle);
  if (found.outcome === 'does-not-close') return found;
  const pose = found[side];
  const pin = { x: mechanism.crank * Math.cos(angle), y: mechanism.crank * Math.sin(angle) };
  const run = pin.x - pose.slider;
  const rise = pin.y - (mechanism.offset ?? 0);
  if (Math.abs(run) <= 1e-9 * mechanism.rod) return { outcome: 'toggle' };
  const rodSpeed = (speed * pin.x) / run;
  const pull = {
    x: -acceleration * pin.y - speed ** 2 * pin.x,
    y: acceleration * pin.x - speed ** 2 * pin.y,
  };
  const rodAcceleration = (pull.y + rodSpeed ** 2 * rise) / run;
  return {
    outcome: 'moves',
    ...pose,
    velocity: rodSpeed * rise - speed * pin.y,
    acceleration: pull.x + rodAcceleration * rise + rodSpeed ** 2 * run,
    rodSpeed,
    rodAcceleration,
  };
}

/**
 * A crank and slider as data for the general solver: points `O2`, `A`, `C` (the slider's pin),
 * `G` and `H` on the groove; driven by the crank's angle, or by the slider along the groove from G,
 * which stands below or above the axle.
 */
export function crankSliderLinkage(
  mechanism: CrankSlider,
  {
    side = 'right',
    driver = 'crank',
  }: { readonly side?: SliderSide; readonly driver?: 'crank' | 'slider' } = {},
): Linkage {
  const { crank, rod, offset } = requireSlider('crankSliderLinkage', mechanism);
  const out = side === 'right' ? 1 : -1;
  return {
    points: {
      O2: { x: 0, y: 0 },
      A: { x: 0, y: crank },
      C: { x: out * rod, y: offset },
      G: { x: 0, y: offset },
      H: { x: rod, y: offset },
    },
    fixed: ['O2', 'G', 'H'],
    bars: [
      { ends: ['O2', 'A'], length: crank },
      { ends: ['A', 'C'], length: rod },
    ],
    slides: [{ point: 'C', along: ['G', 'H'] }],
    drivers: [
      driver === 'crank' ? { kind: 'angle', from: 'O2', to: 'A' } : { kind: 'slide', point: 'C' },
    ],
  };
}

/** Throws `RangeError` for lengths that are not positive; gives them back with the offset. */
export function requireSlider(caller: string, mechanism: CrankSlider): Required<CrankSlider> {
  const { crank, rod, offset = 0 } = mechanism;
  return {
    crank: requireSize(caller, 'crank', crank),
    rod: requireSize(caller, 'rod', rod),
    offset: requireMeasure(caller, 'offset', offset),
  };
}
