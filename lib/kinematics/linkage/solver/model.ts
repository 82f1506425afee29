import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import type { Point } from '@/lib/geometry/point';
import {
  apartPair,
  coincide,
  distanceOf,
  rigidOf,
  type Body,
} from '@/lib/kinematics/linkage/solver/body';
import type { Linkage, Relation, SlideRelation } from '@/lib/kinematics/linkage/solver/linkage';

/** A linkage with names turned into numbers, checked. */
export interface Model {
  readonly names: readonly string[];
  readonly start: Float64Array;
  readonly fixed: ReadonlySet<number>;
  readonly bodies: readonly Body[];
  readonly slides: readonly SlideRelation[];
  /** By slide: the place in the drive that runs it. */
  readonly runs: ReadonlyMap<SlideRelation, number>;
  readonly leads: readonly { readonly point: number; readonly drive: number }[];
  readonly driveLength: number;
  /** Greatest distance of two points of the starting pose: the scale for tolerances. */
  readonly size: number;
}

const CALLER = 'planLinkage';

/** Numbers for names, and every argument looked at: throws `RangeError` for nonsense. */
export function modelOf(linkage: Linkage): Model {
  const entries = Object.entries(linkage.points);
  const names = entries.map(([name]) => name);
  const numbers = new Map(names.map((name, k) => [name, k]));
  const find = (name: string): number => {
    const found = numbers.get(name);
    if (found === undefined)
      throw new RangeError(`${CALLER}: point is ${name}; expected a point of the linkage`);
    return found;
  };
  const start = new Float64Array(2 * names.length);
  entries.forEach(([name, { x, y }], k) => {
    start[2 * k] = requireMeasure(CALLER, `${name}.x`, x);
    start[2 * k + 1] = requireMeasure(CALLER, `${name}.y`, y);
  });
  const slides = (linkage.slides ?? []).map(({ point, along, through, offset = 0 }) => ({
    kind: 'slide' as const,
    p: find(point),
    through: find(through ?? along[0]),
    from: find(along[0]),
    to: find(along[1]),
    offset: requireMeasure(CALLER, 'offset', offset),
  }));
  const drivers = numberDrivers(linkage, find);
  const bodies = bodiesOf(linkage, find).map((body) => {
    const driven = drivers.angles.find(
      ({ from, to }) => body.shape.has(from) && body.shape.has(to),
    );
    return driven ? { ...body, driven } : body;
  });
  for (const angle of drivers.angles) {
    const held = bodies.filter(({ shape }) => shape.has(angle.from) && shape.has(angle.to));
    if (held.length === 0 || held.some(({ shape }) => coincide(shape, angle.from, angle.to))) {
      throw new RangeError(
        `${CALLER}: driver turns ${names[angle.from]} to ${names[angle.to]}; expected two points of one bar or plate, apart`,
      );
    }
  }
  const runs = new Map(
    drivers.runs.map(({ point, drive }) => [slideOf(slides, point, names), drive]),
  );
  const size = Math.max(
    spreadOf(start),
    ...bodies.map(({ shape }) => spreadOf([...shape.values()].flatMap(({ x, y }) => [x, y]))),
  );
  return {
    names,
    start,
    fixed: new Set(linkage.fixed.map(find)),
    bodies,
    slides,
    runs,
    leads: drivers.leads,
    driveLength: drivers.length,
    size: requireSize(CALLER, 'size', size),
  };
}

/** Every relation of a body, its first two points carrying the others. */
export function relationsOf({ points, shape, pair, driven }: Body): readonly Relation[] {
  const [a, b] = pair;
  const rest = points.filter((p) => p !== a && p !== b);
  const turned: Relation[] = driven
    ? [{ kind: 'angle', a: driven.from, b: driven.to, shift: 0, drive: driven.drive }]
    : [];
  return [distanceOf(shape, a, b), ...rest.map((p) => rigidOf(shape, p, a, b)), ...turned];
}

function bodiesOf(linkage: Linkage, find: (name: string) => number): readonly Body[] {
  const bars = (linkage.bars ?? []).map(({ ends, length }) => {
    requireSize(CALLER, `length of bar ${ends.join('–')}`, length);
    return { [ends[0]]: { x: 0, y: 0 }, [ends[1]]: { x: length, y: 0 } };
  });
  const plates = (linkage.plates ?? []).map(({ shape }) => shape);
  return [...bars, ...plates].map((shape) => {
    const entries = Object.entries(shape);
    const named = new Map(entries.map(([name, at]) => [find(name), measured(name, at)]));
    const pair = apartPair(named, [...named.keys()]);
    if (!pair) {
      throw new RangeError(
        `${CALLER}: body is ${entries.map(([name]) => name).join(', ')}; expected two points apart`,
      );
    }
    return { points: [...named.keys()], shape: named, pair };
  });
}

function measured(name: string, { x, y }: Point): Point {
  return { x: requireMeasure(CALLER, `${name}.x`, x), y: requireMeasure(CALLER, `${name}.y`, y) };
}

function numberDrivers(linkage: Linkage, find: (name: string) => number) {
  const angles: { from: number; to: number; drive: number }[] = [];
  const runs: { point: number; drive: number }[] = [];
  const leads: { point: number; drive: number }[] = [];
  let length = 0;
  for (const driver of linkage.drivers) {
    if (driver.kind === 'angle')
      angles.push({ from: find(driver.from), to: find(driver.to), drive: length });
    else if (driver.kind === 'slide') runs.push({ point: find(driver.point), drive: length });
    else leads.push({ point: find(driver.point), drive: length });
    length += driver.kind === 'lead' ? 2 : 1;
  }
  return { angles, runs, leads, length };
}

function slideOf(
  slides: readonly SlideRelation[],
  point: number,
  names: readonly string[],
): SlideRelation {
  const slide = slides.find(({ p }) => p === point);
  if (!slide)
    throw new RangeError(
      `${CALLER}: driver slides ${names[point]}; expected a point with a groove`,
    );
  return slide;
}

/** The diagonal of the box round points given as x, y, x, y … */
function spreadOf(values: ArrayLike<number>): number {
  const xs = Array.from(values).filter((_, k) => k % 2 === 0);
  const ys = Array.from(values).filter((_, k) => k % 2 === 1);
  return Math.hypot(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys));
}
