import { describe, expect, it } from 'vitest';
import { appearance } from '@/lib/scene/appearance';
import { pantographOf } from '@/lib/scene/pantograph-model';
import type { Scene } from '@/lib/scene/scene';
import { staticPicture } from '@/lib/scene/static-picture';
import { dimension, hatch } from '@/lib/scene/strokes';
import { toSvg } from '@/lib/scene/to-svg';
import { trainInLine } from '@/lib/scene/train-model';

const bounds = { left: 0, right: 720, bottom: 0, top: 360 };

describe('toSvg', () => {
  it('turns y over once and paints with the page’s tokens', () => {
    const scene: Scene = {
      bounds,
      shapes: [
        { kind: 'circle', role: 'timber', centre: { x: 10, y: 20 }, radius: 5 },
        {
          kind: 'body',
          pose: { x: 1, y: 2, angle: Math.PI / 2 },
          shapes: [{ kind: 'outline', role: 'hidden', points: [0, 0, 3, 4], closed: false }],
        },
      ],
    };
    expect(toSvg(scene)).toMatchInlineSnapshot(
      `"<svg xmlns="http://www.w3.org/2000/svg" class="drawing" viewBox="0 -360 720 360" aria-hidden="true" fill="none" stroke-linejoin="round" stroke-linecap="butt"><circle cx="10" cy="-20" r="5" stroke-width="1.5" vector-effect="non-scaling-stroke" style="fill:var(--timber);stroke:var(--ink)"/><g transform="translate(1 -2) rotate(-90)"><path d="M0 0L3 -4" stroke-width="1" vector-effect="non-scaling-stroke" stroke-dasharray="5 4" style="stroke:var(--ink)"/></g></svg>"`,
    );
  });

  it('says nothing that could end the markup', () => {
    const scene: Scene = {
      bounds,
      shapes: [
        {
          kind: 'label',
          at: { x: 0, y: 0 },
          text: '<b>&"',
          face: 'name',
          role: 'ink',
          anchor: 'start',
        },
      ],
    };
    const svg = toSvg(scene, 'a "quoted" <name>');
    expect(svg).not.toMatch(/<b>|<name>|"quoted"/);
    expect(svg).toContain('&#60;b&#62;&#38;&#34;');
  });

  it('holds nothing that a strict policy forbids, and no number that is none', () => {
    for (const spec of [
      trainInLine(4, [[12], [36, 14], [28]]),
      pantographOf({ first: 300, second: 300, firstHole: 100, secondHole: 120 }),
    ]) {
      const svg = staticPicture(spec);
      expect(svg).not.toMatch(/<script|<style|NaN|Infinity|undefined/);
    }
  });

  it('gives nothing away when it is locked', () => {
    const locked = staticPicture(trainInLine(4, [[16], [48], [16]]), true);
    expect(locked).not.toMatch(/right|left|One turn/);
    const copy = staticPicture(
      pantographOf({ first: 300, second: 300, firstHole: 100, secondHole: 100 }),
      true,
    );
    expect(copy).not.toMatch(/3 : 1|Scale|300 mm<|upright/);
  });
});

describe('strokes', () => {
  it('draws hidden edges dashed and centre lines long-dash-dot', () => {
    expect(appearance.hidden.dash).toHaveLength(2);
    expect(appearance.centre.dash).toHaveLength(4);
    expect(appearance.pitch.dash).toEqual(appearance.centre.dash);
  });

  it('gives a dimension its figure in the middle and an arrow at both ends', () => {
    const shapes = dimension({ x: 0, y: 0 }, { x: 100, y: 0 }, -20, '100 mm');
    const label = shapes.find((shape) => shape.kind === 'label');
    expect(label).toMatchObject({ at: { x: 50, y: -20 }, text: '100 mm', face: 'figure' });
    expect(shapes.filter((shape) => shape.kind === 'mark')).toHaveLength(2);
  });

  it('hatches a square from edge to edge', () => {
    const lines = hatch([0, 0, 10, 0, 10, 10, 0, 10], Math.SQRT1_2 * 2);
    for (const { points } of lines) {
      for (const value of points) {
        expect(value).toBeGreaterThanOrEqual(-1e-9);
        expect(value).toBeLessThanOrEqual(10 + 1e-9);
      }
    }
    expect(lines.length).toBeGreaterThan(5);
  });
});
