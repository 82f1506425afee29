import 'server-only';
import type { DueEvent } from '@/lib/calendar/write-calendar';
import { row, rows } from '@/lib/db/query';
import { siteEnvironment } from '@/lib/env';
import { itemsSql, type Item } from '../assignment-items';
import { workTitles } from '../lesson-titles';
import type { FeedProof } from './proof';
import { hashSecret } from './secret';
import { concernedLearners, isForLearner } from './set-work';

/**
 * What is due for the person of this address: work that has opened to them as a learner, with their
 * own extensions, and everything set to the classes they teach; from half a year back. Null when the
 * address is not in force, or its person is disabled.
 */
export async function findCalendarFeed(proof: FeedProof, now: Date): Promise<DueEvent[] | null> {
  const owner = await row<{ personId: string }>(
    `select c.person_id as "personId" from calendar_addresses c
     join people p on p.id = c.person_id and p.disabled_at is null and p.erased_at is null
     where c.secret_hash = $1`,
    [hashSecret(proof.secret)],
  );
  if (owner === null) return null;
  const found = await rows<DueRow>(dueSql, [owner.personId, now]);
  return found.map(eventOf);
}

function eventOf({ assignmentId, classId, className, items, note, teaches, ...rest }: DueRow) {
  const titles = workTitles(items);
  const [first = '', ...more] = titles;
  return {
    ...rest,
    uid: assignmentId,
    summary: `${className}: ${more.length === 0 ? first : `${first} and ${more.length} more`}`,
    description: [...titles, ...(note.trim() === '' ? [] : ['', note.trim()])].join('\n'),
    url: `${siteEnvironment().address}${teaches ? `/classes/${classId}` : '/today'}`,
  };
}

interface DueRow {
  readonly assignmentId: string;
  readonly classId: string;
  readonly className: string;
  readonly dueAt: Date;
  readonly sequence: number;
  readonly changedAt: Date;
  readonly cancelled: boolean;
  readonly note: string;
  readonly teaches: boolean;
  readonly items: readonly Item[];
}

/** Extensions that were given and taken back count as changes; the audit log forgets neither. */
const dueSql = `
  with due as (
    select a.*, g.name as class_name, greatest(a.due_at, e.due_at) as due, false as teaches,
      l.id as learner_id
    from ${concernedLearners}
    where p.id = $1 and ${isForLearner} and a.opens_at <= $2
    union all
    select a.*, g.name, a.due_at, true, null
    from memberships m
    join class_groups g on g.id = m.class_id and g.archived_at is null
    join assignments a on a.class_id = g.id
    where m.person_id = $1 and m.role = 'instructor' and m.left_at is null)
  select d.id as "assignmentId", d.class_id as "classId", d.class_name as "className",
    d.due as "dueAt", d.version + x.changes as sequence,
    date_trunc('second', greatest(d.updated_at, x.changed_at)) as "changedAt",
    d.withdrawn_at is not null as cancelled, d.note, d.teaches,
    coalesce(${itemsSql('d.id')}, '[]') as items
  from due d
  cross join lateral (
    select count(*)::int as changes, max(t.at) as changed_at from audit_entries t
    where d.learner_id is not null and t.object_kind = 'learner'
      and t.object_id = d.learner_id::text and t.detail ->> 'assignment' = d.id::text
      and t.action in ('extension given', 'extension taken back')) x
  where d.due > $2::timestamptz - interval '180 days'
    and (d.withdrawn_at is null or d.withdrawn_at >= d.opens_at)
  order by d.due, d.id limit 1000`;
