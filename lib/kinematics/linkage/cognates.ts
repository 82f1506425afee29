import { requireSize } from '@/lib/numeric/moderate';
import { direction, distance, polar, type Point } from '@/lib/geometry/point';
import {
  requireFourBar,
  type CouplerPlace,
  type FourBarLengths,
} from '@/lib/kinematics/linkage/four-bar-linkage';

/** A four-bar that draws the same coupler curve: its bars and its coupler point. */
export interface Cognate {
  readonly bars: FourBarLengths;
  readonly point: CouplerPlace;
}

export interface Cognates {
  /** The third fixed pin. */
  readonly thirdPin: Point;
  /** Stands on O2 and the third pin; its crank is parallel to A–P. */
  readonly left: Cognate;
  /** Stands on O4 and the third pin; its crank is parallel to B–P. */
  readonly right: Cognate;
}

/**
 * The two other four-bars that draw the same curve (Roberts and Chebyshev).
 *
 * Frame as `fourBarPosition`. Each cognate's bars begin with the crank at the old fixed pin (O2 or
 * O4), its rocker stands on the third pin, and its point is told from its own crank pin towards its
 * own rocker pin, both plates keeping their sides. Throws `RangeError` for lengths that are not
 * positive, and for a point on either coupler pin, where a cognate shrinks to nothing.
 * Source: S. Roberts, 1875; P. L. Chebyshev, 1878.
 * @example cognates({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, { distance: 60, angle: radians(30) }).left.bars // → { crank: 60, coupler: 20, rocker: 40, frame: 50 }
 */
export function cognates(bars: FourBarLengths, place: CouplerPlace): Cognates {
  const { crank, coupler, rocker, frame } = requireFourBar('cognates', bars);
  const P = polar(place.distance, place.angle);
  const AP = requireSize('cognates', 'distance A–P', Math.abs(place.distance));
  const BP = requireSize('cognates', 'distance B–P', distance(P, { x: coupler, y: 0 }));
  const atA = direction(P);
  const atB = Math.PI - direction({ x: P.x - coupler, y: P.y });
  const [left, right] = [AP / coupler, BP / coupler];
  return {
    thirdPin: { x: (frame * P.x) / coupler, y: (frame * P.y) / coupler },
    left: {
      bars: { crank: AP, coupler: crank * left, rocker: rocker * left, frame: frame * left },
      point: { distance: crank, angle: -atA },
    },
    right: {
      bars: { crank: BP, coupler: rocker * right, rocker: crank * right, frame: frame * right },
      point: { distance: rocker, angle: atB },
    },
  };
}
