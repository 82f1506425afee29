import { at, givenAt, nth } from '@/lib/numeric/at';
import { solveLinear } from '@/lib/numeric/linear';
import type { Plan, Step } from '@/lib/kinematics/linkage/solver/plan';
import type { Motion } from '@/lib/kinematics/linkage/solver/block';
import { writeRelation } from '@/lib/kinematics/linkage/solver/relations';
import { PIVOT, SLACK, takeStep, type Choice } from '@/lib/kinematics/linkage/solver/steps';

/**
 * Share of the linkage's size by which a dyad may fail to meet and still count as meeting: what
 * rounding does at the end of a stroke, where two circles touch.
 */
const TOUCH_TOLERANCE = 1e-12;
/** Share of the size by which a bar more than is needed may misfit before it stops the linkage. */
const CHECK_TOLERANCE = 1e-9;
/** Newton's iteration ends when no point moves by more than this share of the size. */
const STEP_TOLERANCE = 1e-14;
const NEWTON_TURNS = 40;

/**
 * Settle every point in `pose` for a drive. `slackOf` then tells the least slack of all steps: how
 * far the tightest dyad is from its limit, negative by as much as it does not close. `report`, if
 * given, takes the number of the step that failed first, or −1.
 */
export function runSteps(
  plan: Plan,
  drive: ArrayLike<number>,
  choice: Choice,
  pose: Float64Array,
  report?: Int32Array,
): void {
  const { model, steps, scratch } = plan;
  for (let k = 0; k < model.leads.length; k += 1) {
    const lead = nth(model.leads, k);
    pose[2 * lead.point] = givenAt(drive, lead.drive);
    pose[2 * lead.point + 1] = givenAt(drive, lead.drive + 1);
  }
  const touch = -TOUCH_TOLERANCE * model.size;
  let least = Number.MAX_VALUE;
  let failed = -1;
  for (let k = 0; k < steps.length; k += 1) {
    const step = nth(steps, k);
    const { method } = step;
    if (method.kind === 'solve') solveStep(plan, step, drive, pose);
    else takeStep(method, k, pose, drive, choice, scratch);
    const slack = at(scratch, SLACK);
    if (failed < 0 && slack < least) least = slack;
    if (failed < 0 && slack < touch) failed = k;
  }
  if (plan.checks.length > 0 && failed < 0) {
    const misfit = checkAll(plan, drive, pose);
    if (misfit > CHECK_TOLERANCE * model.size) {
      least = -misfit;
      failed = steps.length;
    }
  }
  if (report) report[0] = failed;
  scratch[SLACK] = failed < 0 && least < 0 ? 0 : least;
}

/** The slack that the last `runSteps` of a plan left. */
export function slackOf({ scratch }: Plan): number {
  return at(scratch, SLACK);
}

/** Newton's iteration, with halved steps, on the relations of one step from the pose as it stands. */
function solveStep(plan: Plan, step: Step, drive: ArrayLike<number>, pose: Float64Array): void {
  const { points, relations, block } = step;
  const tolerance = CHECK_TOLERANCE * plan.model.size;
  const motion = still(plan, pose, drive);
  let error = writeAll(step, motion);
  for (let turn = 0; turn < NEWTON_TURNS; turn += 1) {
    solveLinear(block.matrix, block.right, 2 * points.length);
    if (at(block.right, 2 * points.length) === 0) {
      plan.scratch[SLACK] = -Math.max(error, tolerance);
      return;
    }
    const moved = movePoints(step, pose, 1);
    let share = 1;
    let next = writeError(plan, step, motion);
    while (!(next <= error) && share > 1 / 64) {
      movePoints(step, pose, -share / 2);
      share /= 2;
      next = writeError(plan, step, motion);
    }
    error = next;
    if (moved <= STEP_TOLERANCE * plan.model.size || error === 0) break;
    error = writeAll(step, motion);
  }
  plan.scratch[SLACK] = error <= tolerance && relations.length > 0 ? Number.MAX_VALUE : -error;
}

