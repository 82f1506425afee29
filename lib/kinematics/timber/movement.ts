import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/**
 * How much a board's width changes from one moisture to another; above 0 it swells.
 *
 * Moistures in per cent of the dry weight; `coefficient` per per cent, radial or tangential, sound
 * for 6 to 14 per cent; one unit of length.
 *
 * @throws RangeError for a width or a coefficient below 0, a moisture outside 0 to 100.
 * @see ΔW = W·C·(M₂ − M₁): Wood Handbook, FPL-GTR-190, equation 13-2.
 * @example woodMovement(300, 0.00369, 7, 12) // → 5.535
 */
export function woodMovement(
  width: number,
  coefficient: number,
  fromMoisture: number,
  toMoisture: number,
): number {
  requireNonNegative('woodMovement', 'width', width);
  requireNonNegative('woodMovement', 'coefficient', coefficient);
  requireMoisture('woodMovement', 'fromMoisture', fromMoisture);
  requireMoisture('woodMovement', 'toMoisture', toMoisture);
  return finiteResult('woodMovement', width * coefficient * (toMoisture - fromMoisture));
}

/** A wood known by its shrinkage from green to dry. */
export interface TotalShrinkage {
  /** In per cent of the green width. */
  readonly total: number;
  /** The moisture from which it begins to shrink, in per cent: about 30. */
  readonly fibreSaturation: number;
}

/**
 * The same change reckoned from the total shrinkage, for woods whose coefficient is not known.
 *
 * @throws RangeError for a width below 0, a shrinkage not from 0 (left out) up to 100 (left out), a moisture outside 0 to fibre saturation.
 * @see ΔW = W(M₂ − M₁)/(100·F/S − F + M₁): Wood Handbook, FPL-GTR-190, equation 13-3.
 * @example woodMovementByShrinkage(232, { total: 7, fibreSaturation: 30 }, 8, 11) // → 1.711876
 */
export function woodMovementByShrinkage(
  width: number,
  { total, fibreSaturation }: TotalShrinkage,
  fromMoisture: number,
  toMoisture: number,
): number {
  requireNonNegative('woodMovementByShrinkage', 'width', width);
  requirePositive('woodMovementByShrinkage', 'fibreSaturation', fibreSaturation);
  requirePositive('woodMovementByShrinkage', 'total', total);
  requireWithin('woodMovementByShrinkage', 'total', total, 0, 100 - 1e-9);
  requireWithin('woodMovementByShrinkage', 'fromMoisture', fromMoisture, 0, fibreSaturation);
  requireWithin('woodMovementByShrinkage', 'toMoisture', toMoisture, 0, fibreSaturation);
  const dryWidthInMoistures = fibreSaturation * (100 / total - 1) + fromMoisture;
  return finiteResult(
    'woodMovementByShrinkage',
    width * ((toMoisture - fromMoisture) / dryWidthInMoistures),
  );
}

/**
 * How much the radius of a one-piece wheel grows at an angle from its grain: it becomes an oval.
 *
 * Radians; `growth` is the coefficient times the change of moisture. Along the grain none is taken.
 *
 * @throws RangeError for a radius below 0, values that are no finite numbers.
 * @see r·C·ΔM·sin² φ: own geometry, first order.
 * @example ovalGrowth(100, 0.0165, Math.PI / 2) // → 1.65
 */
export function ovalGrowth(radius: number, growth: number, fromGrain: number): number {
  requireNonNegative('ovalGrowth', 'radius', radius);
  requireFinite('ovalGrowth', 'growth', growth);
  requireFinite('ovalGrowth', 'fromGrain', fromGrain);
  return finiteResult('ovalGrowth', radius * growth * Math.sin(fromGrain) ** 2);
}

/** Two wheels and what the season does to them. */
export interface SeasonPair {
  readonly firstDiameter: number;
  readonly secondDiameter: number;
  /** Coefficient times change of moisture. */
  readonly growth: number;
  /** The backlash that must be left at the tightest place. */
  readonly backlash: number;
  readonly pressureAngle: number;
}

/**
 * How much farther apart the arbors of two one-piece wheels are bored, on a frame that stands
 * still, so that at their widest they still have their backlash.
 *
 * @throws RangeError for diameters of 0 or less, growth or backlash below 0, a pressure angle not within 0 to π/2.
 * @see e = C·ΔM(d₁ + d₂)/2 + j/(2·tan α): first order in the opening.
 * @example seasonOpening({ firstDiameter: 60, secondDiameter: 180, growth: 0.01, backlash: 0.4, pressureAngle: Math.PI / 9 }) // → 1.749495
 */
export function seasonOpening(pair: SeasonPair): number {
  const { firstDiameter, secondDiameter, growth, backlash, pressureAngle } = pair;
  requirePositive('seasonOpening', 'firstDiameter', firstDiameter);
  requirePositive('seasonOpening', 'secondDiameter', secondDiameter);
  requireNonNegative('seasonOpening', 'growth', growth);
  requireNonNegative('seasonOpening', 'backlash', backlash);
  requirePositive('seasonOpening', 'pressureAngle', pressureAngle);
  requireWithin('seasonOpening', 'pressureAngle', pressureAngle, 0, Math.PI / 2);
  return finiteResult(
    'seasonOpening',
    growth * (firstDiameter / 2 + secondDiameter / 2) + backlash / (2 * Math.tan(pressureAngle)),
  );
}

function requireMoisture(caller: string, name: string, moisture: number): void {
  requireWithin(caller, name, moisture, 0, 100);
}
