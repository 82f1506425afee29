import clsx from 'clsx';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type {
  ClassProgress,
  ExerciseCell,
  LearnerProgress,
  LessonColumn,
} from '@/lib/schemas/class-progress';
import { LearnerLink } from './learner-link';
import { PegRail } from './peg-rail';
import { sayDue } from './say-due';

interface LessonsTableProps {
  readonly progress: ClassProgress;
  readonly names: 'shown' | 'hidden';
  /** Opens one lesson to its exercises. */
  readonly onOpen: (lessonId: string) => void;
}

/** Learners × lessons: the lesson's peg rail in each cell, and how much of what was set is left. */
export function LessonsTable({ progress, names, onOpen }: LessonsTableProps) {
  return (
    <Table caption="Learners by lesson">
      <HeadRow>
        <ColumnName className="sticky left-0 bg-board">Learner</ColumnName>
        {progress.lessons.map((lesson) => (
          <ColumnName key={lesson.lessonId} className="min-w-48 align-top">
            <button
              type="button"
              onClick={() => onOpen(lesson.lessonId)}
              className="link min-h-11 text-left font-semibold"
            >
              {lesson.title}
              <span className="sr-only">: show its exercises</span>
            </button>
            <span className="block font-normal text-pencil">
              {sayDue(lesson.dueAt, progress.timeZone)}
            </span>
          </ColumnName>
        ))}
      </HeadRow>
      <tbody>
        {progress.learners.map((learner) => (
          <Row key={learner.learnerId}>
            <RowName className="sticky left-0 bg-paper">
              <LearnerLink
                classId={progress.classId}
                learner={learner}
                hidden={names === 'hidden'}
              />
            </RowName>
            {progress.lessons.map((lesson) => (
              <Cell key={lesson.lessonId}>
                <LessonCell learner={learner} lesson={lesson} />
              </Cell>
            ))}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}

function LessonCell({
  learner,
  lesson,
}: Readonly<{ learner: LearnerProgress; lesson: LessonColumn }>) {
  const cell = learner.lessons.find((one) => one.lessonId === lesson.lessonId);
  if (!cell) return null;
  return (
    <span className="flex flex-wrap items-center gap-x-3">
      <PegRail pegs={cell.pegs} />
      <WhatIsLeft exercises={cell.exercises.filter(({ mark }) => mark !== 'not set')} />
    </span>
  );
}

/** How much is left of what is set to a learner. */
function WhatIsLeft({ exercises }: Readonly<{ exercises: readonly ExerciseCell[] }>) {
  const said = (words: string, look = 'text-pencil') => (
    <span className={clsx('text-[0.9375rem] whitespace-nowrap', look)}>{words}</span>
  );
  if (exercises.length === 0) return said('not set');
  if (exercises.every(({ attempts }) => attempts === 0)) {
    return said('not begun', 'font-semibold text-madder');
  }
  const left = exercises.filter(({ mark }) => mark !== 'right').length;
  return said(left === 0 ? 'all right' : `${left} of ${exercises.length} left`);
}
