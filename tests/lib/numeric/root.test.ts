import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newton } from '@/lib/numeric/newton';
import { findRoot } from '@/lib/numeric/root';

describe('findRoot', () => {
  it('finds a root to rounding: Kepler’s equation M = E − e·sin E at M 1, e 0.5', () => {
    const found = findRoot((x) => x - 0.5 * Math.sin(x) - 1, 0, 3);
    expect(found).toMatchObject({ outcome: 'found' });
    expect(found.outcome === 'found' && found.x).toBeCloseTo(1.49870113351785, 12);
  });

  it('says when the values at both ends have one sign', () => {
    expect(findRoot((x) => x * x + 1, -1, 2)).toEqual({
      outcome: 'no-bracket',
      atLow: 2,
      atHigh: 5,
    });
  });

  it('gives the last residual when it runs out of turns', () => {
    const found = findRoot((x) => Math.cbrt(x - 0.3), -4, 5, { iterations: 3 });
    expect(found.outcome).toBe('not-converged');
    expect(found.outcome === 'not-converged' && Math.abs(found.residual)).toBeGreaterThan(0);
  });

  it('takes an end that is itself the root', () => {
    expect(findRoot((x) => x, 0, 1)).toMatchObject({ outcome: 'found', x: 0 });
    expect(findRoot((x) => x - 1, 0, 1)).toMatchObject({ outcome: 'found', x: 1 });
  });

  it('refuses what is not finite', () => {
    expect(() => findRoot((x) => x, Number.NaN, 1)).toThrow(RangeError);
    expect(() => findRoot(() => Number.NaN, 0, 1)).toThrow('findRoot: f(x) is NaN');
  });

  it('finds the root of any cubic with a given one, within its bracket', () => {
    const number = fc.double({ min: -5, max: 5, noNaN: true });
    fc.assert(
      fc.property(number, number, (root, shape) => {
        const f = (x: number) => (x - root) * (1 + (x - shape) ** 2);
        const found = findRoot(f, -7, 7);
        expect(found.outcome === 'found' && found.x).toBeCloseTo(root, 9);
      }),
      { seed: 1, numRuns: 2000 },
    );
  });

  it('keeps to a tolerance that is asked for', () => {
    const found = findRoot((x) => x ** 9 - 0.1, 0, 1, { tolerance: 1e-3 });
    expect(found.outcome === 'found' && Math.abs(found.x - 0.1 ** (1 / 9))).toBeLessThan(1e-3);
  });
});

describe('newton', () => {
  it('finds the fixed point of the cosine, 0.7390851332151607', () => {
    const found = newton(
      (x) => Math.cos(x) - x,
      (x) => -Math.sin(x) - 1,
      1,
    );
    expect(found.outcome === 'found' && found.x).toBeCloseTo(0.7390851332151607, 14);
  });

  it('halves its step where the whole one leads away', () => {
    const found = newton(Math.atan, (x) => 1 / (1 + x * x), 3);
    expect(found.outcome === 'found' && Math.abs(found.x)).toBeLessThan(1e-12);
  });

  it('says where the function is flat, and where it has no root', () => {
    expect(
      newton(
        (x) => x * x + 1,
        (x) => 2 * x,
        0,
      ),
    ).toEqual({ outcome: 'flat', residual: 1 });
    const none = newton(
      (x) => x * x + 1,
      (x) => 2 * x,
      3,
      { iterations: 5 },
    );
    expect(none.outcome).not.toBe('found');
  });

  it('refuses a start that is not a number', () => {
    expect(() =>
      newton(
        (x) => x,
        () => 1,
        Number.NaN,
      ),
    ).toThrow('newton: start is NaN');
  });
});