/** Fill the step's block for Newton; gives the largest error. */
function writeAll({ relations, block }: Step, motion: Motion): number {
  let row = 0;
  for (let k = 0; k < relations.length; k += 1) {
    row = writeRelation(nth(relations, k), 0, motion, block, row);
  }
  return largest(block.right, row);
}

/** The largest error of the pose as it stands; the step's own block stays as it is. */
function writeError({ checkBlock }: Plan, { relations }: Step, motion: Motion): number {
  let worst = 0;
  for (let k = 0; k < relations.length; k += 1) {
    const rows = writeRelation(nth(relations, k), 0, motion, checkBlock, 0);
    worst = Math.max(worst, largest(checkBlock.right, rows));
  }
  return worst;
}

/** Move the points of a step by `share` of the solution in its block; gives the largest move. */
function movePoints({ points, block }: Step, pose: Float64Array, share: number): number {
  let most = 0;
  for (let k = 0; k < points.length; k += 1) {
    const p = nth(points, k);
    const x = share * at(block.right, 2 * k);
    const y = share * at(block.right, 2 * k + 1);
    pose[2 * p] = at(pose, 2 * p) + x;
    pose[2 * p + 1] = at(pose, 2 * p + 1) + y;
    most = Math.max(most, Math.abs(x), Math.abs(y));
  }
  return most;
}

/** The largest misfit of the relations that no step needed. */
function checkAll(plan: Plan, drive: ArrayLike<number>, pose: Float64Array): number {
  const motion = still(plan, pose, drive);
  let worst = 0;
  for (let k = 0; k < plan.checks.length; k += 1) {
    const rows = writeRelation(nth(plan.checks, k), 0, motion, plan.checkBlock, 0);
    worst = Math.max(worst, largest(plan.checkBlock.right, rows));
  }
  return worst;
}

/**
 * Velocities or accelerations of all points, one step after another, in the pose as it stands.
 * `pivotOf` then tells the smallest pivot met, near 0 at a dead centre, where the rates are not to
 * be used.
 */
export function runRates(plan: Plan, order: 1 | 2, motion: Motion, out: Float64Array): void {
  const { model, steps, scratch } = plan;
  out.fill(0);
  const source = order === 1 ? motion.speeds : motion.accelerations;
  for (let k = 0; k < model.leads.length; k += 1) {
    const lead = nth(model.leads, k);
    out[2 * lead.point] = givenAt(source, lead.drive);
    out[2 * lead.point + 1] = givenAt(source, lead.drive + 1);
  }
  let pivot = 1;
  for (let k = 0; k < steps.length; k += 1) {
    const { points, relations, block } = nth(steps, k);
    let row = 0;
    for (let r = 0; r < relations.length; r += 1) {
      row = writeRelation(nth(relations, r), order, motion, block, row);
    }
    solveLinear(block.matrix, block.right, 2 * points.length);
    pivot = Math.min(pivot, at(block.right, 2 * points.length));
    for (let c = 0; c < points.length && pivot > 0; c += 1) {
      const p = nth(points, c);
      out[2 * p] = at(block.right, 2 * c);
      out[2 * p + 1] = at(block.right, 2 * c + 1);
    }
  }
  scratch[PIVOT] = pivot;
}

/** The smallest pivot that the last `runRates` of a plan met. */
export function pivotOf({ scratch }: Plan): number {
  return at(scratch, PIVOT);
}

/** The plan's own working motion, set to a pose and a drive; of the rates nothing is read. */
function still({ motion }: Plan, pose: Float64Array, drive: ArrayLike<number>): Motion {
  motion.pose = pose;
  motion.drive = drive;
  return motion;
}

function largest(values: Float64Array, length: number): number {
  let most = 0;
  for (let k = 0; k < length; k += 1) most = Math.max(most, Math.abs(at(values, k)));
  return most;
}
