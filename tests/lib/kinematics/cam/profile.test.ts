import { describe, expect, it } from 'vitest';
import { type Point, distance, rotate } from '@/lib/geometry/point';
import { type Cam, type Follower, contactAt } from '@/lib/kinematics/cam/contact';
import { camProfile, surveyProfile } from '@/lib/kinematics/cam/profile';
import { type Segment, programmeMotion, programmeOf } from '@/lib/kinematics/cam/programme';
import { cutRim } from '@/lib/kinematics/cam/undercut';
import { swingingRollerPlace } from '@/lib/kinematics/cam/swinging';
import { derivative, expectNear, outcome } from '@/tests/support/numbers';

function programme(height: number) {
  const segments: readonly Segment[] = [
    { kind: 'rise', law: 'cycloidal', height, angle: 1.9 },
    { kind: 'dwell', angle: 0.7 },
    { kind: 'return', law: '3-4-5', height, angle: 2.1 },
  ];
  return outcome(programmeOf(segments), 'complete').programme;
}

function camOf(follower: Follower, height = 18, baseRadius = 40): Cam {
  return { programme: programme(height), baseRadius, follower };
}

function pointsOf(cam: Cam, steps = 720) {
  return outcome(camProfile(cam, steps), 'outlined').points;
}

const swing = 0.35;
const followers: readonly (readonly [string, Cam])[] = [
  ['a knife edge', camOf({ kind: 'knife-edge', offset: 0 })],
  ['a roller with offset', camOf({ kind: 'roller', radius: 9, offset: 7 })],
  ['a flat face', camOf({ kind: 'flat-face' }, 10, 40)],
  [
    'a swinging roller',
    camOf({ kind: 'swinging-roller', radius: 8, arm: 70, pivotDistance: 90 }, swing),
  ],
  [
    'a swinging roller from the left',
    camOf({ kind: 'swinging-roller', radius: 8, arm: 70, pivotDistance: -90 }, swing),
  ],
  ['a swinging face', camOf({ kind: 'swinging-face', pivotDistance: 90, faceOffset: 6 }, 0.12)],
  [
    'a swinging face from the left',
    camOf({ kind: 'swinging-face', pivotDistance: -90, faceOffset: -4 }, 0.12),
  ],
];

/** How far `point` lies inside the follower, in the follower's frame; above 0 is a clash. */
function depthIn(cam: Cam, point: Point, angle: number): number {
  const { follower, baseRadius } = cam;
  const motion = programmeMotion(cam.programme, angle);
  switch (follower.kind) {
    case 'knife-edge':
      return Number.NEGATIVE_INFINITY;
    case 'roller': {
      const height =
        Math.sqrt((baseRadius + follower.radius) ** 2 - follower.offset ** 2) + motion.position;
      return follower.radius - distance(point, { x: follower.offset, y: height });
    }
    case 'flat-face':
      return point.y - baseRadius - motion.position;
    case 'swinging-roller': {
      const arm = outcome(swingingRollerPlace(follower, baseRadius, motion), 'reaches');
      return follower.radius - distance(point, arm.place);
    }
    case 'swinging-face': {
      const turned =
        Math.asin((baseRadius - follower.faceOffset) / Math.abs(follower.pivotDistance)) +
        motion.position;
      const normal = {
        x: Math.sign(follower.pivotDistance) * Math.sin(turned),
        y: Math.cos(turned),
      };
      return (
        (point.x - follower.pivotDistance) * normal.x + point.y * normal.y - follower.faceOffset
      );
    }
  }
}

