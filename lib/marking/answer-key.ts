import { write } from '@/lib/quantities/write';
import type { Unit } from '@/lib/quantities/units';
import type { ExerciseDefinition, Given, NumberPart, Part, Variant } from './definition';
import { shownOptions } from './mark-choice';
import type { Tolerance } from './tolerance';
import { slipValues, trueValues, wrongUnitValue } from './values';

/** A slip as an instructor reads it: what a learner would answer, and what would be said. */
export interface KeySlip {
  readonly id: string;
  readonly answer: string;
  readonly advice: string;
}

/** One part's right answer with what counts as it, and its slips. */
export interface KeyPart {
  readonly key: string;
  readonly label: string;
  readonly answer: string;
  readonly accepts: string;
  readonly slips: readonly KeySlip[];
}

/** Everything about one variant that a learner must not see. For instructors and administrators. */
export interface AnswerKey {
  readonly exerciseId: string;
  readonly version: number;
  readonly title: string;
  readonly prompt: string;
  readonly givens: readonly Given[];
  readonly parts: readonly KeyPart[];
  readonly hints: readonly string[];
  readonly solution: readonly string[];
}

/** The answers and slips of a variant, with its hints and worked solution. */
export function answerKey(definition: ExerciseDefinition, variant: Variant): AnswerKey {
  return {
    exerciseId: definition.id,
    version: definition.version,
    title: definition.title,
    prompt: definition.prompt(variant),
    givens: definition.givens(variant),
    parts: definition.parts.map((part) => keyPart(part, definition, variant)),
    hints: definition.hints(variant),
    solution: definition.solution(variant),
  };
}

function keyPart(part: Part, definition: ExerciseDefinition, variant: Variant): KeyPart {
  const { key } = part;
  const label = part.label(variant);
  switch (part.kind) {
    case 'number':
      return { key, label, ...numberKey(part, definition, variant) };
    case 'choice': {
      const shown = shownOptions(part, variant);
      const labels = (options: readonly string[]) =>
        shown
          .filter(({ option }) => options.includes(option))
          .map((each) => each.label)
          .join(', ');
      return {
        key,
        label,
        answer: labels(part.answer(variant)),
        accepts: 'exactly this',
        slips: part.slips.map((slip) => ({
          id: slip.id,
          answer: labels(slip.options(variant)),
          advice: slip.advice(variant),
        })),
      };
    }
    case 'setting':
    case 'design':
      return {
        key,
        label,
        answer: part.echo(part.answer(variant), variant),
        accepts: part.criteria.map((criterion) => criterion.label(variant)).join('; '),
        slips: part.slips.flatMap((slip) => {
          const example = slip.example(variant);
          if (example === null) return [];
          const answer = part.echo(example, variant);
          return [{ id: slip.id, answer, advice: slip.advice(variant, example) }];
        }),
      };
  }
}

function numberKey(part: NumberPart, definition: ExerciseDefinition, variant: Variant) {
  const { unit, places } = part.field(variant.units);
  const earlier = trueValues(definition, variant);
  const wrongUnit = wrongUnitValue(part, variant, earlier);
  return {
    answer: write(part.answer(variant, earlier), unit, places),
    accepts: said(part.tolerance(variant.units), unit),
    slips: [
      ...slipValues(part, variant, earlier).map(({ id, value, advice }) => ({
        id,
        answer: write(value, unit, places),
        advice,
      })),
      ...(wrongUnit === null
        ? []
        : [
            {
              id: 'wrong-unit',
              answer: write(wrongUnit, unit, places),
              advice: 'The right quantity, reckoned in the other unit and written without it.',
            },
          ]),
    ],
  };
}

function said(tolerance: Tolerance, unit: Unit): string {
  if (tolerance.operator === 'equal-rounded') {
    return tolerance.mode === 'decimalPlaces'
      ? `the same when rounded to ${tolerance.figures} places`
      : `the same to ${tolerance.figures} figures`;
  }
  switch (tolerance.mode) {
    case 'exact':
      return 'exactly this';
    case 'absolute':
      return `${write(tolerance.tolerance, unit)} to either side`;
    case 'relative':
      return `within ${tolerance.percent} per cent`;
  }
}
