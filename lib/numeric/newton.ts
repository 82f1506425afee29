import { requireFinite } from '@/lib/numeric/require';

/** What Newton's iteration came to. */
export type NewtonOutcome =
  | { readonly outcome: 'found'; readonly x: number; readonly residual: number }
  | { readonly outcome: 'flat'; readonly residual: number }
  | { readonly outcome: 'not-converged'; readonly residual: number };

/**
 * Root of a smooth function near `start`, by Newton's iteration with halved steps.
 *
 * A step that would make the residual larger is halved until it does not. Outcomes: `found`;
 * `flat` where the derivative is nought; `not-converged` with the last residual. Throws
 * `RangeError` if `start` or the value there is not finite.
 * @example newton((x) => Math.cos(x) - x, (x) => -Math.sin(x) - 1, 1) // → { outcome: 'found', x: 0.7390851332 }
 */
export function newton(
  f: (x: number) => number,
  derivative: (x: number) => number,
  start: number,
  { tolerance = 1e-14, iterations = 60 } = {},
): NewtonOutcome {
  let x = requireFinite('newton', 'start', start);
  let residual = requireFinite('newton', 'f(start)', f(x));
  for (let turn = 0; turn < iterations; turn += 1) {
    if (residual === 0) return { outcome: 'found', x, residual };
    const slope = derivative(x);
    if (slope === 0 || !Number.isFinite(slope)) return { outcome: 'flat', residual };
    let step = -residual / slope;
    let next = f(x + step);
    while (!(Math.abs(next) <= Math.abs(residual)) && Math.abs(step) > tolerance * Math.abs(x)) {
      step /= 2;
      next = f(x + step);
    }
    if (!(Math.abs(next) <= Math.abs(residual))) {
      return settled(step, x, tolerance)
        ? { outcome: 'found', x, residual }
        : { outcome: 'not-converged', residual };
    }
    x += step;
    residual = next;
    if (settled(step, x, tolerance)) return { outcome: 'found', x, residual };
  }
  return { outcome: 'not-converged', residual };
}

function settled(step: number, x: number, tolerance: number): boolean {
  return Math.abs(step) <= tolerance * Math.max(Math.abs(x), Number.MIN_VALUE);
}
