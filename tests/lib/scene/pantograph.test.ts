import { describe, expect, it } from 'vitest';
import { distance, norm } from '@/lib/geometry/point';
import type { PantographSpec } from '@/lib/scene/bench-spec';
import { wayOf } from '@/lib/scene/drawings';
import { modelOf } from '@/lib/scene/model-of';
import { pantographOf } from '@/lib/scene/pantograph-model';
import { setUpPantograph } from '@/lib/scene/pantograph-setup';
import { boundsOf } from '@/lib/scene/scene';

const spec = pantographOf({ first: 360, second: 360, firstHole: 120, secondHole: 120 });

function width({ left, right }: { left: number; right: number }): number {
  return right - left;
}

describe('a pantograph', () => {
  it.each([0, 40, 133, 250])('keeps every bar’s length, stylus %f mm along', (drive) => {
    const { O, B, C, D, M, P } = setUpPantograph(spec).pose(drive).points;
    expect(distance(O, C)).toBeCloseTo(360, 6);
    expect(distance(C, P)).toBeCloseTo(360, 6);
    expect(distance(O, B)).toBeCloseTo(120, 6);
    expect(distance(C, D)).toBeCloseTo(120, 6);
    expect(distance(B, M)).toBeCloseTo(120, 6);
    expect(distance(D, M)).toBeCloseTo(240, 6);
  });

  it('copies three times as large, in line, and says so', () => {
    const setup = setUpPantograph(spec);
    const { drawingBox, copyBox } = setup;
    if (!copyBox) throw new Error('a copy');
    expect(width(copyBox)).toBeCloseTo(3 * width(drawingBox), 6);
    for (const drive of [0, 77, 200]) {
      const { pen, stylus, offLine } = setup.pose(drive);
      expect(pen.x).toBeCloseTo(3 * stylus.x, 6);
      expect(pen.y).toBeCloseTo(3 * stylus.y, 6);
      expect(offLine).toBeCloseTo(0, 6);
    }
    expect(modelOf(spec).describe(0)).toContain('in line. Scale 3 : 1, copy upright.');
    expect(modelOf(spec).limits(0)).toEqual([]);
  });

  it('turns the copy half round across the middle', () => {
    const across = { ...spec, setUp: 'across-the-middle' } as const;
    const { pen, stylus } = setUpPantograph(across).pose(50);
    expect(pen.x).toBeCloseTo(-2 * stylus.x, 6);
    expect(pen.y).toBeCloseTo(-2 * stylus.y, 6);
    expect(modelOf(across).describe(0)).toContain('copy turned half round');
    const back = { ...spec, setUp: 'across-the-middle-from-the-end' } as const;
    const other = setUpPantograph(back).pose(50);
    expect(norm(other.pen)).toBeCloseTo(norm(other.stylus) / 2, 6);
  });

  it('tells how far the pen is off the line, and a range of scales', () => {
    const skew = { ...spec, secondHole: 140 };
    const setup = setUpPantograph(skew);
    const model = modelOf(skew);
    const off = Math.abs(setup.pose(0).offLine);
    expect(off).toBeGreaterThan(5);
    expect(model.limits(0)[0]).toBe(
      `Pen ${off.toFixed(1)} mm off the line: circles come out as ovals.`,
    );
    expect(model.readouts(0)[0]?.value).toMatch(/^[\d.]+ to [\d.]+ : 1$/);
  });

  it('shows what lies beyond the reach instead of hiding it', () => {
    const far: PantographSpec = {
      ...spec,
      drawing: { name: 'circle', height: 60, at: { x: 230, y: 0 } },
    };
    const setup = setUpPantograph(far);
    // The elbow's 150° lets the stylus out to 2 · 120 · sin 75° = 231.8 mm; the circle goes to 260.
    expect(setup.beyond).toBeCloseTo(260 - 240 * Math.sin((75 * Math.PI) / 180), 6);
    expect(
      modelOf(far)
        .limits(setup.way.length / 2)
        .join(' '),
    ).toContain('beyond the working reach');
    const beyond = setup.samples.filter(({ beyond: by }) => by > 0);
    expect(beyond.length).toBeGreaterThan(0);
    const scene = modelOf(far).scene(
      { drive: 0, swept: { from: 0, to: 0 } },
      { tracing: true, dimensions: true },
    );
    expect(scene.shapes.some((shape) => shape.kind === 'outline' && shape.role === 'hidden')).toBe(
      true,
    );
  });

  it('says by how much a short bar misfits', () => {
    const misfit = { ...spec, shortBars: { stylus: 2, other: 0 } };
    expect(modelOf(misfit).limits(0)).toContain(
      'Stylus bar 2.0 mm long: scale and shape drift across the sheet.',
    );
    const { B, M } = setUpPantograph(misfit).pose(30).points;
    expect(distance(B, M)).toBeCloseTo(122, 6);
  });

  it('says how far to move when drawing and copy overlap', () => {
    const large = {
      ...spec,
      drawing: { name: 'square', height: 100, at: { x: 120, y: 0 } },
    } as const;
    // Far edge 170, near edge 70: the copy begins at 210, clear. Nearer in it begins on the drawing.
    expect(modelOf(large).limits(0).join(' ')).not.toContain('overlap');
    const near = { ...large, drawing: { ...large.drawing, at: { x: 100, y: 0 } } };
    // Edges 50 and 150; the copy begins at 150: just clear. At 90 it begins at 120, drawing to 140.
    expect(modelOf(near).limits(0).join(' ')).not.toContain('overlap');
    const nearer = { ...large, drawing: { ...large.drawing, at: { x: 90, y: 0 } } };
    expect(modelOf(nearer).limits(0).join(' ')).toContain(
      'move the fixed pin 10.0 mm farther off.',
    );
  });

  it('puts a pulled pin into the nearest hole', () => {
    const model = modelOf(spec);
    const { O, C } = setUpPantograph(spec).pose(0).points;
    const to = { x: ((C.x - O.x) / 360) * 23, y: ((C.y - O.y) / 360) * 23 };
    const dragged = model.drag('firstHole', { x: 0, y: 0 }, to, 0);
    expect(dragged.kind === 'spec' ? dragged.spec : null).toMatchObject({ firstHole: 140 });
  });

  it('keeps the scale to itself when told to', () => {
    const model = modelOf({ ...spec, hide: ['scale'] });
    const text = JSON.stringify([model.readouts(0), model.describe(0), model.tables(0, 1)]);
    expect(text).not.toMatch(/3 : 1|copy is|astray/);
    expect(model.plot).toBeNull();
  });
});

