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
import { dimension, label, lath, line, outline } from './strokes';
import { rimRows, rimsUnrolled, rowsHeight, type RimRows } from './train-rims';
import type { SetWheel, TrainSetup } from './train-setup';
import { troubles } from './train-troubles';

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
  /** Under the crank, over it, and the distances. */
  readonly under: readonly Shape[];
  readonly over: readonly Shape[];
  readonly centres: readonly Shape[];
  /** Null where the rims are not rolled out. */
  readonly rims: RimRows | null;
}

/** Cuts the wheels of a train once; `trainScene` then only turns them. */
export function drawTrain(setup: TrainSetup): TrainDrawing {
  const seen = fromTheFront(setup.wheels);
  const wheels = seen.map((wheel) => ({ wheel, shapes: wheelShapes(setup, wheel) }));
  const reach = leverReach(setup);
  const hidden = new Set(setup.spec.hide ?? []);
  const lever = [lath('driver', { x: 0, y: 0 }, { x: reach, y: 0 }, 2.4 * setup.spec.module)];
  const bounds = trainBounds(setup, reach);
  return {
    setup,
    bounds,
    wheels,
    lever,
    under: [
      ...hiddenEdges(seen),
      ...circlesAndCentres(setup),
      ...troubles(setup),
      ...(hidden.has('sense') ? [] : senseArrows(setup)),
    ],
    over: [...pivots(setup), ...counts(setup)],
    centres: hidden.has('centres') ? [] : centres(setup),
    rims: hidden.has('teeth') ? null : rimRows(setup, bounds),
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
  const { setup, rims } = drawing;
  const wheels = drawing.wheels.map(({ wheel, shapes }): Body => {
    const angle = wheel.phase + (wheel.ratio ?? 0) * drive;
    return { kind: 'body', pose: { ...wheel.centre, angle }, shapes };
  });
  const crank = setup.arbors[setup.crank] ?? { x: 0, y: 0 };
  return {
    bounds: drawing.bounds,
    shapes: [
      ...wheels,
      ...drawing.under,
      {
        kind: 'body',
        pose: { x: crank.x, y: crank.y, angle: drive + leverRest },
        shapes: drawing.lever,
      },
      { kind: 'mark', role: 'driver', symbol: 'handle', at: leverEnd(setup, drive) },
      ...drawing.over,
      ...(showing.dimensions ? drawing.centres : []),
      ...(showing.tracing && rims ? [...rims.still, ...rimsUnrolled(rims, setup, drive)] : []),
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
