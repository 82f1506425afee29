import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createAdministrator } from '@/lib/data/entry/first-administrator';
import { findLinkHolder, setPassword } from '@/lib/data/entry/set-password';
import { complaintAbout, hashPassword, isPassword } from '@/lib/data/entry/password';
import { createSession, endSession, findViewer } from '@/lib/data/entry/sessions';
import { tidy } from '@/lib/data/entry/tidy';
import { createPasswordLink, createPerson, disablePerson, enablePerson } from '@/lib/data/people';
import { addMember, removeMember } from '@/lib/data/class-people';
import { rows } from '@/lib/db/query';
import { countRows, openWorkshop, type Workshop } from '../support/workshop';

const HOUR = 3_600_000;
const password = 'a plank of quarter-sawn ash';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

function prove(email: string, secret = password, from: string | null = null) {
  return { by: 'password', email, password: secret, from } as const;
}

/** A person with a password, made the way the administrator makes one. */
async function makeSigner(name: string): Promise<{ email: string; personId: string }> {
  const email = `${name}@workshop.example`;
  const made = await createPerson(workshop.administrator, { name, email });
  if (made.outcome !== 'created') throw new Error(made.outcome);
  const secret = made.link.split('/').at(-1) ?? '';
  const set = await setPassword({ by: 'link', secret }, password, new Date());
  expect(set).toEqual({ outcome: 'set', email });
  return { email, personId: made.personId };
}

async function mustSignIn(email: string, now = new Date()): Promise<string> {
  const result = await createSession(prove(email), 'a browser', now);
  if (result.outcome !== 'signed in') throw new Error(result.outcome);
  return result.secret;
}

describe('a password', () => {
  it('is kept as argon2id at 19 MiB and two passes at least', async () => {
    const kept = await hashPassword(password);
    const [, kind, version, settings] = kept.split('$');
    expect([kind, version]).toEqual(['argon2id', 'v=19']);
    const numbers = Object.fromEntries(
      (settings ?? '').split(',').map((one) => one.split('=')),
    ) as Record<string, string>;
    expect(Number(numbers.m)).toBeGreaterThanOrEqual(19_456);
    expect(Number(numbers.t)).toBeGreaterThanOrEqual(2);
    expect(await isPassword(kept, password)).toBe(true);
    expect(await isPassword(kept, `${password}.`)).toBe(false);
    expect(await isPassword(null, password)).toBe(false);
  });

  it('must be long enough, not common and not a name, and may be anything else', () => {
    const complaints = {
      'fourteen chars': 'too short',
      ['x'.repeat(257)]: 'too long',
      Password12345678: 'too common',
      'iloveyou!!!!!!!!!!!!': 'too common',
      abababababababab: 'too common',
      passwordpassword: 'too common',
      'Dragon-Superman-2026': 'too common',
      '012345678901234567': 'too common',
      'Marit.Solheim.2026': 'names you',
      'marit@solheim.example': 'names you',
    };
    const known = ['Marit', 'Solheim', 'marit@solheim.example'];
    for (const [given, complaint] of Object.entries(complaints)) {
      expect(complaintAbout(given, known), given).toBe(complaint);
    }
    expect(complaintAbout('träd och späntor av ek', known)).toBeNull();
    expect(complaintAbout('дубовые колышки и клинья', known)).toBeNull();
    expect(complaintAbout('x7'.repeat(4) + ' a plank of ash '.repeat(8), known)).toBeNull();
    expect(complaintAbout(password, ['Ann', 'ann@workshop.example'])).toBeNull();
  });

  it('is the same however its characters are composed', async () => {
    const kept = await hashPassword('a plank of späntor');
    expect(await isPassword(kept, 'a plank of spa\u0308ntor')).toBe(true);
  });
});

