import { readQuantity } from '@/lib/quantities/read';
import { counterpart } from '@/lib/quantities/units';
import { write } from '@/lib/quantities/write';
import type { Earlier, NumberPart, Variant } from './definition';
import type { Answer, WeighedPart } from './marking';
import { farApart, matches } from './tolerance';
import { slipValues, wrongUnitValue } from './values';

/** A number part as marked, with the value that later parts may go on from. */
export interface MarkedNumber {
  readonly marked: WeighedPart;
  readonly own: number;
}

interface Judgement {
  readonly right: boolean;
  readonly message?: string;
  readonly slip?: string;
}

/**
 * Marks a number against the true value, and against the one that follows from the learner's own
 * earlier values; a wrong one is held against the slips. Text that cannot be read is refused with
 * what is expected.
 */
export function markNumber(
  part: NumberPart,
  variant: Variant,
  answer: Answer | undefined,
  truth: Earlier,
  own: Earlier,
): MarkedNumber | { readonly refused: string } {
  const text = typeof answer === 'string' ? answer : '';
  const reading = readQuantity(text, part.field(variant.units));
  if (!reading.ok) return { refused: reading.message };
  const { key, skills, weight = 1 } = part;
  const label = part.label(variant);
  const judgement = judge(part, variant, reading.value, truth, own);
  return {
    marked: { key, label, echo: reading.echo, ...judgement, weight, skills },
    own: reading.value,
  };
}

function judge(
  part: NumberPart,
  variant: Variant,
  value: number,
  truth: Earlier,
  own: Earlier,
): Judgement {
  const tolerance = part.tolerance(variant.units);
  const right = part.answer(variant, truth);
  if (matches(tolerance, value, right)) return { right: true };
  const followed = ifItWorksOut(() => part.answer(variant, own));
  if (followed !== null && matches(tolerance, value, followed)) {
    return { right: true, message: 'Right, going on from your own value above.' };
  }
  return (
    recognised(part, variant, value, truth) ??
    ifItWorksOut(() => recognised(part, variant, value, own)) ?? {
      right: false,
      message: farApart(tolerance, value, right)
        ? `Not yet: this is too ${value > right ? 'large' : 'small'}.`
        : 'Very near, but outside the tolerance: carry more figures through the working.',
    }
  );
}

/** The slip, the wrong unit included, that leads to this value. */
function recognised(
  part: NumberPart,
  variant: Variant,
  value: number,
  earlier: Earlier,
): Judgement | null {
  const tolerance = part.tolerance(variant.units);
  const slip = slipValues(part, variant, earlier).find((each) =>
    matches(tolerance, value, each.value),
  );
  if (slip !== undefined) return { right: false, slip: slip.id, message: slip.advice };
  const wrongUnit = wrongUnitValue(part, variant, earlier);
  if (wrongUnit === null || !matches(tolerance, value, wrongUnit)) return null;
  return { right: false, slip: 'wrong-unit', message: wrongUnitAdvice(part, variant, value) };
}

function wrongUnitAdvice(part: NumberPart, variant: Variant, value: number): string {
  const { unit } = part.field(variant.units);
  const other = counterpart(unit) ?? unit;
  return `The working is right, the unit is not: you reckoned ${write(value, other)}, and a bare number here is read in ${unit}. Write the unit behind it.`;
}

/**
 * What `work` gives, or `null` where the learner's own earlier value makes no sense there: the
 * library refuses such arguments by a `RangeError`.
 */
function ifItWorksOut<T>(work: () => T): T | null {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
