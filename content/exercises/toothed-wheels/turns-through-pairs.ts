import { defineExercise, type Variant } from '@/lib/marking/definition';
import { withinPercent } from '@/lib/marking/tolerance';
import {
  arborTurns,
  compoundTrain,
  simpleTrain,
  type DriverAndDriven,
} from '@/lib/kinematics/train/ratio';
import { plainField } from '@/lib/quantities/field';
import { givenNumber, plain } from '../sizes';
import { givenWheel, sensePart } from './wheels';

type Drawn = {
  readonly z1: number;
  readonly z2: number;
  readonly z3: number;
  readonly z4: number;
  readonly turns: number;
};

/** Number: how many turns does the last wheel of two pairs make? */
export const turnsThroughPairs = defineExercise<Drawn>({
  id: 'turns-through-pairs',
  version: 1,
  kind: 'number',
  lesson: 'train-of-toothed-wheels',
  title: 'Turns through two pairs',
  skills: ['train.compound', 'train.direction'],
  draw: (source) => ({
    z1: source.whole(10, 24),
    z2: source.step(30, 72, 2),
    z3: source.whole(10, 24),
    z4: source.step(30, 72, 2),
    turns: source.pick([12, 15, 20, 24, 30, 36, 40, 48, 60]),
  }),
  prompt: () =>
    'The crank’s wheel z₁ drives z₂. Fast on the same arbor as z₂ sits z₃, which drives z₄. A child gives the crank N turns. How many turns does z₄ make, and does it turn with the crank?',
  givens: ({ givens: g }) => [
    givenWheel('z₁', 'crank’s wheel', g.z1),
    givenWheel('z₂', 'middle arbor, takes', g.z2),
    givenWheel('z₃', 'middle arbor, hands on', g.z3),
    givenWheel('z₄', 'last wheel', g.z4),
    givenNumber('N', 'turns of the crank', g.turns),
  ],
  parts: [
    {
      kind: 'number',
      key: 'turns',
      skills: ['train.compound'],
      label: () => 'Turns of the last wheel',
      field: () => ({ ...plainField, of: ['turns'] }),
      tolerance: () => withinPercent(0.5),
      answer: (variant) => lastTurns(variant),
      slips: [
        {
          id: 'first-over-last',
          value: ({ givens: g }) => g.turns * Math.abs(simpleTrain([g.z1, g.z4]).value),
          advice: ({ givens: g }) =>
            `${g.z2} and ${g.z3} are two different wheels on one arbor, so they do not cancel as a single wheel does.`,
        },
        {
          id: 'upside-down',
          value: (v) => v.givens.turns ** 2 / lastTurns(v),
          advice: () => 'Drivers belong on top, driven wheels below: this train slows down.',
        },
        {
          id: 'added',
          value: ({ givens: g }) =>
            g.turns *
            (Math.abs(simpleTrain([g.z1, g.z2]).value) + Math.abs(simpleTrain([g.z3, g.z4]).value)),
          advice: () => 'The second pair slows what the first has slowed already: multiply.',
        },
        {
          id: 'first-pair-only',
          value: (variant) => middleTurns(variant),
          advice: (v) =>
            `${plain(middleTurns(v))} turns are the middle arbor’s. Go on through ${v.givens.z3} and ${v.givens.z4}.`,
        },
      ],
    },
    sensePart<Drawn>({
      label: 'The last wheel turns',
      sense: (variant) => compoundTrain(pairs(variant)).sense,
      advice: () =>
        'Two meshes turn the sense round twice. The wheels on the middle arbor turn as one; between them nothing is turned round.',
    }),
  ],
  hints: ({ givens: g }) => [
    'Go from arbor to arbor and write down the turns of each.',
    'turns = N × (drivers multiplied) ÷ (driven multiplied).',
    `Middle arbor: ${g.turns} × ${g.z1} ÷ ${g.z2}.`,
  ],
  solution(variant) {
    const { givens: g } = variant;
    return [
      `First mesh: the middle arbor makes ${g.turns} × ${g.z1} ÷ ${g.z2} = ${plain(middleTurns(variant))} turns.`,
      `It hands them on unchanged: both its wheels turn as one.`,
      `Second mesh: ${plain(middleTurns(variant))} × ${g.z3} ÷ ${g.z4} = ${plain(lastTurns(variant))} turns.`,
      `Two meshes: ${compoundTrain(pairs(variant)).sense} the crank.`,
    ];
  },
});

function pairs({ givens: g }: Variant<Drawn>): readonly DriverAndDriven[] {
  return [
    [g.z1, g.z2],
    [g.z3, g.z4],
  ];
}

function middleTurns(variant: Variant<Drawn>): number {
  return Math.abs(arborTurns(pairs(variant), variant.givens.turns)[1] ?? NaN);
}

function lastTurns(variant: Variant<Drawn>): number {
  return Math.abs(arborTurns(pairs(variant), variant.givens.turns)[2] ?? NaN);
}
