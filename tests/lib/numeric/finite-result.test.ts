import { describe, expect, it } from 'vitest';
import { finiteResult } from '@/lib/numeric/finite-result';

describe('the guard of answers', () => {
  it('hands back what is finite throughout', () => {
    const answer = { outcome: 'fits', at: [{ x: 1, y: -2e300 }], none: null, sure: true };
    expect(finiteResult('f', answer)).toBe(answer);
    expect(finiteResult('f', 0)).toBe(0);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    'refuses %s at any depth and names the function',
    (value) => {
      expect(() => finiteResult('f', value)).toThrow(RangeError);
      expect(() => finiteResult('f', { a: { b: [0, { c: value }] } })).toThrow(
        'f: the answer to these arguments is too large for a number',
      );
    },
  );
});
