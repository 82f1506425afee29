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

/** Where the rims of a train are rolled out, a row a wheel. */
export interface RimRows {
  readonly left: number;
  /** How far the crank turns until the longest rim would run off the drawing, radians. */
  readonly wholeTurn: number;
  /** Half the height of a tick, mm. */
  readonly tick: number;
  readonly rows: readonly { readonly wheel: SetWheel; readonly y: number }[];
  /** The names and the lines that wait for the chalk. */
  readonly still: readonly Shape[];
}

/** The rows under a train in which its rims are rolled out; none where nothing turns. */
export function rimRows(setup: TrainSetup, bounds: Bounds): RimRows | null {
  const width = bounds.right - bounds.left;
  const [left, span] = [bounds.left + leftShare * width, spanShare * width];
  const fastest = Math.max(...setup.wheels.map(rimSpeed));
  if (!(fastest > 0)) return null;
  const rows = setup.wheels.map((wheel, row) => ({
    wheel,
    y: bounds.bottom + (setup.wheels.length - row - 0.2) * rowShare * width,
  }));
  return {
    left,
    wholeTurn: Math.min(2 * Math.PI, span / fastest),
    tick: 0.2 * rowShare * width,
    rows,
    still: rows.flatMap(({ wheel, y }): Shape[] => [
      label(`${wheel.teeth} t`, { x: left, y }, { anchor: 'end', nudge: { x: -8, y: 0 } }),
      line('dimension', { x: left, y }, { x: left + span, y }, 0.6),
    ]),
  };
}

/**
 * The rim of each wheel rolled out in chalk under the train, a tick a tooth, so that equal lengths
 * show at a mesh. The strip begins anew before the longest rim would run off the drawing.
 */
export function rimsUnrolled(rims: RimRows, { spec, stuck }: TrainSetup, drive: number): Shape[] {
  const { left, rows, tick, wholeTurn } = rims;
  const turned = stuck ? 0 : Math.abs(drive) % wholeTurn;
  return rows.flatMap(({ wheel, y }): Shape[] => {
    const length = rimSpeed(wheel) * turned;
    return [
      line('tracing', { x: left, y }, { x: left + length, y }),
      comb(left, y, length, Math.PI * spec.module, tick),
    ];
  });
}

/** Length of rim that passes a point for one radian of the crank, mm. */
function rimSpeed({ ratio, pitchRadius }: SetWheel): number {
  return Math.abs(ratio ?? 0) * pitchRadius;
}

/** A tick at every pitch of a length, as one stroke that goes along it and up and down. */
function comb(left: number, y: number, length: number, pitch: number, half: number): Shape {
  const ticks = Math.floor(length / pitch + 1e-9) + 1;
  const points = Array.from({ length: ticks }, (_, i) => {
    const x = left + i * pitch;
    return [x, y, x, y + half, x, y - half, x, y];
  }).flat();
  return { kind: 'outline', role: 'thread', points, closed: false };
}
