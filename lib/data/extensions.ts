import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { classMoment } from './class-time';

/** What giving somebody more time comes to. */
export type ExtensionGiven =
  | { readonly outcome: 'given'; readonly dueAt: string }
  | { readonly outcome: 'not later' | 'in the past' | 'no such learner' };

/** More time for one learner, by the clock of the class. */
export interface NewExtension {
  readonly learnerId: string;
  readonly dueOn: string;
  readonly dueTime: string;
}

/**
 * Gives one learner more time for work that is set to them, or changes the time given before. Late
 * work of theirs that falls within it counts as in time; what came while the work was closed to them
 * stays uncounted. Throws `RangeError` for a malformed day or time.
 */
export async function giveExtension(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  { learnerId, dueOn, dueTime }: NewExtension,
  now: Date = presentTime(),
): Promise<ExtensionGiven> {
  if (![classId, assignmentId, learnerId].every(isId)) return { outcome: 'no such learner' };
  return transact(async (transaction) => {
    const found = await row<{ timeZone: string; dueAt: Date }>(
      forWhomSql,
      [...staffValues(viewer, classId), assignmentId, learnerId],
      transaction,
    );
    if (found === null) return { outcome: 'no such learner' } as const;
    const dueAt = classMoment(found.timeZone, { on: dueOn, time: dueTime });
    if (dueAt <= found.dueAt) return { outcome: 'not later' } as const;
    if (dueAt <= now) return { outcome: 'in the past' } as const;
    await rows(
      `insert into extensions (assignment_id, learner_id, due_at, given_by, created_at)
       values ($1, $2, $3, $4, $5)
       on conflict (assignment_id, learner_id)
         do update set due_at = excluded.due_at, given_by = excluded.given_by
       returning learner_id`,
      [assignmentId, learnerId, dueAt, viewer.personId, now],
      transaction,
    );
    await note(viewer, classId, assignmentId, learnerId, 'extension given', transaction);
    return { outcome: 'given', dueAt: dueAt.toISOString() } as const;
  });
}

/** Takes back the time that one learner was given. False when that cannot be done. */
export async function takeBackExtension(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  learnerId: string,
): Promise<boolean> {
  if (![classId, assignmentId, learnerId].every(isId)) return false;
  return transact(async (transaction) => {
    const gone = await row(
      `delete from extensions e using assignments a, class_groups g
       where e.assignment_id = $4 and e.learner_id = $5 and a.id = e.assignment_id
         and a.class_id = g.id and ${staffOfOpenClass}
       returning e.learner_id`,
      [...staffValues(viewer, classId), assignmentId, learnerId],
      transaction,
    );
    if (gone === null) return false;
    await note(viewer, classId, assignmentId, learnerId, 'extension taken back', transaction);
    return true;
  });
}

async function note(
  viewer: Viewer,
  classId: string,
  assignmentId: string,
  learnerId: string,
  action: 'extension given' | 'extension taken back',
  transaction: Parameters<typeof recordAudit>[1],
): Promise<void> {
  await recordAudit(
    {
      actorId: viewer.personId,
      action,
      objectKind: 'learner',
      objectId: learnerId,
      classId,
      detail: { assignment: assignmentId },
    },
    transaction,
  );
}

/** The work, when it is set to this learner, who learns in the class now. */
const forWhomSql = `
  select g.time_zone as "timeZone", a.due_at as "dueAt"
  from class_groups g
  join assignments a on a.class_id = g.id and a.id = $4 and a.withdrawn_at is null
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join learners l on l.person_id = m.person_id and l.id = $5
  where ${staffOfOpenClass} and (not a.for_chosen_learners or exists (
    select 1 from assignment_learners x where x.assignment_id = a.id and x.learner_id = l.id))
  for share of a`;
