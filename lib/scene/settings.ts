import { degrees, radians } from '@/lib/geometry/angle';
import { lengthField, type Field } from '@/lib/quantities/field';
import type { NumberControl } from './bench-model';
import type { BenchSettings } from './bench-spec';
import { boxText, lengthFromShown, lengthUnit, ruleText, shownLength, toStep } from './measure';

type Units = BenchSettings['units'];

/** From the least to the most by a step: mm for metric learners, inches for the others. */
export interface LengthRange {
  readonly mm: readonly [least: number, most: number, step: number];
  readonly inch: readonly [least: number, most: number, step: number];
}

/** Angles are typed in degrees. */
export const degreeField: Field = { dimension: 'angle', unit: '°' };

/** A length to be set, in the learner's unit. */
export function lengthControl(
  key: string,
  label: string,
  mm: number,
  range: LengthRange,
  units: Units,
): NumberControl {
  const [least, most, step] = units === 'inch' ? range.inch : range.mm;
  return {
    kind: 'number',
    key,
    label,
    unit: lengthUnit(units),
    value: Number(shownLength(mm, units).toFixed(6)),
    text: boxText(mm, units),
    least,
    most,
    step,
    field: lengthField(units ?? 'metric'),
    slides: true,
    spoken: ruleText(mm, units),
  };
}

/** The mm that a shown length stands for, on the nearest step of its range. */
export function lengthSet(shown: number, range: LengthRange, units: Units): number {
  const [least, most, step] = units === 'inch' ? range.inch : range.mm;
  return lengthFromShown(Math.min(most, Math.max(least, toStep(shown, step))), units);
}

/** An angle to be set, in degrees. */
export function angleControl(
  key: string,
  label: string,
  angle: number,
  [least, most, step]: readonly [number, number, number],
): NumberControl {
  const value = Math.round(degrees(angle) * 100) / 100;
  return {
    kind: 'number',
    key,
    label,
    unit: '°',
    value,
    text: String(value),
    least,
    most,
    step,
    field: degreeField,
    spoken: `${value} degrees`,
  };
}

/** The radians that shown degrees stand for, on the nearest step of their range. */
export function angleSet(
  shown: number,
  [least, most, step]: readonly [number, number, number],
): number {
  return radians(Math.min(most, Math.max(least, toStep(shown, step))));
}
