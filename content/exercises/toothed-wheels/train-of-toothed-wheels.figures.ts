import { centreDistance } from '@/lib/kinematics/gear/mesh';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import { arborTurns, compoundTrain, type DriverAndDriven } from '@/lib/kinematics/train/ratio';
import { createSource } from '@/lib/marking/source';
import { turningField } from '@/lib/quantities/field';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import { write } from '@/lib/quantities/write';
import type { LessonFigures, WorkedExample } from '../figures';
import { givenNumber, plain, said } from '../sizes';
import { givenToothSize, givenWheel, moduleOf } from './wheels';

/** The row of the prediction with its middle arbor split: 48 takes the motion, 12 hands it on. */
const split: readonly DriverAndDriven[] = [
  [16, 48],
  [12, 16],
];

/** Two pairs that may follow each other either way round. */
const swapped: readonly [DriverAndDriven, DriverAndDriven] = [
  [12, 36],
  [10, 40],
];

/** The numbers of the lesson on toothed wheels. */
export function trainFigures(units: UnitSystem, seed: number): LessonFigures {
  const [small, large] = units === 'metric' ? [4, 6] : [6, 4];
  return {
    values: {
      'pair-second': { text: `${split[1]?.[0] ?? ''} teeth` },
      'pair-ratio': { text: `${plain(1 / compoundTrain(split).value)} turns` },
      'swap-one': { text: pairText(swapped[0]) },
      'swap-two': { text: pairText(swapped[1]) },
      'swap-ratio': { text: `${plain(1 / compoundTrain(swapped).value)} turns` },
      'swap-before': { text: plain(1 / Math.abs(compoundTrain([swapped[0]]).value)) },
      'swap-after': { text: plain(1 / Math.abs(compoundTrain([swapped[1]]).value)) },
      'tooth-thin': { text: said(thickness(small, units), units, places(units)) },
      'tooth-thick': { text: said(thickness(large, units), units, places(units)) },
    },
    worked: twoPairs(units, seed),
  };
}

function pairText([driver, driven]: DriverAndDriven): string {
  return `${driver} driving ${driven} teeth`;
}

function places(units: UnitSystem): number {
  return units === 'metric' ? 1 : 2;
}

/** How thick a tooth is along the pitch circle; the number of teeth does not matter. */
function thickness(size: number, units: UnitSystem): number {
  const wheel = { module: moduleOf(size, units), teeth: 24, pressureAngle: Math.PI / 9 };
  return gearProportions(wheel).thickness;
}

/** How fast does the lantern turn behind two pairs, which way, and where do the arbors go? */
function twoPairs(units: UnitSystem, seed: number): WorkedExample {
  const source = createSource(seed);
  const z1 = source.whole(10, 16);
  const z2 = source.step(30, 48, 2);
  const z3 = source.whole(10, 16);
  const z4 = source.step(30, 60, 2);
  const crank = source.step(30, 60, 5);
  const size = source.pick(units === 'metric' ? [3, 4, 5] : [8, 6, 5]);
  const pairs: readonly DriverAndDriven[] = [
    [z1, z2],
    [z3, z4],
  ];
  const { sense } = compoundTrain(pairs);
  const [, middle = NaN, last = NaN] = arborTurns(pairs, crank).map(Math.abs);
  const centres = pairs.map(([firstTeeth, secondTeeth]) =>
    said(centreDistance({ module: moduleOf(size, units), firstTeeth, secondTeeth }), units),
  );
  return {
    question:
      'Two pairs slow the lantern down. How fast does it turn, which way, and how far apart do the arbors stand?',
    givens: [
      givenWheel('z₁', 'crank’s wheel', z1),
      givenWheel('z₂', 'middle arbor, takes', z2),
      givenWheel('z₃', 'middle arbor, hands on', z3),
      givenWheel('z₄', 'lantern’s wheel', z4),
      givenNumber('n₁', 'the crank turns at', crank, 'rpm'),
      givenToothSize(size, units),
    ],
    steps: [
      {
        text: 'Follow the motion with a finger and say what each wheel does.',
        value: 'driver, driven; same arbor; driver, driven',
      },
      {
        text: `First mesh, n₁ × z₁ ÷ z₂: ${crank} × ${z1} ÷ ${z2}.`,
        value: write(middle, 'rpm'),
        result: { value: middle, field: turningField },
      },
      {
        text: 'The middle arbor: both its wheels turn as one.',
        value: `${write(middle, 'rpm')}, handed on unchanged`,
      },
      {
        text: `Second mesh, times z₃ ÷ z₄: times ${z3} ÷ ${z4}.`,
        value: write(last, 'rpm'),
        result: { value: last, field: turningField },
      },
      {
        text: 'Count the meshes; each turns the sense round.',
        value: `${compoundTrain(pairs).meshes} meshes: ${sense} the crank`,
      },
      {
        text: `Centres of both pairs, m × (z + z) ÷ 2${units === 'metric' ? '' : ', with m = 1/P'}.`,
        value: centres.join(' and '),
      },
    ],
    check: `Teeth through the first mesh in a minute: ${crank} × ${z1} = ${crank * z1} from the one wheel, ${plain(middle, 2)} × ${z2} = ${plain(middle * z2)} into the other. They agree.`,
  };
}
