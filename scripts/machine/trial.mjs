import { randomUUID } from 'node:crypto';
import { rmSync } from 'node:fs';
import path from 'node:path';
import { buildIfChanged } from './build.mjs';
import { freePort, root, runEntry } from './node.mjs';
import {
  clusterFolder,
  databaseUrl,
  makeCluster,
  makeDatabase,
  makeRoles,
  requireServer,
  startServer,
  stopServer,
} from './postgres.mjs';
import { freeAddress, siteEnvironment, startSite, untilReady } from './site.mjs';

const distDir = '.next-test';

/** An empty database with its roles, on a cluster of its own in a folder that `close` takes away. */
export async function makeTrialDatabase(name, settings = {}) {
  const bin = requireServer();
  const folder = clusterFolder(path.join(root, '.hornbeam-test', `${name}-${process.pid}`));
  const password = randomUUID();
  const port = await freePort();
  makeCluster(bin, folder, password);
  const start = () =>
    startServer(bin, folder, { port, password, settings: { max_connections: '200', ...settings } });
  let server = await start();
  makeRoles(server, { ownerPassword: password, appPassword: password });
  makeDatabase(server, 'hornbeam');
  return {
    database: {
      app: databaseUrl(server, 'hornbeam_app', password, 'hornbeam'),
      owner: databaseUrl(server, 'hornbeam_owner', password, 'hornbeam'),
      superuser: databaseUrl(server, 'postgres', password, 'hornbeam'),
    },
    server: () => server,
    /** As a machine that loses its power would, apart from its disk. */
    kill: async () => {
      server.child.kill('SIGKILL');
      await server.ended;
    },
    start: async () => {
      server = await start();
    },
    close: async () => {
      await stopServer(server);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/**
 * A production build, with the demo data if wanted, on a cluster of its own that writes to the disk as a real one
 * does: for measuring, and for pulling its plug. `address` is where people reach it, by default that
 * of the first web server.
 */
export async function makeTrial(name, { settings = {}, address, mailUrl, demo = true } = {}) {
  const cluster = await makeTrialDatabase(name, settings);
  const { database } = cluster;
  const ownAddress = await freeAddress();
  const env = siteEnvironment({ database, address: address ?? ownAddress, distDir, mailUrl });
  buildIfChanged({ env, distDir });
  runEntry('scripts/migrate.ts', { env, quiet: true });
  const told = demo ? runEntry('scripts/seed.ts', { env, quiet: true }) : '';
  const sites = new Set();
  const close = async () => {
    await Promise.all([...sites].map((site) => site.stop()));
    await cluster.close();
  };
  for (const signal of ['SIGINT', 'SIGTERM']) {
    process.once(signal, () => void close().finally(() => process.exit(1)));
  }
  return {
    address: address ?? ownAddress,
    ownAddress,
    env,
    database,
    distDir,
    /** Of every person of the demo data. */
    password: /password "([^"]+)"/.exec(told)?.[1],
    server: cluster.server,
    /** Starts one more web server and waits until it answers. */
    startSite: async (at = ownAddress, more = {}) => {
      const site = startSite({ address: at, env, ...more });
      sites.add(site);
      void site.ended.then(() => sites.delete(site));
      await untilReady(site);
      return site;
    },
    killDatabase: cluster.kill,
    startDatabase: cluster.start,
    close,
  };
}
