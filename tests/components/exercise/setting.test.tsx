import 'fake-indexeddb/auto';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useEffect, useState } from 'react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Exercise } from '@/components/exercise/exercise';
import { QueryProvider } from '@/lib/browser/query-provider';
import type { SettingValues } from '@/lib/scene/bench-spec';
import { ada, halfRight, pinsRound, reply, serve } from './fixtures';

interface StandIn {
  readonly spec: { readonly farPin: number };
  readonly onSettingChange?: (values: SettingValues) => void;
}

// Like the real bench, it tells what it is set to at the start and whenever it changes.
vi.mock('@/components/bench/bench', () => ({
  Bench: function Bench({ spec, onSettingChange }: StandIn) {
    const [far, setFar] = useState(spec.farPin);
    useEffect(() => onSettingChange?.({ farPin: far }), [far, onSettingChange]);
    return (
      <button type="button" onClick={() => setFar(far + 10)}>
        far pin at {far}
      </button>
    );
  },
}));

const round = pinsRound({
  roundId: '75000000-0000-4000-8000-000000000001',
  exerciseId: 'set-the-pins',
  kind: 'setting',
  figure: { bench: 'trammel', farPin: 100 } as { bench: string },
  parts: [
    {
      kind: 'setting',
      key: 'pins',
      label: 'Set the pins',
      controls: ['farPin'],
      criteria: ['The far pin', 'The near pin'],
    },
  ],
});

function show() {
  const entry = {
    id: 'set-the-pins',
    number: 6,
    title: 'Set the pins',
    pegs: [],
    round,
    sample: null,
  };
  return render(
    <QueryProvider>
      <Exercise entry={entry} personId={ada} units="metric" signInHref="/sign-in" />
    </QueryProvider>,
  );
}

beforeEach(() => window.sessionStorage.clear());
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('a setting exercise', { timeout: 60_000 }, () => {
  it('sends what the learner has set, not how the bench was found, and keeps it through a reload', async () => {
    const asked = serve(() => reply(halfRight({ parts: [] }), round));
    const user = userEvent.setup();
    const first = show();
    expect(screen.getByText('The near pin')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Check' }));
    expect(screen.getByText(/The bench still stands as you found it/)).toBeVisible();
    expect(asked).toEqual([]);

    await user.click(screen.getByRole('button', { name: 'far pin at 100' }));
    await user.click(screen.getByRole('button', { name: 'far pin at 110' }));
    first.unmount();
    show();
    expect(screen.getByRole('button', { name: 'far pin at 120' })).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Check' }));
    await waitFor(() =>
      expect(asked[0]?.body).toMatchObject({ response: { answers: { pins: { farPin: 120 } } } }),
    );
  });
});
