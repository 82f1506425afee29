import { LENGTH_TOLERANCE } from '@/lib/numeric/tolerance';
import { requireNonNegative } from '@/lib/numeric/require';
import {
  add,
  cross,
  distance,
  dot,
  perpendicular,
  polar,
  subtract,
  type Point,
} from '@/lib/geometry/point';

export interface Circle {
  readonly centre: Point;
  readonly radius: number;
}

/** A line without ends, through a point along a direction of any length but nought. */
export interface Line {
  readonly through: Point;
  readonly along: Point;
}

/** How two circles meet. `gap` is the least distance between the two curves. */
export type CirclesOutcome =
  | { readonly outcome: 'meet'; readonly left: Point; readonly right: Point }
  | { readonly outcome: 'touch'; readonly at: Point }
  | { readonly outcome: 'apart'; readonly gap: number }
  | { readonly outcome: 'inside'; readonly gap: number }
  | { readonly outcome: 'same' };

/**
 * Where two circles meet: `left` and `right` of the ray from the first centre to the second.
 *
 * Outcomes: `meet`; `touch`, also when they miss by no more than 1e-12 of the larger size; `apart` or `inside` with the gap
 * between the curves; `same`, when they cover one another. Throws `RangeError` for a negative
 * radius.
 * @example intersectCircles({ centre: ORIGIN, radius: 5 }, { centre: { x: 6, y: 0 }, radius: 5 }) // → { outcome: 'meet', left: { x: 3, y: 4 }, right: { x: 3, y: -4 } }
 * @example intersectCircles({ centre: ORIGIN, radius: 2 }, { centre: { x: 6, y: 0 }, radius: 3 }) // → { outcome: 'apart', gap: 1 }
 */
export function intersectCircles(first: Circle, second: Circle): CirclesOutcome {
  const r1 = requireNonNegative('intersectCircles', 'first.radius', first.radius);
  const r2 = requireNonNegative('intersectCircles', 'second.radius', second.radius);
  const d = distance(first.centre, second.centre);
  const slack = LENGTH_TOLERANCE * Math.max(r1, r2, d);
  if (d <= slack && Math.abs(r1 - r2) <= slack) return { outcome: 'same' };
  if (d > r1 + r2 + slack) return { outcome: 'apart', gap: d - r1 - r2 };
  if (d < Math.abs(r1 - r2) - slack) return { outcome: 'inside', gap: Math.abs(r1 - r2) - d };
  const share = (d * d + (r1 - r2) * (r1 + r2)) / (2 * d * d);
  const squared = (r1 + r2 - d) * (d - (r1 - r2)) * (d + (r1 - r2)) * (r1 + r2 + d);
  const along = subtract(second.centre, first.centre);
  const up = Math.sqrt(Math.max(squared, 0)) / (2 * d * d);
  const foot = { x: first.centre.x + share * along.x, y: first.centre.y + share * along.y };
  if (squared <= 0) return { outcome: 'touch', at: foot };
  const across = { x: -up * along.y, y: up * along.x };
  return { outcome: 'meet', left: add(foot, across), right: subtract(foot, across) };
}

/** How a line and a circle meet. */
export type LineCircleOutcome =
  | { readonly outcome: 'meet'; readonly ahead: Point; readonly behind: Point }
  | { readonly outcome: 'touch'; readonly at: Point }
  | { readonly outcome: 'apart'; readonly gap: number };

/**
 * Where a line meets a circle: `ahead` and `behind` along the line's direction.
 *
 * Outcomes: `meet`; `touch`, also when it misses by no more than 1e-12 of the radius; `apart` with the distance from the line
 * to the curve. Throws `RangeError` for a negative radius or a line without direction.
 * @example intersectLineCircle({ through: { x: 0, y: 3 }, along: { x: 1, y: 0 } }, { centre: ORIGIN, radius: 5 }) // → { outcome: 'meet', ahead: { x: 4, y: 3 }, behind: { x: -4, y: 3 } }
 */
