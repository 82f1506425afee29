import type { Arbor, BenchName, BenchSpec, FreeTrainSpec } from '@/lib/scene/bench-spec';

const MODULE = 4;

/** Arbors in a line, each meshing with the next: what the first hands on, the second takes. */
function inLine(wheels: readonly (readonly number[])[]): readonly Arbor[] {
  let x = 0;
  let handsOn = 0;
  return wheels.map((teeth, index) => {
    if (index > 0) x += (MODULE * (handsOn + (teeth[0] ?? 0))) / 2;
    handsOn = teeth.at(-1) ?? 0;
    return { x, y: 0, wheels: teeth.map((count) => ({ teeth: count })), fast: true };
  });
}

/** A train of wheels in line, the crank on the first arbor. */
function trainOf(...wheels: readonly (readonly number[])[]): FreeTrainSpec {
  return { bench: 'train', layout: 'free', module: MODULE, arbors: inLine(wheels), crank: 0 };
}

/** The train on the front page: a small wheel drives a large one, twice over. */
export const landingTrain = trainOf([12], [36, 14], [28]);

const trammel: BenchSpec = {
  bench: 'trammel',
  farPin: 250,
  nearPin: 150,
  farRunsIn: 'north-south',
  slider: 36,
  groove: 260,
  skew: 0,
  held: 'board',
  drive: Math.PI / 5,
};

const pantograph: BenchSpec = {
  bench: 'pantograph',
  first: 400,
  second: 400,
  firstHole: 200,
  secondHole: 200,
  holeStep: 25,
  setUp: 'middle-to-end',
  drawing: { name: 'herring', height: 90 },
  elbow: [Math.PI / 9, (5 * Math.PI) / 6],
};

const byBench: Readonly<Record<BenchName, BenchSpec>> = {
  train: landingTrain,
  trammel,
  pantograph,
};

/** The bench that stands for a lesson in lists. */
export function pictureOf(bench: BenchName): BenchSpec {
  return byBench[bench];
}

const byWay: Readonly<Record<string, BenchSpec>> = {
  slower: trainOf([12], [36]),
  faster: trainOf([36], [12]),
  'other-way': trainOf([20], [20]),
};

/** The bench that shows one motion, as the lesson with this bench makes it. */
export function pictureOfWay(way: string, bench: BenchName): BenchSpec {
  return byWay[way] ?? byBench[bench];
}
