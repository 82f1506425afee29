/** What a case gives and expects: flat records of plain JSON. */
export type Inputs = Readonly<Record<string, unknown>>;
export type Answers = Record<string, unknown>;
/** One kind of case, answered by the library. */
export type Answer = (inputs: Inputs) => Answers;
/** The kinds that one family of the library answers. */
export type Family = Readonly<Record<string, Answer>>;

export const degree = Math.PI / 180;
export const inch = 25.4;
/** Radians a second for one turn a minute. */
export const rpm = Math.PI / 30;

/** The number under `key`. */
export function number(inputs: Inputs, key: string): number {
  const value = inputs[key];
  if (typeof value !== 'number') throw new TypeError(`the case gives no number for ${key}`);
  return value;
}

/** The number under `key`, or `otherwise` if the case leaves it out. */
export function numberOr(inputs: Inputs, key: string, otherwise: number): number {
  return inputs[key] === undefined ? otherwise : number(inputs, key);
}

/** The words under `key`. */
export function text(inputs: Inputs, key: string): string {
  const value = inputs[key];
  if (typeof value !== 'string') throw new TypeError(`the case gives no text for ${key}`);
  return value;
}

/** The list of numbers under `key`. */
export function numbers(inputs: Inputs, key: string): readonly number[] {
  return list(inputs, key).map((value) => {
    if (typeof value !== 'number') throw new TypeError(`${key} holds something besides numbers`);
    return value;
  });
}

/** The list of lists of numbers under `key`. */
export function rows(inputs: Inputs, key: string): readonly (readonly number[])[] {
  return list(inputs, key).map((value, index) => numbers({ [index]: value }, String(index)));
}

/** The list of pairs of numbers under `key`. */
export function pairs(inputs: Inputs, key: string): readonly (readonly [number, number])[] {
  return rows(inputs, key).map(([first, second]) => {
    if (first === undefined || second === undefined) throw new TypeError(`${key} wants pairs`);
    return [first, second];
  });
}

function list(inputs: Inputs, key: string): readonly unknown[] {
  const value = inputs[key];
  if (!Array.isArray(value)) throw new TypeError(`the case gives no list for ${key}`);
  return value;
}

/** The member of a union of outcomes that the case asks for; any other is an error with its facts. */
export function expectOutcome<
  Outcome extends { readonly outcome: string },
  Kind extends Outcome['outcome'],
>(outcome: Outcome, kind: Kind): Extract<Outcome, { outcome: Kind }> {
  if (outcome.outcome !== kind) {
    throw new Error(`expected ${kind}, but the library says ${JSON.stringify(outcome)}`);
  }
  return outcome as Extract<Outcome, { outcome: Kind }>;
}
