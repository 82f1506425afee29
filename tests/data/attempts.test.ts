import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createAttempt } from '@/lib/data/attempts';
import { takeHint } from '@/lib/data/rounds';
import { row, rows } from '@/lib/db/query';
import { attemptReplySchema } from '@/lib/schemas/round';
import {
  countRows,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  setExercise,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const exerciseId = 'oval-from-pins';

describe('an attempt', () => {
  it('that slips says which, keeps the round open, and shows no skill yet', async () => {
    const viewer = await makeViewer('Sam Slip', []);
    const round = await mustOpen(viewer, exerciseId);
    const request = await requestFor(round.roundId, 'slipped');
    const result = await createAttempt(viewer, request, randomUUID());
    if (result.outcome !== 'kept') throw new Error(result.outcome);
    expect(attemptReplySchema.parse(result.reply)).toEqual(result.reply);
    expect(result.reply.attempt.verdict).not.toBe('right');
    expect(result.reply.attempt.parts.find(({ right }) => !right)?.slip).toBe('half-for-full');
    expect(result.reply.round).toMatchObject({ closed: false, unaided: true });
    expect(result.reply.pegs.map(({ state }) => state)).toEqual(Array(5).fill('open'));
    expect(await countRows('skill_facts', 'learner_id = $1', [viewer.learnerId])).toBe(0);
  });

  it('that is right closes the round and starts the pegs of its skills', async () => {
    const viewer = await makeViewer('Rita Right', []);
    const round = await mustOpen(viewer, exerciseId);
    const result = await createAttempt(
      viewer,
      await requestFor(round.roundId, 'right'),
      randomUUID(),
    );
    if (result.outcome !== 'kept') throw new Error(result.outcome);
    expect(result.reply.attempt).toMatchObject({ verdict: 'right', closesRound: true });
    expect(result.reply.round).toMatchObject({ closed: true, unaided: true });
    expect(
      result.reply.pegs.filter(({ state }) => state === 'started').map(({ skill }) => skill),
    ).toEqual(['trammel.semi-axes', 'oval.size']);
    expect(
      await rows('select was_right, unaided, attempts from skill_facts where round_id = $1', [
        round.roundId,
      ]),
    ).toEqual([
      { was_right: true, unaided: true, attempts: 1 },
      { was_right: true, unaided: true, attempts: 1 },
    ]);
    const late = await requestFor(round.roundId, 'right');
    expect(await createAttempt(viewer, late, randomUUID())).toEqual({ outcome: 'round closed' });
  });

  it('after three hints counts as helped', async () => {
    const viewer = await makeViewer('Hal Helped', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    for (let n = 1; n <= 3; n += 1) await takeHint(viewer, exerciseId, roundId, n);
    await createAttempt(viewer, await requestFor(roundId, 'right'), randomUUID());
    expect(await countRows('skill_facts', 'round_id = $1 and not unaided', [roundId])).toBe(2);
    expect(await countRows('attempts', 'round_id = $1 and not unaided', [roundId])).toBe(1);
  });

  it('that cannot be read is none: nothing is kept', async () => {
    const viewer = await makeViewer('Ulf Unread', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const key = randomUUID();
    const response = { answers: { eastWest: 'about so much', northSouth: '' } };
    const result = await createAttempt(viewer, { roundId, response }, key);
    expect(result.outcome).toBe('refused');
    expect(result).toHaveProperty('errors.0.key', 'eastWest');
    expect(await countRows('attempts', 'round_id = $1', [roundId])).toBe(0);
    // The key is still free for the answer as it was meant.
    const meant = await createAttempt(viewer, await requestFor(roundId, 'right'), key);
    expect(meant).toMatchObject({ outcome: 'kept', repeated: false });
  });

  it("at somebody else's round looks like one at none", async () => {
    const { learner, classmate, stranger, instructor, administrator } = workshop;
    const { roundId } = await mustOpen(learner, exerciseId);
    const request = await requestFor(roundId, 'right');
    for (const other of [classmate, stranger, instructor, administrator]) {
      expect(await createAttempt(other, request, randomUUID())).toEqual({
        outcome: 'no such round',
      });
    }
    expect(
      await createAttempt(learner, { ...request, roundId: randomUUID() }, randomUUID()),
    ).toEqual({ outcome: 'no such round' });
    expect(await countRows('attempts', 'round_id = $1', [roundId])).toBe(0);
  });
});

describe('the same request again', () => {
  it('has the same one attempt and the same answer', async () => {
    const viewer = await makeViewer('Rae Retry', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const request = await requestFor(roundId, 'right');
    const key = randomUUID();
    const first = await createAttempt(viewer, request, key);
    const second = await createAttempt(viewer, request, key);
    expect(first).toMatchObject({ outcome: 'kept', repeated: false });
    expect(second).toEqual({ ...first, repeated: true });
    expect(await countRows('attempts', 'round_id = $1', [roundId])).toBe(1);
  });

  it('sent thirty times at once is one attempt with one answer', async () => {
    const viewer = await makeViewer('Paul Parallel', []);
    await setExercise(workshop.harbour, workshop.instructor, exerciseId);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const request = await requestFor(roundId, 'slipped');
    const key = randomUUID();
    const results = await Promise.all(
      Array.from({ length: 30 }, () => createAttempt(viewer, request, key)),
    );
    const replies = results.map((result) => {
      if (result.outcome !== 'kept') throw new Error(result.outcome);
      return JSON.stringify(sorted(result.reply));
    });
    expect(new Set(replies).size).toBe(1);
    expect(await countRows('attempts', 'round_id = $1', [roundId])).toBe(1);
  });

  it('with another body under its key is refused, whatever the order of its parts', async () => {
    const viewer = await makeViewer('Ola Other', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const key = randomUUID();
    const slipped = await requestFor(roundId, 'slipped');
    await createAttempt(viewer, slipped, key);
    const other = await requestFor(roundId, 'right');
    expect(await createAttempt(viewer, other, key)).toEqual({
      outcome: 'key used for another answer',
    });
    const turned = {
      roundId,
      response: { answers: Object.fromEntries(Object.entries(slipped.response.answers).reverse()) },
    };
    expect(await createAttempt(viewer, turned, key)).toMatchObject({ repeated: true });
  });

  it('under a key that another learner used is theirs alone', async () => {
    const [one, two] = [await makeViewer('Key One', []), await makeViewer('Key Two', [])];
    const key = randomUUID();
    for (const viewer of [one, two]) {
      const { roundId } = await mustOpen(viewer, exerciseId);
      const request = await requestFor(roundId, 'right');
      expect(await createAttempt(viewer, request, key)).toMatchObject({ repeated: false });
    }
  });
});

describe('parallel attempts at one round', () => {
  it('close it once: one right attempt, one fact a skill', async () => {
    const viewer = await makeViewer('Rolf Race', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const request = await requestFor(roundId, 'right');
    const results = await Promise.all(
      Array.from({ length: 12 }, () => createAttempt(viewer, request, randomUUID())),
    );
    expect(results.filter(({ outcome }) => outcome === 'kept')).toHaveLength(1);
    expect(results.filter(({ outcome }) => outcome === 'round closed')).toHaveLength(11);
    expect(await countRows('skill_facts', 'round_id = $1', [roundId])).toBe(2);
  });
});

describe('counting for assignments', () => {
  it('numbers attempts for every open assignment of the learner, and for no other', async () => {
    const { harbour, quay, instructor, otherInstructor } = workshop;
    const both = await makeViewer('Bo Both', [
      [harbour, 'learner'],
      [quay, 'instructor'],
    ]);
    const id = 'pins-for-an-oval';
    const here = await setExercise(harbour, instructor, id);
    const late = await setExercise(harbour, instructor, id, { dueAt: new Date(Date.now() - 1000) });
    const shut = await setExercise(harbour, instructor, id, {
      dueAt: new Date(Date.now() - 1000),
      lateWork: 'closed',
    });
    const soon = await setExercise(harbour, instructor, id, {
      opensAt: new Date(Date.now() + 1000_000),
    });
    const taught = await setExercise(quay, otherInstructor, id);
    const { roundId } = await mustOpen(both, id);
    await createAttempt(both, await requestFor(roundId, 'slipped'), randomUUID());
    await createAttempt(both, await requestFor(roundId, 'right'), randomUUID());
    const counted = await rows<{ item: string; n: number; late: boolean }>(
      'select item_id as item, n, late from counted_attempts where learner_id = $1 order by late, n',
      [both.learnerId],
    );
    expect(counted).toEqual([
      { item: here, n: 1, late: false },
      { item: here, n: 2, late: false },
      { item: late, n: 1, late: true },
      { item: late, n: 2, late: true },
    ]);
    for (const none of [shut, soon, taught]) {
      expect(await countRows('counted_attempts', 'item_id = $1', [none])).toBe(0);
    }
  });

  it('stops at the number allowed under fifty parallel posts, and keeps them all', async () => {
    const viewer = await makeViewer('Fay Fifty', [[workshop.harbour, 'learner']]);
    const id = 'edging-strip';
    const item = await setExercise(workshop.harbour, workshop.instructor, id, {
      attemptsAllowed: 3,
    });
    const { roundId } = await mustOpen(viewer, id);
    const request = await requestFor(roundId, 'slipped');
    const results = await Promise.all(
      Array.from({ length: 50 }, () => createAttempt(viewer, request, randomUUID())),
    );
    expect(results.every(({ outcome }) => outcome === 'kept')).toBe(true);
    expect(await countRows('attempts', 'round_id = $1', [roundId])).toBe(50);
    expect(
      await row(
        'select count(*)::int as n, min(n) as least, max(n) as most from counted_attempts where item_id = $1',
        [item],
      ),
    ).toEqual({ n: 3, least: 1, most: 3 });
  });
});

/** The same value with its keys in one order: the database keeps JSON in an order of its own. */
function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([one], [other]) => (one < other ? -1 : 1))
      .map(([key, held]) => [key, sorted(held)]),
  );
}
