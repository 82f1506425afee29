import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { sqrtClamped } from '@/lib/numeric/tolerance';
import type { Point } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Scott Russell's linkage: a crank A–B on A at the origin, a bar from the slider C on the +x axis
 * through B to the pencil D. Any one unit.
 */
export interface ScottRussell {
  readonly crank: number;
  /** B to C. */
  readonly rod: number;
  /** B to D; the best length if left out. */
  readonly beyond?: number;
}

/**
 * B to D for the straightest path of D: rod²/crank; an exact line when all three are equal.
 * Source: J. Scott Russell, 1843.
 * @example scottRussellBeyond({ crank: 50, rod: 80 }) // → 128
 */
export function scottRussellBeyond({ crank, rod }: ScottRussell): number {
  requireSize('scottRussellBeyond', 'crank', crank);
  return (requireSize('scottRussellBeyond', 'rod', rod) * rod) / crank;
}

export type ScottRussellOutcome =
  | { readonly outcome: 'closes'; readonly slider: number; readonly pencil: Point }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Slider and pencil at a crank angle from +x, slider on the side of the crank pin away from −x.
 *
 * Outcome `does-not-close` with the length by which the rod is short. Throws `RangeError` for
 * lengths that are not positive.
 * @example scottRussellPoint({ crank: 50, rod: 80 }, radians(15)).pencil // → { x: -78.0179252, y: 33.6464759 }
 */
export function scottRussellPoint(linkage: ScottRussell, crankAngle: number): ScottRussellOutcome {
  const beyond = linkage.beyond ?? scottRussellBeyond(linkage);
  const crank = requireSize('scottRussellPoint', 'crank', linkage.crank);
  const rod = requireSize('scottRussellPoint', 'rod', linkage.rod);
  requireMeasure('scottRussellPoint', 'beyond', beyond);
  requireMeasure('scottRussellPoint', 'crankAngle', crankAngle);
  const B = { x: crank * Math.cos(crankAngle), y: crank * Math.sin(crankAngle) };
  const by = Math.abs(B.y) - rod;
  if (by > 1e-12 * (crank + rod)) return { outcome: 'does-not-close', by };
  const exact = crank === rod;
  const run = exact ? B.x : sqrtClamped((rod - B.y) * (rod + B.y));
  const share = beyond / rod;
  return {
    outcome: 'closes',
    slider: B.x + run,
    pencil: { x: B.x - share * run, y: B.y + share * B.y },
  };
}

/** Scott Russell's linkage as data: points `A`, `B`, `C`, `D`, and `X` on the slider's line; driven by the crank. */
export function scottRussellLinkage(linkage: ScottRussell): Linkage {
  const { crank, rod } = linkage;
  const beyond = linkage.beyond ?? scottRussellBeyond(linkage);
  return {
    points: {
      A: { x: 0, y: 0 },
      X: { x: crank, y: 0 },
      B: { x: 0, y: crank },
      C: { x: rod, y: 0 },
      D: { x: 0, y: 2 * crank },
    },
    fixed: ['A', 'X'],
    bars: [{ ends: ['A', 'B'], length: crank }],
    plates: [{ shape: { C: { x: 0, y: 0 }, B: { x: rod, y: 0 }, D: { x: rod + beyond, y: 0 } } }],
    slides: [{ point: 'C', along: ['A', 'X'] }],
    drivers: [{ kind: 'angle', from: 'A', to: 'B' }],
  };
}
