import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { confirmNewAddress, findNewAddress } from '@/lib/data/entry/confirm-address';
import { askForReset } from '@/lib/data/entry/forgotten';
import { hashPassword } from '@/lib/data/entry/password';
import { findLinkHolder, setPassword } from '@/lib/data/entry/set-password';
import { createSession } from '@/lib/data/entry/sessions';
import { askForNewAddress, findOwnAddress } from '@/lib/data/own-address';
import { givePassword } from '@/lib/data/password-given';
import { row, rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { latestToken, lettersTo, workOff } from '../support/letters';
import { countRows, makeViewer, openWorkshop, signInAs, type Workshop } from '../support/workshop';

const MINUTE = 60_000;
const password = 'a plank of quarter-sawn ash';
const other = 'seven pegs of straight oak';
const form = { by: 'form', from: null } as const;

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

async function makeSigner(name: string): Promise<{ viewer: Viewer; email: string }> {
  const viewer = await makeViewer(name, []);
  const email = (await findOwnAddress(viewer)) ?? '';
  await rows('update people set password_hash = $2 where id = $1 returning id', [
    viewer.personId,
    await hashPassword(password),
  ]);
  return { viewer, email };
}

async function linkTo(email: string) {
  return { by: 'link', secret: await latestToken(email) } as const;
}

describe('a forgotten password', () => {
  it('has the same answer, and the same work until it, whether the address is known or not', async () => {
    const { email } = await makeSigner('Frida Forgetful');
    const before = await countRows('graphile_worker._private_jobs');
    const people = await countRows('one_time_links');
    const answers = [
      await askForReset(form, email),
      await askForReset(form, 'nobody@nowhere.example'),
    ];
    expect(answers).toEqual([{ allowed: true }, { allowed: true }]);
    // Until the job runs, both have left exactly one job and nothing else.
    expect(await countRows('graphile_worker._private_jobs')).toBe(before + 2);
    expect(await countRows('one_time_links')).toBe(people);
    expect(await workOff('send-reset')).toBe(2);
    expect(await lettersTo('nobody@nowhere.example')).toEqual([]);
    expect(await lettersTo(email)).toMatchObject([{ kind: 'reset-password' }]);
  });

  it('is replaced by a link that lives for half an hour, works once and ends the sign-ins', async () => {
    const { email, viewer } = await makeSigner('Greta Goes');
    const start = new Date();
    await askForReset(form, email);
    await workOff('send-reset', start);
    const link = await linkTo(email);
    const at = (minutes: number) => new Date(start.getTime() + minutes * MINUTE);
    expect(await findLinkHolder(link, at(29))).toMatchObject({ email, hasPassword: true });
    expect(await findLinkHolder(link, at(31))).toBeNull();
    expect(await setPassword(link, other, at(31))).toEqual({ outcome: 'no longer good' });
    expect(await setPassword(link, other, at(29))).toEqual({ outcome: 'set', email });
    expect(await setPassword(link, password, at(29))).toEqual({ outcome: 'no longer good' });
    expect(
      await countRows('sessions', 'person_id = $1 and ended_at is null', [viewer.personId]),
    ).toBe(0);
    expect((await lettersTo(email)).at(-1)).toMatchObject({ kind: 'password-changed' });
    const proof = { by: 'password', email, password: other, from: null } as const;
    expect((await createSession(proof, '', new Date())).outcome).toBe('signed in');
  });

  it('asked for twice leaves only the later link good', async () => {
    const { email } = await makeSigner('Hanne Hurried');
    await askForReset(form, email);
    await workOff('send-reset');
    const first = await linkTo(email);
    await askForReset(form, email);
    await workOff('send-reset');
    expect(await findLinkHolder(first, new Date())).toBeNull();
    expect(await findLinkHolder(await linkTo(email), new Date())).not.toBeNull();
  });

  it('can be asked for five times an hour, by anybody for any address', async () => {
    for (const email of ['known@x.example', 'unknown@x.example']) {
      const answers = [];
      for (let n = 0; n < 6; n += 1) answers.push((await askForReset(form, email)).allowed);
      expect(answers).toEqual([true, true, true, true, true, false]);
    }
  });
});

describe('a change of address', () => {
  it('wants the password again when it was given long ago', async () => {
    const { viewer } = await makeSigner('Ida Idle');
    const later = new Date(Date.now() + 16 * MINUTE);
    expect(await askForNewAddress(viewer, 'ida@new.example', later)).toBe('password wanted');
    expect(await givePassword(viewer, 'not this one', later)).toBe('wrong');
    expect(await askForNewAddress(viewer, 'ida@new.example', later)).toBe('password wanted');
    expect(await givePassword(viewer, password, later)).toBe('given');
    expect(await askForNewAddress(viewer, 'ida@new.example', later)).toBe('asked');
  });

  it('is in force once the letter to the new address is answered, and the old one is told', async () => {
    const { viewer, email } = await makeSigner('Jorun Joined');
    await askForReset(form, email);
    await workOff('send-reset');
    const reset = await linkTo(email);
    const next = 'jorun@new.example';
    expect(await askForNewAddress(viewer, email)).toBe('the same');
    expect(await askForNewAddress(viewer, ' Jorun@New.example ')).toBe('asked');
    expect(await findOwnAddress(viewer)).toBe(email);
    const link = await linkTo(next);
    expect(await findNewAddress(link, new Date())).toBe(next);
    expect(await findNewAddress(link, new Date(Date.now() + 31 * MINUTE))).toBeNull();
    expect(await confirmNewAddress(link, new Date())).toEqual({ outcome: 'changed', email: next });
    expect(await confirmNewAddress(link, new Date())).toEqual({ outcome: 'no longer good' });
    expect(await findOwnAddress(viewer)).toBe(next);
    expect((await lettersTo(email)).at(-1)).toMatchObject({ kind: 'address-changed' });
    // What was sent to the old address opens nothing any more.
    expect(await findLinkHolder(reset, new Date())).toBeNull();
  });

  it('to an address that somebody has looks the same, and its owner is told', async () => {
    const { viewer, email } = await makeSigner('Kari Keen');
    const taken = (await makeSigner('Liv Longest')).email;
    expect(await askForNewAddress(viewer, taken)).toBe('asked');
    expect(await lettersTo(taken)).toMatchObject([{ kind: 'account-exists' }]);
    expect(await findOwnAddress(viewer)).toBe(email);
  });

  it('that somebody else was quicker with leaves the old one in force', async () => {
    const { viewer, email } = await makeSigner('Mona Meanwhile');
    await askForNewAddress(viewer, 'wanted@new.example');
    const link = await linkTo('wanted@new.example');
    const quick = await makeViewer('Nora Nimble', []);
    await rows("update people set email = 'wanted@new.example' where id = $1 returning id", [
      quick.personId,
    ]);
    expect(await confirmNewAddress(link, new Date())).toEqual({ outcome: 'address taken' });
    expect(await findOwnAddress(viewer)).toBe(email);
  });
});

describe('giving the password again', () => {
  it('counts for this session alone', async () => {
    const { viewer } = await makeSigner('Olga Often');
    const elsewhere = (await signInAs(viewer.personId)).viewer;
    const later = new Date(Date.now() + 20 * MINUTE);
    await givePassword(viewer, password, later);
    expect(await askForNewAddress(elsewhere, 'olga@new.example', later)).toBe('password wanted');
    const given = await row<{ n: number }>(
      "select count(*)::int as n from audit_entries where action = 'password given again' and actor_id = $1",
      [viewer.personId],
    );
    expect(given?.n).toBe(1);
  });
});
