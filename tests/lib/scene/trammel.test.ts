import { describe, expect, it } from 'vitest';
import { radians } from '@/lib/geometry/angle';
import { distance, type Point } from '@/lib/geometry/point';
import type { TrammelSpec } from '@/lib/scene/bench-spec';
import { modelOf } from '@/lib/scene/model-of';
import type { Scene } from '@/lib/scene/scene';
import { describe as inWords } from '@/lib/scene/static-picture';
import { admitted, setUpTrammel } from '@/lib/scene/trammel-setup';

const spec: TrammelSpec = {
  bench: 'trammel',
  farPin: 300,
  nearPin: 180,
  farRunsIn: 'north-south',
  slider: 45,
  groove: 300,
  skew: 0,
  held: 'board',
};
const showing = { tracing: true, dimensions: true };

function marksOf(scene: Scene, symbol: string): Point[] {
  return scene.shapes.flatMap((shape) =>
    shape.kind === 'mark' && shape.symbol === symbol ? [shape.at] : [],
  );
}

describe('an elliptic trammel', () => {
  it.each([0, 0.4, 1.7, 3.3, 5.9])(
    'keeps the pins where they are set on the bar, at %f',
    (drive) => {
      const scene = modelOf(spec).scene({ drive, swept: { from: 0, to: drive } }, showing);
      const [pen] = marksOf(scene, 'pen');
      const [near, far] = marksOf(scene, 'moving-pivot');
      if (!pen || !near || !far) throw new Error('a pen and two pins');
      expect(distance(pen, far)).toBeCloseTo(300, 9);
      expect(distance(pen, near)).toBeCloseTo(180, 9);
      expect(far.x).toBeCloseTo(0, 9);
      expect(near.y).toBeCloseTo(0, 9);
      expect((pen.x / 300) ** 2 + (pen.y / 180) ** 2).toBeCloseTo(1, 12);
    },
  );

  it('tells the pen’s own angle apart from the bar’s', () => {
    // Curriculum 7.1: on an oval of 600 by 360 with the bar at 45° the pen stands at 31.0°.
    expect(inWords(spec, radians(45))).toContain('Bar at 45.0°');
    expect(inWords(spec, radians(45))).toContain('seen from the middle at 31.0°');
    expect(inWords(spec, radians(45))).toContain('Oval 600 mm by 360 mm, lying east-west.');
  });

  it('lies across when the far pin runs the other way', () => {
    const crosswise = { ...spec, farRunsIn: 'east-west' } as const;
    expect(inWords(crosswise, 0)).toContain('lying north-south');
    const { pen } = setUpTrammel(crosswise).pose(0);
    expect(pen.x).toBeCloseTo(0, 9);
    expect(pen.y).toBeCloseTo(300, 9);
  });

  it('stops where a slider strikes the groove’s end, and says how much is missing', () => {
    const short = { ...spec, groove: 240 };
    const model = modelOf(short);
    // Each pin travels 240; with the slider 285 is needed, 240 is there.
    expect(model.limits(0)[0]).toBe('45.0 mm more groove needed: each pin travels 240.0 mm.');
    const room = (240 - 45) / 2;
    for (const drive of [0, 0.2, 0.8, 1.5, 2.4, -7]) {
      const at = model.admit(drive);
      const { levelPin, uprightPin } = setUpTrammel(short).pose(at);
      expect(Math.abs(levelPin.x)).toBeLessThanOrEqual(room + 1e-6);
      expect(Math.abs(uprightPin.y)).toBeLessThanOrEqual(room + 1e-6);
    }
    expect(model.admit(radians(45))).toBe(radians(45));
    expect(admitted(setUpTrammel(spec), 0.123)).toBe(0.123);
  });

  it('says what has become of the oval where it is no ordinary one, and calls it no fault', () => {
    const model = (more: Partial<TrammelSpec>) => modelOf({ ...spec, groove: 1100, ...more });
    const remarks = (more: Partial<TrammelSpec>) => {
      expect(model(more).limits(0)).toEqual([]);
      return model(more).remarks;
    };
    expect(remarks({ nearPin: 300 })).toEqual(['One pin: a circle, 600 mm across.']);
    expect(remarks({ nearPin: 0 })).toEqual([
      'The oval has shut to a line: the pen runs along the groove, 600 mm from end to end.',
    ]);
    expect(remarks({ farPin: 0 })).toEqual([
      'The oval has shut to a line: the pen runs along the groove, 360 mm from end to end.',
    ]);
    expect(remarks({ farPin: 0, nearPin: 0 })).toEqual([
      'Both pins under the pen: it stays on the crossing.',
    ]);
    expect(model({ farPin: 0, nearPin: 0 }).describe(0)).toContain('shut to a point');
    expect(remarks({ farPin: 150, nearPin: -150 })).toEqual([
      'Half-way: a circle of half the pins’ distance, drawn against the bar’s turn.',
    ]);
    expect(remarks({ nearPin: -180 }).join(' ')).toContain(
      'now 480 mm apart and need grooves of 1005 mm',
    );
    expect(remarks({})).toEqual([]);
    expect(remarks({ nearPin: 300, hide: ['length'] })).toEqual([]);
    expect(model({ nearPin: 280 }).limits(0)).toEqual([
      'The sliders meet off the crossing; shorten them or round their ends.',
    ]);
  });

  it.each([
    [300, 300],
    [300, 0],
    [0, 180],
    [0, 0],
    [150, -150],
  ])('draws pins at %i and %i by figures that are numbers, and no size of nothing', (far, near) => {
    const model = modelOf({ ...spec, groove: 1100, farPin: far, nearPin: near });
    const scene = model.scene({ drive: 0.7, swept: { from: 0, to: 0.7 } }, showing);
    expect(JSON.stringify([scene, model.tables(0.7, 1), model.plot])).not.toContain('null,');
    expect(JSON.stringify([scene.bounds, model.readouts(0.7)])).not.toMatch(/NaN|null/);
    const figures = scene.shapes.flatMap((shape) => (shape.kind === 'label' ? [shape.text] : []));
    expect(figures).not.toContain('0 mm');
    expect(figures).not.toContain('0.0 mm');
    const [pen] = marksOf(scene, 'pen');
    expect(pen?.x).toBeCloseTo(far * Math.cos(0.7), 9);
    expect(pen?.y).toBeCloseTo(near * Math.sin(0.7), 9);
  });

  it('follows a pen that is led, from either side', () => {
    const model = modelOf(spec);
    for (const drive of [0.3, 2.2, 4.4]) {
      const { pen } = setUpTrammel(spec).pose(drive);
      const dragged = model.drag('pen', pen, pen, drive + 0.4);
      expect(dragged).toEqual({ kind: 'drive', drive: expect.closeTo(drive, 9) });
    }
  });

  it('moves a pin along the bar by the nearest notch', () => {
    const model = modelOf(spec);
    const dragged = model.drag('farPin', { x: 0, y: 0 }, { x: -10.4, y: 0 }, 0);
    expect(dragged.kind === 'spec' ? dragged.spec : null).toMatchObject({
      farPin: 310,
      nearPin: 180,
    });
  });

  it('keeps the size to itself when told to, and still shows the oval', () => {
    const model = modelOf({ ...spec, hide: ['length', 'width'] });
    const text = JSON.stringify([model.readouts(1), model.describe(1), model.tables(1, 1)]);
    expect(text).not.toMatch(/600|360/);
    expect(model.plot).toBeNull();
    const scene = model.scene({ drive: 1, swept: { from: 1, to: 1 } }, showing);
    expect(scene.shapes.some((shape) => shape.kind === 'outline' && shape.role === 'tracing')).toBe(
      true,
    );
  });

  it('sets and says inches as a rule has them', () => {
    const inches = modelOf({ ...spec, units: 'inch', farPin: 254, nearPin: 127 });
    const longer = inches.set('farPin', 10 + 1 / 32);
    expect(longer).toMatchObject({ farPin: expect.closeTo(254.79375, 9) });
    expect(modelOf(longer).describe(0)).toContain('Far pin 10 1/32 in from the pen');
  });

  it('holds the bar and turns the board under it', () => {
    const held = modelOf({ ...spec, held: 'bar' });
    const scene = held.scene({ drive: 0.7, swept: { from: 0.7, to: 0.7 } }, showing);
    expect(scene.shapes).toHaveLength(1);
    const [body] = scene.shapes;
    if (body?.kind !== 'body') throw new Error('one body');
    const { pen } = setUpTrammel(spec).pose(0.7);
    const { x, y, angle } = body.pose;
    expect(x + pen.x * Math.cos(angle) - pen.y * Math.sin(angle)).toBeCloseTo(0, 9);
    expect(y + pen.x * Math.sin(angle) + pen.y * Math.cos(angle)).toBeCloseTo(0, 9);
  });
});
