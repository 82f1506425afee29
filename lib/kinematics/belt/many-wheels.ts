import { itemAt } from '@/lib/numeric/item-at';
import type { Point } from '@/lib/geometry/point';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A wheel that a belt passes. */
export interface BeltWheel {
  readonly centre: Point;
  /** To the middle line of the belt. */
  readonly radius: number;
  /** `left`: the wheel lies left of the belt's travel and turns counter-clockwise; left unless given. */
  readonly side?: 'left' | 'right';
}

/** A straight piece of a belt, between two wheels. */
export interface BeltRun {
  readonly from: Point;
  readonly to: Point;
  readonly length: number;
}

/** A belt round many wheels. */
export type ManyWheelBelt =
  | {
      readonly outcome: 'belt';
      readonly length: number;
      /** Radians, a wheel each. */
      readonly wraps: readonly number[];
      /** From each wheel to the next. */
      readonly runs: readonly BeltRun[];
    }
  /** Wheel `wheel` and the next overlap, or one lies in the other, by `overlap`. */
  | { readonly outcome: 'wheels-meet'; readonly wheel: number; readonly overlap: number }
  /** The belt does not reach wheel `wheel` on its side: it turns there by `angle` the other way. */
  | { readonly outcome: 'misses'; readonly wheel: number; readonly angle: number };

const turn = 2 * Math.PI;
/** Whole turns are told apart by far more than this. */
const turnTolerance = 1e-6;

/**
 * Length, wraps and runs of a belt that passes wheels in the order given and comes back.
 *
 * Go round counter-clockwise with the wheels on the left; a jockey that presses from outside is on
 * the right. `windings` is how often the belt turns round on its way: 1, or 0 for a crossed one;
 * two wheels tell it by their sides.
 *
 * @throws RangeError for nonsense or fewer than two wheels.
 * Source: common tangents of circles with signed radii; case BL-TP-01.
 * @example beltRoundMany([{ centre: { x: 0, y: 0 }, radius: 75 }, { centre: { x: 800, y: 0 }, radius: 75 }]).outcome // → 'belt'
 */
export function beltRoundMany(wheels: readonly BeltWheel[], windings: 0 | 1 = 1): ManyWheelBelt {
  requireCount('beltRoundMany', 'number of wheels', wheels.length, 2);
  const runs: DirectedRun[] = [];
  for (const [index, wheel] of wheels.entries()) {
    const next = itemAt(wheels, (index + 1) % wheels.length);
    const run = runBetween(wheel, next);
    if ('overlap' in run) return { outcome: 'wheels-meet', wheel: index, overlap: run.overlap };
    runs.push(run);
  }
  const wraps = wrapsOf(wheels, runs);
  const around = wheels.reduce(
    (sum, wheel, index) => sum + signOf(wheel) * itemAt(wraps, index),
    0,
  );
  if (wheels.length > 2 && Math.abs(around - windings * turn) > turnTolerance) {
    const wheel = wraps.indexOf(Math.max(...wraps));
    return { outcome: 'misses', wheel, angle: turn - itemAt(wraps, wheel) };
  }
  const arcs = wheels.reduce((sum, { radius }, index) => sum + radius * itemAt(wraps, index), 0);
  return {
    outcome: 'belt',
    length: runs.reduce((sum, run) => sum + run.length, arcs),
    wraps,
    runs: runs.map(({ from, to, length }) => ({ from, to, length })),
  };
}

interface DirectedRun extends BeltRun {
  readonly direction: number;
}

/** The tangent from one wheel to the next, leaving each on its side. */
function runBetween(a: BeltWheel, b: BeltWheel): DirectedRun | { readonly overlap: number } {
  const [first, second] = [signedRadius(a), signedRadius(b)];
  const [dx, dy] = [b.centre.x - a.centre.x, b.centre.y - a.centre.y];
  const distance = requireMeasure('beltRoundMany', 'distance', Math.hypot(dx, dy));
  const across = second - first;
  const least = a.radius + b.radius;
  if (distance < least) return { overlap: least - distance };
  const direction = Math.atan2(dy, dx) - Math.asin(across / distance);
  const [nx, ny] = [-Math.sin(direction), Math.cos(direction)];
  return {
    from: { x: a.centre.x - first * nx, y: a.centre.y - first * ny },
    to: { x: b.centre.x - second * nx, y: b.centre.y - second * ny },
    length: Math.sqrt((distance - across) * (distance + across)),
    direction,
  };
}

/** How far the belt turns on each wheel, from the run before it to the run after it. */
function wrapsOf(wheels: readonly BeltWheel[], runs: readonly DirectedRun[]): readonly number[] {
  const crossedPair = wheels.length === 2 && wheels.some(isOnRight) && !wheels.every(isOnRight);
  return wheels.map((wheel, index) => {
    const [into, out] = [itemAt(runs, index - 1).direction, itemAt(runs, index).direction];
    const wrap = wrapped(signOf(wheel) * (out - into));
    // Two wheels that touch inside a crossed belt are wrapped all round, which is not the same as none.
    return crossedPair && wrap < Math.PI ? turn : wrap;
  });
}

function isOnRight({ side }: BeltWheel): boolean {
  return side === 'right';
}

function signOf(wheel: BeltWheel): number {
  return isOnRight(wheel) ? -1 : 1;
}

function signedRadius(wheel: BeltWheel): number {
  return signOf(wheel) * requireSize('beltRoundMany', 'radius', wheel.radius);
}

/** An angle from 0 to a whole turn; rounding below nought is nought. */
function wrapped(angle: number): number {
  const within = ((angle % turn) + turn) % turn;
  return turn - within < 1e-12 ? 0 : within;
}
