import { requirePressureAngle } from '@/lib/kinematics/gear/proportions';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount, requireWithin } from '@/lib/numeric/require';

/** A limit on a tooth count: where exactly it lies, and the whole count next to it. */
export interface TeethLimit {
  readonly exact: number;
  readonly teeth: number;
}

/** How large a wheel may be that a pinion runs with. */
export type LargestWheel =
  /** Up to `teeth` teeth. */
  | ({ readonly outcome: 'largest' } & TeethLimit)
  /** Any wheel, and a rack. */
  | { readonly outcome: 'any' }
  /** Not even one of its own size: the pinion itself needs `lacking` more teeth. */
  | { readonly outcome: 'none'; readonly exact: number; readonly lacking: number };

/** Tooth and addendum of teeth that are to run without digging into each other. */
export interface ToothProportion {
  /** Radians, 1° to 45°. */
  readonly pressureAngle: number;
  /** Addendum in modules; 1 unless given. */
  readonly addendum?: number;
}

/** A whole number of teeth is met within this, so that rounding never asks for one more. */
const wholeTolerance = 1e-9;

/**
 * The fewest teeth that a rack cuts, or runs with, without undercut: 2k/sin²α.
 *
 * @throws RangeError for nonsense.
 * Source: Shigley, Mechanical Engineering Design, eq 13-13 (number by edition); 32, 18, 12 teeth.
 * @example fewestTeethForRack({ pressureAngle: Math.PI / 9 }).teeth // → 18
 */
export function fewestTeethForRack(tooth: ToothProportion): TeethLimit {
  const { k, square } = complete('fewestTeethForRack', tooth);
  return atLeast((2 * k) / square);
}

/**
 * The fewest teeth of a pinion that runs with a wheel `ratio` times as large, neither digging.
 *
 * @throws RangeError for nonsense or a ratio below 1.
 * Source: Shigley, eq 13-11 (number by edition); cases GR-UP-01 and 02.
 * @example fewestTeethForPair({ pressureAngle: Math.PI / 9 }, 1).teeth // → 13
 */
export function fewestTeethForPair(tooth: ToothProportion, ratio: number): TeethLimit {
  const { k, square } = complete('fewestTeethForPair', tooth);
  requireWithin('fewestTeethForPair', 'ratio', ratio, 1, 1e9);
  const share = (1 + 2 * ratio) * square;
  return atLeast((2 * k * (ratio + Math.sqrt(ratio * ratio + share))) / share);
}

/**
 * The largest wheel that a pinion runs with before the wheel's tips dig into its foot.
 *
 * - `largest`; `any` when even a rack clears; `none` when not even its twin does.
 *
 * @throws RangeError for nonsense.
 * Source: Shigley, eq 13-12 (number by edition); cases GR-LG-01 to 04.
 * @example largestWheel({ pressureAngle: Math.PI / 9 }, 13) // → { outcome: 'largest', exact: 16.4506680683, teeth: 16 }
 */
export function largestWheel(tooth: ToothProportion, pinionTeeth: number): LargestWheel {
  const { k, square } = complete('largestWheel', tooth);
  const pinion = requireCount('largestWheel', 'pinionTeeth', pinionTeeth, 3);
  const room = 4 * k - 2 * pinion * square;
  if (room <= 0) return { outcome: 'any' };
  const exact = (pinion * pinion * square - 4 * k * k) / room;
  const teeth = Math.floor(exact + wholeTolerance);
  if (teeth >= pinion) return { outcome: 'largest', exact, teeth };
  return { outcome: 'none', exact, lacking: fewestTeethForPair(tooth, 1).teeth - pinion };
}

/**
 * The least profile shift, in modules, with which a rack does not undercut a pinion; negative when
 * the pinion may be shifted inwards by so much.
 *
 * @throws RangeError for nonsense.
 * Source: k − (z/2)·sin²α; cases GR-MX-01 and 02.
 * @example leastShift({ pressureAngle: Math.PI / 9 }, 10) // → 0.415111107797
 */
export function leastShift(tooth: ToothProportion, teeth: number): number {
  const { k, square } = complete('leastShift', tooth);
  return k - (requireCount('leastShift', 'teeth', teeth, 3) * square) / 2;
}

function complete(caller: string, tooth: ToothProportion): { k: number; square: number } {
  const angle = requirePressureAngle(caller, tooth.pressureAngle);
  return {
    k: requireSize(caller, 'addendum', tooth.addendum ?? 1),
    square: Math.sin(angle) ** 2,
  };
}

function atLeast(exact: number): TeethLimit {
  return { exact, teeth: Math.ceil(exact - wholeTolerance) };
}
