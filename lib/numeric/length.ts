/**
 * `√(x² + y²)` without overflow on the way. Unlike `Math.hypot` it takes a fixed number of
 * arguments, so that a step of an animation that uses it allocates nothing.
 * @example lengthOf(-3, 4) // → 5
 * @example lengthOf(3e300, 4e300) // → 5e300
 */
export function lengthOf(x: number, y: number): number {
  const long = Math.max(Math.abs(x), Math.abs(y));
  if (!(long > 0)) return long;
  const share = Math.min(Math.abs(x), Math.abs(y)) / long;
  return long * Math.sqrt(1 + share * share);
}
