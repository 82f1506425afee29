import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { freePort, root } from './node.mjs';
import { clusterFolder, databaseUrl, requireServer, startServer, stopServer } from './postgres.mjs';
import { Remedy } from './say.mjs';

/**
 * The addresses of the database that is in use: the one of the environment, or the embedded one,
 * which is started for the while if no `npm start` runs.
 */
export async function reachDatabase() {
  if (process.env.DATABASE_URL) {
    return {
      owner: process.env.DATABASE_MIGRATION_URL ?? process.env.DATABASE_URL,
      app: process.env.DATABASE_URL,
      stop: async () => undefined,
    };
  }
  const secretsFile = path.join(root, '.hornbeam/secrets.json');
  if (!existsSync(secretsFile)) {
    throw new Remedy(
      'There is no database yet: neither DATABASE_URL nor one made by npm start.',
      'Run npm start once, or set DATABASE_URL.',
    );
  }
  const secrets = JSON.parse(readFileSync(secretsFile, 'utf8'));
  const folder = clusterFolder(path.join(root, '.hornbeam/postgres'));
  const bin = requireServer();
  const pidFile = path.join(folder, 'postmaster.pid');
  const running = existsSync(pidFile);
  const server = running
    ? {
        port: Number(readFileSync(pidFile, 'utf8').split('\n')[3]),
        bin,
        password: secrets.superuser,
      }
    : await startServer(bin, folder, { port: await freePort(), password: secrets.superuser });
  return {
    owner: databaseUrl(server, 'hornbeam_owner', secrets.owner, 'hornbeam'),
    app: databaseUrl(server, 'hornbeam_app', secrets.app, 'hornbeam'),
    session: secrets.session,
    stop: async () => {
      if (!running) await stopServer(server);
    },
  };
}

/** The address without its password, and the environment that carries it: nothing secret in `ps`. */
export function withoutPassword(url) {
  const parsed = new URL(url);
  const password = decodeURIComponent(parsed.password);
  parsed.password = '';
  return { url: parsed.toString(), env: { ...process.env, PGPASSWORD: password } };
}
