import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Point, polar, rotate } from '@/lib/geometry/point';
import { signedArea } from '@/lib/geometry/curve';
import { genevaCrankAngle, genevaLayout, genevaState } from '@/lib/kinematics/intermittent/geneva';
import { genevaArbor, genevaEntry, genevaWood } from '@/lib/kinematics/intermittent/geneva-making';
import {
  genevaLockOutline,
  genevaWheelOutline,
} from '@/lib/kinematics/intermittent/geneva-outline';
import { between, derivative, expectNear, outcome, runs, whole } from '@/tests/support/numbers';

const kind = fc.constantFrom('outside' as const, 'inside' as const);
const degree = Math.PI / 180;

describe('a Geneva wheel', () => {
  it('is that of the worked example: n 5, a 45, c 76.6, R 61.9, moves for 108°', () => {
    const layout = genevaLayout('outside', 5, 45);
    expect(layout.centreDistance).toBeCloseTo(76.6, 1);
    expect(layout.mouthRadius).toBeCloseTo(61.9, 1);
    expect(layout.motionAngle / degree).toBeCloseTo(108, 10);
  });

  it.each(['outside', 'inside'] as const)('%s has the derivatives that it says', (which) => {
    fc.assert(
      fc.property(whole(3, 16), between(-0.97, 0.97), (slots, share) => {
        const angle = (share * genevaLayout(which, slots, 1).motionAngle) / 2;
        const at = (x: number) => genevaState(which, slots, x);
        const step = 1e-5;
        expectNear(
          derivative((x) => at(x).wheelAngle, angle, step),
          at(angle).speedRatio,
          1e-7,
          1,
        );
        expectNear(
          derivative((x) => at(x).speedRatio, angle, step),
          at(angle).acceleration,
          1e-6,
          10,
        );
      }),
      runs,
    );
  });

  it('carries the pin in its slot while it moves', () => {
    fc.assert(
      fc.property(kind, whole(3, 16), between(-1, 1), (which, slots, share) => {
        const { centreDistance: c, motionAngle } = genevaLayout(which, slots, 10);
        const angle = (share * motionAngle) / 2;
        const { wheelAngle } = genevaState(which, slots, angle);
        // seen from the wheel's arbor, the crank's at c on +x outside, at −c inside
        const pin =
          which === 'outside'
            ? { x: c - 10 * Math.cos(angle), y: 10 * Math.sin(angle) }
            : { x: c + 10 * Math.cos(angle), y: 10 * Math.sin(angle) };
        expectNear(Math.atan2(pin.y, pin.x), wheelAngle, 1e-12, 1);
      }),
      runs,
    );
  });

  it('turns one step in a change, from rest to rest, and rests for the remainder', () => {
    fc.assert(
      fc.property(kind, whole(3, 30), (which, slots) => {
        const { motionAngle, dwellAngle, entryAcceleration } = genevaLayout(which, slots, 1);
        const entry = genevaState(which, slots, (-motionAngle / 2) * (1 - 1e-14));
        expectNear(entry.wheelAngle, -Math.PI / slots, 1e-9);
        expect(entry.speedRatio).toBeCloseTo(0, 9);
        expectNear(entry.acceleration, entryAcceleration, 1e-9);
        expectNear(motionAngle + dwellAngle, 2 * Math.PI, 1e-14);
        const rest = genevaState(which, slots, motionAngle / 2 + 0.01);
        expect(rest).toEqual({
          outcome: 'resting',
          wheelAngle: Math.PI / slots,
          speedRatio: 0,
          acceleration: 0,
        });
        expect(genevaState(which, slots, 2 * Math.PI).speedRatio).toBeCloseTo(
          genevaLayout(which, slots, 1).peakSpeedRatio,
          10,
        );
      }),
      runs,
    );
  });

  it('has its greatest acceleration where it says', () => {
    fc.assert(
      fc.property(kind, whole(3, 20), (which, slots) => {
        const { motionAngle, peakAcceleration, angleAtPeak } = genevaLayout(which, slots, 1);
        for (let i = -200; i <= 200; i += 1) {
          const { acceleration } = genevaState(which, slots, (motionAngle / 2) * (i / 200));
          expect(Math.abs(acceleration)).toBeLessThanOrEqual(peakAcceleration * (1 + 1e-12));
        }
        expectNear(
          Math.abs(genevaState(which, slots, angleAtPeak * (1 - 1e-14)).acceleration),
          peakAcceleration,
          1e-9,
        );
      }),
      { ...runs, numRuns: 40 },
    );
  });

  it('is undone by its inverse', () => {
    fc.assert(
      fc.property(kind, whole(3, 16), between(-0.999, 0.999), (which, slots, share) => {
        const angle = (share * genevaLayout(which, slots, 1).motionAngle) / 2;
        const { wheelAngle } = genevaState(which, slots, angle);
        const back = genevaState(which, slots, genevaCrankAngle(which, slots, wheelAngle));
        expectNear(back.wheelAngle, wheelAngle, 1e-7, 1);
      }),
      runs,
    );
  });

  it('refuses nonsense', () => {
    expect(() => genevaLayout('outside', 2, 10)).toThrow('slots is 2');
    expect(() => genevaLayout('outside', 6, 0)).toThrow('crank is 0');
    expect(() => genevaState('inside', 6, Number.NaN)).toThrow('crankAngle is NaN');
    expect(() => genevaCrankAngle('outside', 4, 0.8)).toThrow('wheelAngle is 0.8');
  });
});

