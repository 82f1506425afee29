'use server';

import { revalidatePath } from 'next/cache';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { sendLetterAgain } from '@/lib/data/mail-log';

/** Puts a letter that was sent, or has failed, on its way once more. */
export async function sendAgain(letterId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await sendLetterAgain(viewer, letterId))) {
    return { outcome: 'refused', message: 'Not sent: it is on its way already, or not there.' };
  }
  revalidatePath('/mail');
  return { outcome: 'done', message: 'On its way.' };
}
