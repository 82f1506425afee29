import { add, ORIGIN, subtract, type Point } from '@/lib/geometry/point';
import {
  PANTOGRAPH_ROLES,
  pantographPoints,
  reachesOf,
  type Pantograph,
  type PantographRoles,
  type PantographSetUp,
} from '@/lib/kinematics/linkage/pantograph';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A pantograph as data for the general solver: points `O`, `B`, `C`, `D`, `M`, `P`; its two freedoms
 * are driven by leading the stylus along x and y. The elbow lies to the left of the way from O to P,
 * or to its right. The short bars may be given lengths of their own, to see what a misfit does.
 * Throws `RangeError` as `pantographCopy`, and for holes at the end of a bar.
 * @example pantographLinkage({ first: 300, second: 300, firstHole: 100, secondHole: 100 }, 'middle-to-end').drivers // → [{ kind: 'lead', point: 'M' }]
 */
export function pantographLinkage(
  pantograph: Pantograph,
  setUp: PantographSetUp | PantographRoles,
  {
    side = 'left',
    stylusBar = pantograph.secondHole,
    otherBar = pantograph.first - pantograph.firstHole,
    fixedAt = ORIGIN,
  }: {
    readonly side?: 'left' | 'right';
    readonly stylusBar?: number;
    readonly otherBar?: number;
    readonly fixedAt?: Point;
  } = {},
): Linkage {
  reachesOf('pantographLinkage', pantograph, setUp);
  const { fixed, stylus } = typeof setUp === 'string' ? PANTOGRAPH_ROLES[setUp] : setUp;
  const bend = side === 'left' ? Math.PI / 4 : -Math.PI / 4;
  const pose = pantographPoints(pantograph, bend, -bend);
  const moved = subtract(fixedAt, pose[fixed]);
  const points = Object.fromEntries(
    Object.entries(pose).map(([name, at]) => [name, add(at, moved)]),
  );
  const { first, second, firstHole, secondHole } = pantograph;
  return {
    points,
    fixed: [fixed],
    bars: [
      { ends: ['B', 'M'], length: stylusBar },
      { ends: ['D', 'M'], length: otherBar },
    ],
    plates: [
      { shape: { O: { x: 0, y: 0 }, B: { x: firstHole, y: 0 }, C: { x: first, y: 0 } } },
      { shape: { C: { x: 0, y: 0 }, D: { x: secondHole, y: 0 }, P: { x: second, y: 0 } } },
    ],
    drivers: [{ kind: 'lead', point: stylus }],
  };
}
