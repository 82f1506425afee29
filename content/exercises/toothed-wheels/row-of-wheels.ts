import { defineExercise, type Variant } from '@/lib/marking/definition';
import { withinPercent } from '@/lib/marking/tolerance';
import { simpleTrain } from '@/lib/kinematics/train/ratio';
import { turningField } from '@/lib/quantities/field';
import { write } from '@/lib/quantities/write';
import { givenNumber } from '../sizes';
import { givenWheel, sensePart } from './wheels';

type Drawn = {
  readonly first: number;
  readonly between: number;
  readonly second: number;
  readonly third: number;
  readonly fourth: number;
  readonly last: number;
  readonly speed: number;
};

const symbols = ['z₂', 'z₃', 'z₄'];

/** Number: how fast does the last wheel of a row turn, and does it turn with the first? */
export const rowOfWheels = defineExercise<Drawn>({
  id: 'row-of-wheels',
  version: 1,
  kind: 'number',
  lesson: 'train-of-toothed-wheels',
  title: 'A row of wheels',
  skills: ['train.idler', 'train.direction'],
  draw: (source) => ({
    first: source.whole(12, 40),
    between: source.whole(1, 3),
    second: source.whole(14, 50),
    third: source.whole(14, 50),
    fourth: source.whole(14, 50),
    last: source.whole(16, 80),
    speed: source.step(12, 60, 2),
  }),
  prompt: (variant) =>
    `Wheels in a row, each alone on its arbor, reach across the hall to the gulls: z₁, then ${symbols.slice(0, variant.givens.between).join(', ')}, then the last one, z. The crank turns z₁ at n₁. How fast does the last wheel turn, and does it turn with the crank?`,
  givens: (variant) => [
    givenWheel('z₁', 'crank’s wheel', variant.givens.first),
    ...middle(variant).map((teeth, index) =>
      givenWheel(symbols[index] ?? 'z', 'wheel between', teeth),
    ),
    givenWheel('z', 'last wheel', variant.givens.last),
    givenNumber('n₁', 'crank', variant.givens.speed, 'rpm'),
  ],
  parts: [
    {
      kind: 'number',
      key: 'speed',
      skills: ['train.idler'],
      label: () => 'Speed of the last wheel',
      field: () => turningField,
      tolerance: () => withinPercent(0.5),
      answer: (variant) => speedOf(variant),
      slips: [
        {
          id: 'idler-counted',
          value: ({ givens: g }) => g.speed * Math.abs(simpleTrain([g.first, g.second]).value),
          advice: ({ givens: g }) =>
            `That is the wheel of ${g.second} between. What it takes from one neighbour it hands, tooth for tooth, to the next: its own count falls out.`,
        },
        {
          id: 'upside-down',
          value: (v) => v.givens.speed ** 2 / speedOf(v),
          advice: ({ givens: g }) =>
            `The first wheel, ${g.first}, goes on top and the last, ${g.last}, below: many teeth, few turns.`,
        },
        {
          id: 'added',
          value: (variant) => added(variant),
          advice: () =>
            'Meshes in a row multiply. Multiply them, and every wheel in the middle cancels.',
        },
      ],
    },
    sensePart<Drawn>({
      label: 'The last wheel turns',
      sense: (variant) => simpleTrain(row(variant)).sense,
      advice: (variant) => {
        const { meshes } = simpleTrain(row(variant));
        return `Count meshes, not wheels: ${meshes} meshes turn the sense round ${meshes} times.`;
      },
    }),
  ],
  hints: ({ givens: g }) => [
    'How many teeth pass each mesh when the crank makes one turn? The same number everywhere.',
    'n · z = n₁ · z₁, first and last alone. The sense turns round once for each mesh.',
    `n = ${write(g.speed, 'rpm')} × ${g.first} ÷ ${g.last}; meshes: ${g.between} + 1.`,
  ],
  solution(variant) {
    const { givens: g } = variant;
    const { meshes, sense } = simpleTrain(row(variant));
    return [
      `The same teeth pass every mesh, so only the first and the last wheel count.`,
      `n = ${g.speed} × ${g.first} ÷ ${g.last} = ${write(speedOf(variant), 'rpm', 3)}.`,
      `${meshes} meshes turn the sense round ${meshes} times: the last wheel turns ${sense} the crank.`,
    ];
  },
});

function middle({ givens: g }: Variant<Drawn>): readonly number[] {
  return [g.second, g.third, g.fourth].slice(0, g.between);
}

function row(variant: Variant<Drawn>): readonly number[] {
  return [variant.givens.first, ...middle(variant), variant.givens.last];
}

function speedOf(variant: Variant<Drawn>): number {
  return variant.givens.speed * Math.abs(simpleTrain(row(variant)).value);
}

function added(variant: Variant<Drawn>): number {
  const wheels = row(variant);
  const ratios = wheels
    .slice(1)
    .map((teeth, index) => Math.abs(simpleTrain([wheels[index] ?? teeth, teeth]).value));
  return variant.givens.speed * ratios.reduce((sum, ratio) => sum + ratio, 0);
}
