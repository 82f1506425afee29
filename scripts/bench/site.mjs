import { randomUUID } from 'node:crypto';
import { rmSync } from 'node:fs';
import path from 'node:path';
import { buildIfChanged } from '../machine/build.mjs';
import { freePort, root, runEntry, startChild, stopChild } from '../machine/node.mjs';
import {
  clusterFolder,
  databaseUrl,
  makeCluster,
  makeDatabase,
  makeRoles,
  requireServer,
  startServer,
  stopServer,
} from '../machine/postgres.mjs';

/** A production build on a durable cluster of its own, with the demo data, for measuring. */
export async function startBenchSite() {
  const bin = requireServer();
  const folder = clusterFolder(path.join(root, '.hornbeam-test', `bench-${process.pid}`));
  makeCluster(bin, folder, 'superuser');
  const server = await startServer(bin, folder, { port: await freePort(), password: 'superuser' });
  makeRoles(server, { ownerPassword: 'owner', appPassword: 'app' });
  makeDatabase(server, 'hornbeam');
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const env = {
    DATABASE_URL: databaseUrl(server, 'hornbeam_app', 'app', 'hornbeam'),
    DATABASE_MIGRATION_URL: databaseUrl(server, 'hornbeam_owner', 'owner', 'hornbeam'),
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: randomUUID() + randomUUID(),
    SMTP_URL: 'smtp://127.0.0.1:1',
    MAIL_FROM: 'Hornbeam <hornbeam@localhost>',
    NODE_ENV: 'production',
    HORNBEAM_DIST_DIR: '.next-test',
  };
  buildIfChanged({ env, distDir: '.next-test' });
  runEntry('scripts/migrate.ts', { env, quiet: true });
  const told = runEntry('scripts/seed.ts', { env, quiet: true });
  const next = startChild(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)],
    { env, stdio: 'ignore' },
  );
  for (let attempt = 0; ; attempt += 1) {
    const ready = await fetch(`${address}/api/health/ready`).catch(() => null);
    if (ready?.ok) break;
    if (attempt > 300) throw new Error('The site did not become ready.');
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return {
    address,
    told,
    server,
    stop: async () => {
      await stopChild(next);
      await stopServer(server);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** Signs in and returns the cookie header of the session. */
export async function sessionCookie(address, email, password) {
  const jar = new Map();
  const keep = (response) => {
    for (const cookie of response.headers.getSetCookie()) {
      const [pair] = cookie.split(';');
      jar.set(pair.slice(0, pair.indexOf('=')), pair.slice(pair.indexOf('=') + 1));
    }
  };
  const header = () => [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const csrf = await fetch(`${address}/api/auth/csrf`);
  keep(csrf);
  const { csrfToken } = await csrf.json();
  const done = await fetch(`${address}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: {
      'content-type': 'application/x-www-form-urlencoded',
      origin: address,
      cookie: header(),
    },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
  });
  keep(done);
  if (![...jar.keys()].some((name) => name.includes('session') || name.includes('sid'))) {
    throw new Error(`Signing in as ${email} did not succeed (${done.status}).`);
  }
  return header();
}
