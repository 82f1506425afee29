import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database';

describe('the application’s role', () => {
  let database: TestDatabase;
  let client: pg.Client;

  beforeAll(async () => {
    database = createTestDatabase();
    client = new pg.Client({ connectionString: database.app });
    await client.connect();
  });
  afterAll(async () => {
    await client.end();
    database.drop();
  });

  it.each(['attempts', 'audit_entries'])(
    'may add to %s and read them, nothing else',
    async (table) => {
      const rights = await client.query<{ privilege_type: string }>(
        `select privilege_type from information_schema.role_table_grants
       where grantee = 'hornbeam_app' and table_name = $1 order by 1`,
        [table],
      );
      expect(rights.rows.map((row) => row.privilege_type)).toEqual(['INSERT', 'SELECT']);
      await expect(client.query(`delete from ${table}`)).rejects.toThrow('permission denied');
      await expect(client.query(`truncate ${table}`)).rejects.toThrow('permission denied');
    },
  );

  it('may make no tables of its own', async () => {
    await expect(client.query('create table planted (x int)')).rejects.toThrow('permission denied');
  });
});
