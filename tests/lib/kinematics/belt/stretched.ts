import type { Point } from '@/lib/geometry/point';

const steps = 20_000;

/**
 * Length of a cord stretched round some discs, measured along the hull of points on their rims: an
 * arc length by numbers alone, that knows nothing of tangents.
 */
export function stretchedAround(
  discs: readonly { readonly centre: Point; readonly radius: number }[],
): number {
  // The hull's support in each direction; its length is the integral over a turn (Cauchy).
  let sum = 0;
  for (let step = 0; step < steps; step += 1) {
    const angle = (2 * Math.PI * (step + 0.5)) / steps;
    const support = discs.map(
      ({ centre, radius }) => centre.x * Math.cos(angle) + centre.y * Math.sin(angle) + radius,
    );
    sum += Math.max(...support);
  }
  return (sum * 2 * Math.PI) / steps;
}
