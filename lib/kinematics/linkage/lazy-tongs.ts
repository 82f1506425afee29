import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount, requireWithin } from '@/lib/numeric/require';
import type { Point } from '@/lib/geometry/point';
import type { Linkage, Plate } from '@/lib/kinematics/linkage/solver/linkage';

/** Lazy tongs: pairs of equal bars crossed at their middles. Any one unit. */
export interface LazyTongs {
  readonly stages: number;
  /** From end pin to end pin of one bar. */
  readonly bar: number;
}

export interface TongsPose {
  readonly length: number;
  readonly width: number;
  /** End travel for a unit of squeeze at the first pair; as many times the force. */
  readonly rate: number;
}

/**
 * Length, width and rate of lazy tongs with every bar at `angle` radians to the long axis.
 *
 * `N·b·cos θ`, `b·sin θ`, `N·tan θ`. Throws `RangeError` unless the angle lies from 0 to a quarter
 * turn, short of it for the rate. Source: rhombs in a row; virtual work.
 * @example tongsPose({ stages: 4, bar: 200 }, radians(65)) // → { length: 338.094609, width: 181.261557, rate: 8.578028 }
 */
export function tongsPose(tongs: LazyTongs, angle: number): TongsPose {
  const { stages, bar } = requireTongs('tongsPose', tongs);
  requireWithin('tongsPose', 'angle', angle, 0, Math.PI / 2 - 1e-9);
  return {
    length: stages * bar * Math.cos(angle),
    width: bar * Math.sin(angle),
    rate: stages * Math.tan(angle),
  };
}

/**
 * How far the end travels between two angles, and how many times the first pair's own travel that is.
 * @example tongsTravel({ stages: 4, bar: 200 }, radians(65), radians(20)) // → { travel: 413.659487, timesFirstPair: 4 }
 */
export function tongsTravel(
  tongs: LazyTongs,
  from: number,
  to: number,
): { readonly travel: number; readonly timesFirstPair: number } {
  return {
    travel: tongsPose(tongs, to).length - tongsPose(tongs, from).length,
    timesFirstPair: tongs.stages,
  };
}

/**
 * Curl of the tongs over their whole length, radians, when every middle hole is `off` from the
 * middle to the same side: `2N·atan(2e/(b·tan θ))`. Throws `RangeError` for an angle of nought.
 * Source: exact geometry, every pair a wedge.
 * @example tongsCurl({ stages: 6, bar: 160 }, radians(20), 0.5) // → 0.206041
 */
export function tongsCurl(tongs: LazyTongs, angle: number, off: number): number {
  const { stages, bar } = requireTongs('tongsCurl', tongs);
  requireWithin('tongsCurl', 'angle', angle, 1e-9, Math.PI / 2);
  requireMeasure('tongsCurl', 'off', off);
  return 2 * stages * Math.atan2(2 * off * Math.cos(angle), bar * Math.sin(angle));
}

/**
 * Between which angles to the long axis bars of `width` keep clear of one another: sin 2θ = 2t/b.
 * `too-wide` by how much the bar is wider than half its length.
 * @example tongsClearance({ stages: 6, bar: 160 }, 18) // → { outcome: 'clear', least: 0.113472, most: 1.457325 }
 */
export function tongsClearance(
  tongs: LazyTongs,
  width: number,
):
  | { readonly outcome: 'clear'; readonly least: number; readonly most: number }
  | { readonly outcome: 'too-wide'; readonly by: number } {
  const { bar } = requireTongs('tongsClearance', tongs);
  requireSizeOrNought('tongsClearance', 'width', width);
  if (2 * width > bar) return { outcome: 'too-wide', by: width - bar / 2 };
  const least = Math.asin((2 * width) / bar) / 2;
  return { outcome: 'clear', least, most: Math.PI / 2 - least };
}

/** A scissor lift: tongs that stand on the floor. */
export interface ScissorLift {
  readonly height: number;
  /** Rise for a unit that the foot is drawn in. */
  readonly rate: number;
  /** Pull at the foot that holds the load, in the load's unit. */
  readonly force: number;
}

/**
 * Height of a lift with its bars at `angle` radians to the floor, and the level pull at the sliding
 * foot that holds `load`: `N·W/tan α`, without friction or weight of the bars.
 *
 * Throws `RangeError` for an angle of nought (the pull has no limit) or over a quarter turn.
 * Source: virtual work.
 * @example scissorLift({ stages: 3, bar: 300 }, radians(25), 100) // → { height: 380.356436, rate: 6.433521, force: 643.352076 }
 */
export function scissorLift(tongs: LazyTongs, angle: number, load: number): ScissorLift {
  const { stages, bar } = requireTongs('scissorLift', tongs);
  requireWithin('scissorLift', 'angle', angle, 1e-9, Math.PI / 2);
  requireMeasure('scissorLift', 'load', load);
  const rate = (stages * Math.cos(angle)) / Math.sin(angle);
  return { height: stages * bar * Math.sin(angle), rate, force: load * rate };
}

/**
 * Lazy tongs as data for the general solver: end pins `P0`, `Q0`, `P1`, `Q1` …, crossings `M1`,
 * `M2` …; P0 fixed at the origin, Q0 on the upright groove to `Y`; driven by the first bar's angle
 * to the long axis, which is x. `off` is how far every crossing lies from the middle towards the
 * lower left or upper left ends.
 */
export function tongsLinkage(tongs: LazyTongs, off = 0): Linkage {
  const { stages, bar } = requireTongs('tongsLinkage', tongs);
  requireWithin('tongsLinkage', 'off', Math.abs(off), 0, bar / 2);
  const half = bar / 2 - off;
  const points: Record<string, Point> = {
    P0: { x: 0, y: 0 },
    Y: { x: 0, y: bar },
    Q0: { x: 0, y: bar * Math.SQRT1_2 },
  };
  const plates: Plate[] = [];
  for (let k = 1; k <= stages; k += 1) {
    const x = k * bar * Math.SQRT1_2;
    points[`M${k}`] = { x: x - (bar / 2) * Math.SQRT1_2, y: (bar / 2) * Math.SQRT1_2 };
    points[`P${k}`] = { x, y: 0 };
    points[`Q${k}`] = { x, y: bar * Math.SQRT1_2 };
    for (const [from, to] of [
      [`P${k - 1}`, `Q${k}`],
      [`Q${k - 1}`, `P${k}`],
    ] as const) {
      plates.push({
        shape: { [from]: { x: 0, y: 0 }, [`M${k}`]: { x: half, y: 0 }, [to]: { x: bar, y: 0 } },
      });
    }
  }
  return {
    points,
    fixed: ['P0', 'Y'],
    plates,
    slides: [{ point: 'Q0', along: ['P0', 'Y'] }],
    drivers: [{ kind: 'angle', from: 'P0', to: 'Q1' }],
  };
}

function requireTongs(caller: string, { stages, bar }: LazyTongs): LazyTongs {
  return {
    stages: requireCount(caller, 'stages', stages),
    bar: requireSize(caller, 'bar', bar),
  };
}
