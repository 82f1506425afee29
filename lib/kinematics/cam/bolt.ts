import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative, requirePositive, requireWithin } from '@/lib/numeric/require';
import { findRoot } from '@/lib/numeric/root';
import { type BoltGroove, grooveRadius, requireGroove } from './bolt-groove';

/** Where the pin and the bolt are. */
export interface BoltPlace {
  readonly outcome: 'driven';
  readonly part: 'inner-arc' | 'slope' | 'outer-arc';
  readonly pinRadius: number;
  readonly travel: number;
}

/** What keeps a pin from following its groove. */
export type BoltOutcome =
  | BoltPlace
  /** The bolt's line passes outside the inner arc, by `by`. */
  | { readonly outcome: 'line-misses-groove'; readonly by: number }
  /** The groove runs back under the pin: the slope turns it away faster than the knob turns. */
  | { readonly outcome: 'pin-cannot-follow'; readonly by: number };

/**
 * How far the bolt is out when the knob has turned by `knobAngle` from the start of the groove.
 *
 * Radians; one unit of length. With the line through the axle the travel is what the groove gains;
 * beside it, √(r² − e²) − √(r₁² − e²), the pin standing asin(e/r) round the axle.
 *
 * @throws RangeError for sizes that are none, or a knob turned past the ends of the groove.
 * @see own geometry.
 * @example boltTravel({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 1.5) // → { outcome: 'driven', part: 'slope', pinRadius: 27.5, travel: 7.5 }
 */
export function boltTravel(groove: BoltGroove, knobAngle: number): BoltOutcome {
  requireGroove('boltTravel', groove);
  const offset = groove.lineOffset ?? 0;
  const by = Math.abs(offset) - groove.innerRadius;
  if (by >= 0) return { outcome: 'line-misses-groove', by };
  // dκ/dγ = 1 + (e/r)·r′/√(r² − e²), least at the inner end of the slope
  const inner = reach(groove.innerRadius, offset);
  const follows = 1 + (offset / groove.innerRadius) * (groove.gain / groove.slopeAngle / inner);
  if (follows <= 0)
    return finiteResult('boltTravel', { outcome: 'pin-cannot-follow', by: -follows });
  const place = placeUnder(groove, offset, knobAngle);
  const pinRadius = grooveRadius(groove, place);
  const travel = reach(pinRadius, offset) - inner;
  return finiteResult('boltTravel', {
    outcome: 'driven',
    part: partAt(groove, place),
    pinRadius,
    travel,
  });
}

/**
 * The whole angle through which the knob turns, from one end of the groove to the other, with the
 * bolt's line through the axle: the slope and two arcs.
 *
 * @throws RangeError for sizes that are none.
 * @example knobTurn({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }) // → 3
 */
export function knobTurn(groove: BoltGroove): number {
  requireGroove('knobTurn', groove);
  return finiteResult('knobTurn', groove.slopeAngle + 2 * groove.dwellAngle);
}

/**
 * The slope of the groove against the circle, tan λ = (h/β)/r, at `pinRadius`; steepest inside.
 *
 * @throws RangeError for sizes that are none, or a radius outside the groove.
 * @see the spiral of Archimedes.
 * @example grooveSlope({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 25) // → 0.3
 */
export function grooveSlope(groove: BoltGroove, pinRadius: number): number {
  requireGroove('grooveSlope', groove);
  const { innerRadius, gain, slopeAngle } = groove;
  requireWithin('grooveSlope', 'pinRadius', pinRadius, innerRadius, innerRadius + gain);
  return finiteResult('grooveSlope', gain / slopeAngle / pinRadius);
}

/** What a push on the bolt does while the pin stands on the slope. */
export type BoltHold =
  | { readonly outcome: 'holds'; readonly slope: number; readonly spare: number }
  | {
      readonly outcome: 'slides-back';
      readonly slope: number;
      readonly by: number;
      /** The inner radius from which the same gain would hold; infinite without friction. */
      readonly innerRadiusToHold: number | 'infinite';
    };

/**
 * Whether the bolt, pushed back at the steepest place of the slope, is held by friction alone; on
 * an arc it is locked whatever the friction.
 *
 * `slope` is tan λ; `spare` and `by` are the friction left over or lacking.
 *
 * @throws RangeError for sizes that are none or a friction below 0.
 * @see a block on a slope holds if tan λ < μ; friction of disc and guides only helps.
 * @example boltHold({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 0.25) // → { outcome: 'slides-back', slope: 0.375, by: 0.125, innerRadiusToHold: 30 }
 */
export function boltHold(groove: BoltGroove, friction: number): BoltHold {
  requireNonNegative('boltHold', 'friction', friction);
  const slope = grooveSlope(groove, groove.innerRadius);
  const by = slope - friction;
  if (by < 0) return { outcome: 'holds', slope, spare: -by };
  const needed = groove.gain / groove.slopeAngle / friction;
  const innerRadiusToHold = friction === 0 ? ('infinite' as const) : needed;
  return finiteResult('boltHold', { outcome: 'slides-back', slope, by, innerRadiusToHold });
}

/**
 * The slope angle from which the knob can no longer drive the bolt, groove and guide both rubbing.
 *
 * @throws RangeError for a friction below 0.
 * @see λ = 90° − 2·atan μ: own statics of two rubbing faces.
 * @example wedgingSlope(0.4) // → 0.809784
 */
export function wedgingSlope(friction: number): number {
  requireNonNegative('wedgingSlope', 'friction', friction);
  return Math.PI / 2 - 2 * Math.atan(friction);
}

/**
 * How many times the hand's force the bolt pulls on the slope, friction left out.
 *
 * @throws RangeError for sizes that are none, a gain of 0, or a knob radius of 0 or less.
 * @see virtual work: F·h = hand·K·β.
 * @example boltPull({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 30) // → 4
 */
export function boltPull(groove: BoltGroove, knobRadius: number): number {
  requireGroove('boltPull', groove);
  requirePositive('boltPull', 'knobRadius', knobRadius);
  return finiteResult('boltPull', knobRadius * (groove.slopeAngle / groove.gain));
}

/** The place of the groove under the pin: on the arcs at once, on the slope by a root. */
function placeUnder(groove: BoltGroove, offset: number, knobAngle: number): number {
  const { dwellAngle, slopeAngle } = groove;
  const ahead = (place: number) =>
    Math.asin(offset / groove.innerRadius) - Math.asin(offset / grooveRadius(groove, place));
  const slopeEnd = dwellAngle + slopeAngle;
  const gone = slopeEnd + ahead(slopeEnd);
  requireWithin('boltTravel', 'knobAngle', knobAngle, 0, (gone + dwellAngle) * (1 + 1e-12));
  if (knobAngle <= dwellAngle) return knobAngle;
  if (knobAngle >= gone) return slopeEnd + (knobAngle - gone);
  if (offset === 0) return knobAngle;
  const beyond = (place: number) => place + ahead(place) - knobAngle;
  const found = findRoot(beyond, dwellAngle, slopeEnd, { tolerance: 1e-15 * slopeEnd });
  return found.outcome === 'found' ? found.x : Number.NaN;
}

function reach(radius: number, offset: number): number {
  return offset === 0 ? radius : Math.sqrt(radius - offset) * Math.sqrt(radius + offset);
}

function partAt({ dwellAngle, slopeAngle }: BoltGroove, place: number): BoltPlace['part'] {
  if (place <= dwellAngle) return 'inner-arc';
  return place < dwellAngle + slopeAngle ? 'slope' : 'outer-arc';
}
