import type { Point } from '@/lib/geometry/point';
import type { Bounds } from '@/lib/scene/scene';

/** How the world lies on the canvas: pixels a mm, and the pixel of the world's origin. */
export interface View {
  readonly scale: number;
  readonly x: number;
  readonly y: number;
}

/** How far it is zoomed in, and the point of the world in the middle of the canvas. */
export interface Zoom {
  readonly factor: number;
  readonly middle: Point | null;
}

export const fitted: Zoom = { factor: 1, middle: null };
export const mostZoom = 5;

/** A drawing that fills less of its frame than this has become too small to read. */
const leastFilled = 0.45;

/** The frame as it is while the mechanism still fits it, and otherwise its own bounds. */
export function frameFor(frame: Bounds, bounds: Bounds): Bounds {
  const fits =
    bounds.left >= frame.left &&
    bounds.right <= frame.right &&
    bounds.bottom >= frame.bottom &&
    bounds.top <= frame.top;
  const filled = (bounds.right - bounds.left) / (frame.right - frame.left);
  return fits && filled > leastFilled ? frame : bounds;
}

/** The view that shows `bounds` in a canvas of so many pixels, zoomed in by `zoom`. */
export function viewOf(bounds: Bounds, width: number, height: number, zoom: Zoom): View {
  const fit = Math.min(width / (bounds.right - bounds.left), height / (bounds.top - bounds.bottom));
  const scale = fit * zoom.factor;
  const middle = zoom.middle ?? middleOf(bounds);
  return { scale, x: width / 2 - scale * middle.x, y: height / 2 + scale * middle.y };
}

/** The point of the world under a pixel of the canvas. */
export function worldAt(view: View, pixel: Point): Point {
  return { x: (pixel.x - view.x) / view.scale, y: (view.y - pixel.y) / view.scale };
}

/** The pixel of the canvas over a point of the world. */
export function pixelAt(view: View, point: Point): Point {
  return { x: view.x + view.scale * point.x, y: view.y - view.scale * point.y };
}

/** Zoomed by a factor more, about the middle, and never out beyond the whole drawing. */
export function zoomedBy(zoom: Zoom, factor: number): Zoom {
  const next = Math.min(mostZoom, Math.max(1, zoom.factor * factor));
  return next < 1.01 ? fitted : { ...zoom, factor: next };
}

/** Moved by a share of the visible part, within the drawing. */
export function panned(zoom: Zoom, bounds: Bounds, shareX: number, shareY: number): Zoom {
  const middle = zoom.middle ?? middleOf(bounds);
  const width = (bounds.right - bounds.left) / zoom.factor;
  const height = (bounds.top - bounds.bottom) / zoom.factor;
  return {
    ...zoom,
    middle: {
      x: within(middle.x + shareX * width, bounds.left + width / 2, bounds.right - width / 2),
      y: within(middle.y + shareY * height, bounds.bottom + height / 2, bounds.top - height / 2),
    },
  };
}

function middleOf(bounds: Bounds): Point {
  return { x: (bounds.left + bounds.right) / 2, y: (bounds.bottom + bounds.top) / 2 };
}

function within(value: number, least: number, most: number): number {
  return Math.min(Math.max(value, least), Math.max(least, most));
}
