import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distance } from '@/lib/geometry/point';
import {
  boltHold,
  boltPull,
  boltTravel,
  grooveSlope,
  knobTurn,
  wedgingSlope,
} from '@/lib/kinematics/cam/bolt';
import { grooveLines, grooveRadius, grooveWood } from '@/lib/kinematics/cam/bolt-groove';
import { between, derivative, expectNear, outcome, runs } from '@/tests/support/numbers';

const degree = Math.PI / 180;
const groove = { innerRadius: 20, gain: 15, slopeAngle: 120 * degree, dwellAngle: 20 * degree };
const travel = (knob: number, lineOffset = 0) =>
  outcome(boltTravel({ ...groove, lineOffset }, knob), 'driven');

describe('a plate cam that drives a bolt', () => {
  it('is that of the worked example: slope 0.358, 19.7°, slips at 0.35, 20.5 mm would hold, pull 4.19', () => {
    const held = outcome(boltHold(groove, 0.35), 'slides-back');
    expect(held.slope).toBeCloseTo(0.358, 3);
    expect(Math.atan(held.slope) / degree).toBeCloseTo(19.7, 1);
    expect(held.innerRadiusToHold).toBeCloseTo(20.5, 1);
    expect(boltPull(groove, 30)).toBeCloseTo(4.19, 2);
  });

  it('stands still on its arcs and moves evenly between', () => {
    expect(travel(0)).toMatchObject({ part: 'inner-arc', travel: 0 });
    expect(travel(20 * degree).travel).toBeCloseTo(0, 12);
    expect(travel(80 * degree)).toMatchObject({ part: 'slope' });
    expect(travel(80 * degree).travel).toBeCloseTo(7.5, 12);
    expect(travel(150 * degree)).toMatchObject({ part: 'outer-arc', travel: 15 });
    expect(knobTurn(groove) / degree).toBeCloseTo(160, 12);
  });

  it('does the work on the bolt that the hand does on the knob', () => {
    for (const knob of [0.6, 1, 1.8, 2.3]) {
      const perRadian = derivative((x) => travel(x).travel, knob, 1e-4);
      // F·dx = hand·K·dκ, with F = pull × hand
      expectNear(boltPull(groove, 30) * perRadian, 30, 1e-8);
    }
  });

  it.each([-8, 8])('follows its groove with the line %s mm beside the axle', (offset) => {
    fc.assert(
      fc.property(between(0, 0.93), (share) => {
        const knob = share * 160 * degree;
        const { pinRadius, travel: out } = travel(knob, offset);
        expectNear(out, Math.sqrt(pinRadius ** 2 - 64) - Math.sqrt(400 - 64), 1e-10, 20);
        // the groove has the pin's radius at the place that the knob has brought under the pin
        const place = knob + Math.asin(offset / pinRadius) - Math.asin(offset / 20);
        expectNear(grooveRadius(groove, place), pinRadius, 1e-9);
      }),
      runs,
    );
  });

  it('says by how much its line misses the groove, or its pin cannot follow', () => {
    expect(boltTravel({ ...groove, lineOffset: -21 }, 0)).toEqual({
      outcome: 'line-misses-groove',
      by: 1,
    });
    const steep = { innerRadius: 20, gain: 30, slopeAngle: 0.5, dwellAngle: 0.2, lineOffset: -12 };
    // 1 − (12/20)·60/16
    expect(outcome(boltTravel(steep, 0), 'pin-cannot-follow').by).toBeCloseTo(1.25, 12);
  });

  it('holds on a slope gentler than its friction, and never without any', () => {
    expect(outcome(boltHold(groove, 0.4), 'holds').spare).toBeCloseTo(
      0.4 - grooveSlope(groove, 20),
      14,
    );
    expect(outcome(boltHold(groove, 0), 'slides-back').innerRadiusToHold).toBe('infinite');
    const widened = {
      ...groove,
      innerRadius: Number(outcome(boltHold(groove, 0.2), 'slides-back').innerRadiusToHold),
    };
    expectNear(grooveSlope(widened, widened.innerRadius), 0.2, 1e-12);
  });

  it('is steepest inside', () => {
    expect(grooveSlope(groove, 35)).toBeLessThan(grooveSlope(groove, 20));
    expect(wedgingSlope(0.4) / degree).toBeCloseTo(46.4, 1);
    expect(wedgingSlope(0)).toBe(Math.PI / 2);
  });

  it('refuses nonsense', () => {
    expect(() => boltTravel(groove, 3)).toThrow('knobAngle is 3');
    expect(() => boltTravel({ ...groove, gain: 0 }, 0)).toThrow('gain is 0');
    expect(() => grooveSlope(groove, 36)).toThrow('pinRadius is 36');
    expect(() => boltHold(groove, -1)).toThrow('friction is -1');
    expect(() => boltPull(groove, 0)).toThrow('knobRadius is 0');
    expect(() => grooveLines(groove, 0)).toThrow('pinRadius is 0');
    expect(() => grooveLines(groove, 3, 5)).toThrow('steps is 5');
  });
});

describe('the groove as it is cut', () => {
  it('has walls one pin radius to either side of its middle line', () => {
    const { middle, innerWall, outerWall } = grooveLines(groove, 3, 200);
    middle.forEach((point, i) => {
      const [inner, outer] = [innerWall[i] ?? point, outerWall[i] ?? point];
      expect(distance(point, inner)).toBeCloseTo(3, 10);
      expect(distance(point, outer)).toBeCloseTo(3, 10);
      expect(Math.hypot(outer.x, outer.y)).toBeGreaterThan(Math.hypot(inner.x, inner.y));
      // square to the middle line: no point of it comes nearer than the pin's radius
      const nearest = middle.reduce(
        (least, other) => Math.min(least, distance(other, outer)),
        Infinity,
      );
      const onCorner = Math.min(Math.abs(i - 25), Math.abs(i - 175)) < 12;
      if (!onCorner) expect(nearest).toBeGreaterThan(2.999);
    });
  });

  it('runs clockwise from +y', () => {
    const { middle } = grooveLines(groove, 3, 160);
    expect(middle[0]).toEqual({ x: 0, y: 20 });
    expect(middle[90]?.x).toBeGreaterThan(0);
    expect(middle[90]?.y).toBeCloseTo(0, 9);
  });

  it('leaves wood inside and outside, or says how far it breaks through', () => {
    expect(grooveWood(groove, 3, 12, 46)).toEqual({ inside: 11, outside: 8 });
    expect(grooveWood(groove, 3, 40, 36)).toEqual({ inside: -3, outside: -2 });
  });
});
