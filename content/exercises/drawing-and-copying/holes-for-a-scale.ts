import { defineExercise, type Variant } from '@/lib/marking/definition';
import { pantographHoles } from '@/lib/kinematics/linkage/pantograph-making';
import { lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, givenNumber, lengthWithin, plain, said } from '../sizes';
import { scaleSaid, scaleValue, type Scale } from './scales';

type Drawn = {
  readonly first: number;
  readonly second: number;
  readonly copy: number;
  readonly drawing: number;
};

const scales: readonly Scale[] = [
  [5, 4],
  [4, 3],
  [3, 2],
  [5, 3],
  [5, 2],
  [3, 1],
  [4, 1],
];

/** Number: where are the holes for a wanted scale, and how long is the stylus bar? */
export const holesForAScale = defineExercise<Drawn>({
  id: 'holes-for-a-scale',
  version: 1,
  kind: 'number',
  lesson: 'pantograph',
  title: 'Holes for a scale',
  skills: ['pantograph.holes', 'pantograph.scale'],
  draw(source, units) {
    const first = drawSize(source, units, { mm: [300, 600, 20], in: [12, 24, 1] });
    const second = drawSize(source, units, { mm: [240, 600, 20], in: [10, 24, 1] });
    const [copy, drawing] = source.pick(scales);
    return first === second ? null : { first, second, copy, drawing };
  },
  prompt: () =>
    'The first end is fixed, the stylus in the middle, the pen at the last end. The long bars are L₁ and L₂, and the copy is to be k times as large. How far from the fixed pin is the hole on the first bar, how far from the elbow the hole on the second, and how long is the short bar that carries the stylus?',
  givens: ({ givens: g, units }) => [
    givenLength('L₁', 'first bar, fixed pin to elbow', g.first, units),
    givenLength('L₂', 'second bar, elbow to pen', g.second, units),
    givenNumber('k', 'copy to drawing', scaleSaid(g.copy, g.drawing)),
  ],
  parts: [
    {
      kind: 'number',
      key: 'firstHole',
      skills: ['pantograph.holes', 'pantograph.scale'],
      label: () => 'Fixed pin to the first bar’s hole',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => holes(variant).firstHole,
      slips: [
        {
          id: 'from-the-elbow',
          value: (v) => holes(v).otherBar,
          advice: () => 'You measured from the elbow. The scale counts from the fixed pin.',
        },
        {
          id: 'segment-ratio',
          value: ({ givens: g }) => g.first / (kOf(g) + 1),
          advice: segmentRatio,
        },
      ],
    },
    {
      kind: 'number',
      key: 'secondHole',
      skills: ['pantograph.holes', 'pantograph.scale'],
      label: () => 'Elbow to the second bar’s hole',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (variant) => holes(variant).secondHole,
      slips: [
        {
          id: 'from-the-pen',
          value: (v) => v.givens.second - holes(v).secondHole,
          advice: () =>
            'That is from the pen’s end. On this bar the share is laid off from the elbow, so that the three points fall in line.',
        },
        {
          id: 'segment-ratio',
          value: ({ givens: g }) => g.second / (kOf(g) + 1),
          advice: segmentRatio,
        },
      ],
    },
    {
      kind: 'number',
      key: 'stylusBar',
      skills: ['pantograph.holes'],
      label: () => 'Stylus bar, pin to stylus',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(0.5, 0.02),
      answer: (_variant, { secondHole = NaN }) => secondHole,
      slips: [
        {
          id: 'wrong-short-bar',
          value: (v) => holes(v).otherBar,
          advice: () =>
            'That is the other short bar. The stylus bar lies parallel to the second long bar, opposite the piece from elbow to hole.',
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'The whole bar is to its near piece as the copy is to the drawing, on both bars alike.',
    'b = L₁ ÷ k and c = L₂ ÷ k. Opposite sides of the parallelogram are equal.',
    `b = ${said(g.first, units)} × ${g.drawing} ÷ ${g.copy}.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const { firstHole, secondHole, stylusBar } = holes(variant);
    return [
      `First bar, from the fixed pin: ${said(g.first, units)} ÷ ${plain(kOf(g))} = ${said(firstHole, units)}.`,
      `Second bar, from the elbow: ${said(g.second, units)} ÷ ${plain(kOf(g))} = ${said(secondHole, units)}.`,
      `The stylus bar lies opposite that piece: ${said(stylusBar, units)} too.`,
    ];
  },
});

function kOf({ copy, drawing }: Drawn): number {
  return scaleValue([copy, drawing]);
}

function holes({ givens: g }: Variant<Drawn>) {
  const outcome = pantographHoles(g.first, g.second, kOf(g), 'middle-to-end');
  if (outcome.outcome !== 'holes') throw new RangeError(`holes-for-a-scale: ${outcome.outcome}`);
  return outcome;
}

function segmentRatio({ givens: g }: Variant<Drawn>): string {
  return `You cut the bar into 1 and k. The whole bar is k shares, the near piece one of them: yours copies at ${plain(kOf(g) + 1)}.`;
}
