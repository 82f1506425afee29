import { polar, type Point } from '@/lib/geometry/point';
import type { TrammelPose } from '@/lib/kinematics/linkage/trammel';
import type { DriveState, Showing } from './bench-model';
import { ruleText, lengthText } from './measure';
import { boundsOf, withAspect, type Bounds, type Scene, type Shape } from './scene';
import { dimension, hatch, label, lath, line, outline, rectangle } from './strokes';
import { trail } from './trail';
import {
  barEnds,
  isStopped,
  onBar,
  penBetween,
  sliderWidth,
  type TrammelSetup,
} from './trammel-setup';

/** What of a trammel's drawing stands still. */
export interface TrammelDrawing {
  readonly setup: TrammelSetup;
  readonly bounds: Bounds;
  readonly board: readonly Shape[];
  readonly oval: readonly Shape[];
  readonly sizes: readonly Shape[];
}

/** The fresh chalk behind the pen; the whole oval is there already, fainter. */
const freshArc = (2 * Math.PI) / 3;
const crossing: Point = { x: 0, y: 0 };

/** Draws a trammel's board, oval and dimensions once; `trammelScene` then moves the rest. */
export function drawTrammel(setup: TrammelSetup): TrammelDrawing {
  const hidden = new Set(setup.spec.hide ?? []);
  const sized = !(hidden.has('size') || hidden.has('length') || hidden.has('width'));
  const square = setup.spec.skew === 0 && setup.spec.held === 'board';
  return {
    setup,
    bounds: trammelBounds(setup),
    board: [...board(setup), ...targets(setup)],
    oval: hidden.has('oval') ? [] : [{ ...outline('tracing', setup.path, true), age: 0.55 }],
    sizes: square && sized ? ovalSizes(setup) : [],
  };
}

/** A trammel with its bar at `drive`, back to front. */
export function trammelScene(drawing: TrammelDrawing, state: DriveState, showing: Showing): Scene {
  const { setup } = drawing;
  const pose = setup.pose(state.drive);
  const still = [...drawing.board, ...(showing.tracing ? drawing.oval : [])];
  const fresh = showing.tracing ? trail(state, freshArc, (drive) => penBetween(setup, drive)) : [];
  const moving = [...sliders(setup, pose), ...bar(setup, pose, state.drive, showing)];
  const shapes = [...still, ...fresh, ...moving, ...(showing.dimensions ? drawing.sizes : [])];
  if (setup.spec.held === 'board') return { bounds: drawing.bounds, shapes };
  return { bounds: drawing.bounds, shapes: [heldByBar(setup, pose, state.drive, shapes)] };
}

/** The same seen by someone who sits on the bar: the board turns under it. */
function heldByBar(
  setup: TrammelSetup,
  pose: TrammelPose,
  drive: number,
  shapes: readonly Shape[],
): Shape {
  const angle = -(drive + setup.turned);
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const { x, y } = pose.pen;
  return { kind: 'body', pose: { x: s * y - c * x, y: -s * x - c * y, angle }, shapes };
}

function board(setup: TrammelSetup): readonly Shape[] {
  const { spec, grooveAngle } = setup;
  const half = spec.groove / 2;
  const side = spec.groove + 1.2 * spec.slider;
  const cross = crossOf(half, sliderWidth(spec) / 2, grooveAngle);
  const grain = { x: -side / 2 + 0.12 * side, y: -side / 2 + 0.12 * side };
  const end = { x: grain.x + 0.2 * side, y: grain.y };
  const beyond = 0.06 * side;
  return [
    rectangle('timber', crossing, side, side),
    outline('opening', cross, true),
    line('centre', { x: -side / 2 - beyond, y: 0 }, { x: side / 2 + beyond, y: 0 }),
    line('centre', polar(-side / 2 - beyond, grooveAngle), polar(side / 2 + beyond, grooveAngle)),
    line('grain', grain, end),
    { kind: 'mark', role: 'grain', symbol: 'grain-arrow', at: end },
    label(
      'grain',
      { x: (grain.x + end.x) / 2, y: grain.y },
      {
        face: 'name',
        role: 'brass',
        nudge: { x: 0, y: 10 },
      },
    ),
    ...(setup.apart < 1e-9 ? [rectangle('void', crossing, spec.groove, sliderWidth(spec))] : []),
  ];
}

