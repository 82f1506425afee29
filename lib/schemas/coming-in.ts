import { z } from 'zod';
import { email, personName } from './person';

/** A password that is being chosen: how good it is is looked at where it is kept. */
export const newPassword = z
  .string()
  .min(1, 'Type a password.')
  .max(1000, 'That is longer than we can take.');

/** Somebody new, who accepts an invitation. */
export const newAccountSchema = z.strictObject({ name: personName, password: newPassword });

/** A forgotten password: whose. */
export const forgottenSchema = z.strictObject({ email });

const word = z
  .string()
  .trim()
  .min(1, 'Type the joining word of the class.')
  .max(100, 'A joining word is shorter than that.');

/** Joining with a word, by somebody who is signed in. */
export const joiningWordSchema = z.strictObject({ word });

/** Joining with a word, by somebody who has no account or is not signed in. */
export const joiningSchema = z.strictObject({ word, name: personName, email });

/** The people of a list that was looked through, as they are sent back to be invited. */
export const inviteesSchema = z
  .array(
    z.strictObject({
      line: z.int().min(1),
      email,
      name: z.union([personName, z.null()]),
    }),
  )
  .min(1)
  .max(200);
