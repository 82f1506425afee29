import { convert, counterpart } from '@/lib/quantities/units';
import type { Earlier, ExerciseDefinition, NumberPart, Variant } from './definition';
import { farApart, tolerancesApart } from './tolerance';

/** A slip of one variant with the value it leads to. */
export interface SlipValue {
  readonly id: string;
  readonly value: number;
  readonly advice: string;
}

/** The number parts of an exercise, in order. */
export function numberParts(definition: ExerciseDefinition): readonly NumberPart[] {
  return definition.parts.filter((part) => part.kind === 'number');
}

/** The right value of every number part, in its field's unit. */
export function trueValues(definition: ExerciseDefinition, variant: Variant): Earlier {
  return numberParts(definition).reduce<Earlier>(
    (earlier, part) => ({ ...earlier, [part.key]: part.answer(variant, earlier) }),
    {},
  );
}

/** The values that a part's slips lead to, where they make sense. */
export function slipValues(
  part: NumberPart,
  variant: Variant,
  earlier: Earlier,
): readonly SlipValue[] {
  return part.slips.flatMap((slip) => {
    const value = slip.value(variant, earlier);
    return value === null || !Number.isFinite(value)
      ? []
      : [{ id: slip.id, value, advice: slip.advice(variant, earlier) }];
  });
}

/**
 * The number that stands for the right quantity in the other system's unit (millimetres written into
 * a field of inches), or `null` where both systems share a unit.
 */
export function wrongUnitValue(
  part: NumberPart,
  variant: Variant,
  earlier: Earlier,
): number | null {
  const { unit } = part.field(variant.units);
  const other = counterpart(unit);
  return other === null ? null : convert(part.answer(variant, earlier), unit, other);
}

/**
 * Whether every slip, the wrong unit included, lies at least five tolerances from the answer and
 * from every other slip of the same quantity.
 */
export function slipsApart(definition: ExerciseDefinition, variant: Variant): boolean {
  return pairsToTell(definition, variant).every(({ part, one, other }) =>
    farApart(part.tolerance(variant.units), one, other),
  );
}

/** The smallest distance between two values that must be told apart, in tolerances. */
export function closestPair(definition: ExerciseDefinition, variant: Variant): number {
  return pairsToTell(definition, variant).reduce(
    (least, { part, one, other }) =>
      Math.min(least, tolerancesApart(part.tolerance(variant.units), one, other)),
    Infinity,
  );
}

function pairsToTell(definition: ExerciseDefinition, variant: Variant) {
  const earlier = trueValues(definition, variant);
  return numberParts(definition).flatMap((part) => {
    const answer = part.answer(variant, earlier);
    const wrongUnit = wrongUnitValue(part, variant, earlier);
    const values = [
      answer,
      ...slipValues(part, variant, earlier).map(({ value }) => value),
      ...(wrongUnit === null ? [] : [wrongUnit]),
    ];
    return values.flatMap((one, index) =>
      values.slice(index + 1).map((other) => ({ part, one, other })),
    );
  });
}
