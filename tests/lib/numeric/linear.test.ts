import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { at, givenAt, nth, wholeAt } from '@/lib/numeric/at';
import { singularValues, solveLinear } from '@/lib/numeric/linear';

describe('solveLinear', () => {
  it('solves Hilbert’s 4 by 4 for a row of ones', () => {
    const matrix = Float64Array.from(
      { length: 16 },
      (_, k) => 1 / (1 + (k % 4) + Math.floor(k / 4)),
    );
    const right = new Float64Array([25 / 12, 77 / 60, 57 / 60, 319 / 420, 0]);
    solveLinear(matrix, right, 4);
    expect(at(right, 4)).toBeGreaterThan(0);
    for (const x of right.subarray(0, 4)) expect(x).toBeCloseTo(1, 10);
  });

  it('changes rows where the pivot is nought', () => {
    const right = new Float64Array([2, 3, 0]);
    solveLinear(new Float64Array([0, 1, 1, 0]), right, 2);
    expect([...right]).toEqual([3, 2, 1]);
  });

  it('leaves a pivot of 0 for equations that say the same twice', () => {
    for (const matrix of [
      [1, 2, 2, 4],
      [0, 0, 0, 0],
    ]) {
      const right = new Float64Array([1, 2, 9]);
      solveLinear(Float64Array.from(matrix), right, 2);
      expect(at(right, 2)).toBe(0);
    }
  });

  it('puts its answer back into the equations', () => {
    const number = fc.integer({ min: -1000, max: 1000 }).map((whole) => whole / 128);
    fc.assert(
      fc.property(fc.array(number, { minLength: 12, maxLength: 12 }), (numbers) => {
        const matrix = numbers.slice(0, 9);
        const right = numbers.slice(9);
        const x = Float64Array.from([...right, 0]);
        solveLinear(Float64Array.from(matrix), x, 3);
        fc.pre(at(x, 3) > 1e-3);
        right.forEach((wanted, row) => {
          const got = [0, 1, 2].reduce(
            (sum, k) => sum + givenAt(matrix, 3 * row + k) * at(x, k),
            0,
          );
          expect(got).toBeCloseTo(wanted, 7);
        });
      }),
      { seed: 2, numRuns: 2000 },
    );
  });
});

describe('singularValues', () => {
  it('knows those of a matrix with a known decomposition: (√45, √5) for 3 0 4 5', () => {
    const [first = 0, second = 0] = singularValues([3, 0, 4, 5], 2, 2);
    expect(first).toBeCloseTo(Math.sqrt(45), 12);
    expect(second).toBeCloseTo(Math.sqrt(5), 12);
  });

  it('shows a lost rank as nought, also with more columns than rows', () => {
    expect(singularValues([1, 2, 2, 4], 2, 2)[1]).toBeLessThan(1e-15);
    expect(singularValues([1, 0, 0, 0, 1, 0], 2, 3).map((x) => Math.round(x))).toEqual([1, 1, 0]);
  });
});

describe('the readers of arrays', () => {
  it('give what stands there, and 0 outside the array', () => {
    expect(at(new Float64Array([5]), 0)).toBe(5);
    expect(at(new Float64Array([5]), 1)).toBe(0);
    expect(wholeAt(new Int8Array([-1]), 0)).toBe(-1);
    expect(wholeAt(new Int32Array([7]), 1)).toBe(0);
    expect(givenAt([2.5], 0)).toBe(2.5);
    expect(givenAt([2.5], 1)).toBe(0);
    expect(nth(['oak', 'ash'], 1)).toBe('ash');
  });
});
