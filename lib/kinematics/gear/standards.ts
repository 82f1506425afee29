import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';

/** The four basic racks of ISO 53, by the depth and roundness of their roots. */
export type BasicRackType = 'A' | 'B' | 'C' | 'D';

/** A basic rack for one module; lengths in its unit, the angle in radians. */
export interface BasicRack {
  readonly addendum: number;
  readonly clearance: number;
  readonly dedendum: number;
  readonly filletRadius: number;
  readonly pressureAngle: number;
}

/** Sizes of a wheel by diametral pitch, in inches (or whatever unit the pitch counts teeth to). */
export interface DiametralSizes {
  readonly pitchDiameter: number;
  readonly outsideDiameter: number;
  readonly circularPitch: number;
  readonly toothThickness: number;
  readonly addendum: number;
  readonly dedendum: number;
  readonly wholeDepth: number;
  readonly clearance: number;
}

/** ISO 53:1998, table 2, in modules (from memory). */
const basicRacks: Readonly<Record<BasicRackType, { clearance: number; fillet: number }>> = {
  A: { clearance: 0.25, fillet: 0.38 },
  B: { clearance: 0.25, fillet: 0.3 },
  C: { clearance: 0.25, fillet: 0.25 },
  D: { clearance: 0.4, fillet: 0.39 },
};

/** ISO 54:1996, modules of 1 mm and more: series 1, to be preferred (from memory). */
const firstSeries = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 12, 16, 20, 25, 32, 40, 50] as const;
/** Series 2; 6.5 is listed, but to be avoided. */
const secondSeries = [
  1.125, 1.375, 1.75, 2.25, 2.75, 3.5, 4.5, 5.5, 6.5, 7, 9, 11, 14, 18, 22, 28, 36, 45,
] as const;

/** Millimetres in an inch, exactly. */
const inch = 25.4;
/** From this pitch on the finer teeth of ANSI/AGMA B6.7 have a little more clearance, 0.002 in. */
const finePitch = 20;

/**
 * The basic rack of ISO 53, at 20°.
 *
 * @throws RangeError for nonsense.
 * Source: ISO 53:1998.
 * @example basicRack(4, 'A').filletRadius // → 1.52
 */
export function basicRack(module: number, type: BasicRackType): BasicRack {
  const size = requireSize('basicRack', 'module', module);
  const { clearance, fillet } = basicRacks[type];
  return {
    addendum: size,
    clearance: clearance * size,
    dedendum: (1 + clearance) * size,
    filletRadius: fillet * size,
    pressureAngle: Math.PI / 9,
  };
}

/**
 * Which series of ISO 54 a module of 1 mm or more belongs to: 1 (preferred), 2, or 0 for neither.
 *
 * @throws RangeError for nonsense.
 * Source: ISO 54:1996.
 * @example moduleSeries(1.75) // → 2
 */
export function moduleSeries(module: number): 0 | 1 | 2 {
  const size = requireSize('moduleSeries', 'module', module);
  if (firstSeries.some((listed) => listed === size)) return 1;
  return secondSeries.some((listed) => listed === size) ? 2 : 0;
}

/**
 * The listed module nearest to a measured one, by their ratio; series 1 and 2 of ISO 54.
 *
 * @throws RangeError for nonsense.
 * @example nearestModule(2.94) // → 3
 */
export function nearestModule(measured: number): number {
  const size = requireSize('nearestModule', 'measured', measured);
  const off = (listed: number) => Math.abs(Math.log(listed / size));
  return [...firstSeries, ...secondSeries].reduce((best, listed) =>
    off(listed) < off(best) ? listed : best,
  );
}

/**
 * The module that a found wheel of full-depth, unshifted teeth shows: tip diameter over z + 2.
 *
 * @throws RangeError for nonsense.
 * @example moduleOfFoundWheel(78, 24) // → 3
 */
export function moduleOfFoundWheel(tipDiameter: number, teeth: number): number {
  requireSize('moduleOfFoundWheel', 'tipDiameter', tipDiameter);
  return tipDiameter / (requireCount('moduleOfFoundWheel', 'teeth', teeth) + 2);
}

/**
 * Module in millimetres from diametral pitch in teeth an inch, and just as well the other way.
 *
 * @throws RangeError for nonsense.
 * @example moduleFromDiametralPitch(12.7) // → 2
 */
export function moduleFromDiametralPitch(pitch: number): number {
  return inch / requireSize('moduleFromDiametralPitch', 'pitch', pitch);
}

/**
 * Sizes of an unshifted wheel by its diametral pitch, in inches.
 *
 * @throws RangeError for nonsense.
 * Source: ANSI/AGMA B6.1, and B6.7 from 20 teeth an inch on (from memory).
 * @example diametralSizes(12, 36).outsideDiameter // → 3.16666666667
 */
export function diametralSizes(pitch: number, teeth: number): DiametralSizes {
  const p = requireSize('diametralSizes', 'pitch', pitch);
  const z = requireCount('diametralSizes', 'teeth', teeth, 3);
  const clearance = p < finePitch ? 0.25 / p : 0.2 / p + 0.002;
  return {
    pitchDiameter: z / p,
    outsideDiameter: (z + 2) / p,
    circularPitch: Math.PI / p,
    toothThickness: Math.PI / (2 * p),
    addendum: 1 / p,
    dedendum: 1 / p + clearance,
    wholeDepth: 2 / p + clearance,
    clearance,
  };
}
