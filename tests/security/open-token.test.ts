import { encode } from 'next-auth/jwt';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { openToken } from '@/lib/auth/open-token';

const secret = 'a secret of the tests, long enough to be taken';
const make = (sid: string, maxAge = 60, by = secret) =>
  encode({ token: { sid }, secret: by, maxAge });

afterEach(() => {
  vi.useRealTimers();
});

describe('a token', () => {
  it('gives the same session’s secret the first time and afterwards', async () => {
    const token = await make('one');
    expect(await openToken(token, secret)).toBe('one');
    expect(await openToken(token, secret)).toBe('one');
  });

  it('is worth nothing when it is forged, cut, or of another secret, though the good one is known', async () => {
    const token = await make('two');
    expect(await openToken(token, secret)).toBe('two');
    expect(await openToken(token.slice(0, -1), secret)).toBeNull();
    expect(await openToken(`${token}x`, secret)).toBeNull();
    expect(await openToken(token, 'another secret, which is as long as it')).toBeNull();
    expect(
      await openToken(await make('two', 60, 'another secret, just as long'), secret),
    ).toBeNull();
    expect(await openToken('nonsense', secret)).toBeNull();
  });

  it('is worth nothing once it has expired, though it was opened before', async () => {
    const token = await make('three', 60);
    expect(await openToken(token, secret)).toBe('three');
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 61_000 });
    expect(await openToken(token, secret)).toBeNull();
  });

  it('is remembered only with so many others', async () => {
    const first = await make('first');
    expect(await openToken(first, secret)).toBe('first');
    const many = await Promise.all(Array.from({ length: 2_100 }, (_, n) => make(`${n}`)));
    for (const token of many) await openToken(token, secret);
    expect(await openToken(first, secret)).toBe('first');
  });
});
