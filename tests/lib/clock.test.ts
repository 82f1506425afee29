import { describe, expect, it } from 'vitest';
import { dateIn, isTimeZone, momentIn, timeIn } from '@/lib/clock';

describe('dateIn', () => {
  it('gives the date that the wall calendar shows', () => {
    const moment = new Date('2026-03-01T12:00:00Z');
    expect(dateIn('Pacific/Auckland', moment)).toBe('2026-03-02');
    expect(dateIn('America/New_York', moment)).toBe('2026-03-01');
    expect(dateIn('America/New_York', new Date('2026-03-01T04:59:59Z'))).toBe('2026-02-28');
  });
});

describe('momentIn', () => {
  it('follows summer time', () => {
    expect(momentIn('Europe/Berlin', '2026-07-01', '18:00').toISOString()).toBe(
      '2026-07-01T16:00:00.000Z',
    );
    expect(momentIn('Europe/Berlin', '2026-01-15', '18:00').toISOString()).toBe(
      '2026-01-15T17:00:00.000Z',
    );
  });

  it('takes the first of an hour that comes twice', () => {
    // Clocks in Berlin go back from 03:00 to 02:00 on 25 October 2026.
    expect(momentIn('Europe/Berlin', '2026-10-25', '02:30').toISOString()).toBe(
      '2026-10-25T00:30:00.000Z',
    );
  });

  it('moves a skipped time on by as much as was skipped', () => {
    // Clocks in Berlin go forward from 02:00 to 03:00 on 29 March 2026.
    expect(momentIn('Europe/Berlin', '2026-03-29', '02:30').toISOString()).toBe(
      '2026-03-29T01:30:00.000Z',
    );
  });

  it('refuses a malformed date', () => {
    expect(() => momentIn('Europe/Berlin', '2026-3-1', '18:00')).toThrow(RangeError);
  });
});

describe('timeIn', () => {
  it('gives what the clock on the wall shows, midnight as 00:00', () => {
    expect(timeIn('Europe/Berlin', new Date('2026-07-01T16:00:00Z'))).toBe('18:00');
    expect(timeIn('Europe/Berlin', new Date('2026-03-29T01:30:00Z'))).toBe('03:30');
    expect(timeIn('Asia/Kolkata', new Date('2026-12-07T18:30:00Z'))).toBe('00:00');
  });
});

describe('isTimeZone', () => {
  it('knows real names only', () => {
    expect(isTimeZone('Europe/Lisbon')).toBe(true);
    expect(isTimeZone('Harbour/Workshop')).toBe(false);
  });
});
