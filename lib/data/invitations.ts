import 'server-only';
import type { Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Role, Viewer } from '@/lib/policy/viewer';
import type { BadLine, Invitee, InviteeReading } from '@/lib/schemas/invitees';
import { recordAudit } from './audit';
import { isId } from './class-right';
import { countTry } from './entry/throttle';
import { openInvitationSql, sendInvitation, type InvitationToSend } from './invitation-letter';

/** Where somebody is invited to: a class as one thing or the other, or only the workshop. */
export type InvitedTo =
  { readonly classId: string; readonly role: Role } | { readonly classId: null };

/** An invitation in the list of a class or of the workshop. */
export interface InvitationListed {
  readonly invitationId: string;
  readonly email: string;
  readonly name: string | null;
  readonly role: Role | null;
  /** `asked` came with the joining word and has not confirmed the address yet. */
  readonly state: 'invited' | 'asked' | 'expired' | 'joined' | 'withdrawn';
  readonly sentAt: string;
}

/** What inviting comes to. */
export type Invited =
  | { readonly outcome: 'invited'; readonly count: number; readonly left: readonly BadLine[] }
  | { readonly outcome: 'too many'; readonly retryAfter: number }
  | { readonly outcome: 'not allowed' };

/** What sending an invitation again comes to. */
export type SentAgain = 'sent' | 'too soon' | 'not there';

/** The invitations to a class, or to the workshop alone; the latest first, 500 at most. */
export async function listInvitations(
  viewer: Viewer,
  classId: string | null,
  now: Date = presentTime(),
): Promise<InvitationListed[]> {
  if (classId !== null && !isId(classId)) return [];
  const found = await rows<Omit<InvitationListed, 'sentAt'> & { sentAt: Date }>(
    `select i.id as "invitationId", i.email, i.name, i.role,
       case when i.accepted_at is not null then 'joined'
         when i.withdrawn_at is not null then 'withdrawn'
         when i.expires_at <= $4 then 'expired'
         when i.joining_word is not null then 'asked'
         else 'invited' end as state,
       i.sent_at as "sentAt"
     from invitations i
     where i.class_id is not distinct from $1::uuid and ${mayInvite}
     order by i.created_at desc, i.id limit 500`,
    [classId, viewer.personId, viewer.isAdministrator, now],
  );
  return found.map((one) => ({ ...one, sentAt: one.sentAt.toISOString() }));
}

/**
 * Looks through a list before anybody is invited: who of it is in the class already, or invited
 * already, moves to the lines that name nobody. Changes nothing; null when the viewer may not invite.
 */
export async function checkInvitees(
  viewer: Viewer,
  to: InvitedTo,
  { good, bad }: InviteeReading,
  now: Date = presentTime(),
): Promise<InviteeReading | null> {
  if (!mayInviteTo(viewer, to)) return null;
  const known = await rows<{ email: string; why: 'in' | 'invited' }>(knownSql, [
    to.classId,
    viewer.personId,
    viewer.isAdministrator,
    good.map(({ email }) => email),
    now,
  ]);
  const why = new Map(known.map((one) => [one.email, one.why]));
  const left = good.filter(({ email }) => why.has(email));
  return {
    good: good.filter(({ email }) => !why.has(email)),
    bad: [...bad, ...left.map((one) => leftOut(one, to, why.get(one.email)))].sort(
      (one, other) => one.line - other.line,
    ),
  };
}

/** Invites everybody of a list who is not in or invited already; one letter each. */
export async function createInvitations(
  viewer: Viewer,
  to: InvitedTo,
  invitees: readonly Invitee[],
  now: Date = presentTime(),
): Promise<Invited> {
  const checked = await checkInvitees(viewer, to, { good: invitees, bad: [] }, now);
  if (checked === null) return { outcome: 'not allowed' };
  if (checked.good.length === 0) return { outcome: 'invited', count: 0, left: checked.bad };
  const allowed = await countTry('invitations by person', viewer.personId, checked.good.length);
  if (!allowed.allowed) return { outcome: 'too many', retryAfter: allowed.retryAfter };
  const count = await transact(async (transaction) => {
    const made = await rows<InvitationToSend>(
      openInvitationSql(mayInvite),
      [
        to.classId,
        viewer.personId,
        viewer.isAdministrator,
        now,
        to.classId === null ? null : to.role,
        JSON.stringify(checked.good.map(({ email, name }) => ({ email, name }))),
      ],
      transaction,
    );
    for (const invitation of made) {
      await sendInvitation(invitation, viewer.personId, now, transaction);
      await note(viewer, 'person invited', invitation.invitationId, to.classId, transaction);
    }
    return made.length;
  });
  return { outcome: 'invited', count, left: checked.bad };
}

