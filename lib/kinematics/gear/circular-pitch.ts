import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A wheel set out by the spacing of its teeth. */
export interface PitchedWheel {
  readonly pitchDiameter: number;
  readonly module: number;
  /** What dividers step off on the pitch circle: straight across, not along the arc. */
  readonly chord: number;
}

/** Whole teeth on a circle that was given. */
export type WholeTeeth =
  | {
      readonly outcome: 'teeth';
      readonly teeth: number;
      /** Spacing when the teeth share the circle evenly. */
      readonly pitch: number;
      readonly chord: number;
      /** What would be left over at the wanted spacing. */
      readonly leftOver: number;
      /** Diameters on which the wanted spacing goes round exactly, with these teeth and one more. */
      readonly diameter: number;
      readonly nextDiameter: number;
    }
  /** Fewer than three spacings fit; the circle lacks `lacking` in diameter. */
  | { readonly outcome: 'too-small'; readonly lacking: number };

/** A spacing that fits to within this share of itself counts as fitting. */
const fitTolerance = 1e-9;

/**
 * Diameter, module and divider setting of a wheel with a given spacing along its pitch circle.
 *
 * @throws RangeError for nonsense.
 * Source: case GR-CP-01.
 * @example wheelFromPitch(25, 18).chord // → 24.8732692511
 */
export function wheelFromPitch(pitch: number, teeth: number): PitchedWheel {
  const p = requireSize('wheelFromPitch', 'pitch', pitch);
  const z = requireCount('wheelFromPitch', 'teeth', teeth, 3);
  const pitchDiameter = (p * z) / Math.PI;
  return { pitchDiameter, module: p / Math.PI, chord: pitchDiameter * Math.sin(Math.PI / z) };
}

/**
 * How many whole teeth go round a circle at a wanted spacing, and what becomes of the rest.
 *
 * - `teeth`, the greatest whole number; `too-small` if that is under three.
 *
 * @throws RangeError for nonsense.
 * Source: ⌊πD/p⌋.
 * @example wholeTeethRound(200, 20).outcome // → 'teeth'
 */
export function wholeTeethRound(diameter: number, wantedPitch: number): WholeTeeth {
  const d = requireSize('wholeTeethRound', 'diameter', diameter);
  const p = requireSize('wholeTeethRound', 'wantedPitch', wantedPitch);
  const exact = (Math.PI * d) / p;
  const teeth = Math.floor(exact + fitTolerance * exact);
  if (teeth < 3) return { outcome: 'too-small', lacking: (3 * p) / Math.PI - d };
  return {
    outcome: 'teeth',
    teeth,
    pitch: (Math.PI * d) / teeth,
    chord: d * Math.sin(Math.PI / teeth),
    leftOver: Math.max(0, (exact - teeth) * p),
    diameter: (p * teeth) / Math.PI,
    nextDiameter: (p * (teeth + 1)) / Math.PI,
  };
}
