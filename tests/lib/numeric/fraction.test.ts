import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  add,
  divide,
  fraction,
  greatestCommonDivisor,
  isZero,
  multiply,
  subtract,
  toNumber,
  written,
} from '@/lib/numeric/fraction';

const wholes = fc.integer({ min: -1e6, max: 1e6 });
const others = wholes.filter((n) => n !== 0);

describe('exact fractions', () => {
  it('stand in lowest terms over a positive denominator', () => {
    expect(fraction(36, -48)).toEqual({ numerator: -3n, denominator: 4n });
    expect(fraction(0, -7)).toEqual({ numerator: 0n, denominator: 1n });
    expect(written(fraction(36, 48))).toBe('3/4');
    expect(written(fraction(-10, 2))).toBe('-5');
  });

  it('add, take off, multiply and divide back to where they began', () => {
    fc.assert(
      fc.property(wholes, others, others, others, (a, b, c, d) => {
        const [x, y] = [fraction(a, b), fraction(c, d)];
        expect(subtract(add(x, y), y)).toEqual(x);
        expect(divide(multiply(x, y), y)).toEqual(x);
        expect(isZero(subtract(x, x))).toBe(true);
        expect(toNumber(x)).toBe(a / b + 0);
      }),
      { seed: 6, numRuns: 500 },
    );
  });

  it('become the nearest number even beyond the range of numbers', () => {
    expect(toNumber({ numerator: 3n * 10n ** 400n, denominator: 2n * 10n ** 400n })).toBe(1.5);
    expect(toNumber({ numerator: -(10n ** 400n), denominator: 3n * 10n ** 399n })).toBeCloseTo(
      -10 / 3,
      14,
    );
    expect(toNumber(fraction(0))).toBe(0);
  });

  it('share a greatest divisor as Euclid finds it', () => {
    expect(greatestCommonDivisor(24n, -60n)).toBe(12n);
    expect(greatestCommonDivisor(0n, 0n)).toBe(0n);
  });

  it('refuse half numbers and nothing below the line', () => {
    expect(() => fraction(1.5)).toThrow('numerator is 1.5');
    expect(() => fraction(1, 0)).toThrow('denominator is 0');
    expect(() => divide(fraction(1), fraction(0))).toThrow(RangeError);
  });
});
