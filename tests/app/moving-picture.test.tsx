import { act, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { driveAfter } from '@/app/by-motion/_components/moving-drive';
import { MovingPicture } from '@/app/by-motion/_components/moving-picture';
import { pictureOfWay } from '@/app/_components/pictures';
// Fetched when asked for in the browser; here beforehand, so that no test waits for it.
import '@/lib/scene/thumbnail';

const train = pictureOfWay('slower', 'train-of-toothed-wheels');
const pantograph = pictureOfWay('copy', 'pantograph');
let seen: ((entries: { isIntersecting: boolean }[]) => void) | null = null;

beforeEach(() => {
  vi.stubGlobal(
    'IntersectionObserver',
    class {
      constructor(tell: typeof seen) {
        seen = tell;
      }
      observe(): void {}
      disconnect(): void {}
    },
  );
});
afterEach(() => {
  vi.unstubAllGlobals();
});

function show(): HTMLElement {
  const { container } = render(
    <MovingPicture spec={train} name="A small wheel drives a large one">
      <p>as the server drew it</p>
    </MovingPicture>,
  );
  return container;
}

describe('a moving picture', () => {
  it('rests as the server drew it until somebody asks', () => {
    expect(show().querySelector('svg')).toBeNull();
    expect(screen.getByText('as the server drew it')).toBeVisible();
  });

  it('goes on by one step a press', async () => {
    const container = show();
    const user = userEvent.setup();
    const step = screen.getByRole('button', { name: 'Step: A small wheel drives a large one' });
    await user.click(step);
    await waitFor(() => expect(container.querySelector('svg')).not.toBeNull());
    const first = container.querySelector('svg')?.outerHTML;
    await user.click(step);
    await waitFor(() => expect(container.querySelector('svg')?.outerHTML).not.toBe(first));
  });

  it('turns until it is stopped, and stops by itself once out of sight', async () => {
    show();
    const user = userEvent.setup();
    await user.click(screen.getByRole('button', { name: /^Turn/ }));
    expect(screen.getByRole('button', { name: /^Stop/ })).toBeVisible();
    act(() => seen?.([{ isIntersecting: false }]));
    expect(screen.getByRole('button', { name: /^Turn/ })).toBeVisible();
  });

  it('stands where the time says: a turn of the crank in eight seconds', () => {
    expect(driveAfter(train, 1, 8)).toBeCloseTo(1 + 2 * Math.PI, 12);
    expect(driveAfter(pantograph, 0, 2)).toBe(120);
  });
});
