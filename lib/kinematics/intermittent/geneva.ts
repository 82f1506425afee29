import { finiteResult } from '@/lib/numeric/finite-result';
import { wrapAngle } from '@/lib/geometry/angle';
import { requireCount, requireFinite, requirePositive, requireWithin } from '@/lib/numeric/require';

/** A Geneva wheel: `outside`, the crank beside it and turning against it, or `inside`, within it. */
export type GenevaKind = 'outside' | 'inside';

/** The layout of a Geneva pair whose pin enters square, along the slot. */
export interface GenevaLayout {
  readonly centreDistance: number;
  /** From the wheel's arbor to the pin's centre where it enters: the slot mouths. */
  readonly mouthRadius: number;
  /** The crank's angle while the wheel moves, and while it rests. */
  readonly motionAngle: number;
  readonly dwellAngle: number;
  readonly motionFraction: number;
  /** The wheel's greatest speed over the crank's, at mid-change. */
  readonly peakSpeedRatio: number;
  /** Over the crank's speed squared: the jump at entry, and the greatest. */
  readonly entryAcceleration: number;
  readonly peakAcceleration: number;
  /** The crank's angle from the line of centres at which the greatest acceleration comes. */
  readonly angleAtPeak: number;
}

/** The wheel at one moment, angles from the line of centres in the wheel's sense of travel. */
export interface GenevaState {
  readonly outcome: 'moving' | 'resting';
  readonly wheelAngle: number;
  readonly speedRatio: number;
  readonly acceleration: number;
}

/**
 * The layout of a Geneva wheel of `slots` slots for a crank of `crank`, pin centre to arbor.
 *
 * Radians; one unit of length; at least three slots. The inside wheel's acceleration is greatest
 * at entry.
 *
 * @throws RangeError for fewer than 3 slots or a crank of 0 or less.
 * @see c = a/sin(π/n): exact geometry; tables in the Mechanisms and Mechanical Devices Sourcebook (from memory).
 * @example genevaLayout('outside', 6, 40).centreDistance // → 80
 * @example genevaLayout('inside', 4, 50).peakSpeedRatio // → 0.414214
 */
export function genevaLayout(kind: GenevaKind, slots: number, crank: number): GenevaLayout {
  requireSlots('genevaLayout', slots);
  requirePositive('genevaLayout', 'crank', crank);
  const half = Math.PI / slots;
  const sine = Math.sin(half);
  const motionAngle = 2 * motionLimit(kind, slots);
  const angleAtPeak = kind === 'outside' ? peakAngle(sine) : motionAngle / 2;
  return finiteResult('genevaLayout', {
    centreDistance: crank / sine,
    mouthRadius: crank / Math.tan(half),
    motionAngle,
    dwellAngle: 2 * Math.PI - motionAngle,
    motionFraction: motionAngle / (2 * Math.PI),
    peakSpeedRatio: kind === 'outside' ? sine / (1 - sine) : sine / (1 + sine),
    entryAcceleration: Math.tan(half),
    peakAcceleration: Math.abs(moving(kind, sine, angleAtPeak).acceleration),
    angleAtPeak,
  });
}

/**
 * The wheel when the crank stands at `crankAngle` from the line of centres, turning evenly.
 *
 * While it rests its angle is where it stopped: half a step to the side last passed, and after the
 * middle of the rest half a step before the next change.
 *
 * @throws RangeError for fewer than 3 slots or an angle that is no finite number.
 * @see tan β = λ sin α/(1 ∓ λ cos α), λ = sin(π/n), and its derivatives: exact geometry.
 * @example genevaState('outside', 4, Math.PI / 9).wheelAngle // → 0.62453
 */
export function genevaState(kind: GenevaKind, slots: number, crankAngle: number): GenevaState {
  requireSlots('genevaState', slots);
  const angle = wrapAngle(requireFinite('genevaState', 'crankAngle', crankAngle));
  if (Math.abs(angle) > motionLimit(kind, slots)) {
    const wheelAngle = (Math.sign(angle) * Math.PI) / slots;
    return { outcome: 'resting', wheelAngle, speedRatio: 0, acceleration: 0 };
  }
  return { outcome: 'moving', ...moving(kind, Math.sin(Math.PI / slots), angle) };
}

/**
 * The crank's angle when the wheel stands at `wheelAngle` of its change: the inverse of `genevaState`.
 *
 * @throws RangeError for fewer than 3 slots or an angle beyond half a step.
 * @see sin(α ± β) = sin β/λ: the law of sines.
 * @example genevaCrankAngle('outside', 4, 0.6245295) // → 0.34907
 */
export function genevaCrankAngle(kind: GenevaKind, slots: number, wheelAngle: number): number {
  requireSlots('genevaCrankAngle', slots);
  const half = Math.PI / slots;
  requireWithin('genevaCrankAngle', 'wheelAngle', wheelAngle, -half * slack, half * slack);
  const pin = Math.asin(Math.min(1, Math.max(-1, Math.sin(wheelAngle) / Math.sin(half))));
  return kind === 'outside' ? pin - wheelAngle : pin + wheelAngle;
}

/** Half a step that was reckoned in another way may be over by its last digits. */
const slack = 1 + 1e-12;

/** The crank's angle from the line of centres at entry and exit. */
function motionLimit(kind: GenevaKind, slots: number): number {
  return kind === 'outside' ? Math.PI / 2 - Math.PI / slots : Math.PI / 2 + Math.PI / slots;
}

function moving(kind: GenevaKind, sine: number, angle: number): Omit<GenevaState, 'outcome'> {
  const [s, c] = [Math.sin(angle), Math.cos(angle)];
  const sign = kind === 'outside' ? -1 : 1;
  // pin's distance from the wheel's arbor over the arbors' distance, squared
  const squared = (1 + sign * sine * c) ** 2 + (sine * s) ** 2;
  return {
    wheelAngle: Math.atan2(sine * s, 1 + sign * sine * c),
    speedRatio: (sine * (c + sign * sine)) / squared,
    acceleration: (-sine * s * (1 - sine) * (1 + sine)) / squared ** 2,
  };
}

/** cos α = √(M² + 2) − M with M = (1 + λ²)/4λ, as a quotient that keeps its digits. */
function peakAngle(sine: number): number {
  const m = (1 + sine * sine) / (4 * sine);
  return Math.acos(Math.min(1, 2 / (m + Math.sqrt(m * m + 2))));
}

function requireSlots(caller: string, slots: number): void {
  requireCount(caller, 'slots', slots, 3);
}
