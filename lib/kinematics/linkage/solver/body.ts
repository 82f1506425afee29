import type { Point } from '@/lib/geometry/point';
import type { Distance, Rigid } from '@/lib/kinematics/linkage/solver/linkage';

/** A rigid body: its points by number, and where they lie in its own frame. */
export interface Body {
  readonly points: readonly number[];
  readonly shape: ReadonlyMap<number, Point>;
  /** Two of them that lie apart: they carry the others. */
  readonly pair: readonly [number, number];
  /** The driven direction, if an angle drives this body. */
  readonly driven?: DrivenWay;
}

/** A way from one point of a body to another whose direction is a number of the drive. */
export interface DrivenWay {
  readonly from: number;
  readonly to: number;
  readonly drive: number;
}

/** The first of some points of a body, and the first that does not lie on it. */
export function apartPair(
  shape: ReadonlyMap<number, Point>,
  points: readonly number[],
): readonly [number, number] | undefined {
  const [a] = points;
  const b = points.find((p) => a !== undefined && !coincide(shape, a, p));
  return a === undefined || b === undefined ? undefined : [a, b];
}

/** Whether two points of a body lie in one place. */
export function coincide(shape: ReadonlyMap<number, Point>, p: number, q: number): boolean {
  const [at, other] = [localOf(shape, p), localOf(shape, q)];
  return at.x === other.x && at.y === other.y;
}

export function distanceOf(shape: ReadonlyMap<number, Point>, p: number, q: number): Distance {
  const [from, to] = [localOf(shape, p), localOf(shape, q)];
  return { kind: 'distance', p, q, length: Math.hypot(to.x - from.x, to.y - from.y) };
}

export function rigidOf(shape: ReadonlyMap<number, Point>, p: number, a: number, b: number): Rigid {
  const [origin, end, at] = [localOf(shape, a), localOf(shape, b), localOf(shape, p)];
  const [ux, uy] = [end.x - origin.x, end.y - origin.y];
  const [wx, wy] = [at.x - origin.x, at.y - origin.y];
  const squared = ux * ux + uy * uy;
  return {
    kind: 'rigid',
    p,
    a,
    b,
    along: (wx * ux + wy * uy) / squared,
    across: (wy * ux - wx * uy) / squared,
  };
}

export function localOf(shape: ReadonlyMap<number, Point>, p: number): Point {
  return shape.get(p) ?? { x: 0, y: 0 };
}
