/**
 * When work is due, as it stands above a column.
 *
 * @example sayDue('2026-12-08T18:30:00Z', 'Europe/London') // 'due Tue 8 Dec, 18:30'
 */
export function sayDue(dueAt: string | null, timeZone: string): string {
  return dueAt === null ? 'no date' : `due ${sayWhen(dueAt, timeZone)}`;
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
