import { lessonBench } from '@/content/lessons/benches';
import { centreDistance } from '@/lib/kinematics/gear/mesh';
import type { DriverAndDriven } from '@/lib/kinematics/train/ratio';
import type { Arbor, BenchSpec, FreeTrainSpec } from '@/lib/scene/bench-spec';

const MODULE = 4;

/** Arbors in a line, each meshing with the next: what the first hands on, the second takes. */
function inLine(wheels: readonly (readonly number[])[]): readonly Arbor[] {
  let x = 0;
  let handsOn = 0;
  return wheels.map((teeth, index) => {
    const takes = teeth[0] ?? 0;
    if (index > 0) {
      x += centreDistance({ module: MODULE, firstTeeth: handsOn, secondTeeth: takes });
    }
    handsOn = teeth.at(-1) ?? 0;
    return { x, y: 0, wheels: teeth.map((count) => ({ teeth: count })), fast: true };
  });
}

/** A train of wheels in line, the crank on the first arbor. */
function trainOf(...wheels: readonly (readonly number[])[]): FreeTrainSpec {
  return { bench: 'train', layout: 'free', module: MODULE, arbors: inLine(wheels), crank: 0 };
}

/** A train of pairs: each driven wheel sits fast beside the next driver. */
function trainOfPairs(pairs: readonly DriverAndDriven[]): FreeTrainSpec {
  const beside = (index: number) => (pairs[index + 1] ? [pairs[index + 1]?.[0] ?? 0] : []);
  return trainOf(
    [pairs[0]?.[0] ?? 0],
    ...pairs.map(([, driven], index) => [driven, ...beside(index)]),
  );
}

/** The pairs of the train on the front page: a small wheel drives a large one, twice over. */
export const landingPairs: readonly DriverAndDriven[] = [
  [12, 36],
  [14, 28],
];

/** The train on the front page: to be turned, not yet to be changed. */
export const landingTrain: BenchSpec = { ...trainOfPairs(landingPairs), controls: [] };

/** The same train in words: "12 on 36, and beside that 14 on 28". */
export const landingWords = landingPairs
  .map(([driver, driven]) => `${driver} teeth on ${driven}`)
  .join(', and fast beside that ');

/** The trains that show one motion each. */
const byWay: Readonly<Record<string, BenchSpec>> = {
  slower: trainOf([12], [36]),
  faster: trainOf([36], [12]),
  'other-way': trainOf([20], [20]),
};

/** The bench that stands for a lesson in lists. */
export function pictureOf(lessonId: string): BenchSpec {
  return lessonBench(lessonId, 'metric');
}

/** The bench that shows one motion, as the lesson makes it. */
export function pictureOfWay(way: string, lessonId: string): BenchSpec {
  return byWay[way] ?? pictureOf(lessonId);
}
