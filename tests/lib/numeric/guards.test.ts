import { describe, expect, it } from 'vitest';
import { itemAt } from '@/lib/numeric/item-at';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { rootBetween } from '@/lib/numeric/root-between';

describe('guards for moderate sizes', () => {
  it('let through what a workshop could mean', () => {
    expect(requireSize('f', 'length', 1e-60)).toBe(1e-60);
    expect(requireSize('f', 'length', 1e60)).toBe(1e60);
    expect(requireSizeOrNought('f', 'play', 0)).toBe(0);
    expect(requireSizeOrNought('f', 'play', 2)).toBe(2);
    expect(requireSizeOrNought('f', 'play', 5e-324)).toBe(0);
    expect(requireMeasure('f', 'shift', -2)).toBe(-2);
    expect(requireMeasure('f', 'shift', -1e-61)).toBe(0);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 1e61, -1e61])('refuse %s by name', (value) => {
    for (const guard of [requireSize, requireSizeOrNought, requireMeasure]) {
      expect(() => guard('f', 'length', value)).toThrow(`f: length is ${value}; expected a number`);
    }
  });

  it('refuse nought and less where a size is wanted', () => {
    expect(() => requireSize('f', 'length', 0)).toThrow('f: length is 0');
    expect(() => requireSizeOrNought('f', 'length', -1)).toThrow('f: length is -1');
  });
});

describe('what a caller knows to be there', () => {
  it('is handed over, from either end', () => {
    expect(itemAt([3, 4], 1)).toBe(4);
    expect(itemAt([3, 4], -2)).toBe(3);
    expect(rootBetween('f', (x) => x - 2, 0, 5)).toBeCloseTo(2, 14);
  });

  it('is missed with an error if it is not', () => {
    expect(() => itemAt([3, 4], 2)).toThrow('itemAt: place is 2; expected one of 2 items');
    expect(() => rootBetween('f', (x) => x + 2, 0, 5)).toThrow('f: no-bracket from 0 to 5');
  });
});
