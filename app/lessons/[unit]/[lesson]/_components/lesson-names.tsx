import type { MDXComponents } from 'mdx/types';
import type { ReactNode } from 'react';
import { Exercise } from '@/components/exercise/exercise';
import { hiddenSteps } from '@/components/lesson/fading';
import { LessonBench } from '@/components/lesson/lesson-bench';
import { LessonPegs } from '@/components/lesson/lesson-pegs';
import { Prediction } from '@/components/lesson/prediction';
import { Hook } from '@/components/lesson/section';
import { Given, Value, type GivenProps } from '@/components/lesson/value';
import { WorkedExample } from '@/components/lesson/worked-example';
import { lessonFigures } from '@/content/exercises/figures';
import { lessonBench } from '@/content/lessons/benches';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { LessonWork } from './lesson-work';

/** The reader, as far as a lesson's text needs to know. */
export interface Reader {
  readonly personId: string | null;
  readonly units: UnitSystem;
  readonly signInHref: string;
}

/** The names in a lesson's text that depend on the lesson and its reader. */
export function lessonNames(lessonId: string, work: LessonWork, reader: Reader): MDXComponents {
  const { personId, units } = reader;
  const { values, worked } = lessonFigures(lessonId, units, seedOf(personId));
  const bench = lessonBench(lessonId, units);
  const numbers = new Map(work.exercises.map((exercise, index) => [exercise.id, index]));
  const known = (id: string) => work.exercises.find((exercise) => exercise.id === id);

  return {
    Hook: ({ id, children }: { id: string; children: ReactNode }) => (
      <>
        <Hook id={id}>{children}</Hook>
        {personId === null ? null : (
          <div className="mt-4">
            <LessonPegs personId={personId} pegs={work.pegs} />
          </div>
        )}
      </>
    ),
    Value: ({ of }: { of: string }) => <Value of={of} values={values} />,
    Given: (given: GivenProps) => <Given {...given} units={units} />,
    LessonBench: ({ title }: { title: string }) => (
      <LessonBench key={units} spec={bench} title={title} />
    ),
    WorkedExample: () => (
      <WorkedExample
        key={units}
        worked={worked}
        hidden={hiddenSteps(work.pegs, worked.steps.length)}
      />
    ),
    Prediction: ({ id, children }: { id: string; children: ReactNode }) => {
      const { round = null, sample = null } = known(id) ?? {};
      return (
        <Prediction id={id} personId={personId} units={units} round={round} sample={sample}>
          {children}
        </Prediction>
      );
    },
    Exercise: ({ id }: { id: string }) => {
      const exercise = known(id);
      if (exercise === undefined) return null;
      const pegs = work.pegs.filter((peg) => exercise.skills.includes(peg.skill));
      const { title, round, sample } = exercise;
      const entry = { id, title, round, sample, pegs, number: numbers.get(id) ?? 0 };
      return <Exercise entry={entry} {...reader} />;
    },
  };
}

/** Each reader keeps the numbers of their worked example. */
function seedOf(personId: string | null): number {
  return personId === null ? 1 : Number.parseInt(personId.slice(0, 7), 16);
}
