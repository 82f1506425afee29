import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type DoubleHooke,
  doubleHooke,
  doubleHookeExtremes,
} from '@/lib/kinematics/coupling/double-hooke';
import {
  hookeBendFor,
  hookeDriverAngle,
  hookeExtremes,
  hookeGreatestAcceleration,
  hookeJoint,
} from '@/lib/kinematics/coupling/hooke';
import { between, derivative, expectNear, runs } from '@/tests/support/numbers';

const degree = Math.PI / 180;
const bend = between(0, 1.3);
const start = fc.constantFrom('in-plane' as const, 'square' as const);

describe('a universal joint', () => {
  it('keeps the two pins of its cross square to one another', () => {
    fc.assert(
      fc.property(bend, between(-20, 20), (beta, theta) => {
        const { angle } = hookeJoint(beta, theta);
        // the shafts in the x-z plane; the driving pin starts in it, the driven one square to it
        const driving = [Math.cos(theta), Math.sin(theta), 0] as const;
        const across = [-Math.sin(angle), Math.cos(angle)] as const;
        const driven = [across[0] * Math.cos(beta), across[1], across[0] * Math.sin(beta)] as const;
        const square = driving[0] * driven[0] + driving[1] * driven[1] + driving[2] * driven[2];
        expect(Math.abs(square)).toBeLessThan(1e-12);
      }),
      runs,
    );
  });

  it('has the derivatives that it says, with either start', () => {
    fc.assert(
      fc.property(bend, between(-7, 7), start, (beta, theta, from) => {
        const at = (x: number) => hookeJoint(beta, x, from);
        expectNear(
          derivative((x) => at(x).angle, theta, 1e-4),
          at(theta).speedRatio,
          1e-7,
          5,
        );
        expectNear(
          derivative((x) => at(x).speedRatio, theta, 1e-4),
          at(theta).acceleration,
          1e-6,
          50,
        );
      }),
      runs,
    );
  });

  it('turns as often as its driver, and agrees with it at every quarter turn', () => {
    for (let quarter = -8; quarter <= 8; quarter += 1) {
      expectNear(hookeJoint(0.9, (quarter * Math.PI) / 2).angle, (quarter * Math.PI) / 2, 1e-14, 1);
    }
  });

  it('obeys tan φ = tan θ/cos β in plane, tan φ = tan θ·cos β square to it', () => {
    expect(Math.tan(hookeJoint(0.6, 0.7).angle)).toBeCloseTo(Math.tan(0.7) / Math.cos(0.6), 12);
    expect(Math.tan(hookeJoint(0.6, 0.7, 'square').angle)).toBeCloseTo(
      Math.tan(0.7) * Math.cos(0.6),
      12,
    );
  });

  it('is undone by its inverse', () => {
    fc.assert(
      fc.property(bend, between(-9, 9), start, (beta, theta, from) => {
        expectNear(
          hookeDriverAngle(beta, hookeJoint(beta, theta, from).angle, from),
          theta,
          1e-12,
          10,
        );
      }),
      runs,
    );
  });

  it('swings between its extremes: N 25, β 40° gives 32.64 and 19.15 rpm, 53.9 %', () => {
    const { fastest, slowest, fluctuation } = hookeExtremes(40 * degree);
    expect(25 * fastest).toBeCloseTo(32.64, 2);
    expect(25 * slowest).toBeCloseTo(19.15, 2);
    expect(fluctuation).toBeCloseTo(0.539, 3);
    expectNear(hookeJoint(0.7, 0).speedRatio, hookeExtremes(0.7).fastest, 1e-14);
    expectNear(hookeJoint(0.7, 0, 'square').speedRatio, hookeExtremes(0.7).slowest, 1e-14);
  });

  it('finds the bend for a fluctuation, down to the smallest', () => {
    fc.assert(
      fc.property(between(-12, 0.18), (power) => {
        const beta = 10 ** power;
        expectNear(hookeBendFor(hookeExtremes(beta).fluctuation), beta, 1e-12);
      }),
      runs,
    );
    expect(hookeBendFor(0)).toBe(0);
    expect(hookeBendFor(1e300)).toBeCloseTo(Math.PI / 2, 12);
  });

  it('has its greatest acceleration where it says', () => {
    fc.assert(
      fc.property(between(0.01, 1.3), (beta) => {
        const most = hookeGreatestAcceleration(beta);
        for (let i = 0; i <= 300; i += 1) {
          const { acceleration } = hookeJoint(beta, (i * Math.PI) / 300);
          expect(Math.abs(acceleration)).toBeLessThanOrEqual(most.acceleration * (1 + 1e-12));
        }
      }),
      { ...runs, numRuns: 60 },
    );
    expect(hookeGreatestAcceleration(0).acceleration).toBe(0);
  });

  it('refuses a bend at which it cannot turn', () => {
    expect(() => hookeJoint(Math.PI / 2, 0)).toThrow('hookeJoint: bend is');
    expect(() => hookeExtremes(-0.1)).toThrow('bend is -0.1');
    expect(() => hookeJoint(0.1, Infinity)).toThrow('angle is Infinity');
    expect(() => hookeBendFor(-1)).toThrow('fluctuation is -1');
  });
});

