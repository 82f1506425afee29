import { defineExercise, type Variant } from '@/lib/marking/definition';
import { trammelForOval } from '@/lib/kinematics/linkage/trammel';
import {
  barLength,
  grooveLength,
  grooveTravel,
  leastPinsApart,
  pinsApart,
} from '@/lib/kinematics/linkage/trammel-making';
import { lengthField } from '@/lib/quantities/field';
import { drawSize, givenLength, lengthWithin, said } from '../sizes';

type Drawn = {
  readonly length: number;
  readonly width: number;
  readonly slider: number;
  readonly beyond: number;
};

/** Number: how long must grooves and bar be? */
export const groovesAndBar = defineExercise<Drawn>({
  id: 'grooves-and-bar',
  version: 1,
  kind: 'number',
  lesson: 'trammel-and-oval',
  title: 'Grooves and bar',
  skills: ['trammel.slot-length'],
  draw(source, units) {
    const length = drawSize(source, units, { mm: [240, 800, 10], in: [10, 32, 1 / 2] });
    const width = drawSize(source, units, { mm: [120, 640, 10], in: [5, 26, 1 / 2] });
    const slider = drawSize(source, units, { mm: [30, 80, 5], in: [1.25, 3, 1 / 4] });
    const beyond = drawSize(source, units, { mm: [15, 40, 5], in: [1 / 2, 1.5, 1 / 4] });
    if (width < 0.3 * length || width > 0.9 * length) return null;
    // Sliders a third as wide as long must pass one another at the crossing.
    const apart = pinsApart(trammelForOval(length, width));
    if (apart < leastPinsApart(slider, slider / 3)) return null;
    return { length, width, slider, beyond };
  },
  prompt: () =>
    'You want an oval ℓ by w, with the pen beyond both pins. Each slider is s long, its pin in the middle; the grooves are closed at their ends. The bar carries e of wood beyond the pen and beyond the far pin. How long must each groove be at least, and how long is the bar?',
  givens: ({ givens: g, units }) => [
    givenLength('ℓ', 'length of the oval', g.length, units),
    givenLength('w', 'width of the oval', g.width, units),
    givenLength('s', 'slider', g.slider, units),
    givenLength('e', 'wood beyond pen and pin', g.beyond, units),
  ],
  parts: [
    {
      kind: 'number',
      key: 'groove',
      skills: ['trammel.slot-length'],
      label: () => 'Each groove',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(1, 0.04),
      answer: (variant) => grooveLength(trammel(variant), variant.givens.slider),
      slips: [
        {
          id: 'half-travel',
          value: (v) => pinsApart(trammel(v)) + v.givens.slider,
          advice: (v) =>
            `Each pin runs out ${said(pinsApart(trammel(v)), v.units)} to both sides of the crossing: twice that in all.`,
        },
        {
          id: 'slider-forgotten',
          value: (v) => grooveTravel(trammel(v)),
          advice: (v) =>
            `The pin has room; the slider has not. Half of its ${said(v.givens.slider, v.units)} sticks out at each end.`,
        },
        {
          id: 'oval-for-groove',
          value: ({ givens: g }) => g.length + g.slider,
          advice: () =>
            'The pins do not follow the oval. They never go farther from the crossing than they stand from each other.',
        },
      ],
    },
    {
      kind: 'number',
      key: 'bar',
      skills: ['trammel.slot-length'],
      label: () => 'The bar',
      field: (units) => lengthField(units),
      tolerance: lengthWithin(1, 0.04),
      answer: (variant) => barLength(trammel(variant), variant.givens.beyond),
      slips: [
        {
          id: 'full-length-bar',
          value: ({ givens: g }) => g.length + 2 * g.beyond,
          advice: (v) =>
            `The bar turns about the middle and reaches half the oval: far pin to pen is ${said(v.givens.length / 2, v.units)}.`,
        },
        {
          id: 'pen-forgotten',
          value: (v) => pinsApart(trammel(v)) + 2 * v.givens.beyond,
          advice: (v) =>
            `That bar ends at the near pin; the pen stands ${said(v.givens.width / 2, v.units)} farther out.`,
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'When is a pin farthest from the crossing? When the other one stands on it.',
    'Each pin travels twice the pins’ distance, that is ℓ − w; add one slider. The bar is ℓ ÷ 2 and both ends.',
    `Groove: ${said(g.length, units)} − ${said(g.width, units)} + ${said(g.slider, units)}.`,
  ],
  solution(variant) {
    const { givens: g, units } = variant;
    const pins = trammel(variant);
    return [
      `The pins stand (${said(g.length, units)} − ${said(g.width, units)}) ÷ 2 = ${said(pinsApart(pins), units)} apart, and each travels twice that: ${said(grooveTravel(pins), units)}.`,
      `With one slider the groove is ${said(grooveTravel(pins), units)} + ${said(g.slider, units)} = ${said(grooveLength(pins, g.slider), units)}.`,
      `The bar goes from far pin to pen and ${said(g.beyond, units)} beyond both: ${said(g.length / 2, units)} + 2 × ${said(g.beyond, units)} = ${said(barLength(pins, g.beyond), units)}.`,
    ];
  },
});

function trammel({ givens: g }: Variant<Drawn>) {
  return trammelForOval(g.length, g.width);
}
