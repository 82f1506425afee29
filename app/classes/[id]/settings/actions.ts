'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { archiveClass, reopenClass, updateClass } from '@/lib/data/classes';
import { classSchema } from '@/lib/schemas/class';
import { notYours } from '../_components/not-yours';

/** Says anew what a class is called, where its clock hangs and when it meets. */
export async function changeClass(
  classId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, classSchema);
  if (!reading.ok) return reading.state;
  const { values } = reading;
  if (!(await updateClass(viewer, classId, reading.data))) return { ...notYours, values };
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Saved.', values };
}

/** Puts a class away. */
export async function putAway(classId: string, _state: FormState): Promise<FormState> {
  if (!(await archiveClass(await requireViewer(), classId))) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Put away.' };
}

/** Takes a class that was put away back into use. */
export async function takeBack(classId: string, _state: FormState): Promise<FormState> {
  if (!(await reopenClass(await requireViewer(), classId))) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Back in use.' };
}
