import 'fake-indexeddb/auto';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { BenchLockProvider } from '@/components/lesson/bench-lock';
import { LessonBench } from '@/components/lesson/lesson-bench';
import { Prediction } from '@/components/lesson/prediction';
import { QueryProvider } from '@/lib/browser/query-provider';
import { discardAnswer, listWaiting } from '@/lib/browser/waiting-answers';
import type { TrammelSpec } from '@/lib/scene/bench-spec';
import type { RoundView } from '@/lib/schemas/round';
import { ada, halfRight, json, pinsRound, reply, serve } from '../exercise/fixtures';

vi.mock('@/components/bench/bench', () => ({
  Bench: ({ title, locked }: { title: string; locked?: boolean }) => (
    <figure aria-label={title}>{locked ? 'locked' : 'open'}</figure>
  ),
}));

const spec: TrammelSpec = {
  bench: 'trammel',
  farPin: 160,
  nearPin: 60,
  farRunsIn: 'north-south',
  slider: 40,
  groove: 300,
  skew: 0,
  held: 'board',
};

let rounds = 0;
function fresh(change: Partial<RoundView> = {}): RoundView {
  rounds += 1;
  return pinsRound({
    roundId: `70000000-0000-4000-8000-${String(rounds).padStart(12, '0')}`,
    exerciseId: 'move-the-pen-out',
    kind: 'prediction',
    prompt: 'The pen is moved farther out. What becomes of the oval?',
    parts: [
      {
        kind: 'choice',
        key: 'oval',
        label: 'Your guess',
        multiple: false,
        options: [
          { id: 'p1', label: 'It gets rounder' },
          { id: 'p2', label: 'It keeps its shape' },
        ],
      },
    ],
    ...change,
  });
}

function show(personId: string | null, round: RoundView | null, sample: RoundView | null = null) {
  const predicted = (round?.attempts.length ?? 0) > 0;
  render(
    <QueryProvider>
      <BenchLockProvider predicted={predicted}>
        <Prediction
          id="move-the-pen-out"
          personId={personId}
          units="metric"
          round={round}
          sample={sample}
        >
          <p>Which distance has stayed?</p>
        </Prediction>
        <LessonBench spec={spec} title="Trammel" />
      </BenchLockProvider>
    </QueryProvider>,
  );
  return userEvent.setup();
}

const bench = () => screen.getByRole('figure', { name: 'Trammel' }).textContent;
const kept = halfRight({ parts: [], message: 'It keeps its shape was your guess.' });

beforeEach(async () => {
  for (const one of await listWaiting()) await discardAnswer(one.key);
});

afterEach(() => {
  vi.unstubAllGlobals();
});

describe('a prediction', () => {
  it('keeps the bench locked until the guess is stored', async () => {
    const round = fresh();
    const asked = serve(() => reply(kept, { ...round, closed: true }));
    const user = show(ada, round);
    expect(bench()).toBe('locked');
    expect(screen.queryByText('Which distance has stayed?')).toBeNull();
    await user.click(screen.getByRole('button', { name: 'That is my guess' }));
    expect(screen.getByText('Choose one of them.')).toBeVisible();
    expect(bench()).toBe('locked');
    await user.click(screen.getByRole('radio', { name: 'It keeps its shape' }));
    expect(bench()).toBe('locked');
    await user.click(screen.getByRole('button', { name: 'That is my guess' }));
    expect(await screen.findByText('Which distance has stayed?')).toBeVisible();
    expect(bench()).toBe('open');
    expect(asked[0]?.body).toMatchObject({ response: { answers: { oval: ['p2'] } } });
    expect(screen.getByRole('radio', { name: 'It gets rounder' })).toBeDisabled();
  });

  it('opens its round by itself, since every learner needs it', async () => {
    const round = fresh();
    const asked = serve(() => json(round));
    show(ada, null);
    expect(await screen.findByText(round.prompt)).toBeVisible();
    expect(new Set(asked.map((one) => one.path))).toEqual(
      new Set(['/api/exercises/move-the-pen-out/round']),
    );
    expect(bench()).toBe('locked');
  });

  it('stays open once it was made, with the guess marked on whatever device it is read', () => {
    const part = { key: 'oval', label: 'The oval', right: false, echo: 'It keeps its shape' };
    const guessed = halfRight({ parts: [{ ...part, chosen: ['p2'] }] });
    show(ada, fresh({ closed: true, attempts: [guessed] }));
    expect(bench()).toBe('open');
    expect(screen.getByRole('radio', { name: 'It keeps its shape' })).toBeChecked();
    expect(screen.getByText('You guessed: It keeps its shape.')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'That is my guess' })).toBeNull();
  });

  it('counts as made when the network is away and the guess is kept on the device', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    const user = show(ada, fresh());
    await user.click(screen.getByRole('radio', { name: 'It gets rounder' }));
    await user.click(screen.getByRole('button', { name: 'That is my guess' }));
    await waitFor(() => expect(bench()).toBe('open'));
    expect(await listWaiting()).toHaveLength(1);
  });

  it.each([
    ['a guess', true],
    ['asking to be shown', false],
  ])(
    'is opened in this tab by %s of somebody not signed in, and nothing is sent',
    async (_, guesses) => {
      const asked = serve(() => json({}));
      const user = show(null, null, fresh());
      expect(bench()).toBe('locked');
      if (guesses) {
        await user.click(screen.getByRole('radio', { name: 'It gets rounder' }));
        await user.click(screen.getByRole('button', { name: 'That is my guess' }));
      } else {
        await user.click(screen.getByRole('button', { name: 'Just show me' }));
      }
      expect(bench()).toBe('open');
      expect(screen.getByText('Which distance has stayed?')).toBeVisible();
      expect(asked).toEqual([]);
    },
  );
});
