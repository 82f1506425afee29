import type { SymbolStroke } from '@/lib/scene/appearance';
import type { Arc, Circle, Outline } from '@/lib/scene/scene';

type Line = Outline | Circle | Arc;

/** Paths by the shape they were traced from: what stands still or only turns is traced once. */
const traced = new WeakMap<object, Path2D>();

/** The path of a shape, in the shape's own units, y up. */
export function outlineOf(shape: Line): Path2D {
  return kept(shape, () => {
    if (shape.kind === 'outline') return runOf(shape.points, shape.closed);
    const { x, y } = shape.centre;
    const [from, to] = shape.kind === 'arc' ? [shape.from, shape.to] : [0, 2 * Math.PI];
    return round(x, y, shape.radius, from, to);
  });
}

/** The path of one stroke of a symbol, in pixels, y up. */
export function strokePath(stroke: SymbolStroke): Path2D {
  return kept(stroke, () =>
    'circle' in stroke
      ? round(...stroke.circle, 0, 2 * Math.PI)
      : runOf(stroke.points, stroke.closed),
  );
}

function kept(of: object, trace: () => Path2D): Path2D {
  const known = traced.get(of);
  if (known !== undefined) return known;
  const path = trace();
  traced.set(of, path);
  return path;
}

function runOf(points: readonly number[], closed: boolean): Path2D {
  const path = new Path2D();
  for (let i = 0; i + 1 < points.length; i += 2) path.lineTo(points[i] ?? 0, points[i + 1] ?? 0);
  if (closed) path.closePath();
  return path;
}

function round(x: number, y: number, radius: number, from: number, to: number): Path2D {
  const path = new Path2D();
  path.arc(x, y, radius, from, to);
  return path;
}
