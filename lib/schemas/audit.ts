import { z } from 'zod';

const said = z.string().trim().max(100);
const unset = (value: unknown) => (value === '' ? undefined : value);

/** Which lines of the audit log are looked for; what is empty is not looked for. */
export const auditQuerySchema = z.strictObject({
  person: z.preprocess(unset, said.optional()),
  action: z.preprocess(unset, said.optional()),
  objectKind: z.preprocess(unset, said.optional()),
  classId: z.preprocess(unset, z.uuid('Choose a class from the list.').optional()),
  from: z.preprocess(unset, z.iso.date('Choose a day; it looks like 2026-12-08.').optional()),
  to: z.preprocess(unset, z.iso.date('Choose a day; it looks like 2026-12-08.').optional()),
  before: z.preprocess(
    unset,
    z
      .string()
      .regex(/^\d{1,18}$/, 'That page is not there.')
      .optional(),
  ),
});
