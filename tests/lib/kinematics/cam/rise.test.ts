import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { motionLaws } from '@/lib/kinematics/cam/motion-law';
import { floatSpeed, greatestSlope, riseMotion } from '@/lib/kinematics/cam/rise';
import { between, derivative, expectNear, outcome, runs } from '@/tests/support/numbers';

const law = fc.constantFrom(...motionLaws);
const rpm = Math.PI / 30;

describe('the motion on a rise', () => {
  it('is that of the worked example: cycloidal, 40 mm in 90° at 30 rpm', () => {
    const rise = { law: 'cycloidal', lift: 40, angle: Math.PI / 2 } as const;
    expect(riseMotion(rise, Math.PI / 4, 30 * rpm).velocity).toBeCloseTo(160, 9);
    expect(riseMotion(rise, Math.PI / 8, 30 * rpm).acceleration).toBeCloseTo(1005.31, 2);
    expect(outcome(floatSpeed(rise, 9810), 'floats-above').speed / rpm).toBeCloseTo(93.7, 1);
  });

  it('scales: twice the pace doubles the speed, and so on by powers', () => {
    fc.assert(
      fc.property(
        law,
        between(0, 1),
        between(0.1, 6),
        between(0.1, 50),
        (name, u, angle, speed) => {
          const rise = { law: name, lift: 30, angle };
          const [slow, fast] = [1, 2].map((k) => riseMotion(rise, u * angle, k * speed));
          expectNear(fast?.velocity ?? Number.NaN, 2 * (slow?.velocity ?? 0), 1e-12);
          expectNear(fast?.acceleration ?? Number.NaN, 4 * (slow?.acceleration ?? 0), 1e-12);
          expectNear(fast?.jerk ?? Number.NaN, 8 * (slow?.jerk ?? 0), 1e-12);
        },
      ),
      runs,
    );
  });

  it.each([1e-9, 1, 1e9])('keeps its shape at the size %s', (size) => {
    const small = riseMotion({ law: 'modified-sine', lift: 20, angle: 2 }, 0.7, 3);
    const scaled = riseMotion({ law: 'modified-sine', lift: 20 * size, angle: 2 }, 0.7, 3);
    expectNear(scaled.position, small.position * size, 1e-14);
    expectNear(scaled.jerk, small.jerk * size, 1e-14);
  });

  it('differentiates by time', () => {
    const rise = { law: '4-5-6-7', lift: 25, angle: 1.5 } as const;
    const at = (t: number) => riseMotion(rise, 4 * t, 4).position;
    expectNear(derivative(at, 0.2, 1e-4), riseMotion(rise, 0.8, 4).velocity, 1e-8);
  });

  it('is steepest by the law’s peak factor', () => {
    expect(
      greatestSlope({ law: 'simple-harmonic', lift: 30, angle: (7 * Math.PI) / 18 }),
    ).toBeCloseTo(38.571, 3);
  });

  it('refuses what is no rise', () => {
    expect(() => riseMotion({ law: 'cycloidal', lift: -1, angle: 1 }, 0)).toThrow('lift is -1');
    expect(() => riseMotion({ law: 'cycloidal', lift: 1, angle: 0 }, 0)).toThrow('angle is 0');
    expect(() => riseMotion({ law: 'cycloidal', lift: 1, angle: 1 }, 1.1)).toThrow('turned is 1.1');
    const unknown = { ...{ law: 'cycloidal' as const, lift: 1, angle: 1 } };
    Object.assign(unknown, { law: 'magic' });
    expect(() => riseMotion(unknown, 0)).toThrow('law is magic');
    const huge = { law: 'cycloidal', lift: 1e200, angle: 1e-200 } as const;
    expect(() => riseMotion(huge, 0)).toThrow(RangeError);
  });
});

describe('the speed at which a follower floats', () => {
  it('is where the greatest slowing down equals the pull', () => {
    fc.assert(
      fc.property(
        law,
        between(1, 80),
        between(0.3, 3),
        between(10, 30_000),
        (name, lift, angle, pull) => {
          const rise = { law: name, lift, angle };
          const floats = floatSpeed(rise, pull);
          if (floats.outcome !== 'floats-above') {
            expect(name).toBe('uniform');
            return;
          }
          const places = Array.from({ length: 2001 }, (_, i) =>
            riseMotion(rise, angle * (i / 2000), floats.speed),
          );
          const slowest = places.reduce((least, m) => Math.min(least, m.acceleration), 0);
          expectNear(-slowest, pull, 1e-5);
        },
      ),
      { ...runs, numRuns: 60 },
    );
  });

  it('is none for a follower that does not rise, and any for a blow', () => {
    expect(floatSpeed({ law: 'cycloidal', lift: 0, angle: 1 }, 9810).outcome).toBe('never-floats');
    expect(floatSpeed({ law: 'uniform', lift: 9, angle: 1 }, 9810).outcome).toBe(
      'thrown-at-any-speed',
    );
  });

  it('refuses a pull that is none', () => {
    expect(() => floatSpeed({ law: 'cycloidal', lift: 1, angle: 1 }, 0)).toThrow('pull is 0');
  });
});
