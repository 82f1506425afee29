import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { acceptAsNew, findInvitation } from '@/lib/data/entry/accept-invitation';
import { askToJoin, plainWord } from '@/lib/data/entry/joining';
import { joinByWord } from '@/lib/data/joining';
import { rows } from '@/lib/db/query';
import { latestToken, lettersTo, workOff } from '../support/letters';
import { countRows, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

const word = 'rowan-spokeshave-0417';
const proof = { by: 'form', from: null } as const;
const person = { name: 'Nell New', password: 'a plank of quarter-sawn ash', device: '' };

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
  await setWord(word, true);
});
afterAll(() => workshop.close());

async function setWord(to: string, open: boolean): Promise<void> {
  await rows(
    'update class_groups set joining_word = $2, joining_open = $3 where id = $1 returning id',
    [workshop.harbour, to, open],
  );
}

async function ask(email: string, said = word) {
  const answer = await askToJoin(proof, { word: said, name: 'Nell New', email });
  await workOff('take-up-joining');
  return answer;
}

describe('a joining word', () => {
  it('is the same however it is written down', () => {
    expect(plainWord(' Rowan  spokeshave–0417 ')).toBe(word);
  });

  it('has the same answer whether the word is right and the address known or not', async () => {
    const known = 'known@new.example';
    await ask(known);
    const answers = [await ask(known), await ask('other@new.example', 'no-such-0000')];
    expect(answers).toEqual([{ allowed: true }, { allowed: true }]);
    expect(await lettersTo('other@new.example')).toEqual([]);
    expect(await countRows('people', "email like '%@new.example'")).toBe(0);
  });

  it('brings somebody new in once the address is confirmed', async () => {
    await ask('nell@new.example', 'Rowan Spokeshave 0417');
    expect(await lettersTo('nell@new.example')).toMatchObject([{ kind: 'confirm-address' }]);
    const link = { by: 'link', secret: await latestToken('nell@new.example') } as const;
    expect(await findInvitation(link, new Date())).toMatchObject({
      className: 'The harbour',
      role: 'learner',
      inviterName: null,
    });
    const tomorrow = new Date(Date.now() + 86_401_000);
    expect(await findInvitation(link, tomorrow)).toBeNull();
    expect(await acceptAsNew(link, person, new Date())).toMatchObject({ outcome: 'joined' });
    expect(await ask('nell@new.example')).toEqual({ allowed: true });
    expect((await lettersTo('nell@new.example')).at(-1)).toMatchObject({
      kind: 'account-exists',
      data: { className: 'The harbour' },
    });
  });

  it('lets nobody in once it is closed or renewed, even with a letter from before', async () => {
    await ask('slow@new.example');
    const link = { by: 'link', secret: await latestToken('slow@new.example') } as const;
    await setWord(word, false);
    expect(await findInvitation(link, new Date())).toBeNull();
    await setWord('oak-mallet-0001', true);
    expect(await acceptAsNew(link, person, new Date())).toEqual({ outcome: 'no longer good' });
    await ask('later@new.example');
    expect(await lettersTo('later@new.example')).toEqual([]);
    await setWord(word, true);
    expect(await findInvitation(link, new Date())).not.toBeNull();
  });

  it('lets somebody who is signed in join at once, once', async () => {
    const viewer = await makeViewer('Sigrid Signed-in', []);
    expect(await joinByWord(viewer, 'no-such-0000')).toEqual({ outcome: 'no such word' });
    expect(await joinByWord(viewer, word)).toEqual({
      outcome: 'joined',
      className: 'The harbour',
    });
    expect(await joinByWord(viewer, word)).toEqual({
      outcome: 'already there',
      className: 'The harbour',
    });
    expect(
      await countRows('audit_entries', "action = 'member added' and actor_id = $1", [
        viewer.personId,
      ]),
    ).toBe(1);
  });

  it('is put off when it is tried too often, by address and by person', async () => {
    const answers = [];
    for (let n = 0; n < 6; n += 1) answers.push(await ask('often@new.example'));
    expect(answers.map(({ allowed }) => allowed)).toEqual([true, true, true, true, true, false]);
    const viewer = await makeViewer('Guessing Gunnar', []);
    for (let n = 0; n < 20; n += 1) await joinByWord(viewer, `oak-mallet-${n}`);
    expect(await joinByWord(viewer, word)).toMatchObject({ outcome: 'throttled' });
  });
});
