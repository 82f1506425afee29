import { randomUUID } from 'node:crypto';
import { createServer } from 'node:net';
import type { ParsedMail } from 'mailparser';
import { runOnce } from 'graphile-worker';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { linkToken } from '@/lib/data/entry/link-token';
import { giveUpLostLetters } from '@/lib/data/entry/letter-delivery';
import { hashSecret } from '@/lib/data/entry/secret';
import { letterTries, queueLetter, type NewLetter } from '@/lib/data/letters';
import { row, rows, transact } from '@/lib/db/query';
import { forgetEnvironment } from '@/lib/env';
import type { Letter } from '@/lib/mail/letter';
import { openPostbox, type Postbox } from '@/lib/mail/send';
import { quietLogger } from '@/lib/work/quiet-logger';
import { sendLetter } from '@/lib/work/send-letter';
import { models } from '@/models';
import { catchMail, type CaughtMail } from '../support/postbox';
import { countRows, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
let caught: CaughtMail;
let postbox: Postbox;

beforeAll(async () => {
  workshop = await openWorkshop();
  caught = await catchMail();
  process.env.SMTP_URL = caught.url;
  forgetEnvironment();
  postbox = openPostbox();
});
afterAll(async () => {
  postbox.close();
  await caught.close();
  await workshop.close();
});
beforeEach(async () => {
  await rows('delete from letters returning id');
  await rows('delete from graphile_worker._private_jobs returning id');
});

const comment: Letter = {
  kind: 'comment',
  className: 'The harbour',
  authorName: 'Iris Instructor',
  subject: 'Three wheels in a row',
  body: 'Look at the idler again.',
  path: '/today',
};

const changed: Letter = { kind: 'password-changed' };

async function addressOf(personId: string): Promise<string> {
  const found = await row<{ email: string }>('select email from people where id = $1', [personId]);
  return found?.email ?? '';
}

function queue(letter: NewLetter): Promise<string | null> {
  return transact((transaction) => queueLetter(transaction, letter));
}

async function mustQueue(letter: NewLetter): Promise<string> {
  const id = await queue(letter);
  if (id === null) throw new Error('the letter was not queued');
  return id;
}

/** Runs every job that is due, as a worker would. */
async function work(through: Postbox = postbox): Promise<void> {
  await runOnce({
    connectionString: process.env.DATABASE_URL,
    logger: quietLogger,
    noHandleSignals: true,
    taskList: {
      'send-letter': (payload, helpers) =>
        sendLetter(payload as { letterId: string }, helpers, through),
    },
  });
}

async function stateOf(letterId: string) {
  return row<{ state: string; tries: number; lastError: string | null }>(
    'select state, tries, last_error as "lastError" from letters where id = $1',
    [letterId],
  );
}

async function lastMail(): Promise<ParsedMail> {
  const mail = (await caught.all()).at(-1);
  if (mail === undefined) throw new Error('nothing was caught');
  return mail;
}

describe('a letter', () => {
  it('is sent once, from the outbox to the mail server, with text and HTML', async () => {
    const { learner } = workshop;
    const to = await addressOf(learner.personId);
    const letterId = await mustQueue({ to, personId: learner.personId, letter: comment });
    await work();
    await work();
    const mails = (await caught.all()).filter(({ messageId }) => messageId?.includes(letterId));
    expect(mails).toHaveLength(1);
    const [mail] = mails;
    expect(mail?.messageId).toBe(`<${letterId}@127.0.0.1>`);
    expect(mail?.subject).toBe('The harbour: a comment on your work');
    expect(mail?.from?.text).toBe('"Hornbeam" <hornbeam@localhost>');
    expect(mail?.text).toContain('Hello Lena Learner,');
    expect(mail?.text).toContain('> Look at the idler again.');
    expect(mail?.html).toContain('Look at the idler again.');
    expect(mail?.headers.get('auto-submitted')).toBe('auto-generated');
    expect(await stateOf(letterId)).toEqual({ state: 'sent', tries: 1, lastError: null });
    expect(await countRows('graphile_worker.jobs')).toBe(0);
  });

  it('of a transaction that is rolled back is neither kept nor sent', async () => {
    await expect(
      transact(async (transaction) => {
        await queueLetter(transaction, { to: 'a@b.example', letter: changed });
        throw new Error('thought better of it');
      }),
    ).rejects.toThrow('thought better of it');
    expect(await countRows('letters')).toBe(0);
    expect(await countRows('graphile_worker.jobs')).toBe(0);
  });

  it('is written once for one cause', async () => {
    const letter = { to: 'a@b.example', letter: changed, once: 'the cause' };
    expect(await queue(letter)).not.toBeNull();
    expect(await queue(letter)).toBeNull();
    expect(await countRows('letters')).toBe(1);
    expect(await countRows('graphile_worker.jobs')).toBe(1);
  });

  it('goes to one address and no header of somebody else’s making', async () => {
    for (const to of ['a@b.example\nBcc: c@d.example', 'a@b.example, c@d.example', 'nobody', '']) {
      await expect(queue({ to, letter: changed })).rejects.toThrow(/one address/);
    }
    const className = 'Boats\r\nBcc: everybody@elsewhere.example\r\n\r\nBuy this';
    await mustQueue({ to: 'a@b.example', letter: { ...comment, className } });
    await work();
    const raw = caught.raw().at(-1) ?? '';
    expect(raw.slice(0, raw.indexOf('\r\n\r\n'))).not.toMatch(/^bcc:/im);
    const mail = await lastMail();
    expect(mail.to).toMatchObject({ text: 'a@b.example' });
    expect(mail.bcc).toBeUndefined();
    expect(mail.subject).toBe(
      'Boats Bcc: everybody@elsewhere.example Buy this: a comment on your work',
    );
  });

  it('that does not fit its kind is refused before it is kept', async () => {
    const wrong = { ...changed, secret: 'x' } as unknown as Letter;
    await expect(queue({ to: 'a@b.example', letter: wrong })).rejects.toThrow(/secret/);
    expect(await countRows('letters')).toBe(0);
  });

  it('waits for its time', async () => {
    const sendAfter = new Date(Date.now() + 3_600_000);
    const letterId = await mustQueue({ to: 'a@b.example', letter: changed, sendAfter });
    await work();
    expect(await stateOf(letterId)).toMatchObject({ state: 'waiting', tries: 0 });
  });
});

describe('a letter with a link', () => {
  async function makeLink(expiresAt: Date): Promise<string> {
    const id = randomUUID();
    await models().OneTimeLink.create({
      id,
      personId: workshop.learner.personId,
      purpose: 'set-password',
      secretHash: hashSecret(linkToken(id)),
      createdAt: new Date(expiresAt.getTime() - 7 * 86_400_000),
      expiresAt,
    });
    return id;
  }

  it('carries the token, which neither the outbox nor the queue holds', async () => {
    const linkId = await makeLink(new Date(Date.now() + 86_400_000));
    const to = await addressOf(workshop.learner.personId);
    await mustQueue({ to, letter: { kind: 'set-password', linkId } });
    const token = linkToken(linkId);
    for (const table of ['letters', 'graphile_worker._private_jobs']) {
      expect(await countRows(`${table} t`, 't::text like $1', [`%${token}%`])).toBe(0);
    }
    await work();
    const mail = await lastMail();
    expect(mail.text).toContain(`http://127.0.0.1:5455/set-password/${token}`);
    expect(mail.text).toContain('The link works once, and for 7 days.');
    expect(mail.headers.has('list')).toBe(false);
  });

  it('is dropped when the link is used up or too old', async () => {
    const linkId = await makeLink(new Date(Date.now() - 1000));
    const letterId = await mustQueue({
      to: 'a@b.example',
      letter: { kind: 'set-password', linkId },
    });
    const before = caught.raw().length;
    await work();
    expect(await stateOf(letterId)).toEqual({
      state: 'dropped',
      tries: 1,
      lastError: 'The link in it is used up or too old.',
    });
    expect(caught.raw()).toHaveLength(before);
  });
});

describe('a letter that is not essential', () => {
  it('can be ended by one click, and then is not even written', async () => {
    const viewer = await makeViewer('Wim Weary', [[workshop.harbour, 'learner']]);
    const to = await addressOf(viewer.personId);
    await mustQueue({ to, personId: viewer.personId, letter: comment });
    await work();
    const raw = caught.raw().at(-1) ?? '';
    expect(raw.replace(/\r\n\s+/g, ' ')).toMatch(
      /List-Unsubscribe: <http:\/\/127\.0\.0\.1:5455\/api\/unsubscribe\/[\w.-]+>/,
    );
    expect(raw).toContain('List-Unsubscribe-Post: List-Unsubscribe=One-Click');
    await models().Person.update({ wantsClassMail: false }, { where: { id: viewer.personId } });
    expect(await queue({ to, personId: viewer.personId, letter: comment })).toBeNull();
    expect(await queue({ to, personId: viewer.personId, letter: changed })).not.toBeNull();
  });

  it('is dropped when its reader has chosen so, or was disabled, since it was written', async () => {
    const viewer = await makeViewer('Vera Vague', [[workshop.harbour, 'learner']]);
    const to = await addressOf(viewer.personId);
    const first = await mustQueue({ to, personId: viewer.personId, letter: comment });
    await models().Person.update({ wantsClassMail: false }, { where: { id: viewer.personId } });
    await work();
    expect(await stateOf(first)).toMatchObject({
      state: 'dropped',
      lastError: 'They want no letters about their classes.',
    });
    const second = await mustQueue({ to, personId: viewer.personId, letter: changed });
    await models().Person.update({ disabledAt: new Date() }, { where: { id: viewer.personId } });
    await work();
    expect(await stateOf(second)).toMatchObject({
      state: 'dropped',
      lastError: 'The account is disabled or was erased.',
    });
  });
});

describe('a letter that cannot be handed over', () => {
  /** A mail server that answers each command with what is told, by its first word. */
  async function refusing(answers: Readonly<Record<string, string>>) {
    const server = createServer((socket) => {
      socket.write('220 here\r\n');
      socket.on('data', (chunk) => {
        const word = chunk.toString().slice(0, 4).toUpperCase();
        socket.write(`${answers[word] ?? '250 yes'}\r\n`);
      });
    });
    await new Promise<void>((resolve) => {
      server.listen(0, '127.0.0.1', resolve);
    });
    const address = server.address();
    const port = typeof address === 'object' && address !== null ? address.port : 0;
    process.env.SMTP_URL = `smtp://127.0.0.1:${port}`;
    forgetEnvironment();
    const through = openPostbox();
    process.env.SMTP_URL = caught.url;
    forgetEnvironment();
    return {
      through,
      close: () => {
        through.close();
        server.close();
      },
    };
  }

  it('is tried again later, with the reason in plain words and the same Message-ID', async () => {
    const letterId = await mustQueue({ to: 'a@b.example', letter: changed });
    const { through, close } = await refusing({ RCPT: '451 come back later' });
    await work(through);
    close();
    expect(await stateOf(letterId)).toEqual({
      state: 'waiting',
      tries: 1,
      lastError: 'The mail server refused the address: 451 come back later.',
    });
    const job = await row<{ attempts: number; most: number; later: boolean }>(
      `select attempts, max_attempts as most, run_at > now() as later from graphile_worker.jobs`,
    );
    expect(job).toEqual({ attempts: 1, most: letterTries, later: true });
    await rows('update graphile_worker._private_jobs set run_at = now() returning id');
    await work();
    expect((await lastMail()).messageId).toBe(`<${letterId}@127.0.0.1>`);
    expect(await stateOf(letterId)).toEqual({ state: 'sent', tries: 2, lastError: null });
  });

  it('is given up at once when the address is refused for good', async () => {
    const letterId = await mustQueue({ to: 'a@b.example', letter: changed });
    const { through, close } = await refusing({ RCPT: '550 5.1.1 nobody of that name' });
    await work(through);
    close();
    expect(await stateOf(letterId)).toEqual({
      state: 'failed',
      tries: 1,
      lastError: 'The mail server refused the address: 550 5.1.1 nobody of that name.',
    });
    expect(await countRows('graphile_worker.jobs')).toBe(0);
  });

  it('is given up after the last try', async () => {
    const letterId = await mustQueue({ to: 'a@b.example', letter: changed });
    await rows('update graphile_worker._private_jobs set attempts = max_attempts - 1 returning id');
    process.env.SMTP_URL = 'smtp://127.0.0.1:1';
    forgetEnvironment();
    const nobody = openPostbox();
    process.env.SMTP_URL = caught.url;
    forgetEnvironment();
    await work(nobody);
    nobody.close();
    expect(await stateOf(letterId)).toMatchObject({
      state: 'failed',
      lastError: 'The mail server did not answer.',
    });
  });

  it('is given up when its job is gone, and left alone while it has one', async () => {
    const proof = { by: 'job', job: 'test' } as const;
    const lost = await mustQueue({ to: 'a@b.example', letter: changed });
    await rows('delete from graphile_worker._private_jobs returning id');
    const kept = await mustQueue({ to: 'a@b.example', letter: changed });
    expect(await giveUpLostLetters(proof, new Date())).toBe(0);
    expect(await giveUpLostLetters(proof, new Date(Date.now() + 3_600_000))).toBe(1);
    expect(await stateOf(lost)).toMatchObject({
      state: 'failed',
      lastError: 'The worker was ended while it sent the letter.',
    });
    expect(await stateOf(kept)).toMatchObject({ state: 'waiting' });
  });
});
