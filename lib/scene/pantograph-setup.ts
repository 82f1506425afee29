import { radians } from '@/lib/geometry/angle';
import { cross, dot, norm, ORIGIN, scale, subtract, type Point } from '@/lib/geometry/point';
import { pantographLinkage } from '@/lib/kinematics/linkage/pantograph-linkage';
import {
  leadPantograph,
  pantographReach,
  type Reach,
} from '@/lib/kinematics/linkage/pantograph-reach';
import {
  pantographCopy,
  PANTOGRAPH_ROLES,
  type CopyOutcome,
  type PantographPoints,
  type PantographRoles,
} from '@/lib/kinematics/linkage/pantograph';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import { solveLinkage } from '@/lib/kinematics/linkage/solver/solver';
import type { PantographSetUp, PantographSpec } from './bench-spec';
import { wayOf, type Way } from './drawings';
import { boundsOf, type Bounds } from './scene';

/** Where everything stands for one place on the drawing. */
export interface PantographPose {
  readonly points: PantographPoints;
  readonly stylus: Point;
  readonly pen: Point;
  /** The angle O–C–P, radians. */
  readonly elbow: number;
  /** How far the pen stands from the line through fixed point and stylus, left positive, mm. */
  readonly offLine: number;
  /** How far the place on the drawing lies beyond the reach, mm; 0 where the stylus stands on it. */
  readonly beyond: number;
}

/** A pantograph worked out. Its drive is how far the stylus has gone along the drawing, mm. */
export interface PantographSetup {
  readonly spec: PantographSpec;
  readonly roles: PantographRoles;
  readonly copy: CopyOutcome;
  readonly way: Way;
  /** The drawing's middle as seen from the fixed pin, mm. */
  readonly middle: Point;
  readonly reach: { readonly stylus: Reach; readonly pen: Reach };
  readonly pose: (drive: number) => PantographPose;
  /** Poses at equal steps along the drawing, the last back at the first. */
  readonly samples: readonly PantographPose[];
  readonly drawingBox: Bounds;
  /** What the pen draws where the stylus reaches, or null when it reaches nothing. */
  readonly copyBox: Bounds | null;
  /** The farthest that any of the drawing lies beyond the working reach, mm. */
  readonly beyond: number;
}

/** Past these the bars lie in one line and the elbow stops, whatever its working range. */
const stops = { least: radians(5), most: radians(175) };
const sampleCount = 192;
/** A drawing lies as far out as this share of the working reach, unless it is placed. */
const outermost = 0.96;

const acrossFromTheEnd: PantographRoles = { fixed: 'M', stylus: 'P', pen: 'O' };

/** Who is fixed, who leads and who draws in a named set-up. */
export function rolesOf(setUp: PantographSetUp): PantographRoles {
  return setUp === 'across-the-middle-from-the-end' ? acrossFromTheEnd : PANTOGRAPH_ROLES[setUp];
}

/** The pantograph that a spec describes, on the general solver. */
export function setUpPantograph(spec: PantographSpec): PantographSetup {
  const roles = rolesOf(spec.setUp);
  const [least, most] = spec.elbow;
  const reach = pantographReach(spec, roles, { least, most });
  const ahead = roles.fixed === 'M' ? -1 : 1;
  const { name, height, at } = spec.drawing;
  const wide = boundsOf(wayOf(name, height, ORIGIN).points).right;
  const usual = { x: ahead * (outermost * reach.stylus.most - wide), y: 0 };
  const middle = at ?? usual;
  const way = wayOf(name, height, middle);
  const pose = posing(spec, roles, way);
  const samples = Array.from({ length: sampleCount + 1 }, (_, i) =>
    pose((i * way.length) / sampleCount),
  );
  const reached = [...samples, ...way.marks.map(pose)]
    .filter(({ beyond }) => beyond === 0)
    .map(({ pen }) => pen);
  const distances = samples.map((_, i) => norm(way.at((i * way.length) / sampleCount)));
  const beyond = distances.map((away) =>
    Math.max(0, away - reach.stylus.most, reach.stylus.least - away),
  );
  return {
    spec,
    roles,
    copy: pantographCopy(spec, roles),
    way,
    middle,
    reach,
    pose,
    samples,
    drawingBox: boundsOf(way.points),
    copyBox: reached.length > 1 ? boundsOf(reached) : null,
    beyond: Math.max(...beyond),
  };
}

