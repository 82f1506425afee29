'use server';

import { redirect } from 'next/navigation';
import { readForm } from '@/app/_components/read-form';
import type { FormState } from '@/components/ui/form-state';
import { requireViewer } from '@/lib/auth/viewer';
import { createClass } from '@/lib/data/classes';
import { classSchema } from '@/lib/schemas/class';

/** Makes a class and opens it. */
export async function makeClass(_state: FormState, form: FormData): Promise<FormState> {
  const viewer = await requireViewer();
  const reading = readForm(form, classSchema);
  if (!reading.ok) return reading.state;
  const classId = await createClass(viewer, reading.data);
  if (classId === null) {
    return {
      outcome: 'refused',
      message: 'Only an administrator makes classes.',
      values: reading.values,
    };
  }
  redirect(`/classes/${classId}`);
}
