import { cross, distance, subtract, type Point } from '@/lib/geometry/point';

/**
 * Points of the curve `at(t)` for t evenly from `from` to `to`, both ends included.
 * @example sampleCurve((t) => ({ x: t, y: t * t }), 0, 2, 2) // → [{ x: 0, y: 0 }, { x: 1, y: 1 }, { x: 2, y: 4 }]
 */
export function sampleCurve(
  at: (t: number) => Point,
  from: number,
  to: number,
  pieces: number,
): readonly Point[] {
  return Array.from({ length: pieces + 1 }, (_, k) =>
    at(k === pieces ? to : from + ((to - from) * k) / pieces),
  );
}

/**
 * Length of a row of points, joined in order.
 * @example pathLength([{ x: 0, y: 0 }, { x: 3, y: 4 }, { x: 3, y: 9 }]) // → 10
 */
export function pathLength(points: readonly Point[]): number {
  return points.reduce((sum, at, k) => sum + distance(at, points[k - 1] ?? at), 0);
}

/**
 * Area within a closed row of points: positive where it runs counter-clockwise.
 * @example signedArea([{ x: 0, y: 0 }, { x: 4, y: 0 }, { x: 4, y: 3 }, { x: 0, y: 3 }]) // → 12
 */
export function signedArea(points: readonly Point[]): number {
  const start = points[0] ?? { x: 0, y: 0 };
  const twice = points.reduce(
    (sum, at, k) => sum + cross(subtract(points[k - 1] ?? start, start), subtract(at, start)),
    0,
  );
  return twice / 2;
}

/** Least and greatest coordinates of a set of points. */
export interface Bounds {
  readonly least: Point;
  readonly most: Point;
}

/**
 * The upright box round a set of points; `undefined` if there are none.
 * @example boundsOf([{ x: 1, y: 5 }, { x: 3, y: 2 }]) // → { least: { x: 1, y: 2 }, most: { x: 3, y: 5 } }
 */
export function boundsOf(points: readonly Point[]): Bounds | undefined {
  const first = points[0];
  if (!first) return undefined;
  return points.reduce<Bounds>(
    ({ least, most }, { x, y }) => ({
      least: { x: Math.min(least.x, x), y: Math.min(least.y, y) },
      most: { x: Math.max(most.x, x), y: Math.max(most.y, y) },
    }),
    { least: first, most: first },
  );
}
