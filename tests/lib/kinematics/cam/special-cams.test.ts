import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pathLength } from '@/lib/geometry/curve';
import {
  constantBreadth,
  constantBreadthOutline,
  constantBreadthPerimeter,
  jawDistance,
} from '@/lib/kinematics/cam/constant-breadth';
import { fallAngle, fallTime, hangAngle, landing } from '@/lib/kinematics/cam/drop';
import { eccentricLift, woodBesideHole } from '@/lib/kinematics/cam/eccentric';
import { heartCam, snailOutline, spiralAngle, spiralAt } from '@/lib/kinematics/cam/snail';
import { tangentCamAction, tangentCamMotion } from '@/lib/kinematics/cam/tangent-cam';
import { between, derivative, expectNear, outcome, runs, whole } from '@/tests/support/numbers';

const degree = Math.PI / 180;

describe('an eccentric', () => {
  it('lifts a roller as a crank-slider does and a flat face as a Scotch yoke', () => {
    fc.assert(
      fc.property(
        between(10, 60),
        between(0, 0.99),
        between(0, 20),
        between(-10, 10),
        (radius, part, roller, turned) => {
          const e = radius * part;
          const lift = outcome(
            eccentricLift({ discRadius: radius, eccentricity: e }, roller, turned),
            'lifts',
          );
          const rod = radius + roller;
          const slider = -e * Math.cos(turned) + Math.sqrt(rod ** 2 - (e * Math.sin(turned)) ** 2);
          expectNear(lift.roller, slider - (rod - e), 1e-11, rod);
          expectNear(lift.flat, e * (1 - Math.cos(turned)), 1e-11, rod);
          expect(lift.full).toBe(2 * e);
        },
      ),
      runs,
    );
  });

  it('says by how much its axle lies outside, or its hole breaks through', () => {
    expect(eccentricLift({ discRadius: 20, eccentricity: 23 }, 5, 1)).toEqual({
      outcome: 'axle-outside',
      by: 3,
    });
    expect(woodBesideHole({ discRadius: 20, eccentricity: 15 }, 12)).toEqual({
      outcome: 'breaks-through',
      by: 1,
    });
  });

  it.each([1e-9, 1e9])('keeps its digits at the size %s', (size) => {
    const lift = eccentricLift(
      { discRadius: 30 * size, eccentricity: 10 * size },
      8 * size,
      75 * degree,
    );
    expectNear(outcome(lift, 'lifts').roller, 6.16366296905 * size, 1e-11);
  });

  it('refuses nonsense', () => {
    expect(() => eccentricLift({ discRadius: 0, eccentricity: 0 }, 0, 0)).toThrow(
      'discRadius is 0',
    );
    expect(() => eccentricLift({ discRadius: 1, eccentricity: -1 }, 0, 0)).toThrow(
      'eccentricity is -1',
    );
    expect(() => woodBesideHole({ discRadius: 1, eccentricity: 0 }, -3)).toThrow(
      'holeDiameter is -3',
    );
  });
});

