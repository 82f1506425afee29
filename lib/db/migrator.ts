import { runMigrations as migrateJobQueue } from 'graphile-worker';
import pg from 'pg';
import { Umzug, type RunnableMigration, type UmzugStorage } from 'umzug';
import { grantApplicationRole } from './grants';
import type { MigrationContext } from './migration';
import { migrations } from './migrations';

/** The database was migrated by a later version of the code than this one. */
export class DatabaseNewerThanCode extends Error {
  override name = 'DatabaseNewerThanCode';
  constructor(readonly unknown: readonly string[]) {
    super(
      `The database is newer than this code: it has had ${unknown.join(', ')}, which this ` +
        'version does not know. Start the version that made the change, or a later one.',
    );
  }
}

/** How to migrate. */
export interface MigrateOptions {
  /** The last migration that is to be in force, or `nothing`; by default the latest. */
  readonly to?: string;
  /** The role that runs the application, when it is not the owner who migrates. */
  readonly applicationRole?: string;
}

/** One number for the whole product, so that two instances never migrate at once. */
const LOCK = 4_877_010_026;

/**
 * Brings the database at `url` to the shape that the code expects, or to that of `options.to`,
 * up or down; each change is one transaction. Answers the names of the changes made.
 * Throws `DatabaseNewerThanCode`, and whatever PostgreSQL says when a change fails.
 */
export async function migrate(url: string, options: MigrateOptions = {}): Promise<string[]> {
  const client = new pg.Client({ connectionString: url, application_name: 'hornbeam-migrator' });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [LOCK]);
    await client.query("set lock_timeout = '5s'");
    await client.query(`
      create table if not exists migrations (
        name text primary key, applied_at timestamptz not null default now())`);
    const changed = await change(client, options.to);
    await migrateJobQueue({ connectionString: url, logger: undefined });
    if (options.applicationRole !== undefined) {
      await grantApplicationRole(client, options.applicationRole);
    }
    return changed;
  } finally {
    await client.end();
  }
}

/** The names of the migrations that the code has and the database has not. */
export function pendingAmong(applied: readonly string[]): string[] {
  return migrations.map(({ name }) => name).filter((name) => !applied.includes(name));
}

async function change(client: pg.Client, to: string | undefined): Promise<string[]> {
  const known = migrations.map(({ name }) => name);
  const applied = await appliedMigrations(client);
  const unknown = applied.filter((name) => !known.includes(name));
  if (unknown.length > 0) throw new DatabaseNewerThanCode(unknown);
  const umzug = new Umzug({
    migrations: migrations.map(({ name, migration }) => runnable(client, name, migration)),
    context: client,
    storage: storageIn(client),
    logger: undefined,
  });
  if (to === undefined) return names(await umzug.up());
  if (to !== 'nothing' && !applied.includes(to)) return names(await umzug.up({ to }));
  const kept = known.indexOf(to) + 1;
  const undone = applied.filter((name) => known.indexOf(name) >= kept).reverse();
  return undone.length === 0 ? [] : names(await umzug.down({ migrations: undone }));
}

function runnable(
  client: pg.Client,
  name: string,
  migration: (typeof migrations)[number]['migration'],
): RunnableMigration<pg.Client> {
  return {
    name,
    up: () =>
      inTransaction(client, async (context) => {
        await migration.up(context);
        await client.query('insert into migrations (name) values ($1)', [name]);
      }),
    down: () =>
      inTransaction(client, async (context) => {
        await migration.down(context);
        await client.query('delete from migrations where name = $1', [name]);
      }),
  };
}

async function inTransaction(
  client: pg.Client,
  work: (context: MigrationContext) => Promise<void>,
): Promise<void> {
  await client.query('begin');
  try {
    await work({
      run: async (sql) => {
        await client.query(sql);
      },
    });
    await client.query('commit');
  } catch (error) {
    await client.query('rollback');
    throw error;
  }
}

/** A change is written down in its own transaction, above; here it is only read. */
function storageIn(client: pg.Client): UmzugStorage {
  return {
    executed: () => appliedMigrations(client),
    logMigration: () => Promise.resolve(),
    unlogMigration: () => Promise.resolve(),
  };
}

async function appliedMigrations(client: pg.Client): Promise<string[]> {
  const { rows } = await client.query<{ name: string }>(
    'select name from migrations order by name',
  );
  return rows.map(({ name }) => name);
}

function names(changes: readonly { name: string }[]): string[] {
  return changes.map(({ name }) => name);
}
