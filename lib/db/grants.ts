import pg from 'pg';

/** Tables whose rows are never changed or removed by the application. */
export const appendOnlyTables: readonly string[] = [
  'attempts',
  'audit_entries',
  'counted_attempts',
  'overrides',
  'skill_facts',
];

/** Tables that only the owner writes. */
const readOnlyTables: readonly string[] = ['migrations'];

const JOBS = 'graphile_worker';

/**
 * Gives the role that runs the application what it needs and no more: it may add to and read
 * the append-only tables, and has the other tables and the job queue as usual. May be repeated.
 * Throws when the role does not exist.
 */
export async function grantApplicationRole(client: pg.Client, role: string): Promise<void> {
  const { rows } = await client.query<{ tablename: string }>(
    'select tablename from pg_tables where schemaname = current_schema()',
  );
  const to = pg.escapeIdentifier(role);
  await client.query('begin');
  try {
    await client.query(`grant usage on schema public to ${to}`);
    await client.query(`grant usage on all sequences in schema public to ${to}`);
    for (const { tablename } of rows) {
      const table = pg.escapeIdentifier(tablename);
      await client.query(`revoke all on ${table} from ${to}`);
      await client.query(`grant ${rightsOn(tablename)} on ${table} to ${to}`);
    }
    await grantJobQueue(client, to);
    await client.query('commit');
  } catch (error) {
    await client.query('rollback');
    throw error;
  }
}

function rightsOn(table: string): string {
  if (readOnlyTables.includes(table)) return 'select';
  return appendOnlyTables.includes(table) ? 'select, insert' : 'select, insert, update, delete';
}

/** The job queue's tables are under row security; the application sees all of their rows. */
async function grantJobQueue(client: pg.Client, to: string): Promise<void> {
  await client.query(`grant usage on schema ${JOBS} to ${to}`);
  await client.query(
    `grant select, insert, update, delete on all tables in schema ${JOBS} to ${to}`,
  );
  await client.query(`grant usage on all sequences in schema ${JOBS} to ${to}`);
  await client.query(`grant execute on all functions in schema ${JOBS} to ${to}`);
  const { rows } = await client.query<{ relname: string }>(
    `select relname from pg_class
     where relnamespace = $1::regnamespace and relkind = 'r' and relrowsecurity`,
    [JOBS],
  );
  for (const { relname } of rows) {
    const table = `${JOBS}.${pg.escapeIdentifier(relname)}`;
    await client.query(`drop policy if exists application on ${table}`);
    await client.query(`create policy application on ${table} to ${to} using (true)`);
  }
}
