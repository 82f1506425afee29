import { at } from '@/lib/numeric/at';

/**
 * A set of equations under work: rows over the columns of the points that it settles. A point that
 * another step has settled has no column (−1); its motion goes to the right-hand side.
 */
export interface Block {
  /** By point: the column of its x, or −1. */
  readonly columns: Int32Array;
  readonly width: number;
  readonly matrix: Float64Array;
  readonly right: Float64Array;
}

/** What the right-hand side is to hold: errors of position, or terms of velocity or acceleration. */
export type Order = 0 | 1 | 2;

/** Everything a relation may look at; the rates may be left empty for order 0. */
export interface Motion {
  readonly pose: Float64Array;
  readonly velocity: Float64Array;
  readonly acceleration: Float64Array;
  readonly drive: ArrayLike<number>;
  readonly speeds: ArrayLike<number>;
  readonly accelerations: ArrayLike<number>;
}

/** Add a point's part to a row: to its column if it has one, else its known motion to the right. */
export function put(
  block: Block,
  motion: Motion,
  order: Order,
  row: number,
  p: number,
  x: number,
  y: number,
) {
  const column = at(block.columns, p);
  if (column >= 0) {
    const place = row * block.width + column;
    block.matrix[place] = at(block.matrix, place) + x;
    block.matrix[place + 1] = at(block.matrix, place + 1) + y;
  } else if (order !== 0) {
    const known = order === 1 ? motion.velocity : motion.acceleration;
    addRight(block, row, -(x * at(known, 2 * p) + y * at(known, 2 * p + 1)));
  }
}

export function addRight(block: Block, row: number, value: number): void {
  block.right[row] = at(block.right, row) + value;
}

/** Coordinate `axis` of point `to` less that of point `from`. */
export function gap(values: Float64Array, axis: 0 | 1, from: number, to: number): number {
  return at(values, 2 * to + axis) - at(values, 2 * from + axis);
}
