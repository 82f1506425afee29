import type { Point } from '@/lib/geometry/point';
import type { DrawingName } from './bench-spec';
import { boundsOf } from './scene';

/**
 * The drawings a stylus follows: closed outlines of any size, brought to the height asked for. All but the
 * circle and the square tell at a glance which way up they are.
 */
const outlines: Readonly<Record<DrawingName, () => readonly Point[]>> = {
  circle: () =>
    Array.from({ length: 96 }, (_, i) => {
      const angle = (2 * Math.PI * i) / 96;
      return { x: Math.cos(angle) / 2, y: Math.sin(angle) / 2 };
    }),
  square: () => [
    { x: 0.5, y: -0.5 },
    { x: 0.5, y: 0.5 },
    { x: -0.5, y: 0.5 },
    { x: -0.5, y: -0.5 },
  ],
  herring: () => [
    ...along((s) => ({ x: -1.25 + 1.95 * s, y: back(s) })),
    { x: 0.8, y: 0.07 },
    { x: 1.25, y: 0.42 },
    { x: 1.05, y: 0 },
    { x: 1.25, y: -0.42 },
    { x: 0.8, y: -0.07 },
    ...along((s) => ({ x: 0.7 - 1.95 * s, y: -0.4 * belly(1 - s) })),
  ],
  sign: () => [
    { x: 0.75, y: -0.5 },
    { x: 1.1, y: 0 },
    { x: 0.75, y: 0.5 },
    { x: -1.1, y: 0.5 },
    { x: -0.85, y: 0 },
    { x: -1.1, y: -0.5 },
  ],
};

const curveSteps = 28;

function along(at: (share: number) => Point): readonly Point[] {
  return Array.from({ length: curveSteps + 1 }, (_, i) => at(i / curveSteps));
}

function belly(share: number): number {
  return Math.sin(Math.PI * share ** 0.75);
}

/** A fish's back with its fin. */
function back(share: number): number {
  const fin = Math.max(0, 1 - Math.abs(share - 0.52) / 0.13);
  return 0.38 * belly(share) + 0.13 * fin;
}

/** A closed outline of so many mm, and where a point stands that has gone so far along it. */
export interface Way {
  readonly points: readonly Point[];
  /** How far along it each of the points lies. */
  readonly marks: readonly number[];
  readonly length: number;
  readonly at: (gone: number) => Point;
  /** How far along it the point lies that is nearest to a place. */
  readonly nearest: (place: Point) => number;
}

/** A drawing `height` mm high with its middle at `middle`. */
export function wayOf(name: DrawingName, height: number, middle: Point): Way {
  const unit = outlines[name]();
  const { left, right, bottom, top } = boundsOf(unit);
  const scale = height / (top - bottom);
  const points = unit.map(({ x, y }) => ({
    x: middle.x + scale * (x - (left + right) / 2),
    y: middle.y + scale * (y - (bottom + top) / 2),
  }));
  const marks = [0];
  points.forEach((point, i) => {
    const next = points[(i + 1) % points.length] ?? point;
    marks.push((marks.at(-1) ?? 0) + Math.hypot(next.x - point.x, next.y - point.y));
  });
  const length = marks.at(-1) ?? 0;
  return {
    points,
    marks: marks.slice(0, -1),
    length,
    at: (gone) => {
      const within = gone - Math.floor(gone / length) * length;
      const i = Math.max(0, marks.findIndex((mark) => mark > within) - 1);
      const [a, b] = [points[i % points.length], points[(i + 1) % points.length]];
      const [start, end] = [marks[i] ?? 0, marks[i + 1] ?? length];
      if (!a || !b) return middle;
      const share = end > start ? (within - start) / (end - start) : 0;
      return { x: a.x + share * (b.x - a.x), y: a.y + share * (b.y - a.y) };
    },
    nearest: (place) => nearestOn(points, marks, place),
  };
}

function nearestOn(points: readonly Point[], marks: readonly number[], place: Point): number {
  let [best, least] = [0, Infinity];
  points.forEach((a, i) => {
    const b = points[(i + 1) % points.length] ?? a;
    const [dx, dy] = [b.x - a.x, b.y - a.y];
    const long = dx * dx + dy * dy;
    const raw = long > 0 ? ((place.x - a.x) * dx + (place.y - a.y) * dy) / long : 0;
    const share = Math.min(1, Math.max(0, raw));
    const away = Math.hypot(place.x - a.x - share * dx, place.y - a.y - share * dy);
    if (away < least) {
      least = away;
      best = (marks[i] ?? 0) + share * Math.sqrt(long);
    }
  });
  return best;
}
