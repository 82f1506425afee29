import path from 'node:path';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const root = import.meta.dirname;
const alias = {
  '@': root,
  'server-only': path.join(root, 'tests/support/server-only.ts'),
};
const setupFiles = [path.join(root, 'tests/support/strict-console.ts')];

/** The suites, quickest first: pure code, components in a document, the database, the browser. */
export default defineConfig({
  plugins: [react()],
  resolve: { alias },
  test: {
    coverage: {
      provider: 'v8',
      include: ['lib/**/*.ts', 'content/exercises/**/*.ts', 'components/**/*.tsx'],
      reporter: ['text-summary', 'json-summary'],
    },
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          environment: 'node',
          include: ['tests/{lib,content,reference,scripts}/**/*.test.ts'],
          setupFiles,
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'components',
          environment: 'jsdom',
          include: ['tests/{components,app}/**/*.test.tsx'],
          setupFiles: [...setupFiles, path.join(root, 'tests/support/document.ts')],
        },
      },
      {
        extends: true,
        test: {
          name: 'data',
          environment: 'node',
          include: ['tests/{data,security}/**/*.test.ts'],
          globalSetup: [path.join(root, 'tests/support/database-setup.ts')],
          setupFiles,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          environment: 'node',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: [
            path.join(root, 'tests/support/database-setup.ts'),
            path.join(root, 'tests/support/site-setup.ts'),
          ],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 300_000,
        },
      },
    ],
  },
});
