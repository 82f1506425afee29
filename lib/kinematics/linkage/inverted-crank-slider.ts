import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import { acosClamped } from '@/lib/numeric/tolerance';
import { wrapAngle } from '@/lib/geometry/angle';
import { direction, norm, polar, subtract } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A crank whose pin slides along a groove on a swinging arm. The crank turns about O2 at the
 * origin, the arm about O4 at (frame, 0). Any one unit, radians.
 */
export interface InvertedCrankSlider {
  readonly crank: number;
  readonly frame: number;
  /** The arm, from O4 to its end B, where the groove begins; 0 for a groove through O4. */
  readonly arm: number;
  /** From the arm O4–B to the groove, counter-clockwise; a right angle if left out. */
  readonly grooveAngle?: number;
}

export interface InvertedPose {
  /** Direction O4 to B. */
  readonly armAngle: number;
  /** From B to the crank pin, along the groove; never negative. */
  readonly reach: number;
}

export type InvertedOutcome =
  | { readonly outcome: 'closes'; readonly left: InvertedPose; readonly right: InvertedPose }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Both assemblies at a crank angle: B to the left or the right of the ray from O4 to the crank pin.
 *
 * `grooveAngle` is the size of the angle at B, in the triangle O4–B–pin its supplement; it is laid
 * off to the side on which the pin lies, so both assemblies are mirror images about that ray.
 * Outcome `does-not-close` with the length by which the pin is too near O4. Throws `RangeError` for
 * lengths that are not positive. Source: R. L. Norton, Design of Machinery, example 4-3.
 * @example invertedPosition({ crank: 2, frame: 6, arm: 4 }, radians(30)).left // → { armAngle: -2.950316, reach: 1.793151 }
 */
export function invertedPosition(
  mechanism: InvertedCrankSlider,
  crankAngle: number,
): InvertedOutcome {
  const { crank, frame, arm, grooveAngle } = requireInverted('invertedPosition', mechanism);
  requireMeasure('invertedPosition', 'crankAngle', crankAngle);
  const toPin = subtract(polar(crank, crankAngle), { x: frame, y: 0 });
  const away = norm(toPin);
  const off = arm * Math.sin(grooveAngle);
  const by = off - away;
  if (by > 1e-12 * (away + arm)) return { outcome: 'does-not-close', by };
  const along = Math.sqrt(Math.max((away - off) * (away + off), 0));
  const reach = along - arm * Math.cos(grooveAngle);
  if (reach < -1e-12 * (away + arm)) return { outcome: 'does-not-close', by: -reach };
  const lean =
    arm === 0 || away === 0
      ? 0
      : acosClamped((arm * arm + away * away - reach * reach) / (2 * arm * away));
  const pinAngle = direction(toPin);
  const pose = (side: number): InvertedPose => ({
    armAngle: wrapAngle(pinAngle + side * lean),
    reach: Math.max(reach, 0),
  });
  return { outcome: 'closes', left: pose(1), right: pose(-1) };
}

/**
 * An inverted crank and slider as data for the general solver: points `O2`, `A`, `O4`, `B` and `E`,
 * a place farther along the groove; driven by the crank. The groove turns to the right of the arm's
 * direction for the assembly `left`, to the left for `right`. The arm must have some length.
 */
export function invertedLinkage(
  mechanism: InvertedCrankSlider,
  { side = 'left' }: { readonly side?: 'left' | 'right' } = {},
): Linkage {
  const { crank, frame, arm, grooveAngle } = requireInverted('invertedLinkage', mechanism);
  requireSize('invertedLinkage', 'arm', arm);
  const turn = side === 'left' ? -grooveAngle : grooveAngle;
  const end = polar(crank + frame, turn, { x: arm, y: 0 });
  const found = [0.3, 1.2, 2.4, 3.1].map((angle) => ({
    angle,
    pose: invertedPosition(mechanism, angle),
  }));
  const start = found.find(({ pose }) => pose.outcome === 'closes');
  const armAngle = start?.pose.outcome === 'closes' ? start.pose[side].armAngle : 0;
  const O4 = { x: frame, y: 0 };
  const B = polar(arm, armAngle, O4);
  return {
    points: {
      O2: { x: 0, y: 0 },
      A: polar(crank, start?.angle ?? 0),
      O4,
      B,
      E: polar(crank + frame, armAngle + turn, B),
    },
    fixed: ['O2', 'O4'],
    bars: [{ ends: ['O2', 'A'], length: crank }],
    plates: [{ shape: { O4: { x: 0, y: 0 }, B: { x: arm, y: 0 }, E: end } }],
    slides: [{ point: 'A', along: ['B', 'E'] }],
    drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
  };
}

/** A slotted lever, driven by its crank, as data: points `O2`, `A`, `O4` (the lever's pivot) and `E`, its end. */
export function slottedLeverLinkage(crank: number, centreDistance: number, lever: number): Linkage {
  requireSize('slottedLeverLinkage', 'crank', crank);
  requireSize('slottedLeverLinkage', 'centreDistance', centreDistance);
  requireSize('slottedLeverLinkage', 'lever', lever);
  return {
    points: {
      O2: { x: 0, y: 0 },
      A: { x: 0, y: crank },
      O4: { x: 0, y: -centreDistance },
      E: { x: 0, y: lever - centreDistance },
    },
    fixed: ['O2', 'O4'],
    bars: [
      { ends: ['O2', 'A'], length: crank },
      { ends: ['O4', 'E'], length: lever },
    ],
    slides: [{ point: 'A', along: ['O4', 'E'] }],
    drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
  };
}

function requireInverted(
  caller: string,
  { crank, frame, arm, grooveAngle = Math.PI / 2 }: InvertedCrankSlider,
): Required<InvertedCrankSlider> {
  return {
    crank: requireSize(caller, 'crank', crank),
    frame: requireSize(caller, 'frame', frame),
    arm: requireSizeOrNought(caller, 'arm', arm),
    grooveAngle: requireWithin(caller, 'grooveAngle', grooveAngle, 0, Math.PI),
  };
}