describe('signing in', () => {
  it('gives a session that says who it is', async () => {
    const { email, personId } = await makeSigner('tora');
    const secret = await mustSignIn(` ${email.toUpperCase()} `);
    const viewer = await findViewer({ by: 'session', secret }, new Date());
    expect(viewer).toMatchObject({ personId, name: 'tora', isAdministrator: false });
    expect(viewer?.memberships).toEqual([]);
    expect(await findViewer({ by: 'session', secret: `${secret}x` }, new Date())).toBeNull();
  });

  it('is refused alike for a wrong password, an unknown address and a disabled account', async () => {
    const { email, personId } = await makeSigner('ulla');
    await disablePerson(workshop.administrator, personId);
    const refusals = [
      await createSession(prove(email), '', new Date()),
      await createSession(prove('nobody@workshop.example'), '', new Date()),
      await createSession(prove((await makeSigner('vida')).email, 'not this one'), '', new Date()),
    ];
    expect(refusals).toEqual(Array(3).fill({ outcome: 'refused' }));
    await enablePerson(workshop.administrator, personId);
    expect(await createSession(prove(email), '', new Date())).toMatchObject({
      outcome: 'signed in',
    });
  });

  it('is put off after ten wrong tries at one account, even with the right password', async () => {
    const { email } = await makeSigner('wanda');
    for (let n = 0; n < 10; n += 1) {
      expect(await createSession(prove(email, 'wrong again'), '', new Date())).toEqual({
        outcome: 'refused',
      });
    }
    const put = await createSession(prove(email), '', new Date());
    expect(put.outcome).toBe('throttled');
    expect(put).toHaveProperty('retryAfter', expect.any(Number));
    // An address nobody has is put off in the same way.
    for (let n = 0; n < 10; n += 1) {
      await createSession(prove('ghost@workshop.example'), '', new Date());
    }
    const ghost = await createSession(prove('ghost@workshop.example'), '', new Date());
    expect(ghost.outcome).toBe('throttled');
  }, 60_000);

  it('is counted again from nothing once it was right', async () => {
    const { email } = await makeSigner('xaver');
    for (let n = 0; n < 9; n += 1) await createSession(prove(email, 'wrong'), '', new Date());
    await mustSignIn(email);
    for (let n = 0; n < 9; n += 1) {
      expect((await createSession(prove(email, 'wrong'), '', new Date())).outcome).toBe('refused');
    }
  });
});

describe('a session', () => {
  it('ends when it idles and at its absolute limit', async () => {
    const { email } = await makeSigner('yrsa');
    const start = new Date('2026-03-01T08:00:00Z');
    const secret = await mustSignIn(email, start);
    const seen = (hours: number) =>
      findViewer({ by: 'session', secret }, new Date(start.getTime() + hours * HOUR));
    expect(await seen(11)).not.toBeNull();
    // Seen at eleven hours, so it idles from then on.
    expect(await seen(22)).not.toBeNull();
    expect(await seen(35)).toBeNull();
    const second = await mustSignIn(email, start);
    await rows('update sessions set last_seen_at = $1 where ended_at is null returning id', [
      new Date(start.getTime() + 720 * HOUR),
    ]);
    const last = (hours: number) =>
      findViewer({ by: 'session', secret: second }, new Date(start.getTime() + hours * HOUR));
    expect(await last(719.9)).not.toBeNull();
    expect(await last(720.1)).toBeNull();
  });

  it('is short for those who teach, and cut short when somebody begins to', async () => {
    const { email, personId } = await makeSigner('zelda');
    const start = new Date();
    const secret = await mustSignIn(email, start);
    await addMember(workshop.administrator, workshop.harbour, { email, role: 'instructor' });
    const seen = (hours: number) =>
      findViewer({ by: 'session', secret }, new Date(start.getTime() + hours * HOUR));
    expect((await seen(1))?.memberships).toEqual([
      { classId: workshop.harbour, role: 'instructor' },
    ]);
    expect(await seen(3.1)).toBeNull();
    const second = await mustSignIn(email, start);
    const used = (hours: number) =>
      findViewer({ by: 'session', secret: second }, new Date(start.getTime() + hours * HOUR));
    for (let hours = 1; hours < 12; hours += 1) expect(await used(hours)).not.toBeNull();
    expect(await used(12.1)).toBeNull();
    // It is what they are that counts: as a learner again they have the longer time.
    await removeMember(workshop.administrator, workshop.harbour, personId, { evenTheLast: true });
    expect(await used(12.2)).not.toBeNull();
  });

  it('ends at once with signing out, and a kept token is worth nothing then', async () => {
    const { email } = await makeSigner('anna');
    const [here, there] = [await mustSignIn(email), await mustSignIn(email)];
    await endSession({ by: 'session', secret: here }, new Date());
    expect(await findViewer({ by: 'session', secret: here }, new Date())).toBeNull();
    expect(await findViewer({ by: 'session', secret: there }, new Date())).not.toBeNull();
  });

  it('ends at once when the account is disabled', async () => {
    const { email, personId } = await makeSigner('berit');
    const secret = await mustSignIn(email);
    expect(await disablePerson(workshop.administrator, personId)).toBe(true);
    expect(await findViewer({ by: 'session', secret }, new Date())).toBeNull();
  });
});

