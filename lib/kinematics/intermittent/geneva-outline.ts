import { arcPoints } from '@/lib/geometry/circle';
import { type Point, polar, rotate } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative } from '@/lib/numeric/require';
import { type GenevaMake, genevaWood, requireMake } from './geneva-making';

/** A closed outline, or the wood that is missing for it. */
export type GenevaOutline =
  | { readonly outcome: 'outlined'; readonly points: readonly Point[] }
  /** The slots meet in the middle: no wood is left at the arbor. */
  | { readonly outcome: 'no-wood-at-arbor'; readonly by: number }
  /** Slot and hollow meet: a horn has no thickness. */
  | { readonly outcome: 'no-horn'; readonly by: number };

/**
 * The closed outline of an outside Geneva wheel, counter-clockwise, a slot on +x: slots as wide as
 * the pin and `slotClearance`, hollows for the lock disc between them, horn tips on the circle of
 * the slot mouths.
 *
 * The arbor of the crank in rest stands on the middle line of a hollow, at the right distance.
 *
 * @throws RangeError as `genevaWood`, and for a slot clearance below 0.
 * @see exact geometry: slot and crank are square to each other at entry.
 */
export function genevaWheelOutline(make: GenevaMake, slotClearance = 0): GenevaOutline {
  requireMake('genevaWheelOutline', make);
  requireNonNegative('genevaWheelOutline', 'slotClearance', slotClearance);
  const { slots, crank, lockRadius } = make;
  const { floor } = genevaWood(make);
  const halfSlot = (make.pin + slotClearance) / 2;
  const floorBy = halfSlot / Math.tan(Math.PI / slots) - (floor + make.pin / 2);
  if (floor <= 0 || floorBy >= 0) {
    return { outcome: 'no-wood-at-arbor', by: Math.max(-floor, floorBy) };
  }
  const horn = crank - halfSlot - lockRadius;
  if (horn <= 0) return { outcome: 'no-horn', by: -horn };
  const half = Math.PI / slots;
  const step = stepOutline(make, halfSlot, floor + make.pin / 2);
  const points = Array.from({ length: slots }, (_, k) =>
    step.map((point) => rotate(point, 2 * half * k)),
  ).flat();
  return finiteResult('genevaWheelOutline', { outcome: 'outlined', points });
}

/** From the far wall of the slot on +x round its floor, and over the hollow to the next slot. */
function stepOutline(make: GenevaMake, halfSlot: number, floorCentre: number): Point[] {
  const half = Math.PI / make.slots;
  const mouth = make.crank / Math.tan(half);
  const wallEnd = Math.sqrt(mouth - halfSlot) * Math.sqrt(mouth + halfSlot);
  const floorArc = arcPoints(halfSlot, -Math.PI / 2, -1.5 * Math.PI, { x: floorCentre, y: 0 });
  const centre = polar(make.crank / Math.sin(half), half);
  // the hollow's arc, cut by the circle of the mouths, about the crank's arbor
  const reach = hollowHalfAngle(make, mouth);
  const towards = half + Math.PI;
  return [
    { x: wallEnd, y: -halfSlot },
    ...floorArc,
    { x: wallEnd, y: halfSlot },
    ...arcPoints(make.lockRadius, towards + reach, towards - reach, centre),
  ];
}

/** Half the angle, at the crank's arbor, of the hollow between two horn tips: the cosine rule. */
function hollowHalfAngle({ slots, crank, lockRadius }: GenevaMake, mouth: number): number {
  const distance = crank / Math.sin(Math.PI / slots);
  const cosine =
    (distance / lockRadius + lockRadius / distance - (mouth / distance) * (mouth / lockRadius)) / 2;
  return Math.acos(Math.min(1, Math.max(-1, cosine)));
}

/**
 * The closed outline of the lock disc, counter-clockwise about the crank's arbor, the pin on +x:
 * round, less its clearance, with a cut-out of π − 2π/n for the horns toward the pin.
 *
 * The cut-out is the circle of the slot mouths, drawn down about the crank's arbor until it meets
 * the disc's rim square at both ends, so that the disc lets go just as the pin enters.
 *
 * @throws RangeError as `genevaWood`.
 * @see exact geometry: drawn from the crank's arbor the circle of mouths touches the pin's rays at
 * entry and exit, at the crank's length.
 */
export function genevaLockOutline(make: GenevaMake): GenevaOutline {
  requireMake('genevaLockOutline', make);
  const { slots, lockRadius, lockClearance } = make;
  const half = Math.PI / slots;
  const radius = lockRadius - lockClearance;
  if (radius <= 0) return { outcome: 'no-wood-at-arbor', by: -radius };
  const { horn } = genevaWood(make);
  if (horn <= 0) return { outcome: 'no-horn', by: -horn };
  const open = Math.PI / 2 - half;
  const centre = { x: radius / Math.sin(half), y: 0 };
  const hollow = arcPoints(radius / Math.tan(half), Math.PI + half, Math.PI - half, centre);
  const rim = arcPoints(radius, open, 2 * Math.PI - open, { x: 0, y: 0 });
  return finiteResult('genevaLockOutline', {
    outcome: 'outlined',
    points: [...rim, ...hollow.slice(1, -1)],
  });
}
