import { completePair } from '@/lib/kinematics/gear/pair';
import type { PairSpec } from '@/lib/kinematics/gear/pair';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';
import { requireSize } from '@/lib/numeric/moderate';

/** Where two teeth touch along the line of action, and how many pairs share the load. */
export interface Contact {
  /** Pressure angle at which the wheels run, radians. */
  readonly operatingAngle: number;
  /** Length of the line along which teeth touch. */
  readonly path: number;
  /** Its parts before and after the pitch point, when the first wheel drives. */
  readonly approach: number;
  readonly recess: number;
  /** Pairs in contact on the average; below 1 the driven wheel runs on by itself. */
  readonly contactRatio: number;
  /**
   * How far the tip of the first (second) wheel reaches, along the line of action, past the last
   * point where the other has an involute; 0 if it does not. More than 0 digs, unless undercut.
   */
  readonly firstInterference: number;
  readonly secondInterference: number;
}

export type ContactOutcome =
  | ({ readonly outcome: 'contact' } & Contact)
  /** The tips pass without touching: `short` is missing along the line of action. */
  | { readonly outcome: 'no-contact'; readonly operatingAngle: number; readonly short: number }
  /** The base circles overlap by `overlap`: there is no line of action. */
  | { readonly outcome: 'too-close'; readonly overlap: number };

export type RingContactOutcome =
  | {
      readonly outcome: 'contact';
      readonly path: number;
      readonly contactRatio: number;
      /** How far the ring's tips reach past the pinion's last point of involute; 0 if they do not. */
      readonly interference: number;
    }
  /** The ring's tips reach `inside` its base circle, where it has no involute. */
  | { readonly outcome: 'tip-inside-base-circle'; readonly inside: number };

/**
 * The contact of two outside wheels at a centre distance, standard unless given.
 *
 * Lengths in the unit of the module. The ratio is the path over the base pitch.
 * - `contact`; `no-contact` when the tips pass; `too-close` when the base circles overlap.
 *
 * @throws RangeError for nonsense.
 * Source: Norton, Design of Machinery, gear pair 19/37 (cases GR-CR-01, 02).
 * @example contactOf({ module: 3, firstTeeth: 20, secondTeeth: 40, pressureAngle: Math.PI / 9 }).outcome // → 'contact'
 */
export function contactOf(spec: PairSpec, centreDistance?: number): ContactOutcome {
  const pair = completePair('contactOf', spec);
  const distance = requireSize(
    'contactOf',
    'centreDistance',
    centreDistance ?? pair.standardDistance,
  );
  const bases = pair.firstBase + pair.secondBase;
  if (distance < bases) return { outcome: 'too-close', overlap: bases - distance };
  const line = Math.sqrt((distance - bases) * (distance + bases));
  const operatingAngle = Math.atan2(line, bases);
  const reach = (teeth: number, shift: number, base: number) =>
    tangent(pair.module * (teeth / 2 + pair.addendum + shift), base);
  const first = reach(pair.firstTeeth, pair.firstShift, pair.firstBase);
  const second = reach(pair.secondTeeth, pair.secondShift, pair.secondBase);
  const path = first + second - line;
  if (path <= 0) return { outcome: 'no-contact', operatingAngle, short: -path };
  const firstShare = (line * pair.firstTeeth) / (pair.firstTeeth + pair.secondTeeth);
  return {
    outcome: 'contact',
    operatingAngle,
    path,
    approach: second - (line - firstShare),
    recess: first - firstShare,
    contactRatio: path / (Math.PI * pair.module * Math.cos(pair.pressureAngle)),
    firstInterference: Math.max(0, first - line),
    secondInterference: Math.max(0, second - line),
  };
}

/**
 * Contact ratio of a pinion with a rack of full depth.
 *
 * @throws RangeError for nonsense.
 * Source: case GR-RK-01; approach m·h/sin α on the rack's side.
 * @example rackContactRatio({ module: 3, teeth: 20, pressureAngle: Math.PI / 9 }) // → 1.76882370021
 */
export function rackContactRatio(spec: GearSpec): number {
  const { baseDiameter, tipDiameter, pitchDiameter, basePitch } = gearProportions(spec);
  const sine = Math.sin(spec.pressureAngle);
  const recess = tangent(tipDiameter / 2, baseDiameter / 2) - (pitchDiameter / 2) * sine;
  const approach = (spec.module * ((spec.addendum ?? 1) - (spec.shift ?? 0))) / sine;
  return (recess + approach) / basePitch;
}

/**
 * Contact of an unshifted pinion in an unshifted ring on standard centres.
 *
 * - `contact`; `tip-inside-base-circle` for a ring of few teeth (33 and fewer at 20°).
 *
 * @throws RangeError for nonsense, and if the ring is not larger than the pinion.
 * Source: case GR-IN-01.
 * @example ringContact({ module: 3, firstTeeth: 20, secondTeeth: 60, pressureAngle: Math.PI / 9 }) // → { outcome: 'contact', path: 17.267, contactRatio: 1.94966230005 }
 */
export function ringContact(spec: PairSpec): RingContactOutcome {
  const pair = completePair('ringContact', spec);
  const difference = pair.secondTeeth - pair.firstTeeth;
  requireSize('ringContact', 'ring teeth over pinion teeth', difference);
  const ringTip = pair.module * (pair.secondTeeth / 2 - pair.addendum);
  if (ringTip < pair.secondBase) {
    return { outcome: 'tip-inside-base-circle', inside: pair.secondBase - ringTip };
  }
  const pinionTip = pair.module * (pair.firstTeeth / 2 + pair.addendum);
  const line = ((pair.module * difference) / 2) * Math.sin(pair.pressureAngle);
  const ringReach = tangent(ringTip, pair.secondBase);
  const path = tangent(pinionTip, pair.firstBase) - ringReach + line;
  const basePitch = Math.PI * pair.module * Math.cos(pair.pressureAngle);
  return {
    outcome: 'contact',
    path,
    contactRatio: path / basePitch,
    interference: Math.max(0, line - ringReach),
  };
}

/** Length of the tangent from a point at `radius` to the circle of radius `base`; 0 inside it. */
function tangent(radius: number, base: number): number {
  return radius <= base ? 0 : Math.sqrt((radius - base) * (radius + base));
}
