import { at, givenAt } from '@/lib/numeric/at';
import {
  fillRow,
  type Block,
  type Motion,
  type Order,
} from '@/lib/kinematics/linkage/solver/block';
import { writeGroove } from '@/lib/kinematics/linkage/solver/groove-relation';
import type { Angle, Distance, Relation, Rigid } from '@/lib/kinematics/linkage/solver/linkage';

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
  { p, q, length }: Distance,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const { pose, velocity } = motion;
  const { held, parts, right } = block;
  const x = at(pose, 2 * p) - at(pose, 2 * q);
  const y = at(pose, 2 * p + 1) - at(pose, 2 * q + 1);
  const long = Math.sqrt(x * x + y * y);
  const ux = long > 0 ? x / long : 1;
  const uy = long > 0 ? y / long : 0;
  held[0] = p;
  held[1] = q;
  parts[0] = ux;
  parts[1] = uy;
  parts[2] = -ux;
  parts[3] = -uy;
  fillRow(block, motion, order, row, 2);
  if (order === 0) right[row] = length - long;
  if (order === 2 && long > 0) {
    const vx = at(velocity, 2 * p) - at(velocity, 2 * q);
    const vy = at(velocity, 2 * p + 1) - at(velocity, 2 * q + 1);
    const side = vy * ux - vx * uy;
    right[row] = at(right, row) - (side * side) / long;
  }
  return row + 1;
}

/** P = A + along·(B − A) + across·(B − A turned left): linear, so every order reads alike. */
function writeRigid(
  { p, a, b, along, across }: Rigid,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const { held, parts, right } = block;
  held[0] = p;
  held[1] = a;
  held[2] = b;
  parts[0] = 1;
  parts[1] = 0;
  parts[2] = along - 1;
  parts[3] = -across;
  parts[4] = -along;
  parts[5] = across;
  fillRow(block, motion, order, row, 3);
  parts[0] = 0;
  parts[1] = 1;
  parts[2] = across;
  parts[3] = along - 1;
  parts[4] = -across;
  parts[5] = -along;
  fillRow(block, motion, order, row + 1, 3);
  if (order === 0) {
    const { pose } = motion;
    const x = at(pose, 2 * a);
    const y = at(pose, 2 * a + 1);
    const ux = at(pose, 2 * b) - x;
    const uy = at(pose, 2 * b + 1) - y;
    right[row] = x + along * ux - across * uy - at(pose, 2 * p);
    right[row + 1] = y + along * uy + across * ux - at(pose, 2 * p + 1);
  }
  return row + 2;
}

/** B − A has no part square to the driven direction. */
function writeAngle(
  { a, b, shift, drive }: Angle,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const { pose, velocity } = motion;
  const { held, parts, right } = block;
  const angle = givenAt(motion.drive, drive) + shift;
  const ux = Math.cos(angle);
  const uy = Math.sin(angle);
  const x = at(pose, 2 * b) - at(pose, 2 * a);
  const y = at(pose, 2 * b + 1) - at(pose, 2 * a + 1);
  const along = x * ux + y * uy;
  const off = y * ux - x * uy;
  held[0] = b;
  held[1] = a;
  parts[0] = -uy;
  parts[1] = ux;
  parts[2] = uy;
  parts[3] = -ux;
  fillRow(block, motion, order, row, 2);
  const speed = givenAt(motion.speeds, drive);
  if (order === 0) right[row] = -off;
  if (order === 1) right[row] = at(right, row) + speed * along;
  if (order === 2) {
    const vx = at(velocity, 2 * b) - at(velocity, 2 * a);
    const vy = at(velocity, 2 * b + 1) - at(velocity, 2 * a + 1);
    // Square to the driven direction nothing is left over, so that its turning adds nothing there.
    right[row] =
      at(right, row) +
      2 * speed * (vx * ux + vy * uy) +
      givenAt(motion.accelerations, drive) * along;
  }
  return row + 1;
}
