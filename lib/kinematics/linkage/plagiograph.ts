import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { add, ORIGIN, polar, type Point } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Sylvester's skew pantograph: a parallelogram O–A–B–C about the fixed O, with a plate on bar A–B
 * that carries the stylus P and a like plate on bar C–B that carries the pen Q. Any one unit.
 */
export interface Plagiograph {
  /** O to A, as long as C to B. */
  readonly first: number;
  /** O to C, as long as A to B. */
  readonly second: number;
  /** A to the stylus P. */
  readonly stylusArm: number;
  /** From the bar A–B to A–P, radians counter-clockwise. */
  readonly plateAngle: number;
}

export interface PlagiographPose {
  readonly A: Point;
  readonly B: Point;
  readonly C: Point;
  readonly stylus: Point;
  readonly pen: Point;
}

/**
 * Scale and turn of the copy, and the arm C–Q that makes it so.
 *
 * The copy is `scale` times as large and turned by `turn` radians about O, always true to shape.
 * Throws `RangeError` for a length that is not positive. Source: J. J. Sylvester, 1875.
 * @example plagiographCopy({ first: 120, second: 160, stylusArm: 80, plateAngle: radians(40) }) // → { scale: 2, turn: -0.6981317, penArm: 240 }
 */
export function plagiographCopy({ first, second, stylusArm, plateAngle }: Plagiograph): {
  readonly scale: number;
  readonly turn: number;
  readonly penArm: number;
} {
  requireSize('plagiographCopy', 'first', first);
  requireSize('plagiographCopy', 'second', second);
  requireSize('plagiographCopy', 'stylusArm', stylusArm);
  requireMeasure('plagiographCopy', 'plateAngle', plateAngle);
  const scale = second / stylusArm;
  return { scale, turn: 0 - plateAngle, penArm: first * scale };
}

/**
 * All points with O at the origin, bar O–A and bar O–C in the given directions (radians).
 * @example plagiographPose({ first: 120, second: 160, stylusArm: 80, plateAngle: radians(40) }, radians(15), radians(95)).pen // → { x: 203.56895, y: 57.9627689 }
 */
export function plagiographPose(
  plagiograph: Plagiograph,
  firstAngle: number,
  secondAngle: number,
): PlagiographPose {
  const { penArm } = plagiographCopy(plagiograph);
  requireMeasure('plagiographPose', 'firstAngle', firstAngle);
  requireMeasure('plagiographPose', 'secondAngle', secondAngle);
  const { first, second, stylusArm, plateAngle } = plagiograph;
  const A = polar(first, firstAngle);
  const C = polar(second, secondAngle);
  return {
    A,
    C,
    B: add(A, C),
    stylus: polar(stylusArm, secondAngle + plateAngle, A),
    pen: polar(penArm, firstAngle - plateAngle, C),
  };
}

/**
 * The plagiograph that copies `scale` times as large and turned by `turn`, on the given bars: the
 * inverse of `plagiographCopy`.
 * @example plagiographFor(120, 160, 2, radians(-40)) // → { first: 120, second: 160, stylusArm: 80, plateAngle: 0.6981317 }
 */
export function plagiographFor(
  first: number,
  second: number,
  scale: number,
  turn: number,
): Plagiograph {
  requireSize('plagiographFor', 'first', first);
  requireSize('plagiographFor', 'second', second);
  requireSize('plagiographFor', 'scale', scale);
  requireMeasure('plagiographFor', 'turn', turn);
  return { first, second, stylusArm: second / scale, plateAngle: 0 - turn };
}

/**
 * A plagiograph as data for the general solver: points `O`, `A`, `B`, `C`, `P` (stylus), `Q` (pen);
 * driven by leading the stylus along x and y.
 */
export function plagiographLinkage(plagiograph: Plagiograph): Linkage {
  const { first, second, stylusArm, plateAngle } = plagiograph;
  const { penArm } = plagiographCopy(plagiograph);
  const { A, B, C, stylus, pen } = plagiographPose(plagiograph, 0.2, 1.6);
  return {
    points: { O: ORIGIN, A, B, C, P: stylus, Q: pen },
    fixed: ['O'],
    bars: [
      { ends: ['O', 'A'], length: first },
      { ends: ['O', 'C'], length: second },
    ],
    plates: [
      { shape: { A: ORIGIN, B: { x: second, y: 0 }, P: polar(stylusArm, plateAngle) } },
      { shape: { C: ORIGIN, B: { x: first, y: 0 }, Q: polar(penArm, -plateAngle) } },
    ],
    drivers: [{ kind: 'lead', point: 'P' }],
  };
}
