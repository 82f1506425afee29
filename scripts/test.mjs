import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';

const root = path.resolve(import.meta.dirname, '..');
const run = (command, args) =>
  spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' },
  }).status ?? 1;

if (!existsSync(path.join(root, 'node_modules/vitest'))) {
  if (run('npm', ['ci', '--no-audit', '--no-fund']) !== 0) process.exit(1);
}
const status = run(process.execPath, [
  'node_modules/vitest/vitest.mjs',
  'run',
  '--project',
  'unit',
]);
console.log(status === 0 ? '1 passed, 0 failed' : '0 passed, 1 failed');
process.exit(status);
