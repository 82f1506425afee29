import type { ReactNode } from 'react';
import type { AttemptView } from '@/lib/schemas/round';

interface PredictionOutcomeProps {
  /** The stored guess with its marking; null while it waits, and for those not signed in. */
  readonly attempt: AttemptView | null;
  readonly children: ReactNode;
}

/** What follows a guess: the bench is open, something to look for, and how the guess compares. */
export function PredictionOutcome({ attempt, children }: PredictionOutcomeProps) {
  const messages = attempt === null ? [] : attempt.parts.flatMap((part) => part.message ?? []);
  const guess = attempt?.parts.map((part) => part.echo).join('; ') ?? '';
  return (
    <div className="mt-5 max-w-2xl rounded border border-l-[6px] border-brass px-4 py-3">
      <p className="font-semibold text-brass">
        {attempt === null ? 'The bench is open.' : 'Your guess is kept, and the bench is open.'}
      </p>
      {guess === '' ? null : <p>You guessed: {guess}.</p>}
      <div>{children}</div>
      {attempt === null ? null : (
        <details className="mt-2">
          <summary className="min-h-11 py-2 font-semibold">
            I have driven it: how did my guess do?
          </summary>
          <p>{attempt.message}</p>
          {messages.map((message) => (
            <p key={message}>{message}</p>
          ))}
        </details>
      )}
    </div>
  );
}
