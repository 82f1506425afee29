/** One or more wheels of a stock taken together, and their counts multiplied. */
export interface WheelSet {
  readonly product: number;
  /** Places in the stock, rising; the same place twice only if wheels may be used again. */
  readonly places: readonly number[];
  /** Counts together: of two equal answers the one with fewer teeth is taken. */
  readonly teeth: number;
}

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
  const sets: WheelSet[] = [];
  const grow = (from: number, places: readonly number[], product: number, teeth: number): void => {
    if (places.length === size) {
      sets.push({ product, places, teeth });
      return;
    }
    for (let place = from; place < stock.length; place += 1) {
      const count = stock[place] ?? 1;
      grow(reuse ? place : place + 1, [...places, place], product * count, teeth + count);
    }
  };
  grow(0, [], 1, 0);
  return sets.sort((a, b) => a.product - b.product || a.teeth - b.teeth);
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
    if ((sets[middle]?.product ?? 0) < product) low = middle + 1;
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
