import { plainField } from '@/lib/quantities/field';
import type { Point } from '@/lib/geometry/point';
import type { BenchModel, Dragged, DriveControl, Handle } from './bench-model';
import type { FreeTrainSpec, TrainSpec } from './bench-spec';
import { handsOn, setUpTrain, standard, takes, type TrainSetup } from './train-setup';
import { drawTrain, leverEnd, trainScene } from './train-scene';
import { putArbor, setTrain, trainControls, trainValues } from './train-settings';
import { wheelUnder } from './train-tray';
import { describeTrain, trainLimits, trainPlot, trainReadouts, trainTables } from './train-words';

const turn = 2 * Math.PI;

/** A train of toothed wheels, ready to be turned. Its drive is the crank's angle, radians. */
export function trainModel(spec: TrainSpec): BenchModel {
  const setup = setUpTrain(spec);
  const drawing = drawTrain(setup);
  const start = spec.drive ?? 0;
  return {
    spec,
    bounds: drawing.bounds,
    drive: crankControl(setup, start),
    admit: (drive) => (setup.stuck ? start : drive),
    scene: (state, showing) => trainScene(drawing, state, showing),
    readouts: (drive) => trainReadouts(setup, drive),
    describe: (drive) => describeTrain(setup, drive),
    limits: () => trainLimits(setup),
    remarks: [],
    tables: (drive, pace) => trainTables(setup, drive, pace),
    plot: trainPlot(setup),
    handles: (drive) => trainHandles(setup, drive),
    drag: (handle, from, to, drive) => dragTrain(setup, handle, from, to, drive),
    controls: trainControls(spec).filter(
      ({ key }) => spec.controls === undefined || spec.controls.includes(key.split(':')[0] ?? ''),
    ),
    placeAt: (at) => wheelUnder(setup, at),
    set: (key, value) => setTrain(spec, key, value),
    values: trainValues(spec),
  };
}

/** Arbors in one line, each pair meshing, from the tooth counts on each arbor. */
export function trainInLine(
  module: number,
  wheels: readonly (readonly [number] | readonly [number, number])[],
  more: Partial<Omit<FreeTrainSpec, 'bench' | 'layout' | 'module' | 'arbors'>> = {},
): FreeTrainSpec {
  const arbors: FreeTrainSpec['arbors'][number][] = [];
  for (const counts of wheels) {
    const last = arbors.at(-1);
    const next = { x: 0, y: 0, wheels: counts.map((teeth) => ({ teeth })), fast: true };
    const x = last ? last.x + standard(module, handsOn(last), takes(next)) : 0;
    arbors.push({ ...next, x });
  }
  return { crank: 0, ...more, bench: 'train', layout: 'free', module, arbors };
}

function crankControl(setup: TrainSetup, start: number): DriveControl {
  const teeth = setup.wheels.find(({ arbor }) => arbor === setup.crank)?.teeth ?? 1;
  return {
    verb: 'Turn',
    label: 'Crank',
    unit: 'turns to the right',
    least: -10,
    most: 10,
    notch: 1 / teeth,
    step: 1 / teeth,
    places: 2,
    field: plainField,
    round: null,
    toShown: (drive) => (drive === 0 ? 0 : -drive / turn),
    fromShown: (turns) => -turns * turn,
    pace: { unit: 'rpm', least: 5, most: 60, step: 5, usual: 10, perSecond: -turn / 60 },
    start,
  };
}

function trainHandles(setup: TrainSetup, drive: number): readonly Handle[] {
  const { spec } = setup;
  const crank: Handle = {
    id: 'crank',
    at: leverEnd(setup, drive),
    reach: 4 * spec.module,
    moves: 'drive',
  };
  const rims = setup.wheels
    .filter(({ ratio }) => ratio !== null)
    .map(({ arbor, wheel, centre, tipRadius }): Handle => ({
      id: `wheel:${arbor}:${wheel}`,
      at: centre,
      reach: tipRadius,
      moves: 'drive',
    }));
  const movable = spec.layout === 'free' && (spec.controls?.includes('bend') ?? true);
  const arbors = movable
    ? setup.arbors.slice(1).map(({ x, y }, index): Handle => ({
        id: `arbor:${index + 1}`,
        at: { x, y },
        reach: 2 * spec.module,
        moves: 'setting',
      }))
    : [];
  return [...rims, ...arbors, crank];
}

function dragTrain(
  setup: TrainSetup,
  handle: string,
  from: Point,
  to: Point,
  drive: number,
): Dragged {
  const [what, arborText, wheelText] = handle.split(':');
  const { spec } = setup;
  if (what === 'arbor' && spec.layout === 'free') {
    const index = Number(arborText);
    const arbor = spec.arbors[index];
    if (!arbor) return { kind: 'nothing' };
    const place = { x: arbor.x + to.x - from.x, y: arbor.y + to.y - from.y };
    return { kind: 'spec', spec: putArbor(spec, index, place) };
  }
  const wheel = setup.wheels.find((candidate) =>
    what === 'crank'
      ? candidate.arbor === setup.crank
      : candidate.arbor === Number(arborText) && candidate.wheel === Number(wheelText),
  );
  if (!wheel?.ratio || setup.stuck) return { kind: 'nothing' };
  const swing = angleBetween(wheel.centre, from, to);
  return { kind: 'drive', drive: drive + swing / wheel.ratio };
}

/** How far the way from `centre` turns between two points, from −π to π. */
function angleBetween(centre: Point, from: Point, to: Point): number {
  const [a, b] = [from, to].map(({ x, y }) => Math.atan2(y - centre.y, x - centre.x));
  const swing = (b ?? 0) - (a ?? 0);
  return Math.atan2(Math.sin(swing), Math.cos(swing));
}
