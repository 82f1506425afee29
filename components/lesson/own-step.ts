import { matches, withinPercent } from '@/lib/marking/tolerance';
import type { Field } from '@/lib/quantities/field';
import { readQuantity } from '@/lib/quantities/read';

/** What a step of a worked example comes to, where that is one quantity. */
export interface StepResult {
  readonly value: number;
  readonly field: Field;
}

/** How a learner's own step compares with the one worked out. */
export type Compared =
  | { readonly outcome: 'none' | 'agrees' | 'differs' }
  | { readonly outcome: 'refused'; readonly message: string };

/** As near as an exercise asks for. */
const tolerance = withinPercent(0.5);

/** Reads a step as an answer is read, and compares it; what has no one number is for the eye. */
export function compareStep(own: string, result: StepResult | undefined): Compared {
  if (own.trim() === '' || result === undefined) return { outcome: 'none' };
  const reading = readQuantity(own, result.field);
  if (!reading.ok) return { outcome: 'refused', message: reading.message };
  return { outcome: matches(tolerance, reading.value, result.value) ? 'agrees' : 'differs' };
}