describe('a drawing to follow', () => {
  it.each(['circle', 'square', 'herring', 'sign'] as const)(
    '%s is as high as it is told',
    (name) => {
      const { points, at, nearest, length } = wayOf(name, 50, { x: 200, y: 10 });
      const box = boundsOf(points);
      expect(box.top - box.bottom).toBeCloseTo(50, 9);
      expect((box.top + box.bottom) / 2).toBeCloseTo(10, 9);
      for (const share of [0.05, 0.4, 0.77]) {
        const place = at(share * length);
        expect(distance(at(nearest(place)), place)).toBeLessThan(1e-6);
      }
    },
  );

  it('moves its fixed pin over the board while the drawing stays where it lies', () => {
    const { middle } = setUpPantograph(spec);
    const start = modelOf({ ...spec, drawing: { ...spec.drawing, at: { x: 200, y: 0 } } });
    const pulled = start.drag('fixedPin', { x: 1, y: 1 }, { x: -49, y: 21 }, 0);
    if (pulled.kind !== 'spec' || pulled.spec.bench !== 'pantograph') throw new Error('a spec');
    expect(pulled.spec.drawing.at).toEqual({ x: 250, y: -20 });
    expect(pulled.spec.pinMoved).toEqual({ x: -50, y: 20 });
    const after = modelOf(pulled.spec);
    const pin = (model: typeof after) => model.handles(0).find(({ id }) => id === 'fixedPin')?.at;
    const stylus = (model: typeof after) => model.handles(0).find(({ id }) => id === 'stylus')?.at;
    expect(pin(start)).toEqual({ x: 0, y: 0 });
    expect(pin(after)).toEqual({ x: -50, y: 20 });
    expect(stylus(after)?.x).toBeCloseTo(stylus(start)?.x ?? NaN, 9);
    expect(stylus(after)?.y).toBeCloseTo(stylus(start)?.y ?? NaN, 9);
    expect(after.describe(0)).toContain('its middle 250.0 mm east, 20.0 mm south of the fixed pin');
    // The whole scene stands on the board by one body, and the pen is led on from there.
    const [body, ...rest] = after.scene(
      { drive: 0, swept: { from: 0, to: 0 } },
      { tracing: true, dimensions: true },
    ).shapes;
    expect(rest).toEqual([]);
    expect(body).toMatchObject({ kind: 'body', pose: { x: -50, y: 20, angle: 0 } });
    const at = stylus(after) ?? middle;
    expect(after.drag('stylus', at, at, 3)).toEqual({ kind: 'drive', drive: expect.closeTo(0, 3) });
  });

  it('sets the fixed pin by figures, and by them clears sheets that overlap', () => {
    const near = {
      ...spec,
      drawing: { name: 'square', height: 100, at: { x: 120, y: 0 } },
    } as const;
    const [limit = ''] = modelOf(near).limits(0).slice(-1);
    // 170 and 70 mm are the far and the near edge: (170 − 3 × 70) ÷ 2 would be clear already.
    expect(limit).not.toContain('overlap');
    const over = {
      ...spec,
      drawing: { name: 'square', height: 100, at: { x: 90, y: 0 } },
    } as const;
    // (140 − 3 × 40) ÷ 2 = 10 mm farther off, and it is clear.
    expect(modelOf(over).limits(0).at(-1)).toBe(
      'Drawing and copy overlap: move the fixed pin 10.0 mm farther off.',
    );
    const moved = modelOf(over).set('east', 100);
    expect(moved).toMatchObject({ drawing: { at: { x: 100, y: 0 } }, pinMoved: { x: -10, y: 0 } });
    expect(modelOf(moved).limits(0).join(' ')).not.toContain('overlap');
    expect(modelOf(moved).controls.find(({ key }) => key === 'north')).toMatchObject({ value: 0 });
    expect(
      modelOf({ ...over, controls: ['firstHole'] })
        .handles(0)
        .map(({ id }) => id),
    ).toEqual(['firstHole', 'stylus']);
  });
});
