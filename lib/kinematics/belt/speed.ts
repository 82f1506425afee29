import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';

/** A driving wheel and the wheel that its belt drives, by diameter; `crossed` turns the sense. */
export interface BeltStage {
  readonly driver: number;
  readonly driven: number;
  readonly lay?: 'open' | 'crossed';
}

/** What belts lose and how thick they are. */
export interface BeltLosses {
  /** Thickness of the belt, whose middle runs half of it outside each rim; 0 unless given. */
  readonly thickness?: number;
  /** Share of the speed lost at each belt, 0 to 1; 0 unless given. */
  readonly slip?: number;
}

/**
 * Turns of the last wheel for one of the first through one or more belts; negative against it.
 *
 * Diameters at the rim, in the unit of the thickness.
 *
 * @throws RangeError for nonsense or no belt at all.
 * Source: (D₁ + t)/(D₂ + t)·(1 − s) for each belt; case BL-SL-01.
 * @example beltTurns([{ driver: 750, driven: 450 }, { driver: 900, driven: 150 }]) // → 10
 */
export function beltTurns(stages: readonly BeltStage[], losses: BeltLosses = {}): number {
  requireSize('beltTurns', 'number of belts', stages.length);
  const thickness = requireSizeOrNought('beltTurns', 'thickness', losses.thickness ?? 0);
  const kept = 1 - requireWithin('beltTurns', 'slip', losses.slip ?? 0, 0, 1);
  return stages.reduce((turns, { driver, driven, lay }) => {
    const from = requireSize('beltTurns', 'driver', driver) + thickness;
    const to = requireSize('beltTurns', 'driven', driven) + thickness;
    return turns * (from / to) * kept * (lay === 'crossed' ? -1 : 1);
  }, 1);
}

/**
 * The diameter of a driven wheel that turns `turns` times for one of its driver, at the rim.
 *
 * Whatever the sense; the inverse of `beltTurns` for one belt.
 * - `diameter`; `none` when the belt is so thick that no wheel could turn so fast, with the fastest.
 *
 * @throws RangeError for nonsense.
 * @example drivenDiameter(60, 1 / 3) // → { outcome: 'diameter', diameter: 180 }
 */
export function drivenDiameter(
  driver: number,
  turns: number,
  losses: BeltLosses = {},
):
  | { readonly outcome: 'diameter'; readonly diameter: number }
  | { readonly outcome: 'none'; readonly fastest: number } {
  const size = Math.abs(requireMeasure('drivenDiameter', 'turns', turns));
  requireSize('drivenDiameter', 'turns', size);
  const thickness = requireSizeOrNought('drivenDiameter', 'thickness', losses.thickness ?? 0);
  const kept = 1 - requireWithin('drivenDiameter', 'slip', losses.slip ?? 0, 0, 1);
  const from = (requireSize('drivenDiameter', 'driver', driver) + thickness) * kept;
  const diameter = from / size - thickness;
  return diameter > 0
    ? { outcome: 'diameter', diameter }
    : { outcome: 'none', fastest: from / thickness };
}

/**
 * Speed of a belt on a wheel that turns at `angularSpeed`: length a second for radians a second.
 *
 * @throws RangeError for nonsense.
 * Source: case BL-OP-01.
 * @example beltSpeed(150, 30 * Math.PI) // → 7068.58347
 */
export function beltSpeed(diameter: number, angularSpeed: number, thickness = 0): number {
  requireSize('beltSpeed', 'diameter', diameter);
  requireMeasure('beltSpeed', 'angularSpeed', angularSpeed);
  requireSizeOrNought('beltSpeed', 'thickness', thickness);
  return (Math.abs(angularSpeed) * (diameter + thickness)) / 2;
}
