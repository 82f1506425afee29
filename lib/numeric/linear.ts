import { at } from '@/lib/numeric/at';

/**
 * Solve `matrix · x = right` in place: the first n of `right` become x, `matrix` is used up,
 * nothing is allocated.
 *
 * `matrix` holds n rows of n, row after row; any units. Gaussian elimination with the rows scaled
 * and the largest pivot chosen. `right` is n + 1 long: its last place takes the smallest scaled
 * pivot. A number near 1 says well conditioned, 0 says singular, and the rest of `right` is then
 * left as it stood half-way.
 */
export function solveLinear(matrix: Float64Array, right: Float64Array, n: number): void {
  let smallest = 1;
  scaleRows(matrix, right, n);
  for (let column = 0; column < n; column += 1) {
    const row = largestBelow(matrix, n, column);
    const pivot = at(matrix, row * n + column);
    smallest = Math.min(smallest, Math.abs(pivot));
    if (!(Math.abs(pivot) > 1e-300)) {
      right[n] = 0;
      return;
    }
    if (row !== column) swapRows(matrix, right, n, row, column);
    for (let below = column + 1; below < n; below += 1) {
      const factor = at(matrix, below * n + column) / pivot;
      if (factor === 0) continue;
      for (let k = column; k < n; k += 1) {
        matrix[below * n + k] = at(matrix, below * n + k) - factor * at(matrix, column * n + k);
      }
      right[below] = at(right, below) - factor * at(right, column);
    }
  }
  for (let row = n - 1; row >= 0; row -= 1) {
    let sum = at(right, row);
    for (let k = row + 1; k < n; k += 1) sum -= at(matrix, row * n + k) * at(right, k);
    right[row] = sum / at(matrix, row * n + row);
  }
  right[n] = smallest;
}

/**
 * Singular values of a matrix of `rows` by `columns` (row after row), largest first.
 *
 * One-sided rotations after Hestenes (1958) and Jacobi, exact to rounding even for small values.
 * @example singularValues([3, 0, 0, 4], 2, 2) // → [4, 3]
 */
export function singularValues(
  matrix: ArrayLike<number>,
  rows: number,
  columns: number,
): readonly number[] {
  const vectors = Array.from({ length: columns }, (_, column) =>
    Array.from({ length: rows }, (__, row) => matrix[row * columns + column] ?? 0),
  );
  for (let sweep = 0; sweep < 60; sweep += 1) {
    let turned = false;
    vectors.forEach((u, i) => {
      vectors.slice(i + 1).forEach((v) => {
        turned = rotatePair(u, v) || turned;
      });
    });
    if (!turned) break;
  }
  return vectors.map((vector) => Math.hypot(...vector)).sort((a, b) => b - a);
}

/** Turn two columns until they stand square; false if they already do. */
function rotatePair(u: number[], v: number[]): boolean {
  let uu = 0;
  let vv = 0;
  let uv = 0;
  u.forEach((x, k) => {
    const y = v[k] ?? 0;
    uu += x * x;
    vv += y * y;
    uv += x * y;
  });
  if (Math.abs(uv) <= 1e-15 * Math.sqrt(uu * vv) || uv === 0) return false;
  const zeta = (vv - uu) / (2 * uv);
  const t = (zeta >= 0 ? 1 : -1) / (Math.abs(zeta) + Math.hypot(1, zeta));
  const cosine = 1 / Math.hypot(1, t);
  const sine = cosine * t;
  u.forEach((x, k) => {
    const y = v[k] ?? 0;
    u[k] = cosine * x - sine * y;
    v[k] = sine * x + cosine * y;
  });
  return true;
}

function scaleRows(matrix: Float64Array, right: Float64Array, n: number): void {
  for (let row = 0; row < n; row += 1) {
    let size = 0;
    for (let k = 0; k < n; k += 1) size = Math.max(size, Math.abs(at(matrix, row * n + k)));
    if (size === 0) continue;
    for (let k = 0; k < n; k += 1) matrix[row * n + k] = at(matrix, row * n + k) / size;
    right[row] = at(right, row) / size;
  }
}

function largestBelow(matrix: Float64Array, n: number, column: number): number {
  let best = column;
  for (let row = column + 1; row < n; row += 1) {
    if (Math.abs(at(matrix, row * n + column)) > Math.abs(at(matrix, best * n + column)))
      best = row;
  }
  return best;
}

function swapRows(matrix: Float64Array, right: Float64Array, n: number, i: number, j: number) {
  for (let k = 0; k < n; k += 1) {
    const kept = at(matrix, i * n + k);
    matrix[i * n + k] = at(matrix, j * n + k);
    matrix[j * n + k] = kept;
  }
  const kept = at(right, i);
  right[i] = at(right, j);
  right[j] = kept;
}
