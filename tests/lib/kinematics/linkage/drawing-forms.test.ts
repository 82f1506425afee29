import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { radians } from '@/lib/geometry/angle';
import { distance, norm, ORIGIN } from '@/lib/geometry/point';
import { twistAtFlat } from '@/lib/kinematics/linkage/change-point-play';
import { freedomOf } from '@/lib/kinematics/linkage/freedom';
import { hartLinkage, hartPower } from '@/lib/kinematics/linkage/hart';
import { pantographCopy, copyStretch } from '@/lib/kinematics/linkage/pantograph';
import { pantographHoles, truePantograph } from '@/lib/kinematics/linkage/pantograph-making';
import { leadPantograph, pantographReach } from '@/lib/kinematics/linkage/pantograph-reach';
import {
  peaucellierLinkage,
  peaucellierPath,
  peaucellierPoint,
} from '@/lib/kinematics/linkage/peaucellier';
import { scottRussellLinkage, scottRussellPoint } from '@/lib/kinematics/linkage/scott-russell';
import {
  chebyshevLevel,
  pointOf,
  roberts,
  straightLinkage,
} from '@/lib/kinematics/linkage/straight-four-bars';
import {
  barAngleForPen,
  trammelForOval,
  trammelOval,
  trammelPenVelocity,
  trammelPose,
} from '@/lib/kinematics/linkage/trammel';
import { grooveFits } from '@/lib/kinematics/linkage/trammel-making';
import { togglePress, toggleAtRest } from '@/lib/kinematics/linkage/toggle';
import { wattPoint } from '@/lib/kinematics/linkage/watt';
import { placed, planned } from './planned';

const number = fc.double({ min: -300, max: 300, noNaN: true });
const turn = fc.double({ min: -3, max: 3, noNaN: true });
const trammels = fc.record({
  uprightPin: number,
  levelPin: number,
  beside: number,
  grooveAngle: fc.double({ min: 0.5, max: 2.6, noNaN: true }),
});

describe('the trammel', () => {
  it('keeps pins in their grooves, the bar its lengths, the pen on its oval', () => {
    fc.assert(
      fc.property(trammels, turn, (trammel, angle) => {
        const { pen, levelPin, uprightPin } = trammelPose(trammel, angle);
        const { beside, grooveAngle } = trammel;
        expect(levelPin.y).toBe(0);
        expect(
          uprightPin.x * Math.sin(grooveAngle) - uprightPin.y * Math.cos(grooveAngle),
        ).toBeCloseTo(0, 9);
        expect(distance(pen, levelPin)).toBeCloseTo(Math.hypot(trammel.levelPin, beside), 9);
        expect(distance(pen, uprightPin)).toBeCloseTo(Math.hypot(trammel.uprightPin, beside), 9);
        const oval = trammelOval(trammel);
        expect(norm(pen)).toBeLessThanOrEqual(oval.semiMajor + 1e-9);
        expect(norm(pen)).toBeGreaterThanOrEqual(oval.semiMinor - 1e-9);
      }),
      { seed: 31, numRuns: 20_000 },
    );
  });

  it('finds the bar’s angle again from its pen', () => {
    fc.assert(
      fc.property(trammels, turn, (trammel, angle) => {
        const oval = trammelOval(trammel);
        fc.pre(oval.semiMinor > 1e-3 * oval.semiMajor && oval.semiMajor > 1e-3);
        const found = barAngleForPen(trammel, trammelPose(trammel, angle).pen);
        expect(Math.cos(found - angle)).toBeCloseTo(1, 9);
      }),
      { seed: 32, numRuns: 5000 },
    );
    const shut = { uprightPin: 100, levelPin: 0 };
    expect(trammelPose(shut, barAngleForPen(shut, { x: 60, y: 5 })).pen.x).toBeCloseTo(60, 10);
    expect(barAngleForPen({ uprightPin: 0, levelPin: 0 }, { x: 1, y: 1 })).toBe(0);
  });

  it('comes back from a size, in every way that it can lie', () => {
    for (const lies of ['level', 'upright'] as const) {
      for (const pen of ['beyond', 'between'] as const) {
        const oval = trammelOval(trammelForOval(600, 360, { lies, pen }));
        expect(oval.semiMajor).toBeCloseTo(300, 12);
        expect(oval.semiMinor).toBeCloseTo(180, 12);
        expect(oval.majorAxis).toBeCloseTo(lies === 'level' ? 0 : Math.PI / 2, 12);
        expect(oval.round).toBe(pen === 'beyond' ? 'with-the-bar' : 'against-the-bar');
      }
    }
    expect(() => trammelForOval(300, 400)).toThrow(RangeError);
  });

  it('shuts to a line, opens to a circle, and lies 0.37° askew with a groove 1° out', () => {
    expect(trammelOval({ uprightPin: 80, levelPin: 0 })).toMatchObject({
      semiMinor: 0,
      round: 'line',
    });
    expect(trammelOval({ uprightPin: 80, levelPin: 80 })).toMatchObject({
      semiMajor: 80,
      semiMinor: 80,
    });
    const askew = trammelOval({ uprightPin: 300, levelPin: 180, grooveAngle: radians(91) });
    const off = Math.min(askew.majorAxis, Math.PI - askew.majorAxis);
    expect(off).toBeCloseTo(radians(0.37), 3);
    expect(askew.semiMajor).toBeCloseTo(300, 1);
    expect(() => trammelOval({ uprightPin: 1, levelPin: 2, grooveAngle: 0 })).toThrow(
      'grooves that cross',
    );
  });

  it('moves its pen at the speed that differences show', () => {
    const trammel = { uprightPin: 150, levelPin: -40, beside: 25 };
    const [a, b] = [trammelPose(trammel, 1 - 1e-6).pen, trammelPose(trammel, 1 + 1e-6).pen];
    const v = trammelPenVelocity(trammel, 1, 3);
    expect(((b.x - a.x) / 2e-6) * 3).toBeCloseTo(v.x, 5);
    expect(((b.y - a.y) / 2e-6) * 3).toBeCloseTo(v.y, 5);
    expect(grooveFits(trammel, 40, 420)).toEqual({ outcome: 'enough', spare: 0 });
  });
});

