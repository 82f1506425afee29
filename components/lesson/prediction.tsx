'use client';

import { useEffect, useState, type FormEvent, type ReactNode } from 'react';
import { ChoiceField } from '@/components/exercise/choice-field';
import { chosenOf } from '@/components/exercise/answers';
import { Button } from '@/components/ui/button';
import { useDraft } from '@/lib/browser/draft';
import { sentenceFor } from '@/lib/browser/problem';
import { useAnswering } from '@/lib/browser/use-answering';
import { useRound } from '@/lib/browser/use-round';
import { useWaitingAnswers } from '@/lib/browser/use-waiting-answers';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { RoundView } from '@/lib/schemas/round';
import { useBenchLock } from './bench-lock';
import { PredictionOutcome } from './prediction-outcome';

interface PredictionProps {
  readonly id: string;
  readonly personId: string | null;
  readonly units: UnitSystem;
  /** The round that is open or was answered, or null. */
  readonly round: RoundView | null;
  /** The same question for those who are not signed in. */
  readonly sample: RoundView | null;
  /** What to look at once the bench runs. */
  readonly children?: ReactNode;
}

/** A question to commit to before the bench may be driven. */
export function Prediction(props: PredictionProps) {
  const { personId, units } = props;
  return (
    <div className="my-6 border-l-[3px] border-brass pl-4 sm:pl-6 print:break-inside-avoid">
      {personId === null ? (
        <OpenToAll sample={props.sample}>{props.children}</OpenToAll>
      ) : (
        <Committed key={`${personId} ${units}`} {...props} personId={personId} />
      )}
    </div>
  );
}

/** Nobody is signed in: any choice, or none, opens the bench in this tab; nothing is sent. */
function OpenToAll({
  sample,
  children,
}: {
  readonly sample: RoundView | null;
  readonly children: ReactNode;
}) {
  const { locked, unlock } = useBenchLock();
  if (sample === null) return null;
  return (
    <>
      <Guess round={sample} done={!locked} onGuess={unlock}>
        <Button variant="quiet" onClick={unlock}>
          Just show me
        </Button>
      </Guess>
      <div role="status">
        {locked ? null : <PredictionOutcome attempt={null}>{children}</PredictionOutcome>}
      </div>
    </>
  );
}

function Committed({
  id,
  personId,
  units,
  round: initial,
  children,
}: PredictionProps & { readonly personId: string }) {
  const page = useRound({ personId, exerciseId: id, units }, initial);
  const { round, open } = page;
  const missing = round === null && page.error === null && !page.busy;
  useEffect(() => {
    if (missing) open();
  }, [missing, open]);
  if (round !== null)
    return (
      <Asked personId={personId} round={round}>
        {children}
      </Asked>
    );
  return (
    <div role="status">
      {page.error === null ? (
        <p className="text-pencil">Setting up your question …</p>
      ) : (
        <>
          <p className="mb-2 font-semibold text-madder">✕ {sentenceFor(page.error)}</p>
          <Button variant="quiet" onClick={open}>
            Try again
          </Button>
        </>
      )}
    </div>
  );
}

function Asked({
  personId,
  round,
  children,
}: {
  readonly personId: string;
  readonly round: RoundView;
  readonly children: ReactNode;
}) {
  const { unlock } = useBenchLock();
  const [answering, send] = useAnswering(personId, round);
  const waiting = useWaitingAnswers().some((one) => one.request.roundId === round.roundId);
  const attempt = round.attempts.at(-1) ?? null;
  const done = attempt !== null || waiting;
  useEffect(() => {
    if (done) unlock();
  }, [done, unlock]);
  return (
    <>
      <Guess
        round={round}
        done={done}
        kept={attempt?.parts.flatMap((part) => part.chosen ?? [])}
        busy={answering.state === 'sending'}
        onGuess={(part, chosen) => void send({ answers: { [part]: [...chosen] } })}
      />
      <div role="status">
        {answering.state === 'failed' ? (
          <p className="mt-3 font-semibold text-madder">✕ {answering.sentence}</p>
        ) : null}
        {done ? <PredictionOutcome attempt={attempt}>{children}</PredictionOutcome> : null}
      </div>
    </>
  );
}

interface GuessProps {
  readonly round: RoundView;
  readonly done: boolean;
  readonly busy?: boolean;
  /** The options of the stored guess, which stay marked wherever the lesson is opened. */
  readonly kept?: readonly string[];
  readonly onGuess: (part: string, chosen: readonly string[]) => void;
  /** What stands beside the button. */
  readonly children?: ReactNode;
}

function Guess({ round, done, busy = false, kept = [], onGuess, children }: GuessProps) {
  const [draft, change] = useDraft(round.roundId);
  const [checked, setChecked] = useState(false);
  const part = round.parts.find((one) => one.kind === 'choice');
  if (part?.kind !== 'choice') return null;
  const chosen = kept.length > 0 ? kept : chosenOf(draft[part.key]);
  const commit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    setChecked(true);
    if (chosen.length > 0 && !busy) onGuess(part.key, chosen);
  };
  return (
    <form onSubmit={commit}>
      <p className="mb-4 max-w-measure whitespace-pre-line">{round.prompt}</p>
      <div className="max-w-2xl">
        <ChoiceField
          part={part}
          chosen={chosen}
          onChange={(next) => change(part.key, [...next])}
          checked={checked}
          disabled={done}
        />
      </div>
      {done ? null : (
        <div className="mt-4 flex flex-wrap gap-3">
          <Button type="submit" aria-disabled={busy || undefined}>
            That is my guess
          </Button>
          {children}
        </div>
      )}
    </form>
  );
}
