import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { queueAssignmentLetters } from '@/lib/data/assignment-letters';
import { createAttempt } from '@/lib/data/attempts';
import { claimLetter } from '@/lib/data/entry/letter-delivery';
import { remindOfDueWork } from '@/lib/data/entry/due-reminders';
import { summariseWeeks } from '@/lib/data/entry/weekly-summaries';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import {
  countRows,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  setExercise,
  type Workshop,
} from '../support/workshop';

const proof = { by: 'job', job: 'test' } as const;
const oval = 'oval-from-pins';
const pins = 'pins-for-an-oval';
let workshop: Workshop;

beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());
beforeEach(async () => {
  await rows('delete from letters returning id');
  await rows('update assignments set withdrawn_at = opens_at returning id');
});

interface Queued {
  readonly kind: string;
  readonly to: string;
  readonly data: Readonly<Record<string, unknown>>;
}

function queued(): Promise<Queued[]> {
  return rows<Queued>(
    'select kind, p.name as "to", data from letters w join people p on p.id = w.person_id order by p.name, w.created_at',
  );
}

async function readers(): Promise<string[]> {
  return (await queued()).map(({ to }) => to);
}

/** Sets an exercise to the harbour and answers the assignment's id. */
async function set(
  exerciseId: string,
  rules: { dueAt: Date; opensAt?: Date; attemptsAllowed?: number; lateWork?: 'marked' | 'closed' },
  by = workshop.instructor,
): Promise<string> {
  const opensAt = rules.opensAt ?? new Date(rules.dueAt.getTime() - 20 * 86_400_000);
  const itemId = await setExercise(workshop.harbour, by, exerciseId, { ...rules, opensAt });
  const item = await row<{ id: string }>(
    'select assignment_id as id from assignment_items where id = $1',
    [itemId],
  );
  return item?.id ?? '';
}

async function answer(viewer: Viewer, exerciseId: string, how: 'right' | 'slipped', at: Date) {
  const { roundId } = await mustOpen(viewer, exerciseId, at);
  const answered = await createAttempt(viewer, await requestFor(roundId, how), randomUUID(), at);
  if (answered.outcome !== 'kept') throw new Error(answered.outcome);
}

/** The harbour is in London: in winter its clocks show UTC. */
const nine = new Date('2026-12-07T09:05:00Z');
const tomorrowEvening = new Date('2026-12-08T18:30:00Z');

describe('work that is set', () => {
  it('is told to every learner of the class who wants to know, once', async () => {
    const { harbour } = workshop;
    const quiet = await makeViewer('Quentin Quiet', [[harbour, 'learner']]);
    const gone = await makeViewer('Gil Gone', [[harbour, 'learner']]);
    await models().Person.update({ wantsClassMail: false }, { where: { id: quiet.personId } });
    await models().Membership.update(
      { leftAt: new Date(Date.now() + 1000) },
      { where: { personId: gone.personId } },
    );
    const assignmentId = await set(oval, { dueAt: tomorrowEvening });
    expect(await transact((transaction) => queueAssignmentLetters(transaction, assignmentId))).toBe(
      2,
    );
    expect(await transact((transaction) => queueAssignmentLetters(transaction, assignmentId))).toBe(
      0,
    );
    expect(await readers()).toEqual(['Carl Classmate', 'Lena Learner']);
    expect((await queued())[0]).toMatchObject({
      kind: 'assignment-set',
      data: {
        className: 'The harbour',
        setBy: 'Iris Instructor',
        dueAt: '2026-12-08T18:30:00.000Z',
        work: [expect.stringMatching(/^[A-Z]/)],
      },
    });
    expect(await countRows('graphile_worker.jobs', "task_identifier = 'send-letter'")).toBe(2);
  });

  it('is told to the chosen only, and with the time that holds for each', async () => {
    const { learner, classmate, instructor } = workshop;
    const assignmentId = await set(oval, { dueAt: tomorrowEvening });
    await models().Assignment.update({ forChosenLearners: true }, { where: { id: assignmentId } });
    await rows('insert into assignment_learners values ($1, $2) returning 1 as n', [
      assignmentId,
      learner.learnerId,
    ]);
    await rows(
      `insert into extensions (assignment_id, learner_id, due_at, given_by)
       values ($1, $2, '2026-12-10T18:30:00Z', $3) returning 1 as n`,
      [assignmentId, learner.learnerId, instructor.personId],
    );
    await transact((transaction) => queueAssignmentLetters(transaction, assignmentId));
    const letters = await queued();
    expect(letters.map(({ to }) => to)).toEqual([learner.name]);
    expect(letters[0]?.data).toMatchObject({ dueAt: '2026-12-10T18:30:00.000Z' });
    expect(letters.map(({ to }) => to)).not.toContain(classmate.name);
  });

  it('is not told after all when it was withdrawn, and told as it stands when it was moved', async () => {
    const first = await set(oval, { dueAt: tomorrowEvening });
    await transact((transaction) => queueAssignmentLetters(transaction, first));
    const [letter] = await rows<{ id: string }>('select id from letters order by id');
    await rows(
      "update assignments set due_at = '2026-12-20T18:30:00Z' where id = $1 returning id",
      [first],
    );
    const claimed = await claimLetter(proof, letter?.id ?? '', new Date());
    expect(claimed?.letter).toMatchObject({ dueAt: '2026-12-20T18:30:00.000Z' });
    await rows('update assignments set withdrawn_at = now() where id = $1 returning id', [first]);
    expect(await claimLetter(proof, letter?.id ?? '', new Date())).toBeNull();
    expect(
      await countRows(
        'letters',
        "state = 'dropped' and last_error = 'The work was withdrawn, or is no longer set to them.'",
      ),
    ).toBe(1);
  });
});

