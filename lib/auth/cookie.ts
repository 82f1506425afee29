import 'server-only';
import type { CookieOption } from 'next-auth';
import { encode } from 'next-auth/jwt';
import { cookies } from 'next/headers';
import { sessionLimits } from '@/lib/data/entry/sessions';
import { siteEnvironment } from '@/lib/env';
import { openToken } from './open-token';

/** The cookie's name; over https the prefix binds it to this host and to a secure connection. */
export function sessionCookieName(): string {
  return siteEnvironment().secure ? '__Host-hornbeam-session' : 'hornbeam-session';
}

/** How the cookie is set: readable by no script, sent to this site alone, and over https only there. */
export function sessionCookie(): CookieOption {
  const { secure } = siteEnvironment();
  return {
    name: sessionCookieName(),
    options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
  };
}

/** For how many seconds the token may live: as long as the longest session. */
export const tokenAge = sessionLimits.learner.hours * 3600;

/** Gives the browser the token of a session that was just opened, as next-auth would. */
export async function keepSession(personId: string, secret: string): Promise<void> {
  const token = await encode({
    token: { sub: personId, sid: secret },
    secret: siteEnvironment().secret,
    maxAge: tokenAge,
  });
  const { name, options } = sessionCookie();
  (await cookies()).set(name, token, { ...options, maxAge: tokenAge });
}

/** What the token of a signed-in person holds beside next-auth's own claims. */
export interface SessionClaims {
  readonly sid: string;
}

/** The session's secret out of the cookie, or null when the token is missing, forged or expired. */
export async function readSessionSecret(cookie: string | undefined): Promise<string | null> {
  if (cookie === undefined || cookie === '') return null;
  return openToken(cookie, siteEnvironment().secret);
}
