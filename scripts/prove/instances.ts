import { randomUUID } from 'node:crypto';
import { readdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { isDeepStrictEqual } from 'node:util';
import pg from 'pg';
import { startMailCatcher } from '../fakes/mail.mjs';
import { requireNginx, startProxy } from '../machine/nginx.mjs';
import { freePort, root, startChild, stopChild } from '../machine/node.mjs';
import { say } from '../machine/say.mjs';
import { signInByForm, signOutByForm } from '../machine/sign-in.mjs';
import { freeAddress, type RunningSite } from '../machine/site.mjs';
import { makeTrial, type Trial } from '../machine/trial.mjs';
import { queueLettersTo } from './letters';
import { write, type Acknowledged } from './writer';

/**
 * Two instances of the same build behind nginx, on one database: sessions, throttling, request keys
 * and jobs are shared, and each can be restarted under load without a request that fails.
 */
requireNginx();
const port = await freePort();
const address = `http://127.0.0.1:${port}`;
const mailFolder = path.join(root, '.hornbeam-test', `instances-mail-${process.pid}`);
const mail = await startMailCatcher(mailFolder, { smtpPort: 0, pagePort: 0 });
const trial = await makeTrial('instances', { address, mailUrl: mail.url });
const pool = new pg.Pool({ connectionString: trial.database.superuser, max: 10 });
const [here, there] = [trial.ownAddress, await freeAddress()] as const;
const failures: string[] = [];

function check(what: string, holds: boolean): void {
  say(`  ${holds ? 'holds' : 'DOES NOT HOLD'}: ${what}`);
  if (!holds) failures.push(what);
}

async function status(at: string, cookie: string): Promise<number> {
  const response = await fetch(`${at}/api/progress`, { headers: { cookie } });
  await response.arrayBuffer();
  return response.status;
}

async function learners(): Promise<string[]> {
  const { rows } = await pool.query<{ email: string }>(
    `select distinct p.email from people p join memberships m on m.person_id = p.id
     where m.role = 'learner' and m.left_at is null and p.password_hash is not null order by 1`,
  );
  return rows.map(({ email }) => email);
}

async function sessions([email = '']: readonly string[]): Promise<void> {
  const cookie = await signInByForm(address, email, trial.password);
  const before = [await status(here, cookie), await status(there, cookie)];
  await signOutByForm(here, cookie, address);
  const after = [await status(there, cookie), await status(here, cookie)];
  check(
    'a session is good at both, and ended at one is ended at both',
    `${before} ${after}` === '200,200 401,401',
  );
}

async function throttling([, email = '']: readonly string[]): Promise<void> {
  let refused = 0;
  for (let turn = 0; turn < 10; turn += 1) {
    await signInByForm(address, email, `wrong ${turn}`).catch(() => (refused += 1));
  }
  const right = await signInByForm(address, email, trial.password).catch(() => null);
  check(
    'ten wrong passwords spread over both put off the eleventh, right one',
    refused === 10 && right === null,
  );
}

/** The same answer sent to both at once: one attempt, and the same reply. */
async function requestKeys([, , email = '']: readonly string[]): Promise<void> {
  const cookie = await signInByForm(address, email, trial.password);
  const post = (at: string, to: string, body: unknown, key: string) =>
    fetch(`${at}${to}`, {
      method: 'POST',
      headers: {
        'content-type': 'application/json',
        origin: address,
        cookie,
        'idempotency-key': key,
      },
      body: JSON.stringify(body),
    });
  const opened = await post(address, '/api/exercises/oval-from-pins/round', {}, randomUUID());
  const { roundId } = (await opened.json()) as { roundId: string };
  const response = { answers: { eastWest: '9876 mm', northSouth: '9876 mm' } };
  let same = 0;
  for (let turn = 0; turn < 50; turn += 1) {
    const key = randomUUID();
    const replies = await Promise.all(
      [here, there, here, there].map(async (at) => {
        const reply = await post(at, '/api/attempts', { roundId, response }, key);
        return { status: reply.status, body: (await reply.json()) as unknown };
      }),
    );
    const [first, ...others] = replies;
    if (first?.status === 201 && others.every((one) => isDeepStrictEqual(one, first))) same += 1;
  }
  const { rows } = await pool.query<{ n: number }>(
    'select count(*)::int as n from attempts where round_id = $1',
    [roundId],
  );
  check(
    `50 answers, each sent to both twice at once, are ${rows[0]?.n} attempts, ${same} with one reply`,
    same === 50 && rows[0]?.n === 50,
  );
}

/** Each job is done by one of two workers, once. */
async function jobs(): Promise<void> {
  const work = () =>
    startChild(
      process.execPath,
      ['--conditions=react-server', '--import', 'tsx', 'scripts/work.ts'],
      { env: trial.env },
    );
  const ids = await queueLettersTo(trial.env, 100);
  const workers = [work(), work()];
  const sent = async () =>
    (await pool.query("select 1 from letters where state = 'sent' and id = any($1)", [ids]))
      .rowCount;
  for (let turn = 0; turn < 600 && (await sent()) !== ids.length; turn += 1) {
    await new Promise((resolve) => {
      setTimeout(resolve, 100);
    });
  }
  await Promise.all(workers.map((worker) => stopChild(worker)));
  const bodies = readdirSync(mailFolder)
    .filter((name) => name.endsWith('.eml'))
    .map((name) => readFileSync(path.join(mailFolder, name), 'utf8'));
  const once = ids.filter((id) => bodies.filter((body) => body.includes(`<${id}@`)).length === 1);
  check(`100 letters queued, two workers: ${once.length} sent once`, once.length === ids.length);
}

/** Answers and pages through the proxy, while each instance is ended politely and started again. */
async function restartUnderLoad(
  emails: readonly string[],
  instances: readonly RunningSite[],
): Promise<void> {
  const cookies = await Promise.all(
    emails.slice(3, 11).map((email) => signInByForm(address, email, trial.password)),
  );
  let over = false;
  const acknowledged: Acknowledged[] = [];
  const statuses = new Map<string, number>();
  const count = (kind: string) => statuses.set(kind, (statuses.get(kind) ?? 0) + 1);
  const read = async (cookie: string) => {
    while (!over) {
      for (const to of ['/api/progress', '/today']) {
        const response = await fetch(`${address}${to}`, { headers: { cookie } }).catch(() => null);
        await response?.arrayBuffer();
        count(response === null ? 'no answer' : `${response.status}`);
      }
    }
  };
  const load = cookies.flatMap((cookie) => [
    read(cookie),
    write({ address, cookie, pool, until: () => over, note: (one) => acknowledged.push(one) }),
  ]);
  for (const instance of instances) {
    await instance.stop();
    await trial.startSite(instance.address);
  }
  over = true;
  await Promise.all(load);
  const again = acknowledged.filter(({ sent }) => sent > 1).length;
  const reads = [...statuses].map(([kind, n]) => `${n} × ${kind}`).join(', ');
  check(
    `each restarted under load: ${acknowledged.length} answers (${again} sent again), reads ${reads}`,
    again === 0 && [...statuses.keys()].join() === '200',
  );
}

async function prove(running: Trial): Promise<void> {
  const instances = [await running.startSite(here), await running.startSite(there)];
  const proxy = await startProxy({ port, instances: [here, there] });
  try {
    const emails = await learners();
    await sessions(emails);
    await throttling(emails);
    await requestKeys(emails);
    await jobs();
    await restartUnderLoad(emails, instances);
  } finally {
    await proxy.stop();
  }
}

try {
  await prove(trial);
} finally {
  await pool.end();
  await trial.close();
  await mail.stop();
  rmSync(mailFolder, { recursive: true, force: true });
}
process.exitCode = failures.length === 0 ? 0 : 1;
