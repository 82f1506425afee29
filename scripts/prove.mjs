import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { installPackages, requireNode, root } from './machine/node.mjs';
import { requireServer } from './machine/postgres.mjs';
import { complain, say } from './machine/say.mjs';

/**
 * The long checks: full counts of seeds and inputs, coverage, the whole tour in every width and theme,
 * rights without proxy.ts, power cuts, two instances, many learners, mutants of the kinematics library. `npm run prove -- seeds` runs one part.
 */
const vitest = ['node_modules/vitest/vitest.mjs', 'run'];
const entry = ['--conditions=react-server', '--import', 'tsx'];
const parts = {
  seeds: {
    what: 'Ten thousand seeds an exercise',
    args: [...vitest, '--project', 'unit', 'tests/content/exercises'],
    env: { HORNBEAM_SEEDS: '10000' },
  },
  inputs: {
    what: 'A hundred thousand random inputs a module of the kinematics library',
    args: [...vitest, '--project', 'unit', 'tests/lib/kinematics', 'tests/reference'],
    env: { HORNBEAM_INPUTS: '100000' },
  },
  coverage: {
    what: 'Coverage of the kinematics library',
    args: [
      ...vitest,
      '--project',
      'unit',
      '--coverage',
      '--coverage.include=lib/kinematics/**',
      '--coverage.exclude=tests/**',
      '--coverage.thresholds.lines=98',
      '--coverage.thresholds.branches=98',
      'tests/lib/kinematics',
      'tests/lib/geometry',
      'tests/lib/numeric',
      'tests/reference',
    ],
  },
  tour: {
    what: 'The tour of every screen at every width, light and dark',
    args: [...vitest, '--project', 'e2e', 'tests/e2e/tour.test.ts'],
    env: { HORNBEAM_TOUR: 'whole' },
  },
  worker: {
    what: 'The worker killed between sending and marking, eight times',
    args: [...vitest, '--project', 'data', 'tests/data/worker-killed.test.ts'],
    env: { HORNBEAM_KILLS: '8' },
  },
  'without-proxy': {
    what: 'The matrix of rights on a build without proxy.ts',
    args: [...vitest, '--project', 'e2e', 'tests/e2e/matrix.test.ts'],
    env: { HORNBEAM_WITHOUT_PROXY: '1' },
  },
  durability: {
    what: 'Power cuts under a stream of attempts, and a control that must lose some',
    args: [...entry, 'scripts/prove/durability.ts'],
  },
  instances: {
    what: 'Two instances behind nginx',
    args: [...entry, 'scripts/prove/instances.ts'],
  },
  scale: {
    what: 'Ten thousand learners and two hundred exercises',
    args: [...entry, 'scripts/prove/scale.ts'],
  },
  mutants: { what: 'Mutants of the kinematics library', args: ['scripts/mutate.mjs'] },
};

function main() {
  requireNode();
  installPackages();
  requireServer();
  const wanted = process.argv.slice(2);
  const names = wanted.length > 0 ? wanted : Object.keys(parts);
  const failed = [];
  for (const name of names) {
    const part = parts[name];
    if (!part)
      throw new Error(`There is no part ${name}; there are ${Object.keys(parts).join(', ')}.`);
    if (part.args[0].startsWith('scripts/') && !existsSync(path.join(root, part.args[0]))) continue;
    say(`\n== ${name}: ${part.what}`);
    const begun = Date.now();
    const done = spawnSync(process.execPath, part.args, {
      cwd: root,
      stdio: 'inherit',
      env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...part.env },
    });
    say(
      `   ${done.status === 0 ? 'proved' : 'NOT proved'} in ${((Date.now() - begun) / 1000).toFixed(0)} s`,
    );
    if (done.status !== 0) failed.push(name);
  }
  say(
    `\n${names.length - failed.length} proved, ${failed.length} not proved${failed.length > 0 ? `: ${failed.join(', ')}` : ''}`,
  );
  process.exit(failed.length === 0 ? 0 : 1);
}

try {
  main();
} catch (error) {
  complain(error);
  process.exit(1);
}
