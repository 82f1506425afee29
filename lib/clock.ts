/**
 * Time as data: functions take the moment as an argument, and only the edge of the program asks
 * what time it is. A calendar date is `YYYY-MM-DD`; a time zone is an IANA name.
 */

/** The present moment. */
export function now(): Date {
  return new Date();
}

/**
 * The calendar date at `moment` in `timeZone`. Throws `RangeError` for an unknown time zone.
 *
 * @example dateIn('Pacific/Auckland', new Date('2026-03-01T12:00:00Z')) // '2026-03-02'
 */
export function dateIn(timeZone: string, moment: Date): string {
  const { year, month, day } = wallClock(timeZone, moment);
  return `${pad(year, 4)}-${pad(month)}-${pad(day)}`;
}

/**
 * The time that a clock in `timeZone` shows at `moment`, as `HH:MM`. Throws `RangeError` for an
 * unknown time zone.
 *
 * @example timeIn('Europe/Berlin', new Date('2026-07-01T16:00:00Z')) // '18:00'
 */
export function timeIn(timeZone: string, moment: Date): string {
  const { hour, minute } = wallClock(timeZone, moment);
  return `${pad(hour)}:${pad(minute)}`;
}

/**
 * The moment at which a clock in `timeZone` shows `date` and `time` (`HH:MM`). A time that a
 * clock change skips is taken that much later; one that comes twice is the first of the two.
 * Throws `RangeError` for a malformed date, time or zone.
 *
 * @example momentIn('Europe/Berlin', '2026-07-01', '18:00') // 2026-07-01T16:00:00.000Z
 */
export function momentIn(timeZone: string, date: string, time: string): Date {
  const asIfUtc = Date.parse(`${date}T${time}:00Z`);
  if (!/^\d{4}-\d{2}-\d{2}$/.test(date) || !/^\d{2}:\d{2}$/.test(time) || Number.isNaN(asIfUtc)) {
    throw new RangeError(`momentIn: expected YYYY-MM-DD and HH:MM, not "${date}" and "${time}"`);
  }
  const before = asIfUtc - offsetAt(timeZone, asIfUtc - DAY);
  const after = asIfUtc - offsetAt(timeZone, asIfUtc + DAY);
  const fits = [before, after].filter((at) => at + offsetAt(timeZone, at) === asIfUtc);
  return new Date(fits.length > 0 ? Math.min(...fits) : before);
}

/** Whether `name` is a time zone that this machine knows. */
export function isTimeZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: name });
    return true;
  } catch {
    return false;
  }
}

const DAY = 24 * 60 * 60 * 1000;
const formats = new Map<string, Intl.DateTimeFormat>();

function wallClock(timeZone: string, moment: Date) {
  let format = formats.get(timeZone);
  if (format === undefined) {
    format = new Intl.DateTimeFormat('en', {
      timeZone,
      calendar: 'gregory',
      numberingSystem: 'latn',
      hourCycle: 'h23',
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: 'numeric',
      minute: 'numeric',
      second: 'numeric',
    });
    formats.set(timeZone, format);
  }
  const parts = new Map(format.formatToParts(moment).map((part) => [part.type, part.value]));
  const read = (type: Intl.DateTimeFormatPartTypes) => Number(parts.get(type));
  return {
    year: read('year'),
    month: read('month'),
    day: read('day'),
    hour: read('hour'),
    minute: read('minute'),
    second: read('second'),
  };
}

/** How far, in milliseconds, the clocks of `timeZone` are ahead of UTC at `at`. */
function offsetAt(timeZone: string, at: number): number {
  const clock = wallClock(timeZone, new Date(at));
  const shown = Date.UTC(
    clock.year,
    clock.month - 1,
    clock.day,
    clock.hour,
    clock.minute,
    clock.second,
  );
  return shown - Math.floor(at / 1000) * 1000;
}

function pad(value: number, digits = 2): string {
  return String(value).padStart(digits, '0');
}
