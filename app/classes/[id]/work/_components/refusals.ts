import type { AssignmentFault } from '@/lib/data/assignments';
import { notYours } from '../../_components/not-yours';
import type { AssignmentState } from './assignment-state';

/** What is said of each fault, at the field where it is mended. */
const faults: Readonly<Record<AssignmentFault, readonly [string, string]>> = {
  'nothing chosen': ['lesson', 'Choose a lesson, or a single exercise of one.'],
  'nobody chosen': ['learner', 'Choose a learner who is in the class, or everybody.'],
  'due in the past': ['dueOn', 'That moment has passed; choose a later one.'],
  'due before it opens': ['dueOn', 'That is before it opens; choose a later one.'],
};

/** What a form is told when its work was not set, or not changed. */
export function refusalOf(
  outcome: AssignmentFault | 'no such class' | 'no such work',
): AssignmentState {
  if (outcome === 'no such class' || outcome === 'no such work') return notYours;
  const [field, sentence] = faults[outcome];
  return {
    outcome: 'refused',
    message: 'Not saved yet. What you typed is still here.',
    errors: { [field]: sentence },
  };
}