describe.each(followers)('the profile for %s', (_name, cam) => {
  const points = pointsOf(cam);

  it('is the envelope of the follower: at every angle it touches and nowhere clashes', () => {
    const rim = points.map((place) => place.rim);
    for (let i = 0; i < 24; i += 1) {
      const angle = 0.13 + (i * 2 * Math.PI) / 24;
      const depths = rim.map((point) => depthIn(cam, rotate(point, angle), angle));
      const deepest = depths.reduce((a, b) => Math.max(a, b));
      if (cam.follower.kind === 'knife-edge') return;
      expect(deepest).toBeLessThan(1e-9);
      expect(deepest).toBeGreaterThan(-0.02);
    }
  });

  it('touches exactly at the contact, square to the normal', () => {
    for (const angle of [0.4, 0.95, 1.5, 2.2, 3.3, 4.1, 5.5]) {
      const { contact } = outcome(contactAt(cam, angle), 'touches');
      if (cam.follower.kind !== 'knife-edge') {
        expect(depthIn(cam, contact.point, angle)).toBeCloseTo(0, 9);
      }
      const rimAt = (key: 'x' | 'y') => (x: number) => {
        const there = outcome(contactAt(cam, x), 'touches').contact.point;
        return rotate(there, angle - x)[key];
      };
      const along = { x: derivative(rimAt('x'), angle), y: derivative(rimAt('y'), angle) };
      const across = along.x * contact.normal.x + along.y * contact.normal.y;
      expect(Math.abs(across)).toBeLessThan(1e-6 * Math.hypot(along.x, along.y) + 1e-8);
    }
  });

  it('curves as three neighbouring points of its rim do', () => {
    for (const angle of [0.4, 0.95, 1.5, 2.2, 3.3, 4.1, 5.5]) {
      const at = (x: number) => rotate(outcome(contactAt(cam, x), 'touches').contact.point, -x);
      const [p, q, r] = [at(angle - 5e-4), at(angle), at(angle + 5e-4)];
      const area = (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
      const sides = distance(p, q) * distance(q, r) * distance(p, r);
      const { rimRadius } = outcome(contactAt(cam, angle), 'touches').contact;
      expectNear(1 / Number(rimRadius), (-2 * area) / sides, 1e-3, 0.02);
    }
  });

  it('closes on itself', () => {
    const [first, last] = [points[0], points.at(-1)];
    expect(distance(first?.rim ?? { x: 0, y: 0 }, last?.rim ?? { x: 9, y: 9 })).toBeLessThan(1e-6);
  });
});

describe('the profile of a cam', () => {
  it('is a plain circle for a follower that never rises', () => {
    const still = outcome(programmeOf([]), 'complete').programme;
    const cam: Cam = {
      programme: still,
      baseRadius: 25,
      follower: { kind: 'roller', radius: 6, offset: 4 },
    };
    for (const { rim, path } of pointsOf(cam, 60)) {
      expect(Math.hypot(rim.x, rim.y)).toBeCloseTo(25, 10);
      expect(Math.hypot(path.x, path.y)).toBeCloseTo(31, 10);
    }
  });

  it('shows both sides of a drop', () => {
    const segments: Segment[] = [
      { kind: 'rise', law: 'uniform', height: 20, angle: 5 },
      { kind: 'drop', height: 20 },
    ];
    const snail = outcome(programmeOf(segments), 'complete').programme;
    const points = pointsOf({
      programme: snail,
      baseRadius: 30,
      follower: { kind: 'knife-edge', offset: 0 },
    });
    const radii = points.map(({ rim }) => Math.hypot(rim.x, rim.y));
    expect(Math.max(...radii)).toBeCloseTo(50, 6);
    const drop = radii.findIndex((radius, i) => (radii[i - 1] ?? 0) - radius > 19.9);
    expect(points[drop]?.angle).toBeCloseTo(5, 9);
  });

  it('is surveyed for its extremes', () => {
    const cam = camOf({ kind: 'flat-face' }, 10, 40);
    const survey = surveyProfile(pointsOf(cam, 3600));
    // greatest s′: 2h/β on the cycloidal rise, 15/8·h/β on the 3-4-5 return
    expectNear(survey.contactRight, 20 / 1.9, 1e-5);
    expectNear(survey.contactLeft, -18.75 / 2.1, 1e-5);
    expectNear(survey.reach, 50, 1e-9);
    expect(survey.greatestPressureAngle).toBe(0);
    const roller = surveyProfile(pointsOf(camOf({ kind: 'roller', radius: 9, offset: 0 }), 3600));
    expect(roller.greatestPressureAngle).toBeGreaterThan(0.2);
    expect(roller.leastPressureAngle).toBeLessThan(-0.2);
  });

  it('tells at which angle a follower does not reach, and by how much', () => {
    const wide = camOf({ kind: 'roller', radius: 5, offset: 47 });
    expect(camProfile(wide)).toEqual({ outcome: 'out-of-reach', gap: 2, angle: 0 });
    const short = camOf({ kind: 'swinging-roller', radius: 5, arm: 30, pivotDistance: 80 }, 0.2);
    expect(contactAt(short, 0)).toEqual({ outcome: 'out-of-reach', gap: 5 });
    const far = camOf({ kind: 'swinging-face', pivotDistance: 30, faceOffset: 2 }, 0.2);
    expect(contactAt(far, 0)).toEqual({ outcome: 'out-of-reach', gap: 8 });
  });

  it('tells when a swinging face falls faster than the cam turns', () => {
    const quick: Segment[] = [
      { kind: 'rise', law: 'uniform', height: 0.5, angle: 2 },
      { kind: 'return', law: 'uniform', height: 0.5, angle: 0.4 },
    ];
    const fast = outcome(programmeOf(quick), 'complete').programme;
    const cam: Cam = {
      programme: fast,
      baseRadius: 20,
      follower: { kind: 'swinging-face', pivotDistance: 60, faceOffset: 0 },
    };
    expect(outcome(contactAt(cam, 2.2), 'face-outruns-cam').by).toBeCloseTo(0.25, 12);
  });

  it('tells where an arm stands still on its cam', () => {
    // an arm as long as the pivot is far, its roller over the axle after a swing that runs ψ′ = −1
    const back: Segment[] = [
      { kind: 'rise', law: 'uniform', height: 0.5, angle: 1 },
      { kind: 'return', law: 'uniform', height: 0.5, angle: 0.5 },
    ];
    const falls = outcome(programmeOf(back), 'complete').programme;
    const follower: Follower = { kind: 'swinging-roller', radius: 0, arm: 40, pivotDistance: 60 };
    // at the toggle the roller lies between pivot and axle: ψ = 0, where T = (0, ψ′ℓ − (c − ℓ))
    const cam: Cam = { programme: falls, baseRadius: 20, follower };
    expect(outcome(contactAt(cam, 5), 'touches').contact.centre).toEqual({ x: 20, y: 0 });
  });

  it('refuses sizes and steps that are none', () => {
    const cam = camOf({ kind: 'roller', radius: 5, offset: 0 });
    expect(() => camProfile(cam, 11)).toThrow('steps is 11');
    expect(() => camProfile(cam, 100_001)).toThrow('steps is 100001');
    expect(() => camProfile({ ...cam, baseRadius: -1 })).toThrow('baseRadius is -1');
    expect(() => contactAt(camOf({ kind: 'roller', radius: 0, offset: 0 }), 0)).toThrow(
      'radius is 0',
    );
    expect(() =>
      contactAt(camOf({ kind: 'swinging-roller', radius: 1, arm: 0, pivotDistance: 9 }), 0),
    ).toThrow('arm is 0');
    expect(() =>
      contactAt(camOf({ kind: 'swinging-face', pivotDistance: 0, faceOffset: 1 }), 0),
    ).toThrow('pivotDistance is 0');
    expect(() => surveyProfile([])).toThrow('points.length is 0');
  });
});

describe('an undercut rim', () => {
  const steep = (): Cam => {
    const segments: Segment[] = [
      { kind: 'rise', law: 'simple-harmonic', height: 20, angle: 0.6 },
      { kind: 'return', law: 'simple-harmonic', height: 20, angle: 0.6 },
    ];
    const quick = outcome(programmeOf(segments), 'complete').programme;
    return {
      programme: quick,
      baseRadius: 25,
      follower: { kind: 'roller', radius: 16, offset: 0 },
    };
  };

  it('keeps nothing that lies in the way of the roller, and loses height at the nose', () => {
    const points = pointsOf(steep(), 540);
    const cut = cutRim(points, 16, 0);
    expect(cut.rim.length).toBeLessThan(points.length);
    for (const point of cut.rim) {
      const nearest = points.reduce(
        (least, { path }) => Math.min(least, distance(point, path)),
        Infinity,
      );
      expect(nearest).toBeGreaterThan(16 * 0.999_998);
    }
    // by symmetry the nose is cut to a point on its middle line, 0.6 into the turn
    const tip = cut.rim
      .map((point) => Math.hypot(point.x, point.y))
      .reduce((a, b) => Math.max(a, b));
    expectNear(cut.lost, 45 - tip, 0.02);
    expect(cut.at).toBeCloseTo(0.6, 2);
  });

  it('loses nothing where the roller is small enough', () => {
    const gentle = camOf({ kind: 'roller', radius: 9, offset: 7 });
    const points = pointsOf(gentle);
    const cut = cutRim(points, 9, 7);
    expect(cut.rim).toHaveLength(points.length);
    expect(cut.lost).toBeLessThan(1e-6);
  });

  it('refuses a roller that is none and a rim without places', () => {
    expect(() => cutRim([], 5, 0)).toThrow('points.length is 0');
    expect(() => cutRim(pointsOf(steep(), 12), 0, 0)).toThrow('rollerRadius is 0');
  });
});
