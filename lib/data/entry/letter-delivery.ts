import 'server-only';
import { row, rows } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import type { LetterContext } from '@/lib/mail/draft';
import { isEssential, letterSchema, type Letter } from '@/lib/mail/letter';
import { linkAddress } from './link-token';
import type { JobProof } from './proof';
import { concernedLearners, isConcerned } from './set-work';
import { unsubscribeAddresses } from './unsubscribe';

/** A letter that a worker has taken to send it, with all that is needed to write it. */
export interface ClaimedLetter {
  readonly letterId: string;
  readonly messageId: string;
  readonly to: string;
  readonly letter: Letter;
  readonly context: LetterContext;
  readonly oneClickAddress: string | null;
}

/**
 * Takes a waiting letter: counts the try and reads what it needs. Null when there is nothing to send
 * any more: it was sent, given up, or is no longer wanted, which is then noted with the reason.
 */
export async function claimLetter(
  _proof: JobProof,
  letterId: string,
  now: Date,
): Promise<ClaimedLetter | null> {
  const found = await row<LetterRow>(claimSql, [letterId, now]);
  if (found === null) return null;
  const letter = letterOf(found);
  const reason = reasonAgainst(found, letter, now);
  if (reason !== null) {
    await closeLetter(letterId, 'dropped', reason, now);
    return null;
  }
  const optional = found.personId !== null && !isEssential(letter.kind);
  const unsubscribe =
    optional && found.personId !== null ? unsubscribeAddresses(found.personId) : null;
  return {
    letterId,
    messageId: found.messageId,
    to: found.to,
    letter,
    context: {
      siteAddress: siteEnvironment().address,
      readerName: found.name,
      timeZone: found.timeZone ?? 'UTC',
      writtenAt: found.sendAfter,
      link: linkOf(letter, found),
      unsubscribeAddress: unsubscribe?.page ?? null,
    },
    oneClickAddress: unsubscribe?.oneClick ?? null,
  };
}

/** Notes that a letter was handed over. */
export async function markLetterSent(_proof: JobProof, letterId: string, now: Date): Promise<void> {
  await rows(
    `update letters set state = 'sent', sent_at = $2, last_error = null
     where id = $1 and state = 'waiting' returning id`,
    [letterId, now],
  );
}

/** Notes why a try did not succeed, and whether the letter is given up with it. */
export async function markLetterTried(
  _proof: JobProof,
  letterId: string,
  failure: { readonly reason: string; readonly givenUp: boolean },
  now: Date,
): Promise<void> {
  await closeLetter(letterId, failure.givenUp ? 'failed' : 'waiting', failure.reason, now);
}

/**
 * Gives up letters that wait for nothing: their job is gone or has used its tries up, which happens
 * when a worker is ended during the last of them. Answers how many.
 */
export async function giveUpLostLetters(_proof: JobProof, now: Date): Promise<number> {
  const lost = await rows(
    `update letters l set state = 'failed',
       last_error = coalesce(l.last_error, 'The worker was ended while it sent the letter.')
     where l.state = 'waiting' and l.send_after < $1::timestamptz - interval '10 minutes'
       and not exists (
         select 1 from graphile_worker.jobs j
         where j.key = 'send-letter:' || l.id
           and (j.attempts < j.max_attempts or j.locked_at is not null))
     returning l.id`,
    [now],
  );
  return lost.length;
}

async function closeLetter(
  letterId: string,
  state: 'waiting' | 'failed' | 'dropped',
  reason: string,
  now: Date,
): Promise<void> {
  await rows(
    `update letters set state = $2, last_error = $3, tried_at = $4
     where id = $1 and state = 'waiting' returning id`,
    [letterId, state, reason, now],
  );
}

/** The letter as it was queued, but with the time by which the work is due now. */
function letterOf({ kind, data, dueAt }: LetterRow): Letter {
  const letter = letterSchema.parse({ kind, ...data });
  return 'assignmentId' in letter && dueAt !== null
    ? { ...letter, dueAt: dueAt.toISOString() }
    : letter;
}

function reasonAgainst(found: LetterRow, letter: Letter, now: Date): string | null {
  if (found.gone) return 'The account is disabled or was erased.';
  if (!isEssential(letter.kind) && found.wants === false) {
    return 'They want no letters about their classes.';
  }
  if ('assignmentId' in letter && !found.concerned) {
    return 'The work was withdrawn, or is no longer set to them.';
  }
  if (!('linkId' in letter)) return null;
  const good = found.linkExpiresAt !== null && !found.linkUsed && found.linkExpiresAt > now;
  return good ? null : 'The link in it is used up or too old.';
}

function linkOf(letter: Letter, { linkMadeAt, linkExpiresAt }: LetterRow): LetterContext['link'] {
  if (!('linkId' in letter) || linkMadeAt === null || linkExpiresAt === null) return null;
  const goodForMinutes = Math.round((linkExpiresAt.getTime() - linkMadeAt.getTime()) / 60_000);
  return { href: linkAddress(letter.kind, letter.linkId), goodForMinutes };
}

interface LetterRow {
  readonly messageId: string;
  readonly kind: string;
  readonly to: string;
  readonly data: object;
  readonly personId: string | null;
  readonly sendAfter: Date;
  readonly name: string | null;
  readonly timeZone: string | null;
  readonly wants: boolean | null;
  readonly gone: boolean;
  readonly concerned: boolean;
  readonly dueAt: Date | null;
  readonly linkMadeAt: Date | null;
  readonly linkExpiresAt: Date | null;
  readonly linkUsed: boolean;
}

const claimSql = `
  with claimed as (
    update letters set tries = tries + 1, tried_at = $2
    where id = $1 and state = 'waiting' returning *)
  select claimed.message_id as "messageId", claimed.kind, claimed.to_address as "to", claimed.data,
    claimed.person_id as "personId", claimed.send_after as "sendAfter", p.name, p.time_zone as "timeZone",
    p.wants_class_mail as wants,
    (p.id is not null and (p.disabled_at is not null or p.erased_at is not null)) as gone,
    work.assignment_id is not null as concerned, work.due_at as "dueAt",
    o.created_at as "linkMadeAt", o.expires_at as "linkExpiresAt",
    coalesce(o.used_at is not null, true) as "linkUsed"
  from claimed
  left join people p on p.id = claimed.person_id
  left join lateral (
    select a.id as assignment_id, greatest(a.due_at, e.due_at) as due_at from ${concernedLearners}
    where a.id = (claimed.data ->> 'assignmentId')::uuid and p.id = claimed.person_id
      and ${isConcerned}) work on true
  left join one_time_links o on o.id = (claimed.data ->> 'linkId')::uuid`;
