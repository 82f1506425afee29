import { describe, expect, it, vi } from 'vitest';
import { paintScene } from '@/components/bench/painter';
import { viewOf, fitted } from '@/components/bench/view';
import type { Body, Scene, Shape } from '@/lib/scene/scene';

const bounds = { left: 0, bottom: 0, right: 300, top: 200 };
const ink = { colour: (token: string) => `the ${token}`, figure: 'mono', name: 'text' };

/** Traces what a pen is told, in the pixels of the page: each path with where its points come to lie. */
function penAtWork() {
  const done: { readonly how: string; readonly at: number[]; readonly width: number }[] = [];
  class Traced {
    readonly points: [number, number][] = [];
    lineTo(x: number, y: number) {
      this.points.push([x, y]);
    }
    arc(x: number, y: number) {
      this.points.push([x, y]);
    }
    closePath() {}
  }
  vi.stubGlobal('Path2D', Traced);
  let [a, b, c, d, e, f] = [1, 0, 0, 1, 0, 0];
  const placed = (x: number, y: number) => [a * x + c * y + e, b * x + d * y + f].map(rounded);
  const pen = {
    lineWidth: 1,
    globalAlpha: 1,
    setTransform: (...matrix: number[]) => {
      [a = 1, b = 0, c = 0, d = 1, e = 0, f = 0] = matrix;
    },
    setLineDash: () => undefined,
    stroke: ({ points }: Traced) =>
      done.push({
        how: 'stroke',
        at: points.flatMap(([x, y]) => placed(x, y)),
        width: rounded(pen.lineWidth * Math.hypot(a, b)),
      }),
    fill: () => undefined,
    strokeText: () => undefined,
    fillText: (text: string, x: number, y: number) =>
      done.push({ how: text, at: placed(x, y), width: rounded(d) }),
  };
  return { pen, done };
}

const rounded = (value: number) => Math.round(value * 1000) / 1000 + 0;

function painted(shapes: readonly Shape[], density = 1) {
  const { pen, done } = penAtWork();
  const scene: Scene = { bounds, shapes };
  const view = viewOf(bounds, 600, 400, fitted);
  paintScene(
    { pen: pen as unknown as CanvasRenderingContext2D, view, width: 600, density, ink },
    scene,
  );
  return done;
}

const edge: Shape = { kind: 'outline', role: 'outline', points: [0, 0, 300, 200], closed: false };

describe('painting a scene', () => {
  it('turns y over, fits the sheet, and keeps a line’s width on the page', () => {
    expect(painted([edge])).toEqual([{ how: 'stroke', at: [0, 400, 600, 0], width: 1.5 }]);
  });

  it('uses every pixel of a dense screen', () => {
    expect(painted([edge], 2)).toEqual([{ how: 'stroke', at: [0, 800, 1200, 0], width: 3 }]);
  });

  it('puts a body where its frame stands, a quarter turn to the left', () => {
    const body: Body = {
      kind: 'body',
      pose: { x: 100, y: 50, angle: Math.PI / 2 },
      shapes: [{ kind: 'outline', role: 'outline', points: [0, 0, 10, 0], closed: false }],
    };
    // Ten to the right in its own frame is ten up in the world, twenty px up the page.
    expect(painted([body])).toEqual([{ how: 'stroke', at: [200, 300, 200, 280], width: 1.5 }]);
    const within: Body = { kind: 'body', pose: { x: 0, y: 0, angle: 0 }, shapes: [body] };
    expect(painted([within])).toEqual(painted([body]));
  });

  it('writes upright, nudged by pixels of the page', () => {
    const done = painted([
      {
        kind: 'label',
        at: { x: 150, y: 100 },
        text: '36 / 14',
        face: 'figure',
        role: 'ink',
        anchor: 'middle',
        nudge: { x: 5, y: 11 },
      },
    ]);
    expect(done).toEqual([{ how: '36 / 14', at: [305, 193.55], width: 1 }]);
  });

  it('keeps a symbol’s size whatever the scale', () => {
    const [stroke] = painted([
      { kind: 'mark', role: 'outline', symbol: 'arrowhead', at: { x: 150, y: 100 } },
    ]);
    expect(stroke).toEqual({ how: 'stroke', at: [291, 197, 300, 200, 291, 203], width: 1 });
  });
});
