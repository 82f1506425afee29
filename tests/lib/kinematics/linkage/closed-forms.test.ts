import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { radians } from '@/lib/geometry/angle';
import { distance, norm } from '@/lib/geometry/point';
import { cognates } from '@/lib/kinematics/linkage/cognates';
import {
  crankSliderLinkage,
  crankSliderMotion,
  crankSliderPosition,
} from '@/lib/kinematics/linkage/crank-slider';
import {
  fastestSlider,
  sliderStroke,
  sliderTravel,
} from '@/lib/kinematics/linkage/crank-slider-stroke';
import { fourBarAssembly, fourBarPosition } from '@/lib/kinematics/linkage/four-bar';
import { couplerRange, crankLimits, grashofCount } from '@/lib/kinematics/linkage/four-bar-class';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import {
  couplerPoint,
  couplerPointMotion,
  fourBarMotion,
} from '@/lib/kinematics/linkage/four-bar-motion';
import {
  rockerStrokes,
  transmissionAngle,
  transmissionExtremes,
} from '@/lib/kinematics/linkage/four-bar-strokes';
import { fourBarThroughPairs } from '@/lib/kinematics/linkage/freudenstein';
import { invertedLinkage, invertedPosition } from '@/lib/kinematics/linkage/inverted-crank-slider';
import {
  leverMotion,
  shaperCrank,
  shaperStrokes,
  whitworthStrokes,
} from '@/lib/kinematics/linkage/quick-return';
import { moved, placed, planned } from './planned';

const length = (least: number, most: number) => fc.double({ min: least, max: most, noNaN: true });
const turn = length(-10, 10);
const anyBars = fc.record({
  crank: length(5, 150),
  coupler: length(5, 150),
  rocker: length(5, 150),
  frame: length(5, 150),
});

