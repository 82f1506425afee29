import { itemAt } from '@/lib/numeric/item-at';
import { freedomOf, ringMobility, type SpatialJoint } from './freedom';
import type { CountCorrection } from './mobility';
import type { Linkage } from './solver/linkage';

/** A mechanism that the count misjudges. */
export interface KnownParadox extends CountCorrection {
  /** Words that its name holds, all those of one of the lists. */
  readonly words: readonly (readonly string[])[];
  readonly reason: string;
}

type Triple = readonly [number, number, number];

const hinge = (at: Triple, axis: Triple = [0, 0, 1]): SpatialJoint => ({ kind: 'hinge', at, axis });
const slide = (axis: Triple): SpatialJoint => ({ kind: 'slide', at: [0, 0, 0], axis });
/** A ball leaves three turnings: about any three axes that stand square. */
const ball = (at: Triple): readonly SpatialJoint[] => [
  hinge(at, [1, 0, 0]),
  hinge(at, [0, 1, 0]),
  hinge(at, [0, 0, 1]),
];

/** Three equal, parallel cranks on one rod. */
const parallelCranks: Linkage = {
  points: {
    A: { x: 0, y: 0 },
    B: { x: 7, y: 0 },
    C: { x: 14, y: 0 },
    a: { x: 3, y: 4 },
    b: { x: 10, y: 4 },
    c: { x: 17, y: 4 },
  },
  fixed: ['A', 'B', 'C'],
  bars: (['A', 'B', 'C'] as const).map((end) => ({
    ends: [end, end.toLowerCase()] as const,
    length: 5,
  })),
  plates: [{ shape: { a: { x: 0, y: 0 }, b: { x: 7, y: 0 }, c: { x: 14, y: 0 } } }],
  drivers: [],
};

/** Two threes of parallel hinges, the threes square to each other. */
const sarrus: readonly SpatialJoint[] = [
  hinge([1, 0, 0], [0, 1, 0]),
  hinge([2, 0, 1], [0, 1, 0]),
  hinge([1, 0, 2], [0, 1, 0]),
  hinge([0, 1, 2], [1, 0, 0]),
  hinge([0, 2, 1], [1, 0, 0]),
  hinge([0, 1, 0], [1, 0, 0]),
];

/** A skew four-sided figure, opposite sides alike, each hinge square to the two sides that meet there. */
const bennett: readonly SpatialJoint[] = squareRing([
  [2, 0, 1],
  [1, 2, -1],
  [-2, 0, 1],
  [-1, -2, -1],
]);

/** A disc that rolls on another, kept to it by an arm: it turns about the place where they touch. */
const rollingDiscs: readonly SpatialJoint[] = [
  hinge([0, 0, 0]),
  hinge([5, 0, 0]),
  hinge([3, 0, 0]),
];

const wedges: readonly SpatialJoint[] = [slide([1, 0, 0]), slide([3, 1, 0]), slide([0, 1, 0])];

/** Cam, roller that touches it above, and a follower that slides: the first and last joint matter. */
const rollerFollower: readonly SpatialJoint[] = [
  hinge([-1, 0, 0]),
  slide([1, 0, 0]),
  hinge([0, 3, 0]),
  hinge([0, 4, 0]),
  slide([0, 1, 0]),
];

/** Hinge, ball, ball, hinge: the hinges matter. */
const rssr: readonly SpatialJoint[] = [
  hinge([0, 0, 0]),
  ...ball([1, 0, 0]),
  ...ball([3, 2, 1]),
  hinge([4, 0, 0], [0, 1, 0.3]),
];

/**
 * Mechanisms that the count misjudges, and why, known by name. What the count overlooks is not
 * listed but reckoned, by the rank of an example's conditions or screws.
 */
export const KNOWN_PARADOXES: readonly KnownParadox[] = [
  {
    words: [['parallel', 'crank'], ['parallelogram', 'third'], ['extra', 'crank'], ['oar']],
    reason: 'the extra crank is equal and parallel: it repeats what the others say',
    ...ofLinkage(parallelCranks),
  },
  {
    words: [['sarrus']],
    reason: 'two threes of parallel hinges: one condition in space is said twice',
    ...ofRing(sarrus, 'space'),
  },
  {
    words: [['bennett']],
    reason: 'opposite links alike and a/sin α = b/sin β: three conditions repeat',
    ...ofRing(bennett, 'space'),
  },
  {
    words: [
      ['rolling', 'disc'],
      ['rolling', 'disk'],
      ['rolling', 'cylinder'],
    ],
    reason: 'the links keep the very distance at which the discs touch',
    ...ofRing(rollingDiscs, 'plane'),
  },
  {
    words: [['wedge']],
    reason: 'wedges slide without turning: that nothing turns is said once too often',
    ...ofRing(wedges, 'plane'),
  },
  {
    words: [['roller', 'follower']],
    reason: 'the roller spins about its own pin',
    ...ofRing(rollerFollower, 'plane', [0, 4]),
  },
  {
    words: [['rssr']],
    reason: 'the rod between two balls turns about itself',
    ...ofRing(rssr, 'space', [0, 7]),
  },
];

/**
 * What the count overlooks in a mechanism of a known name; nothing if the name is not known.
 * @example knownCorrection('Sarrus linkage') // → { idle: 0, repeated: 1 }
 */
export function knownCorrection(name: string): CountCorrection {
  const lower = name.toLowerCase();
  const found = KNOWN_PARADOXES.find(({ words }) =>
    words.some((list) => list.every((word) => lower.includes(word))),
  );
  return found ? { idle: found.idle, repeated: found.repeated } : { idle: 0, repeated: 0 };
}

function ofLinkage(linkage: Linkage): CountCorrection {
  return { idle: 0, repeated: freedomOf(linkage).repeated };
}

function ofRing(
  joints: readonly SpatialJoint[],
  within: 'plane' | 'space',
  mattering?: readonly number[],
): CountCorrection {
  const { real, useful } = ringMobility(joints, mattering);
  const counted = joints.length - (within === 'plane' ? 3 : 6);
  return { idle: real - useful, repeated: real - counted };
}

/** Hinges at the corners of a ring, each square to the two sides that meet there. */
function squareRing(corners: readonly Triple[]): readonly SpatialJoint[] {
  return corners.map((corner, k) => {
    const before = itemAt(corners, k - 1);
    const after = itemAt(corners, (k + 1) % corners.length);
    const [ax, ay, az] = less(corner, before);
    const [bx, by, bz] = less(after, corner);
    return hinge(corner, [ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx]);
  });
}

function less([x, y, z]: Triple, [fx, fy, fz]: Triple): Triple {
  return [x - fx, y - fy, z - fz];
}
