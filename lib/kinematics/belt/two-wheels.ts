import { requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { rootBetween } from '@/lib/numeric/root-between';

/** How a belt lies: open, both wheels turning alike, or crossed, so that they turn against. */
export type Lay = 'open' | 'crossed';

/** A belt round two wheels; diameters and lengths along its middle line, in one unit. */
export interface TwoWheels {
  readonly first: number;
  readonly second: number;
  readonly centreDistance: number;
  readonly lay: Lay;
}

/** The pieces of a belt round two wheels. */
export type BeltLoop =
  | {
      readonly outcome: 'loop';
      readonly length: number;
      /** The short formula: 2C + π(D + d)/2 + (D ∓ d)²/4C. */
      readonly shortLength: number;
      /** Angles over which it hugs each wheel, radians. */
      readonly firstWrap: number;
      readonly secondWrap: number;
      /** Length of each of the two straight runs. */
      readonly run: number;
    }
  /** The wheels overlap by `overlap`: they cannot stand so near. */
  | { readonly outcome: 'wheels-meet'; readonly overlap: number };

/** Where shafts must stand for a loop. */
export type CentresForLoop =
  | {
      readonly outcome: 'centres';
      readonly distance: number;
      /** From the short formula. */
      readonly shortDistance: number;
    }
  /** Even with the wheels touching the loop lacks `lacking`. */
  | { readonly outcome: 'loop-too-short'; readonly lacking: number };

/**
 * Length and wraps of a belt round two wheels.
 *
 * Touching wheels are the limit and allowed.
 *
 * @throws RangeError for nonsense.
 * Source: Khurmi and Gupta, Theory of Machines; cases BL-OP-01 to 03, BL-CR-01 and 02.
 * @example beltLoop({ first: 300, second: 150, centreDistance: 800, lay: 'open' }).outcome // → 'loop'
 */
export function beltLoop(belt: TwoWheels): BeltLoop {
  const distance = requireSize('beltLoop', 'centreDistance', belt.centreDistance);
  const [R, r] = radii('beltLoop', belt);
  if (distance < R + r) return { outcome: 'wheels-meet', overlap: R + r - distance };
  const across = belt.lay === 'open' ? R - r : R + r;
  const slope = Math.asin(across / distance);
  const firstWrap = Math.PI + 2 * slope;
  const secondWrap = belt.lay === 'open' ? Math.PI - 2 * slope : firstWrap;
  const run = Math.sqrt((distance - across) * (distance + across));
  return {
    outcome: 'loop',
    length: 2 * run + R * firstWrap + r * secondWrap,
    shortLength: 2 * distance + Math.PI * (R + r) + (across * across) / distance,
    firstWrap,
    secondWrap,
    run,
  };
}

/**
 * How far apart the shafts stand for a loop of a given length.
 *
 * @throws RangeError for nonsense.
 * Source: the root of `beltLoop`'s length, which rises with the distance; the short formula
 * C = (K + √(K² − 32(D ∓ d)²))/16 is Machinery's Handbook's. Cases BL-CL-01 and 02.
 * @example centresForLoop({ first: 300, second: 150, lay: 'open' }, 2400).outcome // → 'centres'
 */
export function centresForLoop(
  belt: Omit<TwoWheels, 'centreDistance'>,
  length: number,
): CentresForLoop {
  requireSize('centresForLoop', 'length', length);
  const [R, r] = radii('centresForLoop', belt);
  const lengthAt = (centreDistance: number): number => {
    const loop = beltLoop({ ...belt, centreDistance });
    return loop.outcome === 'loop' ? loop.length : 0;
  };
  const least = lengthAt(R + r);
  if (length < least) return { outcome: 'loop-too-short', lacking: least - length };
  const over = (centreDistance: number) => lengthAt(centreDistance) - length;
  const distance = rootBetween('centresForLoop', over, R + r, R + r + length / 2);
  return { outcome: 'centres', distance, shortDistance: shortCentres(belt, length) };
}

/**
 * The nearest that the shafts of an open belt may stand for it to hug the smaller wheel over `wrap`.
 *
 * `wrap` in radians, more than 0 and at most half a turn; for equal wheels any distance serves, and
 * the answer is where they touch.
 *
 * @throws RangeError for nonsense.
 * Source: sin((π − wrap)/2) = (D − d)/2C (lesson 1.2).
 * @example centresForWrap(240, 60, (150 * Math.PI) / 180) // → 347.733
 */
export function centresForWrap(first: number, second: number, wrap: number): number {
  const [R, r] = radii('centresForWrap', { first, second });
  requireSize('centresForWrap', 'wrap', wrap);
  requireSizeOrNought('centresForWrap', 'half a turn over wrap', Math.PI - wrap);
  if (R === r) return R + r;
  const sine = requireSize('centresForWrap', 'slope', Math.sin((Math.PI - wrap) / 2));
  return Math.max(R + r, Math.abs(R - r) / sine);
}

/**
 * Length of a bandsaw's blade on two equal wheels.
 *
 * @throws RangeError for nonsense, and if the wheels meet.
 * Source: πD + 2C; case BL-BW-01.
 * @example bandsawBlade(350, 760) // → 2619.55742876
 */
export function bandsawBlade(wheelDiameter: number, centreDistance: number): number {
  requireSize('bandsawBlade', 'wheelDiameter', wheelDiameter);
  requireSizeOrNought('bandsawBlade', 'room between the wheels', centreDistance - wheelDiameter);
  return Math.PI * wheelDiameter + 2 * centreDistance;
}

/** The square is never negative for a loop that goes round touching wheels. */
function shortCentres(belt: Omit<TwoWheels, 'centreDistance'>, length: number): number {
  const across = belt.lay === 'open' ? belt.first - belt.second : belt.first + belt.second;
  const left = 4 * length - 2 * Math.PI * (belt.first + belt.second);
  return (left + Math.sqrt(left * left - 32 * across * across)) / 16;
}

function radii(
  caller: string,
  { first, second }: { readonly first: number; readonly second: number },
): readonly [number, number] {
  return [requireSize(caller, 'first', first) / 2, requireSize(caller, 'second', second) / 2];
}
