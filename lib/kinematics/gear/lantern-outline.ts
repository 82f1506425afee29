import type { Point } from '@/lib/geometry/point';
import { requireDrawable } from '@/lib/kinematics/gear/proportions';
import { lanternCarrying, lanternPoint, lanternSizes } from '@/lib/kinematics/gear/lantern';
import type { LanternSpec } from '@/lib/kinematics/gear/lantern';
import { requireSize } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';
import { rootBetween } from '@/lib/numeric/root-between';

/** A lantern's wheel to be drawn. */
export interface LanternOutlineSpec extends LanternSpec {
  /** Where the teeth end; unless given, 0.04 of a pitch above what carrying a pin needs. */
  readonly tipRadius?: number;
  /** Steps along one flank, and round half a hollow; 12 unless given. */
  readonly steps?: number;
}

/** Fine enough to bracket where hollow and flank cross. */
const searchSteps = 64;
/** Height that is left above the last point of contact, in pitches (common practice). */
const spareHeight = 0.04;

/**
 * The outline of the wheel that drives a lantern: a closed polygon, counter-clockwise, about the
 * origin, the middle of a tooth on +x.
 *
 * The flanks are the path of a pin's centre moved in by its radius; play is taken off both. The
 * hollows are arcs about the pin's place on the pitch circle, wider than the pin by the play. Teeth
 * never stand higher than their point.
 *
 * @throws RangeError for nonsense, or if the pins leave no tooth.
 * Source: unit 3.5's construction; hollow of radius δ/2 + play/2.
 * @example lanternWheelOutline({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11, play: 1 }).length // → 1764
 */
export function lanternWheelOutline(spec: LanternOutlineSpec): readonly Point[] {
  requireDrawable('lanternWheelOutline', spec.wheelTeeth);
  const steps = requireCount('lanternWheelOutline', 'steps', spec.steps ?? 12);
  const { wheelRadius, toothThickness } = lanternSizes(spec);
  requireSize('lanternWheelOutline', 'tooth thickness', toothThickness);
  const side = sideOf(spec, wheelRadius, steps);
  const pitch = (2 * Math.PI) / spec.wheelTeeth;
  // The side runs up from the middle of the space at angle 0; the tooth's middle is at pitch/2.
  const tooth = [
    ...side.map((point) => turned(point, -pitch / 2)),
    ...side.toReversed().map((point) => turned({ x: point.x, y: -point.y }, pitch / 2)),
  ];
  const outline = Array.from({ length: spec.wheelTeeth }, (_, turn) =>
    tooth.slice(0, -1).map((point) => turned(point, turn * pitch)),
  );
  return outline.flat();
}

/** From the bottom of the hollow up one flank to the tip, the space's middle on +x. */
function sideOf(spec: LanternOutlineSpec, wheelRadius: number, steps: number): readonly Point[] {
  const radius = (spec.pinDiameter + (spec.play ?? 0)) / 2;
  const play = (spec.play ?? 0) / (2 * wheelRadius);
  const flankAt = (roll: number) => turned(lanternPoint(spec, roll).flank, play);
  const outOfHollow = (roll: number): number => {
    const { x, y } = flankAt(roll);
    return Math.hypot(x - wheelRadius, y) - radius;
  };
  // At its very foot the flank turns back into the hollow; the side changes over where they cross.
  const end = lastRoll(spec);
  const start = firstAbove(outOfHollow, end);
  const joint = flankAt(start);
  const last = Math.atan2(joint.y, wheelRadius - joint.x);
  const hollow = Array.from({ length: steps }, (_, step) => {
    const angle = (last * step) / steps;
    return { x: wheelRadius - radius * Math.cos(angle), y: radius * Math.sin(angle) };
  });
  const flank = Array.from({ length: steps + 1 }, (_, step) =>
    flankAt(start + ((end - start) * step) / steps),
  );
  return [...hollow, ...flank];
}

/** Where a function that starts at or below nought first rises above it, from 0 to `end`. */
function firstAbove(f: (roll: number) => number, end: number): number {
  for (let step = 1; step <= searchSteps; step += 1) {
    const roll = (end * step) / searchSteps;
    if (f(roll) <= 0) continue;
    const before = (end * Math.max(step - 1, 1e-3)) / searchSteps;
    return f(before) < 0 ? rootBetween('lanternWheelOutline', f, before, roll) : before;
  }
  return end;
}

/** How far the lantern must roll for the flank to reach the tip. */
function lastRoll(spec: LanternOutlineSpec): number {
  const carrying = lanternCarrying(spec);
  if (carrying.outcome === 'no-tooth') return 0;
  const wanted = spec.tipRadius ?? carrying.needed + spareHeight * spec.pitch;
  const tip = Math.min(wanted, carrying.pointed);
  const over = (roll: number): number => {
    const point = lanternPoint(spec, roll).flank;
    return Math.hypot(point.x, point.y) - tip;
  };
  return rootBetween('lanternWheelOutline', over, 0, (Math.PI * spec.pins) / spec.wheelTeeth);
}

function turned({ x, y }: Point, angle: number): Point {
  const [cosine, sine] = [Math.cos(angle), Math.sin(angle)];
  return { x: x * cosine - y * sine, y: x * sine + y * cosine };
}
