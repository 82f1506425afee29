import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { acuteAngle, degrees, radians, TURN, wrapAngle, wrapTurn } from '@/lib/geometry/angle';
import { fitLine } from '@/lib/geometry/best-line';
import { boundsOf, pathLength, sampleCurve, signedArea } from '@/lib/geometry/curve';
import {
  add,
  between,
  cross,
  direction,
  distance,
  dot,
  norm,
  perpendicular,
  point,
  polar,
  rotate,
  scale,
  subtract,
} from '@/lib/geometry/point';

const number = fc.double({ min: -100, max: 100, noNaN: true });
const place = fc.record({ x: number, y: number });

describe('points and vectors', () => {
  it('keep lengths and angles when turned', () => {
    fc.assert(
      fc.property(place, place, number, (a, b, angle) => {
        const [u, v] = [rotate(a, angle), rotate(b, angle)];
        expect(distance(u, v)).toBeCloseTo(distance(a, b), 9);
        expect(dot(u, v)).toBeCloseTo(dot(a, b), 8);
        expect(cross(u, v)).toBeCloseTo(cross(a, b), 8);
      }),
      { seed: 6, numRuns: 1000 },
    );
  });

  it('turn about a point other than the origin', () => {
    const turned = rotate(point(3, 1), Math.PI / 2, point(1, 1));
    expect(turned.x).toBeCloseTo(1, 15);
    expect(turned.y).toBeCloseTo(3, 15);
  });

  it('add, take away, stretch and share as vectors do', () => {
    fc.assert(
      fc.property(place, place, (a, b) => {
        expect(norm(subtract(add(a, b), b))).toBeCloseTo(norm(a), 9);
        expect(distance(between(a, b, 0), a)).toBe(0);
        expect(distance(between(a, b, 0.5), scale(add(a, b), 0.5))).toBeLessThan(1e-12);
        expect(dot(a, perpendicular(a))).toBeCloseTo(0, 9);
        expect(cross(a, perpendicular(a))).toBeCloseTo(dot(a, a), 8);
      }),
      { seed: 7, numRuns: 1000 },
    );
  });

  it('find their direction again', () => {
    expect(direction(polar(5, 2.5))).toBeCloseTo(2.5, 15);
    expect(direction({ x: 0, y: 0 })).toBe(0);
  });
});

describe('angles', () => {
  it('wrap into one turn, the ends settled', () => {
    expect(wrapAngle(Math.PI)).toBe(Math.PI);
    expect(wrapAngle(-Math.PI)).toBe(Math.PI);
    expect(wrapTurn(TURN)).toBe(0);
    expect(wrapTurn(-1e-20)).toBe(0);
    fc.assert(
      fc.property(number, (angle) => {
        expect(wrapAngle(angle)).toBeGreaterThan(-Math.PI);
        expect(wrapAngle(angle)).toBeLessThanOrEqual(Math.PI);
        expect(wrapTurn(angle)).toBeLessThan(TURN);
        expect(Math.cos(wrapAngle(angle) - wrapTurn(angle))).toBeCloseTo(1, 12);
      }),
      { seed: 8, numRuns: 1000 },
    );
  });

  it('go to degrees and back, and know the acute one', () => {
    expect(degrees(radians(37))).toBeCloseTo(37, 13);
    expect(acuteAngle(radians(190))).toBeCloseTo(radians(10), 14);
    expect(acuteAngle(radians(-100))).toBeCloseTo(radians(80), 14);
  });
});

describe('curves', () => {
  it('have the length, area and box of a circle sampled finely', () => {
    const round = sampleCurve((t) => polar(2, t), 0, TURN, 3600);
    expect(pathLength(round)).toBeCloseTo(4 * Math.PI, 5);
    expect(signedArea(round)).toBeCloseTo(4 * Math.PI, 4);
    expect(signedArea([...round].reverse())).toBeCloseTo(-4 * Math.PI, 4);
    expect(boundsOf(round)?.most.y).toBeCloseTo(2, 12);
    expect(boundsOf([])).toBeUndefined();
    expect(pathLength([])).toBe(0);
    expect(signedArea([])).toBe(0);
  });
});

describe('fitLine', () => {
  it('finds a slanting line and how far points stray to either side', () => {
    const along = Array.from({ length: 21 }, (_, k) => polar(k, 0.6, { x: 3, y: -1 }));
    const straight = fitLine(along);
    expect(straight.outcome === 'line' && straight.angle).toBeCloseTo(0.6, 12);
    expect(straight.outcome === 'line' && straight.stroke).toBeCloseTo(20, 12);
    expect(straight.outcome === 'line' && straight.most - straight.least).toBeCloseTo(0, 12);
    const bowed = fitLine([point(0, 0), point(1, 0.3), point(2, 0)]);
    expect(bowed.outcome === 'line' && bowed.least).toBeCloseTo(-0.1, 12);
    expect(bowed.outcome === 'line' && bowed.most).toBeCloseTo(0.2, 12);
  });

  it('says when there is no line', () => {
    expect(fitLine([point(1, 1)])).toEqual({ outcome: 'no-line' });
    expect(fitLine([point(1, 1), point(1, 1)])).toEqual({ outcome: 'no-line' });
    const square = [point(0, 0), point(1, 0), point(1, 1), point(0, 1)];
    expect(fitLine(square)).toEqual({ outcome: 'no-line' });
  });
});
