import { requirePressureAngle } from '@/lib/kinematics/gear/proportions';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Two outside wheels of one module that are to run together. */
export interface PairSpec {
  readonly module: number;
  readonly firstTeeth: number;
  readonly secondTeeth: number;
  /** Pressure angle of the cutting rack, radians, 1° to 45°. */
  readonly pressureAngle: number;
  /** Profile shifts in modules; 0 unless given. */
  readonly firstShift?: number;
  readonly secondShift?: number;
  /** Addendum in modules; 1 unless given. */
  readonly addendum?: number;
}

/** A pair with every choice made, and the circles that follow. */
export interface CompletePair extends Required<PairSpec> {
  /** Centre distance of the same wheels without shift. */
  readonly standardDistance: number;
  readonly firstBase: number;
  readonly secondBase: number;
}

/**
 * `spec` with its defaults filled in, once it makes sense, and its base radii.
 *
 * @throws RangeError for nonsense.
 * @example completePair('pair', { module: 3, firstTeeth: 20, secondTeeth: 40, pressureAngle: 0.35 }).standardDistance // → 90
 */
export function completePair(caller: string, spec: PairSpec): CompletePair {
  const size = requireSize(caller, 'module', spec.module);
  const first = requireCount(caller, 'firstTeeth', spec.firstTeeth, 3);
  const second = requireCount(caller, 'secondTeeth', spec.secondTeeth, 3);
  const cosine = Math.cos(requirePressureAngle(caller, spec.pressureAngle));
  return {
    ...spec,
    firstShift: requireMeasure(caller, 'firstShift', spec.firstShift ?? 0),
    secondShift: requireMeasure(caller, 'secondShift', spec.secondShift ?? 0),
    addendum: requireSize(caller, 'addendum', spec.addendum ?? 1),
    standardDistance: (size * (first + second)) / 2,
    firstBase: (size * first * cosine) / 2,
    secondBase: (size * second * cosine) / 2,
  };
}
