import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requireWithin } from '@/lib/numeric/require';

/**
 * Where the driving fork's pin axis lies at angle 0: in the plane of the two shafts (the driven
 * shaft is then at its fastest) or square to it.
 */
export type HookeStart = 'in-plane' | 'square';

/** A universal joint at one moment, the driving shaft turning evenly. */
export interface HookeState {
  /** The driven shaft's angle, from its own place at the start; it does not jump. */
  readonly angle: number;
  /** How far the driven shaft is ahead. */
  readonly lead: number;
  /** Driven speed over driving speed. */
  readonly speedRatio: number;
  /** Driven acceleration over the driving speed squared. */
  readonly acceleration: number;
}

/**
 * A universal (Hooke's) joint bent by `bend`, the driving shaft turned to `angle`.
 *
 * Radians; a bend from 0 up to a quarter turn, which it cannot reach.
 *
 * @throws RangeError for a bend below 0 or of a quarter turn and more, an angle that is no number.
 * @see tan φ = tan θ/cos β in plane, tan φ = tan θ · cos β square to it: exact geometry.
 * @example hookeJoint(Math.PI / 6, Math.PI / 4).angle // → 0.857072
 */
export function hookeJoint(
  bend: number,
  angle: number,
  start: HookeStart = 'in-plane',
): HookeState {
  requireBend('hookeJoint', bend);
  requireFinite('hookeJoint', 'angle', angle);
  const turned = start === 'in-plane' ? angle : angle + Math.PI / 2;
  const [sine, cosine] = [Math.sin(turned), Math.cos(turned)];
  const cosBend = Math.cos(bend);
  // cos β·cos² θ + sin² θ, and 1 − sin² β·cos² θ: sums of squares, never near 0 by cancelling
  const along = cosBend * cosine ** 2 + sine ** 2;
  const squared = (cosBend * cosine) ** 2 + sine ** 2;
  const lead = Math.atan2(2 * Math.sin(bend / 2) ** 2 * sine * cosine, along);
  return finiteResult('hookeJoint', {
    angle: angle + lead,
    lead,
    speedRatio: cosBend / squared,
    acceleration: (-2 * cosBend * Math.sin(bend) ** 2 * sine * cosine) / squared ** 2,
  });
}

/**
 * The driving shaft's angle when the driven one stands at `driven`: the inverse of `hookeJoint`.
 *
 * @throws RangeError as `hookeJoint`.
 * @see seen from the driven shaft the joint is the same one with the other start.
 * @example hookeDriverAngle(Math.PI / 6, 0.857072) // → 0.785398
 */
export function hookeDriverAngle(
  bend: number,
  driven: number,
  start: HookeStart = 'in-plane',
): number {
  return hookeJoint(bend, driven, start === 'in-plane' ? 'square' : 'in-plane').angle;
}

/** Between which speeds the driven shaft swings, over the driving speed. */
export interface HookeExtremes {
  readonly fastest: number;
  readonly slowest: number;
  /** Fastest less slowest; the mean is 1. */
  readonly fluctuation: number;
}

/**
 * The fastest and the slowest of a joint, twice a turn each.
 *
 * @throws RangeError for a bend below 0 or of a quarter turn and more.
 * @see 1/cos β, cos β, and sin β·tan β between them.
 * @example hookeExtremes(Math.PI / 6) // → { fastest: 1.154701, slowest: 0.866025, fluctuation: 0.288675 }
 */
export function hookeExtremes(bend: number): HookeExtremes {
  requireBend('hookeExtremes', bend);
  const slowest = Math.cos(bend);
  return finiteResult('hookeExtremes', {
    fastest: 1 / slowest,
    slowest,
    fluctuation: Math.sin(bend) * Math.tan(bend),
  });
}

/**
 * The bend that gives a fluctuation of `fluctuation` in all: the inverse of `hookeExtremes`.
 *
 * @throws RangeError for a fluctuation below 0.
 * @see c² + k·c − 1 = 0 for c = cos β.
 * @example hookeBendFor(0.1) // → 0.313535
 */
export function hookeBendFor(fluctuation: number): number {
  requireNonNegative('hookeBendFor', 'fluctuation', fluctuation);
  // tan²(β/2) = (1 − c)/(1 + c), both written so that no digits are lost for a small k
  const root = Math.hypot(fluctuation, 2);
  const oneMinus = 2 / ((2 + root) / fluctuation + 1);
  const onePlus = 1 + 2 / (fluctuation + root);
  return fluctuation === 0 ? 0 : 2 * Math.atan(Math.sqrt(oneMinus / onePlus));
}

/** Where in the first quarter turn the driven shaft changes its speed most, and how fast. */
export interface HookeAcceleration {
  readonly angle: number;
  /** Over the driving speed squared, without its sign. */
  readonly acceleration: number;
  /** The angle by the formula in common use, good for small bends. */
  readonly usualAngle: number;
}

/**
 * The greatest acceleration of the driven shaft, counted from the start `in-plane`, where it slows.
 *
 * @throws RangeError for a bend below 0 or of a quarter turn and more.
 * @see exact: S·c² + (2 − S)·c − 2S = 0 for c = cos 2θ, S = sin² β (own derivation); in common use: c = 2S/(2 − S) (Khurmi and Gupta, Theory of Machines).
 * @example hookeGreatestAcceleration(Math.PI / 9).angle // → 0.723591
 */
export function hookeGreatestAcceleration(bend: number): HookeAcceleration {
  requireBend('hookeGreatestAcceleration', bend);
  const s = Math.sin(bend) ** 2;
  const angle = Math.acos((4 * s) / (2 - s + Math.sqrt((2 - s) ** 2 + 8 * s * s))) / 2;
  return finiteResult('hookeGreatestAcceleration', {
    angle,
    acceleration: Math.abs(hookeJoint(bend, angle).acceleration),
    usualAngle: Math.acos(Math.min(1, (2 * s) / (2 - s))) / 2,
  });
}

/** Refuses a bend at which no joint turns: the guard of every function that takes one. */
export function requireBend(caller: string, bend: number): void {
  requireWithin(caller, 'bend', bend, 0, largestBend);
}

/** The last number under a quarter turn, at which a joint could not turn at all. */
const largestBend = Math.PI / 2 - Number.EPSILON;
