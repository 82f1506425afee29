import { randomUUID } from 'node:crypto';
import { encode } from 'next-auth/jwt';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { POST as postAttempt } from '@/app/api/attempts/route';
import { GET as getClassProgress } from '@/app/api/classes/[id]/progress/route';
import { POST as postHint } from '@/app/api/exercises/[id]/hints/route';
import { POST as postRound } from '@/app/api/exercises/[id]/round/route';
import { POST as postSolution } from '@/app/api/exercises/[id]/solution/route';
import { GET as getProgress } from '@/app/api/progress/route';
import { endSession } from '@/lib/data/entry/sessions';
import { attemptReplySchema, roundViewSchema } from '@/lib/schemas/round';
import {
  countRows,
  makeViewer,
  mustOpen,
  openWorkshop,
  requestFor,
  signInAs,
  type Workshop,
} from '../support/workshop';

const address = 'http://127.0.0.1:5455';
const secret = 'a secret of the tests, long enough to be taken';
let cookie: string | undefined;

vi.mock('next/headers', () => ({
  cookies: () =>
    Promise.resolve({
      get: (name: string) =>
        name === 'hornbeam-session' && cookie !== undefined ? { name, value: cookie } : undefined,
    }),
  headers: () => Promise.resolve(new Headers()),
}));

let workshop: Workshop;
beforeAll(async () => {
  workshop = await openWorkshop();
});
afterAll(() => workshop.close());
beforeEach(() => {
  cookie = undefined;
});

const exerciseId = 'oval-from-pins';
const params = Promise.resolve({ id: exerciseId });

/** Every writing handler of ours, with a body that it takes. */
const writers = {
  round: { call: (request: Request) => postRound(request, { params }), body: {} },
  hints: {
    call: (request: Request) => postHint(request, { params }),
    body: { roundId: randomUUID(), hint: 1 },
  },
  solution: {
    call: (request: Request) => postSolution(request, { params }),
    body: { roundId: randomUUID() },
  },
  attempts: {
    call: (request: Request) => postAttempt(request),
    body: { roundId: randomUUID(), response: { answers: {} } },
  },
};

function post(body: unknown, headers: Record<string, string | null> = {}): Request {
  const all = new Headers({
    origin: address,
    'sec-fetch-site': 'same-origin',
    'content-type': 'application/json',
    'idempotency-key': randomUUID(),
  });
  for (const [name, value] of Object.entries(headers)) {
    if (value === null) all.delete(name);
    else all.set(name, value);
  }
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  return new Request(`${address}/api/anything`, { method: 'POST', headers: all, body: text });
}

async function signIn(personId: string): Promise<string> {
  const session = await signInAs(personId);
  cookie = await encode({ token: { sid: session.secret }, secret });
  return session.secret;
}

async function problemOf(response: Response): Promise<{ status: number; title: string }> {
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  expect(response.headers.get('cache-control')).toBe('no-store');
  const body = (await response.json()) as { status: number; title: string };
  expect(body.status).toBe(response.status);
  expect(JSON.stringify(body)).not.toMatch(/\bat .*\.ts/);
  return body;
}

