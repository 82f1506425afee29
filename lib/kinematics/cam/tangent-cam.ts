import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';
import type { Motion } from './motion-law';

/** A base circle and a nose circle, joined by two straight flanks that touch both. */
export interface TangentCam {
  readonly baseRadius: number;
  readonly noseRadius: number;
  /** From the base circle to the tip of the nose. */
  readonly lift: number;
}

/** Where the parts of a tangent cam begin, by the cam's angle from the start of the rise. */
export type TangentCamAction =
  | {
      readonly outcome: 'turns';
      /** From the start of the rise to the tip of the nose: half of the whole action. */
      readonly halfAction: number;
      /** Where the roller leaves the straight flank for the nose. */
      readonly flankEnd: number;
      readonly noseDistance: number;
    }
  /** The nose is no smaller than the base circle, `by` so much: no flank leads up to it. */
  | { readonly outcome: 'nose-too-large'; readonly by: number };

/** The motion of the roller over a tangent cam, by time. */
export type TangentCamMotion =
  | {
      readonly outcome: 'moves';
      readonly on: 'base' | 'flank' | 'nose';
      readonly motion: Omit<Motion, 'jerk'>;
    }
  | Extract<TangentCamAction, { outcome: 'nose-too-large' }>;

/**
 * The angles of a tangent cam under a roller in line with the axle.
 *
 * Radians; one unit of length.
 *
 * @throws RangeError for a base or a lift of 0 or less, a nose or a roller below 0.
 * @see cos α = (R − r)/d, tan φ = d sin α/(R + ρ), d = R + lift − r: exact geometry.
 * @example tangentCamAction({ baseRadius: 30, noseRadius: 10, lift: 30 }, 12) // → { outcome: 'turns', halfAction: 1.159279, noseDistance: 50 }
 */
export function tangentCamAction(cam: TangentCam, rollerRadius: number): TangentCamAction {
  const { baseRadius, noseRadius, lift } = cam;
  requirePositive('tangentCamAction', 'baseRadius', baseRadius);
  requireNonNegative('tangentCamAction', 'noseRadius', noseRadius);
  requirePositive('tangentCamAction', 'lift', lift);
  requireNonNegative('tangentCamAction', 'rollerRadius', rollerRadius);
  const by = noseRadius - baseRadius;
  if (by >= 0) return { outcome: 'nose-too-large', by };
  const noseDistance = lift - by;
  // the flank's length: √(d² − (R − r)²), with d − (R − r) = lift
  const flank = Math.sqrt(lift) * Math.sqrt(lift - 2 * by);
  return finiteResult('tangentCamAction', {
    outcome: 'turns',
    halfAction: Math.atan2(flank, -by),
    flankEnd: Math.atan2(flank, baseRadius + rollerRadius),
    noseDistance,
  });
}

/**
 * The roller's motion over a tangent cam, `turned` from the start of the rise, the cam turning at
 * `speed`; the fall mirrors the rise, and beyond the action the roller rests on the base circle.
 *
 * @throws RangeError as `tangentCamAction`, and for an angle or a speed that is no finite number.
 * @see flank: s = (R + ρ)(1/cos θ − 1); nose: a crank d with a rod r + ρ. Exact geometry.
 */
export function tangentCamMotion(
  cam: TangentCam,
  rollerRadius: number,
  turned: number,
  speed = 1,
): TangentCamMotion {
  requireFinite('tangentCamMotion', 'turned', turned);
  requireFinite('tangentCamMotion', 'speed', speed);
  const action = tangentCamAction(cam, rollerRadius);
  if (action.outcome === 'nose-too-large') return action;
  const { halfAction, flankEnd, noseDistance } = action;
  const fromTip = Math.abs(turned - halfAction);
  const sense = turned <= halfAction ? 1 : -1;
  const on = fromTip >= halfAction ? 'base' : halfAction - fromTip <= flankEnd ? 'flank' : 'nose';
  const seat = cam.baseRadius + rollerRadius;
  const rise = {
    base: () => ({ position: 0, velocity: 0, acceleration: 0 }),
    flank: () => onFlank(seat, halfAction - fromTip),
    nose: () => onNose(noseDistance, cam.noseRadius + rollerRadius, seat, fromTip),
  }[on]();
  const motion = {
    position: rise.position,
    velocity: sense * rise.velocity * speed,
    acceleration: rise.acceleration * speed ** 2,
  };
  return finiteResult('tangentCamMotion', { outcome: 'moves', on, motion });
}

function onFlank(seat: number, angle: number): Omit<Motion, 'jerk'> {
  const [sine, cosine] = [Math.sin(angle), Math.cos(angle)];
  return {
    position: (2 * seat * Math.sin(angle / 2) ** 2) / cosine,
    velocity: (seat * sine) / cosine ** 2,
    acceleration: (seat * (1 + sine ** 2)) / cosine ** 3,
  };
}

function onNose(crank: number, rod: number, seat: number, fromTip: number): Omit<Motion, 'jerk'> {
  const [sine, cosine] = [Math.sin(fromTip), Math.cos(fromTip)];
  const height = Math.sqrt((rod - crank * sine) * (rod + crank * sine));
  if (!(height > 0)) {
    // a sharp nose under a knife edge: rod 0, met at the tip only
    return {
      position: crank * cosine - seat,
      velocity: crank * sine,
      acceleration: -crank * cosine,
    };
  }
  const lean = (crank * sine) / height;
  return {
    position: crank * cosine + height - seat,
    velocity: crank * sine + crank * cosine * lean,
    acceleration:
      -crank * cosine -
      (crank * crank * (cosine ** 2 - sine ** 2)) / height -
      height * ((cosine * lean * crank) / height) ** 2,
  };
}
