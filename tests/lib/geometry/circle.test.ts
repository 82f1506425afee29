import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  circleThrough,
  intersectCircles,
  intersectLineCircle,
  intersectLines,
} from '@/lib/geometry/circle';
import { cross, distance, norm, ORIGIN, polar, rotate, subtract } from '@/lib/geometry/point';

const number = fc.double({ min: -100, max: 100, noNaN: true });
const radius = fc.double({ min: 0.1, max: 100, noNaN: true });
const place = fc.record({ x: number, y: number });

describe('intersectCircles', () => {
  it('meets a 13-14-15 triangle’s apex, left and right', () => {
    const found = intersectCircles(
      { centre: ORIGIN, radius: 13 },
      { centre: { x: 14, y: 0 }, radius: 15 },
    );
    expect(found).toEqual({ outcome: 'meet', left: { x: 5, y: 12 }, right: { x: 5, y: -12 } });
  });

  it('says apart, inside, touching and the same, with the gap', () => {
    const at = (x: number, r: number) => ({ centre: { x, y: 0 }, radius: r });
    expect(intersectCircles(at(0, 2), at(9, 3))).toEqual({ outcome: 'apart', gap: 4 });
    expect(intersectCircles(at(0, 9), at(1, 3))).toEqual({ outcome: 'inside', gap: 5 });
    expect(intersectCircles(at(0, 9), at(0, 3))).toEqual({ outcome: 'inside', gap: 6 });
    expect(intersectCircles(at(0, 3), at(1, 9))).toEqual({ outcome: 'inside', gap: 5 });
    expect(intersectCircles(at(0, 2), at(5, 3))).toEqual({ outcome: 'touch', at: { x: 2, y: 0 } });
    expect(intersectCircles(at(0, 5), at(2, 3))).toEqual({ outcome: 'touch', at: { x: 5, y: 0 } });
    expect(intersectCircles(at(0, 2), at(0, 2))).toEqual({ outcome: 'same' });
    expect(() => intersectCircles(at(0, -1), at(0, 2))).toThrow(RangeError);
  });

  it('puts both points on both circles, the left one to the left', () => {
    fc.assert(
      fc.property(place, radius, place, radius, (a, r1, b, r2) => {
        const found = intersectCircles({ centre: a, radius: r1 }, { centre: b, radius: r2 });
        if (found.outcome === 'apart' || found.outcome === 'inside') {
          const d = distance(a, b);
          expect(found.gap).toBeCloseTo(Math.max(d - r1 - r2, Math.abs(r1 - r2) - d), 9);
          return;
        }
        fc.pre(found.outcome === 'meet');
        for (const p of [found.left, found.right]) {
          expect(Math.abs(distance(p, a) - r1)).toBeLessThan(1e-9 * (r1 + r2));
          expect(Math.abs(distance(p, b) - r2)).toBeLessThan(1e-9 * (r1 + r2));
        }
        expect(cross(subtract(b, a), subtract(found.left, a))).toBeGreaterThanOrEqual(0);
      }),
      { seed: 3, numRuns: 5000 },
    );
  });

  it('turns with the figure', () => {
    fc.assert(
      fc.property(place, radius, place, radius, number, (a, r1, b, r2, angle) => {
        const found = intersectCircles({ centre: a, radius: r1 }, { centre: b, radius: r2 });
        fc.pre(found.outcome === 'meet' && distance(found.left, found.right) > 1e-3);
        const turned = intersectCircles(
          { centre: rotate(a, angle), radius: r1 },
          { centre: rotate(b, angle), radius: r2 },
        );
        if (found.outcome !== 'meet' || turned.outcome !== 'meet') throw new Error('lost');
        expect(distance(rotate(found.left, angle), turned.left)).toBeLessThan(1e-7);
      }),
      { seed: 4, numRuns: 2000 },
    );
  });
});

describe('intersectLineCircle', () => {
  const circle = { centre: { x: 1, y: 1 }, radius: 5 };

  it('meets ahead and behind, touches, and stays apart by a gap', () => {
    const level = (y: number) => ({ through: { x: -20, y }, along: { x: 3, y: 0 } });
    expect(intersectLineCircle(level(4), circle)).toEqual({
      outcome: 'meet',
      ahead: { x: 5, y: 4 },
      behind: { x: -3, y: 4 },
    });
    expect(intersectLineCircle(level(6), circle)).toEqual({ outcome: 'touch', at: { x: 1, y: 6 } });
    expect(intersectLineCircle(level(9), circle)).toEqual({ outcome: 'apart', gap: 3 });
    expect(intersectLineCircle(level(-9), circle)).toEqual({ outcome: 'apart', gap: 5 });
  });

  it('refuses a line without direction', () => {
    expect(() => intersectLineCircle({ through: ORIGIN, along: ORIGIN }, circle)).toThrow(
      'intersectLineCircle: along is 0, 0; expected a direction',
    );
  });
});

describe('intersectLines', () => {
  it('crosses at one point, and tells how far parallels are apart', () => {
    expect(
      intersectLines(
        { through: { x: 0, y: 2 }, along: { x: 1, y: 0 } },
        { through: { x: 7, y: 0 }, along: { x: 0, y: 5 } },
      ),
    ).toEqual({ outcome: 'meet', at: { x: 7, y: 2 } });
    const parallel = intersectLines(
      { through: ORIGIN, along: { x: 3, y: 4 } },
      { through: { x: 5, y: 0 }, along: { x: -6, y: -8 } },
    );
    expect(parallel.outcome === 'parallel' && parallel.distance).toBeCloseTo(4, 12);
  });
});

describe('circleThrough', () => {
  it('passes through its three points', () => {
    fc.assert(
      fc.property(place, place, place, (a, b, c) => {
        const found = circleThrough(a, b, c);
        fc.pre(Math.min(distance(a, b), distance(b, c), distance(c, a)) > 0.1);
        fc.pre(found.outcome === 'circle' && found.circle.radius < 1e4);
        if (found.outcome !== 'circle') return;
        for (const p of [a, b, c]) {
          expect(distance(p, found.circle.centre)).toBeCloseTo(found.circle.radius, 5);
        }
      }),
      { seed: 5, numRuns: 1000 },
    );
  });

  it('says straight of points in line, whatever their size', () => {
    for (const size of [1e-9, 1, 1e9]) {
      const at = (t: number) => polar(t * size, 0.7);
      expect(circleThrough(at(1), at(2), at(4))).toEqual({ outcome: 'straight' });
    }
    expect(norm(ORIGIN)).toBe(0);
  });
});
