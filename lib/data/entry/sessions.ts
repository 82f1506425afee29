import 'server-only';
import { row, rows, transact } from '@/lib/db/query';
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
  return openSession(person, device, now);
}

/** Who holds this session, if it is in force; one query a request, and a touch once a minute. */
export async function findViewer(proof: SessionProof, now: Date): Promise<Viewer | null> {
  const found = await row<ViewerRow>(viewerSql, [hashSecret(proof.secret), now]);
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
  readonly staff: boolean;
}

const passwordSql = `
  select p.id, p.password_hash as "passwordHash",
    (p.disabled_at is not null or p.erased_at is not null) as disabled,
    (p.is_administrator or exists (
      select 1 from memberships m
      where m.person_id = p.id and m.left_at is null and m.role = 'instructor')) as staff
  from people p where p.email = $1`;

interface ViewerRow extends Viewer {
  readonly memberships: readonly Membership[];
  readonly stale: boolean;
}

const viewerSql = `
  select s.id as "sessionId", p.id as "personId", l.id as "learnerId", p.name,
    p.is_administrator as "isAdministrator", p.units, p.time_zone as "timeZone",
    coalesce((
      select json_agg(json_build_object('classId', m.class_id, 'role', m.role) order by m.joined_at)
      from memberships m where m.person_id = p.id and m.left_at is null), '[]') as memberships,
    s.last_seen_at < $2::timestamptz - interval '1 minute' as stale
  from sessions s
  join people p on p.id = s.person_id and p.disabled_at is null and p.erased_at is null
  join learners l on l.person_id = p.id
  where s.secret_hash = $1 and s.ended_at is null and s.expires_at > $2::timestamptz
    and s.last_seen_at > $2::timestamptz - make_interval(mins => s.idle_minutes)`;

async function openSession(person: PasswordRow, device: string, now: Date): Promise<SignIn> {
  const secret = newSecret();
  const limits = person.staff ? sessionLimits.staff : sessionLimits.learner;
  await transact(async (transaction) => {
    const session = await models().Session.create(
      {
        secretHash: hashSecret(secret),
        personId: person.id,
        device: device.slice(0, 200),
        createdAt: now,
        lastSeenAt: now,
        passwordGivenAt: now,
        idleMinutes: limits.idleMinutes,
        expiresAt: new Date(now.getTime() + limits.hours * 3_600_000),
      },
      { transaction },
    );
    await recordAudit(
      { actorId: person.id, action: 'signed in', objectKind: 'session', objectId: session.id },
      transaction,
    );
  });
  return { outcome: 'signed in', personId: person.id, secret };
}