describe('what is due tomorrow', () => {
  it('is told once to learners who have not done it, however often the job runs', async () => {
    await set(oval, { dueAt: tomorrowEvening });
    await answer(workshop.learner, oval, 'right', new Date('2026-12-05T12:00:00Z'));
    expect(await remindOfDueWork(proof, nine)).toBe(1);
    expect(await remindOfDueWork(proof, nine)).toBe(0);
    expect(await remindOfDueWork(proof, new Date('2026-12-07T22:00:00Z'))).toBe(0);
    expect(await queued()).toMatchObject([
      {
        kind: 'due-tomorrow',
        to: 'Carl Classmate',
        data: { className: 'The harbour', dueAt: '2026-12-08T18:30:00.000Z' },
      },
    ]);
  });

  it('is told from nine in the morning of the class, by its own calendar', async () => {
    await set(pins, { dueAt: tomorrowEvening });
    expect(await remindOfDueWork(proof, new Date('2026-12-07T08:59:00Z'))).toBe(0);
    expect(await remindOfDueWork(proof, new Date('2026-12-06T09:05:00Z'))).toBe(0);
    expect(await remindOfDueWork(proof, new Date('2026-12-08T09:05:00Z'))).toBe(0);
    await rows(
      "update class_groups set time_zone = 'Pacific/Auckland' where id = $1 returning id",
      [workshop.harbour],
    );
    // Due at 07:30 on the 9th there; at 20:30 UTC it is half past nine on the 8th.
    expect(await remindOfDueWork(proof, new Date('2026-12-07T19:00:00Z'))).toBe(0);
    expect(await remindOfDueWork(proof, new Date('2026-12-07T20:30:00Z'))).toBe(2);
    await rows("update class_groups set time_zone = 'Europe/London' where id = $1 returning id", [
      workshop.harbour,
    ]);
  });

  it('takes midnight for the end of a day, also where the clock changes', async () => {
    // London goes back on 25 October: midnight between the 25th and the 26th is 00:00 UTC.
    await set(oval, { dueAt: new Date('2026-10-26T00:00:00Z') });
    // On the morning before the 25th, clocks are still an hour ahead.
    for (const [at, letters] of [
      ['2026-10-25T10:00:00Z', 0],
      ['2026-10-24T07:59:00Z', 0],
      ['2026-10-24T08:00:00Z', 2],
    ] as const) {
      expect(await remindOfDueWork(proof, new Date(at))).toBe(letters);
    }
  });

  it('follows extensions, and tells again for the new date', async () => {
    const { classmate, instructor } = workshop;
    const assignmentId = await set(oval, { dueAt: tomorrowEvening });
    expect(await remindOfDueWork(proof, nine)).toBe(2);
    await rows(
      `insert into extensions (assignment_id, learner_id, due_at, given_by)
       values ($1, $2, '2026-12-10T18:30:00Z', $3) returning 1 as n`,
      [assignmentId, classmate.learnerId, instructor.personId],
    );
    expect(await remindOfDueWork(proof, nine)).toBe(0);
    expect(await remindOfDueWork(proof, new Date('2026-12-09T09:05:00Z'))).toBe(1);
    expect(await readers()).toEqual(['Carl Classmate', 'Carl Classmate', 'Lena Learner']);
  });

  it('concerns nobody who was not chosen, has left, is disabled, or wants no letters', async () => {
    const { harbour, classmate } = workshop;
    const left = await makeViewer('Leo Left', [[harbour, 'learner']]);
    const disabled = await makeViewer('Dan Disabled', [[harbour, 'learner']]);
    const quiet = await makeViewer('Una Unwilling', [[harbour, 'learner']]);
    await set(pins, { dueAt: tomorrowEvening });
    await rows('update memberships set left_at = now() where person_id = $1 returning id', [
      left.personId,
    ]);
    await models().Person.update({ disabledAt: new Date() }, { where: { id: disabled.personId } });
    await models().Person.update({ wantsClassMail: false }, { where: { id: quiet.personId } });
    const chosen = await set(oval, { dueAt: tomorrowEvening });
    await models().Assignment.update({ forChosenLearners: true }, { where: { id: chosen } });
    await remindOfDueWork(proof, nine);
    expect(await readers()).toEqual(['Carl Classmate', 'Lena Learner']);
    await rows('insert into assignment_learners values ($1, $2) returning 1 as n', [
      chosen,
      classmate.learnerId,
    ]);
    expect(await remindOfDueWork(proof, nine)).toBe(1);
  });

  it('is not told when it was withdrawn, has not opened, or allows no further attempt', async () => {
    const withdrawn = await set(pins, { dueAt: tomorrowEvening });
    await models().Assignment.update({ withdrawnAt: nine }, { where: { id: withdrawn } });
    await set(pins, { dueAt: tomorrowEvening, opensAt: new Date('2026-12-07T12:00:00Z') });
    expect(await remindOfDueWork(proof, nine)).toBe(0);
    await set(pins, { dueAt: tomorrowEvening, attemptsAllowed: 1 });
    await answer(workshop.learner, pins, 'slipped', new Date('2026-12-05T13:00:00Z'));
    await remindOfDueWork(proof, nine);
    expect(await readers()).toEqual(['Carl Classmate']);
  });

  it('is not told when an instructor has overridden the marking to right', async () => {
    const { learner, instructor, harbour } = workshop;
    await set(pins, { dueAt: tomorrowEvening });
    await answer(learner, pins, 'slipped', new Date('2026-12-05T14:00:00Z'));
    await remindOfDueWork(proof, nine);
    expect(await readers()).toContain('Lena Learner');
    await rows('delete from letters returning id');
    await rows(
      `insert into overrides (attempt_id, class_id, author_id, verdict, reason)
       select attempt_id, $1, $2, 'right', 'measured by hand' from counted_attempts
       where learner_id = $3 returning id`,
      [harbour, instructor.personId, learner.learnerId],
    );
    await remindOfDueWork(proof, nine);
    expect(await readers()).toEqual(['Carl Classmate']);
  });
});

