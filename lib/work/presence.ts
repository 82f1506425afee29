import 'server-only';
import pg from 'pg';
import { databaseEnvironment } from '@/lib/env';

/**
 * Workers that are alive hold a lock in the database for as long as their connection lasts; a job
 * whose worker holds none was left by a worker that was killed, and goes back to the queue at once
 * instead of after the four hours that the queue itself would wait.
 */

/** Sets the locks of workers apart from all others; any number would do. */
const space = 4_877;

/** How often somebody looks for jobs that were left. */
const pause = 10_000;

/** A worker's presence, until it is ended. */
export interface Presence {
  readonly end: () => Promise<void>;
}

/** Makes the worker known as alive, and frees what dead ones hold: now and every while. */
export async function makePresent(workerId: string): Promise<Presence> {
  let client = await holdLock(workerId);
  await freeLeftJobs(client);
  let looking: Promise<void> = Promise.resolve();
  const look = async () => {
    try {
      await freeLeftJobs(client);
    } catch {
      // The connection is gone, and the lock with it: another takes its place.
      await client.end().catch(() => undefined);
      client = await holdLock(workerId).catch(() => client);
    }
  };
  const timer = setInterval(() => {
    looking = looking.then(look);
  }, pause);
  return {
    end: async () => {
      clearInterval(timer);
      await looking;
      await client.end();
    },
  };
}

async function holdLock(workerId: string): Promise<pg.Client> {
  const client = new pg.Client({
    connectionString: databaseEnvironment().url,
    application_name: 'hornbeam-presence',
    keepAlive: true,
  });
  // Without a listener, a connection that breaks while it is idle would end the whole process.
  client.on('error', () => undefined);
  await client.connect();
  await client.query('select pg_advisory_lock($1, hashtext($2))', [space, workerId]);
  return client;
}

/** Gives back the jobs of every worker whose lock nobody holds; one that has just begun may yet take its. */
async function freeLeftJobs(client: pg.Client): Promise<void> {
  await client.query(
    `select graphile_worker.force_unlock_workers(array(
       select distinct j.locked_by from graphile_worker.jobs j
       where j.locked_at < now() - interval '5 seconds' and not exists (
         select 1 from pg_locks l
         where l.locktype = 'advisory' and l.granted
           and l.database = (select oid from pg_database where datname = current_database())
           and l.classid = $1::int::oid
           and l.objid::bigint = (hashtext(j.locked_by)::bigint & 4294967295))))`,
    [space],
  );
}
