'use client';

import { useActionState, useEffect, useRef, type ReactNode } from 'react';
import { SelectField, TextAreaField, TextField } from './field';
import { FormOutcome } from './form-outcome';
import { idle, type FormState } from './form-state';
import { OneTimeLink } from './one-time-link';
import { SubmitButton } from './submit-button';
import { useFormDraft } from './use-form-draft';

/** One field of a form, as data. */
export interface FormField {
  readonly name: string;
  readonly label: string;
  readonly hint?: string;
  readonly type?: 'text' | 'email' | 'password' | 'date' | 'time';
  readonly autoComplete?: string;
  /** What stands in it before anything was typed. */
  readonly value?: string;
  /** With options the field is a choice of one of them. */
  readonly options?: readonly { readonly value: string; readonly label: string }[];
  readonly required?: boolean;
  /** How many lines it has, when it has several. */
  readonly rows?: number;
}

interface ActionFormProps {
  readonly action: (state: FormState, data: FormData) => Promise<FormState>;
  readonly fields: readonly FormField[];
  readonly submit: string;
  readonly variant?: 'primary' | 'secondary' | 'quiet' | 'danger';
  /** Set where several forms of a page have fields of the same name. */
  readonly prefix?: string;
  /** What stands between the fields and the button. */
  readonly children?: ReactNode;
}

function Field({
  field,
  state,
  prefix,
}: Readonly<{ field: FormField; state: FormState; prefix: string }>) {
  const { name, label, hint, type = 'text', autoComplete, value, options, required, rows } = field;
  const kept = type === 'password' ? '' : (state.values?.[name] ?? value ?? '');
  const common = {
    id: `${prefix}${name}`,
    name,
    label,
    hint,
    error: state.errors?.[name],
    defaultValue: kept,
    required,
  };
  if (options) {
    // The key makes the browser take the kept choice up again after React has reset the form.
    return (
      <SelectField {...common} key={kept}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </SelectField>
    );
  }
  if (rows) return <TextAreaField {...common} rows={rows} />;
  return <TextField {...common} type={type} autoComplete={autoComplete} />;
}

/**
 * A small form over a server action. What was typed stays when it is refused, the first field that
 * is wrong takes the focus, and what happened is said aloud.
 */
export function ActionForm(props: ActionFormProps) {
  const { action, fields, submit, variant, prefix = '', children } = props;
  const [state, send] = useActionState(action, idle);
  const form = useRef<HTMLFormElement>(null);
  const keepDraft = useFormDraft(form, `${prefix}${submit}`, state);
  useEffect(() => {
    if (state.outcome !== 'refused') return;
    form.current?.querySelector<HTMLElement>('[aria-invalid=true]')?.focus();
  }, [state]);
  return (
    <form ref={form} action={send} onSubmit={keepDraft} noValidate className="max-w-md">
      <FormOutcome state={state}>
        {state.link ? <OneTimeLink link={state.link} says={state.linkSays} /> : null}
      </FormOutcome>
      {fields.map((field) => (
        <Field key={field.name} field={field} state={state} prefix={prefix} />
      ))}
      {children}
      <SubmitButton variant={variant}>{submit}</SubmitButton>
    </form>
  );
}
