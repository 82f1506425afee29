import type { Point } from '@/lib/geometry/point';
import { involuteOutline } from '@/lib/kinematics/gear/outline';
import type { DriveState, Showing } from './bench-model';
import { ruleText } from './measure';
import {
  boundsOf,
  grown,
  withAspect,
  type Arc,
  type Body,
  type Bounds,
  type Scene,
  type Shape,
} from './scene';
import { dimension, hatch, label, lath, line, outline } from './strokes';
import { rimsUnrolled, rowsHeight } from './train-rims';
import type { SetPair, SetWheel, TrainSetup } from './train-setup';

/** Drawn with a little air between the flanks, in modules. */
const drawnBacklash = 0.04;
const pressureAngle = Math.PI / 9;
/** A pinion of fewer teeth needs what unit 3 tells. */
export const fewestSoundTeeth = 8;

/** What stands still of a train's drawing, and the parts that only turn. */
export interface TrainDrawing {
  readonly setup: TrainSetup;
  readonly bounds: Bounds;
  readonly wheels: readonly { readonly wheel: SetWheel; readonly shapes: readonly Shape[] }[];
  readonly lever: readonly Shape[];
  readonly fixed: readonly Shape[];
}

/** Cuts the wheels of a train once; `trainScene` then only turns them. */
export function drawTrain(setup: TrainSetup): TrainDrawing {
  const seen = fromTheFront(setup.wheels);
  const wheels = seen.map((wheel) => ({ wheel, shapes: wheelShapes(setup, wheel) }));
  const reach = leverReach(setup);
  const lever = [lath('driver', { x: 0, y: 0 }, { x: reach, y: 0 }, 2.4 * setup.spec.module)];
  return {
    setup,
    bounds: trainBounds(setup, reach),
    wheels,
    lever,
    fixed: [...hiddenEdges(seen), ...circlesAndCentres(setup), ...troubles(setup)],
  };
}

/** How far out on the crank the hand takes hold, mm. */
export function leverReach({ wheels, crank, spec }: TrainSetup): number {
  const tips = wheels.filter(({ arbor }) => arbor === crank).map(({ tipRadius }) => tipRadius);
  return Math.max(...tips) + 4 * spec.module;
}

/** Where the crank's handle stands. */
export function leverEnd(setup: TrainSetup, drive: number): Point {
  const { x, y } = setup.arbors[setup.crank] ?? { x: 0, y: 0 };
  const reach = leverReach(setup);
  const angle = drive + leverRest;
  return { x: x + reach * Math.cos(angle), y: y + reach * Math.sin(angle) };
}

/** The crank hangs down on the left at the start, clear of the wheels that follow. */
const leverRest = (Math.PI * 7) / 6;

/** A train with its crank at `drive`, back to front. */
export function trainScene(drawing: TrainDrawing, { drive }: DriveState, showing: Showing): Scene {
  const { setup } = drawing;
  const wheels = drawing.wheels.map(({ wheel, shapes }): Body => {
    const angle = wheel.phase + (wheel.ratio ?? 0) * drive;
    return { kind: 'body', pose: { ...wheel.centre, angle }, shapes };
  });
  const crank = setup.arbors[setup.crank] ?? { x: 0, y: 0 };
  const hidden = new Set(setup.spec.hide ?? []);
  return {
    bounds: drawing.bounds,
    shapes: [
      ...wheels,
      ...drawing.fixed,
      ...(hidden.has('sense') ? [] : senseArrows(setup)),
      {
        kind: 'body',
        pose: { x: crank.x, y: crank.y, angle: drive + leverRest },
        shapes: drawing.lever,
      },
      { kind: 'mark', role: 'driver', symbol: 'handle', at: leverEnd(setup, drive) },
      ...pivots(setup),
      ...counts(setup),
      ...(showing.dimensions && !hidden.has('centres') ? centres(setup) : []),
      ...(showing.tracing && !hidden.has('teeth')
        ? rimsUnrolled(setup, drive, drawing.bounds)
        : []),
    ],
  };
}

/** Back to front, seen from the side on which the pinions lie in front of their wheels. */
function fromTheFront(wheels: readonly SetWheel[]): readonly SetWheel[] {
  let pinionsAbove = 0;
  wheels.forEach((wheel, index) => {
    const next = wheels[index + 1];
    if (next?.arbor === wheel.arbor) pinionsAbove += next.teeth <= wheel.teeth ? 1 : -1;
  });
  const side = pinionsAbove < 0 ? -1 : 1;
  return [...wheels].sort((a, b) => side * (a.layer - b.layer));
}

