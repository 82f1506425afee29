import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  betweenPins,
  overPins,
  rackOverPin,
  shiftFromSpan,
  spanMeasurement,
  teethToSpan,
} from '@/lib/kinematics/gear/measurement';
import { involuteOutline } from '@/lib/kinematics/gear/outline';
import { ringOutline } from '@/lib/kinematics/gear/ring';
import { degree, gears } from './gears';

describe('a span over teeth', () => {
  it('is the base tangent length of the tables', () => {
    // Machinery's Handbook and cases GR-SP-01 to 03.
    expect(
      spanMeasurement({ module: 1, teeth: 30, pressureAngle: 20 * degree }, 4).span,
    ).toBeCloseTo(10.7526262055, 9);
    const shifted = { module: 3, teeth: 24, pressureAngle: 20 * degree, shift: 0.4 };
    expect(spanMeasurement(shifted, 3).span).toBeCloseTo(23.9702329464, 9);
  });

  it('touches the flanks near the pitch circle for the number of teeth advised', () => {
    fc.assert(
      fc.property(gears, (spec) => {
        const plain = { ...spec, shift: 0 };
        const { touchesAt } = spanMeasurement(plain, teethToSpan(plain));
        expect(Math.abs(touchesAt / spec.module - spec.teeth / 2)).toBeLessThan(1.5);
      }),
      { seed: 16, numRuns: 1000 },
    );
    const spec = { module: 1, teeth: 30, pressureAngle: 20 * degree };
    expect(teethToSpan(spec)).toBe(4);
    expect(spanMeasurement(spec, 4).onFlank).toBe(true);
    expect(spanMeasurement(spec, 9).onFlank).toBe(false);
  });

  it('tells the shift of a wheel that was cut', () => {
    fc.assert(
      fc.property(gears, (spec) => {
        const { span } = spanMeasurement(spec, 2);
        if (span > 0) expect(shiftFromSpan(spec, 2, span)).toBeCloseTo(spec.shift ?? 0, 6);
      }),
      { seed: 17, numRuns: 500 },
    );
  });
});

describe('pins in tooth spaces', () => {
  it('read as the handbook has it, even and odd', () => {
    // Machinery's Handbook, pins of 1.728/P (cases GR-OP-01 re-read, GR-OP-03).
    const even = overPins({ module: 1, teeth: 32, pressureAngle: 20 * degree }, 1.728);
    expect(even.outcome === 'reading' && even.reading).toBeCloseTo(34.4129778952, 9);
    const odd = overPins({ module: 3, teeth: 25, pressureAngle: 20 * degree, shift: 0.2 }, 5.5);
    expect(odd.outcome === 'reading' && odd.reading).toBeCloseTo(84.0744985568, 8);
    const inside = betweenPins({ module: 3, teeth: 60, pressureAngle: 20 * degree }, 4.32);
    expect(inside.outcome === 'reading' && inside.reading).toBeCloseTo(175.994288687, 8);
    const oddInside = betweenPins({ module: 3, teeth: 61, pressureAngle: 20 * degree }, 4.32);
    if (oddInside.outcome !== 'reading') throw new Error(oddInside.outcome);
    expect(oddInside.reading).toBeCloseTo(oddInside.pinCircle * Math.cos(Math.PI / 122) - 4.32, 9);
  });

  it('touch the outline that is drawn: a wheel from outside, a ring from inside', () => {
    const spec = { module: 2, teeth: 20, pressureAngle: 20 * degree };
    const space = Math.PI / 20;
    const over = overPins(spec, 3.5);
    if (over.outcome !== 'reading') throw new Error(over.outcome);
    const centre = {
      x: (over.pinCircle / 2) * Math.cos(space),
      y: (over.pinCircle / 2) * Math.sin(space),
    };
    const near = involuteOutline({ ...spec, flankSteps: 3000 }).reduce(
      (least, { x, y }) => Math.min(least, Math.hypot(x - centre.x, y - centre.y)),
      Number.MAX_VALUE,
    );
    expect(near).toBeCloseTo(1.75, 5);
    const ring = { module: 2, teeth: 50, pressureAngle: 20 * degree };
    const between = betweenPins(ring, 3.2);
    if (between.outcome !== 'reading') throw new Error(between.outcome);
    const half = between.pinCircle / 2;
    const [x0, y0] = [half * Math.cos(Math.PI / 50), half * Math.sin(Math.PI / 50)];
    const inner = ringOutline({ ...ring, flankSteps: 3000 }).reduce(
      (least, { x, y }) => Math.min(least, Math.hypot(x - x0, y - y0)),
      Number.MAX_VALUE,
    );
    expect(inner).toBeCloseTo(1.6, 5);
  });

  it('fall through when thin, and stay out of a ring when thick', () => {
    const spec = { module: 3, teeth: 24, pressureAngle: 20 * degree };
    const thin = overPins(spec, 1);
    expect(thin.outcome).toBe('pin-too-thin');
    if (thin.outcome === 'pin-too-thin') {
      expect(overPins(spec, 1 + thin.lacking * 1.000001).outcome).toBe('reading');
      expect(overPins(spec, 1 + thin.lacking * 0.99).outcome).toBe('pin-too-thin');
    }
    const thick = betweenPins(spec, 9);
    expect(thick.outcome).toBe('pin-too-thick');
    if (thick.outcome === 'pin-too-thick') {
      expect(betweenPins(spec, 9 - thick.excess * 1.000001).outcome).toBe('reading');
    }
    expect(() => overPins(spec, 0)).toThrow('pin is 0');
  });

  it('stand in the space of a rack as the V says', () => {
    expect(rackOverPin({ module: 3, pressureAngle: 20 * degree }, 5)).toBeCloseTo(3.33591984276, 9);
    const large = overPins({ module: 3, teeth: 1_000_000, pressureAngle: 20 * degree }, 5);
    if (large.outcome !== 'reading') throw new Error(large.outcome);
    expect(large.reading / 2 - 1_500_000).toBeCloseTo(3.33591984276, 4);
    expect(() => rackOverPin({ module: 0, pressureAngle: 0.3 }, 5)).toThrow('module is 0');
  });
});
