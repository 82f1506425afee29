import { involute, involuteInverse } from '@/lib/kinematics/gear/involute';
import {
  completeGear,
  gearProportions,
  requirePressureAngle,
} from '@/lib/kinematics/gear/proportions';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A calliper over several teeth. */
export interface Span {
  readonly span: number;
  /** Radius at which the jaws touch the flanks. */
  readonly touchesAt: number;
  /** Whether that lies between base circle and tip, so that the reading can be trusted. */
  readonly onFlank: boolean;
}

/** A reading over or between two pins in opposite tooth spaces. */
export type PinReading =
  | {
      readonly outcome: 'reading';
      readonly reading: number;
      /** Diameter of the circle through the centres of the pins. */
      readonly pinCircle: number;
    }
  /** The pin falls through to the root: it would have to be `lacking` thicker to rest on flanks. */
  | { readonly outcome: 'pin-too-thin'; readonly lacking: number }
  /** The pin does not enter the space of a ring: it would have to be `excess` thinner. */
  | { readonly outcome: 'pin-too-thick'; readonly excess: number };

/**
 * The length over `spanned` teeth, measured with flat jaws: the base tangent length.
 *
 * @throws RangeError for nonsense.
 * Source: ISO 21771; W = m cos α((k − ½)π + z inv α) + 2xm sin α; cases GR-SP-01 to 03.
 * @example spanMeasurement({ module: 1, teeth: 30, pressureAngle: Math.PI / 9 }, 4).span // → 10.7526262055
 */
export function spanMeasurement(spec: GearSpec, spanned: number): Span {
  const gear = completeGear('spanMeasurement', spec);
  requireCount('spanMeasurement', 'spanned', spanned);
  const { baseDiameter, tipDiameter } = gearProportions(spec);
  const [sine, cosine] = [Math.sin(gear.pressureAngle), Math.cos(gear.pressureAngle)];
  const teeth = (spanned - 0.5) * Math.PI + gear.teeth * involute(gear.pressureAngle);
  const span = gear.module * (cosine * teeth + 2 * gear.shift * sine);
  const touchesAt = Math.hypot(baseDiameter, span) / 2;
  return { span, touchesAt, onFlank: span > 0 && touchesAt < tipDiameter / 2 };
}

/**
 * The number of teeth to span so that the jaws touch near the pitch circle.
 *
 * @throws RangeError for nonsense.
 * Source: z·α/π + ½, to the nearest whole (any book of gears).
 * @example teethToSpan({ module: 1, teeth: 30, pressureAngle: Math.PI / 9 }) // → 4
 */
export function teethToSpan(spec: GearSpec): number {
  const gear = completeGear('teethToSpan', spec);
  return Math.max(1, Math.round((gear.teeth * gear.pressureAngle) / Math.PI + 0.5));
}

/**
 * The profile shift, in modules, that a measured span shows: the inverse of `spanMeasurement`.
 *
 * @throws RangeError for nonsense.
 * @example shiftFromSpan({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }, 3, 23.9702329464) // → 0.4
 */
export function shiftFromSpan(spec: GearSpec, spanned: number, measured: number): number {
  requireSize('shiftFromSpan', 'measured', measured);
  const { span } = spanMeasurement({ ...spec, shift: 0 }, spanned);
  return (measured - span) / (2 * spec.module * Math.sin(spec.pressureAngle));
}

/**
 * The reading over two pins in opposite spaces of an outside wheel (nearly opposite, if its teeth
 * are odd in number).
 *
 * - `reading`; `pin-too-thin` when the pin would drop to the root.
 *
 * @throws RangeError for nonsense.
 * Source: Machinery's Handbook, pins of 1.728/P; cases GR-OP-01 to 04.
 * @example overPins({ module: 1, teeth: 32, pressureAngle: Math.PI / 9 }, 1.728) // → { outcome: 'reading', reading: 34.4129778952, pinCircle: 32.6849778952 }
 */
export function overPins(spec: GearSpec, pin: number): PinReading {
  requireSize('overPins', 'pin', pin);
  const { baseDiameter } = gearProportions(spec);
  const rolled = pin / baseDiameter - spaceAtBase(spec);
  if (rolled < 0) return { outcome: 'pin-too-thin', lacking: -rolled * baseDiameter };
  const pinCircle = baseDiameter / Math.cos(involuteInverse(rolled));
  return { outcome: 'reading', reading: acrossPins(spec.teeth, pinCircle) + pin, pinCircle };
}

/**
 * The reading between two pins in opposite spaces of a ring; a positive shift widens its spaces.
 *
 * - `reading`; `pin-too-thick` when the pin stays out of the space.
 *
 * @throws RangeError for nonsense.
 * Source: case GR-OI-01.
 * @example betweenPins({ module: 3, teeth: 60, pressureAngle: Math.PI / 9 }, 4.32) // → { outcome: 'reading', reading: 175.994288687, pinCircle: 180.314288687 }
 */
export function betweenPins(spec: GearSpec, pin: number): PinReading {
  requireSize('betweenPins', 'pin', pin);
  const { baseDiameter, thickness, pitchDiameter } = gearProportions(spec);
  const rolled = thickness / pitchDiameter + involute(spec.pressureAngle) - pin / baseDiameter;
  if (rolled < 0) return { outcome: 'pin-too-thick', excess: -rolled * baseDiameter };
  const pinCircle = baseDiameter / Math.cos(involuteInverse(rolled));
  return { outcome: 'reading', reading: acrossPins(spec.teeth, pinCircle) - pin, pinCircle };
}

/**
 * Height of the top of a pin in the space of a rack above its pitch line, where the space is half a
 * pitch wide.
 *
 * @throws RangeError for nonsense.
 * Source: the pin touches both flanks; case GR-RP-01.
 * @example rackOverPin({ module: 3, pressureAngle: Math.PI / 9 }, 5) // → 3.33591984276
 */
export function rackOverPin(
  rack: { readonly module: number; readonly pressureAngle: number },
  pin: number,
): number {
  const size = requireSize('rackOverPin', 'module', rack.module);
  const angle = requirePressureAngle('rackOverPin', rack.pressureAngle);
  requireSize('rackOverPin', 'pin', pin);
  const centre = (pin / (2 * Math.cos(angle)) - (Math.PI * size) / 4) / Math.tan(angle);
  return centre + pin / 2;
}

/** Half the angle of a tooth space at the base circle, negative if the teeth meet there. */
function spaceAtBase(spec: GearSpec): number {
  const { thickness, pitchDiameter } = gearProportions(spec);
  return Math.PI / spec.teeth - thickness / pitchDiameter - involute(spec.pressureAngle);
}

/** Straight across two pin centres, as nearly opposite as the count allows. */
function acrossPins(teeth: number, pinCircle: number): number {
  return teeth % 2 === 0 ? pinCircle : pinCircle * Math.cos(Math.PI / (2 * teeth));
}
