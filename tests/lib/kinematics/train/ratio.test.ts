import { describe, expect, it } from 'vitest';
import {
  arborTurns,
  compoundTrain,
  idlerBetween,
  simpleTrain,
  trainProduct,
} from '@/lib/kinematics/train/ratio';

describe('the ratio of a train', () => {
  it('of wheels in a row answers to the first and the last alone', () => {
    // Lesson 2.1, prediction `middle-wheel`: one turn, the same way round.
    for (const middle of [24, 48, 60]) {
      expect(simpleTrain([16, middle, 16])).toMatchObject({ value: 1, meshes: 2, sense: 'with' });
    }
    expect(simpleTrain([20, 45])).toEqual({
      turns: { numerator: -4n, denominator: 9n },
      value: -4 / 9,
      meshes: 1,
      sense: 'against',
    });
  });

  it('of pairs multiplies drivers over driven', () => {
    expect(
      compoundTrain([
        [12, 36],
        [10, 40],
      ]).turns,
    ).toEqual({ numerator: 1n, denominator: 12n });
    expect(
      compoundTrain([
        [16, 64],
        [20, 50],
        [25, 75],
      ]),
    ).toMatchObject({ sense: 'against', meshes: 3 });
    expect(
      arborTurns(
        [
          [12, 36],
          [10, 40],
        ],
        12,
      ),
    ).toEqual([12, -4, 1]);
    expect(
      trainProduct([
        [64, 38],
        [48, 24],
        [127, 32],
      ]),
    ).toEqual({ numerator: 254n, denominator: 19n });
  });

  it('refuses a train without a pair, and half teeth', () => {
    expect(() => simpleTrain([20])).toThrow('simpleTrain: number of wheels is 1');
    expect(() => compoundTrain([])).toThrow('number of pairs is 0');
    expect(() => compoundTrain([[12, 36.5]])).toThrow('driven is 36.5');
    expect(() => arborTurns([[12, 36]], Number.NaN)).toThrow('turns is NaN');
  });
});

describe('an idler between two wheels', () => {
  it('fills the gap with its whole diameter', () => {
    expect(idlerBetween({ module: 4, first: 16, last: 20, distance: 120 })).toEqual({
      outcome: 'fits',
      teeth: 12,
      fromFirst: 56,
    });
  });

  it('is told by how much no whole wheel fits, or that there is no room', () => {
    expect(idlerBetween({ module: 4, first: 16, last: 20, distance: 121 })).toEqual({
      outcome: 'no-whole-wheel',
      exact: 12.25,
      below: 12,
      gap: 1,
      above: 13,
      excess: 3,
    });
    expect(idlerBetween({ module: 4, first: 16, last: 20, distance: 70 })).toEqual({
      outcome: 'no-room',
      overlap: 2,
    });
  });
});
