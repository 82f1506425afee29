import { installPackages, requireNode, run } from './machine/node.mjs';
import { sql } from './machine/postgres.mjs';
import { complain, say } from './machine/say.mjs';
import { makeTrial } from './machine/trial.mjs';

/**
 * `npm run bench [kinematics|http|page]`: speed, as ratios measured in one run; nothing here is a
 * test. Requests are compared with a bare route handler of the same build, the solver with an
 * independent one, script with the framework's own.
 */
async function kinematics() {
  say('\n== The kinematics library');
  run(process.execPath, ['--import', 'tsx', 'scripts/bench/kinematics.ts']);
}

async function onSite(measure) {
  const trial = await makeTrial('bench');
  try {
    await trial.startSite();
    await measure(trial);
  } finally {
    await trial.close();
  }
}

/** Sixteen learners of the demo's classes, and the class of its first instructor. */
function demoPeople(trial) {
  const ask = (text) => sql(trial.server(), text, { database: 'hornbeam' }).trim().split('\n');
  const learners = ask(
    `select distinct p.email from people p join memberships m on m.person_id = p.id
     where m.role = 'learner' and m.left_at is null and p.disabled_at is null
       and p.password_hash is not null order by 1 limit 16;`,
  );
  const [[instructor, classId]] = ask(
    `select p.email, m.class_id from memberships m join people p on p.id = m.person_id
     where m.role = 'instructor' and m.left_at is null order by m.joined_at, 1 limit 1;`,
  ).map((line) => line.split('|'));
  return { people: { learners, instructor }, classId };
}

async function http(trial) {
  const { benchHttp } = await import('./bench/http.mjs');
  const { rows, learners, rounds } = await benchHttp({
    address: trial.address,
    password: trial.password,
    ...demoPeople(trial),
  });
  say(
    `\n== Requests: 16 connections, ${learners} learners at ${rounds} rounds, the median of three`,
  );
  for (const { kind, rate, ratio, p99, statuses } of rows) {
    const counted = Object.entries(statuses).map(([status, count]) => `${count} × ${status}`);
    say(
      `${kind.padEnd(15)} ${rate.toFixed(0).padStart(6)}/s  ${ratio.toFixed(2)} of the floor  ` +
        `p99 ${p99.toFixed(1)} × the floor's  (${counted.join(', ')})`,
    );
  }
}

async function page(trial) {
  const { benchFrames, benchWeight } = await import('./bench/page.mjs');
  const lesson = '/lessons/drawing-and-copying/trammel-and-oval';
  const { base, rows } = await benchWeight({
    address: trial.address,
    distDir: trial.distDir,
    pages: { 'a page without a bench': '/for-instructors', 'a lesson with its bench': lesson },
  });
  say(`\n== Client script, gzipped; the framework's own is ${(base / 1000).toFixed(0)} kB`);
  for (const { name, total, ours } of rows) {
    say(
      `${name.padEnd(26)} ${(total / 1000).toFixed(0)} kB = base + ${(ours / 1000).toFixed(0)} kB`,
    );
  }
  say('\n== Work a frame, ms, 300 frames of a running bench');
  for (const path of [
    'toothed-wheels/train-of-toothed-wheels',
    'drawing-and-copying/trammel-and-oval',
    'drawing-and-copying/pantograph',
  ]) {
    for (const slow of [1, 4]) {
      const { p50, p95, most } = await benchFrames({
        address: trial.address,
        url: `/lessons/${path}`,
        slow,
        start: async (tab) => {
          await tab.getByRole('button', { name: 'Just show me' }).click();
          const own = tab.locator('#try');
          const begin = own.getByRole('button', { name: /^(Turn|Lead)$/ }).first();
          await begin.click();
        },
      });
      const at = slow === 1 ? '' : ` (processor slowed ${slow} ×)`;
      say(
        `${(path.split('/')[1] + at).padEnd(48)} p50 ${p50.toFixed(1)}  p95 ${p95.toFixed(1)}  most ${most.toFixed(1)}`,
      );
    }
  }
}

async function main() {
  requireNode();
  installPackages();
  const wanted = process.argv.slice(2);
  const takes = (name) => wanted.length === 0 || wanted.includes(name);
  if (takes('kinematics')) await kinematics();
  if (takes('http') || takes('page')) {
    await onSite(async (trial) => {
      if (takes('http')) await http(trial);
      if (takes('page')) await page(trial);
    });
  }
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
