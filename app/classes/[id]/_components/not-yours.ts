import type { FormState } from '@/components/ui/form-state';

/** Missing, put away and not yours look alike. */
export const notYours: FormState = {
  outcome: 'refused',
  message: 'Not done: this is not here any more, is put away, or is not yours to change.',
};
