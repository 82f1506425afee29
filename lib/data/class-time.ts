import 'server-only';
import { dateIn, momentIn, timeIn } from '@/lib/clock';

/** A moment as it is written for a class: a day, and a time or (empty) the end of that day. */
export interface SaidMoment {
  readonly on: string;
  readonly time: string;
}

const MINUTE = 60_000;

/**
 * The moment that is meant by the clock of a class. Without a time it is the end of the day, which is
 * the first moment that is no longer in it. A time that a clock change skips is taken that much
 * later; of one that comes twice the first is meant. Throws `RangeError` for a malformed day or time.
 *
 * @example classMoment('Europe/Berlin', { on: '2026-03-29', time: '02:30' }) // 2026-03-29T01:30:00.000Z
 */
export function classMoment(timeZone: string, { on, time }: SaidMoment): Date {
  return time === ''
    ? new Date(momentIn(timeZone, on, '23:59').getTime() + MINUTE)
    : momentIn(timeZone, on, time);
}

/**
 * How a moment is written for a class. Midnight is the end of the day before.
 *
 * @example sayMoment('Europe/London', new Date('2026-12-09T00:00:00Z')) // { on: '2026-12-08', time: '' }
 */
export function sayMoment(timeZone: string, moment: Date): SaidMoment {
  const time = timeIn(timeZone, moment);
  return time === '00:00'
    ? { on: dateIn(timeZone, new Date(moment.getTime() - 1)), time: '' }
    : { on: dateIn(timeZone, moment), time };
}

/**
 * The same for a moment that is there already: what still reads as it did is left where it is. So the
 * second of two half past twos does not become the first by saving a form, and a moment that was
 * given with its seconds keeps them.
 */
export function classMomentOr(kept: Date, timeZone: string, said: SaidMoment): Date {
  const now = sayMoment(timeZone, kept);
  return now.on === said.on && now.time === said.time ? kept : classMoment(timeZone, said);
}

/**
 * The moment from which on something is open: without a time, as the day begins. What is there
 * already is left where it is when it reads the same.
 */
export function openingMoment(timeZone: string, { on, time }: SaidMoment, kept?: Date): Date {
  const from = time === '' ? '00:00' : time;
  const same =
    kept !== undefined && dateIn(timeZone, kept) === on && timeIn(timeZone, kept) === from;
  return same ? kept : momentIn(timeZone, on, from);
}
