import { defineExercise, type Earlier, type Variant } from '@/lib/marking/definition';
import { trammelForOval } from '@/lib/kinematics/linkage/trammel';
import { pinsApart } from '@/lib/kinematics/linkage/trammel-making';
import { lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, lengthWithin, said } from '../sizes';

type Drawn = { readonly length: number; readonly width: number };

/** Number: where do the pins go for an oval of a given size? */
export const pinsForAnOval = defineExercise<Drawn>({
  id: 'pins-for-an-oval',
  version: 1,
  kind: 'number',
  lesson: 'trammel-and-oval',
  title: 'Pins for an oval',
  skills: ['trammel.pins-from-size', 'trammel.semi-axes'],
  draw(source, units) {
    const length = drawSize(source, units, { mm: [240, 800, 10], in: [10, 32, 1 / 2] });
    const width = drawSize(source, units, { mm: [120, 640, 10], in: [5, 26, 1 / 2] });
    return width >= 0.3 * length && width <= 0.9 * length ? { length, width } : null;
  },
  prompt: () =>
    'A harbour window is to be an oval ℓ long and w wide. How far from the pen do you set the far pin and the near pin, and how far apart are the two pins then? The pen stands beyond both.',
  givens: ({ givens: g, units }) => [
    givenLength('ℓ', 'length', g.length, units),
    givenLength('w', 'width', g.width, units),
  ],
  parts: [
    {
      kind: 'number',
      key: 'far',
      skills: ['trammel.pins-from-size', 'trammel.semi-axes'],
      label: () => 'Pen to far pin',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => pins(variant).uprightPin,
      slips: [
        { id: 'full-axes', value: ({ givens: g }) => g.length, advice: fullAxes },
        { id: 'far-and-near-swapped', value: (v) => pins(v).levelPin, advice: swapped },
      ],
    },
    {
      kind: 'number',
      key: 'near',
      skills: ['trammel.pins-from-size', 'trammel.semi-axes'],
      label: () => 'Pen to near pin',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => pins(variant).levelPin,
      slips: [
        { id: 'full-axes', value: ({ givens: g }) => g.width, advice: fullAxes },
        { id: 'far-and-near-swapped', value: (v) => pins(v).uprightPin, advice: swapped },
      ],
    },
    {
      kind: 'number',
      key: 'apart',
      skills: ['trammel.pins-from-size'],
      label: () => 'Pins apart',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (_variant, earlier) => apart(earlier),
      slips: [
        { id: 'full-axes', value: ({ givens: g }) => g.length - g.width, advice: fullAxes },
        {
          id: 'sum-for-difference',
          value: ({ givens: g }) =>
            pinsApart(trammelForOval(g.length, g.width, { pen: 'between' })),
          advice: () =>
            'That is how far apart they stand with the pen between them. With the pen beyond both, take the difference of the halves.',
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'Halve the oval first: from the crossing the pen only ever reaches half of it.',
    'f = ℓ ÷ 2, n = w ÷ 2, and the pins are f − n apart.',
    `f = ${said(g.length, units)} ÷ 2.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const trammel = pins(variant);
    const [far, near] = [said(trammel.uprightPin, units), said(trammel.levelPin, units)];
    return [
      `The far pin reaches half the length: ${said(g.length, units)} ÷ 2 = ${far}.`,
      `The near pin reaches half the width: ${said(g.width, units)} ÷ 2 = ${near}.`,
      `The pins are ${far} − ${near} = ${said(pinsApart(trammel), units)} apart.`,
    ];
  },
});

function pins({ givens: g }: Variant<Drawn>) {
  return trammelForOval(g.length, g.width);
}

function apart({ far = NaN, near = NaN }: Earlier): number {
  return pinsApart({ uprightPin: far, levelPin: near });
}

function fullAxes({ givens: g, units }: Variant<Drawn>): string {
  return `From the middle the pen reaches half of ${said(g.length, units)} and half of ${said(g.width, units)}: set the halves.`;
}

function swapped(): string {
  return 'The other way about: the farther pin belongs to the longer half.';
}
