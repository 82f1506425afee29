import { involute, involuteInverse, pressureAngleAt } from '@/lib/kinematics/gear/involute';
import type { CompleteGearSpec } from '@/lib/kinematics/gear/proportions';
import { cuttingRack, filletPoint, undercutDepth } from '@/lib/kinematics/gear/root-fillet';
import type { CuttingRack } from '@/lib/kinematics/gear/root-fillet';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireSize } from '@/lib/numeric/moderate';
import { rootBetween } from '@/lib/numeric/root-between';

/** A point of a tooth: its radius, and its angle from the middle of the tooth. */
export interface ToothPoint {
  readonly radius: number;
  readonly angle: number;
}

/** One side of one tooth, from the root circle to the tip. */
export interface ToothSide {
  /** From the root circle to the end of the fillet. */
  readonly fillet: readonly ToothPoint[];
  /** From the end of the fillet to the tip; empty if the fillet takes the whole side. */
  readonly flank: readonly ToothPoint[];
  /** Where the involute begins, or where the tooth ends if it has none. */
  readonly formRadius: number;
  /** Where the tooth ends: the tip circle, or the point if its sides meet below that. */
  readonly tipRadius: number;
  /** How far inside the tip circle the sides meet; 0 if they do not. */
  readonly pointedBy: number;
  /** How much of the foot's height the cutting rack digs away; 0 if nothing. */
  readonly undercutBy: number;
}

/** Undercut less than this share of the pitch radius is rounding. */
const undercutTolerance = 1e-12;
/** Fine enough to bracket the one crossing of fillet and involute. */
const crossingSteps = 96;

/**
 * One side of a tooth: root fillet as the cutting rack leaves it, then true involute.
 *
 * `backlash` is the arc taken off the thickness on the pitch circle. Where the rack undercuts, the
 * fillet ends where it cuts the involute; where the sides meet below the tip circle, there.
 *
 * @throws RangeError if no tooth or no tooth space is left.
 * @example toothSide({ module: 1, teeth: 10, pressureAngle: Math.PI / 9, shift: 0, addendum: 1, clearance: 0.25 }, 0, 10, 8).undercutBy // → 0.41511111
 */
export function toothSide(
  gear: CompleteGearSpec,
  backlash: number,
  flankSteps: number,
  filletSteps: number,
): ToothSide {
  const curve = involuteSide(gear, backlash);
  const rack = cuttingRack(gear, backlash);
  requireSize('toothSide', 'corner of the cutting rack', rack.corner);
  const fillet = (normal: number): ToothPoint => {
    const { radius, angle } = filletPoint(rack, normal);
    return { radius, angle: Math.PI / gear.teeth - angle };
  };
  const undercut = undercutDepth(rack);
  const isUndercut = undercut > undercutTolerance * rack.pitchRadius;
  const joint = isUndercut ? crossing(curve, fillet, rack) : rack.lastNormal;
  const tipCircle = gear.module * (gear.teeth / 2 + gear.addendum + gear.shift);
  const end = lastNormal(fillet, joint, tipCircle);
  const formRadius = fillet(end).radius;
  const tipRadius = end < joint ? formRadius : Math.min(tipCircle, curve.pointedRadius);
  return finiteResult('toothSide', {
    fillet: steps(filletSteps).map((share) => fillet(end * share)),
    flank: flankPoints(curve, formRadius, tipRadius, flankSteps),
    formRadius,
    tipRadius,
    pointedBy: Math.max(0, tipCircle - tipRadius),
    undercutBy: isUndercut ? undercut : 0,
  });
}

interface InvoluteSide {
  readonly baseRadius: number;
  readonly pointedRadius: number;
  readonly angleAt: (radius: number) => number;
}

function involuteSide(gear: CompleteGearSpec, backlash: number): InvoluteSide {
  const { module, teeth, pressureAngle } = gear;
  const baseRadius = ((module * teeth) / 2) * Math.cos(pressureAngle);
  const thickness = Math.PI / 2 + 2 * gear.shift * Math.tan(pressureAngle) - backlash / module;
  const atBase = thickness / teeth + involute(pressureAngle);
  requireSize('toothSide', 'tooth thickness at the base circle', atBase);
  return {
    baseRadius,
    pointedRadius: baseRadius / Math.cos(involuteInverse(atBase)),
    angleAt: (radius) => atBase - involute(pressureAngleAt(baseRadius, radius)),
  };
}

/** Where an undercut fillet cuts the involute, as the normal's angle. */
function crossing(
  curve: InvoluteSide,
  fillet: (normal: number) => ToothPoint,
  rack: CuttingRack,
): number {
  const outside = (normal: number): number => {
    const point = fillet(normal);
    return point.angle - curve.angleAt(Math.max(point.radius, curve.baseRadius));
  };
  let above = rack.lastNormal;
  for (let step = crossingSteps - 1; step >= 0; step -= 1) {
    const below = (rack.lastNormal * step) / crossingSteps;
    if (fillet(below).radius < curve.baseRadius) break;
    if (outside(below) < 0) {
      return rootBetween('toothSide', outside, below, above);
    }
    above = below;
  }
  return above;
}

/** Where the fillet must end: at the joint, or earlier at the tip circle or at its own twin. */
function lastNormal(
  fillet: (normal: number) => ToothPoint,
  joint: number,
  tipCircle: number,
): number {
  const room = (normal: number): number => {
    const point = fillet(normal);
    return Math.min(point.angle, tipCircle / point.radius - 1);
  };
  for (let step = 1; step <= crossingSteps; step += 1) {
    const normal = (joint * step) / crossingSteps;
    if (room(normal) < 0) {
      return rootBetween('toothSide', room, (joint * (step - 1)) / crossingSteps, normal);
    }
  }
  return joint;
}

/** Steps even in the angle unwound, so that they crowd where the involute bends most. */
function flankPoints(
  curve: InvoluteSide,
  from: number,
  to: number,
  count: number,
): readonly ToothPoint[] {
  const unwound = (radius: number): number => Math.tan(pressureAngleAt(curve.baseRadius, radius));
  const first = unwound(from);
  const last = unwound(to);
  if (to <= from) return [];
  return steps(count).map((share) => {
    const radius =
      share === 1 ? to : curve.baseRadius * Math.hypot(1, first + (last - first) * share);
    return { radius, angle: Math.max(0, curve.angleAt(radius)) };
  });
}

function steps(count: number): readonly number[] {
  return Array.from({ length: count + 1 }, (_, step) => step / count);
}
