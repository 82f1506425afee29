import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireCount,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/** How the pin meets the slot when the arbors stand where they stand. */
export type GenevaEntry =
  /** Off the slot's line by `angle`; it strikes the slot's side with that share of its speed. */
  | { readonly outcome: 'enters'; readonly angle: number; readonly blow: number }
  /** Too far apart: the pin passes the mouth, `gap` before the line of the slot. */
  | { readonly outcome: 'misses'; readonly gap: number };

/**
 * How the pin of `crank` enters a slot when the arbors stand `centreDistance` apart: without a
 * blow only at a/sin(π/n).
 *
 * Radians; one unit of length; an outside or an inside wheel.
 *
 * @throws RangeError for fewer than 3 slots, lengths of 0 or less.
 * @see ε = acos(c·sin(π/n)/a): exact geometry.
 * @example genevaEntry(6, 50, 99.5) // → { outcome: 'enters', angle: 0.100042, blow: 0.099875 }
 * @example genevaEntry(6, 50, 102) // → { outcome: 'misses', gap: 1 }
 */
export function genevaEntry(slots: number, crank: number, centreDistance: number): GenevaEntry {
  requireCount('genevaEntry', 'slots', slots, 3);
  requirePositive('genevaEntry', 'crank', crank);
  requirePositive('genevaEntry', 'centreDistance', centreDistance);
  const beside = finiteResult('genevaEntry', centreDistance * Math.sin(Math.PI / slots));
  const gap = beside - crank;
  if (gap > entryTolerance * crank) return { outcome: 'misses', gap };
  const blow = Math.sqrt(Math.max(0, -gap / crank)) * Math.sqrt(1 + beside / crank);
  return finiteResult('genevaEntry', {
    outcome: 'enters',
    angle: Math.atan2(blow, beside / crank),
    blow,
  });
}

/** Arbors set to the right distance miss it by their last digits only. */
const entryTolerance = 1e-12;

/** The sizes of a Geneva pair in wood; the lock disc's clearance is taken off its radius. */
export interface GenevaMake {
  readonly slots: number;
  readonly crank: number;
  readonly pin: number;
  readonly lockRadius: number;
  readonly lockClearance: number;
}

/** What the wood must bear, all from the right distance of the arbors. */
export interface GenevaWood {
  /** From the wheel's arbor to the floor of the slots, half a pin past the pin's nearest centre. */
  readonly floor: number;
  /** From the mouth to the pin's centre at its nearest. */
  readonly slotLength: number;
  /** The wood of a horn between its slot and the hollow of the lock disc. */
  readonly horn: number;
  /** How far the wheel can rock while it rests. */
  readonly play: number;
  /** The width of the lock disc's cut-out, as an angle of the crank. */
  readonly cutOut: number;
}

/**
 * The wood that an outside Geneva wheel leaves at its arbor and horns, and how firmly it rests; a
 * negative length is wood that is missing.
 *
 * Radians; one unit of length.
 *
 * @throws RangeError for fewer than 3 slots, a crank, pin or lock of 0 or less, a clearance below 0.
 * @see floor c − a − p/2, length a + R − c, horn a − p/2 − lock, play clearance/R: exact geometry.
 * @example genevaWood({ slots: 6, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 }).floor // → 46
 */
export function genevaWood(make: GenevaMake): GenevaWood {
  const { slots, crank, pin, lockRadius, lockClearance } = make;
  requireMake('genevaWood', make);
  const half = Math.PI / slots;
  const centreDistance = crank / Math.sin(half);
  const mouthRadius = crank / Math.tan(half);
  return finiteResult('genevaWood', {
    floor: centreDistance - crank - pin / 2,
    slotLength: crank + mouthRadius - centreDistance,
    horn: crank - pin / 2 - lockRadius,
    play: lockClearance / mouthRadius,
    cutOut: Math.PI - 2 * half,
  });
}

/** The thickest arbor, or by how much there is no wood for any. */
export type GenevaArbor =
  | { readonly outcome: 'fits'; readonly diameter: number }
  | { readonly outcome: 'no-wood'; readonly by: number };

/**
 * The thickest wheel arbor that leaves `wood` between its hole and the floor of the slots.
 *
 * @throws RangeError for fewer than 3 slots, a crank or a pin of 0 or less, wood below 0.
 * @see 2(a/sin(π/n) − a − p/2 − t): exact geometry.
 * @example genevaArbor(6, 50, 8, 6) // → { outcome: 'fits', diameter: 80 }
 */
export function genevaArbor(slots: number, crank: number, pin: number, wood: number): GenevaArbor {
  requireCount('genevaArbor', 'slots', slots, 3);
  requirePositive('genevaArbor', 'crank', crank);
  requirePositive('genevaArbor', 'pin', pin);
  requireNonNegative('genevaArbor', 'wood', wood);
  const diameter = 2 * (crank / Math.sin(Math.PI / slots) - crank - pin / 2 - wood);
  return finiteResult(
    'genevaArbor',
    diameter > 0 ? { outcome: 'fits', diameter } : { outcome: 'no-wood', by: -diameter / 2 },
  );
}

/** Refuses a pair that is none: the guard of every function that takes one. */
export function requireMake(caller: string, make: GenevaMake): void {
  requireCount(caller, 'slots', make.slots, 3);
  requireWithin(caller, 'slots', make.slots, 3, 360);
  requirePositive(caller, 'crank', make.crank);
  requirePositive(caller, 'pin', make.pin);
  requirePositive(caller, 'lockRadius', make.lockRadius);
  requireNonNegative(caller, 'lockClearance', make.lockClearance);
}
