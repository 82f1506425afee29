import { describe, expect, it } from 'vitest';
import { distance, ORIGIN, polar, type Point } from '@/lib/geometry/point';
import { crankSliderLinkage } from '@/lib/kinematics/linkage/crank-slider';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import { slottedLeverLinkage } from '@/lib/kinematics/linkage/inverted-crank-slider';
import { driveLimits, startDrive } from '@/lib/kinematics/linkage/solver/limits';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import { rankOf } from '@/lib/kinematics/linkage/solver/rank';
import { branchOf, solveLinkage } from '@/lib/kinematics/linkage/solver/solver';
import { moved, placed, planned } from './planned';

const nowhere: Point = { x: 9e9, y: 9e9 };
const pick = (points: Readonly<Record<string, Point>>, name: string) => points[name] ?? nowhere;

/** Velocities and accelerations against differences of positions led on in small steps. */
function expectRates(plan: Plan, value: number, speed: number, acceleration: number) {
  const found = moved(plan, [value], [speed], [acceleration]);
  const step = 1e-4;
  const at = (time: number) =>
    placed(plan, [value + speed * time + (acceleration * time * time) / 2], {
      from: plan.model.names.flatMap((name) => [
        pick(found.points, name).x,
        pick(found.points, name).y,
      ]),
    });
  const [before, now, after] = [at(-step), at(0), at(step)];
  for (const name of plan.model.names) {
    const [a, b, c] = [pick(before, name), pick(now, name), pick(after, name)];
    const [v, w] = [pick(found.velocities, name), pick(found.accelerations, name)];
    expect(v.x).toBeCloseTo((c.x - a.x) / (2 * step), 4);
    expect(v.y).toBeCloseTo((c.y - a.y) / (2 * step), 4);
    expect(w.x).toBeCloseTo((c.x - 2 * b.x + a.x) / step ** 2, 2);
    expect(w.y).toBeCloseTo((c.y - 2 * b.y + a.y) / step ** 2, 2);
  }
}

describe('a driver that slides', () => {
  it('pushes a crank round by its slider, on both sides of the axle', () => {
    for (const side of ['right', 'left'] as const) {
      const plan = planned(
        crankSliderLinkage({ crank: 40, rod: 120, offset: 10 }, { side, driver: 'slider' }),
      );
      const out = side === 'right' ? 1 : -1;
      const { A, C } = placed(plan, [out * 130]);
      expect(C).toEqual({ x: out * 130, y: 10 });
      expect(distance(A ?? nowhere, ORIGIN)).toBeCloseTo(40, 12);
      expect(distance(A ?? nowhere, C ?? nowhere)).toBeCloseTo(120, 12);
      expect([...startDrive(plan)]).toEqual([out * 120]);
      expectRates(plan, out * 130, 3, -2);
    }
  });

  it('ends where rod and crank lie in one line', () => {
    const plan = planned(crankSliderLinkage({ crank: 40, rod: 120 }, { driver: 'slider' }));
    const limits = driveLimits(plan, [120]);
    expect(limits.outcome === 'limits' && limits.most).toBeCloseTo(160, 6);
    expect(limits.outcome === 'limits' && limits.least).toBeCloseTo(80, 6);
    const found = solveLinkage(plan, [165]);
    expect(found).toMatchObject({ outcome: 'does-not-close', at: ['A'] });
    expect(found.outcome === 'does-not-close' && found.by).toBeCloseTo(5, 12);
  });

  it('runs a pin along a groove that itself swings: no dyad begins there', () => {
    const lever: Linkage = {
      ...slottedLeverLinkage(40, 100, 200),
      points: {
        O2: ORIGIN,
        A: polar(40, 0.6),
        O4: { x: 0, y: -100 },
        E: polar(200, Math.atan2(100 + 40 * Math.sin(0.6), 40 * Math.cos(0.6)), { x: 0, y: -100 }),
      },
      drivers: [{ kind: 'slide', point: 'A' }],
    };
    const plan = planned(lever);
    expect(plan.steps.map(({ method }) => method.kind)).toContain('solve');
    const from = Math.hypot(40 * Math.cos(0.6), 100 + 40 * Math.sin(0.6));
    expect(startDrive(plan)[0]).toBeCloseTo(from, 12);
    const { A } = placed(plan, [130]);
    // 130² = 100² + 40² + 2·100·40·sin: the cosine rule in the triangle of the two axles and the pin.
    const sine = (130 ** 2 - 100 ** 2 - 40 ** 2) / 8000;
    expect(A?.y).toBeCloseTo(40 * sine, 9);
    expect(A?.x).toBeCloseTo(40 * Math.sqrt(1 - sine * sine), 9);
    expectRates(plan, 125, 7, 2);
  });

  it('reads nought along a groove that has no direction yet', () => {
    const plan = planned({
      points: { O: ORIGIN, G: { x: 5, y: 0 }, H: { x: 5, y: 0 }, S: { x: 9, y: 0 } },
      fixed: ['O', 'G', 'H'],
      slides: [{ point: 'S', along: ['G', 'H'] }],
      drivers: [{ kind: 'slide', point: 'S' }],
    });
    expect([...startDrive(plan)]).toEqual([0]);
    expect(placed(plan, [3]).S).toEqual({ x: 8, y: 0 });
  });
});

