import type { Given } from '@/lib/marking/definition';
import type { Source } from '@/lib/marking/source';
import { within, type Tolerance } from '@/lib/marking/tolerance';
import { lengthField } from '@/lib/quantities/field';
import { lengthUnit } from '@/lib/quantities/units';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { write, writeNumber, writeParts } from '@/lib/quantities/write';

/** A range that is drawn in the learner's own unit and never converted: from, to, step. */
export interface Sizes {
  readonly mm: readonly [from: number, to: number, step: number];
  readonly in: readonly [from: number, to: number, step: number];
}

/** One size of the range in the learner's own unit. */
export function drawSize(source: Source, units: UnitSystem, sizes: Sizes): number {
  const [from, to, step] = sizes[lengthUnit(units)];
  return source.step(from, to, step);
}

/** The first in millimetres, the second in inches. */
export function inUnits(units: UnitSystem, millimetres: number, inches: number): number {
  return units === 'metric' ? millimetres : inches;
}

/** A length with its unit, as a reader of that unit system writes it. */
export function said(value: number, units: UnitSystem, places?: number): string {
  return write(value, lengthUnit(units), places);
}

/** A number as it is written without a unit. */
export const plain = writeNumber;

/** A step of a worked example that comes to a length. */
export function lengthStep(text: string, value: number, units: UnitSystem) {
  return { text, value: said(value, units), result: { value, field: lengthField(units) } };
}

/** A given length. */
export function givenLength(
  symbol: string,
  label: string,
  value: number,
  units: UnitSystem,
  places?: number,
): Given {
  return { symbol, label, ...writeParts(value, lengthUnit(units), places) };
}

/** A given number of something: teeth, turns, times. */
export function givenNumber(
  symbol: string,
  label: string,
  value: number | string,
  unit = '',
): Given {
  return { symbol, label, value: typeof value === 'number' ? writeNumber(value) : value, unit };
}

/** A length counts within so many millimetres or inches. */
export function lengthWithin(millimetres: number, inches: number) {
  return (units: UnitSystem): Tolerance => within(inUnits(units, millimetres, inches));
}
