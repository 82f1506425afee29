import { dot, perpendicular, subtract, type Point } from '@/lib/geometry/point';

export interface BestLine {
  /** The points' middle, which the line passes through. */
  readonly through: Point;
  /** Direction of the line, from −π/2 to π/2. */
  readonly angle: number;
  /** Least and greatest distance from the line, positive to the left of its direction. */
  readonly least: number;
  readonly most: number;
  /** From the first to the last foot of the points on the line: the stroke. */
  readonly stroke: number;
}

/** What fitting a line came to; `no-line` when the points have no direction. */
export type BestLineOutcome =
  ({ readonly outcome: 'line' } & BestLine) | { readonly outcome: 'no-line' };

/**
 * The straight line with the least sum of squared distances from the points (square to the line),
 * and how far the points stray from it.
 *
 * Outcome `no-line` for fewer than two different points, or points that spread alike in all
 * directions. Source: K. Pearson, On lines and planes of closest fit, 1901.
 * @example fitLine([{ x: 0, y: 0 }, { x: 2, y: 0 }, { x: 4, y: 0 }]) // → { outcome: 'line', through: { x: 2, y: 0 }, angle: 0, least: 0, most: 0, stroke: 4 }
 */
export function fitLine(points: readonly Point[]): BestLineOutcome {
  const n = points.length;
  if (n < 2) return { outcome: 'no-line' };
  const through = {
    x: points.reduce((sum, p) => sum + p.x, 0) / n,
    y: points.reduce((sum, p) => sum + p.y, 0) / n,
  };
  const spread = points.map((p) => subtract(p, through));
  const xx = spread.reduce((sum, p) => sum + p.x * p.x, 0);
  const yy = spread.reduce((sum, p) => sum + p.y * p.y, 0);
  const xy = spread.reduce((sum, p) => sum + p.x * p.y, 0);
  if (Math.hypot(2 * xy, xx - yy) <= 1e-12 * (xx + yy)) return { outcome: 'no-line' };
  const angle = Math.atan2(2 * xy, xx - yy) / 2;
  const along = { x: Math.cos(angle), y: Math.sin(angle) };
  const off = spread.map((p) => dot(p, perpendicular(along)));
  const feet = spread.map((p) => dot(p, along));
  return {
    outcome: 'line',
    through,
    angle,
    least: Math.min(...off),
    most: Math.max(...off),
    stroke: Math.max(...feet) - Math.min(...feet),
  };
}
