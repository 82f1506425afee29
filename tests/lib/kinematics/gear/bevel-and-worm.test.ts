import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bevelCones, bevelWheel } from '@/lib/kinematics/gear/bevel';
import { wormDrive, wormEfficiency, wormHolding, wormRatio } from '@/lib/kinematics/gear/worm';
import { degree } from './gears';

describe('bevel wheels', () => {
  it('have the cones of unit 10, at square and other shafts', () => {
    const square = bevelCones({ firstTeeth: 20, secondTeeth: 40, shaftAngle: 90 * degree });
    expect(square.first / degree).toBeCloseTo(26.5650511771, 9);
    const narrow = bevelCones({ firstTeeth: 18, secondTeeth: 30, shaftAngle: 60 * degree });
    expect(narrow.second / degree).toBeCloseTo(38.2132106017, 6);
    // Equal wheels at any corner: half the angle each.
    expect(bevelCones({ firstTeeth: 25, secondTeeth: 25, shaftAngle: 1.1 }).first).toBeCloseTo(
      0.55,
      12,
    );
  });

  it('roll: cones fill the shaft angle and their radii are as the teeth', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 5, max: 200 }),
        fc.integer({ min: 5, max: 200 }),
        fc.double({ min: 0.01, max: 3.13, noNaN: true }),
        (firstTeeth, secondTeeth, shaftAngle) => {
          const { first, second } = bevelCones({ firstTeeth, secondTeeth, shaftAngle });
          expect(first + second).toBeCloseTo(shaftAngle, 9);
          expect(Math.sin(first) * secondTeeth).toBeCloseTo(Math.sin(second) * firstTeeth, 7);
        },
      ),
      { seed: 19, numRuns: 1000 },
    );
  });

  it('become a crown, then hollow, as the shafts open', () => {
    const form = (angle: number) =>
      bevelCones({ firstTeeth: 20, secondTeeth: 40, shaftAngle: angle }).form;
    expect(form(119 * degree)).toBe('outside');
    expect(form(120 * degree)).toBe('crown');
    expect(form(121 * degree)).toBe('inside');
    expect(() => form(0)).toThrow('shaftAngle is 0');
    expect(() => form(Math.PI)).toThrow('shaftAngle');
  });

  it('have a cone length that Pythagoras gives at square shafts', () => {
    const { first } = bevelCones({ firstTeeth: 20, secondTeeth: 40, shaftAngle: 90 * degree });
    const wheel = bevelWheel({ module: 4, teeth: 20 }, first);
    expect(wheel.coneLength).toBeCloseTo(2 * Math.hypot(20, 40), 9);
    expect(wheel.outsideDiameter).toBeCloseTo(80 + 8 * Math.cos(first), 12);
    expect(wheel.spurTeeth).toBeCloseTo(20 / Math.cos(first), 12);
    expect(wheel.pitchDiameter).toBe(80);
    expect(() => bevelWheel({ module: 4, teeth: 20 }, Math.PI / 2)).toThrow('cone');
  });
});

describe('a worm', () => {
  it('divides by its starts, and has the lead angles of unit 10', () => {
    expect(wormRatio(2, 50)).toBe(25);
    const angles = [1, 2, 4].map(
      (starts) =>
        wormDrive({ starts, wheelTeeth: 40, module: 4, wormDiameter: 40 }).leadAngle / degree,
    );
    expect(angles.map((angle) => angle.toFixed(1))).toEqual(['5.7', '11.3', '21.8']);
    expect(wormDrive({ starts: 2, wheelTeeth: 40, module: 4, wormDiameter: 40 })).toMatchObject({
      ratio: 20,
      lead: expect.closeTo(8 * Math.PI, 12),
      centreDistance: 100,
    });
    expect(() => wormRatio(0, 40)).toThrow('starts is 0');
  });

  it('holds below its friction and creeps above, by an amount', () => {
    expect(wormHolding(Math.atan(0.1), 0.2)).toEqual({
      outcome: 'holds',
      spare: expect.closeTo(0.5, 12),
    });
    expect(wormHolding(Math.atan(0.4), 0.2)).toEqual({
      outcome: 'creeps',
      excess: expect.closeTo(0.2, 12),
    });
    // A slanting face of 20° makes friction 1.06 times what it was.
    expect(wormHolding(Math.atan(0.21), 0.2).outcome).toBe('creeps');
    expect(wormHolding(Math.atan(0.21), 0.2, 20 * degree).outcome).toBe('holds');
    expect(() => wormHolding(2, 0.2)).toThrow('leadAngle is 2');
  });

  it('wastes more than half of the work if it holds', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-3, max: 1.5, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (leadAngle, friction) => {
          const share = wormEfficiency(leadAngle, friction);
          expect(share).toBeGreaterThanOrEqual(0);
          expect(share).toBeLessThanOrEqual(1);
          if (wormHolding(leadAngle, friction).outcome === 'holds') expect(share).toBeLessThan(0.5);
        },
      ),
      { seed: 20, numRuns: 1000 },
    );
    expect(wormEfficiency(0, 0.2)).toBe(0);
    expect(wormEfficiency(0, 0)).toBe(1);
    expect(wormEfficiency(0.3, 0.1)).toBeCloseTo(
      Math.tan(0.3) / Math.tan(0.3 + Math.atan(0.1)),
      12,
    );
  });
});
