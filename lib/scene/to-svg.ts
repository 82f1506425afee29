import {
  appearance,
  labelFamily,
  labelSize,
  strength,
  symbols,
  type Paint,
  type SymbolStroke,
} from './appearance';
import type { Arc, Label, Mark, Scene, Shape } from './scene';

/** The width in pixels at which symbols and letters have the size they have on the canvas. */
export const nominalWidth = 720;

/**
 * A scene as an SVG document fragment that takes its colours from the page's tokens, so that it
 * follows light, dark and paper. Here, and nowhere else in it, y is turned over.
 *
 * @param title what a screen reader says; without one the picture is decoration
 * @returns one `svg` element; its symbols and letters grow in narrow boxes by `drawing.css`
 */
export function toSvg(scene: Scene, title?: string): string {
  const { left, right, bottom, top } = scene.bounds;
  const unit = (right - left) / nominalWidth;
  const box = [left, -top, right - left, top - bottom].map(brief).join(' ');
  const spoken =
    title === undefined ? 'aria-hidden="true"' : `role="img" aria-label="${safe(title)}"`;
  const body = scene.shapes.map((shape) => draw(shape, unit)).join('');
  return `<svg xmlns="http://www.w3.org/2000/svg" class="drawing" viewBox="${box}" ${spoken} fill="none" stroke-linejoin="round" stroke-linecap="butt">${body}</svg>`;
}

function draw(shape: Shape, unit: number): string {
  switch (shape.kind) {
    case 'body':
      return (
        `<g transform="translate(${brief(shape.pose.x)} ${brief(-shape.pose.y)}) rotate(${turned(shape.pose.angle)})">` +
        `${shape.shapes.map((inner) => draw(inner, unit)).join('')}</g>`
      );
    case 'outline':
      return `<path d="${pathOf(shape.points, shape.closed)}"${painted(appearance[shape.role], shape.age)}/>`;
    case 'circle':
      return `<circle cx="${brief(shape.centre.x)}" cy="${brief(-shape.centre.y)}" r="${brief(shape.radius)}"${painted(appearance[shape.role], shape.age)}/>`;
    case 'arc':
      return `<path d="${arcPath(shape)}"${painted(appearance[shape.role], shape.age)}/>`;
    case 'mark':
      return fixedSize(shape.at, unit, markStrokes(shape), shape.angle);
    case 'label':
      return fixedSize(shape.at, unit, lettering(shape), shape.angle);
  }
}

/** A group whose inside is measured in pixels of the page. */
function fixedSize(at: Mark['at'], unit: number, inside: string, angle = 0): string {
  const turn = angle === 0 ? '' : ` rotate(${turned(angle)})`;
  return `<g transform="translate(${brief(at.x)} ${brief(-at.y)}) scale(${brief(unit)})${turn}"><g class="drawing-fixed">${inside}</g></g>`;
}

function markStrokes(mark: Mark): string {
  return symbols[mark.symbol].map(symbolStroke).join('');
}

function symbolStroke(stroke: SymbolStroke): string {
  if ('circle' in stroke) {
    const [x, y, radius] = stroke.circle;
    return `<circle cx="${brief(x)}" cy="${brief(-y)}" r="${brief(radius)}"${painted(stroke)}/>`;
  }
  return `<path d="${pathOf(stroke.points, stroke.closed)}"${painted(stroke)}/>`;
}

function lettering(label: Label): string {
  const { x, y } = label.nudge ?? { x: 0, y: 0 };
  const style = `fill:var(--${label.role});stroke:var(--paper);font-family:${labelFamily(label.face)}`;
  return (
    `<text x="${brief(x)}" y="${brief(-y)}" dy=".35em" text-anchor="${label.anchor}" font-size="${labelSize}" ` +
    `stroke-width="4" paint-order="stroke" style="${style}">${safe(label.text)}</text>`
  );
}

function painted(paint: Paint, age = 0): string {
  const colours = [
    paint.fill === undefined ? '' : `fill:var(--${paint.fill})`,
    paint.stroke === undefined ? '' : `stroke:var(--${paint.stroke})`,
  ].filter(Boolean);
  const dash = paint.dash === undefined ? '' : ` stroke-dasharray="${paint.dash.join(' ')}"`;
  const face = paint.fillOpacity === undefined ? '' : ` fill-opacity="${paint.fillOpacity}"`;
  const faded = age > 0 ? ` opacity="${brief(strength(age))}"` : '';
  const width =
    paint.stroke === undefined
      ? ''
      : ` stroke-width="${paint.width}" vector-effect="non-scaling-stroke"`;
  return `${width}${dash}${face}${faded} style="${colours.join(';')}"`;
}

function pathOf(points: readonly number[], closed: boolean): string {
  let path = '';
  for (let i = 0; i + 1 < points.length; i += 2) {
    path += `${i === 0 ? 'M' : 'L'}${brief(points[i] ?? 0)} ${brief(-(points[i + 1] ?? 0))}`;
  }
  return closed ? `${path}Z` : path;
}

function arcPath({ centre, radius, from, to }: Arc): string {
  const at = (angle: number) =>
    `${brief(centre.x + radius * Math.cos(angle))} ${brief(-centre.y - radius * Math.sin(angle))}`;
  const long = to - from > Math.PI ? 1 : 0;
  return `M${at(from)}A${brief(radius)} ${brief(radius)} 0 ${long} 0 ${at(to)}`;
}

/** Degrees, clockwise, as SVG turns things. */
function turned(angle: number): string {
  return brief((-angle * 180) / Math.PI);
}

function brief(value: number): string {
  return String(Math.round(value * 1000) / 1000);
}

function safe(text: string): string {
  return text.replace(/[&<>"]/g, (letter) => `&#${letter.charCodeAt(0)};`);
}
