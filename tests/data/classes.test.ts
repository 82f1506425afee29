import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listAssignments } from '@/lib/data/assignment-list';
import { createAssignment, withdrawAssignment } from '@/lib/data/assignments';
import { createAttempt } from '@/lib/data/attempts';
import { findClassProgress } from '@/lib/data/class-progress';
import { findAttemptInClass, findLearnerInClass } from '@/lib/data/class-work';
import { removeMember } from '@/lib/data/class-people';
import { findClass, listClasses } from '@/lib/data/classes';
import { findFreshKey } from '@/lib/data/exercise-key';
import { findLessonProgress, listPegs } from '@/lib/data/progress';
import { findToday } from '@/lib/data/today';
import { database } from '@/lib/db/connection';
import type { Viewer } from '@/lib/policy/viewer';
import { classProgressSchema } from '@/lib/schemas/class-progress';
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

const exerciseId = 'oval-from-pins';
const lessonId = 'trammel-and-oval';
const nextMonth = new Date(Date.now() + 30 * 86_400_000).toISOString().slice(0, 10);

async function attempt(viewer: Viewer, id: string, how: 'right' | 'slipped'): Promise<string> {
  const { roundId } = await mustOpen(viewer, id);
  const result = await createAttempt(viewer, await requestFor(roundId, how), randomUUID());
  if (result.outcome !== 'kept') throw new Error(result.outcome);
  return result.reply.attempt.attemptId;
}

/** Everybody who must not see what belongs to the harbour's staff. */
function outsiders({ learner, classmate, stranger, otherInstructor }: Workshop): Viewer[] {
  return [learner, classmate, stranger, otherInstructor];
}

describe('classes', () => {
  it('are listed to those who are in them, and all of them to the administrator', async () => {
    const names = async (viewer: Viewer) =>
      (await listClasses(viewer)).map(({ name, role }) => `${name}: ${role}`);
    expect(await names(workshop.learner)).toEqual(['The harbour: learner']);
    expect(await names(workshop.otherInstructor)).toEqual(['The quay: instructor']);
    expect(await names(workshop.administrator)).toEqual(['The harbour: null', 'The quay: null']);
  });

  it('show themselves to their staff only, and look missing to anybody else', async () => {
    for (const viewer of [workshop.instructor, workshop.administrator]) {
      expect(await findClass(viewer, workshop.harbour)).toMatchObject({
        name: 'The harbour',
        instructors: ['Iris Instructor'],
        learners: 2,
        archived: false,
        joiningWord: null,
      });
    }
    for (const viewer of outsiders(workshop)) {
      expect(await findClass(viewer, workshop.harbour)).toBeNull();
    }
    expect(await findClass(workshop.administrator, randomUUID())).toBeNull();
    expect(await findClass(workshop.administrator, 'not-an-id')).toBeNull();
  });
});

describe('setting work', () => {
  it('sets a lesson as all of its exercises, due at the end of a day in the time of the class', async () => {
    const classId = await makeClass('The ropewalk');
    const teacher = await makeViewer('Tess Teacher', [[classId, 'instructor']]);
    const learner = await makeViewer('Lou Learner', [[classId, 'learner']]);
    const result = await createAssignment(teacher, classId, {
      lessons: [lessonId, 'no-such-lesson'],
      exercises: [exerciseId, 'middle-wheel'],
      dueOn: nextMonth,
      note: ' Bring callipers. ',
    });
    expect(result.outcome).toBe('set');
    const [listed] = await listAssignments(teacher, classId);
    expect(listed).toMatchObject({ note: 'Bring callipers.', done: 0, learners: 1 });
    expect(listed?.titles).toEqual(['The trammel and the oval']);
    expect(listed?.exercises).toBe(6);
    const today = await findToday(learner);
    expect(today.set).toHaveLength(1);
    expect(today.set[0]?.exercises).toHaveLength(6);
    expect(today.set[0]).toMatchObject({ overdue: false, done: 0, className: 'The ropewalk' });
    await attempt(learner, exerciseId, 'right');
    const after = await findToday(learner);
    expect(after.set[0]).toMatchObject({ done: 1 });
    expect(after.last).toMatchObject({ exerciseId, open: false });
    expect((await findToday(teacher)).set).toEqual([]);
    const withdrawn = result.outcome === 'set' ? result.assignmentId : '';
    expect(await withdrawAssignment(learner, classId, withdrawn)).toBe(false);
    expect(await withdrawAssignment(teacher, classId, withdrawn)).toBe(true);
    expect((await findToday(learner)).set).toEqual([]);
    expect(await countRows('counted_attempts', 'learner_id = $1', [learner.learnerId])).toBe(1);
  });

  it('is refused to others, for the past, and when nothing is chosen', async () => {
    const wanted = { lessons: [lessonId], exercises: [], dueOn: nextMonth };
    for (const viewer of outsiders(workshop)) {
      expect(await createAssignment(viewer, workshop.harbour, wanted)).toEqual({
        outcome: 'no such class',
      });
      expect(await listAssignments(viewer, workshop.harbour)).toEqual([]);
    }
    const { instructor, harbour } = workshop;
    expect(await createAssignment(instructor, harbour, { ...wanted, dueOn: '2020-01-01' })).toEqual(
      { outcome: 'due in the past' },
    );
    expect(await createAssignment(instructor, harbour, { ...wanted, lessons: [] })).toEqual({
      outcome: 'nothing chosen',
    });
  });
});

