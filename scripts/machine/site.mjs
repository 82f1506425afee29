import { freePort, root, startChild, stopChild } from './node.mjs';
import { Remedy } from './say.mjs';

/**
 * The environment of a site on loopback for tests and measurements: its database, its address, and
 * nothing that would reach out of the machine.
 */
export function siteEnvironment({
  database,
  address,
  distDir,
  mailUrl = 'smtp://127.0.0.1:1',
  secret = 'a secret of the tests, long enough to be taken',
}) {
  return {
    DATABASE_URL: database.app,
    DATABASE_MIGRATION_URL: database.owner,
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: secret,
    SMTP_URL: mailUrl,
    MAIL_FROM: 'Hornbeam <hornbeam@localhost>',
    NODE_ENV: 'production',
    HORNBEAM_DIST_DIR: distDir,
  };
}

/** An address of loopback that nobody uses. */
export async function freeAddress() {
  return `http://127.0.0.1:${await freePort()}`;
}

/** Starts the web server as a child; `untilReady` waits until it answers. */
export function startSite({
  address,
  env,
  mode = 'start',
  stdio = 'pipe',
  folder = root,
  nodeOptions = [],
}) {
  const { hostname, port } = new URL(address);
  const next = `${root}/node_modules/next/dist/bin/next`;
  const { child, ended } = startChild(
    process.execPath,
    [...nodeOptions, next, mode, '-H', hostname, '-p', port],
    { env, stdio, folder },
  );
  let log = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream?.on('data', (chunk) => {
      log = (log + chunk).slice(-8000);
    });
  }
  return {
    address,
    child,
    ended,
    log: () => log,
    stop: () => stopChild({ child, ended }),
    /** As a machine that loses its power would. */
    kill: async () => {
      child.kill('SIGKILL');
      await ended;
    },
  };
}

/** Waits until the site says that it is ready; gives up when it ends or after a minute. */
export async function untilReady({ address, ended, log }) {
  let over = false;
  void ended.then(() => {
    over = true;
  });
  for (let attempt = 0; attempt < 600 && !over; attempt += 1) {
    const reply = await fetch(`${address}/api/health/ready`).catch(() => null);
    await reply?.arrayBuffer();
    if (reply?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Remedy(
    over
      ? `The web server ended by itself.\n${log()}`
      : `${address} did not become ready within a minute.\n${log()}`,
    'See the lines above for the reason.',
  );
}
