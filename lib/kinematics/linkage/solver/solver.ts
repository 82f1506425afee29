import { at, givenAt, nth, wholeAt } from '@/lib/numeric/at';
import type { Point } from '@/lib/geometry/point';
import type { Motion } from '@/lib/kinematics/linkage/solver/block';
import { branchIn } from '@/lib/kinematics/linkage/solver/branch';
import { requireDrive } from '@/lib/kinematics/linkage/solver/drive';
import { pivotOf, runRates, runSteps, slackOf } from '@/lib/kinematics/linkage/solver/place';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';

export type { Bar, Driver, Linkage, Plate, Slide } from '@/lib/kinematics/linkage/solver/linkage';

/** Least pivot, of rows scaled to 1, at which velocities are still told: below it is a dead centre. */
const DEAD_CENTRE = 1e-9;

/** Points by name. */
export type NamedPoints = Readonly<Record<string, Point>>;

/** Where the points of a linkage stand, or by how much it does not close. */
export type LinkageOutcome =
  | { readonly outcome: 'closes'; readonly points: NamedPoints; readonly slack: number }
  | {
      readonly outcome: 'does-not-close';
      /** Length by which the loci of `at` fail to meet, or a spare bar fails to fit. */
      readonly by: number;
      /** The points that the failing step should have placed; empty for a spare bar. */
      readonly at: readonly string[];
      /** The linkage as far as it can be laid out. */
      readonly points: NamedPoints;
    };

export interface SolveOptions {
  /** The assembly, from `branchOf`; that of the starting pose if left out. */
  readonly branch?: Int8Array;
  /** The pose from which Newton's iteration sets out, where the plan needs it. */
  readonly from?: ArrayLike<number>;
}

/** A new copy of the starting pose: x, y of each point in the order of the linkage's own. */
export function startPose({ model }: Plan): Float64Array {
  return model.start.slice();
}

/** The assembly that a pose belongs to: for each step 1 (left, ahead) or −1 (right, behind). */
export function branchOf(plan: Plan, pose: ArrayLike<number> = plan.model.start): Int8Array {
  return branchIn(plan, pose);
}

/**
 * Place every point for a drive, in `pose`, without allocating: the step of an animation.
 *
 * `pose` comes from `startPose` and is written over; Newton's steps set out from it, so a drive
 * should move on in small steps. Gives 0, or the length by which the linkage does not close, when
 * the points stand as far as it can be laid out. Throws `RangeError` for a drive of another length
 * than the drivers ask for, or not finite.
 */
export function placeLinkage(
  plan: Plan,
  drive: ArrayLike<number>,
  branch: Int8Array,
  pose: Float64Array,
): number {
  requireDrive('placeLinkage', plan, drive);
  runSteps(plan, drive, chosen(plan, branch, undefined), pose);
  return Math.max(-slackOf(plan), 0);
}

/**
 * As `placeLinkage`, on the assembly that carries on the way from `before` to `now`: at a change
 * point the points keep their direction. `branch` is written over with the assembly chosen.
 */
export function carryOnLinkage(
  plan: Plan,
  drive: ArrayLike<number>,
  before: Float64Array,
  now: Float64Array,
  branch: Int8Array,
  pose: Float64Array,
): number {
  requireDrive('carryOnLinkage', plan, drive);
  for (let k = 0; k < pose.length; k += 1) pose[k] = 2 * at(now, k) - at(before, k);
  plan.expected.set(pose);
  for (const p of plan.model.fixed) {
    pose[2 * p] = at(now, 2 * p);
    pose[2 * p + 1] = at(now, 2 * p + 1);
  }
  runSteps(plan, drive, chosen(plan, branch, plan.expected), pose);
  return Math.max(-slackOf(plan), 0);
}

/**
 * Where every point stands for a drive, by name.
 *
 * The drive has a number for each driver, in order; a led point has two. Outcomes: `closes` with
 * the least slack of any dyad, `does-not-close` with the length. Throws as `placeLinkage`.
 * @example solveLinkage(planLinkage(crankSliderLinkage({ crank: 30, rod: 50 })).plan, [Math.PI / 2]) // → { outcome: 'closes', points: { C: { x: 40, y: 0 } }, slack: 20 }
 */
