import { readAmount, type Amount } from './amount';
import { explain, type Refusal } from './expects';
import type { Field } from './field';
import { longest, tokens, type Token } from './tokens';
import { otherDimensionOf, unitNamed } from './unit-names';
import { convert, counterpart, type Unit } from './units';
import { write, writeBoth, writeNumber } from './write';

/** What was read: a value in the field's unit with its echo, or why not and what is expected. */
export type Reading =
  | {
      readonly ok: true;
      /** In the field's unit. */
      readonly value: number;
      /** What was understood, as it is said back: `3 1/8 in = 79.4 mm`. */
      readonly echo: string;
    }
  | ({ readonly ok: false; readonly message: string } & Refusal);

/** A value that one term of an answer stands for: 1 foot, 2 1/2 inches, 30 minutes. */
interface Term {
  readonly amount: Amount;
  readonly unit: Unit;
  readonly bare: boolean;
}

const furthest = 1e9;

/**
 * Reads what a woodworker writes, and never guesses: what could mean two things is refused with both
 * readings, anything else with what is expected. A bare number is in the field's unit. Takes time in
 * proportion to the text, of which it looks at 60 characters at most.
 * @example readQuantity('3 1/8 in', { dimension: 'length', unit: 'mm' }) // 79.375, '3 1/8 in = 79.4 mm'
 * @example readQuantity('3:1', ratioField('the crank', 'the lantern')) // 3
 */
export function readQuantity(text: string, field: Field): Reading {
  const result = readWithin(text, field);
  if ('reason' in result) return { ok: false, message: explain(result, field), ...result };
  if (!Number.isFinite(result.value) || Math.abs(result.value) > furthest) {
    const refusal: Refusal = { reason: 'too-large' };
    return { ok: false, message: explain(refusal, field), ...refusal };
  }
  return { ok: true, ...result };
}

function readWithin(text: string, field: Field): { value: number; echo: string } | Refusal {
  if (text.length > longest) return { reason: 'too-long' };
  if (text.trim() === '') return { reason: 'empty' };
  const pieces = tokens(text);
  if (pieces === null) return { reason: 'unreadable' };
  if (isRatio(field)) return readRatio(pieces, field);
  if (field.dimension === 'count' || field.dimension === 'plain') return readPlain(pieces, field);
  const terms = readTerms(pieces, field);
  if ('reason' in terms) return terms;
  return sum(terms, field);
}

function readRatio(pieces: readonly Token[], field: Field) {
  const above = amountAt(pieces, 0, field, true);
  if ('reason' in above) return above;
  const colon = pieces[above.next];
  if (colon === undefined) return ratio(above.value, above.text, field);
  if (colon.kind !== 'mark' || colon.text !== ':') return afterwards(pieces, above.next, field);
  const below = amountAt(pieces, above.next + 1, field, false);
  if ('reason' in below) return below;
  if (below.next < pieces.length) return afterwards(pieces, below.next, field);
  if (below.value === 0) return { reason: 'nought-below' } satisfies Refusal;
  return ratio(above.value / below.value, `${above.text} : ${below.text}`, field);
}

function ratio(value: number, text: string, { dimension, of = [] }: Field) {
  const [turning = 'the one', forOneTurn = 'the other'] = of;
  const number = /[:/]/.test(text) && !/^1.[0-9]+$/.test(text) ? writeNumber(value, 4) : text;
  const said = number === text ? text : `${text}, that is ${number}`;
  if (dimension === 'scale') return { value, echo: `${said} times` };
  const noun = Math.abs(value) <= 1 ? 'turn' : 'turns';
  return { value, echo: `${said} ${noun} of ${turning} for one turn of ${forOneTurn}` };
}

function isRatio({ dimension }: Field): boolean {
  return dimension === 'ratio' || dimension === 'scale';
}

function readPlain(pieces: readonly Token[], field: Field) {
  const amount = amountAt(pieces, 0, field, true);
  if ('reason' in amount) return amount;
  const [noun] = field.of ?? [];
  const rest = unitText(pieces.slice(amount.next));
  if (rest !== '' && rest.toLowerCase() !== noun) return afterwards(pieces, amount.next, field);
  if (field.dimension === 'count' && !Number.isInteger(amount.value)) {
    return { reason: 'not-whole', text: amount.text } satisfies Refusal;
  }
  return { value: amount.value, echo: noun === undefined ? amount.text : `${amount.text} ${noun}` };
}

