import 'server-only';
import { row } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { isId, staffOfClass, staffValues } from './class-right';

/**
 * A word that changes whenever the progress of a class does, under the same right; null for anybody
 * but its staff. One query over counts and last moments: whatever is added to a record is counted,
 * so that nothing is missed when two transactions end in another order than they began.
 */
export async function findClassVersion(viewer: Viewer, classId: string): Promise<string | null> {
  if (!isId(classId)) return null;
  const found = await row<{ version: string }>(versionSql, staffValues(viewer, classId));
  return found?.version ?? null;
}

const versionSql = `
  with enrolled as materialized (
    select l.id, p.updated_at, m.joined_at from class_groups g
    join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
    join people p on p.id = m.person_id
    join learners l on l.person_id = p.id
    where ${staffOfClass})
  select md5(concat_ws('|', g.updated_at,
    (select concat(count(*), max(e.updated_at), max(e.joined_at)) from enrolled e),
    (select concat(count(*), max(a.updated_at)) from assignments a where a.class_id = g.id),
    (select count(*) from enrolled e join counted_attempts c on c.learner_id = e.id
      join assignment_items i on i.id = c.item_id
      join assignments a on a.id = i.assignment_id and a.class_id = g.id),
    (select concat(count(*), max(f.closed_at)) from enrolled e
      join skill_facts f on f.learner_id = e.id),
    (select concat(count(*), max(v.created_at)) from overrides v where v.class_id = g.id),
    (select concat(count(*), sum(extract(epoch from x.due_at))) from assignments a
      join extensions x on x.assignment_id = a.id where a.class_id = g.id))) as version
  from class_groups g where ${staffOfClass}`;