describe('a tangent cam', () => {
  const cam = { baseRadius: 30, noseRadius: 10, lift: 18 };
  const action = outcome(tangentCamAction(cam, 12), 'turns');
  const at = (turned: number, speed = 1) =>
    outcome(tangentCamMotion(cam, 12, turned, speed), 'moves');

  it('goes from base to flank to nose and back', () => {
    expect(at(-0.1).on).toBe('base');
    expect(at(0.3).on).toBe('flank');
    expect(at(action.halfAction).on).toBe('nose');
    expect(at(2 * action.halfAction - 0.3).on).toBe('flank');
    expect(at(2 * action.halfAction + 0.1).on).toBe('base');
    expect(at(action.halfAction).motion.position).toBeCloseTo(18, 12);
  });

  it('joins its parts without a step of height or speed', () => {
    for (const seam of [
      0,
      action.flankEnd,
      2 * action.halfAction - action.flankEnd,
      2 * action.halfAction,
    ]) {
      const [before, after] = [at(seam - 1e-9).motion, at(seam + 1e-9).motion];
      expect(after.position).toBeCloseTo(before.position, 6);
      expect(after.velocity).toBeCloseTo(before.velocity, 5);
    }
  });

  it('has the derivatives that it says, and mirrors its rise', () => {
    for (const turned of [0.1, 0.4, 0.6, 0.75, 0.95, 1.05, 1.3, 1.6, 1.9]) {
      const position = (x: number) => at(x).motion.position;
      const velocity = (x: number) => at(x).motion.velocity;
      expectNear(derivative(position, turned), at(turned).motion.velocity, 1e-7, 10);
      expectNear(derivative(velocity, turned), at(turned).motion.acceleration, 1e-6, 50);
      const mirror = at(2 * action.halfAction - turned).motion;
      expectNear(mirror.position, at(turned).motion.position, 1e-11, 10);
      expectNear(mirror.velocity, -at(turned).motion.velocity, 1e-11, 10);
      expectNear(at(turned, 3).motion.acceleration, 9 * at(turned).motion.acceleration, 1e-12, 10);
    }
  });

  it('needs a nose smaller than its base, and says by how much', () => {
    const blunt = { baseRadius: 10, noseRadius: 12, lift: 5 };
    expect(tangentCamAction(blunt, 4)).toEqual({ outcome: 'nose-too-large', by: 2 });
    expect(tangentCamMotion(blunt, 4, 0.1)).toEqual({ outcome: 'nose-too-large', by: 2 });
  });

  it('comes to a point under a knife edge', () => {
    const sharp = { baseRadius: 30, noseRadius: 0, lift: 18 };
    const tip = outcome(tangentCamAction(sharp, 0), 'turns');
    expectNear(tip.flankEnd, tip.halfAction, 1e-12);
    expect(
      outcome(tangentCamMotion(sharp, 0, tip.halfAction), 'moves').motion.position,
    ).toBeCloseTo(18, 10);
  });

  it('refuses nonsense', () => {
    expect(() => tangentCamAction({ ...cam, lift: 0 }, 12)).toThrow('lift is 0');
    expect(() => tangentCamMotion(cam, -1, 0)).toThrow('rollerRadius is -1');
    expect(() => tangentCamMotion(cam, 1, Number.NaN)).toThrow('turned is NaN');
  });
});

describe('a spiral', () => {
  const snail = { startRadius: 25, lift: 30, angle: 300 * degree };

  it('is that of the worked example: 37 mm after 120°, 12.9° at the low end', () => {
    expect(spiralAt(snail, 120 * degree).radius).toBeCloseTo(37, 12);
    expect(spiralAt(snail, 0).pressureAngle / degree).toBeCloseTo(12.9, 1);
  });

  it('leans as its own curve does', () => {
    const radius = (x: number) => spiralAt(snail, x).radius;
    for (const turned of [0.1, 1, 3, 5]) {
      const { pressureAngle, radius: r } = spiralAt(snail, turned);
      expectNear(Math.tan(pressureAngle), derivative(radius, turned) / r, 1e-9);
    }
  });

  it('is undone by its inverse, and says how far beyond its ends a radius lies', () => {
    fc.assert(
      fc.property(between(0, 1), (share) => {
        const { radius } = spiralAt(snail, share * snail.angle);
        const back = spiralAngle(snail, Math.min(55, radius));
        expectNear(outcome(back, 'reaches').turned, share * snail.angle, 1e-12, 1);
      }),
      runs,
    );
    expect(spiralAngle(snail, 24)).toEqual({ outcome: 'beyond-the-ends', by: 1 });
    expect(spiralAngle(snail, 57)).toEqual({ outcome: 'beyond-the-ends', by: 2 });
  });

  it('makes a heart of two halves that mirror one another', () => {
    const heart = { startRadius: 25, lift: 40 };
    fc.assert(
      fc.property(between(0.001, 3.14), whole(-3, 3), (turned, turns) => {
        const up = heartCam(heart, turned);
        const down = heartCam(heart, turns * 2 * Math.PI - turned);
        expectNear(down.radius, up.radius, 1e-11);
        expectNear(down.pressureAngle, -up.pressureAngle, 1e-11);
        expectNear(up.radius, 25 + (40 * turned) / Math.PI, 1e-12);
      }),
      runs,
    );
  });

  it('refuses nonsense', () => {
    expect(() => spiralAt(snail, 6)).toThrow('turned is 6');
    expect(() => spiralAt({ ...snail, angle: 0 }, 0)).toThrow('angle is 0');
    expect(() => spiralAngle({ ...snail, lift: 0 }, 25)).toThrow('lift is 0');
    expect(() => heartCam({ startRadius: 0, lift: 1 }, 0)).toThrow('startRadius is 0');
  });
});

