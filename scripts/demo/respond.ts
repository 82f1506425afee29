import type { ExerciseDefinition, Part, Variant } from '@/lib/marking/definition';
import type { Answer, LearnersResponse } from '@/lib/marking/marking';
import { slipValues, trueValues } from '@/lib/marking/values';
import { write } from '@/lib/quantities/write';

/** The response that gets everything right, as a learner would send it. */
export function rightResponse(definition: ExerciseDefinition, variant: Variant): LearnersResponse {
  return {
    answers: Object.fromEntries(
      definition.parts.map((part) => [part.key, rightAnswer(part, definition, variant)]),
    ),
  };
}

/**
 * A response that makes the slip of this rank in the first part that has one, and is right in all
 * other parts; null when no part has a slip that makes sense for the variant.
 */
export function slippedResponse(
  definition: ExerciseDefinition,
  variant: Variant,
  rank: number,
): LearnersResponse | null {
  const right = rightResponse(definition, variant);
  for (const part of definition.parts) {
    const wrong = slippedAnswers(part, definition, variant);
    const answer = wrong[rank % Math.max(1, wrong.length)];
    if (answer !== undefined) return { answers: { ...right.answers, [part.key]: answer } };
  }
  return null;
}

function rightAnswer(part: Part, definition: ExerciseDefinition, variant: Variant): Answer {
  switch (part.kind) {
    case 'number': {
      const { unit, places } = part.field(variant.units);
      return write(part.answer(variant, trueValues(definition, variant)), unit, places);
    }
    case 'choice':
      return optionIds(part.key, part.answer(variant), variant);
    case 'setting':
    case 'design':
      return part.answer(variant);
  }
}

function slippedAnswers(part: Part, definition: ExerciseDefinition, variant: Variant): Answer[] {
  switch (part.kind) {
    case 'number': {
      const { unit, places } = part.field(variant.units);
      return slipValues(part, variant, trueValues(definition, variant)).map(({ value }) =>
        write(value, unit, places),
      );
    }
    case 'choice':
      return part.slips.map((slip) => optionIds(part.key, slip.options(variant), variant));
    case 'setting':
    case 'design':
      return part.slips.map((slip) => slip.example(variant)).filter((example) => example !== null);
  }
}

/** The random ids under which this round shows these options. */
function optionIds(part: string, options: readonly string[], variant: Variant): string[] {
  return (variant.options[part] ?? [])
    .filter(({ option }) => options.includes(option))
    .map(({ id }) => id);
}