describe.each(Object.entries(writers))('the writing handler for %s', (_name, { call, body }) => {
  it('refuses what does not come from a page of the site, signed in or not', async () => {
    await signIn(workshop.learner.personId);
    const foreign: Record<string, string | null>[] = [
      { origin: null },
      { origin: 'null' },
      { origin: 'https://elsewhere.example' },
      { origin: `${address}.elsewhere.example` },
      { 'sec-fetch-site': 'cross-site' },
      { 'sec-fetch-site': 'same-site' },
      { 'sec-fetch-site': 'none' },
    ];
    for (const headers of foreign) {
      expect((await problemOf(await call(post(body, headers)))).status).toBe(403);
    }
  });

  it('refuses a body that is not declared as JSON', async () => {
    await signIn(workshop.learner.personId);
    for (const type of ['text/plain', 'application/x-www-form-urlencoded', 'application/jsonp']) {
      expect((await problemOf(await call(post(body, { 'content-type': type })))).status).toBe(415);
    }
  });

  it('refuses who is not signed in, has a forged token, or has signed out', async () => {
    expect((await problemOf(await call(post(body)))).status).toBe(401);
    cookie = await encode({
      token: { sid: 'guessed' },
      secret: 'another secret, just as long as it',
    });
    expect((await problemOf(await call(post(body)))).status).toBe(401);
    const session = await signIn(workshop.learner.personId);
    await endSession({ by: 'session', secret: session }, new Date());
    expect((await problemOf(await call(post(body)))).status).toBe(401);
  });

  it('refuses what is not JSON, has a key it does not know, or is too large', async () => {
    await signIn(workshop.learner.personId);
    expect((await problemOf(await call(post('{')))).status).toBe(400);
    for (const extra of [
      { learnerId: workshop.classmate.learnerId },
      { isAdministrator: true },
      { score: 1 },
    ]) {
      expect((await problemOf(await call(post({ ...body, ...extra })))).status).toBe(422);
    }
    const proto = JSON.stringify(body).replace(/^\{/, '{"__proto__":{"a":1},').replace(',}', '}');
    expect((await problemOf(await call(post(proto)))).status).toBe(422);
    expect((await problemOf(await call(post(`"${'x'.repeat(70_000)}"`)))).status).toBe(413);
  });
});

describe('the loop over HTTP', () => {
  it('opens a round, takes an answer once, and says so again when asked again', async () => {
    const viewer = await makeViewer('Hattie Http', []);
    await signIn(viewer.personId);
    const opened = await postRound(post({}), { params });
    expect(opened.status).toBe(200);
    expect(opened.headers.get('cache-control')).toBe('no-store');
    const round = roundViewSchema.parse(await opened.json());
    const request = await requestFor(round.roundId, 'right');
    const key = { 'idempotency-key': randomUUID() };
    const first = await postAttempt(post(request, key));
    const again = await postAttempt(post(request, key));
    expect([first.status, again.status]).toEqual([201, 201]);
    const reply = attemptReplySchema.parse(await first.json());
    expect(attemptReplySchema.parse(await again.json())).toEqual(reply);
    const other = await postAttempt(
      post({ ...request, response: { answers: { eastWest: '1 mm', northSouth: '1 mm' } } }, key),
    );
    expect((await problemOf(other)).status).toBe(422);
    const closed = await postAttempt(post(request));
    expect((await problemOf(closed)).status).toBe(409);
    expect(await countRows('attempts', 'learner_id = $1', [viewer.learnerId])).toBe(1);
  });

  it('wants a key that is a UUID, and says what cannot be read field by field', async () => {
    const viewer = await makeViewer('Kim Key', []);
    await signIn(viewer.personId);
    const { roundId } = await mustOpen(viewer, exerciseId);
    const request = await requestFor(roundId, 'right');
    for (const key of [null, 'again', '1']) {
      const response = await postAttempt(post(request, { 'idempotency-key': key }));
      expect((await problemOf(response)).status).toBe(400);
    }
    const response = await postAttempt(
      post({ roundId, response: { answers: { eastWest: '??', northSouth: '100 mm' } } }),
    );
    expect(await problemOf(response)).toMatchObject({
      status: 422,
      title: 'That cannot be read',
      errors: [{ field: 'eastWest' }],
    });
  });

  it("treats another learner's round as one that is not there", async () => {
    const { roundId } = await mustOpen(workshop.learner, exerciseId);
    const request = await requestFor(roundId, 'right');
    await signIn(workshop.classmate.personId);
    expect((await postAttempt(post(request))).status).toBe(404);
    expect((await postHint(post({ roundId, hint: 1 }), { params })).status).toBe(404);
    expect((await postSolution(post({ roundId }), { params })).status).toBe(404);
  });
});

describe('reading', () => {
  it("shows a class's progress to its staff only", async () => {
    const context = { params: Promise.resolve({ id: workshop.harbour }) };
    const read = () => getClassProgress(new Request(address), context);
    expect((await read()).status).toBe(401);
    const { learner, stranger, otherInstructor, instructor, administrator } = workshop;
    for (const viewer of [learner, stranger, otherInstructor]) {
      await signIn(viewer.personId);
      const response = await read();
      expect((await problemOf(response)).status).toBe(404);
    }
    for (const viewer of [instructor, administrator]) {
      await signIn(viewer.personId);
      expect((await read()).status).toBe(200);
    }
  });

  it('shows pegs to whoever they belong to', async () => {
    expect((await getProgress()).status).toBe(401);
    await signIn(workshop.learner.personId);
    const response = await getProgress();
    expect(response.status).toBe(200);
    expect(((await response.json()) as { pegs: unknown[] }).pegs.length).toBeGreaterThan(10);
  });
});