describe('four-bars in closed form', () => {
  it('close both assemblies, or say the very gap that assembly says', () => {
    fc.assert(
      fc.property(anyBars, turn, (bars, angle) => {
        const found = fourBarPosition(bars, angle);
        const told = fourBarAssembly(bars, angle);
        if (found.outcome === 'does-not-close') {
          expect(told.outcome === 'does-not-close' && told.by).toBeCloseTo(found.by, 9);
          return;
        }
        for (const { A, B } of [found.open, found.crossed]) {
          expect(norm(A)).toBeCloseTo(bars.crank, 9);
          expect(distance(A, B)).toBeCloseTo(bars.coupler, 7);
          expect(distance(B, { x: bars.frame, y: 0 })).toBeCloseTo(bars.rocker, 7);
        }
      }),
      { seed: 21, numRuns: 20_000 },
    );
  });

  it('move as the general solver says, and as central differences show', () => {
    fc.assert(
      fc.property(
        anyBars,
        turn,
        fc.constantFrom('open' as const, 'crossed' as const),
        (bars, angle, side) => {
          const here = fourBarAssembly(bars, angle);
          fc.pre(here.outcome === 'closes' && here.slack > 2);
          const crank = { angle, speed: 2, acceleration: -1 };
          const found = couplerPointMotion(bars, side, { distance: 40, angle: 0.6 }, crank);
          if (found.outcome !== 'moves') throw new Error(found.outcome);
          const plan = planned(fourBarLinkage(bars, { side, point: { distance: 40, angle: 0.6 } }));
          const solved = moved(plan, [angle], [2], [-1]);
          const scale = 1 + norm(found.acceleration);
          expect(distance(found.position, solved.points.P ?? found.velocity) / scale).toBeLessThan(
            1e-8,
          );
          expect(
            distance(found.velocity, solved.velocities.P ?? found.position) / scale,
          ).toBeLessThan(1e-8);
          expect(
            distance(found.acceleration, solved.accelerations.P ?? found.position) / scale,
          ).toBeLessThan(1e-8);
          const step = 1e-6;
          const after = couplerPointMotion(
            bars,
            side,
            { distance: 40, angle: 0.6 },
            { ...crank, angle: angle + step },
          );
          const before = couplerPointMotion(
            bars,
            side,
            { distance: 40, angle: 0.6 },
            { ...crank, angle: angle - step },
          );
          if (after.outcome !== 'moves' || before.outcome !== 'moves') return;
          expect((after.position.x - before.position.x) / step).toBeCloseTo(found.velocity.x, 2);
        },
      ),
      { seed: 22, numRuns: 200 },
    );
  });

  it('say toggle where coupler and rocker are in line', () => {
    const bars = { crank: 50, coupler: 40, rocker: 45, frame: 110 };
    const limits = crankLimits(bars);
    const most = limits.outcome === 'limits' ? (limits.most ?? 0) : 0;
    expect(most).toBeCloseTo(radians(47.8978434641), 10);
    const inLine = { crank: 30, coupler: 45, rocker: 35, frame: 50 };
    expect(fourBarMotion(inLine, 'open', { angle: Math.PI, speed: 1 }).outcome).toBe('toggle');
    expect(fourBarMotion(bars, 'open', { angle: 1.4, speed: 1 })).toMatchObject({
      outcome: 'does-not-close',
    });
  });

  it('turn exactly as far as Grashof’s rule and the limits say', () => {
    fc.assert(
      fc.property(anyBars, (bars) => {
        const count = grashofCount(bars);
        fc.pre(Math.abs(count.margin) > 0.5);
        const closes = Array.from(
          { length: 361 },
          (_, k) => fourBarAssembly(bars, radians(k)).outcome === 'closes',
        );
        if (count.class === 'not-assemblable') {
          expect(closes.some(Boolean)).toBe(false);
          expect(crankLimits(bars)).toMatchObject({ outcome: 'not-assemblable' });
          return;
        }
        expect(closes.every(Boolean)).toBe(count.crankTurns);
        expect(crankLimits(bars).outcome === 'turns-fully').toBe(count.crankTurns);
      }),
      { seed: 23, numRuns: 2000 },
    );
  });

  it('name every class', () => {
    const of = (crank: number, coupler: number, rocker: number, frame: number) =>
      grashofCount({ crank, coupler, rocker, frame });
    expect(of(120, 80, 100, 40)).toMatchObject({
      class: 'double-crank',
      crankTurns: true,
      rockerTurns: true,
    });
    expect(of(120, 80, 40, 100)).toMatchObject({
      class: 'rocker-crank',
      rockerTurns: true,
      crankTurns: false,
    });
    expect(of(60, 100, 60, 100)).toMatchObject({ class: 'change-point', margin: 0 });
    expect(of(50, 70, 80, 120)).toMatchObject({ class: 'triple-rocker', margin: -20 });
    expect(of(10, 20, 30, 70)).toMatchObject({ class: 'not-assemblable', missing: 10 });
    expect(crankLimits({ crank: 10, coupler: 20, rocker: 30, frame: 70 })).toEqual({
      outcome: 'not-assemblable',
      by: 10,
    });
  });

  it('size a coupler whose ends are change points', () => {
    expect(couplerRange({ crank: 80, rocker: 70, frame: 100 })).toEqual({
      outcome: 'no-coupler',
      by: 10,
    });
    const bars = { crank: 30, rocker: 70, frame: 100 };
    expect(grashofCount({ ...bars, coupler: 60 }).class).toBe('change-point');
    expect(grashofCount({ ...bars, coupler: 140 }).class).toBe('change-point');
  });

  it('swing between the very ends that a sweep of the crank shows', () => {
    const bars = { crank: 35, coupler: 95, rocker: 70, frame: 105 };
    const strokes = rockerStrokes(bars);
    if (strokes.outcome !== 'swings') throw new Error(strokes.outcome);
    const rockers = Array.from({ length: 36_000 }, (_, k) => {
      const found = fourBarPosition(bars, radians(k / 100));
      return found.outcome === 'closes' ? found.open.rockerAngle : 0;
    });
    expect(Math.min(...rockers)).toBeCloseTo(strokes.rockerExtended, 6);
    expect(Math.max(...rockers)).toBeCloseTo(strokes.rockerFolded, 6);
    const mirrored = rockerStrokes(bars, 'crossed');
    expect(mirrored.outcome === 'swings' && mirrored.swing).toBeCloseTo(strokes.swing, 12);
    expect(rockerStrokes({ crank: 50, coupler: 70, rocker: 80, frame: 120 })).toEqual({
      outcome: 'no-crank-rocker',
      by: 20,
    });
  });

  it('push worst at the crank along the frame line', () => {
    const bars = { crank: 40, coupler: 120, rocker: 80, frame: 100 };
    const extremes = transmissionExtremes(bars);
    if (extremes.outcome !== 'extremes') throw new Error(extremes.outcome);
    const folded = transmissionAngle(bars, 0);
    expect(folded.outcome === 'closes' && folded.angle).toBeCloseTo(extremes.least, 12);
    const square = transmissionAngle(bars, Math.PI);
    expect(square.outcome === 'closes' && square.angle).toBeCloseTo(extremes.most, 12);
    expect(transmissionExtremes({ crank: 10, coupler: 20, rocker: 30, frame: 70 })).toEqual({
      outcome: 'not-assemblable',
      by: 10,
    });
  });

  it('draw one curve with all three cognates', () => {
    const bars = { crank: 40, coupler: 120, rocker: 80, frame: 100 };
    const place = { distance: 60, angle: radians(30) };
    const { left, thirdPin } = cognates(bars, place);
    for (const angle of [0.2, 1, 2.2, 4]) {
      const found = couplerPoint(bars, place, angle);
      const pose = fourBarPosition(bars, angle);
      if (found.outcome !== 'closes' || pose.outcome !== 'closes') throw new Error('open');
      const P = found.open;
      const pin = {
        x: 60 * Math.cos(pose.open.couplerAngle + place.angle),
        y: 60 * Math.sin(pose.open.couplerAngle + place.angle),
      };
      expect(norm(pin)).toBeCloseTo(left.bars.crank, 10);
      expect(distance(pin, P)).toBeCloseTo(left.point.distance, 10);
      expect(norm(thirdPin)).toBeCloseTo(left.bars.frame, 10);
    }
  });

  it('come back from three pairs of their own angles', () => {
    fc.assert(
      fc.property(length(20, 40), length(100, 130), length(60, 90), (crank, coupler, rocker) => {
        const bars = { crank, coupler, rocker, frame: 100 };
        fc.pre(grashofCount(bars).class === 'crank-rocker');
        const pair = (angle: number) => {
          const found = fourBarPosition(bars, angle);
          return { crank: angle, rocker: found.outcome === 'closes' ? found.open.rockerAngle : 0 };
        };
        const found = fourBarThroughPairs(100, [pair(0.5), pair(1.1), pair(1.7)]);
        expect(found.outcome === 'bars' && found.bars.crank).toBeCloseTo(crank, 5);
        expect(found.outcome === 'bars' && found.bars.rocker).toBeCloseTo(rocker, 5);
      }),
      { seed: 24, numRuns: 200 },
    );
    const same = { crank: 1, rocker: 2 };
    expect(fourBarThroughPairs(100, [same, same, same])).toEqual({ outcome: 'undetermined' });
  });
});

