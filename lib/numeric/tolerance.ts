/**
 * Relative tolerance for lengths that were reached by a few dozen roundings of doubles: 2⁻⁵² times
 * some five thousand. Below it two lengths of one drawing are one length.
 */
export const LENGTH_TOLERANCE = 1e-12;

/**
 * Share of the largest singular value under which another counts as nought. Far above rounding
 * (1e-16), far below anything that a workshop could make on purpose.
 */
export const RANK_TOLERANCE = 1e-9;

/**
 * Whether two numbers differ by no more than `tolerance` times `size`.
 *
 * `size` is the scale of the drawing that both come from; left out, it is the larger of the two.
 * @example nearlyEqual(0.1 + 0.2, 0.3) // → true
 */
export function nearlyEqual(
  a: number,
  b: number,
  tolerance = LENGTH_TOLERANCE,
  size = Math.max(Math.abs(a), Math.abs(b)),
): boolean {
  return Math.abs(a - b) <= tolerance * size;
}

/**
 * `value`, brought between `least` and `most`.
 * @example clamp(1.5, -1, 1) // → 1
 */
export function clamp(value: number, least: number, most: number): number {
  return Math.min(Math.max(value, least), most);
}

/**
 * Arc cosine in radians, of a value that rounding may have carried past ±1.
 *
 * Only rounding is forgiven by the callers: they decide first whether the triangle closes.
 * @example acosClamped(1.0000000000000002) // → 0
 */
export function acosClamped(value: number): number {
  return Math.acos(clamp(value, -1, 1));
}

/**
 * Arc sine in radians, of a value that rounding may have carried past ±1.
 * @example asinClamped(-1.0000000000000002) // → -1.5707963
 */
export function asinClamped(value: number): number {
  return Math.asin(clamp(value, -1, 1));
}

/**
 * Square root of a value that rounding may have carried below nought.
 * @example sqrtClamped(-1e-18) // → 0
 */
export function sqrtClamped(value: number): number {
  return Math.sqrt(Math.max(value, 0));
}
