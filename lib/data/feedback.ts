import 'server-only';
import type { Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { exerciseTitle } from './lesson-titles';
import { queueLetter } from './letters';
import { latestOverride } from './verdicts';

/** What is said to a learner about an attempt of theirs. */
export interface Feedback {
  readonly kind: 'comment' | 'override';
  readonly id: string;
  readonly className: string;
  readonly authorName: string;
  readonly title: string;
  readonly exerciseId: string;
  /** How it was marked, and how it stands after an override. */
  readonly marked: 'right' | 'partly' | 'wrong';
  readonly verdict: 'right' | 'partly' | 'wrong' | null;
  readonly body: string;
  readonly at: string;
  readonly unread: boolean;
}

/**
 * Says something about an attempt that counts for the class, by its staff; the learner is written to
 * once, until they have read it. False when that cannot be done.
 */
export async function addComment(
  viewer: Viewer,
  classId: string,
  attemptId: string,
  body: string,
  now: Date = presentTime(),
): Promise<boolean> {
  if (!isId(classId) || !isId(attemptId)) return false;
  return transact(async (transaction) => {
    const found = await row<AboutRow>(
      aboutSql,
      [...staffValues(viewer, classId), attemptId],
      transaction,
    );
    if (found === null) return false;
    const made = await row<{ id: string }>(
      `insert into comments (attempt_id, class_id, author_id, learner_id, body, created_at)
       values ($1, $2, $3, $4, $5, $6) returning id`,
      [attemptId, classId, viewer.personId, found.learnerId, body, now],
      transaction,
    );
    await note(viewer, classId, attemptId, 'comment written', {}, transaction);
    if (found.unread === 0 && made !== null) {
      await tell(viewer, found, body, made.id, transaction);
    }
    return true;
  });
}

/** What overriding a marking comes to. */
export type Overridden = 'overridden' | 'stands so already' | 'no such attempt';

/**
 * Marks an attempt that counts for the class otherwise than it was marked, with the reason. What was
 * marked stays; in the class's own figures the override holds.
 */
export async function overrideMarking(
  viewer: Viewer,
  classId: string,
  attemptId: string,
  { verdict, reason }: { verdict: 'right' | 'partly' | 'wrong'; reason: string },
  now: Date = presentTime(),
): Promise<Overridden> {
  if (!isId(classId) || !isId(attemptId)) return 'no such attempt';
  return transact(async (transaction) => {
    const found = await row<AboutRow>(
      aboutSql,
      [...staffValues(viewer, classId), attemptId],
      transaction,
    );
    if (found === null) return 'no such attempt';
    if (found.verdict === verdict) return 'stands so already';
    await rows(
      `insert into overrides (attempt_id, class_id, author_id, verdict, reason, created_at)
       values ($1, $2, $3, $4, $5, $6) returning id`,
      [attemptId, classId, viewer.personId, verdict, reason, now],
      transaction,
    );
    const detail = { from: found.verdict, to: verdict };
    await note(viewer, classId, attemptId, 'marking overridden', detail, transaction);
    return 'overridden';
  });
}

/** What the viewer has been told about their own work, the latest first. */
export async function listFeedback(viewer: Viewer): Promise<Feedback[]> {
  const found = await rows<Omit<Feedback, 'at' | 'title'> & { at: Date }>(feedbackSql, [
    viewer.learnerId,
  ]);
  return found.map((one) => ({
    ...one,
    at: one.at.toISOString(),
    title: exerciseTitle(one.exerciseId),
  }));
}

/** How many comments the viewer has not read yet. */
export async function countUnread(viewer: Viewer): Promise<number> {
  const counted = await row<{ n: number }>(
    'select count(*)::int as n from comments where learner_id = $1 and read_at is null',
    [viewer.learnerId],
  );
  return counted?.n ?? 0;
}

/** Notes that the viewer has read what they were told. */
export async function readFeedback(viewer: Viewer, now: Date = presentTime()): Promise<void> {
  await rows(
    'update comments set read_at = $2 where learner_id = $1 and read_at is null returning id',
    [viewer.learnerId, now],
  );
}

async function tell(
  viewer: Viewer,
  { email, personId, className, exerciseId }: AboutRow,
  body: string,
  commentId: string,
  transaction: Transaction,
): Promise<void> {
  if (email === null) return;
  await queueLetter(transaction, {
    to: email,
    personId,
    letter: {
      kind: 'comment',
      className,
      authorName: viewer.name,
      subject: exerciseTitle(exerciseId),
      body,
      path: '/feedback',
    },
    once: `comment:${commentId}`,
  });
}

async function note(
  viewer: Viewer,
  classId: string,
  attemptId: string,
  action: 'comment written' | 'marking overridden',
  detail: Readonly<Record<string, string>>,
  transaction: Transaction,
): Promise<void> {
  await recordAudit(
    {
      actorId: viewer.personId,
      action,
      objectKind: 'attempt',
      objectId: attemptId,
      classId,
      detail,
    },
    transaction,
  );
}

interface AboutRow {
  readonly learnerId: string;
  readonly personId: string;
  readonly email: string | null;
  readonly className: string;
  readonly exerciseId: string;
  readonly verdict: 'right' | 'partly' | 'wrong';
  readonly unread: number;
}

/** An attempt of somebody who learns in the class, counted for work of it; taken back work too. */
const aboutSql = `
  select l.id as "learnerId", p.id as "personId", p.email, g.name as "className",
    a.exercise_id as "exerciseId", coalesce(o.verdict, a.verdict) as verdict,
    (select count(*)::int from comments c where c.learner_id = l.id and c.read_at is null) as unread
  from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id
  join attempts a on a.learner_id = l.id and a.id = $4
  ${latestOverride('a')}
  where ${staffOfOpenClass} and exists (
    select 1 from counted_attempts c
    join assignment_items i on i.id = c.item_id
    join assignments s on s.id = i.assignment_id and s.class_id = g.id
    where c.attempt_id = a.id)
  for no key update of l`;

const feedbackSql = `
  select told.kind, told.id, g.name as "className", author.name as "authorName",
    a.exercise_id as "exerciseId", a.verdict as marked, told.verdict, told.body, told.at, told.unread
  from (
    select 'comment' as kind, c.id, c.class_id, c.author_id, c.attempt_id, null as verdict, c.body,
      c.created_at as at, c.read_at is null as unread
    from comments c where c.learner_id = $1 and c.attempt_id is not null
    union all
    select 'override', v.id, v.class_id, v.author_id, v.attempt_id, v.verdict, v.reason,
      v.created_at, false
    from attempts mine join overrides v on v.attempt_id = mine.id where mine.learner_id = $1) told
  join class_groups g on g.id = told.class_id
  join people author on author.id = told.author_id
  join attempts a on a.id = told.attempt_id
  order by told.at desc limit 200`;
