import { defineExercise, type Setting, type Variant } from '@/lib/marking/definition';
import { radians } from '@/lib/geometry/angle';
import { cross, norm } from '@/lib/geometry/point';
import { pantographPoints } from '@/lib/kinematics/linkage/pantograph';
import { pantographHoles } from '@/lib/kinematics/linkage/pantograph-making';
import { fromMillimetres, toMillimetres } from '@/lib/quantities/units';
import { drawSize, givenLength, givenNumber, inUnits, plain, said } from '../sizes';
import { onAHole, scaleSaid, scaleValue, type Scale } from './scales';

type Drawn = {
  readonly first: number;
  readonly second: number;
  readonly copy: number;
  readonly drawing: number;
};

const scales: readonly Scale[] = [
  [3, 2],
  [5, 4],
  [4, 3],
  [5, 3],
  [5, 2],
];

/** Setting: put both pins into the holes that copy at a wanted scale. */
export const copyAtThreeToTwo = defineExercise<Drawn>({
  id: 'copy-at-three-to-two',
  version: 1,
  kind: 'setting',
  lesson: 'pantograph',
  title: 'Copy at three to two',
  skills: ['pantograph.holes', 'pantograph.scale'],
  draw(source, units) {
    const first = drawSize(source, units, { mm: [300, 600, 20], in: [12, 24, 1] });
    const second = drawSize(source, units, { mm: [240, 600, 20], in: [10, 24, 1] });
    const [copy, drawing] = source.pick(scales);
    const step = inUnits(units, 10, 1 / 2);
    const k = scaleValue([copy, drawing]);
    if (first === second || !onAHole(first / k, step) || !onAHole(second / k, step)) return null;
    return { first, second, copy, drawing };
  },
  prompt: ({ givens: g }) =>
    `Move the two pins so that the pantograph copies at ${scaleSaid(g.copy, g.drawing)}, copy to drawing, and true in shape. The first end is fixed, the stylus is in the middle; the short bars follow.`,
  givens: ({ givens: g, units }) => [
    givenLength('L₁', 'first bar, fixed pin to elbow', g.first, units),
    givenLength('L₂', 'second bar, elbow to pen', g.second, units),
    givenNumber('k', 'copy to drawing', scaleSaid(g.copy, g.drawing)),
  ],
  parts: [
    {
      kind: 'setting',
      key: 'pins',
      skills: ['pantograph.holes', 'pantograph.scale'],
      label: () => 'The two pins',
      controls: () => [
        { name: 'firstHole', kind: 'number', least: 0, most: 900 },
        { name: 'secondHole', kind: 'number', least: 0, most: 900 },
      ],
      criteria: [
        {
          key: 'first',
          label: () => 'The pin on the first bar',
          met: (setting, v) => inHole(setting.firstHole, wanted(v).firstHole),
          message: (setting, v) =>
            message(Number(setting.firstHole), v.givens.first, 'the fixed pin', v),
        },
        {
          key: 'second',
          label: () => 'The pin on the second bar',
          met: (setting, v) => inHole(setting.secondHole, wanted(v).secondHole),
          message: (setting, v) =>
            message(Number(setting.secondHole), v.givens.second, 'the elbow', v),
        },
      ],
      slips: [
        {
          id: 'segment-ratio',
          holds: (setting, v) =>
            nearHole(setting.firstHole, segments(v).firstHole, v) &&
            nearHole(setting.secondHole, segments(v).secondHole, v),
          example: (v) => segments(v),
          advice: ({ givens: g }) =>
            `At ${scaleSaid(g.copy, g.drawing)} the whole bar counts ${g.copy} and the near piece ${g.drawing}. You cut the bar into ${g.copy + g.drawing}.`,
        },
        {
          id: 'from-the-elbow',
          holds: (setting, v) => inHole(setting.firstHole, wanted(v).otherBar),
          example: (v) => ({ firstHole: wanted(v).otherBar, secondHole: wanted(v).secondHole }),
          advice: () =>
            'The right share, laid off from the wrong end: on the first bar the scale counts from the fixed pin.',
        },
        {
          id: 'from-the-pen',
          holds: (setting, v) =>
            inHole(setting.firstHole, wanted(v).firstHole) &&
            inHole(setting.secondHole, fromThePen(v)),
          example: (v) => ({ firstHole: wanted(v).firstHole, secondHole: fromThePen(v) }),
          advice: () => 'The first bar is right. On the second, count from the elbow.',
        },
        {
          id: 'out-of-line',
          holds: (setting, v) => offLine(setting, v) > 1e-6,
          example: (v) => ({
            firstHole: wanted(v).firstHole,
            secondHole: wanted(v).secondHole + stepOf(v),
          }),
          advice: (v, setting) =>
            `The copy leans: with the elbow at a right angle the pen is ${said(fromMillimetres(offLine(setting, v), v.units), v.units)} out of the line.`,
        },
      ],
      answer: (v) => ({ firstHole: wanted(v).firstHole, secondHole: wanted(v).secondHole }),
      echo: (setting, { units }) =>
        `first pin ${own(Number(setting.firstHole), units)} from the fixed pin, second pin ${own(Number(setting.secondHole), units)} from the elbow`,
    },
  ],
  figure(variant) {
    const { givens: g, units } = variant;
    return {
      bench: 'pantograph',
      first: toMillimetres(g.first, units),
      second: toMillimetres(g.second, units),
      // Nearer than any scale drawn here asks for.
      firstHole: 6 * stepOf(variant),
      secondHole: 8 * stepOf(variant),
      holeStep: stepOf(variant),
      setUp: 'middle-to-end',
      drawing: { name: 'herring', height: toMillimetres(inUnits(units, 40, 1.5), units) },
      elbow: [radians(30), radians(150)],
      drive: 0,
      hide: ['scale', 'copy'],
      controls: ['firstHole', 'secondHole'],
      units,
    };
  },
  hints: ({ givens: g, units }) => [
    'Make it true first: bring stylus and pen into one line with the fixed point. Then the size.',
    'b = L₁ ÷ k from the fixed pin, c = L₂ ÷ k from the elbow.',
    `At ${scaleSaid(g.copy, g.drawing)} the near piece is ${g.drawing} of ${g.copy} shares of each bar: ${said(g.first, units)} × ${g.drawing} ÷ ${g.copy}.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const { firstHole, secondHole } = wanted(variant);
    return [
      `First bar, from the fixed pin: ${said(g.first, units)} × ${g.drawing} ÷ ${g.copy} = ${own(firstHole, units)}.`,
      `Second bar, from the elbow: ${said(g.second, units)} × ${g.drawing} ÷ ${g.copy} = ${own(secondHole, units)}.`,
      'Both bars are cut in the same share, so fixed point, stylus and pen lie in line and the shape is true.',
    ];
  },
});

/** The holes that are right, in millimetres. */
function wanted({ givens: g, units }: Variant<Drawn>) {
  const outcome = pantographHoles(
    toMillimetres(g.first, units),
    toMillimetres(g.second, units),
    scaleValue([g.copy, g.drawing]),
    'middle-to-end',
  );
  if (outcome.outcome !== 'holes') throw new RangeError(`copy-at-three-to-two: ${outcome.outcome}`);
  return outcome;
}

function stepOf({ units }: Variant<Drawn>): number {
  return toMillimetres(inUnits(units, 10, 1 / 2), units);
}

/** The holes nearest to a bar cut into copy and drawing. */
function segments(variant: Variant<Drawn>) {
  const { givens: g, units } = variant;
  const shares = scaleValue([g.copy, g.drawing]) + 1;
  const step = stepOf(variant);
  const hole = (bar: number) => Math.round(toMillimetres(bar, units) / shares / step) * step;
  return { firstHole: hole(g.first), secondHole: hole(g.second) };
}

function fromThePen(variant: Variant<Drawn>): number {
  return toMillimetres(variant.givens.second, variant.units) - wanted(variant).secondHole;
}

function inHole(value: number | string | undefined, hole: number): boolean {
  return Math.abs(Number(value) - hole) < 0.01;
}

function nearHole(value: number | string | undefined, hole: number, v: Variant<Drawn>): boolean {
  return Math.abs(Number(value) - hole) < stepOf(v) / 2;
}

/** The pen's distance from the line through fixed point and stylus, elbow at a right angle, mm. */
function offLine(setting: Setting, { givens: g, units }: Variant<Drawn>): number {
  const { M, P } = pantographPoints(
    {
      first: toMillimetres(g.first, units),
      second: toMillimetres(g.second, units),
      firstHole: Number(setting.firstHole),
      secondHole: Number(setting.secondHole),
    },
    radians(90),
    0,
  );
  return norm(M) === 0 ? 0 : Math.abs(cross(M, P)) / norm(M);
}

function message(hole: number, bar: number, from: string, { units }: Variant<Drawn>): string {
  if (hole === 0) return `It stands on ${from}: nothing can move.`;
  return `It stands ${own(hole, units)} from ${from}; this bar by itself would copy at ${plain(toMillimetres(bar, units) / hole)}.`;
}

function own(millimetres: number, units: Variant['units']): string {
  return said(fromMillimetres(millimetres, units), units);
}
