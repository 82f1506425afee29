import { describe, expect, it } from 'vitest';
import { ways } from '../security/call';
import { demo, password } from '../support/people';
import { keyOf, openVariant } from '../support/records';
import { ask, openSession, post } from '../support/session';

/** What stands in tests/e2e/matrix.test.ts is who gets which page; this is what no learner gets. */
describe('the answers of an open round', () => {
  it('are in no lesson, nor slips, advice and hints, in whatever form it is asked for', async () => {
    const learner = await openSession(demo.secondLearner, password);
    const exercise = 'grooves-and-bar';
    await post(learner, `/api/exercises/${exercise}/round`, {});
    const { key } = keyOf(await openVariant(demo.secondLearner, exercise));
    const secrets = [
      ...key.hints,
      ...key.solution,
      ...key.parts.flatMap((part) => part.slips.map((slip) => slip.advice)),
    ];
    expect(secrets.length).toBeGreaterThan(5);
    for (const headers of Object.values(ways)) {
      const path = '/lessons/drawing-and-copying/trammel-and-oval';
      const body = await (await ask(learner, path, { headers })).text();
      expect(secrets.filter((secret) => body.includes(secret))).toEqual([]);
    }
  });
});
