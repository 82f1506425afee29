import { defineExercise, type Variant } from '@/lib/marking/definition';
import { withinPercent } from '@/lib/marking/tolerance';
import { simpleTrain } from '@/lib/kinematics/train/ratio';
import { turningField } from '@/lib/quantities/field';
import { write } from '@/lib/quantities/write';
import { givenNumber } from '../sizes';
import { givenWheel, sensePart } from './wheels';

type Drawn = { readonly crank: number; readonly lantern: number; readonly speed: number };

/** Number: how fast does the driven wheel of one pair turn, and which way? */
export const lanternWheel = defineExercise<Drawn>({
  id: 'lantern-wheel',
  version: 1,
  kind: 'number',
  lesson: 'train-of-toothed-wheels',
  title: 'The lantern’s wheel',
  skills: ['train.ratio', 'train.direction'],
  draw(source) {
    const crank = source.whole(10, 60);
    const lantern = source.whole(16, 90);
    const speed = source.step(12, 60, 2);
    return Math.abs(crank - lantern) >= 4 ? { crank, lantern, speed } : null;
  },
  prompt: () =>
    'The crank’s wheel has z₁ teeth and meshes with the lantern’s wheel of z₂. The crank turns at n₁, to the right. How fast does the lantern turn, and which way?',
  givens: ({ givens: g }) => [
    givenWheel('z₁', 'crank’s wheel', g.crank),
    givenWheel('z₂', 'lantern’s wheel', g.lantern),
    givenNumber('n₁', 'crank', g.speed, 'rpm'),
  ],
  parts: [
    {
      kind: 'number',
      key: 'speed',
      skills: ['train.ratio'],
      label: () => 'Speed of the lantern',
      field: () => turningField,
      tolerance: () => withinPercent(0.5),
      answer: (variant) => speedOf(variant),
      slips: [
        {
          id: 'upside-down',
          value: ({ givens: g }) => g.speed / Math.abs(simpleTrain([g.crank, g.lantern]).value),
          advice: ({ givens: g }) =>
            `Of ${g.crank} and ${g.lantern} teeth, the wheel with more goes round more slowly. Put the driver’s teeth on top.`,
        },
        {
          id: 'same-turns',
          value: ({ givens: g }) => g.speed,
          advice: ({ givens: g }) =>
            `Wheels hand on teeth, not turns. Each turn of the crank sends ${g.crank} teeth through the mesh, and the lantern has ${g.lantern}.`,
        },
        {
          id: 'as-if-carried',
          value: (v) => v.givens.speed + speedOf(v),
          advice: () =>
            'The one turn you added belongs to a wheel that is carried round. Here both arbors stand still.',
        },
      ],
    },
    sensePart<Drawn>({
      label: 'The lantern turns',
      sense: ({ givens: g }) => simpleTrain([g.crank, g.lantern]).sense,
      words: { with: 'to the right', against: 'to the left' },
      advice: () =>
        'At the mesh both rims go the same way, and they lie on opposite sides of it: one mesh turns the sense round.',
    }),
  ],
  hints: ({ givens: g }) => [
    'Every tooth of one wheel pushes past one tooth of the other: count teeth, not turns.',
    'n₂ · z₂ = n₁ · z₁, and every outside mesh turns the sense round.',
    `n₂ = ${write(g.speed, 'rpm')} × ${g.crank} ÷ ${g.lantern}.`,
  ],
  solution: (variant) => {
    const { givens: g } = variant;
    return [
      `In a minute ${g.speed} × ${g.crank} = ${g.speed * g.crank} teeth pass the mesh.`,
      `The lantern has ${g.lantern} teeth: ${g.speed * g.crank} ÷ ${g.lantern} = ${write(speedOf(variant), 'rpm', 3)}.`,
      'One mesh, one change of sense: the lantern turns to the left.',
    ];
  },
});

function speedOf({ givens: g }: Variant<Drawn>): number {
  return g.speed * Math.abs(simpleTrain([g.crank, g.lantern]).value);
}
