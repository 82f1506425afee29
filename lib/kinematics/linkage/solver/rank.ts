import { at } from '@/lib/numeric/at';
import { singularValues } from '@/lib/numeric/linear';
import { RANK_TOLERANCE } from '@/lib/numeric/tolerance';
import { equationsOf, type Relation } from '@/lib/kinematics/linkage/solver/linkage';
import { driveOf } from '@/lib/kinematics/linkage/solver/drive';
import { relationsOf, type Model } from '@/lib/kinematics/linkage/solver/model';
import { blockFor } from '@/lib/kinematics/linkage/solver/block';
import { writeRelation } from '@/lib/kinematics/linkage/solver/relations';

/** Rows of relations at the starting pose, over the coordinates of the given points. */
export function rowsOf(
  model: Model,
  relations: readonly Relation[],
  points: readonly number[],
): readonly (readonly number[])[] {
  const rows = equationsOf(relations);
  const block = blockFor(points, model.names.length, rows);
  const nothing = new Float64Array(0);
  const motion = {
    pose: model.start,
    velocity: nothing,
    acceleration: nothing,
    drive: driveOf(model, model.start),
    speeds: nothing,
    accelerations: nothing,
  };
  relations.reduce((row, relation) => writeRelation(relation, 0, motion, block, row), 0);
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: block.width }, (__, k) => at(block.matrix, row * block.width + k)),
  );
}

/**
 * Rank of a set of rows: singular values under 1e-9 of the largest count as nought.
 * @example rankOf([[1, 0], [2, 0], [0, 3]]) // → 2
 */
export function rankOf(rows: readonly (readonly number[])[]): number {
  const numbers = rows.flat();
  if (numbers.length === 0) return 0;
  const values = singularValues(numbers, rows.length, numbers.length / rows.length);
  const most = Math.max(...values);
  return values.filter((value) => value > RANK_TOLERANCE * most).length;
}

/** Numbers of the points that are not pinned to the board. */
export function freePoints(model: Model): readonly number[] {
  return [...model.names.keys()].filter((k) => !model.fixed.has(k));
}

/** Every relation of the linkage but those of its drivers. */
export function geometryOf(model: Model): readonly Relation[] {
  return [
    ...model.bodies.flatMap((body) => relationsOf({ ...body, driven: undefined })),
    ...model.slides,
  ];
}
