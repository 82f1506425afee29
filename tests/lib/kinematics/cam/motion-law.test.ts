import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type MotionLaw, motionLaw, motionLaws } from '@/lib/kinematics/cam/motion-law';
import { peakFactors } from '@/lib/kinematics/cam/peak-factors';
import { between, derivative, expectNear, runs } from '@/tests/support/numbers';

const smooth: readonly MotionLaw[] = motionLaws.filter(
  (law) => law !== 'uniform' && law !== 'parabolic',
);
/** Places where a piece of a law ends: no difference may straddle them. */
const seams = [0, 1 / 8, 3 / 8, 1 / 2, 5 / 8, 7 / 8, 1];
const step = 1e-4;
const inside = between(3 * step, 1 - 3 * step).filter((u) =>
  seams.every((seam) => Math.abs(u - seam) > 3 * step),
);

describe('the laws of motion', () => {
  it.each(motionLaws)('%s starts at 0, ends at 1 and does not turn back', (law) => {
    expect(motionLaw(law, 0).position).toBe(0);
    expect(motionLaw(law, 1).position).toBeCloseTo(1, 14);
    fc.assert(
      fc.property(between(0, 1), (u) => {
        const { position, velocity } = motionLaw(law, u);
        expect(position).toBeGreaterThanOrEqual(-1e-15);
        expect(position).toBeLessThanOrEqual(1 + 1e-15);
        expect(velocity).toBeGreaterThanOrEqual(-1e-15);
      }),
      runs,
    );
  });

  it.each(motionLaws)('%s has the derivatives that it says', (law) => {
    fc.assert(
      fc.property(inside, (u) => {
        const at = motionLaw(law, u);
        const by = (key: 'position' | 'velocity' | 'acceleration') =>
          derivative((x) => motionLaw(law, x)[key], u, step);
        expectNear(by('position'), at.velocity, 1e-8, 1);
        expectNear(by('velocity'), at.acceleration, 1e-7, 10);
        expectNear(by('acceleration'), at.jerk, 1e-7, 100);
      }),
      runs,
    );
  });

  it.each(motionLaws.filter((law) => law !== 'double-harmonic'))(
    '%s looks the same turned half round',
    (law) => {
      fc.assert(
        fc.property(between(0, 0.4999), (u) => {
          const [here, there] = [motionLaw(law, u), motionLaw(law, 1 - u)];
          expectNear(there.position, 1 - here.position, 1e-12, 1);
          expectNear(there.velocity, here.velocity, 1e-11, 1);
          expectNear(there.acceleration, -here.acceleration, 1e-10, 10);
          expectNear(there.jerk, here.jerk, 1e-9, 100);
        }),
        runs,
      );
    },
  );

  it.each(smooth)('%s joins its pieces without a step of speed or acceleration', (law) => {
    for (const seam of seams.slice(1, -1)) {
      const [before, after] = [motionLaw(law, seam - 1e-9), motionLaw(law, seam + 1e-9)];
      expect(after.velocity).toBeCloseTo(before.velocity, 6);
      expect(after.acceleration).toBeCloseTo(before.acceleration, 5);
    }
  });

  it('takes the parabolic law’s acceleration at mid-rise from before it turns about', () => {
    expect(motionLaw('parabolic', 0.5)).toEqual({
      position: 0.5,
      velocity: 2,
      acceleration: 4,
      jerk: 0,
    });
    expect(motionLaw('parabolic', 0.5000001).acceleration).toBe(-4);
  });

  it.each([-1e-12, 1.0000001, Number.NaN, Infinity])('refuses %s as a place', (u) => {
    expect(() => motionLaw('cycloidal', u)).toThrow(/motionLaw: u is/);
  });
});

describe('the peak factors', () => {
  it.each(motionLaws)('of %s are the greatest values that the law takes', (law) => {
    const factors = peakFactors(law);
    const places = Array.from({ length: 40_001 }, (_, i) => motionLaw(law, i / 40_000));
    const most = (values: number[]) => values.reduce((a, b) => Math.max(a, b));
    expectNear(most(places.map((m) => m.velocity)), factors.velocity, 1e-7);
    const sides = {
      accelerationMax: most(places.map((m) => m.acceleration)),
      accelerationMin: -most(places.map((m) => -m.acceleration)),
    };
    for (const key of ['accelerationMax', 'accelerationMin'] as const) {
      const factor = factors[key];
      if (factor !== 'infinite') expectNear(sides[key], factor, 1e-6);
    }
    if (factors.jerk !== 'infinite') {
      expectNear(most(places.map((m) => Math.abs(m.jerk))), factors.jerk, 1e-6);
    }
  });

  it.each(motionLaws)('of %s are infinite just where the derivative below steps', (law) => {
    const start = motionLaw(law, 0);
    const end = motionLaw(law, 1);
    const speedSteps = start.velocity > 1e-12 || end.velocity > 1e-12;
    const pushSteps =
      speedSteps || Math.abs(start.acceleration) > 1e-9 || Math.abs(end.acceleration) > 1e-9;
    expect(peakFactors(law).acceleration === 'infinite').toBe(speedSteps);
    expect(peakFactors(law).jerk === 'infinite').toBe(pushSteps);
  });

  it('agree with the figures printed for the modified laws and 4-5-6-7 (Norton, from memory)', () => {
    expect(peakFactors('modified-trapezoid').acceleration).toBeCloseTo(4.888, 3);
    expect(peakFactors('modified-sine').velocity).toBeCloseTo(1.76, 3);
    expect(peakFactors('modified-sine').acceleration).toBeCloseTo(5.528, 3);
    expect(peakFactors('4-5-6-7').velocity).toBe(2.1875);
    expect(peakFactors('4-5-6-7').jerk).toBe(52.5);
  });
});