describe('the making of a Geneva wheel', () => {
  it('knocks when the arbors are near: 0.5 mm at a = 50, n = 6 is a blow of 10 %', () => {
    const entry = outcome(genevaEntry(6, 50, 99.5), 'enters');
    expect(entry.blow).toBeCloseTo(0.1, 3);
    expect(entry.angle).toBeCloseTo(Math.acos(0.995), 12);
    expect(outcome(genevaEntry(6, 50, 100), 'enters').angle).toBeCloseTo(0, 6);
    expect(outcome(genevaEntry(6, 50, 100.4), 'misses').gap).toBeCloseTo(0.2, 12);
  });

  it('keeps wood at floor, horn and arbor, and rocks by its clearance', () => {
    const wood = genevaWood({ slots: 6, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 });
    expect(wood.floor).toBeCloseTo(46, 12);
    expect(wood.slotLength).toBeCloseTo(50 + 50 * Math.sqrt(3) - 100, 12);
    expect(wood.horn).toBe(8);
    expect(wood.play / degree).toBeCloseTo(0.2, 2);
    expect(wood.cutOut / degree).toBeCloseTo(120, 10);
    expect(genevaArbor(3, 50, 8, 6)).toMatchObject({ outcome: 'no-wood' });
    expectNear(
      outcome(genevaArbor(3, 50, 8, 6), 'no-wood').by,
      10 - 100 / Math.sqrt(3) + 50,
      1e-12,
    );
  });

  it('refuses nonsense', () => {
    expect(() => genevaEntry(6, 50, 0)).toThrow('centreDistance is 0');
    expect(() => genevaArbor(6, 50, 8, -1)).toThrow('wood is -1');
    expect(() =>
      genevaWood({ slots: 400, crank: 1, pin: 1, lockRadius: 1, lockClearance: 0 }),
    ).toThrow('slots is 400');
  });
});

function inside(outline: readonly Point[], { x, y }: Point): boolean {
  let odd = false;
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length] ?? a;
    if (a.y > y !== b.y > y && x < a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x)) odd = !odd;
  });
  return odd;
}

describe.each([4, 5, 6, 8])('the outlines of a Geneva pair of %s slots', (slots) => {
  const make = { slots, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 };
  const wheel = outcome(genevaWheelOutline(make, 0.4), 'outlined').points;
  const lock = outcome(genevaLockOutline(make), 'outlined').points;
  const distance = genevaLayout('outside', slots, 50).centreDistance;

  it('run counter-clockwise and repeat themselves by steps', () => {
    expect(signedArea(wheel)).toBeGreaterThan(0);
    expect(signedArea(lock)).toBeGreaterThan(0);
    const step = wheel.length / slots;
    const turned = rotate(wheel[3] ?? { x: 0, y: 0 }, (2 * Math.PI) / slots);
    expect(wheel[3 + step]?.x).toBeCloseTo(turned.x, 9);
    expect(wheel[3 + step]?.y).toBeCloseTo(turned.y, 9);
  });

  it('let pin and lock disc pass without a clash through a whole turn', () => {
    // the wheel's arbor at the origin, the crank's on +x, turning clockwise so the wheel turns with y
    for (let i = 0; i < 180; i += 1) {
      const angle = -Math.PI + (i * 2 * Math.PI) / 180;
      const { wheelAngle } = genevaState('outside', slots, angle);
      const standing = wheel.map((point) => rotate(point, wheelAngle));
      const place = (point: Point) => {
        const turned = rotate(point, Math.PI - angle);
        return { x: turned.x + distance, y: turned.y };
      };
      const disc = lock.map(place);
      for (const point of disc) expect(inside(standing, point)).toBe(false);
      const pin = Array.from({ length: 12 }, (_, k) =>
        place(polar(4, (k * Math.PI) / 6, { x: 50, y: 0 })),
      );
      for (const point of pin) expect(inside(standing, point)).toBe(false);
    }
  });
});

describe('an outline that cannot be', () => {
  const make = { slots: 6, crank: 50, pin: 8, lockRadius: 38, lockClearance: 0.3 };

  it('says what wood is missing', () => {
    expect(outcome(genevaWheelOutline({ ...make, lockRadius: 47 }), 'no-horn').by).toBeCloseTo(
      1,
      12,
    );
    expect(outcome(genevaLockOutline({ ...make, lockRadius: 47 }), 'no-horn').by).toBeCloseTo(
      1,
      12,
    );
    expect(
      outcome(
        genevaWheelOutline({ ...make, slots: 3, pin: 20, lockRadius: 10 }),
        'no-wood-at-arbor',
      ).by,
    ).toBeGreaterThan(2);
    expect(outcome(genevaLockOutline({ ...make, lockClearance: 40 }), 'no-wood-at-arbor').by).toBe(
      2,
    );
    expect(() => genevaWheelOutline(make, -1)).toThrow('slotClearance is -1');
  });
});
