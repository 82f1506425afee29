'use client';

import { Button, ButtonLink } from '@/components/ui/button';
import { PegRail } from '@/components/progress/peg-rail';
import { isSignedOut, sentenceFor } from '@/lib/browser/problem';
import { usePegs } from '@/lib/browser/use-pegs';
import { useRound } from '@/lib/browser/use-round';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { PegView, RoundView } from '@/lib/schemas/round';
import { OpenRound, Question } from './open-round';
import { SampleParts } from './sample-parts';

/** What the server says of an exercise before any round is opened. */
export interface ExerciseEntry {
  readonly id: string;
  /** Its place in the lesson, from 1. */
  readonly number: number;
  readonly title: string;
  /** The pegs of the skills it shows; none while nobody is signed in. */
  readonly pegs: readonly PegView[];
  /** The round that is open in these units, or was closed last, or null. */
  readonly round: RoundView | null;
  /** A question with numbers of nobody's, for those who are not signed in. */
  readonly sample: RoundView | null;
}

interface ExerciseProps {
  readonly entry: ExerciseEntry;
  readonly personId: string | null;
  readonly units: UnitSystem;
  readonly signInHref: string;
}

/** One exercise in a lesson: its question, the answer and its marking, hints, and new numbers. */
export function Exercise({ entry, personId, units, signInHref }: ExerciseProps) {
  const pegs = usePegs(personId, entry.pegs);
  return (
    <section
      id={entry.id}
      aria-labelledby={`${entry.id}-title`}
      className="my-8 scroll-mt-4 border-l-[3px] border-ink pl-4 sm:pl-6"
    >
      <div className="mb-1 flex flex-wrap items-center gap-x-4 gap-y-1">
        <p className="text-[0.9375rem] font-semibold text-pencil">Exercise {entry.number}</p>
        {pegs.length === 0 ? null : <PegRail pegs={pegs} />}
      </div>
      <h3 id={`${entry.id}-title`} className="mb-1">
        {entry.title}
      </h3>
      {personId === null ? (
        <SignedOut sample={entry.sample} signInHref={signInHref} />
      ) : (
        <SignedIn
          key={`${personId} ${units}`}
          entry={entry}
          personId={personId}
          units={units}
          signInHref={signInHref}
        />
      )}
    </section>
  );
}

function SignedIn({ entry, personId, units, signInHref }: ExerciseProps & { personId: string }) {
  const page = useRound({ personId, exerciseId: entry.id, units }, entry.round);
  if (page.round !== null) {
    return <OpenRound personId={personId} signInHref={signInHref} page={page} round={page.round} />;
  }
  return (
    <>
      <p className="max-w-measure text-pencil">
        The numbers are drawn for you, in {units === 'metric' ? 'millimetres' : 'inches'}, and stay
        yours until you have them right. Rounds you have open in the other units are kept.
      </p>
      <Button
        variant="secondary"
        className="mt-3"
        onClick={page.open}
        aria-disabled={page.busy || undefined}
      >
        {page.busy ? 'Drawing your numbers …' : 'Start'}
      </Button>
      <div role="status">
        {page.error === null ? null : (
          <p className="mt-3 font-semibold text-madder">
            ✕ {sentenceFor(page.error)}{' '}
            {isSignedOut(page.error) ? (
              <ButtonLink href={signInHref} variant="quiet">
                Sign in again
              </ButtonLink>
            ) : null}
          </p>
        )}
      </div>
    </>
  );
}

function SignedOut({
  sample,
  signInHref,
}: {
  readonly sample: RoundView | null;
  readonly signInHref: string;
}) {
  return (
    <>
      {sample === null ? null : (
        <>
          <Question round={sample} />
          <SampleParts round={sample} />
        </>
      )}
      <p className="mt-4 max-w-measure text-pencil">
        These numbers are only to look at: answering needs an account, and draws you your own.
      </p>
      <ButtonLink href={signInHref} variant="secondary" className="mt-2">
        Sign in to answer
      </ButtonLink>
    </>
  );
}
