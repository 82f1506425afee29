import {
  apartPair,
  distanceOf,
  localOf,
  type Body,
  type DrivenWay,
} from '@/lib/kinematics/linkage/solver/body';
import type {
  Angle,
  Reach,
  Relation,
  SlideRelation,
} from '@/lib/kinematics/linkage/solver/linkage';
import type { Model } from '@/lib/kinematics/linkage/solver/model';
import type { Locus, Method } from '@/lib/kinematics/linkage/solver/plan';

/** A method with the points that it settles and the equations that it uses up. */
export interface OrderedStep {
  readonly method: Method;
  readonly points: readonly number[];
  readonly relations: readonly Relation[];
}

/** What is known while the dyads are being ordered. */
export interface Progress {
  readonly model: Model;
  readonly placed: Set<number>;
  /** Bodies of which two points are placed by the body itself, and those wholly placed. */
  readonly joined: Set<Body>;
  readonly done: Set<Body>;
  readonly turned: Set<Body>;
  readonly usedSlides: Set<SlideRelation>;
  readonly usedRuns: Set<SlideRelation>;
  readonly steps: OrderedStep[];
  readonly checks: Relation[];
}

/** The circles and grooves on which a point is known to lie, each with the mark that it is used. */
export function lociOf({ model, placed, joined, done, usedSlides }: Progress, p: number) {
  const found: { locus: Locus; mark: () => void }[] = [];
  for (const body of model.bodies) {
    if (done.has(body) || !body.shape.has(p)) continue;
    const known = body.points.filter((q) => placed.has(q));
    const [q] = known;
    if (q === undefined || apartPair(body.shape, known)) continue;
    found.push({ locus: distanceOf(body.shape, p, q), mark: () => joined.add(body) });
  }
  for (const slide of model.slides) {
    if (usedSlides.has(slide)) continue;
    const { through, from, to } = slide;
    const held = slide.p === p ? through : through === p ? slide.p : undefined;
    if (held === undefined || from === p || to === p) continue;
    if (![held, from, to].every((q) => placed.has(q))) continue;
    found.push({ locus: slide, mark: () => usedSlides.add(slide) });
  }
  return found;
}

/** The driven direction of a body, told for two of its points. */
export function angleOf({ shape }: Body, driven: DrivenWay, a: number, b: number): Angle {
  const way = (from: number, to: number) => {
    const [start, end] = [localOf(shape, from), localOf(shape, to)];
    return Math.atan2(end.y - start.y, end.x - start.x);
  };
  return {
    kind: 'angle',
    a,
    b,
    shift: way(a, b) - way(driven.from, driven.to),
    drive: driven.drive,
  };
}

/** A driven slide: where along its groove the point is to stand. */
export function reachOf({ p, through, from, to }: SlideRelation, drive: number): Reach {
  return { kind: 'reach', p, through, from, to, drive };
}
