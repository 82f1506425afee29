import { describe, expect, it } from 'vitest';
import type { Point } from '@/lib/geometry/point';
import { involute, pressureAngleAt } from '@/lib/kinematics/gear/involute';
import { centreDistance, meshPhase } from '@/lib/kinematics/gear/mesh';
import { involuteOutline, toothLimits } from '@/lib/kinematics/gear/outline';
import type { ToothLimits } from '@/lib/kinematics/gear/outline';
import { rackOutline, rackPlace, rackTeethForTravel, rackTravel } from '@/lib/kinematics/gear/rack';
import { ringOutline, ringPassage, ringProportions } from '@/lib/kinematics/gear/ring';
import { degree } from './gears';

const alpha = 20 * degree;

/** How deep a point lies in the wood of an outside wheel, along the arc; negative outside. */
function depthInWheel(teeth: number, module: number, limits: ToothLimits, { x, y }: Point): number {
  const radius = Math.hypot(x, y);
  const { formRadius, tipRadius } = limits;
  if (radius < formRadius || radius > tipRadius) return Number.NEGATIVE_INFINITY;
  const base = ((module * teeth) / 2) * Math.cos(alpha);
  const half = Math.PI / 2 / teeth + involute(alpha) - involute(pressureAngleAt(base, radius));
  const pitch = (2 * Math.PI) / teeth;
  const angle = Math.atan2(y, x);
  return radius * (half - Math.abs(angle - pitch * Math.round(angle / pitch)));
}

/** The same for a ring. */
function depthInRing(teeth: number, module: number, { x, y }: Point): number {
  const radius = Math.hypot(x, y);
  const { tipDiameter, rootDiameter } = ringProportions({ module, teeth, pressureAngle: alpha });
  if (radius < tipDiameter / 2) return Number.NEGATIVE_INFINITY;
  if (radius > rootDiameter / 2) return radius - rootDiameter / 2;
  const base = ((module * teeth) / 2) * Math.cos(alpha);
  const half =
    Math.PI / teeth -
    (Math.PI / 2 / teeth + involute(alpha)) +
    involute(pressureAngleAt(base, radius));
  const pitch = (2 * Math.PI) / teeth;
  const angle = Math.atan2(y, x);
  return radius * (half - Math.abs(angle - pitch * Math.round(angle / pitch)));
}

/** A point of one wheel, seen from another that stands at `centre`, turned by `own`. */
function seen(point: Point, turned: number, centre: Point, own: number): Point {
  const [c, s] = [Math.cos(turned), Math.sin(turned)];
  const [x, y] = [point.x * c - point.y * s - centre.x, point.x * s + point.y * c - centre.y];
  const [co, so] = [Math.cos(-own), Math.sin(-own)];
  return { x: x * co - y * so, y: x * so + y * co };
}

