import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lengthOf } from '@/lib/numeric/length';

describe('the length of a way', () => {
  it('is exact where it can be, and nought only for nought', () => {
    expect(lengthOf(-3, 4)).toBe(5);
    expect(lengthOf(0, -7)).toBe(7);
    expect(lengthOf(0, 0)).toBe(0);
  });

  it('neither overflows nor vanishes on the way', () => {
    expect(lengthOf(3e300, 4e300)).toBeCloseTo(5e300, -290);
    expect(lengthOf(3e-300, 4e-300) / 5e-300).toBeCloseTo(1, 15);
  });

  it('agrees with Math.hypot to the last digits', () => {
    const any = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(any, any, (x, y) => {
        const wanted = Math.hypot(x, y);
        expect(Math.abs(lengthOf(x, y) - wanted)).toBeLessThanOrEqual(4e-16 * wanted);
      }),
    );
  });
});
