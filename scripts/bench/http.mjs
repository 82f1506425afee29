import { randomUUID } from 'node:crypto';
import { load, median } from './load.mjs';
import { signInByForm } from '../machine/sign-in.mjs';

const rounds = 3;

/**
 * Storing a marked attempt and reading a class's progress, as ratios to a bare route handler of the
 * same build: interleaved rounds of one run, the median of each.
 */
export async function benchHttp({ address, demo }) {
  const learner = await signInByForm(address, demo.learner, demo.password);
  const instructor = await signInByForm(address, demo.instructor, demo.password);
  const opened = await post(address, `/api/exercises/${demo.exercise}/round`, learner, {});
  const part = opened.parts.find((candidate) => candidate.kind === 'number');
  const choice = opened.parts.find((candidate) => candidate.kind === 'choice');
  const answers = { [part.key]: '987654' };
  if (choice) answers[choice.key] = [choice.options[0].id];
  const body = JSON.stringify({ roundId: opened.roundId, response: { answers } });

  const kinds = {
    floor: () => ({ path: '/api/floor' }),
    attempt: () => ({
      method: 'POST',
      path: '/api/attempts',
      headers: {
        ...jsonHeaders(address, learner),
        'content-length': Buffer.byteLength(body),
        'idempotency-key': randomUUID(),
      },
      body,
    }),
    progress: () => ({
      path: `/api/classes/${demo.classId}/progress`,
      headers: { cookie: instructor },
    }),
    readRound: () => ({ path: '/api/progress', headers: { cookie: learner } }),
  };
  const measured = Object.fromEntries(Object.keys(kinds).map((kind) => [kind, []]));
  for (const next of Object.values(kinds)) await load(address, { next, seconds: 1 });
  for (let round = 0; round < rounds; round += 1) {
    for (const [kind, next] of Object.entries(kinds))
      measured[kind].push(await load(address, { next }));
  }
  return Object.entries(measured).map(([kind, runs]) => ({
    kind,
    rate: median(runs.map((run) => run.rate)),
    ratio: median(runs.map((run, round) => run.rate / measured.floor[round].rate)),
    p99: median(runs.map((run, round) => run.p99 / measured.floor[round].p99)),
    statuses: Object.fromEntries(runs.flatMap((run) => [...run.statuses])),
  }));
}

function jsonHeaders(address, cookie) {
  return { 'content-type': 'application/json', origin: address, cookie };
}

async function post(address, path, cookie, body) {
  const reply = await fetch(`${address}${path}`, {
    method: 'POST',
    headers: jsonHeaders(address, cookie),
    body: JSON.stringify(body),
  });
  if (!reply.ok) throw new Error(`${path}: ${reply.status} ${await reply.text()}`);
  return reply.json();
}
