import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { exercises } from '@/content/exercises/registry';
import { rows } from '@/lib/db/query';
import { findRound, openRound, showSolution, takeHint } from '@/lib/data/rounds';
import { roundViewSchema } from '@/lib/schemas/round';
import { createAttempt } from '@/lib/data/attempts';
import { randomUUID } from 'node:crypto';
import {
  countRows,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  type Workshop,
} from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const exerciseId = 'oval-from-pins';

describe('opening a round', () => {
  it('gives the same round again, and the page finds it without writing', async () => {
    const { learner } = workshop;
    expect(await findRound(learner, { exerciseId })).toBeNull();
    const first = await mustOpen(learner, exerciseId);
    expect(await mustOpen(learner, exerciseId)).toEqual(first);
    expect(await findRound(learner, { exerciseId })).toEqual(first);
    expect(roundViewSchema.parse(first)).toEqual(first);
  });

  it('makes one round of twenty that are asked for at once', async () => {
    const viewer = await makeViewer('Pat Parallel', []);
    const opened = await Promise.all(
      Array.from({ length: 20 }, () => openRound(viewer, { exerciseId })),
    );
    expect(new Set(opened.map((round) => round?.roundId)).size).toBe(1);
    expect(await countRows('rounds', 'learner_id = $1', [viewer.learnerId])).toBe(1);
  });

  it('keeps a round for each unit, and hints count across both', async () => {
    const viewer = await makeViewer('Una Units', []);
    const metric = await openRound(viewer, { exerciseId, units: 'metric' });
    await takeHint(viewer, exerciseId, metric?.roundId ?? '', 1);
    const inch = await openRound(viewer, { exerciseId, units: 'inch' });
    expect(inch?.roundId).not.toBe(metric?.roundId);
    expect(inch?.hints).toHaveLength(1);
    await takeHint(viewer, exerciseId, inch?.roundId ?? '', 2);
    const again = await openRound(viewer, { exerciseId, units: 'metric' });
    expect(again?.roundId).toBe(metric?.roundId);
    expect(again?.hints).toHaveLength(2);
  });

  it('is null for an exercise that is not there', async () => {
    expect(await openRound(workshop.learner, { exerciseId: 'perpetual-motion' })).toBeNull();
    expect(await findRound(workshop.learner, { exerciseId: 'perpetual-motion' })).toBeNull();
  });

  it('holds nothing of the answer, of a slip or of a hint not taken', async () => {
    for (const [id, definition] of exercises) {
      const viewer = await makeViewer('Nora Nothing', []);
      const round = await mustOpen(viewer, id);
      const text = JSON.stringify(round);
      expect(round.solution).toBeUndefined();
      expect(round.hints).toEqual([]);
      for (const part of definition.parts) {
        for (const slip of part.slips) expect(text).not.toContain(`"${slip.id}"`);
        if (part.kind !== 'choice') continue;
        // Options travel under random ids, never under their own.
        for (const { option } of part.options) expect(text).not.toContain(`"${option}"`);
      }
    }
  });

  it('makes a prediction once: its round stays as it was answered', async () => {
    const viewer = await makeViewer('Petra Prediction', []);
    const round = await mustOpen(viewer, 'move-the-pen-out');
    const request = await requestFor(round.roundId, 'right');
    await createAttempt(viewer, request, randomUUID());
    const after = await openRound(viewer, { exerciseId: 'move-the-pen-out', units: 'inch' });
    expect(after).toMatchObject({ roundId: round.roundId, closed: true });
    expect(after?.attempts).toHaveLength(1);
    expect(await countRows('skill_facts', 'learner_id = $1', [viewer.learnerId])).toBe(0);
  });

  it('closes a round of an older version of its exercise and opens another', async () => {
    const viewer = await makeViewer('Olga Older', []);
    const old = await mustOpen(viewer, exerciseId);
    await rows('update rounds set definition_version = 0 where id = $1 returning id', [
      old.roundId,
    ]);
    const fresh = await mustOpen(viewer, exerciseId);
    expect(fresh.roundId).not.toBe(old.roundId);
    expect(await countRows('rounds', 'id = $1 and closed_at is not null', [old.roundId])).toBe(1);
  });
});

describe('hints and the worked solution', () => {
  it('come one by one, and the third gives up the unaided mark', async () => {
    const viewer = await makeViewer('Hilda Hints', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const taken = [];
    for (let n = 1; n <= 4; n += 1) taken.push(await takeHint(viewer, exerciseId, roundId, n));
    expect(taken.map((round) => round?.hints.length)).toEqual([1, 2, 3, 3]);
    expect(taken.map((round) => round?.unaided)).toEqual([true, true, false, false]);
  });

  it('asked for twice at once, or again later, are the same one', async () => {
    const viewer = await makeViewer('Dora Double', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const twice = await Promise.all([1, 1, 1].map((n) => takeHint(viewer, exerciseId, roundId, n)));
    expect(twice.map((round) => round?.hints.length)).toEqual([1, 1, 1]);
    expect((await takeHint(viewer, exerciseId, roundId, 2))?.hints).toHaveLength(2);
    expect((await takeHint(viewer, exerciseId, roundId, 1))?.hints).toHaveLength(2);
  });

  it('cannot be skipped: the third asked for first is the first', async () => {
    const viewer = await makeViewer('Skip Ahead', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const round = await takeHint(viewer, exerciseId, roundId, 3);
    expect(round).toMatchObject({ unaided: true, hints: [expect.any(String)] });
  });

  it('the solution closes the round, and the next has new numbers', async () => {
    const viewer = await makeViewer('Sol Solution', []);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const shown = await showSolution(viewer, exerciseId, roundId);
    expect(shown).toMatchObject({ closed: true, unaided: false });
    expect(shown?.solution?.length).toBeGreaterThan(1);
    const facts = await rows<{ right: boolean; unaided: boolean }>(
      'select was_right as right, unaided from skill_facts where round_id = $1',
      [roundId],
    );
    expect(facts).toEqual([
      { right: false, unaided: false },
      { right: false, unaided: false },
    ]);
    expect(await showSolution(viewer, exerciseId, roundId)).toEqual(shown);
    expect((await mustOpen(viewer, exerciseId)).roundId).not.toBe(roundId);
  });

  it("of somebody else's round look like those of none", async () => {
    const { roundId } = await mustOpen(workshop.learner, exerciseId);
    const before = await findRound(workshop.learner, { exerciseId });
    const { classmate, stranger, instructor, otherInstructor, administrator } = workshop;
    for (const other of [classmate, stranger, instructor, otherInstructor, administrator]) {
      expect(await takeHint(other, exerciseId, roundId, 1)).toBeNull();
      expect(await showSolution(other, exerciseId, roundId)).toBeNull();
    }
    expect(await takeHint(workshop.learner, exerciseId, randomUUID(), 1)).toBeNull();
    expect(await takeHint(workshop.learner, 'edging-strip', roundId, 1)).toBeNull();
    expect(await findRound(workshop.learner, { exerciseId })).toEqual(before);
  });
});
