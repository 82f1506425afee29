/**
 * Exact fractions of whole numbers of any size, always in lowest terms with a positive denominator.
 * Tooth counts make every ratio of a train such a fraction, so trains need no tolerance.
 */
export interface Fraction {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/**
 * The fraction of two whole numbers.
 *
 * @throws RangeError for a number that is not whole and for a denominator of nought.
 * @example fraction(36, -48) // → { numerator: -3n, denominator: 4n }
 */
export function fraction(numerator: number | bigint, denominator: number | bigint = 1): Fraction {
  return lowest(whole('numerator', numerator), whole('denominator', denominator));
}

/**
 * The sum of two fractions.
 *
 * @example add(fraction(1, 2), fraction(1, 3)) // → { numerator: 5n, denominator: 6n }
 */
export function add(a: Fraction, b: Fraction): Fraction {
  return lowest(
    a.numerator * b.denominator + b.numerator * a.denominator,
    a.denominator * b.denominator,
  );
}

/**
 * The first fraction less the second.
 *
 * @example subtract(fraction(1, 2), fraction(1, 3)) // → { numerator: 1n, denominator: 6n }
 */
export function subtract(a: Fraction, b: Fraction): Fraction {
  return add(a, { numerator: -b.numerator, denominator: b.denominator });
}

/**
 * The product of two fractions.
 *
 * @example multiply(fraction(2, 3), fraction(3, 4)) // → { numerator: 1n, denominator: 2n }
 */
export function multiply(a: Fraction, b: Fraction): Fraction {
  return lowest(a.numerator * b.numerator, a.denominator * b.denominator);
}

/**
 * The first fraction over the second.
 *
 * @throws RangeError if the second is nought.
 * @example divide(fraction(1, 2), fraction(3, 4)) // → { numerator: 2n, denominator: 3n }
 */
export function divide(a: Fraction, b: Fraction): Fraction {
  return lowest(a.numerator * b.denominator, a.denominator * b.numerator);
}

/**
 * Whether a fraction is nought.
 *
 * @example isZero(fraction(0, 7)) // → true
 */
export function isZero(a: Fraction): boolean {
  return a.numerator === 0n;
}

/**
 * The nearest double to a fraction, also when its whole numbers are beyond a double's range.
 *
 * @example toNumber(fraction(1, 8)) // → 0.125
 */
export function toNumber(a: Fraction): number {
  const direct = Number(a.numerator) / Number(a.denominator);
  if (Number.isFinite(direct) && (direct !== 0 || a.numerator === 0n)) return direct;
  const excess = bits(a.denominator) - 64;
  const shift = BigInt(Math.max(0, Math.min(excess, bits(a.numerator) - 64)));
  return Number(a.numerator >> shift) / Number(a.denominator >> shift);
}

/**
 * A fraction as it is written: `3/4`, or `5` when it is whole.
 *
 * @example written(fraction(36, 48)) // → '3/4'
 */
export function written(a: Fraction): string {
  return a.denominator === 1n ? `${a.numerator}` : `${a.numerator}/${a.denominator}`;
}

/**
 * The fraction that a written number stands for: `3.14`, `-1.5e-3` or `22/7`.
 *
 * @throws RangeError for anything else.
 * @example readFraction('25.4') // → { numerator: 127n, denominator: 5n }
 */
export function readFraction(text: string): Fraction {
  const over = text.split('/');
  const [above, below] = [over[0] ?? '', over[1]];
  if (over.length > 2) throw unreadable(text);
  return below === undefined ? readDecimal(above) : divide(readDecimal(above), readDecimal(below));
}

/**
 * The fraction that a number stands for as it is written down, so that 0.1 is one tenth.
 *
 * @throws RangeError for a number that is not finite.
 * @example decimalFraction(1.27) // → { numerator: 127n, denominator: 100n }
 */
export function decimalFraction(value: number): Fraction {
  return readDecimal(String(value));
}

/**
 * The greatest whole number that divides both; 0 if both are 0.
 *
 * @example greatestCommonDivisor(24n, 60n) // → 12n
 */
export function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let [larger, smaller] = [a < 0n ? -a : a, b < 0n ? -b : b];
  while (smaller > 0n) [larger, smaller] = [smaller, larger % smaller];
  return larger;
}

function lowest(numerator: bigint, denominator: bigint): Fraction {
  if (denominator === 0n) throw new RangeError('fraction: denominator is 0; expected another');
  const divisor = greatestCommonDivisor(numerator, denominator) * (denominator < 0n ? -1n : 1n);
  return { numerator: numerator / divisor, denominator: denominator / divisor };
}

function whole(name: string, value: number | bigint): bigint {
  if (typeof value === 'bigint') return value;
  if (Number.isSafeInteger(value)) return BigInt(value);
  throw new RangeError(`fraction: ${name} is ${value}; expected a whole number`);
}

function bits(value: bigint): number {
  return (value < 0n ? -value : value).toString(2).length;
}

function readDecimal(text: string): Fraction {
  const parts = /^\s*([+-]?)(\d*)(?:\.(\d*))?(?:[eE]([+-]?\d{1,3}))?\s*$/.exec(text);
  const [, sign = '', before = '', after = '', power = '0'] = parts ?? [];
  if (!parts || before + after === '') throw unreadable(text);
  const digits = BigInt(before + after) * (sign === '-' ? -1n : 1n);
  const shift = Number(power) - after.length;
  return shift >= 0
    ? lowest(digits * 10n ** BigInt(shift), 1n)
    : lowest(digits, 10n ** BigInt(-shift));
}

function unreadable(text: string): RangeError {
  return new RangeError(`readFraction: text is ${JSON.stringify(text)}; expected a number or a/b`);
}
