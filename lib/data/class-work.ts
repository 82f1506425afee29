import 'server-only';
import { now as presentTime } from '@/lib/clock';
import { row, rows, transact } from '@/lib/db/query';
import type { Given } from '@/lib/marking/definition';
import type { Viewer } from '@/lib/policy/viewer';
import type { AttemptView, PegView } from '@/lib/schemas/round';
import { itemsSql, type Item } from './assignment-items';
import { recordAudit } from './audit';
import { isId, staffOfClass, staffValues } from './class-right';
import {
  exerciseTitle,
  lessonName,
  lessonOfExercise,
  workTitles,
  type LessonName,
} from './lesson-titles';
import { lastRoundsSql, pegViews, skillRounds, skillsOfLesson, type LastRoundRow } from './pegs';
import { viewAttempt, type KeptMarking } from './round-record';
import { latestOverride, ownExtension, standsLate } from './verdicts';
import {
  commentsOf,
  commentsOnWork,
  overridesOf,
  type AttemptComment,
  type AttemptOverride,
} from './attempt-talk';

/** A counted attempt in a list. */
export interface CountedAttemptListed {
  readonly attemptId: string;
  readonly exerciseId: string;
  readonly title: string;
  readonly verdict: 'right' | 'partly' | 'wrong';
  readonly createdAt: string;
  /** When it was answered by the device's clock, if that was away from the network. */
  readonly answeredAt: string | null;
  /** Late, reckoned with the time that the learner has now. */
  readonly late: boolean;
}

/** Work that is set to a learner. */
export interface LearnersWork {
  readonly assignmentId: string;
  readonly titles: readonly string[];
  readonly dueAt: string;
  readonly comments: readonly AttemptComment[];
}

/** A learner's work in one class. */
export interface LearnerInClass {
  readonly classId: string;
  readonly className: string;
  readonly timeZone: string;
  readonly archived: boolean;
  readonly learnerId: string;
  readonly name: string;
  readonly lessons: readonly (LessonName & { readonly pegs: readonly PegView[] })[];
  /** What is set to them, the next due first, with what was said about it as a whole. */
  readonly work: readonly LearnersWork[];
  /** The attempts that count for the class, the latest first. */
  readonly attempts: readonly CountedAttemptListed[];
}

/** A counted attempt with everything about it. */
export interface AttemptInClass {
  readonly classId: string;
  readonly className: string;
  readonly timeZone: string;
  /** In a class that is put away nothing is said or changed any more. */
  readonly archived: boolean;
  readonly learnerId: string;
  readonly name: string;
  readonly exerciseId: string;
  readonly title: string;
  readonly prompt: string;
  readonly givens: readonly Given[];
  readonly units: 'metric' | 'inch';
  /** What was sent, as it was typed. */
  readonly response: unknown;
  readonly attempt: AttemptView;
  readonly credit: number;
  readonly unaided: boolean;
  readonly hintsTaken: number;
  readonly solutionSeen: boolean;
  readonly late: boolean;
  /** What has been said about it, the first first. */
  readonly comments: readonly AttemptComment[];
  /** How it was marked otherwise in this class, the last of which holds. */
  readonly overrides: readonly AttemptOverride[];
  /** When the learner answered by their own clock, if that was away from the network. */
  readonly answeredAt: string | null;
}

/**
 * A learner's work in a class, for its instructors and the administrator, while the learner is
 * enrolled; null otherwise. An administrator's look is noted in the audit log.
 */
export async function findLearnerInClass(
  viewer: Viewer,
  classId: string,
  learnerId: string,
  now: Date = presentTime(),
): Promise<LearnerInClass | null> {
  if (!isId(classId) || !isId(learnerId)) return null;
  const found = await row<LearnerRow>(learnerSql, [...staffValues(viewer, classId), learnerId]);
  if (found === null) return null;
  await noteLook(viewer, classId, 'learner', learnerId);
  const { personTimeZone, work, attempts, ...rest } = found;
  const set = work.flatMap(({ items }) => items);
  const lessonIds = [
    ...new Set(set.flatMap((item) => item.lessonId ?? lessonOfExercise(item.exerciseId) ?? [])),
  ];
  const skills = lessonIds.flatMap(skillsOfLesson);
  const rounds = skillRounds(await rows<LastRoundRow>(lastRoundsSql, [learnerId, skills]));
  return {
    ...rest,
    lessons: lessonIds.map((lessonId) => ({
      ...lessonName(lessonId),
      pegs: pegViews(skillsOfLesson(lessonId), rounds, personTimeZone, now),
    })),
    work: work.map(({ items, dueAt, ...one }) => ({
      ...one,
      dueAt: new Date(dueAt).toISOString(),
      titles: workTitles(items),
    })),
    attempts: attempts.map((one) => ({
      ...one,
      title: exerciseTitle(one.exerciseId),
      createdAt: new Date(one.createdAt).toISOString(),
      answeredAt: one.answeredAt === null ? null : new Date(one.answeredAt).toISOString(),
    })),
  };
}

