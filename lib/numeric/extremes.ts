import { requireCount, requireFinite } from '@/lib/numeric/require';

export interface Extreme {
  readonly at: number;
  readonly value: number;
}

/** Golden section's share: (√5 − 1)/2. */
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * Least and greatest value of a continuous function from `low` to `high`, ends included.
 *
 * The range is cut into `pieces`; around the lowest and the highest sample the place is closed in
 * by golden section, so `pieces` must be fine enough that each bump has a sample. A place is good
 * to about 1e-8 of the range, a value to rounding. Throws `RangeError` for a bound or a value that
 * is not finite.
 * @example findExtremes(Math.sin, 0, 4).most // → { at: 1.5707963, value: 1 }
 */
export function findExtremes(
  f: (x: number) => number,
  low: number,
  high: number,
  pieces = 180,
): { readonly least: Extreme; readonly most: Extreme } {
  requireFinite('findExtremes', 'low', low);
  requireFinite('findExtremes', 'high', high);
  requireCount('findExtremes', 'pieces', pieces, 2);
  return {
    least: lowest(f, low, high, pieces),
    most: negated(lowest((x) => -f(x), low, high, pieces)),
  };
}

function lowest(f: (x: number) => number, low: number, high: number, pieces: number): Extreme {
  const place = (k: number) => (k === pieces ? high : low + ((high - low) * k) / pieces);
  let best = 0;
  let bestValue = requireFinite('findExtremes', 'f(x)', f(low));
  for (let k = 1; k <= pieces; k += 1) {
    const value = requireFinite('findExtremes', 'f(x)', f(place(k)));
    if (value < bestValue) [best, bestValue] = [k, value];
  }
  const sampled = { at: place(best), value: bestValue };
  const closed = section(f, place(Math.max(best - 1, 0)), place(Math.min(best + 1, pieces)));
  return closed.value < sampled.value ? closed : sampled;
}

function section(f: (x: number) => number, low: number, high: number): Extreme {
  let [a, b] = [low, high];
  let x1 = b - GOLDEN * (b - a);
  let x2 = a + GOLDEN * (b - a);
  let [f1, f2] = [f(x1), f(x2)];
  for (let turn = 0; turn < 48; turn += 1) {
    if (f1 <= f2) {
      [b, x2, f2] = [x2, x1, f1];
      x1 = b - GOLDEN * (b - a);
      f1 = f(x1);
    } else {
      [a, x1, f1] = [x1, x2, f2];
      x2 = a + GOLDEN * (b - a);
      f2 = f(x2);
    }
  }
  return f1 <= f2 ? { at: x1, value: f1 } : { at: x2, value: f2 };
}

function negated(extreme: Extreme): Extreme {
  return { at: extreme.at, value: 0 - extreme.value };
}
