/**
 * When work is due, as it stands above a column.
 *
 * @example sayDue('2026-12-08T18:30:00Z', 'Europe/London') // 'due Tue 8 Dec, 18:30'
 */
export function sayDue(dueAt: string | null, timeZone: string): string {
  return dueAt === null ? 'no date' : `due ${sayDeadline(dueAt, timeZone)}`;
}

/**
 * The moment until which something can be done. Midnight is the end of a day, not the beginning of
 * the next.
 *
 * @example sayDeadline('2026-12-09T00:00:00Z', 'Europe/London') // 'Tue 8 Dec, midnight'
 */
export function sayDeadline(moment: string, timeZone: string): string {
  const said = sayWhen(moment, timeZone);
  if (!said.endsWith(', 00:00')) return said;
  const before = new Date(new Date(moment).getTime() - 1).toISOString();
  return `${sayWhen(before, timeZone).split(',')[0] ?? ''}, midnight`;
}

/**
 * A moment as it is said on the screen, in the given time zone.
 *
 * @example sayWhen('2026-12-08T18:30:00Z', 'Europe/London') // 'Tue 8 Dec, 18:30'
 */
export function sayWhen(moment: string, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    timeZone,
    weekday: 'short',
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).format(new Date(moment));
}

/**
 * A day as it is said on the screen, in the given time zone.
 *
 * @example sayDay('2026-12-08T18:30:00Z', 'Europe/London') // '8 Dec 2026'
 */
export function sayDay(moment: string, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', {
    timeZone,
    day: 'numeric',
    month: 'short',
    year: 'numeric',
  }).format(new Date(moment));
}
