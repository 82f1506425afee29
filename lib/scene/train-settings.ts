import type { Point } from '@/lib/geometry/point';
import type { Arbor, FreeTrainSpec, PostsTrainSpec, SettingValues, TrainSpec } from './bench-spec';
import { lengthField, plainField, countField, type Field } from '@/lib/quantities/field';
import type { ChoiceControl, NumberControl, SettingControl } from './bench-model';
import { degrees, radians } from '@/lib/geometry/angle';
import { handsOn, standard, takes } from './train-setup';
import { wheelName, wheelTray } from './train-tray';

/** Inch learners choose a diametral pitch, teeth for each inch of pitch diameter. */
const pitches = [3, 4, 5, 6, 8, 10, 12];
const millimetresInAnInch = 25.4;
const angleField: Field = { dimension: 'angle', unit: '°' };
const mostArbors = 6;
const wheelInTheDrawer = 24;

/** Every control of a train, whatever the learner may use of them. */
export function trainControls(spec: TrainSpec): readonly SettingControl[] {
  if (spec.layout === 'between-posts') return postsControls(spec);
  const { arbors } = spec;
  return [
    wheelTray(arbors),
    ...arbors.flatMap((arbor, index) => arborControls(arbors, arbor, index)),
    toothSize(spec),
    ...(arbors.length < mostArbors
      ? [{ kind: 'action', key: 'add', label: 'Add an arbor' } as const]
      : []),
    ...(arbors.length > 2
      ? [{ kind: 'action', key: 'remove', label: 'Take the last arbor off' } as const]
      : []),
  ];
}

function postsControls(spec: PostsTrainSpec): readonly SettingControl[] {
  return [
    count('lastTeeth', 'Last wheel', spec.lastTeeth, 12, 96, 'teeth'),
    count('idlers', 'Idlers between', spec.idlers, 0, 2, ''),
    count('idlerTeeth', 'Each idler', spec.idlerTeeth, 12, 60, 'teeth'),
  ];
}

function arborControls(
  arbors: readonly Arbor[],
  arbor: Arbor,
  index: number,
): readonly SettingControl[] {
  const name = `Arbor ${index + 1}`;
  const teeth = arbor.wheels.map(({ teeth: value }, wheel) =>
    count(`teeth:${index}:${wheel}`, wheelName(arbor, index, wheel), value, 6, 96, 'teeth'),
  );
  const wheels: ChoiceControl = {
    kind: 'choice',
    key: `wheels:${index}`,
    label: `${name}, wheels`,
    value: arbor.wheels.length < 2 ? 'one' : arbor.fast ? 'fast' : 'loose',
    options: [
      { value: 'one', label: 'one wheel' },
      { value: 'fast', label: 'two, fast together' },
      { value: 'loose', label: 'two, loose' },
    ],
  };
  const before = arbors[index - 1];
  if (!before) return [...teeth, wheels];
  const angle = Math.round(degrees(Math.atan2(arbor.y - before.y, arbor.x - before.x)));
  const bend: NumberControl = {
    kind: 'number',
    key: `bend:${index}`,
    label: `${name}, direction from arbor ${index}`,
    unit: '°',
    value: angle,
    text: String(angle),
    field: angleField,
    least: -180,
    most: 180,
    step: 5,
    spoken: `${angle} degrees`,
  };
  return [...teeth, wheels, bend];
}

function count(
  key: string,
  label: string,
  value: number,
  least: number,
  most: number,
  unit: string,
): NumberControl {
  const field = unit === '' ? plainField : countField(unit);
  const spoken = `${value} ${unit}`.trim();
  const text = String(value);
  return { kind: 'number', key, label, unit, value, text, field, least, most, step: 1, spoken };
}

function toothSize(spec: FreeTrainSpec): SettingControl {
  if (spec.units === 'inch') {
    const pitch = String(Math.round(millimetresInAnInch / spec.module));
    return {
      kind: 'choice',
      key: 'module',
      label: 'Teeth to the inch of diameter, P',
      value: pitch,
      options: pitches.map((value) => ({ value: String(value), label: String(value) })),
    };
  }
  return {
    kind: 'number',
    key: 'module',
    label: 'Module',
    unit: 'mm',
    value: spec.module,
    text: String(spec.module),
    field: lengthField('metric'),
    least: 2,
    most: 8,
    step: 0.5,
    spoken: `${spec.module} millimetres`,
  };
}

/** A train with one setting changed; wheels that meshed still mesh afterwards. */
export function setTrain(spec: TrainSpec, key: string, value: number | string): TrainSpec {
  if (spec.layout === 'between-posts') return { ...spec, [key]: Number(value) };
  const [what, arborText, wheelText] = key.split(':');
  const [index, wheel] = [Number(arborText), Number(wheelText)];
  const { arbors } = spec;
  switch (what) {
    case 'module': {
      const size = spec.units === 'inch' ? millimetresInAnInch / Number(value) : Number(value);
      return { ...spec, module: size, arbors: reseated(spec, arbors, size) };
    }
    case 'teeth': {
      const changed = withTeeth(arbors, index, wheel, Math.round(Number(value)));
      return { ...spec, arbors: reseated(spec, changed) };
    }
    case 'wheels':
      return { ...spec, arbors: reseated(spec, withWheels(arbors, index, String(value))) };
    case 'bend':
      return { ...spec, arbors: bent(spec, index, radians(Number(value))) };
    case 'add':
      return { ...spec, arbors: withArbor(spec) };
    case 'remove':
      return {
        ...spec,
        arbors: arbors.slice(0, -1),
        crank: Math.min(spec.crank, arbors.length - 2),
      };
    default:
      return spec;
  }
}

