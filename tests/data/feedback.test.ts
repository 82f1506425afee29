import { randomUUID } from 'node:crypto';
import { mean, sampleCorrelation } from 'simple-statistics';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createAssignment } from '@/lib/data/assignments';
import { updateAssignment } from '@/lib/data/assignment-change';
import { createAttempt } from '@/lib/data/attempts';
import { exportClassProgress } from '@/lib/data/class-csv';
import { findClassProgress } from '@/lib/data/class-progress';
import { findClassVersion } from '@/lib/data/class-version';
import { findAttemptInClass, findLearnerInClass } from '@/lib/data/class-work';
import { giveExtension } from '@/lib/data/extensions';
import {
  addComment,
  countUnread,
  listFeedback,
  overrideMarking,
  readFeedback,
} from '@/lib/data/feedback';
import { hideNames } from '@/lib/data/hidden-names';
import { exerciseTitle } from '@/lib/data/lesson-titles';
import { listPegs } from '@/lib/data/progress';
import { findStickingPoints } from '@/lib/data/sticking-points';
import { findToday } from '@/lib/data/today';
import { addWorkComment } from '@/lib/data/work-comments';
import type { Viewer } from '@/lib/policy/viewer';
import { classProgressSchema } from '@/lib/schemas/class-progress';
import { models } from '@/models';
import {
  countRows,
  makeClass,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  setExercise,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const exerciseId = 'edging-strip';

interface Room {
  readonly classId: string;
  readonly teacher: Viewer;
  readonly learner: Viewer;
}

async function makeRoom(name = 'Ann One'): Promise<Room> {
  const classId = await makeClass(`Room ${randomUUID().slice(0, 8)}`);
  return {
    classId,
    teacher: await makeViewer('Tess Teacher', [[classId, 'instructor']]),
    learner: await makeViewer(name, [[classId, 'learner']]),
  };
}

async function attempt(
  viewer: Viewer,
  how: 'right' | 'slipped',
  id = exerciseId,
  now = new Date(),
): Promise<string> {
  const { roundId } = await mustOpen(viewer, id, now);
  const sent = await createAttempt(viewer, await requestFor(roundId, how), randomUUID(), now);
  if (sent.outcome !== 'kept') throw new Error(sent.outcome);
  return sent.reply.attempt.attemptId;
}

async function cellOf({ teacher, classId }: Room) {
  const progress = await findClassProgress(teacher, classId);
  return progress?.learners[0]?.lessons[0]?.exercises[0];
}

const others = ({ learner, stranger, otherInstructor }: Workshop) => [
  learner,
  stranger,
  otherInstructor,
];

describe('comments', () => {
  it('are made by the staff of the class on answers that count for it, and by nobody else', async () => {
    const room = await makeRoom();
    const practice = await attempt(room.learner, 'slipped');
    await setExercise(room.classId, room.teacher, exerciseId);
    const counted = await attempt(room.learner, 'slipped');
    for (const viewer of [...others(workshop), room.learner, workshop.instructor]) {
      expect(await addComment(viewer, room.classId, counted, 'Hello.')).toBe(false);
    }
    expect(await addComment(room.teacher, room.classId, practice, 'Hello.')).toBe(false);
    expect(await addComment(room.teacher, workshop.harbour, counted, 'Hello.')).toBe(false);
    expect(await addComment(room.teacher, room.classId, randomUUID(), 'Hello.')).toBe(false);
    expect(await addComment(room.teacher, room.classId, 'nothing', 'Hello.')).toBe(false);
    expect(await addComment(workshop.administrator, room.classId, counted, 'Hello.')).toBe(true);
  });

  it('reach the learner alone, who is written to once until they have read', async () => {
    const room = await makeRoom();
    await setExercise(room.classId, room.teacher, exerciseId);
    const counted = await attempt(room.learner, 'slipped');
    const letters = () =>
      countRows('letters', "kind = 'comment' and person_id = $1", [room.learner.personId]);
    await addComment(room.teacher, room.classId, counted, 'First line.\nSecond <b>line</b>.');
    await addComment(room.teacher, room.classId, counted, 'One more thing.');
    expect(await letters()).toBe(1);
    expect(await countUnread(room.learner)).toBe(2);
    const told = await listFeedback(room.learner);
    expect(told.map(({ body }) => body)).toEqual([
      'One more thing.',
      'First line.\nSecond <b>line</b>.',
    ]);
    expect(told[0]).toMatchObject({ kind: 'comment', authorName: 'Tess Teacher', unread: true });
    expect(await listFeedback(workshop.learner)).toEqual([]);
    await readFeedback(workshop.learner);
    expect(await countUnread(room.learner)).toBe(2);
    await readFeedback(room.learner);
    expect(await countUnread(room.learner)).toBe(0);
    const opened = await findAttemptInClass(room.teacher, room.classId, counted);
    expect(opened?.comments.map(({ readAt }) => readAt !== null)).toEqual([true, true]);
    await addComment(room.teacher, room.classId, counted, 'And another.');
    expect(await letters()).toBe(2);
  });
});

describe('a comment on work as a whole', () => {
  it('is made by the staff of the class on work set to a learner of it, and reaches that learner', async () => {
    const room = await makeRoom();
    const other = await makeViewer('Zed Zero', [[room.classId, 'learner']]);
    const set = await createAssignment(room.teacher, room.classId, {
      lessons: [],
      exercises: [exerciseId],
      dueOn: '2099-01-01',
      learners: [room.learner.learnerId],
    });
    const assignmentId = set.outcome === 'set' ? set.assignmentId : '';
    const about = { learnerId: room.learner.learnerId, assignmentId };
    const say = (viewer: Viewer, changes: Partial<typeof about> = {}, classId = room.classId) =>
      addWorkComment(viewer, classId, { ...about, ...changes }, 'Good joints.');
    for (const viewer of [...others(workshop), room.learner, workshop.instructor]) {
      expect(await say(viewer)).toBe(false);
    }
    expect(await say(room.teacher, { learnerId: other.learnerId })).toBe(false);
    expect(await say(room.teacher, { assignmentId: randomUUID() })).toBe(false);
    expect(await say(room.teacher, { assignmentId: '..' })).toBe(false);
    expect(await say(workshop.instructor, {}, workshop.harbour)).toBe(false);
    expect(await say(room.teacher)).toBe(true);
    expect(await say(workshop.administrator)).toBe(true);
    const letters = "kind = 'comment' and person_id = $1";
    expect(await countRows('letters', letters, [room.learner.personId])).toBe(1);
    expect(await countUnread(room.learner)).toBe(2);
    expect(await listFeedback(other)).toEqual([]);
    const told = await listFeedback(room.learner);
    expect(told).toHaveLength(2);
    expect(told[1]).toMatchObject({
      kind: 'comment',
      title: exerciseTitle(exerciseId),
      authorName: 'Tess Teacher',
      marked: null,
      body: 'Good joints.',
      unread: true,
    });
    await readFeedback(room.learner);
    const seen = await findLearnerInClass(room.teacher, room.classId, about.learnerId);
    expect(seen?.work).toHaveLength(1);
    expect(seen?.work[0]).toMatchObject({ assignmentId, titles: [exerciseTitle(exerciseId)] });
    expect(seen?.work[0]?.comments.map(({ readAt }) => readAt !== null)).toEqual([true, true]);
    const theirs = await findLearnerInClass(room.teacher, room.classId, other.learnerId);
    expect(theirs?.work).toEqual([]);
    await models().ClassGroup.update({ archivedAt: new Date() }, { where: { id: room.classId } });
    expect(await say(room.teacher)).toBe(false);
  });
});

describe('a marking that is overridden', () => {
  it('stands in the class’s figures and Today, keeps what was marked, and moves no peg', async () => {
    const room = await makeRoom();
    await setExercise(room.classId, room.teacher, exerciseId);
    const counted = await attempt(room.learner, 'slipped');
    const before = await listPegs(room.learner);
    for (const viewer of [...others(workshop), room.learner]) {
      const wanted = { verdict: 'right', reason: 'Because.' } as const;
      expect(await overrideMarking(viewer, room.classId, counted, wanted)).toBe('no such attempt');
    }
    const override = (verdict: 'right' | 'wrong') =>
      overrideMarking(room.teacher, room.classId, counted, { verdict, reason: 'Measured so.' });
    expect(await override('wrong')).toBe('stands so already');
    expect(await override('right')).toBe('overridden');
    expect(await override('right')).toBe('stands so already');
    expect(await cellOf(room)).toMatchObject({ mark: 'right', overridden: true });
    expect((await findToday(room.learner)).set[0]).toMatchObject({ done: 1 });
    const opened = await findAttemptInClass(room.teacher, room.classId, counted);
    expect(opened).toMatchObject({
      attempt: { verdict: 'wrong' },
      overrides: [{ verdict: 'right', reason: 'Measured so.', authorName: 'Tess Teacher' }],
    });
    const listed = await findLearnerInClass(room.teacher, room.classId, room.learner.learnerId);
    expect(listed?.attempts[0]).toMatchObject({ verdict: 'right' });
    expect(await listFeedback(room.learner)).toMatchObject([
      { kind: 'override', marked: 'wrong', verdict: 'right', body: 'Measured so.' },
    ]);
    expect(await listPegs(room.learner)).toEqual(before);
    const lines = "action = 'marking overridden' and object_id = $1";
    expect(await countRows('audit_entries', lines, [counted])).toBe(1);
  });

  it('holds in its own class only', async () => {
    const [here, there] = [await makeRoom(), await makeRoom()];
    const both = await makeViewer('Bo Both', [
      [here.classId, 'learner'],
      [there.classId, 'learner'],
    ]);
    for (const room of [here, there]) await setExercise(room.classId, room.teacher, exerciseId);
    const counted = await attempt(both, 'slipped');
    const wanted = { verdict: 'right', reason: 'Here it is.' } as const;
    await overrideMarking(here.teacher, here.classId, counted, wanted);
    const markIn = async (room: Room) => {
      const progress = await findClassProgress(room.teacher, room.classId);
      const row = progress?.learners.find(({ name }) => name === 'Bo Both');
      return row?.lessons[0]?.exercises[0]?.mark;
    };
    expect([await markIn(here), await markIn(there)]).toEqual(['right', 'wrong']);
  });
});

describe('what stands in the progress of a class', () => {
  it('is the best attempt, or the latest where the rule says so', async () => {
    const room = await makeRoom();
    await setExercise(room.classId, room.teacher, exerciseId);
    await attempt(room.learner, 'right');
    const latest = await attempt(room.learner, 'slipped');
    expect(await cellOf(room)).toMatchObject({ mark: 'right', attempts: 2 });
    await models().Assignment.update({ counting: 'latest' }, { where: { classId: room.classId } });
    expect(await cellOf(room)).toMatchObject({ mark: 'wrong', attemptId: latest, attempts: 2 });
  });

  it('is late until more time covers it, and never late because the due moment moved back', async () => {
    const room = await makeRoom();
    const now = new Date();
    const day = 86_400_000;
    const dueAt = new Date(now.getTime() - 3600_000);
    const itemId = await setExercise(room.classId, room.teacher, exerciseId, { dueAt });
    const item = await models().AssignmentItem.findByPk(itemId, { rejectOnEmpty: true });
    await attempt(room.learner, 'slipped', exerciseId, now);
    expect(await cellOf(room)).toMatchObject({ late: true });
    const seen = async () => {
      const listed = await findLearnerInClass(room.teacher, room.classId, room.learner.learnerId);
      const [first] = listed?.attempts ?? [];
      const opened = await findAttemptInClass(room.teacher, room.classId, first?.attemptId ?? '');
      return [first?.late, opened?.late];
    };
    expect(await seen()).toEqual([true, true]);
    await giveExtension(room.teacher, room.classId, item.assignmentId, {
      learnerId: room.learner.learnerId,
      dueOn: new Date(now.getTime() + day).toISOString().slice(0, 10),
      dueTime: '',
    });
    expect(await cellOf(room)).toMatchObject({ late: false });
    expect(await seen()).toEqual([false, false]);
    const other = await makeRoom();
    await setExercise(other.classId, other.teacher, exerciseId);
    await attempt(other.learner, 'slipped', exerciseId, now);
    const moved = { dueAt: new Date(now.getTime() - 60_000) };
    await models().Assignment.update(moved, { where: { classId: other.classId } });
    expect(await cellOf(other)).toMatchObject({ late: false });
  });

  it('is not set to those for whom it is not, and says so', async () => {
    const room = await makeRoom();
    const other = await makeViewer('Zed Zero', [[room.classId, 'learner']]);
    const wanted = { lessons: [], exercises: [exerciseId], dueOn: '2099-01-01' };
    await createAssignment(room.teacher, room.classId, {
      ...wanted,
      learners: [room.learner.learnerId],
    });
    const marks = async () =>
      (await findClassProgress(room.teacher, room.classId))?.learners.map(
        ({ lessons }) => lessons[0]?.exercises[0]?.mark,
      );
    expect(await marks()).toEqual(['none', 'not set']);
    await attempt(other, 'right');
    expect(await marks()).toEqual(['none', 'not set']);
    await createAssignment(room.teacher, room.classId, wanted);
    expect(await marks()).toEqual(['none', 'none']);
  });

  it('tells without names nothing of who is who', async () => {
    const room = await makeRoom();
    const other = await makeViewer('Zed Zero', [[room.classId, 'learner']]);
    await setExercise(room.classId, room.teacher, exerciseId);
    const counted = await attempt(room.learner, 'slipped');
    const progress = await findClassProgress(room.teacher, room.classId);
    const hidden = progress === null ? null : hideNames(progress);
    expect(classProgressSchema.parse(hidden)).toEqual(hidden);
    expect(hidden?.learners.map(({ name }) => name)).toEqual(['Learner 1', 'Learner 2']);
    const marks = hidden?.learners.map(({ lessons }) => lessons[0]?.exercises[0]?.mark);
    expect(marks?.sort()).toEqual(['none', 'wrong']);
    const told = JSON.stringify(hidden);
    for (const one of [room.learner, other]) {
      for (const secret of [one.name, one.learnerId, one.personId, counted]) {
        expect(told).not.toContain(secret);
      }
    }
  });

  it('keeps both times of an answer that waited, and offers nothing to say in a class put away', async () => {
    const room = await makeRoom();
    await setExercise(room.classId, room.teacher, exerciseId);
    const answeredAt = new Date(Date.now() - 3_600_000).toISOString();
    const { roundId } = await mustOpen(room.learner, exerciseId);
    const request = { ...(await requestFor(roundId, 'right')), answeredAt };
    await createAttempt(room.learner, request, randomUUID());
    const look = () => findLearnerInClass(room.teacher, room.classId, room.learner.learnerId);
    const found = await look();
    expect(found).toMatchObject({ archived: false, attempts: [{ answeredAt }] });
    const archivedAt = new Date();
    await models().ClassGroup.update({ archivedAt }, { where: { id: room.classId } });
    expect(await look()).toMatchObject({ archived: true });
    const [first] = found?.attempts ?? [];
    const opened = await findAttemptInClass(room.teacher, room.classId, first?.attemptId ?? '');
    expect(opened).toMatchObject({ archived: true, answeredAt });
  });

  it('has a version that changes with an answer, an override, a rule and a name, and for its staff only', async () => {
    const room = await makeRoom();
    const versions: (string | null)[] = [];
    const look = async () => {
      versions.push(await findClassVersion(room.teacher, room.classId));
    };
    await look();
    const itemId = await setExercise(room.classId, room.teacher, exerciseId);
    await look();
    const counted = await attempt(room.learner, 'slipped');
    await look();
    const wanted = { verdict: 'right', reason: 'So.' } as const;
    await overrideMarking(room.teacher, room.classId, counted, wanted);
    await look();
    await attempt(room.learner, 'right', 'oval-from-pins');
    await look();
    const item = await models().AssignmentItem.findByPk(itemId, { rejectOnEmpty: true });
    const rules = { lessons: [], exercises: [exerciseId], dueOn: '2099-01-01' };
    await updateAssignment(room.teacher, room.classId, item.assignmentId, 0, rules);
    await look();
    await makeViewer('New Comer', [[room.classId, 'learner']]);
    await look();
    expect(new Set(versions).size).toBe(7);
    expect(await findClassVersion(room.teacher, room.classId)).toBe(versions.at(-1));
    for (const viewer of [...others(workshop), room.learner]) {
      expect(await findClassVersion(viewer, room.classId)).toBeNull();
    }
    expect(await findClassVersion(room.teacher, '..')).toBeNull();
  });

  it('is taken away as CSV with its formulas guarded, and that is in the audit log', async () => {
    const room = await makeRoom('=HYPERLINK("x") Ann');
    await setExercise(room.classId, room.teacher, exerciseId);
    await attempt(room.learner, 'right');
    const csv = await exportClassProgress(room.teacher, room.classId);
    const [head, line] = csv?.split('\r\n') ?? [];
    expect(head).toBe('Learner,Lesson,Exercise,Mark,Attempts,Late,Override');
    expect(line).toMatch(/^"'=HYPERLINK\(""x""\) Ann",The trammel and the oval,.+,right,1,,$/);
    expect(await exportClassProgress(room.learner, room.classId)).toBeNull();
    expect(await exportClassProgress(workshop.otherInstructor, room.classId)).toBeNull();
    const lines = "action = 'class progress exported' and class_id = $1";
    expect(await countRows('audit_entries', lines, [room.classId])).toBe(1);
  });
});

describe('where a class is stuck', () => {
  it('tells each slip with who made it, as it was typed, and the section to show again', async () => {
    const room = await makeRoom();
    await setExercise(room.classId, room.teacher, 'pins-for-an-oval');
    await attempt(room.learner, 'slipped', 'pins-for-an-oval');
    const counted = await attempt(room.learner, 'slipped', 'pins-for-an-oval');
    const sticking = await findStickingPoints(room.teacher, room.classId);
    const [point] = sticking?.points ?? [];
    expect(point).toMatchObject({
      exerciseId: 'pins-for-an-oval',
      learners: 1,
      times: 2,
      showAgain: { lesson: 'The trammel and the oval', label: 'Rule' },
    });
    expect(point?.showAgain?.path).toBe('/lessons/drawing-and-copying/trammel-and-oval#rule');
    expect(point?.answers[0]).toMatchObject({ attemptId: counted, name: 'Ann One' });
    const kept = await models().Attempt.findByPk(counted, { rejectOnEmpty: true });
    const typed = Object.values((kept.response as { answers: Record<string, string> }).answers);
    expect(typed).toContain(point?.answers[0]?.typed);
    for (const viewer of [...others(workshop), room.learner]) {
      expect(await findStickingPoints(viewer, room.classId)).toBeNull();
    }
    expect(await findStickingPoints(room.teacher, '..')).toBeNull();
  });

  it('reckons first attempts as simple-statistics and a hand do, and says when they are too few', async () => {
    const classId = await makeClass('The long bench');
    const teacher = await makeViewer('Tina Teacher', [[classId, 'instructor']]);
    const ids = ['oval-from-pins', 'edging-strip', 'pins-for-an-oval'] as const;
    for (const id of ids) await setExercise(classId, teacher, id);
    const first: number[][] = [];
    for (let n = 0; n < 32; n += 1) {
      const viewer = await makeViewer(`Pat${n}`, [[classId, 'learner']]);
      const did = [n % 3 === 0, n % 4 < 2, n % 5 === 1].map(Number);
      for (const [place, id] of ids.entries()) {
        if (place === 2 && n >= 8) continue;
        await attempt(viewer, did[place] === 1 ? 'right' : 'slipped', id);
        // What comes after the first attempt says nothing here.
        if (n === 0) await attempt(viewer, 'right', id);
      }
      first.push(n < 8 ? did : did.slice(0, 2));
    }
    const items = new Map(
      (await findStickingPoints(teacher, classId))?.items.map((item) => [item.exerciseId, item]),
    );
    for (const [place, id] of ids.entries()) {
      const sat = first.filter((row) => row.length > place);
      const x = sat.map((row) => row[place] ?? 0);
      const rest = sat.map((row) => mean(row.filter((_, other) => other !== place)));
      const item = items.get(id);
      expect(item?.n).toBe(x.length);
      expect(item?.tooFew).toBe(place === 2);
      const p = mean(x);
      expect(Math.abs((item?.shareRight ?? NaN) - p)).toBeLessThan(1e-12);
      expect(Math.abs((item?.itemRest ?? NaN) - sampleCorrelation(x, rest))).toBeLessThan(1e-12);
      const [z, n] = [1.959963984540054, x.length];
      const middle = (p + (z * z) / (2 * n)) / (1 + (z * z) / n);
      const half = (z * Math.sqrt((p * (1 - p)) / n + (z * z) / (4 * n * n))) / (1 + (z * z) / n);
      expect(Math.abs((item?.from ?? NaN) - (middle - half))).toBeLessThan(1e-12);
      expect(Math.abs((item?.to ?? NaN) - (middle + half))).toBeLessThan(1e-12);
    }
    // By hand, 11 right of 32 (Wilson, 1927): from 0.2040 to 0.5169.
    expect(items.get('oval-from-pins')?.from).toBeCloseTo(0.204, 3);
    expect(items.get('oval-from-pins')?.to).toBeCloseTo(0.517, 3);
  }, 120_000);
});