describe('the pantograph', () => {
  it('keeps the three corners in line and the scale everywhere in reach', () => {
    const share = fc.double({ min: 0.1, max: 0.9, noNaN: true });
    const bar = fc.double({ min: 200, max: 400, noNaN: true });
    fc.assert(
      fc.property(bar, bar, share, share, turn, (first, second, hole, far, angle) => {
        const pantograph = truePantograph(first, second, hole * first);
        const copy = pantographCopy(pantograph, 'across-the-middle');
        const { stylus: reach } = pantographReach(pantograph, 'across-the-middle');
        const away = reach.least + far * (reach.most - reach.least);
        const stylus = { x: away * Math.cos(angle), y: away * Math.sin(angle) };
        const found = leadPantograph(pantograph, 'across-the-middle', { fixed: ORIGIN, stylus });
        if (found.outcome !== 'placed' || copy.outcome !== 'true') throw new Error('not placed');
        expect(distance(found.points.O, stylus)).toBeLessThan(1e-9);
        expect(found.points.P.x).toBeCloseTo(copy.scale * stylus.x, 8);
        expect(found.points.P.y).toBeCloseTo(copy.scale * stylus.y, 8);
        expect(Math.abs(found.penOffLine)).toBeLessThan(1e-8);
        const back = pantographHoles(first, second, copy.scale, 'across-the-middle');
        expect(back.outcome === 'holes' && back.firstHole).toBeCloseTo(hole * first, 8);
      }),
      { seed: 33, numRuns: 3000 },
    );
  });

  it('is stuck on its own pin, skew when the shares differ, and has an end to its reach', () => {
    const bars = { first: 300, second: 300, firstHole: 100, secondHole: 100 };
    expect(pantographCopy({ ...bars, firstHole: 0, secondHole: 0 }, 'middle-to-end')).toEqual({
      outcome: 'stuck',
    });
    const { most, least } = copyStretch({ ...bars, secondHole: 120 }, 'middle-to-end', radians(40));
    expect(most / least).toBeGreaterThan(1.2);
    expect(() => pantographCopy(bars, { fixed: 'O', stylus: 'O', pen: 'P' })).toThrow(
      'three corners',
    );
    const elbow = { least: radians(30), most: radians(150) };
    const lead = (x: number) =>
      leadPantograph(bars, 'middle-to-end', { fixed: ORIGIN, stylus: { x, y: 0 }, elbow });
    expect(lead(20)).toMatchObject({ outcome: 'too-near' });
    expect(lead(199)).toMatchObject({ outcome: 'too-far' });
    expect(lead(150)).toMatchObject({ outcome: 'placed' });
    expect(pantographHoles(400, 400, 2, 'end-to-middle')).toEqual({
      outcome: 'scale-too-large',
      most: 1,
    });
  });
});

