import { acosClamped, nearlyEqual } from '@/lib/numeric/tolerance';
import { requireFourBar, type FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';

/** What goes round in a four-bar whose crank is the input and whose rocker is the output. */
export type FourBarClass =
  | 'crank-rocker'
  | 'rocker-crank'
  | 'double-crank'
  /** The coupler goes round between two swinging arms. */
  | 'double-rocker'
  /** Shortest and longest equal the others: the bars can fall in one line and go on either way. */
  | 'change-point'
  | 'triple-rocker'
  | 'not-assemblable';

export interface GrashofCount {
  readonly shortestPlusLongest: number;
  readonly otherTwo: number;
  /** The others less shortest and longest: positive where something goes right round. */
  readonly margin: number;
  readonly class: FourBarClass;
  /** Whether crank and rocker go right round; at a change point they can, if led past it. */
  readonly crankTurns: boolean;
  readonly rockerTurns: boolean;
  /** For `not-assemblable`: by how much the longest bar is longer than the other three; else 0. */
  readonly missing: number;
}

/**
 * Grashof's rule for a four-bar, and its class by the bar that is shortest.
 *
 * Sums count as equal within 1e-12. Throws `RangeError` for a length that is not positive.
 * Source: F. Grashof, 1883; inversions as in R. L. Norton, Design of Machinery, section 2.12.
 * @example grashofCount({ crank: 40, coupler: 120, rocker: 80, frame: 100 }) // → { shortestPlusLongest: 160, otherTwo: 180, margin: 20, class: 'crank-rocker', crankTurns: true, rockerTurns: false }
 * @example grashofCount({ crank: 100, coupler: 40, rocker: 120, frame: 80 }).class // → 'double-rocker'
 */
export function grashofCount(bars: FourBarLengths): GrashofCount {
  const { crank, coupler, rocker, frame } = requireFourBar('grashofCount', bars);
  const [s = 0, p = 0, q = 0, l = 0] = [crank, coupler, rocker, frame].sort((a, b) => a - b);
  const [shortestPlusLongest, otherTwo] = [s + l, p + q];
  const named = classOf(bars, s, p + q + s - l, shortestPlusLongest, otherTwo);
  const either = named === 'change-point' || named === 'double-crank';
  return {
    shortestPlusLongest,
    otherTwo,
    margin: otherTwo - shortestPlusLongest,
    class: named,
    crankTurns: either || named === 'crank-rocker',
    rockerTurns: either || named === 'rocker-crank',
    missing: named === 'not-assemblable' ? l - s - p - q : 0,
  };
}

function classOf(
  { crank, rocker, frame }: FourBarLengths,
  shortest: number,
  toSpare: number,
  ends: number,
  middle: number,
): FourBarClass {
  if (toSpare < 0) return 'not-assemblable';
  if (nearlyEqual(ends, middle)) return 'change-point';
  if (ends > middle) return 'triple-rocker';
  if (frame === shortest) return 'double-crank';
  if (crank === shortest) return 'crank-rocker';
  return rocker === shortest ? 'rocker-crank' : 'double-rocker';
}

/** How far the crank can turn, measured from the frame line to either side; 0 to π. */
export type InputLimitsOutcome =
  | { readonly outcome: 'turns-fully' }
  | {
      readonly outcome: 'limits';
      /** Coupler and rocker stretched in line; left out where the crank passes the far side. */
      readonly most?: number;
      /** Coupler and rocker folded in line; left out where the crank passes the frame line. */
      readonly least?: number;
    }
  | { readonly outcome: 'not-assemblable'; readonly by: number };

/**
 * Where the crank of a four-bar stops, to either side of the frame line (toggles of the input).
 *
 * Outcomes: `turns-fully`, a change point included; `limits`; `not-assemblable` with the length
 * missing. Throws `RangeError` for a length that is not positive.
 * Source: cosine rule with the diagonal at coupler + rocker or their difference.
 * @example crankLimits({ crank: 100, coupler: 40, rocker: 120, frame: 80 }) // → { outcome: 'limits', most: 2.18340, least: 0.895665 }
 */
export function crankLimits(bars: FourBarLengths): InputLimitsOutcome {
  const { crank, coupler, rocker, frame } = requireFourBar('crankLimits', bars);
  const [stretched, folded] = [coupler + rocker, Math.abs(coupler - rocker)];
  const [far, near] = [crank + frame, Math.abs(crank - frame)];
  const missing = Math.max(near - stretched, folded - far);
  if (missing > 0) return { outcome: 'not-assemblable', by: missing };
  const angle = (diagonal: number) =>
    acosClamped(
      ((crank - frame) ** 2 + 2 * crank * frame - diagonal * diagonal) / (2 * crank * frame),
    );
  const stops = far > stretched && !nearlyEqual(far, stretched);
  const starts = near < folded && !nearlyEqual(near, folded, 1e-12, far);
  if (!stops && !starts) return { outcome: 'turns-fully' };
  return {
    outcome: 'limits',
    ...(stops ? { most: angle(stretched) } : {}),
    ...(starts ? { least: angle(folded) } : {}),
  };
}

/**
 * Between which lengths the coupler must lie for a crank shorter than rocker and frame to go right
 * round: crank + |frame − rocker| to rocker + frame − crank.
 *
 * `no-coupler` when the crank is not the shortest, with the length by which it is too long.
 * Source: Grashof's sum solved for the coupler.
 * @example couplerRange({ crank: 30, rocker: 70, frame: 100 }) // → { outcome: 'range', least: 60, most: 140 }
 */
export function couplerRange(
  bars: Omit<FourBarLengths, 'coupler'>,
):
  | { readonly outcome: 'range'; readonly least: number; readonly most: number }
  | { readonly outcome: 'no-coupler'; readonly by: number } {
  const { crank, rocker, frame } = requireFourBar('couplerRange', { ...bars, coupler: 1 });
  const tooLong = crank - Math.min(rocker, frame);
  if (tooLong > 0) return { outcome: 'no-coupler', by: tooLong };
  return {
    outcome: 'range',
    least: crank + Math.abs(frame - rocker),
    most: rocker + frame - crank,
  };
}
