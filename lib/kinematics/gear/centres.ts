import { involute, involuteInverse } from '@/lib/kinematics/gear/involute';
import { completePair } from '@/lib/kinematics/gear/pair';
import type { PairSpec } from '@/lib/kinematics/gear/pair';
import { requireSize } from '@/lib/numeric/moderate';

/** What a pair without shift does when its arbors do not stand on standard centres. */
export type CentresOutcome =
  | {
      readonly outcome: 'runs';
      /** Radians. */
      readonly operatingAngle: number;
      /** Diameters of the circles that now roll on each other. */
      readonly firstRolling: number;
      readonly secondRolling: number;
      /** Play along the rolling circles. */
      readonly backlash: number;
      /** The usual estimate, twice the opening times tan α. */
      readonly backlashEstimate: number;
    }
  /** Nearer than standard: the teeth bite by `bite` along the rolling circles. */
  | { readonly outcome: 'bites'; readonly operatingAngle: number; readonly bite: number }
  | { readonly outcome: 'too-close'; readonly overlap: number };

/** Sizes of a shifted pair that runs without backlash and keeps its bottom clearance. */
export type ShiftedPair =
  | {
      readonly outcome: 'pair';
      readonly operatingAngle: number;
      /** How much the centres widen, in modules. */
      readonly widening: number;
      readonly centreDistance: number;
      readonly firstTip: number;
      readonly secondTip: number;
      readonly firstRoot: number;
      readonly secondRoot: number;
    }
  /** The shifts are so far inwards that no distance meshes: their sum must rise by `lacking`. */
  | { readonly outcome: 'no-mesh'; readonly lacking: number };

/** Sum of two shifts, or how far the distance falls short of any mesh. */
export type ShiftSum =
  | { readonly outcome: 'sum'; readonly sum: number }
  | { readonly outcome: 'too-close'; readonly overlap: number };

/** Centres that agree to this share of their distance count as standard. */
const standardTolerance = 1e-12;

/**
 * How an unshifted pair runs on other than its standard centres.
 *
 * Backlash is exact: 2a(inv α′ − inv α), for teeth without thinning of their own.
 *
 * @throws RangeError for nonsense.
 * Source: ISO 21771; cases GR-CD-01 and 02.
 * @example centresChanged({ module: 3, firstTeeth: 24, secondTeeth: 48, pressureAngle: Math.PI / 9 }, 108.5).outcome // → 'runs'
 */
export function centresChanged(spec: PairSpec, distance: number): CentresOutcome {
  const pair = completePair('centresChanged', spec);
  requireSize('centresChanged', 'distance', distance);
  const bases = pair.firstBase + pair.secondBase;
  if (distance < bases) return { outcome: 'too-close', overlap: bases - distance };
  const operatingAngle = anglesOn(bases, distance);
  const backlash = 2 * distance * (involute(operatingAngle) - involute(pair.pressureAngle));
  const opening = distance - pair.standardDistance;
  if (opening < -standardTolerance * distance) {
    return { outcome: 'bites', operatingAngle, bite: -backlash };
  }
  const together = pair.firstTeeth + pair.secondTeeth;
  return {
    outcome: 'runs',
    operatingAngle,
    firstRolling: (2 * distance * pair.firstTeeth) / together,
    secondRolling: (2 * distance * pair.secondTeeth) / together,
    backlash: Math.max(0, backlash),
    backlashEstimate: Math.max(0, 2 * opening * Math.tan(pair.pressureAngle)),
  };
}

/**
 * How much wider than standard an unshifted pair must stand to have a given backlash, exactly.
 *
 * @throws RangeError for nonsense or a backlash below nought.
 * Source: the inverse of `centresChanged`; a·(inv α′ − inv α) = j/2 with a = a₀ cos α/cos α′.
 * @example openingForBacklash({ module: 3, firstTeeth: 24, secondTeeth: 48, pressureAngle: Math.PI / 9 }, 0.371943376836) // → 0.5
 */
