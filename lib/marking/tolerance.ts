/**
 * When two numbers count as the same: the operators of QTI 3, `equal` (exact, absolute, relative)
 * and `equal-rounded` (decimal places, significant figures).
 * Source: 1EdTech, Question and Test Interoperability 3.0, qti-equal and qti-equal-rounded.
 */
export type Tolerance =
  | { readonly operator: 'equal'; readonly mode: 'exact' }
  | { readonly operator: 'equal'; readonly mode: 'absolute'; readonly tolerance: number }
  | { readonly operator: 'equal'; readonly mode: 'relative'; readonly percent: number }
  | {
      readonly operator: 'equal-rounded';
      readonly mode: 'decimalPlaces' | 'significantFigures';
      readonly figures: number;
    };

/** Rounding of floating-point work, relative to the larger value: far below any tolerance asked for. */
const floatSlack = 1e-9;

/** A whole count, right or wrong by one at least. */
export const exact: Tolerance = { operator: 'equal', mode: 'exact' };

/** Within `tolerance` to either side, in the field's unit. */
export function within(tolerance: number): Tolerance {
  return { operator: 'equal', mode: 'absolute', tolerance };
}

/** Within `percent` of the right value. */
export function withinPercent(percent: number): Tolerance {
  return { operator: 'equal', mode: 'relative', percent };
}

/**
 * Whether `given` counts as `right`.
 * @example matches(withinPercent(0.5), 3.333, 10 / 3) // true
 */
export function matches(tolerance: Tolerance, given: number, right: number): boolean {
  const slack = floatSlack * Math.max(Math.abs(given), Math.abs(right));
  if (tolerance.operator === 'equal-rounded') {
    return Math.abs(rounded(given, tolerance) - rounded(right, tolerance)) <= slack;
  }
  return Math.abs(given - right) <= width(tolerance, right) + slack;
}

/**
 * How far from `right` a value may lie and still count. For rounding it is half a unit of the last
 * place kept.
 */
export function width(tolerance: Tolerance, right: number): number {
  if (tolerance.operator === 'equal-rounded') return lastPlace(right, tolerance) / 2;
  switch (tolerance.mode) {
    case 'exact':
      return 0;
    case 'absolute':
      return tolerance.tolerance;
    case 'relative':
      return (Math.abs(right) * tolerance.percent) / 100;
  }
}

/**
 * How many tolerances, taken at the larger of the two values, lie between them. For an exact count
 * one whole unit is taken for five.
 */
export function tolerancesApart(tolerance: Tolerance, one: number, other: number): number {
  const distance = Math.abs(one - other);
  if (tolerance.operator === 'equal' && tolerance.mode === 'exact') return 5 * distance;
  const larger = Math.abs(one) > Math.abs(other) ? one : other;
  const size = width(tolerance, larger);
  return size === 0 ? (distance === 0 ? 0 : Infinity) : distance / size;
}

/** The distance that slips must keep from the answer and from one another, in tolerances. */
export const slipDistance = 5;

/** Whether two values lie far enough apart to tell one from the other. */
export function farApart(tolerance: Tolerance, one: number, other: number): boolean {
  return tolerancesApart(tolerance, one, other) >= slipDistance * (1 - floatSlack);
}

type Rounding = Extract<Tolerance, { operator: 'equal-rounded' }>;

function lastPlace(value: number, { mode, figures }: Rounding): number {
  if (mode === 'decimalPlaces') return 10 ** -figures;
  if (value === 0) return 10 ** -figures;
  return 10 ** (Math.floor(Math.log10(Math.abs(value))) - figures + 1);
}

function rounded(value: number, tolerance: Rounding): number {
  const step = lastPlace(value, tolerance);
  const places = value / step;
  // A half that floating point put a hair below still rounds away from nought.
  const halfUp = Math.round(Math.abs(places) * (1 + floatSlack));
  return Math.sign(places) * halfUp * step;
}
