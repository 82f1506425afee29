'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { addComment, overrideMarking } from '@/lib/data/feedback';
import { commentSchema, overrideSchema } from '@/lib/schemas/feedback';
import { notYours } from '../../_components/not-yours';

/** Says something to the learner about an attempt. */
export async function comment(
  classId: string,
  attemptId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, commentSchema);
  if (!reading.ok) return reading.state;
  if (!(await addComment(viewer, classId, attemptId, reading.data.body))) {
    return { ...notYours, values: reading.values };
  }
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Said. The learner finds it on their Today page.' };
}

/** Marks an attempt otherwise than it was marked, with the reason. */
export async function markOtherwise(
  classId: string,
  attemptId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, overrideSchema);
  if (!reading.ok) return reading.state;
  const { values } = reading;
  const done = await overrideMarking(viewer, classId, attemptId, reading.data);
  if (done === 'no such attempt') return { ...notYours, values };
  if (done === 'stands so already') {
    const errors = { verdict: 'It stands so already.' };
    return { outcome: 'refused', message: 'Nothing was changed.', errors, values };
  }
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'It stands so now. What was marked is kept beside it.' };
}
