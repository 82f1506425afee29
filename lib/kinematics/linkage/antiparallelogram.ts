import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { wrapAngle } from '@/lib/geometry/angle';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Two equal cranks joined crosswise by a bar as long as their pins are apart: the crossed
 * parallelogram. Fixed pins at the origin and at (ground, 0). Any one unit.
 */
export interface Antiparallelogram {
  readonly crank: number;
  readonly ground: number;
}

export interface CounterCrank {
  /** Direction of the second crank, radians from −π to π. */
  readonly angle: number;
  /** Its speed over the first crank's: negative where it runs backward. */
  readonly ratio: number;
}

export type CounterOutcome =
  | ({ readonly outcome: 'runs' } & CounterCrank)
  /** Crank and ground alike: the second crank may do anything. */
  | { readonly outcome: 'equal-sides' };

/**
 * The second crank of a crossed parallelogram, followed through both change points of the turn.
 *
 * `tan(θ4/2) = −(d + a)/(d − a)·tan(θ2/2)`: with cranks shorter than the ground it runs backward,
 * with longer ones forward. Outcomes: `runs`, `equal-sides`. Throws `RangeError` for lengths that
 * are not positive. Source: two equal ellipses (or hyperbolas) rolling on one another.
 * @example counterCrank({ crank: 40, ground: 100 }, radians(70)) // → { outcome: 'runs', angle: -2.043108, ratio: -0.947671 }
 */
export function counterCrank(linkage: Antiparallelogram, crankAngle: number): CounterOutcome {
  const crank = requireSize('counterCrank', 'crank', linkage.crank);
  const ground = requireSize('counterCrank', 'ground', linkage.ground);
  requireMeasure('counterCrank', 'crankAngle', crankAngle);
  const [sum, difference] = [ground + crank, ground - crank];
  if (difference === 0) return { outcome: 'equal-sides' };
  const [sine, cosine] = [Math.sin(crankAngle / 2), Math.cos(crankAngle / 2)];
  return {
    outcome: 'runs',
    angle: wrapAngle(2 * Math.atan2(-sum * sine, difference * cosine)),
    ratio: (-sum * difference) / ((difference * cosine) ** 2 + (sum * sine) ** 2),
  };
}

/**
 * The second crank's speed over the first's at the two places where all bars lie in line: with the
 * first crank towards the other pin (`near`) and away from it (`far`). They are fastest and slowest.
 * @example counterRatios({ crank: 40, ground: 100 }) // → { outcome: 'runs', near: -2.333333, far: -0.428571 }
 */
export function counterRatios(
  linkage: Antiparallelogram,
):
  | { readonly outcome: 'runs'; readonly near: number; readonly far: number }
  | { readonly outcome: 'equal-sides' } {
  const crank = requireSize('counterRatios', 'crank', linkage.crank);
  const ground = requireSize('counterRatios', 'ground', linkage.ground);
  if (crank === ground) return { outcome: 'equal-sides' };
  const near = (ground + crank) / (crank - ground);
  return { outcome: 'runs', near, far: 1 / near };
}

/**
 * The crossed parallelogram as data for the general solver, points as `fourBarLinkage`. It passes a
 * change point every half turn: lead it on with `carryOnLinkage`.
 */
export function antiparallelogramLinkage({ crank, ground }: Antiparallelogram): Linkage {
  const bars = { crank, coupler: ground, rocker: crank, frame: ground };
  return fourBarLinkage(bars, { side: 'crossed' });
}
