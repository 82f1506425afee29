import { add, ORIGIN, subtract, type Point } from '@/lib/geometry/point';
import type { NumberControl } from './bench-model';
import type { PantographSpec } from './bench-spec';
import { shownLength } from './measure';
import type { PantographSetup } from './pantograph-setup';
import type { Bounds, Scene } from './scene';
import { lengthControl, lengthSet, type LengthRange } from './settings';

/** Where the drawing's middle may lie as seen from the fixed pin. */
const away: LengthRange = { mm: [-800, 800, 5], inch: [-32, 32, 0.25] };

/** The two settings that say where the fixed pin stands: how far from it the drawing lies. */
export function pinControls({ spec, middle }: PantographSetup): readonly NumberControl[] {
  const { units } = spec;
  return [
    lengthControl('east', 'Drawing, east of the fixed pin', middle.x, away, units),
    lengthControl('north', 'Drawing, north of the fixed pin', middle.y, away, units),
  ];
}

/** The fixed pin put where the drawing's middle lies so far east of it, or north; in what is shown. */
export function setPin(
  setup: PantographSetup,
  key: 'east' | 'north',
  shown: number,
): PantographSpec {
  const mm = lengthSet(shown, away, setup.spec.units);
  const { middle } = setup;
  return pinSeeing(setup, key === 'east' ? { ...middle, x: mm } : { ...middle, y: mm });
}

/** The fixed pin pulled over the board: the drawing stays where it lies. */
export function pullPin(setup: PantographSetup, from: Point, to: Point): PantographSpec {
  const { units } = setup.spec;
  const wanted = subtract(setup.middle, subtract(to, from));
  const step = (mm: number) => lengthSet(shownLength(mm, units), away, units);
  return pinSeeing(setup, { x: step(wanted.x), y: step(wanted.y) });
}

function pinSeeing({ spec, middle }: PantographSetup, at: Point): PantographSpec {
  const pinMoved = add(spec.pinMoved ?? ORIGIN, subtract(middle, at));
  return { ...spec, drawing: { ...spec.drawing, at }, pinMoved };
}

/** Bounds as the board has them, from bounds as seen from the fixed pin. */
export function boundsOnBoard({ pinMoved = ORIGIN }: PantographSpec, bounds: Bounds): Bounds {
  return {
    left: bounds.left + pinMoved.x,
    right: bounds.right + pinMoved.x,
    bottom: bounds.bottom + pinMoved.y,
    top: bounds.top + pinMoved.y,
  };
}

/** A scene as the board has it, from a scene as seen from the fixed pin. */
export function sceneOnBoard(spec: PantographSpec, scene: Scene): Scene {
  const { pinMoved } = spec;
  if (!pinMoved) return scene;
  const bounds = boundsOnBoard(spec, scene.bounds);
  const { shapes } = scene;
  return { bounds, shapes: [{ kind: 'body', pose: { ...pinMoved, angle: 0 }, shapes }] };
}
