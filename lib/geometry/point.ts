/** A point or a vector of the plane: x to the right, y up, any one unit of length. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export const ORIGIN: Point = { x: 0, y: 0 };

/** @example point(3, 4) // → { x: 3, y: 4 } */
export function point(x: number, y: number): Point {
  return { x, y };
}

/**
 * The point at `length` from `from`, in the direction `angle` (radians counter-clockwise from +x).
 * @example polar(2, Math.PI / 2) // → { x: 0, y: 2 }
 */
export function polar(length: number, angle: number, from: Point = ORIGIN): Point {
  return { x: from.x + length * Math.cos(angle), y: from.y + length * Math.sin(angle) };
}

/** @example add({ x: 1, y: 2 }, { x: 3, y: 4 }) // → { x: 4, y: 6 } */
export function add(a: Point, b: Point): Point {
  return { x: a.x + b.x, y: a.y + b.y };
}

/** `a − b`: the way from `b` to `a`. @example subtract({ x: 3, y: 4 }, { x: 1, y: 1 }) // → { x: 2, y: 3 } */
export function subtract(a: Point, b: Point): Point {
  return { x: a.x - b.x, y: a.y - b.y };
}

/** @example scale({ x: 3, y: -4 }, 2) // → { x: 6, y: -8 } */
export function scale(a: Point, factor: number): Point {
  return { x: a.x * factor, y: a.y * factor };
}

/** @example dot({ x: 3, y: 4 }, { x: 2, y: 1 }) // → 10 */
export function dot(a: Point, b: Point): number {
  return a.x * b.x + a.y * b.y;
}

/** Positive where `b` lies to the left of `a`. @example cross({ x: 1, y: 0 }, { x: 0, y: 2 }) // → 2 */
export function cross(a: Point, b: Point): number {
  return a.x * b.y - a.y * b.x;
}

/** @example norm({ x: 3, y: 4 }) // → 5 */
export function norm(a: Point): number {
  return Math.hypot(a.x, a.y);
}

/** @example distance({ x: 1, y: 1 }, { x: 4, y: 5 }) // → 5 */
export function distance(a: Point, b: Point): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}

/** Direction of a vector in radians from −π to π; 0 for the vector of no length. @example direction({ x: 0, y: 3 }) // → 1.5707963 */
export function direction(a: Point): number {
  return Math.atan2(a.y, a.x);
}

/**
 * `a` turned by `angle` radians counter-clockwise about `about`.
 * @example rotate({ x: 2, y: 0 }, Math.PI / 2) // → { x: 0, y: 2 }
 */
export function rotate(a: Point, angle: number, about: Point = ORIGIN): Point {
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)];
  const [x, y] = [a.x - about.x, a.y - about.y];
  return { x: about.x + x * cosine - y * sine, y: about.y + x * sine + y * cosine };
}

/** `a` turned a quarter turn to the left. @example perpendicular({ x: 1, y: 0 }) // → { x: 0, y: 1 } */
export function perpendicular(a: Point): Point {
  return { x: 0 - a.y, y: a.x };
}

/**
 * The point a share of the way from `a` to `b`; shares outside 0 to 1 lie on the line beyond.
 * @example between({ x: 0, y: 0 }, { x: 4, y: 8 }, 0.25) // → { x: 1, y: 2 }
 */
export function between(a: Point, b: Point, share: number): Point {
  return { x: a.x + (b.x - a.x) * share, y: a.y + (b.y - a.y) * share };
}