export function intersectLineCircle(line: Line, circle: Circle): LineCircleOutcome {
  const radius = requireNonNegative('intersectLineCircle', 'radius', circle.radius);
  const u = unit('intersectLineCircle', line.along);
  const toCentre = subtract(circle.centre, line.through);
  const [foot, off] = [dot(toCentre, u), cross(u, toCentre)];
  const slack = LENGTH_TOLERANCE * Math.max(radius, Math.abs(off));
  if (Math.abs(off) > radius + slack) return { outcome: 'apart', gap: Math.abs(off) - radius };
  const half = Math.sqrt(Math.max((radius - off) * (radius + off), 0));
  const at = (s: number): Point => ({ x: line.through.x + s * u.x, y: line.through.y + s * u.y });
  if (half === 0) return { outcome: 'touch', at: at(foot) };
  return { outcome: 'meet', ahead: at(foot + half), behind: at(foot - half) };
}

/** How two lines meet. `distance` is that between parallel lines. */
export type LinesOutcome =
  | { readonly outcome: 'meet'; readonly at: Point }
  | { readonly outcome: 'parallel'; readonly distance: number };

/**
 * Where two lines meet; `parallel` with their distance when their directions agree within 1e-12.
 *
 * Throws `RangeError` for a line without direction.
 * @example intersectLines({ through: ORIGIN, along: { x: 1, y: 1 } }, { through: { x: 4, y: 0 }, along: { x: 0, y: 1 } }) // → { outcome: 'meet', at: { x: 4, y: 4 } }
 */
export function intersectLines(first: Line, second: Line): LinesOutcome {
  const u = unit('intersectLines', first.along);
  const v = unit('intersectLines', second.along);
  const between = subtract(second.through, first.through);
  const sine = cross(u, v);
  if (Math.abs(sine) <= LENGTH_TOLERANCE) {
    return { outcome: 'parallel', distance: Math.abs(dot(between, perpendicular(u))) };
  }
  const s = cross(between, v) / sine;
  return {
    outcome: 'meet',
    at: { x: first.through.x + s * u.x, y: first.through.y + s * u.y },
  };
}

/** The circle through three points, or `straight` when they stand in one line. */
export type CircleThroughOutcome =
  { readonly outcome: 'circle'; readonly circle: Circle } | { readonly outcome: 'straight' };

/**
 * The circle through three points.
 *
 * `straight` when the triangle's height is under 1e-12 of its longest side.
 * @example circleThrough({ x: 1, y: 0 }, { x: 0, y: 1 }, { x: -1, y: 0 }) // → { outcome: 'circle', circle: { centre: { x: 0, y: 0 }, radius: 1 } }
 */
export function circleThrough(a: Point, b: Point, c: Point): CircleThroughOutcome {
  const [p, q] = [subtract(b, a), subtract(c, a)];
  const twice = 2 * cross(p, q);
  const [pp, qq] = [dot(p, p), dot(q, q)];
  if (Math.abs(twice) <= 2 * LENGTH_TOLERANCE * Math.max(pp, qq)) return { outcome: 'straight' };
  const centre = { x: (q.y * pp - p.y * qq) / twice, y: (p.x * qq - q.x * pp) / twice };
  return {
    outcome: 'circle',
    circle: {
      centre: { x: a.x + centre.x, y: a.y + centre.y },
      radius: Math.hypot(centre.x, centre.y),
    },
  };
}

function unit(caller: string, along: Point): Point {
  const length = Math.hypot(along.x, along.y);
  if (!(length > 0 && Number.isFinite(length))) {
    throw new RangeError(`${caller}: along is ${along.x}, ${along.y}; expected a direction`);
  }
  return { x: along.x / length, y: along.y / length };
}

/** Points on the arcs of an outline: 3° apart at the most. */
const arcStep = Math.PI / 60;

/**
 * Points on an arc from one angle to another, at most 3° apart, its ends among them; clockwise if
 * the second angle is the smaller.
 * @example arcPoints(2, 0, Math.PI / 60, { x: 1, y: 0 })[0] // → { x: 3, y: 0 }
 */
export function arcPoints(
  radius: number,
  from: number,
  to: number,
  centre: Point,
): readonly Point[] {
  const pieces = Math.max(2, Math.ceil(Math.abs(to - from) / arcStep));
  return Array.from({ length: pieces + 1 }, (_, k) =>
    polar(radius, from + ((to - from) * k) / pieces, centre),
  );
}
