'use server';

import { revalidatePath } from 'next/cache';
import { readForm } from '@/app/_components/read-form';
import { sayDeadline } from '@/components/progress/say-due';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { updateAssignment } from '@/lib/data/assignment-change';
import { createAssignment, withdrawAssignment } from '@/lib/data/assignments';
import { findClass } from '@/lib/data/classes';
import { giveExtension, takeBackExtension } from '@/lib/data/extensions';
import { assignmentLists, assignmentSchema, extensionSchema } from '@/lib/schemas/assignment';
import { notYours } from '../_components/not-yours';
import type { AssignmentState } from './_components/assignment-state';
import { refusalOf } from './_components/refusals';
import { bothVersions } from './_components/form-choices';

/** Sets work to a class, or to some of its learners. */
export async function setWork(
  classId: string,
  _state: AssignmentState,
  form: FormData,
): Promise<AssignmentState> {
  const viewer = await requireViewer();
  const reading = readForm(form, assignmentSchema, assignmentLists);
  if (!reading.ok) return reading.state;
  const result = await createAssignment(viewer, classId, reading.data);
  if (result.outcome !== 'set') {
    return { ...refusalOf(result.outcome), values: reading.values };
  }
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: `Set. ${await dueSentence(classId, result.dueAt)}` };
}

/** Changes work that is set; of two who change it at once, the second is shown both versions. */
export async function changeWork(
  classId: string,
  assignmentId: string,
  _state: AssignmentState,
  form: FormData,
): Promise<AssignmentState> {
  const viewer = await requireViewer();
  const reading = readForm(form, assignmentSchema, assignmentLists);
  if (!reading.ok) return reading.state;
  const { data, values } = reading;
  const result = await updateAssignment(viewer, classId, assignmentId, data.version, data);
  switch (result.outcome) {
    case 'changed':
      revalidatePath(`/classes/${classId}`, 'layout');
      return {
        outcome: 'done',
        message: `Saved. ${await dueSentence(classId, result.dueAt)}`,
        version: data.version + 1,
        values: { ...values, version: String(data.version + 1) },
      };
    case 'changed meanwhile':
      return bothVersions(values, result.current, (await findClass(viewer, classId))?.timeZone);
    case 'has answers':
      return {
        outcome: 'refused',
        message: 'Not saved yet.',
        errors: {
          lesson: `There are answers to ${result.titles.join(', ') || 'what you left out'}: keep it in, or take the whole back, which keeps them.`,
        },
        values,
      };
    default:
      return { ...refusalOf(result.outcome), values };
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

/** Gives one learner more time, or changes what they were given. */
export async function giveTime(
  classId: string,
  assignmentId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, extensionSchema);
  if (!reading.ok) return reading.state;
  const result = await giveExtension(viewer, classId, assignmentId, reading.data);
  const { values } = reading;
  switch (result.outcome) {
    case 'given':
      revalidatePath(`/classes/${classId}`, 'layout');
      return { outcome: 'done', message: await dueSentence(classId, result.dueAt) };
    case 'not later':
      return wrongDay('That is not later than it is due for everybody.', values);
    case 'in the past':
      return wrongDay('That moment has passed; choose a later one.', values);
    case 'no such learner':
      return { ...notYours, values };
  }
}

/** Takes back the time that one learner was given. */
export async function takeTimeBack(
  classId: string,
  assignmentId: string,
  learnerId: string,
  _state: FormState,
): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await takeBackExtension(viewer, classId, assignmentId, learnerId))) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Taken back.' };
}

function wrongDay(dueOn: string, values: FormState['values']): FormState {
  return { outcome: 'refused', message: 'Not given yet.', errors: { dueOn }, values };
}

/** When it is due, as the clock of the class will show it: a skipped time is seen at once. */
async function dueSentence(classId: string, dueAt: string): Promise<string> {
  const found = await findClass(await requireViewer(), classId);
  return found === null ? '' : `It is due ${sayDeadline(dueAt, found.timeZone)}.`;
}
