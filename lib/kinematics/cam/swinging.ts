import type { Point } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requirePositive } from '@/lib/numeric/require';
import type { ContactOutcome } from './contact';
import type { Motion } from './motion-law';

/** The roller's centre at the end of its arm, with its derivatives and the way it goes. */
export type ArmPlace =
  | {
      readonly outcome: 'reaches';
      readonly place: Point;
      readonly first: Point;
      readonly second: Point;
      readonly way: Point;
    }
  | { readonly outcome: 'out-of-reach'; readonly gap: number };

/** A roller on an arm whose pivot stands beside the axle, at −x if its distance is below 0. */
export interface SwingingRoller {
  readonly radius: number;
  readonly arm: number;
  readonly pivotDistance: number;
}

/** A straight face that swings about a pivot beside the axle. */
export interface SwingingFace {
  readonly pivotDistance: number;
  readonly faceOffset: number;
}

/**
 * Where an arm holds its roller, `motion.position` radians above where it rests on the base circle,
 * by the cam's angle. Its rest angle ψ₀ from the line pivot to axle follows from the cosine rule.
 *
 * @throws RangeError for an arm of 0 or less or a pivot on the axle.
 * @see own derivation: place = (c − ℓ cos ψ, ℓ sin ψ).
 */
export function swingingRollerPlace(
  { radius, arm, pivotDistance }: SwingingRoller,
  baseRadius: number,
  { position, velocity, acceleration }: Motion,
): ArmPlace {
  const distance = requireDistance(pivotDistance);
  requirePositive('contactAt', 'arm', arm);
  const prime = baseRadius + radius;
  const gap = Math.max(prime - arm - distance, Math.abs(arm - distance) - prime);
  if (gap > 0) return finiteResult('contactAt', { outcome: 'out-of-reach', gap });
  // ψ₀ by half angles, which lose no digits when the triangle is flat
  const folded = Math.max(0, (prime - (arm - distance)) * (prime + (arm - distance)));
  const open = Math.max(0, (arm + distance - prime) * (arm + distance + prime));
  const swing = 2 * Math.atan2(Math.sqrt(folded), Math.sqrt(open)) + position;
  const side = Math.sign(pivotDistance);
  const [sine, cosine] = [Math.sin(swing), Math.cos(swing)];
  const way = { x: side * sine, y: cosine };
  const bend = { x: side * cosine, y: -sine };
  return finiteResult('contactAt', {
    outcome: 'reaches',
    place: { x: side * (distance - arm * cosine), y: arm * sine },
    first: { x: arm * velocity * way.x, y: arm * velocity * way.y },
    second: {
      x: arm * (acceleration * way.x + velocity ** 2 * bend.x),
      y: arm * (acceleration * way.y + velocity ** 2 * bend.y),
    },
    way,
  });
}

/**
 * Where a swinging face touches its cam: at q = c cos ψ/(1 ± ψ′) along the face from the pivot.
 *
 * `face-outruns-cam` where 1 ± ψ′ is not above 0: no convex rim could touch it.
 *
 * @throws RangeError for a pivot on the axle or an offset that is no number.
 * @see own derivation, by the support function of the rim.
 */
export function swingingFaceContact(
  { pivotDistance, faceOffset }: SwingingFace,
  baseRadius: number,
  { position, velocity, acceleration }: Motion,
): ContactOutcome {
  const distance = requireDistance(pivotDistance);
  requireFinite('contactAt', 'faceOffset', faceOffset);
  const gap = Math.abs(baseRadius - faceOffset) - distance;
  if (gap > 0) return finiteResult('contactAt', { outcome: 'out-of-reach', gap });
  const side = Math.sign(pivotDistance);
  const pace = 1 + side * velocity;
  if (pace <= 0) return finiteResult('contactAt', { outcome: 'face-outruns-cam', by: 0 - pace });
  const swing = Math.asin((baseRadius - faceOffset) / distance) + position;
  const [sine, cosine] = [Math.sin(swing), Math.cos(swing)];
  const along = (distance * cosine) / pace;
  const normal = { x: side * sine, y: cosine };
  const point = {
    x: side * (distance - along * cosine + faceOffset * sine),
    y: along * sine + faceOffset * cosine,
  };
  const rimRadius =
    faceOffset +
    distance * (sine - (sine * velocity ** 2) / pace ** 2 + (cosine * acceleration) / pace ** 3);
  const pressureAngle = Math.atan2(side * faceOffset, along);
  const contact = { point, normal, centre: point, pressureAngle, rimRadius, pathRadius: rimRadius };
  return finiteResult('contactAt', { outcome: 'touches', contact });
}

function requireDistance(pivotDistance: number): number {
  requireFinite('contactAt', 'pivotDistance', pivotDistance);
  return requirePositive('contactAt', 'the size of pivotDistance', Math.abs(pivotDistance));
}
