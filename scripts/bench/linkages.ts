import path from 'node:path';
import { GcsWrapper, init_planegcs_module, type SketchPrimitive } from '@salusoft89/planegcs';
import { distance, type Point } from '@/lib/geometry/point';
import { fourBarLinkage, type FourBarLengths } from '@/lib/kinematics/linkage/four-bar-linkage';
import { tongsLinkage } from '@/lib/kinematics/linkage/lazy-tongs';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import type { Plan } from '@/lib/kinematics/linkage/solver/plan';
import {
  branchOf,
  placeLinkage,
  rateLinkage,
  startPose,
  type Linkage,
} from '@/lib/kinematics/linkage/solver/solver';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';
import { conditions } from '@/tests/reference/planegcs';

/** A linkage whose one drive swings evenly between two angles. */
export interface Driven {
  readonly name: string;
  readonly linkage: Linkage;
  readonly from: number;
  readonly to: number;
}

export const fourBar: FourBarLengths = { crank: 40, coupler: 120, rocker: 80, frame: 100 };

/** The linkages that are measured: every family the solver is to be quick with. */
export const drivenLinkages: readonly Driven[] = [
  { name: 'four-bar', linkage: fourBarLinkage(fourBar), from: 0.3, to: 0.3 + 2 * Math.PI },
  {
    name: 'trammel',
    linkage: trammelLinkage({ uprightPin: 150, levelPin: 90 }),
    from: 0.7,
    to: 0.7 + 2 * Math.PI,
  },
  { name: 'six-bar', linkage: sixBar(), from: 0.9, to: 1.5 },
  {
    name: 'lazy tongs of eight stages',
    linkage: tongsLinkage({ stages: 8, bar: 160 }),
    from: 0.4,
    to: 1.2,
  },
];

/** Stephenson's third six-bar: a four-bar with a plate for its coupler, and two bars that hang on it. */
function sixBar(): Linkage {
  const points = {
    O2: { x: 0, y: 0 },
    O4: { x: 100, y: 0 },
    O6: { x: 190, y: 20 },
    A: { x: 20, y: 35 },
    B: { x: 115, y: 80 },
    P: { x: 80, y: 110 },
    C: { x: 165, y: 100 },
  };
  return {
    points,
    fixed: ['O2', 'O4', 'O6'],
    bars: [
      { ends: ['O2', 'A'], length: distance(points.O2, points.A) },
      { ends: ['O4', 'B'], length: distance(points.O4, points.B) },
      { ends: ['P', 'C'], length: distance(points.P, points.C) },
      { ends: ['O6', 'C'], length: distance(points.O6, points.C) },
    ],
    plates: [{ shape: { A: points.A, B: points.B, P: points.P } }],
    drivers: [{ kind: 'angle', from: 'O2', to: 'A' }],
  };
}

/** The plan of a linkage that is known to have one. */
export function planOf({ name, linkage }: Driven): Plan {
  const planned = planLinkage(linkage);
  if (planned.outcome !== 'planned') throw new Error(`${name}: ${planned.outcome}`);
  return planned.plan;
}

/** `count` drives, evenly from one end of the swing to the other. */
export function swing({ from, to }: Driven, count: number): Float64Array {
  return Float64Array.from({ length: count }, (_, k) => from + ((to - from) * k) / (count - 1));
}

/** Steps the solver through a run of drives; allocates nothing. Gives the worst gap. */
export function stepper(driven: Driven): (drives: Float64Array) => number {
  const plan = planOf(driven);
  const branch = branchOf(plan);
  const pose = startPose(plan);
  const drive = new Float64Array(1);
  return (drives) => {
    let worst = 0;
    for (let k = 0; k < drives.length; k += 1) {
      drive[0] = drives[k] ?? 0;
      worst = Math.max(worst, placeLinkage(plan, drive, branch, pose));
    }
    return worst;
  };
}

/** As `stepper`, with velocity and acceleration of every point at each step. Gives the dead centres. */
export function ratedStepper(driven: Driven): (drives: Float64Array) => number {
  const plan = planOf(driven);
  const branch = branchOf(plan);
  const drive = new Float64Array(1);
  const rated = {
    pose: startPose(plan),
    drive,
    speeds: new Float64Array([2]),
    accelerations: new Float64Array([-3]),
    velocity: startPose(plan),
    acceleration: startPose(plan),
  };
  return (drives) => {
    let dead = 0;
    for (let k = 0; k < drives.length; k += 1) {
      drive[0] = drives[k] ?? 0;
      placeLinkage(plan, drive, branch, rated.pose);
      if (!rateLinkage(plan, rated)) dead += 1;
    }
    return dead;
  };
}

/** The worst error of any bar or plate over a run, as a share of the linkage's size. */
export function closingError(driven: Driven, drives: Float64Array): number {
  const { linkage } = driven;
  const plan = planOf(driven);
  const branch = branchOf(plan);
  const pose = startPose(plan);
  const number = (name: string) => plan.model.names.indexOf(name);
  const pairs = [
    ...(linkage.bars ?? []).map(({ ends: [a, b], length }) => [number(a), number(b), length]),
    ...(linkage.plates ?? []).flatMap(({ shape }) => {
      const own = Object.entries(shape);
      return own.flatMap(([a, A], k) =>
        own.slice(k + 1).map(([b, B]) => [number(a), number(b), distance(A, B)]),
      );
    }),
  ];
  const pointAt = (k: number): Point => ({ x: pose[2 * k] ?? 0, y: pose[2 * k + 1] ?? 0 });
  let worst = 0;
  for (const drive of drives) {
    worst = Math.max(worst, placeLinkage(plan, [drive], branch, pose));
    for (const [a = 0, b = 0, length = 0] of pairs) {
      worst = Math.max(worst, Math.abs(distance(pointAt(a), pointAt(b)) - length));
    }
  }
  return worst / plan.model.size;
}

/** planegcs set up with a linkage once, its drive a parameter: the way it is meant to be used. */
export async function oracleStepper({ name, linkage }: Driven) {
  const wasm = path.resolve('node_modules/@salusoft89/planegcs/dist/planegcs_dist/planegcs.wasm');
  const { GcsSystem } = await init_planegcs_module({ locateFile: () => wasm });
  const oracle = new GcsWrapper(new GcsSystem());
  const points: SketchPrimitive[] = Object.entries(linkage.points).map(([id, { x, y }]) => ({
    id,
    type: 'point',
    x,
    y,
    fixed: linkage.fixed.includes(id),
  }));
  oracle.push_sketch_param('drive', 0);
  oracle.push_primitives_and_params([...points, ...conditions(linkage, ['drive'])]);
  return {
    step: (drives: Float64Array): void => {
      for (let k = 0; k < drives.length; k += 1) {
        oracle.set_sketch_param('drive', drives[k] ?? 0);
        if (oracle.solve() > 1) throw new Error(`planegcs does not solve the ${name}`);
        oracle.gcs.apply_solution();
      }
    },
    close: () => oracle.destroy_gcs_module(),
  };
}
