import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { equationsOf, type Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { modelOf } from '@/lib/kinematics/linkage/solver/model';
import { freePoints, geometryOf, rankOf, rowsOf } from '@/lib/kinematics/linkage/solver/rank';

/** How free a linkage is, by the count and in truth. */
export interface Freedom {
  /** Coordinates of the free points less the conditions that hold them. */
  readonly counted: number;
  /** Coordinates less the conditions that are independent: what really moves, in this pose. */
  readonly real: number;
  /** Conditions that say again what others say: real − counted. */
  readonly repeated: number;
}

/**
 * Freedom of a linkage given as data, drivers left out of account.
 *
 * `real` is first order: the rank of the conditions in the starting pose, which must close; singular
 * values under 1e-9 of the largest count as nought. Where bars lie in one line it may be more than
 * can truly be moved. Throws `RangeError` as `planLinkage`. Source: linear algebra.
 * @example freedomOf({ points: { A: ORIGIN, B: { x: 3, y: 0 } }, fixed: ['A'], bars: [{ ends: ['A', 'B'], length: 3 }], drivers: [] }) // → { counted: 1, real: 1, repeated: 0 }
 */
export function freedomOf(linkage: Linkage): Freedom {
  const model = modelOf({ ...linkage, drivers: [] });
  const points = freePoints(model);
  const geometry = geometryOf(model);
  const unknowns = 2 * points.length;
  const counted = unknowns - equationsOf(geometry);
  const real = unknowns - rankOf(rowsOf(model, geometry, points));
  return { counted, real, repeated: real - counted };
}

/** A hinge or slide in space: a point of its axis and the axis' direction. */
export interface SpatialJoint {
  readonly kind: 'hinge' | 'slide';
  readonly at: readonly [number, number, number];
  readonly axis: readonly [number, number, number];
}

/** How free a ring of joints is, and how much of that can be seen at the joints that matter. */
export interface RingMobility {
  readonly real: number;
  /** Freedoms that move a joint that matters: the others are idle, such as a rod's own turning. */
  readonly useful: number;
}

/**
 * Freedom of one closed ring of hinges and slides in space, first order: joints less the rank of
 * their screws. It tells the truth where the count does not (Sarrus, Bennett).
 *
 * A ball is three hinges through one point, a rolling contact a hinge where it touches, a sliding
 * one a hinge and a slide there. `mattering` are the places of the joints that matter, all if left
 * out: what the others can do while those stand still is idle. Throws `RangeError` for an axis
 * without a direction and a place that no joint has.
 *
 * Source: R. S. Ball, A Treatise on the Theory of Screws, 1900.
 * @example ringMobility([{ kind: 'hinge', at: [0, 0, 0], axis: [0, 0, 1] }, { kind: 'hinge', at: [1, 0, 0], axis: [0, 0, 1] }, { kind: 'hinge', at: [2, 1, 0], axis: [0, 0, 1] }, { kind: 'hinge', at: [0, 2, 0], axis: [0, 0, 1] }]) // → { real: 1, useful: 1 }
 */
export function ringMobility(
  joints: readonly SpatialJoint[],
  mattering: readonly number[] = [...joints.keys()],
): RingMobility {
  for (const place of mattering) {
    if (!(place in joints)) {
      throw new RangeError(`ringMobility: mattering is ${place}; expected the place of a joint`);
    }
  }
  const others = joints.filter((_, k) => !mattering.includes(k));
  const real = joints.length - rankOf(joints.map(screwOf));
  const idle = others.length - rankOf(others.map(screwOf));
  return { real, useful: real - idle };
}

function screwOf({ kind, at, axis }: SpatialJoint): readonly number[] {
  const [px = 0, py = 0, pz = 0] = at.map((value) => requireMeasure('ringMobility', 'at', value));
  const [x = 0, y = 0, z = 0] = axis.map((value) => requireMeasure('ringMobility', 'axis', value));
  requireSize('ringMobility', 'length of the axis', Math.hypot(x, y, z));
  if (kind === 'slide') return [0, 0, 0, x, y, z];
  return [x, y, z, py * z - pz * y, pz * x - px * z, px * y - py * x];
}
