import { equationsOf, type Linkage, type Relation } from '@/lib/kinematics/linkage/solver/linkage';
import { driversOf } from '@/lib/kinematics/linkage/solver/drive';
import { modelOf, type Model } from '@/lib/kinematics/linkage/solver/model';
import { orderDyads } from '@/lib/kinematics/linkage/solver/order';
import { blockFor } from '@/lib/kinematics/linkage/solver/block';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import type { OrderedStep } from '@/lib/kinematics/linkage/solver/progress';
import { freePoints, geometryOf, rankOf, rowsOf } from '@/lib/kinematics/linkage/solver/rank';
import { SCRATCH_LENGTH } from '@/lib/kinematics/linkage/solver/steps';

/** What planning a linkage came to. */
export type PlanOutcome =
  | { readonly outcome: 'planned'; readonly plan: Plan }
  | { readonly outcome: 'too-few-drivers'; readonly missing: number }
  | { readonly outcome: 'too-many-drivers'; readonly extra: number }
  /** As many drivers as freedoms, but some drive what is held and leave this many free. */
  | { readonly outcome: 'drivers-misplaced'; readonly undriven: number };

/**
 * Work out, once, the order in which the points of a linkage are to be found.
 *
 * Outcomes: `planned`; `too-few-drivers` and `too-many-drivers` with the number, against the
 * linkage's true freedom in its starting pose (the count's, when that already agrees);
 * `drivers-misplaced`. Bars more than are needed do no harm where their lengths agree: they are
 * checked each time. Throws `RangeError` for names that are not points and numbers that are not
 * finite, lengths that are not positive, and drivers that have nothing to hold on to.
 * Source: Assur's groups, found by looking for the next point on two known loci.
 * @example planLinkage({ points: { A: ORIGIN, B: { x: 3, y: 0 } }, fixed: ['A'], bars: [{ ends: ['A', 'B'], length: 3 }], drivers: [] }) // → { outcome: 'too-few-drivers', missing: 1 }
 */
export function planLinkage(linkage: Linkage): PlanOutcome {
  const model = modelOf(linkage);
  const ordering = orderDyads(model);
  const unknowns = 2 * freePoints(model).length;
  const counted = unknowns - equationsOf(geometryOf(model));
  const dyadic = ordering.unplaced.length === 0 && ordering.checks.length === 0;
  if (!(dyadic && counted === model.driveLength)) {
    const refused = judgeDrivers(model, unknowns);
    if (refused) return refused;
  }
  const rest = solveRest(model, ordering.unplaced, ordering.unused);
  const steps = [...ordering.steps, ...rest.steps].map((step) => ({
    ...step,
    block: blockFor(step.points, model.names.length, equationsOf(step.relations)),
  }));
  const nothing = new Float64Array(0);
  return {
    outcome: 'planned',
    plan: {
      model,
      steps,
      checks: [...ordering.checks, ...rest.checks],
      checkBlock: blockFor([], model.names.length, 2),
      scratch: new Float64Array(SCRATCH_LENGTH),
      expected: model.start.slice(),
      choice: { branch: new Int8Array(0), expected: undefined },
      motion: {
        pose: nothing,
        drive: nothing,
        velocity: nothing,
        acceleration: nothing,
        speeds: nothing,
        accelerations: nothing,
      },
    },
  };
}

/** The drivers against the freedom that the starting pose truly has; undefined if they agree. */
function judgeDrivers(model: Model, unknowns: number): PlanOutcome | undefined {
  const points = freePoints(model);
  const geometry = rowsOf(model, geometryOf(model), points);
  const freedom = unknowns - rankOf(geometry);
  if (model.driveLength < freedom) {
    return { outcome: 'too-few-drivers', missing: freedom - model.driveLength };
  }
  if (model.driveLength > freedom) {
    return { outcome: 'too-many-drivers', extra: model.driveLength - freedom };
  }
  const led = new Set(model.leads.map(({ point }) => point));
  const ledRows = points.flatMap((p, k) =>
    led.has(p) ? [unitRow(unknowns, 2 * k), unitRow(unknowns, 2 * k + 1)] : [],
  );
  const all = [...geometry, ...rowsOf(model, driversOf(model), points), ...ledRows];
  const undriven = unknowns - rankOf(all);
  return undriven > 0 ? { outcome: 'drivers-misplaced', undriven } : undefined;
}

/** One step of Newton's for all that no dyad reached, with as many relations as it needs. */
function solveRest(
  model: Model,
  points: readonly number[],
  relations: readonly Relation[],
): { readonly steps: readonly OrderedStep[]; readonly checks: readonly Relation[] } {
  if (points.length === 0) return { steps: [], checks: relations };
  const wanted = 2 * points.length;
  if (equationsOf(relations) === wanted) {
    return { steps: [{ method: { kind: 'solve' }, points, relations }], checks: [] };
  }
  const kept: Relation[] = [];
  const checks: Relation[] = [];
  for (const relation of relations) {
    const tried = [...kept, relation];
    const rank = rankOf(rowsOf(model, tried, points));
    if (rank === equationsOf(tried) && rank <= wanted) kept.push(relation);
    else checks.push(relation);
  }
  return { steps: [{ method: { kind: 'solve' }, points, relations: kept }], checks };
}

function unitRow(width: number, one: number): readonly number[] {
  return Array.from({ length: width }, (_, k) => (k === one ? 1 : 0));
}
