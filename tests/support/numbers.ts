import fc from 'fast-check';
import { expect } from 'vitest';

/** Runs and seed of the property tests: the same numbers every time, more of them when proving. */
export const runs = { seed: 20_260, numRuns: Number(process.env.PROPERTY_RUNS ?? 500) } as const;

/** A number from `min` to `max`, spread evenly, never NaN or infinite. */
export function between(min: number, max: number): fc.Arbitrary<number> {
  return fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
}

/** A whole number from `min` to `max`. */
export function whole(min: number, max: number): fc.Arbitrary<number> {
  return fc.integer({ min, max });
}

/** The derivative of `f` at `x` by a central difference of fourth order. */
export function derivative(f: (x: number) => number, x: number, step = 1e-3): number {
  const two = f(x + 2 * step) - f(x - 2 * step);
  const one = f(x + step) - f(x - step);
  return (8 * one - two) / (12 * step);
}

/** `got` is `wanted` to a relative part, or to an absolute part near 0. */
export function expectNear(
  got: number,
  wanted: number,
  part = 1e-9,
  size = Math.abs(wanted),
): void {
  expect(Math.abs(got - wanted), `${got} against ${wanted}`).toBeLessThanOrEqual(
    part * Math.max(size, 1e-300),
  );
}

/** The member of a union of outcomes that a test is about; any other fails it with its facts. */
export function outcome<
  Outcome extends { readonly outcome: string },
  Kind extends Outcome['outcome'],
>(got: Outcome, kind: Kind): Extract<Outcome, { outcome: Kind }> {
  expect(got).toMatchObject({ outcome: kind });
  return got as Extract<Outcome, { outcome: Kind }>;
}
