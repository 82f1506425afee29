import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { involuteOutline } from '@/lib/kinematics/gear/outline';
import {
  baseThickness,
  chordalTooth,
  pointedRadius,
  toothThickness,
} from '@/lib/kinematics/gear/thickness';
import { degree, gears } from './gears';

describe('the thickness of a tooth', () => {
  it('falls from base circle to point, and is what the outline shows', () => {
    const spec = { module: 4, teeth: 16, pressureAngle: 20 * degree, shift: 0.3 };
    // Case GR-TT-02.
    expect(toothThickness(spec, 36)).toEqual({
      outcome: 'tooth',
      thickness: expect.closeTo(3.64552301906, 10),
    });
    expect(baseThickness(spec)).toBeCloseTo(7.62146574257, 10);
    expect(pointedRadius(spec)).toBeCloseTo(38.5792086129, 9);
    for (const { x, y } of involuteOutline(spec).filter(
      (p) => p.x > 0 && Math.hypot(p.x, p.y) > 31,
    )) {
      const angle = Math.atan2(y, x);
      const tooth = toothThickness(spec, Math.min(Math.hypot(x, y), 37.2));
      if (Math.abs(angle) > Math.PI / 16 || tooth.outcome !== 'tooth') continue;
      expect(2 * Math.hypot(x, y) * Math.abs(angle)).toBeLessThanOrEqual(tooth.thickness + 1e-9);
    }
  });

  it('is refused inside the base circle and beyond the point, by how much', () => {
    const spec = { module: 3, teeth: 24, pressureAngle: 20 * degree };
    const base = 36 * Math.cos(20 * degree);
    expect(toothThickness(spec, base - 1)).toEqual({
      outcome: 'inside-base-circle',
      inside: expect.closeTo(1, 12),
    });
    expect(toothThickness(spec, 41)).toEqual({
      outcome: 'beyond-the-point',
      beyond: expect.closeTo(41 - 40.7601046136, 9),
    });
    expect(() => toothThickness(spec, 0)).toThrow('radius is 0');
    expect(() => pointedRadius({ ...spec, shift: -4 })).toThrow(
      'tooth thickness at the base circle',
    );
  });

  it('vanishes at the point and is the base thickness at the base, for any wheel', () => {
    fc.assert(
      fc.property(gears, (spec) => {
        const base = (spec.module * spec.teeth * Math.cos(spec.pressureAngle)) / 2;
        const atBase = toothThickness(spec, base * (1 + 1e-15));
        expect(atBase.outcome === 'tooth' && atBase.thickness / baseThickness(spec)).toBeCloseTo(
          1,
          6,
        );
        const atPoint = toothThickness(spec, pointedRadius(spec) * (1 - 1e-12));
        expect(atPoint.outcome === 'tooth' && atPoint.thickness / spec.module).toBeCloseTo(0, 8);
      }),
      { seed: 11, numRuns: 1000 },
    );
  });
});

describe('the chordal tooth', () => {
  it('is what SDP/SI tabulates', () => {
    // SDP/SI, Elements of Metric Gear Technology, Table 10-1: z 12, x 0.3, m 10 (case GR-CH-02).
    const { thickness, addendum } = chordalTooth({
      module: 10,
      teeth: 12,
      pressureAngle: 20 * degree,
      shift: 0.3,
    });
    expect(thickness).toBeCloseTo(17.8255684347, 9);
    expect(addendum).toBeCloseTo(13.6656736998, 9);
  });
});
