import { finiteResult } from '@/lib/numeric/finite-result';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import { acosClamped } from '@/lib/numeric/tolerance';
import { cross, direction, dot, norm, subtract, type Point } from '@/lib/geometry/point';
import {
  fromBars,
  PANTOGRAPH_ROLES,
  reachesOf,
  type BarCoordinates,
  type Pantograph,
  type PantographPoints,
  type PantographRoles,
  type PantographSetUp,
} from '@/lib/kinematics/linkage/pantograph';

/** Least and greatest distance from the fixed point. */
export interface Reach {
  readonly least: number;
  readonly most: number;
}

/** Least and greatest angle O–C–P of the elbow, radians from 0 (folded) to π (straight). */
export interface ElbowRange {
  readonly least: number;
  readonly most: number;
}

const ANY_ELBOW: ElbowRange = { least: 0, most: Math.PI };

/**
 * How near and how far stylus and pen come to the fixed point while the elbow keeps to its range.
 *
 * Throws `RangeError` unless 0 ≤ least ≤ most ≤ π. Source: cosine rule,
 * `√(L₁² + L₂² − 2·L₁·L₂·cos γ)`; with equal bars 2L·sin(γ/2).
 * @example pantographReach({ first: 400, second: 400, firstHole: 200, secondHole: 200 }, 'middle-to-end', { least: radians(30), most: radians(150) }).pen // → { least: 207.055236, most: 772.740661 }
 */
export function pantographReach(
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
  elbow: ElbowRange = ANY_ELBOW,
): { readonly stylus: Reach; readonly pen: Reach } {
  const { stylus, pen } = reachesOf('pantographReach', pantograph, setUp);
  requireElbow('pantographReach', elbow);
  return { stylus: reach(stylus, elbow), pen: reach(pen, elbow) };
}

/** Where a pantograph stands when its stylus is led somewhere, or why it cannot. */
export type PantographOutcome =
  | {
      readonly outcome: 'placed';
      readonly points: PantographPoints;
      /** Angle O–C–P, from 0 to π. */
      readonly elbow: number;
      /** How far the pen stands to the left of the line from fixed point to stylus. */
      readonly penOffLine: number;
    }
  | { readonly outcome: 'too-far'; readonly by: number }
  | { readonly outcome: 'too-near'; readonly by: number };

export interface PantographLead {
  readonly fixed: Point;
  readonly stylus: Point;
  /** On which side of the ray O–P the elbow lies; left if not given. */
  readonly side?: 'left' | 'right';
  readonly elbow?: ElbowRange;
}

/**
 * All points of a pantograph whose fixed corner and stylus stand where they are told to.
 *
 * Frame as everywhere, any one unit. Outcomes: `placed`; `too-far` or `too-near` with the distance
 * by which the stylus oversteps what bars and elbow allow. Throws `RangeError` for numbers that are
 * not finite or a stylus that stands on the fixed corner of the bars (hole at nought).
 * @example leadPantograph({ first: 300, second: 300, firstHole: 100, secondHole: 100 }, 'middle-to-end', { fixed: ORIGIN, stylus: { x: 250, y: 0 } }) // → { outcome: 'too-far', by: 50 }
 */
export function leadPantograph(
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
  { fixed, stylus, side = 'left', elbow = ANY_ELBOW }: PantographLead,
): PantographOutcome {
  const roles = typeof setUp === 'string' ? PANTOGRAPH_ROLES[setUp] : setUp;
  const seen = reachesOf('leadPantograph', pantograph, roles);
  requireElbow('leadPantograph', elbow);
  const lead = subtract(stylus, fixed);
  const away = norm(lead);
  requireMeasure('leadPantograph', 'stylus − fixed', away);
  const { first, second } = seen.stylus;
  requireSize('leadPantograph', 'stylus from the fixed pin', first * second);
  const { least, most } = reach(seen.stylus, elbow);
  const rounding = 1e-12 * most;
  if (away > most + rounding) return { outcome: 'too-far', by: away - most };
  if (away < least - rounding) return { outcome: 'too-near', by: least - away };
  const between = acosClamped(
    (away * away - first * first - second * second) / (2 * first * second),
  );
  const bend = side === 'left' ? -between : between;
  const shape = { x: first + second * Math.cos(bend), y: second * Math.sin(bend) };
  const firstAngle = direction(lead) - direction(shape);
  const at = pointsFrom(pantograph, roles, fixed, firstAngle, firstAngle + bend);
  const pen = subtract(at[roles.pen], fixed);
  const penOffLine = away === 0 ? 0 : cross(lead, pen) / away;
  return { outcome: 'placed', points: at, elbow: Math.PI - between, penOffLine };
}

/**
 * The stylus position that brings the pen of a placed pantograph nearest to `wanted`, for dragging
 * the pen: exact when the copy is true, else true at the elbow's own proportion.
 * @example stylusForPen({ fixed: ORIGIN, scale: 3 }, { x: 30, y: 60 }) // → { x: 10, y: 20 }
 */
export function stylusForPen(
  { fixed, scale }: { readonly fixed: Point; readonly scale: number },
  wanted: Point,
): Point {
  requireSize('stylusForPen', '|scale|', Math.abs(scale));
  return finiteResult('stylusForPen', {
    x: fixed.x + (wanted.x - fixed.x) / scale,
    y: fixed.y + (wanted.y - fixed.y) / scale,
  });
}

function pointsFrom(
  { first, second, firstHole, secondHole }: Pantograph,
  roles: PantographRoles,
  fixed: Point,
  firstAngle: number,
  secondAngle: number,
): PantographPoints {
  const corners = { O: [0, 0], M: [firstHole, secondHole], P: [first, second] } as const;
  const [back, aside] = corners[roles.fixed];
  const at = (along: number, across: number) =>
    fromBars({ first: along - back, second: across - aside }, firstAngle, secondAngle, fixed);
  return {
    O: at(0, 0),
    B: at(firstHole, 0),
    C: at(first, 0),
    D: at(first, secondHole),
    M: at(firstHole, secondHole),
    P: at(first, second),
  };
}

function reach(seen: BarCoordinates, { least, most }: ElbowRange): Reach {
  const away = (elbow: number) => {
    const [u, v] = [
      { x: seen.first, y: 0 },
      { x: -seen.second * Math.cos(elbow), y: seen.second * Math.sin(elbow) },
    ];
    const sum = { x: u.x + v.x, y: v.y };
    return Math.sqrt(dot(sum, sum));
  };
  const [a, b] = [away(least), away(most)];
  return { least: Math.min(a, b), most: Math.max(a, b) };
}

function requireElbow(caller: string, { least, most }: ElbowRange): void {
  requireWithin(caller, 'elbow.least', least, 0, Math.PI);
  requireWithin(caller, 'elbow.most', most, least, Math.PI);
}
