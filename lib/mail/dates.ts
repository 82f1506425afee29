/**
 * The moment until which something can be done, in words, with the zone in which it is meant.
 * Midnight is the end of a day, not the beginning of the next.
 *
 * @example sayDeadline('2026-12-08T18:30:00Z', 'Europe/London')
 * // 'Tuesday 8 December 2026, 18:30 (London time)'
 */
export function sayDeadline(moment: string, timeZone: string): string {
  const at = new Date(moment);
  const clock = format(at, timeZone, { hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
  const zone = ` (${placeOf(timeZone)})`;
  if (clock !== '00:00') return `${sayDay(at, timeZone)}, ${clock}${zone}`;
  return `${sayDay(new Date(at.getTime() - 1), timeZone)}, midnight${zone}`;
}

/** A moment that has passed, in words. */
export function sayMoment(moment: Date, timeZone: string): string {
  const clock = format(moment, timeZone, { hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });
  return `${sayDay(moment, timeZone)}, ${clock} (${placeOf(timeZone)})`;
}

/** A calendar date in words: '8 December'. */
export function sayDate(date: string): string {
  return format(new Date(`${date}T12:00:00Z`), 'UTC', { day: 'numeric', month: 'long' });
}

/** How long something lasts: '30 minutes', 'a day', '7 days'. */
export function sayLifetime(minutes: number): string {
  if (minutes < 120) return `${minutes} minutes`;
  if (minutes < 2 * 1440) return minutes === 1440 ? 'a day' : `${Math.round(minutes / 60)} hours`;
  return `${Math.round(minutes / 1440)} days`;
}

/** Put together from its parts, because one version of Unicode's data has a comma where another has none. */
function sayDay(moment: Date, timeZone: string): string {
  const shown = { weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' } as const;
  const parts = new Intl.DateTimeFormat('en-GB', { timeZone, ...shown }).formatToParts(moment);
  return parts.flatMap(({ type, value }) => (type === 'literal' ? [] : [value])).join(' ');
}

function format(moment: Date, timeZone: string, shown: Intl.DateTimeFormatOptions): string {
  return new Intl.DateTimeFormat('en-GB', { timeZone, ...shown }).format(moment);
}

function placeOf(timeZone: string): string {
  const place = timeZone.split('/').at(-1)?.replaceAll('_', ' ') ?? timeZone;
  return timeZone.includes('/') ? `${place} time` : place;
}
