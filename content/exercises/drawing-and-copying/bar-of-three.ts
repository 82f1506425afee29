import { defineExercise } from '@/lib/marking/definition';
import { pantographCopy } from '@/lib/kinematics/linkage/pantograph';
import { inUnits, plain, said } from '../sizes';

type Drawn = {
  readonly bar: number;
  readonly hole: number;
  readonly herring: number;
  readonly scale: number;
};

/** Prediction: how large, and which way up, is the copy of a bar of three shares? */
export const barOfThree = defineExercise<Drawn>({
  id: 'bar-of-three',
  version: 1,
  kind: 'prediction',
  lesson: 'pantograph',
  title: 'A bar of three shares',
  skills: [],
  draw(_source, units) {
    const bar = inUnits(units, 300, 12);
    const hole = inUnits(units, 100, 4);
    const bars = { first: bar, second: bar, firstHole: hole, secondHole: hole };
    const copy = pantographCopy(bars, 'middle-to-end');
    if (copy.outcome !== 'true') return null;
    return { bar, hole, herring: inUnits(units, 50, 2), scale: copy.scale };
  },
  prompt: ({ givens: g, units }) =>
    `The first bar is ${said(g.bar, units)} long. Its hole is ${said(g.hole, units)} from the fixed pin, which leaves ${said(g.bar - g.hole, units)} to the elbow. The stylus runs round a herring ${said(g.herring, units)} long. What does the pen draw?`,
  givens: () => [],
  parts: [
    {
      kind: 'choice',
      key: 'herring',
      skills: [],
      label: () => 'The pen’s herring is',
      options: [
        {
          option: 'three-times',
          label: ({ givens: g, units }) => `${said(g.scale * g.herring, units)} long, upright`,
        },
        {
          option: 'twice',
          label: ({ givens: g, units }) =>
            `${said(((g.bar - g.hole) / g.hole) * g.herring, units)} long, upright`,
        },
        {
          option: 'a-third',
          label: ({ givens: g, units }) => `${said(g.herring / g.scale, units)} long, upright`,
        },
        {
          option: 'turned',
          label: ({ givens: g, units }) =>
            `${said(g.scale * g.herring, units)} long, turned half round`,
        },
      ],
      answer: () => ['three-times'],
      slips: [
        {
          id: 'segment-ratio',
          options: () => ['twice'],
          advice: () =>
            'One piece against the other does not count; both distances start at the fixed pin.',
        },
        {
          id: 'upside-down',
          options: () => ['a-third'],
          advice: () => 'The pen stands farther out than the stylus, so it moves more.',
        },
        {
          id: 'sign-lost',
          options: () => ['turned'],
          advice: () => 'Stylus and pen lie on the same side of the fixed pin and go the same way.',
        },
      ],
    },
  ],
  hints: () => [
    'Put a finger on the fixed pin and look along the line to the pen.',
    'Scale: fixed pin to pen, over fixed pin to stylus.',
    'Along that line the distances go as the whole bar and the piece up to the hole.',
  ],
  solution: ({ givens: g, units }) => [
    `From the fixed pin the pen is ${plain(g.scale)} times as far as the stylus: ${said(g.bar, units)} to ${said(g.hole, units)}.`,
    `So the herring comes out ${said(g.scale * g.herring, units)} long, and upright: both lie on the same side.`,
  ],
  afterwards: () =>
    'Now stretch a thread from the fixed pin to the pen. What lies on it, and how does it divide the thread?',
});
