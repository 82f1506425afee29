import * as z from 'zod';

/**
 * Every kind of letter that the workshop writes, with what must be known to write it: plain JSON
 * that waits in the outbox. It names a link by its id alone; the secret is worked out when the
 * letter is written and is kept nowhere.
 */

const said = z.string().min(1).max(200);
const link = { linkId: z.uuid() };
const moment = z.iso.datetime();
const inClass = { className: said, timeZone: said };

const about = {
  /** Somebody is asked to come in: to the workshop, or to a class. */
  invitation: z.strictObject({
    kind: z.literal('invitation'),
    className: said.optional(),
    inviterName: said,
    ...link,
  }),
  /** An administrator made an account, or a new link to its password. */
  setPassword: z.strictObject({ kind: z.literal('set-password'), ...link }),
  resetPassword: z.strictObject({ kind: z.literal('reset-password'), ...link }),
  confirmAddress: z.strictObject({ kind: z.literal('confirm-address'), ...link }),
  /** To the new address: it takes the old one's place when the link is followed. */
  changeAddress: z.strictObject({ kind: z.literal('change-address'), ...link }),
  /** To the old address, once it has been replaced. */
  addressChanged: z.strictObject({ kind: z.literal('address-changed') }),
  passwordChanged: z.strictObject({ kind: z.literal('password-changed') }),
  /** Somebody wanted an account with an address that has one. */
  accountExists: z.strictObject({ kind: z.literal('account-exists'), className: said.optional() }),
  assignmentSet: z.strictObject({
    kind: z.literal('assignment-set'),
    assignmentId: z.uuid(),
    ...inClass,
    setBy: said,
    opensAt: moment,
    dueAt: moment,
    note: z.string().max(2000),
    /** Titles of the lessons and single exercises, as they are to be read. */
    work: z.array(said).min(1),
  }),
  dueTomorrow: z.strictObject({
    kind: z.literal('due-tomorrow'),
    assignmentId: z.uuid(),
    ...inClass,
    dueAt: moment,
    /** Titles of the exercises that are not done yet. */
    left: z.array(said).min(1),
  }),
  comment: z.strictObject({
    kind: z.literal('comment'),
    className: said,
    authorName: said,
    /** What the comment is about, such as an exercise's title. */
    subject: said,
    body: z.string().min(1).max(4000),
    /** The page where it can be read and answered. */
    path: z.string().regex(/^\/[a-z0-9/-]*$/),
  }),
  weeklySummary: z.strictObject({
    kind: z.literal('weekly-summary'),
    classId: z.uuid(),
    ...inClass,
    /** The first and the last day of the week, in the class's time zone. */
    from: z.iso.date(),
    to: z.iso.date(),
    answered: z.array(z.strictObject({ name: said, answers: z.int().min(1) })),
    /** Learners who have work set and sent nothing in that week. */
    quiet: z.array(said),
    late: z.array(z.strictObject({ name: said, answers: z.int().min(1) })),
    slips: z.array(z.strictObject({ exercise: said, advice: z.string(), times: z.int().min(1) })),
    due: z.array(z.strictObject({ work: said, dueAt: moment })),
  }),
} as const;

export const letterSchema = z.discriminatedUnion('kind', [
  about.invitation,
  about.setPassword,
  about.resetPassword,
  about.confirmAddress,
  about.changeAddress,
  about.addressChanged,
  about.passwordChanged,
  about.accountExists,
  about.assignmentSet,
  about.dueTomorrow,
  about.comment,
  about.weeklySummary,
]);

/** A letter to be written, by its kind. */
export type Letter = z.infer<typeof letterSchema>;
export type LetterKind = Letter['kind'];

/** A letter of one kind. */
export type LetterOf<Kind extends LetterKind> = Extract<Letter, { readonly kind: Kind }>;

/** A letter that carries a one-time link. */
export type LetterWithLink = Extract<Letter, { readonly linkId: string }>;

/** Every kind, in the order in which they are listed. */
export const letterKinds: readonly LetterKind[] = letterSchema.options.map(
  (option) => option.shape.kind.value,
);

/** What is sent only to those who want letters about their classes; all else their account needs. */
const aboutClasses: ReadonlySet<LetterKind> = new Set([
  'assignment-set',
  'due-tomorrow',
  'comment',
  'weekly-summary',
]);

/** Whether a letter is sent whatever its reader has chosen. */
export function isEssential(kind: LetterKind): boolean {
  return !aboutClasses.has(kind);
}
