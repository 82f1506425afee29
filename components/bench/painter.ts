import {
  appearance,
  labelSize,
  strength,
  symbols,
  type Paint,
  type SymbolStroke,
} from '@/lib/scene/appearance';
import type { Body, Label, Mark, Scene, Shape } from '@/lib/scene/scene';
import type { Ink } from './colours';
import { outlineOf, strokePath } from './paths';
import type { View } from './view';

/** Where a drawing goes and what it is drawn with. */
export interface Sheet {
  readonly pen: CanvasRenderingContext2D;
  readonly view: View;
  /** Width of the drawing on the page, px. */
  readonly width: number;
  /** Pixels of the canvas for one of the page. */
  readonly density: number;
  readonly ink: Ink;
}

/** A sheet with the size that lines and letters have on it, as a share of their full size. */
interface Hand extends Sheet {
  readonly lines: number;
  readonly letters: number;
}

/** Where a frame of reference stands in the world, mm and radians. */
type Frame = Body['pose'];

const world: Frame = { x: 0, y: 0, angle: 0 };

/** From this width on, px, everything has its full size; narrower drawings are drawn finer. */
const fullSizeFrom = 600;
const leastLetters = 0.85;
const leastLines = 0.65;

/** Paints a scene, back to front. Here, as in `toSvg`, y is turned over. */
export function paintScene(sheet: Sheet, { shapes }: Scene): void {
  const share = Math.min(1, sheet.width / fullSizeFrom);
  const lines = Math.max(leastLines, share);
  const letters = Math.max(leastLetters, share);
  sheet.pen.lineJoin = 'round';
  paintAll({ ...sheet, lines, letters }, shapes, world);
}

function paintAll(hand: Hand, shapes: readonly Shape[], frame: Frame): void {
  for (const shape of shapes) paint(hand, shape, frame);
}

function paint(hand: Hand, shape: Shape, frame: Frame): void {
  switch (shape.kind) {
    case 'body':
      return paintAll(
        hand,
        shape.shapes,
        within(frame, shape.pose.x, shape.pose.y, shape.pose.angle),
      );
    case 'mark':
      return paintMark(hand, shape, frame);
    case 'label':
      return write(hand, shape, frame);
    default: {
      const { scale } = hand.view;
      stand(hand, frame, scale);
      hand.pen.globalAlpha = strength(shape.age ?? 0);
      draw(hand, outlineOf(shape), appearance[shape.role], hand.lines / scale);
      hand.pen.globalAlpha = 1;
    }
  }
}

function paintMark(hand: Hand, { at, angle = 0, symbol }: Mark, frame: Frame): void {
  stand(hand, within(frame, at.x, at.y, angle), hand.lines);
  for (const stroke of symbols[symbol]) draw(hand, strokePath(stroke), stroke, 1);
}

/** Fills and outlines a path; `size` is a pixel of line in the units of the path. */
function draw({ pen, ink }: Hand, path: Path2D, paint: Paint | SymbolStroke, size: number): void {
  if (paint.fill !== undefined) {
    pen.fillStyle = ink.colour(paint.fill);
    if (paint.fillOpacity !== undefined) pen.globalAlpha *= paint.fillOpacity;
    pen.fill(path);
    if (paint.fillOpacity !== undefined) pen.globalAlpha /= paint.fillOpacity;
  }
  if (paint.stroke === undefined) return;
  pen.strokeStyle = ink.colour(paint.stroke);
  pen.lineWidth = paint.width * size;
  pen.setLineDash(paint.dash === undefined ? solid : paint.dash.map((length) => length * size));
  pen.stroke(path);
}

const solid: number[] = [];

/** Letters over a halo of paper, upright on the page unless they are turned. */
function write(hand: Hand, label: Label, frame: Frame): void {
  const { pen, ink, letters } = hand;
  const { x, y } = label.nudge ?? { x: 0, y: 0 };
  stand(hand, within(frame, label.at.x, label.at.y, label.angle ?? 0), letters, 'reads');
  pen.font = `${labelSize}px ${label.face === 'figure' ? ink.figure : ink.name}`;
  pen.textAlign = label.anchor === 'middle' ? 'center' : label.anchor;
  pen.setLineDash(solid);
  pen.strokeStyle = ink.colour('paper');
  pen.lineWidth = halo;
  pen.strokeText(label.text, x, baseline - y);
  pen.fillStyle = ink.colour(label.role);
  pen.fillText(label.text, x, baseline - y);
}

const halo = 4;
/** A line of figures stands this far under its own middle. */
const baseline = 0.35 * labelSize;

/** The frame that stands at a place of another, turned. */
function within({ x, y, angle }: Frame, atX: number, atY: number, turned: number): Frame {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return { x: x + c * atX - s * atY, y: y + s * atX + c * atY, angle: angle + turned };
}

/**
 * Makes the pen draw in a frame, `scale` pixels to its unit: y upwards, or downwards for what is
 * to be read.
 */
function stand(
  { pen, view, density }: Hand,
  frame: Frame,
  scale: number,
  y: 'rises' | 'reads' = 'rises',
): void {
  const c = density * scale * Math.cos(frame.angle);
  const s = density * scale * Math.sin(frame.angle);
  const up = y === 'rises' ? -1 : 1;
  pen.setTransform(
    c,
    -s,
    up * s,
    up * c,
    density * (view.x + view.scale * frame.x),
    density * (view.y - view.scale * frame.y),
  );
}
