import type { BenchSpec, FreeTrainSpec } from '@/lib/scene/bench-spec';
import { trainInLine } from '@/lib/scene/train-model';
import { toMillimetres } from '@/lib/quantities/units';
import type { UnitSystem } from '@/lib/quantities/unit-system';

/** How a lesson's bench stands when the page is opened: as its prediction describes it. */
type BenchOf = (units: UnitSystem) => BenchSpec;

const rightAngle = Math.PI / 2;

/** Three wheels in a row, each alone on its arbor; the teeth are those of the prediction. */
function rowOfThree(units: UnitSystem): FreeTrainSpec {
  const size = units === 'metric' ? 4 : toMillimetres(1 / 6, units);
  return trainInLine(size, [[16], [48], [16]], { units });
}

const benches: Readonly<Record<string, BenchOf>> = {
  'train-of-toothed-wheels': rowOfThree,
  'trammel-and-oval': (units) => {
    const metric = units === 'metric';
    const near = toMillimetres(metric ? 60 : 2.5, units);
    const apart = toMillimetres(metric ? 100 : 4, units);
    const slider = toMillimetres(metric ? 40 : 1.5, units);
    return {
      bench: 'trammel',
      farPin: near + apart,
      nearPin: near,
      farRunsIn: 'north-south',
      slider,
      groove: 2 * apart + slider + toMillimetres(metric ? 60 : 2.5, units),
      skew: 0,
      held: 'board',
      drive: rightAngle / 2,
      units,
    };
  },
  pantograph: (units) => {
    const hole = toMillimetres(units === 'metric' ? 100 : 4, units);
    return {
      bench: 'pantograph',
      first: 3 * hole,
      second: 3 * hole,
      firstHole: hole,
      secondHole: hole,
      holeStep: toMillimetres(units === 'metric' ? 10 : 0.5, units),
      setUp: 'middle-to-end',
      drawing: { name: 'herring', height: toMillimetres(units === 'metric' ? 50 : 2, units) / 2 },
      elbow: [rightAngle / 3, (5 * rightAngle) / 3],
      units,
    };
  },
};

/**
 * The bench of a lesson in the reader's units.
 * @throws RangeError for a lesson that has none.
 */
export function lessonBench(lessonId: string, units: UnitSystem): BenchSpec {
  const benchOf = benches[lessonId];
  if (benchOf === undefined) throw new RangeError(`lessonBench: no lesson called ${lessonId}`);
  return benchOf(units);
}
