import { describe, expect, it } from 'vitest';
import { involuteOutline, toothLimits } from '@/lib/kinematics/gear/outline';
import type { OutlineSpec } from '@/lib/kinematics/gear/outline';
import { gearProportions } from '@/lib/kinematics/gear/proportions';
import { rackClearance } from './rolling-rack';

const degree = Math.PI / 180;
const wheels: readonly (readonly [string, OutlineSpec])[] = [
  ['24 teeth at 20°', { module: 3, teeth: 24, pressureAngle: 20 * degree }],
  ['6 leaves, deeply undercut', { module: 5, teeth: 6, pressureAngle: 20 * degree }],
  ['8 leaves at 14.5°', { module: 4, teeth: 8, pressureAngle: 14.5 * degree }],
  ['10 leaves, shifted clear', { module: 2, teeth: 10, pressureAngle: 20 * degree, shift: 0.5 }],
  ['12 leaves, shifted inwards', { module: 2, teeth: 12, pressureAngle: 20 * degree, shift: -0.5 }],
  ['30 teeth at 25° with a full round root', { module: 1, teeth: 30, pressureAngle: 25 * degree }],
  ['20 teeth shifted by a module', { module: 1, teeth: 20, pressureAngle: 20 * degree, shift: 1 }],
  ['60 teeth thinned', { module: 2, teeth: 60, pressureAngle: 20 * degree, backlash: 0.2 }],
  ['16 stub teeth', { module: 6, teeth: 16, pressureAngle: 20 * degree, addendum: 0.8 }],
];

describe('the outline of a wheel', () => {
  it.each(wheels)('of %s is what a rolling rack leaves', (_name, spec) => {
    const pitch = (2 * Math.PI) / spec.teeth;
    const { tipRadius } = toothLimits(spec);
    const sides = involuteOutline(spec).filter((point) => {
      const angle = Math.atan2(point.y, point.x);
      const onTip = Math.hypot(point.x, point.y) > tipRadius * (1 - 1e-9);
      return angle > 0 && angle <= pitch / 2 && !onTip;
    });
    expect(sides.length).toBeGreaterThan(12);
    for (const point of sides) {
      expect(Math.abs(rackClearance(spec, point)) / spec.module).toBeLessThan(2e-6);
    }
  });

  it.each(wheels)('of %s runs counter-clockwise, once, between root and tip', (_name, spec) => {
    const outline = involuteOutline(spec);
    const { rootDiameter } = gearProportions(spec);
    const { tipRadius } = toothLimits(spec);
    let turned = 0;
    let area = 0;
    outline.forEach((point, index) => {
      const next = outline[(index + 1) % outline.length] ?? point;
      const cross = point.x * next.y - point.y * next.x;
      area += cross / 2;
      turned += Math.atan2(cross, point.x * next.x + point.y * next.y);
      const radius = Math.hypot(point.x, point.y);
      expect(radius).toBeGreaterThan((rootDiameter / 2) * (1 - 1e-9));
      expect(radius).toBeLessThan(tipRadius * (1 + 1e-9));
    });
    expect(turned).toBeCloseTo(2 * Math.PI, 9);
    expect(area).toBeGreaterThan((Math.PI * rootDiameter ** 2) / 4);
    expect(area).toBeLessThan(Math.PI * tipRadius ** 2);
  });

  it('has a tooth on +x, is its own mirror image, and repeats each pitch', () => {
    const outline = involuteOutline({ module: 3, teeth: 9, pressureAngle: 20 * degree });
    const nearest = (x: number, y: number) =>
      Math.min(...outline.map((point) => Math.hypot(point.x - x, point.y - y)));
    const turn = (2 * Math.PI) / 9;
    for (const { x, y } of outline.slice(0, outline.length / 9)) {
      expect(nearest(x, -y)).toBeLessThan(1e-9);
      const [cosine, sine] = [Math.cos(turn), Math.sin(turn)];
      expect(nearest(x * cosine - y * sine, x * sine + y * cosine)).toBeLessThan(1e-9);
    }
    expect(nearest(16.5, 0)).toBeLessThan(1e-9);
  });

  it('cuts each tooth as thick on the pitch circle as the proportions say, less the backlash', () => {
    const spec = { module: 4, teeth: 30, pressureAngle: 20 * degree, shift: 0.2, backlash: 0.3 };
    const flank = involuteOutline({ ...spec, flankSteps: 4000 });
    const onPitch = flank
      .filter(({ x, y }) => y > 0 && Math.atan2(y, x) < Math.PI / 30)
      .reduce((best, point) =>
        Math.abs(Math.hypot(point.x, point.y) - 60) < Math.abs(Math.hypot(best.x, best.y) - 60)
          ? point
          : best,
      );
    const thickness = 2 * 60 * Math.atan2(onPitch.y, onPitch.x);
    expect(thickness).toBeCloseTo(gearProportions(spec).thickness - 0.3, 2);
  });

  it('scales with the module over eighteen decades', () => {
    const spec = { module: 1, teeth: 7, pressureAngle: 20 * degree };
    for (const factor of [1e-9, 1e9]) {
      const large = involuteOutline({ ...spec, module: factor });
      involuteOutline(spec).forEach((point, index) => {
        expect(large[index]?.x).toBeCloseTo(point.x * factor, factor > 1 ? -1 : 12);
      });
    }
  });

  it('tells undercut, pointed tips and where the involute begins, with amounts', () => {
    // At 20° a rack undercuts 10 teeth until they are shifted by 0.41511 (case GR-MX-01).
    expect(
      toothLimits({ module: 1, teeth: 10, pressureAngle: 20 * degree }).undercutBy,
    ).toBeCloseTo(0.415111107797, 10);
    const cleared = { module: 1, teeth: 10, pressureAngle: 20 * degree, shift: 0.4151111078 };
    expect(toothLimits(cleared).undercutBy).toBe(0);
    expect(toothLimits(cleared).formRadius).toBeCloseTo(5 * Math.cos(20 * degree), 5);
    // Case GR-TT-02: 16 teeth of module 4 with x = 0.3 would be pointed at 38.5792086.
    const tall = { module: 4, teeth: 16, pressureAngle: 20 * degree, shift: 0.3, addendum: 1.5 };
    const { tipRadius, pointedBy } = toothLimits(tall);
    expect(tipRadius).toBeCloseTo(38.5792086129, 9);
    expect(pointedBy).toBeCloseTo(39.2 - 38.5792086129, 9);
  });

  it('refuses a wheel without teeth, spaces or sense', () => {
    const spec = { module: 2, teeth: 20, pressureAngle: 20 * degree };
    expect(() => involuteOutline({ ...spec, teeth: 12.5 })).toThrow(
      'involuteOutline: teeth is 12.5',
    );
    expect(() => involuteOutline({ ...spec, module: Number.NaN })).toThrow('module is NaN');
    expect(() => involuteOutline({ ...spec, backlash: 9 })).toThrow('tooth thickness');
    expect(() => involuteOutline({ ...spec, backlash: -3 })).toThrow('corner of the cutting rack');
    expect(() => involuteOutline({ ...spec, pressureAngle: 1.2 })).toThrow('pressureAngle is 1.2');
    expect(() => involuteOutline({ ...spec, teeth: 4, shift: -2 })).toThrow('root radius');
  });
});
