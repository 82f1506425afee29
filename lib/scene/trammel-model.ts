import { degrees, radians } from '@/lib/geometry/angle';
import { dot, polar, subtract, type Point } from '@/lib/geometry/point';
import { barAngleForPen } from '@/lib/kinematics/linkage/trammel';
import type { BenchModel, Dragged, DriveControl, Handle, SettingControl } from './bench-model';
import type { TrammelSpec } from './bench-spec';
import { shownLength } from './measure';
import {
  angleControl,
  angleSet,
  degreeField,
  lengthControl,
  lengthSet,
  type LengthRange,
} from './settings';
import { drawTrammel, trammelScene } from './trammel-scene';
import { admitted, barEnds, onBar, setUpTrammel, type TrammelSetup } from './trammel-setup';
import {
  describeTrammel,
  trammelLimits,
  trammelPlot,
  trammelReadouts,
  trammelRemarks,
  trammelTables,
} from './trammel-words';

const turn = 2 * Math.PI;
const ranges = {
  farPin: { mm: [0, 850, 1], inch: [0, 34, 1 / 32] },
  nearPin: { mm: [-400, 850, 1], inch: [-16, 34, 1 / 32] },
  slider: { mm: [20, 80, 5], inch: [0.75, 3, 0.25] },
  groove: { mm: [80, 1000, 10], inch: [3, 40, 0.5] },
} as const satisfies Readonly<Record<string, LengthRange>>;
const skewRange = [-5, 5, 0.5] as const;

/** An elliptic trammel, ready to be turned. Its drive is the bar's angle from the near pin's groove. */
export function trammelModel(spec: TrammelSpec): BenchModel {
  const setup = setUpTrammel(spec);
  const drawing = drawTrammel(setup);
  return {
    spec,
    bounds: drawing.bounds,
    drive: barControl(spec.drive ?? radians(38)),
    admit: (drive) => admitted(setup, drive),
    scene: (state, showing) => trammelScene(drawing, state, showing),
    readouts: (drive) => trammelReadouts(setup, drive),
    describe: (drive) => describeTrammel(setup, drive),
    limits: () => trammelLimits(setup),
    remarks: trammelRemarks(setup),
    tables: () => trammelTables(setup),
    plot: trammelPlot(setup),
    handles: (drive) => trammelHandles(setup, drive),
    drag: (handle, from, to, drive) => dragTrammel(setup, handle, from, to, drive),
    controls: trammelControls(spec).filter(({ key }) => isSettable(spec, key)),
    placeAt: () => null,
    set: (key, value) => setTrammel(spec, key, value),
    values: { farPin: spec.farPin, nearPin: spec.nearPin, farRunsIn: spec.farRunsIn },
  };
}

function isSettable(spec: TrammelSpec, key: string): boolean {
  return spec.controls === undefined || spec.controls.includes(key);
}

function barControl(start: number): DriveControl {
  return {
    verb: 'Turn',
    label: 'Bar',
    unit: '°',
    least: 0,
    most: 360,
    notch: 1,
    step: 5,
    places: 1,
    field: degreeField,
    round: 360,
    toShown: degrees,
    fromShown: radians,
    pace: { unit: 'rpm', least: 5, most: 30, step: 1, usual: 6, perSecond: turn / 60 },
    start,
  };
}

function trammelControls(spec: TrammelSpec): readonly SettingControl[] {
  const { units } = spec;
  return [
    lengthControl('farPin', 'Far pin, from the pen', spec.farPin, ranges.farPin, units),
    lengthControl('nearPin', 'Near pin, from the pen', spec.nearPin, ranges.nearPin, units),
    {
      kind: 'choice',
      key: 'farRunsIn',
      label: 'The far pin runs in',
      value: spec.farRunsIn,
      options: [
        { value: 'north-south', label: 'the north-south groove' },
        { value: 'east-west', label: 'the east-west groove' },
      ],
    },
    lengthControl('groove', 'Length of each groove', spec.groove, ranges.groove, units),
    lengthControl('slider', 'Length of each slider', spec.slider, ranges.slider, units),
    angleControl('skew', 'Grooves out of square by', spec.skew, skewRange),
    {
      kind: 'choice',
      key: 'held',
      label: 'Held fast',
      value: spec.held,
      options: [
        { value: 'board', label: 'the board' },
        { value: 'bar', label: 'the bar: the board turns' },
      ],
    },
  ];
}

