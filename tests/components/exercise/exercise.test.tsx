import 'fake-indexeddb/auto';
import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Exercise, type ExerciseEntry } from '@/components/exercise/exercise';
import { WaitingNotice } from '@/components/exercise/waiting-notice';
import { QueryProvider } from '@/lib/browser/query-provider';
import { discardAnswer, keepAnswer, listWaiting } from '@/lib/browser/waiting-answers';
import type { RoundView } from '@/lib/schemas/round';
import { ada, halfRight, json, pinsRound, reply, serve } from './fixtures';

vi.mock('@/components/bench/bench', () => ({
  Bench: ({ title }: { title: string }) => <figure aria-label={title} />,
}));

const peg = { skill: 'trammel.pins-from-size', name: 'Pins from the size', detail: '' };
const signIn = '/sign-in?from=%2Flessons';

function show(
  round: RoundView | null,
  personId: string | null = ada,
  sample: RoundView | null = null,
) {
  const entry: ExerciseEntry = {
    id: 'pins-for-an-oval',
    number: 2,
    title: 'Pins for an oval',
    pegs: personId === null ? [] : [{ ...peg, state: 'open' }],
    round,
    sample,
  };
  const user = userEvent.setup();
  const { container } = render(
    <QueryProvider>
      <WaitingNotice personId={personId} signInHref={signIn} />
      <Exercise entry={entry} personId={personId} units="metric" signInHref={signIn} />
    </QueryProvider>,
  );
  return { user, container };
}

type User = ReturnType<typeof userEvent.setup>;

async function answer(user: User, far: string, near: string) {
  await user.type(screen.getByRole('textbox', { name: 'Far pin' }), far);
  await user.type(screen.getByRole('textbox', { name: 'Near pin' }), near);
  await user.click(screen.getByRole('button', { name: 'Check both' }));
}

beforeEach(async () => {
  window.sessionStorage.clear();
  for (const kept of await listWaiting()) await discardAnswer(kept.key);
});

afterEach(() => {
  vi.unstubAllGlobals();
});

/** Each test has a round of its own, since what is typed is kept by round. */
let rounds = 0;
function fresh(change: Partial<RoundView> = {}): RoundView {
  rounds += 1;
  const roundId = `7f000000-0000-4000-8000-${String(rounds).padStart(12, '0')}`;
  return pinsRound({ roundId, ...change });
}

