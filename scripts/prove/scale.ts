import pg from 'pg';
import { database, closeDatabase } from '@/lib/db/connection';
import { rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { runEntry } from '../machine/node.mjs';
import { say } from '../machine/say.mjs';
import { siteEnvironment } from '../machine/site.mjs';
import { makeTrialDatabase } from '../machine/trial.mjs';
import {
  bigClass,
  exerciseCount,
  learnerCount,
  makeManyLearners,
  smallClass,
} from './many-learners';

/**
 * A class's page among ten thousand learners and two hundred exercises: as many queries for five
 * hundred learners as for twenty-five, at most 50 ms in them, and none that reads a record through
 * from end to end.
 */
const most = 50;
const turns = 20;
// Nothing of it is kept: it may be made without waiting for the disk.
const trial = await makeTrialDatabase('scale', {
  shared_buffers: '1GB',
  max_wal_size: '8GB',
  fsync: 'off',
  autovacuum: 'off',
});
const failures: string[] = [];

function check(what: string, holds: boolean): void {
  say(`  ${holds ? 'holds' : 'DOES NOT HOLD'}: ${what}`);
  if (!holds) failures.push(what);
}

/** A query as it was sent, and how long the answer took. */
interface Sent {
  readonly sql: string;
  readonly values: unknown[];
  readonly ms: number;
}

/** Notes every query that the work sends. */
function listen(): () => Sent[] {
  let sent: Sent[] = [];
  const begun = new WeakMap<object, number>();
  database().addHook('beforeQuery', (_options, query) => {
    begun.set(query, performance.now());
  });
  database().addHook('afterQuery', (options, query) => {
    const { sql } = query as unknown as { sql: string };
    const values = Array.isArray(options.bind) ? options.bind : [];
    sent.push({ sql, values, ms: performance.now() - (begun.get(query) ?? NaN) });
  });
  return () => {
    const taken = sent;
    sent = [];
    return taken;
  };
}

const median = (figures: readonly number[]) =>
  [...figures].sort((one, other) => one - other)[Math.floor(figures.length / 2)] ?? NaN;

/** The records that are read from end to end by a query. */
async function readThrough({ sql, values }: Sent): Promise<string[]> {
  const plan = await rows<Record<string, unknown>>(`explain (format json) ${sql}`, values);
  const records = /"Node Type":"Seq Scan"[^{}]*?"Relation Name":"(\w+)"/g;
  return [...JSON.stringify(plan).matchAll(records)].map(([, name = '']) => name);
}

async function measure(): Promise<void> {
  const { findClass } = await import('@/lib/data/classes');
  const { findClassProgress } = await import('@/lib/data/class-progress');
  const { findClassVersion } = await import('@/lib/data/class-version');
  const [ids] = await rows<{ person: string; learner: string; small: string; big: string }>(
    `select md5('person0')::uuid as person, md5('learner0')::uuid as learner,
       md5('class7')::uuid as small, md5('class0')::uuid as big`,
  );
  if (ids === undefined) throw new Error('scale: the database does not answer');
  const viewer: Viewer = {
    personId: ids.person,
    learnerId: ids.learner,
    name: 'Learner 0',
    isAdministrator: false,
    units: 'metric',
    timeZone: 'Europe/London',
    reducedMotion: false,
    sessionId: ids.person,
    memberships: [],
  };
  const taken = listen();
  const works = {
    'the page': async (classId: string) => {
      await findClass(viewer, classId);
      return (await findClassProgress(viewer, classId))?.learners.length;
    },
    'the endpoint, something new': async (classId: string) => {
      await findClassVersion(viewer, classId);
      return (await findClassProgress(viewer, classId))?.learners.length;
    },
    'the endpoint, nothing new': (classId: string) => findClassVersion(viewer, classId),
  };
  for (const [name, work] of Object.entries(works)) {
    const queries: number[] = [];
    for (const [size, classId] of [
      [smallClass, ids.small],
      [bigClass, ids.big],
    ] as const) {
      const found = await work(classId);
      if (typeof found === 'number') check(`${size} learners are found`, found === size);
      taken();
      const times: number[] = [];
      let last: Sent[] = [];
      for (let turn = 0; turn < turns; turn += 1) {
        await work(classId);
        last = taken();
        times.push(last.reduce((sum, { ms }) => sum + ms, 0));
      }
      queries.push(last.length);
      const each = last.map(({ ms }) => ms.toFixed(1)).join(' + ');
      check(
        `${name}, ${size} learners: ${last.length} queries, median ${median(times).toFixed(1)} ms in them (the last turn ${each}), at most ${most}`,
        median(times) <= most,
      );
      const through = (await Promise.all(last.map(readThrough))).flat();
      taken();
      const records = ['attempts', 'counted_attempts', 'skill_facts', 'rounds'];
      check(
        `no record is read through${through.length > 0 ? ` (small tables: ${[...new Set(through)].join(', ')})` : ''}`,
        !through.some((table) => records.includes(table)),
      );
    }
    check(`${name}: as many queries for each class`, new Set(queries).size === 1);
  }
}

try {
  const { database: urls } = trial;
  const env = siteEnvironment({ database: urls, address: 'http://127.0.0.1:1', distDir: '.next' });
  runEntry('scripts/migrate.ts', { env, quiet: true });
  Object.assign(process.env, env);
  const begun = Date.now();
  const client = new pg.Client(urls.superuser);
  await client.connect();
  await makeManyLearners(client);
  await client.end();
  say(
    `  ${learnerCount} learners × ${exerciseCount} exercises made in ${Math.round((Date.now() - begun) / 1000)} s`,
  );
  await measure();
} finally {
  await closeDatabase();
  await trial.close();
}
if (failures.length > 0) throw new Error(`Not proved: ${failures.join('; ')}`);
