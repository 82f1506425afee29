import { describe, expect, it } from 'vitest';
import { findExtremes } from '@/lib/numeric/extremes';
import { integrate } from '@/lib/numeric/integrate';
import { acosClamped, asinClamped, clamp, nearlyEqual, sqrtClamped } from '@/lib/numeric/tolerance';

describe('findExtremes', () => {
  it('finds both, within the range and at its ends', () => {
    const { least, most } = findExtremes((x) => x ** 3 - 3 * x, -1.5, 3);
    expect(least.at).toBeCloseTo(1, 7);
    expect(least.value).toBeCloseTo(-2, 14);
    expect(most).toEqual({ at: 3, value: 18 });
  });

  it('gives the value of a function that does not change', () => {
    expect(findExtremes(() => 4, 0, 1).least.value).toBe(4);
    expect(findExtremes(() => 0, 0, 1).most.value).toBe(0);
  });

  it('refuses bounds and values that are not finite', () => {
    expect(() => findExtremes((x) => x, 0, Number.POSITIVE_INFINITY)).toThrow(RangeError);
    expect(() => findExtremes((x) => 1 / x, 0, 1)).toThrow('f(x) is Infinity');
    expect(() => findExtremes((x) => x, 0, 1, 1)).toThrow('pieces is 1');
  });
});

describe('integrate', () => {
  it('knows the area under a quarter circle’s root and under an exponential', () => {
    const exp = integrate(Math.exp, 0, 1);
    expect(exp.outcome === 'found' && exp.value).toBeCloseTo(Math.E - 1, 13);
    expect(integrate(() => 0, 0, 1)).toEqual({ outcome: 'found', value: 0, error: 0 });
  });

  it('says when a corner keeps it from settling', () => {
    const found = integrate((x) => Math.sqrt(Math.abs(x - 0.3)), 0, 1, { halvings: 6 });
    expect(found.outcome).toBe('not-converged');
    expect(found.error).toBeLessThan(0.01);
  });
});

describe('the tolerances', () => {
  it('forgive rounding and nothing else', () => {
    expect(nearlyEqual(1, 1 + 1e-13)).toBe(true);
    expect(nearlyEqual(1, 1 + 1e-11)).toBe(false);
    expect(nearlyEqual(1e9, 1e9 + 1e-4)).toBe(true);
    expect(nearlyEqual(0, 1e-13, 1e-12, 1)).toBe(true);
    expect(nearlyEqual(0, 1e-13)).toBe(false);
  });

  it('clamp what rounding carried too far', () => {
    expect(clamp(-3, 0, 1)).toBe(0);
    expect(acosClamped(1 + 1e-15)).toBe(0);
    expect(acosClamped(-1 - 1e-15)).toBe(Math.PI);
    expect(asinClamped(1 + 1e-15)).toBe(Math.PI / 2);
    expect(sqrtClamped(-1e-20)).toBe(0);
    expect(sqrtClamped(4)).toBe(2);
  });
});
