/** How far an answer may lie from the expected number. */
export interface Tolerance {
  readonly rel: number;
  readonly abs: number;
}

/**
 * What is wrong with the answers to a case, one line a key; empty when all is well.
 *
 * A number passes within abs + rel·|expected|, an angle in degrees modulo 360, lists item by item;
 * counts, words, booleans and "infinite" must agree exactly.
 */
export function differences(
  expected: Readonly<Record<string, unknown>>,
  got: Readonly<Record<string, unknown>>,
  tolerance: Tolerance,
): readonly string[] {
  return Object.entries(expected).flatMap(([key, value]) =>
    agrees(key, value, got[key], tolerance)
      ? []
      : [`${key}: expected ${JSON.stringify(value)}, got ${JSON.stringify(got[key]) ?? 'nothing'}`],
  );
}

function agrees(key: string, expected: unknown, got: unknown, tolerance: Tolerance): boolean {
  if (Array.isArray(expected)) {
    return (
      Array.isArray(got) &&
      got.length === expected.length &&
      expected.every((item, index) => agrees(key, item, got[index], tolerance))
    );
  }
  if (typeof expected !== 'number') return got === expected;
  if (typeof got !== 'number' || !Number.isFinite(got)) return false;
  if (/_count(_list)?$/.test(key)) return got === expected;
  const apart = Math.abs(got - expected);
  const off = /_deg(_list)?$/.test(key) ? Math.min(apart % 360, 360 - (apart % 360)) : apart;
  return off <= tolerance.abs + tolerance.rel * Math.abs(expected);
}
