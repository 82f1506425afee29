'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import {
  createPasswordLink,
  createPerson,
  disablePerson,
  enablePerson,
  makeAdministrator,
  unmakeAdministrator,
} from '@/lib/data/people';
import { newPersonSchema } from '@/lib/schemas/person';

const notDone: FormState = {
  outcome: 'refused',
  message:
    'Not done: only an administrator may, with their password given lately, and nobody to their own account.',
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
        message: `${reading.data.name} has an account, and a letter with a link to the first password is on its way.`,
        link: created.link,
      };
    case 'address taken':
      return {
        outcome: 'refused',
        message: 'Not made.',
        errors: { email: 'Somebody has an account with that address already.' },
        values,
      };
    case 'password wanted':
      revalidatePath('/people');
      return { outcome: 'refused', message: 'Not made: give your own password again.', values };
    case 'not allowed':
      return { ...notDone, values };
  }
}

/** Makes a new link for a password, which ends the earlier ones, and shows it once. */
export async function makeLink(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  const link = await createPasswordLink(viewer, personId);
  if (link === null) return notDone;
  return {
    outcome: 'done',
    message: 'A letter with a new link is on its way. Earlier links no longer work.',
    link,
  };
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

/** Makes somebody an administrator. */
export async function makeAdmin(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await makeAdministrator(viewer, personId))) return notDone;
  revalidatePath(`/people/${personId}`);
  return { outcome: 'done', message: 'They are an administrator from now on.' };
}

/** Makes an administrator one no longer, unless nobody would be left. */
export async function unmakeAdmin(personId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await unmakeAdministrator(viewer, personId))) {
    return {
      outcome: 'refused',
      message: 'Not done: the workshop keeps one administrator at least.',
    };
  }
  revalidatePath(`/people/${personId}`);
  return { outcome: 'done', message: 'They are no administrator any more.' };
}
