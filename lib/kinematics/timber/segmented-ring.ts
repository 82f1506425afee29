import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requirePositive } from '@/lib/numeric/require';

/** A ring glued up from straight segments. */
export interface SegmentedRing {
  readonly segments: number;
  /** Across the outer flats of the ring. */
  readonly acrossFlats: number;
  /** Of the strip that the segments are cut from. */
  readonly width: number;
}

/** One segment, and the round work that the ring holds; or by how much the strip is too wide. */
export type SegmentSizes =
  | {
      readonly outcome: 'cut';
      /** The saw's angle from square, at each end. */
      readonly mitre: number;
      readonly longEdge: number;
      readonly shortEdge: number;
      readonly acrossCorners: number;
      /** The largest disc that can be turned from the ring, and the smallest hole. */
      readonly largestDisc: number;
      readonly smallestHole: number;
    }
  | { readonly outcome: 'strip-too-wide'; readonly by: number };

/**
 * The segments of a ring.
 *
 * Radians; one unit of length. `strip-too-wide` if the segments would meet in the middle.
 *
 * @throws RangeError for fewer than 3 segments, sizes of 0 or less.
 * @see the regular polygon: mitre π/N, edge D·tan(π/N).
 * @example segmentedRing({ segments: 12, acrossFlats: 300, width: 50 }) // → { outcome: 'cut', longEdge: 80.384758, shortEdge: 53.589838, acrossCorners: 310.582854 }
 */
export function segmentedRing(ring: SegmentedRing): SegmentSizes {
  const { segments, acrossFlats, width } = ring;
  requireCount('segmentedRing', 'segments', segments, 3);
  requirePositive('segmentedRing', 'acrossFlats', acrossFlats);
  requirePositive('segmentedRing', 'width', width);
  const innerFlats = acrossFlats - 2 * width;
  if (innerFlats <= 0) {
    return finiteResult('segmentedRing', { outcome: 'strip-too-wide', by: -innerFlats / 2 });
  }
  const mitre = Math.PI / segments;
  return finiteResult('segmentedRing', {
    outcome: 'cut',
    mitre,
    longEdge: acrossFlats * Math.tan(mitre),
    shortEdge: innerFlats * Math.tan(mitre),
    acrossCorners: acrossFlats / Math.cos(mitre),
    largestDisc: acrossFlats,
    smallestHole: innerFlats / Math.cos(mitre),
  });
}
