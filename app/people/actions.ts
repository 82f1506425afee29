'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { createPasswordLink, createPerson, disablePerson, enablePerson } from '@/lib/data/people';
import { newPersonSchema } from '@/lib/schemas/person';

const notDone: FormState = {
  outcome: 'refused',
  message: 'Not done: only an administrator may, and nobody to their own account.',
};

/** Makes a person and shows, once, the link with which they set their password. */
export async function makePerson(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, newPersonSchema);
  if (!reading.ok) return reading.state;
  const { values } = reading;
  const created = await createPerson(viewer, reading.data);
  switch (created.outcome) {
    case 'created':
      revalidatePath('/people');
      return {
        outcome: 'done',
        message: `${reading.data.name} has an account.`,
        link: created.link,
      };
    case 'address taken':
      return {
        outcome: 'refused',
        message: 'Not made.',
        errors: { email: 'Somebody has an account with that address already.' },
        values,
      };
    case 'not allowed':
      return { ...notDone, values };
  }
}

/** Makes a new link for a password, which ends the earlier ones, and shows it once. */
export async function makeLink(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  const link = await createPasswordLink(viewer, personId);
  if (link === null) return notDone;
  return { outcome: 'done', message: 'A new link. Earlier ones no longer work.', link };
}

/** Disables an account and ends every sign-in of it at once. */
export async function disable(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await disablePerson(viewer, personId))) return notDone;
  revalidatePath(`/people/${personId}`);
  return { outcome: 'done', message: 'Disabled, and signed out everywhere.' };
}

/** Lets a disabled account in again. */
export async function enable(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await enablePerson(viewer, personId))) return notDone;
  revalidatePath(`/people/${personId}`);
  return { outcome: 'done', message: 'In use again.' };
}
