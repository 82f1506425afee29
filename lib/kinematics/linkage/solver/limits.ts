import { at } from '@/lib/numeric/at';
import { TURN } from '@/lib/geometry/angle';
import { runSteps, slackOf } from '@/lib/kinematics/linkage/solver/place';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import { driveOf, requireDrive } from '@/lib/kinematics/linkage/solver/drive';
import { branchOf } from '@/lib/kinematics/linkage/solver/solver';

/** How far one number of a drive can go from where it stands. */
export type LimitsOutcome =
  /** An angle that goes right round, or a way that has no end within ten times the linkage's size. */
  | { readonly outcome: 'free' }
  | { readonly outcome: 'limits'; readonly least: number; readonly most: number }
  | { readonly outcome: 'does-not-close'; readonly by: number };

export interface LimitsOptions {
  /** Which number of the drive is moved; the first if left out. */
  readonly moved?: number;
  readonly branch?: Int8Array;
}

/**
 * Share of the size by which a dyad may fail in passing: a change point touches nought exactly, and
 * rounding must not make an end of it.
 */
const PASSING = 1e-10;

/**
 * The ends of a drive: from `drive`, one of its numbers is led on both ways, the others held, until
 * the linkage no longer closes on its branch.
 *
 * Steps are one degree, or a four-hundredth of the size; between them the slack of the tightest
 * dyad is followed to its least, so a narrow gap is not stepped over. An end is good to rounding
 * where the plan needs no Newton step. Outcomes: `free`, `limits`, `does-not-close` at the start.
 * Throws as `placeLinkage`, and for a place that the drive does not have.
 * @example driveLimits(planLinkage(crankSliderLinkage({ crank: 40, rod: 30 })).plan, [0]) // → { outcome: 'limits', least: -0.848062, most: 0.848062 }
 */
export function driveLimits(
  plan: Plan,
  drive: ArrayLike<number> = startDrive(plan),
  { moved = 0, branch = branchOf(plan) }: LimitsOptions = {},
): LimitsOutcome {
  requireDrive('driveLimits', plan, drive);
  if (!(moved in drive)) {
    throw new RangeError(`driveLimits: moved is ${moved}; expected a place in the drive`);
  }
  const numbers = Float64Array.from(drive);
  const start = at(numbers, moved);
  const pose = plan.model.start.slice();
  const slack = (value: number) => {
    numbers[moved] = value;
    runSteps(plan, numbers, { branch, expected: undefined }, pose);
    return slackOf(plan);
  };
  const here = slack(start);
  if (here < 0) return { outcome: 'does-not-close', by: -here };
  const turning = isAngle(plan, moved);
  const reach = turning ? TURN : 10 * plan.model.size;
  const step = turning ? TURN / 360 : plan.model.size / 400;
  const passing = -PASSING * plan.model.size;
  const most = endOf(slack, start, step, reach, passing);
  if (most === undefined) return { outcome: 'free' };
  pose.set(plan.model.start);
  slack(start);
  const least = endOf(slack, start, -step, reach, passing);
  return { outcome: 'limits', least: least ?? start - reach, most };
}

/** The drive as the starting pose of a plan shows it. */
export function startDrive({ model }: Plan): Float64Array {
  return driveOf(model, model.start);
}

/** The last place where it still closes, or undefined if it closes all the way. */
function endOf(
  slack: (value: number) => number,
  start: number,
  step: number,
  reach: number,
  passing: number,
): number | undefined {
  // From one step back, so that a gap just ahead of the start shows as a dip.
  let [before, beforeSlack] = [start - step, slack(start - step)];
  let [now, nowSlack] = [start, slack(start)];
  for (let k = 1; k * Math.abs(step) <= reach + Math.abs(step) / 2; k += 1) {
    const next = start + k * step;
    const nextSlack = slack(next);
    if (nextSlack < passing) return lastClosing(slack, now, next);
    if (nowSlack < beforeSlack && nowSlack <= nextSlack) {
      const tight = tightest(slack, before, next);
      if (slack(tight) < passing) return lastClosing(slack, before, tight);
    }
    [before, beforeSlack, now, nowSlack] = [now, nowSlack, next, nextSlack];
  }
  return undefined;
}

/** By halving: the last value that closes, between one that does and one that does not. */
function lastClosing(slack: (value: number) => number, closing: number, failing: number): number {
  let [good, bad] = [closing, failing];
  for (let turn = 0; turn < 60; turn += 1) {
    const middle = (good + bad) / 2;
    if (slack(middle) < 0) bad = middle;
    else good = middle;
  }
  return good;
}

/** By thirds: where the slack between two values is least. */
function tightest(slack: (value: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  for (let turn = 0; turn < 80; turn += 1) {
    const third = (b - a) / 3;
    if (slack(a + third) < slack(b - third)) b -= third;
    else a += third;
  }
  return (a + b) / 2;
}

function isAngle({ model }: Plan, moved: number): boolean {
  return model.bodies.some(({ driven }) => driven?.drive === moved);
}
