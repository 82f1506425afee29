import type { Field } from './field';
import type { Dimension } from './units';

/** Why an answer was not read. `readings` offers the two things that it could mean. */
export type Refusal =
  | { readonly reason: 'empty' | 'too-long' | 'too-large' | 'unreadable' }
  | { readonly reason: 'nought-below' | 'no-last-unit' | 'does-not-add' | 'ratio-elsewhere' }
  | {
      readonly reason: 'which-fraction' | 'which-comma';
      readonly text: string;
      readonly readings: readonly [string, string];
    }
  | { readonly reason: 'marks-between' | 'top-heavy' | 'not-whole'; readonly text: string }
  | { readonly reason: 'other-dimension'; readonly other: Dimension };

const called: Readonly<Record<Dimension, string>> = {
  length: 'a length',
  angle: 'an angle',
  ratio: 'a ratio',
  scale: 'a scale',
  count: 'a whole number',
  plain: 'a plain number',
  turning: 'turns a minute',
  time: 'a time',
  share: 'a share in per cent',
  force: 'a force',
  speed: 'a speed',
  rate: 'so many an hour',
};

/**
 * What a field takes, said under it.
 * @example expects({ dimension: 'length', unit: 'mm' }) // 'a length, such as 79.4 or 3 1/8 in'
 */
export function expects(field: Field): string {
  const places = field.places === undefined ? '' : `, to ${countWord(field.places)}`;
  const [first, second] = field.of ?? [];
  switch (field.dimension) {
    case 'length':
      return field.unit === 'mm'
        ? `a length in millimetres, such as 79.4, or in inches with the mark, such as 3 1/8 in${places}`
        : `a length in inches, such as 3 1/8 or 3.125, or with another mark, such as 79.4 mm${places}`;
    case 'angle':
      return `an angle in degrees, such as 22.5 or 22° 30′${places}`;
    case 'ratio':
      return `turns of ${first ?? 'the one'} for one turn of ${second ?? 'the other'}, such as 3, 3:1 or 1/3`;
    case 'scale':
      return 'how many times as large, such as 1.5, 3:2 or 2/3';
    case 'count':
      return first === undefined ? 'a whole number' : `a whole number of ${first}, such as 36`;
    case 'plain':
      return `a plain number, such as 3.25 or 3 1/4${places}`;
    case 'turning':
      return `turns a minute, such as 12.5 or 12.5 rpm${places}`;
    case 'time':
      return `a time, such as 90 s or 1 min 30 s${places}`;
    case 'share':
      return `a share in per cent, such as 4 or 4 %${places}`;
    case 'force':
      return `a force, such as 40 N or 9 lbf${places}`;
    case 'speed':
      return `a speed, such as 20 mm/s or 3/4 in/s${places}`;
    case 'rate':
      return `so many an hour, such as 18000 or 18000 /h${places}`;
  }
}

/** A refusal as a sentence: what was met, and what would be read. */
export function explain(refusal: Refusal, field: Field): string {
  const wanted = `Write ${expects(field)}.`;
  switch (refusal.reason) {
    case 'empty':
      return `Nothing is written here yet. ${wanted}`;
    case 'too-long':
      return `That is too long to be read. ${wanted}`;
    case 'too-large':
      return `That is too large a number for this field. ${wanted}`;
    case 'unreadable':
      return `This could not be read. ${wanted}`;
    case 'nought-below':
      return `Nothing can be divided by nought. ${wanted}`;
    case 'no-last-unit':
      return field.dimension === 'angle'
        ? 'What is the last number: minutes? Write 22° 30′, or 22.5.'
        : 'What is the last number? Put its mark behind it, as in 1′ 2 1/2″.';
    case 'does-not-add':
      return `These pieces do not add up: whole numbers first, then the smaller unit, less than one of the larger. ${wanted}`;
    case 'ratio-elsewhere':
      return `This field takes ${called[field.dimension]}, not a ratio. ${wanted}`;
    case 'which-fraction':
      return `${refusal.text} of what? ${refusal.readings.join(', or ')}. Write the unit behind it.`;
    case 'which-comma':
      return `${refusal.text} could be ${refusal.readings.join(' or ')}. Write a decimal point, or leave the mark out.`;
    case 'marks-between':
      return `${refusal.text} has more than one mark. Leave out the marks between thousands.`;
    case 'top-heavy':
      return `The fraction after a whole number is less than one; ${refusal.text} is not.`;
    case 'not-whole':
      return `${refusal.text} is not a whole number. ${wanted}`;
    case 'other-dimension':
      return `That is ${called[refusal.other]}; this field takes ${called[field.dimension]}. ${wanted}`;
  }
}

function countWord(places: number): string {
  return places === 1 ? 'one place' : `${places} places`;
}
