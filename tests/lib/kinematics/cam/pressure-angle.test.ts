import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastFlatBaseRadius, pitchCurvature, sharpestBend } from '@/lib/kinematics/cam/curvature';
import { guideUnder, jammingAngle } from '@/lib/kinematics/cam/guide';
import { motionLaws } from '@/lib/kinematics/cam/motion-law';
import {
  greatestPressureAngle,
  leastBaseRadius,
  midRiseBaseRadius,
  pressureAngle,
} from '@/lib/kinematics/cam/pressure-angle';
import { riseMotion } from '@/lib/kinematics/cam/rise';
import { restHeight } from '@/lib/kinematics/cam/translating-roller';
import { between, expectNear, outcome, runs } from '@/tests/support/numbers';

const degree = Math.PI / 180;
const shm = { law: 'simple-harmonic', lift: 30, angle: 70 * degree } as const;
const cycloidal = { law: 'cycloidal', lift: 25, angle: 120 * degree } as const;
const law = fc.constantFrom(...motionLaws);

describe('the pressure angle', () => {
  it('is that of the worked example: base 41.81 mm leans 30.65°, 43.5 mm 29.99°', () => {
    expect(midRiseBaseRadius(shm, 10, 30 * degree)).toBeCloseTo(41.81, 2);
    const lean = (baseRadius: number) =>
      outcome(greatestPressureAngle(shm, { baseRadius, rollerRadius: 10, offset: 0 }), 'leans')
        .angle / degree;
    expect(Math.abs(lean(41.81) - 30.65)).toBeLessThan(0.006);
    expect(lean(43.5)).toBeCloseTo(29.99, 2);
  });

  it('at its greatest is nowhere exceeded and is taken where it says', () => {
    fc.assert(
      fc.property(
        law,
        between(5, 40),
        between(0.5, 3),
        between(-10, 10),
        (name, lift, angle, offset) => {
          const rise = { law: name, lift, angle };
          const follower = { baseRadius: 30, rollerRadius: 8, offset };
          const most = outcome(greatestPressureAngle(rise, follower), 'leans');
          const at = outcome(pressureAngle(rise, follower, most.at), 'leans').angle;
          expectNear(at, most.angle, 1e-12, 1);
          for (let i = 0; i <= 50; i += 1) {
            const here = outcome(pressureAngle(rise, follower, angle * (i / 50)), 'leans').angle;
            expect(here).toBeLessThanOrEqual(most.angle + 1e-9);
          }
        },
      ),
      { ...runs, numRuns: 100 },
    );
  });

  it('falls on the side to which an offset goes with the rise', () => {
    const lean = (offset: number) =>
      outcome(pressureAngle(cycloidal, { baseRadius: 45, rollerRadius: 10, offset }, 1), 'leans')
        .angle;
    expect(lean(8)).toBeLessThan(lean(0));
    expect(lean(-8)).toBeGreaterThan(lean(0));
  });

  it('grows with the size of nothing: scaled by 1e±9 it stays', () => {
    for (const size of [1e-9, 1e9]) {
      const rise = { ...cycloidal, lift: 25 * size };
      const follower = { baseRadius: 45 * size, rollerRadius: 10 * size, offset: 8 * size };
      const most = outcome(greatestPressureAngle(rise, follower), 'leans');
      expectNear(most.angle / degree, 13.4677450474, 1e-9);
    }
  });

  it('has no answer for a follower that passes beside the prime circle, by the gap', () => {
    const wide = { baseRadius: 20, rollerRadius: 5, offset: -26 };
    const gap = { outcome: 'out-of-reach', gap: 1 };
    expect(restHeight(wide)).toEqual(gap);
    expect(pressureAngle(cycloidal, wide, 1)).toEqual(gap);
    expect(greatestPressureAngle(cycloidal, wide)).toEqual(gap);
    expect(pitchCurvature(cycloidal, wide, 1)).toEqual(gap);
    expect(sharpestBend(cycloidal, wide)).toEqual(gap);
  });

  it('is undone by the least base radius', () => {
    fc.assert(
      fc.property(
        law,
        between(10, 40),
        between(0.6, 2),
        between(-8, 8),
        between(0.2, 0.8),
        (name, lift, angle, offset, allowed) => {
          const rise = { law: name, lift, angle };
          const roller = { rollerRadius: 6, offset };
          const baseRadius = leastBaseRadius(rise, roller, allowed);
          if (baseRadius === 0) return;
          const most = greatestPressureAngle(rise, { ...roller, baseRadius });
          if (most.outcome === 'leans') expectNear(most.angle, allowed, 1e-8, 1);
          else expectNear(Math.abs(offset), baseRadius + 6, 1e-9);
        },
      ),
      { ...runs, numRuns: 150 },
    );
  });

  it('allows any base for a rise that is gentle anyway', () => {
    expect(leastBaseRadius({ ...cycloidal, lift: 0 }, { rollerRadius: 5, offset: 0 }, 0.5)).toBe(0);
    expect(midRiseBaseRadius({ ...cycloidal, lift: 0 }, 5, 0.5)).toBe(0);
  });

  it('refuses angles that no push can have', () => {
    const roller = { rollerRadius: 5, offset: 0 };
    expect(() => leastBaseRadius(cycloidal, roller, 0)).toThrow('allowed is 0');
    expect(() => midRiseBaseRadius(cycloidal, 5, 2)).toThrow('allowed is 2');
    expect(() => pressureAngle(cycloidal, { baseRadius: 0, ...roller }, 1)).toThrow(
      'baseRadius is 0',
    );
  });
});

