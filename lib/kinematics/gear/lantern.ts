import type { Point } from '@/lib/geometry/point';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import { requireCount } from '@/lib/numeric/require';
import { rootBetween } from '@/lib/numeric/root-between';

/** A wheel whose teeth drive the pins of a lantern. */
export interface LanternSpec {
  /** Spacing along both pitch circles. */
  readonly pitch: number;
  readonly wheelTeeth: number;
  readonly pins: number;
  readonly pinDiameter: number;
  /** Play along the pitch circle; 0 unless given. */
  readonly play?: number;
}

/** Circles and wood of a lantern pair. */
export interface LanternSizes {
  readonly wheelRadius: number;
  /** The lantern's pitch circle runs through the middles of its pins. */
  readonly pinCircleRadius: number;
  readonly centreDistance: number;
  /** What a tooth keeps on the pitch circle; nought or less if the pins fill the spacing. */
  readonly toothThickness: number;
  /** Straight from hole to hole. */
  readonly pinChord: number;
  /** Wood between two holes; negative if they run into each other. */
  readonly woodBetweenPins: number;
}

/** Where a pin and the flank that drives it are, in the frame of the wheel. */
export interface LanternPoint {
  readonly pinCentre: Point;
  readonly flank: Point;
}

/** Whether each pin is carried until the next is taken. */
export type LanternCarrying =
  | { readonly outcome: 'carried'; readonly needed: number; readonly pointed: number }
  /** The tooth comes to a point too early; `short` of height is missing. */
  | {
      readonly outcome: 'lets-go';
      readonly needed: number;
      readonly pointed: number;
      readonly short: number;
    }
  /** The pins fill the whole spacing and `excess` more: no tooth is left. */
  | { readonly outcome: 'no-tooth'; readonly excess: number };

/** Steps in which the flank is followed to find where it meets its twin. */
const pointedSteps = 64;

/**
 * Sizes of a lantern and its wheel.
 *
 * @throws RangeError for nonsense.
 * Source: pitch circles p·z/2π through the pin centres; case GR-LN-01.
 * @example lanternSizes({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }).centreDistance // → 175.070437401
 */
export function lanternSizes(spec: LanternSpec): LanternSizes {
  const { wheelRadius, pinCircleRadius } = circles('lanternSizes', spec);
  const pinChord = 2 * pinCircleRadius * Math.sin(Math.PI / spec.pins);
  return {
    wheelRadius,
    pinCircleRadius,
    centreDistance: wheelRadius + pinCircleRadius,
    toothThickness: spec.pitch - spec.pinDiameter - (spec.play ?? 0),
    pinChord,
    woodBetweenPins: pinChord - spec.pinDiameter,
  };
}

/**
 * The centre of a pin that began at (wheel radius, 0), and the point where the flank touches the
 * pin, when the lantern has rolled round the wheel until the line of centres stands at `roll`.
 *
 * The path of the centre is an epicycloid; the flank lies a pin's radius inside it, towards the
 * tooth on the +y side, square to it through the pitch point. At 0 it is the limit. Radians.
 *
 * @throws RangeError for nonsense.
 * Source: Camus; the pitch point is the instantaneous centre. Case GR-LN-01.
 * @example lanternPoint({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }, Math.PI / 45).flank.x // → 143.893565094
 */
export function lanternPoint(spec: LanternSpec, roll: number): LanternPoint {
  const { wheelRadius, pinCircleRadius } = circles('lanternPoint', spec);
  requireMeasure('lanternPoint', 'roll', roll);
  const together = wheelRadius + pinCircleRadius;
  const turned = (together / pinCircleRadius) * roll;
  const pinCentre = {
    x: together * Math.cos(roll) - pinCircleRadius * Math.cos(turned),
    y: together * Math.sin(roll) - pinCircleRadius * Math.sin(turned),
  };
  // From pin centre to pitch point is 2r·sin(t/2), along (R/r)·roll/2 behind the radial's normal.
  const along = roll + (wheelRadius * roll) / (2 * pinCircleRadius) + Math.PI / 2;
  const half = spec.pinDiameter / 2;
  return {
    pinCentre,
    flank: { x: pinCentre.x + half * Math.cos(along), y: pinCentre.y + half * Math.sin(along) },
  };
}

/**
 * The radius at which the two flanks of a wheel's tooth meet in a point; its play is taken off.
 *
 * @throws RangeError for nonsense, or if the pins leave no tooth.
 * Source: case GR-LN-01.
 * @example lanternPointedRadius({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }) // → 157.924551835
 */
export function lanternPointedRadius(spec: LanternSpec): number {
  const { toothThickness, wheelRadius } = lanternSizes(spec);
  requireSize('lanternPointedRadius', 'tooth thickness', toothThickness);
  const middle = Math.PI / spec.wheelTeeth - (spec.play ?? 0) / (2 * wheelRadius);
  const beyond = (roll: number): number => {
    const { flank } = lanternPoint(spec, roll);
    return Math.atan2(flank.y, flank.x) - middle;
  };
  // Half a turn of the lantern brings the pin's centre to the top of its path.
  const end = (Math.PI * spec.pins) / spec.wheelTeeth;
  for (let step = 1; step <= pointedSteps; step += 1) {
    const [from, to] = [(end * (step - 1)) / pointedSteps, (end * step) / pointedSteps];
    if (beyond(to) < 0) continue;
    const { flank } = lanternPoint(spec, rootBetween('lanternPointedRadius', beyond, from, to));
    return Math.hypot(flank.x, flank.y);
  }
  const { flank } = lanternPoint(spec, end);
  return Math.hypot(flank.x, flank.y);
}

/**
 * Whether a wheel's teeth are high enough to carry each pin until the next stands on the line of
 * centres.
 *
 * @throws RangeError for nonsense.
 * Source: own geometry from `lanternPoint` at one pitch of roll; unit 3.5's check, 151.46 against
 * 157.92 mm.
 * @example lanternCarrying({ pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 }).outcome // → 'carried'
 */
export function lanternCarrying(spec: LanternSpec): LanternCarrying {
  const { toothThickness } = lanternSizes(spec);
  if (toothThickness <= 0) return { outcome: 'no-tooth', excess: -toothThickness };
  const { flank } = lanternPoint(spec, (2 * Math.PI) / spec.wheelTeeth);
  const needed = Math.hypot(flank.x, flank.y);
  const pointed = lanternPointedRadius(spec);
  if (needed <= pointed) return { outcome: 'carried', needed, pointed };
  return { outcome: 'lets-go', needed, pointed, short: needed - pointed };
}

function circles(caller: string, spec: LanternSpec) {
  const pitch = requireSize(caller, 'pitch', spec.pitch);
  const teeth = requireCount(caller, 'wheelTeeth', spec.wheelTeeth, 3);
  const pins = requireCount(caller, 'pins', spec.pins, 3);
  requireSize(caller, 'pinDiameter', spec.pinDiameter);
  requireSizeOrNought(caller, 'play', spec.play ?? 0);
  return {
    wheelRadius: (pitch * teeth) / (2 * Math.PI),
    pinCircleRadius: (pitch * pins) / (2 * Math.PI),
  };
}
