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
