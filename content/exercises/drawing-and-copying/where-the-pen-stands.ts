import { defineExercise, type Variant } from '@/lib/marking/definition';
import { letterOf } from '@/lib/marking/mark-choice';
import { polar, distance, type Point } from '@/lib/geometry/point';
import { degrees, radians } from '@/lib/geometry/angle';
import { trammelForOval, trammelPose } from '@/lib/kinematics/linkage/trammel';
import { grooveLength } from '@/lib/kinematics/linkage/trammel-making';
import { toMillimetres } from '@/lib/quantities/units';
import { write } from '@/lib/quantities/write';
import type { TrammelSpec } from '@/lib/scene/bench-spec';
import { drawSize, givenLength, givenNumber, inUnits, plain, said } from '../sizes';

type Drawn = { readonly a: number; readonly b: number; readonly turned: number };

type Dot = 'at-the-pen' | 'bar-angle' | 'on-the-circle' | 'far-and-near-swapped';
const dotNames: readonly Dot[] = [
  'at-the-pen',
  'bar-angle',
  'on-the-circle',
  'far-and-near-swapped',
];

/** Choice: the bar has been turned; on which of four dots does the pen stand? */
export const whereThePenStands = defineExercise<Drawn>({
  id: 'where-the-pen-stands',
  version: 1,
  kind: 'choice',
  lesson: 'trammel-and-oval',
  title: 'Where the pen stands',
  skills: ['trammel.semi-axes'],
  draw(source, units) {
    const a = drawSize(source, units, { mm: [150, 400, 10], in: [6, 16, 1 / 2] });
    const b = a * source.pick([0.4, 0.5, 0.6, 0.7]);
    const turned = source.step(30, 60, 5);
    const drawn = { a, b, turned };
    const points = dotNames.map((dot) => dotAt(dot, drawn));
    const apart = inUnits(units, 20, 3 / 4);
    const clear = points.every((one, index) =>
      points.slice(index + 1).every((other) => distance(one, other) >= apart),
    );
    return clear ? drawn : null;
  },
  prompt: ({ givens: g }) =>
    `The oval lies east-west, with half axes a and b. The bar has been turned ${write(g.turned, '°')} from the long axis. Four dots are chalked on the board, one on each bench below. On which of them does the pen stand?`,
  givens: ({ givens: g, units }) => [
    givenLength('a', 'half the length', g.a, units),
    givenLength('b', 'half the width', g.b, units),
    givenNumber('t', 'bar from the long axis', g.turned, '°'),
  ],
  parts: [
    {
      kind: 'choice',
      key: 'dot',
      skills: ['trammel.semi-axes'],
      label: () => 'The pen stands on',
      options: dotNames.map((option) => ({
        option,
        label: (_variant, letter) => `Dot ${letter}`,
        figure: (variant) => benchWith(option, variant),
      })),
      answer: () => ['at-the-pen'],
      slips: [
        {
          id: 'bar-angle',
          options: () => ['bar-angle'],
          advice: () =>
            'You looked along the bar’s direction from the middle; but the bar does not pass through the middle.',
        },
        {
          id: 'on-the-circle',
          options: () => ['on-the-circle'],
          advice: ({ givens: g, units }) =>
            `That dot lies on the round of the long half, ${said(g.a, units)}. The near pin pulls the height down to b sin t.`,
        },
        {
          id: 'far-and-near-swapped',
          options: () => ['far-and-near-swapped'],
          advice: () => 'Across belongs to the far pin’s distance, up to the near one’s.',
        },
      ],
    },
  ],
  hints: ({ givens: g, units }) => [
    'Read across and up apart from one another, each from its own pin.',
    'Across it is a cos t, up b sin t. The pen’s own angle p has tan p = (b ÷ a) tan t.',
    `Across: ${said(g.a, units)} × cos ${write(g.turned, '°')} = ${said(g.a, units)} × ${plain(Math.cos(radians(g.turned)))}.`,
  ],
  solution({ givens: g, units }) {
    const pen = dotAt('at-the-pen', g);
    return [
      `Across: ${said(g.a, units)} × cos ${write(g.turned, '°')} = ${said(pen.x, units)}.`,
      `Up: ${said(g.b, units)} × sin ${write(g.turned, '°')} = ${said(pen.y, units)}.`,
      `Seen from the middle that is ${write(degrees(Math.atan2(pen.y, pen.x)), '°')}, less than the bar’s ${write(g.turned, '°')}.`,
    ];
  },
});

function dotAt(dot: Dot, { a, b, turned }: Drawn): Point {
  const t = radians(turned);
  switch (dot) {
    case 'at-the-pen':
      return trammelPose(trammelForOval(2 * a, 2 * b), t).pen;
    case 'bar-angle':
      return polar((a * b) / Math.hypot(b * Math.cos(t), a * Math.sin(t)), t);
    case 'on-the-circle':
      return polar(a, t);
    case 'far-and-near-swapped':
      return { x: b * Math.cos(t), y: a * Math.sin(t) };
  }
}

function benchWith(option: string, variant: Variant<Drawn>): TrammelSpec {
  const { givens: g, units } = variant;
  const shown = variant.options.dot ?? [];
  const dot = dotNames.find((name) => name === option) ?? 'at-the-pen';
  const at = dotAt(dot, g);
  const inMillimetres = (value: number) => toMillimetres(value, units);
  const slider = inUnits(units, 40, 38.1);
  const pins = trammelForOval(inMillimetres(2 * g.a), inMillimetres(2 * g.b));
  return {
    bench: 'trammel',
    farPin: pins.uprightPin,
    nearPin: pins.levelPin,
    farRunsIn: 'north-south',
    slider,
    groove: grooveLength(pins, slider) + slider,
    skew: 0,
    held: 'board',
    dots: [
      {
        x: inMillimetres(at.x),
        y: inMillimetres(at.y),
        label: letterOf(shown.findIndex((each) => each.option === option)),
      },
    ],
    drive: 0,
    hide: ['pen'],
    controls: [],
    units,
  };
}
