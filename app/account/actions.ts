'use server';

import { revalidatePath } from 'next/cache';
import { passwordSentence } from '@/app/_components/password-sentence';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { changePassword } from '@/lib/data/account';
import { updateProfile } from '@/lib/data/profile';
import { askForNewAddress } from '@/lib/data/own-address';
import { newAddressSchema, passwordChangeSchema, profileSchema } from '@/lib/schemas/person';

/** Changes name, time zone and units of whoever is signed in. */
export async function saveProfile(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, profileSchema);
  if (!reading.ok) return reading.state;
  await updateProfile(viewer, reading.data);
  revalidatePath('/', 'layout');
  return { outcome: 'done', message: 'Saved.', values: reading.values };
}

/** Changes the password of whoever is signed in. */
export async function savePassword(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, passwordChangeSchema);
  if (!reading.ok) return reading.state;
  const { currentPassword, newPassword } = reading.data;
  const change = await changePassword(viewer, { current: currentPassword, next: newPassword });
  switch (change.outcome) {
    case 'changed':
      return {
        outcome: 'done',
        message: 'Your password is changed. You are signed out on every other device.',
      };
    case 'throttled':
      return { outcome: 'refused', message: 'That was tried too often. Wait a while, then go on.' };
    case 'wrong password':
      return {
        outcome: 'refused',
        message: 'Not changed.',
        errors: { currentPassword: 'That is not the password you have now.' },
      };
    case 'refused':
      return {
        outcome: 'refused',
        message: 'Not changed.',
        errors: { newPassword: passwordSentence(change.complaint) },
      };
  }
}

/** Writes to a new address of whoever is signed in; following the letter's link makes the change. */
export async function saveAddress(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, newAddressSchema);
  if (!reading.ok) return reading.state;
  const { values } = reading;
  switch (await askForNewAddress(viewer, reading.data.email)) {
    case 'asked':
      return {
        outcome: 'done',
        message: `A letter is on its way to ${reading.data.email}. Until you follow its link, the old address stays in force.`,
      };
    case 'the same':
      return {
        outcome: 'refused',
        message: 'Not changed.',
        errors: { email: 'That is the address you have now.' },
        values,
      };
    case 'password wanted':
      revalidatePath('/account');
      return { outcome: 'refused', message: 'Give your password again first.', values };
    case 'throttled':
      return {
        outcome: 'refused',
        message: 'That was asked for too often. Wait an hour, then go on.',
        values,
      };
  }
}
