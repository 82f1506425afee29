import { degrees } from '@/lib/geometry/angle';
import { write, writeNumber, writeParts } from '@/lib/quantities/write';
import type { Point } from '@/lib/geometry/point';
import type { BenchSettings } from './bench-spec';

type Units = BenchSettings['units'];

const millimetresInAnInch = 25.4;

/**
 * A length as it is read off a drawing: millimetres to a tenth, inches to a hundredth.
 *
 * @example lengthText(79.375, 'inch') // → '3.13 in'
 */
export function lengthText(mm: number, units: Units): string {
  return units === 'inch'
    ? `${fixedNumber(mm / millimetresInAnInch, 2)} in`
    : `${fixedNumber(mm, 1)} mm`;
}

/**
 * A length as it is set by a rule: millimetres without needless places, inches and fractions.
 *
 * @example ruleText(79.375, 'inch') // → '3 1/8 in'
 */
export function ruleText(mm: number, units: Units): string {
  return units === 'inch' ? write(mm / millimetresInAnInch, 'in') : write(mm, 'mm');
}

/** A number with just these places and a true minus sign, so that its width stays as it turns. */
export function fixedNumber(value: number, places: number): string {
  const text = Math.abs(value).toFixed(places);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** A number with as many places as it needs, `places` of them at most. */
export function shortNumber(value: number, places: number): string {
  return writeNumber(value, places);
}

/** Radians as degrees in words. */
export function angleText(angle: number, places = 1): string {
  return `${fixedNumber(degrees(angle), places)}°`;
}

/** mm as the number shown in the learner's unit. */
export function shownLength(mm: number, units: Units): number {
  return units === 'inch' ? mm / millimetresInAnInch : mm;
}

/** The number shown in the learner's unit as mm. */
export function lengthFromShown(shown: number, units: Units): number {
  return units === 'inch' ? shown * millimetresInAnInch : shown;
}

/** The name of the unit lengths are shown in. */
export function lengthUnit(units: Units): 'mm' | 'in' {
  return units === 'inch' ? 'in' : 'mm';
}

/** The nearest multiple of `step`. */
export function toStep(value: number, step: number): number {
  return Math.round(value / step) * step;
}

/** A length as it stands in a box whose unit is written beside it. */
export function boxText(mm: number, units: Units): string {
  const shown = shownLength(mm, units);
  return writeParts(shown, lengthUnit(units)).value;
}

/** What is nearer to a line than this, mm, lies on it. */
const seen = 0.05;

/** Where a point lies, in words of the compass: `120.0 mm east, 40.0 mm north`. */
export function compassText({ x, y }: Point, units: Units): string {
  const part = (mm: number, plus: string, minus: string) =>
    Math.abs(mm) < seen ? [] : [`${lengthText(Math.abs(mm), units)} ${mm < 0 ? minus : plus}`];
  const parts = [...part(x, 'east', 'west'), ...part(y, 'north', 'south')];
  return parts.length > 0 ? parts.join(', ') : 'the middle';
}
