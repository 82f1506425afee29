'use client';

import clsx from 'clsx';
import { useSearchParams } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Loading } from '@/components/ui/loading';
import { Notice } from '@/components/ui/notice';
import { Empty } from '@/components/ui/panel';
import { sentenceFor } from '@/lib/browser/problem';
import { useClassProgress } from '@/lib/browser/use-class-progress';
import type { ClassProgress as Progress, LessonColumn } from '@/lib/schemas/class-progress';
import { ExercisesTable } from './exercises-table';
import { LessonsTable } from './lessons-table';
import { ProgressControls } from './progress-controls';
import { firstChoice, viewProgress } from './progress-view';

/** The lesson opened, kept in the address so that it can be handed on and gone back from. */
function openLesson(lessonId: string | null): void {
  const asked = new URLSearchParams(window.location.search);
  if (lessonId === null) asked.delete('lesson');
  else asked.set('lesson', lessonId);
  window.history.pushState(null, '', `?${asked}`);
}

interface ClassProgressProps {
  readonly classId: string;
  /** How it stood when the page was made; without it the page asks first. */
  readonly initial?: Progress | null;
  /** Hidden for the projector: numbers stand for names, and nothing leads to anybody. */
  readonly names?: 'shown' | 'hidden';
}

/** A class's progress, kept up to date by the page: all lessons, or one opened to its exercises. */
export function ClassProgress({ classId, initial = null, names = 'shown' }: ClassProgressProps) {
  const { data, error, refetch } = useClassProgress(classId, names, initial);
  if (data) return <ProgressTables progress={data} names={names} />;
  if (!error) return <Loading lines={6} />;
  return (
    <>
      <Notice tone="wrong" role="alert" title="The progress could not be fetched.">
        {sentenceFor(error)}
      </Notice>
      <Button variant="secondary" onClick={() => void refetch()}>
        Try again
      </Button>
    </>
  );
}

interface ProgressTablesProps {
  readonly progress: Progress;
  readonly names: 'shown' | 'hidden';
}

function ProgressTables({ progress, names }: ProgressTablesProps) {
  const opened = useSearchParams().get('lesson');
  const lesson = progress.lessons.find((one) => one.lessonId === opened);
  if (progress.lessons.length === 0) {
    return (
      <Empty title="Nothing is set yet">
        Set a lesson under Work, and everybody’s pegs for it appear here.
      </Empty>
    );
  }
  if (progress.learners.length === 0) {
    return (
      <Empty title="Nobody learns in this class yet">
        Once somebody is in it, their pegs appear here.
      </Empty>
    );
  }
  return <ChosenProgress progress={progress} names={names} lesson={lesson} />;
}

/** The table of what is chosen, under what chooses it. */
function ChosenProgress({
  progress,
  names,
  lesson,
}: ProgressTablesProps & { readonly lesson: LessonColumn | undefined }) {
  const [choice, setChoice] = useState(firstChoice);
  const lessonId = lesson?.lessonId ?? null;
  const view = viewProgress(progress, choice, lessonId);
  const shown = { ...progress, learners: [...view.learners] };
  return (
    <>
      <LessonChoice progress={progress} opened={lessonId} />
      <ProgressControls
        classId={progress.classId}
        names={names}
        lessonId={lessonId}
        choice={choice}
        onChoose={setChoice}
        view={view}
      />
      {view.fitting === 0 ? (
        <Empty title="Nobody is like that">Choose otherwise, and they are here again.</Empty>
      ) : lesson ? (
        <ExercisesTable progress={shown} names={names} lesson={lesson} />
      ) : (
        <LessonsTable progress={shown} names={names} onOpen={openLesson} />
      )}
    </>
  );
}

interface LessonChoiceProps {
  readonly progress: Progress;
  readonly opened: string | null;
}

function LessonChoice({ progress, opened }: LessonChoiceProps) {
  const choices = [
    { id: null, title: 'All lessons' },
    ...progress.lessons.map(({ lessonId, title }) => ({ id: lessonId, title })),
  ];
  return (
    <div role="group" aria-label="What is shown" className="mb-3 flex flex-wrap gap-2 print:hidden">
      {choices.map(({ id, title }) => (
        <button
          key={title}
          type="button"
          aria-pressed={id === opened}
          onClick={() => openLesson(id)}
          className={clsx(
            'min-h-11 rounded border px-3.5 text-base',
            id === opened
              ? 'border-ink bg-board font-semibold text-ink'
              : 'border-pencil text-pencil hover:text-ink',
          )}
        >
          {title}
        </button>
      ))}
    </div>
  );
}
