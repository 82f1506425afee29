import type { ClassProgress, LearnerProgress } from '@/lib/schemas/class-progress';

/** How the learners of a class are looked at. */
export interface ProgressChoice {
  /** Part of a name; empty for everybody. */
  readonly name: string;
  readonly state: 'all' | 'not begun' | 'something left' | 'late' | 'done';
  readonly order: 'name' | 'least done' | 'most done';
  /** Counted from 0. */
  readonly page: number;
}

/** How it is looked at before anything is chosen. */
export const firstChoice: ProgressChoice = {
  name: '',
  state: 'all',
  order: 'name',
  page: 0,
};

/** Learners on one page of the table. */
export const learnersAPage = 25;

/** What is left of a class's progress under a choice. */
export interface ProgressView {
  readonly learners: readonly LearnerProgress[];
  /** How many learners fit the choice, on all pages. */
  readonly fitting: number;
  readonly pages: number;
  readonly page: number;
}

/**
 * The learners that fit a choice, in its order, one page of them. `lessonId` narrows what counts as
 * begun, left, late and done to one lesson.
 */
export function viewProgress(
  progress: Pick<ClassProgress, 'learners'>,
  choice: ProgressChoice,
  lessonId: string | null,
): ProgressView {
  const wanted = choice.name.trim().toLocaleLowerCase();
  const fitting = progress.learners

    .filter(({ name }) => name.toLocaleLowerCase().includes(wanted))
    .filter((learner) => fits(learner, choice.state, lessonId));
  const pages = Math.max(1, Math.ceil(fitting.length / learnersAPage));
  const page = Math.min(choice.page, pages - 1);
  const shown = inOrder(fitting, choice, lessonId).slice(
    page * learnersAPage,
    (page + 1) * learnersAPage,
  );
  return { learners: shown, fitting: fitting.length, pages, page };
}

/** What is set to a learner. */
function cellsOf({ lessons }: LearnerProgress, lessonId: string | null) {
  return lessons
    .filter((lesson) => lessonId === null || lesson.lessonId === lessonId)
    .flatMap(({ exercises }) => exercises)
    .filter(({ mark }) => mark !== 'not set');
}

function fits(
  learner: LearnerProgress,
  state: ProgressChoice['state'],
  lessonId: string | null,
): boolean {
  const cells = cellsOf(learner, lessonId);
  switch (state) {
    case 'all':
      return true;
    case 'not begun':
      return cells.length > 0 && cells.every(({ mark }) => mark === 'none');
    case 'something left':
      return cells.some(({ mark }) => mark !== 'right');
    case 'late':
      return cells.some(({ late }) => late);
    case 'done':
      return cells.length > 0 && cells.every(({ mark }) => mark === 'right');
  }
}

function inOrder(
  learners: readonly LearnerProgress[],
  { order }: ProgressChoice,
  lessonId: string | null,
): readonly LearnerProgress[] {
  if (order === 'name') return learners;
  const done = (learner: LearnerProgress) =>
    cellsOf(learner, lessonId).filter(({ mark }) => mark === 'right').length;
  const sign = order === 'least done' ? 1 : -1;
  return [...learners].sort((one, other) => sign * (done(one) - done(other)));
}
