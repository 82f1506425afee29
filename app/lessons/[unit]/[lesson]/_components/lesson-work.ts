import 'server-only';
import { exercises, lessons } from '@/content/exercises/registry';
import { findLessonProgress } from '@/lib/data/progress';
import { listRounds } from '@/lib/data/rounds';
import type { Viewer } from '@/lib/policy/viewer';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { PegView, RoundView } from '@/lib/schemas/round';
import { sampleRound } from './sample';

/** What the page knows of one exercise and this reader. */
export interface ExerciseWork {
  readonly id: string;
  readonly title: string;
  readonly skills: readonly string[];
  readonly round: RoundView | null;
  readonly sample: RoundView | null;
}

/** What the page knows of this reader's work at a lesson. */
export interface LessonWork {
  readonly exercises: readonly ExerciseWork[];
  /** Whether the prediction is stored, which opens the bench. */
  readonly predicted: boolean;
  readonly pegs: readonly PegView[];
}

/** The rounds and pegs of a lesson for its reader; samples for somebody who is not signed in. */
export async function findLessonWork(
  lessonId: string,
  viewer: Viewer | null,
  units: UnitSystem,
): Promise<LessonWork> {
  const entry = lessons.find((lesson) => lesson.id === lessonId);
  if (entry === undefined) return { exercises: [], predicted: false, pegs: [] };
  const ids = [entry.prediction, ...entry.exercises];
  const [rounds, progress] =
    viewer === null
      ? [[], null]
      : await Promise.all([listRounds(viewer, ids, units), findLessonProgress(viewer, lessonId)]);
  return {
    exercises: ids.flatMap((id) => {
      const definition = exercises.get(id);
      if (definition === undefined) return [];
      const { title, skills } = definition;
      const round = rounds.find((one) => one.exerciseId === id) ?? null;
      const sample = viewer === null ? sampleRound(id, units) : null;
      return [{ id, title, skills, round, sample }];
    }),
    predicted: progress?.predicted ?? false,
    pegs: progress?.pegs ?? [],
  };
}
