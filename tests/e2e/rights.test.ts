import { beforeAll, describe, expect, it } from 'vitest';
import { demo, password } from '../support/people';
import { keyOf, openVariant, records } from '../support/records';
import { ask, closeSession, nobody, openSession, post, type Session } from '../support/session';

/**
 * Who gets what from the pages and handlers of the production build, asked plainly, as a router's
 * request and as a prefetch: the answer never depends on how one asks.
 */
const whole: readonly (readonly [string, Record<string, string>])[] = [
  ['plainly', {}],
  ['as a router’s request', { RSC: '1' }],
];
/** A prefetch may hold less than the page; what counts is that it never holds more. */
const ways = [...whole, ['as a prefetch', { RSC: '1', 'Next-Router-Prefetch': '1' }] as const];

describe('the rights of the pages', () => {
  let sessions: Record<'nobody' | 'learner' | 'instructor' | 'other' | 'administrator', Session>;
  let classId: string;
  let attemptPath: string;
  let learnerPath: string;
  let classmate: string;

  beforeAll(async () => {
    const [learner, instructor, other, administrator] = await Promise.all([
      openSession(demo.secondLearner, password),
      openSession(demo.instructor, password),
      openSession(demo.otherInstructor, password),
      openSession(demo.administrator, password),
    ]);
    sessions = { nobody, learner, instructor, other, administrator };
    const [own] = await records<{ class_id: string; learner_id: string; name: string }>(
      `select m.class_id, l.id as learner_id, p.name from memberships m
       join people p on p.id = m.person_id join learners l on l.person_id = p.id
       join class_groups c on c.id = m.class_id
       where p.email = $1 and c.name = $2`,
      [demo.learner, demo.className],
    );
    const [attempt] = await records<{ id: string }>(
      `select c.attempt_id as id from counted_attempts c where c.learner_id = $1 limit 1`,
      [own?.learner_id],
    );
    classId = own?.class_id ?? '';
    classmate = own?.name ?? '';
    learnerPath = `/classes/${classId}/learners/${own?.learner_id}`;
    attemptPath = `/classes/${classId}/attempts/${attempt?.id}`;
  });

  const may = async (who: keyof typeof sessions, path: string, headers: Record<string, string>) => {
    const answer = await ask(sessions[who], path, { headers });
    const body = await answer.text();
    return body.includes(classmate);
  };

  it.each(ways)(
    'a class and its learners are for its instructors, asked %s',
    async (way, headers) => {
      for (const path of [`/classes/${classId}`, learnerPath, attemptPath]) {
        for (const who of ['nobody', 'learner', 'other'] as const) {
          expect(await may(who, path, headers), `${who} at ${path}`).toBe(false);
        }
        if (whole.some(([each]) => each === way)) {
          expect(await may('instructor', path, headers), `instructor at ${path}`).toBe(true);
        }
      }
    },
  );

  it.each(ways)('people are for the administrator, asked %s', async (way, headers) => {
    for (const who of ['nobody', 'learner', 'instructor', 'other'] as const) {
      expect(await may(who, '/people', headers), who).toBe(false);
    }
    if (whole.some(([each]) => each === way)) {
      expect(await may('administrator', '/people', headers)).toBe(true);
    }
  });

  it.each(ways)(
    'answers and slips are for instructors and administrators, asked %s',
    async (way, headers) => {
      const path = '/exercises/pins-for-an-oval/key';
      const told = async (who: keyof typeof sessions) =>
        (await (await ask(sessions[who], path, { headers })).text()).includes('set the halves');
      expect(await told('learner')).toBe(false);
      expect(await told('nobody')).toBe(false);
      if (!whole.some(([each]) => each === way)) return;
      expect(await told('instructor')).toBe(true);
      expect(await told('administrator')).toBe(true);
    },
  );

  it('class progress is told to the class’s instructors alone, and looks missing to others', async () => {
    const path = `/api/classes/${classId}/progress`;
    expect((await ask(nobody, path)).status).toBe(401);
    expect((await ask(sessions.learner, path)).status).toBe(404);
    expect((await ask(sessions.other, path)).status).toBe(404);
    const answer = await ask(sessions.instructor, path);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('cache-control')).toContain('no-store');
  });

  it('a lesson holds no answer, slip, advice or hint of an open round, in whatever form it is asked for', async () => {
    const exercise = 'grooves-and-bar';
    await post(sessions.learner, `/api/exercises/${exercise}/round`, {});
    const { key } = keyOf(await openVariant(demo.secondLearner, exercise));
    const secrets = [
      ...key.hints,
      ...key.solution,
      ...key.parts.flatMap((part) => part.slips.map((slip) => slip.advice)),
    ];
    for (const [, headers] of ways) {
      const path = '/lessons/drawing-and-copying/trammel-and-oval';
      const body = await (await ask(sessions.learner, path, { headers })).text();
      expect(secrets.filter((secret) => body.includes(secret))).toEqual([]);
    }
  });

  it('a request for another learner’s round is as if there were none', async () => {
    const mine = await post(sessions.learner, '/api/exercises/edging-strip/round', {});
    const { roundId } = (await mine.json()) as { roundId: string };
    const theirs = await post(
      sessions.other,
      '/api/attempts',
      { roundId, response: { answers: { strip: '1' } } },
      { 'idempotency-key': crypto.randomUUID() },
    );
    expect(theirs.status).toBe(404);
  });

  it('writes are refused from elsewhere, without an origin and in another form', async () => {
    const path = '/api/exercises/edging-strip/round';
    for (const origin of ['https://elsewhere.example', 'null']) {
      const answer = await post(sessions.learner, path, {}, { origin });
      expect(answer.status, origin).toBe(403);
    }
    const form = await ask(sessions.learner, path, {
      method: 'POST',
      headers: { 'content-type': 'text/plain' },
      body: '{}',
    });
    expect([403, 415]).toContain(form.status);
  });

  it('a cookie kept after signing out is worth nothing', async () => {
    const session = await openSession(demo.learner, password);
    expect((await ask(session, '/api/progress')).status).toBe(200);
    await closeSession(session);
    expect((await ask(session, '/api/progress')).status).toBe(401);
  });
});
