import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const readme = readFileSync('lib/kinematics/README.md', 'utf8');
const named = new Set([...readme.matchAll(/`(\w+)`/g)].map(([, name]) => name));
const modules = import.meta.glob<Record<string, unknown>>('/lib/kinematics/**/*.ts', {
  eager: true,
});

describe('the README of the kinematics library', () => {
  it('answers a question by every function, but for the workings and the guards', () => {
    const left = Object.entries(modules)
      .filter(([file]) => !file.includes('/solver/'))
      .flatMap(([file, own]) =>
        Object.entries(own)
          .filter(([name, value]) => typeof value === 'function' && !name.startsWith('require'))
          .filter(([name]) => !named.has(name))
          .map(([name]) => `${file.replace('/lib/kinematics/', '')} ${name}`),
      );
    expect(left).toEqual([]);
  });
});
