import { z } from 'zod';

const oneId = z.string().regex(/^[a-z0-9-]{1,60}$/, 'Choose from the list.');
const day = z.iso.date('Choose a day; it looks like 2026-12-08.');
const time = z.union([
  z.literal(''),
  z.iso.time({ precision: -1, error: 'Choose a time; it looks like 18:30.' }),
]);

/** How many attempts count: a whole number, or nothing for any number. */
const attemptsAllowed = z
  .string()
  .trim()
  .regex(/^(|[1-9]\d?|100)$/, 'Type a whole number from 1 to 100, or nothing for any number.')
  .transform((typed) => (typed === '' ? null : Number(typed)));

/** Work that is set, as its form sends it; days and times are those of the clock of the class. */
export const assignmentSchema = z
  .strictObject({
    lesson: z.array(oneId).max(100),
    exercise: z.array(oneId).max(500),
    for: z.enum(['everybody', 'chosen'], 'Choose for whom it is.'),
    learner: z.array(z.uuid('Choose from the list.')).max(2000),
    opensOn: z.union([z.literal(''), day]),
    opensTime: time,
    dueOn: day,
    dueTime: time,
    attemptsAllowed,
    counting: z.enum(['best', 'latest'], 'Choose which attempt stands.'),
    lateWork: z.enum(['marked', 'closed'], 'Choose what happens to late work.'),
    note: z.string().trim().max(2000, 'A note may have 2000 characters at most.'),
    tell: z.array(z.literal('yes')).max(1),
    version: z.coerce.number().int().min(0),
  })
  .transform(({ lesson, exercise, learner, tell, ...rest }) => ({
    ...rest,
    lessons: lesson,
    exercises: exercise,
    learners: rest.for === 'everybody' ? null : learner,
    tell: tell.length > 0,
  }));

/** The fields of that form which may come several times. */
export const assignmentLists = ['lesson', 'exercise', 'learner', 'tell'] as const;

/** More time for one learner. */
export const extensionSchema = z.strictObject({
  learnerId: z.uuid('Choose a learner from the list.'),
  dueOn: day,
  dueTime: time,
});
