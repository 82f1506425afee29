import { readdirSync } from 'node:fs';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { appendOnlyTables } from '@/lib/db/grants';
import { DatabaseNewerThanCode, migrate } from '@/lib/db/migrator';
import { migrations } from '@/lib/db/migrations';
import { createTestDatabase, type TestDatabase } from '../support/database';

let database: TestDatabase;
let owner: pg.Client;
let app: pg.Client;

beforeAll(async () => {
  database = createTestDatabase();
  owner = new pg.Client({ connectionString: database.owner });
  app = new pg.Client({ connectionString: database.app });
  await owner.connect();
  await app.connect();
});
afterAll(async () => {
  await owner.end();
  await app.end();
  database.drop();
});

async function tables(): Promise<string[]> {
  const { rows } = await owner.query<{ name: string }>(
    "select tablename as name from pg_tables where schemaname = 'public' order by 1",
  );
  return rows.map(({ name }) => name);
}

describe('migrations', () => {
  it('are all listed, in the order of their names', () => {
    const files = readdirSync('migrations').map((file) => file.replace(/\.ts$/, ''));
    expect(migrations.map(({ name }) => name)).toEqual(files.sort());
  });

  it('have nothing to do on a database that has had them', async () => {
    expect(await migrate(database.owner)).toEqual([]);
  });

  it('go down to nothing and up again to the same tables', async () => {
    const before = await tables();
    const undone = await migrate(database.owner, { to: 'nothing' });
    expect(undone).toEqual(migrations.map(({ name }) => name).reverse());
    expect(await tables()).toEqual(['migrations']);
    await migrate(database.owner, { to: '20261201T0903-create-one-time-links' });
    expect(await tables()).toEqual([
      'learners',
      'migrations',
      'one_time_links',
      'people',
      'sessions',
    ]);
    await migrate(database.owner, { to: '20261201T0902-create-sessions' });
    expect(await tables()).not.toContain('one_time_links');
    await migrate(database.owner, { applicationRole: 'hornbeam_app' });
    expect(await tables()).toEqual(before);
  });

  it('run once when two instances migrate at once', async () => {
    await migrate(database.owner, { to: 'nothing' });
    const changes = await Promise.all(
      [1, 2].map(() => migrate(database.owner, { applicationRole: 'hornbeam_app' })),
    );
    expect(changes.flat()).toEqual(migrations.map(({ name }) => name));
  });

  it('leave a database that is newer than the code alone, and name what it has had', async () => {
    await owner.query("insert into migrations (name) values ('20991231T2359-invent-flight')");
    await expect(migrate(database.owner)).rejects.toThrow(DatabaseNewerThanCode);
    await expect(migrate(database.owner)).rejects.toThrow(/20991231T2359-invent-flight/);
    await owner.query("delete from migrations where name = '20991231T2359-invent-flight'");
  });

  it('give up on a lock that is held, and leave no half of a change', async () => {
    const names = migrations.map(({ name }) => name);
    const throttle = names.findIndex((name) => name.endsWith('create-throttle'));
    await migrate(database.owner, { to: names[throttle] });
    await owner.query('begin');
    await owner.query('lock table throttle in access share mode');
    await expect(migrate(database.owner, { to: names[throttle - 1] })).rejects.toThrow(
      /lock timeout/,
    );
    await owner.query('rollback');
    expect(await tables()).toContain('throttle');
    const { rows } = await owner.query('select 1 from migrations where name = $1', [
      names[throttle],
    ]);
    expect(rows).toHaveLength(1);
    await migrate(database.owner, { applicationRole: 'hornbeam_app' });
  });
});

describe("the application's role", () => {
  it('may add to the append-only tables and read them, nothing else', async () => {
    for (const table of appendOnlyTables) {
      for (const statement of [`delete from ${table}`, `truncate ${table}`]) {
        await expect(app.query(statement)).rejects.toThrow(/permission denied/);
      }
      const { rows } = await app.query<{ right: string }>(
        `select privilege_type as right from information_schema.role_table_grants
         where table_name = $1 and grantee = 'hornbeam_app' order by 1`,
        [table],
      );
      expect(rows.map(({ right }) => right)).toEqual(['INSERT', 'SELECT']);
    }
    await expect(app.query("update attempts set verdict = 'right'")).rejects.toThrow(
      /permission denied/,
    );
    await expect(app.query("update audit_entries set action = 'nothing'")).rejects.toThrow(
      /permission denied/,
    );
  });

  it('cannot change the shape of the database nor what it has had', async () => {
    await expect(app.query('create table mine (id int)')).rejects.toThrow(/permission denied/);
    await expect(app.query('delete from migrations')).rejects.toThrow(/permission denied/);
  });

  it('may put jobs on the queue', async () => {
    await app.query("select graphile_worker.add_job('tidy')");
    const { rows } = await app.query<{ task: string }>(
      'select task_identifier as task from graphile_worker.jobs',
    );
    expect(rows).toEqual([{ task: 'tidy' }]);
  });
});