describe('a link to set a password', () => {
  it('works once, says whose it is, and ends every sign-in', async () => {
    const { email, personId } = await makeSigner('cleo');
    const session = await mustSignIn(email);
    const link = await createPasswordLink(workshop.administrator, personId);
    expect(link).toMatch(/^http:\/\/127\.0\.0\.1:5455\/set-password\/[\w-]{43}$/);
    const proof = { by: 'link', secret: link?.split('/').at(-1) ?? '' } as const;
    expect(await findLinkHolder(proof, new Date())).toEqual({
      name: 'cleo',
      email,
      hasPassword: true,
    });
    expect(await setPassword(proof, 'short', new Date())).toEqual({
      outcome: 'refused',
      complaint: 'too short',
    });
    const at = new Date();
    const set = await Promise.all([
      setPassword(proof, 'first of two at once', at),
      setPassword(proof, 'second of two at once', at),
    ]);
    expect(set.map(({ outcome }) => outcome).sort()).toEqual(['no longer good', 'set']);
    expect(await findViewer({ by: 'session', secret: session }, new Date())).toBeNull();
    expect(await findLinkHolder(proof, new Date())).toBeNull();
  });

  it('dies after a week, and when a newer one is made', async () => {
    const { personId } = await makeSigner('dora');
    const first = await createPasswordLink(workshop.administrator, personId);
    const second = await createPasswordLink(workshop.administrator, personId);
    const proof = (link: string | null) =>
      ({ by: 'link', secret: link?.split('/').at(-1) ?? '' }) as const;
    expect(await findLinkHolder(proof(first), new Date())).toBeNull();
    expect(await findLinkHolder(proof(second), new Date())).not.toBeNull();
    const nextWeek = new Date(Date.now() + 7 * 24 * HOUR + 1000);
    expect(await findLinkHolder(proof(second), nextWeek)).toBeNull();
  });

  it('is kept as a hash only', async () => {
    const { personId } = await makeSigner('edda');
    const link = await createPasswordLink(workshop.administrator, personId);
    const secret = link?.split('/').at(-1) ?? '';
    expect(await countRows('one_time_links', 'secret_hash like $1', [`%${secret}%`])).toBe(0);
  });

  it('is what the first administrator gets, from the machine itself', async () => {
    const link = await createAdministrator(
      { by: 'console' },
      { name: 'First', email: 'First@Workshop.example' },
      new Date(),
    );
    const secret = link.split('/').at(-1) ?? '';
    expect(await findLinkHolder({ by: 'link', secret }, new Date())).toMatchObject({
      email: 'first@workshop.example',
      hasPassword: false,
    });
    expect(await countRows('people', "email = 'first@workshop.example' and is_administrator")).toBe(
      1,
    );
  });
});

describe('tidying', () => {
  it('removes what is long over and leaves what is in force', async () => {
    const { email, personId } = await makeSigner('frida');
    await mustSignIn(email, new Date(Date.now() - 90 * 24 * HOUR));
    await mustSignIn(email);
    await tidy({ by: 'job', job: 'tidy' }, new Date());
    expect(await countRows('sessions', 'person_id = $1', [personId])).toBe(1);
  });
});
