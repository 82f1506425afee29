import fc from 'fast-check';
import type { GearSpec } from '@/lib/kinematics/gear/proportions';

export const degree = Math.PI / 180;

/** Wheels that can be made: no root at the centre, a tooth left at every shift. */
export const gears: fc.Arbitrary<GearSpec> = fc.record({
  module: fc.double({ min: 1e-3, max: 1e3, noNaN: true }),
  teeth: fc.integer({ min: 6, max: 300 }),
  pressureAngle: fc.double({ min: 12 * degree, max: 28 * degree, noNaN: true }),
  shift: fc.double({ min: -0.4, max: 0.8, noNaN: true }),
});
