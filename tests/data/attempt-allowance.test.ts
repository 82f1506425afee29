import { afterAll, beforeAll, expect, it } from 'vitest';
import { takeAttempt } from '@/lib/data/attempt-allowance';
import { countTry } from '@/lib/data/entry/throttle';
import { row } from '@/lib/db/query';
import { openWorkshop, type Workshop } from '../support/workshop';

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());

const points = async () =>
  (
    await row<{ points: number }>(
      "select points from throttle where key like 'attempts by person:%'",
    )
  )?.points;

it('counts attempts in the database twenty-five at a time, and puts a flood off with a time to wait', async () => {
  const { learner, classmate } = workshop;
  const at = Date.now();
  for (let n = 0; n < 25; n += 1) expect(await takeAttempt(learner, at)).toEqual({ allowed: true });
  expect(await points()).toBe(25);
  await takeAttempt(learner, at);
  expect(await points()).toBe(50);
  // What was counted ahead is good for a minute.
  await takeAttempt(learner, at + 61_000);
  expect(await points()).toBe(75);
  // Another instance has counted the rest.
  await countTry('attempts by person', learner.personId, 15_000 - 75);
  const put = await takeAttempt(learner, at + 200_000);
  expect(put.allowed).toBe(false);
  expect(put).toHaveProperty('retryAfter', expect.any(Number));
  expect(await takeAttempt(classmate, at)).toEqual({ allowed: true });
});