describe('cranks and sliders in closed form', () => {
  it('agree with the solver in position, velocity and acceleration', () => {
    fc.assert(
      fc.property(
        length(10, 60),
        length(10, 150),
        length(-30, 30),
        turn,
        (crank, rod, offset, angle) => {
          const mechanism = { crank, rod, offset };
          const found = crankSliderMotion(mechanism, 'left', { angle, speed: 3, acceleration: 1 });
          const lean = Math.abs(crank * Math.sin(angle) - offset) / rod;
          if (lean > 1.001) {
            expect(found).toMatchObject({ outcome: 'does-not-close' });
            return;
          }
          fc.pre(lean < 0.98);
          if (found.outcome !== 'moves') throw new Error(found.outcome);
          const solved = moved(
            planned(crankSliderLinkage(mechanism, { side: 'left' })),
            [angle],
            [3],
            [1],
          );
          expect(solved.points.C?.x).toBeCloseTo(found.slider, 8);
          expect(solved.velocities.C?.x).toBeCloseTo(found.velocity, 6);
          expect((solved.accelerations.C?.x ?? 0) / (1 + Math.abs(found.acceleration))).toBeCloseTo(
            found.acceleration / (1 + Math.abs(found.acceleration)),
            6,
          );
        },
      ),
      { seed: 25, numRuns: 500 },
    );
  });

  it('say toggle, too short, and where the ends are', () => {
    expect(
      crankSliderMotion({ crank: 50, rod: 50 }, 'right', { angle: Math.PI / 2, speed: 1 }).outcome,
    ).toBe('toggle');
    expect(crankSliderPosition({ crank: 100, rod: 40 }, -Math.PI / 2)).toEqual({
      outcome: 'does-not-close',
      by: 60,
    });
    expect(sliderTravel({ crank: 100, rod: 40 }, Math.PI / 2)).toEqual({
      outcome: 'does-not-close',
      by: 60,
    });
    expect(fastestSlider({ crank: 50, rod: 40 })).toEqual({ outcome: 'rod-too-short', by: 10 });
    expect(sliderStroke({ crank: 50, rod: 50 })).toMatchObject({
      outcome: 'turns-fully',
      inner: 0,
      outer: 100,
    });
    const fastest = fastestSlider({ crank: 50, rod: 200 });
    if (fastest.outcome !== 'found') throw new Error(fastest.outcome);
    for (const angle of [fastest.crankAngle - 0.01, fastest.crankAngle + 0.01]) {
      const near = crankSliderMotion({ crank: 50, rod: 200 }, 'right', { angle, speed: 1 });
      expect(near.outcome === 'moves' && Math.abs(near.velocity)).toBeLessThan(fastest.speed);
    }
  });

  it('run a groove on a swinging arm as the solver does', () => {
    for (const side of ['left', 'right'] as const) {
      const mechanism = { crank: 40, frame: 100, arm: 30 };
      const plan = planned(invertedLinkage(mechanism, { side }));
      for (let angle = 0.1; angle < 6; angle += 0.5) {
        const exact = invertedPosition(mechanism, angle);
        if (exact.outcome !== 'closes') throw new Error(exact.outcome);
        const { B, A } = placed(plan, [angle]);
        if (!A || !B) throw new Error('lost');
        expect(B.x).toBeCloseTo(100 + 30 * Math.cos(exact[side].armAngle), 9);
        expect(distance(A, B)).toBeCloseTo(exact[side].reach, 9);
      }
    }
    expect(invertedPosition({ crank: 40, frame: 50, arm: 30 }, 0)).toEqual({
      outcome: 'does-not-close',
      by: 20,
    });
  });

  it('return quickly, or turn right round, or stand at the change point', () => {
    expect(shaperStrokes({ crank: 50, centreDistance: 50 })).toEqual({ outcome: 'change-point' });
    expect(shaperStrokes({ crank: 75, centreDistance: 50 })).toEqual({
      outcome: 'turns-right-round',
      by: 25,
    });
    expect(whitworthStrokes({ crank: 50, centreDistance: 50 })).toEqual({
      outcome: 'change-point',
    });
    expect(whitworthStrokes({ crank: 50, centreDistance: 75 })).toEqual({
      outcome: 'only-swings',
      by: 25,
    });
    for (const ratio of [1, 1.4, 2, 3]) {
      const strokes = shaperStrokes({
        crank: Math.max(shaperCrank(240, ratio), 1e-9),
        centreDistance: 240,
      });
      expect(strokes.outcome === 'swings' && strokes.timeRatio).toBeCloseTo(ratio, 9);
    }
    const lever = { crank: 120, centreDistance: 240 };
    const at = (angle: number) => {
      const found = leverMotion(lever, { angle, speed: 3, acceleration: 2 });
      if (found.outcome !== 'moves') throw new Error(found.outcome);
      return found;
    };
    const step = 1e-5;
    expect((at(1 + step).angle - at(1 - step).angle) / (2 * step)).toBeCloseTo(at(1).speed / 3, 8);
    const bend = (at(1 + step).speed - at(1 - step).speed) / (2 * step);
    expect(bend * 3 + (at(1).speed / 3) * 2).toBeCloseTo(at(1).acceleration, 6);
    expect(
      leverMotion({ crank: 50, centreDistance: 50 }, { angle: -Math.PI / 2, speed: 1 }),
    ).toEqual({ outcome: 'change-point' });
  });
});
