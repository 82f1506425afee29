import { between, distance, norm, ORIGIN, scale, type Point } from '@/lib/geometry/point';
import type { PantographCorner } from '@/lib/kinematics/linkage/pantograph';
import type { DriveState, Showing } from './bench-model';
import { lengthText, ruleText } from './measure';
import {
  elbowWorks,
  overlapOf,
  penBetween,
  type PantographPose,
  type PantographSetup,
} from './pantograph-setup';
import {
  boundsOf,
  grown,
  withAspect,
  type Body,
  type Bounds,
  type Scene,
  type Shape,
} from './scene';
import { dimension, hatch, label, lath, line, outline } from './strokes';
import { trail } from './trail';

/** Bars this wide are what the shop uses, mm. */
const barWidth = 20;
const holeRadius = 2;
const faint = 0.6;
/** A pen this near to the line, mm, is in it. */
export const inLine = 0.05;

/** What of a pantograph's drawing stands still, and its bars in their own frames. */
export interface PantographDrawing {
  readonly setup: PantographSetup;
  readonly bounds: Bounds;
  readonly paper: readonly Shape[];
  /** The whole copy, faint; the chalk behind the pen is fresher. */
  readonly copy: readonly Shape[];
  readonly bars: Readonly<Record<'works' | 'binds', Bars>>;
}

interface Bars {
  readonly first: readonly Shape[];
  readonly second: readonly Shape[];
  readonly stylus: readonly Shape[];
  readonly other: readonly Shape[];
}

/** Draws a pantograph's bars and paper once; `pantographScene` then moves the bars. */
export function drawPantograph(setup: PantographSetup): PantographDrawing {
  return {
    setup,
    bounds: pantographBounds(setup),
    paper: paper(setup),
    copy: wholeCopy(setup),
    bars: { works: barsOf(setup, 'timber'), binds: barsOf(setup, 'clash') },
  };
}

/** A pantograph with its stylus at `drive` along the drawing, back to front. */
export function pantographScene(
  drawing: PantographDrawing,
  state: DriveState,
  showing: Showing,
): Scene {
  const { setup } = drawing;
  const { spec, way, roles } = setup;
  const pose = setup.pose(state.drive);
  const { O, B, C, D, M, P } = pose.points;
  const bars = drawing.bars[elbowWorks(setup, pose.elbow) ? 'works' : 'binds'];
  const hidden = new Set(spec.hide ?? []);
  const traced =
    showing.tracing && !hidden.has('path')
      ? [...drawing.copy, ...trail(state, way.length / 3, (drive) => penBetween(setup, drive))]
      : [];
  return {
    bounds: drawing.bounds,
    shapes: [
      ...drawing.paper,
      ...(hidden.has('path') ? [] : overlapShown(setup)),
      ...traced,
      barBody(B, M, bars.stylus),
      barBody(D, M, bars.other),
      barBody(O, C, bars.first),
      barBody(C, P, bars.second),
      ...(showing.tracing && !hidden.has('line') ? thread(setup, pose) : []),
      ...([B, C, D].map((at) => ({
        kind: 'mark',
        role: 'outline',
        symbol: 'moving-pivot',
        at,
      })) satisfies Shape[]),
      ...corners(pose.points, roles),
      ...(showing.dimensions ? measures(setup, pose) : []),
    ],
  };
}

function barsOf({ spec, samples }: PantographSetup, role: 'timber' | 'clash'): Bars {
  const holes = (length: number): Shape[] =>
    Array.from({ length: Math.max(0, Math.ceil(length / spec.holeStep) - 1) }, (_, i) => ({
      kind: 'circle',
      role: 'hole',
      centre: { x: (i + 1) * spec.holeStep, y: 0 },
      radius: holeRadius,
    }));
  const bar = (length: number): Shape => lath(role, ORIGIN, { x: length, y: 0 }, barWidth);
  const { B, D, M } = samples[0]?.points ?? { B: ORIGIN, D: ORIGIN, M: ORIGIN };
  return {
    first: [bar(spec.first), ...holes(spec.first)],
    second: [bar(spec.second), ...holes(spec.second)],
    stylus: [bar(distance(B, M))],
    other: [bar(distance(D, M))],
  };
}

function barBody(from: Point, to: Point, shapes: readonly Shape[]): Body {
  const angle = Math.atan2(to.y - from.y, to.x - from.x);
  return { kind: 'body', pose: { x: from.x, y: from.y, angle }, shapes };
}

