import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { updateAssignment } from '@/lib/data/assignment-change';
import { findAssignment, listAssignments } from '@/lib/data/assignment-list';
import { createAssignment, withdrawAssignment, type NewAssignment } from '@/lib/data/assignments';
import { createAttempt } from '@/lib/data/attempts';
import { removeMember } from '@/lib/data/class-people';
import { classMoment, classMomentOr, sayMoment } from '@/lib/data/class-time';
import { giveExtension, takeBackExtension } from '@/lib/data/extensions';
import { findToday } from '@/lib/data/today';
import { rows } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import type { Counting } from '@/lib/schemas/round';
import { models } from '@/models';
import {
  countRows,
  makeClass,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const exerciseId = 'edging-strip';
const now = new Date('2026-11-02T12:00:00Z');
const at = (moment: string) => new Date(moment);
const wanted: NewAssignment = { lessons: [], exercises: [exerciseId], dueOn: '2026-11-10' };

interface Room {
  readonly classId: string;
  readonly teacher: Viewer;
  readonly one: Viewer;
  readonly other: Viewer;
}

async function makeRoom(): Promise<Room> {
  const classId = await makeClass(`Room ${randomUUID().slice(0, 8)}`);
  return {
    classId,
    teacher: await makeViewer('Tess Teacher', [[classId, 'instructor']]),
    one: await makeViewer('Ann One', [[classId, 'learner']]),
    other: await makeViewer('Ben Other', [[classId, 'learner']]),
  };
}

async function set({ teacher, classId }: Room, changes: Partial<NewAssignment> = {}) {
  const result = await createAssignment(teacher, classId, { ...wanted, ...changes }, now);
  if (result.outcome !== 'set') throw new Error(result.outcome);
  return result.assignmentId;
}

/** Answers wrongly, so that the round stays open, and says what the answer counted for. */
async function answer(viewer: Viewer, moment: Date, id = exerciseId): Promise<readonly Counting[]> {
  const { roundId } = await mustOpen(viewer, id, moment);
  const sent = await createAttempt(
    viewer,
    await requestFor(roundId, 'slipped'),
    randomUUID(),
    moment,
  );
  if (sent.outcome !== 'kept') throw new Error(sent.outcome);
  return sent.reply.counting;
}

const outcomes = (counting: readonly Counting[]) =>
  counting.map(({ outcome, n, late }) => `${outcome} ${n}${late ? ' late' : ''}`);

function outsiders({ learner, stranger, otherInstructor }: Workshop): Viewer[] {
  return [learner, stranger, otherInstructor];
}

describe('the clock of a class', () => {
  const berlin = 'Europe/Berlin';

  it('takes a day without a time to its end, on the day of a clock change too', () => {
    const ends = (on: string) => classMoment(berlin, { on, time: '' }).toISOString();
    expect(ends('2026-12-08')).toBe('2026-12-08T23:00:00.000Z');
    expect(ends('2026-03-29')).toBe('2026-03-29T22:00:00.000Z');
    expect(ends('2026-10-25')).toBe('2026-10-25T23:00:00.000Z');
  });

  it('takes a time that is skipped later, and the first of one that comes twice', () => {
    const said = (on: string, time: string) => classMoment(berlin, { on, time }).toISOString();
    expect(said('2026-03-29', '02:30')).toBe('2026-03-29T01:30:00.000Z');
    expect(said('2026-10-25', '02:30')).toBe('2026-10-25T00:30:00.000Z');
    expect(said('2026-12-08', '00:00')).toBe('2026-12-07T23:00:00.000Z');
  });

  it('writes midnight as the end of the day before, and reads it back', () => {
    const midnight = at('2026-12-08T23:00:00Z');
    expect(sayMoment(berlin, midnight)).toEqual({ on: '2026-12-08', time: '' });
    expect(classMoment(berlin, sayMoment(berlin, midnight))).toEqual(midnight);
  });

  it('leaves a moment where it is when a form says it again', () => {
    const second = at('2026-10-25T01:30:00Z');
    expect(classMomentOr(second, berlin, { on: '2026-10-25', time: '02:30' })).toBe(second);
    expect(classMomentOr(second, berlin, { on: '2026-10-25', time: '02:31' })).toEqual(
      at('2026-10-25T00:31:00Z'),
    );
  });
});

describe('setting work', () => {
  it('keeps its rules, and writes to everybody concerned in the same transaction', async () => {
    const room = await makeRoom();
    const assignmentId = await set(room, {
      lessons: ['pantograph'],
      opensOn: '2026-11-05',
      dueTime: '18:30',
      attemptsAllowed: 2,
      counting: 'latest',
      lateWork: 'closed',
      note: ' Bring a rule. ',
    });
    const [listed] = await listAssignments(room.teacher, room.classId);
    expect(listed).toMatchObject({
      titles: ['The pantograph', expect.any(String)],
      exercises: 7,
      opensAt: '2026-11-05T00:00:00.000Z',
      dueAt: '2026-11-10T18:30:00.000Z',
      attemptsAllowed: 2,
      counting: 'latest',
      lateWork: 'closed',
      note: 'Bring a rule.',
      learners: 2,
      forChosen: false,
      withdrawn: false,
    });
    const letters = await rows<{ personId: string; sendAfter: Date }>(
      `select person_id as "personId", send_after as "sendAfter" from letters
       where kind = 'assignment-set' and data ->> 'assignmentId' = $1`,
      [assignmentId],
    );
    expect(letters.map(({ personId }) => personId).sort()).toEqual(
      [room.one.personId, room.other.personId].sort(),
    );
    expect(letters[0]?.sendAfter.toISOString()).toBe('2026-11-05T00:00:00.000Z');
    expect((await findToday(room.one, now)).set).toEqual([]);
    expect((await findToday(room.one, at('2026-11-05T00:00:00Z'))).set).toHaveLength(1);
  });

  it('reaches the chosen only, and says nothing to them when told so', async () => {
    const room = await makeRoom();
    const stranger = workshop.stranger.learnerId;
    const assignmentId = await set(room, { learners: [room.one.learnerId, stranger], tell: false });
    expect(await findAssignment(room.teacher, room.classId, assignmentId)).toMatchObject({
      learners: [room.one.learnerId],
    });
    expect((await findToday(room.one, now)).set).toHaveLength(1);
    expect((await findToday(room.other, now)).set).toEqual([]);
    expect(await answer(room.other, now)).toEqual([]);
    expect(outcomes(await answer(room.one, now))).toEqual(['counted 1']);
    expect(await countRows('letters', "data ->> 'assignmentId' = $1", [assignmentId])).toBe(0);
  });

  it('says what is wrong with its rules', async () => {
    const { teacher, classId } = await makeRoom();
    const outcome = async (changes: Partial<NewAssignment>) =>
      (await createAssignment(teacher, classId, { ...wanted, ...changes }, now)).outcome;
    expect(await outcome({ exercises: ['no-such-exercise', 'move-the-pen-out'] })).toBe(
      'nothing chosen',
    );
    expect(await outcome({ dueOn: '2026-11-02', dueTime: '12:00' })).toBe('due in the past');
    expect(await outcome({ opensOn: '2026-11-11' })).toBe('due before it opens');
    expect(await outcome({ opensOn: '2026-11-11', opensTime: '00:00' })).toBe(
      'due before it opens',
    );
    expect(await outcome({ learners: [] })).toBe('nobody chosen');
    expect(await outcome({ learners: ['somebody', randomUUID()] })).toBe('nobody chosen');
    await expect(outcome({ dueOn: '2026-13-01' })).rejects.toThrow(RangeError);
    expect(await countRows('assignments', 'class_id = $1', [classId])).toBe(0);
  });

  it('is looked at, changed and taken back by the staff of the class alone', async () => {
    const room = await makeRoom();
    const assignmentId = await set(room);
    const { classId } = room;
    for (const viewer of [...outsiders(workshop), room.one, workshop.instructor]) {
      expect(await findAssignment(viewer, classId, assignmentId)).toBeNull();
      expect(await listAssignments(viewer, classId)).toEqual([]);
      expect((await updateAssignment(viewer, classId, assignmentId, 0, wanted, now)).outcome).toBe(
        'no such work',
      );
      expect(await withdrawAssignment(viewer, classId, assignmentId)).toBe(false);
      const time = { learnerId: room.one.learnerId, dueOn: '2026-12-01', dueTime: '' };
      expect((await giveExtension(viewer, classId, assignmentId, time, now)).outcome).toBe(
        'no such learner',
      );
    }
    const { harbour, instructor } = workshop;
    expect(await findAssignment(instructor, harbour, assignmentId)).toBeNull();
    expect(await findAssignment(room.teacher, classId, randomUUID())).toBeNull();
    expect(await findAssignment(room.teacher, classId, '..')).toBeNull();
    expect(await findAssignment(workshop.administrator, classId, assignmentId)).not.toBeNull();
  });
});

describe('changing work that is set', () => {
  it('shows the second of two editors both versions, and lets them save over it', async () => {
    const room = await makeRoom();
    const id = await set(room, { note: 'As it was.' });
    const { teacher, classId } = room;
    const { administrator } = workshop;
    const change = (who: Viewer, version: number, note: string) =>
      updateAssignment(who, classId, id, version, { ...wanted, note }, now);
    expect(await change(teacher, 0, 'Mine.')).toMatchObject({ outcome: 'changed' });
    const second = await change(administrator, 0, 'Theirs.');
    expect(second).toMatchObject({
      outcome: 'changed meanwhile',
      current: { version: 1, note: 'Mine.' },
    });
    expect(await change(administrator, 1, 'Theirs.')).toMatchObject({ outcome: 'changed' });
    expect(await findAssignment(teacher, classId, id)).toMatchObject({
      version: 2,
      note: 'Theirs.',
    });
  });

  it('is done by one of two who save at the same time', async () => {
    const room = await makeRoom();
    const id = await set(room);
    const results = await Promise.all(
      ['One', 'Two', 'Three', 'Four'].map((note) =>
        updateAssignment(room.teacher, room.classId, id, 0, { ...wanted, note }, now),
      ),
    );
    expect(results.map(({ outcome }) => outcome).sort()).toEqual([
      'changed',
      'changed meanwhile',
      'changed meanwhile',
      'changed meanwhile',
    ]);
    expect(
      await countRows('audit_entries', "action = 'work changed' and object_id = $1", [id]),
    ).toBe(1);
  });

  it('adds and takes out exercises, but none that has answers', async () => {
    const room = await makeRoom();
    const id = await set(room, { lessons: ['pantograph'] });
    await answer(room.one, now);
    const change = (version: number, changes: Partial<NewAssignment>) =>
      updateAssignment(room.teacher, room.classId, id, version, { ...wanted, ...changes }, now);
    const refused = await change(0, { exercises: ['oval-from-pins'] });
    expect(refused).toMatchObject({ outcome: 'has answers', titles: [expect.any(String)] });
    expect(await countRows('assignment_items', 'assignment_id = $1', [id])).toBe(7);
    expect(await change(0, { exercises: [exerciseId, 'oval-from-pins'] })).toMatchObject({
      outcome: 'changed',
    });
    const found = await findAssignment(room.teacher, room.classId, id);
    expect(found?.chosen).toEqual({ lessons: [], exercises: [exerciseId, 'oval-from-pins'] });
  });

  it('tells only those who are new to it', async () => {
    const room = await makeRoom();
    const id = await set(room, { learners: [room.one.learnerId] });
    const letters = () => countRows('letters', "data ->> 'assignmentId' = $1", [id]);
    expect(await letters()).toBe(1);
    await updateAssignment(room.teacher, room.classId, id, 0, wanted, now);
    expect(await letters()).toBe(2);
    await updateAssignment(room.teacher, room.classId, id, 1, { ...wanted, note: 'Again.' }, now);
    expect(await letters()).toBe(2);
  });

  it('never uncounts: a lower limit holds for the attempts that come', async () => {
    const room = await makeRoom();
    const id = await set(room);
    for (let n = 1; n <= 3; n += 1) {
      expect(outcomes(await answer(room.one, now))).toEqual([`counted ${n}`]);
    }
    await updateAssignment(
      room.teacher,
      room.classId,
      id,
      0,
      { ...wanted, attemptsAllowed: 1 },
      now,
    );
    expect(outcomes(await answer(room.one, now))).toEqual(['none left 3']);
    expect(outcomes(await answer(room.other, now))).toEqual(['counted 1']);
    expect(outcomes(await answer(room.other, now))).toEqual(['none left 1']);
    expect(await countRows('counted_attempts', 'learner_id = $1', [room.one.learnerId])).toBe(3);
  });

  it('lets a due moment that has passed stay, and moves it to none that has', async () => {
    const room = await makeRoom();
    const id = await set(room);
    const later = at('2026-11-20T12:00:00Z');
    const change = (version: number, changes: Partial<NewAssignment>) =>
      updateAssignment(room.teacher, room.classId, id, version, { ...wanted, ...changes }, later);
    expect((await change(0, { note: 'Too late for most.' })).outcome).toBe('changed');
    expect((await change(1, { dueOn: '2026-11-12' })).outcome).toBe('due in the past');
    expect((await change(1, { dueOn: '2026-11-21' })).outcome).toBe('changed');
    expect((await change(2, { dueOn: '2026-11-21', lessons: [], exercises: [] })).outcome).toBe(
      'nothing chosen',
    );
    expect((await change(2, { dueOn: '2026-11-21', learners: [] })).outcome).toBe('nobody chosen');
  });

  it('keeps what was done when it is taken back, and takes no more', async () => {
    const room = await makeRoom();
    const id = await set(room);
    await answer(room.one, now);
    expect(await withdrawAssignment(room.teacher, room.classId, id, now)).toBe(true);
    expect(await withdrawAssignment(room.teacher, room.classId, id, now)).toBe(false);
    expect(await answer(room.one, now)).toEqual([]);
    expect(await countRows('counted_attempts', 'learner_id = $1', [room.one.learnerId])).toBe(1);
    const [listed] = await listAssignments(room.teacher, room.classId);
    expect(listed).toMatchObject({ withdrawn: true });
    expect(await findAssignment(room.teacher, room.classId, id)).toMatchObject({ answers: 1 });
    expect((await updateAssignment(room.teacher, room.classId, id, 1, wanted, now)).outcome).toBe(
      'no such work',
    );
  });
});

describe('late work and more time', () => {
  const after = at('2026-11-11T00:00:01Z');

  it('is marked late or does not count, as the rule says, to the second', async () => {
    const marked = await makeRoom();
    await set(marked);
    expect(outcomes(await answer(marked.one, at('2026-11-11T00:00:00Z')))).toEqual(['counted 1']);
    expect(outcomes(await answer(marked.one, after))).toEqual(['counted 2 late']);
    const closed = await makeRoom();
    await set(closed, { lateWork: 'closed' });
    expect(outcomes(await answer(closed.one, after))).toEqual(['closed 0 late']);
    expect(await countRows('counted_attempts', 'learner_id = $1', [closed.one.learnerId])).toBe(0);
    expect(await countRows('attempts', 'learner_id = $1', [closed.one.learnerId])).toBe(1);
  });

  it('is given to one learner, changed and taken back', async () => {
    const room = await makeRoom();
    const id = await set(room, { lateWork: 'closed' });
    const give = (dueOn: string, learnerId = room.one.learnerId) =>
      giveExtension(room.teacher, room.classId, id, { learnerId, dueOn, dueTime: '' }, now);
    expect(await give('2026-11-10')).toEqual({ outcome: 'not later' });
    expect((await give('2026-11-12')).outcome).toBe('given');
    expect(await give('2026-11-14')).toEqual({
      outcome: 'given',
      dueAt: '2026-11-15T00:00:00.000Z',
    });
    expect(await give('2026-11-14', workshop.stranger.learnerId)).toEqual({
      outcome: 'no such learner',
    });
    expect(outcomes(await answer(room.one, after))).toEqual(['counted 1']);
    expect(outcomes(await answer(room.other, after))).toEqual(['closed 0 late']);
    expect((await findToday(room.one, after)).set[0]).toMatchObject({
      dueAt: '2026-11-15T00:00:00.000Z',
    });
    const found = await findAssignment(room.teacher, room.classId, id);
    expect(found?.extensions).toEqual([
      {
        learnerId: room.one.learnerId,
        name: 'Ann One',
        dueAt: '2026-11-15T00:00:00.000Z',
        givenBy: 'Tess Teacher',
      },
    ]);
    const { learnerId } = room.one;
    expect(await takeBackExtension(room.one, room.classId, id, learnerId)).toBe(false);
    expect(await takeBackExtension(room.teacher, room.classId, id, learnerId)).toBe(true);
    expect(await takeBackExtension(room.teacher, room.classId, id, learnerId)).toBe(false);
    expect(outcomes(await answer(room.one, after))).toEqual(['closed 1 late']);
    const audited = await rows<{ action: string }>(
      "select action from audit_entries where class_id = $1 and action like 'extension%' order by id",
      [room.classId],
    );
    expect(audited.map(({ action }) => action)).toEqual([
      'extension given',
      'extension given',
      'extension taken back',
    ]);
  });

  it('is never less than everybody has, when the whole moves later', async () => {
    const room = await makeRoom();
    const id = await set(room);
    const time = { learnerId: room.one.learnerId, dueOn: '2026-11-12', dueTime: '' };
    await giveExtension(room.teacher, room.classId, id, time, now);
    const moved = { ...wanted, dueOn: '2026-11-20' };
    await updateAssignment(room.teacher, room.classId, id, 0, moved, now);
    expect(outcomes(await answer(room.one, at('2026-11-18T12:00:00Z')))).toEqual(['counted 1']);
  });
});

describe('what an attempt counts for', () => {
  it('is each class that asks for the exercise, by its own rules', async () => {
    const [here, there] = [await makeRoom(), await makeRoom()];
    const both = await makeViewer('Bo Both', [
      [here.classId, 'learner'],
      [there.classId, 'learner'],
    ]);
    await set(here, { attemptsAllowed: 1 });
    await set(there, { dueOn: '2026-11-11' });
    expect(outcomes(await answer(both, now))).toEqual(['counted 1', 'counted 1']);
    expect(outcomes(await answer(both, now))).toEqual(['none left 1', 'counted 2']);
    await removeMember(there.teacher, there.classId, both.personId);
    expect(outcomes(await answer(both, now))).toEqual(['none left 1']);
  });

  it('is exactly as many as allowed under fifty parallel posts, late ones and with more time', async () => {
    const room = await makeRoom();
    const id = await set(room, { attemptsAllowed: 4 });
    const time = { learnerId: room.one.learnerId, dueOn: '2026-11-12', dueTime: '' };
    await giveExtension(room.teacher, room.classId, id, time, now);
    const moment = at('2026-11-11T12:00:00Z');
    for (const viewer of [room.one, room.other]) {
      const { roundId } = await mustOpen(viewer, exerciseId, moment);
      const request = await requestFor(roundId, 'slipped');
      const sent = await Promise.all(
        Array.from({ length: 50 }, () => createAttempt(viewer, request, randomUUID(), moment)),
      );
      const told = sent.flatMap((one) => (one.outcome === 'kept' ? one.reply.counting : []));
      const late = viewer === room.other ? ' late' : '';
      expect(
        outcomes(told)
          .filter((said) => said.startsWith('counted'))
          .sort(),
      ).toEqual([1, 2, 3, 4].map((n) => `counted ${n}${late}`));
      expect(outcomes(told).filter((said) => said === `none left 4${late}`)).toHaveLength(46);
      const counted = 'learner_id = $1 and n between 1 and 4 and late = $2';
      expect(await countRows('counted_attempts', counted, [viewer.learnerId, late !== ''])).toBe(4);
      expect(await countRows('attempts', 'learner_id = $1', [viewer.learnerId])).toBe(50);
    }
  }, 120_000);

  it('is told again, the same, when the request comes again', async () => {
    const room = await makeRoom();
    await set(room, { attemptsAllowed: 1 });
    const { roundId } = await mustOpen(room.one, exerciseId, now);
    const request = await requestFor(roundId, 'slipped');
    const key = randomUUID();
    const first = await createAttempt(room.one, request, key, now);
    const second = await createAttempt(room.one, request, key, now);
    expect(second).toEqual({ ...first, repeated: true });
    expect(first).toMatchObject({
      reply: { counting: [{ outcome: 'counted', n: 1, allowed: 1, late: false }] },
    });
  });

  it('keeps the time of the device beside the server’s, which alone decides what is late', async () => {
    const room = await makeRoom();
    await set(room, { dueOn: '2026-11-10' });
    const moment = at('2026-11-12T08:00:00Z');
    const { roundId } = await mustOpen(room.one, exerciseId, moment);
    const request = await requestFor(roundId, 'slipped');
    const answeredAt = '2026-11-10T20:00:00Z';
    const sent = await createAttempt(room.one, { ...request, answeredAt }, randomUUID(), moment);
    if (sent.outcome !== 'kept') throw new Error(sent.outcome);
    expect(outcomes(sent.reply.counting)).toEqual(['counted 1 late']);
    const kept = await models().Attempt.findByPk(sent.reply.attempt.attemptId);
    expect(kept?.answeredAt?.toISOString()).toBe('2026-11-10T20:00:00.000Z');
    expect(kept?.createdAt.toISOString()).toBe('2026-11-12T08:00:00.000Z');
  });
});
