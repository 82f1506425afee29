import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ClassProgress } from '@/components/progress/class-progress';
import { QueryProvider } from '@/lib/browser/query-provider';
import type { ClassProgress as Progress } from '@/lib/schemas/class-progress';

const { search } = vi.hoisted(() => ({ search: { current: '' } }));
vi.mock('next/navigation', () => ({ useSearchParams: () => new URLSearchParams(search.current) }));

const progress: Progress = {
  classId: 'c1',
  name: 'Tuesday evening',
  timeZone: 'Europe/London',
  lessons: [
    {
      lessonId: 'pantograph',
      title: 'The pantograph',
      dueAt: '2026-12-08T18:30:00Z',
      exercises: [
        { exerciseId: 'copy-scale', title: 'How large the copy comes' },
        { exerciseId: 'drill-the-bars', title: 'Drill the bars' },
      ],
    },
  ],
  learners: [
    {
      learnerId: 'l1',
      name: 'Agnes Pell',
      lessons: [
        {
          lessonId: 'pantograph',
          pegs: [{ skill: 'pantograph.scale', name: 'Scale', state: 'started' }],
          exercises: [
            {
              exerciseId: 'copy-scale',
              mark: 'right',
              attempts: 3,
              attemptId: 'a1',
              late: true,
              overridden: false,
            },
            {
              exerciseId: 'drill-the-bars',
              mark: 'none',
              attempts: 0,
              attemptId: null,
              late: false,
              overridden: false,
            },
          ],
        },
      ],
    },
    {
      learnerId: 'l2',
      name: 'Lorcan Daly',
      lessons: [
        {
          lessonId: 'pantograph',
          pegs: [{ skill: 'pantograph.scale', name: 'Scale', state: 'open' }],
          exercises: ['copy-scale', 'drill-the-bars'].map((exerciseId) => ({
            exerciseId,
            mark: 'none' as const,
            attempts: 0,
            attemptId: null,
            late: false,
            overridden: false,
          })),
        },
      ],
    },
  ],
};

function show(names: 'shown' | 'hidden' = 'shown'): void {
  render(
    <QueryProvider>
      <ClassProgress classId="c1" names={names} />
    </QueryProvider>,
  );
}

function answerWith(status: number, body: unknown): void {
  vi.stubGlobal(
    'fetch',
    vi.fn(() => Promise.resolve(new Response(JSON.stringify(body), { status }))),
  );
}

beforeEach(() => {
  search.current = '';
});
afterEach(() => {
  vi.unstubAllGlobals();
});

const rowOf = async (name: RegExp) => (await screen.findByRole('row', { name })) as HTMLElement;

describe('the progress of a class', () => {
  it('is asked for once, from the class’s own address', async () => {
    answerWith(200, progress);
    show();
    await rowOf(/Agnes Pell/);
    expect(vi.mocked(fetch).mock.calls.map(([path]) => path)).toEqual(['/api/classes/c1/progress']);
  });

  it('shows each learner’s pegs by lesson, what is left and who has not begun', async () => {
    answerWith(200, progress);
    show();
    const agnes = within(await rowOf(/Agnes Pell/));
    expect(agnes.getByRole('img')).toHaveAccessibleName(/0 of 1 skill home, one started/);
    expect(agnes.getByText('1 of 2 left')).toBeVisible();
    expect(within(await rowOf(/Lorcan Daly/)).getByText('not begun')).toBeVisible();
    expect(screen.getByText('due Tue 8 Dec, 18:30')).toBeVisible();
  });

  it('opens a lesson to its exercises, in the address', async () => {
    answerWith(200, progress);
    show();
    await rowOf(/Agnes Pell/);
    await userEvent.setup().click(screen.getByRole('button', { name: 'The pantograph' }));
    expect(window.location.search).toBe('?lesson=pantograph');
  });

  it('leads from a mark to the attempt, told in words', async () => {
    search.current = 'lesson=pantograph';
    answerWith(200, progress);
    show();
    const link = await screen.findByRole('link', {
      name: 'Agnes Pell, How large the copy comes: right, 3 tries, late',
    });
    expect(link).toHaveAttribute('href', '/classes/c1/attempts/a1');
    expect(within(await rowOf(/Lorcan Daly/)).getAllByText('not begun')).toHaveLength(2);
  });

  it('leads to nobody on the projector, and asks for itself without names', async () => {
    search.current = 'names=hidden&lesson=pantograph';
    const numbered = progress.learners.map(({ lessons }, place) => ({
      learnerId: String(place + 1),
      name: `Learner ${place + 1}`,
      lessons: lessons.map((lesson) => ({
        ...lesson,
        exercises: lesson.exercises.map((cell) => ({ ...cell, attemptId: null })),
      })),
    }));
    answerWith(200, { ...progress, learners: numbered });
    show('hidden');
    const first = within(await rowOf(/Learner 1/));
    expect(first.getByText(/3 tries/)).toBeVisible();
    expect(screen.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual([
      '/classes/c1?lesson=pantograph',
    ]);
    expect(screen.queryByRole('searchbox')).toBeNull();
    const [[asked]] = vi.mocked(fetch).mock.calls as [[string]];
    expect(asked).toBe('/api/classes/c1/progress?names=hidden');
  });

  it('says of work for others that it is not set', async () => {
    const others = progress.learners.map((learner) => ({
      ...learner,
      lessons: learner.lessons.map((lesson) => ({
        ...lesson,
        exercises: lesson.exercises.map((cell) =>
          learner.learnerId === 'l2' ? { ...cell, mark: 'not set' as const } : cell,
        ),
      })),
    }));
    answerWith(200, { ...progress, learners: others });
    show();
    expect(within(await rowOf(/Lorcan Daly/)).getByText('not set')).toBeVisible();
    expect(within(await rowOf(/Lorcan Daly/)).queryByText('not begun')).toBeNull();
  });

  it('says what to do when nothing is set and when nobody is in it', async () => {
    answerWith(200, { ...progress, lessons: [] });
    show();
    expect(await screen.findByText('Nothing is set yet')).toBeVisible();
  });

  it('says what went wrong and offers to try again', async () => {
    answerWith(404, { title: 'Not found', status: 404 });
    show();
    expect(await screen.findByRole('alert')).toHaveTextContent('not yours to see');
    answerWith(200, progress);
    await userEvent.setup().click(screen.getByRole('button', { name: 'Try again' }));
    expect(await rowOf(/Agnes Pell/)).toBeVisible();
  });
});