/** The edge of two crossing grooves as one outline. */
function crossOf(half: number, h: number, angle: number): readonly Point[] {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  const level = (x: number, up: number): Point => ({ x, y: up * h });
  const upright = (along: number, left: number): Point => ({
    x: along * c - left * h * s,
    y: along * s + left * h * c,
  });
  const corner = (up: number, left: number): Point => {
    const along = (up * h) / s;
    return { x: along * c - (left * h) / s, y: up * h };
  };
  return [
    level(half, -1),
    level(half, 1),
    corner(1, -1),
    upright(half, -1),
    upright(half, 1),
    corner(1, 1),
    level(-half, 1),
    level(-half, -1),
    corner(-1, 1),
    upright(-half, 1),
    upright(-half, -1),
    corner(-1, -1),
  ];
}

/** The oval asked for, and dots to be reached. */
function targets({ spec }: TrammelSetup): readonly Shape[] {
  const { wanted, dots = [] } = spec;
  const oval = wanted
    ? [
        outline(
          'guide',
          Array.from({ length: 120 }, (_, i): Point => {
            const angle = (2 * Math.PI * i) / 120;
            return {
              x: (wanted.length / 2) * Math.cos(angle),
              y: (wanted.width / 2) * Math.sin(angle),
            };
          }),
          true,
        ),
      ]
    : [];
  return [
    ...oval,
    ...dots.flatMap((dot): Shape[] => [
      { kind: 'mark', role: 'tracing', symbol: 'dot', at: dot },
      label(dot.label, dot, { role: 'chalk', nudge: { x: 12, y: 10 } }),
    ]),
  ];
}

function sliders(setup: TrammelSetup, pose: TrammelPose): readonly Shape[] {
  const { spec, grooveAngle, strike } = setup;
  const [length, width] = [spec.slider, 0.94 * sliderWidth(spec)];
  const blocks = [
    rectangle(strike ? 'clash' : 'timber', pose.levelPin, length, width),
    rectangle(strike ? 'clash' : 'timber', pose.uprightPin, length, width, grooveAngle),
  ];
  return [
    ...blocks,
    ...(strike ? blocks.flatMap(({ points }) => hatch(points, spec.slider / 8)) : []),
    ...(isStopped(setup) ? grooveEnds(setup, pose) : []),
  ];
}

/** The groove ends that a slider stands against, in madder. */
function grooveEnds({ spec, grooveAngle, room }: TrammelSetup, pose: TrammelPose): Shape[] {
  const half = spec.groove / 2;
  const end = (pin: Point, angle: number): Shape[] => {
    const along = pin.x * Math.cos(angle) + pin.y * Math.sin(angle);
    if (Math.abs(along) < room - 1e-6) return [];
    const at = polar(Math.sign(along) * half, angle);
    const side = polar(sliderWidth(spec), angle + Math.PI / 2);
    return [
      line('limit', { x: at.x - side.x, y: at.y - side.y }, { x: at.x + side.x, y: at.y + side.y }),
    ];
  };
  return [...end(pose.levelPin, 0), ...end(pose.uprightPin, grooveAngle)];
}

