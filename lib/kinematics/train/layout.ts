import type { Point } from '@/lib/geometry/point';
import { meshState } from '@/lib/kinematics/gear/mesh';
import type { MeshState } from '@/lib/kinematics/gear/mesh';
import type { Train, TrainMesh } from '@/lib/kinematics/train/graph';
import { itemAt } from '@/lib/numeric/item-at';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** A wheel on an arbor. */
export interface ArborWheel {
  readonly module: number;
  readonly teeth: number;
  /** Which plane it turns in; only wheels of one plane can meet. 0 unless given. */
  readonly layer?: number;
}

/** An arbor at a place, with its wheels. */
export interface Arbor extends Point {
  readonly wheels: readonly ArborWheel[];
  /** Whether its wheels turn as one; true unless given. Loose wheels turn each for itself. */
  readonly fast?: boolean;
}

/** Where a wheel is: the arbor's place in the list and the wheel's on the arbor. */
export interface WheelPlace {
  readonly arbor: number;
  readonly wheel: number;
}

/** How two wheels of one plane stand to each other. */
export type PairState = MeshState | { readonly outcome: 'unlike-modules'; readonly gap: number };

/** Two wheels of one plane on different arbors. */
export interface WheelPair {
  readonly first: WheelPlace;
  readonly second: WheelPlace;
  readonly state: PairState;
}

/**
 * The name under which a wheel takes part in the train of a layout: its arbor's, or one of its own
 * if it is loose.
 *
 * @example bodyOf([{ x: 0, y: 0, wheels: [{ module: 4, teeth: 20 }] }], { arbor: 0, wheel: 0 }) // → 'arbor 1'
 */
export function bodyOf(arbors: readonly Arbor[], place: WheelPlace): string {
  const { fast, wheels } = itemAt(arbors, place.arbor);
  const alone = (fast ?? true) || wheels.length < 2;
  const name = `arbor ${place.arbor + 1}`;
  return alone ? name : `${name}, wheel ${place.wheel + 1}`;
}

/**
 * Every pair of wheels that share a plane on different arbors, and how they stand to each other.
 *
 * `tolerance` is the gap, either way, that still counts as meshing, in the unit of the places.
 *
 * @throws RangeError for nonsense, and for two arbors at one place.
 * @example wheelPairs([{ x: 0, y: 0, wheels: [{ module: 4, teeth: 12 }] }, { x: 96, y: 0, wheels: [{ module: 4, teeth: 36 }] }]).length // → 1
 */
export function wheelPairs(arbors: readonly Arbor[], tolerance?: number): readonly WheelPair[] {
  const places = placesOf(arbors);
  return places.flatMap((first, index) =>
    places.slice(index + 1).flatMap((second) => {
      const state =
        first.arbor === second.arbor ? null : pairState(arbors, first, second, tolerance);
      return state ? [{ first, second, state }] : [];
    }),
  );
}

/**
 * The train that a layout makes: its meshing pairs, the first arbor driven.
 *
 * @throws RangeError as `wheelPairs` does, and for a layout without an arbor that has a wheel.
 * @example trainOfLayout([{ x: 0, y: 0, wheels: [{ module: 4, teeth: 12 }] }, { x: 96, y: 0, wheels: [{ module: 4, teeth: 36 }] }]).meshes.length // → 1
 */
export function trainOfLayout(arbors: readonly Arbor[], tolerance?: number): Train {
  const places = placesOf(arbors);
  const crank = places[0];
  if (!crank) throw new RangeError('trainOfLayout: arbors carry no wheel; expected at least one');
  const meshes = wheelPairs(arbors, tolerance)
    .filter(({ state }) => state.outcome === 'meshes')
    .map(({ first, second }): TrainMesh => ({
      first: bodyOf(arbors, first),
      firstTeeth: wheelAt(arbors, first).teeth,
      second: bodyOf(arbors, second),
      secondTeeth: wheelAt(arbors, second).teeth,
    }));
  return {
    meshes,
    driven: [bodyOf(arbors, crank)],
    loose: places.map((place) => bodyOf(arbors, place)),
  };
}

function placesOf(arbors: readonly Arbor[]): readonly WheelPlace[] {
  return arbors.flatMap(({ wheels }, arbor) => wheels.map((_, wheel) => ({ arbor, wheel })));
}

function wheelAt(arbors: readonly Arbor[], place: WheelPlace): ArborWheel {
  return itemAt(itemAt(arbors, place.arbor).wheels, place.wheel);
}

function pairState(
  arbors: readonly Arbor[],
  first: WheelPlace,
  second: WheelPlace,
  tolerance?: number,
): PairState | null {
  const [a, b] = [wheelAt(arbors, first), wheelAt(arbors, second)];
  const [from, to] = [itemAt(arbors, first.arbor), itemAt(arbors, second.arbor)];
  if ((a.layer ?? 0) !== (b.layer ?? 0)) return null;
  const distance = requireSize('wheelPairs', 'distance', Math.hypot(to.x - from.x, to.y - from.y));
  if (a.module !== b.module) {
    return { outcome: 'unlike-modules', gap: distance - pitchRadius(a) - pitchRadius(b) };
  }
  const mesh = { module: a.module, firstTeeth: a.teeth, secondTeeth: b.teeth };
  return meshState(mesh, distance, tolerance);
}

function pitchRadius({ module: size, teeth }: ArborWheel): number {
  requireSize('wheelPairs', 'module', size);
  return (size * requireCount('wheelPairs', 'teeth', teeth)) / 2;
}
