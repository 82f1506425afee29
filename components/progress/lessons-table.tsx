import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { ClassProgress, LearnerProgress, LessonColumn } from '@/lib/schemas/class-progress';
import { LearnerLink } from './learner-link';
import { PegRail } from './peg-rail';
import { sayDue } from './say-due';

interface LessonsTableProps {
  readonly progress: ClassProgress;
  /** Opens one lesson to its exercises. */
  readonly onOpen: (lessonId: string) => void;
}

/** Learners × lessons: the lesson's peg rail in each cell, and how much of what was set is left. */
export function LessonsTable({ progress, onOpen }: LessonsTableProps) {
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
              <LearnerLink classId={progress.classId} learner={learner} />
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
  const begun = cell.exercises.some((exercise) => exercise.attempts > 0);
  const left = cell.exercises.filter((exercise) => exercise.mark !== 'right').length;
  return (
    <span className="flex flex-wrap items-center gap-x-3">
      <PegRail pegs={cell.pegs} />
      {begun ? (
        <span className="text-[0.9375rem] whitespace-nowrap text-pencil">
          {left === 0 ? 'all right' : `${left} of ${cell.exercises.length} left`}
        </span>
      ) : (
        <span className="text-[0.9375rem] font-semibold whitespace-nowrap text-madder">
          not begun
        </span>
      )}
    </span>
  );
}
