import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  lanternCarrying,
  lanternPoint,
  lanternPointedRadius,
  lanternSizes,
} from '@/lib/kinematics/gear/lantern';
import { lanternWheelOutline } from '@/lib/kinematics/gear/lantern-outline';

const spec = { pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 };

describe('a lantern', () => {
  it('has its pitch circle through the middles of the pins', () => {
    // Unit 3.5's worked example: 63.66, 286.48, 175.07, 13 (play 1), 24.36, 13.36.
    const sizes = lanternSizes({ ...spec, play: 1 });
    expect(2 * sizes.pinCircleRadius).toBeCloseTo(63.66, 2);
    expect(2 * sizes.wheelRadius).toBeCloseTo(286.48, 2);
    expect(sizes.centreDistance).toBeCloseTo(175.07, 2);
    expect(sizes.toothThickness).toBe(13);
    expect(sizes.pinChord).toBeCloseTo(24.36, 2);
    expect(sizes.woodBetweenPins).toBeCloseTo(13.36, 2);
    expect(() => lanternSizes({ ...spec, pins: 2 })).toThrow('pins is 2');
  });

  it('carries each pin until the next is taken, if its teeth are tall enough', () => {
    // Needed 151.46 against pointed 157.92 mm (unit 3.5).
    const carried = lanternCarrying(spec);
    expect(carried).toEqual({
      outcome: 'carried',
      needed: expect.closeTo(151.46, 2),
      pointed: expect.closeTo(157.924551835, 7),
    });
    const few = lanternCarrying({ pitch: 25, wheelTeeth: 36, pins: 4, pinDiameter: 20 });
    expect(few.outcome).toBe('lets-go');
    if (few.outcome === 'lets-go') expect(few.short).toBeCloseTo(few.needed - few.pointed, 12);
    expect(lanternCarrying({ ...spec, pinDiameter: 26 })).toEqual({
      outcome: 'no-tooth',
      excess: 1,
    });
    expect(() => lanternPointedRadius({ ...spec, pinDiameter: 26 })).toThrow(
      'tooth thickness is -1',
    );
  });

  it('is driven square to the flank through the pitch point', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 0.4, noNaN: true }), (roll) => {
        const { pinCentre, flank } = lanternPoint(spec, roll);
        expect(Math.hypot(flank.x - pinCentre.x, flank.y - pinCentre.y)).toBeCloseTo(5.5, 9);
        const { wheelRadius } = lanternSizes(spec);
        const pitch = { x: wheelRadius * Math.cos(roll), y: wheelRadius * Math.sin(roll) };
        const across =
          (flank.x - pinCentre.x) * (pitch.y - pinCentre.y) -
          (flank.y - pinCentre.y) * (pitch.x - pinCentre.x);
        expect(Math.abs(across)).toBeLessThan(1e-8);
        const step = 1e-6;
        const [after, before] = [
          lanternPoint(spec, roll + step).flank,
          lanternPoint(spec, roll - step).flank,
        ];
        const along =
          (after.x - before.x) * (flank.x - pinCentre.x) +
          (after.y - before.y) * (flank.y - pinCentre.y);
        expect(Math.abs(along) / step).toBeLessThan(1e-2);
      }),
      { seed: 18, numRuns: 500 },
    );
  });

  it('starts on the pitch circle, the limit', () => {
    const { pinCentre, flank } = lanternPoint(spec, 0);
    expect(pinCentre).toEqual({ x: expect.closeTo(143.239448783, 8), y: 0 });
    expect(flank.y).toBeCloseTo(5.5, 12);
  });

  it('never lets a pin cut its wheel, and touches it, from the line of centres on', () => {
    const outline = lanternWheelOutline({ ...spec, steps: 400 });
    const { wheelRadius } = lanternSizes(spec);
    const clearance = (roll: number) => {
      // A pin whose space lies half a pitch below the tooth on +x.
      const { pinCentre } = lanternPoint(spec, roll);
      const [c, s] = [Math.cos(-Math.PI / 36), Math.sin(-Math.PI / 36)];
      const pin = { x: pinCentre.x * c - pinCentre.y * s, y: pinCentre.x * s + pinCentre.y * c };
      return Math.min(...outline.map(({ x, y }) => Math.hypot(x - pin.x, y - pin.y))) - 5.5;
    };
    for (let roll = 0; roll <= (2 * Math.PI) / 36; roll += 0.01) {
      expect(clearance(roll)).toBeGreaterThan(-1e-4);
      expect(clearance(roll)).toBeLessThan(2e-2);
    }
    const radii = outline.map(({ x, y }) => Math.hypot(x, y));
    expect(Math.min(...radii)).toBeCloseTo(wheelRadius - 5.5, 9);
    expect(Math.max(...radii)).toBeCloseTo(151.46 + 1, 2);
  });

  it('has teeth that end at their point, or where they are told to', () => {
    const tall = lanternWheelOutline({ ...spec, tipRadius: 1000 });
    expect(Math.max(...tall.map(({ x, y }) => Math.hypot(x, y)))).toBeCloseTo(157.924551835, 6);
    const low = lanternWheelOutline({ ...spec, tipRadius: 150, play: 1 });
    expect(Math.max(...low.map(({ x, y }) => Math.hypot(x, y)))).toBeCloseTo(150, 6);
    const turned = low.reduce((sum, { x, y }, index) => {
      const next = low[(index + 1) % low.length] ?? { x, y };
      return sum + Math.atan2(x * next.y - y * next.x, x * next.x + y * next.y);
    }, 0);
    expect(turned).toBeCloseTo(2 * Math.PI, 9);
    expect(() => lanternWheelOutline({ ...spec, pinDiameter: 25 })).toThrow('tooth thickness is 0');
  });
});
