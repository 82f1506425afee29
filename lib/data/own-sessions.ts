import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { rows, transact } from '@/lib/db/query';
import { isStaff, type Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isId } from './class-right';
import { inForce } from './entry/sessions';

/** A sign-in of the viewer's that is in force. */
export interface OwnSession {
  readonly sessionId: string;
  /** What the browser said of itself. */
  readonly device: string;
  readonly signedInAt: string;
  readonly lastSeenAt: string;
  /** Whether it is the one that asks. */
  readonly here: boolean;
}

/** The viewer's sign-ins that are in force, this one first. */
export async function listOwnSessions(
  viewer: Viewer,
  now: Date = presentTime(),
): Promise<OwnSession[]> {
  const found = await rows<
    Omit<OwnSession, 'signedInAt' | 'lastSeenAt'> & { signedInAt: Date; lastSeenAt: Date }
  >(
    `select s.id as "sessionId", s.device, s.created_at as "signedInAt",
       s.last_seen_at as "lastSeenAt", s.id = $2 as here
     from sessions s, (select $4::boolean as staff) as who
     where s.person_id = $1 and ${inForce('$3::timestamptz')}
     order by here desc, s.last_seen_at desc`,
    [viewer.personId, viewer.sessionId, now, isStaff(viewer)],
  );
  return found.map((one) => ({
    ...one,
    signedInAt: one.signedInAt.toISOString(),
    lastSeenAt: one.lastSeenAt.toISOString(),
  }));
}

/** Ends one of the viewer's sign-ins at once. False when it is not theirs or over already. */
export async function endOwnSession(
  viewer: Viewer,
  sessionId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!isId(sessionId)) return false;
  return transact(async (transaction) => {
    const ended = await rows(
      `update sessions set ended_at = $3
       where id = $1 and person_id = $2 and ended_at is null returning id`,
      [sessionId, viewer.personId, now],
      transaction,
    );
    if (ended.length === 0) return false;
    const object = { objectKind: 'session', objectId: sessionId } as const;
    await recordAudit(
      { actorId: viewer.personId, action: 'session ended', ...object },
      transaction,
    );
    return true;
  });
}

/** Ends every sign-in of the viewer's, this one too; answers how many there were. */
export async function endOwnSessions(viewer: Viewer, now: Date = presentTime()): Promise<number> {
  return transact(async (transaction) => {
    const ended = await rows(
      'update sessions set ended_at = $2 where person_id = $1 and ended_at is null returning id',
      [viewer.personId, now],
      transaction,
    );
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'signed out everywhere',
        objectKind: 'person',
        objectId: viewer.personId,
        detail: { sessions: ended.length },
      },
      transaction,
    );
    return ended.length;
  });
}
