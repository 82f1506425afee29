import 'server-only';
import { exercises, lessons } from '@/content/exercises/registry';
import { lessonPath, listLessons } from '@/content/lessons/front-matter';
import type { Item } from './assignment-items';

/** A lesson as it is named in lists. */
export interface LessonName {
  readonly lessonId: string;
  readonly title: string;
  /** Where it is read. */
  readonly path: string;
}

/** How a lesson is named; a lesson that is no longer there keeps its id. */
export function lessonName(lessonId: string): LessonName {
  const lesson = listLessons().find(({ id }) => id === lessonId);
  return lesson === undefined
    ? { lessonId, title: lessonId, path: '/lessons' }
    : { lessonId, title: lesson.title, path: lessonPath(lesson) };
}

/** How an exercise is named. */
export function exerciseTitle(exerciseId: string): string {
  return exercises.get(exerciseId)?.title ?? exerciseId;
}

/** The lesson to which an exercise belongs, or null. */
export function lessonOfExercise(exerciseId: string): string | null {
  const listed = lessons.find((one) => one.exercises.includes(exerciseId));
  return listed?.id ?? exercises.get(exerciseId)?.lesson ?? null;
}

/** What is set, as it is read: each lesson once, and the exercises that were set by themselves. */
export function workTitles(items: readonly Item[]): string[] {
  const titles = items.map(({ lessonId, exerciseId }) =>
    lessonId === null ? exerciseTitle(exerciseId) : lessonName(lessonId).title,
  );
  return [...new Set(titles)];
}
