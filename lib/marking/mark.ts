import type { Earlier, ExerciseDefinition, Part, Variant } from './definition';
import { isCurrent } from './draw';
import { markChoice } from './mark-choice';
import { markNumber } from './mark-number';
import { markSetting } from './mark-setting';
import type { LearnersResponse, Marking, Refused, Verdict, WeighedPart } from './marking';
import { trueValues } from './values';

/**
 * Marks a response: part by part and criterion by criterion, with the slips recognised, partial
 * credit, and later parts followed through from the learner's own earlier values. Pure: the same
 * three arguments always give the same marking.
 * Refuses what cannot be read, part by part, with what is expected; that is no attempt.
 * Throws a `RangeError` when the variant belongs to another exercise or version.
 */
export function markResponse(
  definition: ExerciseDefinition,
  variant: Variant,
  response: LearnersResponse,
): Marking | Refused {
  if (!isCurrent(definition, variant)) {
    throw new RangeError(`markResponse: the variant is not one of ${definition.id}`);
  }
  const truth = trueValues(definition, variant);
  let own: Earlier = truth;
  const errors: { key: string; message: string }[] = [];
  const parts: WeighedPart[] = [];
  for (const part of definition.parts) {
    const result = markPart(part, variant, response, truth, own);
    if ('refused' in result) errors.push({ key: part.key, message: result.refused });
    else {
      parts.push(...result.marked);
      own = result.own === undefined ? own : { ...own, [part.key]: result.own };
    }
  }
  return errors.length > 0 ? { outcome: 'refused', errors } : conclude(definition, variant, parts);
}

type Result =
  { readonly marked: readonly WeighedPart[]; readonly own?: number } | { readonly refused: string };

function markPart(
  part: Part,
  variant: Variant,
  { answers }: LearnersResponse,
  truth: Earlier,
  own: Earlier,
): Result {
  const answer = Object.hasOwn(answers, part.key) ? answers[part.key] : undefined;
  switch (part.kind) {
    case 'number': {
      const result = markNumber(part, variant, answer, truth, own);
      return 'refused' in result ? result : { marked: [result.marked], own: result.own };
    }
    case 'choice': {
      const result = markChoice(part, variant, answer);
      return 'refused' in result ? result : { marked: [result.marked] };
    }
    case 'setting':
    case 'design':
      return markSetting(part, variant, answer);
  }
}

function conclude(
  definition: ExerciseDefinition,
  variant: Variant,
  parts: readonly WeighedPart[],
): Marking {
  const whole = parts.reduce((sum, { weight }) => sum + weight, 0);
  const gained = parts.reduce((sum, { right, weight }) => sum + (right ? weight : 0), 0);
  const allRight = parts.every(({ right }) => right);
  const score = allRight ? 1 : gained / whole;
  const verdict: Verdict = allRight ? 'right' : gained > 0 ? 'partly' : 'wrong';
  const prediction = definition.kind === 'prediction';
  return {
    outcome: 'marked',
    verdict,
    score,
    parts: parts.map(({ weight: _weight, skills: _skills, ...marked }) => marked),
    ...(prediction
      ? {
          message: allRight ? 'You guessed right.' : 'It comes out otherwise.',
          nextStep: definition.afterwards?.(variant) ?? 'Now drive the bench and see.',
        }
      : words(verdict, parts)),
    closesRound: allRight || prediction,
    skills: definition.skills.map((skill) => ({
      skill,
      right: parts.every((part) => part.right || !part.skills.includes(skill)),
    })),
  };
}

function words(verdict: Verdict, parts: readonly WeighedPart[]) {
  if (verdict === 'right') {
    return {
      message: 'Right.',
      nextStep: 'Take another round for new numbers, or go on to the next exercise.',
    };
  }
  const right = parts.filter((part) => part.right).length;
  const first = parts.find((part) => !part.right);
  const where = parts.length > 1 && first !== undefined ? ` beside “${first.label}”` : '';
  const known = first?.slip !== undefined;
  return {
    message: verdict === 'partly' ? `${right} of ${parts.length} right.` : 'Not yet.',
    nextStep: known
      ? `Read the note${where}, then try again with the same numbers.`
      : 'Try again with the same numbers, or take a hint.',
  };
}
