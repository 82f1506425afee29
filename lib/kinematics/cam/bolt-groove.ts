import type { Point } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireCount,
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/**
 * The groove of a plate cam that drives a bolt: an arc about the axle, an even slope, an arc. The
 * bolt's line runs `lineOffset` beside the axle, on the side to which the disc's top turns if < 0.
 */
export interface BoltGroove {
  readonly innerRadius: number;
  readonly gain: number;
  readonly slopeAngle: number;
  /** The angle of each of the two arcs. */
  readonly dwellAngle: number;
  readonly lineOffset?: number;
}

/**
 * The radius of the groove's middle line, `place` radians from its inner end; the ends go on as arcs.
 *
 * @throws RangeError for sizes that are none or a place that is no finite number.
 * @example grooveRadius({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 1.5) // → 27.5
 */
export function grooveRadius(groove: BoltGroove, place: number): number {
  requireGroove('grooveRadius', groove);
  requireFinite('grooveRadius', 'place', place);
  const share = (place - groove.dwellAngle) / groove.slopeAngle;
  const gained = groove.gain * Math.min(1, Math.max(0, share));
  return finiteResult('grooveRadius', groove.innerRadius + gained);
}

/** A groove as it is cut: its middle line and both walls, from the inner end to the outer. */
export interface GrooveLines {
  readonly middle: readonly Point[];
  readonly innerWall: readonly Point[];
  readonly outerWall: readonly Point[];
}

/**
 * The lines of a groove for a pin of `pinRadius`, in the frame of the disc: the inner end at +y,
 * further places clockwise, as a knob turned counter-clockwise brings them under a bolt above.
 *
 * The walls lie one pin radius to either side of the middle line, square to it.
 *
 * @throws RangeError for sizes that are none, or steps that are not a whole number from 6 to 100 000.
 */
export function grooveLines(groove: BoltGroove, pinRadius: number, steps = 120): GrooveLines {
  requireGroove('grooveLines', groove);
  requirePositive('grooveLines', 'pinRadius', pinRadius);
  requireCount('grooveLines', 'steps', steps, 6);
  requireWithin('grooveLines', 'steps', steps, 6, 100_000);
  const whole = groove.slopeAngle + 2 * groove.dwellAngle;
  const places = Array.from({ length: steps + 1 }, (_, i) => (whole * i) / steps);
  const line = (aside: number) => places.map((place) => wallAt(groove, place, aside));
  return finiteResult('grooveLines', {
    middle: line(0),
    innerWall: line(-pinRadius),
    outerWall: line(pinRadius),
  });
}

/** The wood that a groove leaves on either side; below 0 the groove breaks through by so much. */
export interface GrooveWood {
  readonly inside: number;
  readonly outside: number;
}

/**
 * The wood between the groove and the axle hole, and between the groove and the rim.
 *
 * @throws RangeError for sizes that are none.
 * @example grooveWood({ innerRadius: 20, gain: 15, slopeAngle: 2, dwellAngle: 0.5 }, 3, 12, 50) // → { inside: 11, outside: 12 }
 */
export function grooveWood(
  groove: BoltGroove,
  pinRadius: number,
  holeDiameter: number,
  discRadius: number,
): GrooveWood {
  requireGroove('grooveWood', groove);
  requirePositive('grooveWood', 'pinRadius', pinRadius);
  requireNonNegative('grooveWood', 'holeDiameter', holeDiameter);
  requirePositive('grooveWood', 'discRadius', discRadius);
  return finiteResult('grooveWood', {
    inside: groove.innerRadius - pinRadius - holeDiameter / 2,
    outside: discRadius - groove.innerRadius - groove.gain - pinRadius,
  });
}

function wallAt(groove: BoltGroove, place: number, aside: number): Point {
  const radius = grooveRadius(groove, place);
  const onSlope =
    Math.abs(place - groove.dwellAngle - groove.slopeAngle / 2) < groove.slopeAngle / 2;
  const lean = onSlope ? Math.atan2(groove.gain / groove.slopeAngle, radius) : 0;
  // on a slope that grows clockwise the outward normal leans back, against the clock
  const [along, outward] = [-aside * Math.sin(lean), radius + aside * Math.cos(lean)];
  const [sine, cosine] = [Math.sin(place), Math.cos(place)];
  return { x: outward * sine + along * cosine, y: outward * cosine - along * sine };
}

/** Refuses a groove that is none: the guard of every function that takes one. */
export function requireGroove(caller: string, groove: BoltGroove): void {
  requirePositive(caller, 'innerRadius', groove.innerRadius);
  requirePositive(caller, 'gain', groove.gain);
  requirePositive(caller, 'slopeAngle', groove.slopeAngle);
  requireNonNegative(caller, 'dwellAngle', groove.dwellAngle);
  requireFinite(caller, 'lineOffset', groove.lineOffset ?? 0);
}
