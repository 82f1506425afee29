import { fork } from 'node:child_process';
import { availableParallelism } from 'node:os';
import path from 'node:path';
import { root } from './machine/node.mjs';
import { complain, say } from './machine/say.mjs';
import { mutantsIn, sampled } from './mutate/mutants.mjs';

/**
 * How good are the tests of the kinematics library? A sample of its constants and operators is
 * changed, one at a time, and the tests of the changed folder are to notice.
 *
 * `HORNBEAM_MUTANTS` is how many (300), `HORNBEAM_MUTANTS_IN` a folder (all of lib/kinematics),
 * `HORNBEAM_MUTANTS_SEED` which ones (1). Fails when under 85 of a hundred are noticed.
 */
const wanted = 0.85;
const count = Number(process.env.HORNBEAM_MUTANTS ?? 300);
const folder = process.env.HORNBEAM_MUTANTS_IN ?? 'lib/kinematics';
const seed = Number(process.env.HORNBEAM_MUTANTS_SEED ?? 1);

function startJudge() {
  const child = fork(path.join(root, 'scripts/mutate/judge.mjs'), {
    cwd: root,
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
  const ready = new Promise((resolve, reject) => {
    child.once('message', resolve);
    child.once('exit', () => reject(new Error('The judge of mutants did not start.')));
  });
  return { child, ready };
}

/** What a judge says of a mutant; one that never ends, or takes the judge down, is noticed too. */
function ask({ child }, mutant, patience = 600_000) {
  return new Promise((resolve, reject) => {
    const done = (verdict) => {
      clearTimeout(timer);
      child.removeAllListeners('message');
      child.removeAllListeners('exit');
      resolve(verdict);
    };
    const timer = setTimeout(() => done({ killed: true, lost: true }), patience);
    child.once('message', ({ killed, error }) => {
      if (error) reject(new Error(error));
      done({ killed, lost: false });
    });
    child.once('exit', () => done({ killed: true, lost: true }));
    child.send(mutant);
  });
}

async function judgeAll(queue, verdicts, patience) {
  let judge = null;
  for (let mutant = queue.shift(); mutant; mutant = queue.shift()) {
    judge ??= startJudge();
    await judge.ready;
    const { killed, lost } = await ask(judge, mutant, patience);
    verdicts.push({ ...mutant, killed });
    if (lost) {
      judge.child.kill('SIGKILL');
      judge = null;
    }
  }
  judge?.child.kill('SIGKILL');
}

/**
 * Unchanged, every folder's tests must pass, or nothing is said by their failing. Gives the longest
 * that any took, milliseconds.
 */
async function requirePassing(mutants) {
  const judge = startJudge();
  await judge.ready;
  const firsts = new Map(mutants.map((mutant) => [path.dirname(mutant.file), mutant.file]));
  let longest = 0;
  for (const file of firsts.values()) {
    const begun = performance.now();
    const { killed } = await ask(judge, { file });
    if (killed) throw new Error(`The tests of ${path.dirname(file)} fail as they are.`);
    longest = Math.max(longest, performance.now() - begun);
  }
  judge.child.kill('SIGKILL');
  return longest;
}

function report(verdicts) {
  const folders = new Map();
  for (const { file, killed } of verdicts) {
    const name = file.split('/').slice(0, 3).join('/');
    const tally = folders.get(name) ?? { killed: 0, survived: 0 };
    tally[killed ? 'killed' : 'survived'] += 1;
    folders.set(name, tally);
  }
  const share = ({ killed, survived }) => `${((100 * killed) / (killed + survived)).toFixed(0)} %`;
  for (const [name, tally] of [...folders].sort()) {
    say(`${name.padEnd(32)} ${tally.killed} killed, ${tally.survived} survived: ${share(tally)}`);
  }
  const survivors = verdicts.filter(({ killed }) => !killed);
  for (const { file, line, from, to } of survivors)
    say(`survived  ${file}:${line}  ${from} → ${to}`);
  const killed = verdicts.length - survivors.length;
  say(`${killed} of ${verdicts.length} killed: ${share({ killed, survived: survivors.length })}`);
  return killed >= wanted * verdicts.length;
}

async function main() {
  const all = mutantsIn(root, folder);
  const queue = sampled(all, count, seed);
  say(`${queue.length} of ${all.length} mutants of ${folder}, seed ${seed}`);
  const patience = Math.max(20_000, 2 * (await requirePassing(queue)));
  const verdicts = [];
  const judges = Math.max(1, Math.floor(availableParallelism() / 2));
  await Promise.all(Array.from({ length: judges }, () => judgeAll(queue, verdicts, patience)));
  process.exit(report(verdicts) ? 0 : 1);
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
