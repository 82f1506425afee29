import 'server-only';
import { stringify } from 'csv-stringify/sync';
import { momentIn } from '@/lib/clock';
import { rows, transact } from '@/lib/db/query';
import { can } from '@/lib/policy/can';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';

/** A line of the audit log, with the names that its ids have now. */
export interface AuditEntryListed {
  readonly id: string;
  readonly at: string;
  /** Who did it; null for nobody who is known, or for the product itself. */
  readonly actorName: string | null;
  readonly action: string;
  readonly objectKind: string;
  readonly objectName: string | null;
  readonly className: string | null;
  readonly detail: Readonly<Record<string, unknown>>;
}

/** Which lines are looked for; dates are days in the viewer's time zone, both included. */
export interface AuditFilter {
  /** Part of the name or address of who did it or whom it is about. */
  readonly person?: string;
  readonly action?: string;
  readonly objectKind?: string;
  readonly classId?: string;
  readonly from?: string;
  readonly to?: string;
}

/** Some lines, the latest first, and the id before which the next ones stand. */
export interface AuditPage {
  readonly entries: readonly AuditEntryListed[];
  readonly before: string | null;
}

const onPage = 50;
const mostInFile = 50_000;

/** A page of the audit log, for the administrator; empty for anybody else. */
export async function listAudit(
  viewer: Viewer,
  filter: AuditFilter,
  before: string | null = null,
): Promise<AuditPage> {
  const entries = await find(viewer, filter, before, onPage + 1);
  const shown = entries.slice(0, onPage);
  return { entries: shown, before: entries.length > onPage ? (shown.at(-1)?.id ?? null) : null };
}

/** What has been done so far, and the classes it was done in, to choose from. */
export async function listAuditChoices(viewer: Viewer): Promise<{
  readonly actions: readonly string[];
  readonly objectKinds: readonly string[];
  readonly classes: readonly { readonly classId: string; readonly name: string }[];
}> {
  const mayRead = [can(viewer, 'read the audit log')];
  const [actions, objectKinds, classes] = await Promise.all([
    rows<{ said: string }>(distinct('action'), mayRead),
    rows<{ said: string }>(distinct('object_kind'), mayRead),
    rows<{ classId: string; name: string }>(
      'select id as "classId", name from class_groups where $1::boolean order by name, id',
      mayRead,
    ),
  ]);
  const said = (list: readonly { said: string }[]) => list.map((one) => one.said);
  return { actions: said(actions), objectKinds: said(objectKinds), classes };
}

/**
 * The lines looked for as CSV, the latest 50,000 of them, for the administrator; null for anybody else.
 * Taking them away is a line of the log itself.
 */
export async function takeAudit(viewer: Viewer, filter: AuditFilter): Promise<string | null> {
  if (!can(viewer, 'read the audit log')) return null;
  return transact(async (transaction) => {
    const entries = await find(viewer, filter, null, mostInFile);
    await recordAudit(
      {
        actorId: viewer.personId,
        action: 'audit log taken away',
        objectKind: 'audit log',
        detail: { ...filter, lines: entries.length },
      },
      transaction,
    );
    return stringify(
      entries.map((entry) => [
        entry.at,
        entry.actorName,
        entry.action,
        entry.objectKind,
        entry.objectName,
        entry.className,
        JSON.stringify(entry.detail),
      ]),
      {
        header: true,
        columns: ['at', 'who', 'did', 'about', 'whom or what', 'class', 'detail'],
        bom: true,
        escape_formulas: true,
        record_delimiter: 'windows',
      },
    );
  });
}

/** Every value that a column has. */
function distinct(column: 'action' | 'object_kind'): string {
  return `select distinct ${column} as said from audit_entries where $1::boolean order by 1`;
}

async function find(
  viewer: Viewer,
  { person = '', action, objectKind, classId, from, to }: AuditFilter,
  before: string | null,
  limit: number,
): Promise<AuditEntryListed[]> {
  const day = (date: string) => momentIn(viewer.timeZone, date, '00:00');
  const until = to === undefined ? null : day(dayAfter(to));
  const found = await rows<Omit<AuditEntryListed, 'at'> & { at: Date }>(findSql, [
    can(viewer, 'read the audit log'),
    person.trim(),
    action ?? null,
    objectKind ?? null,
    classId ?? null,
    from === undefined ? null : day(from),
    until,
    before,
    limit,
  ]);
  return found.map((entry) => ({ ...entry, at: entry.at.toISOString() }));
}

function dayAfter(date: string): string {
  return new Date(Date.parse(`${date}T00:00:00Z`) + 86_400_000).toISOString().slice(0, 10);
}

const findSql = `
  with meant as (
    select p.id, l.id as learner_id from people p join learners l on l.person_id = p.id
    where $2 <> '' and (strpos(lower(p.name), lower($2)) > 0 or strpos(p.email, lower($2)) > 0))
  select a.id::text, a.at, actor.name as "actorName", a.action, a.object_kind as "objectKind",
    coalesce(about.name, learner.name, class.name, i.email) as "objectName",
    g.name as "className", a.detail
  from audit_entries a
  left join people actor on actor.id = a.actor_id
  left join people about on a.object_kind = 'person' and about.id::text = a.object_id
  left join learners l on a.object_kind = 'learner' and l.id::text = a.object_id
  left join people learner on learner.id = l.person_id
  left join class_groups class on a.object_kind = 'class' and class.id::text = a.object_id
  left join invitations i on a.object_kind = 'invitation' and i.id::text = a.object_id
  left join class_groups g on g.id = a.class_id
  where $1::boolean
    and ($2 = '' or a.actor_id in (select id from meant)
      or (a.object_kind = 'person' and a.object_id in (select id::text from meant))
      or (a.object_kind = 'learner' and a.object_id in (select learner_id::text from meant)))
    and ($3::text is null or a.action = $3)
    and ($4::text is null or a.object_kind = $4)
    and ($5::uuid is null or a.class_id = $5)
    and ($6::timestamptz is null or a.at >= $6)
    and ($7::timestamptz is null or a.at < $7)
    and ($8::bigint is null or a.id < $8)
  order by a.id desc limit $9`;
