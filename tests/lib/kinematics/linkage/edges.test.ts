import { describe, expect, it } from 'vitest';
import { distance, ORIGIN, polar, rotate, type Point } from '@/lib/geometry/point';
import {
  antiparallelogramLinkage,
  counterCrank,
  counterRatios,
} from '@/lib/kinematics/linkage/antiparallelogram';
import { twistAtFlat } from '@/lib/kinematics/linkage/change-point-play';
import { cognates, type Cognate } from '@/lib/kinematics/linkage/cognates';
import { fourBarPosition } from '@/lib/kinematics/linkage/four-bar';
import { grashofCount } from '@/lib/kinematics/linkage/four-bar-class';
import { fourBarThroughPairs } from '@/lib/kinematics/linkage/freudenstein';
import { hartLinkage } from '@/lib/kinematics/linkage/hart';
import { invertedPosition } from '@/lib/kinematics/linkage/inverted-crank-slider';
import { tongsPose } from '@/lib/kinematics/linkage/lazy-tongs';
import { pantographLinkage } from '@/lib/kinematics/linkage/pantograph-linkage';
import { pantographHoles } from '@/lib/kinematics/linkage/pantograph-making';
import { leadPantograph } from '@/lib/kinematics/linkage/pantograph-reach';
import { bestLineOfPath, straightness } from '@/lib/kinematics/linkage/straightness';
import { kneePress } from '@/lib/kinematics/linkage/toggle';
import { barTrammel } from '@/lib/kinematics/linkage/trammel-making';
import { wattPoint } from '@/lib/kinematics/linkage/watt';
import { outcome } from '@/tests/support/numbers';
import { placed, planned } from './planned';

/** A four-bar's coupler point and coupler's angle, its crank pin at `pin`, its frame turned by `turned`. */
function drawn(
  cognate: Cognate,
  pin: Point,
  turned: number,
  crankAngle: number,
  side: 'open' | 'crossed',
) {
  const found = outcome(fourBarPosition(cognate.bars, crankAngle - turned), 'closes');
  const { couplerAngle } = found[side];
  const crankPin = polar(cognate.bars.crank, crankAngle - turned);
  const { distance: away, angle } = cognate.point;
  const point = rotate(polar(away, couplerAngle + angle, crankPin), turned);
  return { x: point.x + pin.x, y: point.y + pin.y };
}

describe('the cognates of a four-bar', () => {
  const bars = { crank: 40, coupler: 120, rocker: 80, frame: 100 };
  const place = { distance: 60, angle: 0.5 };
  const { left, right, thirdPin } = cognates(bars, place);

  it.each([0.3, 1.1, 2, 3.4, 5])('draw one curve: crank at %s', (crankAngle) => {
    const { open } = outcome(fourBarPosition(bars, crankAngle), 'closes');
    const A = polar(40, crankAngle);
    const P = polar(60, open.couplerAngle + 0.5, A);
    const B = polar(80, open.rockerAngle, { x: 100, y: 0 });
    const near = (one: Point, other: Point) => expect(distance(one, other)).toBeLessThan(1e-9);
    const nearest = (points: readonly Point[]) =>
      points.reduce((best, point) => (distance(point, P) < distance(best, P) ? point : best));
    // The left one's crank is parallel to A–P, the right one's to B–P.
    const along = (from: Point) => Math.atan2(P.y - from.y, P.x - from.x);
    const turnedLeft = Math.atan2(thirdPin.y, thirdPin.x);
    const sides = ['open', 'crossed'] as const;
    near(nearest(sides.map((side) => drawn(left, ORIGIN, turnedLeft, along(A), side))), P);
    const O4 = { x: 100, y: 0 };
    const turnedRight = Math.atan2(thirdPin.y, thirdPin.x - 100);
    near(nearest(sides.map((side) => drawn(right, O4, turnedRight, along(B), side))), P);
  });

  it('have frames that are sides of a triangle like the coupler’s', () => {
    expect(left.bars.frame).toBeCloseTo(distance(ORIGIN, thirdPin), 10);
    expect(right.bars.frame).toBeCloseTo(distance({ x: 100, y: 0 }, thirdPin), 10);
    expect(() => cognates(bars, { distance: 0, angle: 0 })).toThrow('distance A–P');
    expect(() => cognates(bars, { distance: 120, angle: 0 })).toThrow('distance B–P');
  });
});

