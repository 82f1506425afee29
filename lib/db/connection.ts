import pg from 'pg';
import { Sequelize } from 'sequelize';
import { databaseEnvironment } from '@/lib/env';

/**
 * One connection pool a process. It is kept on `globalThis`, because a server bundle may
 * evaluate this module more than once.
 */
const keeper = globalThis as typeof globalThis & { hornbeamDatabase?: Sequelize };

/** The process's connection pool, opened at the first use. Throws `EnvironmentError`. */
export function database(): Sequelize {
  keeper.hornbeamDatabase ??= openDatabase();
  return keeper.hornbeamDatabase;
}

/** Closes the pool; the next use opens another. */
export async function closeDatabase(): Promise<void> {
  const open = keeper.hornbeamDatabase;
  delete keeper.hornbeamDatabase;
  await open?.close();
}

function openDatabase(): Sequelize {
  const { url, pool } = databaseEnvironment();
  return new Sequelize(url, {
    dialect: 'postgres',
    dialectModule: pg,
    logging: false,
    define: { underscored: true },
    pool: { max: pool, min: 0, acquire: 5_000, idle: 30_000 },
    dialectOptions: { application_name: 'hornbeam', statement_timeout: 15_000 },
  });
}