describe('drivers that are too many', () => {
  const fiveBar: Linkage = {
    points: {
      A: ORIGIN,
      B: { x: 10, y: 50 },
      C: { x: 60, y: 90 },
      D: { x: 110, y: 60 },
      E: { x: 100, y: 0 },
    },
    fixed: ['A', 'E'],
    bars: [
      { ends: ['A', 'B'], length: Math.hypot(10, 50) },
      { ends: ['B', 'C'], length: Math.hypot(50, 40) },
      { ends: ['C', 'D'], length: Math.hypot(50, 30) },
      { ends: ['D', 'E'], length: Math.hypot(10, 60) },
    ],
    drivers: [{ kind: 'angle', from: 'A', to: 'B' }],
  };
  const onA = { kind: 'angle', from: 'A', to: 'B' } as const;

  it('are told where two turn one bar', () => {
    const fourBar = fourBarLinkage({ crank: 40, coupler: 120, rocker: 80, frame: 100 });
    const twice = { kind: 'angle', from: 'A', to: 'O2' } as const;
    expect(planLinkage({ ...fourBar, drivers: [...fourBar.drivers, twice] })).toEqual({
      outcome: 'too-many-drivers',
      extra: 1,
    });
  });

  it('are misplaced where two turn one bar and another bar has none', () => {
    expect(planLinkage({ ...fiveBar, drivers: [onA, onA] })).toEqual({
      outcome: 'drivers-misplaced',
      undriven: 1,
    });
    expect(planLinkage({ ...fiveBar, drivers: [onA] })).toEqual({
      outcome: 'too-few-drivers',
      missing: 1,
    });
  });

  it('are misplaced on a bar of the board, and on a point that is led twice', () => {
    const boarded = {
      ...fiveBar,
      bars: [...(fiveBar.bars ?? []), { ends: ['A', 'E'] as const, length: 100 }],
    };
    expect(
      planLinkage({ ...boarded, drivers: [onA, { kind: 'angle', from: 'A', to: 'E' }] }),
    ).toEqual({ outcome: 'drivers-misplaced', undriven: 1 });
    const lead = { kind: 'lead', point: 'C' } as const;
    expect(planLinkage({ ...fiveBar, drivers: [lead] }).outcome).toBe('planned');
    expect(planLinkage({ ...fiveBar, drivers: [lead, lead] })).toEqual({
      outcome: 'too-many-drivers',
      extra: 2,
    });
  });

  it('are refused on points of different bars', () => {
    expect(() =>
      planLinkage({ ...fiveBar, drivers: [{ kind: 'angle', from: 'A', to: 'C' }] }),
    ).toThrow('driver turns A to C; expected two points of one bar or plate, apart');
    expect(() => planLinkage({ ...fiveBar, drivers: [{ kind: 'slide', point: 'C' }] })).toThrow(
      'driver slides C; expected a point with a groove',
    );
  });
});

