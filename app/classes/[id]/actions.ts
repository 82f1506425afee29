'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { createAssignment, withdrawAssignment } from '@/lib/data/assignments';
import { addMember, removeMember, type MemberAdded } from '@/lib/data/classes';
import { newAssignmentSchema, newMemberSchema } from '@/lib/schemas/class';

const notYours: FormState = {
  outcome: 'refused',
  message: 'Not done: this class is not here any more, or is not yours to change.',
};

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
      revalidatePath(`/classes/${classId}`);
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
  revalidatePath(`/classes/${classId}`);
  return { outcome: 'done', message: 'Taken back.' };
}

const refusals: Readonly<Record<Exclude<MemberAdded, 'added'>, string>> = {
  'already there': 'They are in this class already.',
  'no such person': 'Nobody has an account with that address.',
  'not allowed': 'Only an administrator changes who is in a class.',
};

/** Puts somebody into a class. */
export async function putIn(
  classId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, newMemberSchema);
  if (!reading.ok) return reading.state;
  const added = await addMember(viewer, classId, reading.data);
  if (added !== 'added') {
    const { values } = reading;
    return {
      outcome: 'refused',
      message: 'Not done.',
      errors: { email: refusals[added] },
      values,
    };
  }
  revalidatePath(`/classes/${classId}`);
  return { outcome: 'done', message: 'They are in the class now.' };
}

/** Takes somebody out of a class; their work stays theirs. */
export async function takeOut(
  classId: string,
  personId: string,
  _state: FormState,
): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await removeMember(viewer, classId, personId))) return notYours;
  revalidatePath(`/classes/${classId}`);
  return { outcome: 'done', message: 'Taken out.' };
}
