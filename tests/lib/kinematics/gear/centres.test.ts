import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  centresChanged,
  openingForBacklash,
  shiftSumForCentres,
  shiftedPair,
} from '@/lib/kinematics/gear/centres';
import {
  fewestTeethForPair,
  fewestTeethForRack,
  largestWheel,
  leastShift,
} from '@/lib/kinematics/gear/interference';
import { toothThickness } from '@/lib/kinematics/gear/thickness';
import { degree } from './gears';

const pair = { module: 3, firstTeeth: 24, secondTeeth: 48, pressureAngle: 20 * degree };
const counts = fc.integer({ min: 8, max: 150 });

describe('a pair on other than standard centres', () => {
  it('has backlash, exactly and as it is usually estimated', () => {
    // Case GR-CD-02.
    expect(centresChanged(pair, 108.5)).toEqual({
      outcome: 'runs',
      operatingAngle: expect.closeTo(20.7132536528 * degree, 10),
      firstRolling: expect.closeTo(72.3333333333, 9),
      secondRolling: expect.closeTo(144.666666667, 8),
      backlash: expect.closeTo(0.371943376836, 9),
      backlashEstimate: expect.closeTo(0.363970234266, 9),
    });
  });

  it('has as much as the spacing leaves beside two thicknesses on the rolling circles', () => {
    const runs = centresChanged(pair, 109);
    if (runs.outcome !== 'runs') throw new Error(runs.outcome);
    const thickness = (teeth: number, rolling: number) => {
      const tooth = toothThickness({ module: 3, teeth, pressureAngle: 20 * degree }, rolling / 2);
      return tooth.outcome === 'tooth' ? tooth.thickness : Number.NaN;
    };
    const spacing = (Math.PI * runs.firstRolling) / 24;
    const left = spacing - thickness(24, runs.firstRolling) - thickness(48, runs.secondRolling);
    expect(runs.backlash).toBeCloseTo(left, 9);
  });

  it('has none on standard centres, bites nearer, and cannot be at all nearer still', () => {
    expect(centresChanged(pair, 108)).toMatchObject({
      outcome: 'runs',
      backlash: expect.closeTo(0, 9),
    });
    const bites = centresChanged(pair, 107.8);
    expect(bites.outcome === 'bites' && bites.bite).toBeCloseTo(0.4 * Math.tan(20 * degree), 2);
    expect(centresChanged(pair, 100)).toEqual({
      outcome: 'too-close',
      overlap: expect.closeTo(108 * Math.cos(20 * degree) - 100, 10),
    });
  });

  it('is opened for a backlash by the inverse', () => {
    fc.assert(
      fc.property(
        counts,
        counts,
        fc.double({ min: 1e-6, max: 0.4, noNaN: true }),
        (z1, z2, share) => {
          const spec = { module: 2, firstTeeth: z1, secondTeeth: z2, pressureAngle: 20 * degree };
          const opening = openingForBacklash(spec, share);
          const runs = centresChanged(spec, z1 + z2 + opening);
          expect(runs.outcome === 'runs' && runs.backlash).toBeCloseTo(share, 9);
        },
      ),
      { seed: 14, numRuns: 1000 },
    );
    expect(openingForBacklash(pair, 0)).toBe(0);
    expect(() => openingForBacklash(pair, -1)).toThrow('backlash is -1');
  });
});

