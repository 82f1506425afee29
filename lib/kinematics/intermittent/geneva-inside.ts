import { arcPoints } from '@/lib/geometry/circle';
import { type Point, polar, rotate } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative, requirePositive } from '@/lib/numeric/require';
import { type GenevaMake, requireMake } from './geneva-making';

/** The ring of an inside Geneva wheel, or the wood that is missing for it. */
export type GenevaRing =
  | {
      readonly outcome: 'outlined';
      /** The outer edge, a circle about the wheel's arbor. */
      readonly rimRadius: number;
      /** The opening with its slots and hollows, counter-clockwise, a slot on +x. */
      readonly opening: readonly Point[];
    }
  /** Slot and hollow meet: a horn has no thickness. */
  | { readonly outcome: 'no-horn'; readonly by: number }
  /** The lock is so small that its hollow does not reach the opening. */
  | { readonly outcome: 'hollow-closed'; readonly by: number };

/** The lock that rides on the crank behind its pin, or why there can be none. */
export type GenevaTail =
  | { readonly outcome: 'outlined'; readonly points: readonly Point[] }
  | { readonly outcome: 'no-horn'; readonly by: number }
  /** While the wheel moves the tips of its horns would cut so far into the lock: make it larger. */
  | { readonly outcome: 'horns-strike'; readonly by: number };

/** Places of a change at which the horns are compared with the lock. */
const places = 180;

/**
 * The ring of an inside Geneva wheel: slots that open inward, as wide as the pin and
 * `slotClearance`; between them hollows for the lock, about the crank's arbor as it stands in rest;
 * and `wood` outside the floors of the slots.
 *
 * The crank must lie before the ring, on an arbor that does not pass through it: only its pin and
 * its lock reach into the ring's plane.
 *
 * @throws RangeError as `genevaWood`, for wood of 0 or less and a slot clearance below 0.
 * @see exact geometry: slot and crank are square to each other at entry, so a horn is
 * a − half a slot − lock thick, as on the outside wheel.
 * @example genevaRingOutline({ slots: 6, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 }, 20).rimRadius // → 174
 */
export function genevaRingOutline(make: GenevaMake, wood: number, slotClearance = 0): GenevaRing {
  requireMake('genevaRingOutline', make);
  requirePositive('genevaRingOutline', 'wood', wood);
  requireNonNegative('genevaRingOutline', 'slotClearance', slotClearance);
  const { slots, crank, pin, lockRadius } = make;
  const { half, distance, mouth } = layout(make);
  const halfSlot = (pin + slotClearance) / 2;
  const horn = crank - halfSlot - lockRadius;
  if (horn <= 0) return { outcome: 'no-horn', by: -horn };
  if (lockRadius <= distance - mouth) {
    return { outcome: 'hollow-closed', by: distance - mouth - lockRadius };
  }
  const step = stepOfRing(make, halfSlot);
  const opening = Array.from({ length: slots }, (_, k) =>
    step.map((point) => rotate(point, 2 * half * k)),
  ).flat();
  return finiteResult('genevaRingOutline', {
    outcome: 'outlined',
    rimRadius: distance + crank + pin / 2 + wood,
    opening,
  });
}

/** Round the slot on +x, along the mouth circle to the hollow, round it, and on to the next slot. */
function stepOfRing(make: GenevaMake, halfSlot: number): readonly Point[] {
  const { half, distance, mouth } = layout(make);
  const wallEnd = Math.sqrt(mouth - halfSlot) * Math.sqrt(mouth + halfSlot);
  const slotEdge = Math.asin(halfSlot / mouth);
  const tip = tipAngle(make);
  const inward = half + Math.PI;
  const open = lockHalfAngle(make);
  return [
    { x: wallEnd, y: -halfSlot },
    ...arcPoints(halfSlot, -Math.PI / 2, Math.PI / 2, { x: distance + make.crank, y: 0 }),
    ...arcPoints(mouth, slotEdge, half - tip, { x: 0, y: 0 }),
    ...arcPoints(
      make.lockRadius,
      inward + open,
      inward + 2 * Math.PI - open,
      polar(distance, half),
    ),
    ...arcPoints(mouth, half + tip, 2 * half - slotEdge, { x: 0, y: 0 }).slice(0, -1),
  ];
}

/**
 * The lock of an inside Geneva wheel, counter-clockwise about the crank's arbor, the pin on +x: a
 * segment of the lock disc behind the pin, less its clearance, as wide as the wheel's rest, so that
 * it lets go just as the pin enters.
 *
 * @throws RangeError as `genevaWood`.
 * @see its rim is exact geometry; that the horns pass it is found by trying a change in 180 places.
 */
export function genevaTailOutline(make: GenevaMake): GenevaTail {
  requireMake('genevaTailOutline', make);
  const { crank, pin, lockRadius, lockClearance } = make;
  const horn = crank - pin / 2 - lockRadius;
  if (horn <= 0) return { outcome: 'no-horn', by: -horn };
  const { half } = layout(make);
  const radius = requirePositive('genevaTailOutline', 'rim radius', lockRadius - lockClearance);
  const by = deepestHorn(make, radius);
  if (by > 0) return { outcome: 'horns-strike', by };
  const open = Math.PI / 2 - half;
  const points = arcPoints(radius, Math.PI - open, Math.PI + open, { x: 0, y: 0 });
  return finiteResult('genevaTailOutline', { outcome: 'outlined', points });
}

/** How far a tip of a horn comes within the lock, behind both its rim and its straight edge. */
function deepestHorn(make: GenevaMake, radius: number): number {
  const { half, distance, mouth } = layout(make);
  const slotEdge = Math.asin(Math.min(1, make.pin / 2 / mouth));
  const tips = [slotEdge, half - tipAngle(make)].flatMap((angle) => [angle, -angle]);
  const edge = radius * Math.sin(half);
  const limit = Math.PI / 2 + half;
  let deepest = 0;
  for (let k = 0; k <= places; k += 1) {
    const crankAngle = limit * ((2 * k) / places - 1);
    const pinAt = polar(make.crank, crankAngle, { x: distance, y: 0 });
    const wheel = Math.atan2(pinAt.y, pinAt.x);
    for (const tip of tips) {
      const stands = polar(mouth, wheel + tip);
      const seen = rotate({ x: stands.x - distance, y: stands.y }, -crankAngle);
      deepest = Math.max(deepest, Math.min(radius - Math.hypot(seen.x, seen.y), -edge - seen.x));
    }
  }
  return deepest;
}

/** Half the angle, at the wheel's arbor, between the two tips of a hollow: the cosine rule. */
function tipAngle(make: GenevaMake): number {
  const open = lockHalfAngle(make);
  const { distance } = layout(make);
  return Math.atan2(make.lockRadius * Math.sin(open), distance - make.lockRadius * Math.cos(open));
}

/** Half the angle, at the crank's arbor, between the two tips of a hollow. */
function lockHalfAngle(make: GenevaMake): number {
  const { distance } = layout(make);
  const { crank, lockRadius } = make;
  const cosine = (crank / lockRadius + lockRadius / crank) * (crank / (2 * distance));
  return Math.acos(Math.min(1, cosine));
}

function layout({ slots, crank }: GenevaMake) {
  const half = Math.PI / slots;
  return { half, distance: crank / Math.sin(half), mouth: crank / Math.tan(half) };
}
