import { describe, expect, it } from 'vitest';
import type { FreeTrainSpec, TrainSpec } from '@/lib/scene/bench-spec';
import { modelOf } from '@/lib/scene/model-of';
import type { Body, Outline, Scene } from '@/lib/scene/scene';
import { describe as inWords, readouts } from '@/lib/scene/static-picture';
import { trainInLine } from '@/lib/scene/train-model';
import { setUpTrain } from '@/lib/scene/train-setup';

const turn = 2 * Math.PI;
const showing = { tracing: true, dimensions: true };
const compound = trainInLine(4, [[12], [36, 14], [28]]);
const row = trainInLine(4, [[16], [48], [16]]);

function sceneAt(spec: TrainSpec, drive: number): Scene {
  return modelOf(spec).scene({ drive, swept: { from: drive, to: drive } }, showing);
}

/** The wheels of a scene: bodies whose first shape is a closed outline of many points. */
function wheelsOf(scene: Scene): { centre: { x: number; y: number }; outline: number[][] }[] {
  return scene.shapes
    .filter((shape): shape is Body => shape.kind === 'body')
    .flatMap((body) => {
      const [face] = body.shapes;
      if (face?.kind !== 'outline' || !face.closed || face.points.length < 200) return [];
      const { x, y, angle } = body.pose;
      const [c, s] = [Math.cos(angle), Math.sin(angle)];
      const outline: number[][] = [];
      for (let i = 0; i < face.points.length; i += 2) {
        const [px, py] = [face.points[i] ?? 0, face.points[i + 1] ?? 0];
        outline.push([x + px * c - py * s, y + px * s + py * c]);
      }
      return [{ centre: { x, y }, outline }];
    });
}

function inside([x = 0, y = 0]: number[], polygon: number[][]): boolean {
  let within = false;
  polygon.forEach(([ax = 0, ay = 0], i) => {
    const [bx = 0, by = 0] = polygon[(i + 1) % polygon.length] ?? [];
    if (ay > y !== by > y && x < ax + ((y - ay) * (bx - ax)) / (by - ay)) within = !within;
  });
  return within;
}

