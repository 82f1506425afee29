import { randomUUID } from 'node:crypto';
import type pg from 'pg';
import { exercises } from '@/content/exercises/registry';
import type { Variant } from '@/lib/marking/definition';
import { rightResponse, slippedResponse } from '../demo/respond';

/** What the server said it has kept. */
export interface Acknowledged {
  readonly attemptId: string;
  readonly roundId: string;
  readonly key: string;
  /** The same request was acknowledged before, and this one gave the same attempt. */
  readonly sent: number;
}

export interface WriterOptions {
  readonly address: string;
  readonly cookie: string;
  /** Past every right: to know what is right for a round, which no learner is told. */
  readonly pool: pg.Pool;
  readonly until: () => boolean;
  readonly note: (acknowledged: Acknowledged) => void;
}

const asked = ['oval-from-pins', 'pins-for-an-oval', 'edging-strip', 'grooves-and-bar'] as const;

/**
 * A learner who answers and answers: two slips, then right, then the next round. What was not
 * acknowledged is sent again under the same key, as a browser does whose server is away.
 */
export async function write({ address, cookie, pool, until, note }: WriterOptions): Promise<void> {
  for (let turn = 0; !until(); turn += 1) {
    const exerciseId = asked[turn % asked.length] ?? asked[0];
    const round = await send(`${address}/api/exercises/${exerciseId}/round`, { cookie, body: {} });
    const { roundId } = round.reply as { roundId: string };
    const variant = await variantOf(pool, roundId);
    const definition = exercises.get(exerciseId);
    if (variant === null || definition === undefined) continue;
    const right = rightResponse(definition, variant);
    for (const response of [
      slippedResponse(definition, variant, turn) ?? right,
      slippedResponse(definition, variant, turn + 1) ?? right,
      right,
    ]) {
      const key = randomUUID();
      const { status, sent, reply } = await send(`${address}/api/attempts`, {
        cookie,
        body: { roundId, response },
        key,
      });
      if (status !== 201) break;
      const { attempt } = reply as { attempt: { attemptId: string } };
      note({ attemptId: attempt.attemptId, roundId, key, sent });
    }
  }
}

interface Sending {
  readonly cookie: string;
  readonly body: unknown;
  readonly key?: string;
}

/** Sends until the server answers for itself: no connection and 5xx are tried again. */
async function send(url: string, { cookie, body, key }: Sending) {
  for (let sent = 1; ; sent += 1) {
    try {
      const response = await fetch(url, {
        method: 'POST',
        headers: {
          'content-type': 'application/json',
          origin: new URL(url).origin,
          cookie,
          ...(key === undefined ? {} : { 'idempotency-key': key }),
        },
        body: JSON.stringify(body),
        signal: AbortSignal.timeout(20_000),
      });
      const reply: unknown = await response.json();
      if (response.status < 500) return { status: response.status, reply, sent };
    } catch {
      // The server is away: killed, or starting again.
    }
    await new Promise((resolve) => {
      setTimeout(resolve, 50);
    });
  }
}

async function variantOf(pool: pg.Pool, roundId: string): Promise<Variant | null> {
  for (;;) {
    try {
      const found = await pool.query<{ variant: Variant }>(
        'select variant from rounds where id = $1',
        [roundId],
      );
      return found.rows[0]?.variant ?? null;
    } catch {
      await new Promise((resolve) => {
        setTimeout(resolve, 100);
      });
    }
  }
}