function wheelShapes(setup: TrainSetup, wheel: SetWheel): readonly Shape[] {
  const { module } = setup.spec;
  const points = involuteOutline({
    module,
    teeth: wheel.teeth,
    pressureAngle,
    backlash: drawnBacklash * module,
    flankSteps: 4,
    filletSteps: 3,
  });
  const driven = wheel.arbor === setup.crank ? 'driver' : 'timber';
  const face = wheel.teeth < fewestSoundTeeth ? 'hidden' : driven;
  const tooth = points.slice(0, Math.round(points.length / wheel.teeth));
  return [outline(face, points, true), outline('tracing', tooth, false)];
}

/** The rim of a wheel behind another, dashed where the one in front covers it. */
function hiddenEdges(seen: readonly SetWheel[]): readonly Shape[] {
  return seen.flatMap((behind, index) =>
    seen
      .slice(index + 1)
      .filter((front) => front.layer !== behind.layer)
      .flatMap((front) => coveredArc(behind, front)),
  );
}

function coveredArc(behind: SetWheel, front: SetWheel): readonly Arc[] {
  const [r, cover] = [behind.tipRadius, front.tipRadius];
  const { centre } = behind;
  const away = Math.hypot(front.centre.x - centre.x, front.centre.y - centre.y);
  if (away >= r + cover || away + cover <= r) return [];
  const arc = { kind: 'arc', role: 'hidden', centre, radius: r } as const;
  if (away + r <= cover) return [{ ...arc, from: 0, to: 2 * Math.PI - 1e-6 }];
  const towards = Math.atan2(front.centre.y - centre.y, front.centre.x - centre.x);
  const half = Math.acos((r * r + away * away - cover * cover) / (2 * r * away));
  return [{ ...arc, from: towards - half, to: towards + half }];
}

function circlesAndCentres(setup: TrainSetup): readonly Shape[] {
  const lines = setup.pairs
    .filter(({ inTrain }) => inTrain)
    .map(({ first, second }) => line('centre', first.centre, second.centre));
  const circles = setup.wheels.map(({ centre, pitchRadius }): Shape => ({
    kind: 'circle',
    role: 'pitch',
    centre,
    radius: pitchRadius,
  }));
  return [...lines, ...circles];
}

function pivots(setup: TrainSetup): readonly Shape[] {
  return setup.arbors.map(({ x, y }): Shape => ({
    kind: 'mark',
    role: 'outline',
    symbol: 'fixed-pivot',
    at: { x, y },
  }));
}

/** Tooth counts, a pair's as `36 / 14`, above the wheels of each arbor. */
function counts(setup: TrainSetup): readonly Shape[] {
  return setup.arbors.map((arbor, index): Shape => {
    const own = setup.wheels.filter((wheel) => wheel.arbor === index);
    const top = Math.max(...own.map(({ tipRadius }) => tipRadius));
    return label(
      own.map(({ teeth }) => String(teeth)).join(' / '),
      { x: arbor.x, y: arbor.y + top },
      {
        nudge: { x: 0, y: 11 },
      },
    );
  });
}

/** Which way each arbor turns when the crank turns to the right. */
function senseArrows(setup: TrainSetup): readonly Shape[] {
  return setup.arbors.flatMap((arbor, index): Shape[] => {
    const own = setup.wheels.filter((wheel) => wheel.arbor === index);
    const ratio = setup.stuck ? null : (own.at(-1)?.ratio ?? null);
    if (ratio === null) return [];
    const radius = 0.62 * Math.min(...own.map(({ pitchRadius }) => pitchRadius));
    const [from, to] = [Math.PI * 0.25, Math.PI * 0.75];
    const right = ratio > 0;
    const end = right ? from : to;
    const at = { x: arbor.x + radius * Math.cos(end), y: arbor.y + radius * Math.sin(end) };
    return [
      { kind: 'arc', role: 'arrow', centre: arbor, radius, from, to },
      {
        kind: 'mark',
        role: 'arrow',
        symbol: 'sense',
        at,
        angle: right ? end - Math.PI / 2 : end + Math.PI / 2,
      },
    ];
  });
}

