import 'server-only';
import type { Transaction } from 'sequelize';
import { row, rows, transact } from '@/lib/db/query';
import { preparedRow, type Prepared } from '@/lib/db/prepared';
import type { Membership, Viewer } from '@/lib/policy/viewer';
import { models } from '@/models';
import { recordAudit } from '../audit';
import { isPassword } from './password';
import type { PasswordProof, SessionProof } from './proof';
import { hashSecret, newSecret } from './secret';
import { countTry, forgetTries } from './throttle';

/** How long a sign-in holds: without use, and at most. */
export const sessionLimits = {
  learner: { idleMinutes: 12 * 60, hours: 30 * 24 },
  staff: { idleMinutes: 2 * 60, hours: 12 },
} as const;

/** What signing in comes to. */
export type SignIn =
  | { readonly outcome: 'signed in'; readonly personId: string; readonly secret: string }
  | { readonly outcome: 'refused' }
  | { readonly outcome: 'throttled'; readonly retryAfter: number };

/**
 * Signs in with an address and a password. An unknown address, a wrong password and a disabled
 * account look alike and take alike. Too many tries are refused whether they were right or not.
 */
export async function createSession(
  proof: PasswordProof,
  device: string,
  now: Date,
): Promise<SignIn> {
  const email = proof.email.trim().toLowerCase();
  if (proof.from !== null) {
    const byAddress = await countTry('sign-in by address', proof.from);
    if (!byAddress.allowed) return { outcome: 'throttled', retryAfter: byAddress.retryAfter };
  }
  const byAccount = await countTry('sign-in by account', email);
  if (!byAccount.allowed) return { outcome: 'throttled', retryAfter: byAccount.retryAfter };
  const person = await row<PasswordRow>(passwordSql, [email]);
  const fits = await isPassword(person?.passwordHash ?? null, proof.password);
  if (!fits || person === null || person.disabled) {
    await recordAudit({
      actorId: person?.id ?? null,
      action: 'sign-in refused',
      objectKind: 'person',
      objectId: person?.id ?? null,
    });
    return { outcome: 'refused' };
  }
  await forgetTries('sign-in by account', email);
  const secret = await transact((transaction) =>
    insertSession(person.id, device, now, transaction),
  );
  return { outcome: 'signed in', personId: person.id, secret };
}

/** Who holds this session, if it is in force; one query a request, and a touch once a minute. */
export async function findViewer(proof: SessionProof, now: Date): Promise<Viewer | null> {
  const found = await preparedRow<ViewerRow>(viewerOfSession, [hashSecret(proof.secret), now]);
  if (found === null) return null;
  const { stale, ...viewer } = found;
  if (stale) {
    await rows('update sessions set last_seen_at = $2 where id = $1 returning id', [
      viewer.sessionId,
      now,
    ]);
  }
  return viewer;
}

/** Ends a session at once, wherever its token may be kept. */
export async function endSession(proof: SessionProof, now: Date): Promise<void> {
  await transact(async (transaction) => {
    const ended = await row<{ id: string; personId: string }>(
      `update sessions set ended_at = $2 where secret_hash = $1 and ended_at is null
       returning id, person_id as "personId"`,
      [hashSecret(proof.secret), now],
      transaction,
    );
    if (ended === null) return;
    await recordAudit(
      {
        actorId: ended.personId,
        action: 'signed out',
        objectKind: 'session',
        objectId: ended.id,
      },
      transaction,
    );
  });
}

interface PasswordRow {
  readonly id: string;
  readonly passwordHash: string | null;
  readonly disabled: boolean;
}

const passwordSql = `
  select p.id, p.password_hash as "passwordHash",
    (p.disabled_at is not null or p.erased_at is not null) as disabled
  from people p where p.email = $1`;

interface ViewerRow extends Viewer {
  readonly memberships: readonly Membership[];
  readonly stale: boolean;
}

/** The condition on `s` (sessions) and `staff` under which a session is in force at `at`. */
export function inForce(at: string): string {
  return `
    s.ended_at is null and s.expires_at > ${at}
    and s.last_seen_at > ${at} - make_interval(mins => s.idle_minutes)
    and (not staff or (
      s.created_at > ${at} - interval '${sessionLimits.staff.hours} hours'
      and s.last_seen_at > ${at} - interval '${sessionLimits.staff.idleMinutes} minutes'))`;
}

/** What somebody is now decides how long their sign-ins hold, whatever they were when they signed in. */
const viewerOfSession: Prepared = {
  name: 'viewer-of-session',
  text: `
  select s.id as "sessionId", p.id as "personId", l.id as "learnerId", p.name,
    p.is_administrator as "isAdministrator", p.units, p.time_zone as "timeZone",
    p.reduced_motion as "reducedMotion",
    coalesce(inside.memberships, '[]') as memberships,
    s.last_seen_at < $2::timestamptz - interval '1 minute' as stale
  from sessions s
  join people p on p.id = s.person_id and p.disabled_at is null and p.erased_at is null
  join learners l on l.person_id = p.id
  cross join lateral (
    select json_agg(json_build_object('classId', m.class_id, 'role', m.role) order by m.joined_at)
        as memberships,
      coalesce(bool_or(m.role = 'instructor'), false) or p.is_administrator as staff
    from memberships m where m.person_id = p.id and m.left_at is null) inside
  where s.secret_hash = $1 and ${inForce('$2::timestamptz')}`,
};

/**
 * Opens a session for somebody who has just proven who they are; answers its secret. It is opened
 * for as long as a learner's; who teaches or administers is held to less at every request.
 */
export async function insertSession(
  personId: string,
  device: string,
  now: Date,
  transaction: Transaction,
): Promise<string> {
  const secret = newSecret();
  const session = await models().Session.create(
    {
      secretHash: hashSecret(secret),
      personId,
      device: device.slice(0, 200),
      createdAt: now,
      lastSeenAt: now,
      passwordGivenAt: now,
      idleMinutes: sessionLimits.learner.idleMinutes,
      expiresAt: new Date(now.getTime() + sessionLimits.learner.hours * 3_600_000),
    },
    { transaction },
  );
  await recordAudit(
    { actorId: personId, action: 'signed in', objectKind: 'session', objectId: session.id },
    transaction,
  );
  return secret;
}
