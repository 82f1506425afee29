import { convert, counterpart, type Unit } from './units';

/** A quantity as it is shown: the number and its unit apart, so that they can be set in two faces. */
export interface Written {
  readonly value: string;
  readonly unit: string;
}

const sixtyFourths = 64;
/** A length this near to a sixty-fourth, in inches, is that sixty-fourth. */
const onTheMark = 1e-6;

/** The places a unit is commonly written to; a small value gets three significant figures. */
const usualPlaces: Readonly<Partial<Record<Unit, number>>> = {
  mm: 1,
  in: 3,
  '°': 1,
  '%': 1,
  '': 3,
};

/**
 * A value and its unit in words of the shop: millimetres to a tenth, inches as a fraction down to
 * sixty-fourths where the value is one and else to three places.
 * @example writeParts(3.125, 'in') // { value: '3 1/8', unit: 'in' }
 */
export function writeParts(value: number, unit: Unit, places?: number): Written {
  const number =
    places === undefined && (unit === 'in' || unit === 'ft')
      ? (inchFraction(value) ?? writeNumber(value, placesFor(value, unit)))
      : writeNumber(value, places ?? placesFor(value, unit));
  return { value: number, unit: symbol(unit) };
}

/**
 * A value with its unit.
 * @example write(79.375, 'mm') // '79.4 mm'
 */
export function write(value: number, unit: Unit, places?: number): string {
  const parts = writeParts(value, unit, places);
  if (parts.unit === '') return parts.value;
  return /^[°′″]$/.test(parts.unit)
    ? `${parts.value}${parts.unit}`
    : `${parts.value} ${parts.unit}`;
}

/**
 * A length or the like in its own unit and in the other system's, as it is said back to the learner.
 * @example writeBoth(3.125, 'in') // '3 1/8 in = 79.4 mm'
 */
export function writeBoth(value: number, unit: Unit): string {
  const other = counterpart(unit);
  if (other === null) return write(value, unit);
  return `${write(value, unit)} = ${write(convert(value, unit, other), other)}`;
}

/**
 * A plain number to so many places at most, without noughts at its end and with a true minus sign.
 * @example writeNumber(-2.5, 3) // '−2.5'
 */
export function writeNumber(value: number, places = 3): string {
  const rounded = Number(value.toFixed(places));
  const text = Math.abs(rounded).toFixed(places);
  const trimmed = text.includes('.') ? text.replace(/0+$/, '').replace(/\.$/, '') : text;
  return rounded < 0 ? `−${trimmed}` : trimmed;
}

/** The value as a whole number and a fraction of an inch in lowest terms, if it is one. */
function inchFraction(value: number): string | null {
  const marks = Math.round(Math.abs(value) * sixtyFourths);
  if (Math.abs(Math.abs(value) * sixtyFourths - marks) > onTheMark * sixtyFourths) return null;
  const whole = Math.floor(marks / sixtyFourths);
  let above = marks % sixtyFourths;
  let below = sixtyFourths;
  while (above > 0 && above % 2 === 0) {
    above /= 2;
    below /= 2;
  }
  const sign = value < 0 && marks > 0 ? '−' : '';
  if (above === 0) return `${sign}${whole}`;
  return `${sign}${whole > 0 ? `${whole} ` : ''}${above}/${below}`;
}

function placesFor(value: number, unit: Unit): number {
  const usual = usualPlaces[unit] ?? 2;
  if (value === 0 || !Number.isFinite(value)) return usual;
  const threeFigures = 2 - Math.floor(Math.log10(Math.abs(value)));
  return Math.min(8, Math.max(usual, threeFigures));
}

function symbol(unit: Unit): string {
  if (unit === 'minute of arc') return '′';
  if (unit === 'second of arc') return '″';
  return unit;
}
