import { randomUUID } from 'node:crypto';
import { signInByForm } from '../machine/sign-in.mjs';
import { load, median } from './load.mjs';

const turns = 3;

/**
 * Storing a marked attempt, reading one's pegs and reading a class's progress, as ratios to a bare
 * route handler of the same build: interleaved turns of one run, the median of each. As in a class,
 * nobody waits for another: the requests go round many learners, each with sessions and rounds of
 * their own, so that no two connections stand at the same round.
 */
export async function benchHttp({ address, people, password, classId }) {
  const instructor = await signInByForm(address, people.instructor, password);
  const sessions = await Promise.all(
    people.learners.map((email) => signInByForm(address, email, password)),
  );
  const answers = await openRounds(address, sessions);
  const answer = inTurn(answers);
  const session = inTurn(sessions);
  const kinds = {
    floor: () => ({ path: '/api/floor' }),
    attempt: () => {
      const { cookie, body } = answer();
      return {
        method: 'POST',
        path: '/api/attempts',
        headers: {
          ...jsonHeaders(address, cookie),
          'content-length': Buffer.byteLength(body),
          'idempotency-key': randomUUID(),
        },
        body,
      };
    },
    'class progress': () => ({
      path: `/api/classes/${classId}/progress`,
      headers: { cookie: instructor },
    }),
    'own pegs': () => ({ path: '/api/progress', headers: { cookie: session() } }),
  };
  const measured = Object.fromEntries(Object.keys(kinds).map((kind) => [kind, []]));
  for (const next of Object.values(kinds)) await load(address, { next, seconds: 2 });
  for (let turn = 0; turn < turns; turn += 1) {
    for (const [kind, next] of Object.entries(kinds))
      measured[kind].push(await load(address, { next }));
  }
  const rows = Object.entries(measured).map(([kind, runs]) => ({
    kind,
    rate: median(runs.map((run) => run.rate)),
    ratio: median(runs.map((run, turn) => run.rate / measured.floor[turn].rate)),
    p99: median(runs.map((run, turn) => run.p99 / measured.floor[turn].p99)),
    statuses: Object.fromEntries(runs.flatMap((run) => [...run.statuses])),
  }));
  return { rows, learners: sessions.length, rounds: answers.length };
}

/** Exercises that ask for numbers, at which a wrong one leaves the round open. */
const exercises = [
  'lantern-wheel',
  'turns-through-pairs',
  'row-of-wheels',
  'wheel-that-reaches',
  'oval-from-pins',
  'pins-for-an-oval',
  'grooves-and-bar',
  'edging-strip',
  'how-large-the-copy',
  'holes-for-a-scale',
  'reach-and-tremor',
];

async function openRounds(address, sessions) {
  const opened = [];
  for (const exercise of exercises) {
    const rounds = await Promise.all(
      sessions.map((cookie) => post(address, `/api/exercises/${exercise}/round`, cookie, {})),
    );
    for (const [place, round] of rounds.entries()) {
      const answers = Object.fromEntries(round.parts.map((part) => [part.key, wrongAnswer(part)]));
      const body = JSON.stringify({ roundId: round.roundId, response: { answers } });
      opened.push({ cookie: sessions[place], body });
    }
  }
  return opened;
}

function wrongAnswer(part) {
  return part.kind === 'choice' ? [part.options[0].id] : '98765';
}

function inTurn(list) {
  let place = 0;
  return () => list[place++ % list.length];
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
