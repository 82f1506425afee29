import { describe, expect, it } from 'vitest';
import { distance, polar, rotate, type Point } from '@/lib/geometry/point';
import { genevaLayout, genevaState } from '@/lib/kinematics/intermittent/geneva';
import { genevaRingOutline, genevaTailOutline } from '@/lib/kinematics/intermittent/geneva-inside';
import { outcome } from '@/tests/support/numbers';

/** Whether a point lies within a closed outline: by counting the edges that it sees on one side. */
function inside(outline: readonly Point[], { x, y }: Point): boolean {
  let within = false;
  outline.forEach((a, k) => {
    const b = outline[(k + 1) % outline.length] ?? a;
    const crosses = a.y > y !== b.y > y;
    if (crosses && x < a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x)) within = !within;
  });
  return within;
}

const makes = [3, 4, 6, 8, 12].map((slots) => ({
  slots,
  crank: 50,
  pin: 8,
  lockRadius: 40,
  lockClearance: 0.4,
}));

describe('an inside Geneva wheel, outlined', () => {
  it.each(makes)('lets pin and lock pass through a whole turn: $slots slots', (make) => {
    const ring = outcome(genevaRingOutline(make, 20, 0.2), 'outlined');
    const tail = outcome(genevaTailOutline(make), 'outlined').points;
    const { centreDistance } = genevaLayout('inside', make.slots, make.crank);
    for (let k = 0; k < 240; k += 1) {
      const crankAngle = -Math.PI + (k * 2 * Math.PI) / 240;
      const { wheelAngle } = genevaState('inside', make.slots, crankAngle);
      const seen = (point: Point) => {
        const turned = rotate(point, crankAngle);
        return rotate({ x: turned.x + centreDistance, y: turned.y }, -wheelAngle);
      };
      const pin = Array.from({ length: 24 }, (_, i) =>
        polar(make.pin / 2, (i * Math.PI) / 12, { x: make.crank, y: 0 }),
      );
      for (const point of [...pin, ...tail]) expect(inside(ring.opening, seen(point))).toBe(true);
    }
  });

  it('holds fast in rest: turned by a degree, its horns meet the lock', () => {
    const make = { slots: 6, crank: 50, pin: 8, lockRadius: 40, lockClearance: 0.2 };
    const { opening } = outcome(genevaRingOutline(make, 20), 'outlined');
    const tail = outcome(genevaTailOutline(make), 'outlined').points;
    const meets = (crankAngle: number, wheel: number) =>
      tail.some((point) => {
        const turned = rotate(point, crankAngle);
        return !inside(opening, rotate({ x: turned.x + 100, y: turned.y }, -wheel));
      });
    const rest = Math.PI / 6;
    for (const crankAngle of [Math.PI - 0.9, Math.PI, Math.PI + 0.9]) {
      expect(meets(crankAngle, rest)).toBe(false);
    }
    expect(meets(Math.PI, rest + Math.PI / 180)).toBe(true);
    expect(meets(Math.PI, rest - Math.PI / 180)).toBe(true);
  });

  it('has slots down to c + a + half a slot, hollows about the crank’s arbor, and wood round them', () => {
    const make = { slots: 6, crank: 50, pin: 8, lockRadius: 40, lockClearance: 0.4 };
    const { opening, rimRadius } = outcome(genevaRingOutline(make, 20, 0.5), 'outlined');
    expect(rimRadius).toBeCloseTo(100 + 50 + 4 + 20, 12);
    const farthest = Math.max(...opening.map(({ x, y }) => Math.hypot(x, y)));
    expect(farthest).toBeCloseTo(150 + 4.25, 9);
    const nearest = Math.min(...opening.map(({ x, y }) => Math.hypot(x, y)));
    expect(nearest).toBeCloseTo(50 / Math.tan(Math.PI / 6), 9);
    const arbor = polar(100, Math.PI / 6);
    const hollow = opening.filter((point) => Math.abs(distance(point, arbor) - 40) < 1e-9);
    expect(hollow.length).toBeGreaterThan(30);
    const tail = outcome(genevaTailOutline(make), 'outlined').points;
    // As wide as the wheel's rest, π − 2π/n of the crank, behind the pin.
    const [first, last] = [tail[0], tail.at(-1)];
    if (!first || !last) throw new Error('the tail has no points');
    expect(Math.atan2(first.y, first.x)).toBeCloseTo((2 * Math.PI) / 3, 12);
    expect(Math.atan2(last.y, last.x)).toBeCloseTo((-2 * Math.PI) / 3, 12);
    for (const { x, y } of tail) expect(Math.hypot(x, y)).toBeCloseTo(39.6, 12);
  });

  it('says what wood is missing', () => {
    const make = { slots: 6, crank: 50, pin: 8, lockRadius: 40, lockClearance: 0.4 };
    expect(outcome(genevaRingOutline({ ...make, lockRadius: 47 }, 20), 'no-horn').by).toBe(1);
    expect(outcome(genevaRingOutline({ ...make, lockRadius: 45 }, 20, 4), 'no-horn').by).toBe(1);
    expect(outcome(genevaTailOutline({ ...make, lockRadius: 47 }), 'no-horn').by).toBe(1);
    // c − R = 100 − 86.60 for six slots
    expect(
      outcome(genevaRingOutline({ ...make, lockRadius: 13 }, 20), 'hollow-closed').by,
    ).toBeCloseTo(0.39745962, 8);
    expect(
      outcome(genevaTailOutline({ ...make, lockRadius: 25 }), 'horns-strike').by,
    ).toBeGreaterThan(1);
    expect(() => genevaRingOutline(make, 0)).toThrow('wood is 0');
    expect(() => genevaRingOutline(make, 20, -1)).toThrow('slotClearance is -1');
    expect(() => genevaTailOutline({ ...make, lockClearance: 40 })).toThrow('rim radius is 0');
  });
});