function bar(
  setup: TrammelSetup,
  pose: TrammelPose,
  drive: number,
  showing: Showing,
): readonly Shape[] {
  const { spec } = setup;
  const angle = drive + setup.turned;
  const { tail, nose } = barEnds(setup);
  const width = 0.9 * sliderWidth(spec);
  const at = (behind: number) => onBar(pose, angle, behind);
  const measured =
    showing.dimensions && spec.held === 'board'
      ? [
          ...dimension(
            at(spec.farPin),
            pose.pen,
            1.3 * spec.slider,
            ruleText(spec.farPin, spec.units),
          ),
          ...dimension(
            at(spec.nearPin),
            pose.pen,
            -0.9 * spec.slider,
            ruleText(Math.abs(spec.nearPin), spec.units),
          ),
        ]
      : [];
  return [
    lath('driver', at(tail), at(nose), width),
    { kind: 'mark', role: 'outline', symbol: 'moving-pivot', at: pose.levelPin },
    { kind: 'mark', role: 'outline', symbol: 'moving-pivot', at: pose.uprightPin },
    { kind: 'mark', role: 'driver', symbol: 'handle', at: at(tail) },
    { kind: 'mark', role: 'tracing', symbol: 'pen', at: pose.pen },
    label('pen', at(nose), { face: 'name', nudge: polar(26, angle) }),
    ...measured,
  ];
}

/** What lies between one dimension line and the next, mm. */
function dimensionGap(path: readonly Point[], side: number): number {
  const { left, right } = boundsOf(path);
  return 0.05 * Math.max(right - left, side);
}

/** The oval's length and width, as wholes and as halves. */
function ovalSizes({ trammel, spec, path }: TrammelSetup): readonly Shape[] {
  const across = Math.abs(trammel.uprightPin);
  const up = Math.abs(trammel.levelPin);
  const side = spec.groove + 1.2 * spec.slider;
  const [below, right] = [Math.max(up, side / 2), Math.max(across, side / 2)];
  const gap = dimensionGap(path, side);
  const text = (mm: number) => lengthText(mm, spec.units);
  const clear = (gaps: number) => (right + 0.3 * gap) / (right + gaps * gap);
  return [
    ...dimension({ x: 0, y: 0 }, { x: across, y: 0 }, -(below + 1.2 * gap), text(across)),
    ...dimension({ x: -across, y: 0 }, { x: across, y: 0 }, -(below + 2.3 * gap), text(2 * across)),
    ...dimension({ x: 0, y: 0 }, { x: 0, y: up }, -(right + 1.2 * gap), text(up), clear(1.2)),
    ...dimension({ x: 0, y: -up }, { x: 0, y: up }, -(right + 2.3 * gap), text(2 * up), clear(2.3)),
  ];
}

function trammelBounds(setup: TrammelSetup): Bounds {
  const { spec, path } = setup;
  const side = spec.groove + 1.2 * spec.slider;
  const { tail } = barEnds(setup);
  const reach = Math.abs(tail) + spec.slider / 2;
  const wanted = spec.wanted ?? { length: 0, width: 0 };
  const square = boundsOf([
    { x: side / 2, y: side / 2 },
    { x: -side / 2, y: -side / 2 },
    { x: wanted.length / 2, y: wanted.width / 2 },
    { x: -wanted.length / 2, y: -wanted.width / 2 },
    ...path,
    ...(spec.dots ?? []),
  ]);
  if (spec.held === 'bar') {
    const away = Math.max(Math.abs(spec.farPin), Math.abs(spec.nearPin));
    const radius = away + Math.max(side * Math.SQRT1_2, reach);
    const round = { left: -radius, right: radius, bottom: -radius, top: radius };
    return withAspect(round, 1.4, 2.4);
  }
  const tails = Array.from({ length: 24 }, (_, i) => {
    const drive = (2 * Math.PI * i) / 24;
    return onBar(setup.pose(drive), drive + setup.turned, tail);
  });
  const all = boundsOf([
    { x: square.left, y: square.bottom },
    { x: square.right, y: square.top },
    ...tails,
  ]);
  const gap = dimensionGap(path, side);
  const room = {
    left: all.left - gap,
    right: Math.max(square.right + 3 * gap, all.right + gap),
    bottom: Math.min(square.bottom - 3 * gap, all.bottom - gap),
    top: all.top + gap,
  };
  return withAspect(room, 1.4, 2.4);
}
