import { add, between, distance, polar, rotate, type Point } from '@/lib/geometry/point';
import { planLinkage } from '@/lib/kinematics/linkage/solver/plan-linkage';
import { solveLinkage } from '@/lib/kinematics/linkage/solver/solver';
import { trammelLinkage } from '@/lib/kinematics/linkage/trammel-linkage';
import { leastPinsApart, pinsApart } from '@/lib/kinematics/linkage/trammel-making';
import {
  trammelOval,
  trammelPose,
  type Trammel,
  type TrammelOval,
  type TrammelPose,
} from '@/lib/kinematics/linkage/trammel';
import type { TrammelSpec } from './bench-spec';

/** A trammel worked out. Its drive is the bar's angle from the near pin's groove, radians. */
export interface TrammelSetup {
  readonly spec: TrammelSpec;
  readonly trammel: Trammel;
  readonly oval: TrammelOval;
  readonly apart: number;
  /** From the level groove to the upright one, radians. */
  readonly grooveAngle: number;
  /** From the level groove to the near pin's, radians. */
  readonly turned: number;
  /** How far a pin may stand from the crossing before its slider strikes the groove's end, mm. */
  readonly room: number;
  /** How far the pins go from the crossing in a whole turn, mm. */
  readonly travel: number;
  /** Whether the sliders strike one another at the crossing. */
  readonly strike: boolean;
  /** Everything that moves, for an angle of the bar. */
  readonly pose: (drive: number) => TrammelPose;
  /** The whole way of the pen. */
  readonly path: readonly Point[];
}

const pathSteps = 180;

/** The trammel that a spec describes, on the general solver unless two of its points are one. */
export function setUpTrammel(spec: TrammelSpec): TrammelSetup {
  const { farPin, nearPin, farRunsIn, skew, slider, groove } = spec;
  const farUpright = farRunsIn === 'north-south';
  const grooveAngle = Math.PI / 2 + skew;
  const trammel: Trammel = {
    uprightPin: farUpright ? farPin : nearPin,
    levelPin: farUpright ? nearPin : farPin,
    ...(skew === 0 ? {} : { grooveAngle }),
  };
  const turned = farUpright ? 0 : grooveAngle;
  const apart = pinsApart(trammel);
  const pose = posing(trammel, turned);
  return {
    spec,
    trammel,
    oval: trammelOval(trammel),
    apart,
    grooveAngle,
    turned,
    room: Math.max(0, (groove - slider) / 2),
    travel: apart / Math.sin(grooveAngle),
    strike: apart > 1e-9 && apart < leastPinsApart(slider, sliderWidth(spec)),
    pose,
    path: Array.from({ length: pathSteps + 1 }, (_, i) => pose((2 * Math.PI * i) / pathSteps).pen),
  };
}

/** The pen's place between the points of its way, without solving anew. */
export function penBetween({ path }: TrammelSetup, drive: number): Point | null {
  const place = (turnShare(drive) * pathSteps) % pathSteps;
  const i = Math.floor(place);
  const [a, b] = [path[i], path[i + 1]];
  return a && b ? between(a, b, place - i) : null;
}

/** How much of a turn an angle is beyond its whole turns, from 0 to 1. */
function turnShare(angle: number): number {
  const turns = angle / (2 * Math.PI);
  return turns - Math.floor(turns);
}

/** A slider is a third as wide as it is long, and so is its groove. */
export function sliderWidth({ slider }: TrammelSpec): number {
  return slider / 3;
}

function posing(trammel: Trammel, turned: number): (drive: number) => TrammelPose {
  const crank = (drive: number) => trammelPose(trammel, drive + turned);
  const { uprightPin, levelPin } = trammel;
  const together = Math.min(pinsApart(trammel), Math.abs(uprightPin), Math.abs(levelPin));
  if (together < 1e-9) return crank;
  const planned = planLinkage(trammelLinkage(trammel));
  if (planned.outcome !== 'planned') return crank;
  return (drive) => {
    const { points } = solveLinkage(planned.plan, [drive + turned]);
    const { pen, upright, level } = points;
    return pen && upright && level ? { pen, uprightPin: upright, levelPin: level } : crank(drive);
  };
}

/** The pens that the far end and the near end of the bar would be, as distances from the pen. */
export function barEnds({ spec }: TrammelSetup): { readonly tail: number; readonly nose: number } {
  const beyond = 0.75 * spec.slider;
  const behind = [0, spec.farPin, spec.nearPin];
  return { tail: Math.max(...behind) + beyond, nose: Math.min(...behind) - 0.4 * beyond };
}

/** A place on the bar, so far behind the pen. */
export function onBar(pose: TrammelPose, barAngle: number, behind: number): Point {
  return add(pose.pen, polar(-behind, barAngle));
}

/** The drive nearest to `drive` at which no slider stands beyond its groove's end. */
export function admitted(setup: TrammelSetup, drive: number): number {
  const { travel, room, grooveAngle: a, turned } = setup;
  if (travel <= room + 1e-9) return drive;
  const q = Math.asin(Math.min(1, room / travel));
  const free = [
    [a - q, q],
    [Math.PI - q, a + q],
  ].filter(([from = 0, to = 0]) => from <= to);
  if (free.length === 0) return drive;
  const angle = drive + turned;
  const half = Math.floor(angle / Math.PI) * Math.PI;
  let nearest: number | null = null;
  for (const [from = 0, to = 0] of free) {
    for (const shift of [half - Math.PI, half, half + Math.PI]) {
      const there = Math.min(Math.max(angle, from + shift), to + shift);
      if (nearest === null || Math.abs(there - angle) < Math.abs(nearest - angle)) nearest = there;
    }
  }
  return nearest === null || nearest === angle ? drive : nearest - turned;
}

/** Whether some turn of the bar is possible, but not all of it. */
export function isStopped({ travel, room }: TrammelSetup): boolean {
  return travel > room + 1e-9;
}

/** The pen's angle from the near pin's groove as seen from the crossing, −π to π; 0 on the crossing. */
export function penAngle(setup: TrammelSetup, pen: Point): number {
  const seen = rotate(pen, -setup.turned);
  return distance(pen, { x: 0, y: 0 }) < 1e-9 ? 0 : Math.atan2(seen.y, seen.x);
}
