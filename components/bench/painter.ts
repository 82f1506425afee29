import Konva from 'konva/lib/Core';
import { Circle } from 'konva/lib/shapes/Circle';
import { Line } from 'konva/lib/shapes/Line';
import { Text } from 'konva/lib/shapes/Text';
import {
  appearance,
  labelSize,
  strength,
  symbols,
  type Paint,
  type SymbolStroke,
} from '@/lib/scene/appearance';
import type { Arc, Body, Label, Mark, Scene, Shape } from '@/lib/scene/scene';
import type { Ink } from './colours';
import type { View } from './view';

type Node = Konva.Group | Konva.Shape;

interface Painted {
  shape: Shape;
  readonly node: Node;
}

/** Paints scenes on a layer, keeping its nodes from one frame to the next. */
export interface Painter {
  readonly paint: (scene: Scene, view: View, width: number, ink: Ink) => void;
}

/**
 * A painter for one layer. A wheel that only turned gets a new angle and nothing else; shapes that
 * are the same object as before are left alone.
 */
export function createPainter(layer: Konva.Layer): Painter {
  const world = new Konva.Group();
  layer.add(world);
  let kept: Painted[] = [];
  let before: { readonly scale: number; readonly ink: Ink } | null = null;
  return {
    paint: (scene, view, width, ink) => {
      world.setAttrs({ x: view.x, y: view.y, scaleX: view.scale, scaleY: -view.scale });
      if (before?.scale !== view.scale || before.ink !== ink) {
        world.destroyChildren();
        kept = [];
        before = { scale: view.scale, ink };
      }
      const share = Math.min(1, width / fullSizeFrom);
      kept = paintAll(world, kept, scene.shapes, {
        scale: view.scale,
        letters: Math.max(leastLetters, share),
        lines: Math.max(leastLines, share),
        ink,
      });
      layer.batchDraw();
    },
  };
}

/** Pixels a mm, and how much of their full size letters, symbols and lines have here. */
interface Brush {
  readonly scale: number;
  readonly letters: number;
  readonly lines: number;
  readonly ink: Ink;
}

/** From this width on, px, everything has its full size; narrower drawings are drawn finer. */
const fullSizeFrom = 600;
const leastLetters = 0.85;
const leastLines = 0.65;

function paintAll(
  parent: Konva.Group,
  kept: readonly Painted[],
  shapes: readonly Shape[],
  brush: Brush,
): Painted[] {
  const next: Painted[] = [];
  let inOrder = true;
  shapes.forEach((shape, index) => {
    const old = kept[index];
    if (inOrder && old && refreshed(old, shape, brush)) {
      next.push(old);
      return;
    }
    if (inOrder) {
      inOrder = false;
      kept.slice(index).forEach(({ node }) => node.destroy());
    }
    const node = nodeOf(shape, brush);
    parent.add(node);
    next.push({ shape, node });
  });
  if (inOrder) kept.slice(shapes.length).forEach(({ node }) => node.destroy());
  return next;
}

/** Brings a kept node up to date; false when it has to be made anew. */
function refreshed(old: Painted, shape: Shape, brush: Brush): boolean {
  if (old.shape === shape) return true;
  if (old.shape.kind !== shape.kind) return false;
  if (shape.kind === 'body') {
    if ((old.shape as Body).shapes !== shape.shapes) return false;
    old.node.setAttrs(poseOf(shape));
  } else if (shape.kind === 'mark') {
    if ((old.shape as Mark).symbol !== shape.symbol) return false;
    old.node.setAttrs(placeOf(shape, brush));
  } else {
    old.node.setAttrs(attributesOf(shape, brush));
  }
  old.shape = shape;
  return true;
}

