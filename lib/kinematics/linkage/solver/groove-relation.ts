import { at, givenAt } from '@/lib/numeric/at';
import {
  fillRow,
  type Block,
  type Motion,
  type Order,
} from '@/lib/kinematics/linkage/solver/block';
import type { Reach, SlideRelation } from '@/lib/kinematics/linkage/solver/linkage';

/** P − Through: its part square to the groove is `offset` (slide), or its part along it is driven (reach). */
export function writeGroove(
  relation: SlideRelation | Reach,
  order: Order,
  motion: Motion,
  block: Block,
  row: number,
): number {
  const { p, through, from, to } = relation;
  const { pose } = motion;
  const { held, parts, right } = block;
  const gx = at(pose, 2 * to) - at(pose, 2 * from);
  const gy = at(pose, 2 * to + 1) - at(pose, 2 * from + 1);
  const long = Math.sqrt(gx * gx + gy * gy);
  const ux = long > 0 ? gx / long : 1;
  const uy = long > 0 ? gy / long : 0;
  const x = at(pose, 2 * p) - at(pose, 2 * through);
  const y = at(pose, 2 * p + 1) - at(pose, 2 * through + 1);
  const along = x * ux + y * uy;
  const off = y * ux - x * uy;
  const sliding = relation.kind === 'slide';
  const lever = (sliding ? -along : off) / (long > 0 ? long : 1);
  held[0] = p;
  held[1] = through;
  held[2] = to;
  held[3] = from;
  parts[0] = sliding ? -uy : ux;
  parts[1] = sliding ? ux : uy;
  parts[2] = -at(parts, 0);
  parts[3] = -at(parts, 1);
  parts[4] = lever * -uy;
  parts[5] = lever * ux;
  parts[6] = lever * uy;
  parts[7] = lever * -ux;
  fillRow(block, motion, order, row, 4);
  if (order === 0) {
    right[row] = sliding ? relation.offset - off : givenAt(motion.drive, relation.drive) - along;
  } else if (!sliding) {
    const driven = order === 1 ? motion.speeds : motion.accelerations;
    right[row] = at(right, row) + givenAt(driven, relation.drive);
  }
  if (order === 2 && long > 0) addTurning(relation, motion, block, row);
  return row + 1;
}

/** What the turning of a moving groove adds to the acceleration of what keeps to it. */
function addTurning(
  { kind, p, through, from, to }: SlideRelation | Reach,
  { pose, velocity }: Motion,
  { right }: Block,
  row: number,
): void {
  const gx = at(pose, 2 * to) - at(pose, 2 * from);
  const gy = at(pose, 2 * to + 1) - at(pose, 2 * from + 1);
  const x = at(pose, 2 * p) - at(pose, 2 * through);
  const y = at(pose, 2 * p + 1) - at(pose, 2 * through + 1);
  const tx = at(velocity, 2 * to) - at(velocity, 2 * from);
  const ty = at(velocity, 2 * to + 1) - at(velocity, 2 * from + 1);
  const vx = at(velocity, 2 * p) - at(velocity, 2 * through);
  const vy = at(velocity, 2 * p + 1) - at(velocity, 2 * through + 1);
  const long = Math.sqrt(gx * gx + gy * gy);
  const ux = gx / long;
  const uy = gy / long;
  const along = x * ux + y * uy;
  const off = y * ux - x * uy;
  const spin = (ty * ux - tx * uy) / long;
  const stretch = (tx * ux + ty * uy) / long;
  const ahead = vx * ux + vy * uy;
  const aside = vy * ux - vx * uy;
  const turning =
    kind === 'slide'
      ? 2 * ahead + spin * off - 2 * along * stretch
      : spin * along - 2 * aside + 2 * off * stretch;
  right[row] = at(right, row) + spin * turning;
}
