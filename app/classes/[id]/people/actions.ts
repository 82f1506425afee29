'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { addMember, removeMember, type MemberAdded } from '@/lib/data/class-people';
import { renewJoiningWord, setJoining } from '@/lib/data/joining-word';
import { newMemberSchema, takeOutSchema } from '@/lib/schemas/class';
import { notYours } from '../_components/not-yours';

const refusals: Readonly<Record<Exclude<MemberAdded, 'added'>, string>> = {
  'already there': 'They are in this class already.',
  'no such person': 'Nobody has an account with that address. Invite them instead.',
  'not allowed': 'Only an administrator does this, and only while the class is in use.',
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
    return { outcome: 'refused', message: 'Not done.', errors: { email: refusals[added] }, values };
  }
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'They are in the class now.' };
}

/** Takes somebody out of a class; their work stays theirs. */
export async function takeOut(
  classId: string,
  personId: string,
  _state: FormState,
  form: FormData,
): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, takeOutSchema);
  if (!reading.ok) return reading.state;
  const removed = await removeMember(viewer, classId, personId, reading.data);
  if (removed === 'not allowed') return notYours;
  if (removed === 'last instructor') {
    return {
      outcome: 'refused',
      message: 'Nobody else teaches this class.',
      errors: { evenTheLast: 'Nobody would teach it, and only an administrator would reach it.' },
    };
  }
  if (personId === viewer.personId && !viewer.isAdministrator) redirect('/classes');
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: 'Taken out.' };
}

/** Makes a new joining word; the old one leads nowhere from then on. */
export async function renewWord(classId: string, _state: FormState): Promise<FormState> {
  const word = await renewJoiningWord(await requireViewer(), classId);
  if (word === null) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: `The joining word is ${word} from now on.` };
}

/** Opens joining by the word, or closes it. */
export async function letJoin(
  classId: string,
  open: boolean,
  _state: FormState,
): Promise<FormState> {
  if (!(await setJoining(await requireViewer(), classId, open))) return notYours;
  revalidatePath(`/classes/${classId}`, 'layout');
  return { outcome: 'done', message: open ? 'Joining is open.' : 'Joining is closed.' };
}
