import { requireFinite } from '@/lib/numeric/require';

/** What halving an interval came to. */
export type Bisection =
  | { readonly outcome: 'root'; readonly root: number }
  /** The function has the same sign at both ends; its values there are given. */
  | { readonly outcome: 'no-bracket'; readonly atLow: number; readonly atHigh: number };

/** Halving twice as often as a double has digits reaches two neighbouring numbers. */
const maximumHalvings = 110;

/**
 * A root of `curve` between `low` and `high`, found by halving: slow and sure.
 *
 * `curve` must be continuous there; the root is good to the last digit of the larger end.
 *
 * @throws RangeError if an end is no number.
 * @example bisect((x) => x * x - 2, 0, 2) // → { outcome: 'root', root: 1.41421356237 }
 */
export function bisect(curve: (x: number) => number, low: number, high: number): Bisection {
  let a = requireFinite('bisect', 'low', low);
  let b = requireFinite('bisect', 'high', high);
  const atLow = curve(a);
  const atHigh = curve(b);
  if (atLow === 0) return { outcome: 'root', root: a };
  if (atHigh === 0) return { outcome: 'root', root: b };
  if (!(atLow < 0 !== atHigh < 0) || Number.isNaN(atLow + atHigh)) {
    return { outcome: 'no-bracket', atLow, atHigh };
  }
  for (let halving = 0; halving < maximumHalvings; halving += 1) {
    const middle = a + (b - a) / 2;
    if (middle === a || middle === b) break;
    if (curve(middle) < 0 === atLow < 0) a = middle;
    else b = middle;
  }
  return { outcome: 'root', root: Math.abs(curve(a)) <= Math.abs(curve(b)) ? a : b };
}
