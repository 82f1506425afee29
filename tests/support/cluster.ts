import { randomBytes } from 'node:crypto';
import { rmSync } from 'node:fs';
import path from 'node:path';
import { freePort, root } from '../../scripts/machine/node.mjs';
import {
  clusterFolder,
  databaseUrl,
  makeCluster,
  makeDatabase,
  makeRoles,
  requireServer,
  sql,
  startServer,
  stopServer,
  type Server,
} from '../../scripts/machine/postgres.mjs';

/** What a test process must know of the cluster; it travels in one environment variable. */
export interface ClusterAddress {
  readonly port: number;
  readonly superuser: string;
  readonly owner: string;
  readonly app: string;
  readonly bin: string;
  readonly template: string;
}

export const clusterVariable = 'HORNBEAM_TEST_CLUSTER';

interface RunningCluster {
  readonly address: ClusterAddress;
  readonly stop: () => Promise<void>;
}

/** Starts a throw-away cluster of the tests' own: nothing of `npm start` is touched. */
export async function startTestCluster(
  settings: Record<string, string> = {},
): Promise<RunningCluster> {
  const bin = requireServer();
  const folder = clusterFolder(
    path.join(root, '.hornbeam-test', `postgres-${process.pid}-${randomBytes(3).toString('hex')}`),
  );
  const [superuser, owner, app] = [secret(), secret(), secret()];
  makeCluster(bin, folder, superuser);
  const server = await startServer(bin, folder, {
    port: await freePort(),
    password: superuser,
    settings: { max_connections: '200', ...settings },
  });
  makeRoles(server, { ownerPassword: owner, appPassword: app });
  return {
    address: { port: server.port, superuser, owner, app, bin, template: 'hornbeam_template' },
    stop: async () => {
      await stopServer(server);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

/** Makes the migrated database that every test database is a copy of. */
export async function makeTemplate(
  address: ClusterAddress,
  migrate: (urls: DatabaseUrls) => Promise<void>,
): Promise<void> {
  makeDatabase(serverOf(address), address.template);
  await migrate(urlsOf(address, address.template));
}

export interface DatabaseUrls {
  /** For the application: the role with few rights. */
  readonly app: string;
  /** For migrations. */
  readonly owner: string;
  /** For what only a test may do, such as looking past the rights. */
  readonly superuser: string;
}

export function urlsOf(address: ClusterAddress, database: string): DatabaseUrls {
  const server = serverOf(address);
  return {
    app: databaseUrl(server, 'hornbeam_app', address.app, database),
    owner: databaseUrl(server, 'hornbeam_owner', address.owner, database),
    superuser: databaseUrl(server, 'postgres', address.superuser, database),
  };
}

/** A new database, a copy of the migrated template, with the name given. */
export function cloneTemplate(address: ClusterAddress, name: string): DatabaseUrls {
  const server = serverOf(address);
  sql(server, `create database :"name" template :"template" owner hornbeam_owner;`, {
    variables: { name, template: address.template },
  });
  sql(server, `grant connect on database :"name" to hornbeam_app;`, { variables: { name } });
  return urlsOf(address, name);
}

export function dropDatabase(address: ClusterAddress, name: string): void {
  sql(serverOf(address), `drop database if exists :"name" with (force);`, { variables: { name } });
}

function serverOf(address: ClusterAddress): Pick<Server, 'port' | 'password' | 'bin'> {
  return { port: address.port, password: address.superuser, bin: address.bin };
}

function secret(): string {
  return randomBytes(24).toString('base64url');
}