/** The drawing, dashed where it lies beyond the working reach. */
function paper({ way, reach }: PantographSetup): readonly Shape[] {
  const parts = 160;
  const within = (at: Point) =>
    norm(at) <= reach.stylus.most + 1e-9 && norm(at) >= reach.stylus.least - 1e-9;
  const runs: { inside: boolean; points: Point[] }[] = [];
  for (let i = 0; i <= parts; i += 1) {
    const at = way.at((i / parts) * way.length * (1 - 1e-12));
    const inside = within(at);
    const run = runs.at(-1);
    run?.points.push(at);
    if (run?.inside !== inside) runs.push({ inside, points: [at] });
  }
  return [
    ...runs.map(({ inside, points }) => outline(inside ? 'outline' : 'hidden', points, false)),
  ];
}

/** What the pen draws while the stylus goes once round, as far as it reaches. */
function wholeCopy(setup: PantographSetup): readonly Shape[] {
  const steps = 2 * (setup.samples.length - 1);
  const runs: Point[][] = [[]];
  for (let i = 0; i <= steps; i += 1) {
    const pen = penBetween(setup, (setup.way.length * i) / steps);
    if (pen) runs.at(-1)?.push(pen);
    else runs.push([]);
  }
  return runs.filter((run) => run.length > 1).map((run) => outline('tracing', run, false, faint));
}

function overlapShown(setup: PantographSetup): readonly Shape[] {
  const { drawingBox: a, copyBox: b } = setup;
  if (!b || overlapOf(setup) <= 0) return [];
  const [left, right] = [Math.max(a.left, b.left), Math.min(a.right, b.right)];
  const [bottom, top] = [Math.max(a.bottom, b.bottom), Math.min(a.top, b.top)];
  const shared = outline(
    'clash',
    [
      { x: left, y: bottom },
      { x: right, y: bottom },
      { x: right, y: top },
      { x: left, y: top },
    ],
    true,
  );
  return [shared, ...hatch(shared.points, 12)];
}

/** The thread from the fixed point through the stylus to the pen, bent where they are not in line. */
function thread(
  setup: PantographSetup,
  { stylus, pen, offLine }: PantographPose,
): readonly Shape[] {
  const ends =
    setup.roles.fixed === 'M' ? [stylus, pen] : [ORIGIN, norm(pen) > norm(stylus) ? pen : stylus];
  const [from = ORIGIN, to = pen] = ends;
  if (Math.abs(offLine) <= inLine) return [line('thread', from, to)];
  const share = (pen.x * stylus.x + pen.y * stylus.y) / norm(stylus) ** 2;
  const foot = scale(stylus, share);
  return [
    line('thread', ORIGIN, stylus),
    line('thread', stylus, pen),
    line('thread', ORIGIN, foot, 0.5),
    line('limit', foot, pen),
    label(lengthText(Math.abs(offLine), setup.spec.units), between(foot, pen, 0.5), {
      role: 'madder',
      anchor: 'start',
      nudge: { x: 10, y: 0 },
    }),
  ];
}

function corners(
  points: Readonly<Record<PantographCorner, Point>>,
  roles: PantographSetup['roles'],
): readonly Shape[] {
  const named = (
    at: Point,
    text: string,
    symbol: 'fixed-pivot' | 'stylus' | 'pen',
    down: number,
  ): Shape[] => [
    { kind: 'mark', role: symbol === 'stylus' ? 'driver' : 'outline', symbol, at },
    label(text, at, { face: 'name', nudge: { x: 0, y: -down } }),
  ];
  return [
    ...named(points[roles.fixed], 'fixed', 'fixed-pivot', 30),
    ...named(points[roles.stylus], 'stylus', 'stylus', 22),
    ...named(points[roles.pen], 'pen', 'pen', 22),
  ];
}

/** Lengths along both long bars, standing off to their outer sides. */
function measures({ spec }: PantographSetup, { points }: PantographPose): readonly Shape[] {
  const { O, B, C, D, P } = points;
  const text = (mm: number) => ruleText(mm, spec.units);
  const outward = Math.sign((C.x - O.x) * (P.y - C.y) - (C.y - O.y) * (P.x - C.x)) || 1;
  const off = (share: number) => -outward * share * barWidth;
  return [
    ...dimension(O, B, off(1.6), text(spec.firstHole)),
    ...dimension(O, C, off(3.4), text(spec.first)),
    ...dimension(C, D, off(1.6), text(spec.secondHole)),
    ...dimension(C, P, off(3.4), text(spec.second)),
  ];
}

function pantographBounds(setup: PantographSetup): Bounds {
  const swept = setup.samples.flatMap(({ points }) => Object.values(points));
  const all = boundsOf([...swept, ...setup.way.points, ORIGIN]);
  const margin = 3.8 * barWidth;
  return withAspect(grown(all, margin), 1.4, 2.6);
}
