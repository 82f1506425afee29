'use server';

import { redirect } from 'next/navigation';
import { readForm } from '@/app/_components/read-form';
import { waitSentence } from '@/app/_components/wait-sentence';
import type { FormState } from '@/components/ui/form-state';
import { currentCaller } from '@/lib/auth/caller';
import { requireViewer } from '@/lib/auth/viewer';
import { askToJoin } from '@/lib/data/entry/joining';
import { joinByWord } from '@/lib/data/joining';
import { joiningSchema, joiningWordSchema } from '@/lib/schemas/coming-in';

/** Takes the wish to join a class; says the same whether word and address are known or not. */
export async function askToComeIn(_state: FormState, form: FormData): Promise<FormState> {
  const reading = readForm(form, joiningSchema);
  if (!reading.ok) return reading.state;
  const { data, values } = reading;
  const asked = await askToJoin({ by: 'form', from: await currentCaller() }, data);
  if (!asked.allowed) {
    return { outcome: 'refused', message: waitSentence(asked.retryAfter), values };
  }
  return {
    outcome: 'done',
    message: `If a class is open to that word, a letter is on its way to ${data.email}. The link in it brings you in; it works for a day.`,
    values,
  };
}

/** Puts whoever is signed in into the class that is open to the word. */
export async function joinAtOnce(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, joiningWordSchema);
  if (!reading.ok) return reading.state;
  const { values } = reading;
  const joined = await joinByWord(viewer, reading.data.word);
  switch (joined.outcome) {
    case 'joined':
      return redirect('/today');
    case 'already there':
      return { outcome: 'done', message: `You are in ${joined.className} already.`, values };
    case 'throttled':
      return { outcome: 'refused', message: waitSentence(joined.retryAfter), values };
    case 'no such word':
      return {
        outcome: 'refused',
        message: 'Not joined.',
        errors: {
          word: 'No class is open to that word. It looks like rowan-spokeshave-0417; ask your instructor whether joining is open.',
        },
        values,
      };
  }
}
