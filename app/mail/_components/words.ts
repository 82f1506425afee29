import type { LetterKind } from '@/lib/mail/letter';
import type { LetterState } from '@/lib/schemas/mail';

/** What each kind of letter is called in the log. */
export const kindWords: Readonly<Record<LetterKind, string>> = {
  invitation: 'Invitation',
  'set-password': 'First password',
  'reset-password': 'New password',
  'confirm-address': 'Address to confirm',
  'change-address': 'New address',
  'address-changed': 'Address changed',
  'password-changed': 'Password changed',
  'account-exists': 'Account exists',
  'assignment-set': 'Work set',
  'due-tomorrow': 'Due tomorrow',
  comment: 'Comment',
  'weekly-summary': 'Week of a class',
};

/** How a letter stands, with a sign that tells it apart without its colour. */
export const stateWords: Readonly<
  Record<LetterState, { readonly word: string; readonly sign: string; readonly colour: string }>
> = {
  waiting: { word: 'waiting', sign: '…', colour: 'text-chalk' },
  sent: { word: 'sent', sign: '✓', colour: 'text-leaf' },
  failed: { word: 'failed', sign: '✕', colour: 'text-madder' },
  dropped: { word: 'dropped', sign: '–', colour: 'text-pencil' },
};
