import 'server-only';
import { decode } from 'next-auth/jwt';
import { siteEnvironment } from '@/lib/env';

/** The cookie's name; over https the prefix binds it to this host and to a secure connection. */
export function sessionCookieName(): string {
  return siteEnvironment().secure ? '__Host-hornbeam-session' : 'hornbeam-session';
}

/** What the token of a signed-in person holds beside next-auth's own claims. */
export interface SessionClaims {
  readonly sid: string;
}

/** The session's secret out of the cookie, or null when the token is missing, forged or expired. */
export async function readSessionSecret(cookie: string | undefined): Promise<string | null> {
  if (cookie === undefined || cookie === '') return null;
  try {
    const claims = await decode({ token: cookie, secret: siteEnvironment().secret });
    return typeof claims?.sid === 'string' ? claims.sid : null;
  } catch {
    return null;
  }
}
