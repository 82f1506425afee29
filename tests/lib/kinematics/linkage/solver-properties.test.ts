import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { distance, rotate, type Point } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';
import {
  branchOf,
  carryOnLinkage,
  moveLinkage,
  placeLinkage,
  solveLinkage,
  startPose,
  type NamedPoints,
} from '@/lib/kinematics/linkage/solver/solver';
import { antiparallelogramLinkage, counterCrank } from '@/lib/kinematics/linkage/antiparallelogram';
import { tongsLinkage, tongsPose } from '@/lib/kinematics/linkage/lazy-tongs';
import { plagiographLinkage } from '@/lib/kinematics/linkage/plagiograph';
import { yokeLinkage, yokeMotion } from '@/lib/kinematics/linkage/scotch-yoke';
import { drawnLinkages } from '../../../reference/random-linkages';
import { placed, planned } from './planned';

const families = Object.entries(drawnLinkages);

/** The drawn linkages of a family that close well clear of a limit. */
function closing(name: string, count: number) {
  const drawn = drawnLinkages[name];
  if (!drawn) throw new Error(`no family ${name}`);
  return fc.sample(drawn, { seed: 77, numRuns: count }).flatMap(({ linkage, drive }) => {
    const plan = planned(linkage);
    const found = solveLinkage(plan, drive);
    return found.outcome === 'closes' && found.slack > 1
      ? [{ linkage, drive, plan, points: found.points }]
      : [];
  });
}

/** A linkage moved, turned and stretched as a whole. */
function changed(linkage: Linkage, size: number, turn: number, mirror: 1 | -1): Linkage {
  const place = ({ x, y }: Point) => rotate({ x: size * x, y: mirror * size * y }, turn);
  const own = ({ x, y }: Point) => ({ x: size * x, y: mirror * size * y });
  const mapped = (points: Readonly<Record<string, Point>>, map: (p: Point) => Point) =>
    Object.fromEntries(Object.entries(points).map(([name, at]) => [name, map(at)]));
  return {
    ...linkage,
    points: mapped(linkage.points, place),
    bars: linkage.bars?.map((bar) => ({ ...bar, length: size * bar.length })),
    plates: linkage.plates?.map(({ shape }) => ({ shape: mapped(shape, own) })),
    slides: linkage.slides?.map((slide) => ({
      ...slide,
      offset: mirror * size * (slide.offset ?? 0),
    })),
  };
}

function changedDrive(
  linkage: Linkage,
  drive: readonly number[],
  size: number,
  turn: number,
  mirror: 1 | -1,
) {
  if (linkage.drivers[0]?.kind !== 'lead') return drive.map((angle) => mirror * angle + turn);
  const [x = 0, y = 0] = drive;
  const at = rotate({ x: size * x, y: mirror * size * y }, turn);
  return [at.x, at.y];
}

