import { describe, expect, it } from 'vitest';
import { sayDeadline, sayDue, sayWhen } from '@/components/progress/say-due';

describe('saying when', () => {
  it('uses the clock of the time zone', () => {
    expect(sayWhen('2026-12-08T18:30:00Z', 'Europe/London')).toBe('Tue 8 Dec, 18:30');
    expect(sayWhen('2026-12-08T18:30:00Z', 'Pacific/Auckland')).toBe('Wed 9 Dec, 07:30');
  });

  it('calls midnight the end of a day, in whichever zone it is midnight', () => {
    expect(sayDeadline('2026-12-09T00:00:00Z', 'Europe/London')).toBe('Tue 8 Dec, midnight');
    expect(sayDeadline('2026-12-08T23:00:00Z', 'Europe/Oslo')).toBe('Tue 8 Dec, midnight');
    expect(sayDeadline('2026-12-09T00:00:00Z', 'Europe/Oslo')).toBe('Wed 9 Dec, 01:00');
  });

  it('says so when there is no date', () => {
    expect(sayDue(null, 'Europe/London')).toBe('no date');
  });
});
