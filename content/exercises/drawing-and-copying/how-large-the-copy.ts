import { defineExercise, type Earlier, type Variant } from '@/lib/marking/definition';
import { withinPercent } from '@/lib/marking/tolerance';
import { pantographCopy, type PantographSetUp } from '@/lib/kinematics/linkage/pantograph';
import { lengthField, scaleField } from '@/lib/quantities/field';
import { drawSize, givenLength, givenNumber, inUnits, plain, said } from '../sizes';

type Drawn = {
  readonly bar: number;
  readonly hole: number;
  readonly setUp: PantographSetUp;
  readonly height: number;
};

const setUps: Readonly<Record<PantographSetUp, string>> = {
  'middle-to-end':
    'the first end is fixed, the stylus is at the middle point and the pen at the last end',
  'end-to-middle':
    'the first end is fixed, the stylus is at the last end and the pen at the middle point',
  'across-the-middle':
    'the middle point is fixed, the stylus is at the first end and the pen at the last',
};

/** Number: scale, height and way up of a copy. */
export const howLargeTheCopy = defineExercise<Drawn>({
  id: 'how-large-the-copy',
  version: 1,
  kind: 'number',
  lesson: 'pantograph',
  title: 'How large is the copy?',
  skills: ['pantograph.scale', 'pantograph.reduction'],
  draw(source, units) {
    const bar = drawSize(source, units, { mm: [300, 600, 20], in: [12, 24, 1] });
    const hole = drawSize(source, units, { mm: [60, 460, 20], in: [2, 18, 1] });
    const setUp = source.pick(['middle-to-end', 'end-to-middle', 'across-the-middle'] as const);
    const height = drawSize(source, units, { mm: [40, 120, 5], in: [1.5, 5, 1 / 4] });
    if (hole < 0.15 * bar || hole > 0.85 * bar || 2 * hole === bar) return null;
    const drawn = { bar, hole, setUp, height };
    const copy = scaleOf(drawn) * height;
    return copy >= inUnits(units, 10, 0.4) && copy <= inUnits(units, 500, 20) ? drawn : null;
  },
  prompt: ({ givens: g }) =>
    `Two long bars L meet at the elbow. The parallelogram is pinned b from the first bar’s outer end and b from the elbow on the second, so that first end, middle point and last end lie in line. Here ${setUps[g.setUp]}. The drawing is H high. What is the scale, how high is the copy, and does it stand upright?`,
  givens: ({ givens: g, units }) => [
    givenLength('L', 'long bars', g.bar, units),
    givenLength('b', 'hole from the first end', g.hole, units),
    givenNumber('', 'set-up', g.setUp.replaceAll('-', ' ')),
    givenLength('H', 'drawing, high', g.height, units),
  ],
  parts: [
    {
      kind: 'number',
      key: 'scale',
      skills: ['pantograph.scale', 'pantograph.reduction'],
      label: () => 'Scale',
      field: () => scaleField,
      tolerance: () => withinPercent(0.5),
      answer: ({ givens: g }) => scaleOf(g),
      slips: [
        {
          id: 'upside-down',
          value: ({ givens: g }) => 1 / scaleOf(g),
          advice: upsideDown,
        },
        {
          id: 'segment-ratio',
          value: ({ givens: g }) => fromTheWrongPin(g),
          advice: () =>
            'Both distances start at the fixed point. You measured one of them from another pin.',
        },
      ],
    },
    {
      kind: 'number',
      key: 'height',
      skills: ['pantograph.scale', 'pantograph.reduction'],
      label: () => 'Height of the copy',
      field: (units) => lengthField(units),
      tolerance: () => withinPercent(0.5),
      answer: (variant, earlier) => heightOf(variant, earlier),
      slips: [
        {
          id: 'upside-down',
          value: ({ givens: g }, { scale = NaN }) => g.height / scale,
          advice: upsideDown,
        },
        {
          id: 'unscaled',
          value: ({ givens: g }) => g.height,
          advice: ({ givens: g, units }) =>
            `${said(g.height, units)} is the drawing’s own height; the copy is k times as high.`,
        },
      ],
    },
    {
      kind: 'choice',
      key: 'way',
      skills: ['pantograph.reduction'],
      label: () => 'The copy stands',
      options: [
        { option: 'same-way', label: () => 'upright' },
        { option: 'turned', label: () => 'turned half round' },
      ],
      answer: ({ givens: g }) => [wayOf(g)],
      slips: [
        {
          id: 'sign-lost',
          options: ({ givens: g }) => [wayOf(g) === 'turned' ? 'same-way' : 'turned'],
          advice: ({ givens: g }) =>
            wayOf(g) === 'turned'
              ? 'The fixed point lies between stylus and pen, so the pen goes the opposite way: the copy is turned half round, not mirrored.'
              : 'Stylus and pen lie on the same side of the fixed point, so the pen goes the same way: the copy stands upright.',
        },
      ],
    },
  ],
  hints: (variant) => [
    'Put a finger on the fixed point and measure from there: how far to the stylus, how far to the pen?',
    'k = (fixed point to pen) ÷ (fixed point to stylus). Along the line these go as L, b and L − b. The fixed point outside: upright; between: turned half round.',
    `Here k = ${working(variant)}.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const copy = heightOf(variant, { scale: scaleOf(g) });
    return [
      `From the fixed point, pen over stylus: ${working(variant)} = ${plain(scaleOf(g))}.`,
      `The copy is ${plain(scaleOf(g))} × ${said(g.height, units)} = ${said(copy, units)} high.`,
      wayOf(g) === 'turned'
        ? 'The fixed point lies between stylus and pen: the copy is turned half round.'
        : 'Stylus and pen lie on the same side of the fixed point: the copy stands upright.',
    ];
  },
});

function copyOf({ bar, hole, setUp }: Drawn) {
  const bars = { first: bar, second: bar, firstHole: hole, secondHole: hole };
  return pantographCopy(bars, setUp);
}

function scaleOf(drawn: Drawn): number {
  const copy = copyOf(drawn);
  return copy.outcome === 'true' ? Math.abs(copy.scale) : NaN;
}

function wayOf(drawn: Drawn): 'same-way' | 'turned' {
  const copy = copyOf(drawn);
  return copy.outcome === 'true' && copy.turned ? 'turned' : 'same-way';
}

function fromTheWrongPin({ bar, hole, setUp }: Drawn): number {
  if (setUp === 'middle-to-end') return (bar - hole) / hole;
  return setUp === 'end-to-middle' ? hole / (bar - hole) : bar / hole;
}

function heightOf({ givens: g }: Variant<Drawn>, { scale = NaN }: Earlier): number {
  return scale * g.height;
}

function working({ givens: g, units }: Variant<Drawn>): string {
  const [bar, hole] = [said(g.bar, units), said(g.hole, units)];
  if (g.setUp === 'middle-to-end') return `${bar} ÷ ${hole}`;
  return g.setUp === 'end-to-middle' ? `${hole} ÷ ${bar}` : `(${bar} − ${hole}) ÷ ${hole}`;
}

function upsideDown(): string {
  return 'Pen’s distance on top, stylus’s below, both from the fixed point: whichever is farther out moves more.';
}
