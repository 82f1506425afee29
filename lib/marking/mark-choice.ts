import type { ChoicePart, ShuffledOption, Variant } from './definition';
import type { Answer, WeighedPart } from './marking';

/** The letter of a place in the row of options: A, B, C … */
export function letterOf(index: number): string {
  return String.fromCharCode('A'.charCodeAt(0) + index);
}

/** The options of a choice part as this round shows them, with label and letter. */
export function shownOptions(part: ChoicePart, variant: Variant) {
  return (variant.options[part.key] ?? []).flatMap(({ id, option }: ShuffledOption, index) => {
    const definition = part.options.find((each) => each.option === option);
    return definition === undefined
      ? []
      : [{ id, option, label: definition.label(variant, letterOf(index)), definition }];
  });
}

/** Marks a choice: right when exactly the right options were chosen. */
export function markChoice(
  part: ChoicePart,
  variant: Variant,
  answer: Answer | undefined,
): { readonly marked: WeighedPart } | { readonly refused: string } {
  const ids = Array.isArray(answer) ? new Set<string>(answer) : new Set<string>();
  const shown = shownOptions(part, variant);
  const chosen = shown.filter(({ id }) => ids.has(id));
  if (chosen.length === 0) return { refused: 'Choose one of the answers.' };
  if (chosen.length < ids.size) return { refused: 'These are not the options of this round.' };
  if (part.multiple !== true && ids.size > 1) return { refused: 'Choose one answer only.' };
  const options = new Set(chosen.map(({ option }) => option));
  const answers = part.answer(variant);
  const right = answers.length === options.size && answers.every((each) => options.has(each));
  const slip = right
    ? undefined
    : part.slips.find((each) => each.options(variant).every((option) => options.has(option)));
  const { key, skills, weight = 1 } = part;
  return {
    marked: {
      key,
      label: part.label(variant),
      right,
      echo: chosen.map(({ label }) => label).join(', '),
      ...(right ? {} : { message: slip?.advice(variant) ?? 'Not yet.' }),
      ...(slip === undefined ? {} : { slip: slip.id }),
      chosen: chosen.map(({ id }) => id),
      weight,
      skills,
    },
  };
}
