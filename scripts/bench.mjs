import { installPackages, requireNode, run } from './machine/node.mjs';
import { sql } from './machine/postgres.mjs';
import { complain, say } from './machine/say.mjs';

/**
 * `npm run bench [kinematics|http|page]`: speed, as ratios measured in one run; nothing here is a
 * test. Requests are compared with a bare route handler of the same build, the solver with an
 * independent one, script with the framework's own.
 */
const learners = { learner: 'agnes@harbour.example', instructor: 'marit@harbour.example' };

async function kinematics() {
  say('\n== The kinematics library');
  run(process.execPath, ['--import', 'tsx', 'scripts/bench/kinematics.ts']);
}

async function onSite(measure) {
  const { startBenchSite } = await import('./bench/site.mjs');
  const site = await startBenchSite();
  try {
    await measure(site);
  } finally {
    await site.stop();
  }
}

async function http(site) {
  const { benchHttp } = await import('./bench/http.mjs');
  const password = /password "([^"]+)"/.exec(site.told)?.[1];
  const classId = sql(
    site.server,
    `select m.class_id from memberships m join people p on p.id = m.person_id
     where p.email = :'email' and m.role = 'instructor' order by m.joined_at limit 1;`,
    { database: 'hornbeam', variables: { email: learners.instructor } },
  );
  const rows = await benchHttp({
    address: site.address,
    demo: { ...learners, password, classId, exercise: 'lantern-wheel' },
  });
  say('\n== Requests: 16 connections, three interleaved rounds, the median');
  for (const { kind, rate, ratio, p99, statuses } of rows) {
    const counted = Object.entries(statuses).map(([status, count]) => `${count} × ${status}`);
    say(
      `${kind.padEnd(10)} ${rate.toFixed(0).padStart(6)}/s  ${ratio.toFixed(2)} of the floor  ` +
        `p99 ${p99.toFixed(1)} × the floor's  (${counted.join(', ')})`,
    );
  }
}

async function page(site) {
  const { benchFrames, benchWeight } = await import('./bench/page.mjs');
  const lesson = '/lessons/drawing-and-copying/trammel-and-oval';
  const { base, rows } = await benchWeight({
    address: site.address,
    distDir: '.next-test',
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
        address: site.address,
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
    await onSite(async (site) => {
      if (takes('http')) await http(site);
      if (takes('page')) await page(site);
    });
  }
}

main().catch((error) => {
  complain(error);
  process.exit(1);
});