describe('a shifted pair', () => {
  it('stands a little nearer than the shifts together', () => {
    // KHK and SDP/SI's example 12/24, m 3 (from memory, recomputed: case GR-PS-01).
    const made = shiftedPair({
      ...pair,
      firstTeeth: 12,
      secondTeeth: 24,
      firstShift: 0.6,
      secondShift: 0.36,
    });
    expect(made).toEqual({
      outcome: 'pair',
      operatingAngle: expect.closeTo(26.0885634421 * degree, 9),
      widening: expect.closeTo(0.833289906768, 9),
      centreDistance: expect.closeTo(56.4998697203, 8),
      firstTip: expect.closeTo(44.8397394406, 8),
      secondTip: expect.closeTo(79.3997394406, 8),
      firstRoot: expect.closeTo(32.1, 9),
      secondRoot: expect.closeTo(66.66, 9),
    });
  });

  it('keeps a quarter of a module between tip and root, and has no backlash', () => {
    fc.assert(
      fc.property(
        counts,
        counts,
        fc.double({ min: 0, max: 0.6, noNaN: true }),
        fc.double({ min: -0.2, max: 0.6, noNaN: true }),
        (firstTeeth, secondTeeth, firstShift, secondShift) => {
          const spec = {
            module: 2,
            firstTeeth,
            secondTeeth,
            pressureAngle: 20 * degree,
            firstShift,
            secondShift,
          };
          const made = shiftedPair(spec);
          if (made.outcome !== 'pair') return;
          const clearance = made.centreDistance - made.firstTip / 2 - made.secondRoot / 2;
          expect(clearance).toBeCloseTo(0.5, 7);
          expect(made.centreDistance - made.secondTip / 2 - made.firstRoot / 2).toBeCloseTo(0.5, 7);
          const sum = shiftSumForCentres(spec, made.centreDistance);
          expect(sum.outcome === 'sum' && sum.sum).toBeCloseTo(firstShift + secondShift, 6);
        },
      ),
      { seed: 15, numRuns: 1000 },
    );
  });

  it('keeps standard centres when the shifts cancel, and has no mesh far inside', () => {
    expect(shiftedPair({ ...pair, firstShift: 0.5, secondShift: -0.5 })).toMatchObject({
      operatingAngle: 20 * degree,
      centreDistance: 108,
      widening: 0,
    });
    const none = shiftedPair({ ...pair, firstShift: -1, secondShift: -1 });
    const least = (72 * (Math.tan(20 * degree) - 20 * degree)) / (2 * Math.tan(20 * degree));
    expect(none).toEqual({ outcome: 'no-mesh', lacking: expect.closeTo(2 - least, 9) });
    expect(shiftSumForCentres(pair, 101).outcome).toBe('too-close');
  });
});

describe('the limits of undercut and interference', () => {
  it('are 32, 18 and 12 teeth against a rack, and fewer for stub teeth', () => {
    expect(
      [14.5, 20, 25].map((angle) => fewestTeethForRack({ pressureAngle: angle * degree }).teeth),
    ).toEqual([32, 18, 12]);
    expect(fewestTeethForRack({ pressureAngle: 20 * degree, addendum: 0.8 }).teeth).toBe(14);
    expect(fewestTeethForRack({ pressureAngle: 30 * degree })).toEqual({
      exact: expect.closeTo(8, 9),
      teeth: 8,
    });
  });

  it('let 13 leaves run with their like and 16 with a wheel of four times', () => {
    // Shigley's table for 20° full depth; cases GR-UP-01, 02.
    const tooth = { pressureAngle: 20 * degree };
    expect(fewestTeethForPair(tooth, 1)).toEqual({
      exact: expect.closeTo(12.323118726, 8),
      teeth: 13,
    });
    expect(fewestTeethForPair(tooth, 4).teeth).toBe(16);
    expect(fewestTeethForPair(tooth, 1e9).exact).toBeCloseTo(fewestTeethForRack(tooth).exact, 5);
    expect(() => fewestTeethForPair(tooth, 0.5)).toThrow('ratio is 0.5');
  });

  it('let 13 to 17 leaves run with wheels up to a size, 18 with any, and 12 with none', () => {
    const tooth = { pressureAngle: 20 * degree };
    expect([13, 14, 15, 16, 17].map((z) => largestWheel(tooth, z))).toMatchObject([
      { teeth: 16 },
      { teeth: 26 },
      { teeth: 45 },
      { teeth: 101 },
      { teeth: 1309 },
    ]);
    expect(largestWheel(tooth, 18)).toEqual({ outcome: 'any' });
    expect(largestWheel(tooth, 12)).toMatchObject({ outcome: 'none', lacking: 1 });
    expect(() => largestWheel(tooth, 2)).toThrow('pinionTeeth is 2');
  });

  it('ask for the shift that just clears, and grant one inwards to large wheels', () => {
    expect(leastShift({ pressureAngle: 20 * degree }, 10)).toBeCloseTo(0.415111107797, 10);
    expect(leastShift({ pressureAngle: 20 * degree }, 40)).toBeLessThan(-1.3);
  });
});
