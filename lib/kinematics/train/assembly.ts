import { ringTeeth } from '@/lib/kinematics/train/epicyclic';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** Planets between a sun and its ring. */
export interface PlanetsSpec {
  readonly sunTeeth: number;
  readonly planetTeeth: number;
  readonly planets: number;
  readonly module: number;
}

/** Whether the planets go in, and where. */
export interface PlanetsAssembly {
  readonly ringTeeth: number;
  /** Whether they go in evenly spaced: their number divides sun and ring together. */
  readonly even: boolean;
  /** Between the tips of neighbouring planets in even spacing; negative when they foul. */
  readonly tipGap: number;
  readonly room: boolean;
  /** Angles nearest to even at which planets do go in, radians from the first. */
  readonly places: readonly number[];
}

/**
 * Whether planets can be put in between a sun and its ring, evenly spaced and without fouling.
 *
 * Unshifted teeth with tips one module beyond the pitch circle. A single planet has no neighbour:
 * its gap is then that to itself across the sun, always room.
 *
 * @throws RangeError for nonsense.
 * Source: n divides S + R; gap m[(S + P) sin(π/n) − (P + 2)]; cases TN-AS-01 and 02.
 * @example planetsAssembly({ sunTeeth: 30, planetTeeth: 15, planets: 3, module: 1 }).even // → true
 */
export function planetsAssembly(spec: PlanetsSpec): PlanetsAssembly {
  const caller = 'planetsAssembly';
  const sun = requireCount(caller, 'sunTeeth', spec.sunTeeth, 3);
  const planet = requireCount(caller, 'planetTeeth', spec.planetTeeth, 3);
  const planets = requireCount(caller, 'planets', spec.planets);
  const size = requireSize(caller, 'module', spec.module);
  const ring = ringTeeth(sun, planet);
  const together = sun + ring;
  const across = planets === 1 ? 2 : Math.sin(Math.PI / planets);
  const tipGap = size * ((sun + planet) * across - (planet + 2));
  return {
    ringTeeth: ring,
    even: together % planets === 0,
    tipGap,
    room: tipGap > 0,
    places: Array.from(
      { length: planets },
      (_, index) => (2 * Math.PI * Math.round((index * together) / planets)) / together,
    ),
  };
}
