import { type Point, rotate } from '@/lib/geometry/point';
import { finiteResult } from '@/lib/numeric/finite-result';
import { requireCount, requirePositive, requireWithin } from '@/lib/numeric/require';
import { type Cam, type Contact, type ContactOutcome, contactForMotion } from './contact';
import { type Programme, programmeCorners, programmeMotion } from './programme';

/** One place of a profile, in the cam's own frame (the follower above it at angle 0). */
export interface ProfilePoint {
  readonly angle: number;
  readonly rim: Point;
  readonly path: Point;
  readonly contact: Contact;
}

/** A cam's outline, or what keeps the follower from touching it. */
export type ProfileOutcome =
  | { readonly outcome: 'outlined'; readonly points: readonly ProfilePoint[] }
  | (Exclude<ContactOutcome, { outcome: 'touches' }> & { readonly angle: number });

/** The most places that a profile is asked for: more would only fill memory. */
const mostSteps = 100_000;

/**
 * The outline of a cam, and the path of the follower's centre on it, in order of the cam's angle,
 * so clockwise: about `steps` places a turn, with both sides of every corner of the programme.
 *
 * Undercut rims are returned as the follower would draw them, loops and all.
 *
 * @throws RangeError for sizes that are none, or steps that are not a whole number from 12 to 100 000.
 * @see the contact of `contactAt`, turned back by the cam's angle.
 */
export function camProfile(cam: Cam, steps = 360): ProfileOutcome {
  requireCount('camProfile', 'steps', steps, 12);
  requireWithin('camProfile', 'steps', steps, 12, mostSteps);
  requirePositive('camProfile', 'baseRadius', cam.baseRadius);
  const points: ProfilePoint[] = [];
  for (const angle of profileAngles(cam.programme, steps)) {
    const outcome = contactForMotion(cam, programmeMotion(cam.programme, angle));
    if (outcome.outcome !== 'touches') return finiteResult('camProfile', { ...outcome, angle });
    const { contact } = outcome;
    const rim = rotate(contact.point, -angle);
    points.push({ angle, rim, path: rotate(contact.centre, -angle), contact });
  }
  return finiteResult('camProfile', { outcome: 'outlined', points });
}

/** The angles of a profile: each piece between corners evenly, its end a hair before the corner. */
function profileAngles(programme: Programme, steps: number): number[] {
  const corners = programmeCorners(programme);
  return corners.slice(1).flatMap((to, i) => {
    const from = corners[i] ?? 0;
    const pieces = Math.max(2, Math.ceil((steps * (to - from)) / (2 * Math.PI)));
    const end = to - Math.max((to - from) * 1e-9, hair);
    return Array.from({ length: pieces + 1 }, (_, k) => from + ((end - from) * k) / pieces);
  });
}

/** Far under what can be cut, far over what two segments may be apart by rounding. */
const hair = 1e-10;

/** The extremes that a designer looks up on a whole cam, and where they are. */
export interface ProfileSurvey {
  readonly leastPressureAngle: number;
  readonly greatestPressureAngle: number;
  /** The farthest point of the rim from the axle. */
  readonly reach: number;
  /** How far the contact goes to either side of a face's foot (flat face: s′). */
  readonly contactLeft: number;
  readonly contactRight: number;
}

/**
 * The extremes of a profile over its sampled places.
 *
 * @throws RangeError for a profile without places.
 */
export function surveyProfile(points: readonly ProfilePoint[]): ProfileSurvey {
  requireCount('surveyProfile', 'points.length', points.length, 1);
  const leans = points.map(({ contact }) => contact.pressureAngle);
  const sides = points.map(({ contact }) => contact.point.x);
  return finiteResult('surveyProfile', {
    leastPressureAngle: leans.reduce((a, b) => Math.min(a, b)),
    greatestPressureAngle: leans.reduce((a, b) => Math.max(a, b)),
    reach: points.reduce((far, { rim }) => Math.max(far, Math.hypot(rim.x, rim.y)), 0),
    contactLeft: sides.reduce((a, b) => Math.min(a, b)),
    contactRight: sides.reduce((a, b) => Math.max(a, b)),
  });
}
