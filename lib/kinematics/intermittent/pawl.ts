import { type Point, cross, polar } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireCount,
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/** Where a pawl's pin belongs. */
export interface PawlPin {
  readonly distance: number;
  /** From the radius through the tooth tip to the radius through the pin. */
  readonly angle: number;
}

/**
 * The place of a pawl's pin so that the pawl, `length` from pin to tip, meets the tooth tip square
 * to the radius: on the tangent.
 *
 * Radians; one unit of length.
 *
 * @throws RangeError for a radius or a length of 0 or less.
 * @see √(R² + ℓ²) and atan(ℓ/R): exact geometry.
 * @example pawlPin(80, 60) // → { distance: 100, angle: 0.643501 }
 */
export function pawlPin(tipRadius: number, length: number): PawlPin {
  requirePositive('pawlPin', 'tipRadius', tipRadius);
  requirePositive('pawlPin', 'length', length);
  return finiteResult('pawlPin', {
    distance: Math.hypot(tipRadius, length),
    angle: Math.atan2(length, tipRadius),
  });
}

/**
 * A pawl against a tooth. The wheel's arbor is the origin, the tooth's tip at (R, 0), and the load
 * turns the wheel counter-clockwise, pushing the pawl up. A pin above the tip makes a pushed pawl,
 * a pin below it a pulled one.
 */
export interface PawlSeat {
  readonly tipRadius: number;
  readonly pin: Point;
  /** How far the face leans under the tip, from the radius: above 0 undercut, below 0 leaning back. */
  readonly undercut: number;
}

/** What the load does to a pawl that it meets. */
export type PawlOutcome =
  /** The push turns the pawl in, with this lever arm about its pin. */
  | { readonly outcome: 'drawn-in'; readonly arm: number }
  /** The push passes through the pin, or the pin stands on the tip's radius: only friction holds. */
  | { readonly outcome: 'neutral' }
  | { readonly outcome: 'thrown-out'; readonly arm: number };

/** A lever arm of less than this part of the pawl's length is none. */
const armTolerance = 1e-9;

/**
 * Whether the load itself draws a pawl in: the square to the tooth's face must pass between pin
 * and arbor for a pushed pawl, and beyond the pin for a pulled one.
 *
 * @throws RangeError for a radius of 0 or less, a face leaning by 60° and more, a pin at the tip.
 * @see moment of the face's push about the pin: own statics, friction left out.
 * @example pawlUnderLoad({ tipRadius: 80, pin: { x: 80, y: 60 }, undercut: 0.2 }).outcome // → 'drawn-in'
 */
export function pawlUnderLoad({ tipRadius, pin, undercut }: PawlSeat): PawlOutcome {
  requirePositive('pawlUnderLoad', 'tipRadius', tipRadius);
  requireFinite('pawlUnderLoad', 'pin.x', pin.x);
  requireFinite('pawlUnderLoad', 'pin.y', pin.y);
  requireWithin('pawlUnderLoad', 'undercut', undercut, -Math.PI / 3, Math.PI / 3);
  const toTip = { x: tipRadius - pin.x, y: -pin.y };
  const length = Math.hypot(toTip.x, toTip.y);
  requirePositive('pawlUnderLoad', 'the pawl’s length', finiteResult('pawlUnderLoad', length));
  // the wheel's push on the pawl, square to the face: along +y, turned inward by the undercut
  const push = polar(1, Math.PI / 2 + undercut);
  // turned by a moment M the tip goes toward the arbor by M·(its height over the pin)
  const arm = cross(toTip, push) * Math.sign(toTip.y);
  if (Math.abs(arm) <= armTolerance * length) return { outcome: 'neutral' };
  return arm > 0 ? { outcome: 'drawn-in', arm } : { outcome: 'thrown-out', arm: -arm };
}

/** Whether a pawl that is caught by its tip only slides down the face, by what friction. */
export type CaughtTip =
  | { readonly outcome: 'slides-in'; readonly spare: number }
  | { readonly outcome: 'stays-caught'; readonly lacking: number };

/**
 * Whether a pawl caught by its very tip is drawn in along an undercut face against friction.
 *
 * @throws RangeError for an undercut of 60° and more, or a friction below 0.
 * @see tan(undercut) > μ: a block on a slope.
 * @example caughtTip(0.2, 0.15) // → { outcome: 'slides-in', spare: 0.05271 }
 */
export function caughtTip(undercut: number, friction: number): CaughtTip {
  requireWithin('caughtTip', 'undercut', undercut, -Math.PI / 3, Math.PI / 3);
  requireNonNegative('caughtTip', 'friction', friction);
  const spare = Math.tan(undercut) - friction;
  return spare > 0 ? { outcome: 'slides-in', spare } : { outcome: 'stays-caught', lacking: -spare };
}

/** A ratchet wheel as it is sawn. */
export interface RatchetWheel {
  readonly teeth: number;
  readonly tipRadius: number;
  readonly depth: number;
  /** How far the faces lean under their tips. */
  readonly undercut: number;
}

/** The closed outline of a ratchet wheel, or the angle by which a face cuts through its tooth. */
export type RatchetOutline =
  | { readonly outcome: 'outlined'; readonly points: readonly Point[] }
  | { readonly outcome: 'no-tooth-left'; readonly by: number };

/**
 * The outline of a ratchet wheel, counter-clockwise, a tip on +x: a face toward the turning of the
 * load (counter-clockwise), straight down to the root, and a straight back up to the next tip.
 *
 * @throws RangeError for fewer than 3 teeth, a radius of 0 or less, a depth outside 0 to the radius.
 * @see exact geometry: the face's foot lies on the root circle, on a line through the tip.
 */
export function ratchetOutline(wheel: RatchetWheel): RatchetOutline {
  const { teeth, tipRadius, depth, undercut } = wheel;
  requireCount('ratchetOutline', 'teeth', teeth, 3);
  requireWithin('ratchetOutline', 'teeth', teeth, 3, 1000);
  requirePositive('ratchetOutline', 'tipRadius', tipRadius);
  requirePositive('ratchetOutline', 'depth', depth);
  requireWithin('ratchetOutline', 'depth', depth, 0, tipRadius);
  requireWithin('ratchetOutline', 'undercut', undercut, -Math.PI / 3, Math.PI / 3);
  const root = tipRadius - depth;
  const pitch = (2 * Math.PI) / teeth;
  const perpendicular = tipRadius * Math.sin(Math.abs(undercut));
  if (perpendicular >= root) {
    return { outcome: 'no-tooth-left', by: (perpendicular - root) / tipRadius };
  }
  // the foot stands back from the tip by the angle under which the face is seen
  const back = Math.asin(perpendicular / root) - Math.abs(undercut);
  const by = back - pitch;
  if (by >= 0) return { outcome: 'no-tooth-left', by };
  const foot = -Math.sign(undercut) * back;
  const points = Array.from({ length: teeth }, (_, k) => [
    polar(tipRadius, k * pitch),
    polar(root, k * pitch + foot),
  ]).flat();
  return finiteResult('ratchetOutline', { outcome: 'outlined', points });
}
