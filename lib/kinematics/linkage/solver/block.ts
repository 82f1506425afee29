import { at, wholeAt } from '@/lib/numeric/at';

/**
 * A set of equations under work: rows over the columns of the points that it settles. A point that
 * another step has settled has no column (−1); its motion goes to the right-hand side.
 *
 * Numbers are handed on through its arrays: as arguments and answers of functions the engine would
 * put each of them on the heap, many times a step.
 */
export interface Block {
  /** By point: the column of its x, or −1. */
  readonly columns: Int32Array;
  readonly width: number;
  readonly matrix: Float64Array;
  /** One longer than there are rows: `solveLinear` leaves its pivot there. */
  readonly right: Float64Array;
  /** The row at hand: its points, at most four, and two coefficients for each. */
  readonly held: Int32Array;
  readonly parts: Float64Array;
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

/** Working space for equations in the coordinates of some points. */
export function blockFor(points: readonly number[], pointCount: number, rows: number): Block {
  const columns = new Int32Array(pointCount).fill(-1);
  points.forEach((p, k) => {
    columns[p] = 2 * k;
  });
  const width = 2 * points.length;
  return {
    columns,
    width,
    matrix: new Float64Array(rows * width),
    right: new Float64Array(rows + 1),
    held: new Int32Array(4),
    parts: new Float64Array(8),
  };
}

/**
 * Fill a row from the first `count` points in `held` and their `parts`: the column of a point if it
 * has one, else its known motion to the right.
 */
export function fillRow(
  { columns, width, matrix, right, held, parts }: Block,
  { velocity, acceleration }: Motion,
  order: Order,
  row: number,
  count: number,
): void {
  const known = order === 1 ? velocity : acceleration;
  const base = row * width;
  for (let k = 0; k < width; k += 1) matrix[base + k] = 0;
  let sum = 0;
  for (let k = 0; k < count; k += 1) {
    const p = wholeAt(held, k);
    const column = wholeAt(columns, p);
    if (column >= 0) {
      matrix[base + column] = at(matrix, base + column) + at(parts, 2 * k);
      matrix[base + column + 1] = at(matrix, base + column + 1) + at(parts, 2 * k + 1);
    } else if (order !== 0) {
      sum -= at(parts, 2 * k) * at(known, 2 * p) + at(parts, 2 * k + 1) * at(known, 2 * p + 1);
    }
  }
  right[row] = sum;
}
