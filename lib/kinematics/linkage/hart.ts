import { requireSize } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';
import type { Point } from '@/lib/geometry/point';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * Hart's inversor: a crossed parallelogram A–B–C–D of long bars A–B, C–D and short ones A–D, B–C,
 * with O on A–B, P on A–D and Q on B–C in one line (P and Q on either side of O), at the share `share` from A (Q from C). Any
 * one unit.
 */
export interface HartInversor {
  readonly long: number;
  readonly short: number;
  /** AO over AB, and AP over AD, between 0 and 1. */
  readonly share: number;
}

/**
 * The constant product of O–P and O–Q: `share·(1 − share)·(long² − short²)`.
 *
 * Throws `RangeError` for lengths that are not positive or a share outside 0 to 1.
 * Source: H. Hart, 1874.
 * @example hartPower({ long: 160, short: 80, share: 0.5 }) // → 4800
 */
export function hartPower({ long, short, share }: HartInversor): number {
  requireSize('hartPower', 'long', long);
  requireSize('hartPower', 'short', short);
  requireWithin('hartPower', 'share', share, 0, 1);
  return share * (1 - share) * (long - short) * (long + short);
}

/**
 * Hart's inversor as data: O fixed at the origin, P led by a crank as long as its pin `E` is far
 * from O, so that Q draws a straight line square to O–E, beyond O by power/(2·crank).
 *
 * Throws `RangeError` as `hartPower`, and unless the long bars are the longer ones.
 */
export function hartLinkage({ long, short, share }: HartInversor, crank: number): Linkage {
  requireSize('hartLinkage', 'crank', crank);
  hartPower({ long, short, share });
  requireSize('hartLinkage', 'long − short', long - short);
  const [ao, ap] = [share * long, share * short];
  const power = (long - short) * (long + short);
  const top = (Math.sqrt(short * short + 4 * power) - short) / 2;
  const bottom = top + short;
  const height = short * Math.sqrt(0.75);
  const place = (x: number, y: number): Point => ({
    x: share * ((bottom + top) / 2) - x,
    y: share * height - y,
  });
  return {
    points: {
      O: { x: 0, y: 0 },
      E: { x: crank, y: 0 },
      A: place(0, 0),
      B: place((bottom + top) / 2, height),
      C: place(bottom, 0),
      D: place((bottom - top) / 2, height),
      P: { x: share * top, y: 0 },
      Q: { x: (share - 1) * bottom, y: 0 },
    },
    fixed: ['O', 'E'],
    bars: [
      { ends: ['E', 'P'], length: crank },
      { ends: ['C', 'D'], length: long },
    ],
    plates: [
      { shape: { A: { x: 0, y: 0 }, O: { x: ao, y: 0 }, B: { x: long, y: 0 } } },
      { shape: { A: { x: 0, y: 0 }, P: { x: ap, y: 0 }, D: { x: short, y: 0 } } },
      { shape: { B: { x: 0, y: 0 }, Q: { x: (1 - share) * short, y: 0 }, C: { x: short, y: 0 } } },
    ],
    drivers: [{ kind: 'angle', from: 'E', to: 'P' }],
  };
}