/** Sends an invitation again, with a new link and its whole time; earlier links end. */
export async function resendInvitation(
  viewer: Viewer,
  invitationId: string,
  now: Date = presentTime(),
): Promise<SentAgain> {
  if (!isId(invitationId)) return 'not there';
  return transact(async (transaction) => {
    const found = await row<InvitationToSend & { classId: string | null; soon: boolean }>(
      `select i.id as "invitationId", i.email, i.joining_word is not null as "byWord",
         i.class_id as "classId", i.sent_at > $4::timestamptz - interval '1 minute' as soon,
         (select g.name from class_groups g where g.id = i.class_id) as "className"
       from invitations i
       where i.id = $1 and i.accepted_at is null and i.withdrawn_at is null and ${mayInvite}
       for update`,
      [invitationId, viewer.personId, viewer.isAdministrator, now],
      transaction,
    );
    if (found === null) return 'not there';
    if (found.soon) return 'too soon';
    await sendInvitation(found, viewer.personId, now, transaction);
    await note(viewer, 'invitation sent again', invitationId, found.classId, transaction);
    return 'sent';
  });
}

/** Withdraws an invitation; its links end at once. False when that cannot be done. */
export async function withdrawInvitation(
  viewer: Viewer,
  invitationId: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!isId(invitationId)) return false;
  return transact(async (transaction) => {
    const withdrawn = await row<{ classId: string | null }>(
      `update invitations i set withdrawn_at = $4
       where i.id = $1 and i.accepted_at is null and i.withdrawn_at is null and ${mayInvite}
       returning i.class_id as "classId"`,
      [invitationId, viewer.personId, viewer.isAdministrator, now],
      transaction,
    );
    if (withdrawn === null) return false;
    await rows(
      `update one_time_links set used_at = $2 where invitation_id = $1 and used_at is null
       returning id`,
      [invitationId, now],
      transaction,
    );
    await note(viewer, 'invitation withdrawn', invitationId, withdrawn.classId, transaction);
    return true;
  });
}

/** The right to an invitation, as a condition on `i`; `$2` the person, `$3` whether they administer. */
const mayInvite = `($3::boolean or exists (
    select 1 from memberships mine
    where mine.class_id = i.class_id and mine.person_id = $2 and mine.role = 'instructor'
      and mine.left_at is null))`;

function mayInviteTo(viewer: Viewer, to: InvitedTo): boolean {
  if (to.classId === null) return can(viewer, 'invite people to the workshop');
  if (!isId(to.classId)) return false;
  return to.role === 'instructor'
    ? can(viewer, 'invite an instructor to a class', to.classId)
    : can(viewer, 'invite people to a class', to.classId);
}

const knownSql = `
  with i as (select $1::uuid as class_id, unnest($4::text[]) as email)
  select i.email, 'in' as why from i join people p on p.email = i.email
  where ${mayInvite} and p.erased_at is null and (i.class_id is null or exists (
    select 1 from memberships m
    where m.class_id = i.class_id and m.person_id = p.id and m.left_at is null))
  union all
  select i.email, 'invited' from i join invitations open
    on open.class_id is not distinct from i.class_id and open.email = i.email
  where ${mayInvite} and open.accepted_at is null and open.withdrawn_at is null
    and open.joining_word is null and open.expires_at > $5`;

function leftOut({ line, email }: Invitee, to: InvitedTo, why: 'in' | 'invited' | undefined) {
  const there = to.classId === null ? 'has an account already' : 'is in the class already';
  return {
    line,
    text: email,
    wrong: why === 'in' ? there : 'is invited already',
    expected: why === 'in' ? 'nothing: nobody is asked twice' : '“Send again” in the list below',
  };
}

function note(
  viewer: Viewer,
  action: 'person invited' | 'invitation sent again' | 'invitation withdrawn',
  invitationId: string,
  classId: string | null,
  transaction: Transaction,
): Promise<void> {
  const object = { objectKind: 'invitation', objectId: invitationId, classId } as const;
  return recordAudit({ actorId: viewer.personId, action, ...object }, transaction);
}
