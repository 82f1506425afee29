import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import {
  PANTOGRAPH_ROLES,
  type Pantograph,
  type PantographSetUp,
} from '@/lib/kinematics/linkage/pantograph';

/** The holes for a wanted scale, or why there are none. */
export type HolesOutcome =
  | {
      readonly outcome: 'holes';
      /** O to B on the first bar. */
      readonly firstHole: number;
      /** C to D on the second bar. */
      readonly secondHole: number;
      /** The short bar B–M, as long as C–D. */
      readonly stylusBar: number;
      /** The short bar D–M, as long as B–C. */
      readonly otherBar: number;
    }
  | { readonly outcome: 'scale-too-small'; readonly least: number }
  | { readonly outcome: 'scale-too-large'; readonly most: number };

/**
 * Where to drill the two long bars for a copy `scale` times as large: the inverse of `pantographCopy`.
 *
 * The scale is a plain number; across the middle its sign is the half turn's and may be given or
 * left out. Outcomes: `holes`; `scale-too-small` from the middle to the end, which enlarges;
 * `scale-too-large` from the end to the middle, which reduces. Throws `RangeError` for a length or
 * scale of nought, a negative length, or a negative scale where the copy stands upright.
 * Source: similar triangles on the line O–M–P.
 * @example pantographHoles(400, 400, 2.5, 'middle-to-end') // → { outcome: 'holes', firstHole: 160, secondHole: 160, stylusBar: 160, otherBar: 240 }
 * @example pantographHoles(400, 300, 0.5, 'middle-to-end') // → { outcome: 'scale-too-small', least: 1 }
 */
export function pantographHoles(
  first: number,
  second: number,
  scale: number,
  setUp: PantographSetUp,
): HolesOutcome {
  requireSize('pantographHoles', 'first', first);
  requireSize('pantographHoles', 'second', second);
  const turned = PANTOGRAPH_ROLES[setUp].fixed === 'M';
  const size = requireSize('pantographHoles', 'scale', turned ? Math.abs(scale) : scale);
  if (setUp === 'middle-to-end' && size < 1) return { outcome: 'scale-too-small', least: 1 };
  if (setUp === 'end-to-middle' && size > 1) return { outcome: 'scale-too-large', most: 1 };
  const divisor = turned ? 1 + size : setUp === 'middle-to-end' ? size : 1 / size;
  const [firstHole, secondHole] = [first / divisor, second / divisor];
  return {
    outcome: 'holes',
    firstHole,
    secondHole,
    stylusBar: secondHole,
    otherBar: first - firstHole,
  };
}

/**
 * The pantograph whose second hole takes the same share of its bar as the first, so that it copies
 * true to shape. Throws `RangeError` for bars that are not positive or a hole beyond the bar.
 * @example truePantograph(350, 280, 140).secondHole // → 112
 */
export function truePantograph(first: number, second: number, firstHole: number): Pantograph {
  requireSize('truePantograph', 'first', first);
  requireSize('truePantograph', 'second', second);
  requireWithin('truePantograph', 'firstHole', firstHole, 0, first);
  return { first, second, firstHole, secondHole: (second * firstHole) / first };
}

/**
 * How far the pen strays when the stylus strays by `stray` from the line: |scale| times as far.
 * @example strayAtPen(2.5, 0.4) // → 1
 */
export function strayAtPen(scale: number, stray: number): number {
  requireMeasure('strayAtPen', 'scale', scale);
  return Math.abs(scale) * requireSizeOrNought('strayAtPen', 'stray', stray);
}

/**
 * How far the pen jumps when the fixed pin is shifted by `shift` while the stylus is held: |scale − 1| times as far.
 * @example shiftAtPen(3, 1) // → 2
 */
export function shiftAtPen(scale: number, shift: number): number {
  requireMeasure('shiftAtPen', 'scale', scale);
  return Math.abs(scale - 1) * requireSizeOrNought('shiftAtPen', 'shift', shift);
}
