import { finiteResult } from '@/lib/numeric/finite-result';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { nearlyEqual } from '@/lib/numeric/tolerance';
import { polar, add, subtract, type Point } from '@/lib/geometry/point';

/**
 * A pantograph: two long bars O–C and C–P pinned at the elbow C, and two short ones that close the
 * parallelogram B–C–D–M. Any one unit of length.
 */
export interface Pantograph {
  /** First long bar, O to the elbow C. */
  readonly first: number;
  /** Second long bar, the elbow C to P. */
  readonly second: number;
  /** O to the hole B on the first bar. */
  readonly firstHole: number;
  /** The elbow C to the hole D on the second bar; the stylus bar B–M is as long. */
  readonly secondHole: number;
}

export type PantographCorner = 'O' | 'M' | 'P';

/** Which corner stands still, which the hand leads and which draws. */
export interface PantographRoles {
  readonly fixed: PantographCorner;
  readonly stylus: PantographCorner;
  readonly pen: PantographCorner;
}

export type PantographSetUp = 'middle-to-end' | 'end-to-middle' | 'across-the-middle';

/** The corners in each of the named set-ups. */
export const PANTOGRAPH_ROLES: Readonly<Record<PantographSetUp, PantographRoles>> = {
  'middle-to-end': { fixed: 'O', stylus: 'M', pen: 'P' },
  'end-to-middle': { fixed: 'O', stylus: 'P', pen: 'M' },
  'across-the-middle': { fixed: 'M', stylus: 'O', pen: 'P' },
};

/** How a pantograph copies. */
export type CopyOutcome =
  | { readonly outcome: 'true'; readonly scale: number; readonly turned: boolean }
  | { readonly outcome: 'skew'; readonly alongFirst: number; readonly alongSecond: number }
  | { readonly outcome: 'stuck' };

/**
 * Scale of the copy: pen's way over stylus's way, negative when it is turned half round.
 *
 * Outcomes: `true` to shape, when both holes cut off the same share of their bars, so that the
 * three corners stay in line; `skew` with the two scales along the directions of the long bars,
 * when they do not; `stuck` when the stylus stands on the fixed pin. Throws `RangeError` for a
 * length that is negative or not finite, or roles that name a corner twice.
 * Source: similar triangles on the line O–M–P.
 * @example pantographCopy({ first: 300, second: 300, firstHole: 100, secondHole: 100 }, 'middle-to-end') // → { outcome: 'true', scale: 3, turned: false }
 * @example pantographCopy({ first: 400, second: 300, firstHole: 200, secondHole: 150 }, 'across-the-middle') // → { outcome: 'true', scale: -1, turned: true }
 * @example pantographCopy({ first: 300, second: 300, firstHole: 100, secondHole: 120 }, 'middle-to-end') // → { outcome: 'skew', alongFirst: 3, alongSecond: 2.5 }
 */
export function pantographCopy(
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
): CopyOutcome {
  const { stylus, pen } = reachesOf('pantographCopy', pantograph, setUp);
  if (stylus.first === 0 || stylus.second === 0) return { outcome: 'stuck' };
  const alongFirst = pen.first / stylus.first;
  const alongSecond = pen.second / stylus.second;
  return nearlyEqual(alongFirst, alongSecond)
    ? { outcome: 'true', scale: alongFirst, turned: alongFirst < 0 }
    : { outcome: 'skew', alongFirst, alongSecond };
}

/**
 * Longest and shortest copy of a small stroke, over its length, by its direction: how far a small
 * circle comes out as an oval. Both are the scale's size when the copy is true.
 *
 * `elbow` is the angle O–C–P in radians, between 0 and π. Throws `RangeError` also where it is flat,
 * and for a stylus on the fixed pin. Source: singular values of the copy's derivative.
 * @example copyStretch({ first: 300, second: 300, firstHole: 100, secondHole: 120 }, 'middle-to-end', Math.PI / 2) // → { most: 3, least: 2.5 }
 */
