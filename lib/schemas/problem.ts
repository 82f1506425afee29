import * as z from 'zod/mini';

/** What went wrong, as RFC 9457 says it. */
export const problemSchema = z.strictObject({
  type: z.literal('about:blank'),
  title: z.string(),
  status: z.int().check(z.minimum(400), z.maximum(599)),
  detail: z.optional(z.string()),
  /** Under which the surprise is in the log. */
  id: z.optional(z.uuid()),
  /** Field by field, what is wrong with the body. */
  errors: z.optional(z.array(z.strictObject({ field: z.string(), message: z.string() }))),
});
export type Problem = z.infer<typeof problemSchema>;
