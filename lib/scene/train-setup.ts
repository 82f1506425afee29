import type { Point } from '@/lib/geometry/point';
import { centreDistance, meshPhase } from '@/lib/kinematics/gear/mesh';
import { analyseTrain } from '@/lib/kinematics/train/graph';
import {
  bodyOf,
  trainOfLayout,
  wheelPairs,
  type Arbor as LaidArbor,
  type PairState,
  type WheelPlace,
} from '@/lib/kinematics/train/layout';
import type { Arbor, FreeTrainSpec, TrainSpec } from './bench-spec';

/** A wheel where it stands, with what the crank makes of it. */
export interface SetWheel {
  readonly arbor: number;
  readonly wheel: number;
  /** Counted from 1 along the train. */
  readonly number: number;
  readonly teeth: number;
  readonly centre: Point;
  readonly pitchRadius: number;
  readonly tipRadius: number;
  readonly layer: number;
  /** Turns for one turn of the crank, counter-clockwise positive; null when nothing turns it. */
  readonly ratio: number | null;
  /** The same as an exact fraction, its sign left off: `1/3`, `4`. */
  readonly ratioText: string | null;
  /** The angle at which it stands when the crank stands at nought. */
  readonly phase: number;
}

/** Two wheels that ought to meet, or that must not. */
export interface SetPair {
  readonly first: SetWheel;
  readonly second: SetWheel;
  readonly state: PairState;
  readonly distance: number;
  /** Whether they follow one another in the train; if not they only get into each other's way. */
  readonly inTrain: boolean;
}

/** A train worked out: where each wheel stands, what turns it, what does not fit. */
export interface TrainSetup {
  readonly spec: TrainSpec;
  readonly arbors: readonly Arbor[];
  readonly crank: number;
  readonly wheels: readonly SetWheel[];
  readonly pairs: readonly SetPair[];
  /** Whether the wheels want to turn each other both ways at once. */
  readonly ring: boolean;
  /** Whether anything stops the crank. */
  readonly stuck: boolean;
}

/** A gap of this many modules is below what any saw leaves. */
const seatedWithin = 0.02;

/** The train that a spec describes, worked out once for every angle of the crank. */
export function setUpTrain(spec: TrainSpec): TrainSetup {
  const { arbors, crank } = asFree(spec);
  const laid = laidArbors(spec.module, arbors);
  const tolerance = seatedWithin * spec.module;
  const crankPlace = { arbor: crank, wheel: 0 };
  const train = { ...trainOfLayout(laid, tolerance), driven: [bodyOf(laid, crankPlace)] };
  const analysis = analyseTrain(train);
  const ring = analysis.demands.length > 0;
  const places = laid.flatMap(({ wheels }, arbor) => wheels.map((_, wheel) => ({ arbor, wheel })));
  const phases = phasesFrom(spec.module, arbors, crank);
  const wheels = places.map((place, index): SetWheel => {
    const share = ring ? undefined : analysis.shares.get(bodyOf(laid, place))?.[0];
    return setWheel(spec.module, arbors, laid, place, index + 1, share, phases);
  });
  const pairs = wheelPairs(laid, tolerance).flatMap((pair): SetPair[] => {
    const [first, second] = [find(wheels, pair.first), find(wheels, pair.second)];
    const inTrain = pair.second.arbor === pair.first.arbor + 1;
    if (!first || !second || !(inTrain || pair.state.outcome !== 'apart')) return [];
    const distance = Math.hypot(second.centre.x - first.centre.x, second.centre.y - first.centre.y);
    return [{ first, second, state: pair.state, distance, inTrain }];
  });
  const stuck = ring || pairs.some(({ state }) => state.outcome === 'too-close');
  return { spec, arbors, crank, wheels, pairs, ring, stuck };
}

