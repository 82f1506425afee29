import { describe, expect, it } from 'vitest';
import {
  requireCount,
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

const nonsense = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

describe('the guards of arguments', () => {
  it('hand back what they let through', () => {
    expect(requireFinite('f', 'x', -2.5)).toBe(-2.5);
    expect(requirePositive('f', 'x', 1e-300)).toBe(1e-300);
    expect(requireNonNegative('f', 'x', 0)).toBe(0);
    expect(requireCount('f', 'z', 12, 3)).toBe(12);
    expect(requireWithin('f', 'x', 5, 5, 5)).toBe(5);
  });

  it.each(nonsense)('refuse %s everywhere', (value) => {
    expect(() => requireFinite('f', 'x', value)).toThrow(RangeError);
    expect(() => requirePositive('f', 'x', value)).toThrow(RangeError);
    expect(() => requireNonNegative('f', 'x', value)).toThrow(RangeError);
    expect(() => requireCount('f', 'x', value)).toThrow(RangeError);
    expect(() => requireWithin('f', 'x', value, -1, 1)).toThrow(RangeError);
  });

  it('name the function, the argument, the value and what was expected', () => {
    expect(() => requirePositive('pitchRadius', 'module', -4)).toThrow(
      'pitchRadius: module is -4; expected a finite number greater than zero',
    );
    expect(() => requireCount('pitchRadius', 'teeth', 12.5, 3)).toThrow(
      'pitchRadius: teeth is 12.5; expected a whole number, 3 or more',
    );
  });

  it('draw the line at the bound itself', () => {
    expect(() => requirePositive('f', 'x', 0)).toThrow(RangeError);
    expect(() => requireNonNegative('f', 'x', -Number.MIN_VALUE)).toThrow(RangeError);
    expect(() => requireCount('f', 'z', 2, 3)).toThrow(RangeError);
    expect(() => requireWithin('f', 'x', 1.0000001, 0, 1)).toThrow(RangeError);
  });
});