/** A six-bar driven where no dyad begins, with spare bars to hold what it holds already. */
function farSixBar(spare: readonly { ends: readonly [string, string]; by: number }[]): Linkage {
  const points = {
    O2: ORIGIN,
    O4: { x: 100, y: 0 },
    O6: { x: 190, y: 20 },
    A: { x: 20, y: 35 },
    B: { x: 115, y: 80 },
    P: { x: 80, y: 110 },
    C: { x: 165, y: 100 },
  };
  const bar = (a: string, b: string, more = 0) => ({
    ends: [a, b] as const,
    length: distance(pick(points, a), pick(points, b)) + more,
  });
  return {
    points,
    fixed: ['O2', 'O4', 'O6'],
    bars: [
      ...spare.map(({ ends, by }) => bar(ends[0], ends[1], by)),
      bar('O2', 'A'),
      bar('O4', 'B'),
      bar('P', 'C'),
      bar('O6', 'C'),
    ],
    plates: [{ shape: { A: points.A, B: points.B, P: points.P } }],
    drivers: [{ kind: 'angle', from: 'O6', to: 'C' }],
  };
}

describe('what no dyad reaches', () => {
  const drive = [Math.atan2(80, -25) + 0.03];

  it('is found with spare bars as without, and says when a spare bar does not fit', () => {
    const plain = placed(planned(farSixBar([])), drive);
    const spare = placed(planned(farSixBar([{ ends: ['A', 'B'], by: 0 }])), drive);
    for (const name of ['A', 'B', 'P', 'C']) {
      expect(distance(pick(plain, name), pick(spare, name))).toBeLessThan(1e-9);
    }
    expect(distance(pick(plain, 'A'), pick(plain, 'B'))).toBeCloseTo(Math.hypot(95, 45), 9);
    const wrong = solveLinkage(planned(farSixBar([{ ends: ['A', 'P'], by: 2 }])), drive);
    expect(wrong.outcome).toBe('does-not-close');
  });

  it('does not close from a pose that says nothing', () => {
    const plan = planned(farSixBar([]));
    const lost = solveLinkage(plan, drive, { from: new Float64Array(14) });
    expect(lost).toMatchObject({ outcome: 'does-not-close', at: ['A', 'B', 'P'] });
  });

  it('moves as differences of positions say', () => {
    expectRates(planned(farSixBar([])), drive[0] ?? 0, 0.7, -0.4);
  });
});

describe('a body whose direction is driven, held at two points', () => {
  // A bar turned by hand: P in a level groove, Q on a circle about O.
  const held = (first: 'groove' | 'circle'): Linkage => ({
    points: {
      O: ORIGIN,
      G: { x: 0, y: 50 },
      H: { x: 9, y: 50 },
      P: { x: 5, y: 50 },
      Q: { x: 39, y: 5 },
    },
    fixed: ['O', 'G', 'H'],
    bars: [
      { ends: first === 'groove' ? ['P', 'Q'] : ['Q', 'P'], length: 60 },
      { ends: ['O', 'Q'], length: 40 },
    ],
    slides: [{ point: 'P', along: ['G', 'H'] }],
    drivers: [{ kind: 'angle', from: 'P', to: 'Q' }],
  });

  it.each(['groove', 'circle'] as const)('is shifted until both are right: %s first', (first) => {
    const plan = planned(held(first));
    expect(plan.steps.map(({ method }) => method.kind)).toEqual(['shift']);
    // Q lies 60·sin 60° under the groove, and on the circle to the right, or on the other branch left.
    const y = 50 - 60 * Math.sin(Math.PI / 3);
    const x = Math.sqrt(1600 - y * y);
    const right = placed(plan, [-Math.PI / 3]);
    expect(right.Q?.x).toBeCloseTo(x, 10);
    expect(right.Q?.y).toBeCloseTo(y, 10);
    expect(right.P?.x).toBeCloseTo(x - 30, 10);
    expect(right.P?.y).toBeCloseTo(50, 10);
    const other = placed(plan, [-Math.PI / 3], { branch: branchOf(plan).map((side) => -side) });
    expect(other.Q?.x).toBeCloseTo(-x, 10);
    const told = branchOf(
      plan,
      plan.model.names.flatMap((name) => [pick(other, name).x, pick(other, name).y]),
    );
    expect([...told]).toEqual([...branchOf(plan).map((side) => -side)]);
    expectRates(plan, -Math.PI / 3, 0.5, 0.3);
  });
});

