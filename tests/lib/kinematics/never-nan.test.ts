import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moreCalls } from './sample-calls';
import { growing, unguarded } from './unguarded';

/**
 * NaN and Infinity never leave the library. Every exported function of lib/kinematics has a sound
 * call, from its own `@example` or from the list beside this test; the call's numbers are then
 * replaced at random, by nonsense too. The function may refuse with a RangeError, or answer with
 * finite numbers throughout.
 */
const helpers = import.meta.glob<Record<string, unknown>>(
  ['/lib/numeric/**/*.ts', '/lib/geometry/**/*.ts'],
  { eager: true },
);
const modules = import.meta.glob<Record<string, unknown>>('/lib/kinematics/**/*.ts', {
  eager: true,
});

type Call = readonly unknown[];
const calls = new Map<string, Call[]>();

/** Lets a function record what it is called with. */
function recording(key: string, run: (...given: Call) => unknown) {
  return (...given: Call): unknown => {
    calls.set(key, [...(calls.get(key) ?? []), structuredCloneIfPlain(given)]);
    return run(...given);
  };
}

function structuredCloneIfPlain(given: Call): Call {
  try {
    return structuredClone(given);
  } catch {
    return given;
  }
}

function isFunction(value: unknown): value is (...given: Call) => unknown {
  return typeof value === 'function';
}

const exported = Object.entries(modules).flatMap(([file, own]) =>
  Object.entries(own)
    .filter((entry): entry is [string, (...given: Call) => unknown] => isFunction(entry[1]))
    .map(([name, run]) => ({ key: `${file} ${name}`, file, name, run })),
);

function namesOf(file: string): Record<string, unknown> {
  return Object.fromEntries(
    exported
      .filter((one) => one.file === file)
      .map(({ key, name, run }) => [name, recording(key, run)]),
  );
}

const scope: Record<string, unknown> = Object.assign(
  {},
  ...Object.values(helpers),
  ...Object.values(modules),
  ...Object.keys(modules).map(namesOf),
);

function evaluate(text: string, own: Record<string, unknown>): void {
  const names = { ...scope, ...own };
  new Function(...Object.keys(names), `"use strict"; return (${text});`)(...Object.values(names));
}

for (const file of Object.keys(modules)) {
  const text = readFileSync(`.${file}`, 'utf8');
  for (const [, expression = ''] of text.matchAll(/@example (.+?) \/\/ → /g)) {
    evaluate(expression, namesOf(file));
  }
}
for (const expression of moreCalls) evaluate(expression, {});

/** Guards hand on or throw what they were given; there is nothing in them to go wrong. */
const tested = exported.filter(
  ({ key, name }) =>
    !name.startsWith('require') &&
    !unguarded.has(key) &&
    (calls.has(key) || !growing.some((folder) => key.startsWith(folder))),
);

const nonsense = [Number.NaN, Infinity, -Infinity, 0, -0, -1, 2.5, 1e300, -1e300, 1e-300, 5e-324];
const instead = (value: number) =>
  fc.oneof(
    { weight: 4, arbitrary: fc.constant(value) },
    {
      weight: 2,
      arbitrary: fc.double({ min: -3, max: 3, noNaN: true }).map((x) => value * 10 ** x),
    },
    { weight: 1, arbitrary: fc.constantFrom(...nonsense) },
    { weight: 1, arbitrary: fc.integer({ min: -2, max: 60 }) },
    { weight: 1, arbitrary: fc.constant(-value) },
  );

/** The same call with other numbers in the same places. */
function altered(value: unknown): fc.Arbitrary<unknown> {
  if (typeof value === 'number') return instead(value);
  if (Array.isArray(value)) return fc.tuple(...value.map(altered));
  if (value === null || typeof value !== 'object') return fc.constant(value);
  if (Object.getPrototypeOf(value) !== Object.prototype) return fc.constant(value);
  return fc.record(Object.fromEntries(Object.entries(value).map(([k, v]) => [k, altered(v)])));
}

function isFiniteThroughout(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (value instanceof Map || value instanceof Set) return isFiniteThroughout([...value]);
  if (value === null || typeof value !== 'object') return true;
  return Object.values(value).every(isFiniteThroughout);
}

const numRuns = Number(process.env.NAN_RUNS ?? 300);

describe('every exported function of lib/kinematics', () => {
  it('is tested, but for those of a list that names only what there is', () => {
    const names = new Set(exported.map(({ key }) => key));
    expect([...unguarded].filter((key) => !names.has(key))).toEqual([]);
  });

  it('has a sound call to start from', () => {
    const without = tested.filter(({ key }) => !calls.has(key)).map(({ key }) => key);
    expect(without).toEqual([]);
  });

  it.each(tested)(
    '$key refuses with a RangeError or answers with finite numbers',
    ({ key, run }) => {
      const samples = calls.get(key) ?? [];
      fc.assert(
        fc.property(fc.oneof(...samples.map((sample) => altered([...sample]))), (given) => {
          let answer: unknown;
          try {
            answer = run(...(Array.isArray(given) ? given : []));
          } catch (error) {
            expect(error).toBeInstanceOf(RangeError);
            return;
          }
          expect(isFiniteThroughout(answer)).toBe(true);
        }),
        { seed: 20_260, numRuns },
      );
    },
  );
});
