import { requireFinite } from '@/lib/numeric/require';

/** What an integration came to. */
export type IntegralOutcome =
  | { readonly outcome: 'found'; readonly value: number; readonly error: number }
  | { readonly outcome: 'not-converged'; readonly error: number };

/**
 * Integral of a smooth function from `low` to `high`.
 *
 * Romberg's scheme: trapezoids halved and extrapolated. Outcomes: `found` with the estimate of its
 * error; `not-converged` with the last one. Throws `RangeError` for a bound or a value that is not
 * finite. Source: W. Romberg, 1955.
 * @example integrate(Math.sin, 0, Math.PI) // → { outcome: 'found', value: 2 }
 */
export function integrate(
  f: (x: number) => number,
  low: number,
  high: number,
  { tolerance = 1e-12, halvings = 20 } = {},
): IntegralOutcome {
  const value = (x: number) => requireFinite('integrate', 'f(x)', f(x));
  const span = requireFinite('integrate', 'high', high) - requireFinite('integrate', 'low', low);
  let previous = [((value(low) + value(high)) * span) / 2];
  let error = Number.MAX_VALUE;
  for (let level = 1; level <= halvings; level += 1) {
    const pieces = 2 ** (level - 1);
    const width = span / pieces;
    let middle = 0;
    for (let k = 0; k < pieces; k += 1) middle += value(low + (k + 0.5) * width);
    const row = [((previous[0] ?? 0) + middle * width) / 2];
    previous.forEach((older, k) => {
      const finer = row[k] ?? 0;
      row.push(finer + (finer - older) / (4 ** (k + 1) - 1));
    });
    const [best, last] = [row.at(-1) ?? 0, previous.at(-1) ?? 0];
    error = Math.abs(best - last);
    if (level > 3 && error <= tolerance * Math.max(Math.abs(best), Number.MIN_VALUE)) {
      return { outcome: 'found', value: best, error };
    }
    if (level > 3 && error === 0) return { outcome: 'found', value: best, error };
    previous = row;
  }
  return { outcome: 'not-converged', error };
}