describe('wheels in mesh', () => {
  it.each([
    [20, 30, 0.4],
    [17, 90, 2.1],
    [31, 24, -1.3],
  ])('of %i and %i teeth touch without cutting, all the way round', (z1, z2, line) => {
    const outline = involuteOutline({ module: 2, teeth: z1, pressureAngle: alpha, flankSteps: 60 });
    const limits = toothLimits({ module: 2, teeth: z2, pressureAngle: alpha });
    const distance = centreDistance({ module: 2, firstTeeth: z1, secondTeeth: z2 });
    const centre = { x: distance * Math.cos(line), y: distance * Math.sin(line) };
    for (let angle = 0; angle < 0.5; angle += 0.05) {
      const own = meshPhase({ firstTeeth: z1, secondTeeth: z2 }, angle, line);
      const deepest = outline.reduce(
        (most, point) =>
          Math.max(most, depthInWheel(z2, 2, limits, seen(point, angle, centre, own))),
        Number.NEGATIVE_INFINITY,
      );
      expect(deepest).toBeLessThan(1e-9);
      expect(deepest).toBeGreaterThan(-2e-3);
    }
  });

  it('of 40 teeth in a ring of 100 touch along their flanks without cutting', () => {
    const spec = { module: 2, teeth: 40, pressureAngle: alpha };
    const { formRadius } = toothLimits(spec);
    const flanks = involuteOutline({ ...spec, flankSteps: 60 }).filter(
      ({ x, y }) => Math.hypot(x, y) >= formRadius,
    );
    const distance = centreDistance({
      module: 2,
      firstTeeth: 40,
      secondTeeth: 100,
      ring: 'second',
    });
    for (let angle = 0; angle < 0.5; angle += 0.05) {
      const centre = { x: distance, y: 0 };
      const own = meshPhase({ firstTeeth: 40, secondTeeth: 100, ring: 'second' }, angle, 0);
      const deepest = flanks.reduce(
        (most, point) => Math.max(most, depthInRing(100, 2, seen(point, angle, centre, own))),
        Number.NEGATIVE_INFINITY,
      );
      expect(deepest).toBeLessThan(1e-9);
      expect(deepest).toBeGreaterThan(-2e-3);
    }
  });

  it('of a pinion and a rack touch without cutting', () => {
    const [slope, pitch] = [Math.tan(alpha), 2 * Math.PI];
    const outline = involuteOutline({ module: 2, teeth: 20, pressureAngle: alpha, flankSteps: 60 });
    for (let angle = -2; angle < -1; angle += 0.07) {
      const place = rackPlace({ module: 2, teeth: 20 }, angle);
      const deepest = outline.reduce((most, point) => {
        const { x, y } = seen(point, angle, { x: place, y: -20 }, 0);
        if (y > 2 || y < -2.4) return most;
        const off = Math.abs(x - pitch * Math.round(x / pitch));
        return Math.max(most, (pitch / 4 - y * slope - off) * Math.cos(alpha));
      }, Number.NEGATIVE_INFINITY);
      expect(deepest).toBeLessThan(1e-9);
      expect(deepest).toBeGreaterThan(-2e-3);
    }
  });
});

describe('a rack', () => {
  it('is a closed bar with its teeth on the pitch, thinned by the backlash', () => {
    const outline = rackOutline({
      module: 2,
      teeth: 5,
      pressureAngle: alpha,
      backlash: 0.2,
      back: 6,
    });
    expect(outline).toHaveLength(4 * 5 + 4);
    const area = outline.reduce((sum, { x, y }, index) => {
      const next = outline[(index + 1) % outline.length] ?? { x, y };
      return sum + (x * next.y - next.x * y) / 2;
    }, 0);
    const thickness = Math.PI - 0.2;
    const tooth = (thickness - 4 * Math.tan(alpha) + thickness + 5 * Math.tan(alpha)) / 2;
    expect(area).toBeCloseTo(5 * 2 * Math.PI * 6 + 5 * tooth * 4.5, 9);
    expect(Math.max(...outline.map(({ y }) => y))).toBe(2);
    expect(Math.min(...outline.map(({ y }) => y))).toBe(-8.5);
  });

  it('needs a tooth for each pitch of travel and one at either end', () => {
    expect(rackTeethForTravel({ module: 3 }, 0)).toBe(2);
    expect(rackTeethForTravel({ module: 3 }, 3 * Math.PI)).toBe(3);
    expect(rackTeethForTravel({ module: 3 }, 3 * Math.PI + 0.01)).toBe(4);
    expect(rackTravel({ module: 5, teeth: 12 }, 2 * Math.PI)).toBeCloseTo(188.4955592, 6);
  });

  it('is refused when its teeth or spaces would vanish', () => {
    const rack = { module: 2, teeth: 5, pressureAngle: alpha };
    expect(() => rackOutline({ ...rack, backlash: 4 })).toThrow('half width of the tip');
    expect(() => rackOutline({ ...rack, backlash: -3 })).toThrow('half width of the space');
    expect(() => rackOutline({ ...rack, teeth: 0 })).toThrow('teeth is 0');
  });
});

