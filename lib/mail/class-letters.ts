import { sayDeadline } from './dates';
import type { Draft, LetterContext, Piece } from './draft';
import type { LetterOf } from './letter';

/** Letters about classes, which a reader may do without. */

export function assignmentSet(
  letter: LetterOf<'assignment-set'>,
  { siteAddress, writtenAt }: LetterContext,
): Draft {
  const { className, timeZone, setBy, opensAt, dueAt, note, work } = letter;
  const opens: readonly [string, string][] =
    new Date(opensAt) > writtenAt ? [['Opens', sayDeadline(opensAt, timeZone)]] : [];
  const quoted: readonly Piece[] =
    note.trim() === '' ? [] : [{ say: `${setBy} writes:` }, { quote: note }];
  return {
    subject: `${className}: work for you`,
    pieces: [
      { say: `${setBy} has set work for ${className}.` },
      { list: work },
      { facts: [...opens, ['Due', sayDeadline(dueAt, timeZone)]] },
      ...quoted,
      { press: 'See what is set', href: `${siteAddress}/today` },
    ],
  };
}

export function dueTomorrow(
  { className, timeZone, dueAt, left }: LetterOf<'due-tomorrow'>,
  { siteAddress }: LetterContext,
): Draft {
  return {
    subject: `${className}: due tomorrow`,
    pieces: [
      { say: `This is due tomorrow for ${className}, and not done yet.` },
      { list: left },
      { facts: [['Due', sayDeadline(dueAt, timeZone)]] },
      { press: 'Go on with it', href: `${siteAddress}/today` },
    ],
  };
}

export function comment(
  { className, authorName, subject, body, path }: LetterOf<'comment'>,
  { siteAddress }: LetterContext,
): Draft {
  return {
    subject: `${className}: a comment on your work`,
    pieces: [
      { say: `${authorName} has written to you about “${subject}”.` },
      { quote: body },
      { press: 'Read it beside your work', href: `${siteAddress}${path}` },
    ],
  };
}
