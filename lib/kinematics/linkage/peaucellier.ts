import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { acosClamped, nearlyEqual } from '@/lib/numeric/tolerance';
import { distance, polar, scale, type Point } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Peaucellier's cell: two long bars from the fixed pin O, a rhombus of four short ones, and a crank
 * that leads the rhombus' near corner. O at the origin, the crank's pin at (centreDistance, 0), its
 * angle from +x. Any one unit.
 */
export interface PeaucellierCell {
  readonly long: number;
  readonly short: number;
  readonly crank: number;
  /** From O to the crank's fixed pin; the path is an exact line when it equals the crank. */
  readonly centreDistance: number;
}

/**
 * Power of the inversion: distance of the near corner from O times that of the far corner.
 *
 * `long² − short²`; negative when the short bars are the longer ones (the corners then lie on
 * opposite sides of O). Source: C.-N. Peaucellier, 1864; L. Lipkin, 1871.
 * @example inversionPower({ long: 120, short: 50 }) // → 11900
 */
export function inversionPower({ long, short }: Pick<PeaucellierCell, 'long' | 'short'>): number {
  requireSize('inversionPower', 'long', long);
  requireSize('inversionPower', 'short', short);
  return (long - short) * (long + short);
}

/** What the far corner draws. */
export type PeaucellierPath =
  | {
      readonly outcome: 'line';
      /** The line x = this. */
      readonly x: number;
      /** Half the line's length, to either side of the axis, until the cell is stretched. */
      readonly halfLength: number;
      /** Crank angle at which the cell is stretched, radians; π if it never is. */
      readonly crankLimit: number;
    }
  | { readonly outcome: 'arc'; readonly radius: number; readonly centre: number }
  | { readonly outcome: 'does-not-reach'; readonly by: number };

/**
 * The line or the arc that the far corner of the cell draws.
 *
 * Outcomes: `line` when crank and centre distance agree within 1e-12; `arc` with radius and the x
 * of its centre otherwise; `does-not-reach` when no crank angle lets the cell close, with the
 * length missing. Throws `RangeError` for lengths that are not positive.
 * Source: the inverse of a circle is a line if the circle passes through the centre, else a circle.
 * @example peaucellierPath({ long: 120, short: 50, crank: 40, centreDistance: 40 }) // → { outcome: 'line', x: 148.75, halfLength: 82.300896, crankLimit: 1.010721 }
 * @example peaucellierPath({ long: 120, short: 50, crank: 40, centreDistance: 45 }) // → { outcome: 'arc', radius: 1120, centre: 1260 }
 */
export function peaucellierPath(cell: PeaucellierCell): PeaucellierPath {
  const { long, short, crank, centreDistance } = requireCell('peaucellierPath', cell);
  const power = inversionPower(cell);
  const [inner, outer] = [Math.abs(centreDistance - crank), centreDistance + crank];
  const missing = Math.max(Math.abs(long - short) - outer, inner - (long + short));
  if (missing > 0) return { outcome: 'does-not-reach', by: missing };
  if (!nearlyEqual(crank, centreDistance)) {
    const squared = (centreDistance - crank) * (centreDistance + crank);
    return {
      outcome: 'arc',
      radius: Math.abs((power * crank) / squared),
      centre: (power * centreDistance) / squared,
    };
  }
  const x = power / (2 * crank);
  const reach = long + short;
  const near = Math.abs(long - short);
  return {
    outcome: 'line',
    x,
    halfLength: Math.sqrt(Math.max((reach - x) * (reach + x), 0)),
    crankLimit: 2 * acosClamped(near / (2 * crank)),
  };
}

export type CellPoint =
  | { readonly outcome: 'closes'; readonly near: Point; readonly far: Point }
  | { readonly outcome: 'does-not-close'; readonly by: number };

/**
 * Both corners of the rhombus on the line through O at a crank angle: the near one led by the
 * crank, the far one that draws.
 *
 * Outcome `does-not-close` with the length by which the near corner is out of the cell's reach.
 * @example peaucellierPoint({ long: 120, short: 50, crank: 40, centreDistance: 40 }, radians(35)).far // → { x: 148.75, y: 46.900695 }
 */
export function peaucellierPoint(cell: PeaucellierCell, crankAngle: number): CellPoint {
  const { long, short, crank, centreDistance } = requireCell('peaucellierPoint', cell);
  requireMeasure('peaucellierPoint', 'crankAngle', crankAngle);
  const near = polar(crank, crankAngle, { x: centreDistance, y: 0 });
  const away = distance(near, { x: 0, y: 0 });
  const by = Math.max(Math.abs(long - short) - away, away - (long + short));
  if (by > 1e-12 * (long + short)) return { outcome: 'does-not-close', by };
  return { outcome: 'closes', near, far: scale(near, inversionPower(cell) / (away * away)) };
}

/** The cell as data: points `O`, `E` (crank's pin), `N` (near), `L`, `R` (sides), `F` (far); driven by the crank. */
export function peaucellierLinkage(cell: PeaucellierCell): Linkage {
  const { long, short, crank, centreDistance } = requireCell('peaucellierLinkage', cell);
  return {
    points: {
      O: { x: 0, y: 0 },
      E: { x: centreDistance, y: 0 },
      N: { x: centreDistance + crank, y: 0 },
      L: { x: centreDistance, y: long },
      R: { x: centreDistance, y: -long },
      F: { x: centreDistance + crank + short, y: 0 },
    },
    fixed: ['O', 'E'],
    bars: [
      { ends: ['E', 'N'], length: crank },
      { ends: ['O', 'L'], length: long },
      { ends: ['O', 'R'], length: long },
      { ends: ['N', 'L'], length: short },
      { ends: ['N', 'R'], length: short },
      { ends: ['L', 'F'], length: short },
      { ends: ['R', 'F'], length: short },
    ],
    drivers: [{ kind: 'angle', from: 'E', to: 'N' }],
  };
}

function requireCell(caller: string, cell: PeaucellierCell): PeaucellierCell {
  requireSize(caller, 'long', cell.long);
  requireSize(caller, 'short', cell.short);
  requireSize(caller, 'crank', cell.crank);
  requireSize(caller, 'centreDistance', cell.centreDistance);
  return cell;
}
