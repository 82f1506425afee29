import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  centresForLinks,
  chainLength,
  sprocketDiameter,
  toothedPulleyDiameter,
} from '@/lib/kinematics/belt/chain';
import { gripOf, gripOnWheels, wrapForGrip } from '@/lib/kinematics/belt/grip';
import { beltSpeed, beltTurns, drivenDiameter } from '@/lib/kinematics/belt/speed';
import {
  evenPaces,
  slackOnStep,
  speedRange,
  stepForLoop,
  steppedCones,
} from '@/lib/kinematics/belt/stepped-cones';
import { toothedBelt } from '@/lib/kinematics/belt/toothed-belt';
import { beltLoop } from '@/lib/kinematics/belt/two-wheels';

describe('the speed of belts', () => {
  it('goes by diameters, with thickness, slip and sense', () => {
    // Khurmi and Gupta; case BL-SL-01.
    expect(
      beltTurns([
        { driver: 750, driven: 450 },
        { driver: 900, driven: 150 },
      ]),
    ).toBeCloseTo(10, 12);
    expect(beltTurns([{ driver: 60, driven: 180 }], { thickness: 4, slip: 0.02 })).toBeCloseTo(
      (64 / 184) * 0.98,
      12,
    );
    expect(beltTurns([{ driver: 60, driven: 180, lay: 'crossed' }])).toBeCloseTo(-1 / 3, 12);
    expect(beltTurns([{ driver: 60, driven: 180 }], { slip: 1 })).toBe(0);
    expect(() => beltTurns([])).toThrow('number of belts is 0');
    expect(() => beltTurns([{ driver: 60, driven: 180 }], { slip: 1.2 })).toThrow('slip is 1.2');
    expect(beltSpeed(150, 30 * Math.PI)).toBeCloseTo(7068.58347058, 7);
    expect(beltSpeed(146, -30 * Math.PI, 4)).toBeCloseTo(7068.58347058, 7);
  });

  it('sets the diameter for a wanted speed, or says that the belt is too thick', () => {
    const losses = { thickness: 5, slip: 0.03 };
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 4, noNaN: true }), (turns) => {
        const wheel = drivenDiameter(200, turns, losses);
        if (wheel.outcome !== 'diameter') throw new Error(wheel.outcome);
        expect(beltTurns([{ driver: 200, driven: wheel.diameter }], losses)).toBeCloseTo(turns, 10);
      }),
      { seed: 33, numRuns: 300 },
    );
    expect(drivenDiameter(60, -1 / 3)).toEqual({
      outcome: 'diameter',
      diameter: expect.closeTo(180, 10),
    });
    expect(drivenDiameter(20, 9, { thickness: 5 })).toEqual({ outcome: 'none', fastest: 5 });
    expect(() => drivenDiameter(20, 0)).toThrow('turns is 0');
  });
});

describe('stepped cones', () => {
  it('keep the sum when crossed, the loop when open', () => {
    const cones = (lay: 'open' | 'crossed') => {
      const made = steppedCones({
        centreDistance: 720,
        firstDriver: 80,
        ratios: [8 / 3, 2, 1.6],
        lay,
      });
      if (made.outcome !== 'cones') throw new Error(made.outcome);
      return made;
    };
    // Khurmi and Gupta; cases BL-SC-01 and 02.
    const crossed = cones('crossed');
    for (const { driver, driven } of crossed.steps) expect(driver + driven).toBeCloseTo(880 / 3, 8);
    const open = cones('open');
    expect(open.length).toBeCloseTo(1906.9441836, 6);
    expect(open.steps.map(({ driver }) => driver / 2)).toEqual([
      40,
      expect.closeTo(49.1876377441, 8),
      expect.closeTo(56.9678238779, 8),
    ]);
    open.steps.forEach((step, index) => {
      expect(step.driven / step.driver).toBeCloseTo([8 / 3, 2, 1.6][index] ?? 0, 10);
      expect(
        slackOnStep(step, { centreDistance: 720, lay: 'open', length: open.length }),
      ).toBeCloseTo(0, 8);
    });
  });

  it('need a fatter middle when open: lesson 1.3 finds 146.83 for 220 and 60', () => {
    const loop = beltLoop({ first: 220, second: 60, centreDistance: 300, lay: 'open' });
    if (loop.outcome !== 'loop') throw new Error(loop.outcome);
    const middle = stepForLoop({ centreDistance: 300, length: loop.length, ratio: 1, lay: 'open' });
    expect(middle.outcome === 'step' && middle.driver).toBeCloseTo(
      (loop.length - 600) / Math.PI,
      9,
    );
    expect(middle.outcome === 'step' && middle.driver).toBeCloseTo(146.84, 1);
    const slack = slackOnStep(
      { driver: 140, driven: 140 },
      { centreDistance: 300, lay: 'open', length: loop.length },
    );
    expect(slack).toBeCloseTo(Math.PI * ((loop.length - 600) / Math.PI - 140), 9);
    expect(
      slackOnStep({ driver: 400, driven: 300 }, { centreDistance: 300, lay: 'open', length: 9 }),
    ).toBeNull();
  });

  it('have no step for a loop too long or too short, by how much', () => {
    const base = { centreDistance: 300, ratio: 1, lay: 'open' as const };
    expect(stepForLoop({ ...base, length: 590 })).toEqual({
      outcome: 'loop-too-short',
      lacking: 10,
    });
    expect(stepForLoop({ ...base, length: 2000 })).toEqual({
      outcome: 'loop-too-long',
      slack: expect.closeTo(2000 - 600 - 300 * Math.PI, 6),
    });
    expect(
      steppedCones({ centreDistance: 100, firstDriver: 80, ratios: [2], lay: 'open' }),
    ).toEqual({
      outcome: 'wheels-meet',
      overlap: 20,
    });
    const apart = steppedCones({
      centreDistance: 300,
      firstDriver: 10,
      ratios: [58, 1],
      lay: 'open',
    });
    expect(apart).toMatchObject({ outcome: 'no-step', step: 1 });
    expect(() =>
      steppedCones({ centreDistance: 300, firstDriver: 10, ratios: [], lay: 'open' }),
    ).toThrow('first ratio');
  });

  it('give paces that multiply, and a range that is squared', () => {
    expect(evenPaces(10, 40, 3)).toEqual([10, expect.closeTo(20, 12), 40]);
    expect(speedRange(180, 60)).toBe(9);
    expect(() => evenPaces(10, 40, 1)).toThrow('count is 1');
  });
});

