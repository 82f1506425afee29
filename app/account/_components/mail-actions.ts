'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { changeClassMail } from '@/lib/data/mail-preference';
import { mailPreferenceSchema } from '@/lib/schemas/mail';

/** Lets letters about classes come, or ends them, for whoever is signed in. */
export async function saveMailPreference(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, mailPreferenceSchema);
  if (!reading.ok) return reading.state;
  await changeClassMail(viewer, reading.data.classMail);
  revalidatePath('/account');
  return { outcome: 'done', message: 'Saved.', values: reading.values };
}
