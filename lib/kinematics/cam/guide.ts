import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative, requirePositive, requireWithin } from '@/lib/numeric/require';

/** A guide of `length`, the roller `overhang` before its near end, and friction in the guide. */
export interface FollowerGuide {
  readonly length: number;
  readonly overhang: number;
  readonly friction: number;
}

/**
 * The pressure angle at which a follower jams in its guide: π/2 without friction.
 *
 * The side push P sin φ is held by two edge forces, P sin φ·(A + B)/B at the near end and
 * P sin φ·A/B at the far one; both rub against P cos φ. The stem's thickness is left out.
 *
 * @throws RangeError for a length of 0 or less, an overhang or a friction below 0.
 * @see tan φ = B/(μ(2A + B)): own statics, as in Rothbart, Cams (from memory).
 * @example jammingAngle({ length: 80, overhang: 40, friction: 0.4 }) // → 0.896055
 */
export function jammingAngle(guide: FollowerGuide): number {
  const { length, overhang, friction } = guide;
  requirePositive('jammingAngle', 'length', length);
  requireNonNegative('jammingAngle', 'overhang', overhang);
  requireNonNegative('jammingAngle', 'friction', friction);
  return finiteResult('jammingAngle', Math.atan2(1, friction * (1 + 2 * (overhang / length))));
}

/** Whether the follower slides under a push that leans, by what angle to spare or too much. */
export type GuideOutcome =
  | { readonly outcome: 'slides'; readonly spare: number }
  | { readonly outcome: 'jams'; readonly by: number };

/**
 * Whether a follower slides in its guide while the cam's push leans by `pressureAngle`, either way.
 *
 * @throws RangeError as `jammingAngle`, and for an angle beyond a quarter turn.
 * @example guideUnder({ length: 80, overhang: 40, friction: 0.5 }, 0.9) // → { outcome: 'jams', by: 0.114602 }
 */
export function guideUnder(guide: FollowerGuide, pressureAngle: number): GuideOutcome {
  requireWithin('guideUnder', 'pressureAngle', pressureAngle, -Math.PI / 2, Math.PI / 2);
  const spare = jammingAngle(guide) - Math.abs(pressureAngle);
  return spare > 0 ? { outcome: 'slides', spare } : { outcome: 'jams', by: -spare };
}
