import { itemAt } from '@/lib/numeric/item-at';
import type { Point } from '@/lib/geometry/point';
import { involute, pressureAngleAt } from '@/lib/kinematics/gear/involute';
import { completeGear, gearProportions, requireDrawable } from '@/lib/kinematics/gear/proportions';
import type { CompleteGearSpec, GearSpec } from '@/lib/kinematics/gear/proportions';
import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Sizes of a ring with teeth inside. */
export interface RingProportions {
  readonly pitchDiameter: number;
  /** Across the tips, inside the pitch circle. */
  readonly tipDiameter: number;
  /** Across the roots, outside it. */
  readonly rootDiameter: number;
}

/** A ring to be drawn. */
export interface RingOutlineSpec extends GearSpec {
  /** Arc taken off the thickness of each tooth on the pitch circle. */
  readonly backlash?: number;
  /** Steps along one flank; 10 unless given. */
  readonly flankSteps?: number;
}

/** Whether the tips of a pinion pass those of its ring on the way out of mesh. */
export type RingPassage =
  | { readonly outcome: 'passes'; readonly clearance: number }
  /** The tips foul by `overlap` along the ring's tip circle: the counts are too nearly alike. */
  | { readonly outcome: 'fouls'; readonly overlap: number };

/**
 * Sizes of a ring: the tips stand inwards, the roots outwards.
 *
 * @throws RangeError for nonsense, and if the tips reach the centre.
 * Source: case GR-IN-01; a positive shift moves tips and roots outwards.
 * @example ringProportions({ module: 3, teeth: 60, pressureAngle: Math.PI / 9 }) // → { pitchDiameter: 180, tipDiameter: 174, rootDiameter: 187.5 }
 */
export function ringProportions(spec: GearSpec): RingProportions {
  const gear = completeGear('ringProportions', spec);
  const { module: size, teeth, addendum, clearance, shift } = gear;
  return {
    pitchDiameter: size * teeth,
    tipDiameter:
      size * 2 * requireSize('ringProportions', 'tip radius', teeth / 2 - addendum + shift),
    rootDiameter: size * (teeth + 2 * (addendum + clearance + shift)),
  };
}

/**
 * The inside of a ring: a closed polygon, counter-clockwise, about the origin.
 *
 * The middle of one of the ring's own teeth lies on +x. Flanks are true involutes; teeth that would
 * reach inside the base circle end there; the root corners are left sharp, a clearance away from
 * the pinion's tips. The wood lies outside the polygon.
 *
 * @throws RangeError for nonsense, and if no tooth is left.
 * Source: the space of a ring is the tooth of an outside wheel of the same count (ISO 21771).
 * @example ringOutline({ module: 3, teeth: 60, pressureAngle: Math.PI / 9, flankSteps: 10 }).length // → 1560
 */
export function ringOutline(spec: RingOutlineSpec): readonly Point[] {
  requireDrawable('ringOutline', spec.teeth);
  const gear = completeGear('ringOutline', spec);
  const backlash = requireMeasure('ringOutline', 'backlash', spec.backlash ?? 0);
  const count = requireCount('ringOutline', 'flankSteps', spec.flankSteps ?? 10);
  const { tipDiameter, rootDiameter } = ringProportions(spec);
  const baseRadius = gearProportions(spec).baseDiameter / 2;
  const angleAt = ringHalfTooth(gear, backlash, baseRadius);
  const from = Math.max(tipDiameter / 2, baseRadius);
  const side = Array.from({ length: count + 1 }, (_, step) => {
    const radius = from + ((rootDiameter / 2 - from) * step) / count;
    return { radius, angle: angleAt(radius) };
  });
  requireSize('ringOutline', 'tooth at the tip', itemAt(side, 0).angle);
  const pitch = (2 * Math.PI) / gear.teeth;
  const rootAngle = itemAt(side, -1).angle;
  requireSize('ringOutline', 'space at the root', pitch / 2 - rootAngle);
  const tooth = [
    { radius: rootDiameter / 2, angle: -(rootAngle + pitch / 2) / 2 },
    ...side.toReversed().map(({ radius, angle }) => ({ radius, angle: -angle })),
    { radius: from, angle: 0 },
    ...side,
    { radius: rootDiameter / 2, angle: (rootAngle + pitch / 2) / 2 },
    { radius: rootDiameter / 2, angle: pitch / 2 },
  ];
  return Array.from({ length: gear.teeth }, (_, turn) =>
    tooth.map(({ radius, angle }) => ({
      x: radius * Math.cos(angle + turn * pitch),
      y: radius * Math.sin(angle + turn * pitch),
    })),
  ).flat();
}

/**
 * Whether a pinion's tips pass the ring's as they leave the mesh, for unshifted teeth on standard
 * centres.
 *
 * - `passes` with the clearance along the ring's tip circle; `fouls` with the overlap.
 *
 * @throws RangeError for nonsense, or a ring that is not larger than its pinion.
 * Source: trochoid interference, KHK, Gear Technical Reference (from memory); checked in the tests
 * by turning the two outlines.
 * @example ringPassage({ module: 3, teeth: 60, pressureAngle: Math.PI / 9 }, 20).outcome // → 'passes'
 */
export function ringPassage(ring: GearSpec, pinionTeeth: number): RingPassage {
  const own = gearProportions({ ...ring, teeth: pinionTeeth, shift: 0 });
  const { tipDiameter, pitchDiameter } = ringProportions({ ...ring, shift: 0 });
  const distance = requireSize(
    'ringPassage',
    'ring teeth over pinion teeth',
    (pitchDiameter - own.pitchDiameter) / 2,
  );
  const [pinionTip, ringTip] = [own.tipDiameter / 2, tipDiameter / 2];
  const ringBase = gearProportions({ ...ring, shift: 0 }).baseDiameter / 2;
  const across = ringTip ** 2 - pinionTip ** 2;
  const cosine = (across - distance ** 2) / (2 * distance * pinionTip);
  // Where the tip circles do not cross, the tips never come near each other.
  if (cosine >= 1) return { outcome: 'passes', clearance: ringTip - pinionTip - distance };
  const working = involute(ring.pressureAngle);
  const pinion =
    Math.acos(Math.max(-1, cosine)) +
    involute(pressureAngleAt(own.baseDiameter / 2, pinionTip)) -
    working;
  const ringSide =
    Math.acos(Math.min(1, Math.max(-1, (across + distance ** 2) / (2 * distance * ringTip)))) +
    involute(pressureAngleAt(ringBase, ringTip)) -
    working;
  const clearance = ringTip * ((pinion * pinionTeeth) / ring.teeth - ringSide);
  return clearance >= 0
    ? { outcome: 'passes', clearance }
    : { outcome: 'fouls', overlap: -clearance };
}

/** Half the angle of a ring's tooth at a radius from the base circle outwards. */
function ringHalfTooth(
  gear: CompleteGearSpec,
  backlash: number,
  baseRadius: number,
): (radius: number) => number {
  const space =
    Math.PI / 2 + 2 * gear.shift * Math.tan(gear.pressureAngle) + backlash / gear.module;
  const atBase = space / gear.teeth + involute(gear.pressureAngle);
  return (radius) => Math.PI / gear.teeth - atBase + involute(pressureAngleAt(baseRadius, radius));
}
