import { finiteResult } from '@/lib/numeric/finite-result';
import {
  requireFinite,
  requireNonNegative,
  requirePositive,
  requireWithin,
} from '@/lib/numeric/require';

/** The pieces that a board gives, or by how much it is too short for one. */
export type BoardPieces =
  | { readonly outcome: 'cut'; readonly pieces: number; readonly left: number }
  | { readonly outcome: 'too-short'; readonly by: number };

/** A board that was meant to come out even may lack this part of a piece by rounding. */
const evenTolerance = 1e-9;

/**
 * How many equal pieces come out of a board, a saw kerf between each two, and what is left.
 *
 * One unit of length. `left` is measured after one cut fewer than there are pieces.
 *
 * @throws RangeError for a board or a piece of 0 or less, a kerf below 0.
 * @see n·w + (n − 1)·k ≤ L.
 * @example piecesFromBoard(2400, 95, 3.2) // → { outcome: 'cut', pieces: 24, left: 46.4 }
 */
export function piecesFromBoard(board: number, piece: number, kerf: number): BoardPieces {
  requirePositive('piecesFromBoard', 'board', board);
  requirePositive('piecesFromBoard', 'piece', piece);
  requireNonNegative('piecesFromBoard', 'kerf', kerf);
  const exact = finiteResult('piecesFromBoard', (board + kerf) / (piece + kerf));
  const pieces = Math.floor(exact + evenTolerance);
  if (pieces === 0) return { outcome: 'too-short', by: piece - board };
  const left = Math.max(0, board - pieces * piece - (pieces - 1) * kerf);
  return finiteResult('piecesFromBoard', { outcome: 'cut', pieces, left });
}

/** Where the beam or the blade runs when it eats half a kerf on either side of a drawn line. */
export interface KerfSizes {
  /** What comes out of an outline and of a hole that are cut as drawn. */
  readonly part: number;
  readonly hole: number;
  /** What to draw so that the sizes come out as wanted. */
  readonly drawnOutline: number;
  readonly drawnHole: number;
  /** The play of a tab in a slot that were drawn alike. */
  readonly play: number;
}

/**
 * What a kerf does to an outline and a hole whose lines are followed by the middle of the cut.
 *
 * @throws RangeError for sizes that are no finite numbers, a kerf below 0.
 * @see half a kerf is lost on each side of the line.
 * @example kerfSizes(60, 8, 0.2) // → { part: 59.8, hole: 8.2, drawnOutline: 60.2, drawnHole: 7.8, play: 0.4 }
 */
export function kerfSizes(outline: number, hole: number, kerf: number): KerfSizes {
  requireFinite('kerfSizes', 'outline', outline);
  requireFinite('kerfSizes', 'hole', hole);
  requireNonNegative('kerfSizes', 'kerf', kerf);
  return finiteResult('kerfSizes', {
    part: outline - kerf,
    hole: hole + kerf,
    drawnOutline: outline + kerf,
    drawnHole: hole - kerf,
    play: 2 * kerf,
  });
}

/** A board that is bent by saw kerfs on its inner face, a skin left whole. */
export interface KerfedBoard {
  readonly thickness: number;
  readonly skin: number;
  readonly kerf: number;
}

/** A bend by kerfs that close fully. */
export interface KerfBend {
  readonly turnPerKerf: number;
  /** The number of kerfs, as it comes out, and whole. */
  readonly exactKerfs: number;
  readonly kerfs: number;
}

/**
 * How many kerfs bend a board by `bend` when they close fully and the skin does not stretch.
 *
 * Radians; one unit of length.
 *
 * @throws RangeError for a bend below 0, a thickness or kerf of 0 or less, a skin not under the thickness.
 * @see the triangle of kerf width and kerf depth, 2·atan(k/2(t − s)).
 * @example kerfBend({ thickness: 18, skin: 2, kerf: 3.2 }, Math.PI / 2).kerfs // → 8
 */
export function kerfBend(board: KerfedBoard, bend: number): KerfBend {
  requireNonNegative('kerfBend', 'bend', bend);
  const turnPerKerf = turnOfOneKerf('kerfBend', board);
  const exactKerfs = bend / turnPerKerf;
  const kerfs = Math.ceil(exactKerfs - evenTolerance * Math.max(1, exactKerfs));
  return finiteResult('kerfBend', { turnPerKerf, exactKerfs, kerfs: Math.max(0, kerfs) });
}

/**
 * The radius of the skin when kerfs `spacing` apart close fully.
 *
 * @throws RangeError as `kerfBend`, and for a spacing of 0 or less.
 * @see the skin's length over its turn.
 * @example kerfBendRadius({ thickness: 18, skin: 2, kerf: 3.2 }, 20) // → 100.33245
 */
export function kerfBendRadius(board: KerfedBoard, spacing: number): number {
  requirePositive('kerfBendRadius', 'spacing', spacing);
  return finiteResult('kerfBendRadius', spacing / turnOfOneKerf('kerfBendRadius', board));
}

/**
 * The spacing of kerfs that gives the skin a radius: the inverse of `kerfBendRadius`.
 *
 * @throws RangeError as `kerfBend`, and for a radius of 0 or less.
 * @example kerfSpacing({ thickness: 18, skin: 2, kerf: 3.2 }, 100) // → 19.933730
 */
export function kerfSpacing(board: KerfedBoard, radius: number): number {
  requirePositive('kerfSpacing', 'radius', radius);
  return finiteResult('kerfSpacing', radius * turnOfOneKerf('kerfSpacing', board));
}

function turnOfOneKerf(caller: string, { thickness, skin, kerf }: KerfedBoard): number {
  requirePositive(caller, 'thickness', thickness);
  requireNonNegative(caller, 'skin', skin);
  requirePositive(caller, 'kerf', kerf);
  requireWithin(caller, 'skin', skin, 0, thickness * (1 - Number.EPSILON));
  return 2 * Math.atan(kerf / 2 / (thickness - skin));
}
