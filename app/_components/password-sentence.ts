import {
  leastPasswordLength,
  mostPasswordLength,
  type PasswordComplaint,
} from '@/lib/data/entry/password';

/** Why a password cannot be taken, and what would do. */
export function passwordSentence(complaint: PasswordComplaint): string {
  switch (complaint) {
    case 'too short':
      return `Too short: ${leastPasswordLength} characters at least. Three or four words in a row do well.`;
    case 'too long':
      return `Too long: ${mostPasswordLength} characters at most.`;
    case 'too common':
      return 'Too many people use that one, so it is guessed first. Three or four words in a row do well.';
    case 'names you':
      return 'That is mostly your own name or address, which others know. Take something they do not.';
  }
}

/** What is asked of a new password, said before anything is typed. */
export const passwordHint = `${leastPasswordLength} characters at least. Three or four words in a row do well; paste one if you like.`;
