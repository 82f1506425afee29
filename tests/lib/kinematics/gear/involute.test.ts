import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  involute,
  involuteInverse,
  pressureAngleAt,
  unwindCord,
} from '@/lib/kinematics/gear/involute';

const degree = Math.PI / 180;

describe('the involute function', () => {
  it.each([
    // Machinery's Handbook, table of involute functions (from memory; recomputed in GR-IV-01 to 03).
    [14.5, 0.00554484281671],
    [20, 0.0149043838673],
    [25, 0.0299753451564],
  ])('of %s° is %s', (angle, value) => {
    expect(involute(angle * degree)).toBeCloseTo(value, 13);
  });

  it('meets its series without a step where it changes over', () => {
    for (const at of [0.1 - 1e-12, 0.1, 0.1 + 1e-12]) {
      expect(involute(at) / (Math.tan(0.1) - 0.1)).toBeCloseTo(1, 9);
    }
    expect(involute(1e-6) / (1e-18 / 3)).toBeCloseTo(1, 9);
    expect(involute(0)).toBe(0);
  });

  it('is undone by its inverse from a millionth of a radian to almost a quarter turn', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1.57, noNaN: true }), (angle) => {
        expect(Math.abs(involuteInverse(involute(angle)) / angle - 1)).toBeLessThan(1e-12);
      }),
      { seed: 1, numRuns: 3000 },
    );
    expect(involuteInverse(0)).toBe(0);
    expect(involuteInverse(1e6)).toBeCloseTo(Math.PI / 2 - 1e-6, 9);
  });

  it('refuses what has no involute', () => {
    expect(() => involute(-0.1)).toThrow('involute: angle is -0.1');
    expect(() => involute(Math.PI / 2)).toThrow(RangeError);
    expect(() => involuteInverse(-1)).toThrow('value is -1');
    expect(() => involuteInverse(Number.NaN)).toThrow(RangeError);
  });
});

describe('a cord unwound from a disc', () => {
  it('keeps its free end square to the curve and touching the disc', () => {
    for (const unwound of [-2, -0.3, 0, 0.4, 1, 3]) {
      const { cord, radius, point } = unwindCord(30, unwound);
      const touching = { x: 30 * Math.cos(unwound), y: 30 * Math.sin(unwound) };
      expect(Math.hypot(point.x - touching.x, point.y - touching.y)).toBeCloseTo(cord, 12);
      expect(Math.hypot(point.x, point.y)).toBeCloseTo(radius, 12);
      const step = 1e-6;
      const [after, before] = [unwindCord(30, unwound + step), unwindCord(30, unwound - step)];
      const along = (after.point.x - before.point.x) * (point.x - touching.x);
      const across = (after.point.y - before.point.y) * (point.y - touching.y);
      expect(Math.abs(along + across)).toBeLessThan(1e-6);
    }
  });

  it('has turned by the involute function when seen from the centre', () => {
    const { point, radius } = unwindCord(30, Math.tan(0.7));
    expect(pressureAngleAt(30, radius)).toBeCloseTo(0.7, 12);
    expect(Math.atan2(point.y, point.x)).toBeCloseTo(involute(0.7), 12);
  });

  it('has no pressure angle inside the disc, and refuses a disc without size', () => {
    expect(pressureAngleAt(30, 20)).toBe(0);
    expect(() => unwindCord(0, 1)).toThrow('baseRadius is 0');
    expect(() => unwindCord(1, Number.POSITIVE_INFINITY)).toThrow('unwound');
    expect(() => pressureAngleAt(1, -1)).toThrow('radius is -1');
  });
});