/** The pose that the samples give between them, without solving anew. */
export function penBetween({ samples, way }: PantographSetup, drive: number): Point | null {
  const place = ((((drive / way.length) % 1) + 1) % 1) * (samples.length - 1);
  const i = Math.floor(place);
  const [a, b] = [samples[i], samples[i + 1]];
  if (!a || !b || a.beyond > 0 || b.beyond > 0) return null;
  const share = place - i;
  return { x: a.pen.x + share * (b.pen.x - a.pen.x), y: a.pen.y + share * (b.pen.y - a.pen.y) };
}

function posing(
  spec: PantographSpec,
  roles: PantographRoles,
  way: Way,
): (drive: number) => PantographPose {
  const side = roles === acrossFromTheEnd ? 'right' : 'left';
  const hard = pantographReach(spec, roles, stops).stylus;
  const solve = solving(spec, roles, side);
  return (drive) => {
    const wanted = way.at(drive);
    const away = norm(wanted);
    const within = Math.min(hard.most, Math.max(hard.least, away));
    const beyond = Math.abs(away - within);
    const to = beyond < 1e-9 ? wanted : held(wanted, away, within);
    const points = solve(to);
    const [stylus, pen] = [points[roles.stylus], points[roles.pen]];
    const lead = norm(stylus);
    return {
      points,
      stylus,
      pen,
      elbow: elbowOf(points),
      offLine: lead < 1e-9 ? 0 : cross(stylus, pen) / lead,
      beyond: beyond < 1e-9 ? 0 : beyond,
    };
  };
}

/** The place on the same ray at the distance that the bars allow. */
function held(wanted: Point, away: number, within: number): Point {
  return away < 1e-9 ? { x: within, y: 0 } : scale(wanted, within / away);
}

/** Places every point for a place of the stylus: by the solver, or in closed form where it must. */
function solving(
  spec: PantographSpec,
  roles: PantographRoles,
  side: 'left' | 'right',
): (stylus: Point) => PantographPoints {
  const { stylus: stylusMisfit, other } = spec.shortBars ?? { stylus: 0, other: 0 };
  const closed = (stylus: Point): PantographPoints => {
    const placed = leadPantograph(spec, roles, { fixed: ORIGIN, stylus, side });
    if (placed.outcome !== 'placed') {
      throw new RangeError(`setUpPantograph: stylus is ${placed.outcome} by ${placed.by}`);
    }
    return placed.points;
  };
  if (spec.firstHole >= spec.first || spec.secondHole >= spec.second) return closed;
  const planned = planLinkage(
    pantographLinkage(spec, roles, {
      side,
      stylusBar: spec.secondHole + stylusMisfit,
      otherBar: spec.first - spec.firstHole + other,
    }),
  );
  if (planned.outcome !== 'planned') return closed;
  const { plan } = planned;
  return (stylus) => {
    const solved = solveLinkage(plan, [stylus.x, stylus.y]);
    const { O, B, C, D, M, P } = solved.points;
    if (solved.outcome !== 'closes' || !O || !B || !C || !D || !M || !P) return closed(stylus);
    return { O, B, C, D, M, P };
  };
}

function elbowOf({ O, C, P }: PantographPoints): number {
  const [a, b] = [subtract(O, C), subtract(P, C)];
  return Math.atan2(Math.abs(cross(a, b)), dot(a, b));
}

/** Whether the elbow keeps within its working range. */
export function elbowWorks({ spec }: PantographSetup, elbow: number): boolean {
  return elbow >= spec.elbow[0] - 1e-9 && elbow <= spec.elbow[1] + 1e-9;
}

/** By how much the fixed pin must move away from the drawing until the copy clears it, mm. */
export function overlapOf({ drawingBox, copyBox, copy }: PantographSetup): number {
  if (!copyBox || copy.outcome !== 'true' || Math.abs(copy.scale - 1) < 1e-9) return 0;
  const clear =
    copyBox.left >= drawingBox.right ||
    copyBox.right <= drawingBox.left ||
    copyBox.bottom >= drawingBox.top ||
    copyBox.top <= drawingBox.bottom;
  if (clear || copy.scale < 0) return 0;
  const [near, far] = [Math.abs(drawingBox.left), Math.abs(drawingBox.right)];
  return copy.scale > 1
    ? (far - copy.scale * near) / (copy.scale - 1)
    : (copy.scale * far - near) / (1 - copy.scale);
}
