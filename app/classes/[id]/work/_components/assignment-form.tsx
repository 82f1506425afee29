'use client';

import { useActionState, useEffect, useRef } from 'react';
import { Choices, FieldGroup } from '@/components/ui/choices';
import { TextAreaField, TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SubmitButton } from '@/components/ui/submit-button';
import { BothVersions } from './both-versions';
import type { AssignmentState, AssignmentValues, FormChoices } from './assignment-state';
import { WhatIsSet } from './what-is-set';

interface AssignmentFormProps {
  readonly action: (state: AssignmentState, form: FormData) => Promise<AssignmentState>;
  readonly choices: FormChoices;
  /** What stands in it before anything was typed. */
  readonly values: AssignmentValues;
  readonly submit: string;
}

const counting = [
  { value: 'best', label: 'The best attempt counts' },
  { value: 'latest', label: 'The latest attempt counts' },
];
const late = [
  { value: 'marked', label: 'Late work counts and is marked late' },
  { value: 'closed', label: 'Late work does not count' },
];

/**
 * Sets work, or changes work that is set. Nothing typed is lost when it is refused; when somebody
 * else has changed it meanwhile, both versions are shown.
 */
export function AssignmentForm({ action, choices, values, submit }: AssignmentFormProps) {
  const [state, send] = useActionState(action, { outcome: 'idle' });
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (state.outcome !== 'refused') return;
    form.current?.querySelector<HTMLElement>('[aria-invalid=true], [role=alert]')?.focus();
  }, [state]);
  const kept: AssignmentValues = { ...values, ...state.values };
  const { errors } = state;
  const text = (name: keyof AssignmentValues, type: string, label: string, hint?: string) => (
    <TextField
      name={name}
      type={type}
      label={label}
      hint={hint}
      defaultValue={kept[name]}
      error={errors?.[name]}
    />
  );
  return (
    <form ref={form} action={send} noValidate className="max-w-3xl">
      <Told state={state} />
      <input type="hidden" name="version" value={state.version ?? values.version} />
      <WhatIsSet choices={choices} values={kept} error={errors?.lesson ?? errors?.exercise} />
      <FieldGroup legend="When">
        <p className="mb-3 text-[0.9375rem] text-pencil">
          By the clock of the class ({choices.timeZone}).
        </p>
        <div className="grid gap-x-6 sm:grid-cols-2">
          {text('dueOn', 'date', 'Due on')}
          {text('dueTime', 'time', 'At', 'Left empty: the end of that day.')}
          {text('opensOn', 'date', 'Opens on', 'Left empty: at once.')}
          {text('opensTime', 'time', 'At', 'Left empty: as that day begins.')}
        </div>
      </FieldGroup>
      <FieldGroup legend="How it counts">
        <TextField
          name="attemptsAllowed"
          label="Attempts that count, for each exercise"
          inputMode="numeric"
          className="max-w-40"
          hint="Left empty: any number. Further attempts are marked and kept, and do not count."
          defaultValue={kept.attemptsAllowed}
          error={errors?.attemptsAllowed}
        />
        <div className="grid gap-x-6 sm:grid-cols-2">
          <Choices name="counting" kind="one" choices={counting} chosen={[kept.counting]} />
          <Choices name="lateWork" kind="one" choices={late} chosen={[kept.lateWork]} />
        </div>
      </FieldGroup>
      <FieldGroup legend="A word to go with it">
        <TextAreaField
          name="note"
          rows={3}
          label="Note"
          hint="May be left empty. Everybody it is set to can read it."
          defaultValue={kept.note}
          error={errors?.note}
        />
        <Choices
          name="tell"
          kind="several"
          chosen={[kept.tell]}
          choices={[{ value: 'yes', label: 'Write to everybody who has not been told of it' }]}
        />
      </FieldGroup>
      <SubmitButton>{state.differences ? 'Save mine over it' : submit}</SubmitButton>
    </form>
  );
}

function Told({ state }: Readonly<{ state: AssignmentState }>) {
  if (state.outcome === 'idle' || !state.message) return null;
  const refused = state.outcome === 'refused';
  return (
    <div role={refused ? 'alert' : 'status'} tabIndex={-1}>
      <Notice tone={refused ? 'wrong' : 'right'} title={state.message}>
        {state.differences ? <BothVersions differences={state.differences} /> : null}
      </Notice>
    </div>
  );
}
