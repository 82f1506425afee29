'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { waitSentence } from '@/app/_components/wait-sentence';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import {
  checkInvitees,
  createInvitations,
  resendInvitation,
  withdrawInvitation,
  type InvitedTo,
} from '@/lib/data/invitations';
import { inviteesSchema } from '@/lib/schemas/coming-in';
import type { Invitee, InviteeReading } from '@/lib/schemas/invitees';
import { readList } from './read-list';

/** What the form for inviting shows: with a `reading`, a list that was looked through. */
export interface InviteState extends FormState {
  readonly reading?: InviteeReading;
}

const roleSchema = z.enum(['learner', 'instructor']);
const notYours: InviteState = {
  outcome: 'refused',
  message: 'Not done: inviting here is not yours, or the class is not here any more.',
};

/**
 * Looks through what was pasted or chosen and changes nothing; one single address, with nothing wrong,
 * is invited at once.
 */
export async function lookThrough(
  classId: string | null,
  _state: InviteState,
  form: FormData,
): Promise<InviteState> {
  const viewer = await requireViewer();
  const to = target(classId, form.get('role'));
  const { list, reading: read } = await readList(form);
  const role = roleSchema.safeParse(form.get('role')).data ?? 'learner';
  const values = { list, role };
  if (read === null) {
    return {
      outcome: 'refused',
      message: 'Nobody is invited yet.',
      errors: { list: 'Type or paste an address such as you@example.org, or choose a CSV file.' },
      values,
    };
  }
  const reading = await checkInvitees(viewer, to, read);
  if (reading === null) return { ...notYours, values };
  const [single] = reading.good;
  if (single && reading.good.length === 1 && reading.bad.length === 0 && read.good.length === 1) {
    return send(to, [single], values);
  }
  return { outcome: 'idle', reading, values };
}

/** Invites everybody of a list that was looked through. */
export async function inviteAll(
  classId: string | null,
  _state: InviteState,
  form: FormData,
): Promise<InviteState> {
  const people = readPeople(form.get('people'));
  const values = { list: '', role: String(form.get('role') ?? 'learner') };
  if (people === null) {
    return { outcome: 'refused', message: 'That list cannot be read. Look through it again.' };
  }
  return send(target(classId, form.get('role')), people, values);
}

/** Sends an invitation again, with a new link. */
export async function sendAgain(invitationId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  switch (await resendInvitation(viewer, invitationId)) {
    case 'sent':
      revalidatePath('/', 'layout');
      return { outcome: 'done', message: 'Sent again. The earlier letter no longer works.' };
    case 'too soon':
      return { outcome: 'refused', message: 'It was sent this minute. Wait a little.' };
    case 'not there':
      return { outcome: 'refused', message: 'It is not there any more.' };
  }
}

/** Withdraws an invitation; its letter leads nowhere from then on. */
export async function withdraw(invitationId: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  if (!(await withdrawInvitation(viewer, invitationId))) {
    return { outcome: 'refused', message: 'It is not there any more.' };
  }
  revalidatePath('/', 'layout');
  return { outcome: 'done', message: 'Withdrawn.' };
}

async function send(
  to: InvitedTo,
  people: readonly Invitee[],
  values: Readonly<Record<string, string>>,
): Promise<InviteState> {
  const viewer = await requireViewer();
  const invited = await createInvitations(viewer, to, people);
  switch (invited.outcome) {
    case 'not allowed':
      return { ...notYours, values };
    case 'too many':
      return { outcome: 'refused', message: waitSentence(invited.retryAfter), values };
    case 'invited': {
      revalidatePath('/', 'layout');
      const left = invited.left.length;
      const besides = left === 0 ? '' : ` ${left} were in or invited already.`;
      return {
        outcome: 'done',
        message: `${countOf(invited.count)} on the way.${besides}`,
        values: { ...values, list: '' },
      };
    }
  }
}

function countOf(letters: number): string {
  return letters === 1 ? 'One letter is' : `${letters} letters are`;
}

function target(classId: string | null, role: FormDataEntryValue | null): InvitedTo {
  if (classId === null) return { classId };
  return { classId: String(classId), role: roleSchema.safeParse(role).data ?? 'learner' };
}

function readPeople(value: FormDataEntryValue | null): Invitee[] | null {
  try {
    return inviteesSchema.safeParse(JSON.parse(String(value))).data ?? null;
  } catch {
    return null;
  }
}
