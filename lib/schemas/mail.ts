import { z } from 'zod';

/** How a letter stands. */
export const letterStates = ['waiting', 'sent', 'failed', 'dropped'] as const;
export type LetterState = (typeof letterStates)[number];

/** Whether letters about classes are wanted. */
export const mailPreferenceSchema = z.strictObject({
  classMail: z.enum(['yes', 'no'], 'Choose yes or no.').transform((said) => said === 'yes'),
});

const given = z.string().trim().max(254).catch('');

/** What part of the mail log is asked for; what makes no sense asks for everything. */
export const mailFilterSchema = z.object({
  state: z.enum(letterStates).nullable().catch(null),
  kind: given,
  address: given,
  after: z.uuid().nullable().catch(null),
});
export type MailFilter = z.output<typeof mailFilterSchema>;
