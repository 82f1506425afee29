import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  createPasswordLink,
  createPerson,
  disablePerson,
  enablePerson,
  makeAdministrator,
  unmakeAdministrator,
} from '@/lib/data/people';
import { findPeople, listPeople } from '@/lib/data/people-list';
import type { Viewer } from '@/lib/policy/viewer';
import { countRows, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

function everybodyElse({ learner, stranger, instructor, otherInstructor }: Workshop): Viewer[] {
  return [learner, stranger, instructor, otherInstructor];
}

describe('people', () => {
  it('are listed for the administrator and for nobody else', async () => {
    const people = await listPeople(workshop.administrator);
    expect(people.map(({ name }) => name)).toEqual([
      'Ada Administrator',
      'Carl Classmate',
      'Iris Instructor',
      'Lena Learner',
      'Otto Other',
      'Stella Stranger',
    ]);
    expect(people[2]).toMatchObject({
      isAdministrator: false,
      disabled: false,
      hasPassword: false,
      classes: [{ classId: workshop.harbour, name: 'The harbour', role: 'instructor' }],
    });
    for (const viewer of everybodyElse(workshop)) expect(await listPeople(viewer)).toEqual([]);
  });

  it('are made, linked, disabled and enabled by the administrator alone', async () => {
    const { learner } = workshop;
    for (const viewer of everybodyElse(workshop)) {
      expect(await createPerson(viewer, { name: 'X', email: 'x@y.example' })).toEqual({
        outcome: 'not allowed',
      });
      expect(await createPasswordLink(viewer, learner.personId)).toBeNull();
      expect(await disablePerson(viewer, learner.personId)).toBe(false);
      expect(await enablePerson(viewer, learner.personId)).toBe(false);
    }
    expect(await countRows('people', "email = 'x@y.example'")).toBe(0);
    expect(await countRows('people', 'disabled_at is not null')).toBe(0);
  });

  it('have one account an address, however it is written', async () => {
    const made = await createPerson(workshop.administrator, {
      name: ' Nell New ',
      email: ' Nell@Workshop.example ',
    });
    expect(made).toMatchObject({ outcome: 'created' });
    expect(
      await createPerson(workshop.administrator, { name: 'N', email: 'NELL@workshop.example' }),
    ).toEqual({ outcome: 'address taken' });
    expect(await countRows('people', "email = 'nell@workshop.example'")).toBe(1);
    expect(await countRows('learners', 'true')).toBe(7);
  });

  it('who are not there cannot be changed, and nobody shuts themselves out', async () => {
    const { administrator } = workshop;
    expect(await disablePerson(administrator, administrator.personId)).toBe(false);
    expect(await disablePerson(administrator, randomUUID())).toBe(false);
    expect(await disablePerson(administrator, 'everybody')).toBe(false);
    expect(await createPasswordLink(administrator, randomUUID())).toBeNull();
  });

  it('leave lines in the audit log, which hold no link', async () => {
    const lines = await countRows('audit_entries', "action = 'person created'");
    const made = await createPerson(workshop.administrator, {
      name: 'Lin Logged',
      email: 'lin@workshop.example',
    });
    const secret = made.outcome === 'created' ? (made.link.split('/').at(-1) ?? '') : '';
    expect(await countRows('audit_entries', "action = 'person created'")).toBe(lines + 1);
    expect(await countRows('audit_entries', 'detail::text like $1', [`%${secret}%`])).toBe(0);
  });
});

describe('finding people', () => {
  it('goes by part of a name or an address, by standing and by page, for the administrator', async () => {
    const { administrator, learner } = workshop;
    const names = async (filter: Parameters<typeof findPeople>[1]) =>
      (await findPeople(administrator, filter)).people.map(({ name }) => name);
    expect(await names({ search: 'LENA' })).toEqual(['Lena Learner']);
    expect(await names({ search: 'lena-' })).toEqual(['Lena Learner']);
    expect(await names({ search: '%' })).toEqual([]);
    expect(await names({ standing: 'administrator' })).toEqual(['Ada Administrator']);
    expect(await names({ standing: 'instructor' })).toEqual(['Iris Instructor', 'Otto Other']);
    expect(await names({ standing: 'disabled' })).toEqual([]);
    const all = await findPeople(administrator, { page: 99 });
    expect(all.pages).toBe(1);
    expect(all.people).toHaveLength(all.total);
    expect(await findPeople(learner)).toEqual({ people: [], total: 0, pages: 1 });
  });
});

describe('administrators', () => {
  it('are made and unmade by administrators, and one always stays', async () => {
    const { administrator, learner, instructor } = workshop;
    for (const viewer of everybodyElse(workshop)) {
      expect(await makeAdministrator(viewer, learner.personId)).toBe(false);
      expect(await unmakeAdministrator(viewer, administrator.personId)).toBe(false);
    }
    expect(await unmakeAdministrator(administrator, administrator.personId)).toBe(false);
    expect(await makeAdministrator(administrator, randomUUID())).toBe(false);
    expect(await makeAdministrator(administrator, instructor.personId)).toBe(true);
    expect(await makeAdministrator(administrator, instructor.personId)).toBe(false);
    expect(await unmakeAdministrator(administrator, instructor.personId)).toBe(true);
    expect(await countRows('people', 'is_administrator')).toBe(1);
    const lines = "action in ('administrator made', 'administrator unmade') and object_id = $1";
    expect(await countRows('audit_entries', lines, [instructor.personId])).toBe(2);
  });

  it('cannot shut each other out at once', async () => {
    const one = await makeViewer('Una One', [], true);
    const two = await makeViewer('Tuva Two', [], true);
    await disablePerson(one, workshop.administrator.personId);
    const done = await Promise.all([
      disablePerson(one, two.personId),
      disablePerson(two, one.personId),
    ]);
    expect(done.filter(Boolean)).toHaveLength(1);
    const left = await countRows('people', 'is_administrator and disabled_at is null');
    expect(left).toBe(1);
    const last = done[0] ? one : two;
    expect(await unmakeAdministrator(last, last.personId)).toBe(false);
    expect(await enablePerson(last, workshop.administrator.personId)).toBe(true);
  });

  it('are asked for their password again before they change an account', async () => {
    const { learner } = workshop;
    const administrator = await makeViewer('Alma Away', [], true);
    const later = new Date(Date.now() + 16 * 60_000);
    expect(await disablePerson(administrator, learner.personId, later)).toBe(false);
    expect(await makeAdministrator(administrator, learner.personId, later)).toBe(false);
    const wanted = { name: 'N', email: 'n@new.example', isAdministrator: true };
    expect(await createPerson(administrator, wanted, later)).toEqual({
      outcome: 'password wanted',
    });
    expect(await createPerson(administrator, { ...wanted, isAdministrator: false }, later)).toEqual(
      expect.objectContaining({ outcome: 'created' }),
    );
  });
});
