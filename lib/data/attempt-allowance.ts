import 'server-only';
import type { Viewer } from '@/lib/policy/viewer';
import { countTry, type Allowance } from './entry/throttle';

/** How many attempts are counted in the database at a time. */
const taken = 25;

/** How long what was counted ahead may be used here, in milliseconds. */
const goodFor = 60_000;

/** How many people's counts one instance remembers. */
const mostPeople = 10_000;

const ahead = new Map<string, { left: number; until: number }>();

/**
 * Takes one of the attempts that the viewer may send. All instances share the count; each takes
 * twenty-five ahead, so that an attempt seldom costs a statement of its own.
 */
export async function takeAttempt(viewer: Viewer, at: number = Date.now()): Promise<Allowance> {
  const held = ahead.get(viewer.personId);
  if (held !== undefined && held.left > 0 && held.until > at) {
    held.left -= 1;
    return { allowed: true };
  }
  const counted = await countTry('attempts by person', viewer.personId, taken);
  if (!counted.allowed) return counted;
  if (ahead.size >= mostPeople) ahead.clear();
  ahead.set(viewer.personId, { left: taken - 1, until: at + goodFor });
  return { allowed: true };
}
