import { describe, expect, it } from 'vitest';
import { radians } from '@/lib/geometry/angle';
import { distance } from '@/lib/geometry/point';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import { pantographLinkage } from '@/lib/kinematics/linkage/pantograph-linkage';
import { driveLimits } from '@/lib/kinematics/linkage/solver/limits';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import {
  branchOf,
  moveLinkage,
  placeLinkage,
  solveLinkage,
  startPose,
} from '@/lib/kinematics/linkage/solver/solver';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';
import { trammelPose } from '@/lib/kinematics/linkage/trammel';
import { moved, placed, planned } from './planned';

const crankRocker = { crank: 40, coupler: 120, rocker: 80, frame: 100 };

describe('the general linkage solver', () => {
  it('places a four-bar as Norton does (Design of Machinery, example 4-1)', () => {
    const { A, B, O4 } = placed(planned(fourBarLinkage(crankRocker)), [radians(40)]);
    if (!A || !B || !O4) throw new Error('a point is missing');
    expect(Math.atan2(B.y - A.y, B.x - A.x)).toBeCloseTo(radians(20.2978827882), 9);
    expect(Math.atan2(B.y, B.x - 100)).toBeCloseTo(radians(57.3248800704), 9);
    const crossed = placed(planned(fourBarLinkage(crankRocker, { side: 'crossed' })), [
      radians(40),
    ]);
    expect(Math.atan2(crossed.B?.y ?? 0, (crossed.B?.x ?? 0) - 100)).toBeCloseTo(
      radians(-98.004964078),
      9,
    );
  });

  it('finds the rocker’s acceleration as Norton does (examples 6-7 and 7-1)', () => {
    const { points, velocities, accelerations } = moved(
      planned(fourBarLinkage(crankRocker)),
      [radians(40)],
      [25],
      [15],
    );
    const { B } = points;
    const [v, a] = [velocities.B, accelerations.B];
    if (!B || !v || !a) throw new Error('a point is missing');
    const arm = { x: B.x - 100, y: B.y };
    expect((v.y * arm.x - v.x * arm.y) / 6400).toBeCloseTo(6.99798524218, 8);
    expect((a.y * arm.x - a.x * arm.y) / 6400).toBeCloseTo(470.133530261, 6);
  });

  it('says by how much, and where, a linkage does not close', () => {
    const plan = planned(fourBarLinkage({ crank: 50, coupler: 40, rocker: 45, frame: 110 }));
    const found = solveLinkage(plan, [radians(75)]);
    expect(found).toMatchObject({ outcome: 'does-not-close', at: ['B'] });
    expect(found.outcome === 'does-not-close' && found.by).toBeCloseTo(23.4112102316, 8);
  });

  it('finds the limits of a drive to rounding, and that a crank has none', () => {
    expect(driveLimits(planned(fourBarLinkage(crankRocker)))).toEqual({ outcome: 'free' });
    const rocker = driveLimits(
      planned(fourBarLinkage({ crank: 50, coupler: 40, rocker: 45, frame: 110 })),
      [0],
    );
    expect(rocker.outcome === 'limits' && rocker.most).toBeCloseTo(radians(47.8978434641), 9);
    expect(rocker.outcome === 'limits' && rocker.least).toBeCloseTo(-radians(47.8978434641), 9);
  });

  it('runs a trammel as its closed form does, in square grooves and in skew ones', () => {
    const skew = { uprightPin: 150, levelPin: -90, beside: 20, grooveAngle: radians(70) };
    for (const trammel of [
      { uprightPin: 150, levelPin: 90 },
      { uprightPin: 60, levelPin: 200 },
      skew,
    ]) {
      const plan = planned(trammelLinkage(trammel));
      for (let degree = 0; degree < 360; degree += 15) {
        const exact = trammelPose(trammel, radians(degree));
        const found = placed(plan, [radians(degree)]);
        expect(distance(found.pen ?? { x: 9e9, y: 0 }, exact.pen)).toBeLessThan(1e-10);
      }
    }
  });

  it('leads a pantograph’s stylus, and the pen goes three times as far', () => {
    const plan = planned(
      pantographLinkage(
        { first: 300, second: 300, firstHole: 100, secondHole: 100 },
        'middle-to-end',
      ),
    );
    const { velocities, points } = moved(plan, [80, 60], [1, 2], [0, 0]);
    expect(points.P?.x).toBeCloseTo(240, 9);
    expect(points.P?.y).toBeCloseTo(180, 9);
    expect(velocities.P?.x).toBeCloseTo(3, 9);
    expect(velocities.P?.y).toBeCloseTo(6, 9);
    const reach = driveLimits(plan, [80, 0]);
    expect(reach.outcome === 'limits' && reach.most).toBeCloseTo(200, 8);
  });

  it('counts drivers that are missing, too many, or in the wrong place', () => {
    const bars = fourBarLinkage(crankRocker);
    const closed = { ...bars, points: placed(planned(bars), [1]) };
    expect(planLinkage({ ...closed, drivers: [] })).toEqual({
      outcome: 'too-few-drivers',
      missing: 1,
    });
    expect(
      planLinkage({
        ...closed,
        drivers: [...closed.drivers, { kind: 'angle', from: 'O4', to: 'B' }],
      }),
    ).toEqual({ outcome: 'too-many-drivers', extra: 1 });
    const braced: Linkage = {
      points: {
        O2: { x: 0, y: 0 },
        A: { x: 10, y: 50 },
        B: { x: 60, y: 100 },
        C: { x: 110, y: 60 },
        O4: { x: 100, y: 0 },
      },
      fixed: ['O2', 'O4'],
      bars: [
        { ends: ['O2', 'A'], length: Math.hypot(10, 50) },
        { ends: ['A', 'B'], length: Math.hypot(50, 50) },
        { ends: ['B', 'C'], length: Math.hypot(50, 40) },
        { ends: ['C', 'O4'], length: Math.hypot(10, 60) },
        { ends: ['A', 'O4'], length: Math.hypot(90, 50) },
      ],
      drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
    };
    expect(planLinkage(braced)).toEqual({ outcome: 'drivers-misplaced', undriven: 1 });
  });

  it('tells a dead centre from a pose that moves', () => {
    const [a, b, c, d] = [40, 120, 80, 100];
    const plan = planned({
      ...fourBarLinkage(crankRocker),
      drivers: [{ kind: 'angle', from: 'O4', to: 'B' }],
    });
    const dead = Math.PI - Math.acos((c * c + d * d - (a + b) ** 2) / (2 * c * d));
    expect(moveLinkage(plan, [dead], [1], [0]).outcome).toBe('dead-centre');
    expect(moveLinkage(plan, [dead + 0.1], [1], [0]).outcome).toBe('moves');
  });

  it('refuses a drive of the wrong length, or not a number', () => {
    const plan = planned(fourBarLinkage(crankRocker));
    expect(() => solveLinkage(plan, [])).toThrow('solveLinkage: drive has 0 numbers; expected 1');
    expect(() => solveLinkage(plan, [Number.NaN])).toThrow(RangeError);
  });

  it('places a pose into an array, and tells the branch of a pose', () => {
    const plan = planned(fourBarLinkage(crankRocker));
    const pose = startPose(plan);
    const open = branchOf(plan);
    const crossed = open.map((side, k) => (plan.steps[k]?.method.kind === 'meet' ? -side : side));
    expect(placeLinkage(plan, [0.7], crossed, pose)).toBe(0);
    expect([...branchOf(plan, pose)]).toEqual([...crossed]);
  });
});