describe('an exercise', () => {
  it('opens a round only when asked to, by POST', async () => {
    const round = fresh();
    const asked = serve(() => json(round));
    const { user } = show(null);
    expect(asked).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Start' }));
    expect(await screen.findByText(round.prompt)).toBeVisible();
    expect(asked).toEqual([
      { path: '/api/exercises/pins-for-an-oval/round', body: { units: 'metric' }, key: null },
    ]);
  });

  it('says back what it reads while one types, and refuses with what is expected', async () => {
    const { user } = show(fresh());
    const far = screen.getByRole('textbox', { name: 'Far pin' });
    await user.type(far, '3 1/8 in');
    expect(far).toHaveAccessibleDescription('3 1/8 in = 79.4 mm');
    await user.clear(far);
    await user.type(far, 'three');
    expect(far).not.toBeInvalid();
    await user.tab();
    expect(far).toBeInvalid();
    expect(far).toHaveAccessibleDescription(/a length in millimetres, such as 79\.4/);
  });

  it('does not send what is not answered, and says which', async () => {
    const asked = serve(() => json({}));
    const { user } = show(fresh());
    await user.type(screen.getByRole('textbox', { name: 'Far pin' }), '230');
    await user.click(screen.getByRole('button', { name: 'Check both' }));
    expect(screen.getByText('Not sent yet. Look at: Near pin.')).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Near pin' })).toBeInvalid();
    expect(asked).toEqual([]);
  });

  it('announces the marking where a status stood before, and leaves the focus alone', async () => {
    const round = fresh();
    const asked = serve(() => reply(halfRight(), round, [{ ...peg, state: 'started' }]));
    const { user } = show(round);
    const statuses = screen.getAllByRole('status');
    await answer(user, '460', '140');
    const said = await screen.findByText('Near pin right, far pin not yet.');
    const status = statuses.find((one) => one.contains(said));
    if (status === undefined)
      throw new Error('the marking is not in a status that was there before');
    expect(screen.getByRole('button', { name: 'Check both' })).toHaveFocus();
    expect(within(status).getByText('That is the whole length: set half of it.')).toBeVisible();
    expect(within(status).getByText(/is not right yet/)).toBeInTheDocument();
    expect(within(status).getByText(/Stand at the middle/)).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Far pin' })).toBeInvalid();
    expect(screen.getByRole('textbox', { name: 'Far pin' })).toHaveValue('460');
    expect(screen.getByRole('img', { name: /Pins from the size: peg started/ })).toBeVisible();
    expect(asked[0]).toMatchObject({
      path: '/api/attempts',
      body: { roundId: round.roundId, response: { answers: { far: '460', near: '140' } } },
      key: expect.stringMatching(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-/),
    });
  });

  it('tries again under the same key after a stumble, and answers anew under another', async () => {
    const round = fresh();
    let fails = 1;
    const asked = serve(() => {
      fails -= 1;
      return fails >= 0 ? json({ title: 'Oops', status: 500 }, 500) : reply(halfRight(), round);
    });
    const { user } = show(round);
    await answer(user, '460', '140');
    expect(await screen.findByText(/Something broke on our side/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Check both' }));
    await screen.findByText('Near pin right, far pin not yet.');
    await user.click(screen.getByRole('button', { name: 'Check both' }));
    await waitFor(() => expect(asked).toHaveLength(3));
    expect(asked[1]?.key).toBe(asked[0]?.key);
    expect(asked[2]?.key).not.toBe(asked[0]?.key);
  });

  it('keeps an answer while the network is away and delivers it, once, when it is back', async () => {
    const round = fresh();
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    const { user } = show(round);
    await answer(user, '460', '140');
    expect(await screen.findByText('Your answer waits on this device.')).toBeVisible();
    expect(screen.getByText(/One answer of yours waits/)).toBeVisible();
    expect(await listWaiting()).toMatchObject([{ personId: ada, title: 'Pins for an oval' }]);

    const asked = serve(() => reply(halfRight(), round));
    window.dispatchEvent(new Event('online'));
    expect(await screen.findByText('Near pin right, far pin not yet.')).toBeVisible();
    window.dispatchEvent(new Event('online'));
    await waitFor(() => expect(screen.queryByText(/waits on this device/)).toBeNull());
    expect(asked).toHaveLength(1);
    expect(await listWaiting()).toEqual([]);
  });

  it('keeps the answer and what was typed when the session has ended', async () => {
    const round = fresh();
    serve(() => json({ title: 'Sign in', status: 401 }, 401));
    const { user } = show(round);
    await answer(user, '230', '140');
    expect(await screen.findByText('Your session has ended; your answer is kept.')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sign in again' })).toHaveAttribute('href', signIn);
    expect(screen.getByRole('textbox', { name: 'Far pin' })).toHaveValue('230');
    expect(window.sessionStorage.getItem(`hornbeam-draft-${round.roundId}`)).toContain('230');
    expect(await listWaiting()).toHaveLength(1);
  });

  it('gives hints one at a time and says what the third one costs', async () => {
    const round = fresh();
    const hints = ['Halve the oval.', 'f = ℓ/2.', 'f = 460 ÷ 2.'];
    let taken = 0;
    serve(() => {
      taken += 1;
      return json({ ...round, hints: hints.slice(0, taken), unaided: taken < 3 });
    });
    const { user } = show(round);
    await user.click(screen.getByRole('button', { name: 'First hint' }));
    expect(await screen.findByText('Halve the oval.')).toBeVisible();
    expect(screen.queryByText(/gives up/)).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Second hint' }));
    expect(await screen.findByText(/third hint gives up this round’s unaided mark/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Third hint' }));
    expect(await screen.findByText('f = 460 ÷ 2.')).toBeVisible();
    expect(screen.queryByRole('button', { name: /hint/ })).toBeNull();
  });

  it('shows the worked solution only after a second press, and then offers new numbers', async () => {
    const round = fresh();
    const next = fresh({ prompt: 'The next question.' });
    const asked = serve((path) =>
      path.endsWith('/round')
        ? json(next)
        : json({ ...round, closed: true, unaided: false, solution: ['f = 460 ÷ 2 = 230 mm'] }),
    );
    const { user } = show(round);
    await user.click(screen.getByRole('button', { name: 'Worked solution' }));
    expect(asked).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Yes, show it and close this round' }));
    expect(await screen.findByText('f = 460 ÷ 2 = 230 mm')).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Check both' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'New numbers' }));
    expect(await screen.findByText('The next question.')).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Far pin' })).toHaveValue('');
  });

  it('shows the question to somebody who is not signed in, and sends nothing', () => {
    const asked = serve(() => json({}));
    show(null, null, fresh());
    expect(screen.getByText('How far from the pencil are the two pins?')).toBeVisible();
    expect(screen.getByText(/answering needs an account/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sign in to answer' })).toHaveAttribute('href', signIn);
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(asked).toEqual([]);
  });

  it('takes one of several options', async () => {
    const options = [
      { id: 'q1', label: 'right' },
      { id: 'q2', label: 'left' },
    ];
    const round = fresh({
      kind: 'choice',
      parts: [{ kind: 'choice', key: 'sense', label: 'Which way?', multiple: false, options }],
    });
    const asked = serve(() => reply(halfRight({ parts: [] }), round));
    const { user } = show(round);
    await user.click(screen.getByRole('button', { name: 'Check' }));
    expect(screen.getByText('Choose one of them.')).toBeVisible();
    await user.click(screen.getByRole('radio', { name: 'left' }));
    await user.click(screen.getByRole('button', { name: 'Check' }));
    await waitFor(() =>
      expect(asked[0]?.body).toMatchObject({ response: { answers: { sense: ['q2'] } } }),
    );
  });
});

describe('answers that wait', () => {
  it('tell another person no more than that they wait', async () => {
    const asked = serve(() => json({}));
    await keepAnswer({
      key: 'k1',
      personId: 'somebody-else',
      exerciseId: 'pins-for-an-oval',
      title: 'Pins for an oval',
      request: { roundId: 'r', response: { answers: { far: '12345' } } },
      givenAt: '2031-03-04T18:00:00.000Z',
    });
    const { container } = show(fresh());
    expect(await screen.findByText('Another person’s answer waits on this device.')).toBeVisible();
    expect(container.textContent).not.toContain('12345');
    expect(asked).toEqual([]);
  });
});
