import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { ExerciseDefinition, Part, ShuffledOption, Variant } from './definition';
import { createSource, type Source } from './source';
import { slipsApart } from './values';

/** How often a source is drawn before the definition itself must be at fault. */
export const mostDraws = 400;

/** A definition that gave no variant in `mostDraws` draws: a mistake in the definition. */
export class DrawsUsedUp extends Error {
  constructor(exerciseId: string, seed: number, units: UnitSystem) {
    super(`drawVariant: ${exerciseId} gave nothing in ${mostDraws} draws (seed ${seed}, ${units})`);
    this.name = 'DrawsUsedUp';
  }
}

/**
 * The variant that a seed stands for: the first draw that satisfies the exercise's own constraint
 * and keeps every slip at least five tolerances from the answer and from the others. The result is
 * plain JSON, to be stored with the round.
 * Throws `DrawsUsedUp` when no draw will do.
 */
export function drawVariant(
  definition: ExerciseDefinition,
  seed: number,
  units: UnitSystem,
): Variant {
  const source = createSource(seed);
  for (let draws = 1; draws <= mostDraws; draws += 1) {
    const givens = definition.draw(source, units);
    if (givens === null) continue;
    const { id: exerciseId, version } = definition;
    const variant: Variant = { exerciseId, version, units, seed, draws, givens, options: {} };
    if (slipsApart(definition, variant)) {
      return { ...variant, options: shuffledOptions(definition.parts, source) };
    }
  }
  throw new DrawsUsedUp(definition.id, seed, units);
}

/** Whether a stored variant may still be marked: a newer definition would read it differently. */
export function isCurrent(definition: ExerciseDefinition, variant: Variant): boolean {
  return definition.id === variant.exerciseId && definition.version === variant.version;
}

function shuffledOptions(
  parts: readonly Part[],
  source: Source,
): Readonly<Record<string, readonly ShuffledOption[]>> {
  return Object.fromEntries(
    parts.flatMap((part) =>
      part.kind === 'choice'
        ? [[part.key, source.shuffle(part.options).map((each) => named(each.option, source))]]
        : [],
    ),
  );
}

function named(option: string, source: Source): ShuffledOption {
  return { id: source.name(), option };
}