describe('a snail', () => {
  const four = { startRadius: 30, lift: 12, lobes: 4, rest: 0.3 };

  it('repeats itself by lobes and stays between its radii', () => {
    const { points, slopeAngle } = outcome(snailOutline(four, 0.1, 20), 'outlined');
    expect(slopeAngle).toBeCloseTo(Math.PI / 2 - 0.3, 14);
    const quarter = points.length / 4;
    points.slice(0, quarter).forEach((point, i) => {
      const next = points[i + quarter];
      expect(next?.x).toBeCloseTo(point.y, 10);
      expect(next?.y).toBeCloseTo(-point.x, 10);
      const radius = Math.hypot(point.x, point.y);
      expect(radius).toBeGreaterThan(30 - 1e-9);
      expect(radius).toBeLessThan(42 + 1e-9);
    });
  });

  it('grows clockwise, so that it lifts while it turns counter-clockwise', () => {
    const { points } = outcome(snailOutline({ ...four, lobes: 1, rest: 0 }, 0, 40), 'outlined');
    const radii = points.map((point) => Math.hypot(point.x, point.y));
    radii
      .slice(1)
      .forEach((radius, i) => expect(radius).toBeGreaterThanOrEqual((radii[i] ?? 0) - 1e-9));
    expect(points[10]?.x).toBeGreaterThan(0);
  });

  it('says what angle its slope, its rest or its step lacks', () => {
    expect(outcome(snailOutline({ ...four, rest: 1.7 }), 'no-room').by).toBeCloseTo(
      1.7 - Math.PI / 2,
      12,
    );
    expect(outcome(snailOutline(four, 0.5), 'no-room').by).toBeCloseTo(0.2, 12);
    expect(outcome(snailOutline({ ...four, rest: 1.4 }, -0.5), 'no-room').by).toBeCloseTo(
      0.5 - (Math.PI / 2 - 1.4),
      12,
    );
  });

  it('refuses nonsense', () => {
    expect(() => snailOutline({ ...four, lobes: 1.5 })).toThrow('lobes is 1.5');
    expect(() => snailOutline(four, 2)).toThrow('lean is 2');
    expect(() => snailOutline(four, 0, 1)).toThrow('steps is 1');
  });
});

