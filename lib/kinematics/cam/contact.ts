import { type Point, cross, dot } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireFinite, requireNonNegative, requirePositive } from '@/lib/numeric/require';
import type { CurvatureRadius } from './curvature';
import type { Motion } from './motion-law';
import { type Programme, programmeMotion } from './programme';
import { rolledCurve } from './rolled-curve';
import { swingingFaceContact, swingingRollerPlace } from './swinging';
import { restHeight } from './translating-roller';

/**
 * What rides on the cam. Sliding followers stand above the axle; a swinging one hangs on a pivot
 * beside it, on the +x side, or on the −x side if its distance is below 0, and its programme's
 * heights are angles of swing, in radians.
 */
export type Follower =
  | { readonly kind: 'knife-edge'; readonly offset: number }
  | { readonly kind: 'roller'; readonly radius: number; readonly offset: number }
  | { readonly kind: 'flat-face' }
  | {
      readonly kind: 'swinging-roller';
      readonly radius: number;
      readonly arm: number;
      readonly pivotDistance: number;
    }
  /** The face lies `faceOffset` beyond its pivot, as seen from the axle. */
  | { readonly kind: 'swinging-face'; readonly pivotDistance: number; readonly faceOffset: number };

/** A cam: what it does, how large it is where the follower rests, and what rides on it. */
export interface Cam {
  readonly programme: Programme;
  readonly baseRadius: number;
  readonly follower: Follower;
}

/** Where cam and follower touch, in the frame in which the follower slides or swings. */
export interface Contact {
  readonly point: Point;
  /** Unit normal, out of the cam into the follower. */
  readonly normal: Point;
  /** The roller's centre; the point of contact itself for an edge or a face. */
  readonly centre: Point;
  /** How far the push leans from the way of the follower. */
  readonly pressureAngle: number;
  /** Of the rim, above 0 where it bulges; 0 or less under a bulge of the path is undercut. */
  readonly rimRadius: CurvatureRadius;
  /** Of the path of the roller's centre; of the rim itself for an edge or a face. */
  readonly pathRadius: CurvatureRadius;
}

/** A contact, or why there is none and by how much. */
export type ContactOutcome =
  | { readonly outcome: 'touches'; readonly contact: Contact }
  /** Rollers, arms or faces do not reach the base circle, by `gap`. */
  | { readonly outcome: 'out-of-reach'; readonly gap: number }
  /** A swinging face turns back faster than the cam turns on, `by` that many radians a radian. */
  | { readonly outcome: 'face-outruns-cam'; readonly by: number }
  /** The follower's point stands still on the cam: its path has no direction there. */
  | { readonly outcome: 'standstill'; readonly at: Point };

/**
 * Where the follower touches its cam when the cam has turned counter-clockwise to `angle`.
 *
 * x right, y up, radians, one unit of length; the axle is the origin.
 *
 * @throws RangeError for sizes that are none.
 * @see the cam's point on the contact moves with the follower along the normal: own derivation.
 */
export function contactAt(cam: Cam, angle: number): ContactOutcome {
  requirePositive('contactAt', 'baseRadius', cam.baseRadius);
  requireFinite('contactAt', 'angle', angle);
  return contactForMotion(cam, programmeMotion(cam.programme, angle));
}

/** The same for a follower whose motion, by the cam's angle, is already known. */
export function contactForMotion(cam: Cam, motion: Motion): ContactOutcome {
  return finiteResult('contactAt', contactOfKind(cam, motion));
}

function contactOfKind({ follower, baseRadius }: Cam, motion: Motion): ContactOutcome {
  switch (follower.kind) {
    case 'knife-edge':
      return slidingRoller(baseRadius, 0, follower.offset, motion);
    case 'roller':
      requirePositive('contactAt', 'radius', follower.radius);
      return slidingRoller(baseRadius, follower.radius, follower.offset, motion);
    case 'flat-face':
      return flatFace(baseRadius, motion);
    case 'swinging-roller':
      requireNonNegative('contactAt', 'radius', follower.radius);
      return swingingRoller(follower, baseRadius, motion);
    case 'swinging-face':
      return swingingFaceContact(follower, baseRadius, motion);
  }
}

function slidingRoller(
  baseRadius: number,
  rollerRadius: number,
  offset: number,
  { position, velocity, acceleration }: Motion,
): ContactOutcome {
  const rest = restHeight({ baseRadius, rollerRadius, offset });
  if (rest.outcome === 'out-of-reach') return rest;
  const place = { x: offset, y: rest.height + position };
  const path = { place, first: { x: 0, y: velocity }, second: { x: 0, y: acceleration } };
  return rolled(path, { x: 0, y: 1 }, rollerRadius);
}

function swingingRoller(
  follower: Extract<Follower, { kind: 'swinging-roller' }>,
  baseRadius: number,
  motion: Motion,
): ContactOutcome {
  const arm = swingingRollerPlace(follower, baseRadius, motion);
  if (arm.outcome === 'out-of-reach') return arm;
  return rolled(arm, arm.way, follower.radius);
}

function rolled(
  path: { readonly place: Point; readonly first: Point; readonly second: Point },
  way: Point,
  rollerRadius: number,
): ContactOutcome {
  const curve = rolledCurve(path.place, path.first, path.second);
  if (curve === null) return { outcome: 'standstill', at: path.place };
  const { normal, curvature } = curve;
  const contact = {
    point: {
      x: path.place.x - rollerRadius * normal.x,
      y: path.place.y - rollerRadius * normal.y,
    },
    normal,
    centre: path.place,
    pressureAngle: Math.atan2(cross(way, normal), dot(way, normal)),
    rimRadius: curvature === 0 ? ('infinite' as const) : 1 / curvature - rollerRadius,
    pathRadius: curvature === 0 ? ('infinite' as const) : 1 / curvature,
  };
  return { outcome: 'touches', contact };
}

/** Under a flat face the contact wanders by s′ to the side where the rim goes up. */
function flatFace(
  baseRadius: number,
  { position, velocity, acceleration }: Motion,
): ContactOutcome {
  const point = { x: velocity, y: baseRadius + position };
  const rimRadius = baseRadius + position + acceleration;
  const contact: Contact = {
    point,
    normal: { x: 0, y: 1 },
    centre: point,
    pressureAngle: 0,
    rimRadius,
    pathRadius: rimRadius,
  };
  return { outcome: 'touches', contact };
}
