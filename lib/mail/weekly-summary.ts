import { sayDate, sayDeadline } from './dates';
import type { Draft, LetterContext, Piece } from './draft';
import type { LetterOf } from './letter';

/** How many lines of a list are written before the rest is only counted. */
const most = 30;

/** What a class did in a week, for whoever teaches it. */
export function weeklySummary(
  letter: LetterOf<'weekly-summary'>,
  { siteAddress }: LetterContext,
): Draft {
  const { className, classId, timeZone, from, to, answered, quiet, late, slips, due } = letter;
  const counted = ({ name, answers }: { name: string; answers: number }) =>
    `${name}: ${answers === 1 ? 'one answer' : `${answers} answers`}`;
  return {
    subject: `${className}: the week from ${sayDate(from)} to ${sayDate(to)}`,
    pieces: [
      { say: `This is how ${className} went from ${sayDate(from)} to ${sayDate(to)}.` },
      ...part('Who answered', answered.map(counted), 'Nobody answered anything that is set.'),
      ...part('Who sent nothing', quiet, 'Everybody with work set sent something.'),
      ...part('Late work', late.map(counted), 'Nothing came late.'),
      ...part(
        'Most frequent slips',
        slips.map(({ exercise, advice, times }) => `${exercise}, ${times}×: ${advice}`),
        'No known slip was made.',
      ),
      ...part(
        'Due next',
        due.map(({ work, dueAt }) => `${work}: ${sayDeadline(dueAt, timeZone)}`),
        'Nothing is due after this.',
      ),
      { press: 'Open the class', href: `${siteAddress}/classes/${classId}` },
    ],
  };
}

function part(heading: string, lines: readonly string[], none: string): readonly Piece[] {
  if (lines.length === 0) return [{ heading }, { say: none }];
  const shown = lines.slice(0, most);
  const rest = lines.length - shown.length;
  return [{ heading }, { list: rest > 0 ? [...shown, `and ${rest} more`] : shown }];
}