describe.each(families)('the solver on a random %s', (name) => {
  const samples = closing(name, 60);

  it('keeps every bar, plate and groove within a 1e-9th of the size', () => {
    expect(samples.length).toBeGreaterThan(15);
    for (const { linkage, points, plan } of samples) {
      const rounding = 1e-9 * plan.model.size;
      const apart = (p: string, q: string) => distance(at(points, p), at(points, q));
      for (const { ends, length } of linkage.bars ?? []) {
        expect(Math.abs(apart(ends[0], ends[1]) - length)).toBeLessThan(rounding);
      }
      for (const { shape } of linkage.plates ?? []) {
        const names = Object.keys(shape);
        for (const p of names) {
          for (const q of names) {
            expect(Math.abs(apart(p, q) - distance(at(shape, p), at(shape, q)))).toBeLessThan(
              rounding,
            );
          }
        }
      }
    }
  });

  it('grows, turns and mirrors with the linkage', () => {
    for (const { linkage, drive, points } of samples.slice(0, 12)) {
      for (const [size, turn, mirror] of [
        [1e-9, 0, 1],
        [1e9, 0, 1],
        [1, 0.9, 1],
        [1, 0, -1],
      ] as const) {
        const plan = planned(changed(linkage, size, turn, mirror));
        const found = placed(plan, changedDrive(linkage, drive, size, turn, mirror));
        for (const [key, { x, y }] of Object.entries(points)) {
          const wanted = rotate({ x: size * x, y: mirror * size * y }, turn);
          expect(distance(at(found, key), wanted) / size).toBeLessThan(2e-6);
        }
      }
    }
  });

  it('tells the velocity and acceleration that central differences show', () => {
    for (const { drive, plan, points } of samples.slice(0, 20)) {
      const speeds = drive.map((_, k) => (plan.model.leads.length > 0 ? 3 + k : 0.7));
      const accelerations = drive.map((_, k) => (plan.model.leads.length > 0 ? 1 - 2 * k : 0.4));
      const now = moveLinkage(plan, drive, speeds, accelerations);
      if (now.outcome !== 'moves') continue;
      const step = 1e-4;
      const from = Float64Array.from(Object.values(points).flatMap(({ x, y }) => [x, y]));
      const shifted = (t: number) =>
        placed(
          plan,
          drive.map((x, k) => x + (speeds[k] ?? 0) * t + ((accelerations[k] ?? 0) * t * t) / 2),
          { from },
        );
      const [before, after] = [shifted(-step), shifted(step)];
      const fastest = Math.max(
        1,
        ...Object.values(now.accelerations).map(({ x, y }) => Math.hypot(x, y)),
      );
      for (const key of plan.model.names) {
        const [a, b, c] = [at(before, key), at(points, key), at(after, key)];
        const v = at(now.velocities, key);
        expect(Math.abs((c.x - a.x) / (2 * step) - v.x)).toBeLessThan(1e-5 * fastest);
        expect(Math.abs((c.y - a.y) / (2 * step) - v.y)).toBeLessThan(1e-5 * fastest);
        const w = at(now.accelerations, key);
        expect(Math.abs((c.x - 2 * b.x + a.x) / step ** 2 - w.x)).toBeLessThan(2e-3 * fastest);
        expect(Math.abs((c.y - 2 * b.y + a.y) / step ** 2 - w.y)).toBeLessThan(2e-3 * fastest);
      }
    }
  });
});

