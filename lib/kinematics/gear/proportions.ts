import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount, requireWithin } from '@/lib/numeric/require';

/** What fixes one involute spur wheel; only the first three must be given. */
export interface GearSpec {
  /** Module: pitch diameter over tooth count, a length. */
  readonly module: number;
  /** Whole number of teeth, 3 or more. */
  readonly teeth: number;
  /** Pressure angle in radians, from 1° to 45°. */
  readonly pressureAngle: number;
  /** Profile shift in modules; 0 unless given. */
  readonly shift?: number;
  /** Addendum in modules; 1 (full depth) unless given, 0.8 for stub teeth. */
  readonly addendum?: number;
  /** Bottom clearance in modules; 0.25 unless given. */
  readonly clearance?: number;
}

/** A wheel with every choice made. */
export type CompleteGearSpec = Required<GearSpec>;

/** The sizes of one wheel, in the unit of its module. */
export interface GearProportions {
  readonly pitchDiameter: number;
  readonly baseDiameter: number;
  readonly tipDiameter: number;
  readonly rootDiameter: number;
  /** Spacing of the teeth along the pitch circle. */
  readonly pitch: number;
  /** Spacing along the base circle, and along the line of action. */
  readonly basePitch: number;
  /** Tooth thickness along the pitch circle. */
  readonly thickness: number;
  /** From root to tip. */
  readonly depth: number;
}

const degree = Math.PI / 180;
/** More teeth than anyone draws; a bound, so that a slip of the finger does not fill the memory. */
const mostDrawn = 10_000;

/**
 * The sizes of an involute spur wheel.
 *
 * Lengths in the unit of the module; a positive shift moves tip and root outwards together.
 *
 * @throws RangeError for nonsense, and for a root at or below the centre of the wheel.
 * Source: ISO 53:1998, ISO 21771; with `shift`, d ± 2m(h ± x).
 * @example gearProportions({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }).tipDiameter // → 78
 */
export function gearProportions(spec: GearSpec): GearProportions {
  const gear = completeGear('gearProportions', spec);
  const pitchDiameter = gear.module * gear.teeth;
  const pitch = Math.PI * gear.module;
  return {
    pitchDiameter,
    baseDiameter: pitchDiameter * Math.cos(gear.pressureAngle),
    tipDiameter: pitchDiameter + 2 * gear.module * (gear.addendum + gear.shift),
    rootDiameter: pitchDiameter - 2 * gear.module * (gear.addendum + gear.clearance - gear.shift),
    pitch,
    basePitch: pitch * Math.cos(gear.pressureAngle),
    thickness: gear.module * (Math.PI / 2 + 2 * gear.shift * Math.tan(gear.pressureAngle)),
    depth: gear.module * (2 * gear.addendum + gear.clearance),
  };
}

/**
 * `spec` with its defaults filled in, once it makes sense.
 *
 * @param caller the function that was asked, named in the refusal.
 * @throws RangeError for nonsense, and for a root at or below the centre of the wheel.
 * @example completeGear('wheel', { module: 2, teeth: 20, pressureAngle: 0.35 }).clearance // → 0.25
 */
export function completeGear(caller: string, spec: GearSpec): CompleteGearSpec {
  const gear = {
    module: requireSize(caller, 'module', spec.module),
    teeth: requireCount(caller, 'teeth', spec.teeth, 3),
    pressureAngle: requirePressureAngle(caller, spec.pressureAngle),
    shift: requireMeasure(caller, 'shift', spec.shift ?? 0),
    addendum: requireSize(caller, 'addendum', spec.addendum ?? 1),
    clearance: requireSizeOrNought(caller, 'clearance', spec.clearance ?? 0.25),
  };
  const root = gear.teeth / 2 - gear.addendum - gear.clearance + gear.shift;
  requireSize(caller, 'root radius in modules', root);
  return gear;
}

/**
 * `angle`, if it can be the pressure angle of a wheel: from 1° to 45°, in radians.
 *
 * @throws RangeError otherwise.
 * @example requirePressureAngle('wheel', 0.35) // → 0.35
 */
export function requirePressureAngle(caller: string, angle: number): number {
  return requireWithin(caller, 'pressureAngle', angle, degree, Math.PI / 4);
}

/**
 * `teeth`, if they are few enough to be drawn one by one: at most ten thousand.
 *
 * @throws RangeError otherwise.
 * @example requireDrawable('wheel', 60) // → 60
 */
export function requireDrawable(caller: string, teeth: number): number {
  return requireWithin(caller, 'teeth', requireCount(caller, 'teeth', teeth), 1, mostDrawn);
}
