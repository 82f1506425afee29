import {
  accountExists,
  addressChanged,
  changeAddress,
  confirmAddress,
  invitation,
  passwordChanged,
  resetPassword,
  setPassword,
} from './account-letters';
import { assignmentSet, comment, dueTomorrow } from './class-letters';
import type { Draft, LetterContext, Written } from './draft';
import { layOut } from './layout';
import type { Letter, LetterKind, LetterOf } from './letter';
import { weeklySummary } from './weekly-summary';

type Drafts = {
  readonly [Kind in LetterKind]: (letter: LetterOf<Kind>, context: LetterContext) => Draft;
};

const drafts: Drafts = {
  invitation,
  'set-password': setPassword,
  'reset-password': resetPassword,
  'confirm-address': confirmAddress,
  'change-address': changeAddress,
  'address-changed': addressChanged,
  'password-changed': passwordChanged,
  'account-exists': accountExists,
  'assignment-set': assignmentSet,
  'due-tomorrow': dueTomorrow,
  comment,
  'weekly-summary': weeklySummary,
};

/** Writes a letter: its subject, its text, and HTML that says the same. */
export function writeLetter(letter: Letter, context: LetterContext): Written {
  return layOut(draftOf(letter, context), context);
}

function draftOf<Kind extends LetterKind>(letter: LetterOf<Kind>, context: LetterContext): Draft {
  const draft: Drafts[LetterKind] = drafts[letter.kind];
  // The table pairs each kind with its own function; a union of functions cannot be called as such.
  return (draft as (letter: LetterOf<Kind>, context: LetterContext) => Draft)(letter, context);
}
