import { requireWithin } from '@/lib/numeric/require';

/** How a follower goes from rest to rest. */
export type MotionLaw =
  | 'uniform'
  | 'parabolic'
  | 'simple-harmonic'
  | 'cycloidal'
  | '3-4-5'
  | '4-5-6-7'
  | 'modified-trapezoid'
  | 'modified-sine'
  | 'double-harmonic';

/** Every law, the plainest first. */
export const motionLaws: readonly MotionLaw[] = [
  'uniform',
  'parabolic',
  'simple-harmonic',
  'cycloidal',
  '3-4-5',
  '4-5-6-7',
  'modified-trapezoid',
  'modified-sine',
  'double-harmonic',
];

/** A place and its first three derivatives by one and the same variable. */
export interface Motion {
  readonly position: number;
  readonly velocity: number;
  readonly acceleration: number;
  readonly jerk: number;
}

/**
 * A law of motion on a rise of height 1 over a length of 1, with its derivatives by `u`.
 *
 * `u` from 0 to 1. Where a derivative jumps, its value is the one inside the rise (at both ends)
 * or just before (at the middle of the parabolic law). The blow at the ends of the uniform law is
 * no number, so its acceleration is 0 throughout: `peakFactors` tells of it.
 *
 * @throws RangeError if `u` does not lie from 0 to 1.
 * @see Rothbart, Cams (the basic curves); double harmonic: the same, s = ½[(1 − cos πu) − ¼(1 − cos 2πu)].
 * @example motionLaw('cycloidal', 0.25).position // → 0.0908451
 * @example motionLaw('3-4-5', 0.5).velocity // → 1.875
 */
export function motionLaw(law: MotionLaw, u: number): Motion {
  requireWithin('motionLaw', 'u', u, 0, 1);
  if (law === 'double-harmonic') return doubleHarmonic(u);
  return u <= 0.5 ? firstHalf(law, u) : mirrored(firstHalf(law, 1 - u));
}

/** All laws but the double harmonic look the same turned half round: s(u) = 1 − s(1 − u). */
function mirrored({ position, velocity, acceleration, jerk }: Motion): Motion {
  return { position: 1 - position, velocity, acceleration: -acceleration, jerk };
}

function firstHalf(law: Exclude<MotionLaw, 'double-harmonic'>, u: number): Motion {
  switch (law) {
    case 'uniform':
      return { position: u, velocity: 1, acceleration: 0, jerk: 0 };
    case 'parabolic':
      return { position: 2 * u * u, velocity: 4 * u, acceleration: 4, jerk: 0 };
    case 'simple-harmonic':
      return simpleHarmonic(u);
    case 'cycloidal':
      return cycloidal(u);
    case '3-4-5':
      return polynomial345(u);
    case '4-5-6-7':
      return polynomial4567(u);
    case 'modified-trapezoid':
      return modifiedTrapezoid(u);
    case 'modified-sine':
      return modifiedSine(u);
  }
}

function simpleHarmonic(u: number): Motion {
  const turn = Math.PI * u;
  return {
    position: Math.sin(turn / 2) ** 2,
    velocity: (Math.PI / 2) * Math.sin(turn),
    acceleration: (Math.PI ** 2 / 2) * Math.cos(turn),
    jerk: (-(Math.PI ** 3) / 2) * Math.sin(turn),
  };
}

function cycloidal(u: number): Motion {
  const turn = 2 * Math.PI * u;
  return {
    position: u - Math.sin(turn) / (2 * Math.PI),
    velocity: 2 * Math.sin(turn / 2) ** 2,
    acceleration: 2 * Math.PI * Math.sin(turn),
    jerk: 4 * Math.PI ** 2 * Math.cos(turn),
  };
}

function polynomial345(u: number): Motion {
  return {
    position: u ** 3 * (10 - 15 * u + 6 * u * u),
    velocity: 30 * (u * (1 - u)) ** 2,
    acceleration: 60 * u * (1 - u) * (1 - 2 * u),
    jerk: 60 * (1 - 6 * u + 6 * u * u),
  };
}

function polynomial4567(u: number): Motion {
  const w = u * (1 - u);
  return {
    position: u ** 4 * (35 - 84 * u + 70 * u * u - 20 * u ** 3),
    velocity: 140 * w ** 3,
    acceleration: 420 * w * w * (1 - 2 * u),
    jerk: 840 * w * (1 - 5 * w),
  };
}

/** The plateau of acceleration of the modified trapezoid. */
export const trapezoidPeak = (8 * Math.PI) / (2 + Math.PI);

/** The crest of acceleration of the modified sine. */
export const sinePeak = (4 * Math.PI ** 2) / (4 + Math.PI);

/** Both modified laws start with an eighth of the rise on a quarter wave of acceleration. */
function quarterWave(peak: number, u: number): Motion {
  const turn = 4 * Math.PI * u;
  return {
    position: (peak / (4 * Math.PI)) * (u - Math.sin(turn) / (4 * Math.PI)),
    velocity: (peak / (4 * Math.PI)) * (1 - Math.cos(turn)),
    acceleration: peak * Math.sin(turn),
    jerk: 4 * Math.PI * peak * Math.cos(turn),
  };
}

function modifiedTrapezoid(u: number): Motion {
  if (u <= 1 / 8) return quarterWave(trapezoidPeak, u);
  const start = quarterWave(trapezoidPeak, 1 / 8);
  if (u <= 3 / 8) return plateau(start, u - 1 / 8);
  const { position, velocity } = plateau(start, 1 / 4);
  const [x, k] = [u - 3 / 8, 4 * Math.PI];
  return {
    position: position + velocity * x + (trapezoidPeak / k ** 2) * (1 - Math.cos(k * x)),
    velocity: velocity + (trapezoidPeak / k) * Math.sin(k * x),
    acceleration: trapezoidPeak * Math.cos(k * x),
    jerk: -k * trapezoidPeak * Math.sin(k * x),
  };
}

function plateau(start: Motion, x: number): Motion {
  return {
    position: start.position + start.velocity * x + (trapezoidPeak / 2) * x * x,
    velocity: start.velocity + trapezoidPeak * x,
    acceleration: trapezoidPeak,
    jerk: 0,
  };
}

function modifiedSine(u: number): Motion {
  if (u <= 1 / 8) return quarterWave(sinePeak, u);
  const start = quarterWave(sinePeak, 1 / 8);
  const [x, k] = [u - 1 / 8, (4 * Math.PI) / 3];
  return {
    position: start.position + start.velocity * x + (sinePeak / k ** 2) * (1 - Math.cos(k * x)),
    velocity: start.velocity + (sinePeak / k) * Math.sin(k * x),
    acceleration: sinePeak * Math.cos(k * x),
    jerk: -k * sinePeak * Math.sin(k * x),
  };
}

function doubleHarmonic(u: number): Motion {
  const [once, twice] = [Math.PI * u, 2 * Math.PI * u];
  return {
    position: Math.sin(once / 2) ** 2 - Math.sin(once) ** 2 / 4,
    velocity: (Math.PI / 2) * (Math.sin(once) - Math.sin(twice) / 2),
    acceleration: (Math.PI ** 2 / 2) * (Math.cos(once) - Math.cos(twice)),
    jerk: (Math.PI ** 3 / 2) * (2 * Math.sin(twice) - Math.sin(once)),
  };
}
