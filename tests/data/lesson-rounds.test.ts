import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findRound, listRounds, openRound } from '@/lib/data/rounds';
import { countRows, makeViewer, openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const asked = ['move-the-pen-out', 'oval-from-pins', 'pins-for-an-oval', 'edging-strip'];

describe('the rounds of a lesson', () => {
  it('are those that each exercise has for itself, and none where there is none', async () => {
    const viewer = await makeViewer('Lena Lesson', []);
    await openRound(viewer, { exerciseId: 'oval-from-pins', units: 'metric' });
    await openRound(viewer, { exerciseId: 'edging-strip', units: 'metric' });
    const found = await listRounds(viewer, asked, 'metric');
    expect(found.map((round) => round.exerciseId).sort()).toEqual([
      'edging-strip',
      'oval-from-pins',
    ]);
    for (const round of found) {
      const { exerciseId } = round;
      expect(round).toEqual(await findRound(viewer, { exerciseId, units: 'metric' }));
    }
  });

  it('are kept apart by unit, but a prediction is made once for both', async () => {
    const viewer = await makeViewer('Ugo Units', []);
    await openRound(viewer, { exerciseId: 'oval-from-pins', units: 'metric' });
    await openRound(viewer, { exerciseId: 'move-the-pen-out', units: 'metric' });
    const inInches = await listRounds(viewer, asked, 'inch');
    expect(inInches.map((round) => round.exerciseId)).toEqual(['move-the-pen-out']);
  });

  it('are nobody else’s, and reading them writes nothing', async () => {
    const owner = await makeViewer('Olga Owner', []);
    const stranger = await makeViewer('Stan Stranger', []);
    await openRound(owner, { exerciseId: 'oval-from-pins' });
    const before = await countRows('rounds', 'true', []);
    expect(await listRounds(stranger, asked)).toEqual([]);
    expect(await listRounds(owner, ['perpetual-motion'])).toEqual([]);
    expect(await countRows('rounds', 'true', [])).toBe(before);
  });
});
