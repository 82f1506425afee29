import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, transact } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { hashSecret, newSecret } from './entry/secret';

/** When the viewer's calendar address was made; null when there is none. */
export async function findCalendarAddress(viewer: Viewer): Promise<string | null> {
  const found = await row<{ madeAt: Date }>(
    'select made_at as "madeAt" from calendar_addresses where person_id = $1',
    [viewer.personId],
  );
  return found?.madeAt.toISOString() ?? null;
}

/**
 * Makes the address of the viewer's calendar, which ends the one before. It is answered this once:
 * only the hash of its secret is kept.
 */
export async function makeCalendarAddress(
  viewer: Viewer,
  now: Date = presentTime(),
): Promise<string> {
  const secret = newSecret();
  await transact(async (transaction) => {
    await row(
      `insert into calendar_addresses (person_id, secret_hash, made_at) values ($1, $2, $3)
       on conflict (person_id) do update
         set secret_hash = excluded.secret_hash, made_at = excluded.made_at
       returning person_id`,
      [viewer.personId, hashSecret(secret), now],
      transaction,
    );
    await recordAudit(about(viewer, 'calendar address made'), transaction);
  });
  return `${siteEnvironment().address}/api/calendar/${secret}`;
}

/** Ends the viewer's calendar address. False when there is none. */
export async function endCalendarAddress(viewer: Viewer): Promise<boolean> {
  return transact(async (transaction) => {
    const ended = await row(
      'delete from calendar_addresses where person_id = $1 returning person_id',
      [viewer.personId],
      transaction,
    );
    if (ended === null) return false;
    await recordAudit(about(viewer, 'calendar address ended'), transaction);
    return true;
  });
}

function about(viewer: Viewer, action: 'calendar address made' | 'calendar address ended') {
  return {
    actorId: viewer.personId,
    action,
    objectKind: 'person',
    objectId: viewer.personId,
  } as const;
}
