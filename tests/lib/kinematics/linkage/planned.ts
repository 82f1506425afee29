import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import {
  moveLinkage,
  solveLinkage,
  type NamedPoints,
  type SolveOptions,
} from '@/lib/kinematics/linkage/solver/solver';

/** The plan of a linkage that is known to have one. */
export function planned(linkage: Linkage): Plan {
  const found = planLinkage(linkage);
  if (found.outcome !== 'planned') throw new Error(`expected a plan, got ${JSON.stringify(found)}`);
  return found.plan;
}

/** The points of a linkage that is known to close. */
export function placed(plan: Plan, drive: readonly number[], options?: SolveOptions): NamedPoints {
  const found = solveLinkage(plan, drive, options);
  if (found.outcome !== 'closes') throw new Error(`does not close by ${found.by}`);
  return found.points;
}

/** Points, velocities and accelerations of a linkage that is known to move. */
export function moved(
  plan: Plan,
  drive: readonly number[],
  speeds: readonly number[],
  accelerations: readonly number[],
  options?: SolveOptions,
) {
  const found = moveLinkage(plan, drive, speeds, accelerations, options);
  if (found.outcome !== 'moves') throw new Error(`expected motion, got ${found.outcome}`);
  return found;
}
