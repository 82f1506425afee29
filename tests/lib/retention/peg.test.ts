import { describe, expect, it } from 'vitest';
import { dateOf, pegOf, type ClosedRound } from '@/lib/retention/peg';
import { dueAfter, gradeOf } from '@/lib/retention/due';

const round = (day: string, right = true, unaided = true): ClosedRound => ({
  closedAt: `2026-03-${day}`,
  right,
  unaided,
});
const peg = (rounds: readonly ClosedRound[], due: string | null = null, timeZone = 'UTC') =>
  pegOf({ rounds, due, now: '2026-03-20T12:00:00Z', timeZone }).state;

describe('how a peg stands', () => {
  it('is an open hole before the first closed round', () => {
    expect(peg([])).toBe('open');
  });

  it('is started by any closed round, right or not', () => {
    expect(peg([round('01T10:00:00Z', false)])).toBe('started');
  });

  it('goes home with three right alone on two dates', () => {
    const three = [round('01T10:00:00Z'), round('01T10:05:00Z'), round('02T10:00:00Z')];
    expect(peg(three)).toBe('home');
    expect(peg(three.slice(0, 2))).toBe('started');
  });

  it('stays started while all the right rounds fall on one date', () => {
    const day = ['10:00', '10:05', '10:10', '10:15'].map((at) => round(`01T${at}:00Z`));
    expect(peg(day)).toBe('started');
    const { detail } = pegOf({
      rounds: day,
      due: null,
      now: '2026-03-02T00:00:00Z',
      timeZone: 'UTC',
    });
    expect(detail).toContain('another day');
  });

  it('counts dates where the person lives, not in Greenwich', () => {
    const evening = ['20:00', '21:00', '23:30'].map((at) => round(`01T${at}:00Z`));
    expect(peg(evening, null, 'UTC')).toBe('started');
    expect(peg(evening, null, 'Europe/Helsinki')).toBe('home');
  });

  it('counts the date of right rounds only', () => {
    const rounds = [
      round('01T10:00:00Z', false),
      round('02T10:00:00Z'),
      round('02T10:05:00Z'),
      round('02T10:10:00Z'),
    ];
    expect(peg(rounds)).toBe('started');
  });

  it('does not count a round with the third hint or the solution', () => {
    const rounds = [
      round('01T10:00:00Z'),
      round('02T10:00:00Z'),
      round('03T10:00:00Z', true, false),
    ];
    expect(peg(rounds)).toBe('started');
    expect(peg([...rounds, round('04T10:00:00Z')])).toBe('home');
  });

  it('looks at the last four closed rounds only, in the order of their closing', () => {
    const early = ['01', '02', '03'].map((day) => round(`${day}T10:00:00Z`));
    const late = ['04', '05'].map((day) => round(`${day}T10:00:00Z`, false));
    expect(peg([...early, ...late.slice(0, 1)])).toBe('home');
    expect(peg([...early, ...late])).toBe('started');
    expect(peg([...late, ...early])).toBe('started');
  });

  it('lifts when it is home and due, and only then', () => {
    const three = ['01', '02', '03'].map((day) => round(`${day}T10:00:00Z`));
    expect(peg(three, '2026-03-20T12:00:00Z')).toBe('lifting');
    expect(peg(three, '2026-03-20T12:00:01Z')).toBe('home');
    expect(peg(three.slice(1), '2026-03-20T12:00:00Z')).toBe('started');
  });

  it('refuses a time that is none', () => {
    expect(() => peg([round('99T10:00:00Z')])).toThrow(RangeError);
  });

  it('says the date of an instant in a time zone, over a change of clocks', () => {
    expect(dateOf('2026-03-28T23:30:00Z', 'Europe/Berlin')).toBe('2026-03-29');
    expect(dateOf('2026-03-29T22:30:00Z', 'Europe/Berlin')).toBe('2026-03-30');
  });
});

describe('when a skill is due again', () => {
  it('is nothing before the first round', () => {
    expect(dueAfter([])).toBeNull();
  });

  it('comes later after each right round, and never on the same day', () => {
    const [first, second] = [round('01T10:00:00Z'), round('05T10:00:00Z')];
    const after = [[first], [first, second]].map((rounds) => Date.parse(dueAfter(rounds) ?? ''));
    const day = 86_400_000;
    expect((after[0] ?? 0) - Date.parse(first.closedAt)).toBeGreaterThanOrEqual(day);
    expect((after[1] ?? 0) - Date.parse(second.closedAt)).toBeGreaterThan(
      (after[0] ?? 0) - Date.parse(first.closedAt),
    );
  });

  it('comes sooner after a wrong round than after a right one', () => {
    const due = (right: boolean) =>
      Date.parse(dueAfter([round('01T10:00:00Z'), round('05T10:00:00Z', right)]) ?? '');
    expect(due(false)).toBeLessThan(due(true));
  });

  it('is the same for the same history, whatever its order', () => {
    const rounds = ['01', '04', '09'].map((day) => round(`${day}T10:00:00Z`));
    expect(dueAfter(rounds)).toBe(dueAfter([...rounds].reverse()));
  });

  it('grades a round that took help or a second try as hard, and never one as easy', () => {
    expect(gradeOf(round('01', false))).toBe(1);
    expect(gradeOf(round('01', true, false))).toBe(2);
    expect(gradeOf({ ...round('01'), attempts: 2 })).toBe(2);
    expect(gradeOf(round('01'))).toBe(3);
  });
});
