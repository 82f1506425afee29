'use server';

import { revalidatePath } from 'next/cache';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { endCalendarAddress, makeCalendarAddress } from '@/lib/data/calendar-address';

/** Makes the address of one's calendar and shows it, this once. */
export async function makeCalendar(_state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  const link = await makeCalendarAddress(viewer);
  revalidatePath('/account');
  return {
    outcome: 'done',
    message: 'Subscribe to this address in your calendar.',
    link,
    linkSays: 'Copy it now: it is shown this once. Whoever has it can read what is due for you.',
  };
}

/** Ends the address of one's calendar. */
export async function endCalendar(_state: FormState): Promise<FormState> {
  const viewer = await requireViewer();
  await endCalendarAddress(viewer);
  revalidatePath('/account');
  return { outcome: 'done', message: 'Ended: calendars that use it get nothing more.' };
}
