import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { beltRoundMany } from '@/lib/kinematics/belt/many-wheels';
import type { BeltWheel } from '@/lib/kinematics/belt/many-wheels';
import {
  bandsawBlade,
  beltLoop,
  centresForLoop,
  centresForWrap,
} from '@/lib/kinematics/belt/two-wheels';
import { stretchedAround } from './stretched';

const degree = Math.PI / 180;
const sizes = fc.double({ min: 20, max: 400, noNaN: true });
const lays = fc.constantFrom('open' as const, 'crossed' as const);

describe('a belt round two wheels', () => {
  it('has the length and wraps of the books, open and crossed', () => {
    // Khurmi and Gupta; cases BL-OP-01 and BL-CR-01.
    expect(beltLoop({ first: 300, second: 150, centreDistance: 800, lay: 'open' })).toEqual({
      outcome: 'loop',
      length: expect.closeTo(2313.89476053, 7),
      shortLength: expect.closeTo(2313.88959706, 7),
      firstWrap: expect.closeTo(190.758757982 * degree, 9),
      secondWrap: expect.closeTo(169.241242018 * degree, 9),
      run: expect.closeTo(Math.sqrt(800 ** 2 - 75 ** 2), 9),
    });
    const crossed = beltLoop({ first: 300, second: 150, centreDistance: 800, lay: 'crossed' });
    expect(crossed.outcome === 'loop' && crossed.length).toBeCloseTo(2370.56699845, 7);
    expect(crossed.outcome === 'loop' && crossed.firstWrap).toBeCloseTo(212.669645561 * degree, 9);
  });

  it('is as long as a cord stretched round both, when open', () => {
    for (const [first, second, centreDistance] of [
      [300, 150, 800],
      [560, 140, 450],
      [100, 100, 101],
    ] as const) {
      const loop = beltLoop({ first, second, centreDistance, lay: 'open' });
      const stretched = stretchedAround([
        { centre: { x: 0, y: 0 }, radius: first / 2 },
        { centre: { x: centreDistance, y: 0 }, radius: second / 2 },
      ]);
      expect(loop.outcome === 'loop' && loop.length / stretched).toBeCloseTo(1, 6);
    }
  });

  it('is the same the other way about, and as two wheels of many', () => {
    fc.assert(
      fc.property(
        sizes,
        sizes,
        fc.double({ min: 0, max: 900, noNaN: true }),
        lays,
        (first, second, gap, lay) => {
          const centreDistance = (first + second) / 2 + gap;
          const loop = beltLoop({ first, second, centreDistance, lay });
          const back = beltLoop({ first: second, second: first, centreDistance, lay });
          const many = beltRoundMany([
            { centre: { x: 3, y: 4 }, radius: first / 2 },
            {
              centre: { x: 3, y: 4 + centreDistance },
              radius: second / 2,
              side: lay === 'open' ? 'left' : 'right',
            },
          ]);
          if (loop.outcome !== 'loop' || back.outcome !== 'loop' || many.outcome !== 'belt') return;
          expect(loop.length / back.length).toBeCloseTo(1, 12);
          expect(loop.firstWrap).toBeCloseTo(back.secondWrap, 9);
          expect(many.length / loop.length).toBeCloseTo(1, 7);
        },
      ),
      { seed: 31, numRuns: 1000 },
    );
  });

  it('cannot be where the wheels meet, but can where they touch', () => {
    const touching = beltLoop({ first: 100, second: 50, centreDistance: 75, lay: 'crossed' });
    expect(touching).toMatchObject({ outcome: 'loop', run: 0, firstWrap: 2 * Math.PI });
    expect(touching.outcome === 'loop' && touching.length).toBeCloseTo(150 * Math.PI, 9);
    expect(beltLoop({ first: 100, second: 50, centreDistance: 70, lay: 'open' })).toEqual({
      outcome: 'wheels-meet',
      overlap: 5,
    });
    expect(() => beltLoop({ first: 0, second: 50, centreDistance: 70, lay: 'open' })).toThrow(
      'first is 0',
    );
  });

  it('gets its centres back from its length', () => {
    fc.assert(
      fc.property(
        sizes,
        sizes,
        fc.double({ min: 1e-3, max: 900, noNaN: true }),
        lays,
        (first, second, gap, lay) => {
          const centreDistance = (first + second) / 2 + gap;
          const loop = beltLoop({ first, second, centreDistance, lay });
          if (loop.outcome !== 'loop') throw new Error(loop.outcome);
          const centres = centresForLoop({ first, second, lay }, loop.length);
          expect(centres.outcome === 'centres' && centres.distance / centreDistance).toBeCloseTo(
            1,
            8,
          );
        },
      ),
      { seed: 32, numRuns: 1000 },
    );
    // Case BL-CL-02, exact and by the handbook's formula.
    expect(centresForLoop({ first: 500, second: 125, lay: 'open' }, 1800)).toEqual({
      outcome: 'centres',
      distance: expect.closeTo(358.935279712, 7),
      shortDistance: expect.closeTo(360.34473595, 7),
    });
  });

  it('is too short for any centres by a length', () => {
    const short = centresForLoop({ first: 100, second: 100, lay: 'open' }, 500);
    expect(short).toEqual({
      outcome: 'loop-too-short',
      lacking: expect.closeTo(200 + 100 * Math.PI - 500, 9),
    });
  });

  it('hugs the small wheel over an angle that sets the nearest centres', () => {
    const distance = centresForWrap(240, 60, 150 * degree);
    const loop = beltLoop({ first: 240, second: 60, centreDistance: distance, lay: 'open' });
    expect(loop.outcome === 'loop' && loop.secondWrap / degree).toBeCloseTo(150, 9);
    expect(centresForWrap(100, 100, 1)).toBe(100);
    expect(centresForWrap(240, 60, 30 * degree)).toBe(150);
    expect(() => centresForWrap(240, 60, 4)).toThrow('half a turn over wrap');
    expect(() => centresForWrap(240, 60, Math.PI)).toThrow('slope is 0');
  });

  it('is a blade on two equal wheels', () => {
    expect(bandsawBlade(350, 760)).toBeCloseTo(2619.55742876, 7);
    expect(() => bandsawBlade(350, 300)).toThrow('room between the wheels is -50');
  });
});

