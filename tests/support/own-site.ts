import {
  freeAddress,
  siteEnvironment,
  startSite,
  untilReady,
  type RunningSite,
} from '../../scripts/machine/site.mjs';
import { closeDatabase } from '@/lib/db/connection';
import { takeTestDatabase } from './workshop';

/** A site of one test file's own: the build, on a database that the test itself may fill. */
export interface OwnSite {
  readonly address: string;
  readonly close: () => Promise<void>;
}

/** Serves the build in `folder` on an empty database, which this process shares. */
export async function openOwnSite(distDir: string, folder?: string): Promise<OwnSite> {
  const database = takeTestDatabase();
  const address = await freeAddress();
  const env = siteEnvironment({ database, address, distDir });
  const running: RunningSite = startSite({ address, env, folder });
  await untilReady(running);
  return {
    address,
    close: async () => {
      await running.stop();
      await closeDatabase();
      database.drop();
    },
  };
}
