import type { UnitSystem } from './unit-system';

/** What a field measures. */
export const dimensions = [
  'length',
  'angle',
  'ratio',
  'scale',
  'count',
  'plain',
  'turning',
  'time',
  'share',
  'force',
  'speed',
  'rate',
] as const;
export type Dimension = (typeof dimensions)[number];

/** Units as they are written; the empty one belongs to ratios, counts and plain numbers. */
export const units = [
  'mm',
  'cm',
  'm',
  'in',
  'ft',
  '°',
  'minute of arc',
  'second of arc',
  'rad',
  'rpm',
  'r/s',
  's',
  'min',
  'h',
  '%',
  'N',
  'lbf',
  'mm/s',
  'in/s',
  'm/min',
  'ft/min',
  '/h',
  '',
] as const;
export type Unit = (typeof units)[number];

interface UnitFacts {
  readonly dimension: Dimension;
  /** How many of the dimension's first unit make one of this. */
  readonly size: number;
}

/** An inch in millimetres: exact by the international agreement of 1959. */
export const inch = 25.4;

const facts: Readonly<Record<Exclude<Unit, ''>, UnitFacts>> = {
  mm: { dimension: 'length', size: 1 },
  cm: { dimension: 'length', size: 10 },
  m: { dimension: 'length', size: 1000 },
  in: { dimension: 'length', size: inch },
  ft: { dimension: 'length', size: 12 * inch },
  '°': { dimension: 'angle', size: 1 },
  'minute of arc': { dimension: 'angle', size: 1 / 60 },
  'second of arc': { dimension: 'angle', size: 1 / 3600 },
  rad: { dimension: 'angle', size: 180 / Math.PI },
  rpm: { dimension: 'turning', size: 1 },
  'r/s': { dimension: 'turning', size: 60 },
  s: { dimension: 'time', size: 1 },
  min: { dimension: 'time', size: 60 },
  h: { dimension: 'time', size: 3600 },
  '%': { dimension: 'share', size: 1 },
  N: { dimension: 'force', size: 1 },
  // Pound (0.453 592 37 kg) times standard gravity (9.806 65 m/s²), both exact.
  lbf: { dimension: 'force', size: 0.45359237 * 9.80665 },
  'mm/s': { dimension: 'speed', size: 1 },
  'in/s': { dimension: 'speed', size: inch },
  'm/min': { dimension: 'speed', size: 1000 / 60 },
  'ft/min': { dimension: 'speed', size: (12 * inch) / 60 },
  '/h': { dimension: 'rate', size: 1 },
};

/** The dimension a unit measures, or `null` for the empty unit, which serves several. */
export function dimensionOf(unit: Unit): Dimension | null {
  return unit === '' ? null : facts[unit].dimension;
}

/**
 * `value` of one unit in another of the same dimension.
 * Throws a `RangeError` when the two measure different things.
 * @example convert(3.125, 'in', 'mm') // 79.375
 */
export function convert(value: number, from: Unit, to: Unit): number {
  if (from === to) return value;
  if (from === '' || to === '' || facts[from].dimension !== facts[to].dimension) {
    throw new RangeError(`convert: from ${from || 'no unit'} to ${to || 'no unit'}`);
  }
  return (value * facts[from].size) / facts[to].size;
}

const pairs: readonly (readonly [Unit, Unit])[] = [
  ['mm', 'in'],
  ['mm/s', 'in/s'],
  ['m/min', 'ft/min'],
  ['N', 'lbf'],
];

/** The unit that the other unit system writes for the same thing, or `null` where both agree. */
export function counterpart(unit: Unit): Unit | null {
  for (const [metric, inches] of pairs) {
    if (unit === metric) return inches;
    if (unit === inches) return metric;
  }
  return null;
}

/** The unit of length in a person's unit system. */
export function lengthUnit(system: UnitSystem): 'mm' | 'in' {
  return system === 'metric' ? 'mm' : 'in';
}

/** A length of the person's own unit in millimetres, for kinematics and benches. */
export function toMillimetres(value: number, system: UnitSystem): number {
  return system === 'metric' ? value : value * inch;
}

/** Millimetres in the person's own unit of length. */
export function fromMillimetres(value: number, system: UnitSystem): number {
  return system === 'metric' ? value : value / inch;
}