describe('the grip of a belt', () => {
  it('is Euler and Eytelwein’s, deeper in a groove', () => {
    expect(gripOf({ friction: 0.3 }, Math.PI)).toBeCloseTo(2.5663324, 6);
    expect(gripOf({ friction: 0.3, grooveHalfAngle: Math.PI / 6 }, Math.PI)).toBeCloseTo(
      2.5663324 ** 2,
      5,
    );
    expect(gripOf({ friction: 0 }, 9)).toBe(1);
    // The pull grows by itself times the friction with each bit of wrap.
    const slope =
      (gripOf({ friction: 0.4 }, 2 + 1e-6) - gripOf({ friction: 0.4 }, 2 - 1e-6)) / 2e-6;
    expect(slope).toBeCloseTo(0.4 * gripOf({ friction: 0.4 }, 2), 7);
    expect(() => gripOf({ friction: 1 }, 1e9)).toThrow('too large for a number');
  });

  it('tells how much wrap a pull needs, and which wheel lets go', () => {
    expect(gripOf({ friction: 0.25 }, wrapForGrip({ friction: 0.25 }, 3.1))).toBeCloseTo(3.1, 12);
    expect(gripOnWheels({ friction: 0.3 }, [3.7, 2.5], 2)).toEqual({
      outcome: 'holds',
      most: expect.closeTo(Math.exp(0.75), 12),
    });
    expect(gripOnWheels({ friction: 0.3 }, [3.7, 2.5], 2.2)).toMatchObject({
      outcome: 'slides',
      wheel: 1,
    });
    expect(() => wrapForGrip({ friction: 0 }, 2)).toThrow('friction is 0');
    expect(() => wrapForGrip({ friction: 0.3 }, 0.5)).toThrow('pullRatio over 1');
    expect(() => gripOnWheels({ friction: 0.3 }, [], 2)).toThrow('number of wheels is 0');
  });
});

describe('chains and toothed belts', () => {
  const chain = { pitch: 12.7, firstTeeth: 17, secondTeeth: 51 };

  it('lie on a polygon, and on an arc', () => {
    expect(sprocketDiameter(12.7, 17)).toBeCloseTo(69.1158276272, 8);
    expect(toothedPulleyDiameter(5, 40)).toBeCloseTo(63.6619772368, 8);
    expect(() => sprocketDiameter(12.7, 2)).toThrow('teeth is 2');
  });

  it('take the next even number of links, and centres to suit', () => {
    // Machinery's Handbook; case BL-CH-01.
    expect(chainLength(chain, 500)).toEqual({
      pitches: expect.closeTo(113.483915761, 7),
      links: 114,
      centreDistance: expect.closeTo(503.308177682, 7),
    });
    const exact = chainLength({ ...chain, secondTeeth: 17 }, 12.7 * 20);
    expect(exact).toMatchObject({ pitches: 57, links: 58 });
    expect(chainLength({ ...chain, firstTeeth: 18, secondTeeth: 18 }, 12.7 * 20)).toMatchObject({
      links: 58,
    });
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 300 }), (links) => {
        const centres = centresForLinks(chain, links);
        expect(
          centres.outcome === 'centres' && chainLength(chain, centres.distance).pitches,
        ).toBeCloseTo(links, 8);
      }),
      { seed: 34, numRuns: 100 },
    );
  });

  it('have too few links for any centres, by how many', () => {
    expect(centresForLinks(chain, 30)).toEqual({ outcome: 'too-few-links', lacking: 20 });
    expect(centresForLinks(chain, 50).outcome).toBe('centres');
    expect(
      chainLength({ pitch: 10, firstTeeth: 3, secondTeeth: 200 }, 1).centreDistance,
    ).toBeGreaterThan(0);
  });

  it('are whole teeth of a toothed belt, with the centres for them', () => {
    const belt = toothedBelt({ pitch: 5, firstTeeth: 20, secondTeeth: 40 }, 100);
    if (belt.outcome !== 'belt') throw new Error(belt.outcome);
    expect(belt.exactTeeth).toBeCloseTo(belt.length / 5, 12);
    expect(Math.abs(belt.teeth - belt.exactTeeth)).toBeLessThanOrEqual(0.5);
    const whole = toothedBelt({ pitch: 5, firstTeeth: 20, secondTeeth: 40 }, belt.centreDistance);
    expect(whole.outcome === 'belt' && whole.exactTeeth).toBeCloseTo(belt.teeth, 9);
    expect(toothedBelt({ pitch: 5, firstTeeth: 20, secondTeeth: 40 }, 10)).toMatchObject({
      outcome: 'wheels-meet',
    });
    expect(toothedBelt({ pitch: 5, firstTeeth: 20, secondTeeth: 20 }, 100 / Math.PI).outcome).toBe(
      'belt',
    );
  });
});
