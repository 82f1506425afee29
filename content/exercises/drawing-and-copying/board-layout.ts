import { radians } from '@/lib/geometry/angle';
import { pantographCopy } from '@/lib/kinematics/linkage/pantograph';
import { pantographReach } from '@/lib/kinematics/linkage/pantograph-reach';

/** A sign, the board it goes on, and what the shop has; all in one unit of length. */
export interface Board {
  readonly signWidth: number;
  readonly signHeight: number;
  readonly boardWidth: number;
  readonly boardHeight: number;
  /** Distance between holes. */
  readonly pitch: number;
  /** Least distance between the two sheets. */
  readonly clear: number;
}

/** Bars, hole and place of the copy, as chosen. */
export interface Layout {
  readonly bar: number;
  /** Which hole, counted from the fixed pin. */
  readonly hole: number;
  /** From the fixed point to the near edge of the copy. */
  readonly from: number;
}

/** What comes of a layout. */
export interface LaidOut {
  readonly scale: number;
  /** From the fixed point to the copy's far corner. */
  readonly farCorner: number;
  /** Where the pen works with the elbow from 30 to 150°. */
  readonly nearest: number;
  readonly farthest: number;
  /** How far out the copy must begin so that the sheets do not overlap. */
  readonly clearFrom: number;
}

const elbow = { least: radians(30), most: radians(150) };

/** The largest scale at which the whole copy fits on the board. */
export function largestScale(board: Board): number {
  return Math.min(board.boardWidth / board.signWidth, board.boardHeight / board.signHeight);
}

/** The scale at which the copy fits one way only. */
export function tooLargeScale(board: Board): number {
  return Math.max(board.boardWidth / board.signWidth, board.boardHeight / board.signHeight);
}

/** What comes of a layout, or `null` when the hole is not on the bar. */
export function layOut({ bar, hole, from }: Layout, board: Board): LaidOut | null {
  const at = hole * board.pitch;
  if (hole < 1 || !Number.isInteger(hole) || at >= bar) return null;
  const bars = { first: bar, second: bar, firstHole: at, secondHole: at };
  const copy = pantographCopy(bars, 'middle-to-end');
  if (copy.outcome !== 'true') return null;
  const { pen } = pantographReach(bars, 'middle-to-end', elbow);
  const scale = copy.scale;
  return {
    scale,
    farCorner: Math.hypot(from + scale * board.signHeight, (scale * board.signWidth) / 2),
    nearest: pen.least,
    farthest: pen.most,
    clearFrom: (scale * (board.signHeight + board.clear)) / (scale - 1),
  };
}

/** Whether a layout meets each of the five demands. */
export function demandsMet(layout: Layout, board: Board) {
  const out = layOut(layout, board);
  if (out === null) {
    return { inside: false, large: false, near: false, far: false, clear: false };
  }
  return {
    inside: out.scale <= largestScale(board) + 1e-9,
    large: out.scale >= 0.92 * largestScale(board) - 1e-9,
    near: layout.from >= out.nearest - 1e-9,
    far: out.farCorner <= out.farthest + 1e-9,
    clear: layout.from >= out.clearFrom - 1e-9,
  };
}

/** Whether a scale fits the board and uses it well. */
export function fitsBoard(scale: number, board: Board): boolean {
  const largest = largestScale(board);
  return scale <= largest + 1e-9 && scale >= 0.92 * largest - 1e-9;
}

/**
 * The first layout from this stock that answers, its copy as near to the fixed point as the grid
 * allows, or `null`.
 */
export function firstLayout(stock: readonly number[], board: Board, grid: number): Layout | null {
  for (const bar of stock) {
    for (let hole = 1; hole * board.pitch < bar; hole += 1) {
      const out = layOut({ bar, hole, from: 0 }, board);
      if (out === null || !fitsBoard(out.scale, board)) continue;
      const from = Math.ceil(Math.max(out.nearest, out.clearFrom) / grid - 1e-9) * grid;
      const met = demandsMet({ bar, hole, from }, board);
      if (Object.values(met).every(Boolean)) return { bar, hole, from };
    }
  }
  return null;
}
