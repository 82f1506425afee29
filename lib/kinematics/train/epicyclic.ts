import { requireCount } from '@/lib/numeric/require';
import type { TrainMesh } from '@/lib/kinematics/train/graph';

/**
 * Trains whose wheels are carried round, as data for `turnsOfMeshes`: hold one body, drive another.
 * Each function names its bodies, and throws `RangeError` for teeth that are not whole counts.
 */

/**
 * Sun, planet, ring and carrier; the ring has the sun's teeth and twice the planet's.
 *
 * Bodies: `sun`, `planet`, `ring`, `carrier`.
 *
 * Source: Willis's equation; cases TN-PL-01 to 04, TN-PD-01.
 * @example planetaryMeshes(30, 15)[1]?.secondTeeth // → 60
 */
export function planetaryMeshes(sunTeeth: number, planetTeeth: number): readonly TrainMesh[] {
  return [
    mesh('planetaryMeshes', 'sun', sunTeeth, 'planet', planetTeeth),
    mesh(
      'planetaryMeshes',
      'planet',
      planetTeeth,
      'ring',
      ringTeeth(sunTeeth, planetTeeth),
      'with',
    ),
  ];
}

/**
 * Teeth of the ring that closes round a sun and its planets, when all have one module.
 *
 * @example ringTeeth(24, 36) // → 96
 */
export function ringTeeth(sunTeeth: number, planetTeeth: number): number {
  requireCount('ringTeeth', 'sunTeeth', sunTeeth);
  return sunTeeth + 2 * requireCount('ringTeeth', 'planetTeeth', planetTeeth);
}

/**
 * A sun that meshes with a stepped planet, whose other step meshes with a ring.
 *
 * Bodies: `sun`, `planet`, `ring`, `carrier`.
 *
 * Source: case TN-CP-01.
 * @example compoundPlanetaryMeshes(20, 40, 20, 80).length // → 2
 */
export function compoundPlanetaryMeshes(
  sunTeeth: number,
  firstPlanetTeeth: number,
  secondPlanetTeeth: number,
  ringCount: number,
): readonly TrainMesh[] {
  return [
    mesh('compoundPlanetaryMeshes', 'sun', sunTeeth, 'planet', firstPlanetTeeth),
    mesh('compoundPlanetaryMeshes', 'planet', secondPlanetTeeth, 'ring', ringCount, 'with'),
  ];
}

/**
 * A wheel carried round another by an arm, straight in mesh with it or over idlers, or inside it.
 *
 * Bodies: `fixed`, `carried`, `carrier`. Held still, the fixed wheel gives the carried one
 * 1 + A/B turns a round outside, 1 − A/B over one idler, 1 − R/B inside a ring.
 *
 * Source: cases TN-EW-01, TN-EI-01, TN-SP-01.
 * @example carriedWheelMeshes(40, 40).length // → 1
 */
export function carriedWheelMeshes(
  fixedTeeth: number,
  carriedTeeth: number,
  way: 'outside' | 'over-an-idler' | 'inside-a-ring' = 'outside',
): readonly TrainMesh[] {
  return [
    mesh(
      'carriedWheelMeshes',
      'fixed',
      fixedTeeth,
      'carried',
      carriedTeeth,
      way === 'outside' ? 'against' : 'with',
    ),
  ];
}

/**
 * A reverted epicyclic: a pair on one arbor is carried round, its first wheel rolls on a fixed
 * wheel, its second drives another on the same axis as the fixed one.
 *
 * Bodies: `fixed`, `pair`, `driven`, `carrier`.
 *
 * Source: Khurmi and Gupta, Theory of Machines; cases TN-RE-01 and 02.
 * @example revertedEpicyclicMeshes({ fixed: 75, first: 45, second: 90, driven: 30 }).length // → 2
 */
export function revertedEpicyclicMeshes(teeth: {
  readonly fixed: number;
  readonly first: number;
  readonly second: number;
  readonly driven: number;
}): readonly TrainMesh[] {
  return [
    mesh('revertedEpicyclicMeshes', 'fixed', teeth.fixed, 'pair', teeth.first),
    mesh('revertedEpicyclicMeshes', 'pair', teeth.second, 'driven', teeth.driven),
  ];
}

/**
 * Ferguson's paradox: one wide planet in mesh with a fixed wheel and others of nearly its count.
 *
 * Bodies: `fixed`, `planet`, `carrier`, and `wheel 1`, `wheel 2` … in the order given.
 *
 * Source: Norton, Design of Machinery, Ferguson's paradox; cases TN-FE-01 and 02.
 * @example fergusonMeshes(100, 20, [99, 101]).length // → 3
 */
export function fergusonMeshes(
  fixedTeeth: number,
  planetTeeth: number,
  wheels: readonly number[],
): readonly TrainMesh[] {
  return [
    mesh('fergusonMeshes', 'fixed', fixedTeeth, 'planet', planetTeeth),
    ...wheels.map((teeth, index) =>
      mesh('fergusonMeshes', 'planet', planetTeeth, `wheel ${index + 1}`, teeth),
    ),
  ];
}

/**
 * A bevel differential: two equal sides and a star wheel between them on the carrier.
 *
 * Bodies: `left`, `right`, `star`, `carrier`. The star's own turning is about its own arbor, which
 * lies across: only its size means anything. The carrier goes by the mean of the sides.
 *
 * Source: case TN-BD-01.
 * @example bevelDifferentialMeshes().length // → 2
 */
export function bevelDifferentialMeshes(sideTeeth = 20, starTeeth = 10): readonly TrainMesh[] {
  return [
    mesh('bevelDifferentialMeshes', 'left', sideTeeth, 'star', starTeeth),
    mesh('bevelDifferentialMeshes', 'star', starTeeth, 'right', sideTeeth, 'with'),
  ];
}

function mesh(
  caller: string,
  first: string,
  firstTeeth: number,
  second: string,
  secondTeeth: number,
  sense: 'against' | 'with' = 'against',
): TrainMesh {
  requireCount(caller, `teeth of ${first}`, firstTeeth);
  requireCount(caller, `teeth of ${second}`, secondTeeth);
  return { first, firstTeeth, second, secondTeeth, carrier: 'carrier', sense };
}
