import { at, givenAt, nth, wholeAt } from '@/lib/numeric/at';
import {
  layLocus,
  meetCircles,
  meetGroove,
  meetGrooves,
} from '@/lib/kinematics/linkage/solver/loci';
import type { Locus, Method } from '@/lib/kinematics/linkage/solver/plan';

/** Where the parts of the scratch array lie: two loci, two meeting points and the slack. */
const FIRST = 0;
const SECOND = 4;
const FOUND = 8;
/** Where a step leaves its slack: returned numbers would be allocated. */
export const SLACK = FOUND + 4;
/** Where the rates leave their smallest pivot. */
export const PIVOT = SLACK + 1;
export const SCRATCH_LENGTH = PIVOT + 1;

/** How one of two assemblies is chosen: the sign of step `k`, or what lies nearest to `expected`. */
export interface Choice {
  readonly branch: Int8Array;
  readonly expected: Float64Array | undefined;
}

/**
 * Settle the points of one step in `pose`; `scratch[SLACK]` takes its slack, negative by as much as
 * it does not close, the largest number where nothing can fail. Branch 1 is left or ahead, −1 right
 * or behind.
 */
export function takeStep(
  method: Exclude<Method, { kind: 'solve' }>,
  k: number,
  pose: Float64Array,
  drive: ArrayLike<number>,
  choice: Choice,
  scratch: Float64Array,
): void {
  scratch[SLACK] = Number.MAX_VALUE;
  switch (method.kind) {
    case 'meet':
      return takeMeet(method, k, pose, choice, scratch);
    case 'carry':
      return takeCarry(method, pose);
    case 'turn': {
      const { distance, angle, p } = method;
      const direction = givenAt(drive, angle.drive) + angle.shift;
      pose[2 * p] = at(pose, 2 * angle.a) + distance.length * Math.cos(direction);
      pose[2 * p + 1] = at(pose, 2 * angle.a + 1) + distance.length * Math.sin(direction);
      return;
    }
    case 'run': {
      const { slide, reach } = method;
      layLocus(slide, slide.p, pose, scratch, FIRST);
      const along = givenAt(drive, reach.drive);
      pose[2 * slide.p] = at(scratch, FIRST) + along * at(scratch, FIRST + 2);
      pose[2 * slide.p + 1] = at(scratch, FIRST + 1) + along * at(scratch, FIRST + 3);
      return;
    }
    case 'aim':
      return takeAim(method, k, pose, choice, scratch);
    case 'shift':
      return takeShift(method, k, pose, drive, choice, scratch);
  }
}

function takeMeet(
  { p, first, second }: Extract<Method, { kind: 'meet' }>,
  k: number,
  pose: Float64Array,
  choice: Choice,
  scratch: Float64Array,
): void {
  layLocus(first, p, pose, scratch, FIRST);
  layLocus(second, p, pose, scratch, SECOND);
  settle(first, second, p, k, pose, choice, scratch);
}

function takeCarry({ rigid }: Extract<Method, { kind: 'carry' }>, pose: Float64Array): void {
  const { p, a, b, along, across } = rigid;
  const x = at(pose, 2 * a);
  const y = at(pose, 2 * a + 1);
  const ux = at(pose, 2 * b) - x;
  const uy = at(pose, 2 * b + 1) - y;
  pose[2 * p] = x + along * ux - across * uy;
  pose[2 * p + 1] = y + along * uy + across * ux;
}

function takeAim(
  { pivot, target, off, members, lead }: Extract<Method, { kind: 'aim' }>,
  k: number,
  pose: Float64Array,
  { branch, expected }: Choice,
  scratch: Float64Array,
): void {
  const x = at(pose, 2 * pivot);
  const y = at(pose, 2 * pivot + 1);
  const dx = at(pose, 2 * target) - x;
  const dy = at(pose, 2 * target + 1) - y;
  const away = Math.sqrt(dx * dx + dy * dy);
  const swing = away > 0 ? Math.acos(Math.min(Math.max(off / away, -1), 1)) : 0;
  const towards = Math.atan2(dy, dx);
  if (expected) {
    // The lead turned to the target, and on which side of that it is expected.
    const ahead = lead.x * Math.cos(towards) - lead.y * Math.sin(towards);
    const aside = lead.x * Math.sin(towards) + lead.y * Math.cos(towards);
    const left =
      ahead * (at(expected, 2 * lead.p + 1) - y) - aside * (at(expected, 2 * lead.p) - x);
    branch[k] = left >= 0 ? 1 : -1;
  }
  const normal = towards + (wholeAt(branch, k) < 0 ? -swing : swing);
  const cosine = Math.cos(normal);
  const sine = Math.sin(normal);
  for (let m = 0; m < members.length; m += 1) {
    const member = nth(members, m);
    pose[2 * member.p] = x + member.x * cosine - member.y * sine;
    pose[2 * member.p + 1] = y + member.x * sine + member.y * cosine;
  }
  scratch[SLACK] = away - Math.abs(off);
}

function takeShift(
  { p, q, first, second, distance, angle }: Extract<Method, { kind: 'shift' }>,
  k: number,
  pose: Float64Array,
  drive: ArrayLike<number>,
  choice: Choice,
  scratch: Float64Array,
): void {
  const direction = givenAt(drive, angle.drive) + angle.shift;
  const dx = distance.length * Math.cos(direction);
  const dy = distance.length * Math.sin(direction);
  const circleSecond = first.kind === 'slide' && second.kind === 'distance';
  const own = circleSecond ? SECOND : FIRST;
  const others = circleSecond ? FIRST : SECOND;
  layLocus(first, p, pose, scratch, own);
  layLocus(second, q, pose, scratch, others);
  scratch[others] = at(scratch, others) - dx;
  scratch[others + 1] = at(scratch, others + 1) - dy;
  if (circleSecond) settle(second, first, p, k, pose, choice, scratch);
  else settle(first, second, p, k, pose, choice, scratch);
  pose[2 * q] = at(pose, 2 * p) + dx;
  pose[2 * q + 1] = at(pose, 2 * p + 1) + dy;
}

/** Put `p` on one of the meeting points of the two loci laid out in `scratch`. */
function settle(
  first: Locus,
  second: Locus,
  p: number,
  k: number,
  pose: Float64Array,
  { branch, expected }: Choice,
  scratch: Float64Array,
): void {
  scratch[FOUND] = scratch[FOUND + 2] = at(pose, 2 * p);
  scratch[FOUND + 1] = scratch[FOUND + 3] = at(pose, 2 * p + 1);
  if (second.kind === 'distance') meetCircles(scratch, FIRST, SECOND, FOUND);
  else if (first.kind === 'distance') meetGroove(scratch, FIRST, SECOND, FOUND);
  else meetGrooves(scratch, FIRST, SECOND, FOUND);
  if (expected) {
    const ex = at(expected, 2 * p);
    const ey = at(expected, 2 * p + 1);
    // Nearer to the left one: on its side of the middle of the two.
    const lx = at(scratch, FOUND) - at(scratch, FOUND + 2);
    const ly = at(scratch, FOUND + 1) - at(scratch, FOUND + 3);
    const mx = (at(scratch, FOUND) + at(scratch, FOUND + 2)) / 2;
    const my = (at(scratch, FOUND + 1) + at(scratch, FOUND + 3)) / 2;
    branch[k] = lx * (ex - mx) + ly * (ey - my) >= 0 ? 1 : -1;
  }
  const from = wholeAt(branch, k) < 0 ? FOUND + 2 : FOUND;
  pose[2 * p] = at(scratch, from);
  pose[2 * p + 1] = at(scratch, from + 1);
}