describe('two universal joints', () => {
  const half = 25 * degree;
  const uneven = (joints: DoubleHooke) => doubleHookeExtremes(joints).fluctuation;

  it('run even with equal bends and the middle forks in one plane', () => {
    fc.assert(
      fc.property(bend, between(-9, 9), (beta, theta) => {
        const state = doubleHooke({ firstBend: beta, secondBend: beta, phase: 0 }, theta);
        expectNear(state.angle, theta, 1e-12, 10);
        expectNear(state.speedRatio, 1, 1e-11);
        expectNear(state.acceleration, 0, 1e-9, 1);
      }),
      runs,
    );
  });

  it('are as uneven as the lesson’s check at 50° in all: crossed 40 %, half crossed 28 %, 30° and 15° 22 %', () => {
    expect(uneven({ firstBend: half, secondBend: half, phase: Math.PI / 2 })).toBeCloseTo(0.4, 2);
    expect(uneven({ firstBend: half, secondBend: half, phase: Math.PI / 4 })).toBeCloseTo(0.28, 2);
    expect(uneven({ firstBend: 30 * degree, secondBend: 15 * degree, phase: 0 })).toBeCloseTo(
      0.22,
      2,
    );
    expect(uneven({ firstBend: 50 * degree, secondBend: 0, phase: 0 })).toBeCloseTo(0.91, 2);
  });

  it('with crossed forks swing between cos² β and its inverse', () => {
    const { fastest, slowest } = doubleHookeExtremes({
      firstBend: 0.5,
      secondBend: 0.5,
      phase: Math.PI / 2,
    });
    expectNear(fastest, 1 / Math.cos(0.5) ** 2, 1e-12);
    expectNear(slowest, Math.cos(0.5) ** 2, 1e-12);
  });

  it('have the derivatives that they say, at any phase', () => {
    fc.assert(
      fc.property(
        between(0, 1),
        between(0, 1),
        between(0, 1.6),
        between(-5, 5),
        (firstBend, secondBend, phase, theta) => {
          const joints = { firstBend, secondBend, phase };
          const at = (x: number) => doubleHooke(joints, x);
          expectNear(
            derivative((x) => at(x).angle, theta, 1e-4),
            at(theta).speedRatio,
            1e-7,
            5,
          );
          expectNear(
            derivative((x) => at(x).speedRatio, theta, 1e-4),
            at(theta).acceleration,
            1e-6,
            50,
          );
          expect(at(0).angle).toBeCloseTo(0, 14);
        },
      ),
      runs,
    );
  });

  it('refuse nonsense', () => {
    expect(() => doubleHooke({ firstBend: 2, secondBend: 0, phase: 0 }, 0)).toThrow('bend is 2');
    expect(() => doubleHookeExtremes({ firstBend: 0, secondBend: 0, phase: Number.NaN })).toThrow(
      'phase is NaN',
    );
  });
});
