import { defineExercise, type Variant } from '@/lib/marking/definition';
import { letterOf } from '@/lib/marking/mark-choice';
import { radians } from '@/lib/geometry/angle';
import { pantographHoles } from '@/lib/kinematics/linkage/pantograph-making';
import { toMillimetres } from '@/lib/quantities/units';
import type { PantographSpec } from '@/lib/scene/bench-spec';
import { drawSize, givenLength, givenNumber, inUnits, plain, said } from '../sizes';
import { onAHole, scaleSaid, scaleValue, type Scale } from './scales';

type Drawn = {
  readonly bar: number;
  readonly copy: number;
  readonly drawing: number;
};

type Bench = 'same-share' | 'one-and-k' | 'second-hole-out' | 'roles-exchanged';
const benches: readonly Bench[] = ['same-share', 'one-and-k', 'second-hole-out', 'roles-exchanged'];

const scales: readonly Scale[] = [
  [3, 2],
  [5, 3],
  [5, 2],
  [3, 1],
  [4, 1],
];

/** Choice: which of four pantographs copies at this scale and true in shape? */
export const whichCopiesTrue = defineExercise<Drawn>({
  id: 'which-copies-true',
  version: 1,
  kind: 'choice',
  lesson: 'pantograph',
  title: 'Which one copies true?',
  skills: ['pantograph.scale', 'pantograph.holes', 'pantograph.reduction'],
  draw(source, units) {
    const bar = drawSize(source, units, { mm: [300, 600, 20], in: [12, 24, 1] });
    const [copy, drawing] = source.pick(scales);
    const drawn = { bar, copy, drawing };
    return onAHole(holeOf(drawn), inUnits(units, 10, 1 / 2)) ? drawn : null;
  },
  prompt: ({ givens: g }) =>
    `Four pantographs, all with the first end fixed. Which one copies the herring ${scaleSaid(g.copy, g.drawing)}, copy to drawing, and true in shape?`,
  givens: ({ givens: g, units }) => [
    givenNumber('k', 'copy to drawing', scaleSaid(g.copy, g.drawing)),
    givenLength('L', 'long bars', g.bar, units),
  ],
  parts: [
    {
      kind: 'choice',
      key: 'bench',
      skills: ['pantograph.scale', 'pantograph.holes', 'pantograph.reduction'],
      label: () => 'The one that copies true',
      options: benches.map((option) => ({
        option,
        label: (_variant, letter) => `Pantograph ${letter}`,
        figure: (variant) => bench(option, variant),
      })),
      answer: () => ['same-share'],
      slips: [
        {
          id: 'segment-ratio',
          options: () => ['one-and-k'],
          advice: ({ givens: g }) =>
            `Whole bar to near piece is the scale; here it is ${plain(scaleValue([g.copy, g.drawing]) + 1)}.`,
        },
        {
          id: 'out-of-line',
          options: () => ['second-hole-out'],
          advice: () =>
            'Stylus, pen and fixed point are not in line. Lead the stylus round: the shape comes out askew.',
        },
        {
          id: 'upside-down',
          options: () => ['roles-exchanged'],
          advice: () => 'That pantograph shrinks: its outer point holds the stylus.',
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'First the shape: do fixed point, stylus and pen lie in line? Then the size. Then, which of the two is the pen?',
    'They are in line when both holes cut off the same share; then k = L ÷ b. The pen is the outer one when the copy is larger.',
    `The near piece is ${said(g.bar, units)} × ${g.drawing} ÷ ${g.copy} on both bars.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const place = (variant.options.bench ?? []).findIndex(({ option }) => option === 'same-share');
    return [
      `At ${scaleSaid(g.copy, g.drawing)} both holes cut off ${said(g.bar, units)} ÷ ${plain(scaleValue([g.copy, g.drawing]))} = ${said(holeOf(g), units)}, and the pen is the outer point.`,
      `That is pantograph ${letterOf(place)}.`,
    ];
  },
});

function holeOf({ bar, copy, drawing }: Drawn): number {
  const outcome = pantographHoles(bar, bar, scaleValue([copy, drawing]), 'middle-to-end');
  return outcome.outcome === 'holes' ? outcome.firstHole : NaN;
}

function bench(option: string, { givens: g, units }: Variant<Drawn>): PantographSpec {
  const inMillimetres = (value: number) => toMillimetres(value, units);
  const step = inMillimetres(inUnits(units, 10, 1 / 2));
  const share = option === 'one-and-k' ? g.bar / (scaleValue([g.copy, g.drawing]) + 1) : holeOf(g);
  const hole = inMillimetres(share);
  return {
    bench: 'pantograph',
    first: inMillimetres(g.bar),
    second: inMillimetres(g.bar),
    firstHole: hole,
    secondHole: option === 'second-hole-out' ? hole + 2 * step : hole,
    holeStep: step,
    setUp: option === 'roles-exchanged' ? 'end-to-middle' : 'middle-to-end',
    drawing: { name: 'herring', height: inMillimetres(inUnits(units, 40, 1.5)) },
    elbow: [radians(30), radians(150)],
    drive: 0,
    hide: ['scale', 'copy'],
    controls: [],
    units,
  };
}
