import { defineExercise, type Variant } from '@/lib/marking/definition';
import { ellipsePerimeterRamanujan2, ellipsePerimeterRootMeanSquare } from '@/lib/geometry/ellipse';
import { withinPercent } from '@/lib/marking/tolerance';
import { lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, plain, said } from '../sizes';

type Drawn = { readonly length: number; readonly width: number; readonly scarf: number };

/** Number: how long is the strip that goes once round the edge of an oval? */
export const edgingStrip = defineExercise<Drawn>({
  id: 'edging-strip',
  version: 1,
  kind: 'number',
  lesson: 'trammel-and-oval',
  title: 'A strip round the edge',
  skills: ['oval.perimeter', 'oval.size'],
  draw(source, units) {
    const length = drawSize(source, units, { mm: [500, 1200, 20], in: [20, 48, 1] });
    const width = drawSize(source, units, { mm: [160, 700, 20], in: [7, 28, 1] });
    const scarf = drawSize(source, units, { mm: [40, 80, 5], in: [1.5, 3, 1 / 4] });
    return width >= 0.3 * length && width <= 0.58 * length ? { length, width, scarf } : null;
  },
  prompt: () =>
    'A thin strip is bent once round the edge of an oval table top, ℓ long and w wide. Its ends are scarfed one over the other for v. How long must the strip be cut?',
  givens: ({ givens: g, units }) => [
    givenLength('ℓ', 'length of the top', g.length, units),
    givenLength('w', 'width of the top', g.width, units),
    givenLength('v', 'scarf', g.scarf, units),
  ],
  parts: [
    {
      kind: 'number',
      key: 'strip',
      skills: ['oval.perimeter', 'oval.size'],
      label: () => 'The strip',
      field: (units) => lengthField(units),
      tolerance: () => withinPercent(0.2),
      answer: (variant) => round(variant) + variant.givens.scarf,
      slips: [
        {
          id: 'mean-circle',
          value: ({ givens: g }) => (Math.PI * (g.length + g.width)) / 2 + g.scarf,
          advice: () =>
            'A round of the mean diameter is shorter than the oval: this strip would leave a gap.',
        },
        {
          id: 'root-mean-square',
          value: (v) => ellipsePerimeterRootMeanSquare(halves(v)) + v.givens.scarf,
          advice: () => 'That common rule runs long, and the flatter the oval the longer.',
        },
        {
          id: 'full-axes',
          value: (v) => 2 * round(v) + v.givens.scarf,
          advice: ({ givens: g, units }) =>
            `a and b are halves: ${said(g.length / 2, units)} and ${said(g.width / 2, units)}. You put in the whole length and width.`,
        },
        {
          id: 'scarf-forgotten',
          value: (v) => round(v),
          advice: ({ givens: g, units }) =>
            `The ends lie one over the other for ${said(g.scarf, units)}: add it once.`,
        },
      ],
    },
  ],
  hints(variant) {
    const { semiMajor: a, semiMinor: b } = halves(variant);
    const { units } = variant;
    return [
      'Guess first: more than the round of the mean diameter, less than the box around the oval.',
      'S = π(a + b)(1 + 3h ÷ (10 + √(4 − 3h))) + v, with the halves a and b, and h = ((a − b) ÷ (a + b))².',
      `a + b = ${said(a + b, units)}, a − b = ${said(a - b, units)}, h = (${plain(a - b)} ÷ ${plain(a + b)})² = …`,
    ];
  },
  solution(variant) {
    const { givens: g, units } = variant;
    const { semiMajor: a, semiMinor: b } = halves(variant);
    const h = ((a - b) / (a + b)) ** 2;
    return [
      `Halves: a = ${said(a, units)}, b = ${said(b, units)}; a + b = ${said(a + b, units)}, a − b = ${said(a - b, units)}.`,
      `h = (${plain(a - b)} ÷ ${plain(a + b)})² = ${plain(h, 5)}.`,
      `Round the edge: π × ${plain(a + b)} × (1 + 3h ÷ (10 + √(4 − 3h))) = ${said(round(variant), units)}.`,
      `With the scarf: ${said(round(variant), units)} + ${said(g.scarf, units)} = ${said(round(variant) + g.scarf, units)}.`,
    ];
  },
});

function halves({ givens: g }: Variant<Drawn>) {
  return { semiMajor: g.length / 2, semiMinor: g.width / 2 };
}

function round(variant: Variant<Drawn>): number {
  return ellipsePerimeterRamanujan2(halves(variant));
}
