import type { Dimension, Unit } from './units';

/** What is written for each unit, in small letters, by what the field measures. */
const names: Readonly<Record<Dimension, Readonly<Record<string, Unit>>>> = {
  length: {
    mm: 'mm',
    millimetre: 'mm',
    millimetres: 'mm',
    millimeter: 'mm',
    millimeters: 'mm',
    cm: 'cm',
    centimetres: 'cm',
    centimeters: 'cm',
    m: 'm',
    metres: 'm',
    meters: 'm',
    in: 'in',
    inch: 'in',
    inches: 'in',
    '"': 'in',
    ft: 'ft',
    foot: 'ft',
    feet: 'ft',
    "'": 'ft',
  },
  angle: {
    '°': '°',
    deg: '°',
    degree: '°',
    degrees: '°',
    "'": 'minute of arc',
    '"': 'second of arc',
    rad: 'rad',
  },
  turning: {
    rpm: 'rpm',
    'r/min': 'rpm',
    'rev/min': 'rpm',
    'turns/min': 'rpm',
    'turns a minute': 'rpm',
    'turns per minute': 'rpm',
    'r/s': 'r/s',
    'turns/s': 'r/s',
    'turns per second': 'r/s',
  },
  time: {
    s: 's',
    sec: 's',
    second: 's',
    seconds: 's',
    min: 'min',
    minute: 'min',
    minutes: 'min',
    h: 'h',
    hour: 'h',
    hours: 'h',
  },
  share: { '%': '%', percent: '%', 'per cent': '%' },
  force: { n: 'N', newton: 'N', newtons: 'N', lbf: 'lbf', 'pounds-force': 'lbf' },
  speed: {
    'mm/s': 'mm/s',
    'in/s': 'in/s',
    'm/min': 'm/min',
    'ft/min': 'ft/min',
  },
  rate: { '/h': '/h', 'per hour': '/h', 'an hour': '/h' },
  ratio: {},
  scale: {},
  count: {},
  plain: {},
};

/** The unit that `text` names in a field of this dimension, or `null`. */
export function unitNamed(text: string, dimension: Dimension): Unit | null {
  const table = names[dimension];
  const key = text.toLowerCase();
  return Object.hasOwn(table, key) ? (table[key] ?? null) : null;
}

/** The other things that `text` would measure, were the field another. */
export function otherDimensionOf(text: string, dimension: Dimension): Dimension | null {
  const key = text.toLowerCase();
  for (const [other, table] of Object.entries(names)) {
    if (other !== dimension && Object.hasOwn(table, key)) return other as Dimension;
  }
  return null;
}
