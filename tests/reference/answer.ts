import { beltAnswers } from './answers/belt';
import { camAnswers } from './answers/cam';
import { couplingAnswers } from './answers/coupling';
import { gearAnswers } from './answers/gear';
import { intermittentAnswers } from './answers/intermittent';
import { linkageAnswers } from './answers/linkage';
import { timberAnswers } from './answers/timber';
import { trainAnswers } from './answers/train';
import type { Answers, Family, Inputs } from './inputs';

/** One file a family of the library; each converts units and names, and computes nothing. */
const families: readonly Family[] = [
  linkageAnswers,
  camAnswers,
  gearAnswers,
  trainAnswers,
  beltAnswers,
  intermittentAnswers,
  couplingAnswers,
  timberAnswers,
];

const kinds = new Map(families.flatMap((family) => Object.entries(family)));

/** Whether the library answers this kind of case. */
export function isBuilt(kind: string): boolean {
  return kinds.has(kind);
}

/** What the library answers to one case: at least the keys that the case expects. */
export function answer(kind: string, inputs: Inputs): Answers {
  const asked = kinds.get(kind);
  if (!asked) throw new RangeError(`answer: the kind ${kind} is not built`);
  return asked(inputs);
}
