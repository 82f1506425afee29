import type { ReactNode } from 'react';
import type { FormState } from './form-state';
import { Notice } from './notice';

interface FormOutcomeProps {
  readonly state: Pick<FormState, 'outcome' | 'message'>;
  /** What is said with it, such as a link that is shown once. */
  readonly children?: ReactNode;
}

/** What became of a form, over its fields: a refusal at once, what is done when it is its turn. */
export function FormOutcome({ state, children }: FormOutcomeProps) {
  return (
    <>
      {state.outcome === 'refused' && state.message ? (
        <Notice tone="wrong" title={state.message} role="alert" />
      ) : null}
      <div role="status">
        {state.outcome === 'done' && state.message ? (
          <Notice tone="right" title={state.message} />
        ) : null}
        {children}
      </div>
    </>
  );
}