export function copyStretch(
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
  elbow: number,
): { readonly most: number; readonly least: number } {
  const { stylus, pen } = reachesOf('copyStretch', pantograph, setUp);
  const sine = requireSize('copyStretch', 'sin(elbow)', Math.sin(elbow));
  const k1 = requireMeasure('copyStretch', 'scale', pen.first / stylus.first);
  const k2 = requireMeasure('copyStretch', 'scale', pen.second / stylus.second);
  const tilt = ((k2 - k1) * Math.cos(elbow)) / sine;
  const [sum, difference] = [Math.hypot(k1 + k2, tilt), Math.hypot(k1 - k2, tilt)];
  return { most: (sum + difference) / 2, least: Math.abs(sum - difference) / 2 };
}

/** All points of a pantograph with O at the origin. */
export type PantographPoints = Readonly<Record<'O' | 'B' | 'C' | 'D' | 'M' | 'P', Point>>;

/**
 * All points with O at the origin, the first bar (O to C) and the second (C to P) in the given
 * directions, radians counter-clockwise from +x.
 * @example pantographPoints({ first: 300, second: 300, firstHole: 100, secondHole: 100 }, Math.PI / 2, 0).P // → { x: 300, y: 300 }
 */
export function pantographPoints(
  { first, second, firstHole, secondHole }: Pantograph,
  firstAngle: number,
  secondAngle: number,
): PantographPoints {
  requireMeasure('pantographPoints', 'firstAngle', firstAngle);
  requireMeasure('pantographPoints', 'secondAngle', secondAngle);
  const C = polar(first, firstAngle);
  const B = polar(firstHole, firstAngle);
  return finiteResult('pantographPoints', {
    O: { x: 0, y: 0 },
    B,
    C,
    D: polar(secondHole, secondAngle, C),
    M: polar(secondHole, secondAngle, B),
    P: polar(second, secondAngle, C),
  });
}

/**
 * How far M and P move while the two long bars turn, with O fixed.
 *
 * Angles in radians, as in `pantographPoints`.
 * @example pantographDisplacement({ first: 300, second: 300, firstHole: 100, secondHole: 100 }, { first: 0, second: 0 }, { first: 0, second: Math.PI }) // → { M: { x: -200, y: 0 }, P: { x: -600, y: 0 } }
 */
export function pantographDisplacement(
  pantograph: Pantograph,
  angles: { readonly first: number; readonly second: number },
  turns: { readonly first: number; readonly second: number },
): { readonly M: Point; readonly P: Point } {
  const from = pantographPoints(pantograph, angles.first, angles.second);
  const to = pantographPoints(pantograph, angles.first + turns.first, angles.second + turns.second);
  return finiteResult('pantographDisplacement', {
    M: subtract(to.M, from.M),
    P: subtract(to.P, from.P),
  });
}

/** A point seen from the fixed one, as so much along the first bar and so much along the second. */
export interface BarCoordinates {
  readonly first: number;
  readonly second: number;
}

/** Stylus and pen seen from the fixed corner, in the directions of the long bars. */
export function reachesOf(
  caller: string,
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
): { readonly stylus: BarCoordinates; readonly pen: BarCoordinates } {
  const { fixed, stylus, pen } = typeof setUp === 'string' ? PANTOGRAPH_ROLES[setUp] : setUp;
  if (fixed === stylus || stylus === pen || pen === fixed) {
    throw new RangeError(
      `${caller}: roles are ${fixed}, ${stylus}, ${pen}; expected three corners`,
    );
  }
  const corners: Readonly<Record<PantographCorner, Point>> = {
    O: { x: 0, y: 0 },
    M: {
      x: requireSizeOrNought(caller, 'firstHole', pantograph.firstHole),
      y: requireSizeOrNought(caller, 'secondHole', pantograph.secondHole),
    },
    P: {
      x: requireSize(caller, 'first', pantograph.first),
      y: requireSize(caller, 'second', pantograph.second),
    },
  };
  const seen = (corner: PantographCorner): BarCoordinates => {
    const { x, y } = subtract(corners[corner], corners[fixed]);
    return { first: x, second: y };
  };
  return { stylus: seen(stylus), pen: seen(pen) };
}

/** The point with the given coordinates along two directions, from `from`. */
export function fromBars(
  { first, second }: BarCoordinates,
  firstAngle: number,
  secondAngle: number,
  from: Point,
): Point {
  return finiteResult('fromBars', add(polar(first, firstAngle, from), polar(second, secondAngle)));
}
