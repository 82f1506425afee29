import 'server-only';
import type { AuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { now } from '@/lib/clock';
import { createSession, endSession, findViewer } from '@/lib/data/entry/sessions';
import { siteEnvironment } from '@/lib/env';
import { callerAddress } from './caller';
import { sessionCookie, tokenAge } from './cookie';

/** The error with which next-auth answers a sign-in that was tried too often. */
export const throttledError = 'throttled';

/**
 * next-auth, with our own sessions beneath it: its token only carries the secret of a row in
 * `sessions`, which every request looks up, and lives as long as the longest of them.
 */
export function authOptions(): AuthOptions {
  const { secure, secret } = siteEnvironment();
  return {
    secret,
    session: { strategy: 'jwt', maxAge: tokenAge },
    pages: { signIn: '/sign-in', signOut: '/sign-out', error: '/sign-in' },
    useSecureCookies: secure,
    cookies: {
      sessionToken: sessionCookie(),
    },
    providers: [
      CredentialsProvider({
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: (given, request) => authorise(given, request.headers ?? {}),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { sub: user.id, sid: user.sid } : token),
      session: async ({ session, token }) => {
        const viewer =
          typeof token.sid === 'string'
            ? await findViewer({ by: 'session', secret: token.sid }, now())
            : null;
        return { expires: session.expires, user: viewer ? { name: viewer.name } : undefined };
      },
      redirect: ({ url, baseUrl }) => sameSite(url, baseUrl),
    },
    events: {
      signOut: async ({ token }) => {
        if (typeof token.sid === 'string') {
          await endSession({ by: 'session', secret: token.sid }, now());
        }
      },
    },
  };
}

async function authorise(
  given: Partial<Record<string, string>> | undefined,
  headers: Record<string, string | undefined>,
): Promise<{ id: string; sid: string } | null> {
  const { email, password } = given ?? {};
  if (!email || !password || email.length > 254 || password.length > 1024) return null;
  const from = callerAddress(headers['x-forwarded-for']);
  const device = headers['user-agent'] ?? '';
  const result = await createSession({ by: 'password', email, password, from }, device, now());
  if (result.outcome === 'throttled') throw new Error(throttledError);
  return result.outcome === 'signed in' ? { id: result.personId, sid: result.secret } : null;
}

/** Only addresses of this site are followed after signing in or out. */
function sameSite(url: string, baseUrl: string): string {
  try {
    const target = new URL(url, baseUrl);
    return target.origin === new URL(baseUrl).origin ? target.href : baseUrl;
  } catch {
    return baseUrl;
  }
}
