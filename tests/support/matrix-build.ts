import { cpSync, rmSync } from 'node:fs';
import path from 'node:path';
import { root, run } from '../../scripts/machine/node.mjs';

/** A build that the matrix is tried on. */
export interface MatrixBuild {
  /** The folder of its sources, from which it is served. */
  readonly folder: string;
  readonly distDir: string;
  /** Its output, from the root of the checkout. */
  readonly output: string;
  readonly make: () => void;
}

/** The tests' own build, or one of the same sources without proxy.ts. */
export function matrixBuild(): MatrixBuild {
  return process.env.HORNBEAM_WITHOUT_PROXY === '1'
    ? withoutProxy
    : { folder: root, distDir: '.next-test', output: '.next-test', make: () => undefined };
}

const copied = [
  'app',
  'components',
  'content',
  'fonts',
  'instrumentation.ts',
  'lib',
  'mdx-components.tsx',
  'migrations',
  'models',
  'next.config.mjs',
  'package.json',
  'postcss.config.mjs',
  'public',
  'tailwind.config.ts',
  'tsconfig.json',
];

/** Below the checkout, so that its packages are found where they are. */
const folder = path.join(root, '.hornbeam-test/without-proxy');

const withoutProxy: MatrixBuild = {
  folder,
  distDir: '.next',
  output: '.hornbeam-test/without-proxy/.next',
  make: () => {
    rmSync(folder, { recursive: true, force: true });
    for (const name of copied) {
      cpSync(path.join(root, name), path.join(folder, name), { recursive: true });
    }
    run(process.execPath, [path.join(root, 'node_modules/next/dist/bin/next'), 'build', folder], {
      env: { NODE_ENV: 'production', HORNBEAM_DIST_DIR: '.next' },
      what: 'The build without proxy.ts',
      quiet: true,
    });
  },
};
