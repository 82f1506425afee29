import 'server-only';
import type { Transaction } from 'sequelize';
import { randomUUID } from 'node:crypto';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { LetterKind } from '@/lib/mail/letter';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import type { LetterState, MailFilter } from '@/lib/schemas/mail';
import { recordAudit } from './audit';
import { isId } from './class-right';
import { messageIdOf, queueSending } from './letters';

/** How many letters stand on a page of the log. */
export const lettersOnPage = 50;

/** A letter in the log: who, when, what kind, how it stands; never what it says. */
export interface LetterListed {
  readonly letterId: string;
  readonly kind: LetterKind;
  readonly to: string;
  readonly personId: string | null;
  readonly personName: string | null;
  readonly state: LetterState;
  readonly tries: number;
  /** Why it was not sent, or the last try did not succeed. */
  readonly reason: string | null;
  readonly createdAt: string;
  readonly sendAfter: string;
  readonly sentAt: string | null;
  /** Whether it is a copy of an earlier letter, sent once more. */
  readonly again: boolean;
}

/** A page of the log. */
export interface MailLog {
  readonly letters: readonly LetterListed[];
  /** What to ask the next page with; null on the last. */
  readonly next: string | null;
  /** How many there are in each state, whatever is asked for. */
  readonly counts: Readonly<Record<LetterState, number>>;
}

/** The mail log, the latest first, for the administrator; empty for anybody else. Two queries. */
export async function findMailLog(viewer: Viewer, filter: MailFilter): Promise<MailLog> {
  const allowed = can(viewer, 'see what was mailed');
  const { state, kind, address, after } = filter;
  const [found, counted] = await Promise.all([
    rows<LetterRow>(logSql, [
      allowed,
      state,
      kind === '' ? null : kind,
      address.toLowerCase(),
      after,
      lettersOnPage + 1,
    ]),
    rows<{ state: LetterState; n: number }>(
      'select state, count(*)::int as n from letters where $1::boolean group by state',
      [allowed],
    ),
  ]);
  const shown = found.slice(0, lettersOnPage);
  const counts = { waiting: 0, sent: 0, failed: 0, dropped: 0 };
  for (const { state: of, n } of counted) counts[of] = n;
  return {
    letters: shown.map(({ createdAt, sendAfter, sentAt, ...rest }) => ({
      ...rest,
      createdAt: createdAt.toISOString(),
      sendAfter: sendAfter.toISOString(),
      sentAt: sentAt?.toISOString() ?? null,
    })),
    next: found.length > shown.length ? (shown.at(-1)?.letterId ?? null) : null,
    counts,
  };
}

/**
 * Sends a letter once more, by the administrator: one that failed is tried anew as the same letter;
 * of one that was sent a copy goes out, as a letter of its own. False when that cannot be done.
 */
export async function sendLetterAgain(
  viewer: Viewer,
  letterId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!can(viewer, 'see what was mailed') || !isId(letterId)) return false;
  return transact(async (transaction) => {
    const again =
      (await tryAnew(letterId, now, transaction)) ?? (await copySent(letterId, now, transaction));
    if (again === null) return false;
    await queueSending(transaction, [{ id: again, sendAfter: now }]);
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'letter sent again',
        objectKind: 'letter',
        objectId: letterId,
        ...(again === letterId ? {} : { detail: { copy: again } }),
      },
      transaction,
    );
    return true;
  });
}

async function tryAnew(
  letterId: string,
  now: Date,
  transaction: Transaction,
): Promise<string | null> {
  const waiting = await row(
    `update letters set state = 'waiting', send_after = $2
     where id = $1 and state = 'failed' returning id`,
    [letterId, now],
    transaction,
  );
  return waiting === null ? null : letterId;
}

/** A second press while the copy waits makes no second copy. */
async function copySent(
  letterId: string,
  now: Date,
  transaction: Transaction,
): Promise<string | null> {
  const id = randomUUID();
  const copied = await row(
    `insert into letters (id, message_id, kind, to_address, person_id, data, again_of, created_at,
       send_after)
     select $2, $3, kind, to_address, person_id, data, id, $4, $4 from letters
     where id = (select id from letters where id = $1 and state = 'sent' for update)
       and not exists (select 1 from letters w where w.again_of = $1 and w.state = 'waiting')
     returning id`,
    [letterId, id, messageIdOf(id), now],
    transaction,
  );
  return copied === null ? null : id;
}

interface LetterRow extends Omit<LetterListed, 'createdAt' | 'sendAfter' | 'sentAt'> {
  readonly createdAt: Date;
  readonly sendAfter: Date;
  readonly sentAt: Date | null;
}

const logSql = `
  select w.id as "letterId", w.kind, w.to_address as "to", w.person_id as "personId",
    p.name as "personName", w.state, w.tries, w.last_error as reason, w.created_at as "createdAt",
    w.send_after as "sendAfter", w.sent_at as "sentAt", w.again_of is not null as again
  from letters w left join people p on p.id = w.person_id
  where $1::boolean and ($2::text is null or w.state = $2) and ($3::text is null or w.kind = $3)
    and ($4::text = '' or strpos(w.to_address, $4) > 0)
    and ($5::uuid is null or (w.created_at, w.id) < (
      select created_at, id from letters where id = $5))
  order by w.created_at desc, w.id desc limit $6`;
