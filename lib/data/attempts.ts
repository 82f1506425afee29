import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { exercises } from '@/content/exercises/registry';
import { now as presentTime } from '@/lib/clock';
import { rows, transact } from '@/lib/db/query';
import { isOvertaken } from '@/lib/db/trouble';
import type { ExerciseDefinition } from '@/lib/marking/definition';
import { isCurrent } from '@/lib/marking/draw';
import { markResponse } from '@/lib/marking/mark';
import { isUnaided } from '@/lib/marking/view';
import type { Viewer } from '@/lib/policy/viewer';
import type { AttemptReply, AttemptRequest } from '@/lib/schemas/round';
import { findBeforeAttempt, insertAttempt, type AttemptRecord } from './attempt-record';
import { pegViews, skillsOfLesson, type SkillRound } from './pegs';
import {
  attemptsShown,
  viewAttempt,
  viewRound,
  type KeptMarking,
  type RoundRecord,
} from './round-record';
import { factsOf } from './skill-facts';

/** What sending a response comes to. */
export type AttemptOutcome =
  | { readonly outcome: 'kept'; readonly reply: AttemptReply; readonly repeated: boolean }
  | {
      /** It could not be read; nothing was marked or kept. */
      readonly outcome: 'refused';
      readonly errors: readonly { readonly key: string; readonly message: string }[];
    }
  | { readonly outcome: 'no such round' }
  | { readonly outcome: 'round closed' }
  | { readonly outcome: 'key used for another answer' };

/**
 * Marks the viewer's response to their round and keeps it. The same request under the same key gives
 * the same one attempt and the same answer, however often and however many at once it is sent.
 */
export async function createAttempt(
  viewer: Viewer,
  request: AttemptRequest,
  key: string,
  now: Date = presentTime(),
): Promise<AttemptOutcome> {
  const first = await unlessTaken(() => tryAttempt(viewer, request, key, now));
  if (first !== taken) return first;
  for (let turn = 0; turn < mostTurns; turn += 1) {
    const again = await unlessTaken(() =>
      transact(async (transaction) => {
        await rows(lockSql, [viewer.learnerId], transaction);
        return tryAttempt(viewer, request, key, now, transaction);
      }),
    );
    if (again !== taken) return again;
  }
  throw new Error(`createAttempt: the key ${key} was taken ${mostTurns} times`);
}

const taken = Symbol('a key or a number was taken meanwhile');

/** Somebody came between at every one of these turns: more than any number of parallel sends. */
const mostTurns = 10;

/** From the second try on, what one learner sends is taken in turn. */
const lockSql = 'select 1 as locked from learners where id = $1 for no key update';

async function unlessTaken<Result>(work: () => Promise<Result>): Promise<Result | typeof taken> {
  try {
    return await work();
  } catch (error) {
    // A row is gone where an exercise was taken out of an assignment at this very moment.
    if (isOvertaken(error)) return taken;
    throw error;
  }
}

async function tryAttempt(
  viewer: Viewer,
  request: AttemptRequest,
  key: string,
  now: Date,
  transaction?: Transaction,
): Promise<AttemptOutcome> {
  const bodyHash = hashBody(request);
  const { earlier, record, rounds } = await findBeforeAttempt(
    viewer.learnerId,
    request.roundId,
    key,
    transaction,
  );
  if (earlier !== null) {
    return earlier.bodyHash === bodyHash
      ? { outcome: 'kept', reply: earlier.reply, repeated: true }
      : { outcome: 'key used for another answer' };
  }
  const definition = record === null ? undefined : exercises.get(record.exerciseId);
  if (record === null || definition === undefined) return { outcome: 'no such round' };
  if (record.closed || !isCurrent(definition, record.variant)) return { outcome: 'round closed' };
  const marking = markResponse(definition, record.variant, request.response);
  if (marking.outcome === 'refused') return marking;
  const { outcome: _marked, ...kept } = marking;
  const made = compose(viewer, definition, record, kept, rounds, now);
  const counting = await insertAttempt(
    {
      ...made,
      roundId: record.roundId,
      learnerId: viewer.learnerId,
      exerciseId: definition.id,
      response: request.response,
      marking: kept,
      closesRound: kept.closesRound,
      counts: definition.kind !== 'prediction',
      answeredAt: request.answeredAt ?? null,
      createdAt: now,
      key,
      bodyHash,
    },
    transaction,
  );
  return counting === null
    ? { outcome: 'round closed' }
    : { outcome: 'kept', reply: { ...made.answer, counting }, repeated: false };
}

type Composed = Pick<AttemptRecord, 'attemptId' | 'unaided' | 'facts'> & {
  answer: Omit<AttemptReply, 'counting'>;
};

/** What the attempt will have made of the round and of the pegs, once it is kept. */
function compose(
  viewer: Viewer,
  definition: ExerciseDefinition,
  record: RoundRecord,
  marking: KeptMarking,
  rounds: readonly SkillRound[],
  now: Date,
): Composed {
  const attemptId = randomUUID();
  const createdAt = now.toISOString();
  const after: RoundRecord = {
    ...record,
    closed: marking.closesRound,
    attempts: [...record.attempts, { attemptId, createdAt, marking }].slice(-attemptsShown),
  };
  const unaided = isUnaided(record);
  const facts = marking.closesRound ? factsOf(definition, marking, unaided, now) : [];
  return {
    attemptId,
    unaided,
    facts,
    answer: {
      attempt: viewAttempt(attemptId, createdAt, marking),
      round: viewRound(definition, after),
      pegs: pegViews(
        skillsOfLesson(definition.lesson),
        [...rounds, ...facts],
        viewer.timeZone,
        now,
      ),
    },
  };
}

/** The same answer gives the same hash, in whatever order its keys come. */
function hashBody(request: AttemptRequest): string {
  return createHash('sha256')
    .update(JSON.stringify(inOrder(request)))
    .digest('base64url');
}

function inOrder(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(inOrder);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([one], [other]) => (one < other ? -1 : 1))
      .map(([name, held]) => [name, inOrder(held)]),
  );
}
