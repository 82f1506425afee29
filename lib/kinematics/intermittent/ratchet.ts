import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requireNonNegative, requirePositive } from '@/lib/numeric/require';

/** What a ratchet wheel with its pawls can do. */
export interface Ratchet {
  /** The angle from tooth to tooth. */
  readonly pitch: number;
  /** The smallest step with the pawls set evenly between teeth, and the most that is ever lost. */
  readonly resolution: number;
}

/** What one stroke of the lever does. */
export type RatchetStroke =
  | {
      readonly outcome: 'steps';
      readonly teeth: number;
      readonly turn: number;
      /** The part of the swing in which the wheel does not move. */
      readonly lost: number;
      /** Whether the swing ends just at a tooth: the pawl may or may not drop in. */
      readonly doubtful: boolean;
    }
  /** The pawl never reaches the next tooth, by `lacking`. */
  | { readonly outcome: 'no-tooth'; readonly lacking: number };

/** Swings that end within this part of a pitch of a tooth end at the tooth. */
const pitchTolerance = 1e-9;

/**
 * The pitch of a ratchet wheel of `teeth` and the resolution that `pawls` set evenly give it.
 *
 * Radians.
 *
 * @throws RangeError for counts that are none.
 * @see 2π/z and 2π/(z·q).
 * @example ratchet(24, 2).resolution // → 0.1308997
 */
export function ratchet(teeth: number, pawls: number): Ratchet {
  requireCount('ratchet', 'teeth', teeth);
  requireCount('ratchet', 'pawls', pawls);
  const pitch = (2 * Math.PI) / teeth;
  return { pitch, resolution: pitch / pawls };
}

/**
 * What a swing of the lever does to the wheel, by one pawl: whole teeth only.
 *
 * @throws RangeError for a count that is none or a swing below 0.
 * @see ⌊β·z/2π⌋.
 * @example ratchetStroke(24, Math.PI / 4.5) // → { outcome: 'steps', teeth: 2, turn: 0.523599, lost: 0.174533, doubtful: false }
 */
export function ratchetStroke(teeth: number, swing: number): RatchetStroke {
  requireCount('ratchetStroke', 'teeth', teeth);
  requireNonNegative('ratchetStroke', 'swing', swing);
  const { pitch } = ratchet(teeth, 1);
  const passed = finiteResult('ratchetStroke', swing / pitch);
  const whole = Math.floor(passed + pitchTolerance);
  if (whole === 0) return { outcome: 'no-tooth', lacking: pitch - swing };
  const turn = whole * pitch;
  return finiteResult('ratchetStroke', {
    outcome: 'steps',
    teeth: whole,
    turn,
    lost: Math.max(0, swing - turn),
    doubtful: Math.abs(passed - whole) <= pitchTolerance * Math.max(1, passed),
  });
}

/**
 * How far a load on a drum can drop, at worst, before the wheel is caught by pawls set evenly.
 *
 * @throws RangeError for counts that are none or a diameter of 0 or less.
 * @see π·D/(z·q).
 * @example ratchetDrop(60, 20, 3) // → 3.1415927
 */
export function ratchetDrop(drumDiameter: number, teeth: number, pawls: number): number {
  requirePositive('ratchetDrop', 'drumDiameter', drumDiameter);
  return finiteResult('ratchetDrop', (drumDiameter / 2) * ratchet(teeth, pawls).resolution);
}

/**
 * How far one stroke of the lever winds a load up.
 *
 * @throws RangeError as `ratchetDrop` and `ratchetStroke`.
 * @example ratchetLift(60, 20, 0.9) // → 18.849556
 */
export function ratchetLift(drumDiameter: number, teeth: number, swing: number): number {
  requirePositive('ratchetLift', 'drumDiameter', drumDiameter);
  const stroke = ratchetStroke(teeth, swing);
  const turn = stroke.outcome === 'steps' ? stroke.turn : 0;
  return finiteResult('ratchetLift', (drumDiameter / 2) * turn);
}
