import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { findSubscription, unsubscribe, unsubscribeAddresses } from '@/lib/data/entry/unsubscribe';
import { queueLetter } from '@/lib/data/letters';
import { findMailLog, lettersOnPage, sendLetterAgain } from '@/lib/data/mail-log';
import { changeClassMail, wantsClassMail } from '@/lib/data/mail-preference';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { mailFilterSchema, type MailFilter } from '@/lib/schemas/mail';
import { countRows, openWorkshop, type Workshop } from '../support/workshop';

const everything: MailFilter = { state: null, kind: '', address: '', after: null };
let workshop: Workshop;

beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());
beforeEach(async () => {
  await rows('delete from letters returning id');
  await rows('delete from graphile_worker._private_jobs returning id');
});

async function write(to: string, personId?: string): Promise<string> {
  const letter = { kind: 'password-changed' } as const;
  const id = await transact((transaction) => queueLetter(transaction, { to, personId, letter }));
  return id ?? '';
}

async function close(letterId: string, state: 'sent' | 'failed' | 'dropped'): Promise<void> {
  await rows(
    `update letters set state = $2, sent_at = case when $2 = 'sent' then now() end,
       last_error = case when $2 <> 'sent' then 'Because.' end where id = $1 returning id`,
    [letterId, state],
  );
  await rows('delete from graphile_worker._private_jobs returning id');
}

function othersOf({ learner, stranger, instructor, otherInstructor }: Workshop): Viewer[] {
  return [learner, stranger, instructor, otherInstructor];
}

describe('the mail log', () => {
  it('is the administrator’s alone', async () => {
    const letterId = await write('a@b.example', workshop.learner.personId);
    await close(letterId, 'sent');
    for (const viewer of othersOf(workshop)) {
      expect(await findMailLog(viewer, everything)).toEqual({
        letters: [],
        next: null,
        counts: { waiting: 0, sent: 0, failed: 0, dropped: 0 },
      });
      expect(await sendLetterAgain(viewer, letterId)).toBe(false);
    }
    expect(await countRows('letters')).toBe(1);
    const log = await findMailLog(workshop.administrator, everything);
    expect(log.counts).toEqual({ waiting: 0, sent: 1, failed: 0, dropped: 0 });
    expect(log.letters).toMatchObject([
      { letterId, kind: 'password-changed', to: 'a@b.example', state: 'sent', again: false },
    ]);
    expect(log.letters[0]?.personName).toBe('Lena Learner');
  });

  it('says how letters stand and never what they say', async () => {
    const linkId = randomUUID();
    await transact((transaction) =>
      queueLetter(transaction, { to: 'a@b.example', letter: { kind: 'reset-password', linkId } }),
    );
    const log = await findMailLog(workshop.administrator, everything);
    expect(log.letters).toHaveLength(1);
    expect(JSON.stringify(log)).not.toContain(linkId);
  });

  it('is narrowed down by state, kind and a part of the address', async () => {
    await close(await write('anna@b.example'), 'failed');
    await write('ben@b.example');
    const to = async (filter: Partial<MailFilter>) => {
      const log = await findMailLog(workshop.administrator, { ...everything, ...filter });
      return log.letters.map((letter) => letter.to);
    };
    expect(await to({ state: 'failed' })).toEqual(['anna@b.example']);
    expect(await to({ address: 'BEN@' })).toEqual(['ben@b.example']);
    expect(await to({ address: '%' })).toEqual([]);
    expect(await to({ kind: 'password-changed' })).toHaveLength(2);
    expect(await to({ kind: 'invitation' })).toEqual([]);
  });

  it('takes a filter that makes no sense for none', () => {
    expect(
      mailFilterSchema.parse({ state: 'lost', kind: ['a', 'b'], after: 'x', other: 1 }),
    ).toEqual(everything);
  });

  it('goes on page by page, each letter once, also where many have the same time', async () => {
    const total = 2 * lettersOnPage + 3;
    await transact(async (transaction) => {
      for (let n = 0; n < total; n += 1) {
        await queueLetter(transaction, {
          to: `n${n}@b.example`,
          letter: { kind: 'password-changed' },
        });
      }
    });
    const seen: string[] = [];
    const sizes: number[] = [];
    let after: string | null = null;
    do {
      const log: Awaited<ReturnType<typeof findMailLog>> = await findMailLog(
        workshop.administrator,
        { ...everything, after },
      );
      sizes.push(log.letters.length);
      seen.push(...log.letters.map((letter) => letter.to));
      after = log.next;
    } while (after !== null);
    expect(sizes).toEqual([lettersOnPage, lettersOnPage, 3]);
    expect(new Set(seen).size).toBe(total);
  });
});

