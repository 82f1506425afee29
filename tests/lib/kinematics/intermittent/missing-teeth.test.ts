import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { indexMove, nearestHole } from '@/lib/kinematics/intermittent/index-plate';
import { driverTeeth, missingTeeth } from '@/lib/kinematics/intermittent/missing-teeth';
import { expectNear, outcome, runs, whole } from '@/tests/support/numbers';

describe('a driver with missing teeth', () => {
  it('is that of the worked example: 3 of 30 on 60 step 18°, 20 turns, a tenth moving', () => {
    const steps = outcome(missingTeeth({ fullTeeth: 30, teethLeft: 3, wheelTeeth: 60 }), 'steps');
    expect((steps.step * 180) / Math.PI).toBeCloseTo(18, 12);
    expect(steps).toMatchObject({
      turnsForRound: 20,
      hollows: 20,
      movingShare: 0.1,
      restShare: 0.9,
    });
  });

  it('says how late the first hollow comes that does not fit: 5 left on 48', () => {
    const late = outcome(
      missingTeeth({ fullTeeth: 24, teethLeft: 5, wheelTeeth: 48 }),
      'hollows-do-not-fit',
    );
    // after ten turns fifty teeth have passed, two too many of a pitch of 7.5°
    expect((late.late * 180) / Math.PI).toBeCloseTo(15, 12);
    expect(late.turnsForRound).toBe(9.6);
  });

  it('cannot keep more teeth than it had', () => {
    expect(missingTeeth({ fullTeeth: 12, teethLeft: 14, wheelTeeth: 28 })).toEqual({
      outcome: 'too-many-teeth',
      by: 2,
    });
  });

  it('is found again from its places and its rest', () => {
    fc.assert(
      fc.property(whole(1, 12), whole(1, 12), whole(0, 40), (teethLeft, places, more) => {
        const wheelTeeth = teethLeft * places;
        const fullTeeth = teethLeft + more;
        const found = driverTeeth(wheelTeeth, places, 1 - teethLeft / fullTeeth);
        expect(found).toEqual({ outcome: 'found', teethLeft, fullTeeth });
        const motion = outcome(missingTeeth({ fullTeeth, teethLeft, wheelTeeth }), 'steps');
        expect(motion.turnsForRound).toBe(places);
      }),
      runs,
    );
  });

  it('says what does not come out even', () => {
    expect(driverTeeth(50, 8, 0.5)).toEqual({ outcome: 'places-do-not-divide', over: 2 });
    const odd = outcome(driverTeeth(48, 8, 0.71), 'circle-not-whole');
    expect(odd).toMatchObject({ teethLeft: 6, nearest: 21 });
    expectNear(odd.exact, 6 / 0.29, 1e-12);
    expectNear(odd.restShare, 15 / 21, 1e-12);
  });

  it('refuses nonsense', () => {
    expect(() => missingTeeth({ fullTeeth: 0, teethLeft: 1, wheelTeeth: 1 })).toThrow(
      'fullTeeth is 0',
    );
    expect(() => driverTeeth(48, 8, 1)).toThrow('restShare is 1');
    expect(() => driverTeeth(48, 0, 0.5)).toThrow('places is 0');
  });
});

describe('an index plate', () => {
  const rings = [24, 28, 30, 36, 42, 48, 54, 60, 66];

  it('brings up exactly n divisions in R turns of the handle', () => {
    fc.assert(
      fc.property(fc.constantFrom(40, 60), whole(2, 130), (ratio, divisions) => {
        const move = indexMove(ratio, divisions, rings);
        if (move.outcome === 'no-ring') {
          expect(rings.every((ring) => ring % move.multipleOf !== 0)).toBe(true);
          return;
        }
        expect((move.turns * move.ring + move.holes) * divisions).toBe(ratio * move.ring);
        expect(move.holes).toBeLessThan(move.ring);
      }),
      runs,
    );
  });

  it('marks out 21 teeth at a ratio of 60, and misses a ring for 23', () => {
    expect(indexMove(60, 21, rings)).toEqual({ outcome: 'moves', turns: 2, holes: 24, ring: 28 });
    expect(indexMove(60, 23, rings)).toEqual({ outcome: 'no-ring', multipleOf: 23 });
    expect(indexMove(40, 20, [])).toEqual({ outcome: 'no-ring', multipleOf: 1 });
  });

  it('carries no error on when the nearest hole is taken each time anew', () => {
    fc.assert(
      fc.property(
        whole(1, 60),
        whole(2, 130),
        whole(1, 66),
        whole(0, 200),
        (ratio, divisions, ring, i) => {
          const { hole, error } = nearestHole(ratio, divisions, ring, i);
          expectNear(hole - error, (i * ratio * ring) / divisions, 1e-12, 1000);
          expect(Math.abs(error)).toBeLessThanOrEqual(0.5);
        },
      ),
      runs,
    );
    expect(nearestHole(1, 2, 1, 1)).toEqual({ hole: 1, error: 0.5 });
  });

  it('refuses nonsense', () => {
    expect(() => indexMove(0, 5, [20])).toThrow('ratio is 0');
    expect(() => indexMove(40, 5, [20.5])).toThrow('ring is 20.5');
    expect(() => nearestHole(40, 5, 20, -1)).toThrow('division is -1');
    expect(() => nearestHole(1e9, 5, 1e9, 1e9)).toThrow('holes in all');
  });
});
