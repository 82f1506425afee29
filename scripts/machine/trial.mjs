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

/**
 * A production build, with the demo data if wanted, on a cluster of its own that writes to the disk as a real one
 * does: for measuring, and for pulling its plug. `address` is where people reach it, by default that
 * of the first web server.
 */
export async function makeTrial(name, { settings = {}, address, mailUrl, demo = true } = {}) {
  const bin = requireServer();
  const folder = clusterFolder(path.join(root, '.hornbeam-test', `${name}-${process.pid}`));
  const password = randomUUID();
  const port = await freePort();
  makeCluster(bin, folder, password);
  const startDatabase = () =>
    startServer(bin, folder, { port, password, settings: { max_connections: '200', ...settings } });
  let server = await startDatabase();
  makeRoles(server, { ownerPassword: password, appPassword: password });
  makeDatabase(server, 'hornbeam');
  const database = {
    app: databaseUrl(server, 'hornbeam_app', password, 'hornbeam'),
    owner: databaseUrl(server, 'hornbeam_owner', password, 'hornbeam'),
    superuser: databaseUrl(server, 'postgres', password, 'hornbeam'),
  };
  const ownAddress = await freeAddress();
  const env = siteEnvironment({ database, address: address ?? ownAddress, distDir, mailUrl });
  buildIfChanged({ env, distDir });
  runEntry('scripts/migrate.ts', { env, quiet: true });
  const told = demo ? runEntry('scripts/seed.ts', { env, quiet: true }) : '';
  const sites = new Set();
  const close = async () => {
    await Promise.all([...sites].map((site) => site.stop()));
    await stopServer(server);
    rmSync(folder, { recursive: true, force: true });
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
    server: () => server,
    /** Starts one more web server and waits until it answers. */
    startSite: async (at = ownAddress, more = {}) => {
      const site = startSite({ address: at, env, ...more });
      sites.add(site);
      void site.ended.then(() => sites.delete(site));
      await untilReady(site);
      return site;
    },
    /** As a machine that loses its power would, apart from its disk. */
    killDatabase: async () => {
      server.child.kill('SIGKILL');
      await server.ended;
    },
    startDatabase: async () => {
      server = await startDatabase();
    },
    close,
  };
}
