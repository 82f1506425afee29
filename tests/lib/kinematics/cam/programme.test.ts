import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type Segment,
  programmeCorners,
  programmeMotion,
  programmeOf,
} from '@/lib/kinematics/cam/programme';
import { angleForTime, dwellArc, setBackAngle, timeForAngle } from '@/lib/kinematics/cam/timing';
import { between, derivative, expectNear, outcome, runs } from '@/tests/support/numbers';

const degree = Math.PI / 180;
const heron: readonly Segment[] = [
  { kind: 'rise', law: '3-4-5', height: 20, angle: 75 * degree },
  { kind: 'dwell', angle: 120 * degree },
  { kind: 'return', law: 'cycloidal', height: 20, angle: 45 * degree },
];
const programme = () => outcome(programmeOf(heron), 'complete').programme;

describe('a programme of a turn', () => {
  it('leaves the remainder of the turn as a dwell', () => {
    const { remaining, closingStep, greatestLift } = programme();
    expect(remaining / degree).toBeCloseTo(120, 10);
    expect(closingStep).toBe(0);
    expect(greatestLift).toBe(20);
  });

  it('rises, stands, returns and stands', () => {
    const height = (degrees: number) => programmeMotion(programme(), degrees * degree).position;
    expect(height(0)).toBe(0);
    expect(height(37.5)).toBeCloseTo(10, 10);
    expect(height(100)).toBe(20);
    expect(height(217.5)).toBeCloseTo(10, 10);
    expect(height(300)).toBe(0);
  });

  it('repeats itself every turn, either way', () => {
    fc.assert(
      fc.property(between(0, 6.28), fc.integer({ min: -3, max: 3 }), (angle, turns) => {
        const here = programmeMotion(programme(), angle).position;
        const there = programmeMotion(programme(), angle + turns * 2 * Math.PI).position;
        expect(there).toBeCloseTo(here, 9);
      }),
      runs,
    );
  });

  it('has the derivatives of its lift, by the cam’s angle and by time', () => {
    fc.assert(
      fc.property(between(0.01, 6.2), (angle) => {
        const clear = programmeCorners(programme()).every((c) => Math.abs(c - angle) > 4e-3);
        if (!clear) return;
        const at = (x: number) => programmeMotion(programme(), x).position;
        expectNear(derivative(at, angle), programmeMotion(programme(), angle).velocity, 1e-6, 30);
        expectNear(
          programmeMotion(programme(), angle, 3).velocity,
          3 * programmeMotion(programme(), angle).velocity,
          1e-12,
          100,
        );
      }),
      runs,
    );
  });

  it('drops at once and tells the step that is left at the end of the turn', () => {
    const segments: Segment[] = [
      { kind: 'rise', law: 'uniform', height: 30, angle: 5 },
      { kind: 'drop', height: 24 },
    ];
    const snail = outcome(programmeOf(segments), 'complete').programme;
    expect(programmeMotion(snail, 4.999).position).toBeCloseTo(30, 1);
    expect(programmeMotion(snail, 5.001).position).toBe(6);
    expect(snail.closingStep).toBe(-6);
  });

  it('says by how much it asks for more than a turn', () => {
    const over = programmeOf([...heron, { kind: 'dwell', angle: 130 * degree }]);
    expect(outcome(over, 'over-a-turn').excess / degree).toBeCloseTo(10, 9);
  });

  it('takes a turn that is full but for rounding as full', () => {
    const third: Segment = { kind: 'dwell', angle: (2 * Math.PI) / 3 + 1e-12 };
    expect(outcome(programmeOf([third, third, third]), 'complete').programme.remaining).toBe(0);
  });

  it('says how deep a return goes below the base', () => {
    const deep = programmeOf([
      { kind: 'rise', law: 'cycloidal', height: 10, angle: 1 },
      { kind: 'return', law: 'cycloidal', height: 12.5, angle: 1 },
    ]);
    expect(deep).toEqual({ outcome: 'below-the-base', depth: 2.5 });
  });

  it('stands at the base if nothing is asked', () => {
    const none = outcome(programmeOf([]), 'complete').programme;
    expect(programmeMotion(none, 1)).toEqual({
      position: 0,
      velocity: 0,
      acceleration: 0,
      jerk: 0,
    });
    expect(programmeCorners(none)).toEqual([0, 2 * Math.PI]);
  });

  it('refuses segments that are none', () => {
    expect(() => programmeOf([{ kind: 'dwell', angle: 0 }])).toThrow('angle is 0');
    expect(() => programmeOf([{ kind: 'drop', height: -2 }])).toThrow('height is -2');
    expect(() =>
      programmeOf([{ kind: 'rise', law: '3-4-5', height: Number.NaN, angle: 1 }]),
    ).toThrow('lift is NaN');
    expect(() => programmeMotion(programme(), Infinity)).toThrow('angle is Infinity');
  });
});

describe('the timing of a cam', () => {
  it('shares the turn as it shares the time: the heron of the worked example', () => {
    expect([2.5, 4, 1.5].map((t) => Math.round(angleForTime(t, 12) / degree))).toEqual([
      75, 120, 45,
    ]);
    expect(dwellArc(35, 20, 120 * degree)).toEqual({ radius: 55, length: 55 * 120 * degree });
  });

  it('is undone by its inverse', () => {
    fc.assert(
      fc.property(between(0, 100), between(0.1, 100), (duration, turn) => {
        expectNear(timeForAngle(angleForTime(duration, turn), turn), duration, 1e-14);
      }),
      runs,
    );
  });

  it('sets a second cam back by its delay, less what its follower stands on', () => {
    expect(setBackAngle(2, 12, 30 * degree) / degree).toBeCloseTo(30, 12);
    expect(setBackAngle(1, 12, 45 * degree) / degree).toBeCloseTo(-15, 12);
  });

  it('refuses nonsense', () => {
    expect(() => angleForTime(-1, 12)).toThrow('duration is -1');
    expect(() => timeForAngle(1, 0)).toThrow('turnTime is 0');
    expect(() => setBackAngle(Number.NaN, 1, 0)).toThrow('delay is NaN');
    expect(() => dwellArc(0, 1, 1)).toThrow('baseRadius is 0');
  });
});