describe('places where a formula has no answer, or two', () => {
  it('a crossed parallelogram of equal sides runs as it likes', () => {
    expect(counterCrank({ crank: 70, ground: 70 }, 1)).toEqual({ outcome: 'equal-sides' });
    expect(counterRatios({ crank: 70, ground: 70 })).toEqual({ outcome: 'equal-sides' });
    const { B } = placed(planned(antiparallelogramLinkage({ crank: 60, ground: 140 })), [1]);
    const turned = outcome(counterCrank({ crank: 60, ground: 140 }, 1), 'runs').angle;
    expect(distance(B ?? ORIGIN, polar(60, turned, { x: 140, y: 0 }))).toBeLessThan(1e-9);
  });

  it('twist needs three pins or more', () => {
    expect(() => twistAtFlat(50, [ORIGIN, { x: 9, y: 0 }], 0.3)).toThrow('pins are 2');
  });

  it('a class is told of each inversion', () => {
    const told = (crank: number, coupler: number, rocker: number, frame: number) =>
      grashofCount({ crank, coupler, rocker, frame }).class;
    expect(told(40, 120, 80, 100)).toBe('crank-rocker');
    expect(told(100, 40, 120, 80)).toBe('double-rocker');
    expect(told(80, 100, 40, 120)).toBe('rocker-crank');
    expect(told(120, 80, 100, 40)).toBe('double-crank');
    expect(told(100, 112, 105, 90)).toBe('double-crank');
    expect(told(100, 120, 100, 70 + 50)).toBe('change-point');
    expect(told(70, 150, 90, 85)).toBe('triple-rocker');
  });

  it('three pairs of which two are alike ask for no four-bar of their own', () => {
    const pair = (crank: number, rocker: number) => ({ crank, rocker });
    const pairs = [pair(0.1, 0.3), pair(0.1, 0.3), pair(1.2, 1.5)] as const;
    expect(fourBarThroughPairs(100, pairs)).toEqual({ outcome: 'undetermined' });
  });

  it('three pairs that ever differ by one angle ask for a crank without end', () => {
    const pair = (crank: number, rocker: number) => ({ crank, rocker });
    const pairs = [pair(0.8, 1.2), pair(1.2, 1.6), pair(0.4, 0.8)] as const;
    expect(fourBarThroughPairs(100, pairs)).toEqual({ outcome: 'impossible', by: 0 });
  });

  it('a groove on an arm that leans so far that the pin stands behind it', () => {
    const short = invertedPosition({ crank: 10, frame: 50, arm: 60, grooveAngle: 0.2 }, 0);
    // √(40² − (60·sin 0.2)²) − 60·cos 0.2
    expect(outcome(short, 'does-not-close').by).toBeCloseTo(
      60 * Math.cos(0.2) - Math.sqrt(1600 - (60 * Math.sin(0.2)) ** 2),
      12,
    );
  });

  it('a pantograph told by its roles, bent the other way, turned in the middle', () => {
    const bars = { first: 300, second: 300, firstHole: 100, secondHole: 100 };
    const roles = { fixed: 'O', stylus: 'M', pen: 'P' } as const;
    const right = planned(pantographLinkage(bars, roles, { side: 'right' }));
    expect(placed(right, [80, 60]).P?.x).toBeCloseTo(240, 9);
    const at = { fixed: ORIGIN, stylus: { x: 80, y: 60 } };
    const left = outcome(leadPantograph(bars, 'middle-to-end', at), 'placed').points;
    const told = outcome(leadPantograph(bars, roles, { ...at, side: 'right' }), 'placed').points;
    expect(distance(told.P, { x: 240, y: 180 })).toBeLessThan(1e-9);
    // Mirror images in the line from the fixed corner to the stylus.
    const mirrored = rotate(left.C, -2 * Math.atan2(60, 80));
    expect(told.C.x).toBeCloseTo(mirrored.x, 9);
    expect(told.C.y).toBeCloseTo(-mirrored.y, 9);
    expect(outcome(pantographHoles(300, 240, 0.5, 'end-to-middle'), 'holes').firstHole).toBe(150);
  });

  it('tongs are told almost to the quarter turn, and a knee by pins only with friction', () => {
    const tongs = { stages: 3, bar: 160 };
    expect(tongsPose(tongs, Math.PI / 2 - 1e-6).rate).toBeCloseTo(3e6, 0);
    expect(() => tongsPose(tongs, Math.PI / 2)).toThrow('angle is 1.57');
    const links = { first: 100, second: 100, knee: 10 };
    expect(kneePress(links, { friction: 0.3 })).toEqual(kneePress(links));
    expect(kneePress(links, { pin: 8 })).toEqual(kneePress(links));
    expect(kneePress({ ...links, knee: 100.5 })).toMatchObject({ outcome: 'links-too-short' });
  });

  it('Hart’s bars fit the pose that he starts in', () => {
    const { points } = hartLinkage({ long: 150, short: 80, share: 0.5 }, 30);
    const apart = (a: string, b: string) => distance(points[a] ?? ORIGIN, points[b] ?? ORIGIN);
    expect(apart('A', 'B')).toBeCloseTo(150, 9);
    expect(apart('C', 'D')).toBeCloseTo(150, 9);
    expect(apart('A', 'D')).toBeCloseTo(80, 9);
    expect(apart('B', 'C')).toBeCloseTo(80, 9);
  });

  it('a path that does not close has no straightness and no best line', () => {
    const gone = (t: number) => (t > 0.5 ? undefined : { x: t, y: 0 });
    expect(straightness(gone, 0, 1, 'x')).toBeUndefined();
    expect(bestLineOfPath(gone, 0, 1)).toBeUndefined();
    expect(straightness(() => ({ x: 1, y: 2 }), 0, 1, 'x')).toMatchObject({ stroke: 0, share: 0 });
  });

  it('a trammel’s bar without a pen, and Watt’s arms stretched out', () => {
    expect(() => barTrammel({ spacing: 60 })).toThrow('beyond or fromMiddle');
    const touch = wattPoint({ arm1: 100, arm2: 50, link: 30 }, 0, 15);
    expect(touch.outcome).toBe('closes');
  });
});
