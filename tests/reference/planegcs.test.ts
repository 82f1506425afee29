import type { GcsWrapper } from '@salusoft89/planegcs';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { distance, type Point } from '@/lib/geometry/point';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import { solveLinkage, type NamedPoints } from '@/lib/kinematics/linkage/solver/solver';
import { openOracle, oraclePoints } from './planegcs';
import { drawnLinkages } from './random-linkages';

let oracle: GcsWrapper;

beforeAll(async () => {
  oracle = await openOracle();
});

afterAll(() => {
  oracle.destroy_gcs_module();
});

/** The same points, each a little out of place, so that the oracle has work to do. */
function disturbed(points: NamedPoints, fixed: readonly string[], by: number): NamedPoints {
  return Object.fromEntries(
    Object.entries(points).map(([name, { x, y }], k) => [
      name,
      fixed.includes(name)
        ? { x, y }
        : { x: x + by * Math.sin(7 * k + 1), y: y + by * Math.cos(11 * k + 2) },
    ]),
  );
}

describe('the general solver against planegcs', () => {
  it.each(Object.entries(drawnLinkages))('%s: every point within a millionth', (_name, drawn) => {
    const drawings = fc.sample(drawn, { seed: 20240611, numRuns: 80 });
    let compared = 0;
    for (const { linkage, drive } of drawings) {
      const planned = planLinkage(linkage);
      if (planned.outcome !== 'planned') throw new Error(planned.outcome);
      const found = solveLinkage(planned.plan, drive);
      if (found.outcome !== 'closes' || found.slack < 0.5) continue;
      const guess = disturbed(found.points, linkage.fixed, 0.02);
      const theirs = oraclePoints(oracle, linkage, drive, guess);
      if (!theirs) continue;
      compared += 1;
      for (const [name, at] of Object.entries(found.points)) {
        expect(distance(at, theirs[name] ?? { x: 9e9, y: 0 }), name).toBeLessThan(1e-6);
      }
    }
    expect(compared).toBeGreaterThan(30);
  });

  it.each(Object.entries(drawnLinkages))(
    '%s: set out far from our answer, finds that one or another assembly of the same bars',
    (_name, drawn) => {
      const drawings = fc.sample(drawn, { seed: 20240612, numRuns: 60 });
      let [same, other] = [0, 0];
      for (const { linkage, drive } of drawings) {
        const planned = planLinkage(linkage);
        if (planned.outcome !== 'planned') throw new Error(planned.outcome);
        const found = solveLinkage(planned.plan, drive);
        if (found.outcome !== 'closes' || found.slack < 0.5) continue;
        const guess = disturbed(found.points, linkage.fixed, planned.plan.model.size / 20);
        const theirs = oraclePoints(oracle, linkage, drive, guess);
        if (!theirs) continue;
        const away = (name: string, at: Point) => distance(at, theirs[name] ?? { x: 9e9, y: 0 });
        const off = Object.entries(found.points).map(([name, at]) => away(name, at));
        if (Math.max(...off) < 1e-6) same += 1;
        else other += 1;
        for (const { ends, length } of linkage.bars ?? []) {
          const long = away(ends[0], theirs[ends[1]] ?? { x: -9e9, y: 0 });
          expect(Math.abs(long - length)).toBeLessThan(1e-6);
        }
      }
      expect(same).toBeGreaterThan(5);
      expect(same + other).toBeGreaterThan(15);
    },
  );
});
