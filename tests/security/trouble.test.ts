import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { POST as postAttempt } from '@/app/api/attempts/route';
import type { AttemptRequest } from '@/lib/schemas/round';
import {
  countRows,
  mustOpen,
  openWorkshop,
  requestFor,
  signInAs,
  type Workshop,
} from '../support/workshop';

const address = 'http://127.0.0.1:5455';
let cookie = '';

vi.mock('next/headers', () => ({
  cookies: () => Promise.resolve({ get: (name: string) => ({ name, value: cookie }) }),
  headers: () => Promise.resolve(new Headers()),
}));

let workshop: Workshop;
let owner: pg.Client;
beforeAll(async () => {
  workshop = await openWorkshop();
  const { secret: sid } = await signInAs(workshop.learner.personId);
  cookie = await encode({
    token: { sid },
    secret: 'a secret of the tests, long enough to be taken',
  });
  owner = new pg.Client(workshop.database.owner);
  await owner.connect();
});
afterAll(async () => {
  await owner.end();
  await workshop.close();
});

function send(body: AttemptRequest, key: string): Promise<Response> {
  const headers = {
    origin: address,
    'sec-fetch-site': 'same-origin',
    'content-type': 'application/json',
    'idempotency-key': key,
  };
  const request = { method: 'POST', headers, body: JSON.stringify(body) };
  return postAttempt(new Request(`${address}/api/attempts`, request));
}

/** Makes the database refuse to store an attempt, as PostgreSQL refuses with this code. */
async function refuseWith(sqlState: string): Promise<void> {
  await owner.query(`
    create or replace function refuse() returns trigger language plpgsql as
    $$ begin raise exception 'refused for the test' using errcode = '${sqlState}'; end $$;
    create or replace trigger refuse before insert on attempts for each row execute function refuse()`);
}

describe('a database that cannot store an answer just now', () => {
  it.each([
    ['53100', 503, 'The disk that keeps the records is full.'],
    ['57P01', 503, 'The records cannot be reached just now.'],
    ['53300', 503, 'Too many are asking at once.'],
    ['XX000', 500, 'Try again; if it happens again'],
  ])(
    'is told plainly for %s, and the same answer counts once afterwards',
    async (state, status, says) => {
      const logged = vi.spyOn(console, 'error').mockImplementation(() => undefined);
      const round = await mustOpen(workshop.learner, 'oval-from-pins');
      const body = await requestFor(round.roundId, 'slipped');
      const key = randomUUID();
      await refuseWith(state);
      const refused = await send(body, key);
      await owner.query('drop trigger refuse on attempts');

      expect(refused.status).toBe(status);
      expect(refused.headers.get('retry-after') !== null).toBe(status === 503);
      expect(((await refused.json()) as { detail: string }).detail).toContain(says);
      const before = await countRows('attempts');
      expect((await send(body, key)).status).toBe(201);
      expect((await send(body, key)).status).toBe(201);
      expect(await countRows('attempts')).toBe(before + 1);

      // What the learner typed stays out of the log.
      const lines = JSON.stringify(logged.mock.calls);
      expect(lines).not.toContain(round.roundId);
      expect(logged).toHaveBeenCalledOnce();
      logged.mockRestore();
    },
  );
});
