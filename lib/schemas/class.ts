import { z } from 'zod';
import { email, timeZone } from './person';

const day = z
  .union([z.literal(''), z.iso.date('Choose a day; it looks like 2026-12-08.')])
  .transform((typed) => (typed === '' ? null : typed));

const name = z
  .string()
  .trim()
  .min(1, 'Type a name for the class.')
  .max(100, 'A name may have 100 characters at most.');

/** What a class is called, where its clock hangs, and from when until when it meets. */
export const classSchema = z
  .strictObject({ name, timeZone, startsOn: day, endsOn: day })
  .refine(({ startsOn, endsOn }) => startsOn === null || endsOn === null || endsOn >= startsOn, {
    path: ['endsOn'],
    message: 'The last day cannot lie before the first.',
  });

/** Somebody to be put into a class. */
export const newMemberSchema = z.strictObject({
  email,
  role: z.enum(['learner', 'instructor'], 'Choose learner or instructor.'),
});

/** Whether the last instructor of a class may go too. */
export const takeOutSchema = z.strictObject({
  evenTheLast: z.enum(['yes', 'no']).transform((said) => said === 'yes'),
});
