import { radians } from '@/lib/geometry/angle';
import { add, dot, direction, ORIGIN, polar, subtract, type Point } from '@/lib/geometry/point';
import { lengthField } from '@/lib/quantities/field';
import type { BenchModel, Dragged, DriveControl, Handle, SettingControl } from './bench-model';
import type { DrawingName, PantographSetUp, PantographSpec } from './bench-spec';
import { lengthFromShown, lengthUnit, shownLength, toStep } from './measure';
import { boundsOnBoard, pinControls, pullPin, sceneOnBoard, setPin } from './pantograph-pin';
import { drawPantograph, pantographScene } from './pantograph-scene';
import { setUpPantograph, type PantographSetup } from './pantograph-setup';
import {
  describePantograph,
  pantographLimits,
  pantographPlot,
  pantographReadouts,
  pantographTables,
} from './pantograph-words';
import { angleControl, angleSet, lengthControl, lengthSet, type LengthRange } from './settings';

const bars: LengthRange = { mm: [200, 800, 10], inch: [8, 32, 0.5] };
const misfit: LengthRange = { mm: [-5, 5, 0.5], inch: [-3 / 16, 3 / 16, 1 / 64] };
const heights: LengthRange = { mm: [20, 150, 5], inch: [0.75, 6, 0.25] };
const elbowLeast = [5, 85, 5] as const;
const elbowMost = [95, 175, 5] as const;

const setUps: Readonly<Record<PantographSetUp, string>> = {
  'middle-to-end': 'first end fixed, stylus in the middle',
  'end-to-middle': 'first end fixed, pen in the middle',
  'across-the-middle': 'middle fixed, stylus at the first end',
  'across-the-middle-from-the-end': 'middle fixed, stylus at the last end',
};
const drawings: Readonly<Record<DrawingName, string>> = {
  circle: 'a circle',
  square: 'a square',
  herring: 'a herring',
  sign: 'a sign',
};

/** A pantograph, ready to be led. Its drive is how far the stylus has gone along the drawing, mm. */
export function pantographModel(spec: PantographSpec): BenchModel {
  const setup = setUpPantograph(spec);
  const drawing = drawPantograph(setup);
  return {
    spec,
    bounds: boundsOnBoard(spec, drawing.bounds),
    drive: stylusControl(setup),
    admit: (drive) => drive,
    scene: (state, showing) => sceneOnBoard(spec, pantographScene(drawing, state, showing)),
    readouts: (drive) => pantographReadouts(setup, drive),
    describe: (drive) => describePantograph(setup, drive),
    limits: (drive) => pantographLimits(setup, drive),
    remarks: [],
    tables: () => pantographTables(setup),
    plot: pantographPlot(setup),
    handles: (drive) =>
      pantographHandles(setup, drive).map((handle) => ({
        ...handle,
        at: add(handle.at, spec.pinMoved ?? ORIGIN),
      })),
    drag: (handle, from, to, drive) => {
      const seen = (at: Point) => subtract(at, spec.pinMoved ?? ORIGIN);
      return dragPantograph(setup, handle, seen(from), seen(to), drive);
    },
    controls: pantographControls(setup).filter(({ key }) => isSettable(spec, key)),
    placeAt: () => null,
    set: (key, value) => setPantograph(setup, key, value),
    values: { firstHole: spec.firstHole, secondHole: spec.secondHole },
  };
}

function stylusControl({ spec, way }: PantographSetup): DriveControl {
  const { units } = spec;
  const inch = units === 'inch';
  const round = shownLength(way.length, units);
  return {
    verb: 'Lead',
    label: 'Stylus',
    unit: `${lengthUnit(units)} along the drawing`,
    least: 0,
    most: round,
    notch: inch ? 0.05 : 1,
    step: inch ? 0.2 : 5,
    places: inch ? 2 : 1,
    field: lengthField(units ?? 'metric'),
    round,
    toShown: (drive) => shownLength(drive, units),
    fromShown: (shown) => lengthFromShown(shown, units),
    pace: inch
      ? { unit: 'in/s', least: 0.2, most: 2.4, step: 0.1, usual: 1.2, perSecond: 25.4 }
      : { unit: 'mm/s', least: 5, most: 60, step: 5, usual: 30, perSecond: 1 },
    start: spec.drive ?? 0,
  };
}

function holes(spec: PantographSpec, length: number): LengthRange {
  const range = (from: number, to: number, step: number) => [from, to, step] as const;
  const inch = spec.holeStep / 25.4;
  return {
    mm: range(spec.holeStep, length, spec.holeStep),
    inch: range(inch, length / 25.4, inch),
  };
}

function isSettable({ controls }: PantographSpec, key: string): boolean {
  return controls === undefined || controls.includes(key);
}

function pantographControls(setup: PantographSetup): readonly SettingControl[] {
  const { spec } = setup;
  const { units, first, second, firstHole, secondHole } = spec;
  const short = spec.shortBars ?? { stylus: 0, other: 0 };
  return [
    lengthControl(
      'firstHole',
      'Hole on the first bar, from its outer end',
      firstHole,
      holes(spec, first),
      units,
    ),
    lengthControl(
      'secondHole',
      'Hole on the second bar, from the elbow',
      secondHole,
      holes(spec, second),
      units,
    ),
    choice('setUp', 'Set up', spec.setUp, setUps),
    choice('drawing', 'Drawing to follow', spec.drawing.name, drawings),
    lengthControl('height', 'Drawing, high', spec.drawing.height, heights, units),
    ...pinControls(setup),
    lengthControl('first', 'First long bar', first, bars, units),
    lengthControl('second', 'Second long bar', second, bars, units),
    lengthControl('stylusBar', 'Stylus bar too long by', short.stylus, misfit, units),
    lengthControl('otherBar', 'Other short bar too long by', short.other, misfit, units),
    angleControl('elbowLeast', 'Elbow works from', spec.elbow[0], elbowLeast),
    angleControl('elbowMost', 'Elbow works to', spec.elbow[1], elbowMost),
  ];
}

