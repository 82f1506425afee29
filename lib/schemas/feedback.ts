import { z } from 'zod';

/** A comment: plain text, its lines kept. */
export const commentSchema = z.strictObject({
  body: z
    .string()
    .trim()
    .min(1, 'Write something first.')
    .max(4000, 'A comment may have 4000 characters at most.'),
});

/** A marking otherwise than it was marked. */
export const overrideSchema = z.strictObject({
  verdict: z.enum(['right', 'partly', 'wrong'], 'Choose how it stands.'),
  reason: z
    .string()
    .trim()
    .min(1, 'Say why: the learner reads it.')
    .max(2000, 'A reason may have 2000 characters at most.'),
});
