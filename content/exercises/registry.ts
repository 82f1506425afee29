import 'server-only';
import type { ExerciseDefinition } from '@/lib/marking/definition';
import { barOfThree } from './drawing-and-copying/bar-of-three';
import { howLargeTheCopy } from './drawing-and-copying/how-large-the-copy';
import { holesForAScale } from './drawing-and-copying/holes-for-a-scale';
import { reachAndTremor } from './drawing-and-copying/reach-and-tremor';
import { whichCopiesTrue } from './drawing-and-copying/which-copies-true';
import { copyAtThreeToTwo } from './drawing-and-copying/copy-at-three-to-two';
import { signForTheBoard } from './drawing-and-copying/sign-for-the-board';
import { edgingStrip } from './drawing-and-copying/edging-strip';
import { groovesAndBar } from './drawing-and-copying/grooves-and-bar';
import { moveThePenOut } from './drawing-and-copying/move-the-pen-out';
import { ovalFromPins } from './drawing-and-copying/oval-from-pins';
import { pinsForAnOval } from './drawing-and-copying/pins-for-an-oval';
import { setThePins } from './drawing-and-copying/set-the-pins';
import { whereThePenStands } from './drawing-and-copying/where-the-pen-stands';
import { joinTheArbors } from './toothed-wheels/join-the-arbors';
import { lanternWheel } from './toothed-wheels/lantern-wheel';
import { middleWheel } from './toothed-wheels/middle-wheel';
import { rowOfWheels } from './toothed-wheels/row-of-wheels';
import { turnsThroughPairs } from './toothed-wheels/turns-through-pairs';
import { wheelThatReaches } from './toothed-wheels/wheel-that-reaches';
import { whichTrainForTheLantern } from './toothed-wheels/which-train-for-the-lantern';

/** What an exercise shows that a learner can do; the unit of progress. */
export interface Skill {
  readonly id: string;
  readonly name: string;
  readonly lesson: string;
}

/** What a lesson holds, in the order in which it asks. */
export interface LessonEntry {
  readonly id: string;
  readonly unit: string;
  readonly exercises: readonly string[];
  readonly skills: readonly string[];
  /** The exercise of kind prediction that opens the lesson's bench. */
  readonly prediction: string;
}

const definitions: readonly ExerciseDefinition[] = [
  middleWheel,
  lanternWheel,
  rowOfWheels,
  turnsThroughPairs,
  wheelThatReaches,
  whichTrainForTheLantern,
  joinTheArbors,
  moveThePenOut,
  ovalFromPins,
  pinsForAnOval,
  groovesAndBar,
  edgingStrip,
  whereThePenStands,
  setThePins,
  barOfThree,
  howLargeTheCopy,
  holesForAScale,
  reachAndTremor,
  whichCopiesTrue,
  copyAtThreeToTwo,
  signForTheBoard,
];

/** Every exercise by its id. Definitions, answers and slips stay on the server. */
export const exercises: ReadonlyMap<string, ExerciseDefinition> = new Map(
  definitions.map((definition) => [definition.id, definition]),
);

const skillNames: Readonly<Record<string, readonly (readonly [string, string])[]>> = {
  'train-of-toothed-wheels': [
    ['train.ratio', 'Speed ratio'],
    ['train.direction', 'Direction of turn'],
    ['train.idler', 'Wheels between'],
    ['train.compound', 'Pairs on one arbor'],
    ['train.centres', 'Centre distances'],
  ],
  'trammel-and-oval': [
    ['trammel.semi-axes', 'Halves from the pins'],
    ['trammel.pins-from-size', 'Pins from the size'],
    ['trammel.slot-length', 'Grooves and bar'],
    ['oval.size', 'Size of an oval'],
    ['oval.perimeter', 'Round the edge'],
  ],
  pantograph: [
    ['pantograph.scale', 'Scale of the copy'],
    ['pantograph.holes', 'Where the holes go'],
    ['pantograph.reduction', 'Smaller, larger, turned'],
    ['pantograph.reach', 'Reach and faults'],
  ],
};

/** Every skill by its id. */
export const skills: ReadonlyMap<string, Skill> = new Map(
  Object.entries(skillNames).flatMap(([lesson, named]) =>
    named.map(([id, name]) => [id, { id, name, lesson }]),
  ),
);

/** The lessons that ask something, with their exercises and skills. */
export const lessons: readonly LessonEntry[] = [
  {
    id: 'train-of-toothed-wheels',
    unit: 'toothed-wheels',
    prediction: 'middle-wheel',
    exercises: [
      'lantern-wheel',
      'row-of-wheels',
      'turns-through-pairs',
      'wheel-that-reaches',
      'which-train-for-the-lantern',
      'join-the-arbors',
    ],
    skills: skillsOf('train-of-toothed-wheels'),
  },
  {
    id: 'trammel-and-oval',
    unit: 'drawing-and-copying',
    prediction: 'move-the-pen-out',
    exercises: [
      'oval-from-pins',
      'pins-for-an-oval',
      'grooves-and-bar',
      'edging-strip',
      'where-the-pen-stands',
      'set-the-pins',
    ],
    skills: skillsOf('trammel-and-oval'),
  },
  {
    id: 'pantograph',
    unit: 'drawing-and-copying',
    prediction: 'bar-of-three',
    exercises: [
      'how-large-the-copy',
      'holes-for-a-scale',
      'reach-and-tremor',
      'which-copies-true',
      'copy-at-three-to-two',
      'sign-for-the-board',
    ],
    skills: skillsOf('pantograph'),
  },
];

function skillsOf(lesson: string): string[] {
  return (skillNames[lesson] ?? []).map(([id]) => id);
}
