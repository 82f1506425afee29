'use server';

import { redirect } from 'next/navigation';
import { passwordSentence } from '@/app/_components/password-sentence';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { currentDevice } from '@/lib/auth/caller';
import { keepSession } from '@/lib/auth/cookie';
import { requireViewer } from '@/lib/auth/viewer';
import { now } from '@/lib/clock';
import { acceptAsNew } from '@/lib/data/entry/accept-invitation';
import { acceptInvitation } from '@/lib/data/joining';
import { newAccountSchema } from '@/lib/schemas/coming-in';

const gone: FormState = {
  outcome: 'refused',
  message:
    'This invitation is used up, withdrawn or too old. Ask whoever sent it to send it again.',
};

/** Accepts an invitation as somebody new, signs them in and opens their first page. */
export async function comeIn(token: string, _state: FormState, form: FormData): Promise<FormState> {
  const reading = readForm(form, newAccountSchema);
  if (!reading.ok) return reading.state;
  const proof = { by: 'link', secret: String(token) } as const;
  const account = { ...reading.data, device: await currentDevice() };
  const accepted = await acceptAsNew(proof, account, now());
  const { values } = reading;
  switch (accepted.outcome) {
    case 'joined':
      await keepSession(accepted.personId, accepted.secret);
      return redirect('/home');
    case 'refused':
      return {
        outcome: 'refused',
        message: 'Not yet: the password will not do.',
        errors: { password: passwordSentence(accepted.complaint) },
        values,
      };
    case 'has an account':
      return {
        outcome: 'refused',
        message: 'This address has an account already. Sign in with it, then open the link again.',
        values,
      };
    case 'no longer good':
      return { ...gone, values };
  }
}

/** Accepts an invitation with the account that is signed in. */
export async function acceptHere(token: string, _state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  const accepted = await acceptInvitation(viewer, { by: 'link', secret: String(token) });
  switch (accepted.outcome) {
    case 'joined':
      return redirect('/home');
    case 'another account':
      return {
        outcome: 'refused',
        message: `This invitation went to ${accepted.invited}, and you are signed in with another address. Sign out, then open the link again.`,
      };
    case 'no longer good':
      return gone;
  }
}
