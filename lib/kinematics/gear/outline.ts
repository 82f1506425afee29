import type { Point } from '@/lib/geometry/point';
import { completeGear, requireDrawable } from '@/lib/kinematics/gear/proportions';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';
import { toothSide } from '@/lib/kinematics/gear/tooth-profile';
import type { ToothPoint, ToothSide } from '@/lib/kinematics/gear/tooth-profile';
import { itemAt } from '@/lib/numeric/item-at';
import { requireMeasure } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A wheel to be drawn. */
export interface OutlineSpec extends GearSpec {
  /** Arc taken off the thickness of each tooth on the pitch circle; negative makes it fuller. */
  readonly backlash?: number;
  /** Steps along one involute flank; 10 unless given. */
  readonly flankSteps?: number;
  /** Steps along one root fillet; 8 unless given. */
  readonly filletSteps?: number;
}

/** What a wheel's teeth can and cannot be, for saying beside its outline. */
export interface ToothLimits {
  /** Where the involute begins. */
  readonly formRadius: number;
  /** Where the teeth end. */
  readonly tipRadius: number;
  /** How far inside the tip circle the teeth come to a point; 0 if they have a land. */
  readonly pointedBy: number;
  /** How much of the foot's height a rack digs away; 0 if nothing. */
  readonly undercutBy: number;
}

/** Arcs of the root and tip circles are drawn in steps no longer than this. */
const arcStep = Math.PI / 90;

/**
 * The outline of a whole involute wheel: a closed polygon, counter-clockwise, about the origin.
 *
 * The middle of a tooth lies on +x. The flanks are true involutes; the root fillet is the one that
 * a rack with rounded corners rolls out (`root-fillet.ts`), so a pinion with few teeth is undercut
 * as it would be in wood. Teeth that come to a point below the tip circle end there: `toothLimits`
 * says by how much. The last point does not repeat the first.
 *
 * @throws RangeError for nonsense, and if no tooth or no space is left by shift, angle or backlash.
 * Source: ISO 53:1998 for the rack; the curves are its envelope, checked in the tests by rolling it.
 * @example involuteOutline({ module: 3, teeth: 24, pressureAngle: Math.PI / 9 }).length // → 960
 */
export function involuteOutline(spec: OutlineSpec): readonly Point[] {
  requireDrawable('involuteOutline', spec.teeth);
  const side = sideOf('involuteOutline', spec);
  const pitch = (2 * Math.PI) / spec.teeth;
  const half = [...side.fillet, ...side.flank.slice(1)];
  const root = rootArc(side, pitch);
  const tip = tipArc(side);
  const tooth = [
    ...root.map(({ radius, angle }) => ({ radius, angle: angle - pitch / 2 })),
    ...half.map(({ radius, angle }) => ({ radius, angle: -angle })),
    ...tip,
    ...half.toReversed(),
  ];
  return aroundTheOrigin(tooth, spec.teeth);
}

/**
 * The limits of a wheel's teeth: where the involute begins and ends, undercut and pointed tips with
 * their amounts.
 *
 * @throws RangeError as `involuteOutline` does.
 * @example toothLimits({ module: 1, teeth: 10, pressureAngle: Math.PI / 9 }).undercutBy // → 0.41511111
 */
export function toothLimits(spec: OutlineSpec): ToothLimits {
  const { formRadius, tipRadius, pointedBy, undercutBy } = sideOf('toothLimits', spec);
  return { formRadius, tipRadius, pointedBy, undercutBy };
}

function sideOf(caller: string, spec: OutlineSpec): ToothSide {
  const gear = completeGear(caller, spec);
  const backlash = requireMeasure(caller, 'backlash', spec.backlash ?? 0);
  const flankSteps = requireCount(caller, 'flankSteps', spec.flankSteps ?? 10);
  const filletSteps = requireCount(caller, 'filletSteps', spec.filletSteps ?? 8);
  return toothSide(gear, backlash, flankSteps, filletSteps);
}

/** The inner points of the root circle's arc, from the middle of the tooth space's angles. */
function rootArc(side: ToothSide, pitch: number): readonly ToothPoint[] {
  const start = itemAt(side.fillet, 0);
  return arc(start.radius, pitch / 2 - start.angle);
}

function tipArc(side: ToothSide): readonly ToothPoint[] {
  const last = itemAt([...side.fillet, ...side.flank], -1);
  return arc(last.radius, last.angle);
}

/** The points strictly between −halfAngle and halfAngle. */
function arc(radius: number, halfAngle: number): readonly ToothPoint[] {
  const count = Math.max(2, 2 * Math.ceil(halfAngle / arcStep));
  return Array.from({ length: count - 1 }, (_, index) => ({
    radius,
    angle: halfAngle * ((2 * (index + 1)) / count - 1),
  }));
}

function aroundTheOrigin(tooth: readonly ToothPoint[], teeth: number): readonly Point[] {
  const xs = tooth.map(({ radius, angle }) => radius * Math.cos(angle));
  const ys = tooth.map(({ radius, angle }) => radius * Math.sin(angle));
  const outline: Point[] = [];
  for (let turn = 0; turn < teeth; turn += 1) {
    const cosine = Math.cos((2 * Math.PI * turn) / teeth);
    const sine = Math.sin((2 * Math.PI * turn) / teeth);
    xs.forEach((x, index) => {
      const y = itemAt(ys, index);
      outline.push({ x: x * cosine - y * sine, y: x * sine + y * cosine });
    });
  }
  return outline;
}
