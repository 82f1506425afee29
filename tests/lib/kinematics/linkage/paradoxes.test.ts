import { describe, expect, it } from 'vitest';
import { ringMobility, type SpatialJoint } from '@/lib/kinematics/linkage/freedom';
import { planarMobility, spatialMobility, usefulMobility } from '@/lib/kinematics/linkage/mobility';
import { KNOWN_PARADOXES, knownCorrection } from '@/lib/kinematics/linkage/paradoxes';

const hinge = (at: SpatialJoint['at'], axis: SpatialJoint['axis'] = [0, 0, 1]): SpatialJoint => ({
  kind: 'hinge',
  at,
  axis,
});

describe('the freedom of a ring of joints', () => {
  it('is one for a four-bar, none for a pinned triangle, two for a ring of five', () => {
    const corners = [
      [0, 0, 0],
      [4, 0, 0],
      [5, 3, 0],
      [2, 6, 0],
      [-1, 3, 0],
    ] as const;
    const ring = (count: number) => ringMobility(corners.slice(0, count).map((at) => hinge(at)));
    expect(ring(3)).toEqual({ real: 0, useful: 0 });
    expect(ring(4)).toEqual({ real: 1, useful: 1 });
    expect(ring(5)).toEqual({ real: 2, useful: 2 });
  });

  it('is none in space where Bennett’s condition or Sarrus’ parallels are a little out', () => {
    const crooked = [
      hinge([2, 0, 1], [4, 2.1, 3]),
      hinge([1, 2, -1], [1, 2, 5]),
      hinge([-2, 0, 1], [2, 7, 1]),
      hinge([-1, -2, -1], [3, -1, 2]),
    ];
    expect(ringMobility(crooked).real).toBe(0);
  });

  it('leaves out what moves no joint that matters', () => {
    const spun = [hinge([0, 0, 0]), hinge([0, 0, 0]), hinge([4, 0, 0]), hinge([1, 3, 0])];
    expect(ringMobility(spun)).toEqual({ real: 1, useful: 1 });
    // The first two can turn against one another while the others stand still.
    expect(ringMobility(spun, [2, 3])).toEqual({ real: 1, useful: 0 });
  });

  it('refuses an axis without a direction, and a joint that is none', () => {
    expect(() => ringMobility([hinge([0, 0, 0], [0, 0, 0])])).toThrow('length of the axis is 0');
    expect(() => ringMobility([hinge([0, Number.NaN, 0])])).toThrow('at is NaN');
    expect(() => ringMobility([hinge([0, 0, 0])], [1])).toThrow('mattering is 1');
  });
});

describe('what the count overlooks', () => {
  // Textbook facts, from memory; the library reckons them from the rank of an example.
  it.each([
    ['four parallel cranks', planarMobility({ links: 5, fullJoints: 6 }), 0, 1],
    ['Parallelogram with a third equal crank', planarMobility({ links: 5, fullJoints: 6 }), 0, 1],
    ['Sarrus linkage', spatialMobility({ links: 6, oneFreedom: 6 }), 0, 1],
    ['Bennett linkage', spatialMobility({ links: 4, oneFreedom: 4 }), -2, 1],
    ['rolling discs kept by an arm', planarMobility({ links: 3, fullJoints: 3 }), 0, 1],
    ['three wedges', planarMobility({ links: 3, fullJoints: 3 }), 0, 1],
    ['cam with roller follower', planarMobility({ links: 4, fullJoints: 3, halfJoints: 1 }), 2, 1],
    ['RSSR', spatialMobility({ links: 4, oneFreedom: 2, threeFreedoms: 2 }), 2, 1],
    ['four-bar', planarMobility({ links: 4, fullJoints: 4 }), 1, 1],
    ['pinned triangle', planarMobility({ links: 3, fullJoints: 3 }), 0, 0],
  ])('%s: counted %s, %s in truth', (name, counted, expected, useful) => {
    expect(counted).toBe(expected);
    expect(usefulMobility(counted, knownCorrection(name))).toBe(useful);
  });

  it('is reckoned for each of them, and has a reason', () => {
    expect(KNOWN_PARADOXES.map(({ idle, repeated }) => [idle, repeated])).toEqual([
      [0, 1],
      [0, 1],
      [0, 3],
      [0, 1],
      [0, 1],
      [1, 0],
      [1, 0],
    ]);
    for (const { reason } of KNOWN_PARADOXES) expect(reason.length).toBeGreaterThan(20);
  });
});
