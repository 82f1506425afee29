import { findRoot } from '@/lib/numeric/root';
import { requireMeasure, requireSize, requireSizeOrNought } from '@/lib/numeric/moderate';
import type { Point } from '@/lib/geometry/point';

/**
 * Least play that lets an oar swing although it is longer than its neighbours: oars of length
 * `arm`, the odd one `excess` longer with its fixed pin set back by as much, swung by `swing`
 * radians from where it fits.
 *
 * `(r + δ) − √(r² + δ² + 2rδ·cos θ)`. Throws `RangeError` for lengths that are negative.
 * Source: exact geometry.
 * @example oarPlay(100, 3, radians(40)) // → 0.683693
 */
export function oarPlay(arm: number, excess: number, swing: number): number {
  requireSize('oarPlay', 'arm', arm);
  requireSizeOrNought('oarPlay', 'excess', excess);
  requireMeasure('oarPlay', 'swing', swing);
  const half = Math.sin(swing / 2);
  const odd = Math.sqrt((arm + excess) ** 2 - 4 * arm * excess * half * half);
  return (4 * arm * excess * half * half) / (arm + excess + odd);
}

/**
 * Greatest twist, radians, of a board at the flat, where its equal arms all lie along +x, when each
 * arm's length between centres may be wrong by `play` either way.
 *
 * `pins` are the fixed pins (three or more hold the board; two let it go crosswise). Source:
 * numerical: the largest turn for which some place of the board leaves no arm out by more.
 * @example twistAtFlat(50, [{ x: 0, y: 0 }, { x: 70, y: 0 }, { x: 140, y: 0 }], 0) // → 0
 */
export function twistAtFlat(arm: number, pins: readonly Point[], play: number): number {
  requireSize('twistAtFlat', 'arm', arm);
  requireSizeOrNought('twistAtFlat', 'play', play);
  if (pins.length < 3) {
    throw new RangeError(`twistAtFlat: pins are ${pins.length}; expected three or more`);
  }
  if (play === 0) return 0;
  const middle = {
    x: pins.reduce((sum, pin) => sum + pin.x, 0) / pins.length,
    y: pins.reduce((sum, pin) => sum + pin.y, 0) / pins.length,
  };
  const from = pins.map((pin) => ({ x: pin.x - middle.x, y: pin.y - middle.y }));
  const over = (turn: number) => leastMisfit(arm, from, turn) - play;
  const found = findRoot(over, 0, Math.PI / 2, { tolerance: 1e-10 });
  return found.outcome === 'found' ? found.x : Math.PI / 2;
}

/** The misfit of the worst arm, for the best place of a board turned by `turn`. */
function leastMisfit(arm: number, pins: readonly Point[], turn: number): number {
  const [cosine, sine] = [Math.cos(turn), Math.sin(turn)];
  const offsets = pins.map(({ x, y }) => ({
    x: x * cosine - y * sine - x,
    y: x * sine + y * cosine - y,
  }));
  const worst = (dx: number, dy: number) =>
    Math.max(...offsets.map((o) => Math.abs(Math.hypot(arm + o.x + dx, o.y + dy) - arm)));
  const reach = 0.9 * arm;
  const overX = (dy: number) => smallest((dx) => worst(dx, dy), -reach, reach);
  return smallest(overX, -reach, reach);
}

/** The least value of a function with one valley, by thirds. */
function smallest(f: (x: number) => number, low: number, high: number): number {
  let [a, b] = [low, high];
  for (let turn = 0; turn < 64; turn += 1) {
    const third = (b - a) / 3;
    if (f(a + third) < f(b - third)) b -= third;
    else a += third;
  }
  return f((a + b) / 2);
}