/** One term, or several of falling size: feet and inches, degrees and minutes, hours and seconds. */
function readTerms(pieces: readonly Token[], field: Field): readonly Term[] | Refusal {
  const terms: Term[] = [];
  let at = 0;
  while (at < pieces.length) {
    const amount = amountAt(pieces, at, field, terms.length === 0);
    if ('reason' in amount) return amount;
    let end = amount.next;
    while (end < pieces.length && pieces[end]?.kind !== 'digits') end += 1;
    const named = pieces.slice(amount.next, end);
    const joined = named.length > 1 && isFoot(named[0]) && named.at(-1)?.text === '-';
    const name = unitText(joined ? named.slice(0, -1) : named);
    const unit = name === '' ? field.unit : unitNamed(name, field.dimension);
    if (unit === null) return wrongUnit(name, field);
    if (end < pieces.length && name === '') return { reason: 'unreadable' };
    terms.push({ amount, unit, bare: name === '' });
    at = end;
  }
  return terms;
}

function sum(terms: readonly Term[], field: Field): { value: number; echo: string } | Refusal {
  const [first] = terms;
  if (first === undefined) return { reason: 'unreadable' };
  for (const [index, term] of terms.entries()) {
    const before = terms[index - 1];
    if (before === undefined) continue;
    const fits = before.amount.shape === 'decimal' && Number.isInteger(before.amount.value);
    const most = convert(1, before.unit, term.unit);
    if (term.bare) return { reason: 'no-last-unit' };
    if (!fits || most <= 1 || term.amount.value >= most - 1e-9) return { reason: 'does-not-add' };
  }
  if (first.bare && first.amount.shape !== 'decimal' && isMetric(field.unit)) {
    return whichFraction(first.amount, field.unit);
  }
  const sign = first.amount.text.startsWith('−') ? -1 : 1;
  const value = terms.reduce(
    (total, { amount, unit }) => total + sign * convert(Math.abs(amount.value), unit, field.unit),
    0,
  );
  return { value, echo: echoOf(terms, value, field) };
}

function echoOf(terms: readonly Term[], value: number, field: Field): string {
  const typed = terms.map(({ amount, unit }) => typedWith(amount.text, unit)).join(' ');
  const [first] = terms;
  if (terms.length > 1 || first?.unit !== field.unit) {
    return `${typed} = ${write(value, field.unit, field.places)}`;
  }
  const other = counterpart(field.unit);
  if (other === null || field.unit === 'N' || isMetric(field.unit)) return typed;
  return `${typed} = ${write(convert(value, field.unit, other), other)}`;
}

function typedWith(text: string, unit: Unit): string {
  const sample = write(1, unit);
  return sample.replace(/^1/, text);
}

function whichFraction({ value, text }: Amount, metric: Unit): Refusal {
  const inches = counterpart(metric) ?? 'in';
  return {
    reason: 'which-fraction',
    text,
    readings: [
      writeBoth(value, inches).replace(/^.*?(?= in)/, text),
      `${text} ${metric} = ${writeNumber(value, 4)} ${metric}`,
    ],
  };
}

function amountAt(
  pieces: readonly Token[],
  start: number,
  field: Field,
  signed: boolean,
): Amount | Refusal {
  const amount = readAmount(pieces, start, signed);
  if (!('problem' in amount)) return amount;
  switch (amount.problem) {
    case 'comma':
      return {
        reason: 'which-comma',
        text: amount.text,
        readings: [amount.text.replace(',', '.'), amount.text.replace(',', '')],
      };
    case 'marks':
      return { reason: 'marks-between', text: amount.text };
    case 'nought-below':
      return { reason: 'nought-below' };
    case 'top-heavy':
      return { reason: 'top-heavy', text: amount.text };
    case 'many-digits':
      return { reason: 'too-long' };
    default:
      return !isRatio(field) && pieces.some((piece) => piece.text === ':')
        ? { reason: 'ratio-elsewhere' }
        : { reason: 'unreadable' };
  }
}

function afterwards(pieces: readonly Token[], from: number, field: Field): Refusal {
  return wrongUnit(unitText(pieces.slice(from)), field);
}

function wrongUnit(name: string, field: Field): Refusal {
  if (name.startsWith(':')) {
    return { reason: isRatio(field) ? 'unreadable' : 'ratio-elsewhere' };
  }
  const other = otherDimensionOf(name, field.dimension);
  return other === null ? { reason: 'unreadable' } : { reason: 'other-dimension', other };
}

function unitText(pieces: readonly Token[]): string {
  return pieces
    .map(({ kind, text, glued }, index) => {
      const apart = kind === 'word' && !glued && pieces[index - 1]?.kind === 'word';
      return apart ? ` ${text}` : text;
    })
    .join('');
}

function isFoot(token: Token | undefined): boolean {
  return token?.text === "'" || token?.text.toLowerCase() === 'ft';
}

function isMetric(unit: Unit): boolean {
  return unit === 'mm' || unit === 'cm' || unit === 'm' || unit === 'mm/s' || unit === 'm/min';
}
