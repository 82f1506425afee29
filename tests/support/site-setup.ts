import path from 'node:path';
import { buildIfChanged } from '../../scripts/machine/build.mjs';
import { freePort, root, runEntry, startChild, stopChild } from '../../scripts/machine/node.mjs';
import { startMailCatcher } from '../../scripts/fakes/mail.mjs';
import { cloneTemplate, clusterVariable, dropDatabase, type ClusterAddress } from './cluster';
import { siteVariable, type SiteAddress } from './site';

/** Builds into a folder of the tests' own, loads the demo data and serves it on a free port. */
let stopAll: (() => Promise<void>) | null = null;

export async function setup(): Promise<void> {
  const told = process.env[clusterVariable];
  if (!told) throw new Error('The test cluster is not running.');
  const cluster = JSON.parse(told) as ClusterAddress;
  const name = `site_${process.pid}`;
  const urls = cloneTemplate(cluster, name);
  const mailFolder = path.join(root, '.hornbeam-test', `mail-${process.pid}`);
  const mail = await startMailCatcher(mailFolder, { smtpPort: 0, pagePort: 0 });
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const env = {
    DATABASE_URL: urls.app,
    DATABASE_MIGRATION_URL: urls.owner,
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: 'a secret of the tests, long enough to be taken',
    SMTP_URL: mail.url,
    MAIL_FROM: 'Hornbeam <hornbeam@localhost>',
    NODE_ENV: 'production',
    HORNBEAM_DIST_DIR: '.next-test',
  };
  buildIfChanged({ env, distDir: '.next-test' });
  runEntry('scripts/seed.ts', { env, what: 'Loading the demo data', quiet: true });
  const next = startChild(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)],
    { env, stdio: 'pipe' },
  );
  let log = '';
  for (const stream of [next.child.stdout, next.child.stderr]) {
    stream?.on('data', (chunk: Buffer) => {
      log = (log + chunk.toString()).slice(-8000);
    });
  }
  stopAll = async () => {
    await stopChild(next);
    await mail.stop();
    dropDatabase(cluster, name);
  };
  await untilReady(address, () => log);
  const site: SiteAddress = { address, mailFolder, database: urls, distDir: '.next-test' };
  process.env[siteVariable] = JSON.stringify(site);
}

export async function teardown(): Promise<void> {
  await stopAll?.();
  stopAll = null;
}

async function untilReady(address: string, log: () => string): Promise<void> {
  for (let attempt = 0; attempt < 300; attempt += 1) {
    try {
      if ((await fetch(`${address}/api/health/ready`)).ok) return;
    } catch {
      // not listening yet
    }
    await new Promise((resolve) => {
      setTimeout(resolve, 100);
    });
  }
  throw new Error(`The site did not become ready:\n${log()}`);
}