describe('a ring', () => {
  it('has a tooth on +x, and runs once round between tips and roots', () => {
    const outline = ringOutline({ module: 3, teeth: 40, pressureAngle: alpha });
    const radii = outline.map(({ x, y }) => Math.hypot(x, y));
    expect(Math.min(...radii)).toBeCloseTo(57, 9);
    expect(Math.max(...radii)).toBeCloseTo(63.75, 9);
    expect(outline.some(({ x, y }) => Math.abs(x - 57) < 1e-9 && y === 0)).toBe(true);
    const turned = outline.reduce((sum, { x, y }, index) => {
      const next = outline[(index + 1) % outline.length] ?? { x, y };
      return sum + Math.atan2(x * next.y - y * next.x, x * next.x + y * next.y);
    }, 0);
    expect(turned).toBeCloseTo(2 * Math.PI, 9);
  });

  it('of few teeth ends them at the base circle', () => {
    const outline = ringOutline({ module: 3, teeth: 24, pressureAngle: alpha });
    const least = Math.min(...outline.map(({ x, y }) => Math.hypot(x, y)));
    expect(least).toBeCloseTo(36 * Math.cos(alpha), 9);
  });

  it('fouls a pinion of nearly its count, as turning the outlines shows', () => {
    const turnsFree = (pinion: number, ring: number): boolean => {
      const tips = involuteOutline({ module: 1, teeth: pinion, pressureAngle: alpha }).filter(
        ({ x, y }) => Math.hypot(x, y) > pinion / 2,
      );
      const distance = centreDistance({
        module: 1,
        firstTeeth: pinion,
        secondTeeth: ring,
        ring: 'second',
      });
      const teeth = { firstTeeth: pinion, secondTeeth: ring, ring: 'second' as const };
      return Array.from({ length: 24 }, (_, step) => (step / 24) * ((2 * Math.PI) / pinion)).every(
        (angle) => {
          const own = meshPhase(teeth, angle, 0);
          return tips.every(
            (point) => depthInRing(ring, 1, seen(point, angle, { x: distance, y: 0 }, own)) < 1e-4,
          );
        },
      );
    };
    for (const pinion of [20, 40, 48, 51, 53, 55, 57]) {
      const passage = ringPassage({ module: 1, teeth: 60, pressureAngle: alpha }, pinion);
      expect([pinion, passage.outcome]).toEqual([
        pinion,
        turnsFree(pinion, 60) ? 'passes' : 'fouls',
      ]);
    }
  });

  it('has every tooth’s root on the root circle, five places and no more', () => {
    const ring = { module: 3, teeth: 40, pressureAngle: alpha };
    const { rootDiameter } = ringProportions(ring);
    const outline = ringOutline(ring);
    const [half, pitch] = [rootDiameter / 2, (2 * Math.PI) / 40];
    const onRoot = outline.filter(({ x, y }) => Math.abs(Math.hypot(x, y) - half) < 1e-9);
    expect(onRoot.length).toBe(5 * 40);
    // The first five, round the tooth on +x: alike on both sides, the last in the middle of the space.
    const [before = 0, left = 0, right = 0, after = 0, middle = 0] = onRoot.map(({ x, y }) =>
      Math.atan2(y, x),
    );
    expect(middle).toBeCloseTo(pitch / 2, 12);
    expect(before).toBeCloseTo(-after, 12);
    expect(left).toBeCloseTo(-right, 12);
    expect(after).toBeCloseTo((right + middle) / 2, 12);
  });

  it('is refused when it has no tooth, or its pinion is as large as itself', () => {
    const ring = { module: 1, teeth: 60, pressureAngle: alpha };
    expect(() => ringPassage(ring, 60)).toThrow('ring teeth over pinion teeth is 0');
    expect(() => ringOutline({ ...ring, backlash: 2 })).toThrow('tooth at the tip');
    expect(() => ringOutline({ ...ring, backlash: -2 })).toThrow('space at the root');
    expect(() =>
      ringProportions({ ...ring, teeth: 3, addendum: 1.6, shift: 0.3, clearance: 0 }),
    ).not.toThrow();
  });
});
