import 'server-only';
import type { Transaction } from 'sequelize';
import { row } from '@/lib/db/query';
import { linkLifetimes } from './entry/link-token';
import { createLink } from './entry/one-time-links';
import { queueLetter } from './letters';

/** What a letter to somebody invited needs to know. */
export interface InvitationToSend {
  readonly invitationId: string;
  readonly email: string;
  readonly className: string | null;
  /** Whether they came with the joining word themselves. */
  readonly byWord: boolean;
}

/**
 * The statement that opens invitations for a list of people. What has expired, or was only asked for
 * with the joining word, is taken up again; what is open stays as it is. `$1` is the class, `$2` who
 * invites, `$3` whether they administer, `$4` the moment, `$5` the role, `$6` the list.
 */
export function openInvitationSql(right: string): string {
  return `
    insert into invitations as old
      (class_id, role, email, name, invited_by, created_at, sent_at, expires_at)
    select i.class_id, $5, i.email, i.name, $2::uuid, $4::timestamptz, $4::timestamptz,
      $4::timestamptz + interval '7 days'
    from (
      select $1::uuid as class_id, one.email, one.name
      from json_to_recordset($6::json) as one (email text, name text)) i
    left join class_groups g on g.id = i.class_id
    where ${right} and (i.class_id is null or g.archived_at is null)
    on conflict (class_id, email) where accepted_at is null and withdrawn_at is null
    do update set role = excluded.role, name = coalesce(excluded.name, old.name),
      invited_by = excluded.invited_by, joining_word = null, created_at = excluded.created_at,
      sent_at = excluded.sent_at, expires_at = excluded.expires_at
    where old.expires_at <= $4::timestamptz or old.joining_word is not null
    returning id as "invitationId", email, false as "byWord",
      (select g.name from class_groups g where g.id = class_id) as "className"`;
}

/** Makes the link of an invitation, gives it its whole time and queues the letter. */
export async function sendInvitation(
  { invitationId, email, className, byWord }: InvitationToSend,
  sentBy: string | null,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  const purpose = byWord ? 'confirm-address' : 'invitation';
  const linkId = await createLink({ purpose, invitationId }, sentBy, now, transaction);
  const sent = await row<{ inviter: string | null }>(
    `update invitations i set sent_at = $2, expires_at = $3 where i.id = $1
     returning (select p.name from people p where p.id = i.invited_by) as inviter`,
    [invitationId, now, new Date(now.getTime() + linkLifetimes[purpose])],
    transaction,
  );
  const inviterName = sent?.inviter ?? 'Hornbeam';
  const letter = byWord
    ? ({ kind: 'confirm-address', linkId } as const)
    : ({
        kind: 'invitation',
        inviterName,
        linkId,
        ...(className === null ? {} : { className }),
      } as const);
  await queueLetter(transaction, { to: email, letter });
}
