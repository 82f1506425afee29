import 'server-only';
import { row, transact } from '@/lib/db/query';
import { enqueue } from '@/lib/jobs/enqueue';
import { sendInvitation } from '../invitation-letter';
import { queueLetter } from '../letters';
import type { FormProof, JobProof } from './proof';
import { countTry, type Allowance } from './throttle';

/** What somebody without an account sends to join a class. */
export interface AskedToJoin {
  readonly word: string;
  readonly name: string;
  readonly email: string;
}

/** The word as it is kept, however it was written down: in small letters, with hyphens. */
export function plainWord(word: string): string {
  return word
    .trim()
    .toLowerCase()
    .replace(/[\s‐-―-]+/g, '-');
}

/**
 * Takes the wish to join a class. The answer is the same, and the work until it is given too, whether
 * the word is right and the address known or not: all looking up is left to the job.
 */
export async function askToJoin(proof: FormProof, asked: AskedToJoin): Promise<Allowance> {
  if (proof.from !== null) {
    const byAddress = await countTry('join by address', proof.from);
    if (!byAddress.allowed) return byAddress;
  }
  const email = asked.email.trim().toLowerCase();
  const byAccount = await countTry('join by account', email);
  if (!byAccount.allowed) return byAccount;
  await transact((transaction) => enqueue(transaction, 'take-up-joining', { ...asked, email }));
  return { allowed: true };
}

/**
 * Writes to whoever wants to join, if the word is open: a link that confirms the address, or, to a
 * member of the class, that they are in it already.
 */
export async function takeUpJoining(
  _proof: JobProof,
  { word, name, email }: AskedToJoin,
  now: Date,
): Promise<void> {
  await transact(async (transaction) => {
    const found = await row<WordRow>(wordSql, [plainWord(word), email], transaction);
    if (found === null || found.shutOut) return;
    const { classId, className, isMember } = found;
    if (isMember) {
      await queueLetter(transaction, { to: email, letter: { kind: 'account-exists', className } });
      return;
    }
    const asked = await row<{ invitationId: string; byWord: boolean }>(
      askSql,
      [classId, email, name, plainWord(word), now],
      transaction,
    );
    if (asked === null) return;
    await sendInvitation({ ...asked, email, className }, null, now, transaction);
  });
}

interface WordRow {
  readonly classId: string;
  readonly className: string;
  readonly isMember: boolean;
  readonly shutOut: boolean;
}

const wordSql = `
  select g.id as "classId", g.name as "className",
    exists (select 1 from memberships m
      where m.class_id = g.id and m.person_id = p.id and m.left_at is null) as "isMember",
    coalesce(p.disabled_at is not null or p.erased_at is not null, false) as "shutOut"
  from class_groups g left join people p on p.email = $2
  where g.joining_word = $1 and g.joining_open and g.archived_at is null`;

/** Somebody who was invited besides keeps the invitation, and gets its letter again. */
const askSql = `
  insert into invitations as old
    (class_id, role, email, name, joining_word, created_at, sent_at, expires_at)
  values ($1, 'learner', $2, $3, $4, $5::timestamptz, $5::timestamptz,
    $5::timestamptz + interval '1 day')
  on conflict (class_id, email) where accepted_at is null and withdrawn_at is null
  do update set name = coalesce(old.name, excluded.name),
    joining_word = case when old.invited_by is null then excluded.joining_word end
  returning id as "invitationId", joining_word is not null as "byWord"`;
