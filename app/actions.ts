'use server';

import { requireViewer } from '@/lib/auth/viewer';
import { updatePreferences } from '@/lib/data/people';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { unitsSchema } from '@/lib/schemas/person';

/** Changes the units of whoever is signed in; anything that is not a unit system is left alone. */
export async function setUnits(units: UnitSystem): Promise<void> {
  const viewer = await requireViewer();
  const reading = unitsSchema.safeParse(units);
  if (reading.success) await updatePreferences(viewer, { units: reading.data });
}
