import type { ChoicePart, Given, Givens, Variant } from '@/lib/marking/definition';
import type { TrainRatio } from '@/lib/kinematics/train/ratio';
import { centreDistance } from '@/lib/kinematics/gear/mesh';
import { inch } from '@/lib/quantities/units';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { FreeTrainSpec } from '@/lib/scene/bench-spec';
import { givenLength, givenNumber } from '../sizes';

/** The size of a tooth as a shop says it: the module in mm, or teeth per inch of pitch diameter. */
export function givenToothSize(size: number, units: UnitSystem): Given {
  return units === 'metric'
    ? givenLength('m', 'module', size, units)
    : givenNumber('P', 'teeth per inch of diameter', size);
}

/** The module in the person's own unit: as given, or 1/P. */
export function moduleOf(size: number, units: UnitSystem): number {
  return units === 'metric' ? size : 1 / size;
}

/** The module in millimetres, for benches. */
export function moduleInMillimetres(size: number, units: UnitSystem): number {
  return units === 'metric' ? size : inch / size;
}

/** A given wheel. */
export function givenWheel(symbol: string, label: string, teeth: number): Given {
  return givenNumber(symbol, label, teeth, 'teeth');
}

type Sense = TrainRatio['sense'];

/** A choice between turning with the crank and against it. */
export function sensePart<G extends Givens>(part: {
  label: string;
  sense(variant: Variant<G>): Sense;
  advice(variant: Variant<G>): string;
  words?: Readonly<Record<Sense, string>>;
}): ChoicePart<G> {
  const words = part.words ?? { with: 'with the crank', against: 'against the crank' };
  const other = (variant: Variant<G>): Sense =>
    part.sense(variant) === 'with' ? 'against' : 'with';
  return {
    kind: 'choice',
    key: 'sense',
    skills: ['train.direction'],
    label: () => part.label,
    options: [
      { option: 'with', label: () => words.with },
      { option: 'against', label: () => words.against },
    ],
    answer: (variant) => [part.sense(variant)],
    slips: [
      {
        id: 'wrong-sense',
        options: (variant) => [other(variant)],
        advice: (variant) => part.advice(variant),
      },
    ],
  };
}

/** Arbors in line, each meshing with the next; the wheels of an arbor turn as one. */
export function trainInLine(
  wheels: readonly (readonly number[])[],
  module: number,
): FreeTrainSpec['arbors'] {
  let x = 0;
  return wheels.map((own, index) => {
    const before = wheels[index - 1]?.at(-1);
    const [takes] = own;
    if (before !== undefined && takes !== undefined) {
      x += centreDistance({ module, firstTeeth: before, secondTeeth: takes });
    }
    return { x, y: 0, wheels: own.map((teeth) => ({ teeth })), fast: true };
  });
}
