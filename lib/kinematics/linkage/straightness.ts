import { findExtremes } from '@/lib/numeric/extremes';
import { requireMeasure } from '@/lib/numeric/moderate';
import { fitLine, type BestLineOutcome } from '@/lib/geometry/best-line';
import { sampleCurve } from '@/lib/geometry/curve';
import type { Point } from '@/lib/geometry/point';

/** How straight a path is along one axis of the frame. */
export interface Straightness {
  /** From the least to the greatest coordinate along the line. */
  readonly stroke: number;
  /** Least and greatest coordinate square to the line. */
  readonly least: number;
  readonly most: number;
  /** Greatest less least, over the stroke: a plain share. */
  readonly share: number;
}

/**
 * How straight the path `at(drive)` runs, between two drives, along the x or the y axis.
 *
 * Any one unit. The path must close everywhere between: `at` gives undefined where it does not, and
 * so does the whole. Extremes are good to rounding. Throws `RangeError` for a drive that is not finite.
 * @example straightness((t) => ({ x: t, y: t * t }), -1, 1, 'x') // → { stroke: 2, least: 0, most: 1, share: 0.5 }
 */
export function straightness(
  at: (drive: number) => Point | undefined,
  from: number,
  to: number,
  line: 'x' | 'y',
): Straightness | undefined {
  requireMeasure('straightness', 'from', from);
  requireMeasure('straightness', 'to', to);
  const pieces = 720;
  requireMeasure('bestLineOfPath', 'from', from);
  requireMeasure('bestLineOfPath', 'to', to);
  const path = sampleCurve((t) => at(t) ?? NOWHERE, from, to, pieces);
  if (path.includes(NOWHERE)) return undefined;
  const across = line === 'x' ? 'y' : 'x';
  const off = findExtremes((t) => (at(t) ?? NOWHERE)[across], from, to, pieces);
  const along = findExtremes((t) => (at(t) ?? NOWHERE)[line], from, to, pieces);
  const stroke = along.most.value - along.least.value;
  const spread = off.most.value - off.least.value;
  return {
    stroke,
    least: off.least.value,
    most: off.most.value,
    share: stroke > 0 ? spread / stroke : 0,
  };
}

/**
 * The best straight line (least squares) through the path between two drives, and how far the path
 * leaves it; undefined where the path does not close.
 * @example bestLineOfPath((t) => ({ x: t, y: 2 * t }), 0, 1).angle // → 1.107149
 */
export function bestLineOfPath(
  at: (drive: number) => Point | undefined,
  from: number,
  to: number,
  pieces = 360,
): BestLineOutcome | undefined {
  requireMeasure('bestLineOfPath', 'from', from);
  requireMeasure('bestLineOfPath', 'to', to);
  const path = sampleCurve((t) => at(t) ?? NOWHERE, from, to, pieces);
  return path.includes(NOWHERE) ? undefined : fitLine(path);
}

const NOWHERE: Point = { x: 0, y: 0 };
