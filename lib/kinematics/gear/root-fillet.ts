import { finiteResult } from '@/lib/numeric/finite-result';
import type { CompleteGearSpec } from '@/lib/kinematics/gear/proportions';

/**
 * The tooth of the rack that rolls out a wheel's tooth spaces, placed for one wheel: the corner of
 * its tip is an arc, and that arc leaves the root fillet behind.
 */
export interface CuttingRack {
  /** Pitch radius of the wheel, along which the rack rolls. */
  readonly pitchRadius: number;
  /** Radius of the corner. */
  readonly corner: number;
  /** How far the centre of the corner lies inside the pitch circle (negative: outside). */
  readonly depth: number;
  /** How far the centre of the corner lies from the middle of the rack's tooth. */
  readonly offset: number;
  /** Direction of the flank's normal, from the radial: the corner ends there. */
  readonly lastNormal: number;
}

/** A point of a fillet: its radius, and its angle from the middle of the tooth space. */
export interface FilletPoint {
  readonly radius: number;
  readonly angle: number;
}

/**
 * The cutting rack of a wheel: its flanks are straight to one addendum below the reference line,
 * and the corner fills the clearance (ISO 53 profile A at 20°), or as much as a full round allows.
 *
 * `backlash` is the arc by which the wheel's teeth are thinned. `corner` is negative when no tooth
 * of a rack is left at that depth; the caller refuses it.
 *
 * Source: ISO 53:1998; corner radius c/(1 − sin α) from the tangency of arc, flank and tip line.
 * @example cuttingRack({ module: 1, teeth: 20, pressureAngle: Math.PI / 9, shift: 0, addendum: 1, clearance: 0.25 }, 0).corner // → 0.37995084
 */
export function cuttingRack(gear: CompleteGearSpec, backlash: number): CuttingRack {
  const { module, pressureAngle } = gear;
  const sine = Math.sin(pressureAngle);
  const cosine = Math.cos(pressureAngle);
  const whole = module * (gear.addendum + gear.clearance);
  const halfTip = (Math.PI * module) / 4 + backlash / 2 - (whole * sine) / cosine;
  const filling = (module * gear.clearance) / (1 - sine);
  const fullRound = (halfTip * cosine) / (1 - sine);
  const corner = Math.min(filling, fullRound);
  return finiteResult('cuttingRack', {
    pitchRadius: (module * gear.teeth) / 2,
    corner,
    depth: whole - corner - module * gear.shift,
    offset: Math.max(0, halfTip - (corner * (1 - sine)) / cosine),
    lastNormal: Math.PI / 2 - pressureAngle,
  });
}

/**
 * The point of the fillet that the corner cuts where its normal stands at `normal` from the radial.
 *
 * The corner touches the wheel when that normal passes through the pitch point; so the rack's place
 * follows from the normal, and no root has to be found. `normal` runs from 0 (the root circle) to
 * `lastNormal` (the end of the straight flank); the answer is the trochoid's parallel curve.
 *
 * @example filletPoint({ pitchRadius: 10, corner: 0.38, depth: 0.87, offset: 0.1, lastNormal: 1.2 }, 0).radius // → 8.75
 */
export function filletPoint(rack: CuttingRack, normal: number): FilletPoint {
  const below = rack.depth + rack.corner * Math.cos(normal);
  const ahead = rack.depth * Math.tan(normal) + rack.corner * Math.sin(normal);
  const rolled = rack.depth * Math.tan(normal) - rack.offset;
  return finiteResult('filletPoint', {
    radius: Math.hypot(rack.pitchRadius - below, ahead),
    angle: Math.atan2(ahead, rack.pitchRadius - below) - rolled / rack.pitchRadius,
  });
}

/**
 * How far the straight flank of the cutting rack reaches past the point where the line of action
 * touches the base circle, measured along the radius; positive means that the foot is undercut.
 *
 * @example undercutDepth({ pitchRadius: 5, corner: 0, depth: 1, offset: 0.4, lastNormal: Math.PI / 2 - Math.PI / 9 }) // → 0.4151111078
 */
export function undercutDepth(rack: CuttingRack): number {
  const cosine = Math.cos(rack.lastNormal);
  const depth = rack.depth + rack.corner * cosine - rack.pitchRadius * cosine * cosine;
  return finiteResult('undercutDepth', depth);
}
