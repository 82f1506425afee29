import { type MotionLaw, sinePeak, trapezoidPeak } from './motion-law';

/** A number, or a blow that has none. */
export type Peak = number | 'infinite';

/** The greatest speed, acceleration and jerk of a law on a rise of height 1 over a length of 1. */
export interface PeakFactors {
  readonly velocity: number;
  /** The greatest acceleration either way. */
  readonly acceleration: Peak;
  /** The greatest speeding up. */
  readonly accelerationMax: Peak;
  /** The greatest slowing down, as a negative number. */
  readonly accelerationMin: Peak;
  /** The greatest jerk either way, the jumps at the ends of a rise between dwells counted. */
  readonly jerk: Peak;
}

/**
 * The peak factors of a law: multiply by h/β, h/β² and h/β³ (or by h/t, h/t², h/t³).
 *
 * `'infinite'` is an impulse at a step of the derivative below, at the ends (from and to a dwell)
 * or inside the rise.
 *
 * @see Rothbart, Cams (peak factors of the basic curves); all values exact, by calculus.
 * @example peakFactors('cycloidal').velocity // → 2
 * @example peakFactors('4-5-6-7').acceleration // → 7.5132
 */
export function peakFactors(law: MotionLaw): PeakFactors {
  return factors[law];
}

const even = (velocity: number, acceleration: Peak, jerk: Peak): PeakFactors => ({
  velocity,
  acceleration,
  accelerationMax: acceleration,
  accelerationMin: acceleration === 'infinite' ? acceleration : -acceleration,
  jerk,
});

const factors: Readonly<Record<MotionLaw, PeakFactors>> = {
  uniform: even(1, 'infinite', 'infinite'),
  parabolic: even(2, 4, 'infinite'),
  'simple-harmonic': even(Math.PI / 2, Math.PI ** 2 / 2, 'infinite'),
  cycloidal: even(2, 2 * Math.PI, 4 * Math.PI ** 2),
  '3-4-5': even(15 / 8, 10 / Math.sqrt(3), 60),
  // u(1 − u) = ¼, ⅕ and ¼ at the three peaks
  '4-5-6-7': even(35 / 16, 84 / (5 * Math.sqrt(5)), 52.5),
  'modified-trapezoid': even(2, trapezoidPeak, 4 * Math.PI * trapezoidPeak),
  'modified-sine': even((4 * Math.PI) / (4 + Math.PI), sinePeak, 4 * Math.PI * sinePeak),
  'double-harmonic': {
    // cos πu = −½ for the speed, ¼ for the speeding up; the slowing down is greatest at the end
    velocity: (3 * Math.sqrt(3) * Math.PI) / 8,
    acceleration: Math.PI ** 2,
    accelerationMax: (9 * Math.PI ** 2) / 16,
    accelerationMin: -(Math.PI ** 2),
    jerk: 'infinite',
  },
};
