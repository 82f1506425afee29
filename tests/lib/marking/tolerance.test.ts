import { describe, expect, it } from 'vitest';
import {
  exact,
  farApart,
  matches,
  tolerancesApart,
  within,
  withinPercent,
  type Tolerance,
} from '@/lib/marking/tolerance';

const rounded = (mode: 'decimalPlaces' | 'significantFigures', figures: number): Tolerance => ({
  operator: 'equal-rounded',
  mode,
  figures,
});

describe('the operators of QTI 3', () => {
  it('equal, exact', () => {
    expect(matches(exact, 36, 36)).toBe(true);
    expect(matches(exact, 35, 36)).toBe(false);
  });

  it('equal, absolute, its edge included', () => {
    expect(matches(within(0.5), 270.5, 270)).toBe(true);
    expect(matches(within(0.1), 0.3, 0.2)).toBe(true);
    expect(matches(within(0.5), 270.51, 270)).toBe(false);
  });

  it('equal, relative to the right value', () => {
    expect(matches(withinPercent(0.5), 3.333, 10 / 3)).toBe(true);
    expect(matches(withinPercent(0.5), 3.36, 10 / 3)).toBe(false);
    expect(matches(withinPercent(1), -101, -100)).toBe(true);
  });

  it('equal-rounded, by places and by figures', () => {
    expect(matches(rounded('decimalPlaces', 1), 3.149, 3.05)).toBe(true);
    expect(matches(rounded('decimalPlaces', 1), 3.151, 3.05)).toBe(false);
    expect(matches(rounded('significantFigures', 3), 1513.9, 1508)).toBe(true);
    expect(matches(rounded('significantFigures', 3), 1516, 1508)).toBe(false);
    expect(matches(rounded('decimalPlaces', 4), 0.00425, 0.0043)).toBe(true);
  });
});

describe('how far two values lie apart', () => {
  it('is counted at the larger of the two', () => {
    expect(tolerancesApart(withinPercent(1), 100, 200)).toBeCloseTo(50, 9);
    expect(tolerancesApart(within(0.5), 100, 102.5)).toBeCloseTo(5, 9);
  });

  it('takes one whole unit of a count for five tolerances', () => {
    expect(tolerancesApart(exact, 36, 37)).toBe(5);
    expect(farApart(exact, 36, 37)).toBe(true);
    expect(farApart(exact, 36, 36)).toBe(false);
  });
});
