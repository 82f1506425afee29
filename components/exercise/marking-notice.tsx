import clsx from 'clsx';
import type { AttemptView } from '@/lib/schemas/round';

const looks = {
  right: { edge: 'border-leaf', text: 'text-leaf', sign: '✓' },
  partly: { edge: 'border-madder', text: 'text-madder', sign: '◐' },
  wrong: { edge: 'border-madder', text: 'text-madder', sign: '✕' },
} as const;

/** How an answer was marked: what is right, what is not and why, and the next step. */
export function MarkingNotice({ attempt }: { readonly attempt: AttemptView }) {
  const look = looks[attempt.verdict];
  return (
    <div
      className={clsx('mt-5 max-w-2xl rounded border border-l-[6px] bg-paper px-4 py-3', look.edge)}
    >
      <p className={clsx('font-semibold', look.text)}>
        <span aria-hidden="true">{look.sign} </span>
        {attempt.message}
      </p>
      <ul className="mt-2 space-y-2">
        {attempt.parts.map((part, index) => (
          <li key={part.key}>
            <span className={clsx('font-semibold', part.right ? 'text-leaf' : 'text-madder')}>
              <span aria-hidden="true">{part.right ? '✓ ' : '✕ '}</span>
              {part.label}
              <span className="sr-only">{part.right ? ' is right' : ' is not right yet'}</span>
            </span>
            {saidBefore(attempt, index) ? null : (
              <span className="pl-2 font-mono">{part.echo}</span>
            )}
            {part.message === undefined ? null : <span className="block">{part.message}</span>}
          </li>
        ))}
      </ul>
      {attempt.nextStep === '' ? null : <p className="mt-2 text-pencil">{attempt.nextStep}</p>}
    </div>
  );
}

/** The criteria of one setting all answer to the same words: those are said once. */
function saidBefore({ parts }: AttemptView, index: number): boolean {
  const echo = parts[index]?.echo ?? '';
  return echo === '' || echo === parts[index - 1]?.echo;
}
