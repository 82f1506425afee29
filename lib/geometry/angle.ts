/** A whole turn, in radians. */
export const TURN = 2 * Math.PI;

/**
 * The same angle from −π (left out) to π, in radians.
 * @example wrapAngle(5 * Math.PI / 2) // → 1.5707963
 */
export function wrapAngle(angle: number): number {
  const wrapped = angle - TURN * Math.round(angle / TURN);
  return wrapped <= -Math.PI ? wrapped + TURN : wrapped;
}

/**
 * The same angle from 0 to 2π (left out), in radians.
 * @example wrapTurn(-Math.PI / 2) // → 4.712389
 */
export function wrapTurn(angle: number): number {
  const wrapped = angle - TURN * Math.floor(angle / TURN);
  return wrapped >= TURN ? 0 : wrapped;
}

/**
 * Radians from degrees.
 * @example radians(180) // → 3.1415927
 */
export function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}

/**
 * Degrees from radians.
 * @example degrees(Math.PI / 6) // → 30
 */
export function degrees(angle: number): number {
  return (angle * 180) / Math.PI;
}

/**
 * The acute angle, 0 to π/2, between two lines whose directions differ by `angle`.
 * @example acuteAngle(radians(150)) // → 0.5235988
 */
export function acuteAngle(angle: number): number {
  const wrapped = Math.abs(wrapAngle(angle));
  return Math.min(wrapped, Math.PI - wrapped);
}
