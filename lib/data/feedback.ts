import 'server-only';
import type { Transaction } from 'sequelize';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Viewer } from '@/lib/policy/viewer';
import { itemsSql, type Item } from './assignment-items';
import { recordAudit } from './audit';
import { isId, staffOfOpenClass, staffValues } from './class-right';
import { exerciseTitle, workTitles } from './lesson-titles';
import { queueLetter } from './letters';
import { latestOverride } from './verdicts';

/** What is said to a learner about an attempt of theirs, or about what they did for work as a whole. */
export interface Feedback {
  readonly kind: 'comment' | 'override';
  readonly id: string;
  readonly className: string;
  readonly authorName: string;
  /** Of the exercise, or of the work. */
  readonly title: string;
  /** How the attempt was marked, and how it stands after an override; null for work as a whole. */
  readonly marked: 'right' | 'partly' | 'wrong' | null;
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
      const subject = exerciseTitle(found.exerciseId);
      await tellOfComment(viewer, { ...found, subject }, { id: made.id, body }, transaction);
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
  const found = await rows<FeedbackRow>(feedbackSql, [viewer.learnerId]);
  return found.map(({ exerciseId, items, at, ...one }) => ({
    ...one,
    at: at.toISOString(),
    title: exerciseId === null ? workTitles(items ?? []).join(', ') : exerciseTitle(exerciseId),
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

/** Writes to the learner that something is said, whatever it is about. */
export async function tellOfComment(
  viewer: Viewer,
  to: {
    readonly personId: string;
    readonly email: string | null;
    readonly className: string;
    readonly subject: string;
  },
  { id, body }: { readonly id: string; readonly body: string },
  transaction: Transaction,
): Promise<void> {
  const { email, personId, className, subject } = to;
  if (email === null) return;
  await queueLetter(transaction, {
    to: email,
    personId,
    letter: {
      kind: 'comment',
      className,
      authorName: viewer.name,
      subject,
      body,
      path: '/feedback',
    },
    once: `comment:${id}`,
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

interface FeedbackRow extends Omit<Feedback, 'at' | 'title'> {
  readonly at: Date;
  readonly exerciseId: string | null;
  readonly items: readonly Item[] | null;
}

const feedbackSql = `
  select told.kind, told.id, g.name as "className", author.name as "authorName",
    a.exercise_id as "exerciseId", a.verdict as marked, told.verdict, told.body, told.at, told.unread,
    ${itemsSql('told.assignment_id')} as items
  from (
    select 'comment' as kind, c.id, c.class_id, c.author_id, c.attempt_id, c.assignment_id,
      null as verdict, c.body,
      c.created_at as at, c.read_at is null as unread
    from comments c where c.learner_id = $1
    union all
    select 'override', v.id, v.class_id, v.author_id, v.attempt_id, null, v.verdict, v.reason,
      v.created_at, false
    from attempts mine join overrides v on v.attempt_id = mine.id where mine.learner_id = $1) told
  join class_groups g on g.id = told.class_id
  join people author on author.id = told.author_id
  left join attempts a on a.id = told.attempt_id
  order by told.at desc limit 200`;
