import { afterEach, describe, expect, it, vi } from 'vitest';
import { sendAttempt, openRound } from '@/lib/browser/exercises';
import { fetchJson } from '@/lib/browser/fetch-json';
import { isPassing, isSignedOut, NetworkAway, Problem, sentenceFor } from '@/lib/browser/problem';

function answering(status: number, body: string) {
  const fetching = vi.fn(
    async (_path: string, _init: RequestInit) =>
      new Response(body, { status, headers: { 'Content-Type': 'application/json' } }),
  );
  vi.stubGlobal('fetch', fetching);
  return fetching;
}

afterEach(() => {
  vi.unstubAllGlobals();
});

describe('asking the server', () => {
  it('posts JSON with the key of the answer', async () => {
    const fetching = answering(201, '{"attempt":{},"round":{},"pegs":[]}');
    const request = { roundId: 'r', response: { answers: { n: '3:1' } } };
    await sendAttempt(request, 'the-key');
    const [path, init] = fetching.mock.calls[0] ?? [];
    expect(path).toBe('/api/attempts');
    expect(init?.method).toBe('POST');
    expect(new Headers(init?.headers).get('Idempotency-Key')).toBe('the-key');
    expect(new Headers(init?.headers).get('Content-Type')).toBe('application/json');
    expect(JSON.parse(String(init?.body))).toEqual(request);
  });

  it('opens a round by POST, so that reading never writes', async () => {
    const fetching = answering(200, '{}');
    await openRound('pins-for-an-oval', 'inch');
    expect(fetching.mock.calls[0]?.[0]).toBe('/api/exercises/pins-for-an-oval/round');
    expect(fetching.mock.calls[0]?.[1].body).toBe('{"units":"inch"}');
  });

  it('turns problem details into a problem with its sentence', async () => {
    answering(409, '{"title":"Closed","status":409,"detail":"This round is closed."}');
    const error = await fetchJson('/api/x').catch((caught: unknown) => caught);
    expect(error).toBeInstanceOf(Problem);
    expect(sentenceFor(error)).toBe('This round is closed.');
    expect(isPassing(error)).toBe(false);
  });

  it('makes a problem of an error that is not JSON, and quotes the number of a logged one', async () => {
    answering(502, '<html>');
    const error = await fetchJson('/api/x').catch((caught: unknown) => caught);
    expect(isPassing(error)).toBe(true);
    expect(sentenceFor(new Problem(500, 'Oops', null, 'e-17'))).toContain('Quote e-17');
  });

  it('says that the network is away when no answer comes, and when one breaks off', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    await expect(fetchJson('/api/x')).rejects.toBeInstanceOf(NetworkAway);
    answering(200, '{"round":');
    await expect(fetchJson('/api/x')).rejects.toBeInstanceOf(NetworkAway);
  });

  it('tells an ended session from other refusals', () => {
    expect(isSignedOut(new Problem(401, 'Sign in', null))).toBe(true);
    expect(isSignedOut(new Problem(403, 'No', null))).toBe(false);
    expect(isPassing(new Problem(429, 'Slow down', null))).toBe(true);
  });
});
