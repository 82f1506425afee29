import { at } from '@/lib/numeric/at';
import type { Locus } from '@/lib/kinematics/linkage/solver/plan';

/*
 * The meeting of two loci, without allocating. A locus is laid out in four numbers of `scratch`:
 * circle: centre x, y, radius; groove: a point x, y of it and its direction x, y. A meeting takes
 * five: both points x, y and the slack, negative by as much as the loci fail to meet.
 */

/** Lay out at `base` the locus on which point `p` lies. */
export function layLocus(
  locus: Locus,
  p: number,
  pose: Float64Array,
  scratch: Float64Array,
  base: number,
): void {
  if (locus.kind === 'distance') {
    scratch[base] = at(pose, 2 * locus.q);
    scratch[base + 1] = at(pose, 2 * locus.q + 1);
    scratch[base + 2] = locus.length;
    return;
  }
  const gx = at(pose, 2 * locus.to) - at(pose, 2 * locus.from);
  const gy = at(pose, 2 * locus.to + 1) - at(pose, 2 * locus.from + 1);
  const long = Math.sqrt(gx * gx + gy * gy);
  const ux = long > 0 ? gx / long : 1;
  const uy = long > 0 ? gy / long : 0;
  const other = locus.p === p ? locus.through : locus.p;
  const offset = locus.p === p ? locus.offset : -locus.offset;
  scratch[base] = at(pose, 2 * other) - offset * uy;
  scratch[base + 1] = at(pose, 2 * other + 1) + offset * ux;
  scratch[base + 2] = ux;
  scratch[base + 3] = uy;
}

/**
 * Two circles: both meeting points to `scratch` from `out` on, left one first, then the slack. Where
 * they fail to meet, the nearest point between them stands for both.
 */
export function meetCircles(scratch: Float64Array, a: number, b: number, out: number): void {
  const ax = at(scratch, a);
  const ay = at(scratch, a + 1);
  const r1 = at(scratch, a + 2);
  const r2 = at(scratch, b + 2);
  const dx = at(scratch, b) - ax;
  const dy = at(scratch, b + 1) - ay;
  const squared = dx * dx + dy * dy;
  const d = Math.sqrt(squared);
  const slack = Math.min(r1 + r2 - d, d - Math.abs(r1 - r2));
  scratch[out + 4] = slack;
  if (!(squared > 0)) {
    scratch[out] = scratch[out + 2] = ax + r1;
    scratch[out + 1] = scratch[out + 3] = ay;
    return;
  }
  const clear = (r1 + r2 - d) * (d - (r1 - r2)) * (d + (r1 - r2)) * (r1 + r2 + d);
  const share =
    slack < 0 ? nearestShare(r1, r2, d) : (squared + (r1 - r2) * (r1 + r2)) / (2 * squared);
  const up = clear > 0 ? Math.sqrt(clear) / (2 * squared) : 0;
  scratch[out] = ax + share * dx - up * dy;
  scratch[out + 1] = ay + share * dy + up * dx;
  scratch[out + 2] = ax + share * dx + up * dy;
  scratch[out + 3] = ay + share * dy - up * dx;
}

/** A circle and a groove: the point ahead along the groove first. Otherwise as `meetCircles`. */
export function meetGroove(
  scratch: Float64Array,
  circle: number,
  groove: number,
  out: number,
): void {
  const px = at(scratch, groove);
  const py = at(scratch, groove + 1);
  const ux = at(scratch, groove + 2);
  const uy = at(scratch, groove + 3);
  const cx = at(scratch, circle) - px;
  const cy = at(scratch, circle + 1) - py;
  const radius = at(scratch, circle + 2);
  const foot = cx * ux + cy * uy;
  const off = cy * ux - cx * uy;
  const clear = (radius - off) * (radius + off);
  const half = clear > 0 ? Math.sqrt(clear) : 0;
  scratch[out] = px + (foot + half) * ux;
  scratch[out + 1] = py + (foot + half) * uy;
  scratch[out + 2] = px + (foot - half) * ux;
  scratch[out + 3] = py + (foot - half) * uy;
  scratch[out + 4] = radius - Math.abs(off);
}

/**
 * Two grooves: their crossing, twice. Parallel ones (directions within 1e-12) fail by their
 * distance; when they cover one another the point first held in `out` stays.
 */
export function meetGrooves(scratch: Float64Array, a: number, b: number, out: number): void {
  const ux = at(scratch, a + 2);
  const uy = at(scratch, a + 3);
  const vx = at(scratch, b + 2);
  const vy = at(scratch, b + 3);
  const dx = at(scratch, b) - at(scratch, a);
  const dy = at(scratch, b + 1) - at(scratch, a + 1);
  const sine = ux * vy - uy * vx;
  scratch[out + 4] = Number.MAX_VALUE;
  if (Math.abs(sine) <= 1e-12) {
    scratch[out + 4] = -Math.abs(dy * ux - dx * uy);
    return;
  }
  const s = (dx * vy - dy * vx) / sine;
  scratch[out] = scratch[out + 2] = at(scratch, a) + s * ux;
  scratch[out + 1] = scratch[out + 3] = at(scratch, a + 1) + s * uy;
}

/** Where the nearest point between two circles that do not meet lies, from centre to centre. */
function nearestShare(r1: number, r2: number, d: number): number {
  if (d > r1 + r2) return (r1 + (d - r1 - r2) / 2) / d;
  return r1 > r2 ? (r1 + r2 + d) / (2 * d) : -(r1 + r2 - d) / (2 * d);
}
