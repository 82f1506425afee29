import 'server-only';
import type { ClassProgress } from '@/lib/schemas/class-progress';

/**
 * The progress of a class without anything that tells who is who, for the projector: numbers for
 * names, no ids of people or of answers, in an order that tells nothing.
 */
export function hideNames(progress: ClassProgress): ClassProgress {
  return {
    ...progress,
    learners: [...progress.learners]
      .sort((one, other) => (one.learnerId < other.learnerId ? -1 : 1))
      .map(({ lessons }, place) => ({
        learnerId: String(place + 1),
        name: `Learner ${place + 1}`,
        lessons: lessons.map(({ exercises, ...lesson }) => ({
          ...lesson,
          exercises: exercises.map((cell) => ({ ...cell, attemptId: null })),
        })),
      })),
  };
}
