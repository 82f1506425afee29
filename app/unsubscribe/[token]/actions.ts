'use server';

import type { FormState } from '@/components/ui/form-state';
import { now } from '@/lib/clock';
import { unsubscribe } from '@/lib/data/entry/unsubscribe';

/** Ends letters about classes for the person of the link, which is the proof. */
export async function endClassMail(token: string, _state: FormState): Promise<FormState> {
  const ended = await unsubscribe({ by: 'unsubscribe', token: String(token) }, now());
  return ended
    ? { outcome: 'done', message: 'Done: no more letters about your classes will come.' }
    : { outcome: 'refused', message: 'Not done: this link is not one of ours, or was cut short.' };
}
