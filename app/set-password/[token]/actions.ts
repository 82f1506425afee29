'use server';

import { z } from 'zod';
import type { FormState } from '@/components/ui/form-state';
import { readForm } from '@/app/_components/read-form';
import { now } from '@/lib/clock';
import { setPassword } from '@/lib/data/entry/set-password';
import { newPassword } from '@/lib/schemas/coming-in';
import { passwordSentence } from '@/app/_components/password-sentence';

const schema = z.strictObject({ password: newPassword });

/** Sets the password of the person the link belongs to. The link itself is the proof. */
export async function setPasswordByLink(
  secret: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const reading = readForm(form, schema);
  if (!reading.ok) return reading.state;
  const result = await setPassword(
    { by: 'link', secret: String(secret) },
    reading.data.password,
    now(),
  );
  if (result.outcome === 'no longer good') {
    return {
      outcome: 'refused',
      message: 'This link is used up or too old. Ask for a new one where you got it.',
    };
  }
  if (result.outcome === 'refused') {
    return {
      outcome: 'refused',
      message: 'Not set yet.',
      errors: { password: passwordSentence(result.complaint) },
    };
  }
  return { outcome: 'done', message: 'Your password is set. You can sign in with it now.' };
}
