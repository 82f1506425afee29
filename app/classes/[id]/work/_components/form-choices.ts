import { listLessons } from '@/content/lessons/front-matter';
import { exercises, lessons } from '@/content/exercises/registry';
import type { AssignmentFound } from '@/lib/data/assignment-list';
import { sayMoment } from '@/lib/data/class-time';
import { dateIn, now, timeIn } from '@/lib/clock';
import type {
  AssignmentState,
  AssignmentValues,
  Difference,
  FormChoices,
} from './assignment-state';

/** The lessons, in the order in which they are read, with the exercises that can be set. */
export function lessonChoices(): FormChoices['lessons'] {
  return listLessons().flatMap(({ id, title }) => {
    const entry = lessons.find((lesson) => lesson.id === id);
    if (entry === undefined) return [];
    return {
      lessonId: id,
      title,
      exercises: entry.exercises.flatMap((exerciseId) => {
        const definition = exercises.get(exerciseId);
        return definition ? [{ exerciseId, title: definition.title }] : [];
      }),
    };
  });
}

const WEEK = 7 * 24 * 60 * 60 * 1000;

/** What stands in the form for new work: due in a week, in the evening, for everybody. */
export function newValues(timeZone: string): AssignmentValues {
  return {
    lesson: '',
    exercise: '',
    for: 'everybody',
    learner: '',
    opensOn: '',
    opensTime: '',
    dueOn: dateIn(timeZone, new Date(now().getTime() + WEEK)),
    dueTime: '18:30',
    attemptsAllowed: '',
    counting: 'best',
    lateWork: 'marked',
    note: '',
    tell: 'yes',
    version: '0',
  };
}

/** What stands in the form for work that is set. */
export function valuesOf(work: AssignmentFound, timeZone: string): AssignmentValues {
  const opens = new Date(work.opensAt);
  const due = sayMoment(timeZone, new Date(work.dueAt));
  return {
    lesson: work.chosen.lessons.join(' '),
    exercise: work.chosen.exercises.join(' '),
    for: work.learners === null ? 'everybody' : 'chosen',
    learner: (work.learners ?? []).join(' '),
    opensOn: dateIn(timeZone, opens),
    opensTime: timeIn(timeZone, opens),
    dueOn: due.on,
    dueTime: due.time,
    attemptsAllowed: work.attemptsAllowed === null ? '' : String(work.attemptsAllowed),
    counting: work.counting,
    lateWork: work.lateWork,
    note: work.note,
    tell: 'yes',
    version: String(work.version),
  };
}

const words: Readonly<Partial<Record<keyof AssignmentValues, string>>> = {
  lesson: 'Lessons',
  exercise: 'Single exercises',
  for: 'For whom',
  learner: 'Chosen',
  opensOn: 'Opens on',
  opensTime: 'Opens at',
  dueOn: 'Due on',
  dueTime: 'Due at',
  attemptsAllowed: 'Attempts that count',
  counting: 'What counts',
  lateWork: 'Late work',
  note: 'Note',
};

/** In what two versions differ, said as it stands on the screen. */
function differencesOf(
  yours: Readonly<Record<string, string>>,
  theirs: AssignmentValues,
  names: ReadonlyMap<string, string>,
): Difference[] {
  const say = (value: string) =>
    value
      .split(' ')
      .map((word) => names.get(word) ?? word)
      .join(names.has(value.split(' ')[0] ?? '') ? '\n' : ' ') || '–';
  return Object.entries(words).flatMap(([name, what]) => {
    const mine = yours[name] ?? '';
    const other = theirs[name as keyof AssignmentValues];
    if (inOrder(mine) === inOrder(other)) return [];
    return [{ what, yours: say(mine), theirs: say(other) }];
  });
}

function inOrder(value: string): string {
  return value.split(' ').sort().join(' ');
}

/** What the second of two editors is told: yours stays in the form, and both are set side by side. */
export function bothVersions(
  yours: Readonly<Record<string, string>>,
  current: AssignmentFound,
  timeZone = 'UTC',
): AssignmentState {
  const names = new Map([
    ...lessonChoices().flatMap(({ lessonId, title, exercises: own }) => [
      [lessonId, title] as const,
      ...own.map((one) => [one.exerciseId, one.title] as const),
    ]),
    ...current.inClass.map(({ learnerId, name }) => [learnerId, name] as const),
  ]);
  return {
    outcome: 'refused',
    message: 'Somebody else has changed this meanwhile. Nothing is saved yet.',
    version: current.version,
    differences: differencesOf(yours, valuesOf(current, timeZone), names),
    values: yours,
  };
}
