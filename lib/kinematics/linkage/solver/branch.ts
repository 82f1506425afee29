import { at } from '@/lib/numeric/at';
import { layLocus } from '@/lib/kinematics/linkage/solver/loci';
import type { Method, Plan } from '@/lib/kinematics/linkage/solver/plan';

/** For each step of a plan the assembly that a pose shows: 1 left or ahead, −1 right or behind. */
export function branchIn(plan: Plan, pose: ArrayLike<number>): Int8Array {
  const at64 = Float64Array.from(pose);
  return Int8Array.from(plan.steps, ({ method }) => (side(method, at64) < 0 ? -1 : 1));
}

function side(method: Method, pose: Float64Array): number {
  const scratch = new Float64Array(8);
  if (method.kind === 'aim') {
    const { pivot, target, lead } = method;
    const [tx, ty] = way(pose, pivot, target);
    const [mx, my] = way(pose, pivot, lead.p);
    const normal = Math.atan2(my, mx) - Math.atan2(lead.y, lead.x);
    return tx * Math.sin(normal) - ty * Math.cos(normal);
  }
  if (method.kind !== 'meet' && method.kind !== 'shift') return 1;
  const swapped =
    method.kind === 'shift' && method.first.kind === 'slide' && method.second.kind === 'distance';
  const [dx, dy] = method.kind === 'shift' ? way(pose, method.q, method.p) : [0, 0];
  const q = method.kind === 'shift' ? method.q : method.p;
  layLocus(method.first, method.p, pose, scratch, swapped ? 4 : 0);
  const second = swapped ? 0 : 4;
  layLocus(method.second, q, pose, scratch, second);
  scratch[second] = at(scratch, second) + dx;
  scratch[second + 1] = at(scratch, second + 1) + dy;
  const circles = method.first.kind === 'distance' && method.second.kind === 'distance';
  const x = at(pose, 2 * method.p) - at(scratch, 0);
  const y = at(pose, 2 * method.p + 1) - at(scratch, 1);
  if (!circles) return x * at(scratch, 6) + y * at(scratch, 7);
  const [cx, cy] = [at(scratch, 4) - at(scratch, 0), at(scratch, 5) - at(scratch, 1)];
  return cx * y - cy * x;
}

function way(pose: Float64Array, from: number, to: number): readonly [number, number] {
  return [at(pose, 2 * to) - at(pose, 2 * from), at(pose, 2 * to + 1) - at(pose, 2 * from + 1)];
}
