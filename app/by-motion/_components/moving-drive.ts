import type { BenchSpec } from '@/lib/scene/bench-spec';

/** One turn of the crank in eight seconds, radians a second. */
const TURNING = (2 * Math.PI) / 8;
/** The stylus along its drawing, mm a second. */
const FOLLOWING = 60;
/** One press of "Step", in seconds of running. */
const STEP_SECONDS = 1 / 3;

/**
 * Where the drive stands after some seconds of running: radians, or mm along the drawing for the
 * pantograph. A function of the time alone, so that a slow screen loses frames but no way.
 *
 * @example driveAfter({ bench: 'trammel', … }, 0, 8) // 2π
 */
export function driveAfter(spec: BenchSpec, from: number, seconds: number): number {
  return from + seconds * (spec.bench === 'pantograph' ? FOLLOWING : TURNING);
}

/** Where the drive stands after one step. */
export function driveAfterStep(spec: BenchSpec, from: number): number {
  return driveAfter(spec, from, STEP_SECONDS);
}
