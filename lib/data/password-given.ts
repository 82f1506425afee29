import 'server-only';
import type { Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isPassword } from './entry/password';
import { countTry, forgetTries } from './entry/throttle';

/** For how long a password that was given is enough for what is sensitive. */
export const passwordMinutes = 15;

/** What giving one's password again comes to. */
export type PasswordGiven = 'given' | 'wrong' | 'throttled';

/** Whether the viewer has given their password, in this session, within the last quarter of an hour. */
export async function hasGivenPassword(
  viewer: Viewer,
  now: Date = presentTime(),
  transaction?: Transaction,
): Promise<boolean> {
  const given = await row(
    `select 1 as given from sessions where id = $1 and person_id = $2 and ended_at is null
       and password_given_at > $3::timestamptz - make_interval(mins => $4)`,
    [viewer.sessionId, viewer.personId, now, passwordMinutes],
    transaction,
  );
  return given !== null;
}

/** Takes the viewer's password again. Wrong tries count with those of signing in. */
export async function givePassword(
  viewer: Viewer,
  password: string,
  now: Date = presentTime(),
): Promise<PasswordGiven> {
  const person = await row<{ email: string; passwordHash: string | null }>(
    'select email, password_hash as "passwordHash" from people where id = $1',
    [viewer.personId],
  );
  if (person === null) return 'wrong';
  const tries = await countTry('sign-in by account', person.email);
  if (!tries.allowed) return 'throttled';
  if (!(await isPassword(person.passwordHash, password))) return 'wrong';
  await forgetTries('sign-in by account', person.email);
  await transact(async (transaction) => {
    await rows(
      'update sessions set password_given_at = $2 where id = $1 returning id',
      [viewer.sessionId, now],
      transaction,
    );
    const object = { objectKind: 'session', objectId: viewer.sessionId } as const;
    await recordAudit(
      { actorId: viewer.personId, action: 'password given again', ...object },
      transaction,
    );
  });
  return 'given';
}
