import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  createPasswordLink,
  createPerson,
  disablePerson,
  enablePerson,
  listPeople,
} from '@/lib/data/people';
import type { Viewer } from '@/lib/policy/viewer';
import { countRows, openWorkshop, type Workshop } from '../support/workshop';

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