describe('a driver told from either end', () => {
  const plate = (places: Readonly<Record<'A' | 'B' | 'C', Point>>): Linkage => ({
    points: places,
    fixed: ['A'],
    plates: [{ shape: places }],
    drivers: [{ kind: 'angle', from: 'B', to: 'C' }],
  });

  it('is refused where both ends lie in one place: they have no direction', () => {
    const place = { x: 30, y: 0 };
    expect(() => planLinkage(plate({ A: ORIGIN, B: place, C: place }))).toThrow(
      'driver turns B to C; expected two points of one bar or plate, apart',
    );
  });

  it('turns a plate about a pivot on which an end of the driven way lies', () => {
    const plan = planned(plate({ A: ORIGIN, B: ORIGIN, C: { x: 30, y: 0 } }));
    const { B, C } = placed(plan, [1]);
    expect(distance(B ?? nowhere, ORIGIN)).toBe(0);
    expect(distance(C ?? nowhere, polar(30, 1))).toBeLessThan(1e-12);
  });

  it('turns a crank by the way back to its pivot', () => {
    const bars = fourBarLinkage({ crank: 40, coupler: 120, rocker: 80, frame: 100 });
    const back = planned({ ...bars, drivers: [{ kind: 'angle', from: 'A', to: 'O2' }] });
    const there = placed(planned(bars), [0.7]);
    const found = placed(back, [0.7 + Math.PI]);
    expect(distance(pick(found, 'B'), pick(there, 'B'))).toBeLessThan(1e-12);
  });

  it('leads a bar that no dyad reaches', () => {
    const plan = planned({ ...farSixBar([]), drivers: [{ kind: 'angle', from: 'P', to: 'C' }] });
    expect(plan.steps.map(({ method }) => method.kind)).toEqual(['solve']);
    const wanted = Math.atan2(-10, 85) + 0.02;
    const { P, C } = placed(plan, [wanted]);
    expect(Math.atan2((C?.y ?? 0) - (P?.y ?? 0), (C?.x ?? 0) - (P?.x ?? 0))).toBeCloseTo(wanted, 9);
  });

  it('swings a slotted lever whose bar begins at its free end', () => {
    const lever = slottedLeverLinkage(40, 100, 200);
    const turned: Linkage = {
      ...lever,
      bars: [
        { ends: ['O2', 'A'], length: 40 },
        { ends: ['E', 'O4'], length: 200 },
      ],
    };
    const [one, other] = [placed(planned(lever), [0.4]), placed(planned(turned), [0.4])];
    expect(distance(pick(one, 'E'), pick(other, 'E'))).toBeLessThan(1e-10);
  });
});

