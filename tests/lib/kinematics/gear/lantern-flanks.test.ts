import { describe, expect, it } from 'vitest';
import {
  lanternSpeed,
  lanternSwing,
  plainFlankDig,
  type LanternFlank,
} from '@/lib/kinematics/gear/lantern-flanks';
import { lanternPoint, lanternSizes } from '@/lib/kinematics/gear/lantern';
import { derivative, expectNear, outcome } from '@/tests/support/numbers';

const spec = { pitch: 25, wheelTeeth: 36, pins: 8, pinDiameter: 11 };
const { wheelRadius, pinCircleRadius, centreDistance } = lanternSizes(spec);

/** The wheel's turn that brings a flank against the pin, by the path of the pin in the wheel's frame. */
function wheelTurn(flank: LanternFlank, turn: number): number {
  const x = centreDistance - pinCircleRadius * Math.cos(turn);
  const y = pinCircleRadius * Math.sin(turn);
  const away = Math.hypot(x, y);
  const angle = Math.acos((wheelRadius * Math.cos(Math.PI / 9)) / away);
  const seen = flank === 'straight' ? Math.asin(5.5 / away) : angle - Math.tan(angle);
  return Math.atan2(y, x) - seen;
}

const speedOf = (flank: LanternFlank, turn: number) =>
  outcome(lanternSpeed(spec, flank, turn), 'drives').speed;

describe('a lantern driven by flanks of three kinds', () => {
  it.each(['straight', 'involute'] as const)('%s: has the speed of its own path', (flank) => {
    for (const turn of [0.05, 0.2, 0.4, 0.6, 0.75]) {
      const perTurn = derivative((t) => wheelTurn(flank, t), turn, 1e-3);
      const mean = wheelRadius / pinCircleRadius;
      expectNear(speedOf(flank, turn), 1 / perTurn / mean, 1e-8);
    }
  });

  it('runs evenly on the flank of the pin’s own path, and evenly at the line of centres on any', () => {
    expect(speedOf('pin-path', 0.4)).toBe(1);
    expect(lanternSwing(spec, 'pin-path')).toEqual({ outcome: 'swings', least: 0, greatest: 0 });
    expect(speedOf('involute', 0)).toBeCloseTo(1, 12);
  });

  it('swings most on straight flanks: unit 3.5’s inverses, −3 to +6 and −42 to 0 of a hundred', () => {
    const involute = outcome(lanternSwing(spec, 'involute'), 'swings');
    expect(100 * (1 / (1 + involute.greatest) - 1)).toBeCloseTo(-2.9, 1);
    expect(100 * (1 / (1 + involute.least) - 1)).toBeCloseTo(6.4, 1);
    const straight = outcome(lanternSwing(spec, 'straight'), 'swings');
    expect(100 * (1 / (1 + straight.greatest) - 1)).toBeCloseTo(-41.9, 1);
    expect(straight.least).toBeGreaterThan(-0.01);
    expect(straight.greatest).toBeCloseTo(speedOf('straight', Math.PI / 4) - 1, 12);
  });

  it('jams where the push passes the lantern’s axle on the wrong side', () => {
    const coarse = { pitch: 25, wheelTeeth: 36, pins: 3, pinDiameter: 6 };
    expect(outcome(lanternSpeed(coarse, 'straight', 2), 'jams').by).toBeGreaterThan(0);
    expect(outcome(lanternSwing(coarse, 'straight'), 'jams').by).toBeGreaterThan(0);
  });

  it('digs into the pin by its radius less half the play, if its flank is not moved in', () => {
    expect(plainFlankDig(spec)).toBe(5.5);
    expect(plainFlankDig({ ...spec, play: 1 })).toBe(5);
    const { pinCentre, flank } = lanternPoint(spec, 0.1);
    expect(Math.hypot(pinCentre.x - flank.x, pinCentre.y - flank.y)).toBeCloseTo(5.5, 12);
  });

  it('refuses nonsense', () => {
    expect(() => lanternSpeed(spec, 'straight', 1)).toThrow('turn is 1');
    expect(() => lanternSpeed(spec, 'straight', -0.1)).toThrow('turn is -0.1');
    expect(() => plainFlankDig({ ...spec, pins: 2 })).toThrow('pins is 2');
  });
});