/** Distances between arbors: under the whole train, or beside a pair that is bent out of line. */
function centres(setup: TrainSetup): readonly Shape[] {
  const lowest = Math.min(...setup.wheels.map(({ centre, tipRadius }) => centre.y - tipRadius));
  return setup.pairs
    .filter(({ inTrain }) => inTrain)
    .flatMap(({ first, second, distance }) => {
      const [left, right] = first.centre.x <= second.centre.x ? [first, second] : [second, first];
      const level = Math.abs(left.centre.y - right.centre.y) < 1e-6;
      const clear = level ? left.centre.y - lowest : Math.max(first.tipRadius, second.tipRadius);
      const below = clear + 3 * setup.spec.module;
      return dimension(left.centre, right.centre, -below, ruleText(distance, setup.spec.units));
    });
}

/** What does not fit, drawn in madder: open gaps, and teeth that run into each other. */
function troubles(setup: TrainSetup): readonly Shape[] {
  return setup.pairs.flatMap((pair): readonly Shape[] => {
    if (pair.state.outcome === 'apart') return gap(pair, setup);
    return pair.state.outcome === 'too-close' ? overlap(pair, setup) : [];
  });
}

function gap({ first, second, state }: SetPair, setup: TrainSetup): readonly Shape[] {
  const angle = Math.atan2(second.centre.y - first.centre.y, second.centre.x - first.centre.x);
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const rim = ({ centre, pitchRadius }: SetWheel, way: number): Point => ({
    x: centre.x + way * pitchRadius * c,
    y: centre.y + way * pitchRadius * s,
  });
  const [from, to] = [rim(first, 1), rim(second, -1)];
  return [
    ...[first, second].map(({ centre, pitchRadius }): Shape => ({
      kind: 'circle',
      role: 'limit',
      centre,
      radius: pitchRadius,
    })),
    line('limit', from, to),
    label(ruleText(state.gap, setup.spec.units), to, { role: 'madder', nudge: { x: 0, y: -14 } }),
  ];
}

function overlap({ first, second, distance, state }: SetPair, setup: TrainSetup): readonly Shape[] {
  const lens = lensOf(first, second, distance);
  const points = lens.flatMap(({ x, y }) => [x, y]);
  const middle = lens[0] ?? first.centre;
  return [
    outline('clash', lens, true),
    ...hatch(points, setup.spec.module),
    label(ruleText(-state.gap, setup.spec.units), middle, {
      role: 'madder',
      nudge: { x: 0, y: 12 },
    }),
  ];
}

/** The region common to two tip circles. */
function lensOf(first: SetWheel, second: SetWheel, distance: number): readonly Point[] {
  const side = (of: SetWheel, other: SetWheel): Point[] => {
    const [r, q] = [of.tipRadius, other.tipRadius];
    const cosine = (r * r + distance * distance - q * q) / (2 * r * distance);
    const half = Math.acos(Math.min(1, Math.max(-1, cosine)));
    const towards = Math.atan2(other.centre.y - of.centre.y, other.centre.x - of.centre.x);
    return Array.from({ length: 13 }, (_, i) => {
      const angle = towards - half + (half * i) / 6;
      return { x: of.centre.x + r * Math.cos(angle), y: of.centre.y + r * Math.sin(angle) };
    });
  };
  return [...side(first, second), ...side(second, first)];
}

function trainBounds(setup: TrainSetup, reach: number): Bounds {
  const { module } = setup.spec;
  const crank = setup.arbors[setup.crank] ?? { x: 0, y: 0 };
  const corners = [
    ...setup.wheels.map(({ centre, tipRadius }) => ({ centre, radius: tipRadius + 3 * module })),
    { centre: crank, radius: reach + 2 * module },
  ].flatMap(({ centre: { x, y }, radius }) => [
    { x: x - radius, y: y - radius },
    { x: x + radius, y: y + radius },
  ]);
  const wheels = grown(boundsOf(corners), 2.5 * module);
  const width = wheels.right - wheels.left;
  const hidden = setup.spec.hide?.includes('teeth') ?? false;
  const below = hidden ? 0 : width * rowsHeight(setup.wheels.length);
  return withAspect({ ...wheels, bottom: wheels.bottom - below }, 1.5, 2.6);
}
