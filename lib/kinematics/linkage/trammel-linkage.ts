import { radians } from '@/lib/geometry/angle';
import { polar } from '@/lib/geometry/point';
import { pinsApart } from '@/lib/kinematics/linkage/trammel-making';
import { trammelPose, type Trammel } from '@/lib/kinematics/linkage/trammel';
import type { Linkage } from '@/lib/kinematics/linkage/solver/linkage';

/**
 * A trammel as data for the general solver: points `O` (the crossing), `E` and `N` (on the level
 * and the upright groove), `level`, `upright` (the pins) and `pen`; driven by the bar's angle, from
 * the upright pin towards the pen's side. Throws `RangeError` for pins in one place: that is a
 * crank, not a trammel.
 * @example trammelLinkage({ uprightPin: 150, levelPin: 90 }).fixed // → ['O', 'E', 'N']
 */
export function trammelLinkage(trammel: Trammel): Linkage {
  const apart = pinsApart(trammel);
  if (apart === 0) {
    throw new RangeError('trammelLinkage: pins stand in one place; expected two pins apart');
  }
  const pose = trammelPose(trammel, radians(40));
  const { uprightPin, levelPin, beside = 0, grooveAngle = Math.PI / 2 } = trammel;
  const forward = uprightPin > levelPin;
  return {
    points: {
      O: { x: 0, y: 0 },
      E: { x: apart, y: 0 },
      N: polar(apart, grooveAngle),
      level: pose.levelPin,
      upright: pose.uprightPin,
      pen: pose.pen,
    },
    fixed: ['O', 'E', 'N'],
    plates: [
      {
        shape: {
          upright: { x: 0, y: 0 },
          level: { x: uprightPin - levelPin, y: 0 },
          pen: { x: uprightPin, y: beside },
        },
      },
    ],
    slides: [
      { point: 'level', along: ['O', 'E'] },
      { point: 'upright', along: ['O', 'N'] },
    ],
    drivers: [
      forward
        ? { kind: 'angle', from: 'upright', to: 'level' }
        : { kind: 'angle', from: 'level', to: 'upright' },
    ],
  };
}
