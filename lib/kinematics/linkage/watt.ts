import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { intersectCircles } from '@/lib/geometry/circle';
import { between, polar, type Point } from '@/lib/geometry/point';
import { straightness, type Straightness } from '@/lib/kinematics/linkage/straightness';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Watt's linkage: two arms that point at one another, joined by a short link. In mid position the
 * arms are level, the link stands on the y axis with its middle at the origin, arm 1 comes from the
 * left to its upper end A, arm 2 from the right to its lower end B. Any one unit.
 */
export interface WattLinkage {
  readonly arm1: number;
  readonly arm2: number;
  readonly link: number;
}

/**
 * Distance of the pencil from A along the link for the straightest path: the link is divided as
 * AP : PB = arm2 : arm1. Throws `RangeError` for lengths that are not positive.
 * Source: J. Watt, 1784; the curvatures of the two arcs cancel.
 * @example wattPencil({ arm1: 80, arm2: 120, link: 50 }) // → 30
 */
export function wattPencil(watt: WattLinkage): number {
  const { arm1, arm2, link } = requireWatt('wattPencil', watt);
  return (link * arm2) / (arm1 + arm2);
}

export type WattOutcome =
  | { readonly outcome: 'closes'; readonly A: Point; readonly B: Point; readonly pencil: Point }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Where the pencil stands when arm 1 is raised by `armAngle` radians from level.
 *
 * Outcome `does-not-close` with the length missing between link and arm 2.
 * @example wattPoint({ arm1: 100, arm2: 100, link: 60 }, radians(15)).pencil // → { x: 0.0541363, y: 26.0822796 }
 */
export function wattPoint(
  watt: WattLinkage,
  armAngle: number,
  pencilFromA: number = wattPencil(watt),
): WattOutcome {
  const { arm1, arm2, link } = requireWatt('wattPoint', watt);
  requireMeasure('wattPoint', 'armAngle', armAngle);
  requireMeasure('wattPoint', 'pencilFromA', pencilFromA);
  const A = polar(arm1, armAngle, { x: -arm1, y: link / 2 });
  const found = intersectCircles(
    { centre: A, radius: link },
    { centre: { x: arm2, y: -link / 2 }, radius: arm2 },
  );
  const gap = found.outcome === 'apart' || found.outcome === 'inside' ? found.gap : 0;
  if (gap > 0) return { outcome: 'does-not-close', by: gap };
  const B = found.outcome === 'meet' ? found.right : found.outcome === 'touch' ? found.at : A;
  return { outcome: 'closes', A, B, pencil: between(A, B, pencilFromA / link) };
}

/**
 * Travel of the pencil along y and its strays along x while arm 1 swings `armRange` to either side.
 *
 * `undefined` where the linkage does not close in that range.
 * @example wattStraightness({ arm1: 100, arm2: 100, link: 60 }, radians(20)) // → { stroke: 68.496950, least: -0.204014517, most: 0.247095830 }
 */
export function wattStraightness(
  watt: WattLinkage,
  armRange: number,
  pencilFromA: number = wattPencil(watt),
): Straightness | undefined {
  const at = (angle: number) => {
    const found = wattPoint(watt, angle, pencilFromA);
    return found.outcome === 'closes' ? found.pencil : undefined;
  };
  return straightness(at, -armRange, armRange, 'y');
}

/** Watt's linkage as data: points `O1`, `O2`, `A`, `B`, `P` (the pencil); driven by arm 1's angle. */
export function wattLinkage(watt: WattLinkage, pencilFromA: number = wattPencil(watt)): Linkage {
  const { arm1, arm2, link } = requireWatt('wattLinkage', watt);
  return {
    points: {
      O1: { x: -arm1, y: link / 2 },
      O2: { x: arm2, y: -link / 2 },
      A: { x: 0, y: link / 2 },
      B: { x: 0, y: -link / 2 },
      P: { x: 0, y: link / 2 - pencilFromA },
    },
    fixed: ['O1', 'O2'],
    bars: [
      { ends: ['O1', 'A'], length: arm1 },
      { ends: ['O2', 'B'], length: arm2 },
    ],
    plates: [{ shape: { A: { x: 0, y: 0 }, B: { x: link, y: 0 }, P: { x: pencilFromA, y: 0 } } }],
    drivers: [{ kind: 'angle', from: 'O1', to: 'A' }],
  };
}

function requireWatt(caller: string, watt: WattLinkage): WattLinkage {
  requireSize(caller, 'arm1', watt.arm1);
  requireSize(caller, 'arm2', watt.arm2);
  requireSize(caller, 'link', watt.link);
  return watt;
}
