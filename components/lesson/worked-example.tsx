'use client';

import { useId, useState } from 'react';
import { GivensTable } from '@/components/exercise/givens-table';
import { Button } from '@/components/ui/button';
import type { RoundView } from '@/lib/schemas/round';
import { compareStep, type Compared, type StepResult } from './own-step';

/** A worked example with its numbers: what is asked, what is given, and each step with its result. */
export interface WorkedExampleView {
  readonly question: string;
  readonly givens: readonly RoundView['givens'][number][];
  readonly steps: readonly {
    readonly text: string;
    readonly value: string;
    readonly result?: StepResult;
  }[];
  readonly check?: string;
}

interface WorkedExampleProps {
  readonly worked: WorkedExampleView;
  /** How many of the last steps are left to the learner. */
  readonly hidden: number;
}

/** A problem worked through step by step; the last steps fade as the learner succeeds. */
export function WorkedExample({ worked, hidden }: WorkedExampleProps) {
  const [shown, setShown] = useState(worked.steps.length - hidden);
  const complete = shown >= worked.steps.length;
  return (
    <div className="my-6 border border-rule bg-board px-4 py-4 sm:px-6">
      <p className="max-w-measure font-semibold">{worked.question}</p>
      <GivensTable givens={worked.givens} />
      {hidden === 0 ? null : (
        <p className="mt-4 text-pencil">
          You have shown that you can do some of this, so the last{' '}
          {hidden === 1 ? 'step is' : 'steps are'} yours. Work each out before you look.
        </p>
      )}
      <ol className="mt-4 space-y-3">
        {worked.steps.map((step, index) => (
          <li key={step.text} className="grid grid-cols-[2rem_minmax(0,1fr)] gap-x-2">
            <span aria-hidden="true" className="font-mono text-pencil">
              {index + 1}
            </span>
            <Step
              step={step}
              hidden={index >= shown}
              next={index === shown}
              onShow={() => setShown(index + 1)}
            />
          </li>
        ))}
      </ol>
      <div role="status">
        {complete && worked.check !== undefined ? (
          <p className="mt-4 max-w-measure">
            <span className="font-semibold">See for yourself:</span> {worked.check}
          </p>
        ) : null}
      </div>
    </div>
  );
}

interface StepProps {
  readonly step: WorkedExampleView['steps'][number];
  readonly hidden: boolean;
  /** True for the first hidden step: the one to do now. */
  readonly next: boolean;
  readonly onShow: () => void;
}

function Step({ step, hidden, next, onShow }: StepProps) {
  const id = useId();
  const [own, setOwn] = useState('');
  const compared = compareStep(own, step.result);
  return (
    <div className="min-w-0">
      <p className="max-w-measure">{step.text}</p>
      <div role="status">
        {hidden ? null : (
          <p className="font-mono font-semibold">
            {step.value}
            {own === '' ? null : <Own own={own} compared={compared} />}
          </p>
        )}
      </div>
      {hidden && next ? (
        <div className="mt-1 flex flex-wrap items-end gap-3 print:hidden">
          <div>
            <label htmlFor={id} className="block text-[0.9375rem] text-pencil">
              Yours first
            </label>
            <input
              id={id}
              type="text"
              autoComplete="off"
              maxLength={60}
              value={own}
              onChange={(event) => setOwn(event.target.value)}
              aria-describedby={compared.outcome === 'refused' ? `${id}-refused` : undefined}
              className="min-h-11 w-44 rounded border border-pencil bg-paper px-3 py-2 font-mono"
            />
          </div>
          <Button variant="quiet" onClick={onShow}>
            {own === '' ? 'Show this step' : 'Compare'}
          </Button>
          {compared.outcome === 'refused' ? (
            <p id={`${id}-refused`} className="basis-full text-[0.9375rem] text-pencil">
              {compared.message}
            </p>
          ) : null}
        </div>
      ) : null}
      {hidden ? <span className="hidden font-mono print:inline">………………</span> : null}
    </div>
  );
}

const verdicts: Readonly<Record<Compared['outcome'], string>> = {
  none: '',
  agrees: ' ✓ that agrees',
  differs: ' ✕ that is not the same: look where the two part',
  refused: ' which could not be read',
};

/** What the learner wrote, and whether it comes to the same. */
function Own({ own, compared }: { readonly own: string; readonly compared: Compared }) {
  const tone = { agrees: 'text-leaf', differs: 'text-madder' } as const;
  const { outcome } = compared;
  return (
    <span className="block font-normal text-pencil">
      you wrote: {own}
      <span className={outcome === 'agrees' || outcome === 'differs' ? tone[outcome] : undefined}>
        {verdicts[outcome]}
      </span>
    </span>
  );
}
