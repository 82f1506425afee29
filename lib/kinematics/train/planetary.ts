import { itemAt } from '@/lib/numeric/item-at';
import { planetaryMeshes, ringTeeth } from '@/lib/kinematics/train/epicyclic';
import { analyseTrain } from '@/lib/kinematics/train/graph';
import type { Fraction } from '@/lib/numeric/fraction';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** The three members of a planetary train that can be held, driven or taken from. */
export type PlanetaryMember = 'sun' | 'ring' | 'carrier';

/** What comes out of a planetary train with one member held. */
export interface PlanetaryDrive {
  readonly ringTeeth: number;
  /** The member that is neither held nor driven. */
  readonly output: PlanetaryMember;
  /** Turns of each member, and of the planet about its own arbor (absolute), for one of the drive. */
  readonly turns: Readonly<Record<PlanetaryMember | 'planet', Fraction>>;
}

/** Torques that keep a planetary train in balance, without friction. */
export interface PlanetaryTorques {
  readonly sun: number;
  readonly ring: number;
  readonly carrier: number;
}

const members: readonly PlanetaryMember[] = ['sun', 'ring', 'carrier'];

/**
 * What a planetary train does with one member held and another driven, in exact fractions.
 *
 * @throws RangeError for nonsense, and if one member is both held and driven.
 * Source: Willis's equation; cases TN-PL-01 to 04.
 * @example planetaryDrive({ sunTeeth: 30, planetTeeth: 15, held: 'ring', driven: 'sun' }).turns.carrier // → { numerator: 1n, denominator: 3n }
 */
export function planetaryDrive(train: {
  readonly sunTeeth: number;
  readonly planetTeeth: number;
  readonly held: PlanetaryMember;
  readonly driven: PlanetaryMember;
}): PlanetaryDrive {
  const sun = requireCount('planetaryDrive', 'sunTeeth', train.sunTeeth);
  const planet = requireCount('planetaryDrive', 'planetTeeth', train.planetTeeth);
  const output = members.find((member) => member !== train.held && member !== train.driven);
  if (train.held === train.driven || !output) {
    throw new RangeError(
      `planetaryDrive: driven is ${train.driven}, which is held; expected another`,
    );
  }
  const { shares } = analyseTrain({
    meshes: planetaryMeshes(sun, planet),
    held: [train.held],
    driven: [train.driven],
  });
  const turnsOf = (body: string): Fraction => itemAt(shares.get(body) ?? [], 0);
  return {
    ringTeeth: ringTeeth(sun, planet),
    output,
    turns: {
      sun: turnsOf('sun'),
      ring: turnsOf('ring'),
      carrier: turnsOf('carrier'),
      planet: turnsOf('planet'),
    },
  };
}

/**
 * Torques on ring and carrier that balance a torque on the sun; the peg of a held member bears its.
 *
 * Any unit of torque. Friction left out; where several planets share, one usually carries more.
 *
 * @throws RangeError for nonsense.
 * Source: equal tooth forces: T_R = T_S·R/S, T_C = −T_S(1 + R/S) (unit 9.2).
 * @example planetaryTorques(30, 15, 2) // → { sun: 2, ring: 4, carrier: -6 }
 */
export function planetaryTorques(
  sunTeeth: number,
  planetTeeth: number,
  sunTorque: number,
): PlanetaryTorques {
  const sun = requireCount('planetaryTorques', 'sunTeeth', sunTeeth);
  const planet = requireCount('planetaryTorques', 'planetTeeth', planetTeeth);
  const torque = requireMeasure('planetaryTorques', 'sunTorque', sunTorque);
  const ring = (torque * ringTeeth(sun, planet)) / sun;
  return { sun: torque, ring, carrier: -torque - ring };
}

/**
 * Ring and planet for one turn of the carrier to `reduction` turns of the sun, ring held.
 *
 * The counts are whole only for some suns; `exact` ones are handed back for the learner to see.
 *
 * @throws RangeError for a reduction of 2 or less, which leaves no planet.
 * Source: R = S(i − 1), Q = S(i − 2)/2 (unit 9.2).
 * @example planetaryFor(4, 24) // → { ring: 72, planet: 24, whole: true }
 */
export function planetaryFor(
  reduction: number,
  sunTeeth: number,
): { readonly ring: number; readonly planet: number; readonly whole: boolean } {
  const sun = requireCount('planetaryFor', 'sunTeeth', sunTeeth);
  requireSize('planetaryFor', 'reduction over 2', reduction - 2);
  const [ring, planet] = [sun * (reduction - 1), (sun * (reduction - 2)) / 2];
  return { ring, planet, whole: Number.isInteger(ring) && Number.isInteger(planet) };
}

/**
 * The oval that a pen draws on a wheel that rolls inside a ring twice its size: its half axes.
 *
 * `penRadius` is the pen's distance from the wheel's middle; at the rim the oval is a straight line.
 *
 * @throws RangeError for nonsense.
 * Source: r·e^{it} + q·e^{−it}, exact (unit 9.1).
 * @example ovalOfPen(40, 15) // → { long: 55, short: 25 }
 */
export function ovalOfPen(
  wheelRadius: number,
  penRadius: number,
): { readonly long: number; readonly short: number } {
  const r = requireSize('ovalOfPen', 'wheelRadius', wheelRadius);
  const q = requireSizeOrNought('ovalOfPen', 'penRadius', penRadius);
  return { long: r + q, short: Math.abs(r - q) };
}

/**
 * Turns of the two wheels of a cart on a curve, when its differential turns `turns`.
 *
 * `track` is the distance between the wheels, `curveRadius` that of the middle of the axle, at
 * least half the track; one length unit.
 *
 * @throws RangeError for nonsense.
 * Source: n(1 ± t/2ρ), rolling without slip (unit 9.3).
 * @example cartWheels(10, 600, 1500) // → { outer: 12, inner: 8 }
 */
export function cartWheels(
  turns: number,
  track: number,
  curveRadius: number,
): { readonly outer: number; readonly inner: number } {
  requireMeasure('cartWheels', 'turns', turns);
  const half = requireSize('cartWheels', 'track', track) / 2;
  requireSizeOrNought('cartWheels', 'curveRadius over half the track', curveRadius - half);
  const share = half / curveRadius;
  return { outer: turns * (1 + share), inner: turns * (1 - share) };
}
