import { describe, expect, it } from 'vitest';
import { site } from '../support/site';

/** Asks without a session, and goes nowhere else. */
const ask = (path: string) => fetch(`${site().address}${path}`, { redirect: 'manual' });

/** What is settled before anything of a page is written: a page once begun can only be a 200. */
describe('the first bytes', () => {
  it('of a private page send somebody who is not signed in to sign in', async () => {
    for (const path of ['/today', '/account', '/classes', '/people', '/exercises', '/home']) {
      const answer = await ask(path);
      expect(answer.status, path).toBe(307);
      expect(answer.headers.get('location'), path).toBe(
        `/sign-in?from=${encodeURIComponent(path)}`,
      );
    }
  });

  it('of a lesson that does not exist say so, and one that does is whole without scripts', async () => {
    expect((await ask('/lessons/toothed-wheels/no-such-lesson')).status).toBe(404);
    const there = await ask('/lessons/toothed-wheels/train-of-toothed-wheels');
    expect(there.status).toBe(200);
    const body = await there.text();
    expect(body).not.toContain('Loading …');
    expect(body).toContain('<svg');
  });
});
