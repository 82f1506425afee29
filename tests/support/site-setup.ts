import path from 'node:path';
import { startMailCatcher } from '../../scripts/fakes/mail.mjs';
import { buildIfChanged } from '../../scripts/machine/build.mjs';
import { root, runEntry, startChild, stopChild } from '../../scripts/machine/node.mjs';
import {
  freeAddress,
  siteEnvironment,
  startSite,
  untilReady,
} from '../../scripts/machine/site.mjs';
import { cloneTemplate, clusterVariable, dropDatabase, type ClusterAddress } from './cluster';
import { siteVariable, type SiteAddress } from './site';

const distDir = '.next-test';

/** Builds into a folder of the tests' own, loads the demo data and serves it with its worker. */
let stopAll: (() => Promise<void>) | null = null;

export async function setup(): Promise<void> {
  const told = process.env[clusterVariable];
  if (!told) throw new Error('The test cluster is not running.');
  const cluster = JSON.parse(told) as ClusterAddress;
  const name = `site_${process.pid}`;
  const database = cloneTemplate(cluster, name);
  const mailFolder = path.join(root, '.hornbeam-test', `mail-${process.pid}`);
  const mail = await startMailCatcher(mailFolder, { smtpPort: 0, pagePort: 0 });
  const address = await freeAddress();
  const env = siteEnvironment({ database, address, distDir, mailUrl: mail.url });
  buildIfChanged({ env, distDir });
  runEntry('scripts/seed.ts', { env, what: 'Loading the demo data', quiet: true });
  const running = startSite({ address, env });
  const worker = startChild(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'scripts/work.ts'],
    { env, stdio: 'ignore' },
  );
  stopAll = async () => {
    await Promise.all([running.stop(), stopChild(worker)]);
    await mail.stop();
    dropDatabase(cluster, name);
  };
  await untilReady(running);
  const site: SiteAddress = { address, mailFolder, database, distDir };
  process.env[siteVariable] = JSON.stringify(site);
}

export async function teardown(): Promise<void> {
  await stopAll?.();
  stopAll = null;
}
