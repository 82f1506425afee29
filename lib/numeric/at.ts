/*
 * Reading from arrays in the step of an animation, where nothing may be allocated. Each kind of array
 * has a reader of its own: what a reader of many kinds gives back, the engine puts on the heap.
 */

/**
 * The number at `index`, which the caller knows to lie within the array; 0 outside it.
 * @example at(new Float64Array([3, 4]), 1) // → 4
 */
export function at(values: Float64Array, index: number): number {
  return values[index] ?? 0;
}

/**
 * The same of whole numbers.
 * @example wholeAt(new Int8Array([1, -1]), 1) // → -1
 */
export function wholeAt(values: Int8Array | Int32Array, index: number): number {
  return values[index] ?? 0;
}

/**
 * The same of what a caller hands in, a list or an array of any kind.
 * @example givenAt([3, 4], 1) // → 4
 */
export function givenAt(values: ArrayLike<number>, index: number): number {
  return values[index] ?? 0;
}

/**
 * The item at `index`, which the caller's own loop keeps within the list. It takes the place of
 * `for … of`, whose iterator the engine may put on the heap.
 * @example nth(['oak', 'ash'], 1) // → 'ash'
 */
export function nth<T>(list: readonly T[], index: number): T {
  return list[index] as T;
}
