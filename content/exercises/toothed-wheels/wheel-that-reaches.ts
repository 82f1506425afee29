import { defineExercise, type Earlier, type Variant } from '@/lib/marking/definition';
import { exact } from '@/lib/marking/tolerance';
import { centreDistance } from '@/lib/kinematics/gear/mesh';
import { idlerBetween } from '@/lib/kinematics/train/ratio';
import { countField, lengthField } from '@/lib/quantities/field';
import { givenLength, inUnits, lengthWithin, plain, said } from '../sizes';
import { givenToothSize, givenWheel, moduleOf } from './wheels';

type Drawn = {
  /** Module in mm, or teeth per inch of diameter. */
  readonly toothSize: number;
  readonly first: number;
  readonly last: number;
  /** Between the two posts, in the learner's own unit. */
  readonly distance: number;
};

/** Number: which idler fills the gap between two posts, and where does its arbor stand? */
export const wheelThatReaches = defineExercise<Drawn>({
  id: 'wheel-that-reaches',
  version: 1,
  kind: 'number',
  lesson: 'train-of-toothed-wheels',
  title: 'The wheel that reaches',
  skills: ['train.idler', 'train.centres'],
  draw(source, units) {
    const toothSize = source.pick(units === 'metric' ? [2, 3, 4, 5, 6] : [12, 10, 8, 6, 5, 4]);
    const first = source.whole(12, 36);
    const last = source.step(12, 60, 2);
    const idler = source.whole(12, 60);
    if (first === last || (first + last) % 2 !== 0) return null;
    const toothModule = moduleOf(toothSize, units);
    const distance =
      centreDistance({ module: toothModule, firstTeeth: first, secondTeeth: idler }) +
      centreDistance({ module: toothModule, firstTeeth: idler, secondTeeth: last });
    if (distance < inUnits(units, 100, 4) || distance > inUnits(units, 500, 20)) return null;
    return { toothSize, first, last, distance };
  },
  prompt: ({ units }) =>
    `The crank’s wheel z₁ and the gull’s wheel z₃ turn on posts A apart and cannot touch. One idler, in line between them, is to join them; all teeth are of ${units === 'metric' ? 'module m' : 'pitch P'}. How many teeth must the idler have, and how far is its arbor from the crank’s?`,
  givens: ({ givens: g, units }) => [
    givenToothSize(g.toothSize, units),
    givenWheel('z₁', 'crank’s wheel', g.first),
    givenWheel('z₃', 'gull’s wheel', g.last),
    givenLength('A', 'between the posts', g.distance, units, units === 'metric' ? undefined : 3),
  ],
  parts: [
    {
      kind: 'number',
      key: 'teeth',
      skills: ['train.idler', 'train.centres'],
      label: () => 'Teeth of the idler',
      field: () => countField('teeth'),
      tolerance: () => exact,
      answer: (variant) => idlerTeeth(variant),
      slips: [
        {
          id: 'radius-for-diameter',
          value: (v) => 2 * idlerTeeth(v),
          advice: () =>
            'That fills the gap with one radius of the idler; a whole diameter lies in it.',
        },
        {
          id: 'diameters',
          value: (v) => positive(idlerTeeth(v) - meanOfEnds(v)),
          advice: () => 'Only one radius of each end wheel lies between the posts, not two.',
        },
        {
          id: 'middle-of-both',
          value: (variant) => meanOfEnds(variant),
          advice: ({ givens: g }) =>
            `Any count keeps the ratio, but only one reaches: the gap decides, not the mean of ${g.first} and ${g.last}.`,
        },
      ],
    },
    {
      kind: 'number',
      key: 'centres',
      skills: ['train.centres'],
      label: () => 'Crank’s arbor to idler’s arbor',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.2, 0.008),
      answer: (variant, earlier) => toIdler(variant, earlier),
      slips: [
        {
          id: 'diameters',
          value: (variant, earlier) => 2 * toIdler(variant, earlier),
          advice: () => 'Arbors stand one radius and one radius apart: half of that.',
        },
        {
          id: 'half-way',
          value: ({ givens: g }) => g.distance / 2,
          advice: ({ givens: g }) =>
            `Half-way only if the end wheels are equal; these have ${g.first} and ${g.last} teeth.`,
        },
        {
          id: 'tips-touching',
          value: (v, earlier) => toIdler(v, earlier) + 2 * moduleOf(v.givens.toothSize, v.units),
          advice: () =>
            'You set tip against tip. Teeth reach one module into each other’s gaps: the pitch circles touch.',
        },
      ],
    },
  ],
  hints: (variant) => {
    const { givens: g, units } = variant;
    return [
      'Lay the pitch circles in a row: a radius, a diameter, a radius.',
      `A = m · (z₁ ÷ 2 + z₂ + z₃ ÷ 2), and the first arbors stand m · (z₁ + z₂) ÷ 2 apart${units === 'metric' ? '' : ', with m = 1 ÷ P inches'}.`,
      `z₂ = ${inModules(variant)} − (${g.first} + ${g.last}) ÷ 2.`,
    ];
  },
  solution(variant) {
    const { givens: g, units } = variant;
    const teeth = idlerTeeth(variant);
    const toothModule = moduleOf(g.toothSize, units);
    const said1 = said(
      centreDistance({ module: toothModule, firstTeeth: g.first, secondTeeth: teeth }),
      units,
      3,
    );
    return [
      `Between the posts lie ${inModules(variant)} = ${plain(g.distance / toothModule)} modules.`,
      `The end wheels take (${g.first} + ${g.last}) ÷ 2 = ${plain(meanOfEnds(variant))} of them; the idler fills the rest with its diameter: ${teeth} teeth.`,
      `Its arbor stands (${g.first} + ${teeth}) ÷ 2 = ${plain((g.first + teeth) / 2)} modules from the crank’s: ${said1}.`,
    ];
  },
});

function idlerTeeth({ givens: g, units }: Variant<Drawn>): number {
  const toothModule = moduleOf(g.toothSize, units);
  const idler = idlerBetween({
    module: toothModule,
    first: g.first,
    last: g.last,
    distance: g.distance,
  });
  return idler.outcome === 'fits' ? idler.teeth : NaN;
}

function meanOfEnds({ givens: g }: Variant<Drawn>): number {
  return (g.first + g.last) / 2;
}

function toIdler({ givens: g, units }: Variant<Drawn>, { teeth = NaN }: Earlier): number {
  const toothModule = moduleOf(g.toothSize, units);
  return centreDistance({ module: toothModule, firstTeeth: g.first, secondTeeth: teeth });
}

/** The distance between the posts counted in modules, as it is reckoned. */
function inModules({ givens: g, units }: Variant<Drawn>): string {
  const distance = said(g.distance, units, units === 'metric' ? undefined : 3);
  return units === 'metric' ? `${distance} ÷ ${g.toothSize} mm` : `${distance} × ${g.toothSize}`;
}

function positive(value: number): number | null {
  return value >= 1 ? value : null;
}
