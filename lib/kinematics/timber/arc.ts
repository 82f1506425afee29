import { finiteResult } from '@/lib/numeric/finite-result';
import { requirePositive, requireWithin } from '@/lib/numeric/require';

/** An arc of a circle: its radius, the angle that it takes, and its length. */
export interface Arc {
  readonly radius: number;
  readonly angle: number;
  readonly length: number;
}

/**
 * The arc through the ends of a chord and the crown `rise` above its middle.
 *
 * Radians; one unit of length; a rise of more than half the chord makes more than half a circle.
 *
 * @throws RangeError for a chord or a rise of 0 or less.
 * @see R = c²/8h + h/2 and θ = 4·atan(2h/c): exact geometry.
 * @example arcFromChord(900, 120) // → { radius: 903.75, angle: 1.0424096, length: 942.0776462 }
 */
export function arcFromChord(chord: number, rise: number): Arc {
  requirePositive('arcFromChord', 'chord', chord);
  requirePositive('arcFromChord', 'rise', rise);
  const radius = (chord / 8) * (chord / rise) + rise / 2;
  const angle = 4 * Math.atan2(2 * rise, chord);
  return finiteResult('arcFromChord', { radius, angle, length: radius * angle });
}

/**
 * The rise of the lesser arc of a radius over a chord: the inverse of `arcFromChord`.
 *
 * `chord-too-long` by what it exceeds the diameter.
 *
 * @throws RangeError for a radius or a chord of 0 or less.
 * @example arcRise(903.75, 900) // → { outcome: 'spans', rise: 120 }
 */
export function arcRise(
  radius: number,
  chord: number,
):
  | { readonly outcome: 'spans'; readonly rise: number }
  | { readonly outcome: 'chord-too-long'; readonly by: number } {
  requirePositive('arcRise', 'radius', radius);
  requirePositive('arcRise', 'chord', chord);
  const half = chord / 2;
  if (half > radius)
    return finiteResult('arcRise', { outcome: 'chord-too-long', by: 2 * (half - radius) });
  // R − √(R² − (c/2)²), without the difference of two near numbers
  const rise = half * (half / (radius + Math.sqrt(radius - half) * Math.sqrt(radius + half)));
  return finiteResult('arcRise', { outcome: 'spans', rise });
}

/**
 * The chord and the rise of an arc of a radius and an angle, for laying it out on a board.
 *
 * @throws RangeError for a radius of 0 or less, an angle not from 0 to a whole turn.
 * @example chordOfArc(100, Math.PI / 3) // → { chord: 100, rise: 13.3974596 }
 */
export function chordOfArc(
  radius: number,
  angle: number,
): { readonly chord: number; readonly rise: number } {
  requirePositive('chordOfArc', 'radius', radius);
  requireWithin('chordOfArc', 'angle', angle, 0, 2 * Math.PI);
  const chord = 2 * radius * Math.sin(angle / 2);
  return finiteResult('chordOfArc', { chord, rise: 2 * radius * Math.sin(angle / 4) ** 2 });
}
