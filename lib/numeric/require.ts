/**
 * Guards for arguments. Each throws a `RangeError` that names the function, the argument and the
 * value it was given, so that nonsense is refused where it enters and NaN never travels on.
 */

/** `value`, if it is a finite number. */
export function requireFinite(caller: string, name: string, value: number): number {
  if (!Number.isFinite(value)) throw refused(caller, name, value, 'a finite number');
  return value;
}

/** `value`, if it is finite and greater than zero. */
export function requirePositive(caller: string, name: string, value: number): number {
  if (!(Number.isFinite(value) && value > 0)) {
    throw refused(caller, name, value, 'a finite number greater than zero');
  }
  return value;
}

/** `value`, if it is finite and zero or more. */
export function requireNonNegative(caller: string, name: string, value: number): number {
  if (!(Number.isFinite(value) && value >= 0)) {
    throw refused(caller, name, value, 'a finite number, zero or more');
  }
  return value;
}

/** `value`, if it is a whole number of at least `least`. */
export function requireCount(caller: string, name: string, value: number, least = 1): number {
  if (!(Number.isSafeInteger(value) && value >= least)) {
    throw refused(caller, name, value, `a whole number, ${least} or more`);
  }
  return value;
}

/** `value`, if it is finite and lies from `least` to `most`, both included. */
export function requireWithin(
  caller: string,
  name: string,
  value: number,
  least: number,
  most: number,
): number {
  if (!(Number.isFinite(value) && value >= least && value <= most)) {
    throw refused(caller, name, value, `a number from ${least} to ${most}`);
  }
  return value;
}

function refused(caller: string, name: string, value: number, expected: string): RangeError {
  return new RangeError(`${caller}: ${name} is ${value}; expected ${expected}`);
}
