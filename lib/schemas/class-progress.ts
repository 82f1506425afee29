/**
 * What passes between the server and the browser about a class: each learner's pegs lesson by
 * lesson, and their marks exercise by exercise. Only attempts that count for the class's own
 * assignments are in it.
 */
import * as z from 'zod/mini';
import { pegStates } from './round';

/**
 * How far somebody is with an exercise; `none` before the first counted attempt, `not set` when what
 * asks for it is for others of the class.
 */
export const marks = ['none', 'not set', 'right', 'partly', 'wrong'] as const;

const pegSchema = z.strictObject({
  skill: z.string(),
  name: z.string(),
  state: z.enum(pegStates),
});

const exerciseColumnSchema = z.strictObject({ exerciseId: z.string(), title: z.string() });

const lessonColumnSchema = z.strictObject({
  lessonId: z.string(),
  title: z.string(),
  /** When it is due: a moment in ISO 8601, or null for a lesson without a date. */
  dueAt: z.nullable(z.string()),
  exercises: z.array(exerciseColumnSchema),
});

const exerciseCellSchema = z.strictObject({
  exerciseId: z.string(),
  mark: z.enum(marks),
  /** Counted attempts so far. */
  attempts: z.number(),
  /** The one that stands: the best or the latest, as the assignment says; null without names. */
  attemptId: z.nullable(z.string()),
  late: z.boolean(),
  /** Whether an instructor has marked it otherwise than it was marked. */
  overridden: z.boolean(),
});

const lessonCellSchema = z.strictObject({
  lessonId: z.string(),
  pegs: z.array(pegSchema),
  exercises: z.array(exerciseCellSchema),
});

/** A class's progress: one column a lesson that was set, one row a learner. */
export const classProgressSchema = z.strictObject({
  classId: z.string(),
  name: z.string(),
  timeZone: z.string(),
  lessons: z.array(lessonColumnSchema),
  learners: z.array(
    z.strictObject({
      learnerId: z.string(),
      name: z.string(),
      lessons: z.array(lessonCellSchema),
    }),
  ),
});
export type ClassProgress = z.infer<typeof classProgressSchema>;
export type LearnerProgress = ClassProgress['learners'][number];
export type LessonColumn = ClassProgress['lessons'][number];
export type ExerciseCell = z.infer<typeof exerciseCellSchema>;
export type Mark = (typeof marks)[number];