function withTeeth(
  arbors: readonly Arbor[],
  index: number,
  wheel: number,
  teeth: number,
): readonly Arbor[] {
  return arbors.map((arbor, i) =>
    i === index
      ? { ...arbor, wheels: arbor.wheels.map((old, j) => (j === wheel ? { teeth } : old)) }
      : arbor,
  );
}

function withWheels(arbors: readonly Arbor[], index: number, value: string): readonly Arbor[] {
  return arbors.map((arbor, i) => {
    if (i !== index) return arbor;
    const first = arbor.wheels[0] ?? { teeth: wheelInTheDrawer };
    const second = arbor.wheels[1] ?? { teeth: Math.max(8, Math.round(first.teeth / 2)) };
    return {
      ...arbor,
      wheels: value === 'one' ? [first] : [first, second],
      fast: value !== 'loose',
    };
  });
}

/**
 * The arbors moved along so that the pairs that meshed before mesh again; gaps stay as wide as they
 * were, and the row keeps its bends.
 */
function reseated(
  before: FreeTrainSpec,
  arbors: readonly Arbor[],
  module = before.module,
): readonly Arbor[] {
  const placed: Arbor[] = [];
  arbors.forEach((arbor, index) => {
    const [last, oldLast, old] = [placed.at(-1), before.arbors[index - 1], before.arbors[index]];
    if (!last || !oldLast || !old) {
      placed.push(arbor);
      return;
    }
    const angle = Math.atan2(old.y - oldLast.y, old.x - oldLast.x);
    const apart = Math.hypot(old.x - oldLast.x, old.y - oldLast.y);
    const gap = apart - standard(before.module, handsOn(oldLast), takes(old));
    const distance = standard(module, handsOn(last), takes(arbor)) + gap;
    placed.push({ ...arbor, ...from(last, distance, angle) });
  });
  return placed;
}

function bent(spec: FreeTrainSpec, index: number, angle: number): readonly Arbor[] {
  const [pivot, moved] = [spec.arbors[index - 1], spec.arbors[index]];
  if (!pivot || !moved) return spec.arbors;
  const distance = standard(spec.module, handsOn(pivot), takes(moved));
  const place = from(pivot, distance, angle);
  const [dx, dy] = [place.x - moved.x, place.y - moved.y];
  return spec.arbors.map((arbor, i) =>
    i < index ? arbor : { ...arbor, x: arbor.x + dx, y: arbor.y + dy },
  );
}

function withArbor(spec: FreeTrainSpec): readonly Arbor[] {
  const last = spec.arbors.at(-1);
  if (!last) return spec.arbors;
  const distance = standard(spec.module, handsOn(last), wheelInTheDrawer);
  const next = { ...from(last, distance, 0), wheels: [{ teeth: wheelInTheDrawer }], fast: true };
  return [...spec.arbors, next];
}

/** An arbor put down at a place: it snaps to mesh with its neighbours where it comes near enough. */
export function putArbor(spec: FreeTrainSpec, index: number, place: Point): FreeTrainSpec {
  const arbor = spec.arbors[index];
  if (!arbor) return spec;
  const neighbours = [
    { at: spec.arbors[index - 1], reach: standardTo(spec, index - 1) },
    { at: spec.arbors[index + 1], reach: standardTo(spec, index) },
  ].flatMap(({ at, reach }) => (at && reach !== null ? [{ at, reach }] : []));
  let seat = place;
  for (let pass = 0; pass < 8; pass += 1) {
    for (const { at, reach } of neighbours) {
      const [dx, dy] = [seat.x - at.x, seat.y - at.y];
      const away = Math.hypot(dx, dy);
      if (away > 0 && Math.abs(away - reach) <= 1.5 * spec.module) {
        seat = { x: at.x + (dx * reach) / away, y: at.y + (dy * reach) / away };
      }
    }
  }
  const arbors = spec.arbors.map((old, i) =>
    i === index ? { ...old, x: seat.x, y: seat.y } : old,
  );
  return { ...spec, arbors };
}

/** The distance at which an arbor and the next one mesh. */
function standardTo(spec: FreeTrainSpec, index: number): number | null {
  const [first, second] = [spec.arbors[index], spec.arbors[index + 1]];
  return first && second ? standard(spec.module, handsOn(first), takes(second)) : null;
}

/** What an exercise reads off a train. */
export function trainValues(spec: TrainSpec): SettingValues {
  if (spec.layout === 'between-posts') {
    return { lastTeeth: spec.lastTeeth, idlers: spec.idlers, idlerTeeth: spec.idlerTeeth };
  }
  return Object.fromEntries(
    spec.arbors.flatMap(({ wheels }, index) =>
      wheels.map(({ teeth }, wheel) => [`teeth:${index}:${wheel}`, teeth]),
    ),
  );
}

function from(point: Point, distance: number, angle: number): Point {
  return { x: point.x + distance * Math.cos(angle), y: point.y + distance * Math.sin(angle) };
}
