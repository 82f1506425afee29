import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { root } from '../../scripts/machine/node.mjs';

/**
 * Versions below which a published fault concerns us. The registry's own audit cannot be asked where
 * this is built, so the table is kept by hand, from the projects' advisories.
 */
const floors = {
  next: '16.3.3',
  react: '19.2.6',
  'react-dom': '19.2.6',
  'next-auth': '4.24.15',
  nodemailer: '9.0.1',
  sequelize: '6.37.8',
  sharp: '0.35.4',
} as const;

interface Lock {
  readonly packages: Readonly<Record<string, { readonly version?: string }>>;
}

const lock = JSON.parse(readFileSync(path.join(root, 'package-lock.json'), 'utf8')) as Lock;

/** Every version of a package that is locked, wherever in the tree. */
function lockedVersions(name: string): string[] {
  return Object.entries(lock.packages)
    .filter(
      ([place]) => place === `node_modules/${name}` || place.endsWith(`/node_modules/${name}`),
    )
    .flatMap(([, { version }]) => version ?? []);
}

function isAtLeast(version: string, floor: string): boolean {
  const parts = (text: string) => text.split('-')[0]?.split('.').map(Number) ?? [];
  const [have, need] = [parts(version), parts(floor)];
  for (const [place, least] of need.entries()) {
    const own = have[place] ?? 0;
    if (own !== least) return own > least;
  }
  return !version.includes('-');
}

describe('the locked packages', () => {
  it.each(Object.entries(floors))('hold no %s below %s', (name, floor) => {
    const versions = lockedVersions(name);
    if (name !== 'sharp') expect(versions).not.toEqual([]);
    expect(versions.filter((version) => !isAtLeast(version, floor))).toEqual([]);
  });

  it('are all exact, and name no registry', () => {
    const { dependencies, devDependencies } = JSON.parse(
      readFileSync(path.join(root, 'package.json'), 'utf8'),
    ) as Record<'dependencies' | 'devDependencies', Record<string, string>>;
    const wanted = Object.entries({ ...dependencies, ...devDependencies });
    expect(wanted.filter(([, version]) => !/^\d+\.\d+\.\d+$/.test(version))).toEqual([]);
    expect(JSON.stringify(lock)).not.toContain('"resolved"');
  });

  it('are compared by number, and a version before its release is below it', () => {
    expect(isAtLeast('16.10.0', '16.3.3')).toBe(true);
    expect(isAtLeast('16.3.3', '16.3.3')).toBe(true);
    expect(isAtLeast('16.3.2', '16.3.3')).toBe(false);
    expect(isAtLeast('9.9.9', '16.3.3')).toBe(false);
    expect(isAtLeast('16.3.3-canary.1', '16.3.3')).toBe(false);
  });
});
