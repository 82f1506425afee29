import { requireMeasure } from '@/lib/numeric/moderate';
import { LENGTH_TOLERANCE } from '@/lib/numeric/tolerance';
import { intersectCircles } from '@/lib/geometry/circle';
import { direction, distance, polar, subtract, type Point } from '@/lib/geometry/point';
import { requireFourBar, type FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';

export type { CouplerPlace, FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';

/**
 * The two assemblies of a four-bar: B to the left (open) or the right (crossed) of the ray from the
 * crank pin A to the rocker's fixed pin O4.
 */
export type FourBarSide = 'open' | 'crossed';

/** One assembly of a four-bar at one crank angle. */
export interface FourBarPose {
  /** Crank pin and rocker pin. */
  readonly A: Point;
  readonly B: Point;
  /** Direction A to B, radians from −π to π. */
  readonly couplerAngle: number;
  /** Direction O4 to B. */
  readonly rockerAngle: number;
}

export type FourBarOutcome =
  | { readonly outcome: 'closes'; readonly open: FourBarPose; readonly crossed: FourBarPose }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Both assemblies of a four-bar with its crank at `crankAngle`.
 *
 * Frame: O2 at the origin, O4 at (frame, 0); any one unit, radians. Outcomes: `closes`, with two
 * like poses at a toggle, where coupler and rocker are in line; `does-not-close` with the length
 * that is missing between coupler and rocker. Throws `RangeError` for a length that is not positive.
 * Source: R. L. Norton, Design of Machinery, example 4-1.
 * @example fourBarPosition({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, radians(40)).open.rockerAngle // → 1.00050791
 * @example fourBarPosition({ crank: 50, coupler: 40, rocker: 45, frame: 110 }, radians(75)) // → { outcome: 'does-not-close', by: 23.4112102 }
 */
export function fourBarPosition(bars: FourBarLengths, crankAngle: number): FourBarOutcome {
  const { crank, coupler, rocker, frame } = requireFourBar('fourBarPosition', bars);
  requireMeasure('fourBarPosition', 'crankAngle', crankAngle);
  const A = polar(crank, crankAngle);
  const O4 = { x: frame, y: 0 };
  const found = intersectCircles({ centre: A, radius: coupler }, { centre: O4, radius: rocker });
  switch (found.outcome) {
    case 'meet':
      return {
        outcome: 'closes',
        open: poseOf(A, found.left, O4),
        crossed: poseOf(A, found.right, O4),
      };
    case 'touch':
      return { outcome: 'closes', open: poseOf(A, found.at, O4), crossed: poseOf(A, found.at, O4) };
    case 'same': {
      const folded = poseOf(A, polar(rocker, crankAngle, O4), O4);
      return { outcome: 'closes', open: folded, crossed: folded };
    }
    default:
      return { outcome: 'does-not-close', by: found.gap };
  }
}

function poseOf(A: Point, B: Point, O4: Point): FourBarPose {
  return {
    A,
    B,
    couplerAngle: direction(subtract(B, A)),
    rockerAngle: direction(subtract(B, O4)),
  };
}

export type AssemblyOutcome =
  | { readonly outcome: 'closes'; readonly diagonal: number; readonly slack: number }
  | { readonly outcome: 'does-not-close'; readonly diagonal: number; readonly by: number };

/**
 * Whether coupler and rocker can bridge the diagonal from A to O4, and by how much they do or fail.
 *
 * `slack` is the distance of the diagonal from the nearer of its limits, rocker + coupler and their
 * difference. Frame and throws as `fourBarPosition`. Source: triangle inequality.
 * @example fourBarAssembly({ crank: 100, coupler: 40, rocker: 50, frame: 100 }, Math.PI) // → { outcome: 'does-not-close', diagonal: 200, by: 110 }
 */
export function fourBarAssembly(bars: FourBarLengths, crankAngle: number): AssemblyOutcome {
  const { crank, coupler, rocker, frame } = requireFourBar('fourBarAssembly', bars);
  requireMeasure('fourBarAssembly', 'crankAngle', crankAngle);
  const diagonal = distance(polar(crank, crankAngle), { x: frame, y: 0 });
  const slack = Math.min(coupler + rocker - diagonal, diagonal - Math.abs(coupler - rocker));
  return slack >= -LENGTH_TOLERANCE * (crank + frame)
    ? { outcome: 'closes', diagonal, slack: Math.max(slack, 0) }
    : { outcome: 'does-not-close', diagonal, by: -slack };
}
