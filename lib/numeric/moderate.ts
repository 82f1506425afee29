/**
 * Guards like those of `require.ts` that also keep sizes moderate, from 1e-60 to 1e60: far beyond
 * any workshop in any unit, and so far within the range of doubles that squares and products of a
 * few of them can neither overflow nor vanish. NaN and infinity then have no way in.
 */

const smallest = 1e-60;
const largest = 1e60;

/**
 * `value`, if it is positive and moderate.
 *
 * @throws RangeError otherwise.
 * @example requireSize('wheel', 'module', 3) // → 3
 */
export function requireSize(caller: string, name: string, value: number): number {
  if (value >= smallest && value <= largest) return value;
  throw refused(caller, name, value, `a number from ${smallest} to ${largest}`);
}

/**
 * `value`, if it is nought, or positive and moderate; what is nearer to nought is nought.
 *
 * @throws RangeError otherwise.
 * @example requireSizeOrNought('belt', 'thickness', 0) // → 0
 */
export function requireSizeOrNought(caller: string, name: string, value: number): number {
  if (value >= 0 && value <= largest) return value < smallest ? 0 : value;
  throw refused(caller, name, value, `a number from 0 to ${largest}`);
}

/**
 * `value`, if it is moderate with either sign, or nought; what is nearer to nought is nought.
 *
 * @throws RangeError otherwise.
 * @example requireMeasure('wheel', 'shift', -0.5) // → -0.5
 */
export function requireMeasure(caller: string, name: string, value: number): number {
  if (Math.abs(value) <= largest) return Math.abs(value) < smallest ? 0 : value;
  throw refused(caller, name, value, `a number from ${-largest} to ${largest}`);
}

function refused(caller: string, name: string, value: number, expected: string): RangeError {
  return new RangeError(`${caller}: ${name} is ${value}; expected ${expected}`);
}
