import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { signedArea } from '@/lib/geometry/curve';
import { cross } from '@/lib/geometry/point';
import {
  caughtTip,
  pawlPin,
  pawlUnderLoad,
  ratchetOutline,
} from '@/lib/kinematics/intermittent/pawl';
import {
  ratchet,
  ratchetDrop,
  ratchetLift,
  ratchetStroke,
} from '@/lib/kinematics/intermittent/ratchet';
import { between, expectNear, outcome, runs, whole } from '@/tests/support/numbers';

const degree = Math.PI / 180;

describe('a ratchet', () => {
  it('is that of the worked example: z 20, 50°, D 60, q 3', () => {
    const stroke = outcome(ratchetStroke(20, 50 * degree), 'steps');
    expect(ratchet(20, 3).pitch / degree).toBeCloseTo(18, 12);
    expect(stroke.teeth).toBe(2);
    expect(stroke.turn / degree).toBeCloseTo(36, 12);
    expect(stroke.lost / degree).toBeCloseTo(14, 12);
    expect(ratchetLift(60, 20, 50 * degree)).toBeCloseTo(18.8, 1);
    expect(ratchetDrop(60, 20, 3)).toBeCloseTo(3.14, 2);
  });

  it('moves whole teeth and loses less than one', () => {
    fc.assert(
      fc.property(whole(3, 60), between(0, 3), (teeth, swing) => {
        const stroke = ratchetStroke(teeth, swing);
        if (stroke.outcome === 'no-tooth') {
          expectNear(stroke.lacking, (2 * Math.PI) / teeth - swing, 1e-12, 1);
          expect(ratchetLift(40, teeth, swing)).toBe(0);
          return;
        }
        expectNear(stroke.turn + stroke.lost, swing, 1e-8, 1);
        expect(stroke.lost).toBeLessThan((2 * Math.PI) / teeth);
        expect(Number.isInteger(stroke.teeth)).toBe(true);
      }),
      runs,
    );
  });

  it('counts a swing of exactly whole teeth as reached, and says that it is doubtful', () => {
    for (let k = 1; k < 24; k += 1) {
      const stroke = outcome(ratchetStroke(24, k * 15 * degree), 'steps');
      expect(stroke.teeth).toBe(k);
      expect(stroke.doubtful).toBe(true);
      expect(outcome(ratchetStroke(24, (k * 15 + 1) * degree), 'steps').doubtful).toBe(false);
    }
  });

  it('refuses nonsense', () => {
    expect(() => ratchet(12.5, 1)).toThrow('teeth is 12.5');
    expect(() => ratchet(12, 0)).toThrow('pawls is 0');
    expect(() => ratchetStroke(12, -1)).toThrow('swing is -1');
    expect(() => ratchetDrop(0, 12, 1)).toThrow('drumDiameter is 0');
    expect(() => ratchetLift(-1, 12, 1)).toThrow('drumDiameter is -1');
  });
});

describe('a pawl', () => {
  it('has its pin on the tangent', () => {
    fc.assert(
      fc.property(between(10, 200), between(10, 200), (radius, length) => {
        const { distance, angle } = pawlPin(radius, length);
        expectNear(distance * Math.cos(angle), radius, 1e-12);
        expectNear(distance * Math.sin(angle), length, 1e-12);
      }),
      runs,
    );
  });

  it.each([
    ['pushed, undercut', 60, 12, 'drawn-in'],
    ['pushed, radial', 60, 0, 'neutral'],
    ['pushed, leaning back', 60, -12, 'thrown-out'],
    ['pulled, undercut', -60, 12, 'drawn-in'],
    ['pulled, leaning back', -60, -12, 'thrown-out'],
  ] as const)('%s: as the statics of the lesson say', (_name, along, lean, wanted) => {
    const held = pawlUnderLoad({
      tipRadius: 80,
      pin: { x: 80, y: along },
      undercut: lean * degree,
    });
    expect(held.outcome).toBe(wanted);
    if (held.outcome !== 'neutral') expectNear(held.arm, 60 * Math.sin(12 * degree), 1e-12);
  });

  it('is thrown out once its pin moves past the square to the face', () => {
    const at = (x: number, y: number) =>
      pawlUnderLoad({ tipRadius: 80, pin: { x, y }, undercut: 12 * degree }).outcome;
    const reach = 60 * Math.tan(12 * degree);
    expect(at(80 - reach + 0.1, 60)).toBe('drawn-in');
    expect(at(80 - reach - 0.1, 60)).toBe('thrown-out');
    expect(at(80 + reach - 0.1, -60)).toBe('drawn-in');
    expect(at(80 + reach + 0.1, -60)).toBe('thrown-out');
    expect(at(120, 0)).toBe('neutral');
  });

  it('slides in from a caught tip where the undercut beats the friction', () => {
    expect(outcome(caughtTip(12 * degree, 0.25), 'stays-caught').lacking).toBeCloseTo(
      0.25 - Math.tan(12 * degree),
      14,
    );
    expect(caughtTip(20 * degree, 0.25).outcome).toBe('slides-in');
  });

  it('refuses nonsense', () => {
    expect(() => pawlPin(0, 1)).toThrow('tipRadius is 0');
    expect(() => pawlUnderLoad({ tipRadius: 80, pin: { x: 80, y: 0 }, undercut: 0 })).toThrow(
      'length is 0',
    );
    expect(() => pawlUnderLoad({ tipRadius: 80, pin: { x: 80, y: 5 }, undercut: 2 })).toThrow(
      'undercut is 2',
    );
    expect(() => caughtTip(0.1, -1)).toThrow('friction is -1');
  });
});

describe('the outline of a ratchet wheel', () => {
  const wheel = { teeth: 24, tipRadius: 80, depth: 8, undercut: 12 * degree };

  it('leans its faces by the undercut and keeps to its circles', () => {
    for (const undercut of [-10, 0, 12, 20]) {
      const { points } = outcome(
        ratchetOutline({ ...wheel, undercut: undercut * degree }),
        'outlined',
      );
      expect(points).toHaveLength(48);
      expect(signedArea(points)).toBeGreaterThan(0);
      const [tip, foot] = points;
      if (!tip || !foot) throw new Error('no tooth');
      const face = { x: foot.x - tip.x, y: foot.y - tip.y };
      expectNear(Math.atan2(cross({ x: -1, y: 0 }, face), -face.x) / degree, undercut, 1e-9, 1);
      expect(Math.hypot(foot.x, foot.y)).toBeCloseTo(72, 10);
    }
  });

  it('says by what angle a face would cut its tooth away', () => {
    expect(
      outcome(ratchetOutline({ ...wheel, teeth: 200, undercut: 50 * degree }), 'no-tooth-left').by,
    ).toBeGreaterThan(0);
    expect(
      outcome(ratchetOutline({ ...wheel, depth: 30, undercut: 45 * degree }), 'no-tooth-left').by,
    ).toBeGreaterThan(0);
    expect(() => ratchetOutline({ ...wheel, depth: 90 })).toThrow('depth is 90');
  });
});
