import { type Point, distance, rotate } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requireFinite, requirePositive } from '@/lib/numeric/require';
import type { ProfilePoint } from './profile';

/** What is left of an undercut rim, and what the follower loses by it. */
export interface CutRim {
  /** The places of the rim that the roller does not cut away again. */
  readonly rim: readonly Point[];
  /** The most of its height that the roller loses, and the cam's angle at which it does. */
  readonly lost: number;
  readonly at: number;
}

/** A place counts as cut away if a roller comes nearer than this part of its radius less. */
const cutTolerance = 1e-6;

/**
 * The rim that a sliding roller of `rollerRadius`, running `offset` beside the axle, really leaves
 * when it cuts its own cam, and how much lower than planned it then rides.
 *
 * `points` are the places of a `camProfile`; the answer is as fine as they are close (with 360 of
 * them, to about a thousandth of the roller).
 *
 * @throws RangeError for fewer than 3 places or a roller of 0 or less.
 * @see own geometry: what lies inside any place of the roller is gone; on what is left the roller is set down again.
 */
export function cutRim(
  points: readonly ProfilePoint[],
  rollerRadius: number,
  offset: number,
): CutRim {
  requireCount('cutRim', 'points.length', points.length, 3);
  requirePositive('cutRim', 'rollerRadius', rollerRadius);
  requireFinite('cutRim', 'offset', offset);
  const near = rollerRadius * (1 - cutTolerance);
  const rim = points
    .map((place) => place.rim)
    .filter((point) => points.every(({ path }) => distance(point, path) >= near));
  let [lost, at] = [0, 0];
  for (const { angle, contact } of points) {
    const below = contact.centre.y - seat(rim, angle, rollerRadius, offset, contact.centre.y);
    if (below > lost) [lost, at] = [below, angle];
  }
  return finiteResult('cutRim', { rim, lost, at });
}

/** The height at which the roller comes to sit on the rim that is left; `planned` at the most. */
function seat(
  rim: readonly Point[],
  angle: number,
  rollerRadius: number,
  offset: number,
  planned: number,
): number {
  let height = Number.NEGATIVE_INFINITY;
  for (const point of rim) {
    const { x, y } = rotate(point, angle);
    const beside = x - offset;
    if (y > 0 && Math.abs(beside) <= rollerRadius) {
      height = Math.max(height, y + Math.sqrt((rollerRadius - beside) * (rollerRadius + beside)));
    }
  }
  return height === Number.NEGATIVE_INFINITY ? planned : Math.min(height, planned);
}
