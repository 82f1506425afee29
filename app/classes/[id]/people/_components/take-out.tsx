'use client';

import { useActionState } from 'react';
import { idle, type FormState } from '@/components/ui/form-state';
import { SubmitButton } from '@/components/ui/submit-button';

interface TakeOutProps {
  readonly action: (state: FormState, form: FormData) => Promise<FormState>;
  readonly name: string;
}

/** Takes somebody out of the class; asks once more when nobody else teaches it. */
export function TakeOut({ action, name }: TakeOutProps) {
  const [state, send] = useActionState(action, idle);
  const last = state.errors?.evenTheLast;
  return (
    <form action={send} className="inline-flex flex-col items-end gap-1">
      {state.outcome === 'refused' ? (
        <p role="alert" className="max-w-60 text-[0.9375rem] text-madder">
          <strong>{state.message}</strong> {last}
        </p>
      ) : null}
      <input type="hidden" name="evenTheLast" value={last ? 'yes' : 'no'} />
      <SubmitButton variant={last ? 'danger' : 'quiet'}>
        {last ? 'Take out all the same' : 'Take out'}
        <span className="sr-only"> {name}</span>
      </SubmitButton>
    </form>
  );
}
