import { describe, expect, it } from 'vitest';
import { firstChoice, learnersAPage, viewProgress } from '@/components/progress/progress-view';
import type { LearnerProgress, Mark } from '@/lib/schemas/class-progress';

function learner(name: string, marks: readonly Mark[], late = false): LearnerProgress {
  return {
    learnerId: `id-${[...name].reverse().join('')}`,
    name,
    lessons: marks.map((mark, place) => ({
      lessonId: `lesson-${place}`,
      pegs: [],
      exercises: [{ exerciseId: 'e', mark, attempts: 1, attemptId: null, late, overridden: false }],
    })),
  };
}

const learners = [
  learner('Agnes Pell', ['right', 'right']),
  learner('Bram Okafor', ['right', 'wrong'], true),
  learner('Catrin Hughes', ['none', 'none']),
];
const names = (changes: Partial<typeof firstChoice>, lessonId: string | null = null) =>
  viewProgress({ learners }, { ...firstChoice, ...changes }, lessonId).learners.map(
    ({ name }) => name.split(' ')[0],
  );

describe('looking at the progress of a class', () => {
  it('finds learners by a part of their name', () => {
    expect(names({ name: ' OKA' })).toEqual(['Bram']);
    expect(names({ name: 'nobody' })).toEqual([]);
  });

  it('shows those of one state, of all lessons or of the one that is open', () => {
    expect(names({ state: 'done' })).toEqual(['Agnes']);
    expect(names({ state: 'done' }, 'lesson-0')).toEqual(['Agnes', 'Bram']);
    expect(names({ state: 'something left' })).toEqual(['Bram', 'Catrin']);
    expect(names({ state: 'not begun' })).toEqual(['Catrin']);
    expect(names({ state: 'late' })).toEqual(['Bram']);
  });

  it('puts them in order by what is done', () => {
    expect(names({ order: 'least done' })).toEqual(['Catrin', 'Bram', 'Agnes']);
    expect(names({ order: 'most done' })).toEqual(['Agnes', 'Bram', 'Catrin']);
  });

  it('leaves out what is not set to somebody: it is neither left nor done', () => {
    const some = [
      learner('Dario Benini', ['right', 'not set']),
      learner('Elif Aydin', ['not set']),
    ];
    const shown = (state: 'done' | 'something left' | 'not begun') =>
      viewProgress({ learners: some }, { ...firstChoice, state }, null).learners.map(
        ({ name }) => name,
      );
    expect(shown('done')).toEqual(['Dario Benini']);
    expect(shown('something left')).toEqual([]);
    expect(shown('not begun')).toEqual([]);
  });

  it('turns pages, and stays on the last when fewer are left', () => {
    const many = Array.from({ length: 60 }, (_, n) => learner(`Learner ${n}`, ['none']));
    const view = viewProgress({ learners: many }, { ...firstChoice, page: 9 }, null);
    expect(view).toMatchObject({ fitting: 60, pages: 3, page: 2 });
    expect(view.learners).toHaveLength(60 - 2 * learnersAPage);
  });
});
