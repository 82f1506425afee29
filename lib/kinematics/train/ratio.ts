import { itemAt } from '@/lib/numeric/item-at';
import { fraction, multiply, toNumber } from '@/lib/numeric/fraction';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A wheel that drives and the wheel that it drives, by their tooth counts. */
export type DriverAndDriven = readonly [driver: number, driven: number];

/** What a train of outside meshes does to the turning of its first arbor. */
export interface TrainRatio {
  /** Turns of the last arbor for one of the first; negative when it turns against it. */
  readonly turns: Fraction;
  /** The same as a number. */
  readonly value: number;
  readonly meshes: number;
  readonly sense: 'with' | 'against';
}

/** No whole count of teeth fits: the next one down leaves a gap, the next one up is too large. */
export interface NoWholeWheel {
  readonly outcome: 'no-whole-wheel';
  readonly exact: number;
  readonly below: number;
  readonly gap: number;
  readonly above: number;
  readonly excess: number;
}

/** Which single wheel joins two others over a given distance. */
export type Idler =
  | { readonly outcome: 'fits'; readonly teeth: number; readonly fromFirst: number }
  | NoWholeWheel
  /** The end wheels meet or overlap already, by `overlap`. */
  | { readonly outcome: 'no-room'; readonly overlap: number };

/** A tooth count as near to whole as this is whole: far below any saw, far above rounding. */
const wholeTolerance = 1e-6;

/**
 * The ratio of wheels in a row, each alone on its arbor: only the first and the last count.
 *
 * @throws RangeError for fewer than two wheels or a count that is not whole.
 * @example simpleTrain([18, 30, 54]).value // → 0.3333333333333333
 */
export function simpleTrain(teeth: readonly number[]): TrainRatio {
  requireCount('simpleTrain', 'number of wheels', teeth.length, 2);
  return compoundRatio(
    'simpleTrain',
    teeth.slice(1).map((driven, index) => [itemAt(teeth, index), driven] as const),
  );
}

/**
 * The ratio of pairs in a row: each driven wheel sits fast beside the next driver.
 *
 * @throws RangeError for no pair at all or a count that is not whole.
 * @example compoundTrain([[12, 36], [10, 40]]).value // → 0.08333333333333333
 */
export function compoundTrain(pairs: readonly DriverAndDriven[]): TrainRatio {
  return compoundRatio('compoundTrain', pairs);
}

/**
 * Drivers multiplied over driven multiplied, in lowest terms and without a sense.
 *
 * @throws RangeError as `compoundTrain` does.
 * @example trainProduct([[64, 38], [48, 24], [127, 32]]) // → { numerator: 254n, denominator: 19n }
 */
export function trainProduct(pairs: readonly DriverAndDriven[]): Fraction {
  return product('trainProduct', pairs);
}

/**
 * The turns of every arbor of a compound train, the first included, when the first makes `turns`.
 *
 * @throws RangeError as `compoundTrain` does.
 * @example arborTurns([[12, 36], [10, 40]], 12) // → [12, -4, 1]
 */
export function arborTurns(pairs: readonly DriverAndDriven[], turns: number): readonly number[] {
  requireMeasure('arborTurns', 'turns', turns);
  return [
    turns,
    ...pairs.map(
      (_, index) => turns * compoundRatio('arborTurns', pairs.slice(0, index + 1)).value,
    ),
  ];
}

/**
 * The one wheel that joins two others, in line between them, over `distance`.
 *
 * `distance` in the unit of `module`; the idler changes sense and reach, never the ratio.
 *
 * @throws RangeError for nonsense.
 * @example idlerBetween({ module: 4, first: 16, last: 20, distance: 120 }) // → { outcome: 'fits', teeth: 12, fromFirst: 56 }
 */
export function idlerBetween(row: {
  readonly module: number;
  readonly first: number;
  readonly last: number;
  readonly distance: number;
}): Idler {
  const caller = 'idlerBetween';
  const size = requireSize(caller, 'module', row.module);
  const ends =
    (requireCount(caller, 'first', row.first) + requireCount(caller, 'last', row.last)) / 2;
  const exact = requireSize(caller, 'distance', row.distance) / size - ends;
  if (exact <= 0) return { outcome: 'no-room', overlap: -exact * size };
  const teeth = Math.round(exact);
  if (teeth > 0 && Math.abs(exact - teeth) <= wholeTolerance) {
    return { outcome: 'fits', teeth, fromFirst: (size * (row.first + teeth)) / 2 };
  }
  const below = Math.floor(exact);
  const above = below + 1;
  return {
    outcome: 'no-whole-wheel',
    exact,
    below,
    gap: (exact - below) * size,
    above,
    excess: (above - exact) * size,
  };
}

function compoundRatio(caller: string, pairs: readonly DriverAndDriven[]): TrainRatio {
  const size = product(caller, pairs);
  const against = pairs.length % 2 === 1;
  const turns = against ? multiply(size, fraction(-1)) : size;
  return {
    turns,
    value: toNumber(turns),
    meshes: pairs.length,
    sense: against ? 'against' : 'with',
  };
}

function product(caller: string, pairs: readonly DriverAndDriven[]): Fraction {
  requireCount(caller, 'number of pairs', pairs.length);
  return pairs.reduce(
    (sofar, [driver, driven]) =>
      multiply(
        sofar,
        fraction(requireCount(caller, 'driver', driver), requireCount(caller, 'driven', driven)),
      ),
    fraction(1),
  );
}
