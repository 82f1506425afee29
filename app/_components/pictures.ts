import { lessonBench } from '@/content/lessons/benches';
import type { DriverAndDriven } from '@/lib/kinematics/train/ratio';
import { toMillimetres } from '@/lib/quantities/units';
import type { UnitSystem } from '@/lib/quantities/unit-system';
import type { BenchSpec } from '@/lib/scene/bench-spec';
import { trainInLine } from '@/lib/scene/train-model';

/** Module 4, or six teeth to the inch of diameter. */
function toothSize(units: UnitSystem): number {
  return units === 'metric' ? 4 : toMillimetres(1 / 6, units);
}

/** The pairs of the train on the front page: a small wheel drives a large one, twice over. */
export const landingPairs: readonly [DriverAndDriven, DriverAndDriven] = [
  [12, 36],
  [14, 28],
];

/** The train on the front page: to be turned, not yet to be changed. */
export function landingTrain(units: UnitSystem): BenchSpec {
  const [[first, second], [third, last]] = landingPairs;
  return trainInLine(toothSize(units), [[first], [second, third], [last]], { controls: [], units });
}

/** The same train in words: "12 on 36, and beside that 14 on 28". */
export const landingWords = landingPairs
  .map(([driver, driven]) => `${driver} teeth on ${driven}`)
  .join(', and fast beside that ');

/** The trains that show one motion each. */
const byWay: Readonly<Record<string, BenchSpec>> = {
  slower: trainInLine(4, [[12], [36]]),
  faster: trainInLine(4, [[36], [12]]),
  'other-way': trainInLine(4, [[20], [20]]),
};

/** The bench that stands for a lesson in lists. */
export function pictureOf(lessonId: string): BenchSpec {
  return lessonBench(lessonId, 'metric');
}

/** The bench that shows one motion, as the lesson makes it. */
export function pictureOfWay(way: string, lessonId: string): BenchSpec {
  return byWay[way] ?? pictureOf(lessonId);
}