describe('a letter sent again', () => {
  it('that had failed is tried anew, as the same letter', async () => {
    const letterId = await write('a@b.example');
    await close(letterId, 'failed');
    expect(await sendLetterAgain(workshop.administrator, letterId)).toBe(true);
    expect(await row('select id, state from letters')).toEqual({ id: letterId, state: 'waiting' });
    expect(await countRows('graphile_worker.jobs', 'key = $1', [`send-letter:${letterId}`])).toBe(
      1,
    );
    expect(await sendLetterAgain(workshop.administrator, letterId)).toBe(false);
  });

  it('that was sent goes out as a copy, once while it waits, and is audited', async () => {
    const letterId = await write('a@b.example');
    await close(letterId, 'sent');
    expect(await sendLetterAgain(workshop.administrator, letterId)).toBe(true);
    expect(await sendLetterAgain(workshop.administrator, letterId)).toBe(false);
    const copy = await row<{ id: string; messageId: string }>(
      'select id, message_id as "messageId" from letters where again_of = $1',
      [letterId],
    );
    expect(copy?.messageId).toBe(`<${copy?.id}@127.0.0.1>`);
    expect(
      await countRows(
        'audit_entries',
        "action = 'letter sent again' and actor_id = $1 and object_id = $2 and detail = $3::jsonb",
        [workshop.administrator.personId, letterId, JSON.stringify({ copy: copy?.id })],
      ),
    ).toBe(1);
  });

  it('is neither one that waits, one that was dropped, nor one that is not there', async () => {
    const waiting = await write('a@b.example');
    expect(await sendLetterAgain(workshop.administrator, waiting)).toBe(false);
    await close(waiting, 'dropped');
    for (const id of [waiting, randomUUID(), 'no id']) {
      expect(await sendLetterAgain(workshop.administrator, id)).toBe(false);
    }
  });
});

describe('letters about classes', () => {
  it('are ended and wanted again by the person', async () => {
    const { learner, classmate } = workshop;
    expect(await wantsClassMail(learner)).toBe(true);
    await changeClassMail(learner, false);
    await changeClassMail(learner, false);
    expect(await wantsClassMail(learner)).toBe(false);
    expect(await wantsClassMail(classmate)).toBe(true);
    await changeClassMail(learner, true);
    expect(await wantsClassMail(learner)).toBe(true);
    const audited = (action: string) =>
      countRows('audit_entries', 'action = $1 and actor_id = $2', [action, learner.personId]);
    expect(await audited('class mail ended')).toBe(1);
    expect(await audited('class mail wanted')).toBe(1);
  });

  it('are ended by the signed address in a letter, as often as it is pressed', async () => {
    const { stranger } = workshop;
    const { page, oneClick } = unsubscribeAddresses(stranger.personId);
    expect(page).toMatch(/^http:\/\/127\.0\.0\.1:5455\/unsubscribe\//);
    const token = page.split('/').at(-1) ?? '';
    expect(oneClick.split('/').at(-1)).toBe(token);
    const proof = { by: 'unsubscribe', token } as const;
    expect(await findSubscription(proof)).toBe(true);
    expect(await unsubscribe(proof, new Date())).toBe(true);
    expect(await unsubscribe(proof, new Date())).toBe(true);
    expect(await findSubscription(proof)).toBe(false);
    expect(await wantsClassMail(stranger)).toBe(false);
  });

  it('are not ended by an address that somebody has made up', async () => {
    const { instructor, learner } = workshop;
    const token = unsubscribeAddresses(learner.personId).page.split('/').at(-1) ?? '';
    const [, signature = ''] = token.split('.');
    for (const forged of [
      `${instructor.personId}.${signature}`,
      `${instructor.personId}.`,
      instructor.personId,
      `${token}.more`,
      '',
      'x'.repeat(5000),
    ]) {
      const proof = { by: 'unsubscribe', token: forged } as const;
      expect(await findSubscription(proof)).toBeNull();
      expect(await unsubscribe(proof, new Date())).toBe(false);
    }
    expect(await wantsClassMail(instructor)).toBe(true);
  });
});
