import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findOwnAddress } from '@/lib/data/own-address';
import { createAssignment } from '@/lib/data/assignments';
import { addMember, findClassPeople, removeMember } from '@/lib/data/class-people';
import {
  archiveClass,
  createClass,
  findClass,
  listClasses,
  reopenClass,
  updateClass,
} from '@/lib/data/classes';
import { makeJoiningWord, renewJoiningWord, setJoining } from '@/lib/data/joining-word';
import { findToday } from '@/lib/data/today';
import { rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { countRows, makeClass, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const facts = { name: 'The loft', timeZone: 'Europe/Berlin', startsOn: null, endsOn: null };

function outsiders({ learner, classmate, stranger, otherInstructor }: Workshop): Viewer[] {
  return [learner, classmate, stranger, otherInstructor];
}

async function addressOf(viewer: Viewer): Promise<string> {
  return (await findOwnAddress(viewer)) ?? '';
}

async function actionsOf(classId: string): Promise<string[]> {
  const found = await rows<{ action: string }>(
    'select action from audit_entries where class_id = $1 order by id',
    [classId],
  );
  return found.map(({ action }) => action);
}

describe('a class', () => {
  it('is made by the administrator alone', async () => {
    for (const viewer of [...outsiders(workshop), workshop.instructor]) {
      expect(await createClass(viewer, { name: 'Mine' })).toBeNull();
    }
    const made = await createClass(workshop.administrator, { name: ' The slip ' });
    const found = await findClass(workshop.administrator, made ?? '');
    expect(found).toMatchObject({ name: 'The slip', instructors: [], learners: 0 });
    await expect(
      createClass(workshop.administrator, { name: 'Nowhere', timeZone: 'Harbour/Loft' }),
    ).rejects.toThrow(RangeError);
  });

  it('is changed by its staff alone, and each change is in the audit log', async () => {
    const classId = await makeClass('The rope walk');
    const teacher = await makeViewer('Tess Teacher', [[classId, 'instructor']]);
    for (const viewer of [...outsiders(workshop), workshop.instructor]) {
      expect(await updateClass(viewer, classId, facts)).toBe(false);
      expect(await archiveClass(viewer, classId)).toBe(false);
    }
    expect(await updateClass(teacher, classId, { ...facts, startsOn: '2026-09-01' })).toBe(true);
    expect(await updateClass(workshop.administrator, classId, facts)).toBe(true);
    expect(await updateClass(teacher, 'not-an-id', facts)).toBe(false);
    expect(await findClass(teacher, classId)).toMatchObject({
      name: 'The loft',
      timeZone: 'Europe/Berlin',
      startsOn: null,
    });
    expect(await actionsOf(classId)).toEqual(['class changed', 'class changed']);
  });

  it('that is put away is read and not changed, leaves the lists of learners, and can come back', async () => {
    const classId = await makeClass('The old shed');
    const teacher = await makeViewer('Theo Teacher', [[classId, 'instructor']]);
    const learner = await makeViewer('Lou Learner', [[classId, 'learner']]);
    await renewJoiningWord(teacher, classId);
    const work = { lessons: ['pantograph'], exercises: [], dueOn: '2099-01-01' };
    await createAssignment(teacher, classId, work);
    expect((await findToday(learner)).set).toHaveLength(1);
    expect(await archiveClass(teacher, classId)).toBe(true);
    expect(await archiveClass(teacher, classId)).toBe(false);

    expect(await findClass(teacher, classId)).toMatchObject({ archived: true, joiningOpen: false });
    expect((await listClasses(teacher)).map(({ archived }) => archived)).toEqual([true]);
    expect(await listClasses(learner)).toEqual([]);
    expect((await findToday(learner)).set).toEqual([]);
    expect(await updateClass(teacher, classId, facts)).toBe(false);
    expect(await setJoining(teacher, classId, true)).toBe(false);
    expect(await renewJoiningWord(teacher, classId)).toBeNull();
    expect(await removeMember(teacher, classId, learner.personId)).toBe('not allowed');
    expect((await createAssignment(teacher, classId, work)).outcome).toBe('no such class');

    expect(await reopenClass(learner, classId)).toBe(false);
    expect(await reopenClass(teacher, classId)).toBe(true);
    expect(await reopenClass(teacher, classId)).toBe(false);
    expect((await findToday(learner)).set).toHaveLength(1);
    expect(await actionsOf(classId)).toEqual([
      'joining word renewed',
      'work set',
      'class archived',
      'class reopened',
    ]);
  });
});

describe('who is in a class', () => {
  it('is shown to its staff only: those in it, instructors first, then those who left', async () => {
    const classId = await makeClass('The boat house');
    const teacher = await makeViewer('Tina Teacher', [[classId, 'instructor']]);
    const one = await makeViewer('Ben Boat', [[classId, 'learner']]);
    const gone = await makeViewer('Ada Away', [[classId, 'learner']]);
    expect(await removeMember(teacher, classId, gone.personId)).toBe('removed');
    for (const viewer of [teacher, workshop.administrator]) {
      const people = await findClassPeople(viewer, classId);
      expect(people?.map(({ name, leftAt }) => [name, leftAt === null])).toEqual([
        ['Tina Teacher', true],
        ['Ben Boat', true],
        ['Ada Away', false],
      ]);
    }
    for (const viewer of [...outsiders(workshop), one, gone]) {
      expect(await findClassPeople(viewer, classId)).toBeNull();
    }
    expect(await findClassPeople(teacher, randomUUID())).toBeNull();
    expect(await findClassPeople(teacher, '../people')).toBeNull();
  });

  it('is added to by the administrator alone, and taken from by its instructors as well', async () => {
    const classId = await makeClass('The yard');
    const teacher = await makeViewer('Toby Teacher', [[classId, 'instructor']]);
    const person = await makeViewer('Mia Member', []);
    const email = await addressOf(person);
    const { administrator } = workshop;
    for (const viewer of [...outsiders(workshop), teacher]) {
      expect(await addMember(viewer, classId, { email, role: 'learner' })).toBe('not allowed');
    }
    for (const viewer of outsiders(workshop)) {
      expect(await removeMember(viewer, classId, teacher.personId)).toBe('not allowed');
    }
    expect(await addMember(administrator, classId, { email, role: 'learner' })).toBe('added');
    const again = { email, role: 'instructor' } as const;
    expect(await addMember(administrator, classId, again)).toBe('already there');
    const nobody = { email: 'no@body.example', role: 'learner' } as const;
    expect(await addMember(administrator, classId, nobody)).toBe('no such person');
    expect(await addMember(administrator, randomUUID(), again)).toBe('not allowed');
    expect(await removeMember(teacher, classId, person.personId)).toBe('removed');
    expect(await removeMember(teacher, classId, person.personId)).toBe('not allowed');
    // Somebody who left may come back, and is listed once.
    expect(await addMember(administrator, classId, again)).toBe('added');
    const people = await findClassPeople(teacher, classId);
    expect(people?.map(({ name, role }) => [name, role])).toEqual([
      ['Mia Member', 'instructor'],
      ['Toby Teacher', 'instructor'],
    ]);
    expect(await actionsOf(classId)).toEqual(['member added', 'member removed', 'member added']);
  });

  it('keeps its last instructor until it is said expressly', async () => {
    const classId = await makeClass('The pier');
    const [one, other] = [
      await makeViewer('One Instructor', [[classId, 'instructor']]),
      await makeViewer('Other Instructor', [[classId, 'instructor']]),
    ];
    const results = await Promise.all([
      removeMember(one, classId, other.personId),
      removeMember(other, classId, one.personId),
    ]);
    // Whoever comes second is the last instructor or is one no longer, as the lock falls.
    expect(results.filter((result) => result === 'removed')).toHaveLength(1);
    const [left] = (await findClassPeople(workshop.administrator, classId)) ?? [];
    const last = left?.personId ?? '';
    expect(await removeMember(workshop.administrator, classId, last)).toBe('last instructor');
    expect(await removeMember(workshop.administrator, classId, last, { evenTheLast: true })).toBe(
      'removed',
    );
  });
});

describe('the joining word', () => {
  it('is a timber, a tool and four digits', () => {
    expect(makeJoiningWord(() => 0)).toBe('alder-adze-0000');
    expect(makeJoiningWord((below) => below - 1)).toBe('yew-winch-9999');
    for (let n = 0; n < 50; n += 1) expect(makeJoiningWord()).toMatch(/^[a-z]+-[a-z]+-\d{4}$/);
  });

  it('is made, closed, opened and renewed by the staff of the class alone', async () => {
    const { harbour, instructor, administrator } = workshop;
    for (const viewer of outsiders(workshop)) {
      expect(await renewJoiningWord(viewer, harbour)).toBeNull();
      expect(await setJoining(viewer, harbour, true)).toBe(false);
    }
    expect(await setJoining(instructor, harbour, true)).toBe(false);
    const first = await renewJoiningWord(instructor, harbour);
    expect(await findClass(instructor, harbour)).toMatchObject({
      joiningWord: first,
      joiningOpen: true,
    });
    expect(await setJoining(administrator, harbour, false)).toBe(true);
    expect(await setJoining(administrator, harbour, false)).toBe(false);
    expect(await setJoining(instructor, harbour, true)).toBe(true);
    const second = await renewJoiningWord(administrator, harbour);
    expect(second).not.toBe(first);
    expect(await countRows('class_groups', 'joining_word = $1', [first])).toBe(0);
    const details = await rows<{ detail: object }>(
      "select detail from audit_entries where action = 'joining word renewed' and class_id = $1",
      [harbour],
    );
    expect(JSON.stringify(details)).not.toContain(second ?? '-');
  });
});