describe('the progress of a class', () => {
  it('holds the pegs and marks of its learners, the best attempt first', async () => {
    const classId = await makeClass('The loft');
    const teacher = await makeViewer('Theo Teacher', [[classId, 'instructor']]);
    const learner = await makeViewer('Abe Able', [[classId, 'learner']]);
    const idle = await makeViewer('Ida Idle', [[classId, 'learner']]);
    await setExercise(classId, teacher, exerciseId);
    await setExercise(classId, teacher, exerciseId);
    await attempt(learner, exerciseId, 'slipped');
    const best = await attempt(learner, exerciseId, 'right');
    await attempt(teacher, exerciseId, 'right');
    const progress = await findClassProgress(teacher, classId);
    expect(classProgressSchema.parse(progress)).toEqual(progress);
    expect(progress?.lessons.map(({ title }) => title)).toEqual(['The trammel and the oval']);
    expect(progress?.learners.map(({ name }) => name)).toEqual(['Abe Able', 'Ida Idle']);
    const [able, nobody] = progress?.learners ?? [];
    expect(able?.lessons[0]?.exercises).toEqual([
      { exerciseId, mark: 'right', attempts: 2, attemptId: best, late: false, overridden: false },
    ]);
    expect(able?.lessons[0]?.pegs.map(({ state }) => state)).toEqual([
      'started',
      'open',
      'open',
      'started',
      'open',
    ]);
    expect(nobody?.learnerId).toBe(idle.learnerId);
    expect(nobody?.lessons[0]?.exercises[0]).toMatchObject({ mark: 'none', attemptId: null });
  });

  it('is for its instructors and the administrator, and looks missing to anybody else', async () => {
    for (const viewer of [workshop.instructor, workshop.administrator]) {
      expect(await findClassProgress(viewer, workshop.harbour)).not.toBeNull();
    }
    for (const viewer of outsiders(workshop)) {
      expect(await findClassProgress(viewer, workshop.harbour)).toBeNull();
    }
    expect(await findClassProgress(workshop.instructor, randomUUID())).toBeNull();
    expect(await findClassProgress(workshop.instructor, '../people')).toBeNull();
  });

  it('takes the same number of queries for two learners and for forty', async () => {
    const classId = await makeClass('The shed');
    const teacher = await makeViewer('Tina Teacher', [[classId, 'instructor']]);
    await setExercise(classId, teacher, exerciseId);
    const few = await queriesOf(() => findClassProgress(teacher, classId));
    for (let n = 0; n < 40; n += 1) await makeViewer(`Many${n}`, [[classId, 'learner']]);
    const many = await queriesOf(() => findClassProgress(teacher, classId));
    expect(few).toBe(2);
    expect(many).toBe(2);
  });
});

