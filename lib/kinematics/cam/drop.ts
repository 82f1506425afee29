import { finiteResult } from '@/lib/numeric/finite-result';
import { requireNonNegative, requirePositive } from '@/lib/numeric/require';

/**
 * The time that a hammer takes to fall freely through `height`.
 *
 * One unit of length; `gravity` in that unit per second squared (9810 in mm); seconds.
 *
 * @throws RangeError for a height below 0 or a gravity of 0 or less.
 * @see Galilei: h = g·t²/2.
 * @example fallTime(30, 9810) // → 0.0782062
 */
export function fallTime(height: number, gravity: number): number {
  requireNonNegative('fallTime', 'height', height);
  requirePositive('fallTime', 'gravity', gravity);
  return finiteResult('fallTime', Math.SQRT2 * Math.sqrt(height / gravity));
}

/**
 * The angle through which the cam turns, at `speed`, while the hammer falls.
 *
 * @throws RangeError as `fallTime`, and for a speed of 0 or less.
 * @example fallAngle(30, 9810, 4) // → 0.312825
 */
export function fallAngle(height: number, gravity: number, speed: number): number {
  requirePositive('fallAngle', 'speed', speed);
  return finiteResult('fallAngle', fallTime(height, gravity) * speed);
}

/** How long a roller hangs on the nose, or by how much it is too large ever to fall behind it. */
export type Hang =
  | { readonly outcome: 'lets-go'; readonly angle: number }
  | { readonly outcome: 'never-lets-go'; readonly by: number };

/**
 * The angle through which the cam turns from the nose on the follower's line until a roller, in
 * line with the axle, lets go of it: the nose must swing aside by the roller's radius.
 *
 * @throws RangeError for a nose radius of 0 or less, a roller below 0.
 * @see sin ψ = ρ/R: own geometry of corner and roller.
 * @example hangAngle(6, 55) // → { outcome: 'lets-go', angle: 0.109308 }
 */
export function hangAngle(rollerRadius: number, noseRadius: number): Hang {
  requireNonNegative('hangAngle', 'rollerRadius', rollerRadius);
  requirePositive('hangAngle', 'noseRadius', noseRadius);
  const by = rollerRadius - noseRadius;
  return by > 0
    ? { outcome: 'never-lets-go', by }
    : { outcome: 'lets-go', angle: Math.asin(rollerRadius / noseRadius) };
}

/** A drop cam as its hammer meets it: fall `height`, then `rest`, then an even rise over `slope`. */
export interface DropCam {
  readonly height: number;
  readonly noseRadius: number;
  readonly rollerRadius: number;
  readonly rest: number;
  readonly slope: number;
}

/** Where the hammer lands after its drop. */
export type Landing =
  /** On the low rest, with this much of it to spare. */
  | { readonly outcome: 'lands-on-the-rest'; readonly spare: number; readonly needed: number }
  /** On the next hill: it strikes the cam, so far up the hill and so high. */
  | {
      readonly outcome: 'strikes-the-hill';
      readonly up: number;
      readonly height: number;
      readonly needed: number;
    }
  | Extract<Hang, { outcome: 'never-lets-go' }>;

/**
 * Where a hammer lands: it hangs on the nose, falls freely, and ought to be down before the next
 * hill comes. `needed` is the least rest at this speed, hang and fall together.
 *
 * @throws RangeError for sizes, angles, gravity or speed of 0 or less (roller and rest: below 0).
 * @see h − g·t²/2 = (h/β)(ω·t − what is left of the rest): own kinematics, the cam's slope even.
 * @example landing({ height: 30, noseRadius: 55, rollerRadius: 0, rest: 0.5, slope: 5 }, 9810, 4) // → { outcome: 'lands-on-the-rest', needed: 0.312825, spare: 0.187175 }
 */
export function landing(cam: DropCam, gravity: number, speed: number): Landing {
  requirePositive('landing', 'height', cam.height);
  requireNonNegative('landing', 'rest', cam.rest);
  requirePositive('landing', 'slope', cam.slope);
  const hang = hangAngle(cam.rollerRadius, cam.noseRadius);
  if (hang.outcome === 'never-lets-go') return hang;
  const needed = hang.angle + fallAngle(cam.height, gravity, speed);
  if (needed <= cam.rest) {
    return finiteResult('landing', {
      outcome: 'lands-on-the-rest',
      spare: cam.rest - needed,
      needed,
    });
  }
  // u: share of the hill's angle at landing; heights as shares of the drop: 1 − k(u + b)² = u
  const ahead = (cam.rest - hang.angle) / cam.slope;
  const drop = ((gravity / speed ** 2) * cam.slope ** 2) / (2 * cam.height);
  const up = shareUp(drop, ahead);
  return finiteResult('landing', {
    outcome: 'strikes-the-hill',
    up: up * cam.slope,
    height: up * cam.height,
    needed,
  });
}

/** The root u from 0 to 1 of k(u + b)² + u = 1; a roller that lets go on the hill stays there. */
function shareUp(k: number, b: number): number {
  if (b <= -1) return 1;
  // with w = u + b: k·w² + w = 1 + b, in the form that loses no digits
  const w = (2 * (1 + b)) / (1 + Math.sqrt(1 + 4 * k * (1 + b)));
  return Math.min(1, Math.max(0, w - b));
}
