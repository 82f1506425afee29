import { defineExercise } from '@/lib/marking/definition';
import { simpleTrain } from '@/lib/kinematics/train/ratio';
import { plain } from '../sizes';

type Drawn = { readonly crank: number; readonly middle: number; readonly lantern: number };

/** Prediction: what does a large wheel in the middle of a row do to the last one? */
export const middleWheel = defineExercise<Drawn>({
  id: 'middle-wheel',
  version: 1,
  kind: 'prediction',
  lesson: 'train-of-toothed-wheels',
  title: 'The wheel in the middle',
  skills: [],
  draw: () => ({ crank: 16, middle: 48, lantern: 16 }),
  prompt: ({ givens: g }) =>
    `Three wheels stand in a row, each alone on its arbor: ${g.crank} teeth on the crank, ${g.middle} in the middle, ${g.lantern} under the lantern. The crank makes one turn to the right. What does the lantern do?`,
  givens: () => [],
  parts: [
    {
      kind: 'choice',
      key: 'lantern',
      skills: [],
      label: () => 'The lantern makes',
      options: [
        { option: 'one-right', label: () => 'one turn to the right' },
        { option: 'third-right', label: () => 'a third of a turn to the right' },
        { option: 'one-left', label: () => 'one turn to the left' },
        { option: 'third-left', label: () => 'a third of a turn to the left' },
      ],
      answer: () => ['one-right'],
      slips: [
        {
          id: 'idler-counted',
          options: () => ['third-right'],
          advice: () => 'The big wheel creeps, but it hands on every tooth that it takes.',
        },
        {
          id: 'wrong-sense',
          options: () => ['one-left'],
          advice: () => 'There are two meshes in this row, and each turns the sense round.',
        },
        {
          id: 'first-pair-only',
          options: () => ['third-left'],
          advice: () => 'That is the middle wheel. Go on to the lantern.',
        },
      ],
    },
  ],
  hints: () => [
    'How many teeth pass each mesh in one turn of the crank?',
    'As many go in as come out, at both meshes.',
    'Follow one tooth after another from the crank to the lantern.',
  ],
  solution({ givens: g }) {
    const { value, sense } = simpleTrain([g.crank, g.middle, g.lantern]);
    return [
      `In one turn of the crank ${g.crank} teeth pass the first mesh, and the same ${g.crank} pass the second.`,
      `The lantern has ${g.lantern} teeth, so it makes ${plain(Math.abs(value))} turn, ${sense} the crank: two meshes turn the sense round twice.`,
    ];
  },
  afterwards: () =>
    'Now turn the crank. How many teeth go through the first mesh, and how many through the second?',
});
