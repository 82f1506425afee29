import 'server-only';
import { createHash } from 'node:crypto';
import { decode } from 'next-auth/jwt';
import { now } from '@/lib/clock';

/** What stands in a token: the secret of a session, and until when the token is good. */
interface Opened {
  readonly sid: string;
  readonly expires: number;
}

/**
 * Tokens that were opened lately, by their hash: what is in one never changes, and opening it costs
 * more than all else that a request does before its first query. Whether the session that it names
 * is in force is looked up every time.
 */
const opened = new Map<string, Opened>();
const mostKept = 2_000;

/** The session's secret out of a token, or null when the token is forged or expired. */
export async function openToken(token: string, secret: string): Promise<string | null> {
  const key = createHash('sha256').update(secret).update(token).digest('base64url');
  const known = opened.get(key) ?? (await read(token, secret));
  if (known === null || known.expires <= now().getTime()) return null;
  if (!opened.has(key)) keep(key, known);
  return known.sid;
}

async function read(token: string, secret: string): Promise<Opened | null> {
  try {
    const claims = await decode({ token, secret });
    if (typeof claims?.sid !== 'string' || typeof claims.exp !== 'number') return null;
    return { sid: claims.sid, expires: claims.exp * 1000 };
  } catch {
    return null;
  }
}

/** The one that came first makes room: a map keeps its keys in that order. */
function keep(key: string, token: Opened): void {
  const [first] = opened.keys();
  if (opened.size >= mostKept && first !== undefined) opened.delete(first);
  opened.set(key, token);
}
