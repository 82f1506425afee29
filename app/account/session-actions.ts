'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { endOwnSession, endOwnSessions } from '@/lib/data/own-sessions';

/** Ends one of the sign-ins of whoever is signed in. */
export async function endSession(sessionId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  const ended = await endOwnSession(viewer, String(sessionId));
  revalidatePath('/account');
  return ended
    ? { outcome: 'done', message: 'Ended.' }
    : { outcome: 'refused', message: 'It had ended already.' };
}

const sureSchema = z.strictObject({ sure: z.literal('yes', 'Press the button once more.') });

/** Ends every sign-in, this one too; nothing but the form's own button does it. */
export async function signOutEverywhere(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, sureSchema);
  if (!reading.ok) return { outcome: 'refused', message: 'Not done: press the button once more.' };
  await endOwnSessions(viewer);
  revalidatePath('/', 'layout');
  redirect('/sign-in');
}
