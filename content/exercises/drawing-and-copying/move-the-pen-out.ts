import { defineExercise } from '@/lib/marking/definition';
import { trammelOval } from '@/lib/kinematics/linkage/trammel';
import { inUnits, said } from '../sizes';

type Drawn = {
  readonly apart: number;
  readonly near: number;
  readonly out: number;
  readonly length: number;
  readonly width: number;
  /** How much the length and the width grow; equal, since the pins stay as far apart. */
  readonly grown: number;
};

/** Prediction: what becomes of the oval when the pen is moved farther out on the bar? */
export const moveThePenOut = defineExercise<Drawn>({
  id: 'move-the-pen-out',
  version: 1,
  kind: 'prediction',
  lesson: 'trammel-and-oval',
  title: 'Move the pen out',
  skills: [],
  draw(_source, units) {
    const apart = inUnits(units, 100, 4);
    const near = inUnits(units, 60, 2.5);
    const out = inUnits(units, 50, 2);
    const before = trammelOval({ uprightPin: near + apart, levelPin: near });
    const after = trammelOval({ uprightPin: near + apart + out, levelPin: near + out });
    return {
      apart,
      near,
      out,
      length: 2 * before.semiMajor,
      width: 2 * before.semiMinor,
      grown: 2 * (after.semiMajor - before.semiMajor),
    };
  },
  prompt: ({ givens: g, units }) =>
    `The two pins stay ${said(g.apart, units)} apart on the bar. The pen stands ${said(g.near, units)} beyond the near one, and the oval comes out ${said(g.length, units)} by ${said(g.width, units)}. Now you move the pen ${said(g.out, units)} farther out. What becomes of the oval?`,
  givens: () => [],
  parts: [
    {
      kind: 'choice',
      key: 'oval',
      skills: [],
      label: () => 'The oval',
      options: [
        {
          option: 'both-grow',
          label: ({ givens: g, units }) =>
            `Length and width both grow by ${said(g.grown, units)}, so it gets rounder`,
        },
        { option: 'same-shape', label: () => 'It grows in both directions in the same proportion' },
        { option: 'only-longer', label: () => 'It gets longer; the width stays' },
        {
          option: 'half-for-full',
          label: ({ givens: g, units }) => `Length and width both grow by ${said(g.out, units)}`,
        },
      ],
      answer: () => ['both-grow'],
      slips: [
        {
          id: 'same-shape',
          options: () => ['same-shape'],
          advice: () =>
            'A longer arm is not an enlargement: the same piece was added to both halves.',
        },
        {
          id: 'only-longer',
          options: () => ['only-longer'],
          advice: () => 'The pen moved away from both pins, so both halves grew.',
        },
        {
          id: 'half-for-full',
          options: () => ['half-for-full'],
          advice: () => 'The pen goes as far out on the other side too.',
        },
      ],
    },
  ],
  hints: () => [
    'Which two distances does the pen hand to the oval?',
    'Half the length is pen to far pin; half the width is pen to near pin.',
    'Both distances grow by the same piece.',
  ],
  solution: ({ givens: g, units }) => [
    `Pen to far pin and pen to near pin both grow by ${said(g.out, units)}.`,
    `Each is half of the oval one way, so length and width both grow by ${said(g.grown, units)}.`,
  ],
  afterwards: () =>
    'Now move the pen on the bench. Which distance on the bar stayed, and what of the oval stayed with it?',
});