describe('straight lines', () => {
  it('come out of the solver where the closed forms say', () => {
    const cell = { long: 120, short: 50, crank: 40, centreDistance: 45 };
    const plan = planned(peaucellierLinkage(cell));
    const scott = planned(scottRussellLinkage({ crank: 50, rod: 80 }));
    const level = planned(straightLinkage(roberts({ ground: 100, arm: 60, link: 50 })));
    for (const angle of [-0.8, -0.3, 0.1, 0.6]) {
      const exact = peaucellierPoint(cell, angle);
      if (exact.outcome !== 'closes') throw new Error('open');
      expect(distance(placed(plan, [angle]).F ?? ORIGIN, exact.far)).toBeLessThan(1e-9);
      const path = peaucellierPath(cell);
      expect(path.outcome === 'arc' && distance(exact.far, { x: path.centre, y: 0 })).toBeCloseTo(
        1120,
        8,
      );
      const pencil = scottRussellPoint({ crank: 50, rod: 80 }, angle);
      expect(
        pencil.outcome === 'closes' && distance(placed(scott, [angle]).D ?? ORIGIN, pencil.pencil),
      ).toBeLessThan(1e-9);
      const at = pointOf(roberts({ ground: 100, arm: 60, link: 50 }), 1 + angle / 4);
      expect(
        distance(placed(level, [1 + angle / 4]).P ?? ORIGIN, at ?? { x: 9e9, y: 0 }),
      ).toBeLessThan(1e-9);
    }
  });

  it('are exact with Hart’s inversor, at power over twice the crank', () => {
    const hart = { long: 160, short: 80, share: 0.5 };
    const plan = planned(hartLinkage(hart, 30));
    for (const angle of [-0.5, -0.1, 0.2, 0.6]) {
      expect(placed(plan, [angle]).Q?.x).toBeCloseTo(-hartPower(hart) / 60, 9);
    }
  });

  it('say where they cannot go', () => {
    expect(peaucellierPath({ long: 120, short: 20, crank: 40, centreDistance: 40 })).toEqual({
      outcome: 'does-not-reach',
      by: 20,
    });
    expect(
      peaucellierPoint({ long: 120, short: 50, crank: 40, centreDistance: 40 }, 3),
    ).toMatchObject({ outcome: 'does-not-close' });
    expect(wattPoint({ arm1: 100, arm2: 100, link: 60 }, 1.5)).toMatchObject({
      outcome: 'does-not-close',
    });
    expect(scottRussellPoint({ crank: 80, rod: 50 }, Math.PI / 2)).toEqual({
      outcome: 'does-not-close',
      by: 30,
    });
    expect(chebyshevLevel({ ground: 200, arm: 50, link: 40 })).toBeUndefined();
  });
});

describe('freedom', () => {
  it('is truer than the count for three oars', () => {
    const oars = {
      points: {
        A: ORIGIN,
        B: { x: 7, y: 0 },
        C: { x: 14, y: 0 },
        a: { x: 3, y: 4 },
        b: { x: 10, y: 4 },
        c: { x: 17, y: 4 },
      },
      fixed: ['A', 'B', 'C'],
      bars: ['A', 'B', 'C'].map((name) => ({
        ends: [name, name.toLowerCase()] as const,
        length: 5,
      })),
      plates: [{ shape: { a: ORIGIN, b: { x: 7, y: 0 }, c: { x: 14, y: 0 } } }],
      drivers: [],
    };
    expect(freedomOf(oars)).toEqual({ counted: 0, real: 1, repeated: 1 });
  });
});

describe('play and toggles', () => {
  it('twist a board at the flat by 6.3° in the row and 1.1° out of it', () => {
    const row = (middle: number) => [
      { x: 0, y: 0 },
      { x: 70, y: middle },
      { x: 140, y: 0 },
    ];
    const inRow = twistAtFlat(50, row(0), 0.3);
    const outOfRow = twistAtFlat(50, row(30), 0.3);
    expect([inRow, outOfRow].map((x) => Math.round((x * 1800) / Math.PI) / 10)).toEqual([6.3, 1.1]);
  });

  it('press without limit on the line, and rest as their knee says', () => {
    expect(togglePress(0, 0)).toEqual({ outcome: 'on-the-line' });
    expect(() => togglePress(Math.PI / 2, 0)).toThrow(RangeError);
    const links = { first: 100, second: 100 };
    expect(toggleAtRest({ ...links, knee: 0 }, { stop: true })).toBe('balances');
    expect(toggleAtRest({ ...links, knee: 3 }, { stop: true })).toBe('opens');
    expect(toggleAtRest({ ...links, knee: -3 }, { stop: false })).toBe('folds-on');
  });
});
