import { requireMeasure } from '@/lib/numeric/moderate';
import { wrapTurn } from '@/lib/geometry/angle';
import { fourBarAssembly, type FourBarSide } from '@/lib/kinematics/linkage/four-bar';
import { grashofCount } from '@/lib/kinematics/linkage/four-bar-class';
import { requireFourBar, type FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';

/** The two ends of a rocker's swing: crank and coupler in line, stretched and folded. */
export interface RockerStrokes {
  /** Rocker's direction at either end, radians from 0 to 2π. */
  readonly rockerExtended: number;
  readonly rockerFolded: number;
  readonly swing: number;
  /** Crank's direction at either end. */
  readonly crankExtended: number;
  readonly crankFolded: number;
  /** What the crank's turn from end to end lacks or has over a half turn; never negative. */
  readonly imbalance: number;
  /** Time of the slow stroke over the quick one, 1 or more. */
  readonly timeRatio: number;
}

export type RockerStrokesOutcome =
  | ({ readonly outcome: 'swings' } & RockerStrokes)
  /** The crank does not go right round; `by` is what Grashof's sum lacks, or 0 for another class. */
  | { readonly outcome: 'no-crank-rocker'; readonly by: number };

/**
 * Swing, dead centres and time ratio of a crank-rocker on one assembly.
 *
 * Frame as `fourBarPosition`. Outcomes: `swings`; `no-crank-rocker`. Throws `RangeError` for a
 * length that is not positive. Source: triangles with O2–B = coupler + crank and coupler − crank.
 * @example rockerStrokes({ crank: 40, coupler: 120, rocker: 80, frame: 100 }) // → { outcome: 'swings', swing: 1.287735, timeRatio: 1.355573, imbalance: 0.474223 }
 */
export function rockerStrokes(
  bars: FourBarLengths,
  side: FourBarSide = 'open',
): RockerStrokesOutcome {
  const { crank, coupler, rocker, frame } = requireFourBar('rockerStrokes', bars);
  const count = grashofCount(bars);
  if (count.class !== 'crank-rocker') {
    return { outcome: 'no-crank-rocker', by: Math.max(-count.margin, 0) };
  }
  const up = side === 'open' ? 1 : -1;
  const atFrame = (reach: number) => angleOpposite(rocker, reach, frame);
  const atRocker = (reach: number) => Math.PI - angleOpposite(reach, rocker, frame);
  const [long, short] = [coupler + crank, coupler - crank];
  const rockerExtended = wrapTurn(up * atRocker(long));
  const rockerFolded = wrapTurn(up * atRocker(short));
  const lacking = atFrame(short) - atFrame(long);
  const imbalance = Math.abs(lacking);
  return {
    outcome: 'swings',
    rockerExtended,
    rockerFolded,
    swing: Math.abs(atRocker(short) - atRocker(long)),
    crankExtended: wrapTurn(up * atFrame(long)),
    crankFolded: wrapTurn(up * atFrame(short) + Math.PI),
    imbalance,
    timeRatio: (Math.PI + imbalance) / (Math.PI - imbalance),
  };
}

/** How squarely the coupler pushes the rocker. */
export interface Transmission {
  /** Angle between coupler and rocker at B, 0 to π. */
  readonly angle: number;
  /** Share of the push that turns the rocker: the sine of the angle. */
  readonly pushShare: number;
}

export type TransmissionOutcome =
  | ({ readonly outcome: 'closes' } & Transmission)
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Transmission angle at a crank angle; the crank drives. Frame as `fourBarPosition`.
 *
 * @example transmissionAngle({ crank: 40, coupler: 120, rocker: 80, frame: 100 }, radians(40)).angle // → 0.646243
 */
export function transmissionAngle(bars: FourBarLengths, crankAngle: number): TransmissionOutcome {
  requireMeasure('transmissionAngle', 'crankAngle', crankAngle);
  const found = fourBarAssembly(bars, crankAngle);
  if (found.outcome === 'does-not-close') return { outcome: 'does-not-close', by: found.by };
  const angle = angleOpposite(found.diagonal, bars.coupler, bars.rocker);
  return { outcome: 'closes', angle, pushShare: Math.sin(angle) };
}

/**
 * Least, greatest and worst transmission angle over all that the crank can turn.
 *
 * `worst` is the smallest as an acute angle. The extremes stand at the crank along the frame line,
 * or at a toggle (0 or π) where the crank stops. Outcome `not-assemblable` with the length missing.
 * Source: cosine rule at the least and the greatest diagonal.
 * @example transmissionExtremes({ crank: 40, coupler: 120, rocker: 80, frame: 100 }) // → { outcome: 'extremes', least: 0.460493, most: 1.508255, worst: 0.460493 }
 */
export function transmissionExtremes(bars: FourBarLengths):
  | {
      readonly outcome: 'extremes';
      readonly least: number;
      readonly most: number;
      readonly worst: number;
    }
  | { readonly outcome: 'not-assemblable'; readonly by: number } {
  const { crank, coupler, rocker, frame } = requireFourBar('transmissionExtremes', bars);
  const [near, far] = [Math.abs(crank - frame), crank + frame];
  const [folded, stretched] = [Math.abs(coupler - rocker), coupler + rocker];
  const missing = Math.max(near - stretched, folded - far);
  if (missing > 0) return { outcome: 'not-assemblable', by: missing };
  const least = angleOpposite(Math.max(near, folded), coupler, rocker);
  const most = angleOpposite(Math.min(far, stretched), coupler, rocker);
  return { outcome: 'extremes', least, most, worst: Math.min(least, Math.PI - most) };
}

/** Angle of a triangle opposite `side`, between sides `a` and `b`; half-angle form, exact near 0 and π. */
function angleOpposite(side: number, a: number, b: number): number {
  const top = (side - (a - b)) * (side + (a - b));
  const bottom = (a + b - side) * (a + b + side);
  return top <= 0 ? 0 : bottom <= 0 ? Math.PI : 2 * Math.atan2(Math.sqrt(top), Math.sqrt(bottom));
}
