import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { requireChromium } from './machine/chromium.mjs';
import { installPackages, requireFolder, requireNode, root } from './machine/node.mjs';
import { requireServer } from './machine/postgres.mjs';
import { complain, requireRoom, say } from './machine/say.mjs';

/**
 * Everything `npm test` needs, from nothing: the locked packages, Debian's PostgreSQL and Chromium;
 * then every suite on a cluster and a build of its own. With `--ci` the static checks run too.
 */
const ci = process.argv.includes('--ci');
const passed = process.argv.slice(2).filter((argument) => argument !== '--ci');

function step(name, args) {
  const done = spawnSync(process.execPath, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' },
  });
  if (done.status !== 0) say(`\n${name} did not pass.`);
  return done.status === 0;
}

function counts(report) {
  if (!existsSync(report)) return { passed: 0, failed: 1 };
  const { numPassedTests, numFailedTests, numFailedTestSuites } = JSON.parse(
    readFileSync(report, 'utf8'),
  );
  return { passed: numPassedTests, failed: Math.max(numFailedTests, numFailedTestSuites) };
}

function main() {
  requireNode();
  const own = path.join(root, '.hornbeam-test');
  requireFolder(own);
  requireRoom(own, 800);
  installPackages();
  requireServer();
  requireChromium();
  mkdirSync(own, { recursive: true });
  const report = path.join(own, 'report.json');
  rmSync(report, { force: true });

  const statics = ci
    ? [
        step('The types', ['node_modules/next/dist/bin/next', 'typegen']) &&
          step('The types', ['node_modules/typescript/bin/tsc', '--noEmit']),
        step('The lint', ['node_modules/eslint/bin/eslint.js', '.', '--max-warnings=0']),
        step('The formatting', [
          'node_modules/prettier/bin/prettier.cjs',
          '--check',
          '--log-level=warn',
          '.',
        ]),
      ]
    : [];
  const suites = step('The tests', [
    'node_modules/vitest/vitest.mjs',
    'run',
    ...(passed.length > 0
      ? passed
      : ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]),
  ]);
  const tests = counts(report);
  const failed =
    tests.failed + statics.filter((good) => !good).length + (suites || tests.failed > 0 ? 0 : 1);
  if (passed.length === 0)
    say(`\n${tests.passed + statics.filter(Boolean).length} passed, ${failed} failed`);
  process.exit(failed === 0 && suites ? 0 : 1);
}

try {
  main();
} catch (error) {
  complain(error);
  process.exit(1);
}
