import { type Point, polar } from '@/lib/geometry/point';
import { wrapTurn } from '@/lib/geometry/angle';
import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireCount,
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/**
 * A cam of constant breadth on an equilateral triangle: about each corner a small arc of
 * `cornerRadius` and, on the far side, a large one of `side` + `cornerRadius`.
 */
export interface ConstantBreadthCam {
  readonly side: number;
  readonly cornerRadius: number;
}

/**
 * The breadth of the cam between parallel jaws square to `direction`: side + 2r in every direction,
 * measured here as the two jaws stand.
 *
 * @throws RangeError for a side of 0 or less, a corner radius below 0, a direction that is no number.
 * @see Reuleaux, Kinematics of Machinery (from memory); exact geometry.
 * @example constantBreadth({ side: 60, cornerRadius: 8 }) // → 76
 */
export function constantBreadth(cam: ConstantBreadthCam, direction = 0): number {
  const [here, opposite] = [jawDistance(cam, direction), jawDistance(cam, direction + Math.PI)];
  return finiteResult('constantBreadth', here + opposite);
}

/**
 * The length of the rim, π times the breadth.
 *
 * @throws RangeError as `constantBreadth`.
 * @see Barbier's theorem.
 * @example constantBreadthPerimeter({ side: 50, cornerRadius: 0 }) // → 157.07963
 */
export function constantBreadthPerimeter(cam: ConstantBreadthCam): number {
  return finiteResult('constantBreadthPerimeter', Math.PI * constantBreadth(cam));
}

/**
 * How far the jaw square to `direction` stands from `axle`, pressed on the cam from outside; the
 * jaw opposite stands the breadth less that on the other side.
 *
 * The triangle's middle is the origin and its first corner lies on +x; radians. With the axle on a
 * corner the jaw stands still for two sixths of a turn.
 *
 * @throws RangeError as `constantBreadth`, and for a direction or an axle that is no finite number.
 * @see the support function of the rim: exact geometry.
 * @example jawDistance({ side: 60, cornerRadius: 8 }, 0) // → 42.641016
 */
export function jawDistance(
  cam: ConstantBreadthCam,
  direction: number,
  axle: Point = { x: 0, y: 0 },
): number {
  requireCam('jawDistance', cam);
  requireFinite('jawDistance', 'direction', direction);
  requireFinite('jawDistance', 'axle.x', axle.x);
  requireFinite('jawDistance', 'axle.y', axle.y);
  const { arc, corner } = arcAt(cam, direction);
  const along =
    (corner.x - axle.x) * Math.cos(direction) + (corner.y - axle.y) * Math.sin(direction);
  return finiteResult('jawDistance', along + arc);
}

/**
 * The closed outline of the cam, counter-clockwise from the middle of its first corner.
 *
 * @throws RangeError as `constantBreadth`, or for steps that are not a whole number from 12 to 100 000.
 */
export function constantBreadthOutline(cam: ConstantBreadthCam, steps = 180): readonly Point[] {
  requireCam('constantBreadthOutline', cam);
  requireCount('constantBreadthOutline', 'steps', steps, 12);
  requireWithin('constantBreadthOutline', 'steps', steps, 12, 100_000);
  const points = Array.from({ length: steps }, (_, i) => {
    const direction = (2 * Math.PI * i) / steps;
    const { arc, corner } = arcAt(cam, direction);
    return polar(arc, direction, corner);
  });
  return finiteResult('constantBreadthOutline', points);
}

/** The arc that faces a direction: a sixth of a turn each, small about the near corner, large about the far one. */
function arcAt(cam: ConstantBreadthCam, direction: number): { arc: number; corner: Point } {
  const sixth = Math.round(wrapTurn(direction) / (Math.PI / 3)) % 6;
  const small = sixth % 2 === 0;
  const cornerAngle = (sixth * Math.PI) / 3 + (small ? 0 : Math.PI);
  return {
    arc: cam.cornerRadius + (small ? 0 : cam.side),
    corner: polar(cam.side / Math.sqrt(3), cornerAngle),
  };
}

function requireCam(caller: string, { side, cornerRadius }: ConstantBreadthCam): void {
  requirePositive(caller, 'side', side);
  requireNonNegative(caller, 'cornerRadius', cornerRadius);
}