/** A train between posts as one whose arbors stand freely, in line. */
export function asFree(spec: TrainSpec): Pick<FreeTrainSpec, 'arbors' | 'crank'> {
  if (spec.layout === 'free') return spec;
  const teeth = [spec.posts.firstTeeth, ...Array<number>(spec.idlers).fill(spec.idlerTeeth)];
  let x = 0;
  const row = teeth.map((count, index): Arbor => {
    const before = teeth[index - 1];
    if (before !== undefined) x += standard(spec.module, before, count);
    return { x, y: 0, wheels: [{ teeth: count }], fast: true };
  });
  const last = { x: spec.posts.distance, y: 0, wheels: [{ teeth: spec.lastTeeth }], fast: true };
  return { arbors: [...row, last], crank: 0 };
}

/** How far apart two wheels of one module stand when they mesh, mm. */
export function standard(module: number, firstTeeth: number, secondTeeth: number): number {
  return centreDistance({ module, firstTeeth, secondTeeth });
}

/** The wheel that takes the motion, and the one that hands it on; one wheel may be both. */
export function takes(arbor: Arbor | undefined): number {
  return arbor?.wheels[0]?.teeth ?? 0;
}

export function handsOn(arbor: Arbor | undefined): number {
  return arbor?.wheels.at(-1)?.teeth ?? 0;
}

/** Layers rise by one at every pair, so that only wheels that follow one another can meet. */
function laidArbors(module: number, arbors: readonly Arbor[]): readonly LaidArbor[] {
  let layer = 0;
  return arbors.map(({ x, y, wheels, fast }) => {
    const start = layer;
    layer += wheels.length - 1;
    return {
      x,
      y,
      fast,
      wheels: wheels.map(({ teeth }, index) => ({ module, teeth, layer: start + index })),
    };
  });
}

function setWheel(
  module: number,
  arbors: readonly Arbor[],
  laid: readonly LaidArbor[],
  { arbor, wheel }: WheelPlace,
  number: number,
  share: { readonly numerator: bigint; readonly denominator: bigint } | undefined,
  phases: readonly (readonly number[])[],
): SetWheel {
  const { x, y } = arbors[arbor] ?? { x: 0, y: 0 };
  const { teeth, layer } = laid[arbor]?.wheels[wheel] ?? { teeth: 0 };
  const still = share === undefined || share.numerator === 0n;
  return {
    arbor,
    wheel,
    number,
    teeth,
    centre: { x, y },
    pitchRadius: (module * teeth) / 2,
    tipRadius: (module * (teeth + 2)) / 2,
    layer: layer ?? 0,
    ratio: still ? null : Number(share.numerator) / Number(share.denominator),
    ratioText: still ? null : fractionText(share.numerator, share.denominator),
    phase: phases[arbor]?.[wheel] ?? 0,
  };
}

/** Angles at which every wheel meshes with its neighbours, from the crank outwards both ways. */
function phasesFrom(
  module: number,
  arbors: readonly Arbor[],
  crank: number,
): readonly (readonly number[])[] {
  const phases = arbors.map(({ wheels }) => wheels.map(() => 0));
  const pass = (from: number, to: number, giving: number, taking: number) => {
    const [a, b] = [arbors[from], arbors[to]];
    const [first, second] = [a?.wheels[giving]?.teeth, b?.wheels[taking]?.teeth];
    const known = phases[from]?.[giving];
    if (!a || !b || !first || !second || known === undefined) return;
    const line = Math.atan2(b.y - a.y, b.x - a.x);
    const angle = meshPhase({ firstTeeth: first, secondTeeth: second }, known, line);
    phases[to] = b.wheels.map(() => angle);
  };
  for (let i = crank; i + 1 < arbors.length; i += 1) {
    pass(i, i + 1, (arbors[i]?.wheels.length ?? 1) - 1, 0);
  }
  for (let i = crank; i > 0; i -= 1) {
    pass(i, i - 1, 0, (arbors[i - 1]?.wheels.length ?? 1) - 1);
  }
  return phases;
}

function find(wheels: readonly SetWheel[], { arbor, wheel }: WheelPlace): SetWheel | undefined {
  return wheels.find((candidate) => candidate.arbor === arbor && candidate.wheel === wheel);
}

function fractionText(numerator: bigint, denominator: bigint): string {
  const size = numerator < 0n ? -numerator : numerator;
  return denominator === 1n ? String(size) : `${size}/${denominator}`;
}
