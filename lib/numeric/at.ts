/**
 * The number at `index`, which the caller knows to lie within the array; 0 outside it.
 * @example at([3, 4], 1) // → 4
 */
export function at(values: ArrayLike<number>, index: number): number {
  return values[index] ?? 0;
}
