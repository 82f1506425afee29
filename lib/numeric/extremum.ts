/** Where a function is greatest, and how great. */
export interface Greatest {
  readonly at: number;
  readonly value: number;
}

/** The golden section: each step keeps this share of the bracket. */
const golden = (Math.sqrt(5) - 1) / 2;

/** Steps that shrink a bracket to 1e-13 of itself, below what a smooth peak can still resolve. */
const steps = 62;

/**
 * The greatest value of a continuous `f` on an interval, its ends included: the best of evenly
 * spread samples, then a golden-section search between its neighbours. A peak narrower than two
 * samples may be missed; give more samples or split the interval there.
 *
 * @throws whatever `f` throws.
 * @example greatestOn((x) => x * (4 - x), 0, 3).at // → 2
 */
export function greatestOn(
  f: (x: number) => number,
  from: number,
  to: number,
  samples = 96,
): Greatest {
  const at = (i: number) => from + ((to - from) * i) / samples;
  let best: Greatest = { at: from, value: f(from) };
  let index = 0;
  for (let i = 1; i <= samples; i += 1) {
    const value = f(at(i));
    if (value > best.value) {
      best = { at: at(i), value };
      index = i;
    }
  }
  return refine(f, at(Math.max(0, index - 1)), at(Math.min(samples, index + 1)), best);
}

function refine(f: (x: number) => number, from: number, to: number, start: Greatest): Greatest {
  let [low, high, best] = [from, to, start];
  for (let i = 0; i < steps; i += 1) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    const [atLeft, atRight] = [f(left), f(right)];
    if (atLeft > best.value) best = { at: left, value: atLeft };
    if (atRight > best.value) best = { at: right, value: atRight };
    if (atLeft < atRight) low = left;
    else high = right;
  }
  return best;
}
