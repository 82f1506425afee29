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
import type { Relation } from '@/lib/kinematics/linkage/solver/linkage';

/** P − Through: its part square to the groove is `offset` (slide), or its part along it is driven (reach). */
export function writeGroove(
  relation: Extract<Relation, { kind: 'slide' | 'reach' }>,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const { p, through, from, to } = relation;
  const { pose, velocity } = motion;
  const gx = gap(pose, 0, from, to);
  const gy = gap(pose, 1, from, to);
  const long = lengthOf(gx, gy);
  const ux = long > 0 ? gx / long : 1;
  const uy = long > 0 ? gy / long : 0;
  const x = gap(pose, 0, through, p);
  const y = gap(pose, 1, through, p);
  const along = x * ux + y * uy;
  const off = y * ux - x * uy;
  const sliding = relation.kind === 'slide';
  const rx = sliding ? -uy : ux;
  const ry = sliding ? ux : uy;
  const lever = (sliding ? -along : off) / (long > 0 ? long : 1);
  put(block, motion, order, row, p, rx, ry);
  put(block, motion, order, row, through, -rx, -ry);
  put(block, motion, order, row, to, lever * -uy, lever * ux);
  put(block, motion, order, row, from, lever * uy, lever * -ux);
  if (order === 0) {
    const wanted = sliding ? relation.offset - off : at(motion.drive, relation.drive) - along;
    addRight(block, row, wanted);
    return row + 1;
  }
  if (!sliding) {
    addRight(block, row, at(order === 1 ? motion.speeds : motion.accelerations, relation.drive));
  }
  if (order === 2 && long > 0) {
    const tx = gap(velocity, 0, from, to);
    const ty = gap(velocity, 1, from, to);
    const vx = gap(velocity, 0, through, p);
    const vy = gap(velocity, 1, through, p);
    const spin = (ty * ux - tx * uy) / long;
    const stretch = (tx * ux + ty * uy) / long;
    const ahead = vx * ux + vy * uy;
    const aside = vy * ux - vx * uy;
    addRight(
      block,
      row,
      sliding
        ? spin * (2 * ahead + spin * off - 2 * along * stretch)
        : spin * (-2 * aside + spin * along + 2 * off * stretch),
    );
  }
  return row + 1;
}
