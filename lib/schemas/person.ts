import { z } from 'zod';
import { unitSystems } from '@/lib/quantities/unit-system';

/** A person's name. */
export const personName = z
  .string()
  .trim()
  .min(1, 'Type a name.')
  .max(100, 'A name may have 100 characters at most.');

/** An address, as it is kept: without blanks around it and in small letters. */
export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'An address may have 254 characters at most.')
  .pipe(z.email('That is not an address; one looks like you@example.org.'));

/** A time zone by its IANA name. */
export const timeZone = z
  .string()
  .refine(isTimeZone, 'Choose a time zone from the list, such as Europe/London.');

function isTimeZone(zone: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}

/** Paper sizes, by their names in ISO 216 and ANSI Y14.1. */
export const papers = ['a4', 'a3', 'letter', 'tabloid'] as const;

const units = z.enum(unitSystems, 'Choose millimetres or inches.');

/** What an administrator says of a new person. */
export const newPersonSchema = z.strictObject({
  name: personName,
  email,
  isAdministrator: z.enum(['yes', 'no']).transform((said) => said === 'yes'),
});

/** What people may change about themselves. */
export const profileSchema = z.strictObject({
  name: personName,
  timeZone,
  units,
  paper: z.enum(papers, 'Choose a paper size from the list.'),
  reducedMotion: z.enum(['no', 'yes']).transform((said) => said === 'yes'),
});

/** Changing a password: the old one is the proof. */
export const passwordChangeSchema = z.strictObject({
  currentPassword: z.string().min(1, 'Type the password you have now.').max(1000),
  newPassword: z.string().min(1, 'Type a new password.').max(1000, 'That is longer than we take.'),
});

/** A new address to sign in with. */
export const newAddressSchema = z.strictObject({ email });

/** Millimetres or inches. */
export const unitsSchema = units;

/** Which people the administrator looks for. */
export const peopleQuerySchema = z.object({
  search: z.string().trim().max(100).catch(''),
  standing: z
    .enum(['administrator', 'instructor', 'learner', 'disabled', 'no password'])
    .optional()
    .catch(undefined),
  page: z.coerce.number().int().min(1).max(100_000).catch(1),
});