function setTrammel(spec: TrammelSpec, key: string, value: number | string): TrammelSpec {
  const { units } = spec;
  switch (key) {
    case 'farPin':
    case 'nearPin':
    case 'groove':
    case 'slider':
      return { ...spec, [key]: lengthSet(Number(value), ranges[key], units) };
    case 'farRunsIn':
      return { ...spec, farRunsIn: value === 'east-west' ? 'east-west' : 'north-south' };
    case 'skew':
      return { ...spec, skew: angleSet(Number(value), skewRange) };
    case 'held':
      return { ...spec, held: value === 'bar' ? 'bar' : 'board' };
    default:
      return spec;
  }
}

function trammelHandles(setup: TrammelSetup, drive: number): readonly Handle[] {
  const { spec } = setup;
  const pose = setup.pose(drive);
  const angle = drive + setup.turned;
  const reach = spec.slider / 2;
  const pins = (['farPin', 'nearPin'] as const)
    .filter((key) => isSettable(spec, key))
    .map((key): Handle => ({
      id: key,
      at: onBar(pose, angle, spec[key]),
      reach,
      moves: 'setting',
    }));
  const held = spec.held === 'bar' ? [] : pins;
  const place = (handle: Handle): Handle => ({ ...handle, at: seen(setup, drive, handle.at) });
  const tail = onBar(pose, angle, barEnds(setup).tail);
  const driving: Handle[] =
    spec.held === 'bar'
      ? [{ id: 'board', at: { x: 0, y: 0 }, reach: spec.groove / 2, moves: 'drive' }]
      : [
          { id: 'tail', at: tail, reach, moves: 'drive' },
          { id: 'pen', at: pose.pen, reach, moves: 'drive' },
        ];
  return [...held, ...driving].map(place);
}

/** A point of the board as it is drawn: where it is, or turned under a bar that is held. */
function seen(setup: TrammelSetup, drive: number, at: Point): Point {
  if (setup.spec.held === 'board') return at;
  const away = subtract(at, setup.pose(drive).pen);
  const angle = -(drive + setup.turned);
  return {
    x: away.x * Math.cos(angle) - away.y * Math.sin(angle),
    y: away.x * Math.sin(angle) + away.y * Math.cos(angle),
  };
}

function dragTrammel(
  setup: TrammelSetup,
  handle: string,
  from: Point,
  to: Point,
  drive: number,
): Dragged {
  const { spec, trammel, turned } = setup;
  if (handle === 'farPin' || handle === 'nearPin') {
    const along = dot(subtract(from, to), polar(1, drive + turned));
    const mm = spec[handle] + along;
    const shown = shownLength(mm, spec.units);
    return {
      kind: 'spec',
      spec: { ...spec, [handle]: lengthSet(shown, ranges[handle], spec.units) },
    };
  }
  if (handle === 'board') {
    const middle = seen(setup, drive, { x: 0, y: 0 });
    const [a, b] = [subtract(from, middle), subtract(to, middle)];
    const swing = Math.atan2(a.x * b.y - a.y * b.x, dot(a, b));
    return { kind: 'drive', drive: drive - swing };
  }
  const tail = handle === 'tail' ? barEnds(setup).tail : 0;
  const led = {
    ...trammel,
    uprightPin: trammel.uprightPin - tail,
    levelPin: trammel.levelPin - tail,
  };
  const angle = barAngleForPen(led, to) - turned;
  const off = angle - drive;
  return { kind: 'drive', drive: drive + Math.atan2(Math.sin(off), Math.cos(off)) };
}
