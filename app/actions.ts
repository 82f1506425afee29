'use server';

import { rememberUnits } from '@/lib/auth/reader-units';
import { currentViewer } from '@/lib/auth/viewer';
import { updateProfile } from '@/lib/data/profile';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { unitsSchema } from '@/lib/schemas/person';

/**
 * Changes the units of whoever reads: a person's own, or this browser's where nobody is signed in.
 * Anything that is not a unit system is left alone.
 */
export async function setUnits(units: UnitSystem): Promise<void> {
  const reading = unitsSchema.safeParse(units);
  if (!reading.success) return;
  const viewer = await currentViewer();
  if (viewer === null) await rememberUnits(reading.data);
  else await updateProfile(viewer, { units: reading.data });
}