function nodeOf(shape: Shape, brush: Brush): Node {
  switch (shape.kind) {
    case 'body': {
      const group = new Konva.Group(poseOf(shape));
      shape.shapes.forEach((inner) => group.add(nodeOf(inner, brush)));
      return group;
    }
    case 'mark': {
      const group = new Konva.Group(placeOf(shape, brush));
      symbols[shape.symbol].forEach((stroke) => group.add(symbolNode(stroke, brush)));
      return group;
    }
    case 'label':
      return new Text({ ...quiet, ...labelAttributes(shape, brush) });
    case 'circle':
      return new Circle({ ...quiet, ...attributesOf(shape, brush) });
    default:
      return new Line({ ...quiet, ...attributesOf(shape, brush) });
  }
}

const quiet = {
  listening: false,
  perfectDrawEnabled: false,
  shadowForStrokeEnabled: false,
  strokeScaleEnabled: false,
};

function attributesOf(shape: Exclude<Shape, Body | Mark>, brush: Brush): object {
  if (shape.kind === 'label') return labelAttributes(shape, brush);
  const paint = {
    ...paintAttributes(appearance[shape.role], brush),
    opacity: strength(shape.age ?? 0),
  };
  if (shape.kind === 'circle') {
    return { ...paint, x: shape.centre.x, y: shape.centre.y, radius: shape.radius };
  }
  const points = shape.kind === 'arc' ? arcPoints(shape) : shape.points;
  return { ...paint, points, closed: shape.kind === 'outline' && shape.closed, lineJoin: 'round' };
}

function paintAttributes(paint: Paint, { ink, lines }: Brush): object {
  const face = paint.fill === undefined ? undefined : ink.colour(paint.fill);
  return {
    fill: paint.fillOpacity === undefined || !face ? face : translucent(face, paint.fillOpacity),
    stroke: paint.stroke === undefined ? undefined : ink.colour(paint.stroke),
    strokeWidth: paint.width * lines,
    dash: paint.dash?.map((length) => length * lines),
  };
}

/** `#rrggbb` with an opacity; other forms are left as they are. */
function translucent(colour: string, opacity: number): string {
  if (!/^#[0-9a-f]{6}$/i.test(colour)) return colour;
  return `${colour}${Math.round(opacity * 255)
    .toString(16)
    .padStart(2, '0')}`;
}

function symbolNode(stroke: SymbolStroke, brush: Brush): Konva.Shape {
  const paint = { ...quiet, ...paintAttributes(stroke, brush) };
  if ('circle' in stroke) {
    const [x, y, radius] = stroke.circle;
    return new Circle({ ...paint, x, y, radius });
  }
  return new Line({ ...paint, points: [...stroke.points], closed: stroke.closed });
}

function labelAttributes(label: Label, { scale, letters, ink }: Brush): object {
  const { x, y } = label.nudge ?? { x: 0, y: 0 };
  const width = 400;
  const inset = { start: 0, middle: width / 2, end: width }[label.anchor];
  return {
    x: label.at.x,
    y: label.at.y,
    scaleX: letters / scale,
    scaleY: -letters / scale,
    rotation: degrees(label.angle ?? 0),
    offsetX: inset - x,
    offsetY: labelSize / 2 + y,
    width,
    align: { start: 'left', middle: 'center', end: 'right' }[label.anchor],
    text: label.text,
    fontSize: labelSize,
    fontFamily: label.face === 'figure' ? ink.figure : ink.name,
    fill: ink.colour(label.role),
    stroke: ink.colour('paper'),
    strokeWidth: 4,
    fillAfterStrokeEnabled: true,
    lineJoin: 'round',
  };
}

function poseOf({ pose }: Body) {
  return { x: pose.x, y: pose.y, rotation: degrees(pose.angle) };
}

function placeOf({ at, angle }: Mark, { scale, lines }: Brush) {
  const size = lines / scale;
  return { x: at.x, y: at.y, scaleX: size, scaleY: size, rotation: degrees(angle ?? 0) };
}

/** An arc as a run of short lines. */
function arcPoints({ centre, radius, from, to }: Arc): number[] {
  const steps = Math.max(4, Math.ceil((to - from) / 0.1));
  return Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps).flatMap(
    (angle) => [centre.x + radius * Math.cos(angle), centre.y + radius * Math.sin(angle)],
  );
}

function degrees(angle: number): number {
  return (angle * 180) / Math.PI;
}