export function openingForBacklash(spec: PairSpec, backlash: number): number {
  const pair = completePair('openingForBacklash', spec);
  if (backlash === 0) return 0;
  requireSize('openingForBacklash', 'backlash', backlash);
  const bases = pair.firstBase + pair.secondBase;
  // In t = tan α′ the play is 2·bases·√(1+t²)·(t − atan t − inv α), which is convex and rises.
  let t = Math.tan(involuteInverse(involute(pair.pressureAngle) + backlash / (2 * bases)));
  for (let step = 0; step < 50; step += 1) {
    const over = t - Math.atan(t) - involute(pair.pressureAngle);
    const secant = Math.hypot(1, t);
    const slope = 2 * bases * ((t * over) / secant + (t * t) / secant);
    const change = (2 * bases * secant * over - backlash) / slope;
    t -= change;
    if (Math.abs(change) <= 4 * Number.EPSILON * t) break;
  }
  return bases * Math.hypot(1, t) - pair.standardDistance;
}

/**
 * A pair with profile shifts: centres without backlash, and tips shortened to keep the clearance.
 *
 * Bottom clearance is a quarter of a module. `pair`, or `no-mesh` with the shift that is lacking.
 *
 * @throws RangeError for nonsense.
 * Source: KHK and SDP/SI's worked example 12/24, m 3 (from memory, recomputed; case GR-PS-01).
 * @example shiftedPair({ module: 2, firstTeeth: 10, secondTeeth: 40, pressureAngle: Math.PI / 9, firstShift: 0.5, secondShift: -0.5 }).outcome // → 'pair'
 */
export function shiftedPair(spec: PairSpec): ShiftedPair {
  const pair = completePair('shiftedPair', spec);
  const { module: size, firstTeeth, secondTeeth, firstShift, secondShift, addendum } = pair;
  const together = firstTeeth + secondTeeth;
  const tangent = Math.tan(pair.pressureAngle);
  const widened =
    involute(pair.pressureAngle) + (2 * tangent * (firstShift + secondShift)) / together;
  if (widened < 0) return { outcome: 'no-mesh', lacking: (-widened * together) / (2 * tangent) };
  const operatingAngle = involuteInverse(widened);
  const balanced = firstShift + secondShift === 0;
  const widening = balanced
    ? 0
    : (together / 2) * (Math.cos(pair.pressureAngle) / Math.cos(operatingAngle) - 1);
  const tip = (teeth: number, otherShift: number) =>
    size * (teeth + 2 * (addendum + widening - otherShift));
  const root = (teeth: number, shift: number) => size * (teeth - 2 * (addendum + 0.25 - shift));
  return {
    outcome: 'pair',
    operatingAngle: balanced ? pair.pressureAngle : operatingAngle,
    widening,
    centreDistance: size * (together / 2 + widening),
    firstTip: tip(firstTeeth, secondShift),
    secondTip: tip(secondTeeth, firstShift),
    firstRoot: root(firstTeeth, firstShift),
    secondRoot: root(secondTeeth, secondShift),
  };
}

/**
 * The sum of profile shifts with which a pair runs without backlash on given centres.
 *
 * @throws RangeError for nonsense.
 * Source: the inverse of `shiftedPair`.
 * @example shiftSumForCentres({ module: 3, firstTeeth: 12, secondTeeth: 24, pressureAngle: Math.PI / 9 }, 56.4998697203) // → { outcome: 'sum', sum: 0.96 }
 */
export function shiftSumForCentres(spec: PairSpec, distance: number): ShiftSum {
  const pair = completePair('shiftSumForCentres', spec);
  requireSize('shiftSumForCentres', 'distance', distance);
  const bases = pair.firstBase + pair.secondBase;
  if (distance < bases) return { outcome: 'too-close', overlap: bases - distance };
  const more = involute(anglesOn(bases, distance)) - involute(pair.pressureAngle);
  const together = pair.firstTeeth + pair.secondTeeth;
  return { outcome: 'sum', sum: (together * more) / (2 * Math.tan(pair.pressureAngle)) };
}

/** The angle whose cosine is bases over distance, good also near nought. */
function anglesOn(bases: number, distance: number): number {
  return Math.atan2(Math.sqrt((distance - bases) * (distance + bases)), bases);
}
