import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from '../../scripts/machine/node.mjs';
import { methodsOf } from './built';
import { nameOf } from './endpoint';
import { endpoints } from './endpoints';

/**
 * The table against the tree: quick, and told before anything is built. The build's own manifests are
 * held against it in tests/e2e/matrix.test.ts.
 */
const files = readdirSync(path.join(root, 'app'), { recursive: true, encoding: 'utf8' });

function routeOf(file: string): string {
  const folder = path.dirname(file);
  return folder === '.' ? '/' : `/${folder}`;
}

function actionsOf(file: string): string[] {
  const source = readFileSync(path.join(root, 'app', file), 'utf8');
  if (!source.startsWith("'use server'")) return [];
  const named = source.matchAll(/^export async function (\w+)/gm);
  return [...named].map(([, name = '']) => `action app/${file} ${name}`);
}

const listed = new Set(endpoints.map(nameOf));

describe('the table of endpoints', () => {
  it('names every page, route handler and server action, and nothing else', () => {
    const found = [
      ...files.filter((file) => file.endsWith('page.tsx')).map((file) => `page ${routeOf(file)}`),
      ...files
        .filter((file) => path.basename(file) === 'route.ts')
        .flatMap((file) => methodsOf(routeOf(file)).map((method) => `${method} ${routeOf(file)}`)),
      ...files.filter((file) => file.endsWith('.ts')).flatMap(actionsOf),
    ];
    expect([...listed].sort()).toEqual([...new Set(found)].sort());
  });
});
