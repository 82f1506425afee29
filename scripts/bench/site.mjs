import { rmSync } from 'node:fs';
import path from 'node:path';
import { buildIfChanged } from '../machine/build.mjs';
import { freePort, root, runEntry } from '../machine/node.mjs';
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
import { freeAddress, siteEnvironment, startSite, untilReady } from '../machine/site.mjs';

/** A production build on a durable cluster of its own, with the demo data, for measuring. */
export async function startBenchSite() {
  const bin = requireServer();
  const folder = clusterFolder(path.join(root, '.hornbeam-test', `bench-${process.pid}`));
  makeCluster(bin, folder, 'superuser');
  const server = await startServer(bin, folder, { port: await freePort(), password: 'superuser' });
  makeRoles(server, { ownerPassword: 'owner', appPassword: 'app' });
  makeDatabase(server, 'hornbeam');
  const address = await freeAddress();
  const database = {
    app: databaseUrl(server, 'hornbeam_app', 'app', 'hornbeam'),
    owner: databaseUrl(server, 'hornbeam_owner', 'owner', 'hornbeam'),
  };
  const env = siteEnvironment({ database, address, distDir: '.next-test' });
  buildIfChanged({ env, distDir: '.next-test' });
  runEntry('scripts/migrate.ts', { env, quiet: true });
  const told = runEntry('scripts/seed.ts', { env, quiet: true });
  const site = startSite({ address, env });
  await untilReady(site);
  return {
    address,
    told,
    server,
    stop: async () => {
      await site.stop();
      await stopServer(server);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
