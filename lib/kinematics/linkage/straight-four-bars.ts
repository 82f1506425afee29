import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { findRoot } from '@/lib/numeric/root';
import { acosClamped } from '@/lib/numeric/tolerance';
import { radians } from '@/lib/geometry/angle';
import type { Point } from '@/lib/geometry/point';
import { couplerPoint } from '@/lib/kinematics/linkage/four-bar-motion';
import type { CouplerPlace, FourBarLengths, FourBarSide } from '@/lib/kinematics/linkage/four-bar';
import { fourBarLinkage } from '@/lib/kinematics/linkage/four-bar-linkage';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';
import { straightness, type Straightness } from '@/lib/kinematics/linkage/straightness';

/** A four-bar with the coupler point that draws a nearly straight line. */
export interface StraightFourBar {
  readonly bars: FourBarLengths;
  readonly side: FourBarSide;
  readonly point: CouplerPlace;
}

/** Two equal arms on fixed pins `ground` apart, joined by a link. Any one unit. */
export interface EqualArms {
  readonly ground: number;
  readonly arm: number;
  readonly link: number;
}

/**
 * Chebyshev's linkage: crossed arms, pencil at the middle of the link; straightest at ground : arm :
 * link = 4 : 5 : 2. Throws `RangeError` for lengths that are not positive. Source: P. L. Chebyshev, 1854.
 * @example chebyshev({ ground: 80, arm: 100, link: 40 }).point // → { distance: 20, angle: 0 }
 */
export function chebyshev(arms: EqualArms): StraightFourBar {
  const { ground, arm, link } = requireArms('chebyshev', arms);
  return {
    bars: { crank: arm, coupler: link, rocker: arm, frame: ground },
    side: 'crossed',
    point: { distance: link / 2, angle: 0 },
  };
}

/**
 * Chebyshev's linkage with 4 : 5 : 2 for a level travel of `stroke`, which equals the ground link.
 * @example chebyshevForStroke(225) // → { ground: 225, arm: 281.25, link: 112.5 }
 */
export function chebyshevForStroke(stroke: number): EqualArms {
  requireSize('chebyshevForStroke', 'stroke', stroke);
  return { ground: stroke, arm: (5 / 4) * stroke, link: stroke / 2 };
}

/**
 * Heights of Chebyshev's pencil in mid position and over the level travel, which runs between the
 * two positions with the link square to the ground line; undefined where it does not reach them.
 * @example chebyshevLevel({ ground: 80, arm: 100, link: 40 }) // → { middle: 80, least: 80, most: 80.195075, share: 0.002438433 }
 */
export function chebyshevLevel(
  arms: EqualArms,
): (Straightness & { readonly middle: number }) | undefined {
  const { ground, arm, link } = requireArms('chebyshevLevel', arms);
  const room = arm * arm - (link * link + ground * ground) / 4;
  const aside = Math.sqrt(Math.max(room, 0)) / Math.hypot(1, ground / link);
  const height = (ground * aside) / link;
  const half = (ground + link) / 2;
  if (room <= 0 || half > arm) return undefined;
  const from = Math.atan2(height - link / 2, ground / 2 + aside);
  const to = Math.atan2(height + link / 2, ground / 2 - aside);
  const linkage = chebyshev(arms);
  const found = straightness((angle) => pointOf(linkage, angle), from, to, 'x');
  return found && { ...found, middle: Math.sqrt((arm - half) * (arm + half)) };
}

/**
 * Roberts' linkage: uncrossed arms and a coupler triangle with legs as long as the arms, apex on
 * the ground side; straightest with a link half the ground. Throws `RangeError` for lengths that
 * are not positive or a triangle that does not close. Source: R. Roberts, before 1864.
 * @example roberts({ ground: 100, arm: 60, link: 50 }).point // → { distance: 60, angle: -1.141021 }
 */
export function roberts(arms: EqualArms): StraightFourBar {
  const { ground, arm, link } = requireArms('roberts', arms);
  requireSize('roberts', '2·arm − link', 2 * arm - link);
  return {
    bars: { crank: arm, coupler: link, rocker: arm, frame: ground },
    side: 'open',
    point: { distance: arm, angle: -acosClamped(link / (2 * arm)) },
  };
}

