import { at } from '@/lib/numeric/at';
import { lengthOf } from '@/lib/numeric/length';
import {
  addRight,
  gap,
  put,
  type Block,
  type Motion,
  type Order,
} from '@/lib/kinematics/linkage/solver/block';
import { writeGroove } from '@/lib/kinematics/linkage/solver/groove-relation';
import type { Relation } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Write the row or rows of a relation, from `row` on, and the right-hand side of the wanted order;
 * gives the next free row. All errors are lengths.
 *
 * Order 0: `right` is minus the error, so that solving gives Newton's step. Orders 1 and 2: `right`
 * makes the solution the velocity or the acceleration, from those of lower order and of the drive.
 */
export function writeRelation(
  relation: Relation,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  for (let k = 0; k < block.width; k += 1) {
    block.matrix[row * block.width + k] = 0;
    if (relation.kind === 'rigid') block.matrix[(row + 1) * block.width + k] = 0;
  }
  block.right[row] = 0;
  switch (relation.kind) {
    case 'distance':
      return writeDistance(relation, order, motion, block, row);
    case 'rigid':
      return writeRigid(relation, order, motion, block, row);
    case 'angle':
      return writeAngle(relation, order, motion, block, row);
    default:
      return writeGroove(relation, order, motion, block, row);
  }
}

/** |P − Q| = length. */
function writeDistance(
  { p, q, length }: Extract<Relation, { kind: 'distance' }>,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const x = gap(motion.pose, 0, q, p);
  const y = gap(motion.pose, 1, q, p);
  const long = lengthOf(x, y);
  const ux = long > 0 ? x / long : 1;
  const uy = long > 0 ? y / long : 0;
  put(block, motion, order, row, p, ux, uy);
  put(block, motion, order, row, q, -ux, -uy);
  if (order === 0) addRight(block, row, length - long);
  if (order === 2 && long > 0) {
    const vx = gap(motion.velocity, 0, q, p);
    const vy = gap(motion.velocity, 1, q, p);
    const side = vy * ux - vx * uy;
    addRight(block, row, -(side * side) / long);
  }
  return row + 1;
}

/** P = A + along·(B − A) + across·(B − A turned left): linear, so every order reads alike. */
function writeRigid(
  { p, a, b, along, across }: Extract<Relation, { kind: 'rigid' }>,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  block.right[row + 1] = 0;
  put(block, motion, order, row, p, 1, 0);
  put(block, motion, order, row, a, along - 1, -across);
  put(block, motion, order, row, b, -along, across);
  put(block, motion, order, row + 1, p, 0, 1);
  put(block, motion, order, row + 1, a, across, along - 1);
  put(block, motion, order, row + 1, b, -across, -along);
  if (order === 0) {
    const { pose } = motion;
    const ux = gap(pose, 0, a, b);
    const uy = gap(pose, 1, a, b);
    addRight(block, row, along * ux - across * uy - gap(pose, 0, a, p));
    addRight(block, row + 1, along * uy + across * ux - gap(pose, 1, a, p));
  }
  return row + 2;
}

/** B − A has no part square to the driven direction. */
function writeAngle(
  { a, b, shift, drive }: Extract<Relation, { kind: 'angle' }>,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const angle = at(motion.drive, drive) + shift;
  const ux = Math.cos(angle);
  const uy = Math.sin(angle);
  const x = gap(motion.pose, 0, a, b);
  const y = gap(motion.pose, 1, a, b);
  put(block, motion, order, row, b, -uy, ux);
  put(block, motion, order, row, a, uy, -ux);
  const along = x * ux + y * uy;
  const off = y * ux - x * uy;
  const speed = at(motion.speeds, drive);
  if (order === 0) addRight(block, row, -off);
  if (order === 1) addRight(block, row, speed * along);
  if (order === 2) {
    const vx = gap(motion.velocity, 0, a, b);
    const vy = gap(motion.velocity, 1, a, b);
    const outward = 2 * speed * (vx * ux + vy * uy);
    addRight(block, row, outward + at(motion.accelerations, drive) * along + speed * speed * off);
  }
  return row + 1;
}
