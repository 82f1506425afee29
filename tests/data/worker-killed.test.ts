import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { queueLetter } from '@/lib/data/letters';
import { closeDatabase } from '@/lib/db/connection';
import { rows, transact } from '@/lib/db/query';
import { startChild, stopChild } from '../../scripts/machine/node.mjs';
import type { TestDatabase } from '../support/database';
import { countRows, takeTestDatabase } from '../support/workshop';

/**
 * The worker as `npm start` runs it, killed as a machine that loses its power would: each time at the
 * worst moment, when the mail server has taken a letter and the outbox does not know it yet.
 * `npm run prove` sets the number of kills; a test takes one.
 */
const kills = Number(process.env.HORNBEAM_KILLS ?? 1);
const letters = 10 * kills;

let database: TestDatabase;
let smtp: SMTPServer;
let worker: ReturnType<typeof startChild> | null = null;
/** The Message-IDs that the mail server has taken, in order. */
const taken: string[] = [];
/** Those after which the worker was killed. */
const killedAfter: string[] = [];

beforeAll(async () => {
  database = takeTestDatabase();
  smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    onData: (stream, _session, done) => {
      void simpleParser(stream).then(({ messageId = '' }) => {
        taken.push(messageId);
        const due = killedAfter.length < kills && taken.length % 8 === 5;
        if (due && !killedAfter.includes(messageId)) {
          killedAfter.push(messageId);
          worker?.child.kill('SIGKILL');
        }
        done();
      });
    },
  });
  // A client that is killed leaves its connection broken.
  smtp.on('error', () => undefined);
  smtp.listen(0, '127.0.0.1');
  await once(smtp.server, 'listening');
});
afterAll(async () => {
  if (worker !== null) await stopChild(worker);
  await new Promise<void>((resolve) => {
    smtp.close(() => resolve());
  });
  await closeDatabase();
  database.drop();
});

function startWorker(): ReturnType<typeof startChild> {
  const { port } = smtp.server.address() as AddressInfo;
  return startChild(
    process.execPath,
    ['--conditions=react-server', '--import', 'tsx', 'scripts/work.ts'],
    { env: { ...process.env, SMTP_URL: `smtp://127.0.0.1:${port}` }, stdio: 'ignore' },
  );
}

const waiting = () => countRows('letters', "state = 'waiting'");

/** Runs workers, one after the other, until nothing waits. */
async function workUntilDone(): Promise<number> {
  let started = 0;
  while ((await waiting()) > 0) {
    if (started > kills)
      throw new Error(`${await waiting()} letters wait after ${started} workers`);
    started += 1;
    worker = startWorker();
    let over = false;
    void worker.ended.then(() => {
      over = true;
    });
    for (let look = 0; look < 1200 && !over && (await waiting()) > 0; look += 1) {
      await new Promise((resolve) => {
        setTimeout(resolve, 50);
      });
    }
  }
  return started;
}

describe('a worker that is killed between sending and marking', () => {
  it(
    'loses no letter, and sends at most one twice, under the same Message-ID',
    { timeout: 60_000 + 60_000 * kills },
    async () => {
      await transact(async (transaction) => {
        for (let n = 0; n < letters; n += 1) {
          const letter = { kind: 'password-changed' } as const;
          await queueLetter(transaction, { to: `n${n}@harbour.example`, letter });
        }
      });
      const workers = await workUntilDone();
      if (worker !== null) await stopChild(worker);
      const queued = await rows<{ messageId: string; state: string }>(
        'select message_id as "messageId", state from letters',
      );
      const times = new Map(queued.map(({ messageId }) => [messageId, 0]));
      for (const messageId of taken) times.set(messageId, (times.get(messageId) ?? 0) + 1);
      const twice = [...times].filter(([, n]) => n === 2).map(([messageId]) => messageId);
      console.info(
        `${letters} letters, ${killedAfter.length} kills, ${workers} workers: ` +
          `${[...times.values()].filter((n) => n === 0).length} lost, ${twice.length} sent twice, ` +
          `${[...times.values()].filter((n) => n > 2).length} more often`,
      );
      expect(killedAfter).toHaveLength(kills);
      expect(times.size).toBe(letters);
      expect(queued.every(({ state }) => state === 'sent')).toBe(true);
      expect([...times.values()].filter((n) => n !== 1 && n !== 2)).toEqual([]);
      expect(twice).toEqual(expect.arrayContaining(killedAfter));
      // Two letters are on their way at a time: a kill can meet both.
      expect(twice.length).toBeLessThanOrEqual(2 * kills);
      expect(await countRows('graphile_worker.jobs')).toBe(0);
    },
  );
});
