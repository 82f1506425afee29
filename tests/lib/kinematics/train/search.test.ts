import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pairedWithin } from '@/lib/kinematics/train/pairing';
import { nearestTrain, searchInPortions, wheelsFrom } from '@/lib/kinematics/train/search';
import type { WheelSearch } from '@/lib/kinematics/train/search';
import { firstFrom, wheelSets } from '@/lib/kinematics/train/wheel-sets';

const drawer = fc.array(fc.integer({ min: 8, max: 60 }), { minLength: 6, maxLength: 8 });
const ratios = fc.double({ min: 0.1, max: 12, noNaN: true });

/** Every way to take `count` wheels out of a drawer, by place. */
function choices(count: number, places: readonly number[]): readonly (readonly number[])[] {
  if (count === 0) return [[]];
  return places.flatMap((place) =>
    choices(
      count - 1,
      places.filter((other) => other !== place),
    ).map((rest) => [place, ...rest]),
  );
}

function leastError(wheels: readonly number[], ratio: number, stages: number): number {
  const at = (place: number) => wheels[place] ?? Number.NaN;
  const all = choices(
    2 * stages,
    wheels.map((_, place) => place),
  );
  return all.reduce((least, taken) => {
    const reached = taken.reduce(
      (product, place, index) => (index < stages ? product * at(place) : product / at(place)),
      1,
    );
    return Math.min(least, Math.abs(reached / ratio - 1));
  }, Number.MAX_VALUE);
}

describe('the search of a drawer', () => {
  it.each([1, 2] as const)('in %i stages finds what trying everything finds', (stages) => {
    fc.assert(
      fc.property(drawer, ratios, (wheels, ratio) => {
        const found = nearestTrain({ ratio, wheels }, stages);
        if (found.outcome !== 'found') throw new Error(found.outcome);
        expect(Math.abs(found.relativeError)).toBeCloseTo(leastError(wheels, ratio, stages), 11);
        const used = found.pairs.flat();
        for (const teeth of new Set(used)) {
          const held = wheels.filter((wheel) => wheel === teeth).length;
          expect(used.filter((wheel) => wheel === teeth).length).toBeLessThanOrEqual(held);
        }
        const product = found.pairs.reduce((value, [a, b]) => (value * a) / b, 1);
        expect(product / ratio - 1).toBeCloseTo(found.relativeError, 11);
      }),
      { seed: 23, numRuns: stages === 1 ? 300 : 60 },
    );
  });

  it('in three stages finds what trying everything finds', () => {
    const wheels = [12, 17, 23, 31, 40, 53, 60];
    const found = nearestTrain({ ratio: 7.3, wheels }, 3);
    if (found.outcome !== 'found') throw new Error(found.outcome);
    expect(Math.abs(found.relativeError)).toBeCloseTo(leastError(wheels, 7.3, 3), 12);
    expect(found.pairs).toHaveLength(3);
  });

  it('over a range finds the pairs of the books, lowest teeth first', () => {
    // Cases TN-BP-01 and TN-B2-01.
    const pi = nearestTrain({ ratio: 3.14159265359, wheels: wheelsFrom(12, 120), reuse: true }, 1);
    expect(pi).toMatchObject({ pairs: [[44, 14]], reached: { numerator: 22n, denominator: 7n } });
    const two = nearestTrain({ ratio: 2.46088233333, wheels: wheelsFrom(12, 60), reuse: true }, 2);
    expect(two).toMatchObject({ reached: { numerator: 598n, denominator: 243n } });
    expect(() => wheelsFrom(20, 12)).toThrow('most is 12');
  });

  it('keeps to the board, and says when nothing fits it', () => {
    const wheels = [12, 20, 30, 48, 60, 72];
    const free = nearestTrain({ ratio: 1 / 6, wheels, module: 4 }, 1);
    expect(free).toMatchObject({ pairs: [[12, 72]], centreDistances: [168] });
    const narrow = nearestTrain({ ratio: 1 / 6, wheels, module: 4, widest: 150 }, 1);
    expect(narrow).toMatchObject({ pairs: [[12, 60]], centreDistances: [144] });
    expect(nearestTrain({ ratio: 1 / 6, wheels, module: 4, widest: 50 }, 1)).toEqual({
      outcome: 'all-too-wide',
    });
  });

  it('says how many wheels are lacking', () => {
    expect(nearestTrain({ ratio: 2, wheels: [12, 24] }, 2)).toEqual({
      outcome: 'too-few-wheels',
      lacking: 2,
    });
    expect(nearestTrain({ ratio: 2, wheels: [], reuse: true }, 1)).toEqual({
      outcome: 'too-few-wheels',
      lacking: 1,
    });
    expect(nearestTrain({ ratio: 1, wheels: [12], reuse: true }, 3)).toMatchObject({
      relativeError: 0,
    });
    expect(() => nearestTrain({ ratio: 0, wheels: [12, 24] }, 1)).toThrow('ratio is 0');
    expect(() => nearestTrain({ ratio: 1, wheels: [12, 24.5] }, 1)).toThrow('wheels is 24.5');
  });

  it('can be taken in portions, rising from nothing to done, with the same answer', () => {
    const search: WheelSearch = { ratio: Math.PI, wheels: wheelsFrom(12, 51) };
    const portions = searchInPortions(search, 3);
    const done: number[] = [];
    let step = portions.next();
    while (!step.done) {
      done.push(step.value.done);
      step = portions.next();
    }
    expect(done.length).toBeGreaterThan(20);
    expect(done).toEqual(done.toSorted((a, b) => a - b));
    expect(step.value).toEqual(nearestTrain(search, 3));
  });
});

describe('sets of wheels', () => {
  it('come by rising product, once each', () => {
    expect(wheelSets([10, 20, 30, 40], 2, false).map(({ product }) => product)).toEqual([
      200, 300, 400, 600, 800, 1200,
    ]);
    expect(wheelSets([10, 20], 3, true).map(({ places }) => places.join(''))).toEqual([
      '000',
      '001',
      '011',
      '111',
    ]);
    expect(wheelSets(wheelsFrom(1, 12), 3, false)).toHaveLength(220);
    expect(firstFrom(wheelSets([10, 20, 30], 1, false), 99)).toBe(3);
  });

  it('are paired so that the widest pair is as narrow as can be', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 8, max: 80 }), { minLength: 3, maxLength: 3 }),
        fc.array(fc.integer({ min: 8, max: 80 }), { minLength: 3, maxLength: 3 }),
        (drivers, driven) => {
          const widest = (others: readonly number[]) =>
            Math.max(...others.map((teeth, index) => teeth + (drivers[index] ?? 0)));
          const orders = choices(3, [0, 1, 2]).map((order) =>
            order.map((place) => driven[place] ?? 0),
          );
          const least = Math.min(...orders.map(widest));
          expect(pairedWithin(drivers, driven, least)).toHaveLength(3);
          expect(pairedWithin(drivers, driven, least - 1)).toBeNull();
        },
      ),
      { seed: 24, numRuns: 500 },
    );
  });
});
