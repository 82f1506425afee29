import { describe, expect, it } from 'vitest';
import { answer, isBuilt } from './answer';
import cases from './cases.json';
import { differences } from './compare';

const kinds = [...new Set(cases.map(({ kind }) => kind))];
const notBuilt = kinds.filter((kind) => !isBuilt(kind));

describe('the reference cases', () => {
  it('are all here, and each has a name of its own', () => {
    expect(cases).toHaveLength(290);
    expect(kinds).toHaveLength(134);
    expect(new Set(cases.map(({ id }) => id)).size).toBe(cases.length);
  });

  it.each(
    cases.filter(({ kind }) => isBuilt(kind)).map((one) => [one.id, one.title, one] as const),
  )('%s: %s', (_id, _title, { kind, inputs, expected, tolerance }) => {
    expect(differences({ ...expected }, answer(kind, { ...inputs }), tolerance)).toEqual([]);
  });

  it(`of kinds not built yet are refused by name (${notBuilt.join(', ') || 'none is left'})`, () => {
    for (const kind of notBuilt) expect(() => answer(kind, {})).toThrow(kind);
  });

  it('of an unknown kind are refused by name', () => {
    expect(() => answer('perpetual_motion', {})).toThrow('perpetual_motion is not built');
  });

  it('tell a typical wrong answer from the right one', () => {
    for (const { expected, common_errors: errors, id, tolerance } of cases) {
      for (const { key, wrong_value: wrong } of errors ?? []) {
        if (!(key in expected)) continue;
        const right: Readonly<Record<string, unknown>> = { ...expected };
        expect(differences({ [key]: right[key] }, { [key]: wrong }, tolerance), id).toHaveLength(1);
      }
    }
  });
});
