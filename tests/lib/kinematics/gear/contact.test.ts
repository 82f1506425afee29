import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contactOf, rackContactRatio, ringContact } from '@/lib/kinematics/gear/contact';
import { toothForce } from '@/lib/kinematics/gear/tooth-force';
import { degree } from './gears';

const pair = { module: 3, firstTeeth: 20, secondTeeth: 40, pressureAngle: 20 * degree };

describe('the contact of two wheels', () => {
  it('is what Norton finds for 19 and 37 teeth, on and off standard centres', () => {
    // Norton, Design of Machinery, gear pair 19/37 (values high; cases GR-CR-01, 02).
    const wheels = {
      module: 25.4 / 6,
      firstTeeth: 19,
      secondTeeth: 37,
      pressureAngle: 20 * degree,
    };
    expect(contactOf(wheels)).toMatchObject({
      outcome: 'contact',
      contactRatio: expect.closeTo(1.62088831905, 9),
      path: expect.closeTo(20.2568190148, 7),
      firstInterference: 0,
      secondInterference: 0,
    });
    const wide = contactOf(wheels, 120.904);
    expect(wide.outcome === 'contact' && wide.contactRatio).toBeCloseTo(1.10218543627, 8);
    expect(wide.outcome === 'contact' && wide.operatingAngle / degree).toBeCloseTo(
      22.8879422536,
      7,
    );
  });

  it('ends where the tips pass, and before the base circles meet', () => {
    expect(contactOf(pair, 95)).toMatchObject({ outcome: 'contact' });
    const past = contactOf(pair, 97);
    expect(past.outcome).toBe('no-contact');
    expect(past.outcome === 'no-contact' && past.short).toBeGreaterThan(0);
    expect(contactOf(pair, 84)).toEqual({
      outcome: 'too-close',
      overlap: expect.closeTo(90 * Math.cos(20 * degree) - 84, 12),
    });
    expect(() => contactOf(pair, 0)).toThrow('centreDistance is 0');
    expect(() => contactOf({ ...pair, secondTeeth: 1.5 })).toThrow('secondTeeth is 1.5');
  });

  it('splits into approach and recess, and is the same seen from the other wheel', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 12, max: 200 }),
        fc.integer({ min: 12, max: 200 }),
        fc.double({ min: 0, max: 0.5, noNaN: true }),
        (firstTeeth, secondTeeth, opening) => {
          const one = { module: 2, firstTeeth, secondTeeth, pressureAngle: 20 * degree };
          const other = { ...one, firstTeeth: secondTeeth, secondTeeth: firstTeeth };
          const distance = firstTeeth + secondTeeth + opening;
          const [a, b] = [contactOf(one, distance), contactOf(other, distance)];
          if (a.outcome !== 'contact' || b.outcome !== 'contact') throw new Error(a.outcome);
          expect(a.approach + a.recess).toBeCloseTo(a.path, 9);
          expect(a.approach).toBeCloseTo(b.recess, 9);
          expect(a.firstInterference).toBeCloseTo(b.secondInterference, 9);
        },
      ),
      { seed: 13, numRuns: 1000 },
    );
  });

  it('digs when a large wheel meets a small pinion, by an amount', () => {
    // 13 leaves run with up to 16 teeth (case GR-LG-01), so 17 dig and 16 do not.
    const small = { module: 1, firstTeeth: 13, secondTeeth: 16, pressureAngle: 20 * degree };
    expect(contactOf(small)).toMatchObject({ secondInterference: 0 });
    const dug = contactOf({ ...small, secondTeeth: 17 });
    expect(dug.outcome === 'contact' && dug.secondInterference).toBeGreaterThan(0);
    expect(dug.outcome === 'contact' && dug.firstInterference).toBe(0);
  });
});

describe('the contact of a rack and of a ring', () => {
  it('is longer than that of two wheels', () => {
    expect(rackContactRatio({ module: 3, teeth: 20, pressureAngle: 20 * degree })).toBeCloseTo(
      1.76882370021,
      9,
    );
    const ring = { module: 3, firstTeeth: 20, secondTeeth: 60, pressureAngle: 20 * degree };
    const inside = ringContact(ring);
    expect(inside.outcome === 'contact' && inside.contactRatio).toBeCloseTo(1.94966230005, 9);
  });

  it('tends to the rack for ever larger wheels, from both sides', () => {
    const rack = rackContactRatio({ module: 1, teeth: 20, pressureAngle: 20 * degree });
    const large = { module: 1, firstTeeth: 20, secondTeeth: 2_000_000, pressureAngle: 20 * degree };
    const outside = contactOf(large);
    const inside = ringContact(large);
    expect(outside.outcome === 'contact' && outside.contactRatio).toBeCloseTo(rack, 4);
    expect(inside.outcome === 'contact' && inside.contactRatio).toBeCloseTo(rack, 4);
  });

  it('tells that the tips of a ring dig into a small pinion, by how much', () => {
    // z₁/z₂ must be at least 1 − tan αₐ₂/tan α (KHK, involute interference; from memory).
    const interference = (firstTeeth: number) => {
      const ring = { module: 3, firstTeeth, secondTeeth: 60, pressureAngle: 20 * degree };
      const contact = ringContact(ring);
      return contact.outcome === 'contact' ? contact.interference : Number.NaN;
    };
    const tip = Math.acos((30 * Math.cos(20 * degree)) / 29);
    const least = Math.ceil(60 * (1 - Math.tan(tip) / Math.tan(20 * degree)));
    expect(interference(least)).toBe(0);
    expect(interference(least - 1)).toBeGreaterThan(0);
  });

  it('refuses rings of few teeth, whose tips have no involute', () => {
    const ring = { module: 1, firstTeeth: 12, secondTeeth: 33, pressureAngle: 20 * degree };
    expect(ringContact(ring)).toEqual({
      outcome: 'tip-inside-base-circle',
      inside: expect.closeTo(16.5 * Math.cos(20 * degree) - 15.5, 12),
    });
    expect(ringContact({ ...ring, secondTeeth: 34 }).outcome).toBe('contact');
    expect(() => ringContact({ ...ring, secondTeeth: 12 })).toThrow(
      'ring teeth over pinion teeth is 0',
    );
  });
});

describe('the push of tooth on tooth', () => {
  it('is twice the torque over the diameter along, and its tangent apart', () => {
    const force = toothForce(3000, 60, 20 * degree);
    expect(force.along).toBe(100);
    expect(force.apart).toBeCloseTo(36.3970234266, 9);
    expect(Math.hypot(force.along, force.apart)).toBeCloseTo(force.push, 10);
    expect(() => toothForce(1, 0, 0)).toThrow('rollingDiameter is 0');
  });
});