export type RobertsLevel = Straightness & {
  /** Arm 1's angle in mid position, and where the pencil reaches the far fixed pin. */
  readonly armMiddle: number;
  readonly armAtPin: number;
};

/**
 * Roberts' mid position, and how level the pencil runs from there to the far fixed pin; undefined
 * where it does not get there.
 * @example robertsLevel({ ground: 100, arm: 60, link: 50 }) // → { armMiddle: 1.141021, armAtPin: 0.585686, least: -0.682101, most: 0 }
 */
export function robertsLevel(arms: EqualArms): RobertsLevel | undefined {
  const { ground, arm, link } = requireArms('robertsLevel', arms);
  const linkage = roberts(arms);
  const armMiddle = acosClamped((ground - link) / 2 / arm);
  const x = (angle: number) => pointOf(linkage, angle)?.x;
  const least = radians(0.01);
  const reached = findRoot((angle) => (x(angle) ?? 2 * ground) - ground, least, armMiddle);
  if (reached.outcome !== 'found' || x(reached.x) === undefined) return undefined;
  const found = straightness((angle) => pointOf(linkage, angle), reached.x, armMiddle, 'x');
  return found && { ...found, armMiddle, armAtPin: reached.x };
}

/**
 * Hoeken's linkage: coupler, rocker and the piece beyond equal; the pencil on A–B produced draws a
 * line at twice the rocker's height while the crank is on the far side. `coupler` left out is
 * 1.5·ground − 0.5·crank. Chebyshev's lambda is the same with 1 : 2 : 2.5.
 * Source: K. Hoeken, 1926; ratios R. L. Norton, Design of Machinery, table 3-1.
 * @example hoeken({ crank: 20, ground: 40 }).bars.coupler // → 50
 */
export function hoeken({
  crank,
  ground,
  coupler = 1.5 * ground - 0.5 * crank,
  rocker = coupler,
  beyond = coupler,
}: {
  readonly crank: number;
  readonly ground: number;
  readonly coupler?: number;
  readonly rocker?: number;
  /** From the rocker's pin B on to the pencil. */
  readonly beyond?: number;
}): StraightFourBar {
  requireSize('hoeken', 'crank', crank);
  requireSize('hoeken', 'ground', ground);
  requireSize('hoeken', 'coupler', coupler);
  requireSize('hoeken', 'rocker', rocker);
  requireMeasure('hoeken', 'beyond', beyond);
  return {
    bars: { crank, coupler, rocker, frame: ground },
    side: 'open',
    point: { distance: coupler + beyond, angle: 0 },
  };
}

/**
 * How straight the pencil runs over `crankRange` radians of crank, centred on the far side (π).
 * @example hoekenStraightness(hoeken({ crank: 1, ground: 2.2 }), Math.PI).share // → 0.000963078
 */
export function hoekenStraightness(
  linkage: StraightFourBar,
  crankRange: number,
): Straightness | undefined {
  const half = crankRange / 2;
  return straightness((angle) => pointOf(linkage, angle), Math.PI - half, Math.PI + half, 'x');
}

/** A straight-line four-bar as data for the general solver: points as `fourBarLinkage`, the pencil `P`. */
export function straightLinkage({ bars, side, point }: StraightFourBar): Linkage {
  return fourBarLinkage(bars, { side, point });
}

/** Where the pencil stands at a crank angle; undefined where the bars do not close. */
export function pointOf(
  { bars, side, point }: StraightFourBar,
  crankAngle: number,
): Point | undefined {
  const found = couplerPoint(bars, point, crankAngle);
  return found.outcome === 'closes' ? found[side] : undefined;
}

function requireArms(caller: string, { ground, arm, link }: EqualArms): EqualArms {
  return {
    ground: requireSize(caller, 'ground', ground),
    arm: requireSize(caller, 'arm', arm),
    link: requireSize(caller, 'link', link),
  };
}
