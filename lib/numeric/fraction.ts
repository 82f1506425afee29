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