describe('a belt round many wheels', () => {
  const three: readonly BeltWheel[] = [
    { centre: { x: 0, y: 0 }, radius: 60 },
    { centre: { x: 400, y: 0 }, radius: 40 },
    { centre: { x: 150, y: 300 }, radius: 50 },
  ];

  it('is as long as a stretched cord, with wraps that make a whole turn', () => {
    const belt = beltRoundMany(three);
    if (belt.outcome !== 'belt') throw new Error(belt.outcome);
    // Case BL-TP-01.
    expect(belt.length).toBeCloseTo(1438.54826947, 7);
    expect(belt.length / stretchedAround(three)).toBeCloseTo(1, 6);
    expect(belt.wraps.reduce((sum, wrap) => sum + wrap, 0)).toBeCloseTo(2 * Math.PI, 12);
  });

  it('touches each wheel square to its radius, at both ends of each run', () => {
    const jockey: BeltWheel = { centre: { x: 310, y: 150 }, radius: 40, side: 'right' };
    const wheels = [three[0], three[1], jockey, three[2]].flatMap((wheel) =>
      wheel ? [wheel] : [],
    );
    const belt = beltRoundMany(wheels);
    if (belt.outcome !== 'belt') throw new Error(belt.outcome);
    belt.runs.forEach(({ from, to, length }, index) => {
      const along = { x: to.x - from.x, y: to.y - from.y };
      expect(Math.hypot(along.x, along.y)).toBeCloseTo(length, 9);
      for (const [point, wheel] of [
        [from, wheels[index]],
        [to, wheels[(index + 1) % wheels.length]],
      ] as const) {
        if (!wheel) throw new Error('no wheel');
        const [rx, ry] = [point.x - wheel.centre.x, point.y - wheel.centre.y];
        expect(Math.hypot(rx, ry)).toBeCloseTo(wheel.radius, 9);
        expect(rx * along.x + ry * along.y).toBeCloseTo(0, 6);
        expect(Math.sign(rx * along.y - ry * along.x)).toBe(wheel.side === 'right' ? -1 : 1);
      }
    });
    const plain = beltRoundMany(three);
    expect(belt.length).toBeGreaterThan(plain.outcome === 'belt' ? plain.length : Number.MAX_VALUE);
    expect(belt.wraps[2]).toBeGreaterThan(0);
  });

  it('misses a wheel that lies within its run, and a jockey that hangs outside it', () => {
    const inside: BeltWheel = { centre: { x: 200, y: 20 }, radius: 10 };
    const [a, b, c] = three;
    if (!a || !b || !c) throw new Error('three');
    expect(beltRoundMany([a, inside, b, c])).toMatchObject({ outcome: 'misses', wheel: 1 });
    const outside: BeltWheel = { centre: { x: 200, y: -150 }, radius: 10, side: 'right' };
    expect(beltRoundMany([a, outside, b, c])).toMatchObject({ outcome: 'misses', wheel: 1 });
  });

  it('crosses itself between three wheels if asked for no winding', () => {
    const [a, b, c] = three;
    if (!a || !b || !c) throw new Error('three');
    const eight = beltRoundMany([a, { ...b, side: 'right' }, c], 0);
    const sum =
      eight.outcome === 'belt'
        ? (eight.wraps[0] ?? 0) - (eight.wraps[1] ?? 0) + (eight.wraps[2] ?? 0)
        : 1;
    expect(sum).toBeCloseTo(0, 9);
  });

  it('cannot pass wheels that meet, and refuses fewer than two', () => {
    const meeting = { centre: { x: 90, y: 0 }, radius: 40 };
    expect(beltRoundMany([{ centre: { x: 0, y: 0 }, radius: 60 }, meeting])).toEqual({
      outcome: 'wheels-meet',
      wheel: 0,
      overlap: 10,
    });
    expect(() => beltRoundMany([meeting])).toThrow('number of wheels is 1');
    expect(() => beltRoundMany([meeting, { centre: { x: 900, y: 0 }, radius: 0 }])).toThrow(
      'radius is 0',
    );
  });
});
