import type { Point } from '@/lib/geometry/point';
import type { Label, Outline, Role, Shape } from './scene';

/** A straight line between two points. */
export function line(role: Role, from: Point, to: Point, age?: number): Outline {
  return { kind: 'outline', role, points: [from.x, from.y, to.x, to.y], closed: false, age };
}

/** A run of points as an outline. */
export function outline(
  role: Role,
  points: readonly Point[],
  closed: boolean,
  age?: number,
): Outline {
  return { kind: 'outline', role, points: points.flatMap(({ x, y }) => [x, y]), closed, age };
}

/** A rectangle about `centre`, turned by `angle` radians. */
export function rectangle(
  role: Role,
  centre: Point,
  length: number,
  width: number,
  angle = 0,
): Outline {
  const corner = (across: number, up: number): Point => ({
    x: centre.x + across * Math.cos(angle) - up * Math.sin(angle),
    y: centre.y + across * Math.sin(angle) + up * Math.cos(angle),
  });
  const [a, b] = [length / 2, width / 2];
  return outline(role, [corner(a, b), corner(-a, b), corner(-a, -b), corner(a, -b)], true);
}

/** A lath with round ends from one point to another, `width` wide and running past both by half. */
export function lath(role: Role, from: Point, to: Point, width: number): Outline {
  const angle = Math.atan2(to.y - from.y, to.x - from.x);
  const points: Point[] = [];
  const steps = 10;
  for (const [end, start] of [
    [to, angle - Math.PI / 2],
    [from, angle + Math.PI / 2],
  ] as const) {
    for (let i = 0; i <= steps; i += 1) {
      const a = start + (Math.PI * i) / steps;
      points.push({ x: end.x + (width / 2) * Math.cos(a), y: end.y + (width / 2) * Math.sin(a) });
    }
  }
  return outline(role, points, true);
}

/** Words or a figure in the middle of a point. */
export function label(
  text: string,
  at: Point,
  more: Partial<Omit<Label, 'kind' | 'text' | 'at'>> = {},
): Label {
  return { kind: 'label', text, at, face: 'figure', role: 'ink', anchor: 'middle', ...more };
}

/**
 * A dimension between two points: extension lines, a line with an arrow at each end, the figure over
 * its middle. `offset` mm is how far it stands off, to the left of the way from `from` to `to`; the
 * extension lines begin at the share `clear` of it. Nothing is drawn where there is no distance.
 */
export function dimension(
  from: Point,
  to: Point,
  offset: number,
  text: string,
  clear = 0.12,
): Shape[] {
  if (Math.hypot(to.x - from.x, to.y - from.y) < 1e-9) return [];
  const angle = Math.atan2(to.y - from.y, to.x - from.x);
  const out = { x: -Math.sin(angle) * offset, y: Math.cos(angle) * offset };
  const past = 1 + 4 / Math.max(Math.abs(offset), 8);
  const [a, b] = [moved(from, out, 1), moved(to, out, 1)];
  const readable = Math.abs(normal(angle)) > Math.PI / 2 + 1e-9 ? angle + Math.PI : angle;
  const extensions =
    Math.abs(offset) < 1e-9
      ? []
      : [
          line('dimension', moved(from, out, clear), moved(from, out, past)),
          line('dimension', moved(to, out, clear), moved(to, out, past)),
        ];
  return [
    ...extensions,
    line('dimension', a, b),
    { kind: 'mark', role: 'dimension', symbol: 'arrowhead', at: b, angle },
    { kind: 'mark', role: 'dimension', symbol: 'arrowhead', at: a, angle: angle + Math.PI },
    // Above its line, as a draughtsman writes it: nothing runs through the figure.
    label(
      text,
      { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 },
      { angle: readable, nudge: { x: 0, y: 10 } },
    ),
  ];
}

/** Parallel lines at 45° across a closed outline, `spacing` mm apart: a face that does not fit. */
export function hatch(points: readonly number[], spacing: number): Outline[] {
  const c = Math.SQRT1_2;
  const turned: Point[] = [];
  for (let i = 0; i + 1 < points.length; i += 2) {
    const [x, y] = [points[i] ?? 0, points[i + 1] ?? 0];
    turned.push({ x: c * (x + y), y: c * (y - x) });
  }
  const heights = turned.map(({ y }) => y);
  const lines: Outline[] = [];
  const first = Math.ceil(Math.min(...heights) / spacing) * spacing;
  for (let y = first; y < Math.max(...heights); y += spacing) {
    const crossings = crossingsAt(turned, y);
    for (let i = 0; i + 1 < crossings.length; i += 2) {
      const [u, v] = [crossings[i] ?? 0, crossings[i + 1] ?? 0];
      const back = (x: number): Point => ({ x: c * (x - y), y: c * (x + y) });
      lines.push(line('limit', back(u), back(v), 0.4));
    }
  }
  return lines;
}

function crossingsAt(points: readonly Point[], y: number): number[] {
  const crossings: number[] = [];
  points.forEach((a, i) => {
    const b = points[(i + 1) % points.length] ?? a;
    if (a.y <= y !== b.y <= y) crossings.push(a.x + ((y - a.y) * (b.x - a.x)) / (b.y - a.y));
  });
  return crossings.sort((m, n) => m - n);
}

function moved(point: Point, by: Point, share: number): Point {
  return { x: point.x + by.x * share, y: point.y + by.y * share };
}

function normal(angle: number): number {
  return Math.atan2(Math.sin(angle), Math.cos(angle));
}
