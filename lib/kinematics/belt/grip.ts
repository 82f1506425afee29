import { finiteResult } from '@/lib/numeric/finite-result';
import { requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';

/** Whether a belt carries a pull without sliding. */
export type GripOutcome =
  /** It does, with the pull ratio that it could carry. */
  | { readonly outcome: 'holds'; readonly most: number }
  /** It slides on the wheel at place `wheel` (from 0), which holds only `most`. */
  | { readonly outcome: 'slides'; readonly wheel: number; readonly most: number };

/** What a belt grips with. */
export interface Grip {
  /** Coefficient of friction. */
  readonly friction: number;
  /** Half the angle of a V groove, radians; a quarter turn, a flat rim, unless given. */
  readonly grooveHalfAngle?: number;
}

/**
 * The greatest pull of the tight run over that of the slack one, before a belt slides.
 *
 * `wrap` in radians; also a rope on a capstan, over any number of turns.
 *
 * @throws RangeError for nonsense, and for turns beyond the range of numbers.
 * Source: Euler and Eytelwein, e^(μ·wrap); in a V, μ/sin γ (from memory; any theory of machines).
 * @example gripOf({ friction: 0.3 }, Math.PI) // → 2.566332
 */
export function gripOf(grip: Grip, wrap: number): number {
  requireSizeOrNought('gripOf', 'wrap', wrap);
  return finiteResult('gripOf', Math.exp(effectiveFriction('gripOf', grip) * wrap));
}

/**
 * The wrap, in radians, that holds a pull ratio of at least 1: the inverse of `gripOf`.
 *
 * @throws RangeError for nonsense, and without friction.
 * @example wrapForGrip({ friction: 0.3 }, Math.E) // → 3.33333333
 */
export function wrapForGrip(grip: Grip, pullRatio: number): number {
  requireSizeOrNought('wrapForGrip', 'pullRatio over 1', pullRatio - 1);
  const friction = effectiveFriction('wrapForGrip', grip);
  return Math.log(pullRatio) / requireSize('wrapForGrip', 'friction', friction);
}

/**
 * Whether a belt holds an asked pull ratio on all its wheels, and on which one it slides first.
 *
 * @throws RangeError for nonsense or no wheel at all.
 * @example gripOnWheels({ friction: 0.3 }, [3.7, 2.5], 2.5).outcome // → 'slides'
 */
export function gripOnWheels(grip: Grip, wraps: readonly number[], pullRatio: number): GripOutcome {
  requireSize('gripOnWheels', 'number of wheels', wraps.length);
  requireSize('gripOnWheels', 'pullRatio', pullRatio);
  const least = Math.min(...wraps);
  const most = gripOf(grip, least);
  return pullRatio <= most
    ? { outcome: 'holds', most }
    : { outcome: 'slides', wheel: wraps.indexOf(least), most };
}

function effectiveFriction(caller: string, { friction, grooveHalfAngle }: Grip): number {
  requireSizeOrNought(caller, 'friction', friction);
  const half = requireWithin(
    caller,
    'grooveHalfAngle',
    grooveHalfAngle ?? Math.PI / 2,
    0.01,
    Math.PI / 2,
  );
  return friction / Math.sin(half);
}
