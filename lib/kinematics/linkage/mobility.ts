import { requireCount } from '@/lib/numeric/require';

/** Links and joints of a planar mechanism; the frame is a link, a pin through k links is k − 1 joints. */
export interface PlanarCount {
  readonly links: number;
  /** Pins and slides: each leaves one freedom. */
  readonly fullJoints: number;
  /** Contacts that roll and slide: each leaves two. */
  readonly halfJoints?: number;
}

/**
 * Freedom of a planar mechanism by the count: `3(L − 1) − 2·J1 − J2`.
 *
 * 1 asks for one crank, 2 for two, 0 is a frame, less has bars to spare. The count knows nothing of
 * lengths: see `freedomOf` for what really moves. Throws `RangeError` for counts that are not whole.
 * Source: P. L. Chebyshev, M. Grübler, K. Kutzbach.
 * @example planarMobility({ links: 4, fullJoints: 4 }) // → 1
 * @example planarMobility({ links: 5, fullJoints: 6 }) // → 0
 */
export function planarMobility({ links, fullJoints, halfJoints = 0 }: PlanarCount): number {
  requireCount('planarMobility', 'links', links);
  requireCount('planarMobility', 'fullJoints', fullJoints, 0);
  requireCount('planarMobility', 'halfJoints', halfJoints, 0);
  return 3 * (links - 1) - 2 * fullJoints - halfJoints;
}

/** Links and joints of a mechanism in space, joints by the freedoms that each leaves. */
export interface SpatialCount {
  readonly links: number;
  /** Hinges, slides, screws. */
  readonly oneFreedom?: number;
  /** Sliding hinges, universal joints. */
  readonly twoFreedoms?: number;
  /** Balls, plane on plane. */
  readonly threeFreedoms?: number;
}

/**
 * Freedom of a mechanism in space by the count: `6(L − 1) − 5·J1 − 4·J2 − 3·J3`.
 * @example spatialMobility({ links: 4, oneFreedom: 2, threeFreedoms: 2 }) // → 2
 */
export function spatialMobility({
  links,
  oneFreedom = 0,
  twoFreedoms = 0,
  threeFreedoms = 0,
}: SpatialCount): number {
  requireCount('spatialMobility', 'links', links);
  requireCount('spatialMobility', 'oneFreedom', oneFreedom, 0);
  requireCount('spatialMobility', 'twoFreedoms', twoFreedoms, 0);
  requireCount('spatialMobility', 'threeFreedoms', threeFreedoms, 0);
  return 6 * (links - 1) - 5 * oneFreedom - 4 * twoFreedoms - 3 * threeFreedoms;
}

/** What the count overlooks in a mechanism. */
export interface CountCorrection {
  /** Freedoms that move nothing of use: a roller that spins, a rod that turns about itself. */
  readonly idle: number;
  /** Conditions that say again what others have said, because lengths or directions are special. */
  readonly repeated: number;
}

/**
 * Freedom that is left to drive: the count, less what is idle, with what was counted twice given
 * back; a frame with bars to spare has none.
 * @example usefulMobility(2, { idle: 1, repeated: 0 }) // → 1
 * @example usefulMobility(-2, { idle: 0, repeated: 3 }) // → 1
 */
export function usefulMobility(
  count: number,
  { idle, repeated }: CountCorrection = { idle: 0, repeated: 0 },
): number {
  requireCount('usefulMobility', 'idle', idle, 0);
  requireCount('usefulMobility', 'repeated', repeated, 0);
  if (!Number.isSafeInteger(count)) {
    throw new RangeError(`usefulMobility: count is ${count}; expected a whole number`);
  }
  return Math.max(count - idle + repeated, 0);
}

/** A mechanism that the count misjudges. */
export interface KnownParadox extends CountCorrection {
  /** Words that its name holds, all of them. */
  readonly words: readonly string[];
  readonly reason: string;
}

/**
 * Mechanisms that the count misjudges, and why, looked up by name. Parallel cranks and Sarrus are
 * also found by `freedomOf` and `ringFreedom` in the tests; the others are textbook facts, from memory.
 */
export const KNOWN_PARADOXES: readonly KnownParadox[] = [
  paradox(
    ['parallel', 'crank'],
    0,
    1,
    'the extra crank is equal and parallel: it repeats the others',
  ),
  paradox(['parallelogram', 'third'], 0, 1, 'the extra crank is equal and parallel'),
  paradox(['oar'], 0, 1, 'equal, parallel oars all ask the same of the rod'),
  paradox(['sarrus'], 0, 1, 'two threes of parallel hinges: one condition in space is said twice'),
  paradox(['bennett'], 0, 3, 'opposite links alike and a/sin α = b/sin β: three conditions repeat'),
  paradox(['rolling', 'disc'], 0, 1, 'the links keep the very distance at which the discs touch'),
  paradox(['rolling', 'disk'], 0, 1, 'the links keep the very distance at which the discs touch'),
  paradox(
    ['wedge'],
    0,
    1,
    'wedges slide without turning: the plane’s turning is counted thrice over',
  ),
  paradox(['roller', 'follower'], 1, 0, 'the roller spins about its own pin'),
  paradox(['rssr'], 1, 0, 'the rod between two balls turns about itself'),
];

/**
 * What the count overlooks in a mechanism of a known name; nothing if the name is not known.
 * @example knownCorrection('Sarrus linkage') // → { idle: 0, repeated: 1 }
 */
export function knownCorrection(name: string): CountCorrection {
  const lower = name.toLowerCase();
  const found = KNOWN_PARADOXES.find(({ words }) => words.every((word) => lower.includes(word)));
  return found ? { idle: found.idle, repeated: found.repeated } : { idle: 0, repeated: 0 };
}

function paradox(
  words: readonly string[],
  idle: number,
  repeated: number,
  reason: string,
): KnownParadox {
  return { words, idle, repeated, reason };
}
