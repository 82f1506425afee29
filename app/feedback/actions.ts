'use server';

import { revalidatePath } from 'next/cache';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { readFeedback } from '@/lib/data/feedback';

/** Notes that the learner has read what they were told. */
export async function haveRead(_state: FormState): Promise<FormState> {
  await readFeedback(await requireViewer());
  revalidatePath('/feedback');
  revalidatePath('/today');
  return { outcome: 'done', message: 'Noted: your instructor sees that you have read it.' };
}
