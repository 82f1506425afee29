import type { FormState } from '@/components/ui/form-state';

/** The fields of the form, as text; what may be chosen several times stands with blanks between. */
export type AssignmentValues = Readonly<
  Record<
    | 'lesson'
    | 'exercise'
    | 'for'
    | 'learner'
    | 'opensOn'
    | 'opensTime'
    | 'dueOn'
    | 'dueTime'
    | 'attemptsAllowed'
    | 'counting'
    | 'lateWork'
    | 'note'
    | 'tell'
    | 'version',
    string
  >
>;

/** One thing in which two versions of the same work differ. */
export interface Difference {
  readonly what: string;
  readonly yours: string;
  readonly theirs: string;
}

/** What the form is told, with both versions when two people changed the same work. */
export interface AssignmentState extends FormState {
  readonly version?: number;
  readonly differences?: readonly Difference[];
}

/** What there is to choose from. */
export interface FormChoices {
  readonly timeZone: string;
  readonly lessons: readonly {
    readonly lessonId: string;
    readonly title: string;
    readonly exercises: readonly { readonly exerciseId: string; readonly title: string }[];
  }[];
  readonly learners: readonly { readonly learnerId: string; readonly name: string }[];
}
