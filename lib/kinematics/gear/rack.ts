import type { Point } from '@/lib/geometry/point';
import { requireDrawable, requirePressureAngle } from '@/lib/kinematics/gear/proportions';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A toothed bar. */
export interface RackSpec {
  readonly module: number;
  readonly teeth: number;
  /** Radians, 1° to 45°. */
  readonly pressureAngle: number;
  /** Addendum and clearance in modules; 1 and 0.25 unless given. */
  readonly addendum?: number;
  readonly clearance?: number;
  /** Taken off the thickness of each tooth on the pitch line. */
  readonly backlash?: number;
  /** Wood behind the roots; two modules unless given. */
  readonly back?: number;
}

/**
 * How far a rack moves while its pinion turns by `angle`: one pitch circumference a turn.
 *
 * The rack lies below its pinion; a pinion that turns counter-clockwise drives it towards +x.
 *
 * @throws RangeError for nonsense.
 * Source: rolling without slip; case GR-RK-01.
 * @example rackTravel({ module: 3, teeth: 20 }, 2 * Math.PI) // → 188.49555921538757
 */
export function rackTravel(
  pinion: { readonly module: number; readonly teeth: number },
  angle: number,
): number {
  requireSize('rackTravel', 'module', pinion.module);
  requireCount('rackTravel', 'teeth', pinion.teeth);
  return (pinion.module * pinion.teeth * requireMeasure('rackTravel', 'angle', angle)) / 2;
}

/**
 * Where the first tooth of a rack stands, along x from below the pinion's centre, so that it meshes
 * with the pinion at `angle`; it runs on without jumps.
 *
 * @throws RangeError for nonsense.
 * Source: at −90° a tooth of the pinion points down, into the space before the rack's first tooth.
 * @example rackPlace({ module: 2, teeth: 20 }, -Math.PI / 2) // → 3.14159265359
 */
export function rackPlace(
  pinion: { readonly module: number; readonly teeth: number },
  angle: number,
): number {
  return rackTravel(pinion, angle + Math.PI / 2) + (Math.PI * pinion.module) / 2;
}

/**
 * The teeth that a rack needs for a travel: those that pass the pinion, and one at either end so
 * that a whole tooth is in mesh throughout.
 *
 * @throws RangeError for nonsense.
 * Source: ⌈travel/pitch⌉ + 2 (own geometry).
 * @example rackTeethForTravel({ module: 3 }, 188.4) // → 22
 */
export function rackTeethForTravel(rack: { readonly module: number }, travel: number): number {
  const pitch = Math.PI * requireSize('rackTeethForTravel', 'module', rack.module);
  const exact = requireSizeOrNought('rackTeethForTravel', 'travel', travel) / pitch;
  return Math.ceil(exact * (1 - Number.EPSILON * 4)) + 2;
}

/**
 * The outline of a rack: a closed polygon, counter-clockwise, teeth upwards.
 *
 * Its pitch line is y = 0 and its teeth are centred on x = 0, p, 2p … The corners of the roots are
 * left sharp: they lie a clearance below the pinion's tips and touch nothing.
 *
 * @throws RangeError for nonsense, and if no tooth or no space is left.
 * Source: ISO 53:1998.
 * @example rackOutline({ module: 1, teeth: 2, pressureAngle: Math.PI / 9 }).length // → 12
 */
export function rackOutline(spec: RackSpec): readonly Point[] {
  const caller = 'rackOutline';
  const size = requireSize(caller, 'module', spec.module);
  const teeth = requireDrawable(caller, spec.teeth);
  const slope = Math.tan(requirePressureAngle(caller, spec.pressureAngle));
  const top = size * requireSize(caller, 'addendum', spec.addendum ?? 1);
  const root = top + size * requireSizeOrNought(caller, 'clearance', spec.clearance ?? 0.25);
  const thinned = requireMeasure(caller, 'backlash', spec.backlash ?? 0) / 2;
  const bottom = -root - requireSizeOrNought(caller, 'back', spec.back ?? 2 * size);
  const pitch = Math.PI * size;
  const half = pitch / 4 - thinned;
  const atTop = requireSize(caller, 'half width of the tip', half - top * slope);
  const atRoot = half + root * slope;
  requireSize(caller, 'half width of the space at the root', pitch / 2 - atRoot);
  const upper = Array.from({ length: teeth }, (_, tooth) => [
    { x: tooth * pitch - atRoot, y: -root },
    { x: tooth * pitch - atTop, y: top },
    { x: tooth * pitch + atTop, y: top },
    { x: tooth * pitch + atRoot, y: -root },
  ]).flat();
  const left = -pitch / 2;
  const right = (teeth - 0.5) * pitch;
  return [
    { x: left, y: bottom },
    { x: right, y: bottom },
    { x: right, y: -root },
    ...upper.toReversed(),
    { x: left, y: -root },
  ];
}
