import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { acceptAsNew, findInvitation } from '@/lib/data/entry/accept-invitation';
import { createSession, findViewer } from '@/lib/data/entry/sessions';
import {
  checkInvitees,
  createInvitations,
  listInvitations,
  resendInvitation,
  withdrawInvitation,
} from '@/lib/data/invitations';
import { acceptInvitation } from '@/lib/data/joining';
import { disablePerson } from '@/lib/data/people';
import { row, rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { lettersTo, latestToken } from '../support/letters';
import { countRows, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

const DAY = 86_400_000;
const password = 'a plank of quarter-sawn ash';
const person = { name: 'Nell New', password, device: 'a tablet' };

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const one = (email: string, name: string | null = null) => [{ line: 1, email, name }];
const asLearner = () => ({ classId: workshop.harbour, role: 'learner' }) as const;

async function invite(email: string, viewer: Viewer = workshop.instructor, now = new Date()) {
  const invited = await createInvitations(viewer, asLearner(), one(email), now);
  expect(invited).toEqual({ outcome: 'invited', count: 1, left: [] });
  return { by: 'link', secret: await latestToken(email) } as const;
}

async function addressOf(viewer: Viewer): Promise<string> {
  const found = await row<{ email: string }>('select email from people where id = $1', [
    viewer.personId,
  ]);
  return found?.email ?? '';
}

async function stateOf(email: string, now = new Date()) {
  const listed = await listInvitations(workshop.instructor, workshop.harbour, now);
  return listed.find((invitation) => invitation.email === email)?.state;
}

describe('inviting', () => {
  it('is for the instructors of the class and the administrator', async () => {
    const { learner, stranger, otherInstructor, administrator, harbour } = workshop;
    const before = await countRows('invitations');
    for (const viewer of [learner, stranger, otherInstructor]) {
      expect(await checkInvitees(viewer, asLearner(), { good: [], bad: [] })).toBeNull();
      expect(await createInvitations(viewer, asLearner(), one('x@y.example'))).toEqual({
        outcome: 'not allowed',
      });
      expect(await listInvitations(viewer, harbour)).toEqual([]);
    }
    expect(await countRows('invitations')).toBe(before);
    await invite('by-instructor@new.example');
    await invite('by-administrator@new.example', administrator);
  });

  it('of instructors, or to no class, is for the administrator alone', async () => {
    const { instructor, administrator, harbour } = workshop;
    const asInstructor = { classId: harbour, role: 'instructor' } as const;
    const nowhere = { classId: null } as const;
    for (const to of [asInstructor, nowhere]) {
      expect(await createInvitations(instructor, to, one('i@new.example'))).toEqual({
        outcome: 'not allowed',
      });
      expect(await createInvitations(administrator, to, one('i@new.example'))).toMatchObject({
        outcome: 'invited',
        count: 1,
      });
    }
    expect(await listInvitations(instructor, null)).toEqual([]);
    expect(await listInvitations(administrator, null)).toMatchObject([
      { email: 'i@new.example', role: null, state: 'invited' },
    ]);
  });

  it('looks through a list without changing anything, and leaves out who is in or invited', async () => {
    await invite('twice@new.example');
    const known = await addressOf(workshop.learner);
    const elsewhere = await addressOf(workshop.stranger);
    const good = [
      { line: 1, email: known, name: null },
      { line: 2, email: 'twice@new.example', name: null },
      { line: 3, email: elsewhere, name: null },
    ];
    const before = [await countRows('invitations'), await countRows('letters')];
    const checked = await checkInvitees(workshop.instructor, asLearner(), { good, bad: [] });
    expect(checked?.good.map(({ email }) => email)).toEqual([elsewhere]);
    expect(checked?.bad.map(({ line, wrong }) => [line, wrong])).toEqual([
      [1, 'is in the class already'],
      [2, 'is invited already'],
    ]);
    expect([await countRows('invitations'), await countRows('letters')]).toEqual(before);
  });

  it('writes one letter each, which holds no token, and a line in the audit log', async () => {
    const { secret } = await invite('letter@new.example');
    const letters = await lettersTo('letter@new.example');
    expect(letters).toMatchObject([
      { kind: 'invitation', data: { className: 'The harbour', inviterName: 'Iris Instructor' } },
    ]);
    expect(JSON.stringify(letters)).not.toContain(secret);
    expect(await countRows('one_time_links', 'secret_hash = $1', [secret])).toBe(0);
    expect(
      await countRows('audit_entries', "action = 'person invited' and class_id = $1", [
        workshop.harbour,
      ]),
    ).toBeGreaterThan(0);
  });

  it('twice at once makes one invitation', async () => {
    const results = await Promise.all(
      [1, 2].map(() =>
        createInvitations(workshop.instructor, asLearner(), one('at-once@new.example')),
      ),
    );
    const counts = results.map((result) => (result.outcome === 'invited' ? result.count : -1));
    expect(counts.sort()).toEqual([0, 1]);
    expect(await lettersTo('at-once@new.example')).toHaveLength(1);
  });
});

describe('an invitation', () => {
  it('lets somebody new in: with a name and a password they are a member and signed in', async () => {
    const proof = await invite('nell@new.example');
    const now = new Date();
    expect(await findInvitation(proof, now)).toEqual({
      email: 'nell@new.example',
      name: null,
      className: 'The harbour',
      role: 'learner',
      inviterName: 'Iris Instructor',
      hasAccount: false,
    });
    expect(await acceptAsNew(proof, { ...person, password: 'short' }, now)).toEqual({
      outcome: 'refused',
      complaint: 'too short',
    });
    const accepted = await acceptAsNew(proof, person, now);
    if (accepted.outcome !== 'joined') throw new Error(accepted.outcome);
    const viewer = await findViewer({ by: 'session', secret: accepted.secret }, now);
    expect(viewer).toMatchObject({
      name: 'Nell New',
      memberships: [{ classId: workshop.harbour, role: 'learner' }],
    });
    const kept = await row<{ confirmed: boolean }>(
      'select email_confirmed_at is not null as confirmed from people where id = $1',
      [accepted.personId],
    );
    expect(kept?.confirmed).toBe(true);
    expect(await stateOf('nell@new.example')).toBe('joined');
    const signIn = { by: 'password', email: 'nell@new.example', password, from: null } as const;
    expect((await createSession(signIn, '', now)).outcome).toBe('signed in');
    expect(await acceptAsNew(proof, person, now)).toEqual({ outcome: 'no longer good' });
    expect(await findInvitation(proof, now)).toBeNull();
  });

  it('works once, however many accept it at once', async () => {
    const proof = await invite('race@new.example');
    const now = new Date();
    const results = await Promise.all([1, 2, 3].map(() => acceptAsNew(proof, person, now)));
    expect(results.filter(({ outcome }) => outcome === 'joined')).toHaveLength(1);
    expect(await countRows('people', "email = 'race@new.example'")).toBe(1);
  });

  it('to a second class keeps one account, and only its own holder accepts it', async () => {
    const { stranger, classmate } = workshop;
    const email = await addressOf(stranger);
    await rows("update people set password_hash = 'kept' where id = $1 returning id", [
      stranger.personId,
    ]);
    const proof = await invite(email);
    const now = new Date();
    expect((await findInvitation(proof, now))?.hasAccount).toBe(true);
    expect(await acceptAsNew(proof, person, now)).toEqual({ outcome: 'has an account' });
    expect(await acceptInvitation(classmate, proof)).toEqual({
      outcome: 'another account',
      invited: email,
    });
    expect(await acceptInvitation(stranger, proof)).toEqual({ outcome: 'joined' });
    expect(await acceptInvitation(stranger, proof)).toEqual({ outcome: 'no longer good' });
    expect(await countRows('people', 'email = $1', [email])).toBe(1);
    expect(
      await countRows('memberships', 'person_id = $1 and left_at is null', [stranger.personId]),
    ).toBe(2);
  });

  it('expires after seven days and is taken up again by inviting again', async () => {
    const start = new Date();
    const proof = await invite('late@new.example', workshop.instructor, start);
    const justBefore = new Date(start.getTime() + 7 * DAY - 1000);
    const after = new Date(start.getTime() + 7 * DAY + 1000);
    expect(await findInvitation(proof, justBefore)).not.toBeNull();
    expect(await findInvitation(proof, after)).toBeNull();
    expect(await acceptAsNew(proof, person, after)).toEqual({ outcome: 'no longer good' });
    expect(await stateOf('late@new.example', after)).toBe('expired');
    const second = await invite('late@new.example', workshop.instructor, after);
    expect(await findInvitation(second, after)).not.toBeNull();
    expect(await countRows('invitations', "email = 'late@new.example'")).toBe(1);
  });

  it('is sent again by whoever may invite, not within a minute, and the older link ends', async () => {
    const { instructor, otherInstructor, learner } = workshop;
    const start = new Date();
    const first = await invite('again@new.example', instructor, start);
    const listed = await listInvitations(instructor, workshop.harbour);
    const id = listed.find(({ email }) => email === 'again@new.example')?.invitationId ?? '';
    const later = new Date(start.getTime() + 2 * DAY);
    for (const viewer of [otherInstructor, learner]) {
      expect(await resendInvitation(viewer, id, later)).toBe('not there');
      expect(await withdrawInvitation(viewer, id)).toBe(false);
    }
    expect(await resendInvitation(instructor, 'not-an-id', later)).toBe('not there');
    expect(await resendInvitation(instructor, id, start)).toBe('too soon');
    expect(await resendInvitation(instructor, id, later)).toBe('sent');
    const second = { by: 'link', secret: await latestToken('again@new.example') } as const;
    expect(await findInvitation(first, later)).toBeNull();
    expect(await findInvitation(second, new Date(later.getTime() + 7 * DAY - 1000))).not.toBeNull();
    expect(await withdrawInvitation(instructor, id, later)).toBe(true);
    expect(await findInvitation(second, later)).toBeNull();
    expect(await resendInvitation(instructor, id, later)).toBe('not there');
    expect(await stateOf('again@new.example')).toBe('withdrawn');
  });

  it('leads nowhere when the account is disabled', async () => {
    const gone = await makeViewer('Gone Already', []);
    const proof = await invite(await addressOf(gone));
    await disablePerson(workshop.administrator, gone.personId);
    expect(await findInvitation(proof, new Date())).toBeNull();
  });
});
