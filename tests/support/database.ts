import { randomBytes } from 'node:crypto';
import {
  cloneTemplate,
  clusterVariable,
  dropDatabase,
  type ClusterAddress,
  type DatabaseUrls,
} from './cluster';

/** A database of one test file's own; `drop` ends its connections and removes it. */
export interface TestDatabase extends DatabaseUrls {
  readonly name: string;
  readonly drop: () => void;
}

/**
 * Copies the migrated template. Call it in `beforeAll`, set `DATABASE_URL` (and
 * `DATABASE_MIGRATION_URL`) from it before anything reads the environment, and `drop` in `afterAll`.
 */
export function createTestDatabase(): TestDatabase {
  const told = process.env[clusterVariable];
  if (!told)
    throw new Error('The test cluster is not running: tests/support/database-setup starts it.');
  const address = JSON.parse(told) as ClusterAddress;
  const name = `test_${process.pid}_${randomBytes(4).toString('hex')}`;
  return {
    name,
    ...cloneTemplate(address, name),
    drop: () => {
      dropDatabase(address, name);
    },
  };
}
