import 'server-only';
import { cookies } from 'next/headers';
import { siteEnvironment } from '@/lib/env';
import { unitSystems, type UnitSystem } from '@/lib/quantities/unit-system';
import { currentViewer } from './viewer';

/** Holds the units of somebody who reads without an account, until the browser is closed. */
const unitsCookie = 'hornbeam-units';

/** The units of whoever reads: their own, those chosen in this browser, or millimetres. */
export async function readerUnits(): Promise<UnitSystem> {
  const viewer = await currentViewer();
  if (viewer !== null) return viewer.units;
  const chosen = (await cookies()).get(unitsCookie)?.value;
  return unitSystems.find((units) => units === chosen) ?? 'metric';
}

/** Keeps the units chosen by somebody who is not signed in. */
export async function rememberUnits(units: UnitSystem): Promise<void> {
  const { secure } = siteEnvironment();
  (await cookies()).set(unitsCookie, units, { httpOnly: true, sameSite: 'lax', path: '/', secure });
}
