import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { buildIfChanged } from './machine/build.mjs';
import {
  freePort,
  installPackages,
  isAlive,
  isPortFree,
  requireFolder,
  requireNode,
  root,
  runEntry,
  runsIn,
  startChild,
  stopChild,
} from './machine/node.mjs';
import {
  clusterFolder,
  databaseUrl,
  makeCluster,
  makeDatabase,
  makeRoles,
  requireServer,
  startServer,
  stopLeftServer,
  stopServer,
} from './machine/postgres.mjs';
import { startSite, untilReady } from './machine/site.mjs';
import { complain, Remedy, requireRoom, say } from './machine/say.mjs';

const dev = process.argv.includes('--dev');
const own = path.join(root, '.hornbeam');
const runFile = path.join(own, 'run.json');
const host = process.env.HOST ?? '127.0.0.1';
const port = Number(process.env.PORT ?? 3000);

/** Everything that was started, to be ended in the opposite order. */
const started = [];
let ending = false;

async function end(code) {
  if (ending) return;
  ending = true;
  if (started.length > 0) say('\nEnding …');
  for (const stop of started.reverse()) {
    try {
      await stop();
    } catch (error) {
      complain(error);
    }
  }
  process.exit(code);
}

process.on('SIGINT', () => end(0));
process.on('SIGTERM', () => end(0));
process.on('SIGHUP', () => end(0));

