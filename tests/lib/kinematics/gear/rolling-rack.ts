import type { Point } from '@/lib/geometry/point';
import type { OutlineSpec } from '@/lib/kinematics/gear/outline';

/**
 * How far a point of a wheel stays from a rack that rolls past it: the least distance over a whole
 * roll, negative if the rack cuts it. The rack is a row of straight-sided teeth with round corners,
 * laid out here from the standard's figures alone, as an independent check of the outline.
 */
export function rackClearance(spec: OutlineSpec, point: Point): number {
  const radius = Math.hypot(point.x, point.y);
  const angle = Math.atan2(point.y, point.x);
  const pitchRadius = (spec.module * spec.teeth) / 2;
  const clearance = (rolled: number): number => {
    const turned = angle + rolled;
    return rackDistance(
      spec,
      pitchRadius * rolled - radius * Math.sin(turned),
      radius * Math.cos(turned) - pitchRadius,
    );
  };
  const count = 4000;
  const step = (2.4 * Math.PI) / count;
  let best = 0;
  for (let index = 0; index <= count; index += 1) {
    const rolled = -1.2 * Math.PI + step * index;
    if (clearance(rolled) < clearance(best)) best = rolled;
  }
  let [low, high] = [best - step, best + step];
  for (let turn = 0; turn < 60; turn += 1) {
    const [a, b] = [low + (high - low) * 0.382, low + (high - low) * 0.618];
    if (clearance(a) < clearance(b)) high = b;
    else low = a;
  }
  return clearance((low + high) / 2);
}

/**
 * Signed distance from the rack's teeth to a point `along` its pitch line and `above` the wheel's
 * pitch circle; wood of the wheel's tooth is centred on along = 0, so a rack tooth on half a pitch.
 */
function rackDistance(spec: OutlineSpec, along: number, above: number): number {
  const { module, pressureAngle, shift = 0, addendum = 1, clearance = 0.25, backlash = 0 } = spec;
  const pitch = Math.PI * module;
  const off = Math.abs((((along % pitch) + pitch) % pitch) - pitch / 2);
  const height = above - shift * module;
  const depth = (addendum + clearance) * module;
  const [sine, cosine] = [Math.sin(pressureAngle), Math.cos(pressureAngle)];
  const half = pitch / 4 + backlash / 2;
  const round = Math.min(
    (clearance * module) / (1 - sine),
    ((half - (depth * sine) / cosine) * cosine) / (1 - sine),
  );
  const centreHeight = round - depth;
  const centreOff = half + (centreHeight * sine) / cosine - round / cosine;
  const toFlank = (off - half) * cosine - height * sine;
  const toTip = -depth - height;
  const [dx, dy] = [off - centreOff, height - centreHeight];
  const inCorner = dx > 0 && dy < 0 && dx * sine + dy * cosine < 0;
  if (inCorner) return Math.hypot(dx, dy) - round;
  return Math.max(toFlank, toTip);
}
