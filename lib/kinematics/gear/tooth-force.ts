import { requireMeasure, requireSize } from '@/lib/numeric/moderate';
import { requireWithin } from '@/lib/numeric/require';

/** What the teeth of a wheel push with. */
export interface ToothForce {
  /** Along the pitch circle: the part that turns. */
  readonly along: number;
  /** Square to it: what pushes the arbors apart. */
  readonly apart: number;
  /** The whole push, along the line of action. */
  readonly push: number;
}

/**
 * The push of tooth on tooth for a torque on a wheel, without friction.
 *
 * Any one unit of force, with torque in that unit times the length of `rollingDiameter` (the circle
 * on which the wheels roll); `operatingAngle` in radians. Signs are those of the torque.
 *
 * @throws RangeError for nonsense.
 * Source: F = 2T/d along, F tan α apart (any book of machine elements).
 * @example toothForce(3000, 60, Math.PI / 9).apart // → 36.397
 */
export function toothForce(
  torque: number,
  rollingDiameter: number,
  operatingAngle: number,
): ToothForce {
  requireMeasure('toothForce', 'torque', torque);
  requireSize('toothForce', 'rollingDiameter', rollingDiameter);
  requireWithin('toothForce', 'operatingAngle', operatingAngle, 0, Math.PI / 2 - 1e-9);
  const along = (2 * torque) / rollingDiameter;
  return {
    along,
    apart: along * Math.tan(operatingAngle),
    push: along / Math.cos(operatingAngle),
  };
}
