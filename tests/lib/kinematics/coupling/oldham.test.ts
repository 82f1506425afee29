import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { oldhamCoupling, oldhamFit, oldhamMotion } from '@/lib/kinematics/coupling/oldham';
import { between, derivative, expectNear, runs } from '@/tests/support/numbers';

describe('an Oldham coupling', () => {
  it('keeps its disc’s middle on both tongues and on the circle through both shafts', () => {
    fc.assert(
      fc.property(between(0, 40), between(-9, 9), (offset, angle) => {
        const { centre, drivingSlide, drivenSlide } = oldhamCoupling(offset, angle);
        const [s, c] = [Math.sin(angle), Math.cos(angle)];
        expectNear(centre.x, drivingSlide * c, 1e-14, 40);
        expectNear(centre.y, drivingSlide * s, 1e-14, 40);
        // the driven tongue is square to the driving one, through the driven shaft
        expectNear(centre.x - offset, -drivenSlide * s, 1e-13, 40);
        expectNear(centre.y, drivenSlide * c, 1e-13, 40);
        expectNear(Math.hypot(centre.x - offset / 2, centre.y), offset / 2, 1e-13, 40);
      }),
      runs,
    );
  });

  it('runs its disc’s middle round twice a turn and its tongues at e·ω at most', () => {
    const { pathRadius, pathSpeed, greatestSlidingSpeed, slideTravel } = oldhamMotion(12, -6);
    const at = (t: number) => oldhamCoupling(12, -6 * t);
    const speed = Math.hypot(
      derivative((t) => at(t).centre.x, 0.3),
      derivative((t) => at(t).centre.y, 0.3),
    );
    expectNear(speed, pathRadius * Math.abs(pathSpeed), 1e-6);
    const slides = Array.from({ length: 721 }, (_, i) => (i * Math.PI) / 360).map(
      (t) => derivative((x) => oldhamCoupling(12, x).drivenSlide, t) * 6,
    );
    expectNear(
      slides.reduce((a, b) => Math.max(a, b)),
      greatestSlidingSpeed,
      1e-6,
    );
    expect(slideTravel).toBe(24);
    expect(oldhamCoupling(12, 1.2).drivenAngle).toBe(1.2);
  });

  it('is that of the worked example: overlap 108, hole 132 for e 12, D 120', () => {
    expect(oldhamFit({ diameter: 120, thickness: 20, grooveDepth: 8 }, 12)).toEqual({
      outcome: 'engages',
      overlap: 108,
      hole: 132,
      web: 4,
    });
    expect(oldhamFit({ diameter: 120, thickness: 20, grooveDepth: 8 }, 123)).toEqual({
      outcome: 'parts',
      by: 3,
    });
  });

  it('refuses nonsense', () => {
    expect(() => oldhamCoupling(-1, 0)).toThrow('offset is -1');
    expect(() => oldhamMotion(1, Number.NaN)).toThrow('speed is NaN');
    expect(() => oldhamMotion(1e300, 1e300)).toThrow(RangeError);
    expect(() => oldhamFit({ diameter: 0, thickness: 1, grooveDepth: 0 }, 0)).toThrow(
      'diameter is 0',
    );
  });
});
