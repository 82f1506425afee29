import pg from 'pg';
import { makeTrial, type Trial } from '../machine/trial.mjs';
import { say } from '../machine/say.mjs';
import { signInByForm } from '../machine/sign-in.mjs';
import type { RunningSite } from '../machine/site.mjs';
import { inspect, type Kept } from './kept';
import { write, type Acknowledged } from './writer';

/**
 * Power cuts under a stream of attempts: the web server and PostgreSQL are killed with SIGKILL at
 * random moments while eight learners answer. Whatever a learner was told is kept must be there, once,
 * with the progress that follows from it. The same with `synchronous_commit=off` must lose some:
 * otherwise this could not see a loss.
 */
const writers = 8;
const wholeRun = Number(process.env.HORNBEAM_ATTEMPTS ?? 20_000);

interface Run {
  readonly kept: Kept;
  readonly kills: { web: number; database: number };
  readonly sentAgain: number;
  readonly seconds: number;
}

async function run(settings: Record<string, string>, attempts: number): Promise<Run> {
  const trial = await makeTrial('durability', { settings });
  const pool = new pg.Pool({ connectionString: trial.database.superuser, max: writers });
  pool.on('error', () => undefined);
  try {
    const first = await trial.startSite();
    const cookies = await signLearnersIn(trial, pool);
    const begun = new Date();
    const acknowledged: Acknowledged[] = [];
    const enough = () => acknowledged.length >= attempts;
    const writing = cookies.map((cookie) =>
      write({
        address: trial.address,
        cookie,
        pool,
        until: enough,
        note: (one) => acknowledged.push(one),
      }),
    );
    const kills = await killAtRandom(trial, first, () => acknowledged.length, attempts);
    await Promise.all(writing);
    return {
      kept: await inspect(pool, acknowledged, begun),
      kills,
      sentAgain: acknowledged.filter(({ sent }) => sent > 1).length,
      seconds: (Date.now() - begun.getTime()) / 1000,
    };
  } finally {
    await pool.end();
    await trial.close();
  }
}

async function signLearnersIn(trial: Trial, pool: pg.Pool): Promise<string[]> {
  const { rows } = await pool.query<{ email: string }>(
    `select distinct p.email from people p join memberships m on m.person_id = p.id
     where m.role = 'learner' and m.left_at is null and p.password_hash is not null
     order by 1 limit $1`,
    [writers],
  );
  return Promise.all(rows.map(({ email }) => signInByForm(trial.address, email, trial.password)));
}

/**
 * Kills one or the other and starts it again at once, each time after a random number of
 * acknowledgements: as many on a slow machine as on a quick one.
 */
async function killAtRandom(
  trial: Trial,
  first: RunningSite,
  acknowledged: () => number,
  wanted: number,
) {
  const kills = { web: 0, database: 0 };
  let site = first;
  for (let next = pause(); next < wanted; next = acknowledged() + pause()) {
    while (acknowledged() < next) {
      await new Promise((resolve) => {
        setTimeout(resolve, 5);
      });
    }
    if (Math.random() < 0.5) {
      await site.kill();
      site = await trial.startSite();
      kills.web += 1;
    } else {
      await trial.killDatabase();
      await trial.startDatabase();
      kills.database += 1;
    }
  }
  return kills;
}

function pause(): number {
  return 50 + Math.floor(Math.random() * 500);
}

function tell(what: string, { kept, kills, sentAgain, seconds }: Run): void {
  say(
    `${what}: ${kept.acknowledged} acknowledged by ${writers} writers in ${seconds.toFixed(0)} s, ` +
      `${kills.web} kills of the web server, ${kills.database} of PostgreSQL, ` +
      `${sentAgain} sent again under the same key`,
  );
  say(
    `  lost ${kept.lost}, twice ${kept.doubled}, never acknowledged ${kept.unknown}, ` +
      `rounds whose progress differs ${kept.wrongProgress}, wrong counts ${kept.wrongCounts}`,
  );
}

const durable = await run({}, wholeRun);
tell('As it is set up', durable);
const control = await run(
  { synchronous_commit: 'off', wal_writer_delay: '10s', wal_writer_flush_after: '1GB' },
  Math.min(wholeRun, 4_000),
);
tell('With synchronous_commit=off', control);

const { lost, doubled, unknown, wrongProgress, wrongCounts } = durable.kept;
const sound = lost + doubled + unknown + wrongProgress + wrongCounts === 0;
const seen = control.kept.lost > 0;
if (!sound) say('Something acknowledged is not as it was acknowledged.');
if (!seen) say('The control run lost nothing: this check cannot see a loss.');
process.exitCode = sound && seen && durable.kept.acknowledged >= wholeRun ? 0 : 1;
