'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { RoundView } from '@/lib/schemas/round';

interface HelpProps {
  readonly round: RoundView;
  readonly busy: boolean;
  readonly onHint: () => void;
  readonly onSolution: () => void;
}

const ordinals = ['First hint', 'Second hint', 'Third hint'];

/** Hints, one at a time, and after them or before them the worked solution. */
export function Help({ round, busy, onHint, onSolution }: HelpProps) {
  const [asked, setAsked] = useState(false);
  const taken = round.hints.length;
  const last = taken + 1 === round.hintsTotal;
  return (
    <div className="mt-5">
      <div role="status">
        {taken === 0 ? null : (
          <ol className="mb-3 max-w-2xl space-y-1 border-l border-pencil pl-4">
            {round.hints.map((hint, index) => (
              <li key={hint}>
                <span className="font-semibold">{ordinals[index] ?? 'Hint'}:</span> {hint}
              </li>
            ))}
          </ol>
        )}
      </div>
      {round.closed ? null : (
        <div className="flex flex-wrap items-center gap-3 print:hidden">
          {taken < round.hintsTotal ? (
            <Button variant="quiet" onClick={onHint} aria-disabled={busy || undefined}>
              {ordinals[taken] ?? 'Hint'}
            </Button>
          ) : null}
          {asked ? (
            <Button
              variant="quiet"
              onClick={onSolution}
              aria-disabled={busy || undefined}
              // The second press of the same place: the focus has not moved.
              key="solution"
            >
              Yes, show it and close this round
            </Button>
          ) : (
            <Button variant="quiet" onClick={() => setAsked(true)} key="solution">
              Worked solution
            </Button>
          )}
          <HelpPrice round={round} last={last} asked={asked} />
        </div>
      )}
    </div>
  );
}

/** What the next help costs, said before it is taken. */
function HelpPrice({
  round,
  last,
  asked,
}: {
  readonly round: RoundView;
  readonly last: boolean;
  readonly asked: boolean;
}) {
  const price = asked
    ? 'The solution closes this round; it will not count as unaided. New numbers come after it.'
    : last && round.unaided
      ? 'The third hint gives up this round’s unaided mark.'
      : '';
  return (
    <p role="status" className="basis-full text-[0.9375rem] text-pencil">
      {price}
    </p>
  );
}

/** The whole reasoning with this round's numbers. */
export function Solution({ lines }: { readonly lines: readonly string[] }) {
  return (
    <details className="mt-4 max-w-2xl" open>
      <summary className="min-h-11 py-2 font-semibold">The whole reasoning</summary>
      <ol className="list-decimal space-y-1 pl-6">
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ol>
    </details>
  );
}