describe("a learner's work in a class", () => {
  it('opens from the class to the learner and to the attempt with all about it', async () => {
    const { harbour, instructor, learner } = workshop;
    await setExercise(harbour, instructor, 'pins-for-an-oval');
    const counted = await attempt(learner, 'pins-for-an-oval', 'slipped');
    const found = await findLearnerInClass(instructor, harbour, learner.learnerId);
    expect(found).toMatchObject({ name: 'Lena Learner', className: 'The harbour' });
    expect(found?.attempts.map(({ attemptId }) => attemptId)).toEqual([counted]);
    const opened = await findAttemptInClass(instructor, harbour, counted);
    expect(opened?.givens.length).toBeGreaterThan(0);
    expect(opened?.attempt.parts.some(({ slip }) => slip !== undefined)).toBe(true);
    expect(opened?.response).toHaveProperty('answers');
    expect(opened).toMatchObject({ late: false, unaided: true, solutionSeen: false });
  });

  it('is not there for others, nor an attempt that does not count for the class', async () => {
    const { harbour, quay, instructor, otherInstructor, learner, administrator } = workshop;
    await setExercise(harbour, instructor, 'grooves-and-bar');
    const counted = await attempt(learner, 'grooves-and-bar', 'slipped');
    const uncounted = await attempt(learner, 'edging-strip', 'slipped');
    for (const viewer of outsiders(workshop)) {
      expect(await findLearnerInClass(viewer, harbour, learner.learnerId)).toBeNull();
      expect(await findAttemptInClass(viewer, harbour, counted)).toBeNull();
    }
    expect(await findAttemptInClass(instructor, harbour, uncounted)).toBeNull();
    expect(await findAttemptInClass(administrator, harbour, uncounted)).toBeNull();
    expect(await findAttemptInClass(otherInstructor, quay, counted)).toBeNull();
    expect(await findLearnerInClass(otherInstructor, quay, learner.learnerId)).toBeNull();
    expect(await findAttemptInClass(instructor, harbour, randomUUID())).toBeNull();
  });

  it('is not there any more once the learner has left', async () => {
    const { harbour, instructor, administrator } = workshop;
    const leaver = await makeViewer('Leo Leaver', [[harbour, 'learner']]);
    await setExercise(harbour, instructor, 'edging-strip');
    const counted = await attempt(leaver, 'edging-strip', 'right');
    expect(await findAttemptInClass(instructor, harbour, counted)).not.toBeNull();
    await removeMember(administrator, harbour, leaver.personId);
    expect(await findAttemptInClass(instructor, harbour, counted)).toBeNull();
    expect(await findLearnerInClass(instructor, harbour, leaver.learnerId)).toBeNull();
  });

  it('leaves a line in the audit log when the administrator looks, and none when the instructor does', async () => {
    const { harbour, instructor, administrator, classmate } = workshop;
    const lines = () => countRows('audit_entries', "action = 'learner''s work viewed'");
    const before = await lines();
    await findLearnerInClass(instructor, harbour, classmate.learnerId);
    expect(await lines()).toBe(before);
    await findLearnerInClass(administrator, harbour, classmate.learnerId);
    expect(await lines()).toBe(before + 1);
  });
});

describe("one's own progress", () => {
  it('is of oneself alone', async () => {
    const one = await makeViewer('Solo One', []);
    const other = await makeViewer('Solo Other', []);
    await attempt(one, 'move-the-pen-out', 'slipped');
    await attempt(one, exerciseId, 'right');
    const own = await findLessonProgress(one, lessonId);
    expect(own).toMatchObject({ predicted: true });
    expect(own?.exercises[0]).toMatchObject({
      exerciseId,
      mark: 'right',
      attempts: 1,
      open: false,
    });
    const theirs = await findLessonProgress(other, lessonId);
    expect(theirs).toMatchObject({ predicted: false });
    expect(theirs?.exercises[0]).toMatchObject({ mark: 'none', attempts: 0 });
    expect((await listPegs(other)).every(({ state }) => state === 'open')).toBe(true);
    expect(await findLessonProgress(one, 'no-such-lesson')).toBeNull();
  });

  it('goes home after three right unaided on two dates in the time zone of the person', async () => {
    const viewer = await makeViewer('Homer Home', []);
    const moments = ['2026-05-04T20:00:00Z', '2026-05-04T21:00:00Z', '2026-05-04T23:30:00Z'];
    for (const moment of moments) {
      const now = new Date(moment);
      const { roundId } = await mustOpen(viewer, exerciseId, now);
      await createAttempt(viewer, await requestFor(roundId, 'right'), randomUUID(), now);
    }
    const peg = async (timeZone: string) =>
      (await listPegs({ ...viewer, timeZone }, new Date('2026-05-06T12:00:00Z'))).find(
        ({ skill }) => skill === 'oval.size',
      )?.state;
    // In London the third was after midnight; in New York it was the same evening.
    expect(await peg('Europe/London')).toBe('home');
    expect(await peg('America/New_York')).toBe('started');
  });
});

describe('answers and slips', () => {
  it('are for instructors and administrators', () => {
    const { instructor, administrator, learner } = workshop;
    for (const viewer of [instructor, administrator]) {
      expect(findFreshKey(viewer, exerciseId)?.parts[0]?.slips.length).toBeGreaterThan(1);
    }
    expect(findFreshKey(learner, exerciseId)).toBeNull();
    expect(findFreshKey(instructor, 'no-such-exercise')).toBeNull();
  });
});

/** How many statements the work sends to the database. */
async function queriesOf(work: () => Promise<unknown>): Promise<number> {
  let sent = 0;
  // Sequelize keeps the options it was made with, which its types leave out.
  const { options } = database() as unknown as { options: { logging: unknown } };
  const before = options.logging;
  options.logging = () => {
    sent += 1;
  };
  await work();
  options.logging = before;
  return sent;
}
