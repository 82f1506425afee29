'use client';

import { Bench } from '@/components/bench/bench';
import { Button, ButtonLink } from '@/components/ui/button';
import { sentenceFor } from '@/lib/browser/problem';
import { useAnswering, type Answering } from '@/lib/browser/use-answering';
import type { RoundInPage } from '@/lib/browser/use-round';
import { useWaitingAnswers } from '@/lib/browser/use-waiting-answers';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import type { RoundView } from '@/lib/schemas/round';
import { CountingNotice } from './counting-notice';
import { GivensTable } from './givens-table';
import { Help, Solution } from './help';
import { MarkingNotice } from './marking-notice';
import { RoundForm } from './round-form';

interface OpenRoundProps {
  readonly personId: string;
  readonly signInHref: string;
  readonly page: RoundInPage;
  readonly round: RoundView;
}

/** A round that has been opened: what is asked, the answer, its marking, help, and what is next. */
export function OpenRound({ personId, signInHref, page, round }: OpenRoundProps) {
  const [answering, send] = useAnswering(personId, round);
  const waiting = useWaitingAnswers().some(
    (answer) => answer.request.roundId === round.roundId && answer.refused === undefined,
  );
  const latest = round.attempts.at(-1);
  return (
    <>
      <Question round={round} />
      {round.closed ? null : (
        <RoundForm
          key={round.roundId}
          round={round}
          sending={answering.state === 'sending'}
          waiting={waiting}
          onSend={(response) => void send(response)}
        />
      )}
      <div role="status" aria-atomic="true">
        {latest === undefined || waiting ? null : <MarkingNotice attempt={latest} />}
        {answering.state === 'idle' ? <CountingNotice counting={answering.counting ?? []} /> : null}
        <Delivery answering={answering} waiting={waiting} signInHref={signInHref} />
        {page.error === null ? null : <p className="mt-3 text-madder">{sentenceFor(page.error)}</p>}
      </div>
      <Help
        key={`help ${round.roundId}`}
        round={round}
        busy={page.busy}
        onHint={page.hint}
        onSolution={page.solution}
      />
      {round.solution === undefined ? null : <Solution lines={round.solution} />}
      {round.closed ? (
        <Button
          variant="secondary"
          className="mt-5"
          onClick={page.open}
          aria-disabled={page.busy || undefined}
        >
          New numbers
        </Button>
      ) : null}
    </>
  );
}

/** What is asked, with its numbers and its picture. */
export function Question({ round }: { readonly round: RoundView }) {
  const setting = round.parts.some((part) => part.kind === 'setting');
  return (
    <>
      <p className="max-w-measure whitespace-pre-line">{round.prompt}</p>
      <GivensTable givens={round.givens} />
      {round.figure === undefined || (setting && !round.closed) ? null : (
        <div className="mt-4">
          <Bench spec={round.figure as BenchSpec} title={round.title} />
        </div>
      )}
    </>
  );
}

/** What became of an answer that did not simply arrive. */
function Delivery({
  answering,
  waiting,
  signInHref,
}: {
  readonly answering: Answering;
  readonly waiting: boolean;
  readonly signInHref: string;
}) {
  if (answering.state === 'failed') {
    return <p className="mt-4 font-semibold text-madder">✕ {answering.sentence}</p>;
  }
  if (!waiting) return null;
  const session = answering.state === 'kept' && answering.because === 'session';
  return (
    <div className="mt-4 max-w-2xl rounded border border-l-[6px] border-plum px-4 py-3">
      <p className="font-semibold text-plum">
        {session
          ? 'Your session has ended; your answer is kept.'
          : 'Your answer waits on this device.'}
      </p>
      <p>
        {session
          ? 'Sign in again on this device and it is sent and marked.'
          : 'The network is away. It is sent by itself once the network is back, and counts from now.'}
      </p>
      {session ? (
        <ButtonLink href={signInHref} className="mt-2">
          Sign in again
        </ButtonLink>
      ) : null}
    </div>
  );
}
