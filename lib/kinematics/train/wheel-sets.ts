import { requireCount } from '@/lib/numeric/require';

import { itemAt } from '@/lib/numeric/item-at';

/** One or more wheels of a stock taken together, and their counts multiplied. */
export interface WheelSet {
  readonly product: number;
  /** Places in the stock, rising; the same place twice only if wheels may be used again. */
  readonly places: readonly number[];
  /** Counts together: of two equal answers the one with fewer teeth is taken. */
  readonly teeth: number;
}

/** Sets gathered between two pauses: a few milliseconds. */
const portion = 4000;

/**
 * Every set of `size` wheels of a stock, by rising product.
 *
 * @param reuse whether one place may be taken more than once, as where any wheel can be cut.
 * @example wheelSets([10, 20, 30], 2, false).map(({ product }) => product) // → [200, 300, 600]
 */
export function wheelSets(
  stock: readonly number[],
  size: number,
  reuse: boolean,
): readonly WheelSet[] {
  const portions = gatherWheelSets(stock, size, reuse);
  let step = portions.next();
  while (!step.done) step = portions.next();
  return step.value;
}

/**
 * The same in portions, each yielding how many sets have been gathered.
 *
 * @example gatherWheelSets([10, 20, 30], 2, false).next().done // → true
 */
export function* gatherWheelSets(
  stock: readonly number[],
  size: number,
  reuse: boolean,
): Generator<number, readonly WheelSet[]> {
  for (const teeth of stock) requireCount('wheelSets', 'stock', teeth);
  // Sets of one product share a drawer, so that only the products, plain numbers, are sorted.
  const drawers = new Map<number, WheelSet[]>();
  let places: readonly number[] | null = Array.from({ length: size }, (_, k) => (reuse ? 0 : k));
  for (let gathered = 1; places; gathered += 1) {
    const set = setOf(stock, places);
    const drawer = drawers.get(set.product) ?? [];
    drawers.set(set.product, drawer);
    drawer.push(set);
    places = following(places, stock.length, reuse);
    if (gathered % portion === 0) yield gathered;
  }
  const order = Float64Array.from(drawers.keys()).sort();
  return Array.from(order).flatMap((product) => drawers.get(product) ?? []);
}

/**
 * The first place in sets of rising product whose product is at least `product`.
 *
 * @example firstFrom(wheelSets([10, 20, 30], 1, false), 15) // → 1
 */
export function firstFrom(sets: readonly WheelSet[], product: number): number {
  let [low, high] = [0, sets.length];
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (itemAt(sets, middle).product < product) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * Whether two sets take no wheel in common.
 *
 * @example areApart({ product: 1, places: [0], teeth: 1 }, { product: 1, places: [1], teeth: 1 }) // → true
 */
export function areApart(a: WheelSet, b: WheelSet): boolean {
  return a.places.every((place) => !b.places.includes(place));
}

function setOf(stock: readonly number[], places: readonly number[]): WheelSet {
  let [product, teeth] = [1, 0];
  for (const place of places) {
    product *= itemAt(stock, place);
    teeth += itemAt(stock, place);
  }
  return { product, places, teeth };
}

/** The next choice of rising places, or null after the last. */
function following(
  places: readonly number[],
  stock: number,
  reuse: boolean,
): readonly number[] | null {
  const step = reuse ? 0 : 1;
  for (let k = places.length - 1; k >= 0; k -= 1) {
    const next = itemAt(places, k) + 1;
    if (next + (places.length - 1 - k) * step < stock) {
      return places.map((place, index) => (index < k ? place : next + (index - k) * step));
    }
  }
  return null;
}
