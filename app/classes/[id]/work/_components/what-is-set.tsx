import { Choices, FieldGroup } from '@/components/ui/choices';
import type { AssignmentValues, FormChoices } from './assignment-state';

interface WhatIsSetProps {
  readonly choices: FormChoices;
  readonly values: AssignmentValues;
  readonly error: string | undefined;
}

const forWhom = [
  { value: 'everybody', label: 'Everybody in the class, those who join later among them' },
  { value: 'chosen', label: 'Only those chosen here' },
];

/** Which lessons and single exercises, and for whom. */
export function WhatIsSet({ choices, values, error }: WhatIsSetProps) {
  const lessons = values.lesson.split(' ');
  const exercises = values.exercise.split(' ');
  return (
    <>
      <FieldGroup legend="What" error={error}>
        {choices.lessons.map((lesson) => (
          <div key={lesson.lessonId} className="border-b border-rule last:border-b-0">
            <Choices
              name="lesson"
              kind="several"
              chosen={lessons}
              choices={[
                {
                  value: lesson.lessonId,
                  label: <span className="font-semibold">{lesson.title}</span>,
                  hint: `The whole lesson: ${lesson.exercises.length} exercises`,
                },
              ]}
            />
            <details
              className="mb-2 pl-8"
              open={lesson.exercises.some(({ exerciseId }) => exercises.includes(exerciseId))}
            >
              <summary className="flex min-h-11 items-center text-chalk underline underline-offset-3">
                or single exercises of it
              </summary>
              <Choices
                name="exercise"
                kind="several"
                chosen={exercises}
                choices={lesson.exercises.map(({ exerciseId, title }) => ({
                  value: exerciseId,
                  label: title,
                }))}
              />
            </details>
          </div>
        ))}
      </FieldGroup>
      <FieldGroup legend="For whom">
        <Choices name="for" kind="one" choices={forWhom} chosen={[values.for]} />
        <details className="pl-8" open={values.for === 'chosen'}>
          <summary className="flex min-h-11 items-center text-chalk underline underline-offset-3">
            choose among {choices.learners.length}{' '}
            {choices.learners.length === 1 ? 'learner' : 'learners'}
          </summary>
          <div className="max-h-80 overflow-y-auto">
            <Choices
              name="learner"
              kind="several"
              chosen={values.learner.split(' ')}
              choices={choices.learners.map(({ learnerId, name }) => ({
                value: learnerId,
                label: name,
              }))}
            />
          </div>
        </details>
      </FieldGroup>
    </>
  );
}