describe('the curvature of the roller’s path', () => {
  it('is the formula of the books where the follower runs in line', () => {
    fc.assert(
      fc.property(law, between(0, 1), between(5, 40), between(0.5, 3), (name, u, lift, angle) => {
        const rise = { law: name, lift, angle };
        const follower = { baseRadius: 40, rollerRadius: 10, offset: 0 };
        const { position, velocity: v, acceleration: a } = riseMotion(rise, u * angle);
        const y = 50 + position;
        const curve = outcome(pitchCurvature(rise, follower, u * angle), 'curves');
        expectNear(
          curve.curvature,
          (y * y + 2 * v * v - y * a) / (y * y + v * v) ** 1.5,
          1e-11,
          1e-2,
        );
      }),
      runs,
    );
  });

  it('agrees with the circle through three neighbouring points of an offset follower’s path', () => {
    const follower = { baseRadius: 45, rollerRadius: 10, offset: 8 };
    const height = outcome(restHeight(follower), 'rests').height;
    const at = (turned: number) => {
      const y = height + riseMotion(cycloidal, turned).position;
      const [c, s] = [Math.cos(turned), Math.sin(turned)];
      return { x: 8 * c + y * s, y: y * c - 8 * s };
    };
    for (const turned of [0.3, 0.9, 1.4, 1.9]) {
      const [p, q, r] = [at(turned - 1e-3), at(turned), at(turned + 1e-3)];
      const area = (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
      const sides =
        Math.hypot(q.x - p.x, q.y - p.y) *
        Math.hypot(r.x - q.x, r.y - q.y) *
        Math.hypot(r.x - p.x, r.y - p.y);
      // drawn clockwise, so a bulge turns right
      expectNear(
        outcome(pitchCurvature(cycloidal, follower, turned), 'curves').curvature,
        (-2 * area) / sides,
        1e-5,
      );
    }
  });

  it('finds the sharper half of the parabolic law, which jumps at mid-rise', () => {
    const rise = { law: 'parabolic', lift: 20, angle: 1 } as const;
    const bend = outcome(
      sharpestBend(rise, { baseRadius: 60, rollerRadius: 5, offset: 0 }),
      'clean',
    );
    expect(bend.at).toBeGreaterThanOrEqual(0.5);
    const [y, v] = [75, 40];
    expectNear(
      Number(bend.pitchRadius),
      (y * y + v * v) ** 1.5 / (y * y + 2 * v * v + y * 80),
      1e-6,
    );
  });

  it('says by how much a roller is too large for its bend', () => {
    const follower = { baseRadius: 26, rollerRadius: 18, offset: 0 };
    const bend = outcome(
      sharpestBend({ law: 'cycloidal', lift: 30, angle: 45 * degree }, follower),
      'undercut',
    );
    expectNear(bend.by, 1.42184994809, 1e-9);
    expectNear(bend.pitchRadius - 18, bend.rimRadius, 1e-12);
  });

  it('never calls a knife edge undercut', () => {
    const sharp = { baseRadius: 5, rollerRadius: 0, offset: 0 };
    expect(sharpestBend({ law: 'cycloidal', lift: 30, angle: 0.3 }, sharp).outcome).toBe('clean');
  });

  it('gives a flat face the least base that leaves its rim convex enough', () => {
    fc.assert(
      fc.property(
        law,
        between(10, 40),
        between(0.8, 2),
        between(0, 10),
        (name, lift, angle, radius) => {
          const rise = { law: name, lift, angle };
          const base = leastFlatBaseRadius(rise, radius);
          const rims = Array.from({ length: 2001 }, (_, i) =>
            riseMotion(rise, angle * (i / 2000)),
          ).map(({ position, acceleration }) => base + position + acceleration);
          const least = rims.reduce((a, b) => Math.min(a, b));
          expect(least).toBeGreaterThanOrEqual(radius - 1e-6 * lift);
          if (base > 0) expectNear(least, radius, 1e-2, lift);
        },
      ),
      { ...runs, numRuns: 100 },
    );
  });
});

describe('the guide of a follower', () => {
  it('jams where its two edge forces rub as much as the cam pushes', () => {
    fc.assert(
      fc.property(
        between(20, 150),
        between(0, 120),
        between(0.1, 0.6),
        (length, overhang, friction) => {
          const angle = jammingAngle({ length, overhang, friction });
          const side = Math.sin(angle);
          const edges = (side * (overhang + length)) / length + (side * overhang) / length;
          expectNear(friction * edges, Math.cos(angle), 1e-12, 1);
        },
      ),
      runs,
    );
  });

  it('never jams without friction short of square, and says what is to spare', () => {
    const smooth = { length: 80, overhang: 40, friction: 0 };
    expect(jammingAngle(smooth)).toBe(Math.PI / 2);
    expect(outcome(guideUnder(smooth, -0.5), 'slides').spare).toBeCloseTo(Math.PI / 2 - 0.5, 14);
    expect(outcome(guideUnder({ ...smooth, friction: 0.5 }, -0.9), 'jams').by).toBeCloseTo(
      0.9 - Math.PI / 4,
      14,
    );
  });

  it('refuses a guide that is none', () => {
    expect(() => jammingAngle({ length: 0, overhang: 1, friction: 1 })).toThrow('length is 0');
    expect(() => guideUnder({ length: 1, overhang: 1, friction: 1 }, 2)).toThrow(
      'pressureAngle is 2',
    );
  });
});
