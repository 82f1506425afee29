import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { wheelFromPitch, wholeTeethRound } from '@/lib/kinematics/gear/circular-pitch';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import {
  basicRack,
  diametralSizes,
  moduleFromDiametralPitch,
  moduleOfFoundWheel,
  moduleSeries,
  nearestModule,
} from '@/lib/kinematics/gear/standards';
import { degree, gears } from './gears';

describe('the proportions of a wheel', () => {
  it('are those of ISO 53 and ISO 21771', () => {
    // Case GR-BA-02.
    const sizes = gearProportions({
      module: 2,
      teeth: 12,
      pressureAngle: 20 * degree,
      shift: 0.35,
    });
    expect(sizes.tipDiameter).toBeCloseTo(29.4, 12);
    expect(sizes.rootDiameter).toBeCloseTo(20.4, 12);
    expect(sizes.baseDiameter).toBeCloseTo(22.5526228989, 9);
    expect(sizes.thickness).toBeCloseTo(3.65115098156, 9);
    expect(sizes.basePitch).toBeCloseTo(5.90426286819, 9);
  });

  it('keep their relations for any wheel, and scale with the module', () => {
    fc.assert(
      fc.property(gears, fc.constantFrom(1e-9, 1e9), (spec, factor) => {
        const sizes = gearProportions(spec);
        expect((sizes.tipDiameter - sizes.rootDiameter) / 2 / sizes.depth).toBeCloseTo(1, 9);
        expect((sizes.pitch * spec.teeth) / Math.PI / sizes.pitchDiameter).toBeCloseTo(1, 12);
        expect(sizes.basePitch / sizes.pitch).toBeCloseTo(
          sizes.baseDiameter / sizes.pitchDiameter,
          12,
        );
        const scaled = gearProportions({ ...spec, module: spec.module * factor });
        expect(scaled.thickness / sizes.thickness / factor).toBeCloseTo(1, 12);
      }),
      { seed: 12, numRuns: 1000 },
    );
  });

  it('are refused for nonsense, by name', () => {
    const spec = { module: 2, teeth: 12, pressureAngle: 20 * degree };
    expect(() => gearProportions({ ...spec, teeth: 2 })).toThrow('gearProportions: teeth is 2');
    expect(() => gearProportions({ ...spec, shift: Number.NaN })).toThrow('shift is NaN');
    expect(() => gearProportions({ ...spec, clearance: -0.1 })).toThrow('clearance is -0.1');
    expect(() => gearProportions({ ...spec, addendum: 0 })).toThrow('addendum is 0');
    expect(() => gearProportions({ ...spec, pressureAngle: 0 })).toThrow('pressureAngle is 0');
  });
});

describe('the standards', () => {
  it('give the four basic racks, and the two series of modules', () => {
    expect(basicRack(4, 'A').filletRadius).toBeCloseTo(1.52, 12);
    expect(basicRack(2, 'B')).toMatchObject({ filletRadius: 0.6, dedendum: 2.5, clearance: 0.5 });
    expect(basicRack(2, 'C')).toMatchObject({ filletRadius: 0.5, addendum: 2 });
    expect(basicRack(2.5, 'D').dedendum).toBeCloseTo(3.5, 12);
    expect(basicRack(2.5, 'D').filletRadius).toBeCloseTo(0.975, 12);
    expect([1, 1.75, 2, 3, 3.25, 3.5, 4.5, 6, 6.5, 50, 45].map(moduleSeries)).toEqual([
      1, 2, 1, 1, 0, 2, 2, 1, 2, 1, 2,
    ]);
    expect(nearestModule(2.94)).toBe(3);
    expect(nearestModule(100)).toBe(50);
  });

  it('turn module into diametral pitch and back', () => {
    for (const pitch of [2, 6, 12, 24]) {
      expect(moduleFromDiametralPitch(moduleFromDiametralPitch(pitch))).toBeCloseTo(pitch, 12);
    }
    expect(moduleOfFoundWheel(78, 24)).toBe(3);
  });

  it('give coarse and fine teeth by diametral pitch their own clearance', () => {
    // ANSI/AGMA B6.1 up to 20 to the inch, B6.7 from there (from memory; cases GR-DP-02, 03).
    expect(diametralSizes(8, 20)).toMatchObject({
      outsideDiameter: 2.75,
      dedendum: 0.15625,
      wholeDepth: 0.28125,
    });
    expect(diametralSizes(32, 48).dedendum).toBeCloseTo(0.0395, 12);
    expect(diametralSizes(32, 48).wholeDepth).toBeCloseTo(0.07075, 12);
    expect(diametralSizes(20, 20).clearance).toBeCloseTo(0.012, 12);
    expect(diametralSizes(12, 36).pitchDiameter).toBe(3);
  });
});

describe('teeth round a circle', () => {
  it('are stepped with the chord, not the arc', () => {
    // Case GR-CP-02.
    expect(wheelFromPitch(20, 9)).toEqual({
      pitchDiameter: expect.closeTo(57.2957795131, 9),
      module: expect.closeTo(6.36619772368, 9),
      chord: expect.closeTo(19.596310721, 9),
    });
  });

  it('are as many as fit whole, with the rest told', () => {
    const fit = wholeTeethRound(200, 20);
    expect(fit).toMatchObject({ outcome: 'teeth', teeth: 31 });
    if (fit.outcome !== 'teeth') return;
    expect(fit.pitch * 31).toBeCloseTo(Math.PI * 200, 9);
    expect(fit.leftOver).toBeCloseTo(Math.PI * 200 - 620, 9);
    expect(fit.diameter).toBeCloseTo(197.352, 3);
    expect(fit.nextDiameter).toBeCloseTo(203.718, 3);
    expect(fit.chord).toBeCloseTo(200 * Math.sin(Math.PI / 31), 12);
    expect(wholeTeethRound((20 * 31) / Math.PI, 20)).toMatchObject({ teeth: 31, leftOver: 0 });
    expect(wholeTeethRound(10, 20)).toEqual({
      outcome: 'too-small',
      lacking: expect.closeTo(60 / Math.PI - 10, 12),
    });
    expect(() => wholeTeethRound(-1, 20)).toThrow('diameter is -1');
  });
});
