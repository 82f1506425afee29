'use client';

import { useActionState, useRef } from 'react';
import { SelectField, TextAreaField, TextField } from '@/components/ui/field';
import { FormOutcome } from '@/components/ui/form-outcome';
import { SubmitButton } from '@/components/ui/submit-button';
import { useFormDraft } from '@/components/ui/use-form-draft';
import { inviteAll, lookThrough, type InviteState } from './actions';
import { LookedThrough } from './looked-through';

interface InviteFormProps {
  /** The class that people are invited to; null for the workshop alone. */
  readonly classId: string | null;
  /** Whether people can be invited to teach, too. */
  readonly mayInviteInstructors: boolean;
}

/** One address, many pasted ones, or a CSV file; a list is shown before anybody is invited. */
export function InviteForm({ classId, mayInviteInstructors }: InviteFormProps) {
  const [state, send] = useActionState(step.bind(null, classId), { outcome: 'idle' });
  const form = useRef<HTMLFormElement>(null);
  const keepDraft = useFormDraft(form, 'invite', state);
  const { reading, values } = state;
  const role = values?.role ?? 'learner';
  return (
    <form ref={form} action={send} onSubmit={keepDraft} noValidate>
      <FormOutcome state={state} />
      {reading ? (
        <LookedThrough reading={reading} role={role} />
      ) : (
        <div className="max-w-md">
          <TextAreaField
            label="E-mail, one or many"
            name="list"
            rows={3}
            spellCheck={false}
            autoComplete="off"
            defaultValue={values?.list ?? ''}
            error={state.errors?.list}
            hint="One a line or with commas between; names too, as in Marit Vik <marit@example.org>. One address is invited at once, a list is shown to you first."
          />
          <TextField
            label="Or a CSV file"
            name="file"
            type="file"
            accept=".csv,text/csv,text/plain"
            hint="Columns name and e-mail; 200 people at most."
          />
          {mayInviteInstructors && classId !== null ? (
            <SelectField label="As" name="role" defaultValue={role} key={role}>
              <option value="learner">learner</option>
              <option value="instructor">instructor</option>
            </SelectField>
          ) : null}
          <SubmitButton name="step" value="look">
            Invite
          </SubmitButton>
        </div>
      )}
    </form>
  );
}

/** One form, three buttons: look through a list, invite those of it, or go back to it. */
function step(classId: string | null, state: InviteState, form: FormData): Promise<InviteState> {
  switch (form.get('step')) {
    case 'invite':
      return inviteAll(classId, state, form);
    case 'back':
      return Promise.resolve({ outcome: 'idle', values: state.values });
    default:
      return lookThrough(classId, state, form);
  }
}
