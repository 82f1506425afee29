import { defineExercise, type Variant } from '@/lib/marking/definition';
import { withinPercent } from '@/lib/marking/tolerance';
import { radians } from '@/lib/geometry/angle';
import { strayAtPen } from '@/lib/kinematics/linkage/pantograph-making';
import { pantographReach } from '@/lib/kinematics/linkage/pantograph-reach';
import { lengthField } from '@/lib/quantities/field';
import { write } from '@/lib/quantities/write';
import { drawSize, givenLength, givenNumber, lengthWithin, plain, said } from '../sizes';
import { scaleSaid, scaleValue, type Scale } from './scales';

type Drawn = {
  readonly bar: number;
  readonly copy: number;
  readonly drawing: number;
  readonly closed: number;
  readonly opened: number;
  readonly stray: number;
};

const scales: readonly Scale[] = [
  [3, 2],
  [2, 1],
  [5, 2],
  [3, 1],
  [4, 1],
];

/** Number: how deep may the drawing be, and what becomes of a stray of the stylus? */
export const reachAndTremor = defineExercise<Drawn>({
  id: 'reach-and-tremor',
  version: 1,
  kind: 'number',
  lesson: 'pantograph',
  title: 'Reach and tremor',
  skills: ['pantograph.reach', 'pantograph.scale'],
  draw(source, units) {
    const bar = drawSize(source, units, { mm: [300, 700, 20], in: [12, 28, 1] });
    const [copy, drawing] = source.pick(scales);
    const closed = source.pick([30, 40, 50]);
    const opened = source.pick([110, 120, 130, 140, 150]);
    const stray = drawSize(source, units, { mm: [0.4, 2, 0.2], in: [1 / 64, 5 / 64, 1 / 64] });
    // A tenth of a millimetre is the finest that is meant.
    return { bar, copy, drawing, closed, opened, stray: Number(stray.toFixed(6)) };
  },
  prompt: () =>
    'Two long bars of L each; the first end is fixed, the stylus in the middle, and the scale is k. The elbow may work from γ₁ to γ₂. How deep may the drawing be, measured straight out from the fixed point? And if the stylus strays from the line by ε, how far does the pen stray?',
  givens: ({ givens: g, units }) => [
    givenLength('L', 'long bars', g.bar, units),
    givenNumber('k', 'copy to drawing', scaleSaid(g.copy, g.drawing)),
    givenNumber('γ₁', 'elbow closed to', g.closed, '°'),
    givenNumber('γ₂', 'elbow opened to', g.opened, '°'),
    givenLength('ε', 'stylus strays by', g.stray, units),
  ],
  parts: [
    {
      kind: 'number',
      key: 'depth',
      skills: ['pantograph.reach'],
      label: () => 'Depth of the drawing',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(1, 0.04),
      answer: (variant) => depthAt(variant).stylus,
      slips: [
        {
          id: 'pen-reach',
          value: (v) => depthAt(v).pen,
          advice: (v) =>
            `That is the depth of the copy, at the pen. The stylus works ${plain(kOf(v))} times nearer.`,
        },
        {
          id: 'full-stretch',
          value: (v) => (2 * v.givens.bar) / kOf(v),
          advice: () =>
            'That reckons from elbow shut to elbow straight. Neither works: near them the bars bind and the copy shakes.',
        },
        {
          id: 'whole-angle',
          value: (v) => {
            const { bar, opened, closed } = v.givens;
            const difference = Math.sin(radians(opened)) - Math.sin(radians(closed));
            return (2 * bar * Math.abs(difference)) / kOf(v);
          },
          advice: () =>
            'Two equal bars and the line across make a triangle with equal legs: half the elbow’s angle counts.',
        },
      ],
    },
    {
      kind: 'number',
      key: 'stray',
      skills: ['pantograph.reach', 'pantograph.scale'],
      label: () => 'The pen strays by',
      field: (units) => lengthField(units),
      tolerance: () => withinPercent(2),
      answer: (variant) => strayAtPen(kOf(variant), variant.givens.stray),
      slips: [
        {
          id: 'error-unscaled',
          value: ({ givens: g }) => g.stray,
          advice: (v) =>
            `The pen does to a fault what it does to a line: ${plain(kOf(v))} times as much.`,
        },
        {
          id: 'error-divided',
          value: (v) => v.givens.stray / kOf(v),
          advice: () =>
            'Enlarging enlarges the faults too. Only copying smaller makes them smaller.',
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'From the fixed point to the pen is the third side of a triangle with two legs L.',
    'Pen’s distance: 2L sin(γ ÷ 2). Stylus: that ÷ k. Faults: × k.',
    `At the far end: 2 × ${said(g.bar, units)} × sin(${write(g.opened, '°')} ÷ 2) = …`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const { pen, stylus } = reachOf(variant);
    const k = plain(kOf(variant));
    return [
      `Pen, elbow opened: 2 × ${said(g.bar, units)} × sin ${write(g.opened / 2, '°')} = ${said(pen.most, units)}; closed: ${said(pen.least, units)}.`,
      `The stylus stands ${k} times nearer: from ${said(stylus.least, units)} to ${said(stylus.most, units)}, a depth of ${said(depthAt(variant).stylus, units)}.`,
      `A stray of ${said(g.stray, units)} becomes ${k} × ${said(g.stray, units)} = ${said(strayAtPen(kOf(variant), g.stray), units)}.`,
    ];
  },
});

function kOf({ givens: g }: Variant<Drawn>): number {
  return scaleValue([g.copy, g.drawing]);
}

function reachOf(variant: Variant<Drawn>) {
  const { bar, closed, opened } = variant.givens;
  const hole = bar / kOf(variant);
  const bars = { first: bar, second: bar, firstHole: hole, secondHole: hole };
  const elbow = { least: radians(closed), most: radians(opened) };
  return pantographReach(bars, 'middle-to-end', elbow);
}

function depthAt(variant: Variant<Drawn>): { stylus: number; pen: number } {
  const { stylus, pen } = reachOf(variant);
  return { stylus: stylus.most - stylus.least, pen: pen.most - pen.least };
}
