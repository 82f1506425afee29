'use server';

import { readForm } from '@/app/_components/read-form';
import { waitSentence } from '@/app/_components/wait-sentence';
import type { FormState } from '@/components/ui/form-state';
import { currentCaller } from '@/lib/auth/caller';
import { askForReset } from '@/lib/data/entry/forgotten';
import { forgottenSchema } from '@/lib/schemas/coming-in';

/** Takes the wish for a new password; says the same whether the address is known or not. */
export async function askReset(_state: FormState, form: FormData): Promise<FormState> {
  const reading = readForm(form, forgottenSchema);
  if (!reading.ok) return reading.state;
  const proof = { by: 'form', from: await currentCaller() } as const;
  const asked = await askForReset(proof, reading.data.email);
  if (!asked.allowed) {
    return {
      outcome: 'refused',
      message: waitSentence(asked.retryAfter),
      values: reading.values,
    };
  }
  return {
    outcome: 'done',
    message: `If ${reading.data.email} has an account here, a letter is on its way to it.`,
    values: reading.values,
  };
}