/**
 * An attempt that counts for an assignment of the class, for its instructors and the administrator;
 * null otherwise. All of it is as it was stored. An administrator's look is noted in the audit log.
 */
export async function findAttemptInClass(
  viewer: Viewer,
  classId: string,
  attemptId: string,
): Promise<AttemptInClass | null> {
  if (!isId(classId) || !isId(attemptId)) return null;
  const found = await row<AttemptRow>(attemptSql, [...staffValues(viewer, classId), attemptId]);
  if (found === null) return null;
  await noteLook(viewer, classId, 'attempt', attemptId);
  const { marking, shown, createdAt, answeredAt, ...rest } = found;
  return {
    ...rest,
    ...shown,
    attempt: viewAttempt(attemptId, createdAt.toISOString(), marking),
    answeredAt: answeredAt?.toISOString() ?? null,
  };
}

/** Instructors look at their own classes; an administrator's look leaves a line. */
async function noteLook(
  viewer: Viewer,
  classId: string,
  objectKind: 'learner' | 'attempt',
  objectId: string,
): Promise<void> {
  const teaches = viewer.memberships.some(
    (one) => one.classId === classId && one.role === 'instructor',
  );
  if (teaches) return;
  await transact((transaction) =>
    recordAudit(
      {
        actorId: viewer.personId,
        action: "learner's work viewed",
        objectKind,
        objectId,
        classId,
      },
      transaction,
    ),
  );
}

interface LearnerRow extends Omit<LearnerInClass, 'lessons' | 'work' | 'attempts'> {
  readonly personTimeZone: string;
  readonly work: readonly (Omit<LearnersWork, 'titles'> & { readonly items: readonly Item[] })[];
  readonly attempts: readonly Omit<CountedAttemptListed, 'title'>[];
}

const learnerSql = `
  select g.id as "classId", g.name as "className", g.time_zone as "timeZone",
    g.archived_at is not null as archived, l.id as "learnerId", p.name, p.time_zone as "personTimeZone",
    coalesce((
      select json_agg(json_build_object('assignmentId', s.id,
        'dueAt', greatest(s.due_at, x.due_at), 'comments', ${commentsOnWork},
        'items', ${itemsSql('s.id')})
        order by s.due_at)
      from assignments s
      left join extensions x on x.assignment_id = s.id and x.learner_id = l.id
      where s.class_id = g.id and s.withdrawn_at is null and (not s.for_chosen_learners or exists (
        select 1 from assignment_learners chosen
        where chosen.assignment_id = s.id and chosen.learner_id = l.id))), '[]') as work,
    coalesce((
      select json_agg(json_build_object('attemptId', a.id, 'exerciseId', a.exercise_id,
        'verdict', coalesce(o.verdict, a.verdict), 'createdAt', a.created_at,
        'answeredAt', a.answered_at, 'late', counted.late) order by a.created_at desc)
      from (
        select c.attempt_id, bool_and(${standsLate}) as late from counted_attempts c
        join attempts a on a.id = c.attempt_id
        join assignment_items i on i.id = c.item_id
        join assignments s on s.id = i.assignment_id and s.class_id = g.id
        ${ownExtension}
        where c.learner_id = l.id group by c.attempt_id) counted
      join attempts a on a.id = counted.attempt_id ${latestOverride('a')}), '[]') as attempts
  from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id and l.id = $4
  where ${staffOfClass}`;

interface AttemptRow extends Omit<
  AttemptInClass,
  'title' | 'prompt' | 'givens' | 'attempt' | 'answeredAt'
> {
  readonly shown: Pick<AttemptInClass, 'title' | 'prompt' | 'givens'>;
  readonly marking: KeptMarking;
  readonly createdAt: Date;
  readonly answeredAt: Date | null;
}

const attemptSql = `
  select g.id as "classId", g.name as "className", g.time_zone as "timeZone",
    g.archived_at is not null as archived, l.id as "learnerId", p.name, a.exercise_id as "exerciseId", r.shown, r.units, a.response,
    a.marking, a.credit, a.unaided, r.hints_taken as "hintsTaken",
    r.solution_seen_at is not null as "solutionSeen", counted.late, a.answered_at as "answeredAt",
    ${commentsOf} as comments, ${overridesOf} as overrides,
    a.created_at as "createdAt"
  from class_groups g
  join memberships m on m.class_id = g.id and m.role = 'learner' and m.left_at is null
  join people p on p.id = m.person_id
  join learners l on l.person_id = p.id
  join attempts a on a.learner_id = l.id and a.id = $4
  join rounds r on r.id = a.round_id
  join lateral (
    select bool_and(${standsLate}) as late from counted_attempts c
    join assignment_items i on i.id = c.item_id
    join assignments s on s.id = i.assignment_id and s.class_id = g.id
    ${ownExtension}
    where c.attempt_id = a.id having count(*) > 0) counted on true
  where ${staffOfClass}`;
