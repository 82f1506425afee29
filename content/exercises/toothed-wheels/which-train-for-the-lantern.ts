import { defineExercise, type Variant } from '@/lib/marking/definition';
import { letterOf } from '@/lib/marking/mark-choice';
import { simpleTrain, trainProduct } from '@/lib/kinematics/train/ratio';
import type { FreeTrainSpec } from '@/lib/scene/bench-spec';
import { givenNumber } from '../sizes';
import { moduleInMillimetres, trainInLine } from './wheels';

type Drawn = {
  readonly z1: number;
  readonly z2: number;
  readonly z3: number;
  readonly z4: number;
};

type Train = 'pairs' | 'single-middle' | 'pairs-and-idler' | 'pairs-from-the-end';
const trains: readonly Train[] = [
  'pairs',
  'single-middle',
  'pairs-and-idler',
  'pairs-from-the-end',
];

/** Any count would do: alone on its arbor, it changes nothing but the sense. */
const idler = 20;

/** Choice: which of four trains gives this ratio, the same way round? */
export const whichTrainForTheLantern = defineExercise<Drawn>({
  id: 'which-train-for-the-lantern',
  version: 1,
  kind: 'choice',
  lesson: 'train-of-toothed-wheels',
  title: 'Which train for the lantern?',
  skills: ['train.ratio', 'train.compound', 'train.direction', 'train.idler'],
  draw(source) {
    const drawn = {
      z1: source.whole(10, 20),
      z2: source.whole(24, 60),
      z3: source.whole(10, 20),
      z4: source.whole(24, 60),
    };
    const slow = ratioOf(drawn);
    const others = [singleMiddle(drawn), 1 / slow];
    const apart = [slow, ...others].every((one, index, all) =>
      all.slice(index + 1).every((other) => Math.max(one, other) / Math.min(one, other) >= 1.1),
    );
    return slow >= 4 && slow <= 16 && apart ? drawn : null;
  },
  prompt: (variant) =>
    `The lantern is to make one turn for ${fractionOf(variant)} turns of the crank, the same way round. The crank’s wheel is drawn in brass; the lantern turns with the wheel at the other end. Which of these trains does it?`,
  givens: (variant) => [
    givenNumber('i', 'turns of the crank for one of the lantern', fractionOf(variant)),
  ],
  parts: [
    {
      kind: 'choice',
      key: 'train',
      skills: ['train.ratio', 'train.compound', 'train.direction', 'train.idler'],
      label: () => 'The train that does it',
      options: trains.map((option) => ({
        option,
        label: (_variant, letter) => `Train ${letter}`,
        figure: (variant) => bench(option, variant),
      })),
      answer: () => ['pairs'],
      slips: [
        {
          id: 'idler-counted',
          options: () => ['single-middle'],
          advice: ({ givens: g }) =>
            `The middle wheel is alone on its arbor and slows nothing: this train gives ${g.z4}/${g.z1}.`,
        },
        {
          id: 'wrong-sense',
          options: () => ['pairs-and-idler'],
          advice: () => 'The right pace; but three meshes turn it against the crank.',
        },
        {
          id: 'upside-down',
          options: () => ['pairs-from-the-end'],
          advice: (variant) =>
            `The crank is at the slow end: the lantern would race ${fractionOf(variant)} times as fast as the crank.`,
        },
      ],
    },
  ],
  hints: ({ givens: g }) => [
    'Two questions for each train: which wheels share an arbor, and how many meshes are there?',
    'i = (driven multiplied) ÷ (drivers multiplied), with single middle wheels left out. An even number of meshes keeps the sense.',
    `Where two pairs follow each other from the crank: i = (${g.z2} × ${g.z4}) ÷ (${g.z1} × ${g.z3}).`,
  ],
  solution(variant) {
    const { givens: g } = variant;
    const shown = variant.options.train ?? [];
    const place = shown.findIndex(({ option }) => option === 'pairs');
    return [
      `Two pairs from the crank: (${g.z2} × ${g.z4}) ÷ (${g.z1} × ${g.z3}) = ${fractionOf(variant)}.`,
      'Two meshes keep the sense.',
      `That is the train with ${g.z2} and ${g.z3} fast on the middle arbor and the crank on the wheel of ${g.z1}, train ${letterOf(place)}.`,
    ];
  },
});

function ratioOf({ z1, z2, z3, z4 }: Drawn): number {
  const { numerator, denominator } = inverse({ z1, z2, z3, z4 });
  return Number(numerator) / Number(denominator);
}

function inverse({ z1, z2, z3, z4 }: Drawn) {
  return trainProduct([
    [z2, z1],
    [z4, z3],
  ]);
}

function singleMiddle({ z1, z2, z4 }: Drawn): number {
  return 1 / simpleTrain([z1, z2, z4]).value;
}

function fractionOf({ givens }: Variant<Drawn>): string {
  const { numerator, denominator } = inverse(givens);
  return denominator === 1n ? `${numerator}` : `${numerator}/${denominator}`;
}

function bench(option: string, { givens: g, units }: Variant<Drawn>): FreeTrainSpec {
  const toothModule = moduleInMillimetres(units === 'metric' ? 4 : 6, units);
  return {
    bench: 'train',
    layout: 'free',
    module: toothModule,
    arbors: trainInLine(wheelsOf(option, g), toothModule),
    crank: option === 'pairs-from-the-end' ? 2 : 0,
    drive: 0,
    hide: ['ratio'],
    controls: [],
    units,
  };
}

function wheelsOf(option: string, { z1, z2, z3, z4 }: Drawn): readonly (readonly number[])[] {
  if (option === 'single-middle') return [[z1], [z2], [z4]];
  if (option === 'pairs-and-idler') return [[z1], [z2, z3], [idler], [z4]];
  return [[z1], [z2, z3], [z4]];
}
