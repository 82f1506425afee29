import type { Point } from '@/lib/geometry/point';

/**
 * A drawing as plain data: shapes in world units (mm, y up), back to front, with roles instead of
 * colours. The canvas, the page before scripts run, paper and thumbnails all paint the same one.
 */
export interface Scene {
  /** What must be seen; it stays the same while the mechanism moves. */
  readonly bounds: Bounds;
  readonly shapes: readonly Shape[];
}

/** A rectangle of the world, mm. */
export interface Bounds {
  readonly left: number;
  readonly bottom: number;
  readonly right: number;
  readonly top: number;
}

/**
 * What a line or a face stands for, after the usual practice of technical drawing:
 *
 * - `timber` the face of a wooden part, `driver` the face of the member that the hand turns,
 *   `opening` a groove through which the paper shows, `hole` a small one bored through a bar,
 *   `void` a part greyed out of play;
 * - `outline` a visible edge, `hidden` an edge behind something, `centre` a centre line,
 *   `pitch` a pitch circle, `dimension` dimension and extension lines, `grain` the way of the wood;
 * - `tracing` the path left by a marked point, `guide` something to follow or to reach,
 *   `thread` a line stretched between points, `arrow` a sense of turning,
 *   `limit` what does not work, `clash` the face of what does not fit.
 */
export type Role =
  | 'timber'
  | 'driver'
  | 'opening'
  | 'void'
  | 'hole'
  | 'outline'
  | 'hidden'
  | 'centre'
  | 'pitch'
  | 'dimension'
  | 'grain'
  | 'tracing'
  | 'guide'
  | 'thread'
  | 'arrow'
  | 'limit'
  | 'clash';

/** A symbol that keeps its size on the page whatever the scale of the drawing. */
export type MarkName =
  | 'fixed-pivot'
  | 'moving-pivot'
  | 'centre-mark'
  | 'arrowhead'
  | 'sense'
  | 'grain-arrow'
  | 'pen'
  | 'stylus'
  | 'dot'
  | 'handle';

interface Drawn {
  readonly role: Role;
  /** How faded it is, from 0 (fresh) to 1 (gone). */
  readonly age?: number;
}

/** A run of straight lines, closed or open; points are x, y, x, y …, mm. */
export interface Outline extends Drawn {
  readonly kind: 'outline';
  readonly points: readonly number[];
  readonly closed: boolean;
}

/** A circle, mm. */
export interface Circle extends Drawn {
  readonly kind: 'circle';
  readonly centre: Point;
  readonly radius: number;
}

/** Part of a circle, counter-clockwise from `from` to `to`, radians. */
export interface Arc extends Drawn {
  readonly kind: 'arc';
  readonly centre: Point;
  readonly radius: number;
  readonly from: number;
  readonly to: number;
}

/** A symbol at a point, turned by `angle` radians. */
export interface Mark extends Drawn {
  readonly kind: 'mark';
  readonly at: Point;
  readonly symbol: MarkName;
  readonly angle?: number;
}

/** Words or a figure at a point. Its size and `nudge` are pixels of the page, x right, y up. */
export interface Label {
  readonly kind: 'label';
  readonly at: Point;
  readonly text: string;
  /** `figure` is set in mono, `name` in the text face. */
  readonly face: 'figure' | 'name';
  readonly role: 'ink' | 'pencil' | 'brass' | 'chalk' | 'madder';
  readonly anchor: 'start' | 'middle' | 'end';
  readonly nudge?: Point;
  /** Turned by this much, radians. */
  readonly angle?: number;
}

/** A rigid body: shapes in its own frame, and where that frame stands. */
export interface Body {
  readonly kind: 'body';
  readonly pose: { readonly x: number; readonly y: number; readonly angle: number };
  readonly shapes: readonly Shape[];
}

export type Shape = Outline | Circle | Arc | Mark | Label | Body;

/** Bounds grown by `margin` mm on every side. */
export function grown(bounds: Bounds, margin: number): Bounds {
  return {
    left: bounds.left - margin,
    bottom: bounds.bottom - margin,
    right: bounds.right + margin,
    top: bounds.top + margin,
  };
}

/** The smallest bounds that hold all of `points`. */
export function boundsOf(points: readonly Point[]): Bounds {
  let [left, bottom, right, top] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { x, y } of points) {
    left = Math.min(left, x);
    right = Math.max(right, x);
    bottom = Math.min(bottom, y);
    top = Math.max(top, y);
  }
  return { left, bottom, right, top };
}

/** Bounds widened or heightened about their middle until width over height lies in the range. */
export function withAspect(bounds: Bounds, least: number, most: number): Bounds {
  const width = bounds.right - bounds.left;
  const height = bounds.top - bounds.bottom;
  const sideways = Math.max(0, (least * height - width) / 2);
  const upwards = Math.max(0, (width / most - height) / 2);
  return {
    left: bounds.left - sideways,
    right: bounds.right + sideways,
    bottom: bounds.bottom - upwards,
    top: bounds.top + upwards,
  };
}