export function solveLinkage(
  plan: Plan,
  drive: ArrayLike<number>,
  { branch = branchOf(plan), from = plan.model.start }: SolveOptions = {},
): LinkageOutcome {
  requireDrive('solveLinkage', plan, drive);
  return told(plan, Float64Array.from(from), drive, branch);
}

/** Settle `pose`, and tell what that came to. */
function told(
  plan: Plan,
  pose: Float64Array,
  drive: ArrayLike<number>,
  branch: Int8Array,
): LinkageOutcome {
  const report = new Int32Array(1);
  runSteps(plan, drive, { branch, expected: undefined }, pose, report);
  const slack = slackOf(plan);
  const points = named(plan, pose);
  if (slack >= 0) return { outcome: 'closes', points, slack };
  const failing = plan.steps[wholeAt(report, 0)]?.points ?? [];
  const names = failing.map((p) => nth(plan.model.names, p));
  return { outcome: 'does-not-close', by: -slack, at: names, points };
}

/** How fast every point moves, or why nothing can be said. */
export type MotionOutcome =
  | {
      readonly outcome: 'moves';
      readonly points: NamedPoints;
      readonly velocities: NamedPoints;
      readonly accelerations: NamedPoints;
    }
  | { readonly outcome: 'dead-centre'; readonly points: NamedPoints }
  | Extract<LinkageOutcome, { readonly outcome: 'does-not-close' }>;

/**
 * Position, velocity and acceleration of every point, for the drive, its speeds and its
 * accelerations (a second, or whatever unit of time they are in).
 *
 * Outcomes: `moves`; `dead-centre`, where the drive cannot say how the linkage moves on;
 * `does-not-close`. Throws as `placeLinkage`.
 * @example moveLinkage(planLinkage(crankSliderLinkage({ crank: 30, rod: 50 })).plan, [Math.PI / 2], [2], [0]).velocities.C // → { x: -60, y: 0 }
 */
export function moveLinkage(
  plan: Plan,
  drive: ArrayLike<number>,
  speeds: ArrayLike<number>,
  accelerations: ArrayLike<number>,
  { branch = branchOf(plan), from = plan.model.start }: SolveOptions = {},
): MotionOutcome {
  for (const given of [drive, speeds, accelerations]) requireDrive('moveLinkage', plan, given);
  const pose = Float64Array.from(from);
  const placed = told(plan, pose, drive, branch);
  if (placed.outcome === 'does-not-close') return placed;
  const [velocity, acceleration] = [startPose(plan), startPose(plan)];
  if (!rateLinkage(plan, { pose, drive, speeds, accelerations, velocity, acceleration })) {
    return { outcome: 'dead-centre', points: placed.points };
  }
  return {
    outcome: 'moves',
    points: placed.points,
    velocities: named(plan, velocity),
    accelerations: named(plan, acceleration),
  };
}

/** A pose with its drive and the drive's rates, and room for the rates of the points. */
export type RatedPose = Motion;

/**
 * Write velocity and acceleration of every point of a placed pose into the caller's arrays, without
 * allocating. False at a dead centre, where the drive cannot say how the linkage moves on and the
 * rates are not to be used.
 */
export function rateLinkage(plan: Plan, rated: RatedPose): boolean {
  runRates(plan, 1, rated, rated.velocity);
  runRates(plan, 2, rated, rated.acceleration);
  return pivotOf(plan) >= DEAD_CENTRE;
}

/** The plan's own choice, set anew so that a step of an animation allocates nothing. */
function chosen(
  { choice }: Plan,
  branch: Int8Array,
  expected: Float64Array | undefined,
): Plan['choice'] {
  choice.branch = branch;
  choice.expected = expected;
  return choice;
}

function named({ model }: Plan, values: ArrayLike<number>): NamedPoints {
  return Object.fromEntries(
    model.names.map((name, k) => [
      name,
      { x: givenAt(values, 2 * k), y: givenAt(values, 2 * k + 1) },
    ]),
  );
}
