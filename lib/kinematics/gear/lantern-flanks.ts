import { requireWithin } from '@/lib/numeric/require';
import { findExtremes } from '@/lib/numeric/extremes';
import { lanternSizes, type LanternSpec } from './lantern';

/** Flanks that one might cut for a lantern; only that of the pin's own path drives it evenly. */
export type LanternFlank = 'pin-path' | 'involute' | 'straight';

/** The lantern's speed over its mean, or why that flank no longer drives it. */
export type LanternSpeed =
  | { readonly outcome: 'drives'; readonly speed: number }
  /** The push passes on the wrong side of the lantern's axle, so far from it. */
  | { readonly outcome: 'jams'; readonly by: number };

/** How far the lantern's speed swings from its mean, as shares of it. */
export type LanternSwing =
  | { readonly outcome: 'swings'; readonly least: number; readonly greatest: number }
  /** Before the spacing is done the flank no longer drives; `by` as for the speed, at its end. */
  | { readonly outcome: 'jams'; readonly by: number };

/** The pressure angle of the involute that is tried: the commonest. */
const involuteAngle = Math.PI / 9;
/** Pieces of a spacing in which an extreme of the speed is looked for. */
const pieces = 64;

/**
 * The lantern's speed under an evenly turning wheel, over its mean, when the driving pin has gone
 * `turn` past the line of centres.
 *
 * Radians, from 0 to one spacing of the lantern, 2π/pins. `pin-path` is the pin's path moved in by
 * its radius; `involute` one of 20° on the same pitch circle; `straight` a radial flank. The wheel
 * under an evenly turning lantern has the inverse.
 *
 * @throws RangeError for nonsense, and a turn beyond one spacing.
 * @see the common normal through the pin's centre: ω₂/ω₁ = its distance from the wheel's axle over
 * that from the lantern's.
 * @example lanternSpeed({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }, 'straight', Math.PI / 4) // → { outcome: 'drives', speed: 1.7226 }
 */
export function lanternSpeed(spec: LanternSpec, flank: LanternFlank, turn: number): LanternSpeed {
  requireWithin('lanternSpeed', 'turn', turn, 0, (2 * Math.PI) / spec.pins);
  const { fromLantern, speed } = pushOf(spec, flank, turn);
  return fromLantern > 0 ? { outcome: 'drives', speed } : { outcome: 'jams', by: -fromLantern };
}

/**
 * How far the lantern's speed swings while a pin is carried from the line of centres to the next
 * pin's turn: 0 and 0 for the right flank.
 *
 * @throws RangeError for nonsense.
 * @see `lanternSpeed`.
 * @example lanternSwing({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }, 'involute') // → { outcome: 'swings', least: -0.0603, greatest: 0.0301 }
 */
export function lanternSwing(spec: LanternSpec, flank: LanternFlank): LanternSwing {
  const spacing = (2 * Math.PI) / spec.pins;
  const end = lanternSpeed(spec, flank, spacing);
  if (end.outcome === 'jams') return end;
  const speed = (turn: number) => pushOf(spec, flank, turn).speed;
  const { least, most } = findExtremes(speed, 0, spacing, pieces);
  return { outcome: 'swings', least: least.value - 1, greatest: most.value - 1 };
}

/**
 * How deep a flank cut to the pin's path itself, not moved in, digs into a pin: its radius less half
 * the play.
 *
 * @throws RangeError for nonsense.
 * @see the flank is to keep one pin's radius from the path of its centre; play takes half of itself.
 * @example plainFlankDig({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11, play: 1 }) // → 5
 */
export function plainFlankDig(spec: LanternSpec): number {
  lanternSizes(spec);
  return (spec.pinDiameter - (spec.play ?? 0)) / 2;
}

/** How far from the lantern's axle the flank pushes, and the speed over the mean that this gives. */
function pushOf(spec: LanternSpec, flank: LanternFlank, turn: number) {
  const { wheelRadius, pinCircleRadius, centreDistance } = lanternSizes(spec);
  if (flank === 'pin-path') return { fromLantern: pinCircleRadius, speed: 1 };
  const x = centreDistance - pinCircleRadius * Math.cos(turn);
  const y = pinCircleRadius * Math.sin(turn);
  const away = Math.hypot(x, y);
  // The angle at the wheel's axle from the pin's centre to the foot of the push's line.
  const foot =
    flank === 'straight'
      ? Math.asin(Math.min(1, spec.pinDiameter / 2 / away))
      : Math.acos((wheelRadius / away) * Math.cos(involuteAngle));
  const leaning = Math.atan2(y, x) - foot;
  const fromWheel = away * Math.cos(foot);
  const fromLantern = centreDistance * Math.cos(leaning) - fromWheel;
  return { fromLantern, speed: (fromWheel / fromLantern) * (pinCircleRadius / wheelRadius) };
}
