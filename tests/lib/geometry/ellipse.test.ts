import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ellipseArea,
  ellipseFoci,
  ellipseLocus,
  ellipsePerimeter,
  ellipsePerimeterRamanujan1,
  ellipsePerimeterRamanujan2,
  ellipsePerimeterRootMeanSquare,
} from '@/lib/geometry/ellipse';
import { integrate } from '@/lib/numeric/integrate';

const oval = fc.record({
  semiMajor: fc.double({ min: 0.01, max: 1000, noNaN: true }),
  semiMinor: fc.double({ min: 0.01, max: 1000, noNaN: true }),
});

describe('the edge of an ellipse', () => {
  it('is the integral of its arc (elliptic integral of the second kind)', () => {
    for (const semiMinor of [0.3, 0.6, 0.95, 1]) {
      const arc = integrate(
        (t) => Math.hypot(Math.sin(t), semiMinor * Math.cos(t)),
        0,
        Math.PI / 2,
      );
      expect(4 * (arc.outcome === 'found' ? arc.value : 0)).toBeCloseTo(
        ellipsePerimeter({ semiMajor: 1, semiMinor }),
        11,
      );
    }
  });

  it('has its limits: a circle, a line, a point', () => {
    expect(ellipsePerimeter({ semiMajor: 7, semiMinor: 7 })).toBeCloseTo(14 * Math.PI, 12);
    expect(ellipsePerimeter({ semiMajor: 7, semiMinor: 0 })).toBe(28);
    expect(ellipsePerimeter({ semiMajor: 7, semiMinor: 1e-9 })).toBeCloseTo(28, 9);
    expect(ellipsePerimeter({ semiMajor: 0, semiMinor: 0 })).toBe(0);
    expect(ellipsePerimeterRamanujan2({ semiMajor: 0, semiMinor: 0 })).toBe(0);
  });

  it('lies between the mean circle and the root-mean-square rule, and grows with its size', () => {
    fc.assert(
      fc.property(oval, (size) => {
        const exact = ellipsePerimeter(size);
        const rounding = 1e-12 * exact;
        expect(exact).toBeGreaterThanOrEqual(
          Math.PI * (size.semiMajor + size.semiMinor) - rounding,
        );
        expect(exact).toBeLessThanOrEqual(ellipsePerimeterRootMeanSquare(size) + rounding);
        expect(Math.abs(ellipsePerimeterRamanujan2(size) / exact - 1)).toBeLessThan(4.1e-4);
        expect(Math.abs(ellipsePerimeterRamanujan1(size) / exact - 1)).toBeLessThan(5e-3);
        for (const factor of [1e-9, 1e9]) {
          const scaled = { semiMajor: factor * size.semiMajor, semiMinor: factor * size.semiMinor };
          expect(ellipsePerimeter(scaled) / factor / exact).toBeCloseTo(1, 12);
        }
      }),
      { seed: 9, numRuns: 3000 },
    );
  });

  it('refuses a half axis below nought', () => {
    expect(() => ellipsePerimeter({ semiMajor: 1, semiMinor: -1 })).toThrow(
      'ellipsePerimeter: semiMinor is -1',
    );
  });
});

describe('foci and area', () => {
  it('are those of a circle and of a line at the ends', () => {
    expect(ellipseFoci({ semiMajor: 5, semiMinor: 5 })).toEqual({
      focalDistance: 0,
      eccentricity: 0,
      stringLoop: 10,
    });
    expect(ellipseFoci({ semiMajor: 5, semiMinor: 0 }).eccentricity).toBe(1);
    expect(ellipseFoci({ semiMajor: 0, semiMinor: 0 }).eccentricity).toBe(0);
    expect(ellipseFoci({ semiMajor: 3, semiMinor: 5 }).focalDistance).toBeCloseTo(4, 14);
    expect(ellipseArea({ semiMajor: 2, semiMinor: 3 })).toBeCloseTo(6 * Math.PI, 14);
  });

  it('keep the sum of the distances to the foci', () => {
    const { focalDistance: f, stringLoop } = ellipseFoci({ semiMajor: 5, semiMinor: 3 });
    for (const t of [0, 0.4, 1.5, 3]) {
      const at = { x: 5 * Math.cos(t), y: 3 * Math.sin(t) };
      expect(ellipseLocus(5, 3, at)).toBeCloseTo(1, 14);
      expect(Math.hypot(at.x - f, at.y) + Math.hypot(at.x + f, at.y) + 2 * f).toBeCloseTo(
        stringLoop,
        12,
      );
    }
    expect(() => ellipseLocus(0, 3, { x: 0, y: 0 })).toThrow(RangeError);
  });
});
