import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requirePositive } from '@/lib/numeric/require';

/**
 * The setting of the dividers for equal divisions of a circle: the chord, not the arc.
 *
 * One unit of length.
 *
 * @throws RangeError for a diameter of 0 or less, a count that is none.
 * @see D·sin(π/N): Machinery's Handbook, lengths of chords.
 * @example dividerSetting(1, 7) // → 0.433884
 */
export function dividerSetting(diameter: number, divisions: number): number {
  requirePositive('dividerSetting', 'diameter', diameter);
  requireCount('dividerSetting', 'divisions', divisions);
  // a whole circle as one division comes back to where it began
  return divisions === 1
    ? 0
    : finiteResult('dividerSetting', diameter * Math.sin(Math.PI / divisions));
}

/**
 * The diameter on which a divider setting steps off a number of divisions: the inverse.
 *
 * @throws RangeError for a chord of 0 or less, fewer than 2 divisions.
 * @example diameterForSetting(20, 6) // → 40
 */
export function diameterForSetting(chord: number, divisions: number): number {
  requirePositive('diameterForSetting', 'chord', chord);
  requireCount('diameterForSetting', 'divisions', divisions, 2);
  return finiteResult('diameterForSetting', chord / Math.sin(Math.PI / divisions));
}

/** Whole teeth round a circle, or by how much the circle is too small for one. */
export type TeethOnCircle =
  | {
      readonly outcome: 'fits';
      readonly teeth: number;
      /** The spacing that they really get, round the circle. */
      readonly pitch: number;
      readonly dividerSetting: number;
      /** The circle that would give the wanted spacing with one tooth more. */
      readonly nextDiameter: number;
    }
  | { readonly outcome: 'too-small'; readonly by: number };

/** A circle that was meant to come out even may lack this part of a tooth by rounding. */
const evenTolerance = 1e-9;

/**
 * The most whole teeth round a circle that are nowhere closer than `pitch`.
 *
 * @throws RangeError for a diameter or a pitch of 0 or less.
 * @see p·N = π·D.
 * @example teethOnCircle(200, 20) // → { outcome: 'fits', teeth: 31, pitch: 20.26834, dividerSetting: 20.23366, nextDiameter: 203.71833 }
 */
export function teethOnCircle(diameter: number, pitch: number): TeethOnCircle {
  requirePositive('teethOnCircle', 'diameter', diameter);
  requirePositive('teethOnCircle', 'pitch', pitch);
  const round = finiteResult('teethOnCircle', Math.PI * diameter);
  const teeth = Math.floor(finiteResult('teethOnCircle', round / pitch) + evenTolerance);
  if (teeth === 0) return { outcome: 'too-small', by: (pitch - round) / Math.PI };
  requireCount('teethOnCircle', 'teeth', teeth);
  return finiteResult('teethOnCircle', {
    outcome: 'fits',
    teeth,
    pitch: round / teeth,
    dividerSetting: dividerSetting(diameter, teeth),
    nextDiameter: ((teeth + 1) * pitch) / Math.PI,
  });
}
