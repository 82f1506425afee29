import { requirePositive } from '@/lib/numeric/require';
import { above, aboveFine, below, belowFine, fineRanges, mainRanges, tolerances } from './fit.data';

/** The limits of a hole or a shaft from its nominal size, in micrometres. */
export interface Deviations {
  readonly upper: number;
  readonly lower: number;
}

/** Limits, or what the tables here do not hold. */
export type DeviationOutcome =
  | ({ readonly outcome: 'limits' } & Deviations)
  | { readonly outcome: 'not-tabulated'; readonly asked: string };

/** A fit of a hole and a shaft of one nominal size, clearances below 0 being interference. */
export type Fit =
  | {
      readonly outcome: 'fits';
      readonly kind: 'clearance' | 'transition' | 'interference';
      readonly hole: Deviations;
      readonly shaft: Deviations;
      readonly greatestClearance: number;
      readonly leastClearance: number;
    }
  | { readonly outcome: 'not-tabulated'; readonly asked: string };

/** Up to this size, in millimetres, the tables reach. */
const largestNominal = 500;

/**
 * The limits of a hole (a capital) or a shaft (a small letter) such as H7 or g6, in micrometres.
 *
 * Nominal size in millimetres, up to 500; letters A to H, JS, K, M, N, P, R, S and the like for
 * shafts, grades 4 to 13. `not-tabulated` for any other.
 *
 * @throws RangeError for a nominal size of 0 or less.
 * @see ISO 286-1 and -2:2010; figures from memory.
 * @example limitDeviations(25, 'H7') // → { outcome: 'limits', upper: 21, lower: 0 }
 * @example limitDeviations(25, 'K7') // → { outcome: 'limits', upper: 6, lower: -15 }
 */
export function limitDeviations(nominal: number, designation: string): DeviationOutcome {
  requirePositive('limitDeviations', 'nominal', nominal);
  const missing: DeviationOutcome = { outcome: 'not-tabulated', asked: designation };
  const [, letter = '', digits = ''] = /^([A-Za-z]{1,2})(\d{1,2})$/.exec(designation) ?? [];
  const grade = Number(digits);
  const width = tolerances[grade]?.[rangeOf(mainRanges, nominal)];
  if (width === undefined || nominal > largestNominal) return missing;
  const name = letter.toLowerCase();
  const isHole = letter !== name;
  if (isHole && letter !== letter.toUpperCase()) return missing;
  if (name === 'js') return { outcome: 'limits', upper: width / 2, lower: -width / 2 };
  const under = at(below, belowFine, name, nominal);
  if (under !== undefined) {
    return isHole
      ? { outcome: 'limits', upper: under + width, lower: under }
      : { outcome: 'limits', upper: 0 - under, lower: 0 - under - width };
  }
  const over = isHole ? holeAbove(name, grade, nominal) : shaftAbove(name, grade, nominal);
  if (over === undefined) return missing;
  return isHole
    ? { outcome: 'limits', upper: 0 - over, lower: 0 - over - width }
    : { outcome: 'limits', upper: over + width, lower: over };
}

/**
 * The fit of a hole and a shaft: their limits, and the greatest and the least clearance.
 *
 * @throws RangeError for a nominal size of 0 or less.
 * @see ISO 286-1:2010.
 * @example isoFit(25, 'H7', 'g6') // → { outcome: 'fits', kind: 'clearance', greatestClearance: 41, leastClearance: 7 }
 */
export function isoFit(nominal: number, hole: string, shaft: string): Fit {
  const around = limitDeviations(nominal, hole);
  const within = limitDeviations(nominal, shaft);
  if (around.outcome === 'not-tabulated' || !/^[A-Z]/.test(hole)) {
    return { outcome: 'not-tabulated', asked: hole };
  }
  if (within.outcome === 'not-tabulated' || !/^[a-z]/.test(shaft)) {
    return { outcome: 'not-tabulated', asked: shaft };
  }
  const greatestClearance = around.upper - within.lower;
  const leastClearance = around.lower - within.upper;
  return {
    outcome: 'fits',
    kind: kindOf(greatestClearance, leastClearance),
    hole: { upper: around.upper, lower: around.lower },
    shaft: { upper: within.upper, lower: within.lower },
    greatestClearance,
    leastClearance,
  };
}

function kindOf(greatest: number, least: number): 'clearance' | 'transition' | 'interference' {
  if (least >= 0) return 'clearance';
  return greatest <= 0 ? 'interference' : 'transition';
}

/** Over the nominal size; the letter k has its step in grades 4 to 7 only. */
function shaftAbove(name: string, grade: number, nominal: number): number | undefined {
  if (name === 'k' && grade > 7) return 0;
  return at(above, aboveFine, name, nominal);
}

/**
 * Under the nominal size. In the fine grades a hole is let out by the difference of two grades, so
 * that hole and shaft make the same fit whichever of them has the letter.
 */
function holeAbove(name: string, grade: number, nominal: number): number | undefined {
  const range = rangeOf(mainRanges, nominal);
  const over = at(above, aboveFine, name, nominal);
  if (over === undefined) return undefined;
  if (name === 'k' && grade > 8) return undefined;
  if (name === 'm' && grade === 6 && nominal > 250 && nominal <= 315) return 9;
  if (name === 'n' && grade > 8 && nominal > 3) return 0;
  const fine = 'kmn'.includes(name) ? grade <= 8 : grade <= 7;
  if (!fine || nominal <= 3) return over;
  const here = tolerances[grade]?.[range];
  const finer = tolerances[grade - 1]?.[range];
  return here === undefined || finer === undefined ? undefined : over - (here - finer);
}

function at(
  main: Readonly<Record<string, readonly number[]>>,
  fine: Readonly<Record<string, readonly number[]>>,
  name: string,
  nominal: number,
): number | undefined {
  if (Object.hasOwn(main, name)) return main[name]?.[rangeOf(mainRanges, nominal)];
  return Object.hasOwn(fine, name) ? fine[name]?.[rangeOf(fineRanges, nominal)] : undefined;
}

function rangeOf(ranges: readonly number[], nominal: number): number {
  return ranges.findIndex((upTo) => nominal <= upTo);
}
