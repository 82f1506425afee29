import { itemAt } from '@/lib/numeric/item-at';
import { trainProduct } from '@/lib/kinematics/train/ratio';
import type { DriverAndDriven } from '@/lib/kinematics/train/ratio';
import { pairedWithin } from '@/lib/kinematics/train/pairing';
import { areApart, firstFrom, gatherWheelSets } from '@/lib/kinematics/train/wheel-sets';
import type { WheelSet } from '@/lib/kinematics/train/wheel-sets';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** What is wanted of a train, and what there is to make it of. */
export interface WheelSearch {
  /** Turns of the last arbor for one of the first, without sense: drivers over driven. */
  readonly ratio: number;
  /** Tooth counts at hand; a count may stand there more than once. */
  readonly wheels: readonly number[];
  /** Whether a wheel may be used again, as where any wheel can be cut; not unless given. */
  readonly reuse?: boolean;
  /** Module, for the centre distances; 1 unless given. */
  readonly module?: number;
  /** The widest centres that the board allows; any unless given. */
  readonly widest?: number;
}

/** A train that was found. */
export interface FoundTrain {
  readonly outcome: 'found';
  readonly pairs: readonly DriverAndDriven[];
  readonly reached: Fraction;
  readonly value: number;
  /** Reached over wanted, less 1. */
  readonly relativeError: number;
  readonly centreDistances: readonly number[];
}

export type SearchOutcome =
  | FoundTrain
  /** The stock holds fewer wheels than the stages need: `lacking` of them. */
  | { readonly outcome: 'too-few-wheels'; readonly lacking: number }
  /** Every choice is wider than the board. */
  | { readonly outcome: 'all-too-wide' };

/** How far a search has come; its last value says what it found. */
export interface SearchProgress {
  /** From 0 to 1. */
  readonly done: number;
}

/** Denominators tried between two pauses of a search that can be resumed: a few milliseconds. */
const portion = 400;
/** Wider than any board. */
const anyWidth = 1e60;

/**
 * The train of one, two or three stages that comes nearest to a ratio.
 *
 * Of equally near ones the one with the fewest teeth. With 40 wheels two stages take some
 * milliseconds, three a tenth of a second; a page uses `searchInPortions`.
 *
 * @throws RangeError for nonsense.
 * Source: exhaustive over the products; cases TN-BP-01 to 03, TN-B2-01.
 * @example nearestTrain({ ratio: Math.PI, wheels: wheelsFrom(12, 120), reuse: true }, 1).outcome // → 'found'
 */
export function nearestTrain(search: WheelSearch, stages: 1 | 2 | 3): SearchOutcome {
  const portions = searchInPortions(search, stages);
  let step = portions.next();
  while (!step.done) step = portions.next();
  return step.value;
}

/**
 * The same search in portions of a few milliseconds: ask for the next when there is time.
 *
 * @throws RangeError for nonsense, at the first step.
 * @example searchInPortions({ ratio: 2, wheels: [10, 20] }, 1).next().done // → true
 */
export function* searchInPortions(
  search: WheelSearch,
  stages: 1 | 2 | 3,
): Generator<SearchProgress, SearchOutcome> {
  const wanted = complete(search);
  const lacking = (search.reuse ? 1 : 2 * stages) - wanted.wheels.length;
  if (lacking > 0) return { outcome: 'too-few-wheels', lacking };
  const gathering = gatherWheelSets(wanted.wheels, stages, wanted.reuse);
  let gathered = gathering.next();
  while (!gathered.done) {
    yield { done: 0 };
    gathered = gathering.next();
  }
  const sets = gathered.value;
  let best: Candidate | null = null;
  for (const [index, driven] of sets.entries()) {
    best = nearer(wanted, sets, driven, best);
    if (index % portion === portion - 1) yield { done: (index + 1) / sets.length };
  }
  return best ? found(wanted, best) : { outcome: 'all-too-wide' };
}

/**
 * Every whole count from the fewest to the most, as a stock to search.
 *
 * @throws RangeError for counts that are not whole or not in order.
 * @example wheelsFrom(12, 15) // → [12, 13, 14, 15]
 */
export function wheelsFrom(fewest: number, most: number): readonly number[] {
  const least = requireCount('wheelsFrom', 'fewest', fewest);
  const count = requireCount('wheelsFrom', 'most', most, least) - least + 1;
  return Array.from({ length: count }, (_, index) => least + index);
}

interface Candidate {
  readonly error: number;
  readonly teeth: number;
  readonly drivers: WheelSet;
  readonly driven: WheelSet;
}

function complete(search: WheelSearch): Required<WheelSearch> {
  return {
    ratio: requireSize('nearestTrain', 'ratio', search.ratio),
    wheels: search.wheels
      .map((teeth) => requireCount('nearestTrain', 'wheels', teeth))
      .toSorted((a, b) => a - b),
    reuse: search.reuse ?? false,
    module: requireSize('nearestTrain', 'module', search.module ?? 1),
    widest: requireSize('nearestTrain', 'widest', search.widest ?? anyWidth),
  };
}

/** The better of `best` and the nearest drivers to one set of driven wheels. */
function nearer(
  search: Required<WheelSearch>,
  sets: readonly WheelSet[],
  driven: WheelSet,
  best: Candidate | null,
): Candidate | null {
  const errorOf = (index: number): number => {
    const drivers = sets[index];
    return drivers
      ? Math.abs(drivers.product / driven.product / search.ratio - 1)
      : Number.POSITIVE_INFINITY;
  };
  let above = firstFrom(sets, driven.product * search.ratio);
  let below = above - 1;
  let found = best;
  for (;;) {
    const index = errorOf(below) < errorOf(above) ? below : above;
    const error = errorOf(index);
    const drivers = sets[index];
    if (!drivers || error > (found?.error ?? Number.MAX_VALUE)) return found;
    const teeth = drivers.teeth + driven.teeth;
    const better = !found || error < found.error || teeth < found.teeth;
    if (better && fits(search, drivers, driven)) found = { error, teeth, drivers, driven };
    if (index === below) below -= 1;
    else above += 1;
  }
}

function fits(search: Required<WheelSearch>, drivers: WheelSet, driven: WheelSet): boolean {
  if (!search.reuse && !areApart(drivers, driven)) return false;
  return search.widest === anyWidth || pairing(search, drivers, driven) !== null;
}

function pairing(search: Required<WheelSearch>, drivers: WheelSet, driven: WheelSet) {
  const counts = (set: WheelSet) => set.places.map((place) => itemAt(search.wheels, place));
  return pairedWithin(counts(drivers), counts(driven), (2 * search.widest) / search.module);
}

function found(search: Required<WheelSearch>, { drivers, driven }: Candidate): SearchOutcome {
  const pairs = pairing(search, drivers, driven);
  if (!pairs) return { outcome: 'all-too-wide' };
  const value = drivers.product / driven.product;
  return {
    outcome: 'found',
    pairs,
    reached: trainProduct(pairs),
    value,
    relativeError: value / search.ratio - 1,
    centreDistances: pairs.map(([first, second]) => (search.module * (first + second)) / 2),
  };
}
