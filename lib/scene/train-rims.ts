import type { Bounds, Shape } from './scene';
import { label, line } from './strokes';
import type { SetWheel, TrainSetup } from './train-setup';

/** Height of one row of the unrolled rims, as a share of the drawing's width. */
const rowShare = 0.036;
const leftShare = 0.12;
const spanShare = 0.82;

/** Height of the strip of unrolled rims, as a share of the drawing's width. */
export function rowsHeight(rows: number): number {
  return rowShare * (rows + 0.7);
}

/**
 * The rim of each wheel rolled out in chalk under the train, a tick a tooth, so that equal lengths
 * show at a mesh. The strip begins anew before the longest rim would run off the drawing.
 */
export function rimsUnrolled(setup: TrainSetup, drive: number, bounds: Bounds): readonly Shape[] {
  const width = bounds.right - bounds.left;
  const [left, span] = [bounds.left + leftShare * width, spanShare * width];
  const fastest = Math.max(...setup.wheels.map(rimSpeed));
  if (!(fastest > 0)) return [];
  const wholeTurn = Math.min(2 * Math.PI, span / fastest);
  const turned = setup.stuck ? 0 : Math.abs(drive) % wholeTurn;
  return setup.wheels.flatMap((wheel, row): Shape[] => {
    const y = bounds.bottom + (setup.wheels.length - row - 0.2) * rowShare * width;
    const length = rimSpeed(wheel) * turned;
    const name = label(
      `${wheel.teeth} t`,
      { x: left, y },
      { anchor: 'end', nudge: { x: -8, y: 0 } },
    );
    return [
      name,
      line('dimension', { x: left, y }, { x: left + span, y }, 0.6),
      line('tracing', { x: left, y }, { x: left + length, y }),
      ...ticks(left, y, length, Math.PI * setup.spec.module, 0.2 * rowShare * width),
    ];
  });
}

/** Length of rim that passes a point for one radian of the crank, mm. */
function rimSpeed({ ratio, pitchRadius }: SetWheel): number {
  return Math.abs(ratio ?? 0) * pitchRadius;
}

function ticks(left: number, y: number, length: number, pitch: number, half: number): Shape[] {
  return Array.from({ length: Math.floor(length / pitch + 1e-9) + 1 }, (_, i) =>
    line('thread', { x: left + i * pitch, y: y - half }, { x: left + i * pitch, y: y + half }),
  );
}
