import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Two wheels of one module. */
export interface MeshSpec {
  readonly module: number;
  readonly firstTeeth: number;
  readonly secondTeeth: number;
  /** Which of the two is a ring with teeth inside, if one is. */
  readonly ring?: 'first' | 'second';
}

/** How two wheels stand to each other; gaps lie between the pitch circles. */
export type MeshState =
  | { readonly outcome: 'meshes'; readonly gap: number; readonly gapInModules: number }
  /** Too far apart: the tips still reach each other, or miss. */
  | {
      readonly outcome: 'apart';
      readonly gap: number;
      readonly gapInModules: number;
      readonly tips: 'touch' | 'miss';
    }
  /** Pressed into each other; the gap is negative. */
  | { readonly outcome: 'too-close'; readonly gap: number; readonly gapInModules: number };

/** What one wheel does to another on their standard centres, without loss. */
export interface GearPair {
  readonly centreDistance: number;
  /** Turns of the second for one of the first, negative when the sense is turned round. */
  readonly turns: number;
  /** Torque on the second over torque on the first, sizes only. */
  readonly torqueRatio: number;
}

/** Centres that agree to this share of their distance are taken as exact. */
const placingTolerance = 1e-9;

/**
 * How far apart the arbors of two unshifted wheels stand: half of m(z₁ + z₂), or of the difference
 * when one is a ring.
 *
 * @throws RangeError for nonsense, and for a ring that is not larger than its pinion.
 * @example centreDistance({ module: 4, firstTeeth: 12, secondTeeth: 36 }) // → 96
 */
export function centreDistance(mesh: MeshSpec): number {
  requireSize('centreDistance', 'module', mesh.module);
  const first = requireCount('centreDistance', 'firstTeeth', mesh.firstTeeth);
  const second = requireCount('centreDistance', 'secondTeeth', mesh.secondTeeth);
  if (!mesh.ring) return (mesh.module * (first + second)) / 2;
  const difference = mesh.ring === 'first' ? first - second : second - first;
  return (
    (mesh.module * requireCount('centreDistance', 'ring teeth over pinion teeth', difference)) / 2
  );
}

/**
 * Ratio, torque and centres of one pair of wheels.
 *
 * @throws RangeError as `centreDistance` does.
 * @example gearPair({ module: 5, firstTeeth: 16, secondTeeth: 48 }).torqueRatio // → 3
 */
export function gearPair(mesh: MeshSpec): GearPair {
  const distance = centreDistance(mesh);
  const size = mesh.firstTeeth / mesh.secondTeeth;
  return {
    centreDistance: distance,
    turns: mesh.ring ? size : -size,
    torqueRatio: mesh.secondTeeth / mesh.firstTeeth,
  };
}

/**
 * How fast a point of the pitch circle moves: length a second for radians a second.
 *
 * @throws RangeError for nonsense.
 * @example pitchLineSpeed({ module: 5, teeth: 16 }, 3 * Math.PI) // → 376.99111843077515
 */
export function pitchLineSpeed(
  wheel: { readonly module: number; readonly teeth: number },
  angularSpeed: number,
): number {
  requireSize('pitchLineSpeed', 'module', wheel.module);
  requireCount('pitchLineSpeed', 'teeth', wheel.teeth);
  requireMeasure('pitchLineSpeed', 'angularSpeed', angularSpeed);
  return (Math.abs(angularSpeed) * wheel.module * wheel.teeth) / 2;
}

/**
 * Whether two wheels mesh at a distance between their centres, and if not, by how much not.
 *
 * `tolerance` is the gap, either way, that still counts as meshing (a length; rounding only unless
 * given). Full-depth teeth reach one module beyond the pitch circle, so tips touch to 2 m.
 *
 * @throws RangeError for nonsense.
 * @example meshState({ module: 4, firstTeeth: 12, secondTeeth: 36 }, 99).outcome // → 'apart'
 */
export function meshState(mesh: MeshSpec, distance: number, tolerance?: number): MeshState {
  requireSize('meshState', 'distance', distance);
  const standard = centreDistance(mesh);
  const gap = mesh.ring ? standard - distance : distance - standard;
  const gapInModules = gap / mesh.module;
  if (Math.abs(gap) <= (tolerance ?? placingTolerance * standard)) {
    return { outcome: 'meshes', gap, gapInModules };
  }
  if (gap < 0) return { outcome: 'too-close', gap, gapInModules };
  return { outcome: 'apart', gap, gapInModules, tips: gapInModules < 2 ? 'touch' : 'miss' };
}

/**
 * The angle at which the second wheel stands when it meshes with the first.
 *
 * Both outlines have the middle of a tooth on +x at angle 0 (for a ring: the middle of a tooth of
 * its own). `firstAngle` is the first wheel's angle and `lineOfCentres` the direction from its
 * centre to the second's, in radians. The answer follows `firstAngle` without jumps over any number
 * of turns, so it can drive a picture. It puts a space of the second round a tooth of the first.
 *
 * @throws RangeError for nonsense.
 * Source: equal arcs pass at the pitch point; own derivation.
 * @example meshPhase({ firstTeeth: 20, secondTeeth: 20 }, 0, 0) // → 2.9845130209103035
 */
export function meshPhase(
  mesh: Omit<MeshSpec, 'module'>,
  firstAngle: number,
  lineOfCentres: number,
): number {
  const first = requireCount('meshPhase', 'firstTeeth', mesh.firstTeeth);
  const second = requireCount('meshPhase', 'secondTeeth', mesh.secondTeeth);
  requireMeasure('meshPhase', 'firstAngle', firstAngle);
  requireMeasure('meshPhase', 'lineOfCentres', lineOfCentres);
  const fromFirst = mesh.ring === 'second' ? lineOfCentres + Math.PI : lineOfCentres;
  const fromSecond = mesh.ring === 'first' ? lineOfCentres : lineOfCentres + Math.PI;
  const rolled = ((fromFirst - firstAngle) * first) / second;
  return fromSecond - Math.PI / second + (mesh.ring ? -rolled : rolled);
}
