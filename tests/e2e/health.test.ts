import { afterAll, beforeAll, expect, it } from 'vitest';
import { untilReady, type RunningSite } from '../../scripts/machine/site.mjs';
import { makeTrial, type Trial } from '../../scripts/machine/trial.mjs';

/** A database of its own, since it is killed: no other test may notice. */
let trial: Trial;
let site: RunningSite;

beforeAll(async () => {
  trial = await makeTrial('health', { demo: false });
  site = await trial.startSite();
});
afterAll(() => trial.close());

/** Asks as whoever watches the machine would, who waits two seconds at most. */
async function health(of: 'live' | 'ready') {
  const response = await fetch(`${trial.address}/api/health/${of}`, {
    signal: AbortSignal.timeout(2_000),
  });
  return { status: response.status, body: (await response.json()) as Record<string, unknown> };
}

it('is ready while the database answers, says so within two seconds when it does not, and comes back by itself', async () => {
  expect(await health('ready')).toEqual({ status: 200, body: { status: 'ready' } });
  await trial.killDatabase();
  expect(await health('ready')).toMatchObject({ status: 503, body: { title: 'Not ready' } });
  expect(await health('live')).toEqual({ status: 200, body: { status: 'live' } });
  await trial.startDatabase();
  await untilReady(site);
  expect(await health('ready')).toEqual({ status: 200, body: { status: 'ready' } });
});
