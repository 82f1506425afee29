import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { root, run } from './node.mjs';
import { say } from './say.mjs';

const sources = [
  'app',
  'components',
  'content',
  'fonts',
  'lib',
  'models',
  'public',
  'mdx-components.tsx',
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
];

function* filesUnder(relative) {
  const absolute = path.join(root, relative);
  if (!existsSync(absolute)) return;
  let entries;
  try {
    entries = readdirSync(absolute, { withFileTypes: true });
  } catch {
    yield relative;
    return;
  }
  for (const entry of entries.sort((a, b) => (a.name < b.name ? -1 : 1))) {
    const next = path.join(relative, entry.name);
    if (entry.isDirectory()) yield* filesUnder(next);
    else yield next;
  }
}

/** A fingerprint of everything that goes into a build. */
export function sourcesFingerprint() {
  const hash = createHash('sha256').update(process.version);
  for (const source of sources) {
    for (const file of filesUnder(source)) {
      hash
        .update(file)
        .update('\0')
        .update(readFileSync(path.join(root, file)))
        .update('\0');
    }
  }
  return hash.digest('hex');
}

/** Builds for production into `distDir`, unless the last build there is of the same sources. */
export function buildIfChanged({ env = {}, distDir = '.next' } = {}) {
  const stamp = path.join(root, distDir, 'hornbeam-sources');
  const now = sourcesFingerprint();
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === now) return false;
  say('Building …');
  run(process.execPath, ['node_modules/next/dist/bin/next', 'build'], {
    env: { ...env, NODE_ENV: 'production', HORNBEAM_DIST_DIR: distDir },
    what: 'The build',
    quiet: true,
  });
  writeFileSync(stamp, now);
  return true;
}
