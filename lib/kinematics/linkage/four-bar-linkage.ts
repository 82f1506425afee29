import { polar, type Point } from '@/lib/geometry/point';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import type { Linkage, Plate } from '@/lib/kinematics/linkage/solver/linkage';

/** Bars of a four-bar, any one unit: crank O2–A, coupler A–B, rocker O4–B, frame O2–O4. */
export interface FourBarLengths {
  readonly crank: number;
  readonly coupler: number;
  readonly rocker: number;
  readonly frame: number;
}

/** A point fixed to the coupler: so far from A, turned so much from A–B (radians). */
export interface CouplerPlace {
  readonly distance: number;
  readonly angle: number;
}

/** Throws `RangeError` unless all four lengths are positive; gives them back. */
export function requireFourBar(caller: string, bars: FourBarLengths): FourBarLengths {
  requireSize(caller, 'crank', bars.crank);
  requireSize(caller, 'coupler', bars.coupler);
  requireSize(caller, 'rocker', bars.rocker);
  requireSize(caller, 'frame', bars.frame);
  return bars;
}

/**
 * A four-bar as data for the general solver: points `O2`, `A`, `B`, `O4`, and `P` if a coupler
 * point is given; driven by the crank's angle. The branch is that of `side`: B left (open) or right
 * (crossed) of the ray from A to O4.
 */
export function fourBarLinkage(
  bars: FourBarLengths,
  {
    side = 'open',
    point,
  }: { readonly side?: 'open' | 'crossed'; readonly point?: CouplerPlace } = {},
): Linkage {
  const { crank, coupler, rocker, frame } = requireFourBar('fourBarLinkage', bars);
  const up = side === 'open' ? 1 : -1;
  const shape: Record<string, Point> = { A: { x: 0, y: 0 }, B: { x: coupler, y: 0 } };
  if (point) {
    requireMeasure('fourBarLinkage', 'point.distance', point.distance);
    requireMeasure('fourBarLinkage', 'point.angle', point.angle);
    shape.P = polar(point.distance, point.angle);
  }
  const plates: readonly Plate[] = [{ shape }];
  const start: Record<string, Point> = {
    O2: { x: 0, y: 0 },
    O4: { x: frame, y: 0 },
    A: { x: 0, y: crank },
    B: { x: frame / 2 + up * crank, y: crank / 2 + up * frame },
  };
  if (point) start.P = start.A ?? { x: 0, y: 0 };
  return {
    points: start,
    fixed: ['O2', 'O4'],
    bars: [
      { ends: ['O2', 'A'], length: crank },
      { ends: ['O4', 'B'], length: rocker },
    ],
    plates,
    drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
  };
}
