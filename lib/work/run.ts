import 'server-only';
import { run, type Runner } from 'graphile-worker';
import { now } from '@/lib/clock';
import { tidy } from '@/lib/data/entry/tidy';
import { databaseEnvironment } from '@/lib/env';

/** Every night, when nobody is at the bench. */
const timetable = '17 3 * * * tidy';

/** Starts taking jobs off the queue, in the database that all instances share. */
export function startWork(): Promise<Runner> {
  return run({
    connectionString: databaseEnvironment().url,
    concurrency: 2,
    noHandleSignals: true,
    crontab: timetable,
    taskList: { tidy: () => tidy({ by: 'job', job: 'tidy' }, now()) },
  });
}
