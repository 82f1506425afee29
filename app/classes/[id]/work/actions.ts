'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { createAssignment, withdrawAssignment } from '@/lib/data/assignments';
import { newAssignmentSchema } from '@/lib/schemas/class';
import { notYours } from '../_components/not-yours';

/** Sets a lesson to a class. */
export async function setLesson(
  classId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, newAssignmentSchema);
  if (!reading.ok) return reading.state;
  const { lessonId, ...when } = reading.data;
  const result = await createAssignment(viewer, classId, {
    ...when,
    lessons: [lessonId],
    exercises: [],
  });
  const { values } = reading;
  switch (result.outcome) {
    case 'set':
      revalidatePath(`/classes/${classId}`, 'layout');
      return { outcome: 'done', message: 'Set. It stands on everybody’s Today page now.' };
    case 'due in the past':
      return {
        outcome: 'refused',
        message: 'Not set yet.',
        errors: { dueOn: 'That moment has passed; choose a later one.' },
        values,
      };
    case 'nothing chosen':
      return {
        outcome: 'refused',
        message: 'Not set yet.',
        errors: { lessonId: 'Choose a lesson from the list.' },
        values,
      };
    case 'no such class':
      return { ...notYours, values };
  }
}

/** Takes set work back; what was done for it is kept. */
export async function withdrawWork(
  classId: string,
  assignmentId: string,
  _state: FormState,
): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await withdrawAssignment(viewer, classId, assignmentId))) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Taken back.' };
}