/** Passwords and secrets of this checkout, made once and readable by its account only. */
function readSecrets() {
  const file = path.join(own, 'secrets.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const make = () => randomBytes(32).toString('base64url');
  const secrets = {
    superuser: make(),
    owner: make(),
    app: make(),
    session: make(),
    storage: make(),
  };
  writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  return secrets;
}

/** Refuses to run twice, and ends what a run that was killed has left behind. */
async function clearEarlierRun() {
  if (!existsSync(runFile)) return;
  const { pid, address, children = [] } = JSON.parse(readFileSync(runFile, 'utf8'));
  if (pid !== process.pid && isAlive(pid)) {
    throw new Remedy(
      `Hornbeam already runs from this folder (process ${pid}, ${address}).`,
      `Open ${address}, or end that run with Ctrl-C first.`,
    );
  }
  const left = children.filter((child) => isAlive(child) && runsIn(child, root));
  if (left.length === 0) return;
  say('Ending what an earlier run had left …');
  for (const child of left) process.kill(child, 'SIGTERM');
  for (let attempt = 0; attempt < 100 && left.some(isAlive); attempt += 1) {
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}

/** The project's own PostgreSQL: returns the two addresses of its database. */
async function startDatabase(secrets) {
  const bin = requireServer();
  const folder = clusterFolder(path.join(own, 'postgres'));
  const fresh = !existsSync(path.join(folder, 'PG_VERSION'));
  if (fresh) {
    say('Making the database cluster …');
    makeCluster(bin, folder, secrets.superuser);
  } else {
    const made = readFileSync(path.join(folder, 'PG_VERSION'), 'utf8').trim();
    if (!bin.includes(`/${made}/`)) {
      throw new Remedy(
        `The database in ${folder} was made by PostgreSQL ${made}; this machine has ${bin}.`,
        `Install postgresql-${made}, or restore a backup into a new cluster (npm run restore).`,
      );
    }
    if (stopLeftServer(bin, folder)) say('Ended a database server that an earlier run had left.');
  }
  const server = await startServer(bin, folder, {
    port: await freePort(Number(process.env.HORNBEAM_DATABASE_PORT ?? 5433)),
    password: secrets.superuser,
    settings: { max_connections: 60, shared_buffers: '128MB' },
  });
  started.push(() => stopServer(server));
  makeRoles(server, { ownerPassword: secrets.owner, appPassword: secrets.app });
  makeDatabase(server, 'hornbeam');
  return {
    DATABASE_URL: databaseUrl(server, 'hornbeam_app', secrets.app, 'hornbeam'),
    DATABASE_MIGRATION_URL: databaseUrl(server, 'hornbeam_owner', secrets.owner, 'hornbeam'),
  };
}

/** Local stands-in for hosted services that the environment does not name. */
async function startFakes(secrets) {
  const env = {};
  if (!process.env.SMTP_URL) {
    const { startMailCatcher } = await import('./fakes/mail.mjs');
    const mail = await startMailCatcher(path.join(own, 'mail'));
    started.push(mail.stop);
    env.SMTP_URL = mail.url;
    env.MAIL_FROM = process.env.MAIL_FROM ?? 'Hornbeam <hornbeam@localhost>';
    env.mailPage = mail.page;
  }
  if (!process.env.S3_ENDPOINT) {
    const { startObjectStore } = await import('./fakes/objects.mjs');
    const objects = await startObjectStore(path.join(own, 'objects'));
    started.push(objects.stop);
    Object.assign(env, {
      S3_ENDPOINT: objects.url,
      S3_REGION: 'local',
      S3_BUCKET: 'hornbeam',
      S3_ACCESS_KEY_ID: 'local',
      S3_SECRET_ACCESS_KEY: secrets.storage,
    });
  }
  return env;
}

function tell(address, demo, embedded, mailPage, signIns) {
  say();
  say(`Hornbeam is at ${address}`);
  if (mailPage) say(`Mail is not sent anywhere: it lands at ${mailPage}`);
  if (demo) say(`\n${signIns.trim()}`);
  if (embedded) {
    say('\nThe database in this folder is for trying Hornbeam out. Real records belong on a');
    say('PostgreSQL server that is looked after and backed up: name it in DATABASE_URL.');
  }
  say('\nCtrl-C ends everything that was started here.');
}

async function main() {
  const begun = Date.now();
  requireNode();
  requireFolder(own);
  requireRoom(own, 600);
  await clearEarlierRun();
  if (!(await isPortFree(port, host))) {
    throw new Remedy(
      `Port ${port} on ${host} is taken by another program.`,
      `Choose another:  PORT=${port + 1} npm start`,
    );
  }
  const address = process.env.NEXTAUTH_URL ?? `http://${host}:${port}`;
  writeFileSync(runFile, JSON.stringify({ pid: process.pid, address }));
  started.push(() => rmSync(runFile, { force: true }));

  installPackages();
  const secrets = readSecrets();
  const embedded = !process.env.DATABASE_URL;
  const database = embedded ? await startDatabase(secrets) : {};
  const { mailPage, ...fakes } = await startFakes(secrets);
  const env = {
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET ?? (embedded ? secrets.session : undefined),
    NODE_ENV: dev ? 'development' : 'production',
    AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
    ...database,
    ...fakes,
  };
  for (const [name, value] of Object.entries(env)) if (value === undefined) delete env[name];

  runEntry('scripts/migrate.ts', { env, what: 'Preparing the database' });
  const demo = embedded ? process.env.HORNBEAM_DEMO !== '0' : process.env.HORNBEAM_DEMO === '1';
  const signIns = demo
    ? runEntry('scripts/seed.ts', { env, what: 'Loading the demo data', quiet: true })
    : '';

  if (!dev) buildIfChanged({ env });
  const worker = startChild(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'scripts/work.ts'],
    { env },
  );
  started.push(() => stopChild(worker));
  const site = startSite({
    address: `http://${host}:${port}`,
    env,
    mode: dev ? 'dev' : 'start',
    stdio: dev ? 'inherit' : 'pipe',
  });
  started.push(site.stop);
  const children = [worker.child.pid, site.child.pid];
  writeFileSync(runFile, JSON.stringify({ pid: process.pid, address, children }));
  if (!dev) site.child.stderr.pipe(process.stderr);
  const died = Promise.race([
    site.ended.then((code) => `The web server ended by itself (${code}).`),
    worker.ended.then((code) => `The job worker ended by itself (${code}).`),
  ]);
  await Promise.race([untilReady(site), died.then((why) => Promise.reject(new Error(why)))]);
  tell(address, demo, embedded, mailPage, signIns);
  say(`(ready after ${((Date.now() - begun) / 1000).toFixed(1)} s)`);
  const why = await died;
  if (!ending) {
    complain(new Error(why));
    await end(1);
  }
}

main().catch(async (error) => {
  if (!ending) {
    complain(error);
    await end(1);
  }
});
