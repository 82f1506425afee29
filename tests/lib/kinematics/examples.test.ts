import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

/**
 * Runs every `@example expression // → value` of the numeric, geometry and kinematics folders: the
 * expression sees all they export, the module's own names first; numbers must agree with every
 * printed digit, and a printed object may leave keys out.
 */
const modules = import.meta.glob<Record<string, unknown>>(
  ['/lib/numeric/**/*.ts', '/lib/geometry/**/*.ts', '/lib/kinematics/**/*.ts'],
  { eager: true },
);

class Printed {
  readonly value: number;
  readonly tolerance: number;

  constructor(text: string) {
    this.value = Number(text);
    const [mantissa = '', exponent = '0'] = text.toLowerCase().split('e');
    const decimals = mantissa.split('.')[1]?.length;
    this.tolerance =
      decimals === undefined
        ? 1e-9 * Math.max(1, Math.abs(this.value))
        : Math.max(1.01 * 10 ** (Number(exponent) - decimals), 1e-14 * Math.abs(this.value));
  }
}

function evaluate(text: string, scope: Record<string, unknown>): unknown {
  const names = Object.keys(scope);
  const run = new Function(...names, `"use strict"; return (${text});`);
  return run(...names.map((name) => scope[name]));
}

function expectedFrom(text: string): unknown {
  const marked = text.replace(/'[^']*'|(?<![\w.])-?\d+(?:\.\d+)?(?:e-?\d+)?n?/g, (found) =>
    found.startsWith("'") || found.endsWith('n') ? found : `new Printed('${found}')`,
  );
  return evaluate(marked, { Printed });
}

function agree(got: unknown, wanted: unknown, path: string): void {
  if (wanted instanceof Printed) {
    expect(typeof got, path).toBe('number');
    const off = Math.abs(Number(got) - wanted.value);
    expect(off, `${path} is ${got}, printed ${wanted.value}`).toBeLessThanOrEqual(wanted.tolerance);
  } else if (Array.isArray(wanted)) {
    expect(got, path).toHaveLength(wanted.length);
    wanted.forEach((item, k) => agree(Reflect.get(Object(got), k), item, `${path}[${k}]`));
  } else if (wanted !== null && typeof wanted === 'object') {
    for (const [key, item] of Object.entries(wanted)) {
      agree(Reflect.get(Object(got), key), item, `${path}.${key}`);
    }
  } else {
    expect(got, path).toBe(wanted);
  }
}

const everything = Object.assign({}, ...Object.values(modules));

const examples = Object.entries(modules).flatMap(([file, own]) =>
  [...readFileSync(`.${file}`, 'utf8').matchAll(/@example (.+?) \/\/ → (.+?)(?: \*\/)?$/gm)].map(
    ([, expression = '', value = '']) => ({ file, own, expression, value }),
  ),
);

describe('the examples in the doc comments', () => {
  it('are many', () => {
    expect(examples.length).toBeGreaterThan(50);
  });

  it('are all in the one form that this test can read', () => {
    for (const file of Object.keys(modules)) {
      const text = readFileSync(`.${file}`, 'utf8');
      const all = [...text.matchAll(/@example/g)].length;
      expect(all, file).toBe(examples.filter((example) => example.file === file).length);
    }
  });

  it.each(examples)('$file: $expression', ({ own, expression, value }) => {
    agree(evaluate(expression, { ...everything, ...own }), expectedFrom(value), expression);
  });
});