describe('a train of toothed wheels', () => {
  it('stands its arbors half the sum of the pitch diameters apart', () => {
    expect(compound.arbors.map(({ x }) => x)).toEqual([0, 96, 180]);
  });

  it.each([0, -0.37, -1.9, 4.2])('meshes without one tooth in another, crank at %f', (drive) => {
    const wheels = wheelsOf(sceneAt(row, drive));
    expect(wheels).toHaveLength(3);
    const [first, second, third] = wheels;
    if (!first || !second || !third) return;
    for (const [a, b] of [
      [first, second],
      [second, third],
      [third, second],
    ] as const) {
      expect(a.outline.filter((point) => inside(point, b.outline))).toEqual([]);
    }
  });

  it('says the turns that the ratio makes, at three angles', () => {
    for (const turns of [1, 6, 15]) {
      expect(inWords(compound, -turns * turn)).toContain(
        `The last wheel, 28 teeth, has made ${Math.round((turns / 6) * 100) / 100} turn`,
      );
    }
    expect(inWords(compound, 0)).toContain('One turn of it for 6 turns of the crank, 2 meshes.');
  });

  it('counts an idler for the sense and not for the ratio', () => {
    expect(readouts(row, -turn)).toEqual([
      { key: 'crank', label: 'Crank, turns', value: '1.00 right' },
      { key: 'turns', label: 'Last wheel, turns', value: '1.00 right' },
      { key: 'ratio', label: 'Last for one of crank', value: '1' },
    ]);
    const pair = trainInLine(4, [[16], [48]]);
    expect(readouts(pair, -3 * turn)[1]?.value).toBe('1.00 left');
  });

  it('keeps hidden readouts out of words, strip, table and plot', () => {
    const model = modelOf({ ...compound, hide: ['ratio', 'turns'] });
    const all = JSON.stringify([
      model.readouts(-turn),
      model.tables(-turn, 10),
      model.describe(-turn),
    ]);
    expect(all).not.toContain('0.17');
    expect(all).not.toContain('1/6');
    expect(model.plot).toBeNull();
  });

  it('unrolls equal lengths at a mesh', () => {
    const drawn = sceneAt(compound, -1.2).shapes.filter(
      (shape): shape is Outline =>
        shape.kind === 'outline' && shape.role === 'tracing' && shape.points.length === 4,
    );
    const lengths = drawn.map(({ points }) => (points[2] ?? 0) - (points[0] ?? 0));
    expect(lengths).toHaveLength(4);
    expect(lengths[0]).toBeCloseTo(1.2 * 24, 6);
    expect(lengths[1]).toBeCloseTo(lengths[0] ?? 0, 6);
    expect(lengths[3]).toBeCloseTo(lengths[2] ?? 0, 6);
  });

  it('tells a gap and an overlap with their amounts', () => {
    const moved = (by: number): FreeTrainSpec => ({
      ...row,
      arbors: row.arbors.map((arbor, i) => (i === 2 ? { ...arbor, x: arbor.x + by } : arbor)),
    });
    expect(modelOf(moved(3)).limits(0)).toEqual([
      'Wheels 2 and 3: 3 mm between the pitch circles: the teeth touch only at their tips.',
    ]);
    expect(modelOf(moved(9)).limits(0)).toEqual([
      'Wheels 2 and 3: 9 mm between the pitch circles: the teeth miss.',
    ]);
    expect(modelOf(moved(-2)).limits(0)).toEqual([
      'Wheels 2 and 3: 2 mm too close: cannot be put in.',
    ]);
    expect(modelOf(moved(-2)).admit(5)).toBe(0);
    expect(setUpTrain(moved(3)).wheels.map(({ ratio }) => ratio)).toEqual([1, -1 / 3, null]);
  });

  it('locks three wheels in a ring', () => {
    const side = 4 * 20;
    const ring: FreeTrainSpec = {
      ...trainInLine(4, [[20], [20], [20]]),
      arbors: [0, 1, 2].map((i) => ({
        x: i === 1 ? side : (i * side) / 4,
        y: i === 2 ? (side * Math.sqrt(3)) / 2 : 0,
        wheels: [{ teeth: 20 }],
        fast: true,
      })),
    };
    expect(modelOf(ring).limits(0)).toContain(
      'Each wants its neighbours to turn against it; three in a ring cannot.',
    );
    expect(modelOf(ring).admit(1)).toBe(0);
  });

  it('hands nothing on over a loose pair', () => {
    const loose = {
      ...compound,
      arbors: compound.arbors.map((arbor) => ({ ...arbor, fast: false })),
    };
    expect(modelOf(loose).limits(0)).toEqual(['Loose on its arbor: nothing is passed on.']);
    expect(setUpTrain(loose).wheels.map(({ ratio }) => ratio)).toEqual([1, -1 / 3, null, null]);
  });

  it('warns of a crank at the slow end', () => {
    const slow = trainInLine(4, [[10], [40, 10], [40]], { crank: 2 });
    expect(modelOf(slow).limits(0)).toEqual([
      'Turning from here the crank will feel locked: 16 turns out for each of yours.',
    ]);
  });

  it('moves the neighbours along when a tooth count changes, and keeps a gap as it was', () => {
    const bigger = modelOf(row).set('teeth:1:0', 60);
    expect(
      bigger.bench === 'train' && setUpTrain(bigger).pairs.map(({ state }) => state.outcome),
    ).toEqual(['meshes', 'meshes']);
  });

  it('leads the crank by the hand, round and round', () => {
    const model = modelOf(compound);
    const at = (angle: number) => ({ x: 50 * Math.cos(angle), y: 50 * Math.sin(angle) });
    let drive = 0;
    for (let i = 0; i < 20; i += 1) {
      const dragged = model.drag('crank', at(-i * 0.5), at(-(i + 1) * 0.5), drive);
      drive = dragged.kind === 'drive' ? dragged.drive : Number.NaN;
    }
    expect(drive).toBeCloseTo(-10, 9);
  });

  it('snaps an arbor to its neighbour where it comes near, and leaves a gap where it does not', () => {
    const model = modelOf(row);
    const near = model.drag('arbor:2', { x: 0, y: 0 }, { x: 4, y: 3 }, 0);
    const far = model.drag('arbor:2', { x: 0, y: 0 }, { x: 30, y: 0 }, 0);
    const gapOf = (dragged: typeof near) =>
      dragged.kind === 'spec' && dragged.spec.bench === 'train'
        ? setUpTrain(dragged.spec).pairs[1]?.state.gap
        : undefined;
    expect(gapOf(near)).toBeCloseTo(0, 6);
    expect(gapOf(far)).toBeCloseTo(30, 6);
  });

  it('closes between posts with the idlers of the exercise, and tells the gap without', () => {
    const posts: TrainSpec = {
      bench: 'train',
      layout: 'between-posts',
      module: 4,
      posts: { distance: 4 * (10 + 20 + 15), firstTeeth: 20 },
      lastTeeth: 30,
      idlers: 1,
      idlerTeeth: 20,
    };
    expect(setUpTrain(posts).pairs.map(({ state }) => state.outcome)).toEqual(['meshes', 'meshes']);
    expect(modelOf({ ...posts, idlers: 0 }).limits(0)[0]).toContain('80 mm between');
    expect(modelOf(posts).values).toEqual({ lastTeeth: 30, idlers: 1, idlerTeeth: 20 });
  });

  it('keeps its frame while it moves', () => {
    const frames = [0, 1, 2.7].map((drive) => sceneAt(compound, drive).bounds);
    expect(new Set(frames.map((frame) => JSON.stringify(frame))).size).toBe(1);
  });

  it('has a tray of wheels with a place for each wheel there is', () => {
    const [tray] = modelOf(compound).controls;
    if (tray?.kind !== 'tray') throw new Error('a tray comes first');
    expect(tray.parts.map(({ value }) => value)).toEqual([
      8, 10, 12, 14, 16, 20, 24, 30, 36, 40, 48, 60, 72, 96,
    ]);
    expect(tray.places).toEqual([
      { key: 'teeth:0:0', label: 'Arbor 1' },
      { key: 'teeth:1:0', label: 'Arbor 2, takes' },
      { key: 'teeth:1:1', label: 'Arbor 2, hands on' },
      { key: 'teeth:2:0', label: 'Arbor 3' },
    ]);
    const changed = modelOf(compound).set('teeth:1:1', 20);
    // 12 into 36, and now 20 into 28: the last arbor moves out to 2 × (20 + 28) beyond the middle.
    expect(changed).toMatchObject({ arbors: [{ x: 0 }, { x: 96 }, { x: 192 }] });
  });

  it('knows which wheel lies under a wheel that is put down, the smaller of a pair in front', () => {
    const { placeAt } = modelOf(compound);
    expect(placeAt({ x: 2, y: 1 })).toBe('teeth:0:0');
    expect(placeAt({ x: 96, y: 10 })).toBe('teeth:1:1');
    expect(placeAt({ x: 96, y: 60 })).toBe('teeth:1:0');
    expect(placeAt({ x: 180, y: 40 })).toBe('teeth:2:0');
    expect(placeAt({ x: 96, y: 120 })).toBeNull();
    expect(modelOf({ ...compound, controls: [] }).placeAt({ x: 0, y: 0 })).toBeNull();
    expect(modelOf({ ...compound, controls: [] }).controls).toEqual([]);
  });
});
