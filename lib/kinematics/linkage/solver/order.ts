import { apartPair, coincide, distanceOf, rigidOf } from '@/lib/kinematics/linkage/solver/body';
import type { Relation, Rigid } from '@/lib/kinematics/linkage/solver/linkage';
import { relationsOf, type Model } from '@/lib/kinematics/linkage/solver/model';
import { aim, shift } from '@/lib/kinematics/linkage/solver/order-bodies';
import type { Locus } from '@/lib/kinematics/linkage/solver/plan';
import {
  angleOf,
  lociOf,
  reachOf,
  type OrderedStep,
  type Progress,
} from '@/lib/kinematics/linkage/solver/progress';

/** What the ordering of the dyads came to: steps, relations to check, and what it did not reach. */
export interface Ordering {
  readonly steps: readonly OrderedStep[];
  readonly checks: readonly Relation[];
  readonly unplaced: readonly number[];
  readonly unused: readonly Relation[];
}

/** Order the dyads of a linkage: one placed point after another, for as long as any can be placed. */
export function orderDyads(model: Model): Ordering {
  const progress: Progress = {
    model,
    placed: new Set([...model.fixed, ...model.leads.map(({ point }) => point)]),
    joined: new Set(),
    done: new Set(),
    turned: new Set(),
    usedSlides: new Set(),
    usedRuns: new Set(),
    steps: [],
    checks: [],
  };
  while (
    copy(progress) ||
    carry(progress) ||
    turn(progress) ||
    run(progress) ||
    meet(progress) ||
    aim(progress) ||
    shift(progress)
  );
  return finish(progress);
}

function finish({ model, placed, done, usedSlides, usedRuns, steps, checks }: Progress): Ordering {
  const left = [
    ...model.bodies.filter((body) => !done.has(body)).flatMap((body) => relationsOf(body)),
    ...model.slides.filter((slide) => !usedSlides.has(slide)),
    ...[...model.runs]
      .filter(([slide]) => !usedRuns.has(slide))
      .map(([slide, drive]) => reachOf(slide, drive)),
  ];
  const unplaced = model.names.map((_, k) => k).filter((k) => !placed.has(k));
  const settled = (relation: Relation) =>
    relation.kind !== 'distance' && relation.kind !== 'rigid' && relation.kind !== 'angle'
      ? [relation.p, relation.through, relation.from, relation.to].every((p) => placed.has(p))
      : false;
  return {
    steps,
    checks: [...checks, ...left.filter(settled)],
    unplaced,
    unused: left.filter((relation) => !settled(relation)),
  };
}

/** A body with two known points carries the rest; what was known twice becomes a check. */
function carry({ model, placed, joined, done, steps, checks }: Progress): boolean {
  for (const body of model.bodies) {
    const known = body.points.filter((p) => placed.has(p));
    const [a, b] = apartPair(body.shape, known) ?? [];
    if (done.has(body) || a === undefined || b === undefined) continue;
    if (!joined.has(body)) checks.push(distanceOf(body.shape, a, b));
    for (const p of body.points.filter((point) => point !== a && point !== b)) {
      const rigid = rigidOf(body.shape, p, a, b);
      if (placed.has(p)) checks.push(rigid);
      else steps.push({ method: { kind: 'carry', rigid }, points: [p], relations: [rigid] });
      placed.add(p);
    }
    done.add(body);
    return true;
  }
  return false;
}

/** A point of a body that lies on a known one. */
function copy({ model, placed, done, steps }: Progress): boolean {
  for (const body of model.bodies) {
    if (done.has(body)) continue;
    for (const p of body.points) {
      const on = body.points.find((q) => placed.has(q) && coincide(body.shape, p, q));
      if (placed.has(p) || on === undefined) continue;
      const rigid: Rigid = { kind: 'rigid', p, a: on, b: on, along: 0, across: 0 };
      steps.push({ method: { kind: 'carry', rigid }, points: [p], relations: [rigid] });
      placed.add(p);
      return true;
    }
  }
  return false;
}

/** A driven body with one known point. */
function turn({ model, placed, joined, done, turned, steps }: Progress): boolean {
  for (const body of model.bodies) {
    const pivot = body.points.find((p) => placed.has(p));
    if (done.has(body) || !body.driven || pivot === undefined) continue;
    const { from, to } = body.driven;
    const p = coincide(body.shape, pivot, from) ? to : from;
    const distance = distanceOf(body.shape, pivot, p);
    const angle = angleOf(body, body.driven, pivot, p);
    steps.push({
      method: { kind: 'turn', distance, angle, p },
      points: [p],
      relations: [distance, angle],
    });
    placed.add(p);
    joined.add(body);
    turned.add(body);
    return true;
  }
  return false;
}

/** A driven slide in a known groove. */
function run({ model, placed, usedSlides, usedRuns, steps }: Progress): boolean {
  for (const [slide, drive] of model.runs) {
    const known = [slide.through, slide.from, slide.to].every((p) => placed.has(p));
    if (!known || placed.has(slide.p)) continue;
    const reach = reachOf(slide, drive);
    steps.push({
      method: { kind: 'run', slide, reach },
      points: [slide.p],
      relations: [slide, reach],
    });
    placed.add(slide.p);
    usedSlides.add(slide);
    usedRuns.add(slide);
    return true;
  }
  return false;
}

/** A point on two known loci; `lociOf` gives circles before grooves. */
function meet(progress: Progress): boolean {
  const { model, placed, steps } = progress;
  for (const p of model.names.keys()) {
    if (placed.has(p)) continue;
    const loci = lociOf(progress, p);
    const first = loci[0];
    const second = loci.find(({ locus }) => first && differ(first.locus, locus));
    if (!first || !second) continue;
    steps.push({
      method: { kind: 'meet', p, first: first.locus, second: second.locus },
      points: [p],
      relations: [first.locus, second.locus],
    });
    placed.add(p);
    for (const { mark } of [first, second]) mark();
    return true;
  }
  return false;
}

/** Whether two loci of one point are not one circle, or one groove, told twice. */
function differ(first: Locus, second: Locus): boolean {
  if (first.kind === 'distance' && second.kind === 'distance') return first.q !== second.q;
  return first !== second;
}