describe('the solver on linkages of one kind', () => {
  it('never hands out NaN or Infinity, whatever the drive', () => {
    const plan = planned(planCase({ crank: 50, frame: 110 }));
    const pose = startPose(plan);
    const branch = branchOf(plan);
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (angle) => {
        const gap = placeLinkage(plan, [angle], branch, pose);
        expect(gap).toBeGreaterThanOrEqual(0);
        expect([...pose].every(Number.isFinite)).toBe(true);
      }),
      { seed: 5, numRuns: 20_000 },
    );
  });

  it('carries a crossed parallelogram through its change points for three turns', () => {
    const linkage = antiparallelogramLinkage({ crank: 40, ground: 100 });
    const plan = planned(linkage);
    const branch = branchOf(plan);
    const step = Math.PI / 180;
    let [before, now] = [startPose(plan), startPose(plan)];
    placeLinkage(plan, [0.3 - step], branch, before);
    placeLinkage(plan, [0.3], branch, now);
    const names = plan.model.names;
    for (let k = 1; k <= 1080; k += 1) {
      const next = startPose(plan);
      expect(carryOnLinkage(plan, [0.3 + k * step], before, now, branch, next)).toBe(0);
      const exact = counterCrank({ crank: 40, ground: 100 }, 0.3 + k * step);
      if (exact.outcome !== 'runs') throw new Error('equal sides');
      const b = 2 * names.indexOf('B');
      expect(next[b]).toBeCloseTo(100 + 40 * Math.cos(exact.angle), 5);
      expect(next[b + 1]).toBeCloseTo(40 * Math.sin(exact.angle), 5);
      [before, now] = [now, next];
    }
  });

  it('runs a slanted yoke as its closed form does', () => {
    const yoke = { crank: 35, slant: 0.4 };
    const plan = planned(yokeLinkage(yoke));
    for (let angle = -3; angle < 3; angle += 0.37) {
      const exact = yokeMotion(yoke, { angle, speed: 4, acceleration: -2 });
      const found = moveLinkage(plan, [angle], [4], [-2]);
      if (found.outcome !== 'moves') throw new Error(found.outcome);
      expect(found.points.Y?.x).toBeCloseTo(exact.position, 10);
      expect(found.velocities.Y?.x).toBeCloseTo(exact.velocity, 9);
      expect(found.accelerations.Y?.x).toBeCloseTo(exact.acceleration, 8);
    }
  });

  it('stretches eight pairs of tongs to their length', () => {
    const tongs = { stages: 8, bar: 160 };
    const plan = planned(tongsLinkage(tongs));
    for (const angle of [0.2, 0.7, 1.3]) {
      const { P8, Q8 } = placed(plan, [angle]);
      const { length, width } = tongsPose(tongs, angle);
      expect(P8?.x).toBeCloseTo(length, 9);
      expect((Q8?.y ?? 0) - (P8?.y ?? 0)).toBeCloseTo(width, 9);
    }
  });

  it('copies with a skew pantograph: twice as large, turned back 40°', () => {
    const plan = planned(
      plagiographLinkage({ first: 120, second: 160, stylusArm: 80, plateAngle: (2 * Math.PI) / 9 }),
    );
    const from = placed(plan, [60, 90]);
    const to = placed(plan, [75, 101]);
    const wanted = rotate({ x: 30, y: 22 }, (-2 * Math.PI) / 9);
    expect(at(to, 'Q').x - at(from, 'Q').x).toBeCloseTo(wanted.x, 9);
    expect(at(to, 'Q').y - at(from, 'Q').y).toBeCloseTo(wanted.y, 9);
  });

  it('lets a third equal oar row with the others, and stops one that is too long', () => {
    const oars = (odd: number): Linkage => {
      const posts = [0, 70, 140];
      const points: Record<string, Point> = {};
      posts.forEach((x, k) => {
        points[`F${k}`] = { x, y: 0 };
        points[`B${k}`] = { x, y: 50 };
      });
      return {
        points,
        fixed: ['F0', 'F1', 'F2'],
        bars: posts.map((_, k) => ({ ends: [`F${k}`, `B${k}`], length: k === 1 ? odd : 50 })),
        plates: [{ shape: { B0: { x: 0, y: 0 }, B1: { x: 70, y: 0 }, B2: { x: 140, y: 0 } } }],
        drivers: [{ kind: 'angle', from: 'F0', to: 'B0' }],
      };
    };
    expect(solveLinkage(planned(oars(50)), [1]).outcome).toBe('closes');
    const stuck = solveLinkage(planned(oars(53)), [1]);
    expect(stuck.outcome === 'does-not-close' && stuck.by).toBeGreaterThan(0.5);
    expect(stuck.outcome === 'does-not-close' && stuck.at).toEqual([]);
  });

  it('runs a trammel whose pen stands on a pin', () => {
    const plan = planned(trammelLinkage({ uprightPin: 150, levelPin: 0 }));
    expect(placed(plan, [1]).pen?.x).toBeCloseTo(150 * Math.cos(1), 10);
    expect(placed(plan, [1]).pen?.y).toBeCloseTo(0, 10);
  });
});

function planCase({ crank, frame }: { crank: number; frame: number }): Linkage {
  return {
    points: {
      O: { x: 0, y: 0 },
      A: { x: 0, y: crank },
      B: { x: frame, y: 40 },
      Q: { x: frame, y: 0 },
    },
    fixed: ['O', 'Q'],
    bars: [
      { ends: ['O', 'A'], length: crank },
      { ends: ['A', 'B'], length: 40 },
      { ends: ['Q', 'B'], length: 45 },
    ],
    drivers: [{ kind: 'angle', from: 'O', to: 'A' }],
  };
}

function at(points: NamedPoints, name: string): Point {
  const found = points[name];
  if (!found) throw new Error(`no point ${name}`);
  return found;
}
