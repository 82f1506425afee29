import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requirePositive } from '@/lib/numeric/require';
import type { Motion, MotionLaw } from './motion-law';
import { requireRise, riseMotion } from './rise';

/** What the follower does for a part of the turn; a drop takes no angle. */
export type Segment =
  | {
      readonly kind: 'rise' | 'return';
      readonly law: MotionLaw;
      readonly height: number;
      readonly angle: number;
    }
  | { readonly kind: 'dwell'; readonly angle: number }
  | { readonly kind: 'drop'; readonly height: number };

/** A segment at its place in the turn. */
export interface PlacedSegment {
  readonly segment: Segment;
  readonly startAngle: number;
  readonly startHeight: number;
}

/** A whole turn of a follower's motion, the remainder of the turn a dwell. */
export interface Programme {
  readonly placed: readonly PlacedSegment[];
  /** The part of the turn that the segments leave, spent in a last dwell. */
  readonly remaining: number;
  /** How far the follower would have to jump at the end of the turn to start again; down is < 0. */
  readonly closingStep: number;
  readonly greatestLift: number;
}

/** A programme, or by how much it is none. */
export type ProgrammeOutcome =
  | { readonly outcome: 'complete'; readonly programme: Programme }
  | { readonly outcome: 'over-a-turn'; readonly excess: number }
  | { readonly outcome: 'below-the-base'; readonly depth: number };

const turn = 2 * Math.PI;

/** Sums of angles that were meant to make a turn miss it by rounding only: a part of 10⁻⁹ of it. */
const angleTolerance = 1e-9 * turn;

/**
 * The programme of one turn, its segments one after the other from the lowest place.
 *
 * Radians; heights 0 or more in any unit. `over-a-turn` if the segments ask for more than 2π, by
 * `excess`; `below-the-base` if a return or a drop goes deeper than the follower stands, by `depth`.
 *
 * @throws RangeError for a height below 0 or an angle of 0 or less.
 * @example programmeOf([{ kind: 'dwell', angle: 7 }]) // → { outcome: 'over-a-turn', excess: 0.716815 }
 */
export function programmeOf(segments: readonly Segment[]): ProgrammeOutcome {
  const placed: PlacedSegment[] = [];
  let [startAngle, startHeight, greatestLift] = [0, 0, 0];
  for (const segment of segments) {
    requireSegment(segment);
    placed.push({ segment, startAngle, startHeight });
    startAngle += segmentAngle(segment);
    startHeight += segmentRise(segment);
    greatestLift = Math.max(greatestLift, startHeight);
    if (startHeight < -1e-9 * greatestLift) {
      return finiteResult('programmeOf', { outcome: 'below-the-base', depth: -startHeight });
    }
    startHeight = Math.max(0, startHeight);
  }
  const remaining = turn - startAngle;
  if (remaining < -angleTolerance) {
    return finiteResult('programmeOf', { outcome: 'over-a-turn', excess: -remaining });
  }
  const programme = {
    placed,
    remaining: remaining < angleTolerance ? 0 : remaining,
    closingStep: 0 - startHeight,
    greatestLift,
  };
  return finiteResult('programmeOf', { outcome: 'complete', programme });
}

/**
 * The follower's lift and its derivatives where the cam has turned to `angle`, by time at the
 * cam's `speed` (by the cam's angle at a speed of 1). Where two segments meet, the later one holds.
 *
 * Radians, any angle, taken round; radians a second.
 *
 * @throws RangeError for an angle or a speed that is no finite number.
 */
export function programmeMotion(programme: Programme, angle: number, speed = 1): Motion {
  requireFinite('programmeMotion', 'angle', angle);
  return finiteResult('programmeMotion', motionAt(programme, angle, speed));
}

function motionAt(programme: Programme, angle: number, speed: number): Motion {
  const into = wrapped(angle);
  const at = programme.placed.findLast((p) => p.startAngle <= into + angleTolerance / 1e3);
  if (at === undefined) return still(0);
  const { segment, startAngle, startHeight } = at;
  if (segment.kind === 'drop') return still(Math.max(0, startHeight - segment.height));
  if (segment.kind === 'dwell') return still(startHeight);
  const { law, height, angle: length } = segment;
  const within = Math.max(0, into - startAngle);
  if (within > length) return still(startHeight + segmentRise(segment));
  const motion = riseMotion({ law, lift: height, angle: length }, within, speed);
  const sense = segment.kind === 'rise' ? 1 : -1;
  return {
    position: startHeight + sense * motion.position,
    velocity: sense * motion.velocity,
    acceleration: sense * motion.acceleration,
    jerk: sense * motion.jerk,
  };
}

/** The angles at which the motion may have a corner: where segments start, and mid-rise. */
export function programmeCorners(programme: Programme): number[] {
  const corners = programme.placed.flatMap(({ segment, startAngle }) =>
    segment.kind === 'rise' || segment.kind === 'return'
      ? [startAngle, startAngle + segment.angle / 2, startAngle + segment.angle]
      : [startAngle],
  );
  const places = [...new Set([0, ...corners.filter((corner) => corner < turn), turn])];
  return finiteResult(
    'programmeCorners',
    places.sort((a, b) => a - b),
  );
}

function still(position: number): Motion {
  return { position, velocity: 0, acceleration: 0, jerk: 0 };
}

function wrapped(angle: number): number {
  const into = angle % turn;
  return into < 0 ? into + turn : into;
}

function segmentAngle(segment: Segment): number {
  return segment.kind === 'drop' ? 0 : segment.angle;
}

function segmentRise(segment: Segment): number {
  if (segment.kind === 'dwell') return 0;
  return segment.kind === 'rise' ? segment.height : -segment.height;
}

function requireSegment(segment: Segment): void {
  if (segment.kind === 'dwell') requirePositive('programmeOf', 'angle', segment.angle);
  else if (segment.kind === 'drop') requirePositive('programmeOf', 'height', segment.height);
  else {
    const { law, height, angle } = segment;
    requireRise('programmeOf', { law, lift: height, angle });
  }
}
