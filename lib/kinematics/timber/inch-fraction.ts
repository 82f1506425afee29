import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requireFinite } from '@/lib/numeric/require';

/** The inch in millimetres, exactly (international yard and pound agreement, 1959). */
export const INCH = 25.4;

/** A length in inches as it stands on a rule, in lowest terms; `negative` for lengths below 0. */
export interface InchFraction {
  readonly negative: boolean;
  readonly whole: number;
  readonly numerator: number;
  readonly denominator: number;
}

/**
 * The millimetres of a length in inches.
 *
 * @throws RangeError for a whole or a numerator below 0, a denominator of 0.
 * @see 1 in = 25.4 mm exactly (ISO 80000-3).
 * @example millimetresFromInches({ negative: false, whole: 2, numerator: 11, denominator: 16 }) // → 68.2625
 */
export function millimetresFromInches(length: InchFraction): number {
  const { negative, whole, numerator, denominator } = length;
  requireCount('millimetresFromInches', 'whole', whole, 0);
  requireCount('millimetresFromInches', 'numerator', numerator, 0);
  requireCount('millimetresFromInches', 'denominator', denominator);
  const size = (INCH * (whole * denominator + numerator)) / denominator;
  return finiteResult('millimetresFromInches', negative ? -size : size);
}

/** A length midway between two marks may lie under it by its last digits. */
const midwayTolerance = 1e-9;

/** The nearest mark of a rule, and how far it lies beyond the length, in millimetres. */
export interface NearestInchFraction extends InchFraction {
  readonly error: number;
}

/**
 * The nearest fraction of an inch on a rule divided by halving down to `finest`; a length midway
 * between two marks takes the larger one.
 *
 * @throws RangeError for a length that is no finite number or too long to count its marks, a `finest` that is no power of two.
 * @see 1 in = 25.4 mm exactly.
 * @example nearestInchFraction(18, 64) // → { whole: 0, numerator: 45, denominator: 64, error: -0.140625 }
 */
export function nearestInchFraction(millimetres: number, finest: number): NearestInchFraction {
  requireFinite('nearestInchFraction', 'millimetres', millimetres);
  requireCount('nearestInchFraction', 'finest', finest);
  if (!Number.isInteger(Math.log2(finest))) {
    throw new RangeError(`nearestInchFraction: finest is ${finest}; expected a power of two`);
  }
  const size = Math.abs(millimetres);
  const marks = Math.floor((size / INCH) * finest + 0.5 + midwayTolerance);
  requireCount('nearestInchFraction', 'marks', marks, 0);
  const negative = millimetres < 0 && marks > 0;
  const nearest = (INCH * marks) / finest;
  const whole = Math.floor(marks / finest);
  let [numerator, denominator] = [marks - whole * finest, finest];
  while (denominator > 1 && numerator % 2 === 0) {
    [numerator, denominator] = [numerator / 2, denominator / 2];
  }
  const error = (negative ? -nearest : nearest) - millimetres;
  return finiteResult('nearestInchFraction', { negative, whole, numerator, denominator, error });
}
