import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { changeWheelRatio } from '@/lib/kinematics/train/change-wheels';
import { beatOfPendulum, clockBeats, pendulumForBeat } from '@/lib/kinematics/train/clock';
import { continuedFraction, driftOf, rungWithin } from '@/lib/kinematics/train/continued-fraction';
import { huntingTeeth } from '@/lib/kinematics/train/hunting';
import { closingWheel, revertedTeeth } from '@/lib/kinematics/train/reverted';
import { decimalFraction, readFraction, toNumber, written } from '@/lib/numeric/fraction';

describe('a clock', () => {
  it('beats twice a tooth, and seconds with a metre of pendulum', () => {
    expect(
      clockBeats(
        [
          [64, 8],
          [60, 8],
        ],
        30,
      ),
    ).toEqual({
      beatsPerTurn: { numerator: 3600n, denominator: 1n },
      beatsPerHour: 3600,
      beat: 1,
      pendulum: expect.closeTo(993.621385566, 8),
    });
    expect(clockBeats([], 30).beatsPerHour).toBe(60);
    expect(beatOfPendulum(pendulumForBeat(0.7))).toBeCloseTo(0.7, 12);
    expect(() => clockBeats([[64, 8]], 0)).toThrow('escapeTeeth is 0');
  });
});

describe('a reverted train', () => {
  it('has equal sums of teeth, the smallest that are whole', () => {
    expect(revertedTeeth(6, 5, 16)).toEqual({
      firstPinion: 18,
      firstWheel: 108,
      secondPinion: 21,
      secondWheel: 105,
      toothSum: 126,
    });
    expect(revertedTeeth(2.66666666667, 2.5, 12)).toMatchObject({
      firstPinion: 21,
      firstWheel: 56,
      toothSum: 77,
    });
    expect(revertedTeeth(0.5, 0.5, 10)).toMatchObject({ firstPinion: 20, firstWheel: 10 });
  });

  it('is closed by the wheel that two modules ask for, or by none', () => {
    const train = {
      firstModule: 2,
      firstPinion: 20,
      firstWheel: 70,
      secondModule: 3,
      secondPinion: 16,
    };
    expect(closingWheel(train)).toEqual({
      outcome: 'closes',
      teeth: 44,
      centreDistance: 90,
      reduction: { numerator: 77n, denominator: 8n },
    });
    expect(closingWheel({ ...train, firstWheel: 71 })).toEqual({
      outcome: 'no-whole-wheel',
      exact: expect.closeTo(44 + 2 / 3, 9),
      below: 44,
      gap: expect.closeTo(1, 9),
      above: 45,
      excess: expect.closeTo(0.5, 9),
    });
    expect(closingWheel({ ...train, secondPinion: 62 })).toEqual({
      outcome: 'no-room',
      overlap: 3,
    });
  });
});

describe('ratios by rungs', () => {
  it('climb as Huygens climbed', () => {
    // Huygens 1703: 77708431/2640858; case TN-CF-03.
    const { quotients, rungs } = continuedFraction(readFraction('77708431/2640858'), 6);
    expect(quotients).toEqual([29n, 2n, 2n, 1n, 5n, 1n]);
    expect(rungs.map(written)).toEqual(['29', '59/2', '147/5', '206/7', '1177/40', '1383/47']);
    expect(continuedFraction(readFraction('-7/3'), 9).quotients).toEqual([-3n, 1n, 2n]);
    expect(() => continuedFraction(readFraction('1'), 0)).toThrow('terms is 0');
  });

  it('are nearest of all fractions with so small a denominator', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.2, max: 9, noNaN: true }), (value) => {
        const rung = continuedFraction(decimalFraction(value), 3).rungs.at(-1);
        const q = Number(rung?.denominator);
        const error = Math.abs(Number(rung?.numerator) / q - value);
        for (let below = 1; below < Math.min(q, 300); below += 1) {
          expect(Math.abs(Math.round(value * below) / below - value)).toBeGreaterThanOrEqual(error);
        }
      }),
      { seed: 21, numRuns: 300 },
    );
  });

  it('end at the number itself, and stop within a share of it', () => {
    expect(written(rungWithin(2.66666666667, 1e-9))).toBe('8/3');
    expect(written(rungWithin(Math.PI, 1e-6))).toBe('355/113');
    expect(toNumber(rungWithin(1.27, 1e-50))).toBe(1.27);
    expect(() => rungWithin(1.27, 0)).toThrow('tolerance is 0');
  });

  it('drift by the share they are off', () => {
    // Lesson 2.3: 59/57 for the tide, 36 millionths; some 22 seconds a week.
    expect(driftOf(59 / 57, 1.03505, 7 * 86400)).toBeCloseTo(22.04, 2);
    expect(driftOf(1, 2, 10)).toBe(-5);
  });

  it('are read as they are written', () => {
    expect(written(readFraction(' 25.4 '))).toBe('127/5');
    expect(written(readFraction('-1.5e-3'))).toBe('-3/2000');
    expect(written(decimalFraction(1e21))).toBe('1000000000000000000000');
    expect(written(readFraction('.5/1.25'))).toBe('2/5');
    for (const nonsense of ['', '.', '1/2/3', 'π', '1/0', '1e9999', 'NaN']) {
      expect(() => readFraction(nonsense)).toThrow(RangeError);
    }
  });

  it('cut a metric thread with 127 teeth', () => {
    expect(written(changeWheelRatio(8, 1.5))).toBe('60/127');
    expect(() => changeWheelRatio(0, 1.5)).toThrow('leadThreads is 0');
  });
});

describe('hunting teeth', () => {
  it('meet again after the least common multiple', () => {
    expect(huntingTeeth(24, 60)).toEqual({ firstTurns: 5, secondTurns: 2, hunting: false });
    expect(huntingTeeth(25, 61)).toEqual({ firstTurns: 61, secondTurns: 25, hunting: true });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.integer({ min: 1, max: 400 }), (a, b) => {
        const met = huntingTeeth(a, b);
        expect(met.firstTurns * a).toBe(met.secondTurns * b);
        let passed = a;
        while (passed % b !== 0) passed += a;
        expect(met.firstTurns).toBe(passed / a);
      }),
      { seed: 22, numRuns: 300 },
    );
  });
});
