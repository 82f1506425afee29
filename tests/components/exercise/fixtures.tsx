import { vi } from 'vitest';
import type { AttemptReply, AttemptView, RoundView } from '@/lib/schemas/round';

export const ada = '0a000000-0000-4000-8000-000000000001';

/** A round that asks for two lengths. */
export function pinsRound(change: Partial<RoundView> = {}): RoundView {
  const length = {
    kind: 'number',
    dimension: 'length',
    unit: 'mm',
    expects: 'a length in mm, for example 79.4',
  } as const;
  return {
    roundId: '7f000000-0000-4000-8000-00000000000a',
    exerciseId: 'pins-for-an-oval',
    version: 1,
    kind: 'number',
    units: 'metric',
    title: 'Pins for an oval',
    prompt: 'How far from the pencil are the two pins?',
    givens: [{ symbol: 'ℓ', label: 'Length', value: '460', unit: 'mm' }],
    parts: [
      { ...length, key: 'far', label: 'Far pin' },
      { ...length, key: 'near', label: 'Near pin' },
    ],
    hints: [],
    hintsTotal: 3,
    attempts: [],
    closed: false,
    unaided: true,
    ...change,
  };
}

/** An attempt with the far pin wrong. */
export function halfRight(change: Partial<AttemptView> = {}): AttemptView {
  return {
    attemptId: 'a1',
    createdAt: '2031-03-04T18:00:00.000Z',
    verdict: 'partly',
    message: 'Near pin right, far pin not yet.',
    parts: [
      {
        key: 'far',
        label: 'Far pin',
        right: false,
        echo: '460 mm',
        slip: 'full-axes',
        message: 'That is the whole length: set half of it.',
      },
      { key: 'near', label: 'Near pin', right: true, echo: '140 mm' },
    ],
    nextStep: 'Stand at the middle. How far is it to the end?',
    closesRound: false,
    ...change,
  };
}

export interface Asked {
  readonly path: string;
  readonly body: unknown;
  readonly key: string | null;
}

/** Answers every request of the page with `answer`; what was asked is kept. */
export function serve(answer: (path: string) => Response): Asked[] {
  const asked: Asked[] = [];
  vi.stubGlobal('fetch', async (path: string, init: RequestInit) => {
    const body: unknown = typeof init.body === 'string' ? JSON.parse(init.body) : undefined;
    asked.push({ path, body, key: new Headers(init.headers).get('Idempotency-Key') });
    return answer(path);
  });
  return asked;
}

export function json(body: unknown, status = 200): Response {
  return Response.json(body, { status });
}

/** What comes back for an attempt at a round. */
export function reply(attempt: AttemptView, round: RoundView, pegs: AttemptReply['pegs'] = []) {
  return json({ attempt, round: { ...round, attempts: [attempt] }, pegs }, 201);
}
