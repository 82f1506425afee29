'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { useDraft } from '@/lib/browser/draft';
import { useHydrated } from '@/lib/browser/use-hydrated';
import type { ExerciseResponse, RoundView } from '@/lib/schemas/round';
import { isAnswered } from './answers';
import { PartField } from './part-field';

interface RoundFormProps {
  readonly round: RoundView;
  readonly sending: boolean;
  /** True while an answer to this round waits on the device: it has to be marked first. */
  readonly waiting: boolean;
  readonly onSend: (response: ExerciseResponse) => void;
}

/** The fields of an open round and the button that has them checked. */
export function RoundForm({ round, sending, waiting, onSend }: RoundFormProps) {
  const [draft, change] = useDraft(round.roundId);
  const hydrated = useHydrated();
  const [checked, setChecked] = useState(false);
  const unanswered = round.parts.filter((part) => !isAnswered(part, draft[part.key]));

  const check = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (sending || waiting) return;
    setChecked(true);
    if (unanswered.length > 0) return;
    setChecked(false);
    const answers = Object.fromEntries(
      round.parts.flatMap((part) => {
        const answer = draft[part.key];
        return answer === undefined ? [] : [[part.key, answer]];
      }),
    );
    onSend({ answers });
  };

  return (
    <form onSubmit={check} noValidate className="mt-5">
      <div className="flex flex-wrap items-start gap-x-4 gap-y-5">
        {round.parts.map((part) => (
          <PartField
            key={`${part.key} ${hydrated}`}
            round={round}
            part={part}
            answer={draft[part.key]}
            onChange={(answer) => change(part.key, answer)}
            checked={checked}
          />
        ))}
      </div>
      <div className="mt-5 flex flex-wrap items-center gap-4">
        <Button type="submit" aria-disabled={sending || waiting || undefined}>
          {sending ? 'Checking …' : checkWords(round.parts.length)}
        </Button>
        <p role="status" className="font-semibold text-madder">
          {checked && unanswered.length > 0 ? missingWords(unanswered.map((one) => one.label)) : ''}
        </p>
      </div>
    </form>
  );
}

function checkWords(parts: number): string {
  if (parts === 1) return 'Check';
  return parts === 2 ? 'Check both' : 'Check all';
}

function missingWords(labels: readonly string[]): string {
  return `Not sent yet. Look at: ${labels.join(', ')}.`;
}
