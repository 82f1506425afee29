'use server';

import type { FormState } from '@/components/ui/form-state';
import { now } from '@/lib/clock';
import { confirmNewAddress } from '@/lib/data/entry/confirm-address';

/** Puts a new address into force. The link that was sent to it is the proof. */
export async function confirmAddress(token: string, _state: FormState): Promise<FormState> {
  const confirmed = await confirmNewAddress({ by: 'link', secret: String(token) }, now());
  switch (confirmed.outcome) {
    case 'changed':
      return { outcome: 'done', message: `Done. You sign in with ${confirmed.email} from now on.` };
    case 'address taken':
      return {
        outcome: 'refused',
        message: 'Another account has that address by now. Your old one stays in force.',
      };
    case 'no longer good':
      return {
        outcome: 'refused',
        message: 'This link is used up or too old. Ask for the change again on your account page.',
      };
  }
}
