import clsx from 'clsx';
import type { Mark } from '@/lib/schemas/class-progress';

const looks: Readonly<Record<Mark, { sign: string; word: string; colour: string }>> = {
  none: { sign: '–', word: 'not begun', colour: 'text-pencil' },
  'not set': { sign: '·', word: 'not set', colour: 'text-pencil' },
  right: { sign: '✓', word: 'right', colour: 'text-leaf font-semibold' },
  partly: { sign: '◐', word: 'partly', colour: 'text-brass font-semibold' },
  wrong: { sign: '✕', word: 'not yet', colour: 'text-madder font-semibold' },
};

/** The word for a mark, as it is said everywhere. */
export function markWord(mark: Mark): string {
  return looks[mark].word;
}

/** How an exercise went: a sign and a word, coloured, never by colour alone. */
export function MarkSign({ mark }: Readonly<{ mark: Mark }>) {
  const { sign, word, colour } = looks[mark];
  return (
    <span className={clsx('whitespace-nowrap', colour)}>
      <span aria-hidden="true" className="mr-1 inline-block w-4 text-center">
        {sign}
      </span>
      {word}
    </span>
  );
}
