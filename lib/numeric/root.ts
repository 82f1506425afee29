import { requireFinite } from '@/lib/numeric/require';

/** What a search for a root came to. */
export type RootOutcome =
  | { readonly outcome: 'found'; readonly x: number; readonly residual: number }
  | { readonly outcome: 'no-bracket'; readonly atLow: number; readonly atHigh: number }
  | { readonly outcome: 'not-converged'; readonly residual: number };

export interface RootOptions {
  /** Greatest error of the root, in its own unit; 0 asks for all that doubles can give. */
  readonly tolerance?: number;
  readonly iterations?: number;
}

/**
 * Root of a continuous function between `low` and `high`, where it must change its sign.
 *
 * Outcomes: `found`; `no-bracket` with the two values, which have one sign; `not-converged` with
 * the last residual. Throws `RangeError` for a bound, or a value of `f`, that is not finite.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives, 1973, chapter 4.
 * @example findRoot((x) => x * x - 2, 1, 2) // → { outcome: 'found', x: 1.41421356237 }
 */
export function findRoot(
  f: (x: number) => number,
  low: number,
  high: number,
  { tolerance = 0, iterations = 100 }: RootOptions = {},
): RootOutcome {
  const value = (x: number) => requireFinite('findRoot', 'f(x)', f(x));
  let a = requireFinite('findRoot', 'low', low);
  let b = requireFinite('findRoot', 'high', high);
  let fa = value(a);
  let fb = value(b);
  if (Math.sign(fa) * Math.sign(fb) > 0) {
    return { outcome: 'no-bracket', atLow: fa, atHigh: fb };
  }
  let c = a;
  let fc = fa;
  let step = b - a;
  let before = step;
  for (let turn = 0; turn < iterations; turn += 1) {
    if (Math.sign(fb) === Math.sign(fc)) {
      c = a;
      fc = fa;
      step = before = b - a;
    }
    if (Math.abs(fc) < Math.abs(fb)) [a, b, c, fa, fb, fc] = [b, c, b, fb, fc, fb];
    const least = 2 * Number.EPSILON * Math.abs(b) + tolerance / 2;
    const half = (c - b) / 2;
    if (fb === 0 || Math.abs(half) <= least) return { outcome: 'found', x: b, residual: fb };
    const guess = interpolate(a, b, c, fa, fb, fc);
    const accepted =
      Math.abs(before) >= least &&
      Math.abs(fa) > Math.abs(fb) &&
      guess * half > 0 &&
      Math.abs(guess) < Math.min(1.5 * Math.abs(half) - least / 2, Math.abs(before) / 2);
    before = accepted ? step : half;
    step = accepted ? guess : half;
    a = b;
    fa = fb;
    b += Math.abs(step) > least ? step : Math.sign(half) * Math.max(least, Number.MIN_VALUE);
    fb = value(b);
  }
  return { outcome: 'not-converged', residual: fb };
}

/** The step that inverse quadratic interpolation proposes, or the secant's with two points. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (1 - s);
  const q = fa / fc;
  const r = fb / fc;
  const top = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  return -top / ((q - 1) * (r - 1) * (s - 1));
}
