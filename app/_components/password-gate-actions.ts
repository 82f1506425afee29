'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { givePassword } from '@/lib/data/password-given';
import { readForm } from './read-form';

const schema = z.strictObject({
  password: z.string().min(1, 'Type your password.').max(1000),
});

/** Takes the password of whoever is signed in again, and opens what lies behind it for a while. */
export async function givePasswordAgain(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, schema);
  if (!reading.ok) return { ...reading.state, message: 'Not yet.' };
  switch (await givePassword(viewer, reading.data.password)) {
    case 'given':
      revalidatePath('/', 'layout');
      return { outcome: 'done' };
    case 'wrong':
      return {
        outcome: 'refused',
        message: 'Not yet.',
        errors: { password: 'That is not your password.' },
      };
    case 'throttled':
      return { outcome: 'refused', message: 'That was tried too often. Wait a while, then go on.' };
  }
}
