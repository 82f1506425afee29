import { migrate } from '@/lib/db/migrator';
import { clusterVariable, makeTemplate, startTestCluster } from './cluster';

/**
 * Starts the tests' cluster once for a whole run, however many suites ask for it. Without fsync:
 * what is tested here must not survive anything.
 */
const shared: { users: number; stop: (() => Promise<void>) | null } = { users: 0, stop: null };

export async function setup(): Promise<void> {
  shared.users += 1;
  if (process.env[clusterVariable]) return;
  const cluster = await startTestCluster({
    fsync: 'off',
    full_page_writes: 'off',
    synchronous_commit: 'off',
  });
  shared.stop = cluster.stop;
  await makeTemplate(cluster.address, async ({ owner }) => {
    await migrate(owner, { applicationRole: 'hornbeam_app' });
  });
  process.env[clusterVariable] = JSON.stringify(cluster.address);
}

export async function teardown(): Promise<void> {
  shared.users -= 1;
  if (shared.users > 0 || !shared.stop) return;
  await shared.stop();
  shared.stop = null;
  delete process.env[clusterVariable];
}
