'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { addWorkComment } from '@/lib/data/work-comments';
import { commentSchema } from '@/lib/schemas/feedback';
import { notYours } from '../../_components/not-yours';

/** Says something to a learner about what they did for work that is set to them. */
export async function commentOnWork(
  classId: string,
  learnerId: string,
  assignmentId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, commentSchema);
  if (!reading.ok) return reading.state;
  const about = { learnerId, assignmentId };
  if (!(await addWorkComment(viewer, classId, about, reading.data.body))) {
    return { ...notYours, values: reading.values };
  }
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Said. The learner finds it on their Today page.' };
}
