import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database';
import { changePassword } from '@/lib/data/account';
import { findOwnAddress } from '@/lib/data/own-address';
import { createAdministrator } from '@/lib/data/entry/first-administrator';
import { setPassword } from '@/lib/data/entry/set-password';
import { createSession, findViewer } from '@/lib/data/entry/sessions';
import { createPerson } from '@/lib/data/people';
import { findPerson } from '@/lib/data/people-list';
import { closeDatabase } from '@/lib/db/connection';
import type { Viewer } from '@/lib/policy/viewer';

const email = 'marit@example.org';
const first = 'six pins of old brass';
const second = 'seven pegs of straight oak';
const now = new Date('2026-12-01T18:00:00Z');
let database: TestDatabase;

beforeAll(() => {
  database = createTestDatabase();
  Object.assign(process.env, {
    DATABASE_URL: database.app,
    DATABASE_MIGRATION_URL: database.owner,
    NEXTAUTH_URL: 'http://127.0.0.1:1',
    NEXTAUTH_SECRET: 'only-for-the-tests-of-the-accounts',
    SMTP_URL: 'smtp://127.0.0.1:1',
    MAIL_FROM: 'Hornbeam <hornbeam@localhost>',
  });
});
afterAll(async () => {
  await closeDatabase();
  database.drop();
});

/** The secret of a new session, or null when the password does not fit. */
async function signIn(password: string): Promise<string | null> {
  const proof = { by: 'password', email, password, from: null } as const;
  const signedIn = await createSession(proof, 'a tablet', now);
  return signedIn.outcome === 'signed in' ? signedIn.secret : null;
}

function viewerOf(secret: string | null): Promise<Viewer | null> {
  return findViewer({ by: 'session', secret: secret ?? '' }, now);
}

async function signedIn(password: string): Promise<{ viewer: Viewer; secret: string }> {
  const secret = await signIn(password);
  const viewer = await viewerOf(secret);
  if (secret === null || viewer === null) throw new Error('could not sign in');
  return { viewer, secret };
}

describe('one’s own account', () => {
  beforeAll(async () => {
    const link = await createAdministrator(
      { by: 'console' },
      { name: 'Marit Vik', email: 'Marit@Example.org' },
      now,
    );
    await setPassword({ by: 'link', secret: link.split('/').at(-1) ?? '' }, first, now);
  });

  it('tells the address, as it is kept', async () => {
    const { viewer } = await signedIn(first);
    expect(await findOwnAddress(viewer)).toBe(email);
  });

  it('keeps the password while the old one is wrong or the new one will not do', async () => {
    const { viewer } = await signedIn(first);
    expect(await changePassword(viewer, { current: 'a guess', next: second }, now)).toEqual({
      outcome: 'wrong password',
    });
    expect(await changePassword(viewer, { current: first, next: 'short' }, now)).toEqual({
      outcome: 'refused',
      complaint: 'too short',
    });
    expect(await signIn(first)).not.toBeNull();
    expect(await signIn(second)).toBeNull();
  });

  it('changes it, ends every other sign-in and keeps this one', async () => {
    const here = await signedIn(first);
    const elsewhere = await signedIn(first);
    expect(await changePassword(here.viewer, { current: first, next: second }, now)).toEqual({
      outcome: 'changed',
    });
    expect(await viewerOf(here.secret)).not.toBeNull();
    expect(await viewerOf(elsewhere.secret)).toBeNull();
    expect(await signIn(first)).toBeNull();
    expect(await signIn(second)).not.toBeNull();
  });
});

describe('one person', () => {
  it('is found by the administrator only, and a stranger’s id finds nobody', async () => {
    const { viewer } = await signedIn(second);
    const made = await createPerson(viewer, { name: 'Ola', email: 'ola@example.org' }, now);
    const id = made.outcome === 'created' ? made.personId : '';
    expect(await findPerson(viewer, id)).toMatchObject({ name: 'Ola', hasPassword: false });
    expect(await findPerson({ ...viewer, isAdministrator: false }, id)).toBeNull();
    expect(await findPerson(viewer, '00000000-0000-4000-8000-000000000000')).toBeNull();
    expect(await findPerson(viewer, 'not an id')).toBeNull();
  });
});
