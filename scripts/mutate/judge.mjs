import { readFileSync } from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { createVitest } from 'vitest/node';
import { filesIn, mutated } from './mutants.mjs';

/**
 * Judges one mutant after another, as the parent process sends them: the changed text is put in the
 * module's place as it is loaded, so the tree stays as it is. Answers whether some test fails.
 */
const root = path.resolve(import.meta.dirname, '../..');
let changed = null;

const vitest = await createVitest(
  'test',
  {
    config: false,
    root,
    watch: false,
    include: ['tests/{lib,reference}/**/*.test.ts'],
    setupFiles: [path.join(root, 'tests/support/strict-console.ts')],
    pool: 'threads',
    maxWorkers: 1,
    bail: 1,
    testTimeout: 60_000,
    reporters: [{}],
  },
  {
    configFile: false,
    resolve: {
      alias: { '@': root, 'server-only': path.join(root, 'tests/support/server-only.ts') },
    },
    plugins: [
      {
        name: 'mutant',
        enforce: 'pre',
        load: (id) => (changed && id.split('?')[0] === changed.path ? changed.text : null),
      },
    ],
  },
);

/** The tests that may tell: of the same folder, those that name the module first; then the rest. */
function roundsFor({ file }) {
  const folder = path.dirname(file).replace('/solver', '');
  const name = file.replace(/\.ts$/, "'");
  const own = filesIn(root, `tests/${folder}`, '.test.ts');
  const naming = own.filter((test) => readFileSync(path.join(root, test), 'utf8').includes(name));
  const rest = own.filter((test) => !naming.includes(test));
  const whole = ['tests/lib/kinematics/examples.test.ts', 'tests/reference/cases.test.ts'];
  return [naming, rest, whole].filter((round) => round.length > 0);
}

async function fails(tests) {
  const specifications = await vitest.globTestSpecifications(tests);
  const { testModules, unhandledErrors } = await vitest.runTestSpecifications(specifications);
  // The result also holds what earlier runs of other files came to.
  const own = testModules.filter(({ relativeModuleId }) => tests.includes(relativeModuleId));
  if (unhandledErrors.length > 0 || !own.every((module) => module.ok())) return true;
  if (own.length < tests.length) throw new Error(`Only ${own.length} of ${tests.join(', ')} ran.`);
  return false;
}

async function judge(mutant) {
  const file = path.join(root, mutant.file);
  if (mutant.to !== undefined)
    changed = { path: file, text: mutated(readFileSync(file, 'utf8'), mutant) };
  vitest.invalidateFile(file);
  let killed = false;
  for (const tests of roundsFor(mutant)) killed = killed || (await fails(tests));
  changed = null;
  vitest.invalidateFile(file);
  return killed;
}

process.on('message', async (mutant) => {
  try {
    process.send?.({ killed: await judge(mutant) });
  } catch (error) {
    process.send?.({ error: error instanceof Error ? error.message : String(error) });
  }
});
process.send?.({ ready: true });
