import 'server-only';
import { EventEmitter } from 'node:events';
import { run, type JobHelpers, type TaskList, type WorkerEvents } from 'graphile-worker';
import { now } from '@/lib/clock';
import { remindOfDueWork } from '@/lib/data/entry/due-reminders';
import { sendReset } from '@/lib/data/entry/forgotten';
import { takeUpJoining } from '@/lib/data/entry/joining';
import { giveUpLostLetters } from '@/lib/data/entry/letter-delivery';
import { tidy } from '@/lib/data/entry/tidy';
import { summariseWeeks } from '@/lib/data/entry/weekly-summaries';
import { databaseEnvironment } from '@/lib/env';
import type { JobName, JobPayloads } from '@/lib/jobs/jobs';
import { openPostbox, type Postbox } from '@/lib/mail/send';
import { makePresent } from './presence';
import { quietLogger } from './quiet-logger';
import { sendLetter } from './send-letter';

/** What the timetable runs by itself, in UTC. What was missed while nobody worked is not made up. */
const timetable = [
  // Every night, when nobody is at the bench.
  '17 3 * * * tidy',
  '*/10 * * * * give-up-lost-letters',
  // Every hour, because nine o'clock and Monday come to each class by its own clock.
  '5 * * * * due-tomorrow',
  '10 * * * * weekly-summary',
].join('\n');

/** Work under way, in this process. */
export interface Work {
  /** Takes no more jobs, and waits for those under way. */
  readonly stop: () => Promise<void>;
  /** Settles when the work has ended. */
  readonly ended: Promise<void>;
}

/** Starts taking jobs off the queue, in the database that all instances share. */
export async function startWork(postbox: Postbox = openPostbox()): Promise<Work> {
  const events: WorkerEvents = new EventEmitter();
  const created = new Promise<string>((resolve) => {
    events.once('pool:create', ({ workerPool }) => resolve(workerPool.id));
  });
  const runner = await run({
    connectionString: databaseEnvironment().url,
    concurrency: 2,
    noHandleSignals: true,
    crontab: timetable,
    events,
    logger: quietLogger,
    taskList: tasks(postbox),
  });
  const presence = await makePresent(await created);
  const close = async () => {
    await presence.end();
    postbox.close();
  };
  let stopping: Promise<void> | undefined;
  return { stop: () => (stopping ??= runner.stop()), ended: runner.promise.finally(close) };
}

/** A handler for each job that something in the product puts on the queue. */
type CausedTasks = {
  readonly [Name in JobName]: (payload: JobPayloads[Name], helpers: JobHelpers) => Promise<void>;
};

function tasks(postbox: Postbox): TaskList {
  const caused: CausedTasks = {
    'send-letter': (payload, helpers) => sendLetter(payload, helpers, postbox),
    'send-reset': (payload) => sendReset({ by: 'job', job: 'send-reset' }, payload, now()),
    'take-up-joining': (payload) =>
      takeUpJoining({ by: 'job', job: 'take-up-joining' }, payload, now()),
  };
  return {
    ...(caused as TaskList),
    tidy: () => tidy({ by: 'job', job: 'tidy' }, now()),
    'give-up-lost-letters': async () => {
      await giveUpLostLetters({ by: 'job', job: 'give-up-lost-letters' }, now());
    },
    'due-tomorrow': async () => {
      await remindOfDueWork({ by: 'job', job: 'due-tomorrow' }, now());
    },
    'weekly-summary': async () => {
      await summariseWeeks({ by: 'job', job: 'weekly-summary' }, now());
    },
  };
}
