import Link from 'next/link';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { ClassProgress, ExerciseCell, LessonColumn } from '@/lib/schemas/class-progress';
import { LearnerLink } from './learner-link';
import { MarkSign, markWord } from './mark';

interface ExercisesTableProps {
  readonly progress: ClassProgress;
  readonly names: 'shown' | 'hidden';
  readonly lesson: LessonColumn;
}

/** Learners × exercises of one lesson: how each went, each leading to the attempt itself. */
export function ExercisesTable({ progress, names, lesson }: ExercisesTableProps) {
  return (
    <Table caption={`Learners by exercise of ${lesson.title}`}>
      <HeadRow>
        <ColumnName className="sticky left-0 bg-board">Learner</ColumnName>
        {lesson.exercises.map((exercise) => (
          <ColumnName key={exercise.exerciseId} className="min-w-32 align-bottom leading-tight">
            {exercise.title}
          </ColumnName>
        ))}
      </HeadRow>
      <tbody>
        {progress.learners.map((learner) => {
          const cell = learner.lessons.find((one) => one.lessonId === lesson.lessonId);
          return (
            <Row key={learner.learnerId}>
              <RowName className="sticky left-0 bg-paper">
                <LearnerLink
                  classId={progress.classId}
                  learner={learner}
                  hidden={names === 'hidden'}
                />
              </RowName>
              {lesson.exercises.map((exercise) => (
                <Cell key={exercise.exerciseId}>
                  <ExerciseMark
                    classId={progress.classId}
                    cell={cell?.exercises.find((one) => one.exerciseId === exercise.exerciseId)}
                    about={`${learner.name}, ${exercise.title}`}
                  />
                </Cell>
              ))}
            </Row>
          );
        })}
      </tbody>
    </Table>
  );
}

interface ExerciseMarkProps {
  readonly classId: string;
  readonly cell: ExerciseCell | undefined;
  /** Whose mark it is and for what; the link says it to screen readers. */
  readonly about: string;
}

function ExerciseMark({ classId, cell, about }: ExerciseMarkProps) {
  if (!cell || cell.attempts === 0) return <MarkSign mark={cell?.mark ?? 'not set'} />;
  const tries = cell.attempts === 1 ? '1 try' : `${cell.attempts} tries`;
  const said = (
    <>
      <MarkSign mark={cell.mark} />
      <span className="block pl-5 text-[0.9375rem] text-pencil">
        {tries}
        {cell.late ? <span className="font-semibold text-madder"> · late</span> : null}
        {cell.overridden ? <span className="text-plum"> · changed</span> : null}
      </span>
    </>
  );
  if (cell.attemptId === null) return said;
  return (
    <Link
      href={`/classes/${classId}/attempts/${cell.attemptId}`}
      prefetch={false}
      aria-label={`${about}: ${markWord(cell.mark)}, ${tries}${cell.late ? ', late' : ''}${cell.overridden ? ', marked otherwise by an instructor' : ''}`}
      className="link-target flex-col !items-start leading-tight hover:underline"
    >
      {said}
    </Link>
  );
}