describe('the weekly summary', () => {
  const monday = new Date('2026-12-14T07:10:00Z');

  it('tells instructors who answered, who sent nothing, late work, slips and what is due', async () => {
    const { learner } = workshop;
    await set(oval, { dueAt: new Date('2026-12-09T18:30:00Z') });
    await set(pins, { dueAt: new Date('2026-12-16T18:30:00Z') });
    await answer(learner, oval, 'slipped', new Date('2026-12-10T12:00:00Z'));
    await answer(learner, pins, 'right', new Date('2026-12-10T13:00:00Z'));
    // Not of this week.
    await answer(learner, oval, 'right', new Date('2026-12-14T00:30:00Z'));
    expect(await summariseWeeks(proof, monday)).toBe(1);
    const [letter] = await queued();
    expect(letter).toMatchObject({
      kind: 'weekly-summary',
      to: 'Iris Instructor',
      data: {
        className: 'The harbour',
        from: '2026-12-07',
        to: '2026-12-13',
        answered: [{ name: 'Lena Learner', answers: 2 }],
        quiet: ['Carl Classmate', 'Quentin Quiet', 'Una Unwilling'],
        late: [{ name: 'Lena Learner', answers: 1 }],
        slips: [{ times: 1, advice: expect.stringMatching(/\w+/) as string }],
        due: [{ dueAt: '2026-12-16T18:30:00.000Z' }],
      },
    });
  });

  it('comes once a week, on Monday from seven by the class’s clock, or on Tuesday', async () => {
    await set(oval, { dueAt: new Date('2026-12-16T18:30:00Z') });
    for (const early of ['2026-12-13T12:00:00Z', '2026-12-14T06:59:00Z', '2026-12-16T09:00:00Z']) {
      expect(await summariseWeeks(proof, new Date(early))).toBe(0);
    }
    expect(await summariseWeeks(proof, new Date('2026-12-15T23:00:00Z'))).toBe(1);
    expect(await summariseWeeks(proof, monday)).toBe(0);
    expect(await summariseWeeks(proof, new Date('2026-12-21T07:10:00Z'))).toBe(1);
  });

  it('goes to everyone who teaches the class, and to nobody else', async () => {
    await makeViewer('Cora Colleague', [[workshop.harbour, 'instructor']]);
    await rows(
      "update memberships set joined_at = '2026-12-01' where joined_at > now() - interval '1 day' returning id",
    );
    await set(oval, { dueAt: new Date('2026-12-16T18:30:00Z') });
    await summariseWeeks(proof, monday);
    expect(await readers()).toEqual(['Cora Colleague', 'Iris Instructor']);
  });

  it('is not written for a class with nothing to tell', async () => {
    expect(await summariseWeeks(proof, monday)).toBe(0);
    expect(await countRows('letters')).toBe(0);
  });
});