describe('a drop', () => {
  it('is that of the worked example: 78.2 ms, 18.8°, hang 6.3°, rest 25.0°', () => {
    const speed = 40 * (Math.PI / 30);
    expect(fallTime(30, 9810) * 1000).toBeCloseTo(78.2, 1);
    expect(fallAngle(30, 9810, speed) / degree).toBeCloseTo(18.8, 1);
    expect(outcome(hangAngle(6, 55), 'lets-go').angle / degree).toBeCloseTo(6.3, 1);
    const cam = { height: 30, noseRadius: 55, rollerRadius: 6, rest: 26 * degree, slope: 5 };
    const landed = outcome(landing(cam, 9810, speed), 'lands-on-the-rest');
    expect(landed.needed / degree).toBeCloseTo(25.0, 1);
    expect(landed.spare).toBeCloseTo(26 * degree - landed.needed, 12);
  });

  it('meets the next hill where fall and slope have one height', () => {
    fc.assert(
      fc.property(
        between(5, 60),
        between(0, 0.5),
        between(0.5, 5),
        between(2, 60),
        (height, rest, slope, speed) => {
          const cam = { height, noseRadius: 55, rollerRadius: 4, rest, slope };
          const landed = landing(cam, 9810, speed);
          if (landed.outcome !== 'strikes-the-hill') return;
          const hang = Math.asin(4 / 55);
          const time = (rest + landed.up - hang) / speed;
          if (landed.up > 0 && time > 0)
            expectNear(height - (9810 * time * time) / 2, landed.height, 1e-9, height);
          expectNear(landed.height, (height * landed.up) / slope, 1e-12, height);
          expect(landed.needed).toBeGreaterThan(rest);
        },
      ),
      runs,
    );
  });

  it('is ridden down no further than the hill has already come when it lets go', () => {
    const late = { height: 10, noseRadius: 10, rollerRadius: 10, rest: 0.1, slope: 0.5 };
    expect(outcome(landing(late, 9810, 5), 'strikes-the-hill').height).toBe(10);
  });

  it('never happens to a roller larger than the nose stands out', () => {
    expect(hangAngle(12, 10)).toEqual({ outcome: 'never-lets-go', by: 2 });
    expect(
      landing({ height: 5, noseRadius: 10, rollerRadius: 12, rest: 1, slope: 1 }, 9810, 1),
    ).toEqual({ outcome: 'never-lets-go', by: 2 });
  });

  it('refuses nonsense', () => {
    expect(() => fallTime(-1, 9810)).toThrow('height is -1');
    expect(() => fallTime(1, 0)).toThrow('gravity is 0');
    expect(() => fallAngle(1, 1, 0)).toThrow('speed is 0');
    expect(() =>
      landing({ height: 5, noseRadius: 10, rollerRadius: 1, rest: -1, slope: 1 }, 1, 1),
    ).toThrow('rest is -1');
  });
});

describe('a cam of constant breadth', () => {
  const cam = { side: 60, cornerRadius: 8 };

  it('is equally broad in every direction, about any axle', () => {
    fc.assert(
      fc.property(
        between(1, 100),
        between(0, 30),
        between(-10, 10),
        (side, cornerRadius, direction) => {
          expectNear(
            constantBreadth({ side, cornerRadius }, direction),
            side + 2 * cornerRadius,
            1e-12,
          );
          const axle = { x: 3, y: -5 };
          const jaws =
            jawDistance(cam, direction, axle) + jawDistance(cam, direction + Math.PI, axle);
          expectNear(jaws, 76, 1e-12);
        },
      ),
      runs,
    );
  });

  it('touches its jaws with its outline and is as long round as Barbier says', () => {
    const outline = constantBreadthOutline(cam, 3600);
    for (const direction of [0.2, 0.9, 1.7, 3, 4.4, 5.8]) {
      const reach = outline.map(({ x, y }) => x * Math.cos(direction) + y * Math.sin(direction));
      expectNear(
        reach.reduce((a, b) => Math.max(a, b)),
        jawDistance(cam, direction),
        1e-6,
      );
    }
    const [first] = outline;
    expectNear(
      pathLength([...outline, ...(first ? [first] : [])]),
      constantBreadthPerimeter(cam),
      1e-6,
    );
  });

  it('lets its jaw stand still for two sixths of a turn on a corner axle', () => {
    const corner = { x: 60 / Math.sqrt(3), y: 0 };
    for (const direction of [-0.5, 0, 0.5])
      expect(jawDistance(cam, direction, corner)).toBeCloseTo(8, 12);
    for (const direction of [2.7, Math.PI, 3.6])
      expect(jawDistance(cam, direction, corner)).toBeCloseTo(68, 12);
  });

  it('refuses nonsense', () => {
    expect(() => constantBreadth({ side: 0, cornerRadius: 1 })).toThrow('side is 0');
    expect(() => jawDistance(cam, Number.NaN)).toThrow('direction is NaN');
    expect(() => constantBreadthOutline(cam, 3)).toThrow('steps is 3');
  });
});
