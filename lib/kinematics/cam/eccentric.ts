import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';

/** A round disc on an axle `eccentricity` beside its middle. */
export interface Eccentric {
  readonly discRadius: number;
  readonly eccentricity: number;
}

/** The lifts of an eccentric, or by how much its axle lies outside the disc. */
export type EccentricLift =
  | {
      readonly outcome: 'lifts';
      /** Of a roller (or, with radius 0, a knife edge) in line with the axle. */
      readonly roller: number;
      /** Of a flat face square to its travel. */
      readonly flat: number;
      /** From the lowest to the highest place, with either. */
      readonly full: number;
    }
  | { readonly outcome: 'axle-outside'; readonly by: number };

/**
 * How high an eccentric has lifted its follower, `turned` on from the lowest place.
 *
 * Radians; one unit of length. With a roller it is a crank-slider of rod R + ρ, with a flat face a
 * Scotch yoke. `axle-outside` if the eccentricity is not less than the disc's radius.
 *
 * @throws RangeError for a disc of 0 or less, an eccentricity or a roller below 0.
 * @see exact geometry: y = −e cos θ + √((R + ρ)² − e² sin² θ).
 * @example eccentricLift({ discRadius: 30, eccentricity: 10 }, 8, Math.PI) // → { outcome: 'lifts', roller: 20, flat: 20, full: 20 }
 */
export function eccentricLift(
  eccentric: Eccentric,
  rollerRadius: number,
  turned: number,
): EccentricLift {
  const { discRadius, eccentricity } = eccentric;
  requirePositive('eccentricLift', 'discRadius', discRadius);
  requireNonNegative('eccentricLift', 'eccentricity', eccentricity);
  requireNonNegative('eccentricLift', 'rollerRadius', rollerRadius);
  requireFinite('eccentricLift', 'turned', turned);
  const by = eccentricity - discRadius;
  if (by >= 0) return { outcome: 'axle-outside', by };
  const flat = 2 * eccentricity * Math.sin(turned / 2) ** 2;
  const rod = discRadius + rollerRadius;
  // rod − √(rod² − (e sin θ)²), without the difference of two near numbers
  const side = eccentricity * Math.abs(Math.sin(turned));
  const drawnIn = side * (side / (rod + Math.sqrt(rod - side) * Math.sqrt(rod + side)));
  const lifts = { roller: flat - drawnIn, flat, full: 2 * eccentricity };
  return finiteResult('eccentricLift', { outcome: 'lifts', ...lifts });
}

/** The wood between the axle hole and the rim on the thin side, or by how much there is none. */
export type WoodBesideHole =
  | { readonly outcome: 'wood'; readonly thickness: number }
  | { readonly outcome: 'breaks-through'; readonly by: number };

/**
 * The wood beside the axle hole of an eccentric where it is thinnest, R − e − d/2.
 *
 * @throws RangeError for a disc of 0 or less, an eccentricity or a hole below 0.
 * @example woodBesideHole({ discRadius: 30, eccentricity: 10 }, 12) // → { outcome: 'wood', thickness: 14 }
 */
export function woodBesideHole(eccentric: Eccentric, holeDiameter: number): WoodBesideHole {
  const { discRadius, eccentricity } = eccentric;
  requirePositive('woodBesideHole', 'discRadius', discRadius);
  requireNonNegative('woodBesideHole', 'eccentricity', eccentricity);
  requireNonNegative('woodBesideHole', 'holeDiameter', holeDiameter);
  const thickness = discRadius - eccentricity - holeDiameter / 2;
  return finiteResult(
    'woodBesideHole',
    thickness > 0 ? { outcome: 'wood', thickness } : { outcome: 'breaks-through', by: -thickness },
  );
}
