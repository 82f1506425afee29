import { describe, expect, it } from 'vitest';
import { isoFit, limitDeviations } from '@/lib/kinematics/timber/fit';
import { above, below, mainRanges, tolerances } from '@/lib/kinematics/timber/fit.data';
import { expectNear, outcome } from '@/tests/support/numbers';

const limits = (nominal: number, designation: string) => {
  const { upper, lower } = outcome(limitDeviations(nominal, designation), 'limits');
  return [upper, lower];
};

describe('the limits of holes and shafts', () => {
  // ISO 286-2:2010, tables of limit deviations; from memory
  it.each([
    [3, 'h6', 0, -6],
    [3.0001, 'h6', 0, -8],
    [6, 'g6', -4, -12],
    [8, 'f7', -13, -28],
    [10, 'H8', 22, 0],
    [12, 'k6', 12, 1],
    [20, 'p6', 35, 22],
    [25, 'd9', -65, -117],
    [25, 'e8', -40, -73],
    [25, 'm6', 21, 8],
    [25, 'n6', 28, 15],
    [25, 'js6', 6.5, -6.5],
    [25, 'N7', -7, -28],
    [25, 'P7', -14, -35],
    [25, 'M7', 0, -21],
    [25, 'M8', 4, -29],
    [25, 'N9', 0, -52],
    [25, 'F8', 53, 20],
    [25, 'G7', 28, 7],
    [25, 'JS7', 10.5, -10.5],
    [45, 'c11', -130, -290],
    [60, 'r6', 60, 41],
    [75, 's6', 78, 59],
    [2, 'K7', 0, -10],
    [2, 'P7', -6, -16],
    [300, 'M6', -9, -41],
    [500, 'H13', 970, 0],
    [25, 'k8', 33, 0],
    [25, 'D10', 149, 65],
    [25, 'A11', 430, 300],
    [25, 'b11', -160, -290],
    [25, 'R7', -20, -41],
    [25, 'P9', -22, -74],
    [3, 'N9', -4, -29],
  ] as const)('of %s %s are %s and %s', (nominal, designation, upper, lower) => {
    expect(limits(nominal, designation)).toEqual([upper, lower]);
  });

  it.each(['H3', 'H14', 'z6', 'q6', 'K9', 'Hh7', 'H', '7', '', 'N4', 'h', 'toString6'])(
    'of %s are not in the tables here',
    (designation) => {
      expect(limitDeviations(25, designation)).toEqual({
        outcome: 'not-tabulated',
        asked: designation,
      });
    },
  );

  it('end at 500 mm', () => {
    expect(limitDeviations(501, 'H7').outcome).toBe('not-tabulated');
    expect(() => limitDeviations(0, 'H7')).toThrow('nominal is 0');
  });
});

describe('the tables', () => {
  const bounds = [1, ...mainRanges];
  const means = mainRanges.map((to, i) => Math.sqrt((bounds[i] ?? 1) * to));

  it('of tolerances follow the standard’s unit i = 0.45·∛D + D/1000 within its rounding', () => {
    const multiples: Record<number, number> = {
      6: 10,
      7: 16,
      8: 25,
      9: 40,
      10: 64,
      11: 100,
      12: 160,
      13: 250,
    };
    for (const [grade, multiple] of Object.entries(multiples)) {
      tolerances[Number(grade)]?.forEach((width, i) => {
        if (i === 0) return;
        const mean = means[i] ?? 1;
        expectNear(width, multiple * (0.45 * Math.cbrt(mean) + mean / 1000), 0.1);
      });
    }
  });

  it('of d to g follow the standard’s powers of D within its rounding', () => {
    const laws: Record<string, (d: number) => number> = {
      d: (d) => 16 * d ** 0.44,
      e: (d) => 11 * d ** 0.41,
      f: (d) => 5.5 * d ** 0.41,
      g: (d) => 2.5 * d ** 0.34,
    };
    for (const [letter, law] of Object.entries(laws)) {
      below[letter]?.forEach((deviation, i) => {
        if (i > 0)
          expect(Math.abs(deviation - law(means[i] ?? 1))).toBeLessThan(0.06 * deviation + 1);
      });
    }
  });

  it('grow with the size and are as long as the ranges', () => {
    for (const row of [
      ...Object.values(tolerances),
      ...Object.values(below),
      ...Object.values(above),
    ]) {
      expect(row).toHaveLength(mainRanges.length);
      row.slice(1).forEach((value, i) => expect(value).toBeGreaterThanOrEqual(row[i] ?? 0));
    }
  });
});

describe('a fit', () => {
  it('is free, in between or tight', () => {
    expect(outcome(isoFit(25, 'H7', 'g6'), 'fits').kind).toBe('clearance');
    expect(outcome(isoFit(25, 'H7', 'k6'), 'fits').kind).toBe('transition');
    expect(outcome(isoFit(25, 'H7', 'p6'), 'fits').kind).toBe('interference');
    expect(outcome(isoFit(25, 'H7', 'h6'), 'fits')).toMatchObject({
      kind: 'clearance',
      leastClearance: 0,
    });
  });

  it('is the same whichever of the two has the letter: H7/p6 and P7/h6', () => {
    for (const nominal of [5, 8, 15, 25, 40, 70, 110, 160, 200]) {
      const one = outcome(isoFit(nominal, 'H7', 'p6'), 'fits');
      const other = outcome(isoFit(nominal, 'P7', 'h6'), 'fits');
      expect(other.greatestClearance).toBe(one.greatestClearance);
      expect(other.leastClearance).toBe(one.leastClearance);
    }
  });

  it('names the part that it does not know', () => {
    expect(isoFit(25, 'h7', 'g6')).toEqual({ outcome: 'not-tabulated', asked: 'h7' });
    expect(isoFit(25, 'H7', 'G6')).toEqual({ outcome: 'not-tabulated', asked: 'G6' });
    expect(isoFit(25, 'H7', 'zz6')).toEqual({ outcome: 'not-tabulated', asked: 'zz6' });
  });
});
