import type { Token } from './tokens';

/** A number as written: its value, its shape, and the same said plainly. */
export interface Amount {
  readonly value: number;
  readonly shape: 'decimal' | 'fraction' | 'mixed';
  readonly text: string;
  /** Index of the first token after it. */
  readonly next: number;
}

/** Why a number could not be read. */
export type AmountProblem =
  | { readonly problem: 'nothing' }
  /** A comma before exactly three digits: a decimal mark, or a mark between thousands? */
  | { readonly problem: 'comma'; readonly text: string }
  | { readonly problem: 'marks'; readonly text: string }
  | { readonly problem: 'many-digits' }
  | { readonly problem: 'nought-below'; readonly text: string }
  | { readonly problem: 'top-heavy'; readonly text: string }
  | { readonly problem: 'malformed' };

/** As many as a calculator may show, and a few more. */
const mostDigits = 20;

/**
 * The number that starts at token `start`: `79.4`, `79,4`, `5/16`, `3 1/8`, `3-1/8`, with a minus
 * sign where `signed`.
 */
export function readAmount(
  tokens: readonly Token[],
  start: number,
  signed: boolean,
): Amount | AmountProblem {
  const first = tokens[start];
  const hasSign = first?.kind === 'mark' && (first.text === '-' || first.text === '+');
  if (hasSign && !signed) return { problem: 'malformed' };
  const unsigned = readUnsigned(tokens, hasSign ? start + 1 : start);
  if ('problem' in unsigned || !hasSign || first.text === '+') return unsigned;
  return { ...unsigned, value: -unsigned.value, text: `−${unsigned.text}` };
}

function readUnsigned(tokens: readonly Token[], start: number): Amount | AmountProblem {
  const head = tokens[start];
  if (head?.kind !== 'digits') return { problem: 'nothing' };
  const number = readDigits(head.text);
  if ('problem' in number) return number;
  if (isMark(tokens[start + 1], '/') && tokens[start + 2]?.kind === 'digits') {
    const fraction = readFraction(tokens, start);
    return 'problem' in fraction ? fraction : { ...fraction, shape: 'fraction' };
  }
  const fractionStart = joinedFraction(tokens, start + 1);
  if (fractionStart === null) return { ...number, shape: 'decimal', next: start + 1 };
  if (!isWhole(head.text)) return { problem: 'malformed' };
  const fraction = readFraction(tokens, fractionStart);
  if ('problem' in fraction) return fraction;
  if (fraction.value >= 1) return { problem: 'top-heavy', text: fraction.text };
  return {
    value: number.value + fraction.value,
    shape: 'mixed',
    text: `${number.text} ${fraction.text}`,
    next: fraction.next,
  };
}

/** Where the fraction of a mixed number starts: after a space, or after a hyphen without spaces. */
function joinedFraction(tokens: readonly Token[], at: number): number | null {
  const [joint, numerator, slash, denominator] = tokens.slice(at, at + 4);
  if (joint?.kind === 'digits' && !joint.glued) {
    return isMark(numerator, '/') && slash?.kind === 'digits' ? at : null;
  }
  const hyphen = isMark(joint, '-') && joint?.glued && numerator?.glued;
  const follows = numerator?.kind === 'digits' && isMark(slash, '/');
  return hyphen && follows && denominator?.kind === 'digits' ? at + 1 : null;
}

function readFraction(
  tokens: readonly Token[],
  start: number,
): Omit<Amount, 'shape'> | AmountProblem {
  const above = tokens[start]?.text ?? '';
  const below = tokens[start + 2]?.text ?? '';
  if (!isWhole(above) || !isWhole(below)) return { problem: 'malformed' };
  if (above.length > mostDigits || below.length > mostDigits) return { problem: 'many-digits' };
  const text = `${Number(above)}/${Number(below)}`;
  if (Number(below) === 0) return { problem: 'nought-below', text };
  return { value: Number(above) / Number(below), text, next: start + 3 };
}

function readDigits(text: string): { value: number; text: string } | AmountProblem {
  const marks = text.replace(/[0-9]/g, '');
  if (text.length - marks.length === 0) return { problem: 'malformed' };
  if (text.length > mostDigits + 1) return { problem: 'many-digits' };
  if (marks.length > 1) return { problem: 'marks', text };
  if (/,[0-9]{3}$/.test(text)) return { problem: 'comma', text };
  const plain = text.replace(',', '.').replace(/^\./, '0.').replace(/\.$/, '');
  return { value: Number(plain), text: plain };
}

function isWhole(text: string): boolean {
  return /^[0-9]+$/.test(text);
}

function isMark(token: Token | undefined, text: string): boolean {
  return token?.kind === 'mark' && token.text === text;
}
