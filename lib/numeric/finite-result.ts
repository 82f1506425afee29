/**
 * `result`, if every number in it is finite: numbers, and arrays and plain objects of them to any
 * depth. The last thing a function does when its arguments may be sound one by one and still
 * overflow together.
 *
 * @throws RangeError naming `caller` if a number in it is NaN or infinite.
 * @example finiteResult('f', { x: 1.5 }).x // → 1.5
 */
export function finiteResult<T>(caller: string, result: T): T {
  if (!isFiniteThroughout(result)) {
    throw new RangeError(`${caller}: the answer to these arguments is too large for a number`);
  }
  return result;
}

function isFiniteThroughout(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (typeof value !== 'object' || value === null) return true;
  for (const part of Object.values(value)) if (!isFiniteThroughout(part)) return false;
  return true;
}