describe('places where little is said', () => {
  it('limits are refused for a drive that is none, and a place it does not have', () => {
    const plan = planned(crankSliderLinkage({ crank: 40, rod: 30 }));
    expect(() => driveLimits(plan, [Number.NaN])).toThrow('driveLimits: drive is NaN');
    expect(() => driveLimits(plan, [0, 1])).toThrow('drive has 2 numbers; expected 1');
    expect(() => driveLimits(plan, [0], { moved: 1 })).toThrow('driveLimits: moved is 1');
  });

  it('the slack is what is left of the tightest dyad', () => {
    const plan = planned(crankSliderLinkage({ crank: 40, rod: 120, offset: 10 }));
    const near = solveLinkage(plan, [0]);
    expect(near.outcome === 'closes' && near.slack).toBeCloseTo(120 - 10, 12);
    const short = planned(crankSliderLinkage({ crank: 40, rod: 30 }));
    const off = solveLinkage(short, [Math.PI / 2]);
    expect(off.outcome === 'does-not-close' && off.by).toBeCloseTo(10, 12);
    const bars = planned(fourBarLinkage({ crank: 40, coupler: 120, rocker: 80, frame: 100 }));
    const now = solveLinkage(bars, [0]);
    expect(now.outcome === 'closes' && now.slack).toBeCloseTo(60 - 40, 12);
  });

  it('a led point counts along x and y, also where a spare bar makes the rank be asked', () => {
    const points = { A: ORIGIN, B: { x: 30, y: 40 }, C: { x: 90, y: 40 } };
    const bar = { ends: ['A', 'B'] as const, length: 50 };
    const led: Linkage = {
      points,
      fixed: ['A'],
      bars: [bar, bar, { ends: ['B', 'C'], length: 60 }],
      drivers: [{ kind: 'lead', point: 'C' }],
    };
    expect(placed(planned(led), [90, 40]).B?.x).toBeCloseTo(30, 10);
    expect(planLinkage({ ...led, drivers: [{ kind: 'lead', point: 'A' }] })).toEqual({
      outcome: 'drivers-misplaced',
      undriven: 2,
    });
  });

  it('parallel grooves fail by their distance, crossing ones meet', () => {
    const crossing = (at: Point, way: Point): Linkage => ({
      points: {
        G: ORIGIN,
        H: { x: 10, y: 0 },
        I: at,
        J: { x: at.x + way.x, y: at.y + way.y },
        S: { x: 3, y: 1 },
        O: { x: 0, y: 40 },
        A: { x: 0, y: 50 },
      },
      fixed: ['G', 'H', 'I', 'J', 'O'],
      bars: [{ ends: ['O', 'A'], length: 10 }],
      slides: [
        { point: 'S', along: ['G', 'H'] },
        { point: 'S', along: ['I', 'J'] },
      ],
      drivers: [{ kind: 'angle', from: 'O', to: 'A' }],
    });
    expect(placed(planned(crossing({ x: 5, y: 5 }, { x: 3, y: 6 })), [0]).S).toEqual({
      x: 2.5,
      y: 0,
    });
  });

  it('a gap narrower than a step still ends the drive', () => {
    // |b − c| is a hair more than d − a: within half a thousandth of a radian of nought it is too long.
    const bars = { crank: 40, coupler: 120, rocker: 60 - 1e-5, frame: 100 };
    const plan = planned(fourBarLinkage(bars));
    const cosine = (100 ** 2 + 40 ** 2 - (60 + 1e-5) ** 2) / 8000;
    const limits = driveLimits(plan, [0.5 * (Math.PI / 180)]);
    // To what the touch of two circles is allowed, 1e-12 of the size over the slope of the gap there.
    expect(limits.outcome === 'limits' && limits.least).toBeCloseTo(Math.acos(cosine), 7);
    expect(limits.outcome === 'limits' && limits.most).toBeCloseTo(
      2 * Math.PI - Math.acos(cosine),
      7,
    );
  });

  it('a groove’s pin that stands on the pivot leaves the groove its last direction', () => {
    const plan = planned({
      ...slottedLeverLinkage(100, 100, 220),
      points: {
        O2: ORIGIN,
        A: { x: 0, y: 100 },
        O4: { x: 100, y: 0 },
        E: polar(220, (3 * Math.PI) / 4, { x: 100, y: 0 }),
      },
    });
    const { A, O4, E } = placed(plan, [0]);
    expect(A).toEqual(O4);
    expect(distance(E ?? nowhere, O4 ?? ORIGIN)).toBeCloseTo(220, 12);
  });

  it('no rows have no rank', () => {
    expect(rankOf([])).toBe(0);
    expect(rankOf([[0, 0]])).toBe(0);
  });
});
