import 'server-only';
import { availableParallelism } from 'node:os';
import { hash, verify } from '@node-rs/argon2';
import { commonPasswords } from './common-passwords.data';

/**
 * Passwords are kept as argon2id at OWASP's parameters (Password Storage Cheat Sheet: 19 MiB,
 * two passes, one lane; argon2id is what the package takes by itself), worked out by a thread of its own, and never many at a time.
 */
const parameters = {
  memoryCost: 19_456,
  timeCost: 2,
  parallelism: 1,
};

/**
 * Fifteen where the password is all that is asked for (NIST SP 800-63B-4, 3.1.1.2, which also wants at
 * least 64 to be taken, and no rules of composition).
 */
export const leastPasswordLength = 15;
export const mostPasswordLength = 256;

/** Why a password cannot be taken. */
export type PasswordComplaint = 'too short' | 'too long' | 'too common' | 'names you';

/**
 * What is wrong with a new password, or null: its length, its being on the list of common ones,
 * or its being made of what everybody knows about the person. There are no rules of composition.
 */
export function complaintAbout(
  password: string,
  known: readonly string[],
): PasswordComplaint | null {
  const length = [...normal(password)].length;
  if (length < leastPasswordLength) return 'too short';
  if (length > mostPasswordLength) return 'too long';
  const plain = plainOf(password);
  if (isCommon(plain)) return 'too common';
  const left = known
    .map(plainOf)
    .filter((word) => word.length > 3)
    .reduce((rest, word) => rest.replaceAll(word, ''), plain);
  return left !== plain && left.length < 8 ? 'names you' : null;
}

/** What everybody knows about somebody, of which their password must not be made. */
export function knownOf({ name, email }: { readonly name: string; readonly email: string }) {
  return [...name.split(/\s+/), email, email.split('@')[0] ?? ''];
}

/** The hash to keep for `password`. */
export async function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(normal(password), parameters));
}

/**
 * Whether `password` belongs to `kept`. With nothing kept it takes just as long and is false, so
 * that the time does not say whether an address is known.
 */
export async function isPassword(kept: string | null, password: string): Promise<boolean> {
  const against = kept ?? (await standIn());
  const fits = await inTurn(() => verify(against, normal(password)));
  return kept !== null && fits;
}

/** What is left to guess when capitals, blanks and signs are left out; letters of every script count. */
function plainOf(text: string): string {
  return normal(text)
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, '');
}

/** The same characters written in another way are the same password (NIST SP 800-63B, 3.1.1.2). */
function normal(password: string): string {
  return password.normalize('NFKC');
}

/** A common password, alone, repeated, with digits hung on, or two of them in a row. */
function isCommon(plain: string): boolean {
  const unit = /^(.+?)\1+$/.exec(plain)?.[1] ?? plain;
  const stem = unit.replace(/^\d+|\d+$/g, '');
  if (stem.length < leastUnit || commonPasswords.has(stem)) return true;
  return Array.from({ length: stem.length }, (_, at) => at).some(
    (at) => commonPasswords.has(stem.slice(0, at)) && commonPasswords.has(stem.slice(at)),
  );
}

/** What is repeated, or stands between the digits, must have this many letters at least. */
const leastUnit = 5;

let standInHash: Promise<string> | undefined;

function standIn(): Promise<string> {
  standInHash ??= hashPassword('nobody has this password');
  return standInHash;
}

const places = availableParallelism() * 2;
const waiting: (() => void)[] = [];
let busy = 0;

/** At most two pieces of work a core at a time; a flood of sign-ins waits instead of filling memory. */
async function inTurn<Result>(work: () => Promise<Result>): Promise<Result> {
  if (busy >= places) await new Promise<void>((resolve) => waiting.push(resolve));
  busy += 1;
  try {
    return await work();
  } finally {
    busy -= 1;
    waiting.shift()?.();
  }
}
