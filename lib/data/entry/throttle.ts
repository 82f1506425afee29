import 'server-only';
import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { database } from '@/lib/db/connection';

/** Something that may be tried only so often: how often, and within how many seconds. */
const limits = {
  'sign-in by account': { points: 10, duration: 15 * 60 },
  'sign-in by address': { points: 100, duration: 15 * 60 },
  'link by address': { points: 30, duration: 15 * 60 },
  'reset by account': { points: 5, duration: 60 * 60 },
  'reset by address': { points: 30, duration: 60 * 60 },
  'join by account': { points: 5, duration: 60 * 60 },
  'join by address': { points: 60, duration: 60 * 60 },
  'joining word by person': { points: 20, duration: 60 * 60 },
  'invitations by person': { points: 1000, duration: 24 * 60 * 60 },
  // Many times what a hand can send, or a device that was away for a week: only a flood meets it.
  'attempts by person': { points: 15_000, duration: 10 * 60 },
  'new address by person': { points: 5, duration: 60 * 60 },
} as const;

/** What is counted. */
export type Counted = keyof typeof limits;

/** Whether one more try is allowed; if not, after how many seconds. */
export type Allowance =
  { readonly allowed: true } | { readonly allowed: false; readonly retryAfter: number };

const limiters = new Map<Counted, { limiter: RateLimiterPostgres; of: unknown }>();

/** Counts a try by `who` and says whether it is allowed; every instance counts together. */
export async function countTry(what: Counted, who: string, points = 1): Promise<Allowance> {
  try {
    await limiterOf(what).consume(hidden(who), points);
    return { allowed: true };
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    return { allowed: false, retryAfter: Math.max(1, Math.ceil(refusal.msBeforeNext / 1000)) };
  }
}

/** Forgets the tries of `who`, once they have got it right. */
export async function forgetTries(what: Counted, who: string): Promise<void> {
  await limiterOf(what).delete(hidden(who));
}

function limiterOf(what: Counted): RateLimiterPostgres {
  const open = database();
  const known = limiters.get(what);
  if (known?.of === open) return known.limiter;
  const limiter = new RateLimiterPostgres({
    storeClient: open,
    storeType: 'sequelize',
    tableName: 'throttle',
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix: what,
    ...limits[what],
  });
  limiters.set(what, { limiter, of: open });
  return limiter;
}

/** Addresses are not kept in clear where they are only counted. */
function hidden(who: string): string {
  return createHash('sha256').update(who).digest('base64url');
}
