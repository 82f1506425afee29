import { describe, expect, it } from 'vitest';
import { greatestOn } from '@/lib/numeric/extremum';

describe('the greatest value on an interval', () => {
  it('finds a smooth peak to half the digits of its place and all of its height', () => {
    const { at, value } = greatestOn(Math.sin, 0, 3);
    expect(at).toBeCloseTo(Math.PI / 2, 7);
    expect(value).toBeCloseTo(1, 15);
  });

  it('takes an end when the function only rises or only falls', () => {
    expect(greatestOn((x) => x, -2, 5)).toEqual({ at: 5, value: 5 });
    expect(greatestOn((x) => -x, -2, 5)).toEqual({ at: -2, value: 2 });
  });

  it('tells the higher of two peaks', () => {
    const f = (x: number) => Math.exp(-((x - 1) ** 2) * 20) + 1.1 * Math.exp(-((x - 3) ** 2) * 20);
    expect(greatestOn(f, 0, 4).at).toBeCloseTo(3, 7);
  });

  it('comes as near as it can to the edge of a jump', () => {
    const { at, value } = greatestOn((x) => (x < 1 / 3 ? 0 : 1 - x), 0, 1);
    expect(at).toBeCloseTo(1 / 3, 9);
    expect(value).toBeCloseTo(2 / 3, 9);
  });

  it('keeps to one point when the interval has no length', () => {
    expect(greatestOn((x) => x * x, 2, 2)).toEqual({ at: 2, value: 4 });
  });
});
