import { afterEach, describe, expect, it, vi } from 'vitest';
import { forgetEnvironment } from '@/lib/env';

vi.mock('next/headers', () => ({ cookies: vi.fn() }));

function at(address: string) {
  Object.assign(process.env, {
    DATABASE_URL: 'postgres://app@127.0.0.1:1/none',
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: 'a secret of the tests, long enough to be taken',
    SMTP_URL: 'smtp://127.0.0.1:1',
    MAIL_FROM: 'Hornbeam <hornbeam@localhost>',
  });
  forgetEnvironment();
}

afterEach(() => {
  forgetEnvironment();
});

describe('the session’s cookie', () => {
  it('over https is bound to this host and sent over https alone', async () => {
    const { sessionCookie } = await import('@/lib/auth/cookie');
    at('https://hornbeam.example');
    expect(sessionCookie()).toEqual({
      name: '__Host-hornbeam-session',
      options: { httpOnly: true, sameSite: 'lax', path: '/', secure: true },
    });
  });

  it('on this machine alone may do without, and still is out of reach of scripts', async () => {
    const { sessionCookie } = await import('@/lib/auth/cookie');
    at('http://127.0.0.1:3000');
    expect(sessionCookie()).toEqual({
      name: 'hornbeam-session',
      options: { httpOnly: true, sameSite: 'lax', path: '/', secure: false },
    });
  });

  it('is the same as next-auth sets', async () => {
    const { authOptions } = await import('@/lib/auth/options');
    const { sessionCookie } = await import('@/lib/auth/cookie');
    at('https://hornbeam.example');
    expect(authOptions().cookies?.sessionToken).toEqual(sessionCookie());
    expect(authOptions().useSecureCookies).toBe(true);
  });
});

describe('the boot', () => {
  it('refuses an address that is neither https nor this machine', async () => {
    const { checkEnvironment } = await import('@/lib/env');
    at('http://hornbeam.example');
    expect(() => checkEnvironment(process.env)).toThrow(/NEXTAUTH_URL must begin with https/);
  });
});
