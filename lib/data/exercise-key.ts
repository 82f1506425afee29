import 'server-only';
import { randomInt } from 'node:crypto';
import { exercises, lessons } from '@/content/exercises/registry';
import { answerKey, type AnswerKey } from '@/lib/marking/answer-key';
import { drawVariant } from '@/lib/marking/draw';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { exerciseTitle, lessonName } from './lesson-titles';

/** Answers and slips of a fresh variant. */
export interface FreshKey extends AnswerKey {
  readonly units: UnitSystem;
  readonly seed: number;
}

/**
 * The answers and slips of a variant drawn for this look, for instructors and administrators; null
 * for anybody else, and for an exercise that is not there.
 */
export function findFreshKey(
  viewer: Viewer,
  exerciseId: string,
  units: UnitSystem = viewer.units,
  seed: number = randomInt(2 ** 31),
): FreshKey | null {
  const definition = exercises.get(exerciseId);
  if (definition === undefined || !can(viewer, 'see answers and slips')) return null;
  return { ...answerKey(definition, drawVariant(definition, seed, units)), units, seed };
}

/** A lesson with the exercises of which there is a key. */
export interface LessonKeys {
  readonly lessonId: string;
  readonly title: string;
  readonly exercises: readonly { readonly exerciseId: string; readonly title: string }[];
}

/** What there are keys of, lesson by lesson, for instructors and administrators; null for others. */
export function listKeys(viewer: Viewer): readonly LessonKeys[] | null {
  if (!can(viewer, 'see answers and slips')) return null;
  return lessons.map((lesson) => ({
    lessonId: lesson.id,
    title: lessonName(lesson.id).title,
    exercises: [lesson.prediction, ...lesson.exercises]
      .filter((exerciseId) => exercises.has(exerciseId))
      .map((exerciseId) => ({ exerciseId, title: exerciseTitle(exerciseId) })),
  }));
}
