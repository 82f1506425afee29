import 'fake-indexeddb/auto';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { NetworkAway, Problem } from '@/lib/browser/problem';
import {
  discardAnswer,
  keepAnswer,
  listWaiting,
  sendWaiting,
  waitingCount,
  type WaitingAnswer,
} from '@/lib/browser/waiting-answers';
import type { AttemptReply } from '@/lib/schemas/round';

const ada = '0a000000-0000-4000-8000-000000000001';
const ben = '0b000000-0000-4000-8000-000000000002';

function answer(key: string, personId: string, minute: number): WaitingAnswer {
  return {
    key,
    personId,
    exerciseId: 'lantern-wheel',
    title: 'The lantern’s wheel',
    request: {
      roundId: '7f000000-0000-4000-8000-00000000000a',
      response: { answers: { speed: '12 rpm' } },
    },
    givenAt: `2031-03-04T18:${String(minute).padStart(2, '0')}:00.000Z`,
  };
}

const reply = { attempt: {}, round: {}, pegs: [] } as unknown as AttemptReply;

beforeEach(async () => {
  for (const kept of await listWaiting()) await discardAnswer(kept.key);
});

describe('answers that wait on this device', () => {
  it('are listed the oldest first and counted for each person alone', async () => {
    await keepAnswer(answer('k2', ada, 2));
    await keepAnswer(answer('k3', ben, 3));
    await keepAnswer(answer('k1', ada, 1));
    expect((await listWaiting()).map((kept) => kept.key)).toEqual(['k1', 'k2', 'k3']);
    expect(await waitingCount(ada)).toBe(2);
    expect(await waitingCount(ben)).toBe(1);
  });

  it('survive a reload: a fresh copy of the module finds them', async () => {
    await keepAnswer(answer('k1', ada, 1));
    vi.resetModules();
    const reloaded = await import('@/lib/browser/waiting-answers');
    expect(await reloaded.waitingCount(ada)).toBe(1);
  });

  it('are sent under their own key, once, and then forgotten', async () => {
    await keepAnswer(answer('k1', ada, 1));
    await keepAnswer(answer('k2', ada, 2));
    const send = vi.fn(async () => reply);
    await Promise.all([sendWaiting(ada, send), sendWaiting(ada, send)]);
    expect(send.mock.calls.map((call: unknown[]) => call[1])).toEqual(['k1', 'k2']);
    expect(await listWaiting()).toEqual([]);
  });

  it('are never sent for somebody else', async () => {
    await keepAnswer(answer('k1', ben, 1));
    const send = vi.fn(async () => reply);
    expect(await sendWaiting(ada, send)).toEqual([]);
    expect(send).not.toHaveBeenCalled();
    expect(await waitingCount(ben)).toBe(1);
  });

  it.each([
    ['the network is away', new NetworkAway('away'), 1],
    ['the session has ended', new Problem(401, 'Signed out', null), 1],
    ['the server stumbles over one of them', new Problem(500, 'Oops', null), 2],
    ['somebody else has signed in from another tab', new Problem(404, 'Not here', null), 2],
  ])('go on waiting while %s', async (_why, error, tried) => {
    await keepAnswer(answer('k1', ada, 1));
    await keepAnswer(answer('k2', ada, 2));
    const send = vi.fn(async () => Promise.reject(error));
    const sent = await sendWaiting(ada, send);
    expect(new Set(sent.map((one) => one.outcome))).toEqual(new Set(['waiting']));
    expect(send).toHaveBeenCalledTimes(tried);
    expect(await waitingCount(ada)).toBe(2);
  });

  it('are kept with the reason, and not sent again, when the server refuses them', async () => {
    await keepAnswer(answer('k1', ada, 1));
    await keepAnswer(answer('k2', ada, 2));
    const send = vi
      .fn<(request: unknown, key: string) => Promise<AttemptReply>>()
      .mockRejectedValueOnce(new Problem(409, 'Closed', 'This round is closed.'))
      .mockResolvedValue(reply);
    const sent = await sendWaiting(ada, send);
    expect(sent.map((one) => one.outcome)).toEqual(['refused', 'marked']);
    expect((await listWaiting()).map((kept) => kept.refused)).toEqual(['This round is closed.']);
    expect(await waitingCount(ada)).toBe(0);
    await sendWaiting(ada, send);
    expect(send).toHaveBeenCalledTimes(2);
  });
});
