import 'server-only';
import { exercises, lessons } from '@/content/exercises/registry';

/** One exercise of an assignment, and the lesson with which it was set. */
export interface Item {
  readonly lessonId: string | null;
  readonly exerciseId: string;
}

/** The items of the assignment of this id (SQL of ours), in their order; null when it has none. */
export const itemsSql = (id: string) => `(
  select json_agg(json_build_object('lessonId', i.lesson_id, 'exerciseId', i.exercise_id)
    order by i.position) from assignment_items i where i.assignment_id = ${id})`;

/** What is set: lessons, each as all of its exercises, and single exercises beside them. */
export interface Chosen {
  readonly lessons: readonly string[];
  readonly exercises: readonly string[];
}

/**
 * The exercises that are meant, each once. What is not there is left out, and so is a prediction:
 * it is there to be wrong.
 */
export function itemsOf(chosen: Chosen): Item[] {
  const byLesson = chosen.lessons.flatMap((lessonId) =>
    (lessons.find(({ id }) => id === lessonId)?.exercises ?? []).map((exerciseId) => ({
      lessonId,
      exerciseId,
    })),
  );
  const alone = chosen.exercises.map((exerciseId) => ({ lessonId: null, exerciseId }));
  const once = new Map<string, Item>();
  for (const item of [...byLesson, ...alone]) {
    const definition = exercises.get(item.exerciseId);
    const settable = definition !== undefined && definition.kind !== 'prediction';
    if (settable && !once.has(item.exerciseId)) once.set(item.exerciseId, item);
  }
  return [...once.values()];
}

/** What was chosen, from the exercises it came to. */
export function chosenOf(items: readonly Item[]): Chosen {
  return {
    lessons: [...new Set(items.flatMap(({ lessonId }) => lessonId ?? []))],
    exercises: items.flatMap(({ lessonId, exerciseId }) => (lessonId === null ? exerciseId : [])),
  };
}