function choice(
  key: string,
  label: string,
  value: string,
  options: Readonly<Record<string, string>>,
): SettingControl {
  return {
    kind: 'choice',
    key,
    label,
    value,
    options: Object.entries(options).map(([each, name]) => ({ value: each, label: name })),
  };
}

function setPantograph(
  setup: PantographSetup,
  key: string,
  value: number | string,
): PantographSpec {
  const { spec } = setup;
  const { units } = spec;
  const number = Number(value);
  const short = spec.shortBars ?? { stylus: 0, other: 0 };
  switch (key) {
    case 'firstHole':
      return { ...spec, firstHole: lengthSet(number, holes(spec, spec.first), units) };
    case 'secondHole':
      return { ...spec, secondHole: lengthSet(number, holes(spec, spec.second), units) };
    case 'first':
    case 'second':
      return withinBars({ ...spec, [key]: lengthSet(number, bars, units) });
    case 'stylusBar':
      return { ...spec, shortBars: { ...short, stylus: lengthSet(number, misfit, units) } };
    case 'otherBar':
      return { ...spec, shortBars: { ...short, other: lengthSet(number, misfit, units) } };
    case 'height':
      return { ...spec, drawing: { ...spec.drawing, height: lengthSet(number, heights, units) } };
    case 'east':
    case 'north':
      return setPin(setup, key, number);
    case 'elbowLeast':
      return { ...spec, elbow: [angleSet(number, elbowLeast), spec.elbow[1]] };
    case 'elbowMost':
      return { ...spec, elbow: [spec.elbow[0], angleSet(number, elbowMost)] };
    case 'setUp':
      return isKey(setUps, value) ? { ...spec, setUp: value, drawing: unplaced(spec) } : spec;
    case 'drawing':
      return isKey(drawings, value) ? { ...spec, drawing: { ...spec.drawing, name: value } } : spec;
    default:
      return spec;
  }
}

function isKey<Keys extends string>(
  names: Readonly<Record<Keys, string>>,
  value: unknown,
): value is Keys {
  return typeof value === 'string' && value in names;
}

/** Another set-up reaches elsewhere, so the drawing is laid where it reaches well. */
function unplaced({ drawing }: PantographSpec): PantographSpec['drawing'] {
  return { name: drawing.name, height: drawing.height };
}

/** Holes stay on their bars when these are made shorter. */
function withinBars(spec: PantographSpec): PantographSpec {
  const hole = (at: number, length: number) =>
    Math.min(at, Math.floor(length / spec.holeStep + 1e-9) * spec.holeStep);
  return {
    ...spec,
    firstHole: hole(spec.firstHole, spec.first),
    secondHole: hole(spec.secondHole, spec.second),
  };
}

function pantographHandles(setup: PantographSetup, drive: number): readonly Handle[] {
  const { spec } = setup;
  const { points, stylus } = setup.pose(drive);
  const pins: Handle[] = [
    { id: 'firstHole', at: points.B, reach: 12, moves: 'setting' },
    { id: 'secondHole', at: points.D, reach: 12, moves: 'setting' },
    { id: 'fixedPin', at: ORIGIN, reach: 14, moves: 'setting' },
  ];
  const settable = pins.filter(({ id }) => isSettable(spec, id === 'fixedPin' ? 'east' : id));
  return [...settable, { id: 'stylus', at: stylus, reach: 14, moves: 'drive' }];
}

function dragPantograph(
  setup: PantographSetup,
  handle: string,
  from: Point,
  to: Point,
  drive: number,
): Dragged {
  const { spec, way } = setup;
  if (handle === 'stylus') {
    const gone = way.nearest(to);
    const off = gone - drive;
    return { kind: 'drive', drive: gone - Math.round(off / way.length) * way.length };
  }
  if (handle === 'fixedPin') return { kind: 'spec', spec: pullPin(setup, from, to) };
  const { O, C, P } = setup.pose(drive).points;
  const along = direction(handle === 'firstHole' ? subtract(C, O) : subtract(P, C));
  const moved = dot(subtract(to, from), polar(1, along));
  const key = handle === 'firstHole' ? 'firstHole' : 'secondHole';
  const most = key === 'firstHole' ? spec.first : spec.second;
  const at = Math.min(most, Math.max(spec.holeStep, toStep(spec[key] + moved, spec.holeStep)));
  return { kind: 'spec', spec: { ...spec, [key]: at } };
}

/** A pantograph with the usual working range of the elbow and nothing out of true. */
export function pantographOf(
  given: Pick<PantographSpec, 'first' | 'second' | 'firstHole' | 'secondHole'> &
    Partial<Omit<PantographSpec, 'bench'>>,
): PantographSpec {
  return {
    holeStep: 10,
    setUp: 'middle-to-end',
    drawing: { name: 'herring', height: 40 },
    elbow: [radians(30), radians(150)],
    ...given,
    bench: 'pantograph',
  };
}
